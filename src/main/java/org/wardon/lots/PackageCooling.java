package org.wardon.lots;

import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Shells and package air, all of one temperature, put into chamber air of another: a chain of
 * capacities whose exact course is the exponential of a small matrix. Shares of the starting
 * difference.
 *
 * <p>The exponential is taken by scaling and squaring (Moler and Van Loan 2003, Nineteen dubious
 * ways to compute the exponential of a matrix, method 3; from memory of it): a Taylor sum over a
 * time short enough, squared until the time is reached. The library's eigenvectors give the same to
 * ten digits ({@code PackageCoolingTest}) and cost a tenth of a whole short answer, as a lot is
 * fitted in each draw.
 */
final class PackageCooling {
    /** Norm of the matrix over the shortest time; with it ten terms leave 1e-15. */
    private static final double SHORT = 0.25;

    private static final int TERMS = 10;

    private final int n;
    private final double[] capacity;

    /** Rates, {@code [row * n + column]}, 1/s. */
    private final double[] rates;

    PackageCooling(Item item, Shells shells, Packing packing) {
        int items = shells.count();
        n = items + 1;
        capacity = new double[n];
        double[] conductance = new double[n];
        for (int i = 0; i < items; i++) {
            capacity[i] = item.specificHeatJkgK() * shells.massFraction(i);
            conductance[i] =
                    i < items - 1
                            ? shells.conductanceWPerKgK(i)
                            : shells.throughFilmWPerKgK(packing.filmWPerKgK());
        }
        capacity[items] = packing.capacityJPerKgK();
        conductance[items] = packing.chamberWPerKgK();
        rates = new double[n * n];
        for (int i = 0; i < n; i++) {
            double inward = i == 0 ? 0 : conductance[i - 1];
            rates[i * n + i] = -(inward + conductance[i]) / capacity[i];
            if (i > 0) {
                rates[i * n + i - 1] = inward / capacity[i];
            }
            if (i < n - 1) {
                rates[i * n + i + 1] = conductance[i] / capacity[i];
            }
        }
    }

    /** The mass average of the items after a time, s; share of the starting difference. */
    double mean(double timeS) {
        double[] after = exponential(timeS);
        double heat = 0;
        double whole = 0;
        for (int i = 0; i < n - 1; i++) {
            double left = 0;
            for (int k = 0; k < n; k++) {
                left += after[i * n + k];
            }
            heat += capacity[i] * left;
            whole += capacity[i];
        }
        return heat / whole;
    }

    private double[] exponential(double timeS) {
        double norm = 0;
        for (int i = 0; i < n; i++) {
            norm = Math.max(norm, -2 * rates[i * n + i] * timeS);
        }
        int squarings = norm > SHORT ? Math.getExponent(norm / SHORT) + 1 : 0;
        double[] power = taylor(timeS / Math.scalb(1.0, squarings));
        for (int s = 0; s < squarings; s++) {
            power = product(power, power);
        }
        return power;
    }

    private double[] taylor(double timeS) {
        double[] sum = new double[n * n];
        double[] term = new double[n * n];
        for (int i = 0; i < n; i++) {
            sum[i * n + i] = 1;
            term[i * n + i] = 1;
        }
        for (int k = 1; k <= TERMS; k++) {
            term = product(term, rates);
            for (int i = 0; i < term.length; i++) {
                term[i] *= timeS / k;
                sum[i] += term[i];
            }
        }
        return sum;
    }

    private double[] product(double[] left, double[] right) {
        double[] product = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int k = 0; k < n; k++) {
                double factor = left[i * n + k];
                for (int j = 0; j < n; j++) {
                    product[i * n + j] += factor * right[k * n + j];
                }
            }
        }
        return product;
    }

    /** The time until the mass average of the items has fallen to a share, s. */
    double meanFallsToS(double share) {
        double longest = 1;
        while (mean(longest) > share) {
            longest *= 2;
        }
        return new BrentSolver(1e-8, 1e-6).solve(200, timeS -> mean(timeS) - share, 0, longest);
    }
}
