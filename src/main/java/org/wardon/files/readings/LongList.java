package org.wardon.files.readings;

import java.util.Arrays;

/** Whole numbers in a row; a year of minutes would be heavy as boxed values. */
final class LongList {
    private long[] values = new long[256];
    private int size;

    void add(long value) {
        if (size == values.length) {
            values = Arrays.copyOf(values, 2 * size);
        }
        values[size++] = value;
    }

    long get(int i) {
        return values[i];
    }

    int size() {
        return size;
    }
}
