package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Timeline;
import org.wardon.keeping.life.GenericCurve;
import org.wardon.lots.LotHistory;
import org.wardon.produce.rows.Q10Row;

/** Figures that stand in the keeping room against the tables they come from. */
class KeepingTablesTest {
    @Test
    @Source("ah66-2002-tab, Table 20.3, as in q10.csv")
    void genericCurveIsThatOfTheHandbook() {
        int checked = 0;
        for (Q10Row row : Crops.get("okra").keeping().q10s()) {
            int decade = (int) Math.round(row.lowC() / 10);
            if (row.q10().lowest() == row.q10().highest()) {
                assertEquals(row.q10().lowest(), GenericCurve.q10(decade), 1e-9);
            } else {
                assertTrue(row.q10().lowest() <= GenericCurve.q10(decade));
                assertTrue(row.q10().highest() >= GenericCurve.q10(decade));
            }
            checked++;
        }
        assertEquals(8, checked);
    }

    @Test
    @Source("ah66-2002-tab, Table 20.3: relative shelf life 100, 33, 13, 7, 4 at 0 to 40 °C")
    void relativeLifeIsThatOfTheHandbook() {
        GenericCurve curve = new GenericCurve(1);
        double[] printed = {100, 33, 13, 7, 4};
        for (int i = 0; i < printed.length; i++) {
            assertEquals(printed[i], 100 / Math.exp(curve.lnRate(10 * i)), 0.5);
        }
    }

    @Test
    void twelveLotsInThirtyTwoDrawsOverTenDaysTakeLittle() {
        LotHistory.Builder hours = new LotHistory.Builder();
        for (int h = 0; h <= 240; h++) {
            double t = 12 + 2 * Math.sin(h * Math.PI / 12);
            hours.add(h * Timeline.HOUR_S, t, t, t, 0.9, 0.1, false);
        }
        LotHistory history = hours.build();
        KeepingModel model = Crops.model("mango");
        List<Draw> draws = Draws.seeded(1, 32);
        double best = Double.POSITIVE_INFINITY;
        for (int run = 0; run < 5; run++) {
            long start = System.nanoTime();
            double sum = 0;
            for (int lot = 0; lot < 12; lot++) {
                for (Draw draw : draws) {
                    sum += model.follow(history, draw).daysLeft(0);
                }
            }
            assertTrue(sum > 0);
            best = Math.min(best, (System.nanoTime() - start) * 1e-9);
        }
        assertTrue(best < 0.4, best + " s");
    }
}
