package org.wardon.enclosure;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.wardon.air.Timeline;

/**
 * How a face conducts, layer by layer, as its heat comes in from a warmer far side.
 *
 * <p>Source: ISO 6946:2017 for layers, films and bridges; ISO 13786:2017 for the lag; ISO
 * 13370:2017 for a floor on soil (all from memory).
 *
 * @param layers from outside to inside; soil under a floor comes first
 * @param outsideFilmM2KW resistance of the outer surface, m2 K/W; 0 on soil
 * @param insideFilmM2KW resistance of the inner surface, m2 K/W
 * @param flow direction of the heat
 * @param wattsM2K transmittance with films, age, water and bridges of the layers, W/(m2 K)
 * @param upliftedWm2K the same with the chamber's thermal bridges, W/(m2 K)
 * @param asNewWm2K transmittance of the layers new, dry and whole, W/(m2 K)
 * @param lagHours how much later the day's wave outside comes through, h
 * @param decrement how much of it comes through, 0 to 1 of a face without mass
 * @param capacityJm2K heat capacity the inner side offers to a day, J/(m2 K)
 */
public record FaceSheet(
        List<Part> layers,
        double outsideFilmM2KW,
        double insideFilmM2KW,
        HeatFlow flow,
        double wattsM2K,
        double upliftedWm2K,
        double asNewWm2K,
        double lagHours,
        double decrement,
        double capacityJm2K) {
    /** Copies the list. */
    public FaceSheet {
        layers = List.copyOf(layers);
    }

    /**
     * A layer.
     *
     * @param layer as it was meant
     * @param conductivityWmK as it conducts there: aged, damp, with what goes through it, W/(m K)
     * @param resistanceM2KW its resistance so, m2 K/W
     * @param soil whether it is soil under a floor
     */
    public record Part(Layer layer, double conductivityWmK, double resistanceM2KW, boolean soil) {}

    /**
     * Works out a face.
     *
     * @param face the face
     * @param thermalBridgePct uplift by the chamber's thermal bridges, percent
     * @param ground the floor as it lies on the soil, where it does and that is known
     * @return the sheet
     */
    public static FaceSheet of(Face face, double thermalBridgePct, Optional<GroundFloor> ground) {
        HeatFlow flow = HeatFlow.through(face.name(), 1, 0);
        double inside = Films.insideM2KW(flow);
        double outside = outside(face.beyond(), inside);
        List<Layer> built = face.asBuilt();
        List<Part> parts = new ArrayList<>();
        if (face.beyond() instanceof Beyond.Ground) {
            double floor = UValue.resistanceM2KW(built);
            ground.ifPresent(
                    g -> g.soilLayers(floor, inside).forEach(soil -> parts.add(part(soil))));
        }
        for (int i = 0; i < built.size(); i++) {
            Layer now = built.get(i);
            parts.add(
                    new Part(
                            face.layers().get(i),
                            now.conductivityWmK(),
                            now.resistanceM2KW(),
                            false));
        }
        return of(parts, built, new Between(outside, inside, flow, thermalBridgePct), face);
    }

    /** What lies on both sides. */
    private record Between(double outside, double inside, HeatFlow flow, double bridgesPct) {}

    private static FaceSheet of(List<Part> parts, List<Layer> built, Between films, Face face) {
        List<Layer> all = new ArrayList<>();
        parts.stream().filter(Part::soil).map(Part::layer).forEach(all::add);
        double soil = UValue.resistanceM2KW(all);
        all.addAll(built);
        double watts = UValue.wattsM2K(all, films.inside, films.outside);
        double asNew =
                UValue.ofResistance(
                        soil + UValue.resistanceM2KW(face.layers()) + films.inside + films.outside);
        Collections.reverse(all);
        PeriodicTransmittance day =
                PeriodicTransmittance.of(all, films.inside, films.outside, Timeline.DAY_S);
        return new FaceSheet(
                parts,
                films.outside,
                films.inside,
                films.flow,
                watts,
                watts * (1 + films.bridgesPct / 100),
                asNew,
                -day.shiftS() / Timeline.HOUR_S,
                day.decrement(),
                day.capacityJm2K());
    }

    private static Part part(Layer soil) {
        return new Part(soil, soil.conductivityWmK(), soil.resistanceM2KW(), true);
    }

    /** Behind a wall to a space the air is as still as inside; soil has no film. */
    private static double outside(Beyond beyond, double inside) {
        if (beyond instanceof Beyond.Ground) {
            return 0;
        }
        boolean open = beyond instanceof Beyond.Outdoors || beyond instanceof Beyond.Shade;
        return open ? Films.OUTSIDE_M2KW : inside;
    }
}
