package org.wardon.advice.wording;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.Reason;

/**
 * Turns codes into sentences. A sentence names subjects as {@code {s0}}, {@code {s1}} or {@code
 * {s*}} for all, and arguments as {@code {0}}, {@code {1}}.
 */
public final class Words {
    /** Days left are not told beyond this. */
    private static final int MOST_DAYS = 730;

    private final Properties bundle;
    private final Units units;

    private Words(Properties bundle, Units units) {
        this.bundle = bundle;
        this.units = units;
    }

    /**
     * Returns English words.
     *
     * @param units the units a person reads
     * @return the words
     */
    public static Words english(Units units) {
        Properties bundle = new Properties();
        try (InputStream in =
                        Objects.requireNonNull(
                                Words.class.getResourceAsStream("words.properties"),
                                "words.properties");
                Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
            bundle.load(reader);
        } catch (IOException e) {
            throw new UncheckedIOException("the words shipped with the program cannot be read", e);
        }
        return new Words(bundle, units);
    }

    /**
     * Returns the units in use.
     *
     * @return units
     */
    public Units units() {
        return units;
    }

    /**
     * Returns the codes there are sentences for.
     *
     * @return keys of the bundle, sorted
     */
    public Set<String> codes() {
        return new TreeSet<>(bundle.stringPropertyNames());
    }

    /**
     * Returns the sentence of a reason.
     *
     * @param reason code, subjects, arguments
     * @return a sentence without its source
     * @throws IllegalArgumentException when no sentence stands for the code
     */
    public String sentence(Reason reason) {
        String text = text(reason.code());
        text = text.replace("{s*}", String.join(", ", reason.subjects()));
        text = fill(text, "s", reason.subjects());
        List<String> figures =
                reason.arguments().stream()
                        .map(
                                a ->
                                        "text".equals(a.unit())
                                                ? a.text()
                                                : units.figure(a.value(), a.unit()))
                        .toList();
        return fill(text, "", figures);
    }

    /**
     * Returns the text of a key.
     *
     * @param key a key of the bundle
     * @return its text
     * @throws IllegalArgumentException when there is none
     */
    public String text(String key) {
        String text = bundle.getProperty(key);
        if (text == null) {
            throw new IllegalArgumentException(
                    "no words for '" + key + "'; add the key to words.properties");
        }
        return text;
    }

    /**
     * Returns days left as a person reads them.
     *
     * @param days p10, p50 and p90, days
     * @return such as "5 to 12 days (likely 8)"; "more than" where a figure stands at its cap
     */
    public String range(Quantiles days) {
        if (days.p10() >= MOST_DAYS) {
            return "more than " + MOST_DAYS + " days";
        }
        String high = days.p90() >= MOST_DAYS ? "more than " + MOST_DAYS : number(days.p90());
        String low = number(days.p10());
        if (low.equals(high)) {
            return low + ("1".equals(low) ? " day" : " days");
        }
        String middle = days.p50() >= MOST_DAYS ? "more than " + MOST_DAYS : number(days.p50());
        return low + " to " + high + " days (likely " + middle + ")";
    }

    private static String number(double days) {
        if (Math.abs(days) < 9.95) {
            String text = String.format(Locale.ROOT, "%.1f", days);
            return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
        }
        return String.format(Locale.ROOT, "%.0f", days);
    }

    private static String fill(String text, String prefix, List<String> values) {
        String filled = text;
        for (int i = 0; i < values.size(); i++) {
            filled = filled.replace("{" + prefix + i + "}", values.get(i));
        }
        return filled;
    }
}
