package org.wardon.files;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.Optional;
import org.wardon.files.json.Part;

/** Reads times that may be missing or wrong. */
final class Times {
    private static final double DAY_S = 86_400;

    private Times() {}

    static Optional<LocalDateTime> at(Part part) {
        try {
            return part.text().map(LocalDateTime::parse);
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    static Optional<LocalDate> dayAt(Part part) {
        try {
            return part.text().map(LocalDate::parse);
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    static LocalDateTime plusDays(LocalDateTime time, double days) {
        return time.plusSeconds(Math.round(days * DAY_S));
    }

    static LocalDateTime plusHours(LocalDateTime time, double hours) {
        return plusDays(time, hours / 24);
    }

    /** Returns the end of the run, where start and length are given and the length is one. */
    static Optional<LocalDateTime> end(Part plan) {
        Optional<LocalDateTime> from = at(plan.at("from"));
        double days = plan.at("days").number().orElse(0);
        return days > 0 ? from.map(time -> plusDays(time, days)) : Optional.empty();
    }
}
