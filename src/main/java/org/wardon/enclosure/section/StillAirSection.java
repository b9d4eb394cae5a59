package org.wardon.enclosure.section;

import java.util.List;
import java.util.Optional;
import org.wardon.enclosure.section.Section.Span;

/**
 * The section of a chamber that no fan stirs.
 *
 * @param chest the chamber
 * @param field temperatures and heat
 * @param spaces how the air of each space carries heat
 * @param stackColumns columns of the stack; not used without one
 * @param stackRows rows of the stack; not used without one
 */
public record StillAirSection(
        Chest chest,
        SectionField field,
        List<SpaceReading> spaces,
        Span stackColumns,
        Span stackRows) {
    /** Copies the list. */
    public StillAirSection {
        spaces = List.copyOf(spaces);
    }

    /**
     * Returns how far the warmest place is from the coldest.
     *
     * @return K
     */
    public double spreadK() {
        return field.warmest().temperatureC() - field.coldest().temperatureC();
    }

    /**
     * The stack in the section.
     *
     * @param fromM its left side from the left wall, m
     * @param toM its right side from the left wall, m
     * @param footM its foot above the floor, m
     * @param topM its top above the floor, m
     */
    public record Outline(double fromM, double toM, double footM, double topM) {
        /**
         * Returns whether a place lies in it.
         *
         * @param place the place
         * @return true inside
         */
        public boolean holds(Spot place) {
            return place.xM() > fromM
                    && place.xM() < toM
                    && place.yM() > footM
                    && place.yM() < topM;
        }
    }

    /**
     * Returns where the stack stands.
     *
     * @return empty without a load
     */
    public Optional<Outline> outline() {
        return chest.stack()
                .map(
                        stack -> {
                            double gap = Stack.clearM(chest.widthM());
                            double foot = Stack.clearM(chest.box().heightM());
                            return new Outline(
                                    gap, chest.widthM() - gap, foot, foot + chest.stackM());
                        });
    }

    /**
     * Returns whether a place lies in the stack.
     *
     * @param place the place
     * @return false in the air
     */
    public boolean inStack(Spot place) {
        return outline().map(outline -> outline.holds(place)).orElse(false);
    }

    /**
     * Returns the warmest place of the air.
     *
     * @return the place
     */
    public Spot warmestInAir() {
        return field.warmest(place -> !inStack(place));
    }

    /**
     * Returns the coldest place of the air.
     *
     * @return the place
     */
    public Spot coldestInAir() {
        return field.coldest(place -> !inStack(place));
    }

    /**
     * Returns how far warm and cold air are apart.
     *
     * @return K
     */
    public double airSpreadK() {
        return warmestInAir().temperatureC() - coldestInAir().temperatureC();
    }

    /**
     * Returns the warmest place in the stack.
     *
     * @return empty without a load
     */
    public Optional<Spot> warmestInStack() {
        return chest.stack().map(stack -> field.warmest(stackColumns, stackRows));
    }

    /**
     * Returns the coldest place in the stack.
     *
     * @return empty without a load
     */
    public Optional<Spot> coldestInStack() {
        return chest.stack().map(stack -> field.coldest(stackColumns, stackRows));
    }

    /**
     * Returns the mean of the air, the stack left out.
     *
     * @return °C
     */
    public double airMeanC() {
        if (chest.stack().isEmpty()) {
            return field.meanC();
        }
        double stackM2 = chest.stackM() * (chest.widthM() - 2 * Stack.clearM(chest.widthM()));
        double allM2 = chest.widthM() * chest.box().heightM();
        double stack = field.meanC(stackColumns, stackRows);
        return (allM2 * field.meanC() - stackM2 * stack) / (allM2 - stackM2);
    }
}
