package org.wardon.heat.solver;

import java.util.Arrays;

/**
 * One branch of the tree: a run of nodes, each coupled to its neighbours, that ends in a small
 * dense block; the block alone is coupled to the hub. The branch holds its part of the Jacobian J
 * and eliminates {@code shift I - J} into the hub.
 *
 * <p>Arrays are flat; matrices are row by row. A caller writes the J parts and never the factors.
 */
public final class Branch {
    /** Place of the first node of the run in the state. */
    public final int start;

    /** Nodes of the run before the block; may be 0. */
    public final int run;

    /** Nodes of the block, at least 1. */
    public final int block;

    /** J of the run: row to the node before it, {@code [node]}; the first is not used. */
    public final double[] before;

    /** J of the run: row to itself, {@code [node]}. */
    public final double[] self;

    /** J of the run: row to the node after it, the last to the first of the block. */
    public final double[] after;

    /** J within the block, {@code [row * block + column]}. */
    public final double[] inner;

    /** J of the block's rows by the hub, {@code [row * hub + hubColumn]}. */
    public final double[] byHub;

    /** J of the hub's rows by the block, {@code [hubRow * block + column]}. */
    public final double[] onHub;

    /** J of the block's first row by the last node of the run. */
    public double blockByRun;

    private final int hub;
    private final double[] inversePivot;
    private final double[] ratio;
    private final double[] afterShare;
    private final double[] lu;
    private final double[] inverse;
    private final double[] work;
    private final double[] hubShare;
    private double blockRatio;
    private boolean active = true;

    Branch(int start, int run, int block, int hub) {
        this.start = start;
        this.run = run;
        this.block = block;
        this.hub = hub;
        before = new double[run];
        self = new double[run];
        after = new double[run];
        inner = new double[block * block];
        byHub = new double[block * hub];
        onHub = new double[hub * block];
        inversePivot = new double[run];
        ratio = new double[run];
        afterShare = new double[run];
        lu = new double[block * block];
        inverse = new double[block * block];
        work = new double[block];
        hubShare = new double[block * hub];
    }

    /**
     * Returns whether the branch takes part.
     *
     * @return false while its nodes stand still and touch nothing
     */
    public boolean active() {
        return active;
    }

    /**
     * Lets the branch take part or stand still.
     *
     * @param takesPart true to take part
     */
    public void activate(boolean takesPart) {
        active = takesPart;
    }

    /**
     * Returns the place of a block node in the state.
     *
     * @param row row of the block
     * @return index into the state
     */
    public int blockAt(int row) {
        return start + run + row;
    }

    int size() {
        return run + block;
    }

    /** Sets J within the block and towards the hub to zero. */
    public void clearBlock() {
        Arrays.fill(inner, 0);
        Arrays.fill(byHub, 0);
        Arrays.fill(onHub, 0);
    }

    /** Factors {@code shift I - J} and takes the branch's share off the hub's matrix. */
    void factor(double shift, double[] hubMatrix) {
        factorRun(shift);
        for (int i = 0; i < block * block; i++) {
            lu[i] = -inner[i];
        }
        for (int i = 0; i < block; i++) {
            lu[i * block + i] += shift;
        }
        if (run > 0) {
            blockRatio = -blockByRun * inversePivot[run - 1];
            lu[0] += blockRatio * after[run - 1];
        }
        invertBlock();
        for (int i = 0; i < block; i++) {
            for (int c = 0; c < hub; c++) {
                double sum = 0;
                for (int k = 0; k < block; k++) {
                    sum -= inverse[i * block + k] * byHub[k * hub + c];
                }
                hubShare[i * hub + c] = sum;
            }
        }
        for (int r = 0; r < hub; r++) {
            for (int c = 0; c < hub; c++) {
                double sum = 0;
                for (int k = 0; k < block; k++) {
                    sum += onHub[r * block + k] * hubShare[k * hub + c];
                }
                hubMatrix[r * hub + c] += sum;
            }
        }
    }

    private void factorRun(double shift) {
        double pivot = 0;
        for (int i = 0; i < run; i++) {
            double r = i == 0 ? 0 : -before[i] * inversePivot[i - 1];
            pivot = shift - self[i] + (i == 0 ? 0 : r * after[i - 1]);
            double inverse = 1 / pivot;
            ratio[i] = r;
            inversePivot[i] = inverse;
            afterShare[i] = after[i] * inverse;
        }
    }

    /** Gauss-Jordan without pivoting; a block of a few nodes is solved fastest by its inverse. */
    private void invertBlock() {
        Arrays.fill(inverse, 0);
        for (int i = 0; i < block; i++) {
            inverse[i * block + i] = 1;
        }
        for (int k = 0; k < block; k++) {
            double scale = 1 / lu[k * block + k];
            for (int j = 0; j < block; j++) {
                lu[k * block + j] *= scale;
                inverse[k * block + j] *= scale;
            }
            for (int i = 0; i < block; i++) {
                double factor = lu[i * block + k];
                if (i != k && factor != 0) {
                    for (int j = 0; j < block; j++) {
                        lu[i * block + j] -= factor * lu[k * block + j];
                        inverse[i * block + j] -= factor * inverse[k * block + j];
                    }
                }
            }
        }
    }

    /** Multiplies the block's entries by its inverse, in place. */
    private void solveBlock(double[] x, int at) {
        if (block == 4) {
            solveFour(x, at);
            return;
        }
        for (int i = 0; i < block; i++) {
            double sum = 0;
            for (int k = 0; k < block; k++) {
                sum += inverse[i * block + k] * x[at + k];
            }
            work[i] = sum;
        }
        System.arraycopy(work, 0, x, at, block);
    }

    /** A block of four, written out: such make up most of a tree. */
    private void solveFour(double[] x, int at) {
        double[] m = inverse;
        double a = x[at];
        double b = x[at + 1];
        double c = x[at + 2];
        double d = x[at + 3];
        x[at] = m[0] * a + m[1] * b + m[2] * c + m[3] * d;
        x[at + 1] = m[4] * a + m[5] * b + m[6] * c + m[7] * d;
        x[at + 2] = m[8] * a + m[9] * b + m[10] * c + m[11] * d;
        x[at + 3] = m[12] * a + m[13] * b + m[14] * c + m[15] * d;
    }

    /** Eliminates the branch from the right-hand side into the hub's entries, in place. */
    void forward(double[] x) {
        for (int i = 1; i < run; i++) {
            x[start + i] -= ratio[i] * x[start + i - 1];
        }
        int b = start + run;
        if (run > 0) {
            x[b] -= blockRatio * x[b - 1];
        }
        solveBlock(x, b);
        for (int r = 0; r < hub; r++) {
            double sum = 0;
            for (int k = 0; k < block; k++) {
                sum += onHub[r * block + k] * x[b + k];
            }
            x[r] += sum;
        }
    }

    /** Puts the hub's solution back into the branch, in place. */
    void back(double[] x) {
        int b = start + run;
        for (int i = 0; i < block; i++) {
            double sum = 0;
            for (int c = 0; c < hub; c++) {
                sum += hubShare[i * hub + c] * x[c];
            }
            x[b + i] -= sum;
        }
        for (int i = run - 1; i >= 0; i--) {
            x[start + i] = x[start + i] * inversePivot[i] + afterShare[i] * x[start + i + 1];
        }
    }
}
