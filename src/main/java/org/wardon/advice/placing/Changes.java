package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.advice.forecast.Tried;
import org.wardon.files.forecast.PlaceAnswer.Change;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What is to be done against the plan as it stands. */
final class Changes {
    private static final String RULE = "assumption";

    private final StorePlan now;
    private final StorePlan then;
    private final Map<String, Double> reachedH;

    Changes(StorePlan now, Tried tried) {
        this.now = now;
        then = tried.plan();
        reachedH = tried.reachedH();
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
            ChamberPlan is = then.chambers().get(i);
            setting(was, is).ifPresent(reason -> changes.add(said(was.id(), reason)));
            if (!is.off() && !is.use().changes().equals(was.use().changes())) {
                later(is).forEach(reason -> changes.add(said(was.id(), reason)));
            }
        }
        return changes;
    }

    /** What it takes to come to what is dialled in now. */
    List<Reason> ways() {
        List<Reason> ways = new ArrayList<>();
        for (int i = 0; i < now.chambers().size(); i++) {
            way(now.chambers().get(i), then.chambers().get(i)).ifPresent(ways::add);
        }
        return ways;
    }

    /** How long the air needs from where it stands to what is dialled in. */
    private Optional<Reason> way(ChamberPlan was, ChamberPlan is) {
        boolean dialled = was.off() || is.setting().temperatureC() != was.setting().temperatureC();
        if (!dialled || is.off() || is.starts().isEmpty()) {
            return Optional.empty();
        }
        Argument fromC = Argument.of(is.starts().get().temperatureC(), "C");
        Argument toC = Argument.of(is.setting().temperatureC(), "C");
        Double hours = reachedH.get(is.id());
        if (hours != null && hours < 1) {
            return Optional.of(Reason.about("place-reached-soon", is.id(), RULE, fromC, toC));
        }
        return Optional.of(
                hours == null
                        ? Reason.about("place-not-reached", is.id(), RULE, fromC, toC)
                        : Reason.about(
                                "place-reached",
                                is.id(),
                                RULE,
                                fromC,
                                toC,
                                Argument.of(hours, "h")));
    }

    /** What is dialled in later, and until when what comes first stays. */
    private static List<Reason> later(ChamberPlan is) {
        return is.use().changes().stream()
                .map(
                        change ->
                                Reason.about(
                                        "place-dial-later",
                                        is.id(),
                                        RULE,
                                        when(change),
                                        Argument.of(change.temperatureC(), "C")))
                .toList();
    }

    /** From when a later setting is in force, in words. */
    static Argument when(SettingChange change) {
        return Argument.text(change.from().toLocalDate() + " at " + change.from().toLocalTime());
    }

    private static Optional<Reason> setting(ChamberPlan was, ChamberPlan is) {
        Argument at = Argument.of(is.setting().temperatureC(), "C");
        if (is.off() != was.off()) {
            return Optional.of(
                    is.off()
                            ? Reason.about("place-switch-off", is.id(), RULE)
                            : Reason.about("place-switch-on", is.id(), RULE, at));
        }
        boolean same = is.setting().temperatureC() == was.setting().temperatureC();
        if (is.off() || (same && is.use().changes().equals(was.use().changes()))) {
            return Optional.empty();
        }
        if (same) {
            String code = is.use().changes().isEmpty() ? "place-throughout" : "place-keep";
            return Optional.of(Reason.about(code, is.id(), RULE, at));
        }
        Argument before = Argument.of(was.setting().temperatureC(), "C");
        return Optional.of(Reason.about("place-dial", is.id(), RULE, at, before));
    }
}
