package org.wardon.advice.placing;

import java.util.Comparator;
import java.util.List;
import org.wardon.advice.forecast.Tried;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;

/** Chooses among placings that were run in full, by what the keeper wishes. */
final class Ranked {
    /** Days that make no difference. */
    private static final double SAME_DAYS = 0.01;

    private final PlaceWish wish;

    Ranked(PlaceWish wish) {
        this.wish = wish;
    }

    /** The best; of equal ones the first. */
    Candidate best(List<Candidate> candidates) {
        Candidate best = candidates.get(0);
        for (Candidate other : candidates.subList(1, candidates.size())) {
            if (compare(other, best) > 0) {
                best = other;
            }
        }
        return best;
    }

    private int compare(Candidate a, Candidate b) {
        Comparator<Tried> net = Comparator.comparingDouble(Tried::net);
        return switch (wish.aim()) {
            case MOST_DAYS -> {
                double more = days(a.tried()) - days(b.tried());
                yield Math.abs(more) > SAME_DAYS
                        ? Double.compare(more, 0)
                        : net.compare(a.tried(), b.tried());
            }
            case FEWEST_CHAMBERS ->
                    Comparator.<Tried>comparingInt(tried -> tried.lots().size())
                            .thenComparing(tried -> -running(tried))
                            .thenComparing(net)
                            .compare(a.tried(), b.tried());
            default -> net.compare(a.tried(), b.tried());
        };
    }

    private double days(Tried tried) {
        return wish.lots().stream()
                .filter(tried.lots()::containsKey)
                .mapToDouble(id -> tried.lot(id).daysLeft().p50())
                .sum();
    }

    /** Chambers that run, or that lots stand in. */
    static long running(Tried tried) {
        return tried.plan().chambers().stream().filter(c -> runs(c, tried)).count();
    }

    private static boolean runs(ChamberPlan chamber, Tried tried) {
        boolean used =
                tried.plan().lots().stream()
                        .anyMatch(
                                lot ->
                                        lot.chamber().filter(chamber.id()::equals).isPresent()
                                                && tried.lots().containsKey(lot.id()));
        return used || (!chamber.off() && !chamber.coolers().isEmpty());
    }
}
