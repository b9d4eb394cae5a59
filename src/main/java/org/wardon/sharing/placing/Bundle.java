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
        final int[] kinds;

        /** How many lots of each of the kinds; of one a part. */
        final double[] parts;

        /** What it earns, currency. */
        final double value;

        double share;
        private double pull;
        private int idle;

        /** Whether as many lots of each kind are in it, whole or in part. */
        boolean touchesSameAs(Load other) {
            boolean same = Arrays.equals(kinds, other.kinds);
            for (int i = 0; i < kinds.length && same; i++) {
                same = Math.ceil(parts[i]) == Math.ceil(other.parts[i]);
            }
            return same;
        }

        Load(int offer, int[] kinds, double[] parts, double value) {
            this.offer = offer;
            this.kinds = kinds;
            this.parts = parts;
            this.value = value;
        }
    }

    private final Store store;
    private final List<List<Load>> loads = new ArrayList<>();

    /** {@code [kind]}, how far a price moves for one lot too many, currency. */
    private final double[] reach;

    /** The most any lot may earn, currency. */
    private final double highest;

    /** {@code [kind]}, lots there are. */
    private int[] count;

    private final double[] wanted;
    private final double[] centre;
    private final List<List<Load>> open = new ArrayList<>();

    private double tolerance;

    /** {@code [kind]}, the prices. */
    final double[] price;

    /** How far prices may move at a time, as a share of what the lots may earn. */
    double length = FIRST_LENGTH;

    Bundle(Store store) {
        this.store = store;
        reach = new double[store.lots];
        wanted = new double[store.lots];
        centre = new double[store.lots];
        price = new double[store.lots];
        count = store.likeness.count;
        for (int c = 0; c < store.chambers; c++) {
            loads.add(new ArrayList<>());
            open.add(new ArrayList<>());
            for (double[] earns : store.earns[c]) {
                for (int l = 0; l < store.lots; l++) {
                    reach[l] = Math.max(reach[l], earns[l]);
                }
            }
        }
        highest = Arrays.stream(reach).max().orElse(0);
        for (int kind = 0; kind < store.lots; kind++) {
            reach[kind] /= Math.max(1, count[kind]);
        }
    }

    void add(int c, Load load) {
        for (Load known : loads.get(c)) {
            if (known.offer == load.offer && known.touchesSameAs(load)) {
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

    /** Tells how much of each climate the shares make, {@code [chamber][offer]}. */
    void useOfOffers(double[][] use) {
        for (int c = 0; c < store.chambers; c++) {
            Arrays.fill(use[c], 0);
            for (Load load : open.get(c)) {
                if (load.offer != Placing.RESTS) {
                    use[c][load.offer] += load.share;
                }
            }
        }
    }

    /** Tells how many lots of each kind the shares make, {@code [chamber][kind]}. */
    void useOfKinds(double[][] use) {
        for (int c = 0; c < store.chambers; c++) {
            Arrays.fill(use[c], 0);
            for (Load load : open.get(c)) {
                for (int i = 0; i < load.kinds.length; i++) {
                    use[c][load.kinds[i]] += load.share * load.parts[i];
                }
            }
        }
    }

    /**
     * Only the loads a branch allows, nothing where none of those known is; their shares start anew
     * where one is no longer allowed.
     */
    void enter(Branch branch) {
        count = branch.count;
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
            if (allowed.isEmpty()) {
                allowed.add(loads.get(c).get(0));
            }
            double sum = 0;
            for (Load load : allowed) {
                sum += load.share;
            }
            Load first = allowed.get(0);
            first.share += 1 - sum;
        }
    }

    private static boolean allowed(Branch branch, int c, Load load) {
        if (load.kinds.length > 0 && !branch.offers[c].get(load.offer)) {
            return false;
        }
        int[] most = branch.most[c];
        int[] least = branch.least[c];
        int next = 0;
        for (int kind = 0; kind < most.length; kind++) {
            boolean in = next < load.kinds.length && load.kinds[next] == kind;
            double some = in ? load.parts[next++] : 0;
            if (some > most[kind] || some < least[kind]) {
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
        tolerance = 1e-5 * highest;
        for (List<Load> of : open) {
            for (Load load : of) {
                for (int i = 0; i < load.kinds.length; i++) {
                    wanted[load.kinds[i]] += load.share * load.parts[i];
                }
            }
        }
        for (int kind = 0; kind < price.length; kind++) {
            reprice(kind, length);
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

    private void reprice(int kind, double length) {
        double tooMany = wanted[kind] - count[kind];
        price[kind] = Math.max(0, centre[kind] + length * reach[kind] * tooMany);
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
        for (int i = 0; i < load.kinds.length; i++) {
            wanted[load.kinds[i]] += by * load.parts[i];
            reprice(load.kinds[i], length);
        }
    }

    double above(Load load) {
        double sum = load.value;
        for (int i = 0; i < load.kinds.length; i++) {
            sum -= load.parts[i] * price[load.kinds[i]];
        }
        return sum;
    }

    /** Reach of the kinds that are in one load and not in the other; both are in rising order. */
    private double apart(Load a, Load b) {
        double sum = 0;
        int i = 0;
        int j = 0;
        while (i < a.kinds.length || j < b.kinds.length) {
            int x = i < a.kinds.length ? a.kinds[i] : Integer.MAX_VALUE;
            int y = j < b.kinds.length ? b.kinds[j] : Integer.MAX_VALUE;
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
        for (int kind = 0; kind < price.length; kind++) {
            sum += count[kind] * price[kind];
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
