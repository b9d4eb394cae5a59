package org.wardon.sharing.placing;

import java.lang.management.ManagementFactory;
import java.util.Locale;

/**
 * Prints how good and how fast the search is on drawn stores, beside the general solver given as
 * long. Run it on the test class path: {@code PlacingFigures LOTS CHAMBERS FIRST_SEED LAST_SEED
 * [MIX]}, a mix by its place in {@link Mix#all}.
 */
final class PlacingFigures {
    private static final double SECOND_NS = 1e9;
    private static final double CAPACITY_SHARE = 0.97;

    private PlacingFigures() {}

    public static void main(String[] args) {
        int lots = Integer.parseInt(args[0]);
        int chambers = Integer.parseInt(args[1]);
        Instances instances = new Instances();
        for (long seed = Long.parseLong(args[2]); seed <= Long.parseLong(args[3]); seed++) {
            Mix mix = Mix.all(CAPACITY_SHARE).get(args.length > 4 ? Integer.parseInt(args[4]) : 0);
            PlacingProblem problem = instances.draw(lots, chambers, mix, seed);
            long start = System.nanoTime();
            long worked = worked();
            PlacingAnswer ours = PlacingSearch.of(problem, Effort.of(problem));
            double seconds = (System.nanoTime() - start) / SECOND_NS;
            double processor = (worked() - worked) / SECOND_NS;
            Checker.check(problem, ours);
            Oracle.Answer theirs = Oracle.ask(problem, Math.max(1, seconds));
            System.out.printf(
                    Locale.ROOT,
                    "%d x %d, seed %d: %.0f of at most %.0f (%.2f %%), %s, %.1f s (%.1f s of a"
                            + " processor); general solver %.0f of at most %.0f%n",
                    lots,
                    chambers,
                    seed,
                    ours.placing().value(),
                    ours.bound(),
                    ours.gapPct(),
                    ours.proven() ? "proven" : "not proven",
                    seconds,
                    processor,
                    theirs.value(),
                    theirs.bound());
        }
    }

    private static long worked() {
        return ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
    }
}
