package org.wardon.heat.solver;

/**
 * Carries a state through time in steps as long as the error allows, and lands exactly on the times
 * asked for and on the first crossing of a {@link Trigger}. Allocates nothing after construction.
 */
public final class Integrator {
    private static final double SAFETY = 0.85;

    /** The same for a step that is tried again behind the next edge of its kind. */
    private static final double CAREFUL = 0.85;

    /** A remembered step grows by no more than this from one time to the next. */
    private static final double MORE = 4;

    /** An error so small that it may grow by more, and by how much. */
    private static final double SMALL = 0.02;

    private static final double MUCH_MORE = 8;

    /** A remembered step is tried where it is no longer than this beside the one before it. */
    private static final double RISES = 8;

    /** Steps behind an edge that are remembered. */
    private static final int REMEMBERED = 8;

    /** The error of a step is not trusted to fall faster than to this share of its power law. */
    private static final double STEEPEST = 0.05;

    private static final double SHORTEST = 0.15;

    /**
     * Where a shorter step has more than this share of the error, a fast mode beside long steps
     * keeps it up.
     */
    private static final double HELD_UP = 0.95;

    private static final double LONGEST = 6;

    /** Rather than two halves, a step this much longer than wanted: its error is still below 1. */
    private static final double REACHES = 1.15;

    private final TreeSystem system;
    private final Rosenbrock method;
    private final Landing landing;
    private final boolean longSteps;
    private final double[] totals;
    private final double shortestStep;
    private double nextStep;
    private double lastError = 1;
    private double lastStep;

    /** Steps that went well behind an edge, {@code [kind][number of the step]}; 0 unknown. */
    private final double[][] learned;

    private int edge;
    private int sinceEdge;
    private boolean fired;
    private long steps;
    private long rejected;

    /**
     * Makes room for a system, to be followed in fine steps.
     *
     * @param system what to integrate; its tree must be complete
     * @param edges kinds of edges {@link #restart} will tell of, at least 1
     * @param firstStep first step tried, above 0
     * @param shortestStep a step the error control would make shorter than this stops the run
     */
    public Integrator(TreeSystem system, int edges, double firstStep, double shortestStep) {
        this(system, Steps.FINE, edges, firstStep, shortestStep);
    }

    /**
     * Makes room for a system.
     *
     * @param system what to integrate; its tree must be complete
     * @param steps what its steps are like
     * @param edges kinds of edges {@link #restart} will tell of, at least 1
     * @param firstStep first step tried, above 0
     * @param shortestStep a step the error control would make shorter than this stops the run
     */
    public Integrator(
            TreeSystem system, Steps steps, int edges, double firstStep, double shortestStep) {
        this.system = system;
        this.longSteps = steps == Steps.LONG;
        this.method = longSteps ? new StifflyAccurate(system) : new FourthOrder(system);
        this.landing = new Landing(system, method, edges * (REMEMBERED + 1), shortestStep);
        this.totals = new double[system.flows()];
        this.learned = new double[edges][REMEMBERED];
        for (double[] known : learned) {
            known[0] = firstStep;
        }
        this.nextStep = firstStep;
        this.shortestStep = shortestStep;
    }

    /** What most steps of a run are like. */
    public enum Steps {
        /** They follow the fast modes behind edges. */
        FINE,
        /** They are long beside them. */
        LONG
    }

    /** Hears of each step taken. */
    public interface StepListener {
        /**
         * Hears of a step.
         *
         * @param from start of the step
         * @param to end of the step
         * @param y state at its end
         */
        void stepped(double from, double to, double[] y);
    }

    /** A function of the state whose rise through zero ends an advance. */
    public interface Trigger {
        /**
         * Returns the function.
         *
         * @param t time
         * @param y state
         * @return below 0 before the crossing; negative infinity while it is not armed, which must
         *     change only where an advance ends
         */
        double value(double t, double[] y);

        /**
         * Returns how near above 0 is near enough.
         *
         * @return above 0
         */
        double tolerance();
    }

    /**
     * Tells that the rates jump here, so that the step last used says little about the next; the
     * steps that went well behind the last edge of the same kind are tried again.
     *
     * @param kind kind of edge, from 0
     */
    public void restart(int kind) {
        edge = kind;
        sinceEdge = 0;
        nextStep = learned[kind][0];
        lastStep = 0;
    }

    /**
     * Advances the state in place.
     *
     * @param t time of the state
     * @param y state, changed in place
     * @param until time to land on, after {@code t}
     * @param trigger ends the advance early when it fires
     * @param listener hears of each step
     * @return the time reached: {@code until}, or that of the crossing
     * @throws StepTooShort where no step long enough passes the error test
     */
    public double advance(
            double t, double[] y, double until, Trigger trigger, StepListener listener) {
        fired = false;
        if (trigger.value(t, y) > 0) {
            fired = true;
            return t;
        }
        double now = t;
        while (now < until && !fired) {
            method.startFrom(now, y);
            double left = until - now;
            double h = acceptableStep(now, y, left);
            fired = trigger.value(now + h, method.end) > 0;
            double taken = fired ? landing.shortened(now, y, h, trigger, likeness()) : h;
            double end = taken == left ? until : now + taken;
            method.addFlows(taken, totals);
            System.arraycopy(method.end, 0, y, 0, y.length);
            steps++;
            listener.stepped(now, end, y);
            now = end;
        }
        return now;
    }

    /** Steps of one number behind an edge of one kind are alike. */
    private int likeness() {
        return edge * (REMEMBERED + 1) + sinceEdge;
    }

    private double acceptableStep(double now, double[] y, double left) {
        double h = fit(nextStep, left);
        boolean refused = false;
        double errorBefore = Double.POSITIVE_INFINITY;
        double before = h;
        while (true) {
            double error = method.tryStep(now, y, h);
            boolean possible = system.possible(method.end);
            if (error <= 1 && possible) {
                chooseNext(h, error, refused);
                return h;
            }
            rejected++;
            refused = true;
            boolean heldUp = longSteps && error > HELD_UP * errorBefore;
            double factor = error < 1e12 && !heldUp ? SAFETY / method.root(error) : SHORTEST;
            if (cornered(error / errorBefore, h / before)) {
                factor = SAFETY / error;
            }
            errorBefore = error;
            before = h;
            h *= Math.max(SHORTEST, Math.min(factor, possible ? 0.8 : 0.4));
            if (!(h > shortestStep)) {
                throw new StepTooShort(now, h, method.worstNode);
            }
        }
    }

    /**
     * Whether the error fell so slowly with the step that a corner of the rates lies within it,
     * such as the first dew: from there on it falls in proportion.
     */
    private static boolean cornered(double errorShare, double stepShare) {
        return errorShare > stepShare * stepShare && errorShare < 1;
    }

    /** A step that lands on the end, or leaves room for a decent last one. */
    private static double fit(double wanted, double left) {
        if (REACHES * wanted >= left) {
            return left;
        }
        return wanted > 0.5 * left ? 0.5 * left : wanted;
    }

    /**
     * Standard control, and foresight: where the error a step makes has been falling or rising from
     * step to step, it is taken to go on so. Behind an edge, what went well the last time.
     */
    private void chooseNext(double h, double error, boolean refused) {
        double e = Math.max(error, 1e-6);
        double factor = SAFETY / method.root(e);
        if (lastStep > 0) {
            double grown = h / lastStep;
            double trend = e / (lastError * method.power(grown));
            if (trend < 1) {
                factor /= method.root(Math.max(trend, STEEPEST));
            } else if (e > lastError) {
                factor *= Math.pow(lastError / e, 0.2);
            }
        }
        double proposed = h * Math.max(SHORTEST, Math.min(factor, refused ? 1 : LONGEST));
        // A step cut short to land on an event says nothing against the step wanted before.
        boolean cut = h < nextStep && !refused;
        if (sinceEdge < REMEMBERED) {
            proposed = learn(h, e, cut, refused, proposed);
        }
        nextStep = cut ? Math.max(proposed, nextStep) : proposed;
        lastError = e;
        lastStep = h;
    }

    /** Remembers what would have gone best here; returns what to try next. */
    private double learn(double h, double e, boolean cut, boolean refused, double proposed) {
        double[] steps = learned[edge];
        double most = e < SMALL ? MUCH_MORE : MORE;
        double best = h * Math.min(Math.max(CAREFUL / method.root(e), 0.7), refused ? 1 : most);
        steps[sinceEdge] = cut ? Math.max(best, steps[sinceEdge]) : best;
        sinceEdge++;
        boolean known = sinceEdge < REMEMBERED && steps[sinceEdge] > 0;
        return known ? Math.min(steps[sinceEdge], RISES * Math.max(proposed, h)) : proposed;
    }

    /**
     * Returns whether the trigger ended the last advance.
     *
     * @return true where it fired
     */
    public boolean fired() {
        return fired;
    }

    /**
     * Returns the integrals of the flows since the start.
     *
     * @return {@code [flow]}, live
     */
    public double[] totals() {
        return totals;
    }

    /**
     * Tells the integrals of the flows as the step tried last would leave them; for a trigger that
     * hangs on them.
     *
     * @param h length of that step
     * @param into {@code [flow]}, filled
     */
    public void tried(double h, double[] into) {
        System.arraycopy(totals, 0, into, 0, totals.length);
        method.addFlows(h, into);
    }

    /**
     * Returns the number of steps taken.
     *
     * @return steps
     */
    public long steps() {
        return steps;
    }

    /**
     * Returns the number of steps tried and refused.
     *
     * @return steps
     */
    public long rejected() {
        return rejected;
    }
}
