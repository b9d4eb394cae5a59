package org.wardon.reference.fits;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.pooling.Deviations;
import org.wardon.keeping.pooling.LifePoint;

/**
 * Leaves out every source of a crop once, fits again without it and asks whether the range of the
 * rest, 10 to 90 of 100 draws, covers the lives it published. The handbook's own condition anchors
 * every curve and is no source to leave out.
 */
final class LeaveOneSource {
    private static final int DRAWS = 256;

    private final LifeRows used;
    private final Deviations deviations;
    private final List<Draw> draws = Draws.seeded(1, DRAWS);

    LeaveOneSource(LifeRows used, Deviations deviations) {
        this.used = used;
        this.deviations = deviations;
    }

    /**
     * One published life and the range that knew nothing of its source.
     *
     * @param row the row
     * @param repeats whether it only repeats the handbook's condition, which anchors the range
     * @param p10 short case, days
     * @param p50 middle, days
     * @param p90 long case, days
     */
    record Covered(UsedRow row, boolean repeats, double p10, double p50, double p90) {
        /** Whether the range and the published figure agree; a bound agrees from its side on. */
        boolean agrees() {
            double days = Math.exp(row.known().lnDays());
            return switch (row.known().kind()) {
                case EXACT -> p10 <= days && days <= p90;
                case AT_LEAST -> days <= p90;
                case AT_MOST -> days >= p10;
            };
        }

        double widthUp() {
            return p90 / p50;
        }

        double widthDown() {
            return p50 / p10;
        }
    }

    List<Covered> list() {
        List<Covered> all = new ArrayList<>();
        for (Crop crop : used.crops()) {
            LifeLevel handbook = crop.handbook().orElse(null);
            if (handbook == null) {
                continue;
            }
            List<UsedRow> own =
                    used.rows().stream()
                            .filter(row -> row.table().equals("life-temperature"))
                            .filter(row -> scored(row, crop, handbook))
                            .toList();
            own.stream()
                    .map(row -> row.known().of().source())
                    .distinct()
                    .forEach(source -> leaveOut(crop, source, own, all));
        }
        return all;
    }

    /** Lives, and bounds by the trial's end; what something else ended bounds nothing published. */
    private static boolean scored(UsedRow row, Crop crop, LifeLevel handbook) {
        if (row.point().isEmpty() || !row.known().of().crop().equals(crop.id())) {
            return false;
        }
        LifePoint point = row.known();
        boolean itself = point.of().source().equals(handbook.sourceId());
        return !itself && (row.isLife() || row.use().equals(row.printedBound()));
    }

    private void leaveOut(Crop crop, String source, List<UsedRow> own, List<Covered> all) {
        List<UsedRow> rest =
                used.rows().stream().filter(row -> !isFrom(row, crop, source)).toList();
        LifeFits fits = new LifeFits(rest, deviations);
        LifeCurve curve = LifeCurve.of(crop.commodity().orElseThrow(), fits.curve(crop, ""));
        for (UsedRow row : own) {
            if (row.known().of().source().equals(source)) {
                double atC = row.known().temperatureC();
                double[] days =
                        draws.stream()
                                .mapToDouble(draw -> curve.at(draw).lifeDays(atC))
                                .sorted()
                                .toArray();
                boolean repeats = crop.handbook().map(h -> row.repeats(crop, h)).orElse(false);
                all.add(new Covered(row, repeats, at(days, 0.1), at(days, 0.5), at(days, 0.9)));
            }
        }
    }

    private static boolean isFrom(UsedRow row, Crop crop, String source) {
        return row.point().isPresent()
                && row.known().of().crop().equals(crop.id())
                && row.known().of().source().equals(source);
    }

    private static double at(double[] sorted, double share) {
        return sorted[(int) Math.round(share * (sorted.length - 1))];
    }

    static double median(List<Double> values) {
        double[] sorted = values.stream().mapToDouble(v -> v).toArray();
        Arrays.sort(sorted);
        return at(sorted, 0.5);
    }
}
