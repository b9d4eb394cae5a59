package org.wardon.sharing.placing;

import java.util.stream.IntStream;

/** Who loses by whose company in a climate, of lots that meet, in the order of the store. */
final class Company {
    /** Nobody. */
    static final Company NONE = new Company(new int[0][], new double[0][]);

    /** {@code [lot]}, the others it loses by or must not meet. */
    final int[][] others;

    /** {@code [lot][place in others]}, currency, {@link Climate#APART} for never. */
    final double[][] loss;

    private Company(int[][] others, double[][] loss) {
        this.others = others;
        this.loss = loss;
    }

    Company(Climate climate, PlacingProblem problem, int[] lotNumber) {
        int lots = lotNumber.length;
        others = new int[lots][];
        loss = new double[lots][];
        for (int l = 0; l < lots; l++) {
            int one = lotNumber[l];
            others[l] =
                    IntStream.range(0, lots)
                            .filter(o -> climate.lossTogether(one, lotNumber[o]) > 0)
                            .filter(o -> lotNumber[o] != one)
                            .filter(o -> problem.lots().get(one).meets(lots(problem, lotNumber[o])))
                            .toArray();
            loss[l] =
                    IntStream.of(others[l])
                            .mapToDouble(o -> climate.lossTogether(one, lotNumber[o]))
                            .toArray();
        }
    }

    private static LotToPlace lots(PlacingProblem problem, int number) {
        return problem.lots().get(number);
    }
}
