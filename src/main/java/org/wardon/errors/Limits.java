package org.wardon.errors;

/**
 * What is taken of a number somebody gives.
 *
 * @param low the least
 * @param high the most
 */
public record Limits(double low, double high) {
    /**
     * Returns whether a number is taken.
     *
     * @param value the number, in the unit of the limits
     * @return true if so; false where it is none
     */
    public boolean hold(double value) {
        return value >= low && value <= high;
    }
}
