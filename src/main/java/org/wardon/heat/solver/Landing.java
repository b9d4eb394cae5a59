package org.wardon.heat.solver;

/**
 * Shortens a step until it ends just behind a crossing. A guess is where the cubic through both
 * ends of the long step, with its rates at both, crosses. Fast modes that die away within the step
 * make the rate at its start a poor one: the steps tried tell by how much, and as one cycle of a
 * thermostat is like the next, the last landing is the first to tell.
 */
final class Landing {
    private static final int TRIES = 40;

    /** Tries the cubic is asked for; then the bracket alone, which always closes. */
    private static final int FORESEEN = 4;

    private static final int GLANCES = 20;

    /** So near on the cubic, as a share of the tolerance, is near enough for a guess. */
    private static final double GLANCE = 0.02;

    private static final double MOST_LACKED = 3;

    private final TreeSystem system;
    private final Rosenbrock method;
    private final double shortestStep;
    private final Bracket bracket = new Bracket();
    private final Bracket onCubic = new Bracket();
    private final double[] far;
    private final double[] farRates;
    private final double[] flows;
    private final double[] between;

    /**
     * Slope at the start that the cubic lacked at the last landing, as a share of the rise over the
     * step; by what the step was like.
     */
    private final double[] lacked;

    private int like;

    Landing(TreeSystem system, Rosenbrock method, int kinds, double shortestStep) {
        this.system = system;
        this.method = method;
        this.shortestStep = shortestStep;
        int n = system.tree().size();
        far = new double[n];
        farRates = new double[n];
        flows = new double[system.flows()];
        between = new double[n];
        lacked = new double[kinds];
    }

    /**
     * Returns the length of the step, which is the one tried last.
     *
     * @param h length of the step tried last, at whose end the trigger fires
     * @param kind what it is like, so that the landings of one kind learn from each other, from 0
     */
    double shortened(double now, double[] y, double h, Integrator.Trigger trigger, int kind) {
        like = kind;
        double wanted = 0.5 * trigger.tolerance();
        double nearMiss = trigger.value(now, y) - wanted;
        double value = trigger.value(now + h, method.end);
        if (Double.isInfinite(nearMiss) || lands(value, trigger)) {
            // Not armed before the end of this step, where it fires; or near enough already.
            return h;
        }
        double farMiss = value - wanted;
        bracket.open(0, nearMiss, h, farMiss);
        System.arraycopy(method.end, 0, far, 0, far.length);
        system.rates(now + h, far, farRates, flows);
        double rise = farMiss - nearMiss;
        double tried = h;
        for (int i = 0; i < TRIES; i++) {
            if (i < FORESEEN) {
                onCubic.open(0, nearMiss, h, farMiss);
                tried = bracket.inside(foreseen(now, y, h, trigger, rise));
            } else {
                tried = bracket.guess();
            }
            method.tryStep(now, y, tried);
            value = trigger.value(now + tried, method.end);
            bracket.take(tried, value - wanted, value > 0);
            learn(value - cubic(now, y, h, tried, trigger), tried / h, rise);
            if (lands(value, trigger) || bracket.width() < shortestStep) {
                break;
            }
        }
        if (tried != bracket.high()) {
            method.tryStep(now, y, bracket.high());
        }
        return bracket.high();
    }

    private static boolean lands(double value, Integrator.Trigger trigger) {
        return value > 0 && value <= trigger.tolerance();
    }

    private double foreseen(
            double now, double[] y, double h, Integrator.Trigger trigger, double rise) {
        double wanted = 0.5 * trigger.tolerance();
        double guess = onCubic.guess();
        for (int i = 0; i < GLANCES; i++) {
            double miss =
                    cubic(now, y, h, guess, trigger)
                            + lacked[like] * rise * startSlope(guess / h)
                            - wanted;
            if (!(Math.abs(miss) >= GLANCE * trigger.tolerance())) {
                break;
            }
            onCubic.take(guess, miss, miss > 0);
            guess = onCubic.guess();
        }
        return guess;
    }

    private void learn(double miss, double share, double rise) {
        double lacks = miss / (rise * startSlope(share));
        if (Double.isFinite(lacks)) {
            lacked[like] = Math.max(-MOST_LACKED, Math.min(MOST_LACKED, lacks));
        }
    }

    /** What a slope of 1 at the start of a step does to the cubic, by the share of the step. */
    private static double startSlope(double share) {
        return share * (share - 1) * (share - 1);
    }

    /** The trigger at a time of the long step, by Hermite's cubic of the state. */
    private double cubic(double now, double[] y, double h, double at, Integrator.Trigger trigger) {
        double share = at / h;
        double left = share - 1;
        double bend = share * left;
        double rise = share + bend * (1 - 2 * share);
        double early = bend * left * h;
        double late = bend * share * h;
        double[] rates = method.f0;
        for (int i = 0; i < y.length; i++) {
            between[i] = y[i] + rise * (far[i] - y[i]) + early * rates[i] + late * farRates[i];
        }
        return trigger.value(now + at, between);
    }
}
