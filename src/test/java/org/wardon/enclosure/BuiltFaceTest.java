package org.wardon.enclosure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;

/** A face as it conducts where it stands: bridges, age and water in its layers. */
class BuiltFaceTest {
    private static final double FILMS = 0.13 + 0.04;
    private static final Layer BOARD = new Layer("plywood", 0.012, 0.13, 500, 1600);

    private static Layer layer(double conductivity, double aged, double waterPct, double f) {
        return new Layer(
                "eps-15",
                0.1,
                conductivity,
                16,
                1450,
                new Layer.InPlace(
                        aged,
                        new Layer.Damp(waterPct, f),
                        Optional.empty(),
                        OptionalDouble.empty()));
    }

    private static Layer bridged(double thicknessM, double conductivity, Layer.Bridge bridge) {
        return new Layer(
                "own",
                thicknessM,
                conductivity,
                40,
                1000,
                new Layer.InPlace(1, Layer.Damp.DRY, Optional.of(bridge), OptionalDouble.empty()));
    }

    private static Face face(List<Layer> layers) {
        return new Face(FaceName.NORTH, new Beyond.Shade(), 0, 0.6, layers);
    }

    private static double wattsM2K(Face face) {
        return UValue.wattsM2K(face.asBuilt(), 0.13, 0.04);
    }

    @Test
    @Source("ISO 6946:2017, combined method; reference-tables/checks, row iso6946_bridged_U")
    void insulationBetweenBattensHasTheTransmittanceOfTheCombinedMethod() {
        Layer battens = bridged(0.1, 0.039, new Layer.Bridge(0.13, 15));
        assertEquals(0.433972, wattsM2K(face(List.of(BOARD, battens, BOARD))), 0.005 * 0.433972);
    }

    @Test
    void severalBridgedLayersMakeUpTheCombinedResistanceToo() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 200; i++) {
            List<Layer> layers =
                    List.of(
                            BOARD,
                            bridged(0.05, 0.03, any(random)),
                            bridged(0.14, 0.05, any(random)),
                            BOARD);
            double exact = BridgedElement.of(layers, 0.13, 0.04).combinedM2KW();
            double whole = FILMS + UValue.resistanceM2KW(layers);
            assertEquals(exact, 1 / wattsM2K(face(layers)), 1e-9 * exact);
            assertTrue(exact < whole, "a conducting bridge lowers the resistance");
        }
    }

    private static Layer.Bridge any(SplittableRandom random) {
        return new Layer.Bridge(0.06 + 49 * random.nextDouble(), 0.01 + 20 * random.nextDouble());
    }

    @Test
    @Source("ISO 10456:2007, exp(f psi), f = 4 for expanded polystyrene, from memory")
    void ageAndWaterRaiseTheConductivity() {
        Layer damp = layer(0.036, 1.25, 5, 4);
        assertEquals(0.036 * 1.25 * Math.exp(0.2), damp.asBuilt().conductivityWmK(), 1e-12);
        assertEquals(0.036, damp.conductivityWmK());
        assertEquals(damp.capacityJm2K(), damp.asBuilt().capacityJm2K());
        assertEquals(
                1 / (FILMS + 0.1 / (0.036 * 1.25 * Math.exp(0.2))),
                wattsM2K(face(List.of(damp))),
                1e-12);
    }

    @Test
    void whatIsOutsideItsBoundsIsRefused() {
        assertEquals(
                "agedFactor is 0.5; accepted is 1.0 to 10.0.",
                assertThrows(IllegalArgumentException.class, () -> layer(0.036, 0.5, 0, 4))
                        .getMessage());
        assertEquals(
                "moisturePct is 11.0 %; accepted is 0.0 to 10.0 %.",
                assertThrows(IllegalArgumentException.class, () -> layer(0.036, 1, 11, 4))
                        .getMessage());
        Layer one = bridged(0.01, 0.04, new Layer.Bridge(0.13, 10));
        assertEquals(
                "face NORTH has 9 bridged layers; at most 8",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> face(Collections.nCopies(9, one)))
                        .getMessage());
    }
}
