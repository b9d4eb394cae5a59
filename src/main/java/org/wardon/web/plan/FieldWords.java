package org.wardon.web.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Objects;
import java.util.Properties;
import java.util.function.DoubleFunction;
import java.util.function.UnaryOperator;
import java.util.regex.Pattern;
import org.wardon.web.pages.Figures;

/**
 * Words of the fields of a plan by their place. A place without words is told by its name and by
 * what the schema says of it, so that a new kind shows by itself.
 */
final class FieldWords {
    private static final Pattern CELSIUS = Pattern.compile("(-?\\d+(?:\\.\\d+)?) °C");
    private static final Pattern PER_KG = Pattern.compile("(\\d+(?:\\.\\d+)?) per kg\\b");
    private static final Pattern KILOGRAMS = Pattern.compile("(\\d+(?:\\.\\d+)?) kg\\b");

    private final Properties bundle;
    private final UnaryOperator<String> told;

    private FieldWords(Properties bundle, UnaryOperator<String> told) {
        this.bundle = bundle;
        this.told = told;
    }

    FieldWords() {
        this(new Properties(), UnaryOperator.identity());
        String name = "/org/wardon/web/plan-fields.properties";
        try (InputStream in =
                        Objects.requireNonNull(FieldWords.class.getResourceAsStream(name), name);
                Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
            bundle.load(reader);
        } catch (IOException e) {
            throw new UncheckedIOException("the words shipped with the program cannot be read", e);
        }
    }

    /**
     * Returns what a place is called.
     *
     * @param key place such as {@code chambers.door.widthM}
     * @return its label; its name in words where there is none
     */
    String label(String key) {
        String label = bundle.getProperty("label." + key);
        return label == null ? spoken(key.substring(key.lastIndexOf('.') + 1)) : label;
    }

    String hint(String key, String otherwise) {
        return told.apply(bundle.getProperty("hint." + key, otherwise));
    }

    /** The same words, figures in hints written as a person likes them. */
    FieldWords in(Figures figures) {
        return new FieldWords(bundle, hint -> figures.text(converted(hint, figures)));
    }

    private static String converted(String hint, Figures figures) {
        String shown = hint;
        if (!figures.temperatureUnit().equals("°C")) {
            shown = each(CELSIUS, shown, figures::temperature);
        }
        if (figures.massUnit().equals("kg")) {
            return shown;
        }
        shown = each(KILOGRAMS, shown, figures::mass);
        return each(PER_KG, shown, price -> figures.typedPrice(price) + " per lb");
    }

    private static String each(Pattern figure, String text, DoubleFunction<String> shown) {
        return figure.matcher(text)
                .replaceAll(found -> shown.apply(Double.parseDouble(found.group(1))));
    }

    /** A word of a list of words. */
    String word(String word) {
        return bundle.getProperty("word." + word, word.replace('-', ' '));
    }

    boolean has(String key) {
        return bundle.containsKey(key);
    }

    private static String spoken(String name) {
        String words = name.replaceAll("(?<=[a-z])(?=[A-Z])", " ").replace('-', ' ');
        return words.isEmpty()
                ? words
                : words.substring(0, 1).toUpperCase(Locale.ROOT)
                        + words.substring(1).toLowerCase(Locale.ROOT);
    }
}
