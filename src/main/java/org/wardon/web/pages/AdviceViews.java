package org.wardon.web.pages;

import java.time.Clock;
import java.time.LocalDateTime;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.Quantiles;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.web.work.OpenPlan;

/** Turns advice on a store into what pages show. */
public final class AdviceViews {
    /** Codes of what figures rest on, for those who ask: the notes of the command line. */
    private static final List<String> DETAILS =
            List.of("default-taken", "life-", "chilling-floor", "chilling-band", "chilling-dose");

    private final StoreAdvice advice;
    private final StorePlan plan;
    private final Forecast forecast;
    private final OpenPlan open;
    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final LocalDateTime today;

    /**
     * Prepares the views.
     *
     * @param advice the advice
     * @param open the plan it is on
     * @param words words of reasons
     * @param frame frame of the page
     * @param clock tells the day
     */
    public AdviceViews(StoreAdvice advice, OpenPlan open, Words words, Frame frame, Clock clock) {
        this.advice = advice;
        this.plan = advice.plan();
        this.forecast = advice.forecast();
        this.open = open;
        this.words = words;
        this.say = frame.words();
        this.figures = frame.figures();
        LocalDateTime now = LocalDateTime.ofInstant(clock.instant(), plan.site().zone());
        LocalDateTime end = plan.from().plusMinutes(Math.round(plan.days() * 24 * 60));
        this.today = now.isBefore(plan.from()) || now.isAfter(end) ? plan.from() : now;
    }

    AllChambersView allChambers() {
        return new AllChambersView(
                plan.name(),
                say.say(
                        "chambers.span",
                        figures.figure(plan.days(), "day"),
                        figures.time(plan.from())),
                Optional.empty(),
                Optional.empty(),
                List.of(),
                forecast.warnings().stream().filter(w -> !detail(w)).map(this::caution).toList(),
                forecast.actions().stream().map(this::action).toList(),
                forecast.chambers().stream().map(this::chamber).toList(),
                lots(lot -> lot.chamber().isEmpty()),
                money(),
                open.kept().id());
    }

    private static boolean detail(Forecast.Warning warning) {
        return warning.level().equals("note")
                && DETAILS.stream().anyMatch(code -> warning.code().startsWith(code));
    }

    private CautionView caution(Forecast.Warning warning) {
        return new CautionView(warning.level(), figures.text(warning.text()), warning.source());
    }

    private String action(Forecast.Action action) {
        String gain =
                action.gainValue().isPresent()
                        ? " " + say.say("action.gains", money(action.gainValue().getAsDouble()))
                        : "";
        return figures.text(action.text()) + gain;
    }

    private String money(double value) {
        return String.format(Locale.ROOT, "%,.0f %s", value, plan.prices().currency())
                .replace(',', ' ')
                .strip();
    }

    private String money() {
        Forecast.Value value = forecast.value();
        return value.kept() == 0 && value.energyCost() == 0
                ? ""
                : say.say(
                        "chambers.money",
                        money(value.kept()),
                        money(value.energyCost()),
                        money(value.net()));
    }

    /**
     * Returns a chamber as it leads a page.
     *
     * @param chamber its forecast
     * @return the view
     */
    public ChamberView chamber(ChamberForecast chamber) {
        List<Reason> why = advice.whyNotHeld(chamber.id());
        Optional<Forecast.Sharing> sharing =
                forecast.sharing().stream()
                        .filter(one -> one.chamber().equals(chamber.id()))
                        .findFirst();
        return new ChamberView(
                chamber.id(),
                chamber.holds(),
                figures.text(sentence(chamber, why)),
                why.stream().skip(1).map(this::sentence).toList(),
                new StripOfDays(advice.air(chamber.id()), figures, say)
                        .view(say.say("strip.title", chamber.id())),
                facts(chamber),
                (int)
                        Math.round(
                                100
                                        * fullestKg(chamber.id())
                                        / plan.getChamber(chamber.id()).capacityKg()),
                sharing.map(one -> words.text("verdict." + one.verdict())),
                sharing.map(one -> one.reasons().stream().map(this::because).toList())
                        .orElse(List.of()),
                lots(lot -> lot.chamber().equals(Optional.of(chamber.id()))),
                chart(chamber.id()));
    }

    private String because(Because because) {
        return figures.text(because.text());
    }

    private String sentence(Reason reason) {
        return figures.text(words.sentence(reason)) + ".";
    }

    private String sentence(ChamberForecast chamber, List<Reason> why) {
        if (plan.getChamber(chamber.id()).off()) {
            return chamber.holds()
                    ? say.say("chamber.off")
                    : say.say("chamber.off-not", words.sentence(why.get(0)));
        }
        String set = set(plan.getChamber(chamber.id()));
        return chamber.holds()
                ? say.say("chamber.holds", set)
                : say.say("chamber.holds-not", set, words.sentence(why.get(0)));
    }

    private String set(ChamberPlan chamber) {
        String all = words.units().temperature(advice.settingC(chamber.id()));
        for (SettingChange change : chamber.use().changes()) {
            String from = figures.time(change.from());
            String to = words.units().temperature(change.temperatureC());
            all = say.say("chamber.then", all, from, to);
        }
        return all;
    }

    private List<FactView> facts(ChamberForecast chamber) {
        ChamberPlan planned = plan.getChamber(chamber.id());
        String capacity = figures.mass(planned.capacityKg());
        String intake =
                chamber.intakeKgPerDay().isPresent()
                        ? figures.mass(chamber.intakeKgPerDay().getAsDouble())
                        : say.say("chamber.intake-none");
        return List.of(
                new FactView(
                        say.say("chamber.in-it", figures.day(today.toLocalDate())),
                        say.say("chamber.of", figures.mass(massKg(chamber.id(), today)), capacity)),
                new FactView(
                        say.say("chamber.fullest"),
                        say.say("chamber.of", figures.mass(fullestKg(chamber.id())), capacity)),
                new FactView(say.say("chamber.intake"), intake),
                new FactView(
                        say.say("chamber.air"),
                        say.say(
                                "chamber.air-value",
                                figures.temperature(chamber.airC().min()),
                                figures.temperature(chamber.airC().max()),
                                figures.figure(chamber.humidityPct().mean(), "pct"))));
    }

    /** Mass in a chamber at a time; lots that move count where they arrived until they move. */
    private double massKg(String chamber, LocalDateTime at) {
        return plan.lots().stream()
                .filter(lot -> !lot.arrives().isAfter(at) && lot.leaves().isAfter(at))
                .filter(lot -> chamberAt(lot, at).equals(Optional.of(chamber)))
                .mapToDouble(LotPlan::massKg)
                .sum();
    }

    private static Optional<String> chamberAt(LotPlan lot, LocalDateTime at) {
        Optional<String> chamber = lot.chamber();
        for (var move : lot.moves()) {
            if (!move.at().isAfter(at)) {
                chamber = Optional.of(move.to());
            }
        }
        return chamber;
    }

    private double fullestKg(String chamber) {
        double fullest = massKg(chamber, plan.from());
        for (LotPlan lot : plan.lots()) {
            fullest = Math.max(fullest, massKg(chamber, lot.arrives()));
            for (var move : lot.moves()) {
                fullest = Math.max(fullest, massKg(chamber, move.at()));
            }
        }
        return fullest;
    }

    private List<LotCardView> lots(java.util.function.Predicate<LotForecast> which) {
        return forecast.lots().stream()
                .filter(which)
                .sorted(Comparator.comparing(LotForecast::leaveBy))
                .map(this::lot)
                .toList();
    }

    private LotCardView lot(LotForecast lot) {
        LotPlan planned =
                plan.lots().stream()
                        .filter(one -> one.id().equals(lot.id()))
                        .findFirst()
                        .orElseThrow();
        return new LotCardView(
                lot.id(),
                crop(planned),
                figures.mass(planned.massKg()),
                figures.day(lot.leaveBy().toLocalDate()),
                RangeView.days(lot.daysLeft(), words, figures),
                words.text("mechanism." + lot.limitedBy()),
                gained(lot.daysGained()),
                lot.hangsOn().map(on -> words.text("hangs-on." + on.range())).stream().toList(),
                lot.leaveBy().isBefore(today.plusDays(1)));
    }

    private String crop(LotPlan lot) {
        String name = open.book().get(lot.commodity()).names().get(0);
        return lot.variant().map(variant -> name + ", " + variant).orElse(name);
    }

    private String gained(Quantiles days) {
        String size = figures.figure(Math.abs(days.p50()), "day");
        return days.p50() < 0 ? say.say("lot.loses", size) : say.say("lot.gains", size);
    }

    private ChartView chart(String chamber) {
        return new ChartView(
                say.say("chart.title", chamber),
                "/api/plans/" + open.kept().id() + "/chambers/" + chamber + "/curves/air",
                "airC outdoorC setting",
                new AirTable(advice.air(chamber), figures, say).byDay(chamber),
                "");
    }
}
