package org.wardon.keeping.life;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.LifeCurveRow;

/**
 * Slope of a commodity's ageing over temperature, from the fitted curves of the tables.
 *
 * <p>Source of the form: Arrhenius, as in Tijskens and Polderdijk 1996 (id
 * tijskens-polderdijk-1996).
 *
 * @param kilojoulePerMol slope, kJ/mol
 * @param deviation its standard deviation, kJ/mol
 * @param lowestC lowest temperature of trials at several temperatures, °C; empty where there is
 *     none
 * @param highestC highest of them, °C
 * @param ownWeight weight of the commodity's own figures in the slope, 0 to 1
 * @param temperatures number of different temperatures used
 * @param betweenCrops standard deviation of slopes between crops, share of the slope
 * @param sourceIds sources used
 */
public record OwnSlope(
        double kilojoulePerMol,
        double deviation,
        OptionalDouble lowestC,
        OptionalDouble highestC,
        double ownWeight,
        int temperatures,
        double betweenCrops,
        List<String> sourceIds) {
    /**
     * A commodity no fit was made for: slopes published for fresh produce, median 68 kJ/mol, middle
     * half 55 to 81, which is 13 over 0.6745.
     */
    static final OwnSlope COMMON =
            new OwnSlope(
                    68,
                    13 / 0.6745,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    0,
                    0,
                    13 / 0.6745 / 68,
                    List.of());

    /** Gas constant, kJ/(mol K). */
    private static final double GAS = 8.314462618e-3;

    private static final double ZERO_C_IN_K = 273.15;

    /** Copies the list. */
    public OwnSlope {
        sourceIds = List.copyOf(sourceIds);
    }

    /**
     * Returns the fitted curve of a commodity as a whole.
     *
     * @param commodity the commodity
     * @return the row; empty where no fit was made for it
     */
    static Optional<LifeCurveRow> row(Commodity commodity) {
        return commodity.keeping().curves().stream()
                .filter(row -> row.variant().isEmpty())
                .findFirst();
    }

    /**
     * Returns the slope a fitted curve has.
     *
     * @param row the curve
     * @return its slope
     */
    public static OwnSlope of(LifeCurveRow row) {
        return new OwnSlope(
                row.slopeKJMol(),
                row.slopeDeviationKJMol(),
                row.lowestC(),
                row.highestC(),
                row.ownWeight(),
                row.temperatures(),
                row.betweenCrops(),
                row.sourceIds());
    }

    /**
     * Returns the logarithm of the rate of ageing at a slope, up to a constant.
     *
     * @param temperatureC temperature, °C
     * @param kilojoulePerMol slope, kJ/mol
     * @return rising with temperature
     */
    public static double lnRate(double temperatureC, double kilojoulePerMol) {
        return -kilojoulePerMol / (GAS * (temperatureC + ZERO_C_IN_K));
    }
}
