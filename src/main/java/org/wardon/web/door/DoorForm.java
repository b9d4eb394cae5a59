package org.wardon.web.door;

import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoubleFunction;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.wardon.advice.receiving.NewLot;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.plan.Defaults;
import org.wardon.plan.Purpose;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;

/** What a keeper types at the door: three fields are enough, the rest has told defaults. */
final class DoorForm {
    /** Every field, with the name a fault of it carries. */
    private static final Map<String, String> OPTIONS =
            Map.of(
                    "crop", "--commodity",
                    "mass", "--mass",
                    "pulp", "--temperature",
                    "harvested", "--harvested",
                    "wanted", "--days",
                    "market", "--market-days",
                    "price", "--price",
                    "packed", "--package",
                    "comes", "--at");

    static final List<String> NAMES =
            List.of(
                    "crop",
                    "mass",
                    "pulp",
                    "ripe",
                    "purpose",
                    "harvested",
                    "wanted",
                    "market",
                    "price",
                    "packed",
                    "comes");

    private final UnaryOperator<String> typed;
    private final PageWords say;
    private final Figures figures;
    private final List<Fault> faults = new ArrayList<>();

    DoorForm(UnaryOperator<String> typed, PageWords say, Figures figures) {
        this.typed = typed;
        this.say = say;
        this.figures = figures;
    }

    String typed(String name) {
        return typed.apply(name);
    }

    boolean asked() {
        return !typed("crop").isBlank() || !typed("mass").isBlank();
    }

    List<DoorView.Typed> all() {
        return NAMES.stream()
                .filter(name -> !typed(name).isBlank())
                .map(name -> new DoorView.Typed(name, typed(name)))
                .toList();
    }

    /** The lot, or every fault of what was typed. */
    NewLot lot(Commodity crop, Optional<LocalDateTime> now) {
        OptionalDouble mass = figures.massKg(typed("mass"));
        if (mass.isEmpty()) {
            fault("mass", typed("mass").isBlank() ? "door.no-mass" : "door.no-number");
        }
        NewLot.Fruit fruit =
                new NewLot.Fruit(
                        number("pulp", figures.temperatureC(typed("pulp"))),
                        crop.climacteric() ? ripeness() : Ripeness.UNKNOWN,
                        number("harvested"),
                        Optional.empty(),
                        Optional.of(typed("packed")).filter(one -> !one.isBlank()),
                        Optional.empty());
        NewLot.Wish wish =
                new NewLot.Wish(
                        comes().or(() -> now),
                        number("wanted"),
                        number("market"),
                        crop.climacteric() ? purpose() : Optional.empty(),
                        number("price", figures.pricePerKg(typed("price"))));
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return new NewLot(crop.id(), mass.orElseThrow(), fruit, wish);
    }

    private OptionalDouble number(String name) {
        return number(name, figures.number(typed(name)));
    }

    private OptionalDouble number(String name, OptionalDouble read) {
        if (!typed(name).isBlank() && read.isEmpty()) {
            fault(name, "door.no-number");
        }
        return read;
    }

    private Optional<LocalDateTime> comes() {
        try {
            return typed("comes").isBlank()
                    ? Optional.empty()
                    : Optional.of(LocalDateTime.parse(typed("comes")));
        } catch (DateTimeParseException e) {
            fault("comes", "door.no-time");
            return Optional.empty();
        }
    }

    private void fault(String name, String key) {
        faults.add(
                new Fault(
                        OPTIONS.getOrDefault(name, name),
                        "",
                        say.say(key, typed(name)),
                        say.say("door.mend", say.say("door." + name))));
    }

    private Ripeness ripeness() {
        for (Ripeness one : Ripeness.values()) {
            if (one.name().equalsIgnoreCase(typed("ripe"))) {
                return one;
            }
        }
        return Ripeness.UNKNOWN;
    }

    private Optional<Purpose> purpose() {
        for (Purpose one : Purpose.values()) {
            if (one.name().equalsIgnoreCase(typed("purpose"))) {
                return Optional.of(one);
            }
        }
        return Optional.empty();
    }

    /** What is wrong with what has no field of its own, a package say. */
    List<String> beside(List<Fault> wrong) {
        Set<String> shown =
                Stream.concat(needed(wrong).stream(), more(wrong, "").stream())
                        .map(field -> OPTIONS.getOrDefault(field.name(), field.name()))
                        .collect(Collectors.toSet());
        return wrong.stream()
                .filter(fault -> !shown.contains(fault.file()))
                .map(this::told)
                .toList();
    }

    List<FieldView> needed(List<Fault> wrong) {
        return List.of(
                with(FieldView.text("crop", say.say("door.crop"), typed("crop")), wrong)
                        .withHint(say.say("door.crop-hint"))
                        .asNeeded(),
                with(number("mass", figures.massUnit()), wrong).asNeeded(),
                with(number("pulp", figures.temperatureUnit()), wrong)
                        .withHint(say.say("door.pulp-hint")));
    }

    List<FieldView> more(List<Fault> wrong, String currency) {
        String wanted = figures.figure(Defaults.WANTED_DAYS.value(), "day");
        String market = figures.figure(Defaults.MARKET_DAYS.value(), "day");
        return List.of(
                with(number("wanted", say.say("door.days")), wrong)
                        .withHint(say.say("door.wanted-hint", wanted)),
                with(number("harvested", say.say("door.hours")), wrong)
                        .withHint(say.say("door.harvested-hint")),
                with(number("market", say.say("door.days")), wrong)
                        .withHint(say.say("door.market-hint", market)),
                with(number("price", (currency + " / " + figures.massUnit()).strip()), wrong)
                        .withHint(say.say("door.price-hint")),
                with(FieldView.time("comes", say.say("door.comes"), typed("comes")), wrong)
                        .withHint(say.say("door.comes-hint")));
    }

    private FieldView number(String name, String unit) {
        return FieldView.number(name, say.say("door." + name), typed(name), unit);
    }

    private FieldView with(FieldView field, List<Fault> wrong) {
        String option = OPTIONS.getOrDefault(field.name(), field.name());
        return wrong.stream()
                .filter(fault -> fault.file().equals(option))
                .findFirst()
                .map(fault -> field.withFault(told(fault)))
                .orElse(field);
    }

    /** Ranges of the fields with units of their own are told in those units. */
    private String told(Fault fault) {
        boolean isNumber = fault.found().startsWith("is ");
        if (isNumber && fault.file().equals("--temperature")) {
            return between(NewLot.PULP_C, figures::temperature);
        }
        if (isNumber && fault.file().equals("--mass")) {
            return between(NewLot.MASS_KG, figures::mass);
        }
        if (isNumber && fault.file().equals("--price")) {
            return between(
                    NewLot.PRICE_PER_KG,
                    price -> figures.typedPrice(price) + " / " + figures.massUnit());
        }
        // What was typed is told as it was typed.
        String found = isNumber ? figures.text(fault.found()) : fault.found();
        return found + "; " + figures.text(fault.accepted());
    }

    private String between(Limits taken, DoubleFunction<String> shown) {
        return say.say("door.between", shown.apply(taken.low()), shown.apply(taken.high()));
    }

    List<DoorView.Pick> ripeness(boolean stages) {
        if (!stages) {
            return List.of();
        }
        List<DoorView.Pick> picks = new ArrayList<>();
        for (Ripeness one :
                List.of(Ripeness.UNKNOWN, Ripeness.GREEN, Ripeness.TURNING, Ripeness.RIPE)) {
            String word = one.name().toLowerCase(Locale.ROOT);
            picks.add(new DoorView.Pick(word, say.say("ripeness." + word), "", one == ripeness()));
        }
        return picks;
    }

    List<DoorView.Pick> packed() {
        List<DoorView.Pick> picks = new ArrayList<>();
        boolean known = false;
        for (Picture one : Picture.values()) {
            boolean taken = one.packageId().equals(typed("packed"));
            known |= taken;
            picks.add(
                    new DoorView.Pick(
                            one == Picture.ANY ? "" : one.packageId(),
                            say.say("packed." + one.name().toLowerCase(Locale.ROOT)),
                            one.drawn(),
                            taken));
        }
        if (!known) {
            DoorView.Pick any = picks.get(0);
            picks.set(0, new DoorView.Pick(any.word(), any.name(), any.drawn(), true));
        }
        return picks;
    }
}
