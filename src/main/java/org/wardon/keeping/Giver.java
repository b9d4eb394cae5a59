package org.wardon.keeping;

import org.wardon.lots.LotHistory;

/**
 * A lot in a chamber as it gives off and feels ethylene.
 *
 * @param model the lot, as it keeps
 * @param history what it goes through from its arrival on
 * @param massKg its mass, kg
 * @param leavesS from here on it gives nothing, s; it goes on feeling the air
 */
public record Giver(KeepingModel model, LotHistory history, double massKg, double leavesS) {}
