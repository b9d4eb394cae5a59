package org.wardon.keeping.ethylene;

import java.util.Set;
import org.wardon.keeping.Draw;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;

/** How ripeness bears on what a fruit gives off and on what its published life means. */
public final class Stage {
    /** Rows of the tables that already speak of ripening or ripe fruit. */
    private static final Set<String> RIPE_IDS =
            Set.of("banana-ripe", "tomato-ripe", "tomato-pink", "cherry-tomato");

    /** Rows of the tables that already speak of green fruit. */
    private static final Set<String> GREEN_IDS =
            Set.of("banana-green", "tomato-mature-green", "plantain");

    private Stage() {}

    /**
     * Returns whether the commodity's own rows are those of ripe fruit.
     *
     * @param commodity the commodity
     * @return true if its life is a ripe life
     */
    public static boolean soldRipe(Commodity commodity) {
        return RIPE_IDS.contains(commodity.id());
    }

    /**
     * Returns whether the commodity's own rows are those of green fruit.
     *
     * @param commodity the commodity
     * @return true if its class of ethylene is that of green fruit
     */
    public static boolean soldGreen(Commodity commodity) {
        return GREEN_IDS.contains(commodity.id());
    }

    /**
     * Returns the ripeness to judge by.
     *
     * @param commodity the commodity
     * @param told what was told
     * @return green or ripe where the commodity itself says so, else what was told
     */
    public static Ripeness judged(Commodity commodity, Ripeness told) {
        if (soldRipe(commodity)) {
            return Ripeness.RIPE;
        }
        return told == Ripeness.UNKNOWN && soldGreen(commodity) ? Ripeness.GREEN : told;
    }

    /**
     * Returns where between the lowest and the highest printed rate a lot gives off ethylene.
     *
     * @param commodity the commodity
     * @param told what was told of its ripeness
     * @param draw the draw
     * @return 0 for green fruit that ripens, 1 for ripening, ripe and unknown; for produce that
     *     does not ripen as the draw has it
     */
    public static double giving(Commodity commodity, Ripeness told, Draw draw) {
        if (!commodity.climacteric()) {
            return draw.ethyleneGiven();
        }
        return judged(commodity, told) == Ripeness.GREEN ? 0 : 1;
    }
}
