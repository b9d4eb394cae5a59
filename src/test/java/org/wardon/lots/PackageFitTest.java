package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.Source;

/** A fitted package takes its published time, checked by a general integrator. */
class PackageFitTest {
    private static final PackageInside CARTON =
            new PackageInside("pear", "USDA-AH66", 0.0007, 100, 1e-10, 0);

    /** Three percent is promised; shells without film miss by up to 1.5 %. */
    private static final double PROMISED = 0.03;

    /** What an open package and its film add: 4 kJ/(kg K) over 500 W/(kg K), to the half. */
    private static final double OPEN_S = 0.693 * 4000 / 500;

    static Stream<Arguments> itemsAndTimes() {
        SplittableRandom random = new SplittableRandom(20261201);
        return IntStream.range(0, 40)
                .mapToObj(
                        n -> {
                            Shape shape = Shape.values()[random.nextInt(3)];
                            double radius = logBetween(random, 0.003, 0.08);
                            Item item =
                                    new Item(
                                            shape,
                                            radius,
                                            random.nextDouble(700, 1080),
                                            random.nextDouble(3400, 4050),
                                            random.nextDouble(0.3, 0.58),
                                            0.2);
                            return Arguments.of(n, item, logBetween(random, 0.2, 60));
                        });
    }

    private static double logBetween(SplittableRandom random, double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    @ParameterizedTest(name = "seed 20261201, case {0}: {1}, {2} h")
    @MethodSource("itemsAndTimes")
    void takesThePublishedHalfCoolingTime(int number, Item item, double hours) {
        WithReasons<Packing> fitted = PackageFit.of(item, CARTON, 3600 * hours);
        double halfS = PackageFit.halfCoolingS(item, fitted.value());
        if (fitted.restsOn().isEmpty()) {
            assertEquals(3600 * hours, halfS, 0.0001 * 3600 * hours);
        } else {
            assertEquals("item-slower-than-package", fitted.restsOn().get(0).code());
            assertTrue(halfS >= 3600 * hours);
            double bareS = bareHalfS(item);
            assertEquals(bareS, halfS, PROMISED * bareS + OPEN_S, "the item's own time");
        }
        assertEquals(0.5, meanShareAfter(item, fitted.value(), halfS), 0.001);
    }

    /** Exact series without film. */
    private static double bareHalfS(Item item) {
        SeriesSolution bare = SeriesSolution.of(item.shape(), Double.POSITIVE_INFINITY);
        return bare.fourierWhenMean(0.5) * item.radiusM() * item.radiusM() / item.diffusivityM2S();
    }

    /** The same chain by Commons Math, package air and all, not by its own modes. */
    private static double meanShareAfter(Item item, Packing packing, double timeS) {
        Shells shells = Shells.of(item);
        LoneItem lone = new LoneItem(item, shells, packing.filmWPerKgK(), 0);
        int n = shells.count();
        double[] share = new double[n + 1];
        Arrays.fill(share, 1);
        FirstOrderDifferentialEquations chain =
                new FirstOrderDifferentialEquations() {
                    @Override
                    public int getDimension() {
                        return n + 1;
                    }

                    @Override
                    public void computeDerivatives(double t, double[] y, double[] rate) {
                        double[] aboveAir = new double[n];
                        for (int i = 0; i < n; i++) {
                            aboveAir[i] = y[i] - y[n];
                        }
                        double[] rates = new double[n];
                        lone.computeDerivatives(t, aboveAir, rates);
                        System.arraycopy(rates, 0, rate, 0, n);
                        double inW =
                                shells.throughFilmWPerKgK(packing.filmWPerKgK())
                                        * (y[n - 1] - y[n]);
                        rate[n] =
                                (inW - packing.chamberWPerKgK() * y[n]) / packing.capacityJPerKgK();
                    }
                };
        new DormandPrince853Integrator(1e-9, 1e6, 1e-7, 1e-7)
                .integrate(chain, 0, share, timeS, share);
        return lone.mean(share);
    }

    @Test
    void keepsTheItemsTimeAndSaysSo() {
        Item melon = new Item(Shape.SPHERE, 0.08, 950, 3900, 0.5, 1.5);
        WithReasons<Packing> fitted = PackageFit.of(melon, CARTON, 600);
        assertEquals("item-slower-than-package", fitted.restsOn().get(0).code());
        assertEquals(
                bareHalfS(melon) / 3600,
                fitted.restsOn().get(0).arguments().get(0).value(),
                (PROMISED * bareHalfS(melon) + OPEN_S) / 3600);
    }

    @Test
    void slowerByAFactor() {
        Item apple = new Item(Shape.SPHERE, 0.038, 840, 3800, 0.42, 0.2);
        Packing packing = PackageFit.of(apple, CARTON, 12 * 3600).value();
        Packing slow = PackageFit.slowed(apple, packing, 1.5);
        assertEquals(18 * 3600, PackageFit.halfCoolingS(apple, slow), 1);
        assertEquals(packing.vapourKgPerKgSPa(), slow.vapourKgPerKgSPa(), 0);
    }

    @Source("definition: bare and package in series let pass the printed share of bare")
    @Test
    void vapourPassesInThePrintedShare() {
        double bare = 3e-11;
        double wall = PackageFit.vapourKgPerKgSPa(bare, 0.4);
        assertEquals(0.4, Transpirations.inSeries(bare, wall) / bare, 1e-12);
        double open = PackageFit.vapourKgPerKgSPa(bare, 1.01);
        assertEquals(0.995, Transpirations.inSeries(bare, open) / bare, 1e-12);
    }
}
