package org.wardon.web.api.told;

import java.util.List;
import org.wardon.advice.faces.FaceReport;

/**
 * How a face of a plan conducts.
 *
 * @param at where it stands in the plan
 * @param layers its layers, outside first
 * @param outsideFilmM2KW film outside, m2 K/W
 * @param insideFilmM2KW film inside, m2 K/W
 * @param flow way of the heat, {@code up}, {@code level} or {@code down}
 * @param wattsM2K U-value as it stands, W/(m2 K)
 * @param upliftedWm2K the same with thermal bridges, W/(m2 K)
 * @param asNewWm2K the same as new, W/(m2 K)
 * @param lagHours by how much a wave of a day comes later, h
 * @param decrement what is left of it
 * @param capacityKJm2K heat it holds, kJ/(m2 K)
 */
public record FaceTold(
        String at,
        List<FaceReport.Line> layers,
        double outsideFilmM2KW,
        double insideFilmM2KW,
        String flow,
        double wattsM2K,
        double upliftedWm2K,
        double asNewWm2K,
        double lagHours,
        double decrement,
        double capacityKJm2K) {
    /** Copies the list. */
    public FaceTold {
        layers = List.copyOf(layers);
    }

    /**
     * Tells a face.
     *
     * @param at where it stands in the plan
     * @param report what is known of it
     * @return the answer
     */
    public static FaceTold of(String at, FaceReport report) {
        return new FaceTold(
                at,
                report.layers(),
                report.outsideFilmM2KW(),
                report.insideFilmM2KW(),
                report.flow(),
                report.wattsM2K(),
                report.upliftedWm2K(),
                report.asNewWm2K(),
                report.lagHours(),
                report.decrement(),
                report.capacityKJm2K());
    }
}
