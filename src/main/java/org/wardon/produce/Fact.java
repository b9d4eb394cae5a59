package org.wardon.produce;

import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * A printed figure or range. A bound may be missing; a figure nobody printed is an absent Fact,
 * never 0.
 *
 * @param low lower bound, in {@code unit}; empty if only an upper limit is printed
 * @param high upper bound, in {@code unit}; empty if only a lower limit is printed
 * @param unit unit of both bounds
 * @param sourceId id in the table of sources
 * @param evidence how the figure reached us
 * @param own whether it is the keeper's own value
 */
public record Fact(
        OptionalDouble low,
        OptionalDouble high,
        String unit,
        String sourceId,
        Evidence evidence,
        boolean own) {
    /** Refuses a blank source, a fact without a bound, and bounds the wrong way round. */
    public Fact {
        Require.text("sourceId", sourceId);
        Require.that(low.isPresent() || high.isPresent(), "a Fact needs at least one bound");
        if (low.isPresent() && high.isPresent() && !(low.getAsDouble() <= high.getAsDouble())) {
            // The words are put together only here: thousands of facts are read at a time.
            throw new IllegalArgumentException(
                    "low " + low + " above high " + high + " in a fact of " + sourceId);
        }
    }

    /**
     * Returns a published range.
     *
     * @param low lower bound
     * @param high upper bound
     * @param unit unit
     * @param sourceId source
     * @param evidence how it reached us
     * @return the fact
     */
    public static Fact range(
            double low, double high, String unit, String sourceId, Evidence evidence) {
        return new Fact(
                OptionalDouble.of(low), OptionalDouble.of(high), unit, sourceId, evidence, false);
    }

    /**
     * Returns a single published figure.
     *
     * @param value the figure
     * @param unit unit
     * @param sourceId source
     * @param evidence how it reached us
     * @return the fact, both bounds equal
     */
    public static Fact of(double value, String unit, String sourceId, Evidence evidence) {
        return range(value, value, unit, sourceId, evidence);
    }

    /**
     * Returns the lower bound, or the upper where it alone is printed.
     *
     * @return in {@code unit}
     */
    public double lowest() {
        return low.isPresent() ? low.getAsDouble() : high.getAsDouble();
    }

    /**
     * Returns the upper bound, or the lower where it alone is printed.
     *
     * @return in {@code unit}
     */
    public double highest() {
        return high.isPresent() ? high.getAsDouble() : low.getAsDouble();
    }

    /**
     * Returns the middle of the range.
     *
     * @return in {@code unit}
     */
    public double middle() {
        return 0.5 * (lowest() + highest());
    }

    /**
     * Returns the value at a share of the range, even in the logarithm.
     *
     * @param share 0 for the lower bound, 1 for the upper
     * @return in {@code unit}; both bounds must be above 0
     */
    public double atLogShare(double share) {
        return lowest() * Math.pow(highest() / lowest(), share);
    }

    /**
     * Returns the value at a share of the range.
     *
     * @param share 0 for the lower bound, 1 for the upper
     * @return in {@code unit}
     */
    public double atShare(double share) {
        return lowest() + share * (highest() - lowest());
    }
}
