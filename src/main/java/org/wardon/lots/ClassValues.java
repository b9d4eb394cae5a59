package org.wardon.lots;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.wardon.errors.Require;
import org.wardon.lots.StandIn.Figure;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.Ripeness;

/**
 * Medians over kindred commodities, for figures nobody printed.
 *
 * <p>Each figure is the median over those that have it of their own: first over commodities of the
 * same plant part and scientific name, else over the plant part, else over a kindred part (leafy
 * vegetables for herbs), else over all commodities. All of it is (assumption): that a crop is like
 * its kin.
 */
public final class ClassValues {
    /** Source named where a class value stands in. */
    static final String SOURCE = "assumption";

    private static final String ALL = "all";
    private static final Map<String, String> KINDRED = Map.of("herb", "leafy");
    private static final double[] RESPIRATION_C = {0, 5, 10, 15, 20, 25, 30};

    /** Commodities that share something, and its name. */
    private record Group(String name, List<Commodity> members) {}

    private final Map<String, StandIn> byId;
    private final Map<String, StandIn> byPart;
    private final StandIn all;

    private ClassValues(Map<String, StandIn> byId, Map<String, StandIn> byPart, StandIn all) {
        this.byId = Map.copyOf(byId);
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
        Group all = new Group(ALL, List.copyOf(commodities));
        Map<String, StandIn> bySpecies = new HashMap<>();
        Map<String, StandIn> byPart = new HashMap<>();
        Map<String, StandIn> byId = new HashMap<>();
        for (Commodity one : commodities) {
            String part = one.plantPart();
            List<Group> wider = List.of(part(all, part), part(all, kindred(part)), all);
            byPart.computeIfAbsent(part, key -> over(wider));
            String species = species(one);
            Group kin = new Group(species, matching(all, c -> kin(one, c)));
            List<Group> groups = new ArrayList<>(wider);
            groups.add(0, kin);
            byId.put(
                    one.id(), bySpecies.computeIfAbsent(species + " " + part, key -> over(groups)));
        }
        return new ClassValues(byId, byPart, over(List.of(all)));
    }

    private static Group part(Group all, String part) {
        return new Group(part, matching(all, c -> c.plantPart().equals(part)));
    }

    private static String kindred(String part) {
        return KINDRED.getOrDefault(part, part);
    }

    /** The scientific name stands last. */
    private static String species(Commodity commodity) {
        return commodity.names().get(commodity.names().size() - 1);
    }

    private static boolean kin(Commodity one, Commodity other) {
        return one.plantPart().equals(other.plantPart()) && species(one).equals(species(other));
    }

    private static List<Commodity> matching(Group group, Predicate<Commodity> like) {
        return group.members().stream().filter(like).toList();
    }

    /** What stands in for a commodity. */
    StandIn of(Commodity commodity) {
        return byId.getOrDefault(commodity.id(), byPart.getOrDefault(commodity.plantPart(), all));
    }

    /** Takes each figure from the first group that has it. */
    private static StandIn over(List<Group> groups) {
        return new StandIn(
                first(groups, ClassValues::medianHeat, "composition"),
                first(groups, ClassValues::medianSize, "size"),
                first(groups, ClassValues::medianRespiration, "respiration rate"),
                first(groups, ClassValues::medianTranspiration, "transpiration coefficient"));
    }

    private static <T> Figure<T> first(
            List<Group> groups, Function<Collection<Commodity>, Optional<T>> figure, String what) {
        for (Group group : groups) {
            Optional<T> found = figure.apply(group.members());
            if (found.isPresent()) {
                return new Figure<>(found.get(), group.name());
            }
        }
        throw new IllegalArgumentException("no commodity has a " + what);
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
