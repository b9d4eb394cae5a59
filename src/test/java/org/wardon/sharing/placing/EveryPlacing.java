package org.wardon.sharing.placing;

import java.util.Arrays;
import java.util.function.BiPredicate;

/** The best placing of few lots by trying every one, summed from the problem itself. */
final class EveryPlacing {
    private static final double FULL = 1 + 1e-9;

    private final PlacingProblem problem;
    private final int all;
    private final BiPredicate<ChamberToFill, Integer> allowed;

    EveryPlacing(PlacingProblem problem) {
        this(problem, (chamber, lots) -> true);
    }

    /**
     * Of placings only those whose chambers hold sets of lots (bits by number) that are allowed.
     */
    EveryPlacing(PlacingProblem problem, BiPredicate<ChamberToFill, Integer> allowed) {
        this.problem = problem;
        this.allowed = allowed;
        all = 1 << problem.lots().size();
    }

    /** What the best placing is worth, currency; minus infinity where none is allowed. */
    double best() {
        double[] best = new double[all];
        for (ChamberToFill chamber : problem.chambers()) {
            double[] here = values(chamber);
            double[] with = new double[all];
            for (int lots = 0; lots < all; lots++) {
                with[lots] = here[0] + best[lots];
                for (int some = lots; some > 0; some = (some - 1) & lots) {
                    with[lots] = Math.max(with[lots], here[some] + best[lots & ~some]);
                }
            }
            best = with;
        }
        return best[all - 1];
    }

    /** What each set of lots is worth in a chamber at its best climate. */
    private double[] values(ChamberToFill chamber) {
        double[] values = new double[all];
        Arrays.fill(values, Double.NEGATIVE_INFINITY);
        values[0] = allowed.test(chamber, 0) ? 0 : Double.NEGATIVE_INFINITY;
        for (Offer offer : chamber.offers()) {
            for (int lots = 1; lots < all; lots++) {
                if (allowed.test(chamber, lots) && fits(chamber, offer, lots)) {
                    values[lots] = Math.max(values[lots], value(chamber, offer, lots));
                }
            }
        }
        return values;
    }

    private boolean isIn(int lots, int lot, int day) {
        LotToPlace one = problem.lots().get(lot);
        return (lots & 1 << lot) != 0 && one.firstDay() <= day && day <= one.lastDay();
    }

    private boolean fits(ChamberToFill chamber, Offer offer, int lots) {
        for (int day = 0; day < problem.days(); day++) {
            double mass = 0;
            double volume = 0;
            double heat = 0;
            for (int l = 0; l < problem.lots().size(); l++) {
                if (isIn(lots, l, day)) {
                    mass += problem.lots().get(l).massKg();
                    volume += problem.lots().get(l).volumeM3();
                    heat += offer.climate().heatW(l, day);
                }
            }
            if (mass > chamber.massKg() * FULL
                    || volume > chamber.volumeM3() * FULL
                    || heat > offer.coolingW().get(day) * FULL) {
                return false;
            }
        }
        return true;
    }

    private double value(ChamberToFill chamber, Offer offer, int lots) {
        double value = -offer.cost();
        for (int a = 0; a < problem.lots().size(); a++) {
            if ((lots & 1 << a) == 0) {
                continue;
            }
            boolean may = problem.lots().get(a).onlyIn().map(chamber.id()::equals).orElse(true);
            value += may ? problem.earns(a, offer) : Climate.NEVER;
            for (int b = 0; b < a; b++) {
                boolean meet = problem.lots().get(a).meets(problem.lots().get(b));
                value -= (lots & 1 << b) != 0 && meet ? offer.climate().lossTogether(a, b) : 0;
            }
        }
        return value;
    }
}
