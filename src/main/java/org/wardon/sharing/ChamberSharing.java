package org.wardon.sharing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wardon.air.Timeline;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Judges the lots that really are in one chamber, by what its air does to them. */
public final class ChamberSharing {
    private final List<Together> lots;
    private final List<Reason> reasons = new ArrayList<>();
    private final Map<String, Verdict> each = new HashMap<>();
    private Verdict verdict = Verdict.GOOD;

    private ChamberSharing(List<Together> lots) {
        this.lots = lots;
    }

    /**
     * Judges a chamber.
     *
     * @param lots the lots that are in it at some time of the run
     * @return verdict and reasons; good for an empty chamber
     */
    public static ChamberVerdict of(List<Together> lots) {
        ChamberSharing sharing = new ChamberSharing(List.copyOf(lots));
        Verdict all = Verdict.GOOD;
        for (Together lot : sharing.lots) {
            sharing.verdict = Verdict.GOOD;
            sharing.lasts(lot);
            sharing.chilled(lot);
            sharing.company(lot);
            sharing.each.merge(lot.id(), sharing.verdict, Verdict::worse);
            all = all.worse(sharing.verdict);
        }
        return new ChamberVerdict(all, sharing.reasons, sharing.each);
    }

    private static double marketEndS(Together lot) {
        return lot.span().goesS() + lot.wish().marketDays() * Timeline.DAY_S;
    }

    /** Told where the lot ends: what it lasts is made in all places together. */
    private void lasts(Together lot) {
        if (!lot.span().last()) {
            return;
        }
        double sound = Outlook.shareSound(lot.fates(), marketEndS(lot));
        if (sound >= 1 - Limits.GOOD_SHARE) {
            return;
        }
        double[] days =
                lot.fates().stream()
                        .mapToDouble(fate -> fate.daysLeft(lot.span().storedS()))
                        .toArray();
        Spread spread = Spread.of(days);
        double wanted = (marketEndS(lot) - lot.span().storedS()) / Timeline.DAY_S;
        double handbook =
                lot.wish()
                        .lot()
                        .commodity()
                        .needs()
                        .lifeDays()
                        .map(life -> life.atLogShare(0.5))
                        .orElse(wanted);
        boolean nearly = handbook >= Limits.LEAST_OF_WANTED * wanted;
        boolean enough = spread.p50() >= Limits.neededDays(handbook, wanted);
        verdict = verdict.worse(nearly && enough ? Verdict.TOLERABLE : Verdict.NO);
        reasons.add(
                Reason.about(
                        handbook < wanted ? "keeps-less-here" : "falls-short-here",
                        lot.id(),
                        handbookSource(lot),
                        Argument.of(spread.p10(), "day"),
                        Argument.of(wanted, "day"),
                        Argument.of(lot.felt().meanC(), "C")));
    }

    private void chilled(Together lot) {
        double injured = 0;
        for (Fate fate : lot.fates()) {
            injured += fate.endS(Mechanism.CHILLING) <= marketEndS(lot) ? 1 : 0;
        }
        double share = injured / lot.fates().size();
        boolean coldHere = lot.span().last() || lot.felt().coldestC() < lot.model().lowestSafeC();
        if (share < Limits.GOOD_CHILLING || !coldHere) {
            return;
        }
        verdict = verdict.worse(share < Limits.TOLERABLE_CHILLING ? Verdict.TOLERABLE : Verdict.NO);
        reasons.add(
                Reason.about(
                        "chilling-risk",
                        lot.id(),
                        handbookSource(lot),
                        Argument.of(100 * share, "pct"),
                        Argument.of(lot.felt().coldestC(), "C"),
                        Argument.of(lot.felt().meanC(), "C"),
                        Argument.of(lot.model().lowestSafeC(), "C")));
    }

    private void company(Together lot) {
        Conflicts conflicts = new Conflicts();
        conflicts.ethylene(
                lot.wish(),
                lot.model(),
                strongestGiver(lot),
                lot.felt().ethylenePpm(),
                lot.felt().meanC(),
                lot.wish().wantedDays());
        for (Together other : lots) {
            double days = other.daysWith(lot);
            if (!other.id().equals(lot.id()) && days > 0) {
                conflicts.odour(other.wish(), lot.wish(), days);
            }
        }
        verdict = verdict.worse(conflicts.verdict());
        reasons.addAll(conflicts.reasons());
    }

    /** Of all lots there with it, the one that gives off most ethylene; the lot itself at last. */
    private String strongestGiver(Together lot) {
        String strongest = lot.id();
        double most = 0;
        for (Together other : lots) {
            double given = other.daysWith(lot) > 0 ? given(other) : 0;
            if (given > most) {
                most = given;
                strongest = other.id();
            }
        }
        return strongest;
    }

    private static double given(Together lot) {
        return lot.massKg()
                * lot.model().ethyleneMicrolitrePerKgHour(lot.felt().meanC(), Draw.MEDIAN);
    }

    private static String handbookSource(Together lot) {
        return lot.wish()
                .lot()
                .commodity()
                .needs()
                .temperatureC()
                .map(Fact::sourceId)
                .orElse("assumption");
    }
}
