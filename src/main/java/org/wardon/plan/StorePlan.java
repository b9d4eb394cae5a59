package org.wardon.plan;

import java.time.LocalDateTime;
import java.util.HashSet;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Set;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.errors.Require;
import org.wardon.produce.Conflict;

/**
 * A store and what is to come into it.
 *
 * @param name a name for people
 * @param site where it stands
 * @param weatherSource weather of the run and where it comes from
 * @param from local time the run starts
 * @param days how long it runs, days
 * @param chambers at least one, ids unique
 * @param lots ids unique
 * @param without what happens to the lots otherwise
 * @param seed number the draws start from
 * @param prices money
 * @param ethylene ethylene of the air around
 * @param wish what a placing is to seek
 * @param assumed every value the plan left out, in the order of the plan
 */
public record StorePlan(
        String name,
        Site site,
        WeatherSource weatherSource,
        LocalDateTime from,
        double days,
        List<ChamberPlan> chambers,
        List<LotPlan> lots,
        WithoutChamber without,
        long seed,
        Prices prices,
        EthyleneAround ethylene,
        PlaceWish wish,
        List<Assumed> assumed) {
    /** Copies the lists and checks bounds and ids. */
    public StorePlan {
        chambers = List.copyOf(chambers);
        lots = List.copyOf(lots);
        assumed = List.copyOf(assumed);
        Require.within("seed", (double) seed, 0, 9_007_199_254_740_991.0, "", "");
        Require.within("days", days, 0.1, 1_830, "day", "");
        Require.that(!chambers.isEmpty(), "a plan needs at least one chamber");
        Set<String> seen = new HashSet<>();
        for (ChamberPlan chamber : chambers) {
            Require.that(seen.add(chamber.id()), "chamber id '" + chamber.id() + "' stands twice");
        }
        Set<String> seenLots = new HashSet<>();
        for (LotPlan lot : lots) {
            Require.that(seenLots.add(lot.id()), "lot id '" + lot.id() + "' stands twice");
            if (lot.chamber().isPresent()) {
                Require.that(
                        seen.contains(lot.chamber().get()),
                        "lot '" + lot.id() + "' is in no chamber of the plan");
            }
        }
    }

    /**
     * Returns a chamber.
     *
     * @param id its id
     * @return the chamber
     * @throws NoSuchElementException where the plan has none of that id
     */
    public ChamberPlan getChamber(String id) {
        return chambers.stream()
                .filter(chamber -> chamber.id().equals(id))
                .findFirst()
                .orElseThrow(() -> new NoSuchElementException("no chamber '" + id + "'"));
    }

    /**
     * Returns what the keeper accepts in a chamber, there or everywhere.
     *
     * @param chamber one of the plan, or one that might be added
     * @return conflicts that forbid nothing
     */
    public Set<Conflict> accepts(ChamberPlan chamber) {
        Set<Conflict> all = new HashSet<>(wish.accepts());
        all.addAll(chamber.use().accepts());
        return all;
    }

    /**
     * Returns whether the keeper accepts a conflict in a chamber, there or everywhere.
     *
     * @param chamber one of the plan, or one that might be added
     * @param conflict which
     * @return whether it forbids nothing
     */
    public boolean accepts(ChamberPlan chamber, Conflict conflict) {
        return wish.accepts().contains(conflict) || chamber.use().accepts().contains(conflict);
    }

    /**
     * Returns the clock of the run.
     *
     * @return the clock, second 0 at {@code from}
     */
    public Timeline timeline() {
        return new Timeline(from, site.zone());
    }

    /**
     * Returns how long the run is.
     *
     * @return s
     */
    public double durationS() {
        return days * Timeline.DAY_S;
    }

    /**
     * Returns a copy with other lots, such as after placing.
     *
     * @param otherLots the lots
     * @return the copy
     */
    public StorePlan withLots(List<LotPlan> otherLots) {
        return with(chambers, otherLots);
    }

    /**
     * Returns a copy with other chambers and lots.
     *
     * @param otherChambers the chambers
     * @param otherLots the lots
     * @return the copy
     */
    public StorePlan with(List<ChamberPlan> otherChambers, List<LotPlan> otherLots) {
        return with(otherChambers, otherLots, wish);
    }

    /**
     * Returns a copy of which a placing is to seek something else.
     *
     * @param other the wish
     * @return the copy
     */
    public StorePlan wishing(PlaceWish other) {
        return with(chambers, lots, other);
    }

    private StorePlan with(
            List<ChamberPlan> otherChambers, List<LotPlan> otherLots, PlaceWish other) {
        return new StorePlan(
                name,
                site,
                weatherSource,
                from,
                days,
                otherChambers,
                otherLots,
                without,
                seed,
                prices,
                ethylene,
                other,
                assumed);
    }

    /**
     * Returns a copy with a chamber built or set otherwise.
     *
     * @param other taken for the chamber of its id
     * @return the copy
     */
    public StorePlan withChamber(ChamberPlan other) {
        return with(
                chambers.stream()
                        .map(chamber -> chamber.id().equals(other.id()) ? other : chamber)
                        .toList(),
                lots);
    }
}
