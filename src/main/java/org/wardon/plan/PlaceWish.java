package org.wardon.plan;

import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.wardon.produce.Conflict;

/**
 * What a placing is to seek.
 *
 * @param aim what comes first
 * @param lots ids of the lots whose days come first, where these are the aim
 * @param accepts conflicts accepted in every chamber
 */
public record PlaceWish(Aim aim, List<String> lots, Set<Conflict> accepts) {
    /** Most value, nothing accepted. */
    public static final PlaceWish USUAL = new PlaceWish(Aim.MOST_VALUE, List.of(), Set.of());

    /** What comes first. */
    public enum Aim {
        /** What is kept of the lots, less energy. */
        MOST_VALUE,
        /** Days of the lots named, then value. */
        MOST_DAYS,
        /** As few chambers running as the lots that can be placed allow, then value. */
        FEWEST_CHAMBERS,
        /** Most value, lots that are in the store already staying where they are. */
        LOTS_IN_STAY;

        /**
         * Returns the word of a plan.
         *
         * @return lower case, hyphens between
         */
        public String word() {
            return name().toLowerCase(Locale.ROOT).replace('_', '-');
        }
    }

    /** Copies list and set. */
    public PlaceWish {
        lots = List.copyOf(lots);
        accepts = Set.copyOf(accepts);
    }
}
