package org.wardon.advice.whatif;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What is changed in a chamber. What is absent stays as it is.
 *
 * @param settingC temperature it is set to, °C
 * @param coolingFactor size of its coolers, times that of the plan
 * @param loadFactor mass of its lots, times that of the plan
 * @param freshAirM3PerHour deliberate fresh air, m3/h
 * @param insulation its insulation
 * @param door its door
 */
public record Changes(
        OptionalDouble settingC,
        OptionalDouble coolingFactor,
        OptionalDouble loadFactor,
        OptionalDouble freshAirM3PerHour,
        Optional<Insulation> insulation,
        DoorUse door) {
    /** Nothing is changed. */
    public static final Changes NOTHING =
            new Changes(
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    Optional.empty(),
                    new DoorUse(OptionalDouble.empty(), Optional.empty()));

    /**
     * Thicker or thinner insulation: of each face meant, the layers that insulate (below 0.06 W/(m
     * K)), or all its layers where none does.
     *
     * @param thicknessFactor thickness, times that of the plan
     * @param face name of the face; absent: all faces that do not lie at another chamber
     */
    public record Insulation(double thicknessFactor, Optional<String> face) {}

    /**
     * How the door is used.
     *
     * @param openingsPerDay openings a day
     * @param protection what protects it, an id of the tables such as {@code strip-curtain} or
     *     {@code open-unprotected}
     */
    public record DoorUse(OptionalDouble openingsPerDay, Optional<String> protection) {}

    /**
     * Returns the same with another setting.
     *
     * @param temperatureC °C
     * @return the changed copy
     */
    public Changes setTo(double temperatureC) {
        return new Changes(
                OptionalDouble.of(temperatureC),
                coolingFactor,
                loadFactor,
                freshAirM3PerHour,
                insulation,
                door);
    }

    /**
     * Returns the same with coolers of another size.
     *
     * @param factor times that of the plan
     * @return the changed copy
     */
    public Changes cooled(double factor) {
        return new Changes(
                settingC,
                OptionalDouble.of(factor),
                loadFactor,
                freshAirM3PerHour,
                insulation,
                door);
    }

    /**
     * Returns the same with another load.
     *
     * @param factor times that of the plan
     * @return the changed copy
     */
    public Changes loaded(double factor) {
        return new Changes(
                settingC,
                coolingFactor,
                OptionalDouble.of(factor),
                freshAirM3PerHour,
                insulation,
                door);
    }

    /**
     * Returns the same with other fresh air.
     *
     * @param m3PerHour m3/h
     * @return the changed copy
     */
    public Changes aired(double m3PerHour) {
        return new Changes(
                settingC,
                coolingFactor,
                loadFactor,
                OptionalDouble.of(m3PerHour),
                insulation,
                door);
    }

    /**
     * Returns the same with other insulation.
     *
     * @param other the insulation
     * @return the changed copy
     */
    public Changes insulated(Insulation other) {
        return new Changes(
                settingC, coolingFactor, loadFactor, freshAirM3PerHour, Optional.of(other), door);
    }

    /**
     * Returns the same with the door used otherwise.
     *
     * @param other its use
     * @return the changed copy
     */
    public Changes through(DoorUse other) {
        return new Changes(
                settingC, coolingFactor, loadFactor, freshAirM3PerHour, insulation, other);
    }
}
