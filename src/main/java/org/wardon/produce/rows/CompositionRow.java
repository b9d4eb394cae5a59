package org.wardon.produce.rows;

import java.util.OptionalDouble;
import org.wardon.produce.Evidence;

/**
 * What the tissue is made of.
 *
 * @param waterPct water, percent of mass
 * @param proteinPct protein, percent
 * @param fatPct fat, percent
 * @param carbohydratePct carbohydrate with fibre, percent
 * @param fibrePct fibre, percent
 * @param ashPct ash, percent
 * @param initialFreezingC initial freezing point, °C
 * @param sourceId source
 * @param evidence how it reached us
 */
public record CompositionRow(
        double waterPct,
        double proteinPct,
        double fatPct,
        double carbohydratePct,
        OptionalDouble fibrePct,
        double ashPct,
        OptionalDouble initialFreezingC,
        String sourceId,
        Evidence evidence) {}
