package org.wardon.reference.fits;

import java.util.Optional;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.pooling.LifePoint;

/**
 * A printed row and what the fit makes of it.
 *
 * @param table table it stands in
 * @param line its line there, 0 for the handbook's own condition of a commodity
 * @param variant variant as printed
 * @param lowDays lower end as printed, days; that of the bound where there is one end
 * @param highDays upper end, days
 * @param printedBound {@code exact}, {@code at-least} or {@code at-most} as printed
 * @param use how the fit uses it
 * @param point what it says of the life; empty where it says nothing
 */
record UsedRow(
        String table,
        long line,
        String variant,
        double lowDays,
        double highDays,
        String printedBound,
        String use,
        Optional<LifePoint> point) {
    private static final double SAME_CONDITION_K = 2;
    private static final double SAME_LN = 0.02;

    /** Whether the row is a life and not a bound or a ratio. */
    boolean isLife() {
        return point.isPresent() && point.get().exact() && !point.get().of().relative();
    }

    /**
     * Whether the row says the same of the same condition as the handbook: one of them is copied
     * from the other, or both from a third. Months are printed as 30 days here, 30.4 there.
     */
    boolean repeats(Crop crop, LifeLevel handbook) {
        if (!isLife() || !known().of().crop().equals(crop.id())) {
            return false;
        }
        double atC = known().temperatureC();
        return atC >= handbook.atLowC() - SAME_CONDITION_K
                && atC <= handbook.atHighC() + SAME_CONDITION_K
                && Math.abs(Math.log(lowDays / handbook.lowDays())) < SAME_LN
                && Math.abs(Math.log(highDays / handbook.highDays())) < SAME_LN;
    }

    LifePoint known() {
        return point.orElseThrow();
    }
}
