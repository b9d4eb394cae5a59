package org.wardon.sharing;

import java.util.ArrayList;
import java.util.List;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Whether two lots may share, and why not. */
final class Pairing {
    private final Workable a;
    private final Workable b;
    private final Circumstances at;
    private final Common common;
    private final List<Reason> reasons = new ArrayList<>();
    private Verdict verdict;

    Pairing(Workable a, Workable b, Circumstances at) {
        this.a = a;
        this.b = b;
        this.at = at;
        common = Common.of(List.of(a, b));
        verdict = common.verdict();
    }

    PairVerdict verdict() {
        if (common.verdict() == Verdict.NO) {
            apart();
        } else {
            together();
        }
        return new PairVerdict(id(a), id(b), verdict, reasons);
    }

    private void together() {
        double atC = common.bestC();
        if (common.verdict() == Verdict.TOLERABLE) {
            shortened(a);
            shortened(b);
        }
        Conflicts conflicts = conflicts(a, b, atC, at.daysTogether(a, b), at);
        verdict = verdict.worse(conflicts.verdict());
        reasons.addAll(conflicts.reasons());
    }

    /** Ethylene and smell of two lots at a temperature for some days together. */
    static Conflicts conflicts(Workable a, Workable b, double atC, double days, Circumstances at) {
        Conflicts conflicts = new Conflicts(at.accepted());
        double ppmA = at.ppm(a, 2, atC);
        double ppmB = at.ppm(b, 2, atC);
        conflicts.ethylene(
                a.wish(), a.model(), ppmB >= ppmA ? id(b) : id(a), ppmA + ppmB, atC, days);
        conflicts.ethylene(
                b.wish(), b.model(), ppmA >= ppmB ? id(a) : id(b), ppmA + ppmB, atC, days);
        conflicts.odour(a.wish(), b.wish(), days);
        conflicts.odour(b.wish(), a.wish(), days);
        return conflicts;
    }

    private void shortened(Workable lot) {
        double days = lot.tenthDays(common.bestC(), common.bestPct());
        if (days < lot.wish().wholeDays()) {
            reasons.add(
                    Reason.about(
                            "short-of-wanted",
                            id(lot),
                            "assumption",
                            Argument.of(common.bestC(), "C"),
                            Argument.of(days, "day"),
                            Argument.of(lot.wish().wholeDays(), "day")));
        }
    }

    private void apart() {
        Gap gap = Gap.between(a, b);
        if (gap.kelvins() > 0) {
            reasons.add(
                    new Reason(
                            "temperature-gap",
                            List.of(gap.colder(), gap.warmer()),
                            List.of(
                                    Argument.of(gap.kelvins(), "K"),
                                    Argument.of(gap.colderHighC(), "C"),
                                    Argument.of(gap.warmerLowC(), "C")),
                            handbookSource(gap.colder().equals(id(a)) ? a : b)));
        } else if (gap.humidityPct() <= 0) {
            reasons.add(
                    new Reason(
                            "no-common-setting",
                            List.of(id(a), id(b)),
                            List.of(
                                    Argument.of(a.wish().wholeDays(), "day"),
                                    Argument.of(b.wish().wholeDays(), "day")),
                            handbookSource(a)));
        } else {
            reasons.add(
                    new Reason(
                            "humidity-split",
                            List.of(id(a), id(b)),
                            List.of(Argument.of(gap.humidityPct(), "pct")),
                            handbookSource(a)));
        }
        tooShort(a);
        tooShort(b);
    }

    private void tooShort(Workable lot) {
        if (lot.fallsShortAnyway()) {
            reasons.add(
                    Reason.about(
                            "keeps-less-than-wanted",
                            id(lot),
                            handbookSource(lot),
                            Argument.of(lot.wish().wholeDays(), "day")));
        }
    }

    private static String handbookSource(Workable lot) {
        return lot.wish()
                .lot()
                .commodity()
                .needs()
                .temperatureC()
                .map(fact -> fact.sourceId())
                .orElse("assumption");
    }

    private static String id(Workable lot) {
        return lot.id();
    }
}
