package org.wardon.enclosure.section;

/**
 * Solves symmetric positive definite equations whose numbers stand near the diagonal, by Cholesky's
 * factors within the band (Golub and Van Loan, Matrix Computations, 4th ed. 2013, section 4.3.5,
 * from memory). Row i holds the entries of columns i - band to i; nothing outside is ever touched.
 */
final class BandedCholesky {
    private final int size;
    private final int band;
    private final double[] lower;

    BandedCholesky(int size, int band) {
        this.size = size;
        this.band = band;
        this.lower = new double[size * (band + 1)];
    }

    private int at(int row, int column) {
        return row * (band + 1) + column - row + band;
    }

    /** Adds to an entry at or below the diagonal. */
    void add(int row, int column, double value) {
        lower[at(row, column)] += value;
    }

    /** Factorises in place and solves; the right-hand side becomes the answer. */
    void solve(double[] rightSide) {
        factorise();
        for (int row = 0; row < size; row++) {
            double sum = rightSide[row];
            for (int k = Math.max(0, row - band); k < row; k++) {
                sum -= lower[at(row, k)] * rightSide[k];
            }
            rightSide[row] = sum / lower[at(row, row)];
        }
        for (int row = size - 1; row >= 0; row--) {
            rightSide[row] /= lower[at(row, row)];
            for (int k = Math.max(0, row - band); k < row; k++) {
                rightSide[k] -= lower[at(row, k)] * rightSide[row];
            }
        }
    }

    private void factorise() {
        for (int row = 0; row < size; row++) {
            int first = Math.max(0, row - band);
            for (int column = first; column <= row; column++) {
                double sum = lower[at(row, column)];
                for (int k = Math.max(first, column - band); k < column; k++) {
                    sum -= lower[at(row, k)] * lower[at(column, k)];
                }
                if (column < row) {
                    lower[at(row, column)] = sum / lower[at(column, column)];
                } else if (sum > 0) {
                    lower[at(row, row)] = Math.sqrt(sum);
                } else {
                    throw new IllegalArgumentException(
                            "no edge lets heat through; give at least one a film or a temperature");
                }
            }
        }
    }
}
