package org.wardon.keeping.life;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.keeping.RestsOn;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;

/**
 * Life where nobody printed one for the commodity: that of its kin, else of its plant part.
 *
 * <p>Source of the figures of kin: id cantwell-2001 (rows of luffa by id zong-1993), as in the
 * table of commodities; which is kin to which is ours (zong-1993 names luffa and bitter gourd
 * beside the bottle gourd). Figures of plant parts are medians of that table, worked out here.
 */
final class ClassLife {
    private static final double WIDER = 1.5;
    private static final String KIN_SOURCE_ID = "cantwell-2001";
    private static final double COLDEST_JUDGED_C = -2;

    private static final Map<String, LifeLevel> KIN =
            Map.of(
                    "bottle-gourd", kin(10, 12.5, 7, 14, "zong-1993"),
                    "turmeric", kin(13, 13, 182.4, 182.4, KIN_SOURCE_ID),
                    "shallot", kin(0, 0, 30.4, 243.2, KIN_SOURCE_ID),
                    "tomato-pink", kin(8, 10, 7, 21, KIN_SOURCE_ID));

    private static final Map<String, LifeLevel> PLANT_PARTS =
            Map.ofEntries(
                    Map.entry("fruit", part(5, 14, 28)),
                    Map.entry("fruit-vegetable", part(9, 8.5, 21)),
                    Map.entry("seed-pod", part(4, 7, 10)),
                    Map.entry("flower", part(0, 14, 21)),
                    Map.entry("leafy", part(0, 14, 21)),
                    Map.entry("stem", part(0, 30.4, 60.8)),
                    Map.entry("fungus", part(0, 7, 14)),
                    Map.entry("bulb", part(0, 106.4, 228)),
                    Map.entry("root", part(0, 121.6, 152)),
                    Map.entry("tuber", part(7, 136.8, 258.4)),
                    Map.entry("herb", part(0, 14, 17.5)));

    /** For a plant part nobody listed: the shortest-lived kind of them all. */
    private static final LifeLevel UNKNOWN_PART = part(0, 7, 14);

    private ClassLife() {}

    private static LifeLevel kin(
            double lowC, double highC, double lowDays, double highDays, String sourceId) {
        return new LifeLevel(
                lowC, highC, lowDays / WIDER, highDays * WIDER, RestsOn.CLASS, sourceId);
    }

    private static LifeLevel part(double atC, double lowDays, double highDays) {
        return kin(atC, atC, lowDays, highDays, KIN_SOURCE_ID);
    }

    /**
     * Returns the life to anchor on.
     *
     * @param commodity the commodity
     * @return the handbook's own life, else that of kin or plant part with a wider range
     */
    static LifeLevel of(Commodity commodity) {
        LifeLevel fallback =
                KIN.getOrDefault(
                        commodity.id(),
                        PLANT_PARTS.getOrDefault(commodity.plantPart(), UNKNOWN_PART));
        Optional<Fact> temperature = commodity.needs().temperatureC();
        double lowC = temperature.map(Fact::lowest).orElse(fallback.atLowC());
        double highC = temperature.map(Fact::highest).orElse(fallback.atHighC());
        OptionalDouble days = shortest(commodity);
        if (days.isEmpty()) {
            return new LifeLevel(
                    Math.max(lowC, COLDEST_JUDGED_C),
                    highC,
                    fallback.lowDays(),
                    fallback.highDays(),
                    RestsOn.CLASS,
                    fallback.sourceId());
        }
        Fact life = commodity.needs().lifeDays().orElseThrow();
        return new LifeLevel(
                Math.max(lowC, COLDEST_JUDGED_C),
                highC,
                life.lowest(),
                life.highest(),
                RestsOn.HANDBOOK_LIFE,
                life.sourceId());
    }

    private static OptionalDouble shortest(Commodity commodity) {
        return commodity
                .needs()
                .lifeDays()
                .map(life -> OptionalDouble.of(life.lowest()))
                .orElse(OptionalDouble.empty());
    }
}
