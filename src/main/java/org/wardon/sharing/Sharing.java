package org.wardon.sharing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiPredicate;
import org.wardon.errors.Require;
import org.wardon.keeping.Draw;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Who may share a chamber with whom, before there is a chamber. */
public final class Sharing {
    private Sharing() {}

    /**
     * Judges a group of lots.
     *
     * @param wishes the lots and their days, at least one, ids all different
     * @param draws the draws, 32 are usual
     * @return verdict, workable settings and every pair
     */
    public static SharingAnswer of(List<Wish> wishes, List<Draw> draws) {
        List<Workable> lots = new ArrayList<>();
        for (Wish wish : wishes) {
            lots.add(Workable.of(wish, draws));
        }
        return among(lots);
    }

    /**
     * Judges a group whose workable settings are known.
     *
     * @param lots the lots with their workable settings, at least one
     * @return verdict, workable settings and every pair
     */
    public static SharingAnswer among(List<Workable> lots) {
        return among(lots, (one, other) -> true);
    }

    /**
     * Judges a group not all of whom are there at one time. They still have to have a setting in
     * common, as that stays; what two do to each other counts where they meet.
     *
     * @param lots the lots with their workable settings, at least one
     * @param meet whether two lots, by id, are there at one time
     * @return verdict, workable settings and every pair that meets or has no setting in common
     */
    public static SharingAnswer among(List<Workable> lots, BiPredicate<String, String> meet) {
        Require.that(!lots.isEmpty(), "sharing is judged of at least one lot");
        Common common = Common.of(lots);
        Verdict verdict = common.verdict();
        List<PairVerdict> pairs = new ArrayList<>();
        for (int i = 0; i < lots.size(); i++) {
            for (int j = i + 1; j < lots.size(); j++) {
                Pairing pairing = new Pairing(lots.get(i), lots.get(j));
                PairVerdict pair = pairing.verdict();
                if (pairing.isApart() || meet.test(pair.a(), pair.b())) {
                    pairs.add(pair);
                    verdict = verdict.worse(pair.verdict());
                }
            }
        }
        boolean apart = common.verdict() == Verdict.NO;
        return new SharingAnswer(
                verdict,
                common.temperatureC(),
                common.humidityPct(),
                pairs,
                reasons(lots),
                apart ? Compromise.of(lots) : Optional.empty(),
                verdict == Verdict.NO ? takeOut(lots, pairs) : Optional.empty());
    }

    /** The lot without which the others have the best verdict and the widest temperatures. */
    private static Optional<String> takeOut(List<Workable> lots, List<PairVerdict> pairs) {
        Optional<String> out = Optional.empty();
        Verdict best = Verdict.NO;
        double widest = 0;
        for (Workable one : lots.size() > 2 ? lots : List.<Workable>of()) {
            String id = one.wish().lot().id();
            Common rest = Common.of(lots.stream().filter(lot -> lot != one).toList());
            Verdict verdict = rest.verdict();
            for (PairVerdict pair : pairs) {
                boolean stays = !pair.a().equals(id) && !pair.b().equals(id);
                verdict = stays ? verdict.worse(pair.verdict()) : verdict;
            }
            double wide = rest.temperatureC().map(SettingRange::widthK).orElse(0.0);
            boolean better = verdict.compareTo(best) > 0;
            boolean same = verdict == best && verdict != Verdict.NO;
            if (better || (same && (wide > widest || (wide == widest && first(id, out))))) {
                best = verdict;
                widest = wide;
                out = Optional.of(id);
            }
        }
        return out;
    }

    /** Between equals the id decides, so that the order of lots changes nothing. */
    private static boolean first(String id, Optional<String> known) {
        return known.map(other -> id.compareTo(other) < 0).orElse(true);
    }

    private static List<Reason> reasons(List<Workable> lots) {
        List<Reason> reasons = new ArrayList<>();
        for (Workable lot : lots) {
            if (lot.fallsShortAnyway()) {
                reasons.add(
                        Reason.about(
                                "keeps-less-than-wanted",
                                lot.wish().lot().id(),
                                "assumption",
                                Argument.of(lot.wish().wholeDays(), "day")));
            }
            if (lot.model().uncured()) {
                reasons.add(
                        Reason.about(
                                "cure-first",
                                lot.wish().lot().id(),
                                lot.wish().lot().commodity().keeping().curing().get(0).sourceId()));
            }
        }
        return reasons;
    }
}
