package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.Control;
import org.wardon.errors.Progress;

/**
 * A full chamber (12 lots, sun, door pulses, people, modulating compressor) against an explicit
 * integrator of Commons Math at tight tolerance on the laws asked directly.
 */
class ReferenceIntegratorTest {
    private static final double DAYS = 1;
    private static final ChamberRun RUN = Chambers.full(Control.MODULATING, 12, DAYS);
    private static final List<double[]> REFERENCE = new ArrayList<>();
    private static final List<Double> AIR_MEAN = new ArrayList<>();

    /** Integrates edge by edge; keeps surface and core of each lot and the mean air, hourly. */
    @BeforeAll
    static void integrateReference() {
        new ExplicitRun(RUN, true, new ExplicitRun.Tolerance(1e-7, 1e-9))
                .go(
                        (network, y, meanAirC) -> {
                            AIR_MEAN.add(meanAirC);
                            double[] lots = new double[2 * RUN.stays().size()];
                            for (int i = 0; i < RUN.stays().size(); i++) {
                                lots[2 * i] = network.lot(i).surfaceC(y);
                                lots[2 * i + 1] = network.lot(i).coreC(y);
                            }
                            REFERENCE.add(lots);
                        });
    }

    private static double worstLotK(Course course) {
        double worst = 0;
        for (int hour = 0; hour < REFERENCE.size(); hour++) {
            for (int i = 0; i < RUN.stays().size(); i++) {
                LotCourse lot = course.lots().get(i);
                int row = hour + 1;
                assertEquals((hour + 1) * 3600.0, lot.atS(row), 1e-9);
                double[] exact = REFERENCE.get(hour);
                worst = Math.max(worst, Math.abs(lot.surfaceC(row) - exact[2 * i]));
                worst = Math.max(worst, Math.abs(lot.coreC(row) - exact[2 * i + 1]));
            }
        }
        return worst;
    }

    private static double worstAirK(Course course) {
        double worst = 0;
        for (int hour = 0; hour < AIR_MEAN.size(); hour++) {
            worst = Math.max(worst, Math.abs(course.hours().airC(hour) - AIR_MEAN.get(hour)));
        }
        return worst;
    }

    @Test
    void agreesToFiveThousandthsOfAKelvin() {
        Course course = HeatModel.run(RUN, Progress.SILENT, new Accuracy(2e-4, 1e-3), false);
        assertTrue(worstLotK(course) < 0.005, "lots " + worstLotK(course) + " K");
        assertTrue(worstAirK(course) < 0.005, "air " + worstAirK(course) + " K");
    }

    @Test
    void theUsualAccuracyKeepsLotsWithinTwoHundredths() {
        Course course = HeatModel.run(RUN, Progress.SILENT);
        assertTrue(worstLotK(course) < 0.02, "lots " + worstLotK(course) + " K");
        assertTrue(worstAirK(course) < 0.06, "air " + worstAirK(course) + " K");
    }

    @Test
    void errorFallsWithTheTolerance() {
        double last = Double.POSITIVE_INFINITY;
        for (double airK : new double[] {0.1, 0.01, 0.001}) {
            Course course = HeatModel.run(RUN, Progress.SILENT, new Accuracy(airK / 5, airK), true);
            double worst = worstLotK(course) + worstAirK(course);
            assertTrue(worst < last / 2, "at " + airK + ": " + worst + " after " + last);
            last = worst;
        }
    }
}
