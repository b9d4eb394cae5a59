package org.wardon.plan;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;
import org.wardon.produce.Ripeness;

/**
 * What a lot has behind it when it comes to the door.
 *
 * @param harvested local time of harvest; absent where nobody knows
 * @param heldC temperature it was held at since; absent: outdoor air in shade
 * @param usedPct share of its life already used, percent; absent where nobody knows
 * @param ripeness how far it has ripened
 * @param cured whether a bulb, root or tuber was cured; absent where nobody knows
 * @param chilledBefore time spent cold before
 * @param surfaceWaterPct water on it from washing or hydrocooling, percent of its mass
 * @param knownLife what the keeper knows of its life, where so
 */
public record AtDoor(
        Optional<LocalDateTime> harvested,
        OptionalDouble heldC,
        OptionalDouble usedPct,
        Ripeness ripeness,
        Optional<Boolean> cured,
        List<Chilled> chilledBefore,
        double surfaceWaterPct,
        Optional<KnownLife> knownLife) {
    /** Nothing is known. */
    public static final AtDoor UNKNOWN =
            new AtDoor(
                    Optional.empty(),
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    Ripeness.UNKNOWN,
                    Optional.empty(),
                    List.of(),
                    0,
                    Optional.empty());

    /** Copies the list and checks the bounds. */
    public AtDoor {
        chilledBefore = List.copyOf(chilledBefore);
        if (heldC.isPresent()) {
            Require.within("heldC", heldC.getAsDouble(), -5, 55, "°C", "");
        }
        if (usedPct.isPresent()) {
            Require.within("usedPct", usedPct.getAsDouble(), 0, 100, "%", "");
        }
        Require.within("surfaceWaterPct", surfaceWaterPct, 0, 20, "%", "");
    }

    /**
     * Returns whether the age has to be drawn because neither harvest nor use is known.
     *
     * @return true if so
     */
    public boolean ageUnknown() {
        return harvested.isEmpty() && usedPct.isEmpty();
    }
}
