package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * One fruit, root, head or leaf as a body that conducts heat.
 *
 * @param shape the simple body it is taken for
 * @param radiusM radius of sphere and cylinder, half thickness of a slab, m
 * @param densityKgM3 density with its air spaces, kg/m3
 * @param specificHeatJkgK specific heat above freezing, J/(kg K)
 * @param conductivityWmK thermal conductivity with air spaces, W/(m K)
 * @param unitMassKg mass of one item, kg
 */
public record Item(
        Shape shape,
        double radiusM,
        double densityKgM3,
        double specificHeatJkgK,
        double conductivityWmK,
        double unitMassKg) {
    /** Refuses what no produce can be. */
    public Item {
        Require.within("radiusM", radiusM, 1e-5, 0.5, "m", "Give the radius or half thickness.");
        Require.within("densityKgM3", densityKgM3, 100, 2500, "kg/m3", "Give the item's density.");
        Require.within(
                "specificHeatJkgK", specificHeatJkgK, 1000, 4300, "J/(kg K)", "Produce is wet.");
        Require.within(
                "conductivityWmK", conductivityWmK, 0.02, 1, "W/(m K)", "Water has about 0.6.");
        Require.within("unitMassKg", unitMassKg, 1e-6, 100, "kg", "Give the mass of one item.");
    }

    /**
     * Returns the surface of a kilogram of items.
     *
     * <p>Source: geometry; surface over volume is 3/R, 2/R and 1/L for sphere, cylinder and slab.
     *
     * @return m2/kg, above 0
     */
    public double areaM2PerKg() {
        return shape.dimensions() / (densityKgM3 * radiusM);
    }

    /**
     * Returns the thermal diffusivity.
     *
     * @return m2/s, above 0
     */
    public double diffusivityM2S() {
        return conductivityWmK / (densityKgM3 * specificHeatJkgK);
    }

    /**
     * Returns the sensible heat a mass of items gives up while it cools.
     *
     * @param massKg mass, kg
     * @param fromC first temperature, °C, above freezing
     * @param toC last temperature, °C, above freezing
     * @return J, positive when cooled
     */
    public double sensibleHeatJ(double massKg, double fromC, double toC) {
        return massKg * specificHeatJkgK * (fromC - toC);
    }

    /**
     * Returns the Biot number of a film.
     *
     * @param filmWm2K heat transfer coefficient of the film, W/(m2 K)
     * @return film coefficient times radius over conductivity
     */
    public double biot(double filmWm2K) {
        return filmWm2K * radiusM / conductivityWmK;
    }
}
