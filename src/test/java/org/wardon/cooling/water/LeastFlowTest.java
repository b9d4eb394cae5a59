package org.wardon.cooling.water;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;
import org.wardon.cooling.water.LeastFlow.Air;
import org.wardon.cooling.water.LeastFlow.Answer;
import org.wardon.cooling.water.LeastFlow.Wall;

/** The least flow of an open film, and the wall it keeps. */
class LeastFlowTest {
    private static final double P = 101_325;
    private static final Air AIR = new Air(14, MoistAir.humidityRatioAt(14, 0.9, P), P);
    private static final Wall BRICK = new Wall(2.5, 4, 1.8, 34);

    @Test
    void theFlowFoundKeepsTheWallAndLessDoesNot() {
        SplittableRandom random = new SplittableRandom(3);
        int found = 0;
        for (int k = 0; k < 60; k++) {
            Wall wall =
                    new Wall(
                            random.nextDouble(1, 4),
                            random.nextDouble(1, 8),
                            random.nextDouble(0.2, 4),
                            random.nextDouble(20, 50));
            double inlet = random.nextDouble(1, 8);
            double wanted = inlet + random.nextDouble(0.3, 4);
            if (LeastFlow.of(wall, AIR, inlet, wanted) instanceof Answer.Flow flow) {
                found++;
                double kgS = flow.flowKgS();
                assertEquals(wanted, LeastFlow.wallC(wall, AIR, inlet, kgS), 1e-6);
                assertTrue(LeastFlow.wallC(wall, AIR, inlet, 0.9 * kgS) > wanted);
                assertTrue(flow.outletC() > inlet && flow.outletC() < Math.max(wanted, 14));
            }
        }
        assertTrue(found > 40, "flows found: " + found);
    }

    /**
     * By hand: water of 5 °C rises to the wall but for the drop of its film; what comes through 10
     * m2 at 1.8 W/(m2 K) from 34 to 8 °C is 468 W, air gives about 10 m2 x (8 to 9) W/(m2 K) x 7 K
     * and latent heat. The flow must carry at least the wall's share and at most thrice that.
     */
    @Test
    void theFlowIsOfTheSizeOfTheHeat() {
        Answer.Flow flow = assertInstanceOf(Answer.Flow.class, LeastFlow.of(BRICK, AIR, 5, 8));
        double carried = flow.flowKgS() * MoistAir.WATER_J_KG_K * (flow.outletC() - 5);
        assertTrue(carried > 468 && carried < 3 * 468, "carried " + carried);
    }

    @Test
    void colderWallsTakeMoreWater() {
        double last = 0;
        for (double wanted : new double[] {12, 10, 8, 7, 6}) {
            Answer.Flow flow =
                    assertInstanceOf(Answer.Flow.class, LeastFlow.of(BRICK, AIR, 5, wanted));
            assertTrue(flow.flowKgS() > last, wanted + " °C takes " + flow.flowKgS());
            last = flow.flowKgS();
        }
    }

    @Test
    void aWallColdAlreadyNeedsNoneAndWaterTooWarmNeverDoes() {
        Answer.NotNeeded none =
                assertInstanceOf(Answer.NotNeeded.class, LeastFlow.of(BRICK, AIR, 5, 25));
        assertTrue(none.wallC() < 25 && none.wallC() > 14);
        Answer.OutOfReach never =
                assertInstanceOf(Answer.OutOfReach.class, LeastFlow.of(BRICK, AIR, 9, 8.9));
        assertTrue(never.coldestC() > 9 && never.coldestC() < 9.2, never.toString());
    }

    @Test
    void hugeFlowBringsTheWallToTheInlet() {
        assertEquals(5, LeastFlow.wallC(BRICK, AIR, 5, 900), 0.05);
    }
}
