package org.wardon.produce.rows;

import java.util.Optional;
import org.wardon.produce.Fact;

/**
 * Gas levels that injure.
 *
 * @param co2InjuryPct injury while CO2 stays above this, percent
 * @param o2LowPct injury while O2 stays below this, percent
 * @param effect what happens
 * @param sourceId source
 */
public record GasInjury(
        Optional<Fact> co2InjuryPct, Optional<Fact> o2LowPct, String effect, String sourceId) {}
