package org.wardon.plan;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * The same hours without power every day, over midnight where they end earlier than they start.
 *
 * @param from local time the power fails
 * @param to local time it comes back, not equal to {@code from}
 * @param fromDate first day on which it fails; absent: from the first
 * @param toDate last day on which it fails; absent: for good
 */
public record DailyOutage(
        LocalTime from, LocalTime to, Optional<LocalDate> fromDate, Optional<LocalDate> toDate) {
    /** Checks the order. */
    public DailyOutage {
        Require.that(
                !from.equals(to), "outages.daily runs from " + from + " to the same time of day");
        Require.that(
                fromDate.isEmpty() || toDate.isEmpty() || !toDate.get().isBefore(fromDate.get()),
                "outages.toDate " + toDate + " is before fromDate " + fromDate);
    }

    /**
     * Returns how long each is.
     *
     * @return h, above 0 and below 24
     */
    public double hours() {
        double seconds = to.toSecondOfDay() - from.toSecondOfDay();
        return (seconds > 0 ? seconds : seconds + 86_400) / 3_600;
    }

    /**
     * Returns the outages of a span of time.
     *
     * @param start its start; an outage that began the day before is in
     * @param end its end
     * @return in order, each overlapping the span
     */
    public List<OutagePlan> within(LocalDateTime start, LocalDateTime end) {
        List<OutagePlan> outages = new ArrayList<>();
        LocalDate day = start.toLocalDate().minusDays(1);
        for (; !day.isAfter(end.toLocalDate()); day = day.plusDays(1)) {
            boolean before = fromDate.isPresent() && day.isBefore(fromDate.get());
            boolean after = toDate.isPresent() && day.isAfter(toDate.get());
            OutagePlan outage = new OutagePlan(day.atTime(from), hours());
            if (!before && !after && outage.to().isAfter(start) && outage.from().isBefore(end)) {
                outages.add(outage);
            }
        }
        return outages;
    }
}
