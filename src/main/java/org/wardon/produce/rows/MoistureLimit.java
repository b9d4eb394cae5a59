package org.wardon.produce.rows;

import org.wardon.produce.Fact;

/**
 * Permissible loss of water.
 *
 * @param maxLossPct permissible loss, percent of harvest mass
 * @param symptom what is seen beyond it
 */
public record MoistureLimit(Fact maxLossPct, String symptom) {}
