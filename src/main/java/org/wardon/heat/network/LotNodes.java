package org.wardon.heat.network;

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
    public static double[] of(LotPart lot, double[] y) {
        return lot.nodes(y);
    }

    /**
     * Puts a lot in; from then on it takes part.
     *
     * @param nodes {@code [node]} of the same lot
     * @param lot the lot
     * @param y state, changed in place
     */
    public static void put(double[] nodes, LotPart lot, double[] y) {
        int rows = LotBank.SHELLS + 3;
        Require.that(nodes.length == rows, "a lot of " + rows + " nodes, not " + nodes.length);
        lot.put(nodes, y);
    }
}
