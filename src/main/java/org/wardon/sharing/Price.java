package org.wardon.sharing;

import java.util.OptionalDouble;
import org.wardon.produce.Conflict;

/**
 * What a conflict that is accepted costs a lot.
 *
 * @param conflict what is accepted
 * @param id the lot that bears it
 * @param from id of the lot it comes from; of ethylene, the one that gives most
 * @param daysLost days of its life, in the middle of its range; empty where it cannot be counted
 * @param days days together
 */
public record Price(
        Conflict conflict, String id, String from, OptionalDouble daysLost, double days) {}
