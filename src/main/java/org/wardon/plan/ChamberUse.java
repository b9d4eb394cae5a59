package org.wardon.plan;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.cooling.Cooler;

/**
 * How the keeper uses a chamber.
 *
 * @param accepts conflicts of lots that are accepted in it
 * @param off what stands still where the chamber is switched off; absent where it is on
 */
public record ChamberUse(Set<Conflict> accepts, Optional<Installed> off) {
    /** Switched on, nothing accepted. */
    public static final ChamberUse USUAL = new ChamberUse(Set.of(), Optional.empty());

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

    /** Copies the set. */
    public ChamberUse {
        accepts = Set.copyOf(accepts);
    }
}
