package org.wardon.files.forecast;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;

/**
 * The answer of {@code why}: what moved heat and water in one chamber in one hour. Powers and flows
 * are means of the hour, temperatures stand at its end.
 *
 * @param chamber id of the chamber
 * @param from start of the hour, local time
 * @param until its end, local time
 * @param settingC what the chamber is set to, °C
 * @param before its air at the start
 * @param after its air at the end
 * @param outdoorC outdoor air at the end, °C
 * @param heatW heat into the air by term, W
 * @param heatSumW their sum, W
 * @param removedW heat taken by all coolers, W
 * @param heatErrorW sum less what was removed, W
 * @param heatErrorPct that error, percent of what passed
 * @param waterKgH water into the air by term, kg/h
 * @param waterSumKgH their sum, which must be nothing, kg/h
 * @param waterErrorPct that error, percent of what passed
 * @param ends the two ends of the air; absent where it is one, else {@code before} and {@code
 *     after} are all of it mixed
 * @param face the face asked for
 * @param lot the lot asked for
 */
public record WhyAnswer(
        String chamber,
        LocalDateTime from,
        LocalDateTime until,
        double settingC,
        Air before,
        Air after,
        double outdoorC,
        HeatW heatW,
        double heatSumW,
        double removedW,
        double heatErrorW,
        double heatErrorPct,
        WaterKgH waterKgH,
        double waterSumKgH,
        double waterErrorPct,
        @JsonInclude(JsonInclude.Include.NON_ABSENT) Optional<Ends> ends,
        Optional<OfFace> face,
        Optional<OfLot> lot) {
    /**
     * Air at an instant.
     *
     * @param airC temperature, °C
     * @param humidityPct relative humidity, percent
     * @param dewPointC dew point, °C
     */
    public record Air(double airC, double humidityPct, double dewPointC) {}

    /**
     * The two ends of the air; what one gives the other takes, so that it is no term of the sum.
     *
     * @param coilEndC coil end, °C
     * @param doorEndC door end, °C
     * @param toCoilEndW heat from the door end to the coil end, W
     * @param exchangeM3H air that goes each way, m3/h
     */
    public record Ends(double coilEndC, double doorEndC, double toCoilEndW, double exchangeM3H) {}

    /**
     * Heat into the air, W; the names are those of {@code loadKWh} in the forecast.
     *
     * @param walls through the faces
     * @param door through the open door
     * @param leakage with leaking air
     * @param freshAir with fresh air
     * @param fieldHeat given up by the lots
     * @param respiration of the lots
     * @param fans fans
     * @param lights lights
     * @param people people
     * @param packages given up by packages and structure
     * @param defrost defrost
     * @param humidifier with the water of the humidifier
     * @param heater heater
     * @param pumps pumps
     * @param air given up by the air
     */
    public record HeatW(
            double walls,
            double door,
            double leakage,
            double freshAir,
            double fieldHeat,
            double respiration,
            double fans,
            double lights,
            double people,
            double packages,
            double defrost,
            double humidifier,
            double heater,
            double pumps,
            double air) {}

    /**
     * Water into the air, kg/h.
     *
     * @param lots left skins and free water of lots
     * @param packages given up by the air of packages
     * @param door through the open door
     * @param leakage with leaking air
     * @param freshAir with fresh air
     * @param people of people
     * @param humidifier of the humidifier
     * @param faces off the faces, below 0 where it condensed
     * @param coolers of coolers, below 0 where they dried the air
     * @param air given up by the air
     */
    public record WaterKgH(
            double lots,
            double packages,
            double door,
            double leakage,
            double freshAir,
            double people,
            double humidifier,
            double faces,
            double coolers,
            double air) {}

    /**
     * One face from outside to inside.
     *
     * @param face its name
     * @param beyondC what lies beyond, sun on it counted in, °C
     * @param outerC outer surface, °C
     * @param points temperatures through its layers, outside first
     * @param innerC inner surface, °C
     * @param airC the chamber's air, °C
     * @param fromBeyondW heat from beyond into the layers, W
     * @param toAirW heat to the air, bridges included, W
     * @param bridgeW heat through thermal bridges, W
     * @param vapourKgH vapour to the air, below 0 where it condenses, kg/h
     * @param waterKg water lying on it, kg
     * @param outdoorDewPointC dew point outdoors, °C
     * @param dewPointC dew point of the chamber's air, °C
     */
    public record OfFace(
            String face,
            double beyondC,
            double outerC,
            List<Point> points,
            double innerC,
            double airC,
            double fromBeyondW,
            double toAirW,
            double bridgeW,
            double vapourKgH,
            double waterKg,
            double outdoorDewPointC,
            double dewPointC) {
        /** Copies the list. */
        public OfFace {
            points = List.copyOf(points);
        }
    }

    /**
     * A place in a face.
     *
     * @param depthMm from its outer side, mm
     * @param temperatureC there, °C
     * @param layer material of the layer it lies in or ends
     */
    public record Point(double depthMm, double temperatureC, String layer) {}

    /**
     * One lot from its middle to the chamber's air. What it gave adds up to {@code toAirW}.
     *
     * @param id its id
     * @param there whether it stands there at the end of the hour
     * @param shellsC shells from the middle outwards, °C
     * @param skinC skin, °C
     * @param packageC air of the package, °C
     * @param packageHumidityPct its relative humidity, percent
     * @param airC the chamber's air, °C
     * @param respirationW heat of respiration, W
     * @param fleshW heat its flesh gave up, W
     * @param vapourW enthalpy the water that left it had as a liquid, W
     * @param packageW heat its package gave up, W
     * @param toAirW heat and enthalpy that reached the chamber's air, W
     * @param evaporatedKgH water that left skin and free water as vapour, kg/h
     * @param toAirKgH vapour that reached the chamber's air, kg/h
     * @param freeWaterKg free water lying on it, kg
     * @param massKg its mass at the end, kg
     */
    public record OfLot(
            String id,
            boolean there,
            List<Double> shellsC,
            double skinC,
            double packageC,
            double packageHumidityPct,
            double airC,
            double respirationW,
            double fleshW,
            double vapourW,
            double packageW,
            double toAirW,
            double evaporatedKgH,
            double toAirKgH,
            double freeWaterKg,
            double massKg) {
        /** Copies the list. */
        public OfLot {
            shellsC = List.copyOf(shellsC);
        }
    }
}
