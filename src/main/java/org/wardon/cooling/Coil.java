package org.wardon.cooling;

import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;

/**
 * The air side of a direct-expansion coil by apparatus dew point and bypass: a share {@code 1 -
 * exp(-NTU)} of the air meets the surface and leaves at its state, saturated where it gives up
 * water; the rest passes by. The whole resistance is put on the air's side, so the surface stands
 * at the evaporating temperature (assumption: the refrigerant's side is the small part).
 *
 * <p>Source: apparatus dew point and bypass factor as in ASHRAE Handbook - Systems and Equipment,
 * chapter on air-cooling coils (from memory). Frost: below -1 °C evaporating the conductance falls
 * to 0.8 of the dry one over 4 K, a mean over the time between two defrosts (assumption).
 *
 * <p>Its {@link State} is a scratch object: {@link State#at} fills its fields, the law reads them.
 * Not shared.
 */
final class Coil {
    /** Specific heat of ice, J/(kg K). Source: from memory of ASHRAE Fundamentals, chapter 1. */
    private static final double ICE_J_KG_K = 2_100;

    private static final double FROST_FROM_C = -1;
    private static final double FROST_OVER_K = 4;
    private static final double FROST_LOSS = 0.2;

    /** Water freezes on the coil over this span below 0 °C, K; rounds the jump in enthalpy. */
    private static final double FREEZES_OVER_K = 1;

    /** Rounding of the start of condensation, kg/kg. */
    private static final double WET_WIDTH = 5e-5;

    private Coil() {}

    /** Conductance left by frost, 0.8 to 1. */
    static double frostFactor(double evaporatingC) {
        return 1 - FROST_LOSS * Smooth.step((FROST_FROM_C - evaporatingC) / FROST_OVER_K);
    }

    private static double frostFactorSlope(double evaporatingC) {
        return FROST_LOSS
                * Smooth.stepSlope((FROST_FROM_C - evaporatingC) / FROST_OVER_K)
                / FROST_OVER_K;
    }

    /** Share of the condensate that freezes, 0 to 1. */
    static double frozenShare(double evaporatingC) {
        return Smooth.step(-evaporatingC / FREEZES_OVER_K);
    }

    static double frozenShareSlope(double evaporatingC) {
        return -Smooth.stepSlope(-evaporatingC / FREEZES_OVER_K) / FREEZES_OVER_K;
    }

    /** Enthalpy of what leaves the air at the surface, J/kg from liquid water of 0 °C. */
    static double condensateJkg(double surfaceC) {
        double f = frozenShare(surfaceC);
        return (1 - f) * MoistAir.WATER_J_KG_K * surfaceC
                + f * (ICE_J_KG_K * surfaceC - MoistAir.MELTING_J_KG);
    }

    private static double condensateSlope(double surfaceC) {
        double f = frozenShare(surfaceC);
        return (1 - f) * MoistAir.WATER_J_KG_K
                + f * ICE_J_KG_K
                + frozenShareSlope(surfaceC)
                        * ((ICE_J_KG_K - MoistAir.WATER_J_KG_K) * surfaceC - MoistAir.MELTING_J_KG);
    }

    /** What the coil does at one evaporating temperature, with all partial derivatives. */
    static final class State {
        double sensibleW;
        double sensibleByAir;
        double sensibleByHumidity;
        double sensibleByCoil;
        double vapourKgS;
        double vapourByHumidity;
        double vapourByCoil;
        double totalW;
        double totalByAir;
        double totalByHumidity;
        double totalByCoil;
        double effectiveness;

        /** Where the coil was in balance last, and how its temperature follows from there. */
        double coilByAir;

        double coilByHumidity;
        double coilBySpeed;
        double coilByCondensing;
        private double foundAirC;
        private double foundRatio;
        private double foundSpeed;
        private double foundCondensingC;

        private double bypassUnits = Double.NaN;
        private double bypass;

        /** A coil without frost has the same one always. */
        private double bypass(double transferUnits) {
            if (transferUnits != bypassUnits) {
                bypassUnits = transferUnits;
                bypass = Math.exp(-transferUnits);
            }
            return bypass;
        }

        /** Remembers what it was in balance with. */
        void found(CoolerInputs in, double speed, double condensingC) {
            foundAirC = in.airC;
            foundRatio = in.humidityRatio;
            foundSpeed = speed;
            foundCondensingC = condensingC;
        }

        /** Takes over where another was in balance. */
        void foundAs(State other) {
            coilByAir = other.coilByAir;
            coilByHumidity = other.coilByHumidity;
            coilBySpeed = other.coilBySpeed;
            coilByCondensing = other.coilByCondensing;
            foundAirC = other.foundAirC;
            foundRatio = other.foundRatio;
            foundSpeed = other.foundSpeed;
            foundCondensingC = other.foundCondensingC;
        }

        /** The balance to be expected, from a coil that was at {@code lastC} in the last one. */
        double foreseenC(double lastC, CoolerInputs in, double speed, double condensingC) {
            return lastC
                    + coilByAir * (in.airC - foundAirC)
                    + coilByHumidity * (in.humidityRatio - foundRatio)
                    + coilBySpeed * (speed - foundSpeed)
                    + coilByCondensing * (condensingC - foundCondensingC);
        }

        /** Moves on to a coil a little warmer, along the slopes. */
        void follow(double warmerK) {
            sensibleW += sensibleByCoil * warmerK;
            vapourKgS += vapourByCoil * warmerK;
            totalW += totalByCoil * warmerK;
        }

        /** Fills the state for air of {@code airC} and {@code w} on a coil at {@code coilC}. */
        void at(
                double airC,
                double w,
                double coilC,
                double flowKgS,
                double uaWK,
                double pressurePa) {
            double ntu = uaWK / (flowKgS * MoistAir.DRY_AIR_J_KG_K);
            double bypass = bypass(ntu * frostFactor(coilC));
            double eps = 1 - bypass;
            double epsByCoil = bypass * ntu * frostFactorSlope(coilC);
            double psat = SaturatedAir.pressurePa(coilC);
            double rest = pressurePa - psat;
            double wSat = MoistAir.MOLAR_MASS_RATIO * psat / rest;
            double wSatSlope =
                    MoistAir.MOLAR_MASS_RATIO
                            * pressurePa
                            / (rest * rest)
                            * psat
                            * SaturatedAir.logSlopePerK(coilC);
            double wet = Smooth.positive(w - wSat, WET_WIDTH);
            double wetSlope = Smooth.positiveSlope(w - wSat, WET_WIDTH);
            double d = airC - coilC;
            double outByCoil = -epsByCoil * wet + eps * wetSlope * wSatSlope;
            double heatOut = MoistAir.heatCapacityJkgK(w - eps * wet);
            effectiveness = eps;
            sensibleW = flowKgS * eps * d * heatOut;
            sensibleByAir = flowKgS * eps * heatOut;
            sensibleByHumidity = flowKgS * eps * d * MoistAir.VAPOUR_J_KG_K * (1 - eps * wetSlope);
            sensibleByCoil =
                    flowKgS
                            * (epsByCoil * d * heatOut
                                    - eps * heatOut
                                    + eps * d * MoistAir.VAPOUR_J_KG_K * outByCoil);
            vapourKgS = flowKgS * eps * wet;
            vapourByHumidity = flowKgS * eps * wetSlope;
            vapourByCoil = -flowKgS * outByCoil;
            double latent = MoistAir.vapourEnthalpyJkg(airC) - condensateJkg(coilC);
            totalW = sensibleW + vapourKgS * latent;
            totalByAir = sensibleByAir + vapourKgS * MoistAir.VAPOUR_J_KG_K;
            totalByHumidity = sensibleByHumidity + vapourByHumidity * latent;
            totalByCoil =
                    sensibleByCoil + vapourByCoil * latent - vapourKgS * condensateSlope(coilC);
        }
    }
}
