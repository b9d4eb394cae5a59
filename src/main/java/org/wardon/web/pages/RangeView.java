package org.wardon.web.pages;

/**
 * A number with its unit and its range.
 *
 * @param likely the likely number, with its unit
 * @param low the low end; blank where there is no range
 * @param high the high end
 */
public record RangeView(String likely, String low, String high) {
    /**
     * Returns a number without a range.
     *
     * @param likely the number with its unit
     * @return the view
     */
    public static RangeView of(String likely) {
        return new RangeView(likely, "", "");
    }
}
