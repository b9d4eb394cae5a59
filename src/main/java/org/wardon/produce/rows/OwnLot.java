package org.wardon.produce.rows;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.produce.Ripeness;

/**
 * A lot of the keeper's own that is gone: what it went through and how it ended.
 *
 * @param number its number in the keeper's file, from 1
 * @param endedOn the day it ended
 * @param ended how it ended
 * @param began what it was when it came
 * @param spells time spent at each temperature, in any order
 */
public record OwnLot(long number, LocalDate endedOn, Ended ended, Began began, List<Spell> spells) {
    /** How a lot ended. */
    public enum Ended {
        /** It aged past its best: this was its life. */
        AGED,
        /** Green fruit that could be held green no longer: this was its green life. */
        RIPE,
        /** It left while still sound: its life was at least as long. */
        SOLD,
        /** Rot, cold, frost, drought or bruises ended it: it had not aged out yet. */
        SPOILT;

        /**
         * Returns whether the end shows the life itself.
         *
         * @return false where the life was at least as long
         */
        public boolean ageing() {
            return this == AGED || this == RIPE;
        }
    }

    /**
     * A lot as it came.
     *
     * @param variant its variant, empty where nobody said
     * @param ripeness how ripe it was
     * @param cured whether it was cured, where that is known
     * @param usedFraction share of its life used before, 0 to below 1
     */
    public record Began(
            String variant, Ripeness ripeness, Optional<Boolean> cured, double usedFraction) {
        /** Checks the bounds. */
        public Began {
            Require.within("usedFraction", usedFraction, 0, 0.99, "1", "Share of its life.");
        }
    }

    /**
     * Time at a temperature.
     *
     * @param atC temperature, °C
     * @param hours how long, h
     */
    public record Spell(double atC, double hours) {
        /** Checks the bounds. */
        public Spell {
            Require.within("spell.atC", atC, -40, 70, "°C", "");
            Require.within("spell.hours", hours, 0, 100_000, "h", "");
        }
    }

    /** Copies the list and refuses an empty one. */
    public OwnLot {
        spells = List.copyOf(spells);
        Require.that(!spells.isEmpty(), "a lot was somewhere for some time");
    }

    /**
     * Returns how long it was followed.
     *
     * @return days
     */
    public double days() {
        return spells.stream().mapToDouble(Spell::hours).sum() / 24;
    }

    /**
     * Returns the mean temperature it was followed at.
     *
     * @return °C
     */
    public double meanC() {
        double kelvinHours = spells.stream().mapToDouble(s -> s.atC() * s.hours()).sum();
        return kelvinHours / (24 * days());
    }
}
