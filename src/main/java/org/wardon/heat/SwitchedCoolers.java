package org.wardon.heat;

import java.util.Arrays;
import org.wardon.cooling.Compressor;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.CoolerPart;
import org.wardon.heat.solver.Integrator;

/**
 * The thermostats of coolers that run on and off: on above setting + band, off below setting -
 * band, each run and rest at least as long as the unit asks. The crossing is found by the
 * integrator, which ends a step there.
 */
final class SwitchedCoolers implements Integrator.Trigger {
    /** A switching may come this much late, K; thermostats are no better. */
    private static final double LATE_K = 0.01;

    private final ChamberNetwork network;
    private final double[] lockedUntil;
    private final double[] minRunS;
    private final double[] minRestS;
    private long switches;

    SwitchedCoolers(ChamberRun run, ChamberNetwork network) {
        this.network = network;
        int n = network.coolerCount();
        lockedUntil = new double[n];
        minRunS = new double[n];
        minRestS = new double[n];
        Arrays.fill(lockedUntil, Double.NEGATIVE_INFINITY);
        for (int i = 0; i < n; i++) {
            if (run.coolers().get(i) instanceof Compressor unit) {
                minRunS[i] = 60 * unit.minRunMinutes();
                minRestS[i] = 60 * unit.minRestMinutes();
            }
        }
    }

    @Override
    public double value(double t, double[] y) {
        double most = Double.NEGATIVE_INFINITY;
        double airC = network.airC(y);
        for (int i = 0; i < lockedUntil.length; i++) {
            most = Math.max(most, miss(i, t, airC));
        }
        return most;
    }

    /** How far the air is beyond the point of switching, K; below 0 before it. */
    private double miss(int i, double t, double airC) {
        CoolerPart cooler = network.cooler(i);
        if (cooler.modulating()
                || !cooler.powered()
                || cooler.defrosting()
                || t < lockedUntil[i] - 1e-6) {
            return Double.NEGATIVE_INFINITY;
        }
        double above = airC - cooler.followedC();
        return cooler.on() ? -cooler.bandK() - above : above - cooler.bandK();
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
            if (miss(i, t, airC) > 0) {
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

    /** Lets all that run come to rest: the power went, or a defrost starts. */
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
