package org.wardon.files;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.files.json.Part;
import org.wardon.plan.AtDoor;
import org.wardon.plan.Chilled;
import org.wardon.plan.Defaults;
import org.wardon.plan.KnownLife;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Market;
import org.wardon.plan.Move;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.Place;
import org.wardon.plan.Purpose;
import org.wardon.produce.Ripeness;

/** Turns the lots of a checked plan into records. */
final class LotBinder {
    private static final double DAY_S = 86_400;
    private static final double FEWEST_DAYS = 0.01;
    private static final double MOST_DAYS = 730;

    private final LocalDateTime from;
    private final Inputs inputs;

    LotBinder(LocalDateTime from, Inputs inputs) {
        this.from = from;
        this.inputs = inputs;
    }

    LotPlan bind(Part lot) {
        LocalDateTime arrives = arrives(lot);
        double wantedDays = wantedDays(lot, arrives);
        return new LotPlan(
                inputs.text(lot, "id"),
                inputs.text(lot, "commodity"),
                lot.at("variant").text(),
                inputs.number(lot, "massKg"),
                packed(lot),
                arrives,
                inputs.number(lot, "temperatureC"),
                wantedDays,
                inputs.time(lot, "leaves").orElseGet(() -> Times.plusDays(arrives, wantedDays)),
                lot.at("chamber").text(),
                lot.at("place")
                        .text()
                        .map(word -> Place.valueOf(constant(word)))
                        .orElse(Place.MIDDLE),
                moves(lot),
                atDoor(lot),
                market(lot));
    }

    private LocalDateTime arrives(Part lot) {
        if (!lot.has("arrives")) {
            inputs.note(lot, "arrives", from.toString(), "", Defaults.ASSUMPTION);
        }
        return inputs.time(lot, "arrives").orElse(from);
    }

    private double wantedDays(Part lot, LocalDateTime arrives) {
        Optional<LocalDateTime> leaves = inputs.time(lot, "leaves");
        if (leaves.isPresent() && !lot.has("wantedDays")) {
            double days = arrives.until(leaves.get(), ChronoUnit.SECONDS) / DAY_S;
            return Math.min(Math.max(days, FEWEST_DAYS), MOST_DAYS);
        }
        return inputs.number(lot, "wantedDays", Defaults.WANTED_DAYS);
    }

    private PackagePlan packed(Part lot) {
        Part packed = lot.at("package");
        if (packed.has("halfCoolingHours")) {
            return new PackagePlan.HalfCooling(inputs.number(packed, "halfCoolingHours"));
        }
        if (packed.has("stackHalfThicknessM")) {
            return new PackagePlan.Stack(inputs.number(packed, "stackHalfThicknessM"));
        }
        return new PackagePlan.Named(
                inputs.text(lot, "package", Defaults.PACKAGE, Defaults.ASSUMPTION));
    }

    private List<Move> moves(Part lot) {
        return lot.at("moves").items().stream()
                .map(
                        move ->
                                new Move(
                                        inputs.time(move, "at").orElseThrow(),
                                        inputs.text(move, "to")))
                .toList();
    }

    private AtDoor atDoor(Part lot) {
        Part life = lot.at("knownLife");
        return new AtDoor(
                inputs.time(lot, "harvested"),
                inputs.maybe(lot, "heldC"),
                inputs.maybe(lot, "usedPct"),
                lot.at("ripeness")
                        .text()
                        .map(word -> Ripeness.valueOf(constant(word)))
                        .orElse(Ripeness.UNKNOWN),
                lot.at("cured").flag(),
                lot.at("chilledBefore").items().stream()
                        .map(
                                cold ->
                                        new Chilled(
                                                inputs.number(cold, "atC"),
                                                inputs.number(cold, "hours")))
                        .toList(),
                inputs.numberElse(lot, "surfaceWaterPct", 0),
                life.given()
                        ? Optional.of(
                                new KnownLife(
                                        inputs.number(life, "days"), inputs.number(life, "atC")))
                        : Optional.empty());
    }

    private Market market(Part lot) {
        return new Market(
                inputs.number(lot, "marketDays", Defaults.MARKET_DAYS),
                inputs.maybe(lot, "marketC"),
                lot.at("purpose").text().map(word -> Purpose.valueOf(constant(word))),
                inputs.number(lot, "pricePerKg", Defaults.PRICE_PER_KG),
                lot.at("ripeOn").text().map(LocalDate::parse));
    }

    static String constant(String word) {
        return word.toUpperCase(Locale.ROOT).replace('-', '_');
    }
}
