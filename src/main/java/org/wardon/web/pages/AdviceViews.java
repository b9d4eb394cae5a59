package org.wardon.web.pages;

import java.time.Clock;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
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

    /** So many cautions of a level, reasons of a chamber and things to do are told one by one. */
    private static final int CAUTIONS_SHOWN = 30;

    /** So many cautions, or kinds of them, lead the page; of dangers all do. */
    private static final int CAUTIONS_FIRST = 5;

    /** So few more are not worth the way to the list. */
    private static final int CAUTIONS_FEW = 2;

    private static final int REASONS_SHOWN = 12;
    private static final int ACTIONS_SHOWN = 12;

    /** So few more are not worth a page of their own. */
    private static final int ACTIONS_FEW = 6;

    private final StoreAdvice advice;
    private final StorePlan plan;
    private final Forecast forecast;
    private final OpenPlan open;
    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final LocalDateTime today;
    private final LotCards cards;

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
        this.cards = new LotCards(advice, open, words, frame, today);
    }

    AllChambersView allChambers() {
        List<CautionView> cautions = brief("caution");
        return new AllChambersView(
                plan.name(),
                say.say(
                        "chambers.span",
                        figures.figure(plan.days(), "day"),
                        figures.time(plan.from())),
                Optional.empty(),
                Optional.empty(),
                List.of(),
                leading(cautions),
                cautions.size(),
                moreCautions(cautions.size()),
                actions().stream().limit(actionsShown()).toList(),
                moreActions(),
                forecast.chambers().stream().map(this::chamber).toList(),
                cards.brief(Optional.empty()),
                money(),
                open.kept().id());
    }

    static boolean isDetail(Forecast.Warning warning) {
        return warning.level().equals("note")
                && DETAILS.stream().anyMatch(code -> warning.code().startsWith(code));
    }

    /**
     * Returns what is to be told at a level, but for what figures rest on.
     *
     * @param level {@code danger}, {@code caution} or {@code note}
     * @return in the order of the forecast
     */
    public List<Telling> told(String level) {
        return forecast.warnings().stream()
                .filter(warning -> warning.level().equals(level) && !isDetail(warning))
                .map(Tellings::of)
                .toList();
    }

    /** What leads the page: all dangers, the first cautions, all notes. */
    private List<CautionView> leading(List<CautionView> cautions) {
        return Stream.of(
                        brief("danger"),
                        cautions.subList(0, cautionsShown(cautions.size())),
                        brief("note"))
                .flatMap(List::stream)
                .toList();
    }

    private List<CautionView> brief(String level) {
        String path = Room.CHAMBERS.path(open.kept().id()) + "/" + listOf(level);
        return new Tellings(say, figures)
                .brief(told(level), CAUTIONS_SHOWN, code -> path + "?of=" + code);
    }

    private static int cautionsShown(int all) {
        return all <= CAUTIONS_FIRST + CAUTIONS_FEW ? all : CAUTIONS_FIRST;
    }

    private Optional<MoreView> moreCautions(int all) {
        int more = all - cautionsShown(all);
        String path = Room.CHAMBERS.path(open.kept().id()) + "/cautions";
        return more == 0
                ? Optional.empty()
                : Optional.of(
                        new MoreView(
                                say.say("cautions.rest", String.valueOf(more)),
                                new LinkView(path, say.say("cautions.all"))));
    }

    private static String listOf(String level) {
        return level.equals("note") ? "notes" : "cautions";
    }

    /**
     * Returns what is to be done.
     *
     * @return sentences, what comes first at the head
     */
    public List<String> actions() {
        return forecast.actions().stream().map(this::action).toList();
    }

    /** All, unless the rest would be worth a page of its own. */
    private int actionsShown() {
        int all = forecast.actions().size();
        return all <= ACTIONS_SHOWN + ACTIONS_FEW ? all : ACTIONS_SHOWN;
    }

    private Optional<MoreView> moreActions() {
        int more = forecast.actions().size() - actionsShown();
        String path = Room.CHAMBERS.path(open.kept().id()) + "/actions?from=";
        return more == 0
                ? Optional.empty()
                : Optional.of(
                        new MoreView(
                                "",
                                new LinkView(
                                        path + (actionsShown() + 1),
                                        say.say("actions.more", String.valueOf(more)))));
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
                because(chamber.id()),
                cards.brief(Optional.of(chamber.id())),
                chart(chamber.id()));
    }

    private List<CautionView> because(String chamber) {
        String path = Room.CHAMBERS.path(open.kept().id()) + "/chamber/" + chamber;
        return new Tellings(say, figures)
                .brief(reasons(chamber), REASONS_SHOWN, code -> path + "/company?of=" + code);
    }

    /**
     * Returns why the lots of a chamber may share it or not.
     *
     * @param chamber its id
     * @return in the order of the forecast
     */
    public List<Telling> reasons(String chamber) {
        return forecast.sharing().stream()
                .filter(one -> one.chamber().equals(chamber))
                .flatMap(one -> one.reasons().stream())
                .map(Tellings::of)
                .toList();
    }

    /**
     * Returns lots at a glance.
     *
     * @return the cards of all lots
     */
    public LotCards cards() {
        return cards;
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

    private ChartView chart(String chamber) {
        return new ChartView(
                say.say("chart.title", chamber),
                "/api/plans/" + open.kept().id() + "/chambers/" + chamber + "/curves/air",
                "airC outdoorC setting",
                new AirTable(advice.air(chamber), figures, say).byDay(chamber),
                "");
    }
}
