package org.wardon.keeping.life;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.LifeRow;

/**
 * Slope of a commodity's own published lives over temperature, drawn toward that of all crops.
 *
 * <p>Within each source and variant the logarithm of life is regressed on 1/(R T) with a level of
 * its own; the slope has a normal prior. Source of the prior: slopes published for fresh produce,
 * median 68 kJ/mol, middle half 55 to 81 (collected in the table of fitted and published rates).
 * Source of the model: Arrhenius form as in Tijskens and Polderdijk 1996 (id
 * tijskens-polderdijk-1996).
 *
 * @param kilojoulePerMol slope, kJ/mol
 * @param deviation its standard deviation, kJ/mol
 * @param lowestC lowest published temperature used, °C
 * @param highestC highest published temperature used, °C
 * @param ownWeight weight of the commodity's own figures in the slope, 0 to 1
 * @param temperatures number of different temperatures used
 * @param sourceIds sources used
 */
public record OwnSlope(
        double kilojoulePerMol,
        double deviation,
        double lowestC,
        double highestC,
        double ownWeight,
        int temperatures,
        List<String> sourceIds) {
    /** Slope of all crops, kJ/mol. */
    public static final double COMMON_KJ_MOL = 68;

    /** Gas constant, kJ/(mol K). */
    static final double GAS = 8.314462618e-3;

    private static final double ZERO_C_IN_K = 273.15;

    /** Middle half 55 to 81 kJ/mol of a normal distribution: half width over 0.6745. */
    private static final double COMMON_DEVIATION = 13 / 0.6745;

    /** Left-out temperatures of the same source are predicted within about a quarter. */
    private static final double WITHIN_SOURCE = 0.25;

    private static final Set<String> USABLE = Set.of("senescence", "ripening", "not-stated");

    /** Copies the list. */
    public OwnSlope {
        sourceIds = List.copyOf(sourceIds);
    }

    /**
     * Returns the slope of a commodity.
     *
     * @param commodity the commodity
     * @param aboveC rows below this temperature lie in the chilling zone and are left out, °C
     * @return a slope; own weight 0 where no source gives two temperatures
     */
    public static OwnSlope of(Commodity commodity, double aboveC) {
        Map<String, List<LifeRow>> trials = new TreeMap<>();
        for (LifeRow row : commodity.keeping().lives()) {
            if (usable(row, aboveC)) {
                String trial =
                        row.lifeDays().sourceId() + '|' + row.variant() + '|' + row.ripeness();
                trials.computeIfAbsent(trial, key -> new ArrayList<>()).add(row);
            }
        }
        trials.values().removeIf(rows -> temperatures(rows).size() < 2);
        return fitted(trials.values().stream().toList());
    }

    private static boolean usable(LifeRow row, double aboveC) {
        return row.temperatureC().isPresent()
                && row.temperatureC().getAsDouble() >= aboveC
                && USABLE.contains(row.endedBy())
                && row.bound().equals("exact");
    }

    private static Set<Double> temperatures(List<LifeRow> rows) {
        Set<Double> different = new TreeSet<>();
        for (LifeRow row : rows) {
            different.add(row.temperatureC().getAsDouble());
        }
        return different;
    }

    private static OwnSlope fitted(List<List<LifeRow>> trials) {
        double sxx = 0;
        double sxy = 0;
        Set<Double> temperatures = new TreeSet<>();
        Set<String> sources = new TreeSet<>();
        for (List<LifeRow> rows : trials) {
            double meanX = rows.stream().mapToDouble(OwnSlope::x).average().orElse(0);
            double meanY = rows.stream().mapToDouble(OwnSlope::lnLife).average().orElse(0);
            for (LifeRow row : rows) {
                sxx += (x(row) - meanX) * (x(row) - meanX);
                sxy += (x(row) - meanX) * (lnLife(row) - meanY);
                sources.add(row.lifeDays().sourceId());
            }
            temperatures.addAll(temperatures(rows));
        }
        double own = sxx / (WITHIN_SOURCE * WITHIN_SOURCE);
        double prior = 1 / (COMMON_DEVIATION * COMMON_DEVIATION);
        double slope =
                (sxy / (WITHIN_SOURCE * WITHIN_SOURCE) + prior * COMMON_KJ_MOL) / (own + prior);
        return new OwnSlope(
                slope,
                1 / Math.sqrt(own + prior),
                temperatures.stream().mapToDouble(t -> t).min().orElse(Double.NaN),
                temperatures.stream().mapToDouble(t -> t).max().orElse(Double.NaN),
                own / (own + prior),
                temperatures.size(),
                List.copyOf(sources));
    }

    private static double x(LifeRow row) {
        return 1 / (GAS * (row.temperatureC().getAsDouble() + ZERO_C_IN_K));
    }

    private static double lnLife(LifeRow row) {
        return Math.log(Math.sqrt(row.lifeDays().lowest() * row.lifeDays().highest()));
    }

    /**
     * Returns the logarithm of the rate of ageing at a slope, up to a constant.
     *
     * @param temperatureC temperature, °C
     * @param kilojoulePerMol slope, kJ/mol
     * @return rising with temperature
     */
    static double lnRate(double temperatureC, double kilojoulePerMol) {
        return -kilojoulePerMol / (GAS * (temperatureC + ZERO_C_IN_K));
    }
}
