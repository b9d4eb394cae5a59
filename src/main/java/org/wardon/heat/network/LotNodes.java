package org.wardon.heat.network;

import java.util.Arrays;
import org.wardon.errors.Require;

/**
 * What the nodes of one lot hold, taken out of one chamber's state and put into another's: shells,
 * free water, enthalpy and humidity ratio of the package air. Networks of one site and one lot cut
 * it alike, so that nothing is lost on the way.
 */
public final class LotNodes {
    private LotNodes() {}

    /**
     * Takes out a lot.
     *
     * @param lot the lot
     * @param y state it is in
     * @return {@code [node]}, a copy
     */
    public static double[] of(LotBranch lot, double[] y) {
        return Arrays.copyOfRange(y, lot.branch.start, lot.branch.blockAt(3) + 1);
    }

    /**
     * Puts a lot in; from then on it takes part.
     *
     * @param nodes {@code [node]} of the same lot
     * @param lot the lot
     * @param y state, changed in place
     */
    public static void put(double[] nodes, LotBranch lot, double[] y) {
        int places = lot.branch.blockAt(3) + 1 - lot.branch.start;
        Require.that(nodes.length == places, "a lot of " + places + " nodes, not " + nodes.length);
        System.arraycopy(nodes, 0, y, lot.branch.start, nodes.length);
        lot.branch.activate(true);
    }
}
