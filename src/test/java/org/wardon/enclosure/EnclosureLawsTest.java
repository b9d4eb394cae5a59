package org.wardon.enclosure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.enclosure.BridgedElement.BridgedLayer;
import org.wardon.enclosure.BridgedElement.Part;
import org.wardon.enclosure.GroundFloor.Soil;

/** What must hold of the laws of the enclosure whatever the figures. */
class EnclosureLawsTest {
    private static Layer layer(SplittableRandom random) {
        return new Layer(
                "own",
                random.nextDouble(0.001, 0.4),
                random.nextDouble(0.02, 3),
                random.nextDouble(10, 3_000),
                random.nextDouble(400, 2_500));
    }

    @Test
    void everyLayerLowersTheTransmittanceAndTheWaveThroughIt() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 200; i++) {
            List<Layer> layers = new ArrayList<>(List.of(layer(random)));
            double before = UValue.wattsM2K(layers, 0.13, 0.04);
            layers.add(layer(random));
            double u = UValue.wattsM2K(layers, 0.13, 0.04);
            assertTrue(u > 0 && u < before);
            PeriodicTransmittance wave = PeriodicTransmittance.of(layers, 0.13, 0.04, 86_400);
            assertTrue(wave.decrement() > 0 && wave.decrement() < 1 + 1e-12);
            assertTrue(wave.shiftS() <= 0 && wave.shiftS() >= -86_400);
        }
    }

    @Test
    void slowWaveIsTheSteadyState() {
        SplittableRandom random = new SplittableRandom(4);
        for (int i = 0; i < 50; i++) {
            List<Layer> layers = List.of(layer(random), layer(random));
            PeriodicTransmittance wave = PeriodicTransmittance.of(layers, 0.13, 0.04, 1e11);
            assertEquals(1, wave.decrement(), 1e-6);
        }
    }

    @Test
    void evenElementHasOneResistanceAndBridgedOneLiesBetweenItsLimits() {
        BridgedElement even =
                new BridgedElement(
                        List.of(BridgedLayer.even(0.1, 0.04), BridgedLayer.even(0.2, 0.5)),
                        0.13,
                        0.04);
        assertEquals(even.lowerM2KW(), even.upperM2KW(), 1e-12);
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < 200; i++) {
            double share = random.nextDouble(0.01, 0.99);
            Part wood = new Part(share, random.nextDouble(0.1, 1));
            Part wool = new Part(1 - share, random.nextDouble(0.02, 0.1));
            BridgedElement bridged =
                    new BridgedElement(
                            List.of(
                                    new BridgedLayer(0.1, List.of(wood, wool)),
                                    new BridgedLayer(0.05, List.of(wool, wood))),
                            0.13,
                            0.04);
            assertTrue(bridged.lowerM2KW() <= bridged.upperM2KW());
            double u = bridged.wattsM2K();
            assertTrue(1 / bridged.upperM2KW() <= u && u <= 1 / bridged.lowerM2KW());
        }
        assertThrows(
                IllegalArgumentException.class,
                () -> new BridgedLayer(0.1, List.of(new Part(0.5, 1))));
    }

    @Test
    void soilLayersMakeUpTheResistanceOfTheSlab() {
        SplittableRandom random = new SplittableRandom(6);
        for (int i = 0; i < 300; i++) {
            double a = random.nextDouble(0.5, 30);
            double b = random.nextDouble(0.5, 30);
            GroundFloor floor =
                    new GroundFloor(
                            a * b, 2 * (a + b), random.nextDouble(0, 0.5), Soil.CLAY_OR_SILT);
            double rf = random.nextDouble(0, 5);
            List<Layer> soil = floor.soilLayers(rf, 0.17);
            double total = UValue.resistanceM2KW(soil) + rf + 0.17;
            assertEquals(1 / floor.wattsM2K(rf, 0.17), total, 1e-9 * total);
            assertTrue(soil.get(1).capacityJm2K() > 0);
        }
    }

    @Test
    void slabBranchesMeetWhereTheStandardChanges() {
        // Well insulated from dt = B on: the two formulas of the standard differ there by under 1
        // %.
        GroundFloor floor = new GroundFloor(100, 40, 0.3, Soil.SAND_OR_GRAVEL);
        double edge = (floor.characteristicM() - 0.3) / 2.0 - 0.17 - 0.04;
        double below = floor.wattsM2K(edge - 1e-6, 0.17);
        double above = floor.wattsM2K(edge + 1e-6, 0.17);
        assertEquals(below, above, 0.01 * below);
    }

    @Test
    void doorExchangeIsTheSameBothWaysAndNothingAtEqualDensity() {
        SplittableRandom random = new SplittableRandom(8);
        for (int i = 0; i < 500; i++) {
            double room = random.nextDouble(0.9, 1.4);
            double beyond = random.nextDouble(0.9, 1.4);
            double flow = DoorExchange.flowKgS(room, beyond, 0.9, 2);
            assertEquals(flow, DoorExchange.flowKgS(beyond, room, 0.9, 2), 1e-12);
            assertTrue(flow >= 0);
            assertEquals(0, DoorExchange.flowKgS(room, room, 0.9, 2));
        }
        assertTrue(DoorExchange.flowKgS(1.2, 1.2001, 0.9, 2) > 0);
    }

    @Test
    void doorExchangeIsSmoothThroughEqualDensity() {
        // The slope vanishes there and grows steadily: no kink for the solver to stumble on.
        double h = 1e-9; // where a plain square root would slope by 60 000
        double slope =
                (DoorExchange.flowKgS(1.2 + h, 1.2, 0.9, 2)
                                - DoorExchange.flowKgS(1.2, 1.2, 0.9, 2))
                        / h;
        assertEquals(0, slope, 0.01);
        double last = 0;
        for (double d = 1e-6; d < 0.2; d *= 1.3) {
            double flow = DoorExchange.flowKgS(1.2 + d, 1.2, 0.9, 2);
            assertTrue(flow > last);
            last = flow;
        }
    }

    @Test
    void smallChamberEmptiesOnceAnOpening() {
        assertEquals(1.0, DoorExchange.volumeAnOpeningM3(0.5, 1e6, 1.0), 1e-12);
        assertEquals(0.5 * 60, DoorExchange.volumeAnOpeningM3(0.5, 60, 1e9), 1e-5);
        assertEquals(0, DoorExchange.volumeAnOpeningM3(0.5, 0, 10));
        assertEquals(0.12, DoorExchange.share(0.8, 0.85), 1e-15);
    }

    @Test
    void lumpedChamberAndGasLevelFollowTheirOwnRates() {
        LumpedChamber lump = new LumpedChamber(25, 4e7, 400, 30);
        double t = 10;
        // The slope of the exact answer is the balance: C dT/dt = UA (Ta - T) + internal.
        for (double s = 0; s < 1e6; s += 1e5) {
            double slope = (lump.temperatureC(t, s + 1) - lump.temperatureC(t, s - 1)) / 2;
            double balance = 25 * (30 - lump.temperatureC(t, s)) + 400;
            assertEquals(balance, 4e7 * slope, 1e-4 * balance);
        }
        assertEquals(12, lump.temperatureC(t, lump.timeToS(t, 12)), 1e-9);
        assertEquals(Double.POSITIVE_INFINITY, lump.timeToS(t, 60));
        assertEquals(Double.POSITIVE_INFINITY, lump.timeToS(t, 5));
        assertEquals(0, lump.timeToS(t, t));
        GasLevel tight = new GasLevel(1_000, 0, 420);
        assertEquals(2_420, tight.afterPpm(420, 2));
        assertEquals(2, tight.timeToH(420, 2_420));
        GasLevel leaky = new GasLevel(1_000, 0.5, 420);
        assertEquals(Double.POSITIVE_INFINITY, leaky.timeToH(420, 3_000));
        assertEquals(2_000, leaky.afterPpm(420, leaky.timeToH(420, 2_000)), 1e-9);
        double changes = GasLevel.airChangesToHold(1_000, 1_420, 420);
        assertEquals(1_420, new GasLevel(1_000, changes, 420).restsAtPpm(), 1e-9);
    }

    @Source("White, Viscous Fluid Flow, and Incropera and others, table A.4 at 300 K, from memory")
    @Test
    void airHasTheTabulatedProperties() {
        NaturalConvection.Gas air = NaturalConvection.Gas.air(26.85, 101_325);
        // Table: nu 15.89e-6, k 26.3e-3, alpha 22.5e-6, Pr 0.707. Sutherland's law claims 2 %.
        assertEquals(15.89e-6, air.viscosityM2s(), 0.02 * 15.89e-6);
        assertEquals(0.0263, air.conductivityWmK(), 0.02 * 0.0263);
        assertEquals(22.5e-6, air.diffusivityM2s(), 0.02 * 22.5e-6);
        assertEquals(0.707, air.prandtl(), 0.02 * 0.707);
    }

    @Test
    void coldCeilingStirsMoreThanColdFloorAndComputedFilmsAreNearTheFixedOnes() {
        Box box = new Box(4, 3, 2.5);
        double ceiling = NaturalConvection.filmWm2K(FaceName.ROOF, box, 8, 12, 101_325);
        double floor = NaturalConvection.filmWm2K(FaceName.FLOOR, box, 8, 12, 101_325);
        double warmFloor = NaturalConvection.filmWm2K(FaceName.FLOOR, box, 16, 12, 101_325);
        assertTrue(ceiling > 2 * floor);
        assertTrue(warmFloor > 2 * floor);
        double wall = Films.computedM2KW(FaceName.NORTH, box, 15, 12, 101_325);
        assertEquals(Films.insideM2KW(HeatFlow.LEVEL), wall, 0.03);
    }

    @Test
    void outdoorFilmFallsWithWind() {
        assertEquals(0.04, Films.outsideM2KW(Double.NaN));
        assertEquals(1 / 25.5, Films.outsideM2KW(4), 1e-15);
        assertTrue(Films.outsideM2KW(1) > Films.outsideM2KW(5));
    }

    @Test
    void peopleGiveLessHeatInWarmChambers() {
        assertEquals(182, PeopleHeat.watts(15));
        assertEquals(152, PeopleHeat.watts(35));
        assertEquals(-6, PeopleHeat.slopeWattsPerK(10));
        assertEquals(0, PeopleHeat.slopeWattsPerK(35));
    }

    @Test
    void directionFollowsTheWarmerSide() {
        assertEquals(HeatFlow.DOWN, HeatFlow.through(FaceName.ROOF, 40, 12));
        assertEquals(HeatFlow.UP, HeatFlow.through(FaceName.ROOF, 2, 12));
        assertEquals(HeatFlow.UP, HeatFlow.through(FaceName.FLOOR, 25, 12));
        assertEquals(HeatFlow.DOWN, HeatFlow.through(FaceName.FLOOR, 5, 12));
        assertEquals(HeatFlow.LEVEL, HeatFlow.through(FaceName.EAST, 25, 12));
    }
}
