package org.wardon.heat;

import java.util.Optional;

/**
 * How a lot comes to its place in a chamber, where that is, and how it leaves it.
 *
 * @param from id of the chamber it is carried from; absent where it comes in by the door
 * @param to id of the chamber it is carried to; absent where it leaves by the door
 * @param as how it is when it is carried in; absent where the run of the chambers together finds it
 * @param inBlast whether it stands near the cooler, in air midway between the room's and that which
 *     leaves the cooler
 */
public record Berth(
        Optional<String> from, Optional<String> to, Optional<LotState> as, boolean inBlast) {
    /** In and out by the door, in the room's air. */
    public static final Berth DOOR = between(Optional.empty(), Optional.empty());

    /**
     * Returns a berth in the room's air of which nothing more is known beforehand.
     *
     * @param from id of the chamber it is carried from
     * @param to id of the chamber it is carried to
     * @return the berth
     */
    public static Berth between(Optional<String> from, Optional<String> to) {
        return new Berth(from, to, Optional.empty(), false);
    }

    /**
     * Returns the same near the cooler.
     *
     * @return in the blast
     */
    public Berth nearCooler() {
        return new Berth(from, to, as, true);
    }
}
