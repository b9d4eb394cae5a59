package org.wardon.reference.fits;

import java.util.ArrayList;
import java.util.List;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.ChillingExposure;

/**
 * Leaves out every published exposure to cold once and asks the rest on which side it lies: injured
 * or not. Safe exposures are asked at their end, injuries at one and a half times the time at which
 * they were first or already seen.
 */
final class LeaveOneExposure {
    private static final double SURELY_LATER = 1.5;

    private LeaveOneExposure() {}

    /**
     * One exposure and what the rest says of it.
     *
     * @param commodity its commodity
     * @param row the exposure
     * @param topC temperature from which on the rest calls it safe, °C
     * @param probability probability of injury by the fit alone
     * @param heldProbability the same where the handbook's own condition keeps its published life
     */
    record Judged(
            Commodity commodity,
            ChillingExposure row,
            double topC,
            double probability,
            double heldProbability) {
        boolean injured() {
            return !row.kind().equals("safe");
        }

        boolean right() {
            return injured() == probability > 0.5;
        }

        boolean rightHeld() {
            return injured() == heldProbability > 0.5;
        }
    }

    static List<Judged> list(List<Commodity> commodities) {
        List<Judged> all = new ArrayList<>();
        for (Commodity commodity : commodities) {
            List<ChillingExposure> rows = commodity.keeping().exposures();
            for (int i = 0; i < rows.size(); i++) {
                ChillingExposure row = rows.get(i);
                if (counts(row)) {
                    List<ChillingExposure> rest = new ArrayList<>(rows);
                    rest.remove(i);
                    judge(commodity, row, rest, all);
                }
            }
        }
        return all;
    }

    /** Whether an exposure says on which side it lies: safe, or injured so that it is seen. */
    static boolean counts(ChillingExposure row) {
        return row.kind().equals("safe") || !row.visible().equals("no");
    }

    private static void judge(
            Commodity commodity,
            ChillingExposure row,
            List<ChillingExposure> rest,
            List<Judged> all) {
        Ripeness ripeness = row.ripeness().equals("ripe") ? Ripeness.RIPE : Ripeness.GREEN;
        Chilling.of(commodity, ripeness, rest, Chilling.trial(row))
                .map(
                        chilling -> {
                            boolean safe = row.kind().equals("safe");
                            double days = (safe ? 1 : SURELY_LATER) * row.days().highest();
                            return new Judged(
                                    commodity,
                                    row,
                                    chilling.zone().topC(),
                                    chilling.probability(commodity, row, days, false),
                                    chilling.probability(commodity, row, days, true));
                        })
                .ifPresent(all::add);
    }
}
