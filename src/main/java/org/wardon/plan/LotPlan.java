package org.wardon.plan;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.produce.Ripeness;

/**
 * One lot of a plan.
 *
 * @param id its id, unique in the plan
 * @param commodity id of the commodity
 * @param variant id of its variant; absent: the crop as a whole
 * @param massKg net mass on arrival, kg
 * @param packed how it is packed
 * @param arrives local time; one before the plan's {@code from} is in its chamber at the start, at
 *     {@code temperatureC} then
 * @param temperatureC pulp on arrival, °C
 * @param wantedDays days wanted in the chamber
 * @param leaves local time it leaves the chamber
 * @param chamber id of the chamber it arrives in; absent: to be placed
 * @param place where in the chamber it stands
 * @param moves to other chambers, in order of time
 * @param atDoor what it has behind it
 * @param market what comes after
 */
public record LotPlan(
        String id,
        String commodity,
        Optional<String> variant,
        double massKg,
        PackagePlan packed,
        LocalDateTime arrives,
        double temperatureC,
        double wantedDays,
        LocalDateTime leaves,
        Optional<String> chamber,
        Place place,
        List<Move> moves,
        AtDoor atDoor,
        Market market) {
    /** Copies the list and checks the bounds. */
    public LotPlan {
        Ids.check("lot", id);
        Require.text("commodity of " + id, commodity);
        moves = List.copyOf(moves);
        Require.within("massKg of " + id, massKg, 0.1, 500_000, "kg", "Give net kilograms.");
        Require.within("temperatureC of " + id, temperatureC, -5, 55, "°C", "Measure the pulp.");
        Require.within("wantedDays of " + id, wantedDays, 0.01, 730, "day", "");
        Require.that(
                leaves.isAfter(arrives),
                "lot " + id + " leaves at " + leaves + ", not after it arrives at " + arrives);
    }

    /**
     * Returns what the lot is kept for: as the plan says, else sent on green if it is green, else
     * sold ripe.
     *
     * @return the purpose
     */
    public Purpose purpose() {
        return market.purpose()
                .orElse(
                        atDoor.ripeness() == Ripeness.GREEN
                                ? Purpose.SHIP_GREEN
                                : Purpose.SELL_RIPE);
    }

    /**
     * Returns a copy placed in a chamber.
     *
     * @param chamberId id of the chamber
     * @return the copy
     */
    public LotPlan placedIn(String chamberId) {
        return standing(Optional.of(chamberId));
    }

    /**
     * Returns a copy without a chamber.
     *
     * @return the copy, to be placed
     */
    public LotPlan unplaced() {
        return standing(Optional.empty());
    }

    private LotPlan standing(Optional<String> chamberId) {
        return new LotPlan(
                id,
                commodity,
                variant,
                massKg,
                packed,
                arrives,
                temperatureC,
                wantedDays,
                leaves,
                chamberId,
                place,
                moves,
                atDoor,
                market);
    }

    /**
     * Returns a heavier or lighter copy.
     *
     * @param kg net mass on arrival, kg
     * @return the copy
     */
    public LotPlan weighing(double kg) {
        return new LotPlan(
                id,
                commodity,
                variant,
                kg,
                packed,
                arrives,
                temperatureC,
                wantedDays,
                leaves,
                chamber,
                place,
                moves,
                atDoor,
                market);
    }
}
