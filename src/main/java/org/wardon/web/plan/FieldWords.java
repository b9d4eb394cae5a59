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

/**
 * Words of the fields of a plan by their place. A place without words is told by its name and by
 * what the schema says of it, so that a new kind shows by itself.
 */
final class FieldWords {
    private final Properties bundle = new Properties();

    FieldWords() {
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
        return bundle.getProperty("hint." + key, otherwise);
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
