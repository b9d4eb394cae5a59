package org.wardon.advice.forecast;

import java.util.List;
import java.util.Map;
import org.wardon.heat.Course;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Spread;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;

/**
 * A store run in full: the money as the forecast tells it, chambers and lots.
 *
 * @param plan the plan that was run
 * @param kept what is kept of the lots, currency
 * @param energyCost what the electricity costs, currency
 * @param chambers the chambers, by id
 * @param ethylene their ethylene, by id
 * @param lots the lots that stood in the store, by id
 * @param reachedH hours until a chamber's air first is at its setting, by id; none where it never
 *     is
 * @param notHeld why a chamber does not hold its setting, by id; empty where it does
 */
public record Tried(
        StorePlan plan,
        double kept,
        double energyCost,
        Map<String, Course> chambers,
        Map<String, ChamberEthylene> ethylene,
        Map<String, OfLot> lots,
        Map<String, Double> reachedH,
        Map<String, List<Reason>> notHeld) {
    private static final double J_PER_KWH = 3.6e6;

    /** Copies the maps. */
    public Tried {
        chambers = Map.copyOf(chambers);
        ethylene = Map.copyOf(ethylene);
        lots = Map.copyOf(lots);
        reachedH = Map.copyOf(reachedH);
        notHeld = Map.copyOf(notHeld);
    }

    /**
     * One lot.
     *
     * @param valueKept what is kept of it, currency
     * @param shareSound share of draws in which it is sound when sold
     * @param massShare share of its mass left when it leaves
     * @param shareChilled share of draws in which cold has injured it when it is sold
     * @param daysLeft days left staying where it is
     * @param limitedBy what it ends by in the middle draw
     */
    public record OfLot(
            double valueKept,
            double shareSound,
            double massShare,
            double shareChilled,
            Spread daysLeft,
            Mechanism limitedBy) {}

    /**
     * Returns the value net of energy.
     *
     * @return currency
     */
    public double net() {
        return kept - energyCost;
    }

    /**
     * Returns the electricity all chambers take.
     *
     * @return kWh
     */
    public double energyKWh() {
        return chambers.values().stream()
                .mapToDouble(course -> course.heat().electricity() / J_PER_KWH)
                .sum();
    }

    /**
     * Returns what was found of a lot.
     *
     * @param id its id, of a lot that stood in the store
     * @return what was found
     */
    public OfLot lot(String id) {
        return ById.get(lots, id);
    }
}
