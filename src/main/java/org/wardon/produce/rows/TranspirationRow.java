package org.wardon.produce.rows;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * Transpiration coefficient of a commodity.
 *
 * @param coefficient skin and test film together, ng/(kg s Pa); empty where not printed
 * @param skin skin mass transfer coefficient, low to high, µg/(s m2 Pa); empty where not printed
 * @param skinMean mean of the skin coefficient, µg/(s m2 Pa); empty where not printed
 * @param vapourPressureLowering factor on the saturation pressure at the surface, 0 to 1; empty
 *     where not printed
 */
public record TranspirationRow(
        Optional<Fact> coefficient,
        Optional<Fact> skin,
        OptionalDouble skinMean,
        OptionalDouble vapourPressureLowering) {}
