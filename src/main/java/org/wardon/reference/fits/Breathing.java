package org.wardon.reference.fits;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.apache.commons.math3.stat.regression.SimpleRegression;

/** How steeply crops breathe with temperature, by the two tables of carbon dioxide. */
final class Breathing {
    private static final int ENOUGH_TEMPERATURES = 3;
    private static final double WARMEST_C = 25;
    private static final double GAS = 8.314462618e-3;
    private static final double ZERO_C_IN_K = 273.15;

    private final Map<String, Double> slopes = new LinkedHashMap<>();
    private final double middle;

    Breathing(Path crops) {
        Map<String, List<Double>> found = new LinkedHashMap<>();
        for (String table : List.of("respiration.csv", "respiration-alt.csv")) {
            slopes(crops.resolve(table))
                    .forEach(
                            (crop, slope) ->
                                    found.computeIfAbsent(crop, id -> new ArrayList<>())
                                            .add(slope));
        }
        found.forEach(
                (crop, all) ->
                        slopes.put(crop, all.stream().mapToDouble(s -> s).average().orElseThrow()));
        middle = new Median().evaluate(slopes.values().stream().mapToDouble(s -> s).toArray());
    }

    private static Map<String, Double> slopes(Path table) {
        Map<String, SimpleRegression> lines = new LinkedHashMap<>();
        Map<String, Integer> temperatures = new HashMap<>();
        for (PrintedTable.Line row : PrintedTable.read(table)) {
            OptionalDouble low = row.number("mgCO2_kg_h_low");
            OptionalDouble high = row.number("mgCO2_kg_h_high");
            double atC = row.number("temp_C").orElse(Double.POSITIVE_INFINITY);
            if (low.isPresent() && high.isPresent() && low.getAsDouble() > 0 && atC <= WARMEST_C) {
                String crop = row.text("commodity_id");
                lines.computeIfAbsent(crop, id -> new SimpleRegression())
                        .addData(
                                -1 / (GAS * (atC + ZERO_C_IN_K)),
                                0.5 * Math.log(low.getAsDouble() * high.getAsDouble()));
                temperatures.merge(crop, 1, Integer::sum);
            }
        }
        Map<String, Double> slopes = new LinkedHashMap<>();
        lines.forEach(
                (crop, line) -> {
                    if (temperatures.getOrDefault(crop, 0) >= ENOUGH_TEMPERATURES) {
                        slopes.put(crop, line.getSlope());
                    }
                });
        return slopes;
    }

    /** Slope of a crop's breathing over that of the middle crop, kJ/mol; 0 where not printed. */
    double overMiddleKJMol(String crop) {
        Double slope = slopes.get(crop);
        return slope == null ? 0 : slope - middle;
    }
}
