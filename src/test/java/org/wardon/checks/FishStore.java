package org.wardon.checks;

import java.util.List;
import org.wardon.Source;
import org.wardon.advice.size.DesignLoad;
import org.wardon.advice.size.LoadTerms;

/** A frozen-fish store of 20 x 10 x 5 m at -30 °C, 35 °C outdoors. */
final class FishStore {
    private static final double KILOCALORIE_J = 4_186.8;

    private FishStore() {}

    /**
     * Leak, air, lights, two workers, product, fans. The conductivity is the 0.037 kcal/(h m K)
     * that gives the printed leak; 0.033 is printed and does not.
     */
    @Source("FAO Fisheries Technical Paper 340 (1994), chapter 8, cold store refrigeration load")
    static DesignLoad firstSix() {
        double wattsM2K = 0.037 * KILOCALORIE_J / 3_600 / 0.25;
        double workerW = 378 * KILOCALORIE_J / 3_600;
        return new DesignLoad(
                List.of(
                        LoadTerms.transmission("all faces", wattsM2K, 771.5, 35 + 30, 0),
                        LoadTerms.airChange("store", 2.7, 1_000, 40 * KILOCALORIE_J),
                        LoadTerms.lights("store", 1_000, 24),
                        LoadTerms.people("store", 2 * 24, workerW),
                        LoadTerms.product("fish", 35_000, 35_000 * 5.5 * KILOCALORIE_J, 24),
                        LoadTerms.fans("store", 3 * 250, 24)),
                0,
                24);
    }
}
