package org.wardon.heat.network;

import java.util.stream.IntStream;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.HeatFlow;
import org.wardon.enclosure.NaturalConvection;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.enclosure.RadiantFilm;
import org.wardon.enclosure.UValue;

/**
 * The inside film of a face, chosen once by the run's mean difference and never switched inside a
 * step.
 */
final class FaceFilms {
    private static final int ROUNDS = 20;
    private static final double LEAST_DIFFERENCE_K = 0.2;

    private FaceFilms() {}

    /**
     * A film.
     *
     * @param resistanceM2KW convection and radiation together, m2 K/W
     * @param convectiveWm2K convection alone, which carries vapour too, W/(m2 K)
     */
    record Film(double resistanceM2KW, double convectiveWm2K) {}

    /** The film inside a face. */
    static Film inside(
            Enclosure enclosure, Face face, OutsideBoundary boundary, NetworkInputs inputs) {
        double standard = Films.insideM2KW(boundary.direction());
        if (!enclosure.computedFilms()) {
            return new Film(standard, convectiveWm2K(boundary.direction()));
        }
        double insideC = inputs.around().insideMeanC();
        double beyondC =
                IntStream.rangeClosed(0, boundary.hours())
                        .mapToDouble(boundary::temperatureC)
                        .average()
                        .orElseThrow();
        double layers =
                UValue.resistanceM2KW(face.asBuilt())
                        + boundary.addedLayers().stream().mapToDouble(l -> l.resistanceM2KW()).sum()
                        + 1 / boundary.filmWm2K(0);
        double film = standard;
        double convective = 0;
        for (int i = 0; i < ROUNDS; i++) {
            double drop = (beyondC - insideC) * film / (film + layers);
            double least = Math.copySign(LEAST_DIFFERENCE_K, drop);
            double surfaceC = insideC + (Math.abs(drop) < LEAST_DIFFERENCE_K ? least : drop);
            convective =
                    NaturalConvection.filmWm2K(
                            face.name(), enclosure.box(), surfaceC, insideC, inputs.pressurePa());
            film = 1 / (convective + RadiantFilm.wattsM2K(0.5 * (surfaceC + insideC)));
        }
        return new Film(film, convective);
    }

    /**
     * Convective part of the inside film of the standard, W/(m2 K).
     *
     * <p>Source: ISO 6946:2017, annex C: 5.0 up, 2.5 level, 0.7 down (from memory).
     */
    static double convectiveWm2K(HeatFlow direction) {
        return switch (direction) {
            case UP -> 5.0;
            case LEVEL -> 2.5;
            case DOWN -> 0.7;
        };
    }
}
