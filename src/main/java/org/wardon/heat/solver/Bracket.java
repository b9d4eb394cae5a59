package org.wardon.heat.solver;

/** Two times with a crossing between them, and where to look for it next (Illinois rule). */
final class Bracket {
    private static final double MARGIN = 0.01;

    private double low;
    private double lowMiss;
    private double high;
    private double highMiss;

    /** Which end moved last: 1 the later one, -1 the earlier one, 0 none yet. */
    private int moved;

    void open(double from, double fromMiss, double to, double toMiss) {
        low = from;
        lowMiss = fromMiss;
        high = to;
        highMiss = toMiss;
        moved = 0;
    }

    double high() {
        return high;
    }

    double width() {
        return high - low;
    }

    /** Inside, and not at an end. */
    double guess() {
        return inside((low * highMiss - high * lowMiss) / (highMiss - lowMiss));
    }

    double inside(double at) {
        double margin = MARGIN * width();
        return Math.min(Math.max(at, low + margin), high - margin);
    }

    /**
     * Takes what was found at a guess.
     *
     * @param crossed whether the crossing lies before it
     */
    void take(double at, double miss, boolean crossed) {
        if (crossed) {
            high = at;
            highMiss = miss;
            lowMiss *= moved > 0 ? 0.5 : 1;
            moved = 1;
        } else {
            low = at;
            lowMiss = miss;
            highMiss *= moved < 0 ? 0.5 : 1;
            moved = -1;
        }
    }
}
