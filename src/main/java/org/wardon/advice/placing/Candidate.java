package org.wardon.advice.placing;

import org.wardon.advice.forecast.Tried;

/**
 * A placing that was run in full.
 *
 * @param sought as it was found, and what was assumed
 * @param tried what the full model says of it
 */
record Candidate(Sought sought, Tried tried) {}
