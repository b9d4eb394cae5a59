package org.wardon.heat;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.wardon.cooling.Control;

/** Time of a run by Commons Math's explicit integrator; for a person to run, not a check. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 1)
@Measurement(iterations = 3)
@Fork(1)
public class ExplicitBenchmark {
    /** Length of the run, days. */
    @Param("30")
    public int days;

    /**
     * Runs a chamber of 12 lots.
     *
     * @return the mean air of the last hour, °C
     */
    @Benchmark
    public double wholeRun() {
        double[] last = new double[1];
        ChamberRun run = Chambers.full(Control.MODULATING, 12, days);
        new ExplicitRun(run, true, new ExplicitRun.Tolerance(1e-7, 1e-9))
                .go((network, y, meanAirC) -> last[0] = meanAirC);
        return last[0];
    }
}
