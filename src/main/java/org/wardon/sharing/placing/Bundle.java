package org.wardon.sharing.placing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The loads met so far, and the prices that would be best if there were no others, held near the
 * best prices known (proximal bundle method; C. Lemaréchal, in Optimization, 1989, from memory).
 * Its dual shares each chamber between loads; shares move between the two loads of a chamber that
 * pull hardest, one pair after another.
 */
final class Bundle {
    private static final int MOST_LOADS = 300;
    private static final int SWEEPS = 300;
    private static final double FIRST_LENGTH = 0.1;
    private static final int MOVES = 6;

    /** One load of a chamber. */
    static final class Load {
        final int offer;
        final int[] lots;

        /** How much of each of the lots, 0 to 1. */
        final double[] parts;

        /** What it earns, currency. */
        final double value;

        double share;
        private double pull;
        private int idle;

        Load(int offer, int[] lots, double[] parts, double value) {
            this.offer = offer;
            this.lots = lots;
            this.parts = parts;
            this.value = value;
        }
    }

    private final Store store;
    private final List<List<Load>> loads = new ArrayList<>();

    /** {@code [lot]}, how far a price moves for one lot too many, currency. */
    private final double[] reach;

    private final double[] wanted;
    private final double[] centre;
    private final List<List<Load>> open = new ArrayList<>();

    private double tolerance;

    /** {@code [lot]}, the prices. */
    final double[] price;

    /** How far prices may move at a time, as a share of what the lots may earn. */
    double length = FIRST_LENGTH;

    Bundle(Store store) {
        this.store = store;
        reach = new double[store.lots];
        wanted = new double[store.lots];
        centre = new double[store.lots];
        price = new double[store.lots];
        for (int c = 0; c < store.chambers; c++) {
            loads.add(new ArrayList<>());
            open.add(new ArrayList<>());
            for (double[] earns : store.earns[c]) {
                for (int l = 0; l < store.lots; l++) {
                    reach[l] = Math.max(reach[l], earns[l]);
                }
            }
        }
    }

    void add(int c, Load load) {
        for (Load known : loads.get(c)) {
            if (known.offer == load.offer && Arrays.equals(known.lots, load.lots)) {
                known.idle = 0;
                return;
            }
        }
        List<Load> all = loads.get(c);
        if (all.size() >= MOST_LOADS) {
            int idlest = 1;
            for (int i = 2; i < all.size(); i++) {
                idlest = all.get(i).idle > all.get(idlest).idle ? i : idlest;
            }
            all.remove(idlest);
        }
        all.add(load);
    }

    /** Tells how much of each climate and lot the shares make, {@code [chamber][offer or lot]}. */
    void use(double[][] ofOffers, double[][] ofLots) {
        for (int c = 0; c < store.chambers; c++) {
            Arrays.fill(ofOffers[c], 0);
            Arrays.fill(ofLots[c], 0);
            for (Load load : open.get(c)) {
                if (load.offer != Placing.RESTS) {
                    ofOffers[c][load.offer] += load.share;
                }
                for (int i = 0; i < load.lots.length; i++) {
                    ofLots[c][load.lots[i]] += load.share * load.parts[i];
                }
            }
        }
    }

    /** Only the loads a branch allows; their shares start anew where one is no longer allowed. */
    void enter(Branch branch) {
        for (int c = 0; c < store.chambers; c++) {
            List<Load> allowed = open.get(c);
            allowed.clear();
            for (Load load : loads.get(c)) {
                if (allowed(branch, c, load)) {
                    allowed.add(load);
                } else {
                    load.share = 0;
                }
            }
            double sum = 0;
            for (Load load : allowed) {
                sum += load.share;
            }
            if (!allowed.isEmpty()) {
                Load first = allowed.get(0);
                first.share += 1 - sum;
            }
        }
    }

    private static boolean allowed(Branch branch, int c, Load load) {
        if (load.lots.length > 0 && !branch.offers[c].get(load.offer)) {
            return false;
        }
        for (int l : load.lots) {
            if (!branch.lots[c].get(l)) {
                return false;
            }
        }
        return true;
    }

    /**
     * Moves the prices to the best for the loads known.
     *
     * @param from best prices known
     * @param length how far they may move
     * @return what the loads known promise there, currency
     */
    double solve(double[] from, double length) {
        System.arraycopy(from, 0, centre, 0, centre.length);
        Arrays.fill(wanted, 0);
        tolerance = 1e-5 * Arrays.stream(reach).max().orElse(0);
        for (List<Load> of : open) {
            for (Load load : of) {
                for (int i = 0; i < load.lots.length; i++) {
                    wanted[load.lots[i]] += load.share * load.parts[i];
                }
            }
        }
        for (int l = 0; l < price.length; l++) {
            reprice(l, length);
        }
        for (int sweep = 0; sweep < SWEEPS; sweep++) {
            double pull = 0;
            for (List<Load> of : open) {
                pull = Math.max(pull, even(of, length));
            }
            if (pull < tolerance) {
                break;
            }
        }
        return promised();
    }

    private void reprice(int l, double length) {
        price[l] = Math.max(0, centre[l] + length * reach[l] * (wanted[l] - 1));
    }

    /** Shares move from the load that pulls least to the one that pulls most. */
    private double even(List<Load> of, double length) {
        double worst = 0;
        for (int move = 0; move < MOVES; move++) {
            Load to = of.get(0);
            Load from = of.get(0);
            double least = Double.POSITIVE_INFINITY;
            double most = Double.NEGATIVE_INFINITY;
            for (Load load : of) {
                load.pull = above(load);
                if (load.pull > most) {
                    most = load.pull;
                    to = load;
                }
                if (load.share > 0 && load.pull < least) {
                    least = load.pull;
                    from = load;
                }
            }
            double gap = most - least;
            worst = Math.max(worst, gap);
            if (gap < tolerance) {
                return worst;
            }
            double bend = length * apart(to, from);
            double shift = bend > 0 ? Math.min(from.share, gap / bend) : from.share;
            shift(to, shift, length);
            shift(from, -shift, length);
        }
        return worst;
    }

    private void shift(Load load, double by, double length) {
        load.share = load.share + by < 1e-12 ? 0 : load.share + by;
        for (int i = 0; i < load.lots.length; i++) {
            wanted[load.lots[i]] += by * load.parts[i];
            reprice(load.lots[i], length);
        }
    }

    double above(Load load) {
        double sum = load.value;
        for (int i = 0; i < load.lots.length; i++) {
            sum -= load.parts[i] * price[load.lots[i]];
        }
        return sum;
    }

    /** Reach of the lots that are in one load and not in the other; both are in rising order. */
    private double apart(Load a, Load b) {
        double sum = 0;
        int i = 0;
        int j = 0;
        while (i < a.lots.length || j < b.lots.length) {
            int x = i < a.lots.length ? a.lots[i] : Integer.MAX_VALUE;
            int y = j < b.lots.length ? b.lots[j] : Integer.MAX_VALUE;
            int l = Math.min(x, y);
            double more = (x == l ? a.parts[i] : 0) - (y == l ? b.parts[j] : 0);
            sum += reach[l] * more * more;
            i += x == l ? 1 : 0;
            j += y == l ? 1 : 0;
        }
        return sum;
    }

    private double promised() {
        double sum = 0;
        for (double one : price) {
            sum += one;
        }
        for (List<Load> of : open) {
            double most = Double.NEGATIVE_INFINITY;
            for (Load load : of) {
                load.pull = above(load);
                most = Math.max(most, load.pull);
                load.idle = load.share > 0 ? 0 : load.idle + 1;
            }
            sum += most;
        }
        return sum;
    }
}
