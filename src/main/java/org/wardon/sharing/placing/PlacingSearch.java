package org.wardon.sharing.placing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.PriorityQueue;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.wardon.errors.Progress;

/** Finds the best placing it can and says what none can exceed. */
public final class PlacingSearch {
    private static final long SEED = 1;
    private static final double ROUNDING = 1e-7;
    private static final double NEAR = 0.02;
    private static final double HELPS = 0.2;
    private static final long QUICKER = 10;
    private static final double HARDLY_NEAR = 0.002;

    private final Effort effort;
    private final Progress progress;
    private final Store store;
    private final Prices prices;
    private final PartedLoads parted;
    private final WholeLoads whole;
    private Loads last;
    private boolean wholeHelps;
    private final Polish polish;
    private final PriorityQueue<Branch> branches =
            new PriorityQueue<>(
                    Comparator.<Branch>comparingDouble(branch -> -branch.bound)
                            .thenComparingInt(branch -> branch.number));
    private double closed = Double.NEGATIVE_INFINITY;
    private int made;
    private final double[][] kindUse;

    private PlacingSearch(PlacingProblem problem, Effort effort, Progress progress) {
        this.effort = effort;
        this.progress = progress;
        store = new Store(problem);
        kindUse = new double[store.chambers][store.lots];
        Offers offers = new Offers(store, true);
        LoadSearch search = new LoadSearch(store);
        parted = new PartedLoads(store, new Offers(store, false), search);
        whole = new WholeLoads(store, offers, search, effort.loadSteps());
        last = whole;
        prices = new Prices(store);
        polish =
                new Polish(
                        store,
                        offers,
                        prices,
                        parted,
                        whole,
                        Math.max(1, effort.loadSteps() / QUICKER));
    }

    /**
     * Searches.
     *
     * @param problem the store to be filled
     * @param effort how much work to do
     * @return the best placing found and what no placing can exceed
     */
    public static PlacingAnswer of(PlacingProblem problem, Effort effort) {
        return of(problem, effort, Progress.SILENT);
    }

    /**
     * Searches as long as nobody stops it.
     *
     * @param problem the store to be filled
     * @param effort how much work to do
     * @param progress hears of each step and may stop the search
     * @return the best placing found and what no placing can exceed
     */
    public static PlacingAnswer of(PlacingProblem problem, Effort effort, Progress progress) {
        return new PlacingSearch(problem, effort, progress).search();
    }

    /** A bound this low leaves nothing better to be found but by rounding. */
    static double enough(double known) {
        return known + ROUNDING * Math.max(1, Math.abs(known));
    }

    private PlacingAnswer search() {
        Branch all = Branch.whole(store);
        prices.lower(all, parted, effort.priceSteps(), this::known);
        double ofParts = all.bound;
        prices.lower(all, whole, effort.priceSteps(), () -> repaired(NEAR));
        wholeHelps = ofParts - all.bound > HELPS * (ofParts - polish.bestValue);
        polish.fillAll(all);
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < effort.polishes() && !near(all.bound); i++) {
            goOn();
            polish.shake(random, all);
        }
        branches.add(all);
        int looked = 0;
        while (!branches.isEmpty() && looked < effort.branches() && !near(branches.peek().bound)) {
            split(branches.remove());
            looked++;
        }
        double bound = Math.max(polish.bestValue, closed);
        bound = branches.isEmpty() ? bound : Math.max(bound, branches.peek().bound);
        boolean proven = bound <= enough(polish.bestValue);
        return new PlacingAnswer(placing(), bound, proven, looked, prices.steps);
    }

    private double known() {
        goOn();
        return polish.bestValue;
    }

    /** Whoever hears of the step may stop the search. */
    private void goOn() {
        progress.at("search", 0);
    }

    private double repaired(double near) {
        goOn();
        polish.repair(near);
        return polish.bestValue;
    }

    private boolean near(double bound) {
        double gap = effort.gapFraction() * Math.abs(bound);
        return bound <= enough(polish.bestValue) + gap;
    }

    private void lower(Branch branch) {
        last = parted;
        prices.lower(branch, parted, effort.branchSteps(), this::known);
        if (branch.bound > enough(polish.bestValue)) {
            int steps = wholeHelps ? effort.branchSteps() : 1;
            last = wholeHelps ? whole : parted;
            prices.lower(branch, whole, steps, () -> repaired(HARDLY_NEAR));
        }
    }

    /** Looks into a branch by parting it in two. */
    private void split(Branch branch) {
        lower(branch);
        if (branch.bound <= enough(polish.bestValue)) {
            return;
        }
        Branch one = branch.copy(++made);
        Branch other = branch.copy(++made);
        last.bundle.useOfKinds(kindUse);
        if (!part(one, other)) {
            close(branch);
            return;
        }
        for (Branch part : List.of(one, other)) {
            lower(part);
            if (part.bound > enough(polish.bestValue)) {
                branches.add(part);
            }
        }
    }

    /** Nothing is left to decide, so no lot has a price: the loads themselves are the placing. */
    private void close(Branch branch) {
        Arrays.fill(branch.price, 0);
        prices.lower(branch, whole, 1, () -> repaired(HARDLY_NEAR));
        closed = Math.max(closed, branch.bound);
    }

    /**
     * Parts how many lots of a kind a chamber holds: at most as many as it held whole of late, or
     * more. Climates need no parting: chambers that no longer vie for lots take their best each.
     */
    private boolean part(Branch one, Branch other) {
        int kind = -1;
        int chamber = -1;
        double most = Double.NEGATIVE_INFINITY;
        for (int k = 0; k < store.lots; k++) {
            if (one.decided(k)) {
                continue;
            }
            for (int c = 0; c < store.chambers; c++) {
                double part = kindUse[c][k] - wholeLots(one, c, k);
                double open = part * (1 - Math.min(1, part)) * (1 + one.price[k]);
                if (one.least[c][k] < one.most[c][k] && open > most) {
                    most = open;
                    kind = k;
                    chamber = c;
                }
            }
        }
        if (kind < 0) {
            return false;
        }
        int lots = wholeLots(one, chamber, kind);
        one.atLeast(chamber, kind, lots + 1);
        other.atMost(chamber, kind, lots);
        return true;
    }

    /** How many whole lots of a kind a chamber held of late, so that it may hold one more. */
    private int wholeLots(Branch branch, int c, int kind) {
        int most = Math.min((int) kindUse[c][kind], branch.most[c][kind] - 1);
        return Math.max(branch.least[c][kind], most);
    }

    private Placing placing() {
        List<Placing.Filled> filled = new ArrayList<>();
        Fill best = polish.best;
        int[] placeOf = new int[store.chambers];
        for (int c = 0; c < store.chambers; c++) {
            placeOf[store.chamberNumber[c]] = c;
        }
        for (int number = 0; number < store.chambers; number++) {
            int c = placeOf[number];
            filled.add(new Placing.Filled(best.offer[c], standing(best, c)));
        }
        return new Placing(filled, standing(best, Fill.NOWHERE), best.value());
    }

    private List<Integer> standing(Fill fill, int c) {
        return IntStream.range(0, store.lots)
                .filter(l -> fill.chamber[l] == c)
                .map(l -> store.lotNumber[l])
                .sorted()
                .boxed()
                .toList();
    }
}
