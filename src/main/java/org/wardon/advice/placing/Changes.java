package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.files.forecast.PlaceAnswer.Change;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What is to be done against the plan as it stands. */
final class Changes {
    private static final String RULE = "assumption";

    private final StorePlan now;
    private final StorePlan then;

    Changes(StorePlan now, StorePlan then) {
        this.now = now;
        this.then = then;
    }

    List<Said<Change>> moves() {
        List<Said<Change>> moves = new ArrayList<>();
        for (int i = 0; i < now.lots().size(); i++) {
            LotPlan lot = now.lots().get(i);
            Optional<String> from = lot.chamber();
            Optional<String> to = then.lots().get(i).chamber();
            if (!from.equals(to)) {
                moves.add(said(lot.id(), move(lot.id(), from, to)));
            }
        }
        return moves;
    }

    private static Said<Change> said(String subject, Reason reason) {
        return new Said<>(text -> new Change(subject, text), reason);
    }

    private static Reason move(String lot, Optional<String> from, Optional<String> to) {
        if (to.isEmpty()) {
            return new Reason("place-leave-out", List.of(lot, from.orElse("")), List.of(), RULE);
        }
        return from.isEmpty()
                ? new Reason("place-put", List.of(lot, to.get()), List.of(), RULE)
                : new Reason("place-move", List.of(lot, from.get(), to.get()), List.of(), RULE);
    }

    List<Said<Change>> settings() {
        List<Said<Change>> changes = new ArrayList<>();
        for (int i = 0; i < now.chambers().size(); i++) {
            ChamberPlan was = now.chambers().get(i);
            setting(was, then.chambers().get(i))
                    .ifPresent(reason -> changes.add(said(was.id(), reason)));
        }
        return changes;
    }

    private static Optional<Reason> setting(ChamberPlan was, ChamberPlan is) {
        Argument at = Argument.of(is.setting().temperatureC(), "C");
        if (is.off() != was.off()) {
            return Optional.of(
                    is.off()
                            ? Reason.about("place-switch-off", is.id(), RULE)
                            : Reason.about("place-switch-on", is.id(), RULE, at));
        }
        if (is.off() || is.setting().temperatureC() == was.setting().temperatureC()) {
            return Optional.empty();
        }
        Argument before = Argument.of(was.setting().temperatureC(), "C");
        return Optional.of(Reason.about("place-dial", is.id(), RULE, at, before));
    }
}
