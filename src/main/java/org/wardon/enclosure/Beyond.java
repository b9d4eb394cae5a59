package org.wardon.enclosure;

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
    record Space(double temperatureC) implements Beyond {}

    /**
     * A space warmer than outdoors, such as a room under a tin roof.
     *
     * @param aboveOutdoorK its air above the outdoor air, K
     */
    record SpaceAboveOutdoor(double aboveOutdoorK) implements Beyond {}

    /**
     * Another chamber of the plan.
     *
     * @param chamberId its id
     */
    record Neighbour(String chamberId) implements Beyond {}
}
