package org.wardon.reference.fits;

import org.wardon.produce.rows.ChillingExposure;
import org.wardon.reference.fits.LeaveOneExposure.Judged;

/** The likely reason why an exposure left out lies on the other side than the rest says. */
final class WhyMissed {
    private static final double NEAR_K = 1.5;
    private static final double EVEN = 0.15;
    private static final double HALF = 0.5;

    private WhyMissed() {}

    /**
     * Returns the likely reason.
     *
     * @param one an exposure missed with or without the handbook's condition held
     * @return one phrase
     */
    static String likely(Judged one) {
        if (one.right() != one.rightHeld()) {
            return "the handbook's own condition lies there and is held";
        }
        if (one.injured() && one.probability() == 0) {
            return "injured where every other print calls it safe";
        }
        String against = against(one);
        if (!against.isEmpty()) {
            return "contradicted by " + against;
        }
        if (Math.abs(one.probability() - HALF) < EVEN) {
            return "too near the middle of the range to call";
        }
        if (!one.row().variant().isEmpty()) {
            return one.injured() ? "a tender variant" : "a hardy variant";
        }
        return one.injured()
                ? "quicker than the crop's other rows"
                : "hardier than the crop's other rows";
    }

    /** Source of a row near it that says the opposite, "" if there is none. */
    private static String against(Judged one) {
        ChillingExposure row = one.row();
        return one.commodity().keeping().exposures().stream()
                .filter(other -> !other.equals(row) && LeaveOneExposure.counts(other))
                .filter(other -> Math.abs(other.temperatureC() - row.temperatureC()) < NEAR_K)
                .filter(other -> opposite(row, other))
                .map(other -> other.days().sourceId())
                .findFirst()
                .orElse("");
    }

    /** Injured in less time than another was safe, or safe for longer than another took. */
    private static boolean opposite(ChillingExposure row, ChillingExposure other) {
        boolean injured = !row.kind().equals("safe");
        boolean otherInjured = !other.kind().equals("safe");
        if (injured == otherInjured) {
            return false;
        }
        double safeDays = (injured ? other : row).days().highest();
        double injuredDays = (injured ? row : other).days().highest();
        return injuredDays <= safeDays;
    }
}
