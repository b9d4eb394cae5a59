package org.wardon.keeping.chilling;

import org.wardon.keeping.life.LifeLevel;

/**
 * The handbook's own condition, in which no lot is injured before the shortest published life:
 * sources disagree, and this condition is the one that must hold. What other sources say of colder
 * air counts in full from a third of a kelvin below it on, between the two in part: printed
 * exposures left out in turn are the likelier the narrower this is (1 K: -105.2, 0.5 K: -104.6, 0.3
 * K: -104.5), and a keeper's thermometer hardly tells less apart (common practice, no source).
 *
 * @param lowC lowest temperature of the condition, °C
 * @param highC highest temperature of it, °C
 * @param days shortest life published for it, days
 */
record Handbook(double lowC, double highC, double days) {
    private static final double FULLY_AFTER_K = 0.3;

    /** Between the handbook's condition and a band above it nothing is worse than in either. */
    static Handbook of(LifeLevel handbook, Zone zone) {
        double highC = Math.max(handbook.atHighC(), zone.bandLowC().orElse(handbook.atHighC()));
        return new Handbook(handbook.atLowC(), highC, handbook.lowDays());
    }

    /**
     * Returns the share of the injuring dose a day.
     *
     * @param byExposures the share by the exposures alone, 1/day
     * @param temperatureC temperature, °C
     * @param band whether the zone is a band, so that warmer air may be worse
     * @return 1/day, at most what the exposures say
     */
    double hold(double byExposures, double temperatureC, boolean band) {
        double most = 1 / days;
        if (byExposures <= most) {
            return byExposures;
        }
        double counts = counts(temperatureC, band);
        return most + counts * (byExposures - most);
    }

    /** Share to which exposures count against the handbook. */
    private double counts(double temperatureC, boolean band) {
        double outside = Math.max(lowC - temperatureC, band ? temperatureC - highC : 0);
        return Math.min(1, Math.max(0, outside / FULLY_AFTER_K));
    }

    /**
     * Returns the largest dose that injures a lot in a time.
     *
     * @param inDays time in that temperature, days
     * @param severityK how strongly it injures, K
     * @param temperatureC temperature, °C
     * @param band whether the zone is a band
     * @return dose, K d; 0 where none is small enough
     */
    double dose(double inDays, double severityK, double temperatureC, boolean band) {
        if (inDays >= days) {
            return severityK * inDays;
        }
        double counts = counts(temperatureC, band);
        return counts * severityK / (1 / inDays - (1 - counts) / days);
    }
}
