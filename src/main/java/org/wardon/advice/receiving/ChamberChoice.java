package org.wardon.advice.receiving;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.IntStream;
import org.wardon.advice.Ranges;
import org.wardon.advice.forecast.ChamberTrial;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.ChillingRisk;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.heat.Hours;
import org.wardon.keeping.Outlook;
import org.wardon.plan.Defaults;
import org.wardon.produce.Caution;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.sharing.Verdict;

/**
 * The new lot in one chamber.
 *
 * <p>The verdict is the worst of: what the chamber's air does to the lot and to those beside it,
 * where they come off worse than without it; whether the chamber goes on holding (no where its air
 * leaves the band through the lot, tolerable where lots cool or warm more than they should); a lot
 * already lost that loses a tenth more of its days is tolerable; no room is no, and so is a chamber
 * more than 5 K colder than the lot is still to be cured at (these rules are ours).
 */
final class ChamberChoice {
    private static final double NOTICED_K = 0.5;
    private static final double NOTABLE_LOSS = 0.1;
    private static final double COLDER_THAN_CURING_K = 5;
    private static final String RULE = "assumption";
    private static final Set<String> BREAKS =
            Set.of(
                    "never-pulled-down",
                    "air-outside-band",
                    "near-freezing",
                    "no-power-daily",
                    "battery-runs-out");

    private final Question question;
    private final ChamberTrial before;
    private final ChamberTrial after;
    private final Neighbours neighbours;
    private final String lot;
    private final List<Reason> reasons = new ArrayList<>();
    private Verdict verdict = Verdict.GOOD;

    ChamberChoice(Question question, ChamberTrial before) {
        this.question = question;
        this.before = before;
        after = question.more().in(before.chamber().id());
        neighbours = new Neighbours(question, before, after);
        lot = question.lot().id();
        judgeRoom();
        judgeCuring();
        judgeCompany();
        judgeHolding();
        judgeGases();
    }

    ReceiveAnswer.Choice choice(Words words) {
        double energy = after.energyCost() - before.energyCost();
        return new ReceiveAnswer.Choice(
                ReceiveAnswer.CHAMBER,
                Optional.of(before.chamber().id()),
                verdict.word(),
                "",
                reasons.stream().map(reason -> because(reason, words)).toList(),
                keeps(),
                ReceiveAnswer.Worth.of(after.valueKept(lot), neighbours.valueLost(), energy),
                Optional.of(inside()));
    }

    /** What to know of the lot wherever it goes: what its life rests on. */
    List<Reason> notes() {
        return after.outlook(lot).reasons();
    }

    static Because because(Reason reason, Words words) {
        return new Because(
                reason.code(), reason.subjects(), words.sentence(reason), reason.sourceId());
    }

    private ReceiveAnswer.Keeps keeps() {
        Outlook outlook = after.outlook(lot);
        return new ReceiveAnswer.Keeps(
                Ranges.told(outlook.daysLeft()),
                outlook.limitedBy().word(),
                new ChillingRisk(after.chillingProbability(lot), outlook.chilling().safeDays()),
                after.coolHalfHours(lot),
                after.coolSevenEighthsHours(lot));
    }

    private ReceiveAnswer.Inside inside() {
        Rise rise = rise();
        return new ReceiveAnswer.Inside(
                after.holds(),
                before.holds(),
                rise.mostK(),
                rise.untilS().isPresent()
                        ? Optional.of(local(rise.untilS().getAsDouble()))
                        : Optional.empty(),
                freeKg(),
                freeM3(),
                neighbours.lots());
    }

    private LocalDateTime local(double atS) {
        return question.plan().timeline().localAt(atS);
    }

    private double freeKg() {
        return before.chamber().capacityKg() - after.mostKg(question.fromS(), question.toS());
    }

    private double freeM3() {
        return before.chamber().enclosure().box().volumeM3()
                - after.mostKg(question.fromS(), question.toS()) / Defaults.STOWAGE_KG_M3.value();
    }

    private void say(Verdict at, Reason reason) {
        verdict = verdict.worse(at);
        reasons.add(reason);
    }

    private void judgeRoom() {
        if (freeKg() < 0) {
            say(
                    Verdict.NO,
                    Reason.about(
                            "no-room",
                            before.chamber().id(),
                            "own",
                            Argument.of(freeKg() + question.lot().massKg(), "kg"),
                            Argument.of(question.lot().massKg(), "kg")));
        } else if (freeM3() < 0) {
            say(
                    Verdict.TOLERABLE,
                    Reason.about(
                            "packed-tight",
                            before.chamber().id(),
                            "common-practice",
                            Argument.of(Defaults.STOWAGE_KG_M3.value(), "kg")));
        }
    }

    private void judgeCuring() {
        OptionalDouble cured = question.more().curedAtC();
        if (!question.more().uncured() || cured.isEmpty()) {
            return;
        }
        Hours hours = after.hours();
        double airC =
                IntStream.range(0, hours.size())
                        .filter(i -> hours.atS(i) > question.fromS())
                        .mapToDouble(hours::airC)
                        .average()
                        .orElse(before.chamber().setting().temperatureC());
        if (airC < cured.getAsDouble() - COLDER_THAN_CURING_K) {
            boolean borne = question.plan().accepts(before.chamber(), Conflict.UNCURED);
            say(
                    borne ? Verdict.TOLERABLE : Verdict.NO,
                    Reason.about(
                            borne ? "uncured-in-cold-accepted" : "uncured-in-cold",
                            lot,
                            RULE,
                            Argument.of(airC, "C"),
                            Argument.of(cured.getAsDouble(), "C")));
        }
    }

    private void judgeCompany() {
        Verdict own = after.company().each().getOrDefault(lot, Verdict.GOOD);
        verdict = verdict.worse(own);
        for (Reason reason : after.company().reasons()) {
            boolean its = reason.subjects().contains(lot);
            boolean worse = reason.subjects().stream().anyMatch(this::comesOffWorse);
            if (its || (worse && isNew(reason, before.company().reasons()))) {
                reasons.add(reason);
            }
        }
        for (String id : neighbours.ids()) {
            if (comesOffWorse(id)) {
                verdict = verdict.worse(after.company().each().getOrDefault(id, Verdict.GOOD));
            }
            if (neighbours.shareLost(id) >= NOTABLE_LOSS) {
                say(
                        Verdict.TOLERABLE,
                        new Reason(
                                "costs-days",
                                List.of(lot, id),
                                List.of(Argument.of(100 * neighbours.shareLost(id), "pct")),
                                RULE));
            }
        }
    }

    private boolean comesOffWorse(String id) {
        Verdict as = before.company().each().get(id);
        Verdict with = after.company().each().get(id);
        return as != null && with != null && with.worse(as) == with && with != as;
    }

    private static boolean isNew(Reason reason, List<Reason> known) {
        return known.stream()
                .noneMatch(
                        other ->
                                other.code().equals(reason.code())
                                        && other.subjects().equals(reason.subjects()));
    }

    private void judgeHolding() {
        for (Reason reason : after.whyNotHeld()) {
            if (isNew(reason, before.whyNotHeld())) {
                say(BREAKS.contains(reason.code()) ? Verdict.NO : Verdict.TOLERABLE, reason);
            }
        }
        if (!before.holds()) {
            reasons.add(Reason.about("holds-not-before", before.chamber().id(), RULE));
        }
    }

    private void judgeGases() {
        List<Reason> known = before.gasCautions().stream().map(Caution::reason).toList();
        for (Caution caution : after.gasCautions()) {
            if (caution.level() != Caution.Level.NOTE && isNew(caution.reason(), known)) {
                say(Verdict.TOLERABLE, caution.reason());
            }
        }
    }

    /**
     * How the air warms through the lot.
     *
     * @param mostK most of any hour, K
     * @param untilS when it is less than half a kelvin again, s; empty where it never was more
     */
    private record Rise(double mostK, OptionalDouble untilS) {}

    private Rise rise() {
        Hours as = before.hours();
        Hours with = after.hours();
        int peak = -1;
        double most = 0;
        for (int i = 0; i < Math.min(as.size(), with.size()); i++) {
            double more = with.airC(i) - as.airC(i);
            if (with.atS(i) > question.fromS() && more > most) {
                most = more;
                peak = i;
            }
        }
        if (most < NOTICED_K) {
            return new Rise(most, OptionalDouble.empty());
        }
        int until = peak;
        while (until < Math.min(as.size(), with.size()) - 1
                && with.airC(until) - as.airC(until) >= NOTICED_K) {
            until++;
        }
        return new Rise(most, OptionalDouble.of(with.atS(until)));
    }
}
