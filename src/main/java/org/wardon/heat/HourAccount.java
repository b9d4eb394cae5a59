package org.wardon.heat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.enclosure.FaceName;
import org.wardon.heat.network.FaceReading;
import org.wardon.heat.network.LotReading;

/**
 * One chamber over one span of its run, with everything that moved its heat and its water, and how
 * faces and lots are at the end of it.
 *
 * @param chamberId id of the chamber
 * @param fromS start of the span, s since the start of the run
 * @param untilS its end, s
 * @param before air at the start
 * @param after air at the end
 * @param outdoorC outdoor air at the end, °C
 * @param heat heat of the span by term
 * @param water water of the span by term
 * @param ends the two ends of the air at the end; absent where it is one
 * @param faces faces at the end; what went through them is that of the span
 * @param lots lots that stood there in the span, by id
 */
public record HourAccount(
        String chamberId,
        double fromS,
        double untilS,
        Air before,
        Air after,
        double outdoorC,
        HeatLedger heat,
        WaterLedger water,
        Optional<Ends> ends,
        Map<FaceName, FaceReading> faces,
        List<OfLot> lots) {
    /** Copies the list and the map. */
    public HourAccount {
        faces = Map.copyOf(faces);
        lots = List.copyOf(lots);
    }

    /**
     * The chamber's air at an instant; all of it mixed where it is two.
     *
     * @param temperatureC temperature, °C
     * @param humidityFraction relative humidity, 0 to 1 and a little above
     * @param humidityRatio kg/kg
     * @param dryAirKg dry air in the chamber, kg
     * @param enthalpyJkg enthalpy, J per kg dry air
     */
    public record Air(
            double temperatureC,
            double humidityFraction,
            double humidityRatio,
            double dryAirKg,
            double enthalpyJkg) {}

    /**
     * The two ends of a chamber's air and what they changed with each other in the span.
     *
     * @param coilEndC air of the coil end at the end, °C
     * @param doorEndC air of the door end at the end, °C
     * @param heatJ heat from the door end to the coil end, vapour's counted in, J
     * @param airM3 chamber air that went each way, m3
     */
    public record Ends(double coilEndC, double doorEndC, double heatJ, double airM3) {}

    /**
     * A lot in the span.
     *
     * @param id its id
     * @param there whether it stands there at the end
     * @param airC air of the end it stands in, °C
     * @param inside how it is at the end, or would be where it left
     * @param gave what it gave and took in the span
     * @param massKg its mass at the end, kg
     */
    public record OfLot(
            String id,
            boolean there,
            double airC,
            LotReading inside,
            LotAmounts gave,
            double massKg) {}
}
