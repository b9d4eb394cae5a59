package org.wardon.advice.faces;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.wardon.advice.picture.FacePicture;
import org.wardon.advice.wording.Words;
import org.wardon.enclosure.FaceSheet;
import org.wardon.enclosure.Layer;

/** How a face conducts, layer by layer, ready to be told. */
public final class FaceReport {
    private static final double MM_IN_M = 1_000;

    private final FaceSheet sheet;

    FaceReport(FaceSheet sheet) {
        this.sheet = sheet;
    }

    /**
     * A layer.
     *
     * @param material what it is made of
     * @param thicknessMm thickness, mm
     * @param newWmK conductivity new, dry and whole, W/(m K)
     * @param nowWmK conductivity there: aged, damp, with what goes through it, W/(m K)
     * @param resistanceM2KW resistance there, m2 K/W
     * @param worseFactor how many times more age and water let through, 1 for neither
     * @param bridgePct share of its area that battens or ties take, percent; empty for none
     * @param soil whether it is soil under a floor
     */
    public record Line(
            String material,
            double thicknessMm,
            double newWmK,
            double nowWmK,
            double resistanceM2KW,
            double worseFactor,
            OptionalDouble bridgePct,
            boolean soil) {}

    /**
     * Returns the layers.
     *
     * @return from outside to inside
     */
    public List<Line> layers() {
        return sheet.layers().stream().map(FaceReport::line).toList();
    }

    private static Line line(FaceSheet.Part part) {
        Layer layer = part.layer();
        return new Line(
                layer.material(),
                MM_IN_M * layer.thicknessM(),
                layer.conductivityWmK(),
                part.conductivityWmK(),
                part.resistanceM2KW(),
                layer.inPlace().worseFactor(),
                layer.inPlace()
                        .bridge()
                        .map(bridge -> OptionalDouble.of(bridge.areaPct()))
                        .orElse(OptionalDouble.empty()),
                part.soil());
    }

    /**
     * Returns the resistance of the outer surface.
     *
     * @return m2 K/W, 0 on soil
     */
    public double outsideFilmM2KW() {
        return sheet.outsideFilmM2KW();
    }

    /**
     * Returns the resistance of the inner surface.
     *
     * @return m2 K/W
     */
    public double insideFilmM2KW() {
        return sheet.insideFilmM2KW();
    }

    /**
     * Returns the direction heat comes in.
     *
     * @return {@code up}, {@code level} or {@code down}
     */
    public String flow() {
        return sheet.flow().name().toLowerCase(Locale.ROOT);
    }

    /**
     * Returns the transmittance with films, age, water and bridges of the layers.
     *
     * @return W/(m2 K)
     */
    public double wattsM2K() {
        return sheet.wattsM2K();
    }

    /**
     * Returns the transmittance with the chamber's thermal bridges too.
     *
     * @return W/(m2 K)
     */
    public double upliftedWm2K() {
        return sheet.upliftedWm2K();
    }

    /**
     * Returns the transmittance of the layers new, dry and whole.
     *
     * @return W/(m2 K)
     */
    public double asNewWm2K() {
        return sheet.asNewWm2K();
    }

    /**
     * Returns how much later the day's wave comes through.
     *
     * @return h
     */
    public double lagHours() {
        return sheet.lagHours();
    }

    /**
     * Returns how much of the day's wave comes through.
     *
     * @return 0 to 1 of a face without mass
     */
    public double decrement() {
        return sheet.decrement();
    }

    /**
     * Returns the heat capacity the inner side offers to a day.
     *
     * @return kJ/(m2 K)
     */
    public double capacityKJm2K() {
        return sheet.capacityJm2K() / 1_000;
    }

    /**
     * Draws the section.
     *
     * @param words words of the person
     * @param marks writes decimal marks as the person does
     * @return SVG that takes its colours from the page's style
     */
    public String picture(Words words, UnaryOperator<String> marks) {
        return FacePicture.of(sheet, words, marks);
    }
}
