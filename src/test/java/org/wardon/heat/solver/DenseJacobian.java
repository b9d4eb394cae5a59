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
            write(branch, j);
        }
        for (Bank bank : tree.banks()) {
            for (int i = 0; i < bank.count(); i++) {
                write(bank, i, j);
            }
        }
        return j;
    }

    private static void write(Bank bank, int i, double[][] j) {
        int p = bank.places;
        for (int k = 0; k < bank.run; k++) {
            int at = bank.at(k, i);
            j[at][at] = bank.self[k * p + i];
            j[at][bank.at(k + 1, i)] = bank.after[k * p + i];
            if (k > 0) {
                j[at][bank.at(k - 1, i)] = bank.before[k * p + i];
            }
        }
        j[bank.at(bank.run, i)][bank.at(bank.run - 1, i)] = bank.blockByRun[i];
        for (int r = 0; r < Bank.BLOCK; r++) {
            for (int c = 0; c < Bank.BLOCK; c++) {
                j[bank.at(bank.run + r, i)][bank.at(bank.run + c, i)] =
                        bank.inner[(r * Bank.BLOCK + c) * p + i];
            }
        }
        for (int r = 0; r < Bank.TOUCH; r++) {
            for (int h = 0; h < Bank.TOUCH; h++) {
                int node = bank.at(bank.run + 2 + r, i);
                j[node][bank.hubAt + h] = bank.byHub[(r * Bank.TOUCH + h) * p + i];
                j[bank.hubAt + h][node] = bank.onHub[(h * Bank.TOUCH + r) * p + i];
            }
        }
    }

    private static void write(Branch branch, double[][] j) {
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
            for (int h = 0; h < Branch.TOUCH; h++) {
                j[b + r][branch.hubAt + h] = branch.byHub[r * Branch.TOUCH + h];
                j[branch.hubAt + h][b + r] = branch.onHub[h * branch.block + r];
            }
        }
    }
}
