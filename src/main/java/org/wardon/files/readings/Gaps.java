package org.wardon.files.readings;

import java.util.ArrayList;
import java.util.List;
import org.wardon.plan.FilledGap;

/**
 * Finds where readings are missing. A gap is the time for which readings are missing: the distance
 * of two readings less the usual one. Up to three hours are filled by a straight line, at the ends
 * by holding the nearest reading, and told; longer ones are refused.
 */
final class Gaps {
    static final long LONGEST_S = 3 * 3_600;

    private static final long HOUR_S = 3_600;
    private static final String ACCEPTED = "accepted: gaps of up to 3 h";

    private final Readings readings;
    private final long fromS;
    private final long toS;
    private final LimitedFaults faults;
    private final long medianS;
    private final long usualS;
    private final List<FilledGap> filled = new ArrayList<>();

    Gaps(Readings readings, long fromS, long toS, LimitedFaults faults) {
        this.readings = readings;
        this.fromS = fromS;
        this.toS = toS;
        this.faults = faults;
        this.medianS = readings.usualStepS();
        this.usualS = Math.min(medianS, HOUR_S);
    }

    /** Returns the gaps that may be filled, in order of column and time. */
    List<FilledGap> find(List<String> columns) {
        if (medianS > LONGEST_S) {
            faults.add(
                    "column time",
                    "the readings are usually " + hours(medianS) + " apart",
                    "accepted: readings at most 3 h apart");
            return filled;
        }
        if (!covered()) {
            return filled;
        }
        between("time", readings.times(), readings.lines(), false);
        for (String column : columns) {
            Track track = readings.track(column);
            edges(column, track);
            between(column, track.at(), track.line(), true);
        }
        return filled;
    }

    private boolean covered() {
        long first = readings.times().get(0);
        long last = readings.times().get(readings.size() - 1);
        String wanted =
                "accepted: readings from " + Readings.local(fromS) + " to " + Readings.local(toS);
        if (first - fromS > usualS + LONGEST_S) {
            faults.add(
                    "line " + readings.lines().get(0),
                    "the readings begin at " + Readings.local(first) + ", after the plan",
                    wanted);
            return false;
        }
        if (toS - last > usualS + LONGEST_S) {
            faults.add(
                    "line " + readings.lines().get(readings.size() - 1),
                    "the readings end at " + Readings.local(last) + ", before the plan",
                    wanted);
            return false;
        }
        edge("time", fromS, first);
        edge("time", last, toS);
        return true;
    }

    private void edge(String column, long a, long b) {
        if (b - a > usualS) {
            filled.add(new FilledGap(Readings.local(a), Readings.local(b), column));
        }
    }

    private void edges(String column, Track track) {
        long first = track.size() == 0 ? toS : track.at().get(0);
        long last = track.size() == 0 ? fromS : track.at().get(track.size() - 1);
        long start = Math.max(fromS, readings.times().get(0));
        long end = Math.min(toS, readings.times().get(readings.size() - 1));
        tooLong(column, start, first, readings.lines().get(0));
        if (track.size() > 0) {
            tooLong(column, last, end, readings.lines().get(readings.size() - 1));
        }
    }

    private void tooLong(String column, long a, long b, long line) {
        if (b - a > usualS + LONGEST_S) {
            faults.add(
                    "line " + line + ", column " + column,
                    "no reading from " + Readings.local(a) + " to " + Readings.local(b),
                    ACCEPTED);
        } else {
            edge(column, a, b);
        }
    }

    private void between(String column, LongList at, LongList line, boolean emptyCells) {
        for (int i = 1; i < at.size(); i++) {
            long a = at.get(i - 1);
            long b = at.get(i);
            boolean missing = 2 * (b - a) > 3 * medianS && b - a > HOUR_S;
            // Where whole lines are missing the columns have nothing to add.
            boolean own = !emptyCells || line.get(i) - line.get(i - 1) > 1;
            if (missing && own && b > fromS && a < toS) {
                gap(column, a, b, line.get(i));
            }
        }
    }

    private void gap(String column, long a, long b, long line) {
        if (b - a > usualS + LONGEST_S) {
            faults.add(
                    "line " + line + (column.equals("time") ? "" : ", column " + column),
                    "no reading between " + Readings.local(a) + " and " + Readings.local(b),
                    ACCEPTED);
        } else {
            filled.add(new FilledGap(Readings.local(a), Readings.local(b), column));
        }
    }

    private static String hours(long seconds) {
        long tenths = Math.round(seconds / 360.0);
        return tenths / 10 + (tenths % 10 == 0 ? "" : "." + tenths % 10) + " h";
    }
}
