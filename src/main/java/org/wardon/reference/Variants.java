package org.wardon.reference;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.wardon.errors.BadInput;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.rows.ChillingExposure;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.LifeCurveRow;
import org.wardon.produce.rows.OwnLot;

/**
 * Variants of a commodity that print keeps apart, and the commodity with the rows of one of them.
 *
 * <p>The rule: the lowest safe temperature, the times of injury and the slope of ageing are the
 * variant's where print has rows of it, else the crop's; rows of other variants do not count then.
 * The level of life is the crop's. Names that speak of several cultivars at once choose nothing,
 * nor does a source's other word for the whole crop.
 */
public final class Variants {
    private static final Pattern SEVERAL =
            Pattern.compile("\\b(cultivars?|types?|some|most|all|several|and|fruit|of)\\b|\\d,");

    /** Letters that may be wrong in a name that is still understood. */
    private static final int NEAR = 3;

    private Variants() {}

    /**
     * A commodity with the rows of a variant.
     *
     * @param commodity the commodity as that variant
     * @param told what is the variant's own
     */
    public record Chosen(Commodity commodity, Reason told) {}

    /**
     * Returns the variants that can be chosen.
     *
     * @param commodity the commodity
     * @return names of the sources by id, in their order
     */
    public static Map<String, String> of(Commodity commodity) {
        Map<String, String> found = new LinkedHashMap<>();
        Commodity.Keeping keeping = commodity.keeping();
        Stream.of(
                        keeping.curves().stream().map(LifeCurveRow::variant),
                        keeping.floors().stream().map(ChillingFloor::variant),
                        keeping.exposures().stream().map(ChillingExposure::variant))
                .flatMap(Function.identity())
                .filter(name -> !name.isEmpty() && !SEVERAL.matcher(name).find())
                .forEach(name -> found.putIfAbsent(id(name), name));
        List<String> crop =
                Stream.concat(Stream.of(commodity.id()), commodity.names().stream())
                        .map(Variants::id)
                        .toList();
        boolean onlyTheCrop = crop.containsAll(found.keySet());
        return onlyTheCrop ? Map.of() : found;
    }

    /**
     * Returns the id of a variant's name.
     *
     * @param name as a source writes it
     * @return lower-case words joined by hyphens
     */
    public static String id(String name) {
        return name.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "-").replaceAll("^-|-$", "");
    }

    /**
     * Chooses a variant.
     *
     * @param commodity the commodity
     * @param variant id or name of the variant
     * @return the commodity with its rows
     * @throws BadInput if print has no rows of it, with those it has
     */
    public static Chosen choose(Commodity commodity, String variant) {
        Map<String, String> known = of(commodity);
        String name = known.get(id(variant));
        if (name == null) {
            throw new BadInput(
                    "--variant",
                    "",
                    "'"
                            + variant
                            + "' is no variant of "
                            + commodity.id()
                            + " with rows of its own",
                    nearest(id(variant), known)
                            + "accepted: "
                            + (known.isEmpty()
                                    ? "none, print keeps no variants of it apart"
                                    : String.join(", ", known.keySet())));
        }
        return chosen(commodity, name);
    }

    private static String nearest(String id, Map<String, String> known) {
        return known.keySet().stream()
                .min(Comparator.comparingInt(one -> EditDistance.between(id, one)))
                .filter(one -> EditDistance.between(id, one) <= NEAR)
                .map(one -> "did you mean '" + one + "'? ")
                .orElse("");
    }

    private static Chosen chosen(Commodity of, String name) {
        List<String> own = new ArrayList<>();
        Commodity.Keeping k = of.keeping();
        List<LifeCurveRow> curves = curves(k.curves(), name, own);
        List<ChillingFloor> floors = floors(k.floors(), name, own);
        List<ChillingExposure> exposures = exposures(k.exposures(), name, own);
        List<OwnLot> lots =
                k.ownLots().stream()
                        .filter(
                                lot ->
                                        lot.began().variant().isEmpty()
                                                || lot.began().variant().equals(id(name)))
                        .toList();
        Commodity.Keeping keeping =
                new Commodity.Keeping(
                        k.lives(),
                        k.q10s(),
                        floors,
                        exposures,
                        k.sprouting(),
                        k.curing(),
                        k.ambient(),
                        curves,
                        k.ripening(),
                        lots);
        Reason told =
                Reason.about(
                        "variant-facts",
                        of.id(),
                        "assumption",
                        Argument.text(name),
                        Argument.text(String.join(", ", own)));
        return new Chosen(OwnOverlay.keeping(of, keeping), told);
    }

    private static List<LifeCurveRow> curves(
            List<LifeCurveRow> rows, String name, List<String> own) {
        List<LifeCurveRow> of = rows.stream().filter(row -> row.variant().equals(name)).toList();
        if (of.isEmpty()) {
            return rows;
        }
        own.add("how much faster it ages in warmth");
        LifeCurveRow row = of.get(0);
        return List.of(
                new LifeCurveRow(
                        "",
                        row.slopeKJMol(),
                        row.slopeDeviationKJMol(),
                        row.ownWeight(),
                        row.lowestC(),
                        row.highestC(),
                        row.temperatures(),
                        row.shortestDays(),
                        row.longestDays(),
                        row.betweenSources(),
                        row.betweenCrops(),
                        row.sourceIds()));
    }

    private static List<ChillingFloor> floors(
            List<ChillingFloor> rows, String name, List<String> own) {
        List<ChillingFloor> of =
                rows.stream()
                        .filter(row -> row.variant().equals(name) && row.lowestSafeC().isPresent())
                        .toList();
        boolean keepers =
                rows.stream().anyMatch(row -> row.lowestSafeC().filter(f -> f.own()).isPresent());
        if (of.isEmpty() || keepers) {
            return rows;
        }
        own.add("the lowest safe temperature");
        return of.stream()
                .map(
                        row ->
                                new ChillingFloor(
                                        row.lowestSafeC(),
                                        row.rated(),
                                        row.symptoms(),
                                        row.ripeness(),
                                        "",
                                        row.tissue(),
                                        row.zone().isEmpty() ? "floor" : row.zone(),
                                        row.bandLowC(),
                                        row.sourceId()))
                .toList();
    }

    private static List<ChillingExposure> exposures(
            List<ChillingExposure> rows, String name, List<String> own) {
        if (rows.stream().noneMatch(row -> row.variant().equals(name))) {
            return rows;
        }
        own.add("times of injury by cold");
        return rows.stream()
                .filter(row -> row.variant().isEmpty() || row.variant().equals(name))
                .map(
                        row ->
                                new ChillingExposure(
                                        row.temperatureC(),
                                        row.days(),
                                        row.kind(),
                                        row.visible(),
                                        row.bound(),
                                        row.ripeness(),
                                        "",
                                        row.tissue(),
                                        row.note()))
                .toList();
    }
}
