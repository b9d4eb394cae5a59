package org.wardon.sharing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.air.Timeline;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;
import org.wardon.produce.Conflict;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Judges the lots that really are in one chamber, by what its air does to them. */
public final class ChamberSharing {
    private final List<Together> lots;
    private final Set<Conflict> accepted;
    private final List<Reason> reasons = new ArrayList<>();
    private final List<Price> borne = new ArrayList<>();
    private final Map<String, Verdict> each = new HashMap<>();
    private Verdict verdict = Verdict.GOOD;

    private ChamberSharing(List<Together> lots, Set<Conflict> accepted) {
        this.lots = lots;
        this.accepted = accepted;
    }

    /**
     * Judges a chamber.
     *
     * @param lots the lots that are in it at some time of the run
     * @param accepted conflicts its keeper accepts: told with what they cost, they refuse nothing
     * @return verdict and reasons; good for an empty chamber
     */
    public static ChamberVerdict of(List<Together> lots, Set<Conflict> accepted) {
        ChamberSharing sharing = new ChamberSharing(List.copyOf(lots), Set.copyOf(accepted));
        Verdict all = Verdict.GOOD;
        for (Together lot : sharing.lots) {
            sharing.verdict = Verdict.GOOD;
            sharing.lasts(lot);
            sharing.chilled(lot);
            sharing.company(lot);
            sharing.each.merge(lot.id(), sharing.verdict, Verdict::worse);
            all = all.worse(sharing.verdict);
        }
        sharing.prices();
        return new ChamberVerdict(all, sharing.reasons, sharing.borne, sharing.each);
    }

    /** Days that ethylene costs are told once; smell costs none, and is told already. */
    private void prices() {
        borne.stream()
                .filter(price -> price.conflict() == Conflict.ETHYLENE)
                .filter(price -> reasons.stream().noneMatch(one -> shortBy(price, one)))
                .map(Price::told)
                .toList()
                .forEach(reasons::add);
    }

    private static boolean shortBy(Price price, Reason told) {
        return told.code().equals("falls-short-accepted") && told.subjects().contains(price.id());
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
        Spread spread = spread(lot, List.of());
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
        double needed = Limits.neededDays(handbook, wanted);
        if (nearly && spread.p50() < needed && accepted.contains(Conflict.ETHYLENE)) {
            Spread clean = spread(lot, lot.ethyleneDays());
            if (clean.p50() >= needed) {
                verdict = verdict.worse(Verdict.TOLERABLE);
                reasons.add(shortByEthylene(lot, spread, clean, wanted));
                return;
            }
        }
        boolean enough = spread.p50() >= needed;
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

    /** Days left, with more of them in each draw. */
    private static Spread spread(Together lot, List<Double> more) {
        double[] days = new double[lot.fates().size()];
        for (int i = 0; i < days.length; i++) {
            days[i] = lot.fates().get(i).daysLeft(lot.span().storedS());
            days[i] += more.isEmpty() ? 0 : more.get(i);
        }
        return Spread.of(days);
    }

    /** It would last but for ethylene, which its keeper accepts. */
    private static Reason shortByEthylene(Together lot, Spread here, Spread clean, double wanted) {
        return Reason.about(
                "falls-short-accepted",
                lot.id(),
                handbookSource(lot),
                Argument.of(here.p50(), "day"),
                Argument.of(wanted, "day"),
                Argument.of(clean.p50(), "day"));
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
        Conflicts conflicts = new Conflicts(accepted);
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
                smell(other, lot, days);
            }
        }
        ethylene(lot);
        verdict = verdict.worse(conflicts.verdict());
        reasons.addAll(conflicts.reasons());
    }

    private void smell(Together giver, Together taker, double days) {
        if (accepted.contains(Conflict.ODOUR)
                && PairConflict.ofSmell(giver.wish(), taker.wish(), days)) {
            borne.add(
                    new Price(
                            Conflict.ODOUR, taker.id(), giver.id(), OptionalDouble.empty(), days));
        }
    }

    /** What the ethylene of others costs it, where that is accepted. */
    private void ethylene(Together lot) {
        double days = 0;
        for (Together other : lots) {
            if (!other.id().equals(lot.id()) && given(other) > 0) {
                days = Math.max(days, other.daysWith(lot));
            }
        }
        String from = strongestGiver(lot);
        boolean asked = accepted.contains(Conflict.ETHYLENE) && !lot.ethyleneDays().isEmpty();
        if (!asked || days == 0 || from.equals(lot.id())) {
            return;
        }
        double lost =
                Spread.of(lot.ethyleneDays().stream().mapToDouble(one -> one).toArray()).p50();
        if (lost >= Price.LEAST_DAYS) {
            borne.add(new Price(Conflict.ETHYLENE, lot.id(), from, OptionalDouble.of(lost), days));
        }
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
