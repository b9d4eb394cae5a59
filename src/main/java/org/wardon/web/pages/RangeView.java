package org.wardon.web.pages;

import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Quantiles;

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

    /**
     * Returns days with their range.
     *
     * @param days the range over the draws
     * @param words words of the person
     * @param figures figures of the person
     * @return the likely days, with low and high end unless they are more than can be told
     */
    public static RangeView days(Quantiles days, Words words, Figures figures) {
        if (Words.isCapped(days.p10())) {
            return of(figures.text(words.range(days)));
        }
        String high = Words.isCapped(days.p90()) ? "730+" : bare(figures.figure(days.p90(), "day"));
        return new RangeView(
                figures.figure(days.p50(), "day"), bare(figures.figure(days.p10(), "day")), high);
    }

    private static String bare(String days) {
        return days.replaceAll(" days?$", "");
    }
}
