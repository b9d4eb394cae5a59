package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.water.WaterSheet;
import org.wardon.heat.laws.FreeWater;

/**
 * Water running over one face: {@link WaterSheet} with its derivatives, as scratch of the face.
 * Conductances and inlet are constant within an hour. Water cooled by a chiller and returned brings
 * what it took, but no more than the chiller can take; beyond that it comes in warmer.
 */
final class FilmExchange {
    /** Derivatives by the face's surface. */
    static final int BY_WALL = 0;

    /** By what lies before the water: air, or the sheet of a jacket. */
    static final int BY_BEFORE = 1;

    /** By the humidity ratio of the air. */
    static final int BY_RATIO = 2;

    private static final double LATENT_SLOPE = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
    private static final double NEAR_K = 1e-11;
    private static final int ROUNDS = 40;

    /** The chiller's limit is rounded within this share of it. */
    private static final double ROUND_SHARE = 0.02;

    private final double limitW;
    private final LocalCurve saturation;
    private final double pressurePa;
    private WaterSheet sheet;
    private double inletC;
    private double perFlux;

    double meanC;
    double fromWallW;
    double fromBeforeW;
    double vapourKgS;
    double takenW;

    /** Heat that makes a kilogram vapour, J/kg. */
    double latent;

    final double[] meanBy = new double[3];
    final double[] fromWallBy = new double[3];
    final double[] fromBeforeBy = new double[3];
    final double[] vapourBy = new double[3];
    final double[] takenBy = new double[3];

    private double flux;
    private double fluxSlope;
    private double saturated;

    /**
     * Starts with conductances that stand until the first hour.
     *
     * @param limitW what the chiller can take, W; infinite for water that runs away
     * @param sheet the water
     */
    FilmExchange(double limitW, WaterSheet sheet, double pressurePa, boolean plain) {
        this.limitW = limitW;
        this.sheet = sheet;
        this.pressurePa = pressurePa;
        this.saturation = Saturation.curve(plain);
        this.meanC = Double.NaN; // not met yet
    }

    /** Sets what holds for an hour. */
    void set(WaterSheet now, double entersC) {
        sheet = now;
        inletC = entersC;
        perFlux = now.meanShare() * now.areaM2() / (now.flowKgS() * MoistAir.WATER_J_KG_K);
    }

    WaterSheet sheet() {
        return sheet;
    }

    /** Renews the curve where the water is. */
    void near() {
        saturation.near(meanC);
    }

    /** Water leaving, °C. */
    double outletC() {
        return meanC + (1 - sheet.meanShare()) * takenW / (sheet.flowKgS() * MoistAir.WATER_J_KG_K);
    }

    /** Heat to the water a square metre and its slope by the water's temperature. */
    private void fluxAt(double t, double wallC, double beforeC, double ratio) {
        WaterSheet.Sides sides = sheet.sides();
        double g = sides.vapourKgM2S();
        flux = sides.wallWm2K() * (wallC - t) + sides.beforeWm2K() * (beforeC - t);
        fluxSlope = -sides.wallWm2K() - sides.beforeWm2K();
        latent = WaterSheet.latentJkg(t);
        if (g > 0) {
            double psat = saturation.value(t);
            double rest = pressurePa - psat;
            saturated = MoistAir.MOLAR_MASS_RATIO * psat / rest;
            double slope = saturatedSlope(t, rest);
            flux += g * latent * (ratio - saturated);
            fluxSlope += g * (LATENT_SLOPE * (ratio - saturated) - latent * slope);
        }
    }

    private double saturatedSlope(double t, double rest) {
        return MoistAir.MOLAR_MASS_RATIO * pressurePa / (rest * rest) * saturation.slope(t);
    }

    private double limited(double w) {
        double width = ROUND_SHARE * limitW;
        return Double.isInfinite(limitW)
                ? w
                : FreeWater.positive(w, width) - FreeWater.positive(w - limitW, width);
    }

    private double limitedSlope(double w) {
        double width = ROUND_SHARE * limitW;
        return Double.isInfinite(limitW)
                ? 1
                : FreeWater.positiveSlope(w, width) - FreeWater.positiveSlope(w - limitW, width);
    }

    /** Works out what the water does between a surface and the air. */
    void at(double wallC, double beforeC, double ratio) {
        double free = unlimited(wallC, beforeC, ratio);
        takenW = limited(free);
        if (takenW != free) {
            carrying(takenW / sheet.areaM2(), wallC, beforeC, ratio);
        }
        finish(wallC, beforeC, ratio);
    }

    /** Temperature and heat of water that comes in as cold as it should, W. */
    private double unlimited(double wallC, double beforeC, double ratio) {
        // A refused step may have left no number behind.
        double t = Double.isFinite(meanC) ? meanC : inletC;
        for (int i = 0; i < ROUNDS; i++) {
            fluxAt(t, wallC, beforeC, ratio);
            double step = (t - inletC - perFlux * flux) / (1 - perFlux * fluxSlope);
            t -= step;
            if (!(Math.abs(step) > NEAR_K)) {
                break;
            }
        }
        meanC = t;
        fluxAt(t, wallC, beforeC, ratio);
        return sheet.areaM2() * flux;
    }

    /** The temperature at which the water takes a given heat, W/m2. */
    private void carrying(double wanted, double wallC, double beforeC, double ratio) {
        double t = meanC;
        for (int i = 0; i < ROUNDS; i++) {
            fluxAt(t, wallC, beforeC, ratio);
            double step = (flux - wanted) / fluxSlope;
            t -= step;
            if (!(Math.abs(step) > NEAR_K)) {
                break;
            }
        }
        meanC = t;
        fluxAt(t, wallC, beforeC, ratio);
    }

    private void finish(double wallC, double beforeC, double ratio) {
        WaterSheet.Sides sides = sheet.sides();
        double area = sheet.areaM2();
        fromWallW = area * sides.wallWm2K() * (wallC - meanC);
        fromBeforeW = area * sides.beforeWm2K() * (beforeC - meanC);
        vapourKgS = sides.vapourKgM2S() > 0 ? area * sides.vapourKgM2S() * (saturated - ratio) : 0;
    }

    /** The same with all derivatives, by implicit differentiation. */
    void slopesAt(double wallC, double beforeC, double ratio) {
        double free = unlimited(wallC, beforeC, ratio);
        double area = sheet.areaM2();
        double share = limitedSlope(free) / (1 - perFlux * fluxSlope);
        WaterSheet.Sides sides = sheet.sides();
        double latentFree = latent;
        takenW = limited(free);
        if (takenW != free) {
            carrying(takenW / area, wallC, beforeC, ratio);
        }
        finish(wallC, beforeC, ratio);
        double g = sides.vapourKgM2S();
        double rise =
                g > 0 ? g * area * saturatedSlope(meanC, pressurePa - saturation.value(meanC)) : 0;
        for (int by = 0; by < 3; by++) {
            double fluxFree = fluxBy(by, latentFree);
            takenBy[by] = area * share * fluxFree;
            meanBy[by] = (share * fluxFree - fluxBy(by, latent)) / fluxSlope;
            fromWallBy[by] = area * sides.wallWm2K() * ((by == BY_WALL ? 1 : 0) - meanBy[by]);
            fromBeforeBy[by] = area * sides.beforeWm2K() * ((by == BY_BEFORE ? 1 : 0) - meanBy[by]);
            vapourBy[by] = rise * meanBy[by] - (by == BY_RATIO ? area * g : 0);
        }
    }

    private double fluxBy(int by, double latentJkg) {
        WaterSheet.Sides sides = sheet.sides();
        return switch (by) {
            case BY_WALL -> sides.wallWm2K();
            case BY_BEFORE -> sides.beforeWm2K();
            default -> sides.vapourKgM2S() * latentJkg;
        };
    }
}
