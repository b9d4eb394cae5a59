package org.wardon.heat;

import org.wardon.errors.Require;

/**
 * What perturbs a run: fit, sampling, sensitivity and what-if are one mechanism. A run is plan,
 * weather, factors and start; nothing else changes the model.
 *
 * @param wall on the conductance of all faces, thermal bridges included
 * @param exchange on leakage, fresh air and door exchange
 * @param capacity on what coolers can take
 * @param respiration on heat and gases of respiration
 * @param transpiration on the conductance from tissue to air
 * @param packageTime on the half-cooling time of packages
 * @param thermostatOffsetK what the thermostat reads above the air, K
 */
public record Factors(
        double wall,
        double exchange,
        double capacity,
        double respiration,
        double transpiration,
        double packageTime,
        double thermostatOffsetK) {
    /** Nothing perturbed. */
    public static final Factors PLAIN = new Factors(1, 1, 1, 1, 1, 1, 0);

    /** Checks the bounds. */
    public Factors {
        factor("wall", wall);
        factor("exchange", exchange);
        factor("capacity", capacity);
        factor("respiration", respiration);
        factor("transpiration", transpiration);
        factor("packageTime", packageTime);
        Require.within("thermostatOffsetK", thermostatOffsetK, -20, 20, "K", "");
    }

    private static void factor(String name, double value) {
        Require.within("factor " + name, value, 1e-3, 1e3, "", "1 changes nothing.");
    }
}
