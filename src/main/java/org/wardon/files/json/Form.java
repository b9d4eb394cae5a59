package org.wardon.files.json;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.util.Optional;
import java.util.regex.Pattern;

/** Texts with a meaning of their own, named by {@code x-form} in the schema. */
final class Form {
    private static final Pattern OFFSET =
            Pattern.compile(".*T[0-9:.]+(Z|[+-][0-9]{2}:?[0-9]{2}|\\[.*\\])+$");

    private Form() {}

    /** Returns what is wrong with a text that should be of a form, if anything. */
    static Optional<String> trouble(String form, String text) {
        try {
            switch (form) {
                case "localDateTime" -> LocalDateTime.parse(text);
                case "localDate" -> LocalDate.parse(text);
                case "localTime" -> LocalTime.parse(text);
                case "zone" -> ZoneId.of(text);
                default -> throw new IllegalArgumentException("no form '" + form + "'");
            }
            return Optional.empty();
        } catch (DateTimeException e) {
            return Optional.of("is " + Json.quoted(text) + ", " + why(form));
        }
    }

    /** Returns what is wrong with a text that does not even look like the form. */
    static String misshapen(String form, String text) {
        boolean offset = form.equals("localDateTime") && OFFSET.matcher(text).matches();
        return "is " + Json.quoted(text) + (offset ? ", with a zone or offset" : "");
    }

    static String question(String form, String text) {
        return form.equals("zone") ? Nearest.question(text, ZoneId.getAvailableZoneIds()) : "";
    }

    private static String why(String form) {
        return switch (form) {
            case "zone" -> "no time zone known here";
            case "localTime" -> "no time of day";
            case "localDate" -> "no day of the calendar";
            default -> "no day and time of the calendar";
        };
    }
}
