package org.wardon.reference.fits;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.wardon.keeping.life.GenericCurve;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.life.OwnSlope;
import org.wardon.keeping.pooling.Deviations;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.keeping.pooling.LifePoint.Trial;

/**
 * Leaves out every temperature of every trial that tried several, once, fits again without it and
 * asks the rest. Fitted and generic curve alike are anchored at the nearest temperature left of the
 * same trial; the deviations are those of all rows.
 */
final class LeaveOneTemperature {
    private static final GenericCurve GENERIC = new GenericCurve(1);
    private static final double CHILLS_FROM_C = 3;

    private final LifeRows used;
    private final Deviations deviations;

    LeaveOneTemperature(LifeRows used, Deviations deviations) {
        this.used = used;
        this.deviations = deviations;
    }

    List<LeftOut> list() {
        List<LeftOut> all = new ArrayList<>();
        trials().forEach((trial, rows) -> leaveOut(trial, rows, all));
        return all;
    }

    private Map<Trial, List<UsedRow>> trials() {
        Map<Trial, List<UsedRow>> trials = new LinkedHashMap<>();
        for (UsedRow row : used.rows()) {
            if (row.isLife()) {
                trials.computeIfAbsent(row.known().of(), trial -> new ArrayList<>()).add(row);
            }
        }
        trials.values().removeIf(rows -> temperatures(rows).size() < 2);
        return trials;
    }

    private static List<Double> temperatures(List<UsedRow> rows) {
        return rows.stream().map(row -> row.known().temperatureC()).distinct().sorted().toList();
    }

    private void leaveOut(Trial trial, List<UsedRow> rows, List<LeftOut> all) {
        Crop crop =
                used.crops().stream()
                        .filter(c -> c.id().equals(trial.crop()))
                        .findFirst()
                        .orElseThrow();
        List<Double> temperatures = temperatures(rows);
        for (double atC : temperatures) {
            List<UsedRow> left =
                    rows.stream().filter(row -> row.known().temperatureC() == atC).toList();
            List<UsedRow> rest = rows.stream().filter(row -> !left.contains(row)).toList();
            LifeFits fits =
                    new LifeFits(
                            used.rows().stream().filter(row -> !left.contains(row)).toList(),
                            deviations);
            ToDoubleFunction<LifePoint> fitted = fitted(fits, crop, left.get(0).variant(), rest);
            boolean interior =
                    atC > temperatures.get(0) && atC < temperatures.get(temperatures.size() - 1);
            for (UsedRow row : left) {
                all.add(
                        new LeftOut(
                                row,
                                interior,
                                chills(crop),
                                predicted(row, nearest(rest, atC), fitted),
                                predicted(row, nearest(rest, atC), LeaveOneTemperature::generic),
                                predicted(row, coldest(rest), LeaveOneTemperature::generic)));
            }
        }
    }

    private static boolean chills(Crop crop) {
        return crop.chills("not-stated", CHILLS_FROM_C);
    }

    private static List<UsedRow> nearest(List<UsedRow> rest, double atC) {
        return rest.stream()
                .min(Comparator.comparingDouble(row -> Math.abs(row.known().temperatureC() - atC)))
                .stream()
                .toList();
    }

    private static List<UsedRow> coldest(List<UsedRow> rest) {
        return rest.stream()
                .min(Comparator.comparingDouble(row -> row.known().temperatureC()))
                .stream()
                .toList();
    }

    private static double predicted(
            UsedRow row, List<UsedRow> rest, ToDoubleFunction<LifePoint> lnRate) {
        double level =
                rest.stream()
                        .map(UsedRow::known)
                        .mapToDouble(point -> point.lnDays() + lnRate.applyAsDouble(point))
                        .average()
                        .orElseThrow();
        return level - lnRate.applyAsDouble(row.known());
    }

    private static double generic(LifePoint point) {
        return GENERIC.lnRate(point.temperatureC());
    }

    /** The shape the program uses: fitted up to the highest published temperature, then generic. */
    private static ToDoubleFunction<LifePoint> fitted(
            LifeFits fits, Crop crop, String variant, List<UsedRow> rest) {
        double slope = fits.curve(crop, variant).slopeKJMol();
        OptionalDouble spanned = fits.curve(crop, "").highestC();
        double published =
                crop.handbook().map(LifeLevel::atHighC).orElse(rest.get(0).known().temperatureC());
        double highestC = Math.max(published, spanned.orElse(published));
        return point -> {
            double atC = point.temperatureC();
            return OwnSlope.lnRate(Math.min(atC, highestC), slope)
                    + GENERIC.lnRate(Math.max(atC, highestC))
                    - GENERIC.lnRate(highestC);
        };
    }
}
