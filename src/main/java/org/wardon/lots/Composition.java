package org.wardon.lots;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import org.wardon.errors.Require;
import org.wardon.produce.rows.CompositionRow;

/**
 * What a tissue is made of, by mass, and what follows for heat.
 *
 * <p>Source: Choi and Okos 1986: specific heats add by mass, volumes add, conductivities lie side
 * by side by volume.
 *
 * @param fraction mass fraction of each component, together 1
 */
public record Composition(Map<Component, Double> fraction) {
    /** Heat of melting of the water in food, J/kg. Source: ASHRAE Refrigeration 2006, chapter 9. */
    private static final double MELTING_J_KG = 334_000;

    /**
     * Conductivity of air in the spaces of tissue, W/(m K), at about 15 °C (from memory of tables).
     */
    private static final double AIR_W_M_K = 0.025;

    /** Copies the map and refuses fractions that do not make up the whole. */
    public Composition {
        // In one order always: sums of the parts must be the same to the last digit in every run.
        Map<Component, Double> ordered = new EnumMap<>(Component.class);
        ordered.putAll(fraction);
        fraction = Collections.unmodifiableMap(ordered);
        double sum = fraction.values().stream().mapToDouble(Double::doubleValue).sum();
        Require.within("sum of fractions", sum, 0.999999, 1.000001, "1", "Scale them to 1.");
    }

    /**
     * Returns the composition of a printed row; carbohydrate is taken net of fibre and the whole
     * scaled to 1.
     *
     * @param row the row, percent
     * @return the composition
     */
    public static Composition of(CompositionRow row) {
        double fibre = row.fibrePct().orElse(0);
        return ofParts(
                row.waterPct(),
                row.proteinPct(),
                row.fatPct(),
                Math.max(0, row.carbohydratePct() - fibre),
                fibre,
                row.ashPct());
    }

    /**
     * Returns the composition of parts in any unit of mass.
     *
     * @param water water
     * @param protein protein
     * @param fat fat
     * @param carbohydrate carbohydrate without fibre
     * @param fibre fibre
     * @param ash ash
     * @return the parts scaled to 1
     */
    public static Composition ofParts(
            double water,
            double protein,
            double fat,
            double carbohydrate,
            double fibre,
            double ash) {
        double sum = water + protein + fat + carbohydrate + fibre + ash;
        Map<Component, Double> parts = new EnumMap<>(Component.class);
        parts.put(Component.WATER, water / sum);
        parts.put(Component.PROTEIN, protein / sum);
        parts.put(Component.FAT, fat / sum);
        parts.put(Component.CARBOHYDRATE, carbohydrate / sum);
        parts.put(Component.FIBRE, fibre / sum);
        parts.put(Component.ASH, ash / sum);
        return new Composition(parts);
    }

    /**
     * Returns the specific heat above freezing.
     *
     * @param temperatureC temperature, °C
     * @return J/(kg K)
     */
    public double specificHeatJkgK(double temperatureC) {
        double sum = 0;
        for (Map.Entry<Component, Double> part : fraction.entrySet()) {
            sum += part.getValue() * ChoiOkos.specificHeatJkgK(part.getKey(), temperatureC);
        }
        return sum;
    }

    /**
     * Returns the density without air spaces.
     *
     * @param temperatureC temperature, °C
     * @return kg/m3
     */
    public double densityKgM3(double temperatureC) {
        double volume = 0;
        for (Map.Entry<Component, Double> part : fraction.entrySet()) {
            volume += part.getValue() / ChoiOkos.densityKgM3(part.getKey(), temperatureC);
        }
        return 1 / volume;
    }

    /**
     * Returns the conductivity without air spaces.
     *
     * @param temperatureC temperature, °C
     * @return W/(m K)
     */
    public double conductivityWmK(double temperatureC) {
        double density = densityKgM3(temperatureC);
        double sum = 0;
        for (Map.Entry<Component, Double> part : fraction.entrySet()) {
            Component component = part.getKey();
            sum +=
                    part.getValue()
                            * density
                            / ChoiOkos.densityKgM3(component, temperatureC)
                            * ChoiOkos.conductivityWmK(component, temperatureC);
        }
        return sum;
    }

    /**
     * Returns the conductivity of tissue whose air spaces make it lighter; air lies side by side
     * with the rest.
     *
     * @param temperatureC temperature, °C
     * @param measuredDensityKgM3 density with air spaces, kg/m3; above the density of the parts
     *     counts as no air
     * @return W/(m K)
     */
    public double conductivityWmK(double temperatureC, double measuredDensityKgM3) {
        double air = Math.max(0, 1 - measuredDensityKgM3 / densityKgM3(temperatureC));
        return (1 - air) * conductivityWmK(temperatureC) + air * AIR_W_M_K;
    }

    /**
     * Returns the heat of freezing all the water.
     *
     * @return J per kg of tissue
     */
    public double latentHeatOfFusionJkg() {
        return MELTING_J_KG * fraction.getOrDefault(Component.WATER, 0.0);
    }
}
