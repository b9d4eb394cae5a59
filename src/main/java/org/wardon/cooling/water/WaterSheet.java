package org.wardon.cooling.water;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.wardon.air.MoistAir;
import org.wardon.errors.Require;

/**
 * Cold water on its way over one face, between the face and what lies before it: the chamber's air
 * for an open film, the sheet of a jacket for a closed one. Its outlet follows from the
 * effectiveness of a heat exchanger, 1 - exp(-NTU), with the conductance that feeds it along its
 * way; heat and vapour pass at the mean temperature of the water, so what the water carries away is
 * exactly what it was given.
 *
 * <p>Source: effectiveness as in Incropera and others, Fundamentals of Heat and Mass Transfer (from
 * memory); vapour by the Lewis relation, {@code cooling-sources.csv}, row mass_transfer. The film's
 * surface is taken at the temperature of its water (a film of 0.3 mm drops 0.1 K at most).
 *
 * @param areaM2 area under water, m2
 * @param flowKgS water over it, kg/s, above 0
 * @param sides what passes heat and vapour to it
 */
public record WaterSheet(double areaM2, double flowKgS, Sides sides) {
    private static final double FEW_NTU = 1e-3;

    /** Checks the bounds. */
    public WaterSheet {
        Require.within("areaM2", areaM2, 1e-6, 1e5, "m2", "");
        Require.within("flowKgS", flowKgS, 1e-9, 1e5, "kg/s", "Without water there is no sheet.");
    }

    /**
     * Conductances to the water.
     *
     * @param wallWm2K film coefficient between face and water, W/(m2 K)
     * @param beforeWm2K between water and what lies before it, W/(m2 K)
     * @param vapourKgM2S for vapour, kg/(m2 s) per kg/kg; 0 for a jacket
     * @param alongWm2K what feeds the water along its way, for NTU, W/(m2 K): from the depth of the
     *     face and from the air, latent heat included. The surface of the face follows the water
     *     from top to bottom, so its film does not count alone
     */
    public record Sides(double wallWm2K, double beforeWm2K, double vapourKgM2S, double alongWm2K) {
        /** Checks the bounds. */
        public Sides {
            Require.within("wallWm2K", wallWm2K, 0, 1e6, "W/(m2 K)", "");
            Require.within("beforeWm2K", beforeWm2K, 0, 1e6, "W/(m2 K)", "");
            Require.within("vapourKgM2S", vapourKgM2S, 0, 1, "kg/(m2 s)", "");
            Require.within("alongWm2K", alongWm2K, 0, 1e6, "W/(m2 K)", "");
        }
    }

    /**
     * What happens to the water.
     *
     * @param meanC mean temperature of the water, °C
     * @param outletC water leaving, °C
     * @param fromWallW heat from the face, W
     * @param fromBeforeW sensible heat from the air or the sheet before it, W
     * @param vapourKgS vapour to the air, kg/s; below 0 where it condenses on the film
     */
    public record Balance(
            double meanC, double outletC, double fromWallW, double fromBeforeW, double vapourKgS) {
        /**
         * Returns the heat the water takes up, latent heat included.
         *
         * @return W
         */
        public double takenW() {
            return fromWallW + fromBeforeW - vapourKgS * latentJkg(meanC);
        }
    }

    /**
     * Returns the number of transfer units.
     *
     * @return dimensionless
     */
    public double ntu() {
        return areaM2 * sides.alongWm2K / (flowKgS * MoistAir.WATER_J_KG_K);
    }

    /**
     * Returns the effectiveness: rise of the water over the rise it could have.
     *
     * @return 0 to 1
     */
    public double effectiveness() {
        return -Math.expm1(-ntu());
    }

    /**
     * Returns by how much of its whole rise the water is warmer on the mean of its way: half for
     * little exchange, all for much.
     *
     * @return 1/effectiveness - 1/NTU
     */
    public double meanShare() {
        double n = ntu();
        return n < FEW_NTU ? 0.5 + n / 12 : 1 / effectiveness() - 1 / n;
    }

    /**
     * Returns the heat that makes a kilogram of water of this temperature vapour.
     *
     * @param waterC °C
     * @return J/kg
     */
    public static double latentJkg(double waterC) {
        return MoistAir.vapourEnthalpyJkg(waterC) - MoistAir.WATER_J_KG_K * waterC;
    }

    /**
     * Returns the latent part of the conductance to the air, by the rise of saturation between
     * water and air.
     *
     * @param vapourKgM2S conductance for vapour, kg/(m2 s) per kg/kg
     * @param waterC water, °C
     * @param airC air, °C
     * @param pressurePa air pressure, Pa
     * @return W/(m2 K)
     */
    public static double latentWm2K(
            double vapourKgM2S, double waterC, double airC, double pressurePa) {
        double away = Math.abs(airC - waterC) < 0.1 ? waterC + 0.1 : airC;
        double rise =
                MoistAir.saturatedHumidityRatio(away, pressurePa)
                        - MoistAir.saturatedHumidityRatio(waterC, pressurePa);
        return vapourKgM2S * latentJkg(waterC) * rise / (away - waterC);
    }

    /**
     * Returns what the water does between a face and the air.
     *
     * @param inletC water entering, °C
     * @param wallC surface of the face, °C
     * @param beforeC air or sheet before the water, °C
     * @param humidityRatio of that air, kg/kg; not used for a jacket
     * @param pressurePa air pressure, Pa
     * @return the balance
     */
    public Balance balance(
            double inletC, double wallC, double beforeC, double humidityRatio, double pressurePa) {
        double perW = meanShare() / (flowKgS * MoistAir.WATER_J_KG_K);
        double low = Math.max(-55, Math.min(inletC, Math.min(wallC, beforeC)) - 40);
        double high = Math.max(inletC, Math.max(wallC, beforeC)) + 1;
        double mean =
                new BrentSolver(1e-13, 1e-12)
                        .solve(
                                300,
                                t ->
                                        t
                                                - inletC
                                                - perW
                                                        * at(
                                                                        t,
                                                                        wallC,
                                                                        beforeC,
                                                                        humidityRatio,
                                                                        pressurePa)
                                                                .takenW(),
                                low,
                                high);
        Balance there = at(mean, wallC, beforeC, humidityRatio, pressurePa);
        double outlet = inletC + there.takenW() / (flowKgS * MoistAir.WATER_J_KG_K);
        return new Balance(mean, outlet, there.fromWallW, there.fromBeforeW, there.vapourKgS);
    }

    private Balance at(
            double meanC, double wallC, double beforeC, double humidityRatio, double pressurePa) {
        double vapour =
                sides.vapourKgM2S == 0
                        ? 0
                        : areaM2
                                * sides.vapourKgM2S
                                * (MoistAir.saturatedHumidityRatio(meanC, pressurePa)
                                        - humidityRatio);
        return new Balance(
                meanC,
                Double.NaN,
                areaM2 * sides.wallWm2K * (wallC - meanC),
                areaM2 * sides.beforeWm2K * (beforeC - meanC),
                vapour);
    }
}
