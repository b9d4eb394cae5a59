package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.Source;

/** Shells against the exact series, steady heating, and the books of heat. */
class ShellsTest {
    /** The promise: 1 % of the starting difference, and of the cooling times. */
    private static final double PROMISED = 0.01;

    private static final double[] FOURIER = {0.01, 0.03, 0.1, 0.2, 0.4, 0.7, 1, 2, 3};

    static Stream<Arguments> publishedBiotNumbers() {
        return Arrays.stream(Shape.values())
                .flatMap(shape -> Stream.of(0.1, 1.0, 10.0).map(biot -> Arguments.of(shape, biot)));
    }

    @Source("exact series; Biot numbers of Incropera and DeWitt, chapter 5, table 5.1")
    @ParameterizedTest(name = "{0}, Biot {1}: centre, surface and mean at nine times")
    @MethodSource("publishedBiotNumbers")
    void staysWithinOnePercentOfTheSeries(Shape shape, double biot) {
        Item item = item(shape);
        LoneItem lone = lone(item, Shells.USUAL, biot, 0);
        SeriesSolution exact = SeriesSolution.of(shape, biot);
        double unitS = unitS(item);
        double[] c = start(Shells.USUAL);
        double nowS = 0;
        for (double share : FOURIER) {
            double fourier = share * (1 + 1 / biot);
            c = lone.after(c, nowS, fourier * unitS);
            nowS = fourier * unitS;
            assertEquals(exact.mean(fourier), lone.mean(c), PROMISED, "mean at " + fourier);
            assertEquals(exact.at(0, fourier), lone.centre(c), PROMISED, "centre at " + fourier);
            assertEquals(exact.at(1, fourier), lone.skin(c), PROMISED, "surface at " + fourier);
        }
    }

    @Source("exact series; Biot numbers of Incropera and DeWitt, chapter 5, table 5.1")
    @ParameterizedTest(name = "{0}, Biot {1}: half and seven-eighths times of mean and centre")
    @MethodSource("publishedBiotNumbers")
    void coolsInTheSeriesTime(Shape shape, double biot) {
        Item item = item(shape);
        LoneItem lone = lone(item, Shells.USUAL, biot, 0);
        SeriesSolution exact = SeriesSolution.of(shape, biot);
        for (double share : new double[] {0.5, 0.125}) {
            double meanS = exact.fourierWhenMean(share) * unitS(item);
            double centreS = exact.fourierWhenCentre(share) * unitS(item);
            assertTrue(passes(lone, share, meanS, true), "mean at " + share);
            assertTrue(passes(lone, share, centreS, false), "centre at " + share);
        }
    }

    /** Whether the shells pass the share between 99 % and 101 % of the exact time. */
    private static boolean passes(LoneItem lone, double share, double exactS, boolean mean) {
        double[] before = lone.after(start(lone.getDimension()), 0, exactS * (1 - PROMISED));
        double[] after = lone.after(before, exactS * (1 - PROMISED), exactS * (1 + PROMISED));
        double first = mean ? lone.mean(before) : lone.centre(before);
        double last = mean ? lone.mean(after) : lone.centre(after);
        return first > share && last < share;
    }

    @ParameterizedTest
    @EnumSource(Shape.class)
    void moreShellsComeNearer(Shape shape) {
        double exact = SeriesSolution.of(shape, 10).mean(0.05);
        Item item = item(shape);
        double last = Double.POSITIVE_INFINITY;
        for (int count : new int[] {4, 8, 16}) {
            LoneItem lone = lone(item, count, 10, 0);
            double mean = lone.mean(lone.after(start(count), 0, 0.05 * unitS(item)));
            double error = Math.abs(mean - exact);
            assertTrue(error < 0.6 * last, count + " shells miss by " + error + " after " + last);
            last = error;
        }
    }

    @Source("closed form: a body heated evenly, core excess q rho R2/(2 d k) + q/film")
    @ParameterizedTest
    @EnumSource(Shape.class)
    void steadyHeatingFromWithinIsExact(Shape shape) {
        Item item = item(shape);
        double heat = 0.1;
        double film = filmWPerKgK(item, 1);
        LoneItem lone = lone(item, Shells.USUAL, 1, heat);
        double[] c = lone.after(new double[Shells.USUAL], 0, 60 * unitS(item));
        double overSkin =
                heat
                        * item.densityKgM3()
                        * item.radiusM()
                        * item.radiusM()
                        / (2 * shape.dimensions() * item.conductivityWmK());
        assertEquals(heat / film, lone.skin(c), 1e-6 * heat / film);
        assertEquals(heat / film + overSkin, lone.centre(c), 1e-6 * overSkin);
    }

    @ParameterizedTest
    @EnumSource(Shape.class)
    void heatLostIsHeatThroughTheFilm(Shape shape) {
        Item item = item(shape);
        LoneItem lone = lone(item, 7, 2, 0.3);
        double[] c = {20, 19, 17, 14, 9, 7, 3};
        double[] rate = new double[7];
        lone.computeDerivatives(0, c, rate);
        double storedW = item.specificHeatJkgK() * lone.mean(rate);
        double lostW = filmWPerKgK(item, 2) * lone.skin(c);
        assertEquals(0.3 - lostW, storedW, 1e-9 * lostW);
    }

    @ParameterizedTest
    @EnumSource(Shape.class)
    void fractionsMakeTheWhole(Shape shape) {
        Shells shells = Shells.of(item(shape), 9);
        double sum = 0;
        for (int i = 0; i < shells.count(); i++) {
            sum += shells.massFraction(i);
        }
        assertEquals(1, sum, 1e-12);
    }

    @Test
    void refusesTooFewShells() {
        IllegalArgumentException refused =
                org.junit.jupiter.api.Assertions.assertThrows(
                        IllegalArgumentException.class, () -> Shells.of(item(Shape.SPHERE), 3));
        assertEquals(
                "count of shells is 3.0 1; accepted is 4.0 to 50.0 1. Give at least 4.",
                refused.getMessage());
    }

    private static Item item(Shape shape) {
        return new Item(shape, 0.035, 950, 3800, 0.45, 0.17);
    }

    private static double unitS(Item item) {
        return item.radiusM() * item.radiusM() / item.diffusivityM2S();
    }

    private static double filmWPerKgK(Item item, double biot) {
        return biot * item.conductivityWmK() / item.radiusM() * item.areaM2PerKg();
    }

    private static LoneItem lone(Item item, int count, double biot, double heatWPerKg) {
        return new LoneItem(item, Shells.of(item, count), filmWPerKgK(item, biot), heatWPerKg);
    }

    private static double[] start(int count) {
        double[] c = new double[count];
        Arrays.fill(c, 1);
        return c;
    }
}
