package org.wardon.heat.network;

import org.wardon.heat.laws.FreeWater;
import org.wardon.lots.Lot;

/**
 * The laws of {@link org.wardon.heat.laws.SkinWater} for a whole lot, with their slopes. A scratch
 * object: {@link #at} fills its fields.
 */
final class SkinEvaporation {
    private final double tissueKgSPa;
    private final double lowering;
    private final double filmKgSPa;
    private final LocalCurve saturation;

    /** Vapour leaving tissue and free water, kg/s; below 0 where dew settles. */
    double evaporated;

    /** Slopes: by skin temperature, by wet share, by vapour pressure of the package. */
    double evaporatedBySkin;

    double evaporatedByWater;
    double evaporatedByRatio;

    /** The part of it that leaves free water, kg/s, with the same slopes. */
    double filmWater;

    double filmWaterBySkin;
    double filmWaterByWater;
    double filmWaterByRatio;

    SkinEvaporation(Lot lot, double transpirationFactor, boolean plain) {
        double kg = lot.massKg();
        tissueKgSPa = kg * lot.transpiration().conductanceKgPerKgSPa() * transpirationFactor;
        lowering = lot.transpiration().vapourPressureLowering();
        filmKgSPa = kg * lot.transpiration().filmKgPerKgSPa();
        saturation = Saturation.overWater(plain);
    }

    /** Renews the curve of saturation where need be. */
    void near(double skinC) {
        saturation.near(skinC);
    }

    /** Fills the fields for a skin of {@code t}, its wet share and the package's pressure. */
    void at(double t, double wet, double packagePa) {
        double psat = saturation.value(t);
        double slope = saturation.slope(t);
        double tissueDrop = lowering * psat - packagePa;
        double filmDrop = psat - packagePa;
        double width = FreeWater.ROUND_PA;
        double tissue = tissueKgSPa * (1 - wet);
        double up = FreeWater.positive(filmDrop, width);
        double down = FreeWater.positive(-filmDrop, width);
        double tissueSlope = tissue * FreeWater.positiveSlope(tissueDrop, width);
        double filmSlope =
                filmKgSPa
                        * (wet * FreeWater.positiveSlope(filmDrop, width)
                                + FreeWater.positiveSlope(-filmDrop, width));
        filmWater = filmKgSPa * (wet * up - down);
        evaporated = tissue * FreeWater.positive(tissueDrop, width) + filmWater;
        evaporatedBySkin = (tissueSlope * lowering + filmSlope) * slope;
        filmWaterBySkin = filmSlope * slope;
        // By the package's vapour pressure; turned to humidity ratio where it is needed.
        evaporatedByRatio = -tissueSlope - filmSlope;
        filmWaterByRatio = -filmSlope;
        evaporatedByWater = filmKgSPa * up - tissueKgSPa * FreeWater.positive(tissueDrop, width);
        filmWaterByWater = filmKgSPa * up;
    }
}
