package org.wardon.heat.solver;

/**
 * Many branches of one shape side by side: of each a run of nodes that ends in a block of four, of
 * which the last two touch the hub. Node k of member i stands at {@code start + k * places + i}, so
 * that one pass goes over all members: neighbours in memory do not wait for each other.
 *
 * <p>Only the first members take part, as many as {@link #count}; members are added in the order in
 * which they start to take part. Arrays of J are {@code [row * places + member]}; the system writes
 * them and never the factors. Elimination as in {@link Branch}, of the block in its order without
 * pivoting.
 */
public final class Bank {
    /** Nodes of a block. */
    public static final int BLOCK = 4;

    /** Rows of the block that touch the hub, and nodes of the hub they touch. */
    public static final int TOUCH = 2;

    /** Place of the first node in the state. */
    public final int start;

    /** Members there is room for. */
    public final int places;

    /** Nodes of the run of each member, at least 1. */
    public final int run;

    /** J of the run: row to the node before it; the first row is not used. */
    public final double[] before;

    /** J of the run: row to itself. */
    public final double[] self;

    /** J of the run: row to the node after it, the last to the first of the block. */
    public final double[] after;

    /** J of the block's first row by the last node of the run, {@code [member]}. */
    public final double[] blockByRun;

    /** J within the block, {@code [(row * 4 + column) * places + member]}. */
    public final double[] inner;

    /**
     * J of the block's last two rows by the hub, {@code [(row * 2 + column) * places + member]}.
     */
    public final double[] byHub;

    /** J of the hub's rows by those two, {@code [(hubRow * 2 + column) * places + member]}. */
    public final double[] onHub;

    /** First of the two nodes of the hub they touch. */
    public final int hubAt;

    private final double[] inversePivot;
    private final double[] ratio;
    private final double[] afterShare;
    private final double[] blockRatio;

    /** Below the diagonal of the block's factors: 10 20 30 21 31 32. */
    private final double[] lower;

    /** Above it: 01 02 03 12 13 23, each over its row's pivot. */
    private final double[] upper;

    /** Inverse pivots of the block. */
    private final double[] pivots;

    /** The block's last two rows by the hub, over their pivots. */
    private final double[] hubShare;

    /** What the hub's rows take of them. */
    private final double[] onto;

    private int count;

    Bank(int start, int places, int run, int hubAt) {
        this.start = start;
        this.places = places;
        this.run = run;
        this.hubAt = hubAt;
        before = new double[run * places];
        self = new double[run * places];
        after = new double[run * places];
        blockByRun = new double[places];
        inner = new double[BLOCK * BLOCK * places];
        byHub = new double[TOUCH * TOUCH * places];
        onHub = new double[TOUCH * TOUCH * places];
        inversePivot = new double[run * places];
        ratio = new double[run * places];
        afterShare = new double[run * places];
        blockRatio = new double[places];
        lower = new double[6 * places];
        upper = new double[6 * places];
        pivots = new double[BLOCK * places];
        hubShare = new double[TOUCH * TOUCH * places];
        onto = new double[TOUCH * TOUCH * places];
    }

    /**
     * Returns how many members take part.
     *
     * @return 0 to {@link #places}
     */
    public int count() {
        return count;
    }

    /**
     * Lets the first members take part.
     *
     * @param members 0 to {@link #places}
     */
    public void count(int members) {
        count = members;
    }

    /**
     * Returns the place of a node in the state.
     *
     * @param row row of the run, or behind it of the block
     * @param member the member
     * @return index into the state
     */
    public int at(int row, int member) {
        return start + row * places + member;
    }

    /**
     * Returns the nodes of one member.
     *
     * @return run and block
     */
    public int rows() {
        return run + BLOCK;
    }

    int size() {
        return rows() * places;
    }

    /** Factors {@code shift I - J} and takes the bank's share off the hub's matrix. */
    void factor(double shift, double[] hubMatrix, int hub) {
        factorFirst(shift);
        for (int k = 1; k < run; k++) {
            factorRow(shift, k * places);
        }
        factorBlock(shift);
        shareOfHub();
        for (int r = 0; r < TOUCH; r++) {
            for (int c = 0; c < TOUCH; c++) {
                hubMatrix[(hubAt + r) * hub + hubAt + c] -= taken(r, c);
            }
        }
    }

    private void factorFirst(double shift) {
        for (int i = 0; i < count; i++) {
            double inverse = 1 / (shift - self[i]);
            inversePivot[i] = inverse;
            afterShare[i] = after[i] * inverse;
        }
    }

    private void factorRow(double shift, int at) {
        int p = places;
        for (int i = at; i < at + count; i++) {
            double r = -before[i] * inversePivot[i - p];
            double inverse = 1 / (shift - self[i] + r * after[i - p]);
            ratio[i] = r;
            inversePivot[i] = inverse;
            afterShare[i] = after[i] * inverse;
        }
    }

    private void factorBlock(double shift) {
        int p = places;
        int last = (run - 1) * p;
        double[] in = inner;
        for (int i = 0; i < count; i++) {
            double step = -blockByRun[i] * inversePivot[last + i];
            blockRatio[i] = step;
            double i0 = 1 / (shift - in[i] + step * after[last + i]);
            double a01 = -in[p + i] * i0;
            double a02 = -in[2 * p + i] * i0;
            double a03 = -in[3 * p + i] * i0;
            double l10 = -in[4 * p + i];
            double i1 = 1 / (shift - in[5 * p + i] - l10 * a01);
            double a12 = (-in[6 * p + i] - l10 * a02) * i1;
            double a13 = (-in[7 * p + i] - l10 * a03) * i1;
            double l20 = -in[8 * p + i];
            double l21 = -in[9 * p + i] - l20 * a01;
            double i2 = 1 / (shift - in[10 * p + i] - l20 * a02 - l21 * a12);
            double a23 = (-in[11 * p + i] - l20 * a03 - l21 * a13) * i2;
            double l30 = -in[12 * p + i];
            double l31 = -in[13 * p + i] - l30 * a01;
            double l32 = -in[14 * p + i] - l30 * a02 - l31 * a12;
            double i3 = 1 / (shift - in[15 * p + i] - l30 * a03 - l31 * a13 - l32 * a23);
            lower[i] = l10;
            lower[p + i] = l20;
            lower[2 * p + i] = l30;
            lower[3 * p + i] = l21;
            lower[4 * p + i] = l31;
            lower[5 * p + i] = l32;
            upper[i] = a01;
            upper[p + i] = a02;
            upper[2 * p + i] = a03;
            upper[3 * p + i] = a12;
            upper[4 * p + i] = a13;
            upper[5 * p + i] = a23;
            pivots[i] = i0;
            pivots[p + i] = i1;
            pivots[2 * p + i] = i2;
            pivots[3 * p + i] = i3;
        }
    }

    private void shareOfHub() {
        int p = places;
        for (int i = 0; i < count; i++) {
            double l32 = lower[5 * p + i];
            double a23 = upper[5 * p + i];
            double i2 = pivots[2 * p + i];
            double i3 = pivots[3 * p + i];
            double h20 = -byHub[i] * i2;
            double h21 = -byHub[p + i] * i2;
            hubShare[i] = h20;
            hubShare[p + i] = h21;
            hubShare[2 * p + i] = (-byHub[2 * p + i] - l32 * h20) * i3;
            hubShare[3 * p + i] = (-byHub[3 * p + i] - l32 * h21) * i3;
            double g02 = -onHub[i];
            double g12 = -onHub[2 * p + i];
            onto[i] = g02;
            onto[p + i] = -onHub[p + i] - g02 * a23;
            onto[2 * p + i] = g12;
            onto[3 * p + i] = -onHub[3 * p + i] - g12 * a23;
        }
    }

    /** What elimination takes off the hub's entry of row r and column c. */
    private double taken(int r, int c) {
        int p = places;
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum +=
                    onto[2 * r * p + i] * hubShare[c * p + i]
                            + onto[(2 * r + 1) * p + i] * hubShare[(2 + c) * p + i];
        }
        return sum;
    }

    /** Eliminates the members from the right-hand side into the hub's entries, in place. */
    void forward(double[] x) {
        int p = places;
        for (int k = 1; k < run; k++) {
            int at = start + k * p;
            int row = k * p;
            for (int i = 0; i < count; i++) {
                x[at + i] -= ratio[row + i] * x[at - p + i];
            }
        }
        int b = start + run * p;
        double first = 0;
        double second = 0;
        for (int i = 0; i < count; i++) {
            double x0 = (x[b + i] - blockRatio[i] * x[b - p + i]) * pivots[i];
            double x1 = (x[b + p + i] - lower[i] * x0) * pivots[p + i];
            double x2 =
                    (x[b + 2 * p + i] - lower[p + i] * x0 - lower[3 * p + i] * x1)
                            * pivots[2 * p + i];
            double x3 =
                    (x[b + 3 * p + i]
                                    - lower[2 * p + i] * x0
                                    - lower[4 * p + i] * x1
                                    - lower[5 * p + i] * x2)
                            * pivots[3 * p + i];
            x[b + i] = x0;
            x[b + p + i] = x1;
            x[b + 2 * p + i] = x2;
            x[b + 3 * p + i] = x3;
            first += onto[i] * x2 + onto[p + i] * x3;
            second += onto[2 * p + i] * x2 + onto[3 * p + i] * x3;
        }
        x[hubAt] -= first;
        x[hubAt + 1] -= second;
    }

    /** Puts the hub's solution back into the members, in place. */
    void back(double[] x) {
        int p = places;
        int b = start + run * p;
        double first = x[hubAt];
        double second = x[hubAt + 1];
        for (int i = 0; i < count; i++) {
            double x3 =
                    x[b + 3 * p + i] - hubShare[2 * p + i] * first - hubShare[3 * p + i] * second;
            double x2 =
                    x[b + 2 * p + i]
                            - hubShare[i] * first
                            - hubShare[p + i] * second
                            - upper[5 * p + i] * x3;
            double x1 = x[b + p + i] - upper[3 * p + i] * x2 - upper[4 * p + i] * x3;
            x[b + i] -= upper[i] * x1 + upper[p + i] * x2 + upper[2 * p + i] * x3;
            x[b + p + i] = x1;
            x[b + 2 * p + i] = x2;
            x[b + 3 * p + i] = x3;
        }
        for (int k = run - 1; k >= 0; k--) {
            int at = start + k * p;
            int row = k * p;
            for (int i = 0; i < count; i++) {
                x[at + i] = x[at + i] * inversePivot[row + i] + afterShare[row + i] * x[at + p + i];
            }
        }
    }

    /** The largest root mean square of a member; {@code weighted} is error over allowance. */
    double worst(double[] error, double[] weights) {
        double worst = 0;
        int p = places;
        for (int i = 0; i < count; i++) {
            double sum = 0;
            for (int at = start + i; at < start + rows() * p; at += p) {
                double share = error[at] * weights[at];
                sum += share * share;
            }
            if (sum > worst || Double.isNaN(sum)) {
                worst = sum;
                worstMember = i;
            }
        }
        return Math.sqrt(worst / rows());
    }

    /** The member {@link #worst} found. */
    int worstMember;
}
