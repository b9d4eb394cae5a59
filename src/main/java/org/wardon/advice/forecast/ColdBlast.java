package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Hours;
import org.wardon.keeping.Draws;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.Mechanism;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What the cold blast of a cooler would do to the lots of its chamber if they stood in it, and the
 * lowest setting at which none freezes there. The blast is midway between the room's air and that
 * which leaves the cooler, for the share of the time it blows (the half is common practice, no
 * source).
 */
final class ColdBlast {
    static final double SHARE = 0.5;

    /** A blast this little colder than the room is no matter, K. */
    private static final double LEAST_K = 0.1;

    /** A risk of chilling is told where it is this much larger in the blast (assumption). */
    private static final double MORE_RISK = 0.05;

    private static final String PRACTICE = "common-practice";

    private final StoreOutcome outcome;
    private final ChamberPlan chamber;
    private final Hours hours;
    private final List<Visit> visits;
    private final Fates fates;

    ColdBlast(StoreOutcome outcome, ChamberPlan chamber) {
        this.outcome = outcome;
        this.chamber = chamber;
        fates = new Fates(outcome.model());
        hours = outcome.course(chamber.id()).hours();
        visits =
                outcome.model().visitsIn(chamber.id()).stream()
                        .filter(visit -> outcome.has(visit.id()))
                        .filter(visit -> visit.arrivesS() < outcome.horizonS())
                        .toList();
    }

    List<Caution> all() {
        List<Caution> told = new ArrayList<>();
        if (supplyBelowK() < LEAST_K) {
            return told;
        }
        lowestSetting().ifPresent(told::add);
        for (Visit visit : visits) {
            if (!visit.nearCooler()) {
                judge(visit, told);
            }
        }
        return told;
    }

    /** How far the air off the cooler is below the room's, as a mean while it blows, K. */
    double supplyBelowK() {
        return supplyBelowK(hours);
    }

    static double supplyBelowK(Hours hours) {
        double chill = 0;
        double blown = 0;
        for (int i = 0; i < hours.size(); i++) {
            chill += hours.chillK(i);
            blown += hours.blows(i);
        }
        return blown > 0 ? chill / blown : 0;
    }

    /**
     * The setting from which on no lot freezes near the cooler: freezing limit, band and half of
     * what the supply is colder.
     */
    private Optional<Caution> lowestSetting() {
        Optional<Visit> first =
                visits.stream()
                        .max(
                                Comparator.comparingDouble(
                                        v -> v.sheet().model().freezingC() - coldestC(v)));
        if (first.isEmpty()) {
            return Optional.empty();
        }
        double limitC = first.get().sheet().model().freezingC() + KeepingModel.FREEZING_MARGIN_K;
        double bandK = chamber.setting().bandK();
        double lowestC = limitC + bandK + SHARE * supplyBelowK();
        double setC = coldestC(first.get());
        return setC >= lowestC
                ? Optional.empty()
                : Optional.of(
                        new Caution(
                                Level.NOTE,
                                new Reason(
                                        "set-below-advised",
                                        List.of(chamber.id(), first.get().id()),
                                        List.of(
                                                Argument.of(setC, "C"),
                                                Argument.of(lowestC, "C"),
                                                Argument.of(limitC, "C"),
                                                Argument.of(bandK, "K"),
                                                Argument.of(supplyBelowK(), "K")),
                                        PRACTICE)));
    }

    /** Lowest setting while a lot is here, °C. */
    private double coldestC(Visit visit) {
        double fromS = Math.max(0, visit.hereFromS());
        double untilS = Math.min(visit.leavesS(), outcome.horizonS());
        return outcome.model().settings(chamber).coldestC(fromS, untilS);
    }

    private void judge(Visit visit, List<Caution> told) {
        LotHistory whole = outcome.history(visit.id());
        LotHistory here = visit.within(whole);
        LotHistory blast =
                outcome.model().inBlast(visit, here.meanC(0), blast(), outcome.horizonS());
        double coldestC = coldest(blast, visit);
        double freezingC = visit.sheet().model().freezingC();
        if (coldestC < freezingC + KeepingModel.FREEZING_MARGIN_K
                && coldest(here, visit) >= freezingC + KeepingModel.FREEZING_MARGIN_K) {
            told.add(
                    said(
                            "freezes-in-blast",
                            visit,
                            Argument.of(coldestC, "C"),
                            Argument.of(freezingC, "C")));
        }
        if (visit.only() && coldestC < visit.sheet().model().lowestSafeC()) {
            chilling(visit, here, blast, told);
        }
    }

    private void chilling(Visit visit, LotHistory here, LotHistory blast, List<Caution> told) {
        double risk = risk(visit, blast);
        double inRoom = risk(visit, here);
        if (risk >= Holding.RISK_MOST && risk >= inRoom + MORE_RISK) {
            told.add(
                    said(
                            "chills-in-blast",
                            visit,
                            Argument.of(100 * risk, "pct"),
                            Argument.of(100 * inRoom, "pct"),
                            Argument.of(SHARE * supplyBelowK(), "K")));
        }
    }

    /** Share of the draws in which the lot, kept along a history, shows chilling when sold. */
    private double risk(Visit visit, LotHistory history) {
        LotSheet sheet = visit.sheet();
        LotHistory sold = fates.inOtherAir(sheet, history, 0);
        long injured =
                Draws.seeded(outcome.model().plan().seed(), StoreRun.DRAWS).parallelStream()
                        .map(draw -> sheet.model().follow(sold, draw))
                        .filter(fate -> fate.endS(Mechanism.CHILLING) <= sheet.soldS())
                        .count();
        return injured / (double) StoreRun.DRAWS;
    }

    private double coldest(LotHistory history, Visit visit) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < history.size() && history.timeS(i) <= visit.leavesS(); i++) {
            least = Math.min(least, history.coldestC(i));
        }
        return least;
    }

    /** The air in the blast, as hourly means. */
    private AirSeries blast() {
        int n = hours.size();
        double[] time = new double[n];
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        for (int i = 0; i < n; i++) {
            time[i] = hours.atS(i);
            temperature[i] = hours.airC(i) - SHARE * hours.chillK(i);
            humidity[i] = Math.min(1, hours.humidityFraction(i));
        }
        return new AirSeries(time, temperature, humidity);
    }

    private Caution said(String code, Visit visit, Argument... arguments) {
        return new Caution(
                Level.CAUTION,
                new Reason(code, List.of(visit.id(), chamber.id()), List.of(arguments), PRACTICE));
    }
}
