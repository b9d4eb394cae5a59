package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;
import org.wardon.cooling.WaterFilm;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.heat.solver.Tree;
import org.wardon.produce.Reason;

/**
 * The faces of a chamber with what lies beyond them, hour by hour. A face that bounds both ends of
 * the air is two parts.
 */
final class Faces {
    private final NetworkInputs inputs;
    private final List<OutsideBoundary> boundaries = new ArrayList<>();
    private final FacePart[] parts;
    private final int[] faceOf;
    private final double[][] beyondC;
    private final double[] hourStartC;
    private final double[] hourChangeK;
    private final List<FilmedFace> filmed = new ArrayList<>();
    private final List<WettedFace> wetted = new ArrayList<>();

    Faces(Tree tree, IntUnaryOperator take, NetworkInputs inputs, AirEnd[] ends) {
        this.inputs = inputs;
        Enclosure enclosure = inputs.enclosure();
        FaceParts kinds = new FaceParts(tree, take, inputs);
        List<FacePart> list = new ArrayList<>();
        for (Face face : enclosure.faces()) {
            boundaries.add(OutsideBoundary.of(enclosure, face, inputs.around()));
        }
        List<Integer> numbers = new ArrayList<>();
        for (AirEnd end : ends) {
            end.hang(tree);
            List<FacePart> here = new ArrayList<>();
            for (int i = 0; i < enclosure.faces().size(); i++) {
                Face face = enclosure.faces().get(i);
                double share = end.shareOf(face.name());
                if (share > 0) {
                    here.add(kinds.of(face, share, boundaries.get(i)));
                    numbers.add(i);
                }
            }
            end.add(here);
            list.addAll(here);
        }
        parts = list.toArray(new FacePart[0]);
        faceOf = numbers.stream().mapToInt(i -> i).toArray();
        for (FacePart part : parts) {
            if (part instanceof FilmedFace under) {
                filmed.add(under);
            } else if (part instanceof WettedFace wet) {
                wetted.add(wet);
            }
        }
        beyondC = new double[parts.length][];
        for (int i = 0; i < parts.length; i++) {
            beyondC[i] = boundaries.get(faceOf[i]).meansC(inputs.rowHours());
        }
        hourStartC = new double[parts.length];
        hourChangeK = new double[parts.length];
    }

    FacePart[] parts() {
        return parts;
    }

    /** The parts of one face. */
    List<FacePart> of(int face) {
        List<FacePart> found = new ArrayList<>();
        for (int i = 0; i < parts.length; i++) {
            if (faceOf[i] == face) {
                found.add(parts[i]);
            }
        }
        return found;
    }

    /** Number of the face a node of the state lies in, -1 for none. */
    int holding(int node) {
        for (int i = 0; i < parts.length; i++) {
            if (node >= parts[i].firstNode() && node <= parts[i].lastNode()) {
                return faceOf[i];
            }
        }
        return -1;
    }

    /** Mean inner surface of a face, °C. */
    double surfaceC(int face, double[] y) {
        double mean = 0;
        double area = 0;
        for (FacePart part : of(face)) {
            area += part.areaM2();
            mean += part.areaM2() / area * (part.surfaceC(y) - mean);
        }
        return mean;
    }

    List<WettedFace> wetted() {
        return wetted;
    }

    List<FilmedFace> filmed() {
        return filmed;
    }

    /** Lets the water of each face run as its cooler does. */
    void drivenBy(CoolerPart[] coolers) {
        filmed.forEach(face -> face.drivenBy(coolers[face.cooler()]));
    }

    /** Enters an hour of the weather and of the water, and the stretch that starts with it. */
    void hour(int hour) {
        int until = Math.min(hour + inputs.rowHours(), inputs.around().hours());
        for (int i = 0; i < parts.length; i++) {
            OutsideBoundary b = boundaries.get(faceOf[i]);
            parts[i].farFilm(0.5 * (b.filmWm2K(hour) + b.filmWm2K(until)));
            hourStartC[i] = beyondC[i][hour];
            hourChangeK[i] = beyondC[i][hour + 1] - hourStartC[i];
        }
        double outdoorC =
                0.5
                        * (inputs.around().weather().temperatureC(hour)
                                + inputs.around().weather().temperatureC(until));
        for (FilmedFace face : filmed) {
            WaterFilm water = (WaterFilm) inputs.coolers().get(face.cooler());
            double inletC = inletC(water, hour, until);
            face.hour(
                    inletC, water.chiller().map(c -> c.electricPerW(inletC, outdoorC)).orElse(0.0));
        }
    }

    /** Water at the inlet in the mean of a stretch of hours, °C. */
    private double inletC(WaterFilm water, int from, int until) {
        int hours = Math.max(until - from, 1);
        double sum = 0;
        for (int h = from; h < from + hours; h++) {
            sum += water.inletC((int) Math.floor(inputs.startsAtHour() + h) % 24);
        }
        return sum / hours;
    }

    /** Sets what lies beyond at a share of the hour. */
    void at(double share) {
        for (int i = 0; i < parts.length; i++) {
            parts[i].beyond(hourStartC[i] + share * hourChangeK[i], hourChangeK[i] / 3600);
        }
    }

    /** Lets the films of water follow the state, and the sand of wetted walls. */
    void settle(AirState air, double[] y) {
        filmed.forEach(face -> face.settle(air, y));
        wetted.forEach(face -> face.follow(y));
    }

    void steadyProfile(double airC, double[] y) {
        for (FacePart part : parts) {
            part.steadyProfile(airC, y);
        }
    }

    double layersJ(double[] y) {
        double sum = 0;
        for (FacePart part : parts) {
            sum += part.heatJ(y);
        }
        return sum;
    }

    double waterKg(double[] y) {
        double sum = 0;
        for (FacePart part : parts) {
            sum += part.waterKg(y);
        }
        return sum;
    }

    void tolerances(double airK, double[] tolerances) {
        for (FacePart part : parts) {
            part.tolerances(airK, tolerances);
        }
    }

    List<Reason> reasons() {
        return boundaries.stream().flatMap(b -> b.reasons().stream()).distinct().toList();
    }
}
