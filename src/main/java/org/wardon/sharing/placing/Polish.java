package org.wardon.sharing.placing;

import java.util.Arrays;
import java.util.BitSet;
import java.util.SplittableRandom;

/**
 * Makes placings better: loads of chambers are sought again with the lots of others to be had for
 * what they earn there, lots are moved and swapped, and parts of the store are emptied and filled
 * again.
 */
final class Polish {
    private static final double ROUNDING = 1e-9;
    private static final int MOST_PASSES = 20;
    private static final int MOST_EMPTIED = 4;
    private static final int FILL_STEPS = 10;

    private final Store store;
    private final Prices prices;
    private final PartedLoads parted;
    private final WholeLoads loads;
    private final double[][] offerUse;
    private final Offers offers;
    private final LoadSearch search;
    private final long loadSteps;
    private final Gains gains;
    private final int[][] wanted;
    private final double[] here;
    private final boolean[] load;
    private final Fill trial;

    /** The best placing known. */
    final Fill best;

    double bestValue;

    Polish(
            Store store,
            Offers offers,
            Prices prices,
            PartedLoads parted,
            WholeLoads loads,
            long loadSteps) {
        offerUse = new double[store.chambers][];
        for (int c = 0; c < store.chambers; c++) {
            offerUse[c] = new double[store.offers(c)];
        }
        this.store = store;
        this.offers = offers;
        this.loads = loads;
        this.search = loads.search;
        this.prices = prices;
        this.parted = parted;
        this.loadSteps = loadSteps;
        gains = new Gains(store.lots);
        wanted = new int[store.chambers][store.lots];
        here = new double[store.lots];
        load = new boolean[store.lots];
        trial = new Fill(store);
        best = new Fill(store);
        bestValue = best.value();
    }

    /** Makes a placing of the loads the prices lead to; keeps it if it is the best. */
    void repair(double nearFraction) {
        for (int c = 0; c < store.chambers; c++) {
            int offer = loads.offer[c];
            boolean rests = offer == Placing.RESTS && !store.mayRest[c];
            trial.clear(c, rests ? best.offer[c] : offer);
        }
        for (int c = 0; c < store.chambers; c++) {
            Arrays.fill(wanted[c], 0);
            for (int l = 0; l < store.lots; l++) {
                wanted[c][store.likeness.kind[l]] += loads.load[c][l] ? 1 : 0;
            }
        }
        for (int l = 0; l < store.lots; l++) {
            int kind = store.likeness.kind[l];
            int most = Fill.NOWHERE;
            for (int c = 0; c < store.chambers; c++) {
                if (wanted[c][kind] > 0
                        && (most == Fill.NOWHERE || trial.gain(l, c) > trial.gain(l, most))) {
                    most = c;
                }
            }
            if (most != Fill.NOWHERE) {
                trial.put(l, most);
                wanted[most][kind]--;
            }
        }
        insert();
        keep();
        if (trial.value() > bestValue - nearFraction * Math.abs(bestValue)) {
            improve();
            keep();
        }
    }

    private void keep() {
        double value = trial.value();
        if (value > bestValue + ROUNDING * Math.abs(bestValue)) {
            bestValue = value;
            best.copyFrom(trial);
        }
    }

    /** Empties some chambers of the best placing, fills them again and polishes. */
    void shake(SplittableRandom random, Branch whole) {
        trial.copyFrom(best);
        BitSet emptied = new BitSet();
        int count = Math.min(store.chambers, 2 + random.nextInt(MOST_EMPTIED));
        while (emptied.cardinality() < count) {
            emptied.set(random.nextInt(store.chambers));
        }
        fill(emptied, whole);
    }

    /** Fills all chambers from nothing. */
    void fillAll(Branch whole) {
        BitSet all = new BitSet();
        all.set(0, store.chambers);
        fill(all, whole);
    }

    /**
     * Fills chambers one after another, the one whose climate wavers least first, at prices that
     * are found anew for what is left.
     */
    private void fill(BitSet emptied, Branch whole) {
        Branch part = whole.copy(0);
        for (int c = 0; c < store.chambers; c++) {
            if (emptied.get(c)) {
                trial.clear(c, store.mayRest[c] ? Placing.RESTS : trial.offer[c]);
            } else {
                part.shut(c, trial.offer[c]);
            }
        }
        for (int l = 0; l < store.lots; l++) {
            if (trial.chamber[l] != Fill.NOWHERE) {
                part.forget(store.likeness.kind[l]);
            }
        }
        while (!emptied.isEmpty()) {
            prices.lower(part, parted, FILL_STEPS, () -> Double.NEGATIVE_INFINITY);
            parted.bundle.useOfOffers(offerUse);
            int c = surest(emptied);
            emptied.clear(c);
            loads.most(part, c, part.price);
            trial.clear(c, rests(c) ? trial.offer[c] : loads.offer[c]);
            for (int l = 0; l < store.lots; l++) {
                if (loads.load[c][l]) {
                    int kind = store.likeness.kind[l];
                    trial.put(unplaced(kind), c);
                    part.forget(kind);
                }
            }
            part.shut(c, trial.offer[c]);
        }
        insert();
        improve();
        keep();
    }

    private boolean rests(int c) {
        return loads.offer[c] == Placing.RESTS && !store.mayRest[c];
    }

    /** The first lot of a kind that stands nowhere yet. */
    private int unplaced(int kind) {
        int l = kind;
        while (store.likeness.kind[l] != kind || trial.chamber[l] != Fill.NOWHERE) {
            l++;
        }
        return l;
    }

    private int surest(BitSet among) {
        int surest = among.nextSetBit(0);
        double most = -1;
        for (int c = surest; c >= 0; c = among.nextSetBit(c + 1)) {
            double use = Arrays.stream(offerUse[c]).max().orElse(0);
            if (use > most) {
                most = use;
                surest = c;
            }
        }
        return surest;
    }

    private double earning(int l) {
        return trial.chamber[l] == Fill.NOWHERE ? 0 : trial.gain(l, trial.chamber[l]);
    }

    /** Polishes until nothing more is gained. */
    private void improve() {
        for (int pass = 0; pass < MOST_PASSES; pass++) {
            double before = trial.value();
            for (int c = 0; c < store.chambers; c++) {
                for (int l = 0; l < store.lots; l++) {
                    here[l] = trial.chamber[l] == c ? 0 : earning(l);
                }
                reload(c, trial.value(c));
                insert();
            }
            moves();
            if (trial.value() <= before + ROUNDING * Math.abs(before)) {
                return;
            }
        }
    }

    /** The best climate and load of a chamber, other lots to be had for what they earn. */
    private void reload(int c, double toBeat) {
        double most = toBeat;
        int offer = Placing.RESTS;
        boolean better = false;
        if (store.mayRest[c] && most < 0) {
            most = 0;
            better = true;
            Arrays.fill(load, false);
        }
        for (int o = 0; o < store.offers(c); o++) {
            gains.of(store.earns[c][o], here);
            Weights weights = offers.weights(c, o);
            double beat = most == Double.NEGATIVE_INFINITY ? -1 : most + store.cost[c][o];
            beat += ROUNDING * Math.abs(beat);
            if (weights.bound(gains) <= beat) {
                continue;
            }
            search.run(c, o, gains, weights, beat, loadSteps);
            if (search.found) {
                most = search.value - store.cost[c][o];
                offer = o;
                better = true;
                System.arraycopy(search.load, 0, load, 0, load.length);
            }
        }
        if (better) {
            settle(c, offer);
        }
    }

    private void settle(int c, int offer) {
        for (int l = 0; l < store.lots; l++) {
            if (load[l] && trial.chamber[l] != Fill.NOWHERE && trial.chamber[l] != c) {
                trial.takeOut(l);
            }
        }
        trial.clear(c, offer);
        for (int l = 0; l < store.lots; l++) {
            if (load[l]) {
                trial.put(l, c);
            }
        }
    }

    /** Puts lots without a place where they earn most, the most valuable first. */
    private void insert() {
        while (true) {
            int lot = Fill.NOWHERE;
            int chamber = Fill.NOWHERE;
            double most = 0;
            for (int l = 0; l < store.lots; l++) {
                if (trial.chamber[l] != Fill.NOWHERE) {
                    continue;
                }
                for (int c = 0; c < store.chambers; c++) {
                    double gain = trial.gain(l, c);
                    if (gain > most && trial.fits(l, c)) {
                        most = gain;
                        lot = l;
                        chamber = c;
                    }
                }
            }
            if (lot == Fill.NOWHERE) {
                return;
            }
            trial.put(lot, chamber);
        }
    }

    /** Moves single lots to where they earn more, and swaps lots where both earn more. */
    private void moves() {
        for (int l = 0; l < store.lots; l++) {
            move(l);
        }
        for (int a = 0; a < store.lots; a++) {
            for (int b = a + 1; b < store.lots; b++) {
                if (trial.chamber[a] != trial.chamber[b] && !store.likeness.alike(a, b)) {
                    swap(a, b);
                }
            }
        }
    }

    private void move(int l) {
        int from = trial.chamber[l];
        if (from == Fill.NOWHERE) {
            return;
        }
        double earned = trial.gain(l, from);
        trial.takeOut(l);
        int to = from;
        for (int c = 0; c < store.chambers; c++) {
            double gain = c == from ? earned : trial.gain(l, c);
            if (gain > earned + ROUNDING * Math.abs(earned) && trial.fits(l, c)) {
                earned = gain;
                to = c;
            }
        }
        trial.put(l, to);
    }

    private void swap(int a, int b) {
        int atA = trial.chamber[a];
        int atB = trial.chamber[b];
        if ((atA != Fill.NOWHERE && !(store.earns(atA, trial.offer[atA], b) > 0))
                || (atB != Fill.NOWHERE && !(store.earns(atB, trial.offer[atB], a) > 0))) {
            return;
        }
        double before = earning(a) + earning(b);
        takeOut(a);
        takeOut(b);
        boolean fits = fits(a, atB);
        double after = fits ? put(a, atB) : 0;
        fits = fits && fits(b, atA);
        after += fits ? put(b, atA) : 0;
        if (!fits || after <= before + ROUNDING * Math.abs(before)) {
            takeOut(a);
            takeOut(b);
            put(a, atA);
            put(b, atB);
        }
    }

    private void takeOut(int l) {
        if (trial.chamber[l] != Fill.NOWHERE) {
            trial.takeOut(l);
        }
    }

    private boolean fits(int l, int c) {
        return c == Fill.NOWHERE || (trial.gain(l, c) > 0 && trial.fits(l, c));
    }

    private double put(int l, int c) {
        if (c == Fill.NOWHERE) {
            return 0;
        }
        double gain = trial.gain(l, c);
        trial.put(l, c);
        return gain;
    }
}
