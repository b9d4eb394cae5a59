package org.wardon.enclosure;

import java.util.ArrayList;
import java.util.List;
import org.wardon.air.SaturatedAir;
import org.wardon.errors.Require;

/**
 * Water that gathers inside a face: the vapour pressure falls in proportion to the resistance of
 * the layers from side to side, never above saturation; where it would be, vapour condenses, and
 * the pressure runs along the lower convex hull of saturation between both sides.
 *
 * <p>Source: ISO 13788:2012, steady vapour diffusion by the month after Glaser, layers of more than
 * 0.25 m2 K/W cut up (here of more than 0.05), vapour conductivity of air 2e-10 kg/(m s Pa) (from
 * memory). Air that leaks through joints carries more vapour than diffusion does; it is not
 * counted.
 */
public final class InnerCondensation {
    /**
     * Water gathering faster is worth a word: 200 g/m2 in a year, kg/(m2 s). Source: the 200 g/m2
     * at which water runs off in ISO 13788 (from memory); that it may take a year is ours
     * (assumption).
     */
    public static final double WORTH_SAYING_KG_M2S = 0.2 / (365 * 86_400.0);

    private static final double AIR_KG_M_S_PA = 2e-10;
    private static final double SLICE_M2KW = 0.05;

    private InnerCondensation() {}

    /**
     * Air on one side of a face.
     *
     * @param temperatureC what the face feels there, sun included, °C
     * @param vapourPa vapour pressure, Pa
     * @param filmM2KW surface resistance, m2 K/W
     */
    public record Side(double temperatureC, double vapourPa, double filmM2KW) {
        /** Checks the bounds. */
        public Side {
            Require.within("temperatureC beside a face", temperatureC, -60, 95, "°C", "");
            Require.within("vapourPa beside a face", vapourPa, 0, 100_000, "Pa", "");
            Require.within("film beside a face", filmM2KW, 1e-6, 10, "m2 K/W", "");
        }
    }

    /** Whether water gathers: exactly one of three answers. */
    public sealed interface Answer {
        /** None, or too slowly to matter. */
        record Dry() implements Answer {}

        /**
         * It gathers.
         *
         * @param layer number of the layer that holds most of it, 0 outermost
         * @param kgM2S how fast in the whole face, kg/(m2 s)
         * @param fromOutside whether the damp comes from outside
         */
        record Wet(int layer, double kgM2S, boolean fromOutside) implements Answer {}

        /**
         * Nobody can tell: how a layer resists vapour is not known.
         *
         * @param layer number of that layer, 0 outermost
         */
        record Unknown(int layer) implements Answer {}
    }

    /**
     * Judges a face.
     *
     * @param layers from outside to inside
     * @param outside the air beyond
     * @param inside the air of the chamber
     * @return where most water gathers, if any
     */
    public static Answer of(List<Layer> layers, Side outside, Side inside) {
        boolean inward = outside.vapourPa > inside.vapourPa;
        for (int i = 0; i < layers.size(); i++) {
            int fromDamp = inward ? i : layers.size() - 1 - i;
            if (layers.get(fromDamp).inPlace().vapourResistanceFactor().isEmpty()) {
                return shutBefore(layers, fromDamp, outside, inside)
                        ? new Answer.Dry()
                        : new Answer.Unknown(fromDamp);
            }
        }
        List<Node> hull = hull(nodes(layers, outside, inside));
        double[] held = new double[layers.size()];
        double all = 0;
        int wettest = 0;
        for (int i = 1; i < hull.size() - 1; i++) {
            double into = slope(hull.get(i - 1), hull.get(i));
            double on = slope(hull.get(i), hull.get(i + 1));
            int layer = hull.get(i).layer;
            held[layer] += AIR_KG_M_S_PA * (on - into);
            all += AIR_KG_M_S_PA * (on - into);
            wettest = held[layer] > held[wettest] ? layer : wettest;
        }
        return all > WORTH_SAYING_KG_M2S ? new Answer.Wet(wettest, all, inward) : new Answer.Dry();
    }

    /** Whether the known layers on the damp side alone keep vapour out, whatever comes behind. */
    private static boolean shutBefore(List<Layer> layers, int unknown, Side outside, Side inside) {
        double air = 0;
        boolean inward = outside.vapourPa > inside.vapourPa;
        for (int i = 0; i < layers.size(); i++) {
            if (inward ? i < unknown : i > unknown) {
                air += airM(layers.get(i));
            }
        }
        double coldest = Math.min(outside.temperatureC, inside.temperatureC);
        double drop = Math.max(outside.vapourPa, inside.vapourPa) - saturatedPa(coldest);
        return drop <= 0 || AIR_KG_M_S_PA * drop < WORTH_SAYING_KG_M2S * air;
    }

    private static double saturatedPa(double temperatureC) {
        return SaturatedAir.pressurePa(Math.min(temperatureC, SaturatedAir.HIGHEST_C));
    }

    /** Thickness of still air that resists as much, m. */
    private static double airM(Layer layer) {
        return layer.thicknessM() * layer.inPlace().vapourResistanceFactor().orElseThrow();
    }

    /**
     * A place in the face.
     *
     * @param airM thickness of still air up to here, m
     * @param vapourPa most vapour pressure there can be, Pa
     * @param layer the layer that would hold water here
     */
    private record Node(double airM, double vapourPa, int layer) {}

    private static List<Node> nodes(List<Layer> layers, Side outside, Side inside) {
        double whole = outside.filmM2KW + UValue.resistanceM2KW(layers) + inside.filmM2KW;
        double perM2KW = (inside.temperatureC - outside.temperatureC) / whole;
        double passed = outside.filmM2KW;
        double air = 0;
        List<Node> nodes = new ArrayList<>();
        double skin = saturatedPa(outside.temperatureC + perM2KW * passed);
        nodes.add(new Node(0, Math.min(outside.vapourPa, skin), 0));
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            int slices = (int) Math.max(1, Math.ceil(layer.resistanceM2KW() / SLICE_M2KW));
            for (int j = 1; j <= slices; j++) {
                passed += layer.resistanceM2KW() / slices;
                air += airM(layer) / slices;
                double saturated = saturatedPa(outside.temperatureC + perM2KW * passed);
                nodes.add(new Node(air, saturated, j == slices ? holder(layers, i) : i));
            }
        }
        Node last = nodes.remove(nodes.size() - 1);
        nodes.add(new Node(last.airM, Math.min(inside.vapourPa, last.vapourPa), layers.size() - 1));
        return nodes;
    }

    /** Of the two layers at a border the one that vapour goes through more easily. */
    private static int holder(List<Layer> layers, int before) {
        return before + 1 < layers.size()
                        && factor(layers.get(before + 1)) < factor(layers.get(before))
                ? before + 1
                : before;
    }

    private static double factor(Layer layer) {
        return layer.inPlace().vapourResistanceFactor().orElseThrow();
    }

    /** Lower convex hull from first to last. Source: A. M. Andrew, monotone chain, 1979. */
    private static List<Node> hull(List<Node> nodes) {
        List<Node> hull = new ArrayList<>();
        for (Node node : nodes) {
            while (hull.size() > 1
                    && slope(hull.get(hull.size() - 2), hull.get(hull.size() - 1))
                            >= slope(hull.get(hull.size() - 1), node)) {
                hull.remove(hull.size() - 1);
            }
            hull.add(node);
        }
        return hull;
    }

    private static double slope(Node a, Node b) {
        return (b.vapourPa - a.vapourPa) / (b.airM - a.airM);
    }
}
