package org.wardon.web.pages;

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

/** Words of the pages themselves, by key; {@code {0}} and {@code {1}} are filled. */
public final class PageWords {
    private final Properties bundle;

    private PageWords(Properties bundle) {
        this.bundle = bundle;
    }

    /**
     * Returns English words.
     *
     * @return the words
     */
    public static PageWords english() {
        Properties bundle = new Properties();
        String name = "/org/wardon/web/pages.properties";
        try (InputStream in =
                        Objects.requireNonNull(PageWords.class.getResourceAsStream(name), name);
                Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
            bundle.load(reader);
        } catch (IOException e) {
            throw new UncheckedIOException("the words shipped with the program cannot be read", e);
        }
        return new PageWords(bundle);
    }

    /**
     * Returns the words of a key.
     *
     * @param key a key of the bundle
     * @param with what fills {@code {0}}, {@code {1}} and so on
     * @return the words
     * @throws IllegalArgumentException when there are none
     */
    public String say(String key, String... with) {
        String text = bundle.getProperty(key);
        if (text == null) {
            throw new IllegalArgumentException(
                    "no words for '" + key + "'; add the key to pages.properties");
        }
        List<String> values = List.of(with);
        for (int i = 0; i < values.size(); i++) {
            text = text.replace("{" + i + "}", values.get(i));
        }
        return text;
    }

    /**
     * Returns whether there are words for a key.
     *
     * @param key a key
     * @return true if so
     */
    public boolean has(String key) {
        return bundle.containsKey(key);
    }

    /**
     * Returns the keys there are words for.
     *
     * @return sorted
     */
    public Set<String> keys() {
        return new TreeSet<>(bundle.stringPropertyNames());
    }
}
