package org.wardon.sharing.placing;

import java.util.Locale;

/**
 * Prints how good and how fast the search is on drawn stores, beside the general solver given as
 * long. Run it on the test class path: {@code PlacingFigures LOTS CHAMBERS FIRST_SEED LAST_SEED}.
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
            PlacingProblem problem = instances.draw(lots, chambers, CAPACITY_SHARE, seed);
            long start = System.nanoTime();
            PlacingAnswer ours = PlacingSearch.of(problem, Effort.of(problem));
            double seconds = (System.nanoTime() - start) / SECOND_NS;
            Checker.check(problem, ours);
            Oracle.Answer theirs = Oracle.ask(problem, Math.max(1, seconds));
            System.out.printf(
                    Locale.ROOT,
                    "%d x %d, seed %d: %.0f of at most %.0f (%.2f %%), %s, %.1f s;"
                            + " general solver %.0f of at most %.0f%n",
                    lots,
                    chambers,
                    seed,
                    ours.placing().value(),
                    ours.bound(),
                    ours.gapPct(),
                    ours.proven() ? "proven" : "not proven",
                    seconds,
                    theirs.value(),
                    theirs.bound());
        }
    }
}
