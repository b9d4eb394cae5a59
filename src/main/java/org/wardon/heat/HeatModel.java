package org.wardon.heat;

import java.util.List;
import java.util.Optional;
import org.wardon.air.Site;
import org.wardon.air.StandardAtmosphere;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Progress;
import org.wardon.errors.Require;
import org.wardon.heat.network.LotInGivenAir;

/** The heat and moisture model: runs a chamber, or a lot in given air. */
public final class HeatModel {
    private HeatModel() {}

    /**
     * Runs a chamber.
     *
     * @param run what to run
     * @param progress hears how far it has come, as stage {@code heat}
     * @return what happened
     * @throws org.wardon.errors.RunStopped where a state cannot be
     * @throws IllegalArgumentException where a part is not built or parts do not fit together
     */
    public static Course run(ChamberRun run, Progress progress) {
        return run(run, progress, Accuracy.of(run.doorMode()), false);
    }

    /**
     * Warms a chamber that follows the weather, for many runs with other lots.
     *
     * @param run one of those runs
     * @return its start with the faces warmed, or its own start where none is needed
     */
    public static Start warmed(ChamberRun run) {
        if (!WarmUp.wanted(run)) {
            return run.start();
        }
        Warmed warmed = WarmUp.warmed(run, Accuracy.of(run.doorMode()), false);
        return new Start(
                run.start().temperatureC(), run.start().humidityPct(), Optional.of(warmed));
    }

    /**
     * Returns what surrounds the chamber of a run, as the model feels it.
     *
     * @param run the run
     * @return its weather, sun and neighbours
     */
    public static Surroundings around(ChamberRun run) {
        return RunCompiler.surroundings(run);
    }

    static Course run(ChamberRun run, Progress progress, Accuracy accuracy, boolean plain) {
        return ChamberRunner.of(run, accuracy, plain).run(progress);
    }

    /**
     * Runs the chambers of a store, which may carry lots to each other.
     *
     * @param runs the chambers, of one span and one site; a lot that is carried on stands in both
     * @return what happened, in the order of the runs
     * @throws org.wardon.errors.RunStopped where a state cannot be
     * @throws IllegalArgumentException where a lot is carried to where no such lot comes in
     */
    public static List<Course> runTogether(List<ChamberRun> runs) {
        return runTogether(runs, Progress.SILENT);
    }

    /**
     * Runs the chambers of a store for as long as nobody stops it.
     *
     * @param runs the chambers, of one span and one site; a lot that is carried on stands in both
     * @param progress hears of each hour of each chamber, in any order, as stage {@code heat}
     * @return what happened, in the order of the runs
     * @throws org.wardon.errors.RunStopped where a state cannot be
     * @throws IllegalArgumentException where a lot is carried to where no such lot comes in
     */
    public static List<Course> runTogether(List<ChamberRun> runs, Progress progress) {
        Accuracy accuracy = runs.isEmpty() ? Accuracy.USUAL : Accuracy.of(runs.get(0).doorMode());
        return TogetherRun.of(runs, accuracy, progress);
    }

    /**
     * Runs a chamber to a time and accounts for the span before it.
     *
     * @param run what to run; a lot carried in must be known
     * @param fromS start of the span, s since the start of the run
     * @param untilS its end, s, after its start, within the run
     * @return what moved heat and water in the span, and faces and lots at its end
     * @throws org.wardon.errors.RunStopped where a state cannot be
     */
    public static HourAccount account(ChamberRun run, double fromS, double untilS) {
        Require.that(
                fromS >= 0 && untilS > fromS && untilS <= run.durationS(),
                "a span of the run, not " + fromS + " to " + untilS + " s");
        return ChamberRunner.of(run, Accuracy.USUAL, false).account(fromS, untilS);
    }

    /**
     * Accounts for a span hour by hour.
     *
     * @param run what to run; a lot carried in must be known
     * @param fromS start of the span, s since the start of the run
     * @param untilS its end, s, after its start, within the run
     * @return an account for each hour, the last perhaps shorter
     * @throws org.wardon.errors.RunStopped where a state cannot be
     */
    public static List<HourAccount> accounts(ChamberRun run, double fromS, double untilS) {
        Require.that(
                fromS >= 0 && untilS > fromS && untilS <= run.durationS(),
                "a span of the run, not " + fromS + " to " + untilS + " s");
        return ChamberRunner.of(run, Accuracy.USUAL, false).accounts(fromS, untilS, 3_600);
    }

    /**
     * Runs one lot in air that is given: without the chamber, along a logger, or before it arrived.
     * The lot breathes, sweats and cools by the same code as in a chamber; it does not act on the
     * air.
     *
     * @param stay the lot, its arrival and the temperature of its flesh then; its leaving is not
     *     heard
     * @param air the air around its package
     * @param site where, for the air pressure
     * @param factors on respiration, transpiration and package; the rest is not heard
     * @param durationS end, s since the start of the run, after arrival
     * @return what it went through, from arrival to the end
     * @throws org.wardon.errors.RunStopped where a state cannot be
     */
    public static LotCourse runInGivenAir(
            Stay stay, AirSeries air, Site site, Factors factors, double durationS) {
        Require.that(
                durationS > Math.max(stay.arrivesS(), 0),
                "the run ends at " + durationS + " s, the lot arrives at " + stay.arrivesS());
        double pressurePa = StandardAtmosphere.pressurePa(site.elevationM());
        LotInGivenAir network =
                new LotInGivenAir(stay.lot(), RunCompiler.tuning(factors), pressurePa);
        return new GivenAirRunner(stay, air, pressurePa, durationS, network).run();
    }
}
