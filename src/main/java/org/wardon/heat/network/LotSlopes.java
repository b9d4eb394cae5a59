package org.wardon.heat.network;

import java.util.Arrays;
import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Bank;

/**
 * The derivatives of a {@link LotBank} where a step starts: what its unknowns do to each other, to
 * the chamber's air and to its flows.
 */
final class LotSlopes {
    private final LotBank lots;
    private final Bank bank;
    private final double[] evaporatedBy;
    private final double[] liquidBy;
    private final double[] breathSlope;
    private final double[] packageByEnthalpy;
    private final double[] packageByRatio;
    private final double[] toAirByEnthalpy;
    private final double[] toAirByRatio;
    private final double[] vapourByRatio;
    private final double[] toAirByAirRatio;

    LotSlopes(LotBank lots) {
        this.lots = lots;
        bank = lots.bank;
        int places = lots.places;
        evaporatedBy = new double[LotBank.BY * places];
        liquidBy = new double[LotBank.BY * places];
        breathSlope = new double[LotBank.SHELLS * places];
        packageByEnthalpy = new double[places];
        packageByRatio = new double[places];
        toAirByEnthalpy = new double[places];
        toAirByRatio = new double[places];
        vapourByRatio = new double[places];
        toAirByAirRatio = new double[places];
    }

    /** Writes J of the lots, of whose state the rates were asked last. */
    void at(AirState air, double airKg, double[] y) {
        breathJ(y);
        for (int i = 0; i < bank.count(); i++) {
            skinJ(i, y);
        }
        hubJ(air, airKg);
    }

    private void breathJ(double[] y) {
        int n = bank.count();
        for (int k = 0; k < LotBank.SHELLS; k++) {
            int row = k * lots.places;
            int at = bank.start + row;
            for (int j = row; j < row + n; j++) {
                double d = y[at + j - row] - lots.breath.centre[j];
                breathSlope[j] =
                        lots.breath.c1[j] + d * (2 * lots.breath.c2[j] + d * 3 * lots.breath.c3[j]);
            }
            if (k < LotBank.SHELLS - 1) {
                for (int j = row; j < row + n; j++) {
                    bank.self[j] = breathSlope[j] * lots.perCapacity[j] - lots.leaves[j];
                }
            }
        }
    }

    /** What the block's unknowns do to skin and evaporation; the block's rows. */
    private void skinJ(int i, double[] y) {
        int p = lots.places;
        int b = bank.at(LotBank.SHELLS - 1, i);
        double t = lots.skinC[i];
        double pa = lots.packagePa[i];
        double ratio = y[b + 3 * p];
        double d = t - lots.saturation.centre[i];
        double psat =
                lots.saturation.c0[i]
                        + d
                                * (lots.saturation.c1[i]
                                        + d * (lots.saturation.c2[i] + d * lots.saturation.c3[i]));
        double slope =
                lots.saturation.c1[i]
                        + d * (2 * lots.saturation.c2[i] + d * 3 * lots.saturation.c3[i]);
        double fullness = y[b + p] * lots.perFullKg[i];
        double wet = FreeWater.wetShare(fullness);
        double wetSlope = FreeWater.wetShareSlope(fullness) * lots.perFullKg[i];
        double drop = lots.lowering[i] * psat - pa;
        double filmDrop = psat - pa;
        double upSlope = FreeWater.positiveSlope(filmDrop, LotBank.WIDTH);
        double tissueBy =
                lots.tissueKgSPa[i] * (1 - wet) * FreeWater.positiveSlope(drop, LotBank.WIDTH);
        double filmBy = lots.filmKgSPa[i] * (wet * upSlope + (1 - upSlope));
        double up = FreeWater.positive(filmDrop, LotBank.WIDTH);
        double tissueUp = FreeWater.positive(drop, LotBank.WIDTH);
        double sum = LotBank.RATIO + ratio;
        double paByRatio = lots.pressurePa * LotBank.RATIO / (sum * sum);
        double bySkin = (tissueBy * lots.lowering[i] + filmBy) * slope;
        double byRatio = -(tissueBy + filmBy) * paByRatio;
        double byWater = (lots.filmKgSPa[i] * up - lots.tissueKgSPa[i] * tissueUp) * wetSlope;
        double gone = lots.evaporated[i];
        double latent = LotBank.L0 + LotBank.VAPOUR_LESS_WATER * t;
        double inverse = 1 / (lots.packageJkgK[i] + MoistAir.VAPOUR_J_KG_K * ratio);
        double cByRatio = -(LotBank.L0 + MoistAir.VAPOUR_J_KG_K * lots.packageC[i]) * inverse;
        double perFall =
                1
                        / (lots.skinWK[i]
                                + lots.filmWK[i]
                                + bySkin * latent
                                + gone * LotBank.VAPOUR_LESS_WATER);
        double s0 = lots.skinWK[i] * perFall;
        double s1 = -latent * byWater * perFall;
        double s2 = lots.filmWK[i] * inverse * perFall;
        double s3 = (lots.filmWK[i] * cByRatio - latent * byRatio) * perFall;
        double e0 = bySkin * s0;
        double e1 = bySkin * s1 + byWater;
        double e2 = bySkin * s2;
        double e3 = bySkin * s3 + byRatio;
        double filmBySkin = filmBy * slope;
        double[] j = bank.inner;
        j[4 * p + i] = -filmBySkin * s0;
        j[5 * p + i] = -filmBySkin * s1 - lots.filmKgSPa[i] * up * wetSlope;
        j[6 * p + i] = -filmBySkin * s2;
        j[7 * p + i] = -filmBySkin * s3 + filmBy * paByRatio;
        keep(lots.skinBy, i, s0, s1, s2, s3);
        keep(evaporatedBy, i, e0, e1, e2, e3);
        keep(
                liquidBy,
                i,
                LotBank.WATER * (e0 * t + gone * s0),
                LotBank.WATER * (e1 * t + gone * s1),
                LotBank.WATER * (e2 * t + gone * s2),
                LotBank.WATER * (e3 * t + gone * s3));
        packageByEnthalpy[i] = inverse;
        packageByRatio[i] = cByRatio;
        vapourByRatio[i] = lots.packageKgSPa[i] * paByRatio;
    }

    private void keep(double[] by, int i, double v0, double v1, double v2, double v3) {
        by[i] = v0;
        by[lots.places + i] = v1;
        by[2 * lots.places + i] = v2;
        by[3 * lots.places + i] = v3;
    }

    /** The other rows of the block, and what hangs on the chamber's air. */
    private void hubJ(AirState air, double airKg) {
        int n = bank.count();
        int p = lots.places;
        int last = (LotBank.SHELLS - 1) * p;
        double[] j = bank.inner;
        double perAirKg = 1 / airKg;
        double byEnthalpy = 0;
        double byRatio = 0;
        double vapourBy = 0;
        for (int i = 0; i < n; i++) {
            double per = lots.perPackageKg[i];
            double perShell = lots.perCapacity[last + i];
            double skin = lots.skinWK[i];
            double enthalpy = LotBank.L0 + MoistAir.VAPOUR_J_KG_K * lots.packageC[i];
            double out =
                    lots.packageKgSPa[i]
                            * (lots.packagePa[i] - (air.vapourPa - lots.inBlast[i] * lots.dryPa));
            double byPackageC = lots.packageWK[i] + out * MoistAir.VAPOUR_J_KG_K;
            double jRatio = vapourByRatio[i];
            double toAir2 = byPackageC * packageByEnthalpy[i];
            double toAir3 = byPackageC * packageByRatio[i] + enthalpy * jRatio;
            double jAir = -lots.packageKgSPa[i] * air.vapourByRatio;
            double toAirByAir = enthalpy * jAir;
            double hubEnthalpy = -lots.packageWK[i] * air.airByEnthalpy;
            double hubRatio = -lots.packageWK[i] * air.airByRatio + toAirByAir;
            double s0 = skin * (1 - lots.skinBy[i]);
            double s1 = -skin * lots.skinBy[p + i];
            double s2 = -skin * lots.skinBy[2 * p + i];
            double s3 = -skin * lots.skinBy[3 * p + i];
            j[i] = (breathSlope[last + i] - lots.between[last - p + i] - s0) * perShell;
            j[p + i] = -s1 * perShell;
            j[2 * p + i] = -s2 * perShell;
            j[3 * p + i] = -s3 * perShell;
            j[8 * p + i] = (s0 + liquidBy[i]) * per;
            j[9 * p + i] = (s1 + liquidBy[p + i]) * per;
            j[10 * p + i] = (s2 + liquidBy[2 * p + i] - toAir2) * per;
            j[11 * p + i] = (s3 + liquidBy[3 * p + i] - toAir3) * per;
            j[12 * p + i] = evaporatedBy[i] * per;
            j[13 * p + i] = evaporatedBy[p + i] * per;
            j[14 * p + i] = evaporatedBy[2 * p + i] * per;
            j[15 * p + i] = (evaporatedBy[3 * p + i] - jRatio) * per;
            bank.byHub[i] = -hubEnthalpy * per;
            bank.byHub[p + i] = -hubRatio * per;
            bank.byHub[2 * p + i] = 0;
            bank.byHub[3 * p + i] = -jAir * per;
            double share = lots.gives[i] * perAirKg;
            bank.onHub[i] = toAir2 * share;
            bank.onHub[p + i] = toAir3 * share;
            bank.onHub[2 * p + i] = 0;
            bank.onHub[3 * p + i] = jRatio * share;
            toAirByEnthalpy[i] = toAir2;
            toAirByRatio[i] = toAir3;
            toAirByAirRatio[i] = toAirByAir;
            byEnthalpy += hubEnthalpy * share;
            byRatio += hubRatio * share;
            vapourBy += jAir * share;
        }
        air.byItself[0] += byEnthalpy;
        air.byItself[1] += byRatio;
        air.byItself[3] += vapourBy;
    }

    /** Writes the change of the lots' flows along a direction. */
    void flowsAlong(AirState air, double[] v, double[] change) {
        int n = bank.count();
        int p = lots.places;
        int b = bank.at(LotBank.SHELLS - 1, 0);
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        Arrays.fill(lots.breathing, 0, n, 0);
        for (int k = 0; k < LotBank.SHELLS; k++) {
            int at = bank.at(k, 0);
            for (int i = 0; i < n; i++) {
                lots.breathing[i] += breathSlope[k * p + i] * v[at + i];
            }
        }
        for (int i = 0; i < n; i++) {
            double v0 = v[b + i];
            double v1 = v[b + p + i];
            double v2 = v[b + 2 * p + i];
            double v3 = v[b + 3 * p + i];
            change[lots.flowAt + i] =
                    toAirByEnthalpy[i] * v2
                            + toAirByRatio[i] * v3
                            - lots.packageWK[i] * airC
                            + toAirByAirRatio[i] * ratio;
            change[lots.flowAt + LotBank.VAPOUR * p + i] =
                    vapourByRatio[i] * v3 - lots.packageKgSPa[i] * air.vapourByRatio * ratio;
            change[lots.flowAt + LotBank.RESPIRATION * p + i] = lots.breathing[i];
            change[lots.flowAt + LotBank.EVAPORATED * p + i] =
                    evaporatedBy[i] * v0
                            + evaporatedBy[p + i] * v1
                            + evaporatedBy[2 * p + i] * v2
                            + evaporatedBy[3 * p + i] * v3;
            change[lots.flowAt + LotBank.LIQUID * p + i] =
                    liquidBy[i] * v0
                            + liquidBy[p + i] * v1
                            + liquidBy[2 * p + i] * v2
                            + liquidBy[3 * p + i] * v3;
        }
    }
}
