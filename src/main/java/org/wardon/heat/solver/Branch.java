package org.wardon.heat.solver;

/**
 * One branch of the tree: a run of nodes, each coupled to its neighbours, that ends in a small
 * dense block; the block alone is coupled to two nodes of the hub. The branch holds its part of the
 * Jacobian J and eliminates {@code shift I - J} into the hub.
 *
 * <p>Arrays are flat; matrices are row by row. A caller writes the J parts and never the factors.
 */
public final class Branch {
    /** Nodes of the hub a branch touches. */
    public static final int TOUCH = 2;

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

    /** J of the block's rows by the two nodes of the hub, {@code [row * 2 + column]}. */
    public final double[] byHub;

    /** J of the hub's two rows by the block, {@code [hubRow * block + column]}. */
    public final double[] onHub;

    /** J of the block's first row by the last node of the run. */
    public double blockByRun;

    /** First of the two nodes of the hub it touches. */
    public final int hubAt;

    private final double[] inversePivot;
    private final double[] ratio;
    private final double[] afterShare;
    private final double[] inverse;
    private final double[] work;
    private final double[] hubShare;
    private double blockRatio;

    Branch(int start, int run, int block, int hubAt) {
        this.start = start;
        this.run = run;
        this.block = block;
        this.hubAt = hubAt;
        before = new double[run];
        self = new double[run];
        after = new double[run];
        inner = new double[block * block];
        byHub = new double[block * TOUCH];
        onHub = new double[TOUCH * block];
        inversePivot = new double[run];
        ratio = new double[run];
        afterShare = new double[run];
        inverse = new double[block * block];
        work = new double[block];
        hubShare = new double[block * TOUCH];
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

    /** Factors {@code shift I - J} and takes the branch's share off the hub's matrix. */
    void factor(double shift, double[] hubMatrix, int hub) {
        factorRun(shift);
        for (int i = 0; i < block * block; i++) {
            inverse[i] = -inner[i];
        }
        for (int i = 0; i < block; i++) {
            inverse[i * block + i] += shift;
        }
        if (run > 0) {
            blockRatio = -blockByRun * inversePivot[run - 1];
            inverse[0] += blockRatio * after[run - 1];
        }
        invertBlock();
        shareOfHub(hubMatrix, hub);
    }

    private void shareOfHub(double[] hubMatrix, int hub) {
        double first = 0;
        double firstBySecond = 0;
        double secondByFirst = 0;
        double second = 0;
        for (int i = 0; i < block; i++) {
            double left = 0;
            double right = 0;
            for (int k = 0; k < block; k++) {
                double part = inverse[i * block + k];
                left -= part * byHub[2 * k];
                right -= part * byHub[2 * k + 1];
            }
            hubShare[2 * i] = left;
            hubShare[2 * i + 1] = right;
            first += onHub[i] * left;
            firstBySecond += onHub[i] * right;
            secondByFirst += onHub[block + i] * left;
            second += onHub[block + i] * right;
        }
        int row = hubAt * hub + hubAt;
        hubMatrix[row] += first;
        hubMatrix[row + 1] += firstBySecond;
        hubMatrix[row + hub] += secondByFirst;
        hubMatrix[row + hub + 1] += second;
    }

    /**
     * Pivots by the leading minors, each over the product of the diagonal so far: {@code e(k) =
     * e(k-1) - before(k) after(k-1) / (d(k) d(k-1)) e(k-2)}. No node waits for the division of the
     * one before it, as it would where pivots follow from pivots.
     */
    private void factorRun(double shift) {
        double last = 1;
        double beforeLast = 1;
        double coupled = 0;
        for (int i = 0; i < run; i++) {
            double perDiagonal = 1 / (shift - self[i]);
            double minor = last - before[i] * coupled * perDiagonal * beforeLast;
            inversePivot[i] = perDiagonal * (last / minor);
            afterShare[i] = after[i] * inversePivot[i];
            coupled = after[i] * perDiagonal;
            beforeLast = last;
            last = minor;
        }
        for (int i = 1; i < run; i++) {
            ratio[i] = -before[i] * inversePivot[i - 1];
        }
    }

    /**
     * Gauss-Jordan in place without pivoting; a block of a few nodes is solved fastest by its
     * inverse.
     */
    private void invertBlock() {
        if (block == 2) {
            invertTwo();
            return;
        }
        double[] m = inverse;
        for (int k = 0; k < block; k++) {
            int row = k * block;
            double scale = 1 / m[row + k];
            m[row + k] = 1;
            for (int j = 0; j < block; j++) {
                m[row + j] *= scale;
            }
            for (int i = 0; i < block; i++) {
                if (i != k) {
                    double factor = m[i * block + k];
                    m[i * block + k] = 0;
                    for (int j = 0; j < block; j++) {
                        m[i * block + j] -= factor * m[row + j];
                    }
                }
            }
        }
    }

    private void invertTwo() {
        double[] m = inverse;
        double a = m[0];
        double scale = 1 / (a * m[3] - m[1] * m[2]);
        m[0] = m[3] * scale;
        m[1] *= -scale;
        m[2] *= -scale;
        m[3] = a * scale;
    }

    /** Multiplies the block's entries by its inverse, in place. */
    private void solveBlock(double[] x, int at) {
        if (block == 2) {
            double a = x[at];
            double b = x[at + 1];
            x[at] = inverse[0] * a + inverse[1] * b;
            x[at + 1] = inverse[2] * a + inverse[3] * b;
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

    /** Eliminates the branch from the right-hand side into the hub's entries, in place. */
    void forward(double[] x) {
        int b = start + run;
        if (run > 0) {
            double last = x[start];
            for (int i = 1; i < run; i++) {
                last = x[start + i] - ratio[i] * last;
                x[start + i] = last;
            }
            x[b] -= blockRatio * last;
        }
        solveBlock(x, b);
        double first = 0;
        double second = 0;
        for (int k = 0; k < block; k++) {
            double part = x[b + k];
            first += onHub[k] * part;
            second += onHub[block + k] * part;
        }
        x[hubAt] += first;
        x[hubAt + 1] += second;
    }

    /** Puts the hub's solution back into the branch, in place. */
    void back(double[] x) {
        int b = start + run;
        double first = x[hubAt];
        double second = x[hubAt + 1];
        for (int i = 0; i < block; i++) {
            x[b + i] -= hubShare[2 * i] * first + hubShare[2 * i + 1] * second;
        }
        double next = x[b];
        for (int i = run - 1; i >= 0; i--) {
            next = x[start + i] * inversePivot[i] + afterShare[i] * next;
            x[start + i] = next;
        }
    }
}
