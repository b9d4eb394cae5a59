package org.wardon.keeping.pooling;

import org.wardon.keeping.pooling.LifePoint.Trial;

/**
 * What two figures have in common before anything is seen: the covariance of ln life.
 *
 * <p>ln life = level + slope (1/T - 1/T10)/R, the Arrhenius form of Tijskens and Polderdijk 1996
 * (id tijskens-polderdijk-1996) with T10 = 10 °C. The slope is that of all crops, plus what the
 * plant part, the crop and the variant add, plus a share of how much more steeply than others the
 * crop breathes. The level is the crop's, the variant's and the source's.
 */
final class Likeness {
    /** Slope of all crops before the fit: the median published for fresh produce, kJ/mol. */
    static final double COMMON_KJ_MOL = 68;

    /** How well that is known, kJ/mol (assumption). */
    private static final double COMMON_DEVIATION = 15;

    /**
     * Whether ageing follows breathing in its steepness is open: 1 says that it does, 0 that it
     * does not; the figures decide (assumption).
     */
    private static final double FOLLOWS_BREATH = 0.5;

    private static final double FOLLOWS_BREATH_DEVIATION = 0.5;

    /** Lives run from days to months: ln 20 days give or take 1.5. */
    private static final double USUAL_LN_DAYS = Math.log(20);

    private static final double LEVEL_DEVIATION = 1.5;
    private static final double VARIANT_DEVIATION = 0.5;
    private static final double FREE_DEVIATION = 10;

    /** Gas constant, kJ/(mol K). */
    private static final double GAS = 8.314462618e-3;

    private static final double ZERO_C_IN_K = 273.15;
    private static final double REFERENCE_K = ZERO_C_IN_K + 10;

    private final Deviations deviations;

    Likeness(Deviations deviations) {
        this.deviations = deviations;
    }

    /** Weight of the slope in ln life, mol/kJ. */
    static double x(double temperatureC) {
        return (1 / (temperatureC + ZERO_C_IN_K) - 1 / REFERENCE_K) / GAS;
    }

    /** Slope expected before anything is seen, kJ/mol. */
    static double expectedSlope(Trial trial) {
        return COMMON_KJ_MOL + FOLLOWS_BREATH * trial.respirationKJMol();
    }

    static double expected(LifePoint point) {
        return USUAL_LN_DAYS + expectedSlope(point.of()) * x(point.temperatureC());
    }

    double slopes(Trial a, Trial b) {
        double shared = square(COMMON_DEVIATION);
        shared += square(FOLLOWS_BREATH_DEVIATION) * a.respirationKJMol() * b.respirationKJMol();
        if (!a.part().isEmpty() && a.part().equals(b.part())) {
            shared += square(deviations.partKJMol());
        }
        if (a.crop().equals(b.crop())) {
            shared += square(deviations.cropKJMol());
        }
        if (a.curve().equals(b.curve())) {
            shared += square(deviations.curveKJMol());
        }
        return shared;
    }

    private double levels(Trial a, Trial b) {
        if (a.relative() || b.relative()) {
            return a.sharesLevel(b) ? square(FREE_DEVIATION) : 0;
        }
        double shared = 0;
        if (a.crop().equals(b.crop())) {
            shared += square(LEVEL_DEVIATION);
        }
        if (a.curve().equals(b.curve())) {
            shared += square(VARIANT_DEVIATION);
        }
        return a.sharesLevel(b) ? shared + square(deviations.source()) : shared;
    }

    double between(LifePoint a, LifePoint b) {
        return slopes(a.of(), b.of()) * x(a.temperatureC()) * x(b.temperatureC())
                + levels(a.of(), b.of());
    }

    /** Variance of a figure about its trial's curve. */
    double noise(LifePoint point) {
        return square(point.estimate() ? deviations.estimated() : deviations.measured());
    }

    private static double square(double value) {
        return value * value;
    }
}
