package org.wardon.keeping;

import java.util.OptionalDouble;

/**
 * Risk of injury by cold.
 *
 * @param probability share of draws in which injury shows by the time of leaving, after rewarming
 *     where so named
 * @param safeDays days at the state of the end until one draw in ten is injured; empty where
 *     nothing chills
 */
public record ChillingRisk(double probability, OptionalDouble safeDays) {}
