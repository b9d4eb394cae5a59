package org.wardon.enclosure;

import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * The air of a chamber in two zones, cut across its length: the coil end, where coolers and
 * thermostat are, and the door end. Each is well mixed, and they change air with each other.
 *
 * @param doorEnd end wall of the door end, east or west
 * @param doorEndShare share of the length that is door end, 0.1 to 0.9
 * @param exchangeM3S chamber air that goes each way between the ends at all times, m3/s; absent
 *     where it follows from fans and from the difference of temperature
 */
public record AirZones(FaceName doorEnd, double doorEndShare, OptionalDouble exchangeM3S) {
    /** Least and most of the length that can be one end. */
    public static final double LEAST_SHARE = 0.1;

    /** Checks the bounds. */
    public AirZones {
        Require.that(
                doorEnd == FaceName.EAST || doorEnd == FaceName.WEST,
                "the door end is east or west, found " + doorEnd);
        Require.within("doorEndShare", doorEndShare, LEAST_SHARE, 1 - LEAST_SHARE, "", "");
        if (exchangeM3S.isPresent()) {
            Require.within("exchange of the ends", exchangeM3S.getAsDouble(), 0, 1e4, "m3/s", "");
        }
    }

    /**
     * Returns how much of a face belongs to the door end.
     *
     * @param face the face
     * @return share of its area, 0 to 1
     */
    public double doorEndShareOf(FaceName face) {
        return switch (face) {
            case ROOF, FLOOR, NORTH, SOUTH -> doorEndShare;
            case EAST, WEST -> face == doorEnd ? 1 : 0;
        };
    }
}
