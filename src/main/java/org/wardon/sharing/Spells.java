package org.wardon.sharing;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The times in which different lots stand together. A chamber's setting may change between days, so
 * lots that never meet need not agree on one.
 */
final class Spells {
    private final List<One> all = new ArrayList<>();

    /** Lots that are there at one time, and what they have in common. */
    record One(double fromS, double toS, List<Workable> lots, Common common) {
        Spell told() {
            return new Spell(
                    fromS,
                    toS,
                    lots.stream().map(Workable::id).toList(),
                    common.verdict(),
                    common.temperatureC(),
                    common.humidityPct());
        }
    }

    private Spells() {}

    static Spells of(List<Workable> lots, Circumstances at) {
        List<List<Workable>> together = new ArrayList<>();
        lots.stream()
                .mapToDouble(lot -> at.stay(lot).fromS())
                .distinct()
                .sorted()
                .forEach(fromS -> together.add(thereAt(lots, at, fromS)));
        Spells spells = new Spells();
        for (List<Workable> group : together) {
            if (!within(group, together)) {
                spells.all.add(one(group, at));
            }
        }
        return spells;
    }

    private static List<Workable> thereAt(List<Workable> lots, Circumstances at, double timeS) {
        return lots.stream()
                .filter(lot -> at.stay(lot).fromS() <= timeS && timeS < at.stay(lot).toS())
                .toList();
    }

    /** Whether all of a group stand together with more at another time, or came before likewise. */
    private static boolean within(List<Workable> group, List<List<Workable>> together) {
        Set<Workable> mine = new HashSet<>(group);
        boolean behind = false;
        for (List<Workable> other : together) {
            behind |= other == group;
            boolean covers = new HashSet<>(other).containsAll(mine);
            if (other != group && covers && (other.size() > group.size() || !behind)) {
                return true;
            }
        }
        return group.isEmpty();
    }

    private static One one(List<Workable> group, Circumstances at) {
        double from = Double.NEGATIVE_INFINITY;
        double to = Double.POSITIVE_INFINITY;
        for (Workable lot : group) {
            from = Math.max(from, at.stay(lot).fromS());
            to = Math.min(to, at.stay(lot).toS());
        }
        return new One(from, to, group, Common.of(group));
    }

    List<One> all() {
        return all;
    }

    Verdict verdict() {
        return all.stream().map(one -> one.common().verdict()).reduce(Verdict.GOOD, Verdict::worse);
    }

    /** Width of the temperatures that are left where they are narrowest, K. */
    double widthK() {
        return all.stream()
                .mapToDouble(
                        one -> one.common().temperatureC().map(SettingRange::widthK).orElse(0.0))
                .min()
                .orElse(0);
    }

    /** Lots that some time have no setting in common with those beside them, in their order. */
    List<Workable> apart(List<Workable> lots) {
        Set<Workable> torn = new HashSet<>();
        all.stream()
                .filter(one -> one.common().verdict() == Verdict.NO)
                .forEach(one -> torn.addAll(one.lots()));
        return lots.stream().filter(torn::contains).toList();
    }
}
