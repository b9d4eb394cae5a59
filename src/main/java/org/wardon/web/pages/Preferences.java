package org.wardon.web.pages;

import java.util.List;
import java.util.Locale;
import org.wardon.advice.wording.Units;

/**
 * How a person likes to read: kept in a cookie, one word a choice.
 *
 * @param fahrenheit whether temperatures are told in °F
 * @param pounds whether masses are told in lb
 * @param decimalComma whether numbers have a comma as decimal mark
 * @param light whether pages are light, dark, or as the machine is set
 */
public record Preferences(boolean fahrenheit, boolean pounds, boolean decimalComma, Light light) {
    /** Name of the cookie. */
    public static final String COOKIE = "wardon-preferences";

    /** What is taken where nobody chose. */
    public static final Preferences USUAL = new Preferences(false, false, false, Light.AUTO);

    private static final int LONGEST = 40;

    /** Light or dark pages. */
    public enum Light {
        /** As the machine is set. */
        AUTO,
        /** Light. */
        LIGHT,
        /** Dark. */
        DARK;

        /**
         * Returns its word.
         *
         * @return in lower case
         */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }

        static Light of(String word) {
            for (Light light : values()) {
                if (light.word().equals(word)) {
                    return light;
                }
            }
            return AUTO;
        }
    }

    /**
     * Returns the cookie's value.
     *
     * @return such as {@code c.kg.point.auto}
     */
    public String cookie() {
        return String.join(
                ".",
                fahrenheit ? "f" : "c",
                pounds ? "lb" : "kg",
                decimalComma ? "comma" : "point",
                light.word());
    }

    /**
     * Reads a cookie; what is not understood is as usual.
     *
     * @param cookie its value, perhaps made up by somebody
     * @return the preferences
     */
    public static Preferences of(String cookie) {
        List<String> words =
                cookie.length() > LONGEST ? List.of() : List.of(cookie.split("\\.", -1));
        return new Preferences(
                words.contains("f"),
                words.contains("lb"),
                words.contains("comma"),
                Light.of(words.isEmpty() ? "" : words.get(words.size() - 1)));
    }

    /**
     * Returns the units.
     *
     * @return units of sentences and figures
     */
    public Units units() {
        return new Units(fahrenheit, pounds);
    }
}
