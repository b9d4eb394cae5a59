package org.wardon.produce.rows;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The fitted curve of life over temperature of a commodity or of a variant of it.
 *
 * @param variant variant as the sources name it, empty for the commodity as a whole
 * @param slopeKJMol slope of ageing, kJ/mol
 * @param slopeDeviationKJMol its standard deviation, kJ/mol
 * @param ownWeight weight of the commodity's own figures in the slope, 0 to 1
 * @param lowestC lowest temperature of trials at several temperatures, °C; empty where there is
 *     none
 * @param highestC highest of them, °C
 * @param temperatures number of their temperatures
 * @param shortestDays shortest life another source gives in the handbook's condition, days
 * @param longestDays longest, days
 * @param betweenSources standard deviation of ln life of one source over another's
 * @param betweenCrops standard deviation of slopes between crops, share of the slope
 * @param sourceIds sources of its points
 */
public record LifeCurveRow(
        String variant,
        double slopeKJMol,
        double slopeDeviationKJMol,
        double ownWeight,
        OptionalDouble lowestC,
        OptionalDouble highestC,
        int temperatures,
        OptionalDouble shortestDays,
        OptionalDouble longestDays,
        double betweenSources,
        double betweenCrops,
        List<String> sourceIds) {
    /** Copies the list. */
    public LifeCurveRow {
        sourceIds = List.copyOf(sourceIds);
    }
}
