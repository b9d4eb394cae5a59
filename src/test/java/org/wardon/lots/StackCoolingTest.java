package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;

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
}
