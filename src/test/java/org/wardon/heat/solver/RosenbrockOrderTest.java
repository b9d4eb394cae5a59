package org.wardon.heat.solver;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The methods' orders, seen as the step falls; a wrong coefficient cannot pass. */
class RosenbrockOrderTest {
    private static final double END = 2;
    private static final List<Method> METHODS = List.of(StifflyAccurate::new, FourthOrder::new);

    /** Makes room for a method. */
    private interface Method {
        Rosenbrock of(TreeSystem system);
    }

    @ParameterizedTest(name = "stiffness {0}")
    @ValueSource(doubles = {1, 3})
    void errorOfLongStepsFallsWithTheirThirdPower(double stiffness) {
        errorFalls(stiffness, StifflyAccurate::new, 3);
    }

    @ParameterizedTest(name = "stiffness {0}")
    @ValueSource(doubles = {1, 3})
    void errorOfFineStepsFallsWithTheirFourthPower(double stiffness) {
        errorFalls(stiffness, FourthOrder::new, 4);
    }

    private static void errorFalls(double stiffness, Method method, double power) {
        double[] exact = reference(stiffness);
        double[] errors = new double[4];
        double[] flowErrors = new double[4];
        for (int i = 0; i < 4; i++) {
            double[] found = fixedSteps(method, stiffness, 20 << i);
            errors[i] = largest(exact, found, 0, 4);
            flowErrors[i] = Math.abs(found[4] - exact[4]);
        }
        for (int i = 1; i < 4; i++) {
            double order = Math.log(errors[i - 1] / errors[i]) / Math.log(2);
            double flowOrder = Math.log(flowErrors[i - 1] / flowErrors[i]) / Math.log(2);
            assertEquals(power, order, 0.25, "state, halving " + i);
            assertEquals(power, flowOrder, 0.35, "flow, halving " + i);
        }
    }

    @Test
    void staysStableAndAccurateWhereStiff() {
        for (Method method : METHODS) {
            double[] exact = reference(2e3);
            double coarse = largest(exact, fixedSteps(method, 2e3, 40), 0, 4);
            double fine = largest(exact, fixedSteps(method, 2e3, 160), 0, 4);
            assertTrue(coarse < 1e-4, "error " + coarse);
            assertTrue(fine < coarse / 10, "error " + fine + " after " + coarse);
        }
    }

    @Test
    void flowsOfTheSameTermsCloseToRounding() {
        for (Method method : METHODS) {
            double[] found = fixedSteps(method, 50, 10);
            assertEquals(found[0] - 1, found[5], 1e-13);
        }
    }

    private static double[] fixedSteps(Method choice, double stiffness, int steps) {
        Cascade system = new Cascade(stiffness, 1);
        Rosenbrock method = choice.of(system);
        double[] y = {1, 0.5, 0.2, 0.3};
        double[] totals = new double[2];
        double h = END / steps;
        for (int i = 0; i < steps; i++) {
            method.startFrom(i * h, y);
            method.tryStep(i * h, y, h);
            method.addFlows(h, totals);
            System.arraycopy(method.end, 0, y, 0, 4);
        }
        return new double[] {y[0], y[1], y[2], y[3], totals[0], totals[1]};
    }

    private static double[] reference(double stiffness) {
        Cascade system = new Cascade(stiffness, 1);
        double[] y = {1, 0.5, 0.2, 0.3, 0};
        new DormandPrince853Integrator(1e-9, 0.1, 1e-13, 1e-13)
                .integrate(
                        new FirstOrderDifferentialEquations() {
                            @Override
                            public int getDimension() {
                                return 5;
                            }

                            @Override
                            public void computeDerivatives(double t, double[] x, double[] f) {
                                system.plain(t, x, f);
                                f[4] = x[0] * x[0] * t;
                            }
                        },
                        0,
                        y,
                        END,
                        y);
        return y;
    }

    private static double largest(double[] a, double[] b, int from, int to) {
        double worst = 0;
        for (int i = from; i < to; i++) {
            worst = Math.max(worst, Math.abs(a[i] - b[i]));
        }
        return worst;
    }
}
