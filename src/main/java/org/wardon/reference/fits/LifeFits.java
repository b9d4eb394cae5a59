package org.wardon.reference.fits;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.life.OwnSlope;
import org.wardon.keeping.pooling.Deviations;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.keeping.pooling.LifePoint.Trial;
import org.wardon.keeping.pooling.PooledLives;
import org.wardon.produce.rows.LifeCurveRow;

/** The curve of every crop and variant, drawn from one pooled fit of all used rows. */
final class LifeFits {
    /** How near another source's temperature must lie to the handbook's condition, K. */
    private static final double SAME_CONDITION_K = 2;

    private static final String NOBODY = "none";

    private final List<UsedRow> rows;
    private final Deviations deviations;
    private final PooledLives pooled;

    LifeFits(List<UsedRow> rows, Deviations deviations) {
        this.rows = rows.stream().filter(row -> row.point().isPresent()).toList();
        this.deviations = deviations;
        pooled = new PooledLives(this.rows.stream().map(UsedRow::known).toList(), deviations);
    }

    PooledLives pooled() {
        return pooled;
    }

    List<UsedRow> rows() {
        return rows;
    }

    /** The curve of a crop as a whole, with the variants that have lives of their own after it. */
    List<LifeCurveRow> curves(Crop crop) {
        List<LifeCurveRow> curves = new ArrayList<>(List.of(curve(crop, "")));
        of(crop).stream()
                .filter(row -> !row.variant().isEmpty() && !row.known().of().relative())
                .map(UsedRow::variant)
                .distinct()
                .forEach(variant -> curves.add(curve(crop, variant)));
        return curves;
    }

    /** The rows of a crop. */
    List<UsedRow> of(Crop crop) {
        return rows.stream().filter(row -> row.known().of().crop().equals(crop.id())).toList();
    }

    /** The rows of a crop or of one variant of it. */
    List<UsedRow> of(Crop crop, String variant) {
        return of(crop).stream()
                .filter(row -> variant.isEmpty() || row.variant().equals(variant))
                .toList();
    }

    LifeCurveRow curve(Crop crop, String variant) {
        Trial trial = crop.trial(variant, NOBODY, false);
        List<UsedRow> own = of(crop, variant);
        Set<Double> temperatures = spanned(own);
        double slope = pooled.slopeKJMol(trial);
        double deviation = pooled.slopeDeviationKJMol(trial);
        List<Double> others = inHandbooksCondition(crop, variant, slope);
        return new LifeCurveRow(
                variant,
                slope,
                deviation,
                ownWeight(crop, deviation),
                temperatures.stream().mapToDouble(t -> t).min(),
                temperatures.stream().mapToDouble(t -> t).max(),
                temperatures.size(),
                others.stream().mapToDouble(d -> d).min(),
                others.stream().mapToDouble(d -> d).max(),
                deviations.betweenTwoSources(),
                deviations.betweenCropsShare(),
                own.stream().map(row -> row.known().of().source()).distinct().sorted().toList());
    }

    private double ownWeight(Crop crop, double deviation) {
        Trial kin = new Trial(NOBODY, NOBODY, NOBODY, crop.part(), crop.respirationKJMol(), false);
        double ofKin = pooled.slopeDeviationKJMol(kin);
        return Math.max(0, 1 - deviation * deviation / (ofKin * ofKin));
    }

    /** Temperatures of trials that tried several. */
    private static Set<Double> spanned(List<UsedRow> rows) {
        Map<Trial, Set<Double>> trials = new LinkedHashMap<>();
        for (UsedRow row : rows) {
            if (row.known().exact()) {
                trials.computeIfAbsent(row.known().of(), trial -> new TreeSet<>())
                        .add(row.known().temperatureC());
            }
        }
        return trials.values().stream()
                .filter(temperatures -> temperatures.size() > 1)
                .flatMap(Set::stream)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    /** Ends of the lives other sources give there, brought to its warm end, days. */
    private List<Double> inHandbooksCondition(Crop crop, String variant, double slope) {
        LifeLevel handbook = crop.handbook().orElse(null);
        List<Double> days = new ArrayList<>();
        if (handbook == null) {
            return days;
        }
        for (UsedRow row : of(crop)) {
            double atC = row.known().temperatureC();
            boolean near =
                    atC >= handbook.atLowC() - SAME_CONDITION_K
                            && atC <= handbook.atHighC() + SAME_CONDITION_K;
            boolean other = !row.known().of().source().equals(handbook.sourceId());
            if (near && other && row.isLife() && row.variant().equals(variant)) {
                double factor =
                        Math.exp(
                                OwnSlope.lnRate(atC, slope)
                                        - OwnSlope.lnRate(handbook.atHighC(), slope));
                days.add(row.lowDays() * factor);
                days.add(row.highDays() * factor);
            }
        }
        return days;
    }

    /** Residuals of the lives of a crop or variant, ln. */
    OptionalDouble[] residuals(Crop crop, String variant) {
        double[] fitted = pooled.fittedLnDays();
        double squares = 0;
        double largest = 0;
        int count = 0;
        for (int i = 0; i < rows.size(); i++) {
            LifePoint point = rows.get(i).known();
            boolean own = point.of().crop().equals(crop.id()) && point.exact();
            if (own && (variant.isEmpty() || rows.get(i).variant().equals(variant))) {
                double off = point.lnDays() - fitted[i];
                squares += off * off;
                largest = Math.max(largest, Math.abs(off));
                count++;
            }
        }
        return count == 0
                ? new OptionalDouble[] {OptionalDouble.empty(), OptionalDouble.empty()}
                : new OptionalDouble[] {
                    OptionalDouble.of(Math.sqrt(squares / count)), OptionalDouble.of(largest)
                };
    }
}
