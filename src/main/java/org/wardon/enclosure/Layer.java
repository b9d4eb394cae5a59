package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * One layer of a face: a solid with capacity, or a still-air layer that is a resistance alone.
 *
 * @param material material id of the table, or {@code own}
 * @param thicknessM thickness, m, above 0
 * @param conductivityWmK conductivity, W/(m K); for a resistance {@code thicknessM/resistance}
 * @param densityKgM3 density, kg/m3; 0 for a resistance
 * @param specificHeatJkgK specific heat, J/(kg K); 0 for a resistance
 */
public record Layer(
        String material,
        double thicknessM,
        double conductivityWmK,
        double densityKgM3,
        double specificHeatJkgK) {
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
     * Returns the resistance of the layer.
     *
     * @return m2 K/W
     */
    public double resistanceM2KW() {
        return thicknessM / conductivityWmK;
    }

    /**
     * Returns the heat capacity per area.
     *
     * @return J/(m2 K)
     */
    public double capacityJm2K() {
        return thicknessM * densityKgM3 * specificHeatJkgK;
    }
}
