package org.wardon.advice.wording;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.Reason;

/**
 * Turns codes into sentences. A sentence names subjects as {@code {s0}}, {@code {s1}}, arguments as
 * {@code {0}}, {@code {1}}, and an argument that is itself a code of a family as {@code
 * {family.0}}, whose words stand under {@code family.CODE}.
 */
public final class Words {
    /** Days left are not told beyond this. */
    private static final int MOST_DAYS = 730;

    private static final Pattern FAMILY = Pattern.compile("\\{([a-z-]+)\\.(\\d+)}");

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
        String text = families(text(reason.code()), reason.arguments());
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
        String low = capped(days.p10());
        String high = capped(days.p90());
        return low.equals(high)
                ? low + ("1".equals(low) ? " day" : " days")
                : low + " to " + high + " days (likely " + capped(days.p50()) + ")";
    }

    /**
     * Returns days left in few words, for a table whose head names the unit.
     *
     * @param days p10, p50 and p90, days
     * @return such as "5 to 12 (likely 8)"
     */
    public String span(Quantiles days) {
        String low = capped(days.p10());
        String high = capped(days.p90());
        return low.equals(high)
                ? low
                : low + " to " + high + " (likely " + capped(days.p50()) + ")";
    }

    /**
     * Returns whether a number of days stands at its cap and is told as "more than".
     *
     * @param days days left
     * @return true at the cap
     */
    public static boolean isCapped(double days) {
        return days >= MOST_DAYS;
    }

    private static String capped(double days) {
        return isCapped(days) ? "more than " + MOST_DAYS : Units.brief(days);
    }

    private String families(String text, List<Reason.Argument> arguments) {
        return FAMILY.matcher(text)
                .replaceAll(
                        match -> {
                            int argument = Integer.parseInt(match.group(2));
                            String code = arguments.get(argument).text();
                            return Matcher.quoteReplacement(text(match.group(1) + "." + code));
                        });
    }

    private static String fill(String text, String prefix, List<String> values) {
        String filled = text;
        for (int i = 0; i < values.size(); i++) {
            filled = filled.replace("{" + prefix + i + "}", values.get(i));
        }
        return filled;
    }
}
