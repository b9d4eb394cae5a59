package org.wardon.files.json;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A JSON value. Numbers keep their text, objects the order of their names. */
public sealed interface Json {
    /**
     * An object.
     *
     * @param members its values by name, in the order of the text
     */
    record Obj(Map<String, Json> members) implements Json {
        /** Copies the map, keeping its order. */
        public Obj {
            members = Collections.unmodifiableMap(new LinkedHashMap<>(members));
        }
    }

    /**
     * A list.
     *
     * @param items its values
     */
    record Arr(List<Json> items) implements Json {
        /** Copies the list. */
        public Arr {
            items = List.copyOf(items);
        }
    }

    /**
     * A text.
     *
     * @param value the text
     */
    record Text(String value) implements Json {}

    /**
     * A number.
     *
     * @param written as it was written
     */
    record Num(String written) implements Json {
        /**
         * Returns the nearest double.
         *
         * @return the number, infinite where it is too large
         */
        public double value() {
            return Double.parseDouble(written);
        }
    }

    /**
     * True or false.
     *
     * @param value which
     */
    record Flag(boolean value) implements Json {}

    /** Null. */
    record Null() implements Json {}

    /** Longest text shown in a message. */
    int SHOWN = 60;

    /**
     * Returns the value as a message shows it.
     *
     * @return a short text, such as {@code 'mango'}, {@code 12} or {@code a list}
     */
    default String shown() {
        if (this instanceof Text text) {
            return quoted(text.value());
        }
        if (this instanceof Num num) {
            return cut(num.written());
        }
        if (this instanceof Flag flag) {
            return String.valueOf(flag.value());
        }
        if (this instanceof Null) {
            return "null";
        }
        return this instanceof Arr ? "a list" : "an object";
    }

    /**
     * Returns a text as a message shows it.
     *
     * @param text any text
     * @return in single quotes, on one line, cut where long
     */
    static String quoted(String text) {
        StringBuilder plain = new StringBuilder();
        for (char c : cut(text).toCharArray()) {
            plain.append(Character.isISOControl(c) ? '?' : c);
        }
        return "'" + plain + "'";
    }

    /**
     * Returns the path of a member.
     *
     * @param path path of the object
     * @param name name of the member
     * @return such as {@code $.site.zone}
     */
    static String member(String path, String name) {
        return plain(name) ? path + "." + name : path + "[" + quoted(name) + "]";
    }

    /** A letter or low line, then letters, digits, low lines and hyphens; asked for every name. */
    private static boolean plain(String name) {
        for (int i = 0; i < name.length(); i++) {
            char c = name.charAt(i);
            boolean letter = c == '_' || (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z');
            boolean later = c == '-' || (c >= '0' && c <= '9');
            if (!letter && (i == 0 || !later)) {
                return false;
            }
        }
        return !name.isEmpty();
    }

    private static String cut(String text) {
        return text.length() <= SHOWN ? text : text.substring(0, SHOWN) + "...";
    }
}
