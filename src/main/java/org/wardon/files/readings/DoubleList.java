package org.wardon.files.readings;

import java.util.Arrays;

/** Numbers in a row. */
final class DoubleList {
    private double[] values = new double[256];
    private int size;

    void add(double value) {
        if (size == values.length) {
            values = Arrays.copyOf(values, 2 * size);
        }
        values[size++] = value;
    }

    double get(int i) {
        return values[i];
    }

    int size() {
        return size;
    }
}
