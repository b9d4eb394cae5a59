package org.wardon.heat;

import java.util.Optional;

/**
 * What one cooler did in a run.
 *
 * @param kind kind, as a plan names it
 * @param ranS time it ran, weighted by its share, s
 * @param removedJ enthalpy taken from the air, J
 * @param electricityJ electricity, fan and defrost included, J
 * @param waterKg water used up, kg
 * @param ice its ice, where it works with ice
 */
public record CoolerTotals(
        String kind,
        double ranS,
        double removedJ,
        double electricityJ,
        double waterKg,
        Optional<IceLedger> ice) {
    /** What fades out within the band is summed to the solver's error, to either side of 0. */
    public CoolerTotals {
        ranS = Math.max(ranS, 0);
        electricityJ = Math.max(electricityJ, 0);
        waterKg = Math.max(waterKg, 0);
    }
}
