package org.wardon.sharing.placing;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/**
 * A problem in numbers: lots and chambers in the order of their ids, so that the order they were
 * named in changes nothing; what they take up as shares of what there is.
 */
final class Store {
    /** A share nothing can bear. */
    private static final double TOO_MUCH = 1e9;

    /** More than all there is, but for rounding. */
    private static final double FULL = 1 + 1e-8;

    final int lots;
    final int chambers;
    final int days;

    /** Numbers in the problem, by place here. */
    final int[] lotNumber;

    final int[] chamberNumber;
    final int[] first;
    final int[] last;
    final boolean[] mayRest;

    /** {@code [chamber][offer]}. */
    final double[][] cost;

    /** {@code [chamber][offer][lot]}, {@link Climate#NEVER} where it must not stand. */
    final double[][][] earns;

    /** {@code [chamber][lot]}, share of what the chamber takes. */
    final double[][] massShare;

    final double[][] volumeShare;

    /** {@code [chamber][offer][lot * days + day]}, share of the cooling there is that day. */
    final double[][][] heatShare;

    /** {@code [chamber][offer]}. */
    final Company[][] company;

    /** {@code [chamber][offer][lot]}, bits of those there is no room or cooling for beside it. */
    final long[][][][] crowds;

    /** Nobody harms anybody. */
    final Company alone;

    /** Which lots are alike. */
    final Likeness likeness;

    Store(PlacingProblem problem) {
        lots = problem.lots().size();
        chambers = problem.chambers().size();
        days = problem.days();
        lotNumber = order(lots, Comparator.comparing(l -> problem.lots().get(l).id()));
        chamberNumber = order(chambers, Comparator.comparing(c -> problem.chambers().get(c).id()));
        first = IntStream.of(lotNumber).map(l -> problem.lots().get(l).firstDay()).toArray();
        last = IntStream.of(lotNumber).map(l -> problem.lots().get(l).lastDay()).toArray();
        mayRest = new boolean[chambers];
        cost = new double[chambers][];
        earns = new double[chambers][][];
        massShare = new double[chambers][lots];
        volumeShare = new double[chambers][lots];
        heatShare = new double[chambers][][];
        company = new Company[chambers][];
        alone = new Company(lots);
        crowds = new long[chambers][][][];
        Map<Climate, Company> known = new HashMap<>();
        for (int c = 0; c < chambers; c++) {
            fill(c, problem, known);
        }
        likeness = new Likeness(this);
    }

    private static int[] order(int count, Comparator<Integer> by) {
        return IntStream.range(0, count).boxed().sorted(by).mapToInt(i -> i).toArray();
    }

    private void fill(int c, PlacingProblem problem, Map<Climate, Company> known) {
        ChamberToFill chamber = problem.chambers().get(chamberNumber[c]);
        List<Offer> offers = chamber.offers();
        mayRest[c] = chamber.mayRest();
        cost[c] = offers.stream().mapToDouble(Offer::cost).toArray();
        earns[c] = new double[offers.size()][lots];
        heatShare[c] = new double[offers.size()][lots * days];
        company[c] = new Company[offers.size()];
        for (int l = 0; l < lots; l++) {
            LotToPlace lot = problem.lots().get(lotNumber[l]);
            massShare[c][l] = share(lot.massKg(), chamber.massKg());
            volumeShare[c][l] = share(lot.volumeM3(), chamber.volumeM3());
        }
        crowds[c] = new long[offers.size()][lots][Cover.words(lots)];
        for (int o = 0; o < offers.size(); o++) {
            Offer offer = offers.get(o);
            company[c][o] =
                    known.computeIfAbsent(
                            offer.climate(), climate -> new Company(climate, problem, lotNumber));
            for (int l = 0; l < lots; l++) {
                heat(c, o, l, offer);
                earns[c][o][l] = earns(c, o, l, problem, offer);
            }
            crowd(c, o);
        }
    }

    private void heat(int c, int o, int l, Offer offer) {
        for (int d = first[l]; d <= last[l]; d++) {
            heatShare[c][o][l * days + d] =
                    share(offer.climate().heatW(lotNumber[l], d), offer.coolingW().get(d));
        }
    }

    /** A lot that cannot stand there alone cannot stand there at all. */
    private double earns(int c, int o, int l, PlacingProblem problem, Offer offer) {
        LotToPlace lot = problem.lots().get(lotNumber[l]);
        String chamber = problem.chambers().get(chamberNumber[c]).id();
        double most = Math.max(massShare[c][l], volumeShare[c][l]);
        for (int d = first[l]; d <= last[l]; d++) {
            most = Math.max(most, heatShare[c][o][l * days + d]);
        }
        boolean elsewhere = lot.onlyIn().isPresent() && !lot.onlyIn().get().equals(chamber);
        return elsewhere || most > 1 ? Climate.NEVER : problem.earns(lotNumber[l], offer);
    }

    private void crowd(int c, int o) {
        for (int a = 0; a < lots; a++) {
            for (int b = 0; b < a && earns[c][o][a] > 0; b++) {
                if (earns[c][o][b] > 0 && crowd(c, o, a, b)) {
                    crowds[c][o][a][b >> 6] |= 1L << b;
                    crowds[c][o][b][a >> 6] |= 1L << a;
                }
            }
        }
    }

    private boolean crowd(int c, int o, int a, int b) {
        int from = Math.max(first[a], first[b]);
        int to = Math.min(last[a], last[b]);
        if (from > to) {
            return false;
        }
        boolean full =
                massShare[c][a] + massShare[c][b] > FULL
                        || volumeShare[c][a] + volumeShare[c][b] > FULL;
        for (int d = from; d <= to && !full; d++) {
            full = heatShare[c][o][a * days + d] + heatShare[c][o][b * days + d] > FULL;
        }
        return full;
    }

    private static double share(double part, double whole) {
        if (part <= 0) {
            return 0;
        }
        return whole > 0 ? Math.min(part / whole, TOO_MUCH) : TOO_MUCH;
    }

    int offers(int chamber) {
        return cost[chamber].length;
    }

    /** What a lot earns alone in a chamber, nothing where that is switched off. */
    double earns(int chamber, int offer, int lot) {
        return offer == Placing.RESTS ? 0 : earns[chamber][offer][lot];
    }

    /** Whether a lot may stand in a chamber in any of its climates. */
    boolean mayStand(int chamber, int lot) {
        for (double[] offer : earns[chamber]) {
            if (offer[lot] > Climate.NEVER) {
                return true;
            }
        }
        return false;
    }
}
