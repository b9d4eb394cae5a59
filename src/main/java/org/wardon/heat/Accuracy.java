package org.wardon.heat;

import org.wardon.errors.Require;

/**
 * How exactly the solver steps: the error of one step that just passes.
 *
 * @param lotK of the worst lot, K
 * @param airK of the chamber's air, K
 */
record Accuracy(double lotK, double airK) {
    /** Lots within 0.02 K and air within 0.06 K of a tight run over a month (measured). */
    static final Accuracy USUAL = new Accuracy(5e-3, 5e-2);

    /** For a run whose single hours nobody reads: lots within 0.1 K over a month (measured). */
    static final Accuracy SKETCHED = new Accuracy(2e-2, 2e-1);

    Accuracy {
        Require.within("lotK", lotK, 1e-9, 1, "K", "");
        Require.within("airK", airK, 1e-9, 1, "K", "");
    }
}
