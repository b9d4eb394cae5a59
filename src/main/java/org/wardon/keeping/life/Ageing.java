package org.wardon.keeping.life;

/**
 * Rate of ageing over temperature in one draw: by the fitted slope up to the highest temperature at
 * which lives are published, by the class's Q10 beyond.
 */
public final class Ageing {
    private final GenericCurve beyond;
    private final double kilojoulePerMol;
    private final double highestC;
    private final double offset;

    Ageing(GenericCurve beyond, double kilojoulePerMol, double highestC, double offset) {
        this.beyond = beyond;
        this.kilojoulePerMol = kilojoulePerMol;
        this.highestC = highestC;
        this.offset = offset;
    }

    Ageing anchored(double lnLifeDays, double atC) {
        return new Ageing(beyond, kilojoulePerMol, highestC, offset - lnLifeDays - lnRate(atC));
    }

    /**
     * Returns the logarithm of the rate of ageing.
     *
     * @param temperatureC temperature, °C
     * @return ln of the share of life used a day
     */
    public double lnRate(double temperatureC) {
        double fitted = OwnSlope.lnRate(Math.min(temperatureC, highestC), kilojoulePerMol);
        double above = beyond.lnRate(Math.max(temperatureC, highestC)) - beyond.lnRate(highestC);
        return offset + fitted + above;
    }

    /**
     * Returns the rate of ageing.
     *
     * @param temperatureC temperature, °C
     * @return share of life used a day
     */
    public double perDay(double temperatureC) {
        return Math.exp(lnRate(temperatureC));
    }

    /**
     * Returns the life in a constant temperature.
     *
     * @param temperatureC temperature, °C
     * @return days
     */
    public double lifeDays(double temperatureC) {
        return 1 / perDay(temperatureC);
    }
}
