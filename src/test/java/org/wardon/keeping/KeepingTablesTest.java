package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.keeping.life.GenericCurve;
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
}
