package org.wardon.sharing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Paces;
import org.wardon.keeping.Purpose;
import org.wardon.keeping.ethylene.Response;
import org.wardon.keeping.ethylene.Stage;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.EthyleneEffect;
import org.wardon.produce.rows.OdourPair;

/** What two lots do to each other beside the setting: ethylene and smell. */
final class Conflicts {
    private static final String ANY = "any";

    /** What would refuse, by what it is called where its keeper accepts it. */
    private static final Map<String, String> BORNE =
            Map.of(
                    "ethylene-shortens", "ethylene-shortens-accepted",
                    "ethylene-starts-ripening", "ethylene-starts-ripening-accepted",
                    "odour", "odour-accepted",
                    "odour-of-all", "odour-of-all-accepted");

    private final Set<Conflict> accepted;
    private final List<Reason> reasons = new ArrayList<>();
    private Verdict verdict = Verdict.GOOD;

    Conflicts() {
        this(Set.of());
    }

    /** What is accepted is told and forbids nothing. */
    Conflicts(Set<Conflict> accepted) {
        this.accepted = accepted;
    }

    Verdict verdict() {
        return verdict;
    }

    List<Reason> reasons() {
        return reasons;
    }

    private void say(Conflict conflict, Verdict at, Reason reason) {
        boolean borne = at == Verdict.NO && accepted.contains(conflict);
        verdict = verdict.worse(borne ? Verdict.TOLERABLE : at);
        reasons.add(
                borne ? named(reason, Objects.requireNonNull(BORNE.get(reason.code()))) : reason);
    }

    private static Reason named(Reason reason, String code) {
        return new Reason(code, reason.subjects(), reason.arguments(), reason.sourceId());
    }

    /**
     * Judges what a level of ethylene does to a lot.
     *
     * @param taker the lot and its days
     * @param model how it keeps
     * @param giverId the lot that gives most of it
     * @param ppm the level, µL/L
     * @param atC the temperature, °C
     * @param days days in that air; the market leg is not spent in it
     */
    void ethylene(
            Wish taker, KeepingModel model, String giverId, double ppm, double atC, double days) {
        starts(taker, model, giverId, ppm, atC);
        if (model.response().sensitive()) {
            Paces paces = model.paces(Draw.MEDIAN);
            double with = paces.perDay(Mechanism.ETHYLENE, atC, 1, ppm);
            double without = paces.perDay(Mechanism.ETHYLENE, atC, 1, 0);
            double cost = (with - without) * days;
            if (cost >= Limits.GOOD_ETHYLENE) {
                say(
                        Conflict.ETHYLENE,
                        cost < Limits.TOLERABLE_ETHYLENE ? Verdict.TOLERABLE : Verdict.NO,
                        reason(
                                "ethylene-shortens",
                                taker.lot().id(),
                                giverId,
                                Response.SOURCE_ID,
                                Argument.of(ppm, "ppm"),
                                Argument.of(100 * Math.min(1, cost), "pct")));
            }
        }
        disorders(taker, giverId, ppm);
    }

    private void starts(Wish taker, KeepingModel model, String giverId, double ppm, double atC) {
        OptionalDouble trigger = model.response().triggerPpm(Draw.MEDIAN);
        boolean green =
                Stage.judged(taker.lot().commodity(), taker.lot().door().ripeness())
                        == Ripeness.GREEN;
        if (trigger.isEmpty() || !green || !taker.lot().commodity().climacteric()) {
            return;
        }
        if (ppm > trigger.getAsDouble() && atC >= model.lowestSafeC()) {
            // Of fruit that is to be sold ripe, only the days that are lost count.
            boolean ripe = taker.lot().door().purpose().equals(Optional.of(Purpose.SELL_RIPE));
            say(
                    Conflict.ETHYLENE,
                    ripe ? Verdict.TOLERABLE : Verdict.NO,
                    reason(
                            "ethylene-starts-ripening",
                            taker.lot().id(),
                            giverId,
                            "BURG1962",
                            Argument.of(ppm, "ppm"),
                            Argument.of(trigger.getAsDouble(), "ppm")));
        }
    }

    private void disorders(Wish taker, String giverId, double ppm) {
        for (EthyleneEffect effect : taker.lot().commodity().company().ethyleneEffects()) {
            double threshold = effect.thresholdPpm().map(fact -> fact.lowest()).orElse(Double.NaN);
            if (Response.isDisorder(effect) && ppm >= threshold) {
                say(
                        Conflict.ETHYLENE,
                        Verdict.TOLERABLE,
                        reason(
                                "ethylene-disorder",
                                taker.lot().id(),
                                giverId,
                                effect.sourceId(),
                                Argument.of(ppm, "ppm"),
                                Argument.of(threshold, "ppm"),
                                Argument.text(effect.effect())));
            }
        }
    }

    /**
     * Judges whether one lot gives its smell to another.
     *
     * @param giver the lot that may give
     * @param taker the lot that may take
     * @param days days together
     */
    void odour(Wish giver, Wish taker, double days) {
        String giverId = giver.lot().commodity().id();
        String takerId = taker.lot().commodity().id();
        if (giverId.equals(takerId)) {
            return;
        }
        for (OdourPair pair : giver.lot().commodity().company().odours()) {
            if (pair.giverId().equals(giverId) && pair.takerId().equals(takerId)) {
                smell("odour", giver, taker, days, Limits.ODOUR_DAYS, pair.sourceId());
                return;
            }
        }
        for (OdourPair pair : giver.lot().commodity().company().odours()) {
            if (pair.giverId().equals(giverId) && pair.takerId().equals(ANY)) {
                smell(
                        "odour-of-all",
                        giver,
                        taker,
                        days,
                        Limits.GENERAL_ODOUR_DAYS,
                        pair.sourceId());
                return;
            }
        }
    }

    private void smell(
            String code, Wish giver, Wish taker, double days, double most, String sourceId) {
        say(
                Conflict.ODOUR,
                days <= most ? Verdict.TOLERABLE : Verdict.NO,
                reason(
                        code,
                        giver.lot().id(),
                        taker.lot().id(),
                        sourceId,
                        Argument.of(days, "day"),
                        Argument.of(most, "day")));
    }

    private static Reason reason(
            String code, String first, String second, String sourceId, Argument... arguments) {
        return new Reason(code, List.of(first, second), List.of(arguments), sourceId);
    }
}
