package org.wardon.produce.rows;

import java.util.Optional;
import org.wardon.produce.Fact;

/**
 * A harm that ethylene does from a level on.
 *
 * @param thresholdPpm level at which the source reports it, µL/L; empty where not printed
 * @param effect what happens
 * @param sourceId source
 */
public record EthyleneEffect(Optional<Fact> thresholdPpm, String effect, String sourceId) {}
