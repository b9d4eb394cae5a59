package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.produce.Reason;
import org.wardon.sharing.Verdict;

/** Conflicts that a placing bears because its keeper accepts them, and what they cost. */
final class Accepted {
    private static final String RULE = "assumption";

    private final Sought sought;
    private final Money money;

    Accepted(Sought sought, Money money) {
        this.sought = sought;
        this.money = money;
    }

    List<Reason> told() {
        List<Reason> told = new ArrayList<>();
        for (int c = 0; c < sought.chambers().size(); c++) {
            Optional<Option> option = sought.chosen().get(c);
            List<Task.Item> items = sought.in(c);
            for (int i = 0; option.isPresent() && i < items.size(); i++) {
                if (items.get(i).lot().model().uncured()
                        && !option.get().chamber().coolers().isEmpty()) {
                    told.add(
                            new Reason(
                                    "place-bears-uncured",
                                    List.of(items.get(i).lot().id(), option.get().chamber().id()),
                                    List.of(),
                                    RULE));
                }
                for (int j = 0; j < i; j++) {
                    pair(option.get(), items.get(i), items.get(j), told);
                }
            }
        }
        return told;
    }

    private void pair(Option option, Task.Item one, Task.Item other, List<Reason> told) {
        if (!one.meets(other) || one.number() == other.number()) {
            return;
        }
        String chamber = option.chamber().id();
        if (Companions.odour(one, other).verdict() == Verdict.NO) {
            told.add(
                    new Reason(
                            "place-bears-smell",
                            List.of(one.lot().id(), other.lot().id(), chamber),
                            List.of(),
                            RULE));
        }
        ethylene(option, one, other, told);
        ethylene(option, other, one, told);
    }

    private void ethylene(Option option, Task.Item taker, Task.Item giver, List<Reason> told) {
        Cell cell = option.cell(taker.number());
        if (cell.refuses(option.cell(giver.number()))) {
            double loss = cell.lossBy(option.cell(giver.number()));
            told.add(
                    new Reason(
                            "place-bears-ethylene",
                            List.of(taker.lot().id(), giver.lot().id(), option.chamber().id()),
                            List.of(money.argument(loss)),
                            RULE));
        }
    }
}
