package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;

/**
 * One face at an instant, from outside to inside, and what went through it since the start.
 *
 * @param areaM2 inside area, m2
 * @param beyondC what lies beyond, sun on it counted in, °C
 * @param outerC outer surface, °C
 * @param points temperatures at the nodes of the layers
 * @param thicknessM of all layers, m
 * @param innerC inner surface, °C
 * @param fromBeyondJ heat from the far side into the layers, J
 * @param toAirJ heat to the chamber's air, thermal bridge included, J
 * @param bridgeJ heat through the thermal bridge, J
 * @param vapourKg vapour to the air, below 0 where it condensed, kg
 * @param waterKg water lying on it, kg
 */
public record FaceReading(
        double areaM2,
        double beyondC,
        double outerC,
        List<Point> points,
        double thicknessM,
        double innerC,
        double fromBeyondJ,
        double toAirJ,
        double bridgeJ,
        double vapourKg,
        double waterKg) {
    /**
     * A place in the layers.
     *
     * @param depthM from the outer side, m
     * @param temperatureC there, °C
     * @param layer name of the layer it lies in or ends
     */
    public record Point(double depthM, double temperatureC, String layer) {}

    /** Copies the list. */
    public FaceReading {
        points = List.copyOf(points);
    }

    /**
     * Returns the face as it is now with what went through it since an earlier reading.
     *
     * @param before the earlier reading
     * @return the reading of the span
     */
    public FaceReading since(FaceReading before) {
        return new FaceReading(
                areaM2,
                beyondC,
                outerC,
                points,
                thicknessM,
                innerC,
                fromBeyondJ - before.fromBeyondJ,
                toAirJ - before.toAirJ,
                bridgeJ - before.bridgeJ,
                vapourKg - before.vapourKg,
                waterKg);
    }

    /** The parts of one face as one: temperatures in the mean by area, the rest added. */
    static FaceReading of(List<FacePart> parts, double[] y, double[] totals) {
        FaceReading all = of(parts.get(0), y, totals);
        for (FacePart part : parts.subList(1, parts.size())) {
            all = all.with(of(part, y, totals));
        }
        return all;
    }

    private FaceReading with(FaceReading other) {
        double share = other.areaM2 / (areaM2 + other.areaM2);
        List<Point> mean = new ArrayList<>();
        for (int i = 0; i < points.size(); i++) {
            Point here = points.get(i);
            double there = other.points.get(i).temperatureC();
            double both = here.temperatureC() + share * (there - here.temperatureC());
            mean.add(new Point(here.depthM(), both, here.layer()));
        }
        return new FaceReading(
                areaM2 + other.areaM2,
                beyondC,
                outerC + share * (other.outerC - outerC),
                mean,
                thicknessM,
                innerC + share * (other.innerC - innerC),
                fromBeyondJ + other.fromBeyondJ,
                toAirJ + other.toAirJ,
                bridgeJ + other.bridgeJ,
                vapourKg + other.vapourKg,
                waterKg + other.waterKg);
    }

    private static FaceReading of(FacePart face, double[] y, double[] totals) {
        FaceGrid grid = face.grid();
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < grid.depthM.length; i++) {
            points.add(new Point(grid.depthM[i], y[face.outermost() + i], grid.layers.get(i)));
        }
        double film = face.farFilmWm2K();
        double intoFirst =
                (face.beyondC() - points.get(0).temperatureC()) / (1 / film + grid.outerM2KW);
        return new FaceReading(
                face.areaM2(),
                face.beyondC(),
                face.beyondC() - intoFirst / film,
                points,
                grid.thicknessM,
                face.surfaceC(y),
                totals[face.flow(FacePart.FROM_BEYOND)],
                totals[face.flow(FacePart.HEAT)],
                totals[face.flow(FacePart.BRIDGE)],
                totals[face.flow(FacePart.VAPOUR)],
                face.waterKg(y));
    }
}
