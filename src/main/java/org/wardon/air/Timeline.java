package org.wardon.air;

import java.time.Duration;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;

/**
 * The calendar of a run. Inside a run time is seconds since {@code from}; the UTC offset in force
 * at {@code from} is kept throughout, so no hour is repeated or lost.
 */
public final class Timeline {
    /** Seconds of a day. */
    public static final double DAY_S = 86_400;

    /** Seconds of an hour. */
    public static final double HOUR_S = 3_600;

    private final LocalDateTime from;
    private final ZoneOffset offset;

    /**
     * Starts the clock.
     *
     * @param from local time of second 0
     * @param zone zone of the plan
     */
    public Timeline(LocalDateTime from, ZoneId zone) {
        this.from = from;
        this.offset = zone.getRules().getOffset(from);
    }

    /**
     * Returns the start.
     *
     * @return local time of second 0
     */
    public LocalDateTime from() {
        return from;
    }

    /**
     * Returns the offset kept through the run.
     *
     * @return offset from UTC
     */
    public ZoneOffset offset() {
        return offset;
    }

    /**
     * Returns seconds since the start.
     *
     * @param local local time
     * @return s, negative before the start
     */
    public double secondsAt(LocalDateTime local) {
        Duration since = Duration.between(from, local);
        return since.getSeconds() + since.getNano() * 1e-9;
    }

    /**
     * Returns the local time.
     *
     * @param seconds seconds since the start
     * @return local time, to the second
     */
    public LocalDateTime localAt(double seconds) {
        return from.plusSeconds(Math.round(seconds));
    }

    /**
     * Returns the second of the local day.
     *
     * @param seconds seconds since the start
     * @return s, 0 to 86 400
     */
    public double secondOfDay(double seconds) {
        double s = (from.toLocalTime().toSecondOfDay() + seconds) % DAY_S;
        return s < 0 ? s + DAY_S : s;
    }

    /**
     * Returns the day of the year.
     *
     * @param seconds seconds since the start
     * @return 1 to 366
     */
    public int dayOfYear(double seconds) {
        return localAt(Math.floor(seconds)).getDayOfYear();
    }
}
