package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** The series as a series: it starts at one, obeys its boundary, keeps its books. */
class SeriesSolutionTest {
    @ParameterizedTest
    @CsvSource({
        "SLAB, 0.1",
        "SLAB, 30",
        "CYLINDER, 0.1",
        "CYLINDER, 30",
        "SPHERE, 0.1",
        "SPHERE, 30"
    })
    void rootsRiseAndHeatLostIsHeatThroughTheFilm(Shape shape, double biot) {
        SeriesSolution series = SeriesSolution.of(shape, biot);
        for (int n = 2; n <= 60; n++) {
            double apart = series.eigenvalue(n) - series.eigenvalue(n - 1);
            assertTrue(apart > 2 && apart < 4.2, "root " + n + " lies " + apart + " on");
        }
        double fourier = 0.2;
        double step = 1e-5;
        double loss = (series.mean(fourier - step) - series.mean(fourier + step)) / (2 * step);
        double film = shape.dimensions() * biot * series.at(1, fourier);
        assertEquals(film, loss, 1e-6 * film);
    }

    @ParameterizedTest
    @EnumSource(Shape.class)
    void startsAtOneInside(Shape shape) {
        SeriesSolution series = SeriesSolution.of(shape, 1);
        assertEquals(1, series.at(0, 0.001), 1e-4);
        assertEquals(0.125, series.mean(series.fourierWhenMean(0.125)), 1e-9);
    }
}
