package org.wardon.reference;

import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.wardon.errors.Limits;

/**
 * A fact that a keeper may set for a store of their own.
 *
 * @param kind which fact
 * @param atC the temperature it holds at, °C, for facts that need one
 */
record OwnName(Kind kind, OptionalDouble atC) {
    static final double COLDEST_C = -2;
    static final double HOTTEST_C = 40;
    private static final Pattern AT = Pattern.compile("([a-z-]+)@(-?[0-9]{1,2}(?:\\.[0-9]+)?)C");

    /** The facts, with their unit and the figures accepted (our bounds). */
    enum Kind {
        STORAGE_TEMPERATURE("storage-temperature", "C", -30, 30, false),
        STORAGE_HUMIDITY("storage-humidity", "pct", 1, 100, false),
        STORAGE_LIFE("storage-life", "day", 0.1, 730, false),
        LIFE("life", "day", 0.1, 730, true),
        FREEZING_POINT("highest-freezing-point", "C", -30, 0, false),
        CHILLING_FLOOR("chilling-floor", "C", -5, 25, false),
        PERMISSIBLE_LOSS("permissible-loss", "pct", 0.1, 60, false),
        RESPIRATION_HEAT("respiration-heat", "W/t", 0.1, 5000, true);

        private final String word;
        private final String unit;
        private final double low;
        private final double high;
        private final boolean needsTemperature;

        Kind(String word, String unit, double low, double high, boolean needsTemperature) {
            this.word = word;
            this.unit = unit;
            this.low = low;
            this.high = high;
            this.needsTemperature = needsTemperature;
        }

        String unit() {
            return unit;
        }

        boolean accepts(double value) {
            return limits().hold(value);
        }

        Limits limits() {
            return new Limits(low, high);
        }

        String accepted() {
            return low + " to " + high + " " + unit;
        }

        private String form() {
            return needsTemperature ? word + "@10C" : word;
        }
    }

    /** Returns the fact of that name; empty where it is none that can be set. */
    static Optional<OwnName> of(String name) {
        Matcher at = AT.matcher(name);
        boolean hasTemperature = at.matches();
        String word = hasTemperature ? at.group(1) : name;
        OptionalDouble atC =
                hasTemperature
                        ? OptionalDouble.of(Double.parseDouble(at.group(2)))
                        : OptionalDouble.empty();
        return Arrays.stream(Kind.values())
                .filter(kind -> kind.word.equals(word) && kind.needsTemperature == hasTemperature)
                .findFirst()
                .filter(kind -> !hasTemperature || inReach(atC.orElseThrow()))
                .map(kind -> new OwnName(kind, atC));
    }

    /** Returns the figures a fact accepts, by its name without a temperature. */
    static Optional<Limits> limits(String word) {
        return Arrays.stream(Kind.values())
                .filter(kind -> kind.word.equals(word))
                .findFirst()
                .map(Kind::limits);
    }

    private static boolean inReach(double atC) {
        return atC >= COLDEST_C && atC <= HOTTEST_C;
    }

    /** Returns the names that can be set, for a message. */
    static String accepted() {
        return Arrays.stream(Kind.values()).map(Kind::form).collect(Collectors.joining(", "))
                + "; the temperature from "
                + COLDEST_C
                + " to "
                + HOTTEST_C
                + " C";
    }
}
