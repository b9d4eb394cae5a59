package org.wardon.heat;

import org.wardon.heat.solver.Integrator;

/** The first of two triggers to fire; the second is scaled to the tolerance of the first. */
record FirstOf(Integrator.Trigger one, Integrator.Trigger other) implements Integrator.Trigger {
    @Override
    public double value(double t, double[] y) {
        double scale = one.tolerance() / other.tolerance();
        return Math.max(one.value(t, y), scale * other.value(t, y));
    }

    @Override
    public double tolerance() {
        return one.tolerance();
    }
}
