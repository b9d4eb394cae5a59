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
import org.wardon.errors.Progress;

/** Time of whole runs; for a person to run, not a check. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class HeatBenchmark {
    /** Lots in the chamber. */
    @Param({"1", "12", "100"})
    public int lots;

    /** One of modulating, on-off, averaged. */
    @Param({"modulating", "on-off", "averaged"})
    public String way;

    /**
     * Runs a chamber for thirty days.
     *
     * @return what happened
     */
    @Benchmark
    public Course thirtyDays() {
        Control control = way.equals("on-off") ? Control.ON_OFF : Control.MODULATING;
        ChamberRun run = Chambers.full(control, lots, 30);
        if (way.equals("averaged")) {
            run = run.withDoorMode(DoorMode.AVERAGED).withControlMode(ControlMode.MODULATING);
        }
        return HeatModel.run(run, Progress.SILENT);
    }

    /**
     * Runs a lot for thirty days in outdoor air.
     *
     * @return what it went through
     */
    @Benchmark
    public LotCourse withoutTheChamber() {
        ChamberRun run = Chambers.full(Control.MODULATING, lots, 30);
        AirSeries air = AirSeries.outdoors(run.weather());
        return HeatModel.runInGivenAir(
                run.stays().get(0), air, run.site(), Factors.PLAIN, run.durationS());
    }
}
