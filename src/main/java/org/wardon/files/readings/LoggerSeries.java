package org.wardon.files.readings;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Puts readings in order and tells what it did: a clock set back, lines out of order, times that
 * come twice, spikes, a stuck sensor.
 */
final class LoggerSeries {
    private static final long HOUR_S = 3_600;

    /** A single reading this far from both neighbours, which agree, is a fault of the sensor. */
    private static final double SPIKE_K = 10;

    private static final double AGREE_K = 3;

    /** The same figure for longer asks for a look at the sensor. */
    private static final long STUCK_S = 24 * HOUR_S;

    private final List<Reason> notes = new ArrayList<>();
    private LongList at = new LongList();
    private DoubleList value = new DoubleList();
    private DoubleList humidity = new DoubleList();

    /**
     * Orders the readings.
     *
     * @param logged as the file has them
     */
    LoggerSeries(LoggerCsv.Logged logged) {
        notes.addAll(logged.notes());
        long[] times = clockSetBack(logged.times());
        List<Integer> order =
                IntStream.range(0, times.length)
                        .filter(i -> !Double.isNaN(logged.temperatureC().get(i)))
                        .boxed()
                        .sorted(Comparator.comparingLong(i -> times[i]))
                        .toList();
        int moved = 0;
        for (int i = 1; i < order.size(); i++) {
            moved += order.get(i) < order.get(i - 1) ? 1 : 0;
        }
        if (moved > 0) {
            notes.add(LoggerCsv.note("history-unordered"));
        }
        merge(order, times, logged);
        despike();
        stuck();
    }

    /** One step back by an hour less the usual step is a clock set back, and what follows later. */
    private long[] clockSetBack(LongList given) {
        long[] times = new long[given.size()];
        int back = -1;
        int steps = 0;
        for (int i = 0; i < times.length; i++) {
            times[i] = given.get(i);
            if (i > 0 && times[i] < times[i - 1]) {
                steps++;
                back = i;
            }
        }
        if (steps != 1 || back < 2) {
            return times;
        }
        long usual = times[back - 1] - times[back - 2];
        long after = times[back] + HOUR_S - times[back - 1];
        if (usual <= 0 || usual > HOUR_S || after != usual) {
            return times;
        }
        notes.add(
                LoggerCsv.note(
                        "history-clock-back",
                        Argument.text(Readings.local(times[back]).toString())));
        for (int i = back; i < times.length; i++) {
            times[i] += HOUR_S;
        }
        return times;
    }

    private void merge(List<Integer> order, long[] times, LoggerCsv.Logged logged) {
        int twice = 0;
        int i = 0;
        while (i < order.size()) {
            int first = order.get(i);
            double sum = 0;
            int n = 0;
            while (i < order.size() && times[order.get(i)] == times[first]) {
                sum += logged.temperatureC().get(order.get(i));
                n++;
                i++;
            }
            twice += n - 1;
            at.add(times[first]);
            value.add(n == 1 ? logged.temperatureC().get(first) : sum / n);
            humidity.add(logged.humidityPct().get(first));
        }
        if (twice > 0) {
            notes.add(LoggerCsv.note("history-twice", Argument.of(twice, "1")));
        }
    }

    private void despike() {
        LongList times = new LongList();
        DoubleList kept = new DoubleList();
        DoubleList damp = new DoubleList();
        int spikes = 0;
        for (int i = 0; i < at.size(); i++) {
            if (spike(i)) {
                spikes++;
                continue;
            }
            times.add(at.get(i));
            kept.add(value.get(i));
            damp.add(humidity.get(i));
        }
        if (spikes > 0) {
            notes.add(LoggerCsv.note("history-spikes", Argument.of(spikes, "1")));
        }
        at = times;
        value = kept;
        humidity = damp;
    }

    private boolean spike(int i) {
        if (i == 0 || i == at.size() - 1) {
            return false;
        }
        double before = value.get(i) - value.get(i - 1);
        double after = value.get(i) - value.get(i + 1);
        return Math.min(Math.abs(before), Math.abs(after)) > SPIKE_K
                && before * after > 0
                && Math.abs(before - after) < AGREE_K
                && at.get(i + 1) - at.get(i - 1) <= 2 * HOUR_S;
    }

    private void stuck() {
        int from = 0;
        for (int i = 1; i <= at.size(); i++) {
            if (i < at.size() && value.get(i) == value.get(from)) {
                continue;
            }
            long span = at.get(i - 1) - at.get(from);
            if (span > STUCK_S && i - from > 3) {
                notes.add(
                        LoggerCsv.note(
                                "history-stuck",
                                Argument.of(value.get(from), "C"),
                                Argument.of(span / (double) HOUR_S, "h"),
                                Argument.text(Readings.local(at.get(from)).toString())));
            }
            from = i;
        }
    }

    LongList at() {
        return at;
    }

    DoubleList temperatureC() {
        return value;
    }

    DoubleList humidityPct() {
        return humidity;
    }

    List<Reason> notes() {
        return notes;
    }
}
