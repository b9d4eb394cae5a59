package org.wardon.produce.rows;

import org.wardon.produce.Evidence;

/**
 * Published power law of respiration: mg CO2/(kg h) = f (1.8 T + 32)^g.
 *
 * @param f factor
 * @param g exponent
 * @param sourceId source
 * @param evidence how it reached us
 * @param note what is known against it, may be empty
 */
public record RespirationPower(
        double f, double g, String sourceId, Evidence evidence, String note) {}
