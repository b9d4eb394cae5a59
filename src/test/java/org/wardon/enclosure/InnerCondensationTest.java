package org.wardon.enclosure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.SaturatedAir;
import org.wardon.enclosure.InnerCondensation.Answer;
import org.wardon.enclosure.InnerCondensation.Side;

/** Water inside faces, against sums on paper and another way of solving the same problem. */
class InnerCondensationTest {
    private static final Side TROPICS = air(29, 0.8, 0.04);
    private static final Side COLD = air(2, 0.9, 0.13);
    private static final Layer BRICK = layer("brick", 0.2, 0.72, 16);
    private static final Layer FOAM = layer("eps", 0.1, 0.036, 60);
    private static final Layer SHEET = layer("steel", 0.0005, 50, 1e6);
    private static final Layer FILM = layer("film", 0.0002, 0.33, 100_000);

    private static Side air(double temperatureC, double humidity, double film) {
        return new Side(temperatureC, humidity * SaturatedAir.pressurePa(temperatureC), film);
    }

    private static Layer layer(String id, double thicknessM, double conductivity, double factor) {
        return new Layer(id, thicknessM, conductivity, 100, 1000, known(OptionalDouble.of(factor)));
    }

    private static Layer.InPlace known(OptionalDouble factor) {
        return new Layer.InPlace(1, Layer.Damp.DRY, Optional.empty(), factor);
    }

    @Test
    @Source("ISO 13788:2012, one plane of condensation, from memory")
    void insulationBehindATightInnerSheetGathersWhatComesThroughIt() {
        Answer.Wet wet =
                assertInstanceOf(
                        Answer.Wet.class,
                        InnerCondensation.of(List.of(BRICK, FOAM, SHEET), TROPICS, COLD));
        assertEquals(1, wet.layer());
        assertTrue(wet.fromOutside());
        // What comes in: the steepest straight fall from outdoors to saturation in the foam.
        double whole = 0.04 + 0.2 / 0.72 + 0.1 / 0.036 + 0.0005 / 50 + 0.13;
        double come = 0;
        for (double depth = 0; depth <= 0.1; depth += 1e-5) {
            double c = 29 - 27 * (0.04 + 0.2 / 0.72 + depth / 0.036) / whole;
            double fall = TROPICS.vapourPa() - SaturatedAir.pressurePa(c);
            come = Math.max(come, 2e-10 * fall / (16 * 0.2 + 60 * depth));
        }
        assertEquals(come, wet.kgM2S(), 0.01 * come);
    }

    @Test
    void aBarrierOnTheWarmSideKeepsItDryAndOnTheColdSideMakesItWet() {
        assertEquals(
                new Answer.Dry(), InnerCondensation.of(List.of(FILM, FOAM, BRICK), TROPICS, COLD));
        assertInstanceOf(
                Answer.Wet.class, InnerCondensation.of(List.of(BRICK, FOAM, FILM), TROPICS, COLD));
        assertEquals(
                new Answer.Dry(), InnerCondensation.of(List.of(SHEET, FOAM, SHEET), TROPICS, COLD));
    }

    @Test
    void dampFromInsideIsToldAsSuch() {
        Side winter = air(-5, 0.8, 0.04);
        Side store = air(8, 0.95, 0.13);
        Answer.Wet wet =
                assertInstanceOf(
                        Answer.Wet.class,
                        InnerCondensation.of(
                                List.of(FILM, layer("wool", 0.1, 0.04, 1)), winter, store));
        assertEquals(1, wet.layer());
        assertEquals(false, wet.fromOutside());
    }

    @Test
    void anUnknownLayerIsToldUnlessTheDampSideIsShut() {
        Layer own = new Layer("own", 0.1, 0.036, 20, 1400, known(OptionalDouble.empty()));
        assertEquals(
                new Answer.Unknown(1),
                InnerCondensation.of(List.of(BRICK, own, SHEET), TROPICS, COLD));
        assertEquals(
                new Answer.Dry(), InnerCondensation.of(List.of(SHEET, own, SHEET), TROPICS, COLD));
        // Damp inside, shut towards it: the order is counted from the damp side.
        assertEquals(
                new Answer.Dry(),
                InnerCondensation.of(List.of(BRICK, own, SHEET), COLD, air(29, 0.8, 0.13)));
    }

    @Test
    void agreesWithAnObstacleSolvedByRelaxation() {
        SplittableRandom random = new SplittableRandom(11);
        int wetWalls = 0;
        for (int i = 0; i < 40; i++) {
            List<Layer> layers = new ArrayList<>();
            for (int n = 1 + random.nextInt(3); n >= 0; n--) {
                layers.add(
                        layer(
                                "l" + n,
                                0.02 + 0.1 * random.nextDouble(),
                                0.03 * Math.pow(30, random.nextDouble()),
                                Math.pow(100, random.nextDouble())));
            }
            Answer answer = InnerCondensation.of(layers, TROPICS, COLD);
            double relaxed = new Obstacle(layers, TROPICS, COLD).gathersKgM2S();
            double limit = InnerCondensation.WORTH_SAYING_KG_M2S;
            if (answer instanceof Answer.Wet wet) {
                wetWalls++;
                assertEquals(relaxed, wet.kgM2S(), 0.02 * relaxed + 0.1 * limit);
            } else {
                assertTrue(relaxed < 1.1 * limit, relaxed / limit + " times what is said");
            }
        }
        assertTrue(wetWalls > 5, wetWalls + " walls were wet");
    }

    /** The vapour pressure as an obstacle problem: straight where below saturation, else on it. */
    private static final class Obstacle {
        private static final int CELLS = 1_200;

        /** Over-relaxation that suits so many cells, 2 - 2 pi/n. */
        private static final double OVER = 2 - 2 * Math.PI / CELLS;

        private final double[] p = new double[CELLS + 1];
        private final double stepM;

        Obstacle(List<Layer> layers, Side outside, Side inside) {
            double air = 0;
            double whole = outside.filmM2KW() + inside.filmM2KW();
            for (Layer layer : layers) {
                air += airM(layer);
                whole += layer.resistanceM2KW();
            }
            stepM = air / CELLS;
            double[] most = new double[CELLS + 1];
            for (int i = 0; i <= CELLS; i++) {
                double passed = outside.filmM2KW() + passedM2KW(layers, i * stepM);
                double c =
                        outside.temperatureC()
                                + (inside.temperatureC() - outside.temperatureC()) * passed / whole;
                most[i] = SaturatedAir.pressurePa(c);
            }
            p[0] = Math.min(outside.vapourPa(), most[0]);
            p[CELLS] = Math.min(inside.vapourPa(), most[CELLS]);
            for (int sweep = 0; sweep < 12_000; sweep++) {
                for (int i = 1; i < CELLS; i++) {
                    double relaxed = p[i] + OVER * (0.5 * (p[i - 1] + p[i + 1]) - p[i]);
                    p[i] = Math.min(most[i], relaxed);
                }
            }
        }

        private static double airM(Layer layer) {
            return layer.thicknessM() * layer.inPlace().vapourResistanceFactor().orElseThrow();
        }

        private static double passedM2KW(List<Layer> layers, double airM) {
            double left = airM;
            double passed = 0;
            for (Layer layer : layers) {
                double share = Math.min(1, left / airM(layer));
                passed += share * layer.resistanceM2KW();
                left -= share * airM(layer);
            }
            return passed;
        }

        double gathersKgM2S() {
            double into = (p[0] - p[1]) / stepM;
            double out = (p[CELLS - 1] - p[CELLS]) / stepM;
            return 2e-10 * (into - out);
        }
    }
}
