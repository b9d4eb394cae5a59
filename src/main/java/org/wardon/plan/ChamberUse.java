package org.wardon.plan;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.cooling.Cooler;
import org.wardon.errors.Require;
import org.wardon.produce.Conflict;

/**
 * How the keeper uses a chamber.
 *
 * @param accepts conflicts of lots that are accepted in it
 * @param changes later settings, in order of time, no two at one time
 * @param off what stands still where the chamber is switched off; absent where it is on
 */
public record ChamberUse(
        Set<Conflict> accepts, List<SettingChange> changes, Optional<Installed> off) {
    /** Switched on, one setting, nothing accepted. */
    public static final ChamberUse USUAL = new ChamberUse(Set.of(), List.of(), Optional.empty());

    /**
     * What stands still.
     *
     * @param coolers the coolers
     * @param humidifierKgH most water of the humidifier, kg/h
     * @param heaterW heater, W
     */
    public record Installed(List<Cooler> coolers, double humidifierKgH, double heaterW) {
        /** Copies the list. */
        public Installed {
            coolers = List.copyOf(coolers);
        }
    }

    /** Copies the set and the list and checks its order. */
    public ChamberUse {
        accepts = Set.copyOf(accepts);
        changes = List.copyOf(changes);
        for (int i = 1; i < changes.size(); i++) {
            LocalDateTime before = changes.get(i - 1).from();
            Require.that(
                    changes.get(i).from().isAfter(before),
                    "settingChanges are in order of time, found "
                            + changes.get(i).from()
                            + " behind "
                            + before);
        }
    }

    /**
     * Returns the same with other later settings.
     *
     * @param other in order of time
     * @return the changed copy
     */
    ChamberUse changing(List<SettingChange> other) {
        return new ChamberUse(accepts, other, off);
    }

    /**
     * Returns the same with other conflicts accepted.
     *
     * @param other conflicts
     * @return the changed copy
     */
    ChamberUse accepting(Set<Conflict> other) {
        return new ChamberUse(other, changes, off);
    }

    /**
     * Returns the same switched off or on.
     *
     * @param there what stands still; absent for on
     * @return the changed copy
     */
    ChamberUse resting(Optional<Installed> there) {
        return new ChamberUse(accepts, changes, there);
    }
}
