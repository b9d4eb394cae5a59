package org.wardon.enclosure;

import org.wardon.errors.Require;

/** What lies on the far side of a face or a door. */
public sealed interface Beyond {
    /** Open sky and sun. */
    record Outdoors() implements Beyond {}

    /** Outdoor air without sun. */
    record Shade() implements Beyond {}

    /** Soil. */
    record Ground() implements Beyond {}

    /**
     * A space at a steady temperature.
     *
     * @param temperatureC its air, °C
     */
    record Space(double temperatureC) implements Beyond {
        /** Checks the bounds. */
        public Space {
            Require.within("beyond.spaceC", temperatureC, -40, 70, "°C", "");
        }
    }

    /**
     * A space warmer than outdoors, such as a room under a tin roof.
     *
     * @param aboveOutdoorK its air above the outdoor air, K
     */
    record SpaceAboveOutdoor(double aboveOutdoorK) implements Beyond {
        /** Checks the bounds. */
        public SpaceAboveOutdoor {
            Require.within("beyond.spaceAboveOutdoorK", aboveOutdoorK, -20, 40, "K", "");
        }
    }

    /**
     * Another chamber of the plan.
     *
     * @param chamberId its id
     */
    record Neighbour(String chamberId) implements Beyond {}
}
