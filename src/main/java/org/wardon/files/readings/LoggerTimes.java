package org.wardon.files.readings;

import java.time.DateTimeException;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.wardon.files.json.Json;

/**
 * Times as loggers write them. Whether 03/04 is April or March is read from the file as a whole: a
 * 13 tells, else the order in which the days run; where neither tells, the file is refused.
 */
final class LoggerTimes {
    private static final Pattern FORM =
            Pattern.compile(
                    "(\\d{1,4})([-/.])(\\d{1,2})\\2(\\d{1,4})[T ,]+(\\d{1,2}):(\\d{2})(?::(\\d{2})"
                            + "(?:[.,]\\d+)?)?\\s*([AaPp][Mm])?\\s*(Z|[+-]\\d{2}:?\\d{2})?");
    private static final int LONG_YEAR = 1000;
    private static final int MONTHS = 12;

    /** The wrong order makes steps this many times longer. */
    private static final long FAR_LONGER = 8;

    /** Parts of one date. */
    private record Parts(int first, int second, int year, boolean yearFirst, long secondOfDay) {}

    private final List<Parts> all = new ArrayList<>();
    private final List<Integer> offsets = new ArrayList<>();
    private final List<Long> lines = new ArrayList<>();
    private boolean dotted;
    private String sample = "";
    private boolean assumed;
    private boolean dayFirst = true;

    /** Takes a time; tells a fault where it is none. */
    boolean add(String text, long line, LimitedFaults faults) {
        Matcher m = FORM.matcher(text);
        Optional<Parts> parts = m.matches() ? parts(m) : Optional.empty();
        if (parts.isEmpty()) {
            faults.add(
                    "line " + line + ", column time",
                    "is " + Json.quoted(text),
                    "accepted: a day and a time such as 2026-03-02T15:00 or 02.03.2026 15:00");
            return false;
        }
        sample = sample.isEmpty() && !parts.get().yearFirst() ? text : sample;
        dotted |= m.group(2).equals(".");
        all.add(parts.get());
        lines.add(line);
        offsets.add(offset(m.group(9)));
        return true;
    }

    private static Optional<Parts> parts(Matcher m) {
        int a = Integer.parseInt(m.group(1));
        int b = Integer.parseInt(m.group(3));
        int c = Integer.parseInt(m.group(4));
        boolean yearFirst = a >= LONG_YEAR;
        int hour = hour(Integer.parseInt(m.group(5)), m.group(8));
        int minute = Integer.parseInt(m.group(6));
        int second = m.group(7) == null ? 0 : Integer.parseInt(m.group(7));
        if (hour > 23 || minute > 59 || second > 59) {
            return Optional.empty();
        }
        long secondOfDay = hour * 3_600L + minute * 60L + second;
        int year = yearFirst ? a : c < 100 ? 2000 + c : c;
        return year < LONG_YEAR
                ? Optional.empty()
                : Optional.of(
                        new Parts(
                                yearFirst ? b : a,
                                yearFirst ? c : b,
                                year,
                                yearFirst,
                                secondOfDay));
    }

    private static int hour(int hour, String half) {
        if (half == null) {
            return hour;
        }
        int twelve = hour == 12 ? 0 : hour;
        return half.equalsIgnoreCase("pm") ? twelve + 12 : twelve;
    }

    /** Offset from UTC, s; the smallest number where none is written. */
    private static int offset(String text) {
        if (text == null) {
            return Integer.MIN_VALUE;
        }
        if (text.equals("Z")) {
            return 0;
        }
        String digits = text.substring(1).replace(":", "");
        int s =
                Integer.parseInt(digits.substring(0, 2)) * 3_600
                        + Integer.parseInt(digits.substring(2)) * 60;
        return text.charAt(0) == '-' ? -s : s;
    }

    /** Seconds of all times in the offset of the first; nothing where a fault was told. */
    LongList seconds(LimitedFaults faults) {
        if (!all.isEmpty() && !all.get(0).yearFirst() && !order(faults)) {
            return new LongList();
        }
        LongList seconds = new LongList();
        for (int i = 0; i < all.size(); i++) {
            Optional<Long> local = local(all.get(i), dayFirst);
            boolean offsetsMix =
                    (offsets.get(i) == Integer.MIN_VALUE) != (offsets.get(0) == Integer.MIN_VALUE);
            if (local.isEmpty() || offsetsMix) {
                faults.add(
                        "line " + lines.get(i) + ", column time",
                        offsetsMix
                                ? "some times carry an offset from UTC, some do not"
                                : "no day of the calendar",
                        offsetsMix
                                ? "accepted: all with an offset, or none"
                                : "accepted: a day and a time such as 2026-03-02T15:00");
                continue;
            }
            long shift = offsets.get(0) == Integer.MIN_VALUE ? 0 : offsets.get(0) - offsets.get(i);
            seconds.add(local.get() + shift);
        }
        return seconds;
    }

    private boolean order(LimitedFaults faults) {
        boolean day = all.stream().anyMatch(parts -> parts.first() > MONTHS);
        boolean month = all.stream().anyMatch(parts -> parts.second() > MONTHS);
        if (day || month || dotted) {
            dayFirst = day || !month;
            return true;
        }
        long byDay = longestStep(true);
        long byMonth = longestStep(false);
        assumed = true;
        if (byDay * FAR_LONGER < byMonth || byMonth * FAR_LONGER < byDay) {
            dayFirst = byDay < byMonth;
            return true;
        }
        faults.add(
                "line " + lines.get(0) + ", column time",
                Json.quoted(sample) + " may be day/month or month/day, and no other line tells",
                "accepted: the year first, such as 2026-03-02T15:00, or dots for day.month.year");
        return false;
    }

    private long longestStep(boolean byDay) {
        long longest = 0;
        for (int i = 1; i < all.size(); i++) {
            Optional<Long> a = local(all.get(i - 1), byDay);
            Optional<Long> b = local(all.get(i), byDay);
            if (a.isEmpty() || b.isEmpty()) {
                return Long.MAX_VALUE / (2 * FAR_LONGER);
            }
            longest = Math.max(longest, Math.abs(b.get() - a.get()));
        }
        return longest;
    }

    private static Optional<Long> local(Parts parts, boolean byDay) {
        boolean monthFirst = parts.yearFirst() || !byDay;
        int month = monthFirst ? parts.first() : parts.second();
        int day = monthFirst ? parts.second() : parts.first();
        try {
            LocalDateTime midnight = LocalDateTime.of(parts.year(), month, day, 0, 0);
            return Optional.of(Readings.seconds(midnight) + parts.secondOfDay());
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    /** Whether the order of day and month was read from how the days run. */
    boolean assumed() {
        return assumed;
    }

    boolean dayFirst() {
        return dayFirst;
    }

    /** Whether the offset from UTC changes on the way. */
    boolean offsetChanges() {
        return offsets.stream().distinct().count() > 1;
    }
}
