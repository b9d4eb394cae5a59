package org.wardon.heat;

import org.wardon.errors.Require;
import org.wardon.heat.solver.Integrator;

/**
 * How exactly the solver steps: the error of one step that just passes.
 *
 * @param lotK of the worst lot, K
 * @param airK of the chamber's air, K
 * @param steps what most steps are like
 */
record Accuracy(double lotK, double airK, Integrator.Steps steps) {
    /**
     * Lots within 0.005 K and air within 0.05 K of a tight run at the end of any step (measured).
     */
    static final Accuracy USUAL = new Accuracy(1e-2, 0.13);

    /** For a run without pulses, whose steps are long: as exact, humidity too (measured). */
    static final Accuracy EVEN = new Accuracy(5e-3, 5e-2, Integrator.Steps.LONG);

    /**
     * For a run whose single hours nobody reads: lots within 0.1 K at any hour and 0.006 K in the
     * mean, where the cooler is just large enough (measured).
     */
    static final Accuracy SKETCHED = new Accuracy(4e-2, 4e-1, Integrator.Steps.LONG);

    Accuracy {
        Require.within("lotK", lotK, 1e-9, 1, "K", "");
        Require.within("airK", airK, 1e-9, 1, "K", "");
    }

    static Accuracy of(DoorMode mode) {
        return switch (mode) {
            case PULSES -> USUAL;
            case AVERAGED -> EVEN;
            case SKETCHED -> SKETCHED;
        };
    }

    /** The first step tried, s. */
    double firstStepS() {
        return steps == Integrator.Steps.LONG ? 300 : 2;
    }

    Accuracy(double lotK, double airK) {
        this(lotK, airK, Integrator.Steps.FINE);
    }
}
