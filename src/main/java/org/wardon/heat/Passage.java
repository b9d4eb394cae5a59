package org.wardon.heat;

import java.util.Optional;

/**
 * How a lot comes into a chamber and leaves it: by the door, or carried from and to other chambers
 * of the store.
 *
 * @param from id of the chamber it is carried from; absent where it comes in by the door
 * @param to id of the chamber it is carried to; absent where it leaves by the door
 * @param as how it is when it is carried in; absent where the run of the chambers together finds it
 */
public record Passage(Optional<String> from, Optional<String> to, Optional<LotState> as) {
    /** In and out by the door. */
    public static final Passage DOOR =
            new Passage(Optional.empty(), Optional.empty(), Optional.empty());

    /**
     * Returns a passage of which nothing more is known beforehand.
     *
     * @param from id of the chamber it is carried from
     * @param to id of the chamber it is carried to
     * @return the passage
     */
    public static Passage between(Optional<String> from, Optional<String> to) {
        return new Passage(from, to, Optional.empty());
    }
}
