package org.wardon.advice.outlook;

import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Ripeness;

/**
 * The question how long a lot keeps, as a person asks it.
 *
 * @param commodity id or any common name
 * @param condition one condition or a history
 * @param humidityPct humidity at the produce, percent; empty for the handbook's
 * @param usedPct share of its life used before, percent
 * @param knownLife the keeper's own life as {@code DAYS@C}
 * @param ripeness how far it has come
 * @param cured whether it was cured, where that is known
 * @param ethylenePpm ethylene in the air of one condition, µL/L; empty for clean outdoor air
 * @param ripeInDays asks whether it is ripe after so many days
 * @param variant variant of the commodity; empty for the crop as a whole
 */
public record KeepRequest(
        String commodity,
        Condition condition,
        OptionalDouble humidityPct,
        OptionalDouble usedPct,
        Optional<String> knownLife,
        Ripeness ripeness,
        Optional<Boolean> cured,
        OptionalDouble ethylenePpm,
        OptionalDouble ripeInDays,
        Optional<String> variant) {
    /** What the lot goes through. */
    public sealed interface Condition {}

    /**
     * One temperature.
     *
     * @param atC temperature of lot and air, °C
     * @param days days after which life used and chilling are told
     */
    public record Steady(double atC, double days) implements Condition {
        /** Days told unless others are asked for. */
        public static final double USUAL_DAYS = 7;
    }

    /**
     * A logged history.
     *
     * @param csv the file
     * @param thenC temperature it goes on at, °C; empty to go on as in its last day
     */
    public record Logged(Path csv, OptionalDouble thenC) implements Condition {}
}
