package org.wardon.cooling.solar;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;

/** Panels, battery and inverter by hand, and the battery's balance at random. */
class SolarLawsTest {
    private static final double KWH = 3.6e6;

    private static Battery battery(double kWh, double efficiency, double startPct) {
        return new Battery(new SolarSupply.Cells(kWh, efficiency, startPct, 20));
    }

    @Source("Duffie and Beckman, chapter 23, nominal cell temperature, from memory")
    @Test
    void panelAtItsNominalPointIsTwentyKelvinWarmAndLosesEightPercent() {
        // 800 W/m2 at 20 °C: cells at 45 °C, 20 K above the rating: 0.8 x 0.92.
        assertEquals(736, PanelPower.watts(1_000, 1, 800, 20), 1e-9);
        // 1000 W/m2 in frost of -6.25 °C: cells at 25 °C, the rating itself.
        assertEquals(800, PanelPower.watts(1_000, 0.8, 1_000, -6.25), 1e-9);
        assertEquals(0, PanelPower.watts(1_000, 0.8, 0, 30));
    }

    @Test
    void aBatteryGivesBackItsEfficiency() {
        Battery battery = battery(10, 0.81, 0);
        battery.pass(3_600, 1_000, 1_000, 0);
        assertEquals(0.9 * KWH, battery.storedJ(), 1e-6);
        assertEquals(0, battery.leastJ(3_600, 0, 0, 810), 1e-6, "a kWh in, 0.81 out");
        battery.pass(3_600, 0, 0, 405);
        assertEquals(0.45 * KWH, battery.storedJ(), 1e-6);
        assertEquals((0.1 + 0.045) * KWH, battery.lostJ(), 1e-6);
    }

    @Test
    void aFullBatterySpills() {
        Battery battery = battery(1, 1, 50);
        battery.pass(3_600, 1_200, 1_200, 200);
        assertEquals(0.5 * KWH, battery.spilledJ(), 1e-6);
        assertEquals(1, battery.share(), 1e-12);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void itsBalanceClosesWhateverComes(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Battery battery = battery(5, random.nextDouble(0.5, 1), 60);
        double start = battery.storedJ();
        for (int i = 0; i < 5_000; i++) {
            double seconds = random.nextDouble(1, 3_000);
            double from = random.nextDouble(0, 2_000);
            double to = random.nextDouble(0, 2_000);
            double drawn = random.nextDouble(0, 1_800);
            if (battery.leastJ(seconds, from, to, drawn) < 0) {
                drawn = 0;
            }
            double least = battery.leastJ(seconds, from, to, drawn);
            Battery before = copy(battery);
            battery.pass(seconds, from, to, drawn);
            assertTrue(least <= before.storedJ() + 1e-6 && least <= battery.storedJ() + 1e-6);
            assertTrue(battery.storedJ() >= 0 && battery.share() <= 1 + 1e-12, "seed " + seed);
        }
        double in = battery.panelJ() + start;
        double out = battery.usedJ() + battery.lostJ() + battery.spilledJ() + battery.storedJ();
        assertEquals(in, out, 1e-9 * in, "seed " + seed);
        assertTrue(battery.spilledJ() > 0 && battery.lostJ() > 0);
    }

    private static Battery copy(Battery of) {
        return new Battery(new SolarSupply.Cells(5, 1, 100 * of.share(), 20));
    }

    @Test
    void theTimeToAChargeIsWhenItIsReached() {
        Battery battery = battery(2, 0.9, 0);
        double slope = 500.0 / 3_600;
        double seconds = battery.secondsTo(0.1, 20, slope, 3_600);
        battery.pass(seconds, 20, 20 + slope * seconds, 0);
        assertEquals(0.1, battery.share(), 1e-12);
        assertEquals(Double.POSITIVE_INFINITY, battery.secondsTo(0.9, 20, slope, 3_600));
        assertEquals(0, battery.secondsTo(0.05, 0, 0, 3_600));
        double falling = battery.secondsTo(0.12, 300, -300.0 / 3_600, 3_600);
        battery.pass(falling, 300, 300 - 300.0 / 3_600 * falling, 0);
        assertEquals(0.12, battery.share(), 1e-12);
    }

    @Test
    void anInverterCarriesCoolersInOrderWhileTheyFit() {
        Cooler large = unit(4_000, 1_600);
        Cooler small = unit(1_000, 400);
        List<Cooler> coolers = List.of(small, large, small);
        double most = small.mostElectricW();
        assertEquals(
                List.of(true, false, true),
                Inverter.carries(OptionalDouble.of(2 * most + 100), 100, coolers));
        assertEquals(
                List.of(true, true, true), Inverter.carries(OptionalDouble.empty(), 100, coolers));
        assertEquals(
                List.of(false, false, false),
                Inverter.carries(OptionalDouble.of(50), 100, coolers));
    }

    private static Compressor unit(double capacityW, double powerW) {
        return new Compressor(
                capacityW,
                powerW,
                10,
                35,
                50,
                false,
                capacityW / 6,
                capacityW / 6_000,
                Control.ON_OFF,
                2,
                3,
                3,
                -5,
                Optional.empty(),
                OptionalDouble.empty());
    }

    @Test
    void outagesThatOverlapOrTouchBecomeOne() {
        assertEquals(
                List.of(new Outage(0, 30), new Outage(40, 50)),
                Outage.joined(
                        List.of(
                                new Outage(40, 50),
                                new Outage(0, 10),
                                new Outage(5, 20),
                                new Outage(20, 30),
                                new Outage(42, 45))));
    }
}
