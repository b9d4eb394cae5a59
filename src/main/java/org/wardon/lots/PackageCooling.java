package org.wardon.lots;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealVector;

/**
 * Shells and package air, all of one temperature, put into chamber air of another: a chain of
 * capacities whose exact course is a sum of falling exponentials. Shares of the starting
 * difference.
 */
final class PackageCooling {
    private static final int LONGEST = 60;

    private final double[] rate;
    private final double[] meanWeight;

    PackageCooling(Item item, Shells shells, Packing packing) {
        int n = shells.count();
        double[] capacity = new double[n + 1];
        double[] conductance = new double[n + 1];
        for (int i = 0; i < n; i++) {
            capacity[i] = item.specificHeatJkgK() * shells.massFraction(i);
            conductance[i] =
                    i < n - 1
                            ? shells.conductanceWPerKgK(i)
                            : shells.throughFilmWPerKgK(packing.filmWPerKgK());
        }
        capacity[n] = packing.capacityJPerKgK();
        conductance[n] = packing.chamberWPerKgK();
        EigenDecomposition modes =
                new EigenDecomposition(main(capacity, conductance), beside(capacity, conductance));
        rate = modes.getRealEigenvalues();
        meanWeight = new double[n + 1];
        for (int k = 0; k <= n; k++) {
            meanWeight[k] = weight(modes.getEigenvector(k), capacity);
        }
    }

    /** Scaled by the root of the capacities, the chain's matrix is symmetric. */
    private static double[] main(double[] capacity, double[] conductance) {
        double[] main = new double[capacity.length];
        for (int i = 0; i < main.length; i++) {
            double inward = i == 0 ? 0 : conductance[i - 1];
            main[i] = (inward + conductance[i]) / capacity[i];
        }
        return main;
    }

    private static double[] beside(double[] capacity, double[] conductance) {
        double[] beside = new double[capacity.length - 1];
        for (int i = 0; i < beside.length; i++) {
            beside[i] = -conductance[i] / Math.sqrt(capacity[i] * capacity[i + 1]);
        }
        return beside;
    }

    /**
     * Start in the mode times what the mode gives to the mean of the items, the last node left out.
     */
    private static double weight(RealVector mode, double[] capacity) {
        int n = capacity.length - 1;
        double start = 0;
        double mean = 0;
        double items = 0;
        for (int i = 0; i <= n; i++) {
            start += mode.getEntry(i) * Math.sqrt(capacity[i]);
            if (i < n) {
                mean += mode.getEntry(i) * Math.sqrt(capacity[i]);
                items += capacity[i];
            }
        }
        return start * mean / items;
    }

    /** The mass average of the items after a time, share of the starting difference. */
    double mean(double timeS) {
        double sum = 0;
        for (int k = 0; k < rate.length; k++) {
            sum += meanWeight[k] * Math.exp(-rate[k] * timeS);
        }
        return sum;
    }

    /** The time until the mass average of the items has fallen to a share, s. */
    double meanFallsToS(double share) {
        double slowest = Double.POSITIVE_INFINITY;
        for (double r : rate) {
            slowest = Math.min(slowest, r);
        }
        return new BrentSolver(1e-8, 1e-6)
                .solve(200, timeS -> mean(timeS) - share, 0, LONGEST / slowest);
    }
}
