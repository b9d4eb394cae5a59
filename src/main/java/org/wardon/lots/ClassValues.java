package org.wardon.lots;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.wardon.errors.Require;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.Ripeness;

/**
 * Medians over kindred commodities, for figures nobody printed.
 *
 * <p>Each figure is the median over those that have it of their own: first over commodities of the
 * same plant part and scientific name, else over the plant part, else over a kindred part (leafy
 * vegetables for herbs), else over all commodities; for water, roots with a skin of cork are kin of
 * sweet potato and potato (common practice, no source). All of it is (assumption): that a crop is
 * like its kin.
 */
public final class ClassValues {
    /** Source named where a class value stands in. */
    static final String SOURCE = "assumption";

    private static final String ALL = "all";
    private static final Map<String, String> KINDRED = Map.of("herb", "leafy");

    /** Roots with a skin of cork, which loses water as a potato does and not as a carrot. */
    private static final Set<String> CORKED = Set.of("cassava", "ginger", "turmeric", "jicama");

    private static final Set<String> CORKED_AND_MEASURED = Set.of("sweet-potato", "potato-table");
    private static final String CORKED_NAME = "roots and tubers with a skin of cork";
    private static final double[] RESPIRATION_C = {0, 5, 10, 15, 20, 25, 30};

    /** Commodities that share something, and its name. */
    private record Group(String name, List<Commodity> members) {}

    /**
     * A median and whose it is.
     *
     * @param value the median
     * @param group scientific name, plant part, or {@code all}
     * @param <T> what it is of
     */
    record Figure<T>(T value, String group) {}

    private final Group all;

    // Figures already asked for, by species and plant part; most lots ask for one or two.
    private final Map<String, Figure<ItemHeat>> heats = new ConcurrentHashMap<>();
    private final Map<String, Figure<ItemSize>> sizes = new ConcurrentHashMap<>();
    private final Map<String, Figure<Map<Double, Fact>>> respirations = new ConcurrentHashMap<>();
    private final Map<String, Figure<Double>> transpirations = new ConcurrentHashMap<>();

    private ClassValues(Group all) {
        this.all = all;
    }

    /**
     * Returns the medians over commodities. Each is worked out when it is first asked for; one that
     * no commodity can give is refused then.
     *
     * @param commodities all commodities of the tables
     * @return the class values
     */
    public static ClassValues of(Collection<Commodity> commodities) {
        Require.that(!commodities.isEmpty(), "class values need at least one commodity");
        return new ClassValues(new Group(ALL, List.copyOf(commodities)));
    }

    /** Specific heat, conductivity and density. */
    Figure<ItemHeat> heat(Commodity commodity) {
        return heats.computeIfAbsent(
                kind(commodity),
                kind -> first(groups(commodity), ClassValues::medianHeat, "composition"));
    }

    /** Shape and size. */
    Figure<ItemSize> size(Commodity commodity) {
        return sizes.computeIfAbsent(
                kind(commodity), kind -> first(groups(commodity), ClassValues::medianSize, "size"));
    }

    /** Rates by temperature in °C, W/t, median × or ÷ the class spread. */
    Figure<Map<Double, Fact>> respiration(Commodity commodity) {
        return respirations.computeIfAbsent(
                kind(commodity),
                kind ->
                        first(
                                groups(commodity),
                                ClassValues::medianRespiration,
                                "respiration rate"));
    }

    /** Tissue to package air, kg/(kg s Pa). */
    Figure<Double> transpirationKgPerKgSPa(Commodity commodity) {
        return transpirations.computeIfAbsent(
                kind(commodity),
                kind ->
                        first(
                                watery(commodity),
                                ClassValues::medianTranspiration,
                                "transpiration coefficient"));
    }

    private List<Group> watery(Commodity commodity) {
        List<Group> groups = new ArrayList<>(groups(commodity));
        if (CORKED.contains(commodity.id())) {
            groups.add(0, group(CORKED_NAME, other -> CORKED_AND_MEASURED.contains(other.id())));
        }
        return groups;
    }

    /** Commodities of one kind have the same kin, and so the same class values. */
    private static String kind(Commodity commodity) {
        return commodity.plantPart() + " " + species(commodity);
    }

    /** The scientific name stands last. */
    private static String species(Commodity commodity) {
        return commodity.names().get(commodity.names().size() - 1);
    }

    /** Takes the figure from the first group that has it. */
    private <T> Figure<T> first(
            List<Group> groups, Function<Collection<Commodity>, Optional<T>> figure, String what) {
        for (Group group : groups) {
            Optional<T> found = figure.apply(group.members());
            if (found.isPresent()) {
                return new Figure<>(found.get(), group.name());
            }
        }
        throw new IllegalArgumentException(
                "no commodity of " + all.members().size() + " has a " + what);
    }

    private List<Group> groups(Commodity commodity) {
        String part = commodity.plantPart();
        String kind = kind(commodity);
        return List.of(
                group(species(commodity), other -> kind(other).equals(kind)),
                part(part),
                part(KINDRED.getOrDefault(part, part)),
                all);
    }

    private Group part(String part) {
        return group(part, commodity -> commodity.plantPart().equals(part));
    }

    private Group group(String name, Predicate<Commodity> like) {
        return new Group(name, all.members().stream().filter(like).toList());
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
