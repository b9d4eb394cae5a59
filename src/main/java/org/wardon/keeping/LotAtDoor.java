package org.wardon.keeping;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;
import org.wardon.produce.Ripeness;

/**
 * What is known of a lot when it arrives.
 *
 * @param ripeness how ripe
 * @param usedFraction share of its life already used, 0 to 1; empty where only the age is known
 * @param age time since harvest, counted where {@code usedFraction} is empty; empty for produce
 *     fresh from harvest or in the handbook's state
 * @param cured whether it was cured; empty where nobody said
 * @param chilledBefore cold it went through before
 * @param purpose what it is wanted for; empty for ship-green if green, else sell-ripe
 * @param knownLife the keeper's own figure
 */
public record LotAtDoor(
        Ripeness ripeness,
        OptionalDouble usedFraction,
        Optional<Age> age,
        Optional<Boolean> cured,
        List<ColdSpell> chilledBefore,
        Optional<Purpose> purpose,
        Optional<KnownLife> knownLife) {
    /** A lot of which nothing is known but that it is sound: as the handbook takes it. */
    public static final LotAtDoor SOUND =
            new LotAtDoor(
                    Ripeness.UNKNOWN,
                    OptionalDouble.empty(),
                    Optional.empty(),
                    Optional.empty(),
                    List.of(),
                    Optional.empty(),
                    Optional.empty());

    /** Copies the list and checks the bounds. */
    public LotAtDoor {
        chilledBefore = List.copyOf(chilledBefore);
        if (usedFraction.isPresent()) {
            Require.within("usedFraction", usedFraction.getAsDouble(), 0, 1, "1", "");
        }
    }

    /**
     * Returns the lot at another ripeness.
     *
     * @param other how ripe
     * @return the copy
     */
    public LotAtDoor withRipeness(Ripeness other) {
        return new LotAtDoor(other, usedFraction, age, cured, chilledBefore, purpose, knownLife);
    }

    /**
     * Returns the lot with a share of its life used.
     *
     * @param fraction 0 to 1
     * @return the copy
     */
    public LotAtDoor withUsed(double fraction) {
        return new LotAtDoor(
                ripeness,
                OptionalDouble.of(fraction),
                age,
                cured,
                chilledBefore,
                purpose,
                knownLife);
    }

    /**
     * Returns the lot with an age.
     *
     * @param other time since harvest
     * @return the copy
     */
    public LotAtDoor withAge(Age other) {
        return new LotAtDoor(
                ripeness,
                usedFraction,
                Optional.of(other),
                cured,
                chilledBefore,
                purpose,
                knownLife);
    }

    /**
     * Returns the lot, cured or not.
     *
     * @param isCured whether it was cured
     * @return the copy
     */
    public LotAtDoor withCured(boolean isCured) {
        return new LotAtDoor(
                ripeness,
                usedFraction,
                age,
                Optional.of(isCured),
                chilledBefore,
                purpose,
                knownLife);
    }

    /**
     * Returns the lot for another purpose.
     *
     * @param other what it is wanted for
     * @return the copy
     */
    public LotAtDoor withPurpose(Purpose other) {
        return new LotAtDoor(
                ripeness, usedFraction, age, cured, chilledBefore, Optional.of(other), knownLife);
    }

    /**
     * Returns the lot with cold before its arrival.
     *
     * @param spells the cold it went through
     * @return the copy
     */
    public LotAtDoor withChilledBefore(List<ColdSpell> spells) {
        return new LotAtDoor(ripeness, usedFraction, age, cured, spells, purpose, knownLife);
    }

    /**
     * Returns the lot with the keeper's own figure.
     *
     * @param life days and temperature
     * @return the copy
     */
    public LotAtDoor withKnownLife(KnownLife life) {
        return new LotAtDoor(
                ripeness, usedFraction, age, cured, chilledBefore, purpose, Optional.of(life));
    }
}
