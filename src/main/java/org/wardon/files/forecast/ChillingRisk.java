package org.wardon.files.forecast;

import java.util.OptionalDouble;

/**
 * Risk of chilling injury.
 *
 * @param probability of visible injury by the time of leaving, 0 to 1
 * @param safeDays days until one draw in ten shows injury; absent where there is no chilling
 */
public record ChillingRisk(double probability, OptionalDouble safeDays) {}
