package org.wardon.heat.network;

/**
 * Factors on the parts of a network, 1 for none.
 *
 * @param wall on the conductance of faces and thermal bridges
 * @param exchange on leakage, fresh air and door
 * @param capacity on what coolers can take
 * @param respiration on heat of respiration
 * @param transpiration on the conductance from tissue to air
 * @param packageTime on half-cooling times
 * @param thermostatOffsetK what the thermostat reads above the air, K
 */
public record Tuning(
        double wall,
        double exchange,
        double capacity,
        double respiration,
        double transpiration,
        double packageTime,
        double thermostatOffsetK) {
    /** Nothing tuned. */
    public static final Tuning NONE = new Tuning(1, 1, 1, 1, 1, 1, 0);
}
