package org.wardon.enclosure.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.section.SpaceReading.Space;

/** The section of a chest: its balance, its bounds, and what must come out of it. */
class StillAirTest {
    private static final Box CHEST = new Box(1.0, 2.0, 0.8);
    private static final double STACK_WMK = 0.378;

    /** Surfaces of left, right, floor and roof. */
    private static Chest chest(double[] surfaces, Optional<Stack> stack, double airHeatW) {
        Map<Side, Double> at =
                Map.of(
                        Side.LEFT, surfaces[0],
                        Side.RIGHT, surfaces[1],
                        Side.FLOOR, surfaces[2],
                        Side.ROOF, surfaces[3]);
        double mean = 0.25 * (surfaces[0] + surfaces[1] + surfaces[2] + surfaces[3]);
        return new Chest(CHEST, Cut.WEST_EAST, at, stack, airHeatW, mean, 101_325);
    }

    private static Optional<Stack> load(double m3, double heatW) {
        return Optional.of(new Stack(m3, STACK_WMK, heatW));
    }

    private static double[] of(double left, double right, double floor, double roof) {
        return new double[] {left, right, floor, roof};
    }

    private static SpaceReading space(StillAirSection section, Space which) {
        return section.spaces().stream()
                .filter(reading -> reading.space() == which)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void facesAlikeLeaveNoSpread() {
        StillAirSection empty = StillAir.of(chest(of(6, 6, 6, 6), Optional.empty(), 0));
        assertEquals(0, empty.spreadK(), 1e-9);
        assertEquals(6, empty.airMeanC(), 1e-9);
        assertEquals(0, StillAir.of(chest(of(6, 6, 6, 6), load(0.8, 0), 0)).spreadK(), 1e-9);
    }

    @Test
    void aWarmLidOverColdWallsIsWarmUnderItAndColdByTheWall() {
        StillAirSection section = StillAir.of(chest(of(4, 4, 7, 9), Optional.empty(), 0));
        Spot warm = section.field().warmest();
        Spot cold = section.field().coldest();
        assertEquals(0.8, warm.yM(), 1e-9);
        assertEquals(0.5, warm.xM(), 0.03);
        assertEquals(0, Math.min(cold.xM(), 1 - cold.xM()), 1e-9);
        assertTrue(warm.temperatureC() < 9 && cold.temperatureC() > 4);
        double before = 0;
        for (double roofC = 5; roofC < 20; roofC += 3) {
            double spread = StillAir.of(chest(of(4, 4, 4, roofC), Optional.empty(), 0)).spreadK();
            assertTrue(spread > before && spread < roofC - 4, roofC + " °C: " + spread + " K");
            before = spread;
        }
    }

    @Test
    void whatComesInAndIsGivenGoesOutAndNothingPassesItsBounds() {
        SplittableRandom draw = new SplittableRandom(21);
        for (int trial = 0; trial < 25; trial++) {
            double[] surfaces = draw.doubles(4, 1, 32).toArray();
            boolean loaded = trial % 3 > 0;
            double heat = trial % 3 == 2 ? 40 : 0;
            StillAirSection section =
                    StillAir.of(
                            chest(
                                    surfaces,
                                    loaded ? load(0.05 + 0.03 * trial, heat) : Optional.empty(),
                                    0));
            SectionField field = section.field();
            double sum = field.givenW() + field.exchangedW();
            double through = Math.abs(field.givenW()) + Math.abs(field.exchangedW());
            for (Side side : Side.values()) {
                sum += field.inW(side);
                through += Math.abs(field.inW(side));
            }
            String which = "seed 21, trial " + trial;
            assertEquals(0, sum, 1e-8 * through, which);
            double least = java.util.Arrays.stream(surfaces).min().orElseThrow();
            double most = java.util.Arrays.stream(surfaces).max().orElseThrow();
            assertTrue(field.coldest().temperatureC() >= least, which);
            assertTrue(heat > 0 || field.warmest().temperatureC() <= most, which);
        }
    }

    @Test
    void theGivenHeatIsThatOfLoadAndAirInAMetreOfDepth() {
        StillAirSection section = StillAir.of(chest(of(5, 5, 6, 8), load(0.72, 30), 12));
        // The stack is 1.8 m long; its air stands in 1.6 m3 less the stack.
        double loadW = 30 / 1.8;
        double airM2 = 0.8 - 0.72 / 1.8;
        double airW = 12 / (1.6 - 0.72) * airM2;
        assertEquals(loadW + airW, section.field().givenW(), 1e-9);
        assertEquals(0.5, section.chest().stackM(), 1e-12);
    }

    @Test
    void breathMakesTheMiddleOfTheStackTheWarmestPlace() {
        StillAirSection still = StillAir.of(chest(of(4, 4, 5, 6), load(0.9, 0), 0));
        StillAirSection breathing = StillAir.of(chest(of(4, 4, 5, 6), load(0.9, 45), 0));
        Spot warm = breathing.field().warmest();
        assertTrue(breathing.outline().orElseThrow().holds(warm), warm.toString());
        assertEquals(warm, breathing.warmestInStack().orElseThrow());
        assertTrue(breathing.field().meanC() > still.field().meanC() + 1);
        // Even heat between two faces with nothing in the way would bow by q L2/(8 k).
        double bow = 45 / 0.9 * 0.8 * 0.8 / (8 * STACK_WMK);
        double rise = warm.temperatureC() - breathing.coldestInStack().orElseThrow().temperatureC();
        assertTrue(rise < bow, rise + " K, " + bow);
    }

    @Test
    void aWarmFloorUnderAColdLidStirsTheAirAndAWarmLidDoesNot() {
        double[] turnsOver = of(7, 7, 11, 3);
        double[] lies = of(7, 7, 3, 11);
        StillAirSection stirred = StillAir.of(chest(turnsOver, Optional.empty(), 0));
        SpaceReading open = space(stirred, Space.OPEN);
        assertEquals(0.8, open.thicknessM(), 1e-12);
        assertEquals(8, open.differenceK(), 1e-9);
        assertEquals(
                AirSpace.layerNusselt(open.rayleigh(), true),
                open.nusselt(),
                0.01 * open.nusselt());
        StillAirSection lying = StillAir.of(chest(lies, load(0.5, 0), 0));
        assertEquals(1, space(lying, Space.BELOW).nusselt(), 0.01);
    }

    @Test
    void theStackIsNeverHigherThanLeavesItClearOfTheRoof() {
        StillAirSection full = StillAir.of(chest(of(4, 4, 5, 6), load(5, 45), 0));
        assertEquals(0.8 - 2 * 0.08, full.chest().stackM(), 1e-12);
        assertEquals(45 / 1.8, full.field().givenW(), 1e-9);
        StillAirSection little = StillAir.of(chest(of(4, 4, 5, 6), load(1e-4, 0.01), 0));
        assertEquals(0.02, little.chest().stackM(), 1e-12);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.3, 0.9})
    void finerCellsChangeLittle(double m3) {
        Optional<Stack> stack = m3 == 0 ? Optional.empty() : load(m3, 50 * m3);
        Chest chest = chest(of(3, 6, 7, 10), stack, 0);
        double usual = StillAir.of(chest).spreadK();
        double fine = StillAir.of(chest, 8).spreadK();
        assertEquals(fine, usual, 0.03 * fine);
    }

    @Source(
            "J. P. Holman, Heat Transfer: radiation between wide grey plates, sigma (T1^4 - T2^4)/(1/e1"
                    + " + 1/e2 - 1) (from memory)")
    @Test
    void radiationBetweenPlatesIsTheTangentOfTheFourthPower() {
        double warm = Math.pow(273.15 + 12, 4);
        double cold = Math.pow(273.15 + 8, 4);
        double exact = 5.67e-8 * (warm - cold) / (2 / 0.9 - 1) / 4;
        assertEquals(exact, org.wardon.enclosure.RadiantFilm.betweenWm2K(10), 1e-3 * exact);
    }

    @Test
    void refusesFewerThanFourSurfaces() {
        assertEquals(
                "four surfaces are needed, found [LEFT]",
                assertThrows(
                                IllegalArgumentException.class,
                                () ->
                                        new Chest(
                                                CHEST,
                                                Cut.WEST_EAST,
                                                Map.of(Side.LEFT, 4.0),
                                                Optional.empty(),
                                                0,
                                                5,
                                                101_325))
                        .getMessage());
    }
}
