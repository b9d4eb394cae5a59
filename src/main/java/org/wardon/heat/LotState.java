package org.wardon.heat;

import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.LotPart;

/**
 * A lot at the moment it is carried from one chamber to another: each shell's temperature, the free
 * water on it, what its package holds, its mass. The air in the package goes along with it.
 */
public final class LotState {
    private final double[] nodes;
    private final double massKg;

    LotState(LotPart lot, double[] y, double massKg) {
        this.nodes = lot.nodes(y);
        this.massKg = massKg;
    }

    /**
     * Returns the mass.
     *
     * @return tissue and sugar left, free water apart, kg
     */
    public double massKg() {
        return massKg;
    }

    void into(ChamberNetwork network, int lot, double[] y) {
        network.bringIn(lot, nodes, y);
    }
}
