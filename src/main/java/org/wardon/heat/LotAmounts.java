package org.wardon.heat;

/**
 * What a lot gave and took since it came in.
 *
 * @param respirationJ heat of respiration, J
 * @param fleshJ heat its flesh gave up, J
 * @param liquidJ enthalpy the water that left it had as a liquid, J
 * @param packageJ heat its package and the air in it gave up, J
 * @param packageKg vapour the air of the package gave up, kg
 * @param evaporatedKg vapour that left skin and free water, kg
 * @param toAirJ heat and enthalpy that reached the chamber's air, J
 * @param toAirKg vapour that reached the chamber's air, kg
 */
public record LotAmounts(
        double respirationJ,
        double fleshJ,
        double liquidJ,
        double packageJ,
        double packageKg,
        double evaporatedKg,
        double toAirJ,
        double toAirKg) {
    /** Nothing yet. */
    static final LotAmounts NOTHING = new LotAmounts(0, 0, 0, 0, 0, 0, 0, 0);

    /** What came in between. */
    LotAmounts since(LotAmounts before) {
        return new LotAmounts(
                respirationJ - before.respirationJ,
                fleshJ - before.fleshJ,
                liquidJ - before.liquidJ,
                packageJ - before.packageJ,
                packageKg - before.packageKg,
                evaporatedKg - before.evaporatedKg,
                toAirJ - before.toAirJ,
                toAirKg - before.toAirKg);
    }
}
