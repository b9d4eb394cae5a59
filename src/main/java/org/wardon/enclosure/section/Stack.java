package org.wardon.enclosure.section;

import org.wardon.enclosure.Box;
import org.wardon.errors.Require;

/**
 * The load of a chamber as one block that conducts and breathes evenly. It stands clear of walls
 * and floor, as wide and long as that lets it, and as high as its volume asks.
 *
 * @param volumeM3 room it takes, m3, above 0
 * @param conductivityWmK conductivity of the bulk, W/(m K)
 * @param heatW heat it gives off in all, W; below 0 where it gives off more vapour than warmth
 */
public record Stack(double volumeM3, double conductivityWmK, double heatW) {
    /** Clearance from walls and floor (common practice, no source), m. */
    static final double CLEAR_M = 0.10;

    /** A small chest leaves less: this share of its width or height (assumption). */
    private static final double CLEAR_SHARE = 0.1;

    /** No stack is lower than an item (assumption), m. */
    private static final double LEAST_M = 0.02;

    /** Checks the bounds. */
    public Stack {
        Require.within("volumeM3 of the stack", volumeM3, 1e-6, 1e6, "m3", "");
        Require.within("conductivityWmK of the stack", conductivityWmK, 0.01, 5, "W/(m K)", "");
        Require.within("heatW of the stack", heatW, -1e6, 1e6, "W", "");
    }

    /**
     * Returns what it leaves clear of something.
     *
     * @param lengthM inside measure of the chamber that way, m
     * @return m
     */
    static double clearM(double lengthM) {
        return Math.min(CLEAR_M, CLEAR_SHARE * lengthM);
    }

    /**
     * Returns its height in a chamber.
     *
     * @param box inside measures
     * @return m; no less than an item, no more than leaves it clear of the roof
     */
    public double heightM(Box box) {
        double long1 = box.lengthM() - 2 * clearM(box.lengthM());
        double wide = box.widthM() - 2 * clearM(box.widthM());
        double most = box.heightM() - 2 * clearM(box.heightM());
        return Math.min(most, Math.max(LEAST_M, volumeM3 / (long1 * wide)));
    }
}
