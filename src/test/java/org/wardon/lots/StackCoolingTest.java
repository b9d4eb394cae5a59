package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;

/** The rule of a stack against the exact series, and the rest of a heap that breathes. */
class StackCoolingTest {
    @Source("exact series of a slab without and with film")
    @Test
    void halfTimeIsThatOfASlab() {
        StackCooling tight = new StackCooling(0.5, 1.8e-7, 2.1e6, 1000);
        SeriesSolution bare = SeriesSolution.of(Shape.SLAB, Double.POSITIVE_INFINITY);
        double exactS = bare.fourierWhenMean(0.5) * 0.25 / 1.8e-7;
        assertEquals(exactS, tight.halfS() - 0.69 * 2.1e6 * 0.5 / 1000, 0.005 * exactS);
        double biot = 10 * 0.5 / (1.8e-7 * 2.1e6);
        double withFilmS = SeriesSolution.of(Shape.SLAB, biot).fourierWhenMean(0.5) * 0.25 / 1.8e-7;
        // the sum of both terms is the rule's own shortening of the series
        assertEquals(withFilmS, StackCooling.of(0.5).halfS(), 0.05 * withFilmS);
    }

    @Test
    void restsWhereItLosesWhatItBreathes() {
        double capacity = 3800;
        double halfS = 30 * 3600;
        double conductance = 0.693 * capacity / halfS;
        assertEquals(0.05 / conductance, StackCooling.selfHeatingK(0.05, halfS, capacity), 1e-9);
        assertEquals(10 / Math.log(2.5), StackCooling.RUNAWAY_K, 0.1);
    }

    private static RespirationLaw breath(double atZeroC, double q10) {
        double perK = Math.log(q10) / 10;
        return new RespirationLaw() {
            @Override
            public double wattsPerKg(double temperatureC) {
                return atZeroC * Math.exp(perK * temperatureC);
            }

            @Override
            public double slopeWattsPerKgK(double temperatureC) {
                return perK * wattsPerKg(temperatureC);
            }
        };
    }

    @Source("N. N. Semenov 1928: heat as exp(x) meets loss as x up to x = 1, from memory")
    @Test
    void aStackOfQ10TwoAndAHalfRunsAwayAtElevenKelvin() {
        double capacity = 3800;
        double halfS = 30 * 3600;
        double scaleK = 10 / Math.log(2.5);
        double most = scaleK / Math.E * 0.693 * capacity / halfS;
        double justRests =
                StackCooling.restsAtK(breath(0.9999 * most, 2.5), 0, halfS, capacity).orElseThrow();
        assertEquals(scaleK, justRests, 0.2);
        assertEquals(StackCooling.RUNAWAY_K, justRests, 0.3);
        assertTrue(StackCooling.restsAtK(breath(1.001 * most, 2.5), 0, halfS, capacity).isEmpty());
    }

    @Test
    void restIsWhereBreathingAtItsOwnTemperatureIsLost() {
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < 200; i++) {
            RespirationLaw law = breath(0.005 + 0.02 * random.nextDouble(), 2.5);
            double airC = 20 * random.nextDouble();
            double halfS = 3600 * (2 + 30 * random.nextDouble());
            OptionalDouble rest = StackCooling.restsAtK(law, airC, halfS, 3700);
            if (rest.isPresent()) {
                double x = rest.getAsDouble();
                double gives = StackCooling.selfHeatingK(law.wattsPerKg(airC + x), halfS, 3700);
                assertEquals(x, gives, 0.01);
                assertTrue(
                        x > StackCooling.selfHeatingK(law.wattsPerKg(airC), halfS, 3700) - 1e-9,
                        "warmer produce breathes more");
            }
        }
    }
}
