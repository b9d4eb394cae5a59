package org.wardon.keeping.ethylene;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Exchange and cleaning of a chamber's air against the exact answer of a well-mixed vessel. */
class ChamberAirTest {
    private static final double FREE_M3 = 15;

    private static ChamberAir air(double exchangeM3H, double cleanedM3H, int hours) {
        double[] time = new double[hours + 1];
        Arrays.setAll(time, i -> 3_600.0 * i);
        double[] exchange = new double[hours + 1];
        Arrays.fill(exchange, exchangeM3H / 3_600);
        double[] free = new double[hours + 1];
        Arrays.fill(free, FREE_M3);
        double[] cleaned = new double[hours + 1];
        Arrays.fill(cleaned, cleanedM3H / 3_600);
        return new ChamberAir(time, exchange, free, cleaned);
    }

    private static double atEnd(ChamberAir air, double microlitreH, double outdoorPpm) {
        double ppm = outdoorPpm;
        for (int i = 0; i + 1 < air.size(); i++) {
            ppm = air.after(i, ppm, microlitreH, outdoorPpm);
        }
        return ppm;
    }

    @Test
    void restsWhereWhatIsGivenIsCarriedAwayAndCleaned() {
        // 3 mL/h into 5 m3/h of outdoor air at 0.01 ppm and 40 m3/h cleaned: litres are 1e-3 m3.
        double rest = (3_000 / 1e3 + 5 * 0.01) / (5 + 40);
        assertEquals(rest, atEnd(air(5, 40, 100), 3_000, 0.01), 1e-9);
        assertEquals((3 + 0.05) / 5, atEnd(air(5, 0, 400), 3_000, 0.01), 1e-9);
    }

    @Test
    void cleaningAloneTakesEvenWhatComesFromOutdoors() {
        double falls = atEnd(air(0, 30, 1), 0, 0.5);
        assertEquals(0.5 * Math.exp(-30 / FREE_M3), falls, 1e-12);
    }

    @Test
    void aCubicMetreCleanedIsWorthACubicMetreOfCleanAir() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 100; i++) {
            double exchange = 20 * random.nextDouble();
            double cleaned = 20 * random.nextDouble();
            double given = 5_000 * random.nextDouble();
            assertEquals(
                    atEnd(air(exchange + cleaned, 0, 9), given, 0),
                    atEnd(air(exchange, cleaned, 9), given, 0),
                    1e-12);
        }
    }

    @Test
    void cleaningThatCannotBeIsRefused() {
        assertEquals(
                "cleanedM3s is -1.0 m3/s; accepted is 0.0 to 10000.0 m3/s.",
                assertThrows(IllegalArgumentException.class, () -> air(1, -3_600, 3))
                        .getMessage()
                        .strip());
    }
}
