package org.wardon.advice.placing;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.wardon.advice.forecast.LotInAir;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Paces;
import org.wardon.keeping.ethylene.Stage;
import org.wardon.produce.Ripeness;
import org.wardon.sharing.PairConflict;
import org.wardon.sharing.Verdict;

/**
 * What ethylene of others does to a lot at one temperature: the level from which on sharing refuses
 * their company, and the share of it that is no longer sold sound at any level, draw by draw.
 */
final class Taking {
    private static final double LEAST_PPM = 0.003;
    private static final double MOST_PPM = 12;
    private static final int HALVINGS = 10;

    private final TrialLot lot;
    private final List<Paces> paces;
    private final LotInAir there;
    private final double basePpm;
    private final double atC;
    private final double refusedPpm;
    private final double[] startsPpm;
    private final boolean[] soundStarted;

    private Taking(
            TrialLot lot,
            List<Paces> paces,
            LotInAir there,
            double basePpm,
            double atC,
            Started started) {
        this.lot = lot;
        this.paces = paces;
        this.there = there;
        this.basePpm = basePpm;
        this.atC = atC;
        startsPpm = started.fromPpm;
        soundStarted = started.sound;
        refusedPpm = minds() ? refusedPpm() : Double.POSITIVE_INFINITY;
    }

    /** The level that starts ripening in each draw, and whether the lot is sold sound then. */
    private static final class Started {
        private final double[] fromPpm;
        private final boolean[] sound;

        Started(int draws) {
            fromPpm = new double[draws];
            sound = new boolean[draws];
            Arrays.fill(fromPpm, Double.POSITIVE_INFINITY);
        }
    }

    /** Follows a lot with ethylene that starts its ripening. */
    interface InEthylene {
        /** The lot in the same air with this level in every draw. */
        LotInAir with(double ppm);
    }

    /**
     * Looks at a lot.
     *
     * @param lot the lot
     * @param paces its paces in each draw
     * @param there what it comes to in clean air
     * @param basePpm ethylene of that air, µL/L
     * @param atC temperature of the air, °C
     * @param gassed follows it with more of it
     */
    static Taking of(
            TrialLot lot,
            List<Paces> paces,
            LotInAir there,
            double basePpm,
            double atC,
            InEthylene gassed) {
        return new Taking(lot, paces, there, basePpm, atC, started(lot, paces.size(), atC, gassed));
    }

    private static Started started(TrialLot lot, int draws, double atC, InEthylene gassed) {
        Started started = new Started(draws);
        if (canBeStarted(lot, atC)) {
            LotInAir after = gassed.with(MOST_PPM);
            for (int d = 0; d < draws; d++) {
                Draw draw = after.draw(d);
                started.fromPpm[d] =
                        lot.model().response().triggerPpm(draw).orElse(Double.POSITIVE_INFINITY);
                started.sound[d] = after.sound(d, 1);
            }
        }
        return started;
    }

    private static boolean canBeStarted(TrialLot lot, double atC) {
        OptionalDouble trigger = lot.model().response().triggerPpm(Draw.MEDIAN);
        Ripeness ripeness =
                Stage.judged(lot.model().lot().commodity(), lot.model().lot().door().ripeness());
        return trigger.isPresent()
                && ripeness != Ripeness.RIPE
                && lot.model().lot().commodity().climacteric()
                && atC >= lot.model().lowestSafeC() - 0.5;
    }

    /** Whether ethylene does anything to it. */
    boolean minds() {
        return lot.model().response().sensitive()
                || lot.model().response().triggerPpm(Draw.MEDIAN).isPresent();
    }

    /** The lowest level at which sharing says no; found by halving on a scale of logarithms. */
    private double refusedPpm() {
        if (!refused(MOST_PPM)) {
            return Double.POSITIVE_INFINITY;
        }
        double low = Math.log(LEAST_PPM);
        double high = Math.log(MOST_PPM);
        for (int i = 0; i < HALVINGS; i++) {
            double middle = 0.5 * (low + high);
            if (refused(Math.exp(middle))) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return Math.exp(high);
    }

    private boolean refused(double ppm) {
        return PairConflict.ofEthylene(lot.wish(), lot.model(), lot.id(), ppm, atC).verdict()
                == Verdict.NO;
    }

    /**
     * Whether so much more than its own is too much; what it makes itself is no company's fault.
     *
     * @param own what it makes itself in the middle draw, µL/L
     * @param added what another makes in the middle draw, µL/L
     */
    boolean refuses(double own, double added) {
        double alone = basePpm + own;
        return added >= LEAST_PPM && alone + added >= refusedPpm && alone < refusedPpm;
    }

    /**
     * Share of it no longer sold sound with so much more than in clean air.
     *
     * @param addedPpm {@code [draw]}, µL/L
     */
    double lostShare(double[] addedPpm) {
        if (!minds()) {
            return 0;
        }
        double lost = 0;
        for (int d = 0; d < addedPpm.length; d++) {
            if (addedPpm[d] >= LEAST_PPM && there.sound(d, 1)) {
                lost += soundWith(d, basePpm + addedPpm[d]) ? 0 : 1;
            }
        }
        return lost / addedPpm.length;
    }

    private boolean soundWith(int d, double ppm) {
        if (ppm > startsPpm[d] && !soundStarted[d]) {
            return false;
        }
        double slow = paces.get(d).perDay(Mechanism.ETHYLENE, atC, 1, basePpm);
        double fast = paces.get(d).perDay(Mechanism.ETHYLENE, atC, 1, ppm);
        return there.sound(d, slow > 0 ? fast / slow : 1);
    }
}
