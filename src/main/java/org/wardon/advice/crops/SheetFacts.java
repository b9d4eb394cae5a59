package org.wardon.advice.crops;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.wardon.advice.crops.SheetFact.Part;
import org.wardon.advice.crops.SheetFact.Standing;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.NamedFact;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.LifeRow;
import org.wardon.reference.ReferenceBook;

/** The facts of a crop, each with what it is about and whether answers rest on it. */
final class SheetFacts {
    private static final String NEEDS =
            "storage-temperature|storage-humidity|storage-life|highest-freezing-point"
                    + "|climacteric|ethylene-(?:production|sensitivity)-class";
    private static final String LIFE =
            "life@.*|q10@.*|(?:fitted-)?activation-energy|ambient-life|sprouting.*|curing-.*";
    private static final List<Rule> RULES =
            List.of(
                    new Rule(NEEDS, Part.CONDITION),
                    new Rule(LIFE, Part.LIFE),
                    new Rule("chilling-floor|chilling@.*", Part.COLD),
                    new Rule("respiration-.*", Part.BREATH),
                    new Rule(
                            "green-to-ripe.*|to-ripe.*|ripe-to-.*|ripen.*|ethylene.*",
                            Part.RIPENING),
                    new Rule(
                            "transpiration-.*|skin-.*|vapour-.*|water-loss.*|permissible-loss",
                            Part.WATER));

    /** Rates are shown to a tenth of a watt. */
    private static final double SHOWN_W_PER_T = 0.06;

    private final ReferenceBook book;
    private final Commodity commodity;
    private final BreathLine breath;

    SheetFacts(ReferenceBook book, Commodity commodity, BreathLine breath) {
        this.book = book;
        this.commodity = commodity;
        this.breath = breath;
    }

    private record Rule(Pattern names, Part part) {
        Rule(String names, Part part) {
            this(Pattern.compile(names), part);
        }
    }

    List<SheetFact> list() {
        return book.facts(commodity.id()).stream()
                .map(
                        fact ->
                                new SheetFact(
                                        fact,
                                        part(fact.name()),
                                        standing(fact),
                                        book.sources(fact.sourceId())))
                .toList();
    }

    private static Part part(String name) {
        return RULES.stream()
                .filter(rule -> rule.names().matcher(name).matches())
                .map(Rule::part)
                .findFirst()
                .orElse(Part.OTHER);
    }

    private Standing standing(NamedFact fact) {
        Commodity.Needs needs = commodity.needs();
        return switch (fact.name().replaceFirst("@.*", "")) {
            case "storage-temperature" -> among(fact, needs.temperatureC().stream());
            case "storage-humidity" -> among(fact, needs.humidityPct().stream());
            case "storage-life" -> among(fact, needs.lifeDays().stream());
            case "highest-freezing-point" -> among(fact, needs.highestFreezingC().stream());
            case "permissible-loss" ->
                    among(
                            fact,
                            commodity.water().limits().stream()
                                    .limit(1)
                                    .map(row -> row.maxLossPct()));
            case "chilling-floor" -> among(fact, floors());
            case "life" -> own(fact);
            case "respiration-heat" -> breathed(fact);
            default -> Standing.AMONG_OTHERS;
        };
    }

    private static Standing among(NamedFact fact, Stream<Fact> chosen) {
        Optional<Fact> figure = fact.fact();
        return figure.isPresent() && chosen.anyMatch(figure.get()::equals)
                ? Standing.CHOSEN
                : Standing.BESIDE;
    }

    /**
     * The keeper's own floor alone, else all that give a temperature: the lot's ripeness chooses.
     */
    private Stream<Fact> floors() {
        List<Fact> all =
                commodity.keeping().floors().stream()
                        .filter(row -> !row.zone().isEmpty())
                        .map(ChillingFloor::lowestSafeC)
                        .flatMap(Optional::stream)
                        .toList();
        return all.stream().anyMatch(Fact::own) ? all.stream().filter(Fact::own) : all.stream();
    }

    /** Lives all bear on the line; the keeper's own are weighed against print. */
    private static Standing own(NamedFact fact) {
        return fact.own() ? Standing.CHOSEN : Standing.AMONG_OTHERS;
    }

    private Standing breathed(NamedFact fact) {
        boolean taken =
                breath.printed().stream()
                        .filter(BreathLine.Printed::taken)
                        .map(BreathLine.Printed::row)
                        .anyMatch(
                                row ->
                                        fact.name().equals(name(row.temperatureC()))
                                                && row.wattsPerTonne()
                                                        .sourceId()
                                                        .equals(fact.sourceId())
                                                && near(fact.low(), row.wattsPerTonne().low())
                                                && near(fact.high(), row.wattsPerTonne().high()));
        return taken ? Standing.CHOSEN : Standing.BESIDE;
    }

    private static String name(double atC) {
        String degrees = atC == Math.rint(atC) ? String.valueOf((long) atC) : String.valueOf(atC);
        return "respiration-heat@" + degrees + "C";
    }

    private static boolean near(OptionalDouble shown, OptionalDouble row) {
        return shown.isPresent() == row.isPresent()
                && (shown.isEmpty()
                        || Math.abs(shown.getAsDouble() - row.getAsDouble()) <= SHOWN_W_PER_T);
    }

    /** Lives with a temperature, as they stand in the commodity. */
    static List<LifeRow> lives(Commodity commodity) {
        return commodity.keeping().lives().stream()
                .filter(row -> row.temperatureC().isPresent())
                .toList();
    }
}
