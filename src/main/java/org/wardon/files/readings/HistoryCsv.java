package org.wardon.files.readings;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.BadInput;
import org.wardon.files.json.Faults;
import org.wardon.lots.LotHistory;
import org.wardon.plan.FilledGap;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Reads the logged history of a lot, at any steps: columns {@code time,temperatureC} or {@code
 * temperatureF} and, where known, {@code humidityPct}, or whatever the logger calls them.
 */
public final class HistoryCsv {
    private static final double HOUR_S = 3_600;

    /** Beside a gap the bounds leave and meet the readings within this time, s. */
    private static final double EDGE_S = 60;

    /** More readings than these are taken in means of short spans. */
    private static final int MOST_SAMPLES = 3_000;

    private final double humidityFraction;
    private final double ethylenePpm;
    private final LoggerSeries series;
    private final Track humidity;
    private final long startS;
    private final double spanS;

    private HistoryCsv(LoggerSeries series, double humidityFraction, double ethylenePpm) {
        this.series = series;
        this.humidityFraction = humidityFraction;
        this.ethylenePpm = ethylenePpm;
        startS = series.at().get(0);
        humidity = humidity(series);
        int n = series.at().size();
        long wholeS = series.at().get(n - 1) - startS;
        spanS = n > MOST_SAMPLES ? wholeS / (double) MOST_SAMPLES : 0;
    }

    /**
     * Reads a history.
     *
     * @param file the file
     * @param shown its name in messages
     * @param humidityFraction humidity at the fruit where the file gives none, 0 to 1
     * @param ethylenePpm ethylene around the lot, µL/L
     * @return the history, its gaps and what was assumed
     * @throws BadInput with every fault
     */
    public static LoggedHistory read(
            Path file, String shown, double humidityFraction, double ethylenePpm) {
        Faults faults = new Faults(shown);
        Optional<LoggerCsv.Logged> logged = LoggerCsv.read(file, shown, faults);
        faults.refuseIfAny();
        LoggerSeries series = new LoggerSeries(logged.orElseThrow());
        if (series.at().size() < 2) {
            faults.add(
                    "",
                    "there are " + series.at().size() + " readings of temperature",
                    "accepted: at least 2");
        }
        faults.refuseIfAny();
        return new HistoryCsv(series, humidityFraction, ethylenePpm).history();
    }

    private static Track humidity(LoggerSeries series) {
        LongList at = new LongList();
        DoubleList value = new DoubleList();
        for (int i = 0; i < series.at().size(); i++) {
            if (!Double.isNaN(series.humidityPct().get(i))) {
                at.add(series.at().get(i));
                value.add(series.humidityPct().get(i));
            }
        }
        return new Track(at, at, value);
    }

    private LoggedHistory history() {
        List<FilledGap> gaps = new ArrayList<>();
        List<Reason> notes = new ArrayList<>(series.notes());
        int filled = 0;
        long usualS = usualStepS();
        for (int i = 1; i < series.at().size(); i++) {
            long a = series.at().get(i - 1);
            long b = series.at().get(i);
            boolean missing = 2 * (b - a) > 3 * usualS;
            if (missing && b - a > Gaps.LONGEST_S) {
                gaps.add(new FilledGap(Readings.local(a), Readings.local(b), "time"));
                notes.add(
                        LoggerCsv.note(
                                "history-gap",
                                Argument.text(Readings.local(a).toString()),
                                Argument.of((b - a) / HOUR_S, "h"),
                                Argument.of(colder(i), "C"),
                                Argument.of(warmer(i), "C")));
            } else if (missing && b - a > HOUR_S) {
                filled++;
            }
        }
        if (filled > 0) {
            notes.add(LoggerCsv.note("history-gaps-filled", Argument.of(filled, "1")));
        }
        if (spanS > 0) {
            notes.add(
                    LoggerCsv.note(
                            "history-means",
                            Argument.of(series.at().size(), "1"),
                            Argument.of(spanS / HOUR_S, "h")));
        }
        Optional<LoggedHistory.Bounds> bounds =
                gaps.isEmpty()
                        ? Optional.empty()
                        : Optional.of(
                                new LoggedHistory.Bounds(built(usualS, -1), built(usualS, 1)));
        return new LoggedHistory(
                built(usualS, 0), Readings.local(startS), humidity.size() > 0, gaps, bounds, notes);
    }

    private long usualStepS() {
        return new Readings(series.at(), series.at(), java.util.Map.of()).usualStepS();
    }

    private double colder(int i) {
        return Math.min(series.temperatureC().get(i - 1), series.temperatureC().get(i));
    }

    private double warmer(int i) {
        return Math.max(series.temperatureC().get(i - 1), series.temperatureC().get(i));
    }

    /** Builds the history; in gaps straight (0), as cold (-1) or as warm (1) as beside them. */
    private LotHistory built(long usualS, int side) {
        LotHistory.Builder history = new LotHistory.Builder();
        int n = series.at().size();
        int i = 0;
        while (i < n) {
            if (i > 0 && side != 0) {
                gap(history, i, usualS, side);
            }
            int from = i;
            double sumS = 0;
            double sumC = 0;
            double least = Double.POSITIVE_INFINITY;
            do {
                sumS += series.at().get(i) - startS;
                sumC += series.temperatureC().get(i);
                least = Math.min(least, series.temperatureC().get(i));
                i++;
            } while (i < n - 1 && from > 0 && series.at().get(i) - series.at().get(from) < spanS);
            add(history, sumS / (i - from), sumC / (i - from), least);
        }
        return history.build();
    }

    private void gap(LotHistory.Builder history, int i, long usualS, int side) {
        long a = series.at().get(i - 1);
        long b = series.at().get(i);
        if (b - a > Gaps.LONGEST_S && 2 * (b - a) > 3 * usualS) {
            double c = side < 0 ? colder(i) : warmer(i);
            add(history, a - startS + EDGE_S, c, c);
            add(history, b - startS - EDGE_S, c, c);
        }
    }

    private void add(LotHistory.Builder history, double atS, double meanC, double coldestC) {
        double damp =
                humidity.size() == 0 ? humidityFraction : humidity.at(startS + (long) atS) / 100;
        history.add(atS, meanC, meanC, coldestC, damp, ethylenePpm, false);
    }
}
