package org.wardon.enclosure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;

/** A face layer by layer, against the standards' figures and against the laws it is made of. */
class FaceSheetTest {
    private static final Layer BOARD = new Layer("plywood", 0.012, 0.13, 500, 1600);
    private static final Layer CONCRETE = new Layer("concrete", 0.2, 1.8, 2400, 1000);

    private static Layer bridged(double thicknessM, double conductivity, Layer.Bridge bridge) {
        return new Layer(
                "own",
                thicknessM,
                conductivity,
                40,
                1000,
                new Layer.InPlace(1, Layer.Damp.DRY, Optional.of(bridge), OptionalDouble.empty()));
    }

    private static FaceSheet sheet(FaceName name, Beyond beyond, Layer... layers) {
        return FaceSheet.of(new Face(name, beyond, 0, 0.6, List.of(layers)), 10, Optional.empty());
    }

    @Test
    @Source("ISO 6946:2017, combined method; reference-tables/checks, row iso6946_bridged_U")
    void bridgedWallHasTheTransmittanceOfTheCombinedMethod() {
        Layer battens = bridged(0.1, 0.039, new Layer.Bridge(0.13, 15));
        FaceSheet sheet = sheet(FaceName.NORTH, new Beyond.Shade(), BOARD, battens, BOARD);
        assertEquals(0.433972, sheet.wattsM2K(), 0.005 * 0.433972);
        assertEquals(1.1 * sheet.wattsM2K(), sheet.upliftedWm2K(), 1e-12);
        assertTrue(sheet.asNewWm2K() < sheet.wattsM2K(), "whole, it conducts less");
    }

    @Test
    @Source("ISO 13786:2017, single layer of concrete 200 mm: decrement and lag, as in the checks")
    void lagIsThatOfThePeriodicTransmittance() {
        FaceSheet sheet = sheet(FaceName.NORTH, new Beyond.Outdoors(), CONCRETE);
        PeriodicTransmittance day = PeriodicTransmittance.of(List.of(CONCRETE), 0.13, 0.04, 86_400);
        assertEquals(-day.shiftS() / 3600, sheet.lagHours(), 1e-12);
        assertEquals(day.decrement(), sheet.decrement(), 1e-12);
        assertTrue(sheet.lagHours() > 3 && sheet.lagHours() < 9, "lag " + sheet.lagHours());
    }

    @Test
    @Source("ISO 6946:2017, table 7: 0.10 up, 0.13 level, 0.17 down, 0.04 outside")
    void filmsFollowTheHeatThatComesIn() {
        assertEquals(0.17, sheet(FaceName.ROOF, new Beyond.Outdoors(), BOARD).insideFilmM2KW());
        assertEquals(0.10, sheet(FaceName.FLOOR, new Beyond.Shade(), BOARD).insideFilmM2KW());
        assertEquals(0.13, sheet(FaceName.EAST, new Beyond.Space(25), BOARD).outsideFilmM2KW());
        assertEquals(0.04, sheet(FaceName.EAST, new Beyond.Shade(), BOARD).outsideFilmM2KW());
        assertEquals(0, sheet(FaceName.FLOOR, new Beyond.Ground(), BOARD).outsideFilmM2KW());
    }

    @Test
    void soilBringsTheFloorToTheTransmittanceOfTheSlab() {
        GroundFloor ground = new GroundFloor(20, 18, 0.1, GroundFloor.Soil.SAND_OR_GRAVEL);
        Face floor = new Face(FaceName.FLOOR, new Beyond.Ground(), 0, 0.6, List.of(CONCRETE));
        FaceSheet sheet = FaceSheet.of(floor, 0, Optional.of(ground));
        double slab = ground.wattsM2K(CONCRETE.resistanceM2KW(), 0.10);
        assertEquals(slab, sheet.wattsM2K(), 1e-9);
        assertEquals(2, sheet.layers().stream().filter(FaceSheet.Part::soil).count());
    }

    @Test
    void resistancesOfLayersAndFilmsAddUp() {
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 100; i++) {
            Layer filled =
                    bridged(
                            0.02 + 0.2 * random.nextDouble(),
                            0.02 + random.nextDouble(),
                            new Layer.Bridge(
                                    0.1 + 40 * random.nextDouble(), 1 + random.nextDouble()));
            FaceSheet sheet = sheet(FaceName.WEST, new Beyond.Shade(), BOARD, filled, CONCRETE);
            double sum =
                    sheet.outsideFilmM2KW()
                            + sheet.insideFilmM2KW()
                            + sheet.layers().stream()
                                    .mapToDouble(FaceSheet.Part::resistanceM2KW)
                                    .sum();
            assertEquals(1 / sheet.wattsM2K(), sum, 1e-9 * sum, "seed 11, case " + i);
        }
    }
}
