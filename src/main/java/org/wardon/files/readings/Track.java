package org.wardon.files.readings;

/**
 * The filled cells of one column.
 *
 * @param at local seconds, rising
 * @param line line of each
 * @param value value of each
 */
record Track(LongList at, LongList line, DoubleList value) {
    int size() {
        return at.size();
    }

    /** Returns the values at even times by straight lines; the ends are held. */
    double[] even(long fromS, long stepS, int count) {
        LongList times = new LongList();
        for (int i = 0; i < count; i++) {
            times.add(fromS + i * stepS);
        }
        return valuesAt(times);
    }

    /** Returns the value at a time by straight lines; the ends are held. */
    double at(long t) {
        int low = 0;
        int high = size();
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (at.get(middle) < t) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return between(low, t);
    }

    /** Returns the values at rising times by straight lines; the ends are held. */
    double[] valuesAt(LongList times) {
        double[] out = new double[times.size()];
        int next = 0;
        for (int i = 0; i < out.length; i++) {
            while (next < size() && at.get(next) < times.get(i)) {
                next++;
            }
            out[i] = between(next, times.get(i));
        }
        return out;
    }

    private double between(int next, long t) {
        if (next == 0) {
            return value.get(0);
        }
        if (next == size()) {
            return value.get(size() - 1);
        }
        double share = (double) (t - at.get(next - 1)) / (at.get(next) - at.get(next - 1));
        double before = value.get(next - 1);
        return before + share * (value.get(next) - before);
    }
}
