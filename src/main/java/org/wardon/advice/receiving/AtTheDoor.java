package org.wardon.advice.receiving;

import java.math.BigDecimal;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import org.wardon.air.Timeline;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.plan.AtDoor;
import org.wardon.plan.Defaults;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Market;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.Place;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;
import org.wardon.reference.Variants;

/** Makes a lot of a plan of what a keeper told, tells every fault, and what had to be assumed. */
final class AtTheDoor {
    private static final String OWN_RULE = "assumption";
    private static final String PRACTICE = "common-practice";
    private static final Limits HOURS_AGO = new Limits(0, 8_760);
    private static final Limits WANTED_DAYS = new Limits(0.1, 730);
    private static final Limits MARKET_DAYS = new Limits(0, 60);

    private final StorePlan plan;
    private final ReferenceBook book;
    private final NewLot told;
    private final List<Fault> faults = new ArrayList<>();
    private final List<Reason> assumed = new ArrayList<>();

    private AtTheDoor(StorePlan plan, ReferenceBook book, NewLot told) {
        this.plan = plan;
        this.book = book;
        this.told = told;
    }

    /**
     * A lot that can be asked about.
     *
     * @param lot the lot
     * @param assumed what was assumed of it
     */
    record Known(LotPlan lot, List<Reason> assumed) {
        Known {
            assumed = List.copyOf(assumed);
        }
    }

    /** Outdoor air by seconds of the plan. */
    @FunctionalInterface
    interface Outdoors {
        double temperatureC(double atS);
    }

    static Known of(StorePlan plan, ReferenceBook book, NewLot told, Outdoors outdoors) {
        return new AtTheDoor(plan, book, told).known(outdoors);
    }

    private Known known(Outdoors outdoors) {
        Optional<Commodity> commodity = commodity();
        check();
        LocalDateTime at = at();
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        String crop = commodity.orElseThrow().id();
        double atS = plan.timeline().secondsAt(at);
        double pulpC = temperatureC(outdoors.temperatureC(atS));
        double days = wantedDays();
        LotPlan lot =
                new LotPlan(
                        freeId(crop),
                        crop,
                        told.fruit().variant().map(Variants::id),
                        told.massKg(),
                        packed(),
                        at,
                        pulpC,
                        days,
                        at.plusSeconds(Math.round(days * Timeline.DAY_S)),
                        Optional.empty(),
                        Place.MIDDLE,
                        List.of(),
                        door(crop, at),
                        market(crop));
        return new Known(lot, assumed);
    }

    private Optional<Commodity> commodity() {
        try {
            Commodity found = book.named(told.commodity());
            told.fruit().variant().ifPresent(variant -> variant(found, variant));
            return Optional.of(found);
        } catch (BadInput unknown) {
            unknown.faults()
                    .forEach(
                            fault ->
                                    faults.add(
                                            new Fault(
                                                    "--commodity",
                                                    "",
                                                    "'" + told.commodity() + "': " + fault.found(),
                                                    fault.accepted())));
            return Optional.empty();
        }
    }

    private void variant(Commodity of, String variant) {
        try {
            Variants.choose(of, variant);
        } catch (BadInput unknown) {
            faults.addAll(unknown.faults());
        }
    }

    private void check() {
        within("--mass", OptionalDouble.of(told.massKg()), NewLot.MASS_KG, "kg, net");
        NewLot.Fruit fruit = told.fruit();
        within("--temperature", fruit.temperatureC(), NewLot.PULP_C, "°C, measured in the flesh");
        within("--harvested", fruit.harvestedHoursAgo(), HOURS_AGO, "hours ago");
        NewLot.Wish wish = told.wish();
        within("--days", wish.wantedDays(), WANTED_DAYS, "days");
        within("--market-days", wish.marketDays(), MARKET_DAYS, "days");
        within("--price", wish.pricePerKg(), NewLot.PRICE_PER_KG, "a kilogram");
        fruit.packed().ifPresent(this::known);
    }

    private void known(String packed) {
        try {
            book.packageKind(packed);
        } catch (BadInput unknown) {
            unknown.faults()
                    .forEach(
                            fault ->
                                    faults.add(
                                            new Fault(
                                                    "--package",
                                                    "",
                                                    "'" + packed + "': " + fault.found(),
                                                    fault.accepted())));
        }
    }

    private void within(String what, OptionalDouble given, Limits taken, String unit) {
        if (given.isPresent() && !taken.hold(given.getAsDouble())) {
            faults.add(
                    new Fault(
                            what,
                            "",
                            "is " + plain(given.getAsDouble()),
                            "accepted: "
                                    + plain(taken.low())
                                    + " to "
                                    + plain(taken.high())
                                    + " "
                                    + unit));
        }
    }

    private static String plain(double value) {
        return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }

    private LocalDateTime at() {
        LocalDateTime from = plan.from();
        LocalDateTime at = told.wish().at().orElse(from);
        double atS = plan.timeline().secondsAt(at);
        if (told.wish().at().isEmpty()) {
            assume("took-start", OWN_RULE, Argument.text(from.toString().replace('T', ' ')));
        } else if (atS < 0 || atS > plan.durationS() - Timeline.HOUR_S) {
            faults.add(
                    new Fault(
                            "--at",
                            "",
                            "is " + at + ", outside the plan",
                            "accepted: "
                                    + from
                                    + " to "
                                    + plan.timeline().localAt(plan.durationS() - Timeline.HOUR_S)
                                    + "; or give the plan more days"));
        }
        return at;
    }

    private double temperatureC(double outdoorC) {
        if (told.fruit().temperatureC().isPresent()) {
            return told.fruit().temperatureC().getAsDouble();
        }
        double pulpC = Math.min(55, Math.max(-5, outdoorC));
        assume("took-outdoor-temperature", OWN_RULE, Argument.of(pulpC, "C"));
        return pulpC;
    }

    private double wantedDays() {
        if (told.wish().wantedDays().isEmpty()) {
            assume("took-wanted", OWN_RULE, Argument.of(Defaults.WANTED_DAYS.value(), "day"));
        }
        return told.wish().wantedDays().orElse(Defaults.WANTED_DAYS.value());
    }

    private PackagePlan packed() {
        if (told.fruit().packed().isEmpty()) {
            assume("took-package", OWN_RULE, Argument.text(Defaults.PACKAGE));
        }
        return new PackagePlan.Named(told.fruit().packed().orElse(Defaults.PACKAGE));
    }

    private AtDoor door(String crop, LocalDateTime at) {
        NewLot.Fruit fruit = told.fruit();
        if (fruit.ripeness() == Ripeness.UNKNOWN && book.get(crop).climacteric()) {
            assume("took-ripeness", OWN_RULE);
        }
        if (fruit.harvestedHoursAgo().isEmpty()) {
            assume("took-age", OWN_RULE);
        }
        Optional<LocalDateTime> harvested =
                fruit.harvestedHoursAgo().isPresent()
                        ? Optional.of(
                                at.minusMinutes(
                                        Math.round(60 * fruit.harvestedHoursAgo().getAsDouble())))
                        : Optional.empty();
        return new AtDoor(
                harvested,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                fruit.ripeness(),
                fruit.cured(),
                List.of(),
                0,
                Optional.empty());
    }

    private Market market(String crop) {
        NewLot.Wish wish = told.wish();
        if (wish.marketDays().isEmpty()) {
            assume("took-market", PRACTICE, Argument.of(Defaults.MARKET_DAYS.value(), "day"));
        }
        if (wish.purpose().isEmpty()
                && told.fruit().ripeness() == Ripeness.GREEN
                && book.get(crop).climacteric()) {
            assume("took-purpose", OWN_RULE);
        }
        return new Market(
                wish.marketDays().orElse(Defaults.MARKET_DAYS.value()),
                OptionalDouble.empty(),
                wish.purpose(),
                wish.pricePerKg().orElseGet(() -> price(crop)),
                Optional.empty());
    }

    /** The price of lots of this crop, else of all lots, by mass. */
    private double price(String crop) {
        List<LotPlan> alike =
                plan.lots().stream().filter(lot -> lot.commodity().equals(crop)).toList();
        List<LotPlan> from = alike.isEmpty() ? plan.lots() : alike;
        double kg = from.stream().mapToDouble(LotPlan::massKg).sum();
        double worth =
                from.stream().mapToDouble(lot -> lot.massKg() * lot.market().pricePerKg()).sum();
        double price = kg > 0 ? worth / kg : Defaults.PRICE_PER_KG.value();
        String currency = plan.prices().currency();
        assume(
                alike.isEmpty() ? "took-price" : "took-price-of-crop",
                OWN_RULE,
                Argument.of(price, "per kg"),
                Argument.text(currency.isEmpty() ? "" : currency + " "));
        return price;
    }

    private void assume(String code, String sourceId, Argument... arguments) {
        assumed.add(Reason.about(code, told.commodity(), sourceId, arguments));
    }

    /** Three letters of the crop and the next number the plan has not. */
    private String freeId(String crop) {
        Set<String> taken = plan.lots().stream().map(LotPlan::id).collect(Collectors.toSet());
        String letters = crop.replaceAll("[^a-z]", "").toUpperCase(Locale.ROOT);
        String stem = letters.substring(0, Math.min(3, letters.length()));
        int number = 1;
        while (taken.contains(stem + number)) {
            number++;
        }
        return stem + number;
    }
}
