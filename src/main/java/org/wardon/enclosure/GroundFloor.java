package org.wardon.enclosure;

import java.util.ArrayList;
import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.air.YearWave;
import org.wardon.errors.Require;

/**
 * A slab on the ground.
 *
 * <p>Source: ISO 13370:2017, slab on ground without edge insulation, and its annex on a floor in a
 * transient calculation: floor, half a metre of soil, and a virtual layer that brings the whole
 * resistance to that of the slab (from memory).
 *
 * @param areaM2 area, m2
 * @param perimeterM exposed perimeter, m
 * @param wallThicknessM thickness of the walls around it, m
 * @param soil what it lies on
 */
public record GroundFloor(double areaM2, double perimeterM, double wallThicknessM, Soil soil) {
    /**
     * How much later than outdoors the yearly wave comes through the ground, days: one month.
     * Source: ISO 13370:2017, periodic heat flow of a slab on ground, from memory.
     */
    public static final double LATE_DAYS = 30.4;

    /** Depth of soil with capacity, m. */
    private static final double SOIL_DEPTH_M = 0.5;

    /**
     * Soil.
     *
     * @param conductivityWmK conductivity, W/(m K)
     * @param densityKgM3 density, kg/m3
     * @param specificHeatJkgK specific heat, J/(kg K)
     */
    public record Soil(double conductivityWmK, double densityKgM3, double specificHeatJkgK) {
        /**
         * Sand or gravel, taken where the soil is not known: 2.0 W/(m K) and 2.0 MJ/(m3 K). Source:
         * ISO 13370:2017, table 7, from memory.
         */
        public static final Soil SAND_OR_GRAVEL = new Soil(2.0, 2_000, 1_000);

        /** Clay or silt. Source: ISO 13370:2017, table 7, from memory. */
        public static final Soil CLAY_OR_SILT = new Soil(1.5, 2_000, 1_500);

        /** Checks the bounds. */
        public Soil {
            Require.within("soil conductivityWmK", conductivityWmK, 0.1, 10, "W/(m K)", "");
            Require.within("soil densityKgM3", densityKgM3, 500, 4_000, "kg/m3", "");
            Require.within("soil specificHeatJkgK", specificHeatJkgK, 400, 4_500, "J/(kg K)", "");
        }
    }

    /** Checks the bounds. */
    public GroundFloor {
        Require.within("floor areaM2", areaM2, 0.01, 1e6, "m2", "");
        Require.within("floor perimeterM", perimeterM, 0.1, 1e5, "m", "");
        Require.within("wallThicknessM", wallThicknessM, 0, 5, "m", "");
    }

    /**
     * Returns the floor of a chamber that stands alone on sand or gravel (the soil taken where none
     * is known).
     *
     * @param enclosure the chamber
     * @return its floor, exposed all around
     */
    public static GroundFloor under(Enclosure enclosure) {
        Box box = enclosure.box();
        double thick =
                enclosure.faces().stream()
                        .filter(face -> !face.level())
                        .mapToDouble(
                                face -> face.layers().stream().mapToDouble(Layer::thicknessM).sum())
                        .average()
                        .orElse(0);
        return new GroundFloor(
                box.areaM2(FaceName.FLOOR),
                2 * (box.lengthM() + box.widthM()),
                thick,
                Soil.SAND_OR_GRAVEL);
    }

    /**
     * Returns the characteristic dimension: area over half the perimeter.
     *
     * @return m
     */
    public double characteristicM() {
        return areaM2 / (0.5 * perimeterM);
    }

    /**
     * Returns the thickness of soil as good as the floor with its films.
     *
     * @param floorM2KW resistance of the floor's layers, m2 K/W
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @return m
     */
    public double equivalentM(double floorM2KW, double insideFilmM2KW) {
        return wallThicknessM
                + soil.conductivityWmK * (insideFilmM2KW + floorM2KW + Films.OUTSIDE_M2KW);
    }

    /**
     * Returns the transmittance between the chamber and the yearly mean outdoors.
     *
     * @param floorM2KW resistance of the floor's layers, m2 K/W
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @return W/(m2 K)
     */
    public double wattsM2K(double floorM2KW, double insideFilmM2KW) {
        double b = characteristicM();
        double dt = equivalentM(floorM2KW, insideFilmM2KW);
        double lambda = soil.conductivityWmK;
        return dt < b
                ? 2 * lambda / (Math.PI * b + dt) * Math.log(Math.PI * b / dt + 1)
                : lambda / (0.457 * b + dt);
    }

    /**
     * Returns how much of the yearly swing outdoors acts below the floor: the periodic coefficient
     * of the standard over its steady one. Never above 1: the standard's strip along the edge would
     * say so for a very small floor (departure).
     *
     * <p>Source: ISO 13370:2017, annex on periodic heat flow, slab on ground without edge
     * insulation: {@code 0.37 P lambda ln(delta/dt + 1)} with the depth delta the yearly wave
     * reaches (from memory; 3.2 m in sand or gravel, 2.2 m in clay).
     *
     * @param floorM2KW resistance of the floor's layers, m2 K/W
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @return 0 to 1
     */
    public double swingShare(double floorM2KW, double insideFilmM2KW) {
        double diffusivity = soil.conductivityWmK / (soil.densityKgM3 * soil.specificHeatJkgK);
        double reachM =
                GroundTemperature.dampingDepthM(diffusivity, YearWave.YEAR_DAYS * Timeline.DAY_S);
        double dt = equivalentM(floorM2KW, insideFilmM2KW);
        double periodicWK = 0.37 * perimeterM * soil.conductivityWmK * Math.log(reachM / dt + 1);
        return Math.min(1, periodicWK / (areaM2 * wattsM2K(floorM2KW, insideFilmM2KW)));
    }

    /**
     * Returns the layers to put below the floor in a transient calculation, deepest first: a
     * resistance and soil. Below them stands the yearly mean outdoors. A very small floor has less
     * than half a metre of soil.
     *
     * @param floorM2KW resistance of the floor's layers, m2 K/W
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @return one or two layers whose resistance with floor and film is that of {@link #wattsM2K}
     */
    public List<Layer> soilLayers(double floorM2KW, double insideFilmM2KW) {
        double below = 1 / wattsM2K(floorM2KW, insideFilmM2KW) - floorM2KW - insideFilmM2KW;
        double depth = Math.min(SOIL_DEPTH_M, 0.9 * below * soil.conductivityWmK);
        double virtual = below - depth / soil.conductivityWmK;
        List<Layer> layers = new ArrayList<>();
        // A resistance has no thickness of its own: 0.1 m keeps its conductivity within bounds.
        layers.add(new Layer("virtual-ground", 0.1, 0.1 / virtual, 0, 0));
        layers.add(
                new Layer(
                        "soil",
                        depth,
                        soil.conductivityWmK,
                        soil.densityKgM3,
                        soil.specificHeatJkgK));
        return layers;
    }
}
