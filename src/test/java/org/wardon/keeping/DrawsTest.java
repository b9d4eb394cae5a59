package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;

class DrawsTest {
    private static final List<ToDoubleFunction<Draw>> ALL =
            List.of(
                    Draw::lifeLevel,
                    Draw::slope,
                    Draw::chilling,
                    Draw::transpiration,
                    Draw::respiration,
                    Draw::packaging,
                    Draw::delay,
                    Draw::ethyleneReference,
                    Draw::ethyleneGiven,
                    Draw::market,
                    Draw::ripening,
                    Draw::dormancy,
                    Draw::curing,
                    Draw::ripeningPace);

    @Test
    void sameSeedGivesTheSameDrawsAndAnotherSeedOthers() {
        assertEquals(Draws.seeded(7, 32), Draws.seeded(7, 32));
        assertNotEquals(Draws.seeded(7, 32), Draws.seeded(8, 32));
    }

    @Test
    void longerListBeginsWithTheShorterAndNumbersCountFromOne() {
        List<Draw> longer = Draws.seeded(1, 64);
        assertEquals(Draws.seeded(1, 32), longer.subList(0, 32));
        for (int i = 0; i < longer.size(); i++) {
            assertEquals(i + 1, longer.get(i).number());
        }
    }

    /**
     * Of 32 shifted Sobol points, each sixteenth of each range holds 1 to 3 (exactly 2 unshifted).
     */
    @Test
    void everyRangeIsCoveredEvenly() {
        for (long seed = 1; seed <= 20; seed++) {
            for (ToDoubleFunction<Draw> quantile : ALL) {
                int[] cells = new int[16];
                for (Draw draw : Draws.seeded(seed, 32)) {
                    cells[(int) (16 * quantile.applyAsDouble(draw))]++;
                }
                for (int count : cells) {
                    assertTrue(count >= 1 && count <= 3, "seed " + seed + ": " + count);
                }
            }
        }
    }

    @Test
    void meansOfThePairwiseProductsAreThoseOfIndependentRanges() {
        List<Draw> draws = Draws.seeded(3, 1024);
        for (int a = 0; a < ALL.size(); a++) {
            for (int b = a + 1; b < ALL.size(); b++) {
                double sum = 0;
                for (Draw draw : draws) {
                    sum += ALL.get(a).applyAsDouble(draw) * ALL.get(b).applyAsDouble(draw);
                }
                assertEquals(0.25, sum / draws.size(), 0.01, a + " with " + b);
            }
        }
    }
}
