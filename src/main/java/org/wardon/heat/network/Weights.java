package org.wardon.heat.network;

import java.util.Arrays;
import java.util.List;
import org.wardon.air.MoistAir;

/** What error of each node of a chamber counts as 1, the other way round. */
final class Weights {
    /** Humidity ratio that counts as much as a kelvin of air, kg/kg. */
    private static final double RATIO_PER_K = 5e-4;

    /** One over the error, {@code [node]}. */
    final double[] perNode;

    private double lotK = 1;
    private double airK = 1;

    Weights(int nodes) {
        perNode = new double[nodes];
    }

    /** Allows lots and air an error, K. */
    void allow(double ofLotsK, double ofAirK, AirEnd[] ends, Faces faces, CoolerPart[] coolers) {
        lotK = ofLotsK;
        airK = ofAirK;
        double[] tolerances = new double[perNode.length];
        Arrays.fill(tolerances, lotK);
        for (AirEnd end : ends) {
            tolerances[end.air.at] = airK * MoistAir.DRY_AIR_J_KG_K;
            tolerances[end.air.at + 1] = airK * RATIO_PER_K;
        }
        faces.tolerances(airK, tolerances);
        List.of(coolers).forEach(cooler -> cooler.tolerances(tolerances));
        for (int i = 0; i < perNode.length; i++) {
            perNode[i] = 1 / tolerances[i];
        }
    }

    /** Takes in a lot that came. */
    void take(LotPart lot) {
        lot.weights(lotK, airK, perNode);
    }
}
