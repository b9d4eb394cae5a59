package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.files.forecast.PlaceAnswer.Worth;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What one more chamber or one kelvin would be worth, by what is assumed of the chambers. */
final class Gains {
    private static final String RULE = "assumption";
    private static final String MORE = "-one-more";
    private static final int LONGEST_ID = 40;

    private final StoreTrial trial;
    private final Options options;
    private final Draft draft;
    private final Money money;

    Gains(StoreTrial trial, Options options, Draft draft, Money money) {
        this.trial = trial;
        this.options = options;
        this.draft = draft;
        this.money = money;
    }

    /** The same lots a kelvin colder and warmer, chamber by chamber. */
    List<Said<Worth>> kelvins(Sought sought) {
        List<Said<Worth>> worth = new ArrayList<>();
        for (int c = 0; c < sought.chambers().size(); c++) {
            Optional<Option> now = sought.chosen().get(c);
            if (now.isPresent()
                    && now.get().riseK() == 0
                    && !now.get().changes()
                    && !sought.in(c).isEmpty()) {
                worth.add(kelvin(sought, c, now.get(), -1));
                worth.add(kelvin(sought, c, now.get(), 1));
            }
        }
        return worth;
    }

    private Said<Worth> kelvin(Sought sought, int chamber, Option now, int kelvin) {
        Option beside =
                options.of(List.of(Options.Dial.at(now.chamber(), now.settingC() + kelvin))).get(0);
        Option base = options.of(List.of(Options.Dial.at(now.chamber(), now.settingC()))).get(0);
        double gain =
                sought.assumed(beside, sought.in(chamber))
                        - sought.assumed(base, sought.in(chamber));
        String id = now.chamber().id();
        Argument at = Argument.of(now.settingC() + kelvin, "C");
        Reason reason =
                Reason.about(
                        gain > 0 ? "kelvin-gains" : "kelvin-costs",
                        id,
                        RULE,
                        at,
                        money.argument(Math.abs(gain)));
        String what = kelvin < 0 ? "kelvin-colder" : "kelvin-warmer";
        return new Said<>(text -> new Worth(id, what, gain, text), reason);
    }

    /** The store with a copy of the chamber that brings most. */
    Optional<Said<Worth>> oneMore(Sought sought, Map<String, List<Option>> known) {
        Optional<ChamberPlan> best = best(sought);
        if (best.isEmpty()) {
            return Optional.empty();
        }
        String id = best.get().id();
        String copy = (id.length() > LONGEST_ID - MORE.length() ? "chamber" : id) + MORE;
        List<ChamberPlan> chambers = new ArrayList<>(trial.plan().chambers());
        chambers.add(best.get().named(copy));
        Map<String, List<Option>> more = new LinkedHashMap<>(known);
        more.put(copy, known.getOrDefault(id, List.of()).stream().map(o -> o.named(copy)).toList());
        PlaceWish.Aim aim = PlaceWish.Aim.MOST_VALUE;
        double before = draft.seek(trial.plan().chambers(), known, aim, 1).assumed();
        double after = draft.seek(chambers, more, aim, 1).assumed();
        double gain = Math.max(0, after - before);
        Reason reason = Reason.about("one-more-chamber", id, RULE, money.argument(gain));
        return Optional.of(
                new Said<>(text -> new Worth(id, "one-more-chamber", gain, text), reason));
    }

    private static Optional<ChamberPlan> best(Sought sought) {
        Optional<ChamberPlan> best = Optional.empty();
        double most = Double.NEGATIVE_INFINITY;
        for (int c = 0; c < sought.chambers().size(); c++) {
            Optional<Option> option = sought.chosen().get(c);
            if (option.isPresent()) {
                double worth = sought.assumed(option.get(), sought.in(c));
                if (worth > most) {
                    most = worth;
                    best = Optional.of(sought.chambers().get(c));
                }
            }
        }
        return best;
    }
}
