package org.wardon.sharing.placing;

import java.util.Comparator;
import java.util.stream.IntStream;

/** Who loses by whose company in a climate, of lots that meet, in the order of the store. */
final class Company {
    /** Nobody. */
    static final Company NONE = new Company(0);

    /** {@code [lot]}, the others it loses by or must not meet. */
    final int[][] others;

    /** {@code [lot][place in others]}, currency, {@link Climate#APART} for never. */
    final double[][] loss;

    /** {@code [lot]}, bits of those it must not meet. */
    final long[][] apart;

    /** {@code [lot]}, the others it may meet and loses by. */
    final int[][] partners;

    /** {@code [lot][place in partners]}, currency. */
    final double[][] partnerLoss;

    /** {@code [lot]}, how many partners. */
    final int[] partnerCount;

    /** Lots, those that must not meet few first. */
    final int[] lightest;

    /** Lots that do each other no harm. */
    Company(int lots) {
        others = new int[lots][0];
        loss = new double[lots][0];
        apart = new long[lots][Cover.words(lots)];
        partners = others;
        partnerLoss = loss;
        partnerCount = new int[lots];
        lightest = IntStream.range(0, lots).toArray();
    }

    Company(Climate climate, PlacingProblem problem, int[] lotNumber) {
        int lots = lotNumber.length;
        others = new int[lots][];
        loss = new double[lots][];
        apart = new long[lots][Cover.words(lots)];
        partners = new int[lots][];
        partnerLoss = new double[lots][];
        partnerCount = new int[lots];
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
            part(l);
        }
        lightest =
                IntStream.range(0, lots)
                        .boxed()
                        .sorted(Comparator.comparingInt(l -> others[l].length - partners[l].length))
                        .mapToInt(l -> l)
                        .toArray();
    }

    private void part(int l) {
        for (int k = 0; k < others[l].length; k++) {
            int other = others[l][k];
            if (loss[l][k] == Climate.APART) {
                apart[l][other >> 6] |= 1L << other;
            }
        }
        int[] may =
                IntStream.range(0, others[l].length)
                        .filter(k -> loss[l][k] < Climate.APART)
                        .toArray();
        partners[l] = IntStream.of(may).map(k -> others[l][k]).toArray();
        partnerLoss[l] = IntStream.of(may).mapToDouble(k -> loss[l][k]).toArray();
        partnerCount[l] = may.length;
    }

    private static LotToPlace lots(PlacingProblem problem, int number) {
        return problem.lots().get(number);
    }
}
