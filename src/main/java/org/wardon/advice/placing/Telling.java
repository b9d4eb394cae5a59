package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.Tried;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.files.forecast.PlaceAnswer.Choice;
import org.wardon.files.forecast.PlaceAnswer.Placed;
import org.wardon.files.forecast.PlaceAnswer.Unplaced;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.SettingChange;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Tells a placing: what goes where and why, what is to be done, and how good it is. */
final class Telling {
    private static final String RULE = "assumption";

    private final StoreTrial trial;
    private final Options options;
    private final Draft draft;
    private final Coupling coupling;
    private final Money money;

    Telling(StoreTrial trial, Options options, Draft draft, Coupling coupling) {
        this.trial = trial;
        this.options = options;
        this.draft = draft;
        this.coupling = coupling;
        money = new Money(trial.plan().prices().currency());
    }

    Told of(Candidate best, Candidate present, boolean small) {
        Sought sought = best.sought();
        Tried tried = best.tried();
        Sought last =
                draft.seek(trial.plan().chambers(), coupling.known(), PlaceWish.Aim.MOST_VALUE, 1);
        double value = tried.net();
        double bound = Math.max(last.bound(), value);
        double gap = bound > 0 ? 100 * (bound - value) / bound : 0;
        Changes changes = new Changes(trial.plan(), tried);
        List<Said<PlaceAnswer.Worth>> worth = new ArrayList<>();
        Gains gains = new Gains(trial, options, draft, money);
        if (small) {
            gains.oneMore(sought, coupling.known()).ifPresent(worth::add);
            worth.addAll(gains.kelvins(sought));
        }
        return new Told(
                new Told.Figures(
                        value,
                        bound,
                        gap,
                        trial.plan().wish().aim().word(),
                        sought.assumed(),
                        present.tried().net(),
                        last.proven(),
                        told(value, bound, gap, last.proven())),
                chambers(sought, tried),
                unplaced(sought),
                because(sought, tried),
                changes.moves(),
                changes.settings(),
                worth,
                notes(sought, tried, changes.ways()));
    }

    private Reason told(double value, double bound, double gap, boolean proven) {
        Argument[] arguments = {
            money.argument(bound), money.argument(value), Argument.of(gap, "pct")
        };
        String code = gap < 0.05 ? "place-at-bound" : proven ? "place-proven" : "place-gap";
        return new Reason(code, List.of(), List.of(arguments), RULE);
    }

    private List<Said<Placed>> chambers(Sought sought, Tried tried) {
        List<Said<Placed>> placed = new ArrayList<>();
        for (int c = 0; c < tried.plan().chambers().size(); c++) {
            ChamberPlan chamber = tried.plan().chambers().get(c);
            var course = Objects.requireNonNull(tried.chambers().get(chamber.id()));
            double airC = DayMeans.whole(course.hours(), course.hours()::airC);
            List<String> lots =
                    sought.in(c).stream().map(item -> item.lot().id()).distinct().toList();
            PlaceAnswer.Dial dial = Arranged.dial(chamber);
            placed.add(
                    new Said<>(
                            text -> new Placed(chamber.id(), dial, chamber.off(), airC, lots, text),
                            chamber(chamber, airC, lots, tried)));
        }
        return placed;
    }

    private Reason chamber(ChamberPlan chamber, double airC, List<String> lots, Tried tried) {
        if (chamber.off()) {
            return Reason.about("place-off", chamber.id(), RULE);
        }
        double kept =
                lots.stream()
                        .filter(tried.lots()::containsKey)
                        .mapToDouble(id -> tried.lot(id).valueKept())
                        .sum();
        if (chamber.coolers().isEmpty()) {
            return Reason.about(
                    "place-passive",
                    chamber.id(),
                    RULE,
                    Argument.of(airC, "C"),
                    money.argument(kept));
        }
        List<SettingChange> later = chamber.use().changes();
        List<Argument> told = new ArrayList<>();
        told.add(Argument.of(chamber.setting().temperatureC(), "C"));
        told.add(Argument.of(airC, "C"));
        told.add(money.argument(kept));
        if (!later.isEmpty()) {
            told.add(Changes.when(later.get(0)));
            told.add(Argument.of(later.get(0).temperatureC(), "C"));
        }
        String code =
                later.isEmpty()
                        ? "place-set"
                        : later.size() > 1 ? "place-set-on" : "place-set-then";
        return Reason.about(code, chamber.id(), RULE, told.toArray(new Argument[0]));
    }

    private List<Said<Unplaced>> unplaced(Sought sought) {
        List<Said<Unplaced>> left = new ArrayList<>();
        for (int number : sought.placing().unplaced()) {
            Task.Item item = sought.task().items().get(number);
            left.add(unplaced(item.lot().id(), whyNowhere(item)));
        }
        for (String id : sought.task().outside()) {
            left.add(unplaced(id, Reason.about("unplaced-outside", id, RULE)));
        }
        return left;
    }

    private static Said<Unplaced> unplaced(String id, Reason reason) {
        return new Said<>(text -> new Unplaced(id, text), reason);
    }

    private Reason whyNowhere(Task.Item item) {
        String id = item.lot().id();
        Optional<Option> best = Optional.empty();
        boolean uncured = false;
        for (List<Option> chamber : coupling.known().values()) {
            for (Option option : chamber) {
                Cell cell = option.cell(item.number());
                uncured |= cell.forbidden() == Cell.Forbidden.UNCURED;
                boolean better =
                        cell.allowed()
                                && best.map(b -> Sought.alone(option, item) > Sought.alone(b, item))
                                        .orElse(true);
                best = better ? Optional.of(option) : best;
            }
        }
        if (best.isEmpty()) {
            return Reason.about(uncured ? "unplaced-uncured" : "unplaced-lost", id, RULE);
        }
        return new Reason(
                "unplaced-no-room",
                List.of(id, best.get().chamber().id()),
                List.of(
                        money.argument(Sought.alone(best.get(), item)),
                        Argument.of(best.get().figures().meanC(), "C")),
                RULE);
    }

    private List<Said<Choice>> because(Sought sought, Tried tried) {
        Elsewhere elsewhere = new Elsewhere(trial, sought, money);
        return IntStream.range(0, sought.task().items().size())
                .parallel()
                .filter(i -> sought.task().items().get(i).whole())
                .boxed()
                .flatMap(i -> because(i, sought, tried, elsewhere).stream())
                .toList();
    }

    private List<Said<Choice>> because(
            int number, Sought sought, Tried tried, Elsewhere elsewhere) {
        Task.Item item = sought.task().items().get(number);
        int here = sought.chamberOf(number).orElse(-1);
        List<Said<Choice>> choices = new ArrayList<>();
        String lot = item.lot().id();
        if (here >= 0 && tried.lots().containsKey(lot)) {
            choices.add(here(item, sought.chambers().get(here).id(), tried.lot(lot)));
        }
        for (int c = 0; c < sought.chambers().size(); c++) {
            if (c != here) {
                String chamber = sought.chambers().get(c).id();
                List<Option> known = coupling.known().getOrDefault(chamber, List.of());
                Elsewhere.Cost cost = elsewhere.of(number, here, c, known);
                choices.add(
                        new Said<>(
                                text ->
                                        new Choice(
                                                lot,
                                                chamber,
                                                false,
                                                cost.days(),
                                                cost.value(),
                                                text),
                                cost.reason()));
            }
        }
        return choices;
    }

    private Said<Choice> here(Task.Item item, String chamber, Tried.OfLot lot) {
        Reason reason =
                new Reason(
                        item.isFixed() ? "placed-stays" : "placed-here",
                        List.of(item.lot().id(), chamber),
                        List.of(
                                Argument.of(lot.daysLeft().p50(), "day"),
                                Argument.of(100 * lot.shareSound(), "pct"),
                                money.argument(lot.valueKept()),
                                Argument.text(lot.limitedBy().word())),
                        RULE);
        String id = item.lot().id();
        return new Said<>(
                text ->
                        new Choice(
                                id,
                                chamber,
                                true,
                                OptionalDouble.empty(),
                                OptionalDouble.empty(),
                                text),
                reason);
    }

    private List<Reason> notes(Sought sought, Tried tried, List<Reason> ways) {
        List<Reason> reasons = new ArrayList<>(ways);
        reasons.addAll(new Accepted(sought, money).told());
        reasons.addAll(0, PlaceCautions.of(tried));
        if (trial.lots().stream().allMatch(l -> l.plan().market().pricePerKg() == 0)) {
            reasons.add(new Reason("place-no-prices", List.of(), List.of(), RULE));
        }
        return reasons;
    }
}
