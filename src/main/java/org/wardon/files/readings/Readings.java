package org.wardon.files.readings;

import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.Map;

/**
 * Readings in order of time.
 *
 * @param times local times, rising
 * @param lines line of each reading in its file
 * @param values values by column and reading; NaN where a cell is empty
 */
record Readings(LongList times, LongList lines, Map<String, DoubleList> values) {
    static long seconds(LocalDateTime local) {
        return local.toEpochSecond(ZoneOffset.UTC);
    }

    static LocalDateTime local(long seconds) {
        return LocalDateTime.ofEpochSecond(seconds, 0, ZoneOffset.UTC);
    }

    int size() {
        return times.size();
    }

    LocalDateTime time(int i) {
        return local(times.get(i));
    }

    boolean has(String column) {
        return values.containsKey(column);
    }

    /** Returns the usual distance of readings: the median, s. */
    long usualStepS() {
        long[] steps = new long[size() - 1];
        for (int i = 1; i < size(); i++) {
            steps[i - 1] = times.get(i) - times.get(i - 1);
        }
        java.util.Arrays.sort(steps);
        return steps.length == 0 ? 0 : steps[steps.length / 2];
    }

    /** Returns the readings whose cell in a column is not empty. */
    Track track(String column) {
        DoubleList all = values.get(column);
        LongList at = new LongList();
        LongList line = new LongList();
        DoubleList value = new DoubleList();
        for (int i = 0; i < size(); i++) {
            if (all != null && !Double.isNaN(all.get(i))) {
                at.add(times.get(i));
                line.add(lines.get(i));
                value.add(all.get(i));
            }
        }
        return new Track(at, line, value);
    }
}
