package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Place;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.sharing.Verdict;

/** What it would cost a lot to stand in another chamber, all else staying as proposed. */
final class Elsewhere {
    private static final String RULE = "assumption";
    private static final double SAME_DAYS = 0.05;
    private static final double NOTHING = 0.5;

    private final StoreTrial trial;
    private final Sought sought;
    private final Money money;

    Elsewhere(StoreTrial trial, Sought sought, Money money) {
        this.trial = trial;
        this.sought = sought;
        this.money = money;
    }

    /**
     * What is told of one lot and one other chamber.
     *
     * @param reason the sentence
     * @param days days it would lose, where it could stand there
     * @param value value it would lose, likewise
     */
    record Cost(Reason reason, OptionalDouble days, OptionalDouble value) {
        static Cost not(Reason reason) {
            return new Cost(reason, OptionalDouble.empty(), OptionalDouble.empty());
        }
    }

    /** The way a chamber is used, or would best be used for a lot while it is off. */
    private Optional<Option> option(int chamber, Task.Item item, List<Option> known) {
        return sought.chosen()
                .get(chamber)
                .or(
                        () ->
                                known.stream()
                                        .filter(o -> o.cell(item.number()).allowed())
                                        .max(
                                                Comparator.comparingDouble(
                                                        o -> Sought.alone(o, item))));
    }

    Cost of(int number, int here, int chamber, List<Option> known) {
        Task.Item item = sought.task().items().get(number);
        String lot = item.lot().id();
        ChamberPlan there = sought.chambers().get(chamber);
        Optional<Option> found = option(chamber, item, known);
        if (found.isEmpty()) {
            return Cost.not(say("elsewhere-lost", lot, there.id()));
        }
        Option option = found.get();
        List<Task.Item> others = others(chamber, item);
        Optional<Reason> barred = barred(item, option, others);
        if (barred.isPresent()) {
            return Cost.not(barred.get());
        }
        Optional<Option> now = here < 0 ? Optional.empty() : sought.chosen().get(here);
        if (now.isEmpty()) {
            double worth = with(option, item, others);
            return new Cost(
                    say("elsewhere-worth", lot, there.id(), at(option), money.argument(worth)),
                    OptionalDouble.empty(),
                    OptionalDouble.empty());
        }
        double days = days(now.get(), item) - days(option, item);
        double value = with(now.get(), item, others(here, item)) - with(option, item, others);
        return new Cost(
                cost(lot, there.id(), option, days, value),
                OptionalDouble.of(days),
                OptionalDouble.of(value));
    }

    private Reason cost(String lot, String there, Option option, double days, double value) {
        boolean off = sought.chosen().stream().noneMatch(Optional.of(option)::equals);
        if (off) {
            return say(
                    "elsewhere-off",
                    lot,
                    there,
                    at(option),
                    money.argument(-value),
                    money.argument(option.figures().idleCost()));
        }
        if (Math.abs(value) < NOTHING) {
            return say("elsewhere-alike", lot, there, at(option));
        }
        if (value <= 0) {
            return say("elsewhere-more", lot, there, at(option), money.argument(-value));
        }
        return Math.abs(days) < SAME_DAYS
                ? say("elsewhere-same-days", lot, there, at(option), money.argument(value))
                : say(
                        days > 0 ? "elsewhere-costs" : "elsewhere-costs-longer",
                        lot,
                        there,
                        at(option),
                        Argument.of(Math.abs(days), "day"),
                        money.argument(value));
    }

    private double days(Option option, Task.Item item) {
        return option.cell(item.number()).daysStaying(trial).p50();
    }

    private List<Task.Item> others(int chamber, Task.Item item) {
        List<Task.Item> others = new ArrayList<>(sought.in(chamber));
        others.remove(item);
        return others;
    }

    private double with(Option option, Task.Item item, List<Task.Item> others) {
        double worth = Sought.alone(option, item);
        for (Task.Item other : others) {
            double loss = sought.companions().loss(option, item, other);
            worth -= Double.isFinite(loss) ? loss : 0;
        }
        return worth;
    }

    private Optional<Reason> barred(Task.Item item, Option option, List<Task.Item> others) {
        String lot = item.lot().id();
        String there = option.chamber().id();
        switch (option.cell(item.number()).forbidden()) {
            case UNCURED -> {
                return Optional.of(say("elsewhere-uncured", lot, there));
            }
            case FREEZING -> {
                return Optional.of(freezing(item, option));
            }
            case LOST -> {
                return Optional.of(say("elsewhere-lost", lot, there));
            }
            default -> {
                return apart(item, option, others).or(() -> full(item, option, others));
            }
        }
    }

    private static Reason freezing(Task.Item item, Option option) {
        boolean blown = item.lot().plan().place() == Place.NEAR_COOLER;
        double belowK = Option.swingK(option.chamber()) + (blown ? option.figures().blastK() : 0);
        return say(
                blown ? "elsewhere-freezing-blast" : "elsewhere-freezing",
                item.lot().id(),
                option.chamber().id(),
                at(option),
                Argument.of(belowK, "K"),
                Argument.of(item.lot().model().freezingC(), "C"));
    }

    private Optional<Reason> apart(Task.Item item, Option option, List<Task.Item> others) {
        for (Task.Item other : others) {
            if (Double.isInfinite(sought.companions().loss(option, item, other))) {
                boolean smells = Companions.odour(item, other).verdict() == Verdict.NO;
                return Optional.of(
                        new Reason(
                                smells ? "elsewhere-smell" : "elsewhere-ethylene",
                                List.of(item.lot().id(), option.chamber().id(), other.lot().id()),
                                List.of(at(option)),
                                RULE));
            }
        }
        return Optional.empty();
    }

    private Optional<Reason> full(Task.Item item, Option option, List<Task.Item> others) {
        String lot = item.lot().id();
        String there = option.chamber().id();
        double[] heat = new double[trial.days()];
        double[] mass = new double[trial.days()];
        List<Task.Item> all = new ArrayList<>(others);
        all.add(item);
        for (Task.Item one : all) {
            double[] gives = option.cell(one.number()).there().heatW(heat.length);
            for (int day = one.firstDay(); day <= one.lastDay(); day++) {
                heat[day] += gives[day];
                mass[day] += one.lot().plan().massKg();
            }
        }
        for (int day = item.firstDay(); day <= item.lastDay(); day++) {
            double most = option.chamber().capacityKg();
            if (mass[day] > most) {
                double over = mass[day] - most;
                return Optional.of(say("elsewhere-full", lot, there, Argument.of(over, "kg")));
            }
            double over = heat[day] - option.takesW().get(day);
            if (over > 1) {
                return Optional.of(
                        say("elsewhere-heat", lot, there, at(option), Argument.of(over, "W")));
            }
        }
        return Optional.empty();
    }

    private static Argument at(Option option) {
        return Argument.of(option.riseK() > 0 ? option.figures().meanC() : option.settingC(), "C");
    }

    private static Reason say(String code, String lot, String chamber, Argument... arguments) {
        return new Reason(code, List.of(lot, chamber), List.of(arguments), RULE);
    }
}
