package org.wardon.files;

import java.time.LocalTime;
import java.util.Optional;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Door;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** Turns the door of a checked plan into a record. */
final class DoorBinder {
    private final Lookups lookups;
    private final Inputs inputs;

    DoorBinder(Lookups lookups, Inputs inputs) {
        this.lookups = lookups;
        this.inputs = inputs;
    }

    Door bind(Part door) {
        String protection =
                inputs.text(door, "protection", Defaults.DOOR_PROTECTION, Defaults.ASSUMPTION);
        double printed = Optional.ofNullable(lookups.protections().get(protection)).orElse(0.0);
        return new Door(
                inputs.number(door, "widthM"),
                inputs.number(door, "heightM"),
                inputs.number(door, "openingsPerDay", Defaults.OPENINGS_PER_DAY),
                inputs.number(door, "secondsOpen", Defaults.SECONDS_OPEN),
                LocalTime.parse(inputs.text(door, "from", Defaults.DOOR_FROM, Defaults.ASSUMPTION)),
                LocalTime.parse(inputs.text(door, "to", Defaults.DOOR_TO, Defaults.ASSUMPTION)),
                inputs.numberElse(door, "effectiveness", printed),
                protection,
                FaceBinder.beyond(door.at("beyond")).orElse(new Beyond.Outdoors()));
    }
}
