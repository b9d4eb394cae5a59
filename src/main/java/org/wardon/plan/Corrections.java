package org.wardon.plan;

import java.time.LocalDate;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * What a fit to logged days found a chamber to be, against what its plan says.
 *
 * @param wallFactor on the conductance of the faces
 * @param exchangeFactor on door, leakage and fresh air
 * @param capacityFactor on the capacity of the coolers
 * @param thermostatOffsetK true air less what the thermostat shows, K
 * @param since day from which it holds; absent where not said
 */
public record Corrections(
        double wallFactor,
        double exchangeFactor,
        double capacityFactor,
        double thermostatOffsetK,
        Optional<LocalDate> since) {
    /** Nothing corrected. */
    public static final Corrections NONE = new Corrections(1, 1, 1, 0, Optional.empty());

    /** Checks the bounds. */
    public Corrections {
        Require.within("corrections.wallFactor", wallFactor, 0.05, 20, "", "");
        Require.within("corrections.exchangeFactor", exchangeFactor, 0, 50, "", "");
        Require.within("corrections.capacityFactor", capacityFactor, 0, 5, "", "");
        Require.within("corrections.thermostatOffsetK", thermostatOffsetK, -10, 10, "K", "");
    }
}
