package org.wardon.enclosure;

import java.time.LocalTime;
import org.wardon.errors.Require;

/**
 * A door and how it is used.
 *
 * @param widthM clear width, m
 * @param heightM clear height, m
 * @param openingsPerDay openings a day, spread evenly over the hours of use
 * @param secondsOpen how long each stands open, s
 * @param from first hour of use
 * @param to last hour of use, after {@code from}
 * @param effectiveness share of the exchange a curtain keeps back, 0 to 1
 * @param protection id of the table of doorways the effectiveness comes from
 * @param beyond what lies behind the door
 */
public record Door(
        double widthM,
        double heightM,
        double openingsPerDay,
        double secondsOpen,
        LocalTime from,
        LocalTime to,
        double effectiveness,
        String protection,
        Beyond beyond) {
    /** Checks the bounds. */
    public Door {
        Require.within("door.widthM", widthM, 0.1, 20, "m", "");
        Require.within("door.heightM", heightM, 0.1, 20, "m", "");
        Require.within("door.openingsPerDay", openingsPerDay, 0, 2_000, "1/day", "");
        Require.within("door.secondsOpen", secondsOpen, 0, 86_400, "s", "");
        Require.within("door effectiveness", effectiveness, 0, 1, "", "");
        Require.that(from.isBefore(to), "door.from " + from + " must be before door.to " + to);
    }
}
