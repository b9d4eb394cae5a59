package org.wardon.cooling.water;

import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.enclosure.DoorExchange;
import org.wardon.enclosure.NaturalConvection;
import org.wardon.enclosure.NaturalConvection.Gas;

/**
 * Still air before a film of water on a wall: natural convection, driven by the difference of
 * virtual temperature, since vapour makes air lighter as warmth does.
 *
 * <p>Source: {@code cooling-sources.csv}, rows air_side and vertical_plate, CHURCHILL1975 (from
 * memory); virtual temperature T (1 + 1.6078 W)/(1 + W) of an ideal mixture.
 */
public final class FilmAir {
    private static final double VAPOUR_VOLUME = 1.607858;

    private FilmAir() {}

    /**
     * Returns the convective film, without radiation.
     *
     * @param heightM height of the wall, m
     * @param filmC water of the film, °C; the air at it is saturated
     * @param airC air of the chamber, °C
     * @param humidityRatio its humidity ratio, kg/kg
     * @param pressurePa air pressure, Pa
     * @return W/(m2 K)
     */
    public static double convectiveWm2K(
            double heightM, double filmC, double airC, double humidityRatio, double pressurePa) {
        double atFilm = virtualK(filmC, MoistAir.saturatedHumidityRatio(filmC, pressurePa));
        double difference = atFilm - virtualK(airC, humidityRatio);
        Gas gas = Gas.air(0.5 * (filmC + airC), pressurePa);
        double rayleigh =
                NaturalConvection.rayleigh(difference, heightM, gas, DoorExchange.GRAVITY_MS2);
        return NaturalConvection.wallNusselt(rayleigh, gas.prandtl())
                * gas.conductivityWmK()
                / heightM;
    }

    /**
     * Returns the temperature at which dry air would be as light.
     *
     * @param airC air, °C
     * @param humidityRatio kg/kg
     * @return K
     */
    public static double virtualK(double airC, double humidityRatio) {
        return (airC + SaturatedAir.ZERO_C_IN_K)
                * (1 + VAPOUR_VOLUME * humidityRatio)
                / (1 + humidityRatio);
    }
}
