package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import org.wardon.keeping.Draw;

/**
 * Lets the bodies of a few draws stand for those of all, where lots are put into many airs: draws
 * are sorted by how fast a package cools, parted, sorted by how fast water is lost and parted
 * again; the body of the middle of each part stands for the part.
 */
final class TypicalBodies {
    /** Parts by package for a lot in an air that is there. */
    static final int FEW = 4;

    /** Parts by package for a whole chamber. */
    static final int MANY = 8;

    private static final int BY_WATER = 2;

    private TypicalBodies() {}

    /**
     * The draw that stands for each draw, in their order.
     *
     * @param draws all draws
     * @param byPackage parts by how fast a package cools, each of two by how fast water is lost
     */
    static List<Draw> of(List<Draw> draws, int byPackage) {
        List<Draw> standing = new ArrayList<>(Collections.nCopies(draws.size(), draws.get(0)));
        List<Draw> sorted = new ArrayList<>(draws);
        sorted.sort(Comparator.comparingDouble(Draw::packaging));
        for (List<Draw> like : parts(sorted, byPackage)) {
            List<Draw> byWater = new ArrayList<>(like);
            byWater.sort(Comparator.comparingDouble(Draw::transpiration));
            for (List<Draw> part : parts(byWater, BY_WATER)) {
                part.forEach(draw -> standing.set(draws.indexOf(draw), part.get(part.size() / 2)));
            }
        }
        return standing;
    }

    private static List<List<Draw>> parts(List<Draw> sorted, int count) {
        List<List<Draw>> parts = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            int from = i * sorted.size() / count;
            int to = (i + 1) * sorted.size() / count;
            if (to > from) {
                parts.add(sorted.subList(from, to));
            }
        }
        return parts;
    }
}
