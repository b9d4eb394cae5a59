package org.wardon.heat;

/**
 * What added up for a lot from arrival to leaving, or to the end of the run.
 *
 * @param respirationJ heat of respiration, J
 * @param fieldHeatJ heat it gave up beside that, J
 * @param evaporatedKg vapour that left skin and free water, kg
 * @param massLostKg mass lost: water and burnt sugar, free water apart, kg
 * @param massAtArrivalKg mass at arrival, kg
 */
public record LotTotals(
        double respirationJ,
        double fieldHeatJ,
        double evaporatedKg,
        double massLostKg,
        double massAtArrivalKg) {
    /** What added up in this place and then in another. */
    LotTotals and(LotTotals next) {
        return new LotTotals(
                respirationJ + next.respirationJ,
                fieldHeatJ + next.fieldHeatJ,
                evaporatedKg + next.evaporatedKg,
                massLostKg + next.massLostKg,
                massAtArrivalKg);
    }

    /**
     * Returns the loss of weight.
     *
     * @return percent of the mass at arrival
     */
    public double weightLossPct() {
        return 100 * massLostKg / massAtArrivalKg;
    }
}
