package org.wardon.advice.wording;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.files.forecast.WrittenNumber;
import org.wardon.produce.NamedFact;

/** Names and figures of facts as a person reads them. */
public final class FactWords {
    private static final Pattern AT =
            Pattern.compile("(.+)@(-?\\d+(?:\\.\\d+)?)(?:-(-?\\d+(?:\\.\\d+)?))?C");

    /** What an exposure to cold tells; its note repeats the word. */
    private static final Map<String, String> EXPOSURE =
            Map.of("onset", "until first injury", "by", "injured by then", "safe", "no injury yet");

    private static final Pattern KIND = Pattern.compile("^kind=[a-z]+(?:; |$)");

    private final boolean fahrenheit;
    private final boolean pounds;

    /**
     * Prepares.
     *
     * @param units the units a person reads
     */
    public FactWords(Units units) {
        fahrenheit = units.fahrenheit();
        pounds = units.pounds();
    }

    /**
     * Returns what a fact is, in words.
     *
     * @param name its stable name, such as {@code life@13C}
     * @return such as "life at 13 °C"
     */
    public String name(String name) {
        Matcher at = AT.matcher(name);
        if (!at.matches()) {
            return name.replace('-', ' ');
        }
        String low = temperature(Double.parseDouble(at.group(2)));
        String high =
                at.group(3) == null ? "" : " to " + temperature(Double.parseDouble(at.group(3)));
        return at.group(1).replace('-', ' ') + " at " + low + high + sign("C");
    }

    /**
     * Returns what a fact comes to.
     *
     * @param fact the fact
     * @return its range with its unit, or its word
     */
    public String value(NamedFact fact) {
        String range = range(fact);
        if (range.isEmpty()) {
            return fact.text();
        }
        String exposure = EXPOSURE.get(fact.text());
        return range + sign(fact, range) + (exposure == null ? "" : ", " + exposure);
    }

    /**
     * Returns the note of a fact without what its value says already.
     *
     * @param fact the fact
     * @return the note, may be empty
     */
    public String note(NamedFact fact) {
        return KIND.matcher(fact.note()).replaceFirst("");
    }

    private String sign(NamedFact fact, String range) {
        return "day".equals(fact.unit()) && "1".equals(range) ? " day" : sign(fact.unit());
    }

    /** The unit as a person writes it. */
    private String sign(String unit) {
        return switch (unit) {
            case "C" -> fahrenheit ? " °F" : " °C";
            case "kg" -> pounds ? " lb" : " kg";
            case "pct" -> " %";
            case "day" -> " days";
            case "1", "" -> "";
            default -> " " + unit.replace("uL", "µL").replace("ug", "µg");
        };
    }

    private String range(NamedFact fact) {
        OptionalDouble low = fact.low();
        OptionalDouble high = fact.high();
        if (low.isEmpty() && high.isEmpty()) {
            return "";
        }
        if (low.isEmpty()) {
            return "up to " + figure(high.getAsDouble(), fact.unit());
        }
        if (high.isEmpty()) {
            return "from " + figure(low.getAsDouble(), fact.unit());
        }
        String from = figure(low.getAsDouble(), fact.unit());
        String to = figure(high.getAsDouble(), fact.unit());
        return from.equals(to) ? from : from + " to " + to;
    }

    private String figure(double value, String unit) {
        return switch (unit) {
            case "C" -> temperature(value);
            case "kg" -> mass(value);
            default -> WrittenNumber.text(value);
        };
    }

    /** A printed mass of one item; in lb to a thousandth, half a gram. */
    private String mass(double massKg) {
        return pounds
                ? WrittenNumber.text(Math.rint(1_000 * massKg / Units.KG_PER_LB) / 1_000)
                : WrittenNumber.text(massKg);
    }

    /** A printed temperature; in °F to a tenth, finer than any source reads. */
    private String temperature(double temperatureC) {
        return fahrenheit
                ? WrittenNumber.text(Math.rint(10 * (1.8 * temperatureC + 32)) / 10)
                : WrittenNumber.text(temperatureC);
    }
}
