package org.wardon.advice.placing;

import java.util.Set;

/**
 * Which lots that have a chamber may be moved to another.
 *
 * @param all whether all may
 * @param some ids of those that may
 */
public record PlaceQuestion(boolean all, Set<String> some) {
    /** Lots that have a chamber stay in it. */
    public static final PlaceQuestion NONE_MOVES = new PlaceQuestion(false, Set.of());

    /** Copies the set. */
    public PlaceQuestion {
        some = Set.copyOf(some);
    }
}
