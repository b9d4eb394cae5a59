package org.wardon.heat.network;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
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

    static Stream<List<Layer>> walls() {
        return Stream.of(
                List.of(SHEET, FOAM, SHEET),
                List.of(BRICK),
                List.of(BRICK, STILL_AIR, BRICK, PLASTER),
                List.of(PLASTER, STRAW, PLASTER),
                List.of(STILL_AIR, BRICK, STILL_AIR),
                List.of(BRICK, FOAM, SHEET));
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
    void dailyTransmittanceIsWithinOnePercentOfIso13786(List<Layer> outsideToInside) {
        List<Layer> insideToOutside = new ArrayList<>(outsideToInside);
        Collections.reverse(insideToOutside);
        PeriodicTransmittance exact =
                PeriodicTransmittance.of(insideToOutside, INSIDE, OUTSIDE, DAY_S);
        Complex found = waveThrough(new FaceGrid(outsideToInside, INSIDE, 1));
        assertEquals(exact.transmittanceWm2K(), found.abs(), 0.01 * exact.transmittanceWm2K());
    }

    @Test
    void aThinSheetIsCapacityOnItsBorder() {
        FaceGrid grid = new FaceGrid(List.of(SHEET, FOAM, SHEET), INSIDE, 1);
        int last = grid.capacity.length - 1;
        double halfCell = 0.5 * FOAM.capacityJm2K() / last;
        assertEquals(SHEET.capacityJm2K() + halfCell, grid.capacity[0], 1e-9);
        assertEquals(SHEET.capacityJm2K() + halfCell, grid.capacity[last], 1e-9);
    }

    /** Heat into a chamber held at 0 when the far side swings by 1 K: elimination, complex. */
    private static Complex waveThrough(FaceGrid grid) {
        double omega = 2 * Math.PI / DAY_S;
        double k = 1 / (1 / (1 / OUTSIDE) + grid.outerM2KW);
        Complex source = new Complex(k);
        Complex self = Complex.ZERO;
        for (int i = 0; i < grid.capacity.length; i++) {
            boolean last = i == grid.capacity.length - 1;
            double next = last ? grid.inner : grid.between[i];
            Complex pivot = new Complex(k + next, omega * grid.capacity[i]).subtract(self);
            Complex t = source.divide(pivot);
            if (last) {
                return t.multiply(grid.inner);
            }
            source = t.multiply(next);
            self = new Complex(next * next).divide(pivot);
            k = next;
        }
        throw new IllegalStateException("a face has at least one node");
    }
}
