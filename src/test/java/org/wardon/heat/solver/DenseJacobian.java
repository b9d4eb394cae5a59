package org.wardon.heat.solver;

/** The Jacobian a tree holds, written out as a matrix, for tests. */
public final class DenseJacobian {
    private DenseJacobian() {}

    /**
     * Writes it out.
     *
     * @param tree the tree
     * @return {@code [row][column]}
     */
    public static double[][] of(Tree tree) {
        int hub = tree.hub();
        double[][] j = new double[tree.size()][tree.size()];
        for (int r = 0; r < hub; r++) {
            System.arraycopy(tree.hubByHub, r * hub, j[r], 0, hub);
        }
        for (Branch branch : tree.branches()) {
            if (branch.active()) {
                write(branch, hub, j);
            }
        }
        return j;
    }

    private static void write(Branch branch, int hub, double[][] j) {
        for (int i = 0; i < branch.run; i++) {
            int at = branch.start + i;
            j[at][at] = branch.self[i];
            j[at][at + 1] = branch.after[i];
            if (i > 0) {
                j[at][at - 1] = branch.before[i];
            }
        }
        int b = branch.blockAt(0);
        if (branch.run > 0) {
            j[b][b - 1] = branch.blockByRun;
        }
        for (int r = 0; r < branch.block; r++) {
            System.arraycopy(branch.inner, r * branch.block, j[b + r], b, branch.block);
            for (int h = 0; h < hub; h++) {
                j[b + r][h] = branch.byHub[r * hub + h];
                j[h][b + r] = branch.onHub[h * branch.block + r];
            }
        }
    }
}
