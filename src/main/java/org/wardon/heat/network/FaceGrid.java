package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.UValue;

/**
 * A face cut into nodes, per square metre: the nodes lie on the borders of cells and of layers, so
 * that the innermost is the surface itself. A thin sheet is capacity on its border without a
 * resistance (it would ask for steps of milliseconds and carry a hundred-thousandth of the
 * resistance); a still-air layer is a resistance without capacity.
 *
 * <p>Cells are so thin against the depth a daily wave reaches, {@code sqrt(a day/pi)}, that a wave
 * of a day comes through as strong and as late as the exact one within 1 %: the error of its
 * strength grows as the face's thickness in depths times the square of a cell's (measured: 8 % of
 * that product). No wave of a day comes out of the ground, and one from inside fades on its way:
 * its cells grow outwards.
 */
final class FaceGrid {
    private static final double DAY_S = 86_400;
    private static final double THICKEST_CELL = 0.35;
    private static final double PRODUCT = 0.11;

    /** Below this many cells the lag asks for the whole end correction. */
    private static final int FEW_CELLS = 5;

    /** The innermost cell of soil, in depths, and how much longer each next one is. */
    private static final double FIRST_OF_SOIL = 0.2;

    private static final double GROWTH_OF_SOIL = 1.6;

    /** A layer with less of the face's resistance may be a single cell. */
    private static final double THIN_SHARE = 0.05;

    /** A layer of less than this is a thin sheet, m2 K/W. */
    private static final double SHEET_M2K_W = 0.002;

    /** Capacity of a face that is nothing but resistance, J/(m2 K) (assumption). */
    private static final double BARE_JM2K = 500;

    /** Node capacities from outside to inside, J/(m2 K). */
    final double[] capacity;

    /** Conductance from each node to the next, W/(m2 K); one less than nodes. */
    final double[] between;

    /** Resistance between the far film and the first node, m2 K/W. */
    final double outerM2KW;

    /** Conductance from the last node to the air, film included, W/(m2 K). */
    final double inner;

    /** Depth of each node from the outer side of the layers, m. */
    final double[] depthM;

    /** Name of the layer each node lies in, or on the outer side of. */
    final List<String> layers;

    /** Thickness of all layers, m. */
    final double thicknessM;

    private final List<double[]> nodes = new ArrayList<>();
    private final List<String> names = new ArrayList<>();
    private double doneM;
    private final double wholeM2KW;
    private double pendingM2KW;

    /** Cuts layers, from outside to inside; the inner film is a resistance, m2 K/W. */
    FaceGrid(List<Layer> layers, double innerM2KW, double wallFactor) {
        this(List.of(), layers, innerM2KW, wallFactor);
    }

    /** The same of layers that lie on ground, deepest first. */
    FaceGrid(List<Layer> ground, List<Layer> layers, double innerM2KW, double wallFactor) {
        double depths = 0;
        wholeM2KW = (UValue.resistanceM2KW(ground) + UValue.resistanceM2KW(layers)) / wallFactor;
        for (Layer layer : layers) {
            depths += conducts(layer) ? depths(layer) : 0;
        }
        double cell = Math.min(THICKEST_CELL, Math.sqrt(PRODUCT / Math.max(depths, 1e-3)));
        for (Layer layer : ground) {
            addSoil(layer, wallFactor);
        }
        for (Layer layer : layers) {
            add(layer, wallFactor, cell);
        }
        if (nodes.isEmpty()) {
            addNode(BARE_JM2K, doneM, layers.isEmpty() ? "" : layers.get(0).material());
        }
        thicknessM = doneM;
        depthM = nodes.stream().mapToDouble(node -> node[2]).toArray();
        this.layers = List.copyOf(names);
        inner = 1 / (pendingM2KW + innerM2KW / wallFactor);
        int n = nodes.size();
        capacity = new double[n];
        between = new double[n - 1];
        outerM2KW = nodes.get(0)[1];
        for (int i = 0; i < n; i++) {
            capacity[i] = nodes.get(i)[0];
            if (i > 0) {
                between[i - 1] = 1 / nodes.get(i)[1];
            }
        }
    }

    private void addSoil(Layer layer, double wallFactor) {
        if (!conducts(layer)) {
            add(layer, wallFactor, THICKEST_CELL);
            return;
        }
        double first = FIRST_OF_SOIL / depths(layer);
        int cells = Math.max(1, (int) Math.rint(log(1 + (GROWTH_OF_SOIL - 1) / first)));
        double unit = (GROWTH_OF_SOIL - 1) / (Math.pow(GROWTH_OF_SOIL, cells) - 1);
        double resistance = layer.resistanceM2KW() / wallFactor;
        double share = unit * Math.pow(GROWTH_OF_SOIL, cells - 1);
        massHere(0.5 * share * layer.capacityJm2K(), layer.material());
        double depth = doneM;
        for (int i = 0; i < cells; i++) {
            double next = i < cells - 1 ? share / GROWTH_OF_SOIL : 0;
            depth += share * layer.thicknessM();
            pendingM2KW = share * resistance;
            addNode(0.5 * (share + next) * layer.capacityJm2K(), depth, layer.material());
            share = next;
        }
        doneM += layer.thicknessM();
    }

    /** Logarithm to the base of the growth. */
    private static double log(double x) {
        return Math.log(x) / Math.log(GROWTH_OF_SOIL);
    }

    private void add(Layer layer, double wallFactor, double cell) {
        double resistance = layer.resistanceM2KW() / wallFactor;
        if (layer.capacityJm2K() <= 0) {
            pendingM2KW += resistance;
        } else if (!conducts(layer)) {
            massHere(layer.capacityJm2K(), layer.material());
        } else {
            int least = resistance > THIN_SHARE * wholeM2KW ? 2 : 1;
            int cells = Math.max(least, (int) Math.ceil(depths(layer) / cell - 1e-9));
            double[] share = shares(cells);
            massHere(share[0] * layer.capacityJm2K(), layer.material());
            for (int i = 1; i <= cells; i++) {
                pendingM2KW = resistance / cells;
                double depth = doneM + i * layer.thicknessM() / cells;
                addNode(share[i] * layer.capacityJm2K(), depth, layer.material());
            }
        }
        doneM += layer.thicknessM();
    }

    /**
     * Shares of a layer's capacity that stand on the borders of its cells, both ends included. Half
     * a cell's mass on each end would bring a slow wave early by one part in cells squared; moving
     * some of it to the next border (the end correction of Gregory's rule, whole in few cells, half
     * in many, where it costs amplitude) keeps the lag.
     */
    private static double[] shares(int cells) {
        double[] share = new double[cells + 1];
        Arrays.fill(share, 1.0 / cells);
        double correction = cells < FEW_CELLS ? 1 : 0.5;
        double inward = cells > 1 ? correction / (12.0 * (cells - 1)) : 0;
        share[0] = 0.5 / cells - inward;
        share[cells] = share[0];
        if (cells > 1) {
            share[1] += inward;
            share[cells - 1] += inward;
        }
        return share;
    }

    private static boolean conducts(Layer layer) {
        return layer.capacityJm2K() > 0 && layer.resistanceM2KW() >= SHEET_M2K_W;
    }

    /** Thickness over the depth a daily wave reaches. */
    private static double depths(Layer layer) {
        double diffusivity =
                layer.conductivityWmK() / (layer.densityKgM3() * layer.specificHeatJkgK());
        return layer.thicknessM() / Math.sqrt(diffusivity * DAY_S / Math.PI);
    }

    private void massHere(double jm2k, String layer) {
        if (nodes.isEmpty() || pendingM2KW > 0) {
            addNode(jm2k, doneM, layer);
        } else {
            nodes.get(nodes.size() - 1)[0] += jm2k;
        }
    }

    private void addNode(double jm2k, double depth, String layer) {
        nodes.add(new double[] {jm2k, pendingM2KW, depth});
        names.add(layer);
        pendingM2KW = 0;
    }

    /** Steady conductance from the far side to the air, W/(m2 K), with a far film, W/(m2 K). */
    double steady(double farFilmWm2K) {
        double r = 1 / farFilmWm2K + outerM2KW + 1 / inner;
        for (double k : between) {
            r += 1 / k;
        }
        return 1 / r;
    }
}
