package org.wardon.sharing;

/**
 * What makes a verdict good or tolerable. The figures are ours and are shown with the verdict.
 *
 * <ul>
 *   <li>good: p10 of the days left covers stay and market leg, chilling under 5 %, ethylene costs
 *       under 10 % of the life, no odour pair
 *   <li>tolerable: p50 covers it, chilling under 15 %, ethylene under 25 %, odour at most 2 days
 *       (general advice to keep apart: 7 days)
 * </ul>
 *
 * <p>No company can give a lot more than the handbook's own condition does: a lot that keeps nine
 * tenths of its p50 there is tolerable even where that falls short of its days, unless it falls
 * short by more than half.
 */
final class Limits {
    static final double GOOD_SHARE = 0.1;
    static final double TOLERABLE_SHARE = 0.5;
    static final double GOOD_CHILLING = 0.05;
    static final double TOLERABLE_CHILLING = 0.15;
    static final double GOOD_ETHYLENE = 0.10;
    static final double TOLERABLE_ETHYLENE = 0.25;
    static final double ODOUR_DAYS = 2;
    static final double GENERAL_ODOUR_DAYS = 7;
    static final double LEAST_OF_WANTED = 0.5;
    static final double MOST_OF_HANDBOOK = 0.9;

    /** What {@link org.wardon.keeping.KeepingModel#FREEZING_MARGIN_K} rests on. */
    static final String FREEZING_SOURCE = "common-practice";

    private Limits() {}

    /**
     * Returns the days a lot has to keep in the middle of its range to be tolerable.
     *
     * @param handbookDays median life in the handbook's own condition, days
     * @param wantedDays stay and market leg, days
     * @return the days wanted, or nine tenths of what it keeps in the handbook's own condition if
     *     that is less
     */
    static double neededDays(double handbookDays, double wantedDays) {
        return Math.min(wantedDays, MOST_OF_HANDBOOK * handbookDays);
    }
}
