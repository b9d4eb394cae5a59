package org.wardon.sharing.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Chambers that must hold some lots of a kind, or may not hold more: held against trying all. */
class HeldLotsTest {
    private static final double ROUNDING = 2e-7;
    private static final Instances INSTANCES = new Instances();
    private static final int LOTS = 9;
    private static final int CHAMBERS = 3;
    private static final long MANY_STEPS = 1_000_000;

    private static PlacingProblem drawn(Mix.Harm harm, int seed) {
        Mix mix = Mix.ofAllCrops(0.7).few(1 + seed % 3, 1, true).company(harm);
        return INSTANCES.draw(LOTS, CHAMBERS, mix, seed);
    }

    /** Lots of a store, by its numbers, as bits by the numbers of the problem. */
    private static int bits(Store store, boolean[] lots) {
        int bits = 0;
        for (int l = 0; l < lots.length; l++) {
            bits |= lots[l] ? 1 << store.lotNumber[l] : 0;
        }
        return bits;
    }

    /** Best sum of gains of a load that holds what it must, by every set of lots. */
    private static double best(Store store, int c, int o, Gains gains) {
        double best = Double.NEGATIVE_INFINITY;
        for (int lots = 0; lots < 1 << LOTS; lots++) {
            best = Math.max(best, worth(store, c, o, gains, lots));
        }
        return best;
    }

    private static double worth(Store store, int c, int o, Gains gains, int lots) {
        double worth = 0;
        double[][] used = new double[3][store.days];
        for (int a = 0; a < LOTS; a++) {
            if ((lots & 1 << a) == 0) {
                worth += gains.must[a] ? Double.NEGATIVE_INFINITY : 0;
                continue;
            }
            worth += gains.ofLot[a];
            for (int d = store.first[a]; d <= store.last[a]; d++) {
                used[0][d] += store.massShare[c][a];
                used[1][d] += store.volumeShare[c][a];
                used[2][d] += store.heatShare[c][o][a * store.days + d];
            }
            int[] others = store.company[c][o].others[a];
            for (int k = 0; k < others.length; k++) {
                boolean both = others[k] < a && (lots & 1 << others[k]) != 0;
                worth -= both ? store.company[c][o].loss[a][k] : 0;
            }
        }
        boolean fits = Arrays.stream(used).flatMapToDouble(Arrays::stream).allMatch(u -> u <= 1);
        return fits ? worth : Double.NEGATIVE_INFINITY;
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 3, 5})
    void theBestLoadWithLotsThatMustBeHeldIsFound(int seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int possible = 0;
        int impossible = 0;
        for (Mix.Harm harm : Mix.Harm.values()) {
            Store store = new Store(drawn(harm, seed));
            LoadSearch search = new LoadSearch(store);
            Offers offers = new Offers(store, true);
            for (int time = 0; time < 200; time++) {
                int c = random.nextInt(CHAMBERS);
                int o = random.nextInt(store.offers(c));
                Gains gains = new Gains(LOTS);
                for (int l = 0; l < LOTS; l++) {
                    double part = random.nextDouble(-0.3, 1);
                    double earns = store.earns[c][o][l];
                    gains.ofLot[l] = earns > Climate.NEVER ? earns * part : earns;
                    gains.must[l] = random.nextInt(5) == 0 && gains.ofLot[l] > Climate.NEVER;
                }
                double best = best(store, c, o, gains);
                Weights weights = offers.weights(c, o);
                weights.tighten(gains, gains.held(), 3);
                double roof = search.roof(c, o, gains, weights);
                search.run(c, o, gains, weights, Double.NEGATIVE_INFINITY, MANY_STEPS);
                double slack = ROUNDING * Math.max(1, Math.abs(best));
                if (best == Double.NEGATIVE_INFINITY) {
                    assertFalse(search.found);
                    impossible++;
                } else {
                    assertEquals(best, search.value, slack);
                    assertTrue(roof >= best - slack, roof + " " + best);
                    assertTrue(weights.bound(gains) >= best - slack);
                    assertEquals(best, worth(store, c, o, gains, loaded(search.load)), slack);
                    possible++;
                }
            }
        }
        assertTrue(possible > 50 && impossible > 5, possible + " " + impossible);
    }

    private static int loaded(boolean[] load) {
        int bits = 0;
        for (int l = 0; l < load.length; l++) {
            bits |= load[l] ? 1 << l : 0;
        }
        return bits;
    }

    /** Each side of a parting by counts is bounded above the best placing of that side. */
    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 3, 5})
    void noPartOfThePlacingsIsBoundedBelowItsBest(int seed) {
        int held = 0;
        for (Mix.Harm harm : Mix.Harm.values()) {
            PlacingProblem problem = drawn(harm, seed);
            Store store = new Store(problem);
            for (int kind = 0; kind < LOTS; kind++) {
                for (int lots = 1; lots <= store.likeness.count[kind]; lots++) {
                    held += bothSides(problem, store, kind, lots, (kind + lots + seed) % CHAMBERS);
                }
            }
        }
        assertTrue(held > 5, held + " partings with placings on both sides");
    }

    private static int bothSides(PlacingProblem problem, Store store, int kind, int lots, int c) {
        boolean[] like = new boolean[LOTS];
        for (int l = 0; l < LOTS; l++) {
            like[l] = store.likeness.kind[l] == kind;
        }
        int ofKind = bits(store, like);
        ChamberToFill here = problem.chambers().get(store.chamberNumber[c]);
        Branch more = Branch.whole(store);
        more.atLeast(c, kind, lots);
        double best =
                new EveryPlacing(
                                problem,
                                (in, set) -> in != here || Integer.bitCount(set & ofKind) >= lots)
                        .best();
        check(store, more, best);
        Branch fewer = Branch.whole(store);
        fewer.atMost(c, kind, Math.min(fewer.most[c][kind], lots - 1));
        double other =
                new EveryPlacing(
                                problem,
                                (in, set) -> in != here || Integer.bitCount(set & ofKind) < lots)
                        .best();
        check(store, fewer, other);
        return best > 0 && other > 0 ? 1 : 0;
    }

    private static void check(Store store, Branch branch, double best) {
        LoadSearch search = new LoadSearch(store);
        Prices prices = new Prices(store);
        double slack = ROUNDING * Math.max(1, Math.abs(best));
        prices.lower(
                branch, new PartedLoads(store, new Offers(store, false), search), 20, () -> best);
        assertTrue(branch.bound >= best - slack, branch.bound + " " + best);
        WholeLoads whole = new WholeLoads(store, new Offers(store, true), search, MANY_STEPS);
        prices.lower(branch, whole, 20, () -> best);
        assertTrue(branch.bound >= best - slack, branch.bound + " " + best);
    }
}
