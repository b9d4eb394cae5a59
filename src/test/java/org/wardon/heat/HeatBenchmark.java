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
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.wardon.cooling.Control;
import org.wardon.errors.Progress;

/**
 * Time of whole runs; for a person to run, not a check. A year of 12 lots: {@code -p days=365 -p
 * lots=12 -p way=modulating}. Two threads ({@code -t 2}) show what a second core brings to
 * sampling.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class HeatBenchmark {
    /** Lots in the chamber. */
    @Param({"1", "12", "100", "1000"})
    public int lots;

    /** Length of the run, days. */
    @Param("30")
    public int days;

    /** One of modulating, on-off, averaged, sketched. */
    @Param({"modulating", "on-off", "averaged", "sketched"})
    public String way;

    private ChamberRun run = Chambers.full(Control.MODULATING, 1, 1);

    /** Makes the run; draws of a store share what lies outside, so it is worked out before. */
    @Setup
    public void prepare() {
        ChamberRun made = make();
        run = made.withExtras(made.extras().under(HeatModel.around(made)));
    }

    private ChamberRun make() {
        Control control = way.equals("on-off") ? Control.ON_OFF : Control.MODULATING;
        ChamberRun full = Chambers.full(control, lots, days);
        return switch (way) {
            case "averaged" ->
                    full.withDoorMode(DoorMode.AVERAGED).withControlMode(ControlMode.MODULATING);
            case "sketched" ->
                    full.withDoorMode(DoorMode.SKETCHED).withControlMode(ControlMode.MODULATING);
            default -> full;
        };
    }

    /**
     * Runs a chamber.
     *
     * @return what happened
     */
    @Benchmark
    public Course wholeRun() {
        return HeatModel.run(run, Progress.SILENT);
    }

    /**
     * Runs a lot in outdoor air.
     *
     * @return what it went through
     */
    @Benchmark
    public LotCourse withoutTheChamber() {
        AirSeries air = AirSeries.outdoors(run.weather());
        return HeatModel.runInGivenAir(
                run.stays().get(0), air, run.site(), Factors.PLAIN, run.durationS());
    }
}
