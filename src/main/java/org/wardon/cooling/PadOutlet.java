package org.wardon.cooling;

import org.wardon.air.WetBulb;
import org.wardon.errors.Require;

/**
 * Air leaving a wet pad: cooled by a share of its wet-bulb depression, along the line of one wet
 * bulb.
 *
 * <p>Source: saturation effectiveness as in Wang, Handbook of Air Conditioning and Refrigeration;
 * wet-bulb line of ASHRAE Handbook - Fundamentals, 2017, chapter 1, equation 33.
 *
 * @param temperatureC air leaving, °C, not below the wet bulb
 * @param humidityRatio kg/kg
 * @param waterKgKg water taken up, kg per kg dry air, without bleed
 */
public record PadOutlet(double temperatureC, double humidityRatio, double waterKgKg) {
    /**
     * Works out the air leaving a pad.
     *
     * @param airC air entering, °C
     * @param humidityRatio its humidity ratio, kg/kg
     * @param effectiveness saturation effectiveness, 0 to 1
     * @param pressurePa air pressure, Pa
     * @return the air leaving
     */
    public static PadOutlet of(
            double airC, double humidityRatio, double effectiveness, double pressurePa) {
        Require.within("effectiveness", effectiveness, 0, 1, "", "A fraction of 1.");
        double wetBulb = WetBulb.temperatureC(airC, humidityRatio, pressurePa);
        double out = airC - effectiveness * (airC - wetBulb);
        double w = WetBulb.humidityRatio(out, wetBulb, pressurePa);
        return new PadOutlet(out, w, w - humidityRatio);
    }
}
