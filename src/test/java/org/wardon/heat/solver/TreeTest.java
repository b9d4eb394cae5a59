package org.wardon.heat.solver;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.SplittableRandom;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

/** Elimination along the tree against a dense solve of the same matrix. */
class TreeTest {
    private static final double SHIFT = 7;

    @Test
    void solvesAsADenseSolverDoes() {
        solves(2);
    }

    @Test
    void solvesWhereBranchesHangOnOtherNodesOfALargerHub() {
        solves(4);
    }

    private static void solves(int hub) {
        SplittableRandom random = new SplittableRandom(20260301);
        Tree tree = new Tree(hub);
        Branch wall = tree.addBranch(6, 2);
        tree.hangAt(hub - 2);
        Branch stub = tree.addBranch(0, 1);
        Branch lot = tree.addBranch(4, 4);
        Bank bank = tree.addBank(5, 3);
        bank.count(4);
        double[][] j = new double[tree.size()][tree.size()];
        for (int r = 0; r < hub; r++) {
            for (int c = 0; c < hub; c++) {
                j[r][c] = tree.hubByHub[r * hub + c] = random.nextDouble(-1, 1);
            }
        }
        for (Branch branch : new Branch[] {wall, stub, lot}) {
            fill(branch, j, random);
        }
        fill(bank, random);
        double[][] ofBank = DenseJacobian.of(tree);
        for (int r = 0; r < j.length; r++) {
            for (int c = 0; c < j.length; c++) {
                j[r][c] = r >= bank.start || c >= bank.start ? ofBank[r][c] : j[r][c];
            }
        }
        double[] x = new double[tree.size()];
        for (int i = 0; i < x.length; i++) {
            x[i] = random.nextDouble(-1, 1);
        }
        double[] expected = dense(j, x);
        tree.factor(SHIFT);
        tree.solve(x);
        for (int i = 0; i < x.length; i++) {
            if (i >= bank.start && (i - bank.start) % bank.places >= bank.count()) {
                continue;
            }
            assertEquals(expected[i], x[i], 1e-13, "node " + i);
        }
    }

    private static void fill(Bank bank, SplittableRandom random) {
        for (double[] part :
                new double[][] {
                    bank.before,
                    bank.self,
                    bank.after,
                    bank.blockByRun,
                    bank.inner,
                    bank.byHub,
                    bank.onHub
                }) {
            for (int i = 0; i < part.length; i++) {
                part[i] = random.nextDouble(-1, 1);
            }
        }
    }

    private static double[] dense(double[][] j, double[] x) {
        Array2DRowRealMatrix m = new Array2DRowRealMatrix(x.length, x.length);
        for (int r = 0; r < x.length; r++) {
            for (int c = 0; c < x.length; c++) {
                m.setEntry(r, c, (r == c ? SHIFT : 0) - j[r][c]);
            }
        }
        return new LUDecomposition(m).getSolver().solve(new ArrayRealVector(x)).toArray();
    }

    private static void fill(Branch branch, double[][] j, SplittableRandom random) {
        for (int i = 0; i < branch.run; i++) {
            int at = branch.start + i;
            j[at][at] = branch.self[i] = random.nextDouble(-3, 0);
            j[at][at + 1] = branch.after[i] = random.nextDouble(-1, 1);
            if (i > 0) {
                j[at][at - 1] = branch.before[i] = random.nextDouble(-1, 1);
            }
        }
        int b = branch.blockAt(0);
        if (branch.run > 0) {
            j[b][b - 1] = branch.blockByRun = random.nextDouble(-1, 1);
        }
        for (int r = 0; r < branch.block; r++) {
            for (int c = 0; c < branch.block; c++) {
                j[b + r][b + c] = branch.inner[r * branch.block + c] = random.nextDouble(-1, 1);
            }
            for (int h = 0; h < 2; h++) {
                j[b + r][branch.hubAt + h] = branch.byHub[r * 2 + h] = random.nextDouble(-1, 1);
                j[branch.hubAt + h][b + r] =
                        branch.onHub[h * branch.block + r] = random.nextDouble(-1, 1);
            }
        }
    }
}
