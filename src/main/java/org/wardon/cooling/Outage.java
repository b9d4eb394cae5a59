package org.wardon.cooling;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.wardon.errors.Require;

/**
 * A span without power.
 *
 * @param startS start, s since the start of the run
 * @param endS end, s since the start of the run, after the start
 */
public record Outage(double startS, double endS) {
    /** Checks the order. */
    public Outage {
        Require.that(startS < endS, "an outage must end after it starts");
    }

    /**
     * Joins spans that overlap or touch.
     *
     * @param outages in any order
     * @return in order, none overlapping
     */
    public static List<Outage> joined(List<Outage> outages) {
        List<Outage> joined = new ArrayList<>();
        outages.stream()
                .sorted(Comparator.comparingDouble(Outage::startS))
                .forEach(
                        next -> {
                            int last = joined.size() - 1;
                            if (last >= 0 && next.startS <= joined.get(last).endS) {
                                Outage before = joined.get(last);
                                joined.set(
                                        last,
                                        new Outage(
                                                before.startS, Math.max(before.endS, next.endS)));
                            } else {
                                joined.add(next);
                            }
                        });
        return joined;
    }
}
