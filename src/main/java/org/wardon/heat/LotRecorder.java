package org.wardon.heat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.heat.network.LotPart;
import org.wardon.lots.BurntSugar;
import org.wardon.lots.LotHistory;

/** Writes down what one lot goes through. */
final class LotRecorder {
    /** For so long after arrival samples stand closer. */
    private static final double CLOSER_FOR_S = 24 * 3600.0;

    private static final double CLOSER_S = 300;

    /** Room for samples closer than rows; more are taken too. */
    private static final int CLOSER_SAMPLES = 80;

    /** The same in a run of long steps. */
    private static final int CLOSER_SAMPLES_OF_LONG_STEPS = 20;

    /** Wet from this share of the skin on; below it dew is not noticed (assumption). */
    private static final double WET_SHARE = 0.02;

    private final Stay stay;
    private final LotPart lot;
    private final LotHistory.Builder history;
    private final LotRows rows;
    private double lastRowS = Double.NEGATIVE_INFINITY;
    private double lastSampleS = Double.NEGATIVE_INFINITY;
    private double arrivedS = Double.POSITIVE_INFINITY;
    private double startHeatJ;
    private double startPackageJ;
    private double startPackageKg;
    private double startWaterKg;
    private double startMassKg;
    private boolean closed;
    private Optional<LotState> carriedOut = Optional.empty();
    private LotAmounts amounts = LotAmounts.NOTHING;
    private double wetFromS = Double.NaN;
    private final List<CourseEvent> wetSpans = new ArrayList<>();
    private final LotTotals nothing;
    private LotTotals totals;

    LotRecorder(Stay stay, LotPart lot, int mostRows, boolean longSteps) {
        this.stay = stay;
        this.lot = lot;
        this.startMassKg = stay.lot().massKg();
        this.nothing = new LotTotals(0, 0, 0, 0, startMassKg);
        this.totals = nothing;
        this.history =
                new LotHistory.Builder(
                        mostRows + (longSteps ? CLOSER_SAMPLES_OF_LONG_STEPS : CLOSER_SAMPLES));
        rows = new LotRows(mostRows);
    }

    boolean present() {
        return arrivedS < Double.POSITIVE_INFINITY && !closed;
    }

    void arrives(double t, double[] y, double[] integrals) {
        arrivedS = t;
        startHeatJ = lot.heatJ(y);
        startPackageJ = lot.packageHeatJ(y);
        startPackageKg = lot.packageWaterKg(y);
        startWaterKg = lot.waterKg(y);
        row(t, y, integrals);
    }

    /** A lot carried in from another chamber, with what it weighs now. */
    void carriedIn(double t, double[] y, double[] integrals, double massKg) {
        startMassKg = massKg;
        arrives(t, y, integrals);
    }

    /** How the lot is now, to be carried on. */
    LotState state(double[] y, double[] integrals) {
        return new LotState(lot, y, massKg(y, integrals));
    }

    /** The lot is gone to another chamber, where it is written down from now on. */
    void carriedOff(double t, double[] y, double[] integrals) {
        carriedOut = Optional.of(state(y, integrals));
        if (!Double.isNaN(wetFromS)) {
            endWetSpan(t);
        }
    }

    /** Closes the account: the lot leaves, or the run ends. */
    void close(double[] y, double[] integrals) {
        if (!present()) {
            return;
        }
        amounts = amounts(y, integrals);
        closed = true;
        totals =
                new LotTotals(
                        amounts.respirationJ(),
                        amounts.fleshJ() + amounts.liquidJ(),
                        amounts.evaporatedKg(),
                        startMassKg - massKg(y, integrals),
                        startMassKg);
    }

    /** What it gave so far; as it was when the account was closed. */
    LotAmounts amounts(double[] y, double[] integrals) {
        return present()
                ? new LotAmounts(
                        lot.respirationJ(integrals),
                        startHeatJ - lot.heatJ(y),
                        lot.liquidJ(integrals),
                        startPackageJ - lot.packageHeatJ(y),
                        startPackageKg - lot.packageWaterKg(y),
                        lot.evaporatedKg(integrals),
                        lot.toAirJ(integrals),
                        lot.vapourKg(integrals))
                : amounts;
    }

    /** Tissue and sugar left, free water apart. */
    double massKg(double[] y, double[] integrals) {
        double co2 = lot.respirationJ(integrals) / BurntSugar.JOULE_PER_KG_CO2;
        double burnt = co2 * (BurntSugar.GLUCOSE_KG_PER_KG_CO2 - BurntSugar.WATER_KG_PER_KG_CO2);
        double water = lot.evaporatedKg(integrals) + lot.waterKg(y) - startWaterKg;
        return startMassKg - burnt - water;
    }

    void stepped(double t, double[] y, double[] integrals) {
        if (arrivedS == Double.POSITIVE_INFINITY || carriedOut.isPresent()) {
            return;
        }
        boolean wet = lot.wetShare(y) > WET_SHARE;
        if (wet && Double.isNaN(wetFromS)) {
            wetFromS = t;
        } else if (!wet && !Double.isNaN(wetFromS)) {
            endWetSpan(t);
        }
        if (t - arrivedS < CLOSER_FOR_S && t - lastSampleS >= CLOSER_S) {
            sample(t, y, integrals);
        }
    }

    private void endWetSpan(double t) {
        String id = stay.lot().id();
        wetSpans.add(new CourseEvent(CourseEvent.Kind.WET_LOT, id, wetFromS, t));
        wetFromS = Double.NaN;
    }

    /** Writes an hourly row, and a sample where none stands there yet. */
    void row(double t, double[] y, double[] integrals) {
        if (arrivedS == Double.POSITIVE_INFINITY || carriedOut.isPresent()) {
            return;
        }
        if (t > lastSampleS) {
            sample(t, y, integrals);
        }
        if (t > lastRowS) {
            rows.add(history.size() - 1, lot.coreC(y), lot.respirationW(y));
            lastRowS = t;
        }
    }

    private void sample(double t, double[] y, double[] integrals) {
        history.add(
                        t,
                        lot.meanC(y),
                        lot.surfaceC(y),
                        lot.coldestC(y),
                        Math.min(lot.humidityFraction(y), 1),
                        0,
                        lot.wetShare(y) > WET_SHARE)
                .mass(massKg(y, integrals));
        lastSampleS = t;
    }

    LotTotals totals() {
        return totals;
    }

    /** Ends open spans and returns them all. */
    List<CourseEvent> wetSpans(double endS) {
        if (!Double.isNaN(wetFromS)) {
            endWetSpan(endS);
        }
        return wetSpans;
    }

    LotCourse course() {
        return new LotCourse(stay, history.build(), rows, totals, carriedOut);
    }
}
