package org.wardon.heat;

import java.util.Optional;
import org.wardon.enclosure.Enclosure;

/**
 * How a lot comes to its place in a chamber, where that is, and how it leaves it.
 *
 * @param from id of the chamber it is carried from; absent where it comes in by the door
 * @param to id of the chamber it is carried to; absent where it leaves by the door
 * @param as how it is when it is carried in; absent where the run of the chambers together finds it
 * @param spot where in the chamber
 */
public record Berth(Optional<String> from, Optional<String> to, Optional<LotState> as, Spot spot) {
    /** Where in a chamber a lot stands. */
    public enum Spot {
        /**
         * Near the cooler, in air midway between the room's and that which leaves the cooler; at
         * the coil end.
         */
        NEAR_COOLER,
        /** In the middle; at the larger end, at the coil end of two alike. */
        MIDDLE,
        /** By the door; at the door end where the air is two. */
        BY_DOOR;

        /**
         * Returns which end of a chamber it lies in.
         *
         * @param built the chamber
         * @return true at the door end; false where the air is one
         */
        public boolean atDoorEnd(Enclosure built) {
            return built.zones()
                    .filter(
                            zones ->
                                    this == BY_DOOR
                                            || (this == MIDDLE && zones.doorEndShare() > 0.5))
                    .isPresent();
        }
    }

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
        return new Berth(from, to, Optional.empty(), Spot.MIDDLE);
    }

    /**
     * Returns whether the lot stands in the blast of the cooler.
     *
     * @return true near the cooler
     */
    public boolean inBlast() {
        return spot == Spot.NEAR_COOLER;
    }

    /**
     * Returns the same elsewhere in the chamber.
     *
     * @param other where
     * @return the changed copy
     */
    public Berth at(Spot other) {
        return new Berth(from, to, as, other);
    }

    /**
     * Returns the same near the cooler.
     *
     * @return in the blast
     */
    public Berth nearCooler() {
        return at(Spot.NEAR_COOLER);
    }
}
