package org.wardon.lots;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.wardon.errors.Require;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.Ripeness;

/**
 * Medians over the plant parts, for figures nobody printed.
 *
 * <p>Each figure is the median over those commodities of the part that have it of their own. A part
 * without any takes the figure of a kindred part (herbs that of leafy vegetables), else the median
 * over all commodities. All of it is (assumption): that a crop is like others of its part.
 */
public final class ClassValues {
    /** Source named where a class value stands in. */
    static final String SOURCE = "assumption";

    private static final Map<String, String> KINDRED = Map.of("herb", "leafy");
    private static final double[] RESPIRATION_C = {0, 5, 10, 15, 20, 25, 30};

    private final Map<String, StandIn> byPart;
    private final StandIn all;

    private ClassValues(Map<String, StandIn> byPart, StandIn all) {
        this.byPart = Map.copyOf(byPart);
        this.all = all;
    }

    /**
     * Returns the medians over commodities.
     *
     * @param commodities all commodities of the tables; at least one of them with a composition, a
     *     size, a respiration rate and a transpiration coefficient
     * @return the class values
     */
    public static ClassValues of(Collection<Commodity> commodities) {
        Require.that(!commodities.isEmpty(), "class values need at least one commodity");
        Map<String, List<Commodity>> parts =
                commodities.stream().collect(Collectors.groupingBy(Commodity::plantPart));
        Map<String, StandIn> byPart = new HashMap<>();
        for (String part : parts.keySet()) {
            byPart.put(
                    part, over(List.of(members(parts, part), kindred(parts, part), commodities)));
        }
        return new ClassValues(byPart, over(List.of(commodities)));
    }

    private static Collection<Commodity> members(Map<String, List<Commodity>> parts, String part) {
        return parts.getOrDefault(part, List.of());
    }

    private static Collection<Commodity> kindred(Map<String, List<Commodity>> parts, String part) {
        return members(parts, KINDRED.getOrDefault(part, part));
    }

    /** The values of a plant part; those of all commodities where the part is unknown. */
    StandIn of(String plantPart) {
        return byPart.getOrDefault(plantPart, all);
    }

    /** Takes each figure from the first group that has it. */
    private static StandIn over(List<Collection<Commodity>> groups) {
        return new StandIn(
                first(groups, ClassValues::medianHeat, "composition"),
                first(groups, ClassValues::medianSize, "size"),
                first(groups, ClassValues::medianRespiration, "respiration rate"),
                first(groups, ClassValues::medianTranspiration, "transpiration coefficient"));
    }

    private static <T> T first(
            List<Collection<Commodity>> groups,
            Function<Collection<Commodity>, Optional<T>> figure,
            String what) {
        return groups.stream()
                .map(figure)
                .flatMap(Optional::stream)
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no commodity has a " + what));
    }

    private static Optional<ItemHeat> medianHeat(Collection<Commodity> group) {
        List<ItemHeat> own = group.stream().map(Items::ownHeat).flatMap(Optional::stream).toList();
        return own.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        new ItemHeat(
                                median(own, ItemHeat::densityKgM3),
                                median(own, ItemHeat::specificHeatJkgK),
                                median(own, ItemHeat::conductivityWmK)));
    }

    /** The commonest shape, and the median radius of that shape. */
    private static Optional<ItemSize> medianSize(Collection<Commodity> group) {
        Map<Shape, List<ItemSize>> own =
                group.stream()
                        .map(Items::printedSize)
                        .flatMap(Optional::stream)
                        .collect(
                                Collectors.groupingBy(
                                        ItemSize::shape, TreeMap::new, Collectors.toList()));
        return own.values().stream()
                .reduce((one, other) -> other.size() > one.size() ? other : one)
                .map(sizes -> new ItemSize(sizes.get(0).shape(), median(sizes, ItemSize::radiusM)));
    }

    private static Optional<Map<Double, Fact>> medianRespiration(Collection<Commodity> group) {
        List<RespirationCurve> own =
                group.stream()
                        .map(commodity -> Respirations.own(commodity, Ripeness.UNKNOWN, 0.5))
                        .flatMap(Optional::stream)
                        .map(WithReasons::value)
                        .toList();
        if (own.isEmpty()) {
            return Optional.empty();
        }
        Map<Double, Fact> rates = new TreeMap<>();
        for (double c : RESPIRATION_C) {
            double middle = median(own, curve -> 1000 * curve.wattsPerKg(c));
            rates.put(
                    c,
                    Fact.range(
                            middle / Respirations.CLASS_SPREAD,
                            middle * Respirations.CLASS_SPREAD,
                            "W/t",
                            SOURCE,
                            Evidence.ASSUMPTION));
        }
        return Optional.of(rates);
    }

    private static Optional<Double> medianTranspiration(Collection<Commodity> group) {
        List<Double> own =
                group.stream().map(Transpirations::ownMiddle).flatMap(Optional::stream).toList();
        return own.isEmpty() ? Optional.empty() : Optional.of(median(own, Double::doubleValue));
    }

    private static <T> double median(List<T> values, ToDoubleFunction<T> figure) {
        return new Median().evaluate(values.stream().mapToDouble(figure).toArray());
    }
}
