package org.wardon.sharing.placing;

import org.wardon.errors.Require;

/**
 * How much work a search may do, in steps, so that equal problems give equal answers on any
 * machine.
 *
 * @param priceSteps steps of the prices of lots at the start
 * @param branchSteps steps of the prices in each branch
 * @param branches most branches looked into
 * @param loadSteps most steps of the search for one load of one chamber
 * @param polishes most rounds of polishing with a part of the store emptied
 * @param gapFraction the search ends where it is known to be within this share of the best
 */
public record Effort(
        int priceSteps,
        int branchSteps,
        int branches,
        int loadSteps,
        int polishes,
        double gapFraction) {
    /** Checks the bounds. */
    public Effort {
        Require.within("priceSteps", priceSteps, 1, 1_000_000, "", "");
        Require.within("branchSteps", branchSteps, 1, 1_000_000, "", "");
        Require.within("branches", branches, 0, 100_000_000, "", "");
        Require.within("loadSteps", loadSteps, 1, 100_000_000, "", "");
        Require.within("polishes", polishes, 0, 1_000_000, "", "");
        Require.within("gapFraction", gapFraction, 0, 1, "", "");
    }

    /** Lots and chambers up to which a best placing is proven. */
    private static final int FEW = 150;

    private static final int MANY = 600;

    /**
     * Returns the work that suits a problem: proof for a small one, for larger ones a bound close
     * to what was found.
     *
     * @param problem the problem
     * @return the effort
     */
    public static Effort of(PlacingProblem problem) {
        int size = problem.lots().size() * problem.chambers().size();
        if (size <= FEW) {
            return new Effort(100, 20, 2_000, 5_000, 20, 0);
        }
        return size <= MANY
                ? new Effort(100, 15, 60, 2_000, 100, 0.005)
                : new Effort(50, 15, 0, 1_500, 300, 0.02);
    }
}
