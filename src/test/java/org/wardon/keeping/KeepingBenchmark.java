package org.wardon.keeping;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.wardon.air.Timeline;
import org.wardon.lots.LotHistory;

/** Time of judging lots in all their draws; for a person to run, not a check. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class KeepingBenchmark {
    /** How many lots. */
    @Param("12")
    public int lots;

    /** Length of their histories, hours. */
    @Param("240")
    public int hours;

    private KeepingModel model;
    private LotHistory history;
    private List<Draw> draws;

    /** Makes a history of warm days and cold nights. */
    @Setup
    public void prepare() {
        LotHistory.Builder rows = new LotHistory.Builder();
        for (int h = 0; h <= hours; h++) {
            double t = 12 + 2 * Math.sin(h * Math.PI / 12);
            rows.add(h * Timeline.HOUR_S, t, t, t, 0.9, 0.1, false);
        }
        history = rows.build();
        model = Crops.model("mango");
        draws = Draws.seeded(1, 32);
    }

    /**
     * Follows every lot through every draw.
     *
     * @return the sum of the days left
     */
    @Benchmark
    public double allDraws() {
        double sum = 0;
        for (int lot = 0; lot < lots; lot++) {
            for (Draw draw : draws) {
                sum += model.follow(history, draw).daysLeft(0);
            }
        }
        return sum;
    }
}
