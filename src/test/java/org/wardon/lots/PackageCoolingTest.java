package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.Source;

/** The course of a package against the modes of Commons Math. */
class PackageCoolingTest {
    static Stream<Arguments> packages() {
        SplittableRandom random = new SplittableRandom(20261202);
        return IntStream.range(0, 20)
                .mapToObj(
                        n -> {
                            Shape shape = Shape.values()[random.nextInt(3)];
                            Item item =
                                    new Item(
                                            shape,
                                            random.nextDouble(0.003, 0.08),
                                            random.nextDouble(700, 1080),
                                            random.nextDouble(3400, 4050),
                                            random.nextDouble(0.3, 0.58),
                                            0.2);
                            Packing packing =
                                    new Packing(
                                            Math.exp(random.nextDouble(-4, 6)),
                                            Math.exp(random.nextDouble(-6, 5)),
                                            0.0007,
                                            random.nextDouble(0, 200),
                                            1e-10);
                            return Arguments.of(n, item, packing);
                        });
    }

    @Source("Apache Commons Math 3.6.1, EigenDecomposition")
    @ParameterizedTest(name = "seed 20261202, case {0}")
    @MethodSource("packages")
    void meanIsThatOfItsModes(int number, Item item, Packing packing) {
        Shells shells = Shells.of(item);
        PackageCooling cooling = new PackageCooling(item, shells, packing);
        for (double hours : new double[] {0.01, 0.5, 6, 48, 400}) {
            assertEquals(
                    meanByModes(item, shells, packing, 3600 * hours),
                    cooling.mean(3600 * hours),
                    1e-9);
        }
    }

    /** Scaled by the roots of the capacities the chain is symmetric. */
    private static double meanByModes(Item item, Shells shells, Packing packing, double timeS) {
        int n = shells.count() + 1;
        double[] capacity = new double[n];
        double[] conducts = new double[n];
        for (int i = 0; i < n - 1; i++) {
            capacity[i] = item.specificHeatJkgK() * shells.massFraction(i);
            conducts[i] =
                    i < n - 2
                            ? shells.conductanceWPerKgK(i)
                            : shells.throughFilmWPerKgK(packing.filmWPerKgK());
        }
        capacity[n - 1] = packing.capacityJPerKgK();
        conducts[n - 1] = packing.chamberWPerKgK();
        RealMatrix chain = new Array2DRowRealMatrix(n, n);
        for (int i = 0; i < n; i++) {
            chain.setEntry(i, i, ((i > 0 ? conducts[i - 1] : 0) + conducts[i]) / capacity[i]);
            if (i > 0) {
                double beside = -conducts[i - 1] / Math.sqrt(capacity[i] * capacity[i - 1]);
                chain.setEntry(i, i - 1, beside);
                chain.setEntry(i - 1, i, beside);
            }
        }
        EigenDecomposition modes = new EigenDecomposition(chain);
        double mean = 0;
        double whole = 0;
        for (int i = 0; i < n - 1; i++) {
            whole += capacity[i];
        }
        for (int k = 0; k < n; k++) {
            double start = 0;
            double items = 0;
            for (int i = 0; i < n; i++) {
                double part = modes.getEigenvector(k).getEntry(i) * Math.sqrt(capacity[i]);
                start += part;
                items += i < n - 1 ? part : 0;
            }
            mean += start * items / whole * Math.exp(-modes.getRealEigenvalue(k) * timeS);
        }
        return mean;
    }
}
