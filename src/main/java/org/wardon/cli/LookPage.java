package org.wardon.cli;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.files.forecast.WrittenNumber;
import org.wardon.produce.Commodity;
import org.wardon.produce.NamedFact;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** What print says of a commodity, for a person. */
final class LookPage {
    private static final Pattern AT =
            Pattern.compile("(.+)@(-?\\d+(?:\\.\\d+)?)(?:-(-?\\d+(?:\\.\\d+)?))?C");

    /** What an exposure to cold tells; its note repeats the word. */
    private static final Map<String, String> EXPOSURE =
            Map.of("onset", "until first injury", "by", "injured by then", "safe", "no injury yet");

    private static final Pattern KIND = Pattern.compile("^kind=[a-z]+(?:; |$)");
    private static final String NOTE_INDENT = "      ";

    private final ReferenceBook book;
    private final boolean fahrenheit;

    LookPage(ReferenceBook book, boolean fahrenheit) {
        this.book = book;
        this.fahrenheit = fahrenheit;
    }

    String of(Commodity commodity, List<NamedFact> facts) {
        StringBuilder page = new StringBuilder();
        page.append(
                Paragraph.hanging(
                        "", String.join(", ", commodity.names()) + " [" + commodity.id() + "]"));
        Map<String, String> variants = Variants.of(commodity);
        if (!variants.isEmpty()) {
            page.append(
                    Paragraph.hanging(
                            "",
                            "Variants with rows of their own (keep --variant): "
                                    + String.join(", ", variants.keySet())));
        }
        page.append('\n');
        Set<String> sources = new LinkedHashSet<>();
        for (NamedFact fact : facts) {
            page.append(entry(fact));
            sources.addAll(List.of(fact.sourceId().split(";", -1)));
        }
        page.append("\nSources\n");
        for (String id : sources) {
            page.append(Paragraph.hanging("  ", id + ": " + book.source(id).citation()));
        }
        return page.toString();
    }

    private String entry(NamedFact fact) {
        String told =
                name(fact.name())
                        + ": "
                        + value(fact)
                        + " ["
                        + (fact.own() ? "own" : fact.sourceId() + ", " + fact.evidence().word())
                        + "]";
        String note = KIND.matcher(fact.note()).replaceFirst("");
        return Paragraph.hanging("  ", told)
                + (note.isBlank() ? "" : Paragraph.hanging(NOTE_INDENT, note));
    }

    private String name(String name) {
        Matcher at = AT.matcher(name);
        if (!at.matches()) {
            return name.replace('-', ' ');
        }
        String low = temperature(Double.parseDouble(at.group(2)));
        String high =
                at.group(3) == null ? "" : " to " + temperature(Double.parseDouble(at.group(3)));
        return at.group(1).replace('-', ' ') + " at " + low + high + sign("C");
    }

    private String value(NamedFact fact) {
        String range = range(fact);
        if (range.isEmpty()) {
            return fact.text();
        }
        String exposure = EXPOSURE.get(fact.text());
        return range + sign(fact, range) + (exposure == null ? "" : ", " + exposure);
    }

    private String sign(NamedFact fact, String range) {
        return "day".equals(fact.unit()) && "1".equals(range) ? " day" : sign(fact.unit());
    }

    /** The unit as a person writes it. */
    private String sign(String unit) {
        return switch (unit) {
            case "C" -> fahrenheit ? " °F" : " °C";
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
        return "C".equals(unit) ? temperature(value) : WrittenNumber.text(value);
    }

    /** A printed temperature; in °F to a tenth, finer than any source reads. */
    private String temperature(double temperatureC) {
        return fahrenheit
                ? WrittenNumber.text(Math.rint(10 * (1.8 * temperatureC + 32)) / 10)
                : WrittenNumber.text(temperatureC);
    }
}
