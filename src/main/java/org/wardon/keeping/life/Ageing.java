package org.wardon.keeping.life;

/** Rate of ageing over temperature in one draw. */
public final class Ageing {
    private final GenericCurve generic;
    private final OwnSlope slope;
    private final double kilojoulePerMol;
    private final double offset;

    Ageing(GenericCurve generic, OwnSlope slope, double kilojoulePerMol, double offset) {
        this.generic = generic;
        this.slope = slope;
        this.kilojoulePerMol = kilojoulePerMol;
        this.offset = offset;
    }

    Ageing anchored(double lnLifeDays, double atC) {
        return new Ageing(generic, slope, kilojoulePerMol, offset - lnLifeDays - lnRate(atC));
    }

    /**
     * Returns the logarithm of the rate of ageing.
     *
     * @param temperatureC temperature, °C
     * @return ln of the share of life used a day
     */
    public double lnRate(double temperatureC) {
        if (!(slope.ownWeight() > 0)) {
            return offset + generic.lnRate(temperatureC);
        }
        double low = slope.lowestC();
        double high = slope.highestC();
        double inside = Math.min(Math.max(temperatureC, low), high);
        double own =
                OwnSlope.lnRate(inside, kilojoulePerMol) - OwnSlope.lnRate(low, kilojoulePerMol);
        double below = generic.lnRate(Math.min(temperatureC, low));
        double above = generic.lnRate(Math.max(temperatureC, high)) - generic.lnRate(high);
        return offset + below + own + above;
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
