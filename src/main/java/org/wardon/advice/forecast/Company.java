package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.Forecast;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.sharing.ChamberSharing;
import org.wardon.sharing.ChamberVerdict;
import org.wardon.sharing.PairVerdict;
import org.wardon.sharing.Sharing;
import org.wardon.sharing.Together;
import org.wardon.sharing.Wish;
import org.wardon.sharing.Workable;

/**
 * Who stands with whom in the chambers of a plan, and whether they may: the verdict by what the
 * chamber's own air does to them, and of the pairs that no setting suits the reason why.
 */
final class Company {
    /** What two lots want of the setting; what they do to each other the chamber's air tells. */
    private static final Set<String> OF_SETTINGS =
            Set.of("temperature-gap", "humidity-split", "no-common-setting");

    private final StoreOutcome outcome;
    private final Words words;

    Company(StoreOutcome outcome, Words words) {
        this.outcome = outcome;
        this.words = words;
    }

    List<Forecast.Sharing> verdicts() {
        List<Forecast.Sharing> verdicts = new ArrayList<>();
        for (ChamberPlan chamber : outcome.model().plan().chambers()) {
            List<Visit> visits =
                    outcome.model().visitsIn(chamber.id()).stream()
                            .filter(visit -> outcome.has(visit.id()))
                            .filter(visit -> visit.arrivesS() < outcome.horizonS())
                            .toList();
            if (visits.stream().map(Visit::id).distinct().count() > 1) {
                verdicts.add(verdict(chamber, visits));
            }
        }
        return verdicts;
    }

    private Forecast.Sharing verdict(ChamberPlan chamber, List<Visit> visits) {
        ChamberVerdict found = together(outcome, chamber.id(), visits);
        List<Because> reasons = new ArrayList<>();
        apart(visits).forEach(reason -> reasons.add(because(reason)));
        found.reasons().forEach(reason -> reasons.add(because(reason)));
        return new Forecast.Sharing(
                chamber.id(),
                found.verdict().word(),
                reasons,
                found.borne().stream().map(price -> PriceTold.of(price, words)).toList());
    }

    /** What the air of a chamber, as it was worked out, does to visits there. */
    static ChamberVerdict together(StoreOutcome outcome, String chamberId, List<Visit> visits) {
        StorePlan plan = outcome.model().plan();
        Set<Conflict> accepted = plan.accepts(plan.getChamber(chamberId));
        Optional<Fates> asked =
                accepted.contains(Conflict.ETHYLENE)
                        ? Optional.of(new Fates(outcome.model()))
                        : Optional.empty();
        return ChamberSharing.of(
                visits.stream().map(visit -> together(outcome, visit, asked)).toList(), accepted);
    }

    /** Why pairs that no setting suits do not go together; those that meet, where lots move. */
    private List<Reason> apart(List<Visit> visits) {
        List<Reason> reasons = new ArrayList<>();
        List<Draw> draws = Draws.seeded(outcome.model().plan().seed(), StoreRun.DRAWS);
        List<Workable> workable =
                visits.parallelStream()
                        .map(visit -> Workable.of(wish(visit), visit.sheet().model(), draws))
                        .toList();
        for (PairVerdict pair : Sharing.among(workable).pairs()) {
            if (meet(pair, visits)) {
                pair.reasons().stream()
                        .filter(reason -> OF_SETTINGS.contains(reason.code()))
                        .filter(reason -> !reasons.contains(reason))
                        .forEach(reasons::add);
            }
        }
        return reasons;
    }

    /** Lots that never stand here at one time because one of them is moved need not agree. */
    private static boolean meet(PairVerdict pair, List<Visit> visits) {
        for (Visit a : visits) {
            for (Visit b : visits) {
                boolean pairOfThese =
                        a.id().equals(pair.a()) && b.id().equals(pair.b()) && !a.equals(b);
                boolean settled = a.only() && b.only();
                boolean overlap = a.hereFromS() < b.leavesS() && b.hereFromS() < a.leavesS();
                if (pairOfThese && (settled || overlap)) {
                    return true;
                }
            }
        }
        return false;
    }

    private static Together together(StoreOutcome outcome, Visit visit, Optional<Fates> asked) {
        LotSheet sheet = visit.sheet();
        LotHistory whole = outcome.history(visit.id());
        LotHistory history = visit.within(whole);
        ChamberEthylene level = outcome.ethylene(visit.chamber());
        List<Fate> sold = outcome.fates(sheet.id()).sold();
        List<Draw> draws = sold.stream().map(Fate::draw).toList();
        return new Together(
                wish(visit),
                sheet.model(),
                sold,
                sheet.plan().massKg(),
                new Together.Span(
                        visit.hereFromS(),
                        visit.leavesS(),
                        sheet.clock().hereFromS(),
                        sheet.clock().leavesS()),
                felt(history, level, Math.min(visit.leavesS(), outcome.horizonS())),
                asked.map(fates -> fates.lostToEthylene(visit, whole, draws)).orElse(List.of()));
    }

    private static Together.Felt felt(LotHistory history, ChamberEthylene level, double untilS) {
        double sumC = 0;
        double sumPpm = 0;
        double span = 0;
        double coldestC = history.meanC(0);
        for (int i = 1; i < history.size() && history.timeS(i) <= untilS + 1; i++) {
            double step = history.timeS(i) - history.timeS(i - 1);
            sumC += step * 0.5 * (history.meanC(i) + history.meanC(i - 1));
            sumPpm += step * level.ppmAt(history.timeS(i));
            coldestC = Math.min(coldestC, history.meanC(i));
            span += step;
        }
        return span > 0
                ? new Together.Felt(sumC / span, coldestC, sumPpm / span)
                : new Together.Felt(coldestC, coldestC, level.ppmAt(history.timeS(0)));
    }

    private static Wish wish(Visit visit) {
        double days = (visit.leavesS() - visit.hereFromS()) / Timeline.DAY_S;
        return new Wish(
                visit.sheet().kept(),
                Math.min(730, Math.max(0.1, days)),
                visit.sheet().marketDays(),
                OptionalDouble.empty());
    }

    private Because because(Reason reason) {
        return new Because(
                reason.code(), reason.subjects(), words.sentence(reason), reason.sourceId());
    }
}
