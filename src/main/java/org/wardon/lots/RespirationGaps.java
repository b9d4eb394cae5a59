package org.wardon.lots;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.RespirationRow;

/**
 * Fills the temperatures that the chosen table of respiration lacks from other sources.
 *
 * <p>Rule, with its reasons in decision 1 (src/site/markdown/decisions): a row of another source
 * fills a temperature that the chosen table does not print if it was seen, both speak of the same
 * single state, and
 *
 * <ol>
 *   <li>its source agrees with the chosen table: at least one of its rows of that state lies within
 *       the chosen temperatures, and each that does, seen or not, meets the chosen range there, but
 *       for rounding;
 *   <li>its range lies between those of the next colder and the next warmer temperature; beyond the
 *       ends, not above the first and not below the last.
 * </ol>
 *
 * <p>Rows of several sources at one temperature count as one range. Where a row fails, the chosen
 * table stands alone there and the source is named among the refused.
 */
final class RespirationGaps {
    /** Most sources print whole mg CO2/(kg h): half of one, with 10.7 J per mg. */
    private static final double ROUNDING_W_PER_T = 0.5 * 10.7 / 3.6;

    /** Rates by temperature in °C, W/t. */
    private final NavigableMap<Double, Fact> rates = new TreeMap<>();

    private final NavigableMap<Double, Fact> filling = new TreeMap<>();
    private final Set<String> refused = new LinkedHashSet<>();

    private RespirationGaps(List<RespirationRow> chosen) {
        chosen.forEach(row -> merge(rates, row));
    }

    /** The chosen rows alone; several states at one temperature count as one range. */
    static RespirationGaps leftOpen(List<RespirationRow> chosen) {
        return new RespirationGaps(chosen);
    }

    /** The chosen rows, and of all rows those that fill their gaps. */
    static RespirationGaps filled(List<RespirationRow> chosen, List<RespirationRow> all) {
        RespirationGaps gaps = new RespirationGaps(chosen);
        String state = chosen.get(0).state();
        if (chosen.stream().allMatch(row -> row.state().equals(state))) {
            String own = tableOf(chosen.get(0));
            Map<String, List<RespirationRow>> others =
                    all.stream()
                            .filter(row -> row.state().equals(state))
                            .filter(row -> !tableOf(row).equals(own))
                            .collect(
                                    Collectors.groupingBy(
                                            row -> row.wattsPerTonne().sourceId(),
                                            LinkedHashMap::new,
                                            Collectors.toList()));
            gaps.consider(others.values());
        }
        return gaps;
    }

    /** A table and the source it quotes: what was printed together. */
    static String tableOf(RespirationRow row) {
        return row.table() + " " + row.wattsPerTonne().sourceId();
    }

    /** Rates by temperature in °C, W/t. */
    NavigableMap<Double, Fact> rates() {
        return rates;
    }

    /** Those of the rates that other sources gave. */
    NavigableMap<Double, Fact> filling() {
        return filling;
    }

    /** Whether a row is one of those that other sources gave. */
    boolean filledBy(RespirationRow row) {
        Fact filled = filling.get(row.temperatureC());
        Fact rate = row.wattsPerTonne();
        return filled != null
                && rate.evidence() == Evidence.SEEN
                && filled.sourceId().equals(rate.sourceId())
                && filled.lowest() <= rate.lowest()
                && filled.highest() >= rate.highest();
    }

    /** Sources with a seen rate at a temperature that stayed open because they disagree. */
    Set<String> refused() {
        return refused;
    }

    private void consider(Iterable<List<RespirationRow>> sources) {
        RespirationCurve low = RespirationCurve.through(rates, 0);
        RespirationCurve high = low.withShare(1);
        for (List<RespirationRow> source : sources) {
            boolean agrees = agrees(source, low, high);
            for (RespirationRow row : source) {
                boolean seen = row.wattsPerTonne().evidence() == Evidence.SEEN;
                if (seen && !rates.containsKey(row.temperatureC())) {
                    if (agrees) {
                        merge(filling, row);
                    } else {
                        refused.add(row.wattsPerTonne().sourceId());
                    }
                }
            }
        }
        filling.entrySet().removeIf(offer -> !takes(offer.getKey(), offer.getValue()));
    }

    private boolean agrees(
            List<RespirationRow> source, RespirationCurve low, RespirationCurve high) {
        List<RespirationRow> shared =
                source.stream()
                        .filter(row -> row.temperatureC() >= rates.firstKey())
                        .filter(row -> row.temperatureC() <= rates.lastKey())
                        .toList();
        return !shared.isEmpty() && shared.stream().allMatch(row -> meets(row, low, high));
    }

    private static boolean meets(RespirationRow row, RespirationCurve low, RespirationCurve high) {
        double c = row.temperatureC();
        Fact other = row.wattsPerTonne();
        return other.highest() >= 1000 * low.wattsPerKg(c) - ROUNDING_W_PER_T
                && other.lowest() <= 1000 * high.wattsPerKg(c) + ROUNDING_W_PER_T;
    }

    private boolean takes(double temperatureC, Fact offer) {
        Map.@Nullable Entry<Double, Fact> colder = rates.lowerEntry(temperatureC);
        Map.@Nullable Entry<Double, Fact> warmer = rates.higherEntry(temperatureC);
        boolean fits =
                liesBetween(offer, colder, warmer, Fact::lowest)
                        && liesBetween(offer, colder, warmer, Fact::highest);
        if (fits) {
            rates.put(temperatureC, offer);
        } else {
            refused.add(offer.sourceId());
        }
        return fits;
    }

    private static boolean liesBetween(
            Fact offer,
            Map.@Nullable Entry<Double, Fact> colder,
            Map.@Nullable Entry<Double, Fact> warmer,
            ToDoubleFunction<Fact> bound) {
        double rate = bound.applyAsDouble(offer);
        double below = colder == null ? 0 : bound.applyAsDouble(colder.getValue());
        double above =
                warmer == null ? Double.POSITIVE_INFINITY : bound.applyAsDouble(warmer.getValue());
        return rate >= Math.min(below, above) && rate <= Math.max(below, above);
    }

    private static void merge(Map<Double, Fact> rates, RespirationRow row) {
        rates.merge(row.temperatureC(), row.wattsPerTonne(), RespirationGaps::both);
    }

    private static Fact both(Fact one, Fact other) {
        return new Fact(
                OptionalDouble.of(Math.min(one.lowest(), other.lowest())),
                OptionalDouble.of(Math.max(one.highest(), other.highest())),
                one.unit(),
                one.sourceId(),
                one.evidence(),
                one.own() || other.own());
    }
}
