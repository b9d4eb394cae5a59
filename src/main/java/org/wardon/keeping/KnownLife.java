package org.wardon.keeping;

import org.wardon.errors.Require;

/**
 * How long the commodity usually keeps in the keeper's own store.
 *
 * @param days days it keeps
 * @param atC temperature there, °C
 * @param deviation how well that is known, standard deviation of ln days
 */
public record KnownLife(double days, double atC, double deviation) {
    /**
     * A figure told as one number is right to a twentieth (assumption); who is less sure tells a
     * range.
     */
    public static final double USUAL_DEVIATION = 0.05;

    /** One in ten lies beyond this many deviations. */
    private static final double TENTH = 1.2816;

    /** Checks the bounds. */
    public KnownLife {
        Require.within("knownLife.days", days, 0.1, 730, "day", "");
        Require.within("knownLife.atC", atC, -5, 45, "°C", "");
        Require.within("knownLife.deviation", deviation, 0, 2, "1", "");
    }

    /**
     * A figure as usually well known.
     *
     * @param days days it keeps
     * @param atC temperature there, °C
     */
    public KnownLife(double days, double atC) {
        this(days, atC, USUAL_DEVIATION);
    }

    /**
     * Returns a figure told as a range; one in ten lies beyond each end.
     *
     * @param lowDays lower end, days
     * @param highDays upper end, days; the same for a single figure
     * @param atC temperature there, °C
     * @return the figure
     */
    public static KnownLife between(double lowDays, double highDays, double atC) {
        if (highDays <= lowDays) {
            return new KnownLife(lowDays, atC);
        }
        double middle = Math.sqrt(lowDays * highDays);
        return new KnownLife(middle, atC, Math.log(highDays / lowDays) / (2 * TENTH));
    }
}
