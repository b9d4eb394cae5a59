package org.wardon.files.forecast;

import java.util.OptionalDouble;

/**
 * Whether a fruit is ripe on the day it is wanted ripe.
 *
 * @param inDays days until then
 * @param probability that it is ripe and not overripe, 0 to 1
 * @param overripe probability that it is past eating, 0 to 1
 * @param atC steady temperature that most likely makes it ripe then, °C; absent where none that is
 *     safe does
 */
public record RipeOn(double inDays, double probability, double overripe, OptionalDouble atC) {}
