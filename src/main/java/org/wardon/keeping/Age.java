package org.wardon.keeping;

import org.wardon.errors.Require;

/**
 * Time from harvest to arrival and where it was spent.
 *
 * @param lowHours shortest time it may be, h
 * @param highHours longest time it may be, h
 * @param heldC temperature it was held at, °C
 * @param heldHumidityFraction humidity it was held at, 0 to 1
 */
public record Age(double lowHours, double highHours, double heldC, double heldHumidityFraction) {
    /** Checks the bounds. */
    public Age {
        Require.within("age.lowHours", lowHours, 0, 8760, "h", "Count from harvest.");
        Require.within("age.highHours", highHours, lowHours, 8760, "h", "Count from harvest.");
        Require.within("heldC", heldC, -5, 55, "°C", "");
        Require.within("heldHumidityFraction", heldHumidityFraction, 0, 1, "1", "");
    }

    /**
     * Returns an age that was told.
     *
     * @param hours hours since harvest
     * @param heldC temperature it was held at, °C
     * @param heldHumidityFraction humidity it was held at, 0 to 1
     * @return the age
     */
    public static Age known(double hours, double heldC, double heldHumidityFraction) {
        return new Age(hours, hours, heldC, heldHumidityFraction);
    }

    /**
     * Returns the age of a lot of which nobody knows when it was harvested: 4 to 36 h (assumption).
     *
     * @param heldC temperature it was held at, °C
     * @param heldHumidityFraction humidity it was held at, 0 to 1
     * @return the age
     */
    public static Age unknown(double heldC, double heldHumidityFraction) {
        return new Age(4, 36, heldC, heldHumidityFraction);
    }

    /**
     * Returns the hours of a draw.
     *
     * @param draw the draw
     * @return h
     */
    double hours(Draw draw) {
        return lowHours + draw.delay() * (highHours - lowHours);
    }

    /**
     * Returns whether the time is a guess.
     *
     * @return true if lowest and highest differ
     */
    boolean guessed() {
        return highHours > lowHours;
    }
}
