package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * Water passing between tissue and the air of its package.
 *
 * <p>Source: J = kt (VPL psat(Ts) - pa), ASHRAE Handbook - Refrigeration 2006, chapter 9; ng =
 * 1e-12 kg.
 *
 * @param conductanceKgPerKgSPa tissue to package air, skin and film together, kg/(kg s Pa)
 * @param vapourPressureLowering vapour pressure at the tissue over saturation, dissolved matter
 *     lowering it, 0.8 to 1
 * @param filmKgPerKgSPa film alone, by which dew settles and a wet surface dries, kg/(kg s Pa)
 */
public record TranspirationLaw(
        double conductanceKgPerKgSPa, double vapourPressureLowering, double filmKgPerKgSPa) {
    /** Refuses conductances that are not above 0. */
    public TranspirationLaw {
        Require.within(
                "conductanceKgPerKgSPa", conductanceKgPerKgSPa, 1e-15, 1e-4, "kg/(kg s Pa)", "");
        Require.within("vapourPressureLowering", vapourPressureLowering, 0.8, 1, "1", "");
        Require.within("filmKgPerKgSPa", filmKgPerKgSPa, 1e-15, 1e-4, "kg/(kg s Pa)", "");
    }

    /**
     * Returns the water a kilogram of produce loses; below 0, the dew that settles on it.
     *
     * <p>Dew settles when the air's vapour pressure is above saturation at the skin. Between the
     * lowered and the full saturation pressure nothing passes.
     *
     * @param skinSaturationPa saturation pressure at the temperature of the skin, Pa
     * @param airVapourPa vapour pressure of the package air, Pa
     * @return kg water/(kg s)
     */
    public double waterKgPerKgS(double skinSaturationPa, double airVapourPa) {
        double tissuePa = vapourPressureLowering * skinSaturationPa;
        if (airVapourPa < tissuePa) {
            return conductanceKgPerKgSPa * (tissuePa - airVapourPa);
        }
        return airVapourPa > skinSaturationPa
                ? filmKgPerKgSPa * (skinSaturationPa - airVapourPa)
                : 0;
    }

    /**
     * Returns the law with tissue that lets water pass more or less easily.
     *
     * @param factor on the conductance from tissue to air, above 0
     * @return the law
     */
    public TranspirationLaw times(double factor) {
        return new TranspirationLaw(
                conductanceKgPerKgSPa * factor, vapourPressureLowering, filmKgPerKgSPa);
    }

    /**
     * Returns the law of produce behind a package: both conductances in series.
     *
     * @param packageKgPerKgSPa package air to the air outside, kg/(kg s Pa); infinite for none
     * @return the law
     */
    public TranspirationLaw behind(double packageKgPerKgSPa) {
        if (Double.isInfinite(packageKgPerKgSPa)) {
            return this;
        }
        return new TranspirationLaw(
                Transpirations.inSeries(conductanceKgPerKgSPa, packageKgPerKgSPa),
                vapourPressureLowering,
                Transpirations.inSeries(filmKgPerKgSPa, packageKgPerKgSPa));
    }
}
