package org.wardon.files.readings;

/**
 * A column of numbers.
 *
 * @param name its name in the first line
 * @param needed whether it must be there
 * @param low lowest value accepted
 * @param high highest value accepted
 * @param unit unit of the bounds
 */
record Column(String name, boolean needed, double low, double high, String unit) {
    /** Returns what is accepted in a cell. */
    String accepted() {
        return "accepted: a number from " + plain(low) + " to " + plain(high) + " " + unit;
    }

    private static String plain(double bound) {
        return String.valueOf(Math.round(bound));
    }
}
