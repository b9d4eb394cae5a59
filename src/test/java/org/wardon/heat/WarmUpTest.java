package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.enclosure.Layer;
import org.wardon.errors.Progress;

/** A massive chamber that follows the weather does not start as if it had no memory. */
class WarmUpTest {
    private static final Layer BRICK = new Layer("brick", 0.22, 0.7, 1700, 900);

    private static Weather repeatedDay(int hours) {
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double[] none = new double[hours];
        for (int h = 0; h < hours; h++) {
            t[h] = 27 - 7 * Math.cos(2 * Math.PI * (h - 4) / 24);
            rh[h] = 60;
            none[h] = 0;
        }
        return new Weather(t, rh, none, none);
    }

    @Test
    void aRepeatedDayFindsTheChamberInItsRhythm() {
        ChamberRun run = Chambers.passive(Chambers.shut(List.of(BRICK)), repeatedDay(80), 3);
        Course course = HeatModel.run(run, Progress.SILENT);
        for (int i = 0; i < 24; i++) {
            assertEquals(course.hours().airC(48 + i), course.hours().airC(i), 0.15, "hour " + i);
        }
        double outdoors = run.weather().temperatureC(0);
        assertTrue(course.hours().airC(0) > outdoors + 2, "a brick box is warmer at night");
    }

    @Test
    void aGivenStartIsKept() {
        ChamberRun run =
                Chambers.passive(Chambers.shut(List.of(BRICK)), repeatedDay(30), 1)
                        .withStart(Start.at(15, 70));
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.hours().airLowestC(0) < 17);
        assertTrue(course.balanceErrorPct() < 1e-6);
    }

    @Test
    void aGivenHumidityAloneIsKept() {
        ChamberRun run =
                Chambers.passive(Chambers.shut(List.of(BRICK)), repeatedDay(30), 1)
                        .withStart(
                                new Start(
                                        java.util.OptionalDouble.empty(),
                                        java.util.OptionalDouble.of(30),
                                        java.util.Optional.empty()));
        Course course = HeatModel.run(run, Progress.SILENT);
        assertEquals(0.30, course.hours().humidityFraction(0), 0.03);
    }
}
