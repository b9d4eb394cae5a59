package org.wardon.heat;

import java.util.Arrays;
import java.util.Optional;
import org.wardon.cooling.Following;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.CoolerPart;
import org.wardon.heat.solver.Integrator;

/**
 * The thermostats of coolers that run on and off: on above setting + band where the cooler's own
 * conditions hold, off below setting - band or where they do not; each run and rest at least as
 * long as the unit asks. The crossing is found by the integrator, which ends a step there.
 */
final class SwitchedCoolers implements Integrator.Trigger {
    /** A switching may come this much late, K; thermostats are no better. */
    private static final double LATE_K = 0.01;

    private final ChamberNetwork network;
    private final double[] lockedUntil;
    private final double[] minRunS;
    private final double[] minRestS;
    private long switches;

    SwitchedCoolers(ChamberNetwork network) {
        this.network = network;
        int n = network.coolerCount();
        lockedUntil = new double[n];
        minRunS = new double[n];
        minRestS = new double[n];
        Arrays.fill(lockedUntil, Double.NEGATIVE_INFINITY);
        for (int i = 0; i < n; i++) {
            Optional<Following> following = network.cooler(i).unit().following();
            minRunS[i] = following.map(Following::minRunS).orElse(0.0);
            minRestS[i] = following.map(Following::minRestS).orElse(0.0);
        }
    }

    @Override
    public double value(double t, double[] y) {
        double most = Double.NEGATIVE_INFINITY;
        double airC = network.airC(y);
        for (int i = 0; i < lockedUntil.length; i++) {
            most = Math.max(most, miss(i, t, y, airC));
        }
        return most;
    }

    /** How far the air is beyond the point of switching, K; below 0 before it. */
    private double miss(int i, double t, double[] y, double airC) {
        CoolerPart cooler = network.cooler(i);
        if (!cooler.switched()
                || !cooler.powered()
                || cooler.defrosting()
                || t < lockedUntil[i] - 1e-6) {
            return Double.NEGATIVE_INFINITY;
        }
        double above = airC - cooler.followedC();
        double inside = network.inside(i, t, y);
        return cooler.on()
                ? Math.max(-cooler.bandK() - above, -inside)
                : Math.min(above - cooler.bandK(), inside);
    }

    @Override
    public double tolerance() {
        return LATE_K;
    }

    /** Switches what has to be switched; returns whether anything runs now that did not. */
    boolean fire(double t, double[] y) {
        boolean started = false;
        double airC = network.airC(y);
        for (int i = 0; i < lockedUntil.length; i++) {
            if (miss(i, t, y, airC) > 0) {
                boolean on = !network.cooler(i).on();
                turn(i, t, on);
                started |= on;
            }
        }
        return started;
    }

    private void turn(int i, double t, boolean on) {
        network.cooler(i).switchOn(on);
        lockedUntil[i] = t + (on ? minRunS[i] : minRestS[i]);
        switches++;
    }

    /** Lets one that runs come to rest: the power went or came, or a defrost starts. */
    void rest(int i, double t) {
        if (network.cooler(i).on()) {
            turn(i, t, false);
        }
    }

    int count() {
        return lockedUntil.length;
    }

    /** The next time a lock opens, s; infinite where none is shut. */
    double nextUnlock(double t) {
        double next = Double.POSITIVE_INFINITY;
        for (double until : lockedUntil) {
            if (until > t + 1e-6) {
                next = Math.min(next, until);
            }
        }
        return next;
    }

    long switches() {
        return switches;
    }
}
