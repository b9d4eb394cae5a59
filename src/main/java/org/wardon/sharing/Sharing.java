package org.wardon.sharing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.keeping.Draw;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Who may share a chamber with whom, before there is a chamber. */
public final class Sharing {
    private final List<Workable> lots;
    private final Circumstances at;
    private final Common common;
    private final Spells spells;
    private final List<PairVerdict> pairs = new ArrayList<>();

    private Sharing(List<Workable> lots, Circumstances at) {
        this.lots = lots;
        this.at = at;
        common = Common.of(lots);
        spells = Spells.of(lots, at);
        for (int i = 0; i < lots.size(); i++) {
            for (int j = i + 1; j < lots.size(); j++) {
                if (at.meet(lots.get(i), lots.get(j))) {
                    pairs.add(new Pairing(lots.get(i), lots.get(j), at).verdict());
                }
            }
        }
    }

    /**
     * Judges a group of lots.
     *
     * @param wishes the lots and their days, at least one, ids all different
     * @param draws the draws, 32 are usual
     * @param at how they stand together
     * @return verdict, workable settings and every pair
     */
    public static SharingAnswer of(List<Wish> wishes, List<Draw> draws, Circumstances at) {
        return among(wishes.stream().map(wish -> Workable.of(wish, draws)).toList(), at);
    }

    /**
     * Judges a group whose workable settings are known.
     *
     * @param lots the lots with their workable settings, at least one
     * @return verdict, workable settings and every pair
     */
    public static SharingAnswer among(List<Workable> lots) {
        return among(lots, Circumstances.usual());
    }

    /**
     * Judges a group of which more is known. Lots that are never there at one time need not agree
     * on a setting, as it may be changed between them.
     *
     * @param lots the lots with their workable settings, at least one
     * @param at how they stand together
     * @return verdict, workable settings and every pair that meets
     */
    public static SharingAnswer among(List<Workable> lots, Circumstances at) {
        Require.that(!lots.isEmpty(), "sharing is judged of at least one lot");
        return new Sharing(List.copyOf(lots), at).answer();
    }

    private SharingAnswer answer() {
        Verdict verdict = with(spells.verdict(), "");
        List<Workable> apart = spells.apart(lots);
        return new SharingAnswer(
                verdict,
                common.temperatureC(),
                common.humidityPct(),
                pairs,
                reasons(),
                apart.isEmpty() ? Optional.empty() : Compromise.of(apart),
                verdict == Verdict.NO ? takeOut() : Optional.empty(),
                spells.all().size() > 1
                        ? spells.all().stream().map(Spells.One::told).toList()
                        : List.of(),
                Prices.of(spells, at));
    }

    /** A verdict on settings made worse by the pairs that do not hold a lot. */
    private Verdict with(Verdict ofSettings, String without) {
        Verdict verdict = ofSettings;
        for (PairVerdict pair : pairs) {
            boolean stays = !pair.a().equals(without) && !pair.b().equals(without);
            verdict = stays ? verdict.worse(pair.verdict()) : verdict;
        }
        return verdict;
    }

    /** The lot without which the others have the best verdict and the widest temperatures. */
    private Optional<String> takeOut() {
        Optional<String> out = Optional.empty();
        Verdict best = Verdict.NO;
        double widest = 0;
        for (Workable one : lots.size() > 2 ? lots : List.<Workable>of()) {
            Spells rest = Spells.of(lots.stream().filter(lot -> lot != one).toList(), at);
            Verdict verdict = with(rest.verdict(), one.id());
            double wide = rest.widthK();
            boolean better = verdict.compareTo(best) > 0;
            boolean same = verdict == best && verdict != Verdict.NO;
            if (better || (same && (wide > widest || (wide == widest && first(one.id(), out))))) {
                best = verdict;
                widest = wide;
                out = Optional.of(one.id());
            }
        }
        return out;
    }

    /** Between equals the id decides, so that the order of lots changes nothing. */
    private static boolean first(String id, Optional<String> known) {
        return known.map(other -> id.compareTo(other) < 0).orElse(true);
    }

    private List<Reason> reasons() {
        List<Reason> reasons = new ArrayList<>();
        for (Workable lot : lots) {
            if (lot.fallsShortAnyway()) {
                reasons.add(
                        Reason.about(
                                "keeps-less-than-wanted",
                                lot.id(),
                                "assumption",
                                Argument.of(lot.wish().wholeDays(), "day")));
            }
            if (lot.model().uncured()) {
                reasons.add(
                        Reason.about(
                                "cure-first",
                                lot.id(),
                                lot.wish().lot().commodity().keeping().curing().get(0).sourceId()));
            }
        }
        frost().ifPresent(reasons::add);
        return reasons;
    }

    /** Frost, where it is what keeps all from being set colder; of the lot it is nearest to. */
    private Optional<Reason> frost() {
        Optional<Workable> nearest =
                lots.stream().max(Comparator.comparingDouble(Workable::frostC));
        return common.temperatureC()
                .filter(all -> all.low() - nearest.orElseThrow().frostC() < Settings.STEP_C)
                .map(all -> nearest.orElseThrow().frost());
    }
}
