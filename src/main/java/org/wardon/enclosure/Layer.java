package org.wardon.enclosure;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * One layer of a face as it was meant: a solid with capacity, or a still-air layer that is a
 * resistance alone. How it conducts where it stands is told by {@link #asBuilt} and, bridges
 * included, by {@link Face#asBuilt}.
 *
 * @param material material id of the table, or {@code own}
 * @param thicknessM thickness, m, above 0
 * @param conductivityWmK conductivity, new and dry, W/(m K); for a resistance {@code
 *     thicknessM/resistance}
 * @param densityKgM3 density, kg/m3; 0 for a resistance
 * @param specificHeatJkgK specific heat, J/(kg K); 0 for a resistance
 * @param inPlace how it stands there
 */
public record Layer(
        String material,
        double thicknessM,
        double conductivityWmK,
        double densityKgM3,
        double specificHeatJkgK,
        InPlace inPlace) {
    private static final double MOST_CONDUCTIVITY = 500;

    /**
     * What became of a layer, and what goes through it.
     *
     * @param agedFactor how many times more heat it conducts than new, 1 or more
     * @param damp water in it
     * @param bridge what goes through it, where anything does
     * @param vapourResistanceFactor resistance to vapour over that of still air; empty where not
     *     known
     */
    public record InPlace(
            double agedFactor,
            Damp damp,
            Optional<Bridge> bridge,
            OptionalDouble vapourResistanceFactor) {
        /** New, dry, whole, and nothing known of its vapour. */
        public static final InPlace AS_NEW =
                new InPlace(1, Damp.DRY, Optional.empty(), OptionalDouble.empty());

        /** Checks the bounds. */
        public InPlace {
            Require.within("agedFactor", agedFactor, 1, 10, "", "");
            if (vapourResistanceFactor.isPresent()) {
                Require.within(
                        "vapourResistanceFactor",
                        vapourResistanceFactor.getAsDouble(),
                        1,
                        10_000_000,
                        "",
                        "");
            }
        }

        /**
         * Returns how many times more heat the layer conducts than new and dry.
         *
         * @return 1 or more
         */
        public double worseFactor() {
            return agedFactor * damp.factor();
        }
    }

    /**
     * Water in a layer.
     *
     * <p>Source: ISO 10456:2007, conversion for moisture: conductivity x exp(f x water content in
     * m3/m3), from memory; printed for up to 10 to 25 % of water by material.
     *
     * @param waterPct water, percent of the volume
     * @param coefficient f of the material
     */
    public record Damp(double waterPct, double coefficient) {
        /** No water. */
        public static final Damp DRY = new Damp(0, 0);

        /** Checks the bounds. */
        public Damp {
            Require.within("moisturePct", waterPct, 0, 10, "%", "");
            Require.within("moisture coefficient", coefficient, 0, 15, "", "");
        }

        /**
         * Returns what the water does to the conductivity.
         *
         * @return factor, 1 or more
         */
        public double factor() {
            return Math.exp(coefficient * waterPct / 100);
        }
    }

    /**
     * Battens, studs or ties through a layer.
     *
     * @param conductivityWmK their conductivity, W/(m K)
     * @param areaPct their share of the area, percent
     */
    public record Bridge(double conductivityWmK, double areaPct) {
        /** Checks the bounds. */
        public Bridge {
            Require.within("bridge.conductivityWmK", conductivityWmK, 0.005, 500, "W/(m K)", "");
            Require.within("bridge.areaPct", areaPct, 0.01, 99, "%", "");
        }
    }

    /** Checks the bounds. */
    public Layer {
        Require.within("thicknessM of " + material, thicknessM, 1e-5, 5, "m", "Give metres.");
        Require.within(
                "conductivityWmK of " + material, conductivityWmK, 0.005, 500, "W/(m K)", "");
        Require.within("densityKgM3 of " + material, densityKgM3, 0, 12_000, "kg/m3", "");
        Require.within(
                "specificHeatJkgK of " + material, specificHeatJkgK, 0, 5_000, "J/(kg K)", "");
    }

    /**
     * Makes a layer that is new, dry and whole.
     *
     * @param material material id of the table, or {@code own}
     * @param thicknessM thickness, m
     * @param conductivityWmK conductivity, W/(m K)
     * @param densityKgM3 density, kg/m3; 0 for a resistance
     * @param specificHeatJkgK specific heat, J/(kg K); 0 for a resistance
     */
    public Layer(
            String material,
            double thicknessM,
            double conductivityWmK,
            double densityKgM3,
            double specificHeatJkgK) {
        this(material, thicknessM, conductivityWmK, densityKgM3, specificHeatJkgK, InPlace.AS_NEW);
    }

    /**
     * Returns the layer at another conductivity, whole and no worse.
     *
     * @param otherWmK W/(m K); held within 0.005 and 500
     * @return the layer
     */
    Layer conducting(double otherWmK) {
        return new Layer(
                material,
                thicknessM,
                Math.min(Math.max(otherWmK, 0.005), MOST_CONDUCTIVITY),
                densityKgM3,
                specificHeatJkgK,
                new InPlace(1, Damp.DRY, Optional.empty(), inPlace.vapourResistanceFactor));
    }

    /**
     * Returns the layer as aged and damp as it is, beside its bridges.
     *
     * @return a layer whose conductivity is the one at work
     */
    public Layer asBuilt() {
        return conducting(conductivityWmK * inPlace.worseFactor());
    }

    /**
     * Returns the resistance of the layer, new, dry and whole.
     *
     * @return m2 K/W
     */
    public double resistanceM2KW() {
        return thicknessM / conductivityWmK;
    }

    /**
     * Returns the heat capacity per area; that of water in it and of bridges is not counted.
     *
     * @return J/(m2 K)
     */
    public double capacityJm2K() {
        return thicknessM * densityKgM3 * specificHeatJkgK;
    }
}
