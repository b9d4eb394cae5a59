package org.wardon.heat.solver;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;

/** Step control, landing on times and on crossings. */
class IntegratorTest {
    private static final Integrator.Trigger NEVER = trigger(Double.POSITIVE_INFINITY);
    private static final Integrator.StepListener DEAF = (from, to, y) -> {};

    private static Integrator.Trigger trigger(double level) {
        return new Integrator.Trigger() {
            @Override
            public double value(double t, double[] y) {
                return y[1] - level;
            }

            @Override
            public double tolerance() {
                return 1e-6;
            }
        };
    }

    private static double[] run(double tolerance) {
        double[] y = {1, 0.5, 0.2, 0.3};
        new Integrator(new Cascade(500, tolerance), 1, 1e-3, 1e-12).advance(0, y, 10, NEVER, DEAF);
        return y;
    }

    @Test
    void errorFallsWithTheTolerance() {
        double[] exact = run(1e-11);
        double last = Double.POSITIVE_INFINITY;
        for (double tolerance : new double[] {1e-3, 1e-5, 1e-7}) {
            double[] y = run(tolerance);
            double worst = 0;
            for (int i = 0; i < 4; i++) {
                worst = Math.max(worst, Math.abs(y[i] - exact[i]));
            }
            assertTrue(worst < 5 * tolerance, worst + " at " + tolerance);
            assertTrue(worst < last / 5, worst + " after " + last);
            last = worst;
        }
    }

    @Test
    void landsOnTimesExactlyAndOnCrossingsWithinTheirTolerance() {
        double[] y = {1, 0.5, 0.2, 0.3};
        Integrator integrator = new Integrator(new Cascade(5, 1e-6), 1, 1e-3, 1e-12);
        double level = 0.52;
        double t = integrator.advance(0, y, 10, trigger(level), DEAF);
        assertTrue(integrator.fired());
        assertTrue(y[1] > level && y[1] <= level + 1e-6, "landed at " + y[1]);
        double reached = integrator.advance(t, y, 7.3, NEVER, DEAF);
        assertEquals(7.3, reached, 0.0);
    }

    @Test
    void allocatesNothingInItsSteps() {
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long id = Thread.currentThread().getId();
        double[] y = {1, 0.5, 0.2, 0.3};
        Integrator integrator = new Integrator(new Cascade(500, 1e-6), 1, 1e-3, 1e-12);
        double t = integrator.advance(0, y, 1, NEVER, DEAF);
        long before = threads.getThreadAllocatedBytes(id);
        integrator.advance(t, y, 50, NEVER, DEAF);
        long allocated = threads.getThreadAllocatedBytes(id) - before;
        assertTrue(integrator.steps() > 500, "steps " + integrator.steps());
        assertTrue(allocated < 1024, "allocated " + allocated + " bytes");
    }
}
