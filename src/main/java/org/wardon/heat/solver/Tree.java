package org.wardon.heat.solver;

import java.util.ArrayList;
import java.util.List;

/**
 * A Jacobian shaped like a tree: a hub of a few nodes and branches that hang on it. The state holds
 * the hub first, then branch by branch. Solving costs as much as the tree has nodes; no matrix is
 * formed.
 *
 * <p>Signs: with M = shift I - J, a branch's run is tridiagonal, so plain elimination towards the
 * hub, a solve of the hub, and substitution back give the exact solution. No pivoting is done: the
 * shift 1/(step γ) rules the diagonal of a step that passes its error test.
 */
public final class Tree {
    private final int hub;
    private final List<Branch> list = new ArrayList<>();
    private Branch[] branches = new Branch[0];
    private final List<Bank> bankList = new ArrayList<>();
    private Bank[] banks = new Bank[0];
    private final double[] hubLu;
    private int size;
    private int hangsAt;

    /** J of the hub's rows by the hub, {@code [row * hub + column]}; written by the system. */
    public final double[] hubByHub;

    /**
     * Starts a tree.
     *
     * @param hub nodes of the hub, at least 2
     */
    public Tree(int hub) {
        this.hub = hub;
        this.size = hub;
        hubByHub = new double[hub * hub];
        hubLu = new double[hub * hub];
    }

    /**
     * Chooses where on the hub that hangs which is added from now on; at its first nodes before.
     *
     * @param hubAt first of the two nodes of the hub it touches
     */
    public void hangAt(int hubAt) {
        hangsAt = hubAt;
    }

    /**
     * Adds a branch behind the last one.
     *
     * @param run nodes of its run, 0 or more
     * @param block nodes of its block, 1 or more
     * @return the branch, whose J parts the system writes
     */
    public Branch addBranch(int run, int block) {
        Branch branch = new Branch(size, run, block, hangsAt);
        size += branch.size();
        list.add(branch);
        branches = list.toArray(new Branch[0]);
        return branch;
    }

    /**
     * Adds a bank behind what was added last.
     *
     * @param places members there is room for, 1 or more
     * @param run nodes of the run of each, 1 or more
     * @return the bank, whose J parts the system writes
     */
    public Bank addBank(int places, int run) {
        Bank bank = new Bank(size, places, run, hangsAt);
        size += bank.size();
        bankList.add(bank);
        banks = bankList.toArray(new Bank[0]);
        return bank;
    }

    /**
     * Returns the number of nodes.
     *
     * @return hub and branches
     */
    public int size() {
        return size;
    }

    /**
     * Returns the number of nodes of the hub.
     *
     * @return at least 2
     */
    public int hub() {
        return hub;
    }

    Branch[] branches() {
        return branches;
    }

    Bank[] banks() {
        return banks;
    }

    void factor(double shift) {
        for (int i = 0; i < hub * hub; i++) {
            hubLu[i] = -hubByHub[i];
        }
        for (int i = 0; i < hub; i++) {
            hubLu[i * hub + i] += shift;
        }
        for (Branch branch : branches) {
            branch.factor(shift, hubLu, hub);
        }
        for (Bank bank : banks) {
            bank.factor(shift, hubLu, hub);
        }
        factorHub();
    }

    private void factorHub() {
        for (int k = 0; k < hub; k++) {
            double inverse = 1 / hubLu[k * hub + k];
            hubLu[k * hub + k] = inverse;
            for (int i = k + 1; i < hub; i++) {
                double l = hubLu[i * hub + k] * inverse;
                hubLu[i * hub + k] = l;
                for (int j = k + 1; j < hub; j++) {
                    hubLu[i * hub + j] -= l * hubLu[k * hub + j];
                }
            }
        }
    }

    /** Solves (shift I - J) x = right-hand side, in place. */
    void solve(double[] x) {
        for (Branch branch : branches) {
            branch.forward(x);
        }
        for (Bank bank : banks) {
            bank.forward(x);
        }
        for (int i = 1; i < hub; i++) {
            for (int k = 0; k < i; k++) {
                x[i] -= hubLu[i * hub + k] * x[k];
            }
        }
        for (int i = hub - 1; i >= 0; i--) {
            for (int k = i + 1; k < hub; k++) {
                x[i] -= hubLu[i * hub + k] * x[k];
            }
            x[i] *= hubLu[i * hub + i];
        }
        for (Branch branch : branches) {
            branch.back(x);
        }
        for (Bank bank : banks) {
            bank.back(x);
        }
    }
}
