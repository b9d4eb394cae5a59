package org.wardon.keeping.chilling;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.ChillingExposure;
import org.wardon.produce.rows.ChillingFloor;

/**
 * Which lowest safe temperature counts for a lot.
 *
 * <p>The rule: the keeper's own floor, where there is one; else of the printed rows, those of the
 * lot's ripeness, else those that state none; rows of single cultivars only where there are no
 * others. Among them the highest printed figure counts, but not above the handbook's own storage
 * temperature unless a row gives it as its lower bound. Injury reported at the floor raises it.
 * Unknown ripeness is judged as green. A commodity without a row whose handbook temperature is 7 °C
 * or more is taken to chill below that temperature (assumption).
 */
final class Floors {
    private static final double TROPICAL_FROM_C = 7;
    private static final double AT_K = 0.25;
    private static final double NEAR_K = 3;
    private static final double INJURED_BELOW_K = 2;
    private static final String SAFE = "safe";
    private static final String BAND = "band";
    private static final double BAND_WIDTH_K = 10;
    private static final double BAND_ABOVE_K = 2;

    private Floors() {}

    /**
     * Returns the zone in which a lot is injured.
     *
     * @param commodity the commodity
     * @param ripeness how ripe the lot is
     * @param exposures injuries that may raise a floor
     * @return the zone; empty where it does not chill
     */
    static Optional<Zone> of(
            Commodity commodity, Ripeness ripeness, List<ChillingExposure> exposures) {
        List<ChillingFloor> rows = chosen(commodity, ripeness);
        LifeLevel handbook = LifeLevel.of(commodity);
        if (rows.isEmpty()) {
            boolean rated = commodity.keeping().floors().stream().anyMatch(row -> !row.rated());
            boolean tropical = handbook.atLowC() >= TROPICAL_FROM_C && !rated;
            return tropical
                    ? Optional.of(
                            new Zone(
                                    handbook.atLowC(),
                                    OptionalDouble.empty(),
                                    false,
                                    true,
                                    handbook.sourceId()))
                    : Optional.empty();
        }
        boolean band = rows.stream().anyMatch(row -> row.zone().equals(BAND));
        Zone zone = band ? band(rows, handbook.atHighC()) : floor(rows, handbook.atLowC());
        boolean own = rows.stream().anyMatch(row -> row.lowestSafeC().orElseThrow().own());
        return Optional.of(
                band || own
                        ? zone
                        : raised(zone, ofRipeness(exposures, ripeness), handbook.atHighC()));
    }

    /** Exposures of the lot's ripeness or of none stated. */
    private static List<ChillingExposure> ofRipeness(
            List<ChillingExposure> exposures, Ripeness ripeness) {
        String word = word(ripeness);
        return exposures.stream()
                .filter(row -> row.ripeness().equals(word) || row.ripeness().equals("not-stated"))
                .toList();
    }

    /**
     * Where injury is reported at the floor or a little above it, not of one variant alone and not
     * where somebody found none in colder and longer stays, the zone reaches two kelvins above it,
     * but not beyond the warm end of the handbook's condition.
     */
    private static Zone raised(Zone zone, List<ChillingExposure> exposures, double warmC) {
        double warmest =
                exposures.stream()
                        .filter(row -> !row.kind().equals(SAFE) && row.variant().isEmpty())
                        .filter(row -> !row.visible().equals("no"))
                        .filter(row -> near(zone, row) && !contradicted(row, exposures))
                        .mapToDouble(
                                row -> Math.min(DoseFit.temperatureC(row) + INJURED_BELOW_K, warmC))
                        .max()
                        .orElse(zone.topC());
        return new Zone(
                Math.max(zone.topC(), warmest),
                zone.bandLowC(),
                zone.bySkin(),
                zone.assumed(),
                zone.sourceId());
    }

    private static boolean near(Zone zone, ChillingExposure row) {
        double above = DoseFit.temperatureC(row) - zone.topC();
        return above >= -AT_K && above < NEAR_K;
    }

    private static boolean contradicted(ChillingExposure row, List<ChillingExposure> exposures) {
        return exposures.stream()
                .anyMatch(
                        other ->
                                other.kind().equals(SAFE)
                                        && other.variant().isEmpty()
                                        && other.temperatureC() <= row.temperatureC()
                                        && other.days().highest() >= row.days().highest());
    }

    /**
     * A band whose lower end nobody printed is ten kelvins wide, but ends two kelvins above a
     * handbook that advises to keep colder than it, as those printed do (assumption).
     */
    private static Zone band(List<ChillingFloor> rows, double keptAtC) {
        double top = rows.stream().mapToDouble(Floors::high).max().orElseThrow();
        OptionalDouble printed =
                rows.stream()
                        .filter(row -> row.bandLowC().isPresent())
                        .mapToDouble(row -> row.bandLowC().getAsDouble())
                        .min();
        double above = keptAtC + BAND_ABOVE_K;
        double widest = top - BAND_WIDTH_K;
        double low = printed.orElse(above < top - BAND_ABOVE_K ? Math.max(widest, above) : widest);
        return new Zone(top, OptionalDouble.of(low), skin(rows), false, rows.get(0).sourceId());
    }

    private static Zone floor(List<ChillingFloor> rows, double keptAtC) {
        double highest = rows.stream().mapToDouble(Floors::high).max().orElseThrow();
        double highestLow = rows.stream().mapToDouble(Floors::low).max().orElseThrow();
        double floor = Math.max(highestLow, Math.min(highest, keptAtC));
        return new Zone(floor, OptionalDouble.empty(), skin(rows), false, sourceOf(rows, floor));
    }

    private static String sourceOf(List<ChillingFloor> rows, double floor) {
        return rows.stream()
                .filter(row -> low(row) <= floor && floor <= high(row))
                .findFirst()
                .orElse(rows.get(0))
                .sourceId();
    }

    private static boolean skin(List<ChillingFloor> rows) {
        String tissue =
                rows.stream()
                        .map(ChillingFloor::tissue)
                        .filter(name -> !name.equals("not-stated"))
                        .findFirst()
                        .orElse("whole");
        return tissue.equals("skin") || tissue.equals("leaf");
    }

    private static List<ChillingFloor> chosen(Commodity commodity, Ripeness ripeness) {
        List<ChillingFloor> all = new ArrayList<>();
        for (ChillingFloor row : commodity.keeping().floors()) {
            if (row.rated() && row.lowestSafeC().isPresent() && !row.zone().isEmpty()) {
                all.add(row);
            }
        }
        List<ChillingFloor> own =
                all.stream().filter(row -> row.lowestSafeC().orElseThrow().own()).toList();
        if (!own.isEmpty()) {
            return own;
        }
        List<ChillingFloor> fitting =
                all.stream().filter(row -> row.ripeness().equals(word(ripeness))).toList();
        List<ChillingFloor> silent =
                all.stream().filter(row -> row.ripeness().equals("not-stated")).toList();
        List<ChillingFloor> pool = !fitting.isEmpty() ? fitting : silent.isEmpty() ? all : silent;
        List<ChillingFloor> general = pool.stream().filter(row -> row.variant().isEmpty()).toList();
        return general.isEmpty() ? pool : general;
    }

    /**
     * Returns how the tables call a ripeness for chilling.
     *
     * @param ripeness ripeness of the lot
     * @return word of the tables
     */
    static String word(Ripeness ripeness) {
        return ripeness == Ripeness.RIPE ? "ripe" : "mature-green";
    }

    private static double low(ChillingFloor row) {
        return row.lowestSafeC().orElseThrow().lowest();
    }

    private static double high(ChillingFloor row) {
        return row.lowestSafeC().orElseThrow().highest();
    }
}
