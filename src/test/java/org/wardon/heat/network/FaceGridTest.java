package org.wardon.heat.network;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.enclosure.GroundFloor;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.PeriodicTransmittance;
import org.wardon.enclosure.UValue;

/** The nodes of a face against ISO 6946 when steady and ISO 13786 under a daily wave. */
class FaceGridTest {
    private static final double DAY_S = 86_400;
    private static final double INSIDE = 0.13;
    private static final double OUTSIDE = 0.04;
    private static final Layer SHEET = new Layer("steel", 0.0005, 50, 7800, 500);
    private static final Layer FOAM = new Layer("foam", 0.1, 0.024, 35, 1400);
    private static final Layer BRICK = new Layer("brick", 0.22, 0.7, 1700, 900);
    private static final Layer STILL_AIR = new Layer("air", 0.05, 0.05 / 0.18, 0, 0);
    private static final Layer STRAW = new Layer("straw", 0.4, 0.06, 110, 1900);
    private static final Layer PLASTER = new Layer("plaster", 0.015, 0.8, 1600, 1000);

    private static final Layer EPS = new Layer("eps-15", 0.1, 0.036, 16, 1450);
    private static final Layer ADOBE = new Layer("adobe-dry", 0.4, 0.6, 1600, 830);
    private static final Layer WET_SAND = new Layer("sand-sat", 0.1, 2.5, 2000, 1480);
    private static final Layer WET_BRICK = new Layer("brick-wet", 0.11, 1.3, 2000, 1100);
    private static final Layer CONCRETE = new Layer("concrete-dense", 0.2, 2.0, 2400, 1000);
    private static final Layer RAMMED = new Layer("rammed-earth", 0.5, 1.1, 2000, 1000);
    private static final Layer STONE = new Layer("stone-limestone", 0.6, 2.3, 2600, 792);
    private static final Layer THATCH = new Layer("thatch-straw", 0.25, 0.07, 240, 1420);
    private static final Layer HUSK = new Layer("rice-husk", 0.15, 0.05, 150, 1700);
    private static final Layer BOARD = new Layer("plywood", 0.012, 0.13, 500, 1600);
    private static final Layer SAWDUST = new Layer("sawdust", 0.3, 0.065, 190, 1700);

    static Stream<List<Layer>> walls() {
        return Stream.of(
                List.of(SHEET, FOAM, SHEET),
                List.of(SHEET),
                List.of(BRICK),
                List.of(BRICK, STILL_AIR, BRICK, PLASTER),
                List.of(PLASTER, STRAW, PLASTER),
                List.of(STILL_AIR, BRICK, STILL_AIR),
                List.of(BRICK, FOAM, SHEET),
                List.of(PLASTER, BRICK, EPS, PLASTER),
                List.of(PLASTER, EPS, CONCRETE),
                List.of(CONCRETE, EPS, PLASTER),
                List.of(PLASTER, ADOBE, PLASTER),
                List.of(RAMMED),
                List.of(STONE),
                List.of(WET_BRICK, WET_SAND, WET_BRICK),
                List.of(THATCH),
                List.of(BOARD, HUSK, BOARD),
                List.of(BOARD, SAWDUST, BOARD),
                List.of(BOARD));
    }

    @ParameterizedTest
    @MethodSource("walls")
    void steadyConductanceIsThatOfTheLayers(List<Layer> outsideToInside) {
        FaceGrid grid = new FaceGrid(outsideToInside, INSIDE, 1);
        double exact = UValue.wattsM2K(outsideToInside, INSIDE, OUTSIDE);
        assertEquals(exact, grid.steady(1 / OUTSIDE), 1e-4 * exact);
    }

    @ParameterizedTest
    @MethodSource("walls")
    void dailyWaveComesThroughAsStrongAndAsLateAsIso13786Says(List<Layer> outsideToInside) {
        List<Layer> insideToOutside = new ArrayList<>(outsideToInside);
        Collections.reverse(insideToOutside);
        PeriodicTransmittance exact =
                PeriodicTransmittance.of(insideToOutside, INSIDE, OUTSIDE, DAY_S);
        Wave found = waveThrough(new FaceGrid(outsideToInside, INSIDE, 1), exact.shiftS());
        assertEquals(
                exact.transmittanceWm2K(), found.strengthWm2K, 0.01 * exact.transmittanceWm2K());
        assertEquals(exact.shiftS(), found.shiftS, 0.01 * Math.abs(exact.shiftS()));
    }

    static Stream<Arguments> floors() {
        List<List<Layer>> floors =
                List.of(
                        List.of(CONCRETE),
                        List.of(CONCRETE, EPS, PLASTER),
                        List.of(SHEET, FOAM, SHEET),
                        List.of(PLASTER));
        return floors.stream()
                .flatMap(
                        floor ->
                                Stream.of(0.5, 1.0, 7.0, 30.0)
                                        .map(days -> Arguments.of(floor, days * DAY_S)));
    }

    /** A wave from inside meets soil whose cells grow, and soil as ISO 13786 has it. */
    @ParameterizedTest
    @MethodSource("floors")
    void soilTakesUpAWaveFromInsideAsIso13786Says(List<Layer> floor, double periodS) {
        GroundFloor slab = new GroundFloor(30, 22, 0.1, GroundFloor.Soil.CLAY_OR_SILT);
        double resistance = UValue.resistanceM2KW(floor);
        List<Layer> soil = slab.soilLayers(resistance, INSIDE);
        List<Layer> insideToOutside = new ArrayList<>(soil);
        insideToOutside.addAll(floor);
        Collections.reverse(insideToOutside);
        double tight = 1e-4;
        double exact =
                PeriodicTransmittance.of(insideToOutside, INSIDE, tight, periodS).capacityJm2K();
        FaceGrid grid = new FaceGrid(soil, floor, INSIDE, 1);
        assertEquals(exact, capacityInside(grid, tight, periodS), 0.01 * exact);
        List<Layer> all = new ArrayList<>(soil);
        all.addAll(floor);
        double steady = UValue.wattsM2K(all, INSIDE, tight);
        assertEquals(steady, grid.steady(1 / tight), 1e-4 * steady);
    }

    /** Heat into the inner side less that through it, over the swing inside and the frequency. */
    private static double capacityInside(FaceGrid grid, double farM2KW, double periodS) {
        double omega = 2 * Math.PI / periodS;
        double k = 1 / (farM2KW + grid.outerM2KW);
        Complex self = Complex.ZERO;
        Complex through = new Complex(k);
        for (int i = 0; i < grid.capacity.length; i++) {
            boolean last = i == grid.capacity.length - 1;
            double next = last ? grid.inner : grid.between[i];
            Complex pivot = new Complex(k + next, omega * grid.capacity[i]).subtract(self);
            self = new Complex(next * next).divide(pivot);
            through = through.multiply(next).divide(pivot);
            k = next;
        }
        Complex into = new Complex(grid.inner).subtract(self);
        return into.subtract(through).abs() / omega;
    }

    @Test
    void aThinSheetIsCapacityOnItsBorder() {
        FaceGrid grid = new FaceGrid(List.of(SHEET, FOAM, SHEET), INSIDE, 1);
        int last = grid.capacity.length - 1;
        // Half a cell less the end correction of 1/(12 (cells - 1)) of the layer.
        double end = (0.5 / last - 1 / (12.0 * (last - 1))) * FOAM.capacityJm2K();
        assertEquals(SHEET.capacityJm2K() + end, grid.capacity[0], 1e-9);
        assertEquals(SHEET.capacityJm2K() + end, grid.capacity[last], 1e-9);
        double all = 2 * SHEET.capacityJm2K() + FOAM.capacityJm2K();
        assertEquals(all, Arrays.stream(grid.capacity).sum(), 1e-9 * all);
    }

    private record Wave(double strengthWm2K, double shiftS) {}

    /**
     * Heat into a chamber held at 0 when the far side swings by 1 K: elimination, complex. The
     * shift is told in the turn nearest to one that is near.
     */
    private static Wave waveThrough(FaceGrid grid, double nearS) {
        double omega = 2 * Math.PI / DAY_S;
        double k = 1 / (OUTSIDE + grid.outerM2KW);
        Complex source = new Complex(k);
        Complex self = Complex.ZERO;
        for (int i = 0; i < grid.capacity.length; i++) {
            boolean last = i == grid.capacity.length - 1;
            double next = last ? grid.inner : grid.between[i];
            Complex pivot = new Complex(k + next, omega * grid.capacity[i]).subtract(self);
            Complex t = source.divide(pivot);
            source = t.multiply(next);
            self = new Complex(next * next).divide(pivot);
            k = next;
        }
        double shift = source.getArgument() / omega;
        return new Wave(source.abs(), shift + DAY_S * Math.rint((nearS - shift) / DAY_S));
    }
}
