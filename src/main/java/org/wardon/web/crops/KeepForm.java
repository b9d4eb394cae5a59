package org.wardon.web.crops;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.wardon.advice.outlook.KeepReport;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Limits;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** The question how long a lot keeps, as it is typed, and its answer. */
final class KeepForm {
    /** Beginning of the names of the question's fields. */
    static final String ASKS = "keep-";

    private static final double ALL_PCT = 100;

    /** As {@code keep} accepts, told in the person's own unit. */
    private static final Map<String, Limits> RANGES =
            Map.of(
                    "at", new Limits(-5, 50),
                    "humidity", new Limits(0, 100),
                    "days", new Limits(0.05, 730),
                    "used", new Limits(0, 100),
                    "ripe", new Limits(0, 120),
                    "ethylene", new Limits(0, 1000));

    private final String prefix;
    private final Commodity commodity;
    private final Function<String, String> given;
    private final PageWords page;
    private final Figures figures;
    private final List<Fault> faults = new ArrayList<>();

    /**
     * Takes what was typed.
     *
     * @param prefix beginning of the names of its fields
     * @param commodity the crop
     * @param typed what was typed into a field by its whole name; blank for nothing
     */
    KeepForm(
            String prefix,
            Commodity commodity,
            Function<String, String> typed,
            PageWords page,
            Figures figures) {
        this.prefix = prefix;
        this.commodity = commodity;
        this.given = name -> typed.apply(name.equals("variant") ? name : prefix + name);
        this.page = page;
        this.figures = figures;
    }

    boolean asked() {
        return !given.apply("at").isBlank();
    }

    /**
     * Returns the question.
     *
     * @param days days where none were typed; empty to ask for them
     * @throws BadInput where something typed is no number
     */
    KeepRequest request(OptionalDouble days) {
        OptionalDouble at = temperature("at");
        OptionalDouble kept = number("days");
        if (at.isEmpty() && given.apply("at").isBlank()) {
            missing("--at");
        }
        if (kept.isEmpty() && given.apply("days").isBlank() && days.isEmpty()) {
            missing("--days");
        }
        KeepRequest request =
                new KeepRequest(
                        commodity.id(),
                        new KeepRequest.Steady(at.orElse(0), kept.orElse(days.orElse(1))),
                        number("humidity"),
                        number("used"),
                        Optional.empty(),
                        ripeness(),
                        cured(),
                        number("ethylene"),
                        number("ripe"),
                        Optional.of(given.apply("variant")).filter(v -> !v.isBlank()));
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return request;
    }

    private void missing(String option) {
        faults.add(new Fault(option, "", page.say("crop.missing"), page.say("crop.give-number")));
    }

    /** What answers call the field. */
    private static String option(String name) {
        return name.equals("ripe") ? "--ripe-in" : "--" + name;
    }

    private OptionalDouble number(String name) {
        return read(name, figures::number);
    }

    private OptionalDouble temperature(String name) {
        return read(name, figures::temperatureC);
    }

    private OptionalDouble read(String name, Function<String, OptionalDouble> as) {
        String typed = given.apply(name);
        if (typed.isBlank()) {
            return OptionalDouble.empty();
        }
        OptionalDouble number = as.apply(typed);
        if (number.isEmpty()) {
            faults.add(
                    new Fault(
                            option(name),
                            "",
                            page.say("crop.no-number", typed),
                            page.say("crop.give-number")));
        } else if (!range(name).hold(number.getAsDouble())) {
            faults.add(
                    new Fault(
                            option(name),
                            "",
                            page.say("crop.out-of-range", typed),
                            page.say("crop.give-within", low(name), high(name))));
        }
        return number;
    }

    private static Limits range(String name) {
        return Optional.ofNullable(RANGES.get(name)).orElseThrow();
    }

    private String low(String name) {
        double low = range(name).low();
        return name.equals("at") ? figures.typedTemperature(low) : figures.typed(low);
    }

    private String high(String name) {
        double high = range(name).high();
        return name.equals("at") ? figures.typedTemperature(high) : figures.typed(high);
    }

    private Ripeness ripeness() {
        for (Ripeness one : Ripeness.values()) {
            if (one.name().equalsIgnoreCase(given.apply("ripeness"))) {
                return one;
            }
        }
        return Ripeness.UNKNOWN;
    }

    private Optional<Boolean> cured() {
        return switch (given.apply("cured")) {
            case "yes" -> Optional.of(true);
            case "no" -> Optional.of(false);
            default -> Optional.empty();
        };
    }

    CropView.KeepView unasked() {
        return new CropView.KeepView(
                fields(List.of()),
                ripenesses(),
                cures(),
                List.of(),
                Optional.empty(),
                List.of(),
                List.of());
    }

    CropView.KeepView refused(List<Fault> found) {
        return new CropView.KeepView(
                fields(found),
                ripenesses(),
                cures(),
                List.of(),
                Optional.empty(),
                List.of(),
                besideFields(found, fields(found)));
    }

    CropView.KeepView answered(KeepReport report, Words words) {
        KeepAnswer answer = report.answer();
        List<String> lines = new ArrayList<>();
        String keeps = figures.text(words.range(answer.daysLeft()));
        lines.add(
                Words.isCapped(answer.daysLeft().p10())
                        ? page.say("crop.keeps-long", keeps)
                        : page.say("crop.keeps", keeps, words.text("limit." + answer.limitedBy())));
        lines.add(
                page.say(
                        "crop.used",
                        answer.lifeUsedPct() >= ALL_PCT
                                ? page.say("crop.all-of-it")
                                : figures.figure(answer.lifeUsedPct(), "pct"),
                        words.text("rests-on." + report.restsOn())));
        answer.hangsOn()
                .ifPresent(
                        most ->
                                lines.add(
                                        page.say(
                                                "crop.hangs-on",
                                                words.text("hangs-on." + most.range()))));
        answer.ripeFrom()
                .filter(from -> !Words.isCapped(from.p50()))
                .ifPresent(
                        from ->
                                lines.add(
                                        page.say(
                                                "crop.ripe-from",
                                                figures.text(words.range(from)))));
        if (answer.chillingRisk().probability() > 0) {
            lines.add(
                    page.say(
                            "crop.risk",
                            figures.figure(100 * answer.chillingRisk().probability(), "pct")));
        }
        List<CropView.Because> because = new ArrayList<>();
        report.ripe().forEach(reason -> because.add(because(reason, words)));
        report.reasons().stream()
                .filter(reason -> !reason.code().equals("life-rests-on"))
                .forEach(reason -> because.add(because(reason, words)));
        return new CropView.KeepView(
                fields(List.of()),
                ripenesses(),
                cures(),
                lines,
                Optional.of(mechanisms(answer, words)),
                because,
                List.of());
    }

    private CropView.Because because(Reason reason, Words words) {
        return new CropView.Because(figures.text(words.sentence(reason)), reason.sourceId());
    }

    private TableView mechanisms(KeepAnswer answer, Words words) {
        return new TableView(
                page.say("crop.alone"),
                List.of(page.say("crop.acting"), page.say("crop.days")),
                answer.mechanisms().stream()
                        .map(
                                one ->
                                        List.of(
                                                words.text("mechanism." + one.name()),
                                                figures.text(words.span(one.daysLeft()))))
                        .toList());
    }

    List<FieldView> fields(List<Fault> found) {
        List<FieldView> fields = new ArrayList<>();
        fields.add(field("at", figures.temperatureUnit(), found).asNeeded());
        fields.add(field("humidity", "%", found));
        fields.add(field("days", page.say("crop.unit-days"), found));
        fields.add(field("used", "%", found));
        if (prefix.equals(ASKS) && !commodity.keeping().ripening().isEmpty()) {
            fields.add(field("ripe", page.say("crop.unit-days"), found));
            fields.add(field("ethylene", "ppm", found));
        }
        return fields;
    }

    private FieldView field(String name, String unit, List<Fault> found) {
        FieldView field =
                FieldView.number(prefix + name, page.say("keep." + name), given.apply(name), unit)
                        .withHint(page.say("keep.hint-" + name, low(name), high(name)));
        return withFault(field, option(name), found);
    }

    static FieldView withFault(FieldView field, String option, List<Fault> found) {
        return found.stream()
                .filter(
                        fault ->
                                fault.file().equals(option)
                                        || fault.file().startsWith(option + " "))
                .findFirst()
                .map(fault -> field.withFault(fault.found() + "; " + fault.accepted()))
                .orElse(field);
    }

    /** Faults that stand at no field. */
    static List<String> besideFields(List<Fault> found, List<FieldView> fields) {
        long shown = fields.stream().filter(field -> !field.fault().isEmpty()).count();
        return shown == found.size()
                ? List.of()
                : found.stream()
                        .map(f -> f.file() + ": " + f.found() + "; " + f.accepted())
                        .toList();
    }

    List<CropView.Pick> ripenesses() {
        if (!commodity.climacteric()) {
            return List.of();
        }
        List<CropView.Pick> picks = new ArrayList<>();
        for (Ripeness one :
                List.of(Ripeness.UNKNOWN, Ripeness.GREEN, Ripeness.TURNING, Ripeness.RIPE)) {
            String word = one.name().toLowerCase(Locale.ROOT);
            picks.add(new CropView.Pick(word, page.say("ripeness." + word), one == ripeness()));
        }
        return picks;
    }

    List<CropView.Pick> cures() {
        if (commodity.keeping().curing().isEmpty()) {
            return List.of();
        }
        String cured = given.apply("cured");
        return List.of(
                new CropView.Pick("", page.say("crop.not-said"), cured.isBlank()),
                new CropView.Pick("yes", page.say("crop.yes"), cured.equals("yes")),
                new CropView.Pick("no", page.say("crop.no"), cured.equals("no")));
    }
}
