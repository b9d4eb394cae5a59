package org.wardon.enclosure;

import java.util.ArrayList;
import java.util.List;
import org.wardon.errors.Require;

/**
 * A face with layers that are not the same all over, such as insulation between battens.
 *
 * <p>Source: ISO 6946:2017, 6.7.2, combined method: the mean of an upper limit (heat flows straight
 * through) and a lower limit (each layer at one temperature), from memory. Where several layers are
 * bridged their parts are taken to lie independently (assumption).
 *
 * @param layers from one side to the other
 * @param insideFilmM2KW resistance of the inner surface, m2 K/W
 * @param outsideFilmM2KW resistance of the outer surface, m2 K/W
 */
public record BridgedElement(
        List<BridgedLayer> layers, double insideFilmM2KW, double outsideFilmM2KW) {
    /**
     * One layer made of parts beside each other.
     *
     * @param thicknessM thickness, m
     * @param parts parts whose shares add to 1
     */
    public record BridgedLayer(double thicknessM, List<Part> parts) {
        /** Copies the parts and checks their shares. */
        public BridgedLayer {
            parts = List.copyOf(parts);
            double sum = parts.stream().mapToDouble(Part::share).sum();
            Require.within(
                    "sum of the shares of a layer",
                    sum,
                    1 - 1e-6,
                    1 + 1e-6,
                    "",
                    "Shares add to 1.");
        }

        /**
         * Returns a layer that is the same all over.
         *
         * @param thicknessM thickness, m
         * @param conductivityWmK conductivity, W/(m K)
         * @return the layer
         */
        public static BridgedLayer even(double thicknessM, double conductivityWmK) {
            return new BridgedLayer(thicknessM, List.of(new Part(1, conductivityWmK)));
        }
    }

    /**
     * A part of a layer.
     *
     * @param share share of the area, 0 to 1
     * @param conductivityWmK conductivity, W/(m K)
     */
    public record Part(double share, double conductivityWmK) {
        /** Checks the bounds. */
        public Part {
            Require.within("share of a part", share, 0, 1, "", "");
            Require.within("conductivityWmK of a part", conductivityWmK, 0.005, 500, "W/(m K)", "");
        }
    }

    /** Copies the layers. */
    public BridgedElement {
        layers = List.copyOf(layers);
        Require.that(!layers.isEmpty(), "a bridged element needs at least one layer");
    }

    /**
     * Returns the element of layers, as aged and damp as they are, between two films.
     *
     * @param layers from one side to the other
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @param outsideFilmM2KW resistance of the outer surface, m2 K/W
     * @return the element
     */
    public static BridgedElement of(
            List<Layer> layers, double insideFilmM2KW, double outsideFilmM2KW) {
        return new BridgedElement(
                layers.stream().map(BridgedElement::parts).toList(),
                insideFilmM2KW,
                outsideFilmM2KW);
    }

    private static BridgedLayer parts(Layer layer) {
        double conductivity = layer.asBuilt().conductivityWmK();
        if (layer.inPlace().bridge().isEmpty()) {
            return BridgedLayer.even(layer.thicknessM(), conductivity);
        }
        Layer.Bridge bridge = layer.inPlace().bridge().get();
        double share = bridge.areaPct() / 100;
        return new BridgedLayer(
                layer.thicknessM(),
                List.of(
                        new Part(share, bridge.conductivityWmK()),
                        new Part(1 - share, conductivity)));
    }

    /**
     * Returns the mean of both limits.
     *
     * @return resistance from air to air, m2 K/W
     */
    public double combinedM2KW() {
        return 0.5 * (upperM2KW() + lowerM2KW());
    }

    /**
     * Returns the upper limit of the resistance.
     *
     * @return m2 K/W
     */
    public double upperM2KW() {
        double conductance = 0;
        for (Path path : paths()) {
            conductance += path.share / path.resistanceM2KW;
        }
        return 1 / conductance;
    }

    /**
     * Returns the lower limit of the resistance.
     *
     * @return m2 K/W, not above the upper limit
     */
    public double lowerM2KW() {
        double sum = insideFilmM2KW + outsideFilmM2KW;
        for (BridgedLayer layer : layers) {
            double conductivity = 0;
            for (Part part : layer.parts) {
                conductivity += part.share * part.conductivityWmK;
            }
            sum += layer.thicknessM / conductivity;
        }
        return sum;
    }

    /**
     * Returns the transmittance by the combined method.
     *
     * @return W/(m2 K)
     */
    public double wattsM2K() {
        return UValue.ofResistance(combinedM2KW());
    }

    private record Path(double share, double resistanceM2KW) {}

    private List<Path> paths() {
        List<Path> paths = List.of(new Path(1, insideFilmM2KW + outsideFilmM2KW));
        for (BridgedLayer layer : layers) {
            List<Path> longer = new ArrayList<>();
            for (Path path : paths) {
                for (Part part : layer.parts) {
                    longer.add(
                            new Path(
                                    path.share * part.share,
                                    path.resistanceM2KW + layer.thicknessM / part.conductivityWmK));
                }
            }
            paths = longer;
        }
        return paths;
    }
}
