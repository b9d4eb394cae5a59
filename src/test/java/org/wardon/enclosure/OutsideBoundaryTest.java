package org.wardon.enclosure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;

/** What each kind of far side gives a face. */
class OutsideBoundaryTest {
    private static final ZoneId ZONE = ZoneId.of("America/Grenada");
    private static final Site SITE = new Site(12, -61.7, 20, ZONE);
    private static final Timeline DAY = new Timeline(LocalDateTime.of(2026, 3, 2, 0, 0), ZONE);
    private static final Layer PANEL = new Layer("own", 0.08, 0.024, 35, 1_400);

    private static Weather sunny() {
        double[] t = new double[49];
        double[] rh = new double[49];
        double[] global = new double[49];
        double[] wind = new double[49];
        Arrays.fill(t, 28);
        Arrays.fill(rh, 70);
        Arrays.fill(wind, 3);
        for (int h = 0; h < 49; h++) {
            global[h] = Math.max(0, 900 * Math.sin(Math.PI * (h % 24 - 6) / 12));
        }
        return new Weather(t, rh, global, wind);
    }

    private static Face face(FaceName name, Beyond beyond, double azimuthDeg) {
        return new Face(name, beyond, azimuthDeg, 0.6, List.of(PANEL));
    }

    private static Enclosure enclosure(Face one) {
        List<Face> faces =
                Arrays.stream(FaceName.values())
                        .map(n -> n == one.name() ? one : face(n, new Beyond.Shade(), 0))
                        .toList();
        return new Enclosure(
                new Box(4, 3, 2.5), faces, 10, Optional.empty(), 2, 0, Gains.NONE, 0, false);
    }

    private static OutsideBoundary of(Face face, Weather weather) {
        Surroundings around = Surroundings.of(SITE, DAY, weather, 48, 12);
        return OutsideBoundary.of(enclosure(face), face, around);
    }

    @Test
    void roofUnderTheSunIsHotAtNoonAndColderThanAirAtNight() {
        OutsideBoundary roof = of(face(FaceName.ROOF, new Beyond.Outdoors(), 0), sunny());
        // 0.6 x 900 W/m2 over 21.5 W/(m2 K) is 25 K, less up to 4 K to the sky.
        assertEquals(28 + 0.6 * 900 / 21.5 - 4, roof.temperatureC(12), 1);
        assertTrue(roof.temperatureC(2) < 28 && roof.temperatureC(2) >= 24);
        assertEquals(21.5, roof.filmWm2K(5), 1e-12);
        assertEquals(HeatFlow.DOWN, roof.direction());
        assertEquals(List.of(), roof.addedLayers());
        assertEquals(List.of(), roof.reasons());
        assertEquals(48, roof.hours());
    }

    @Test
    void eastWallIsWarmerInTheMorningAndAWallInShadeNever() {
        OutsideBoundary east = of(face(FaceName.EAST, new Beyond.Outdoors(), 90), sunny());
        OutsideBoundary west = of(face(FaceName.WEST, new Beyond.Outdoors(), 270), sunny());
        OutsideBoundary shade = of(face(FaceName.EAST, new Beyond.Shade(), 90), sunny());
        assertTrue(east.temperatureC(9) > west.temperatureC(9) + 3);
        assertTrue(west.temperatureC(15) > east.temperatureC(15) + 3);
        assertEquals(28, east.temperatureC(0), 1e-12);
        for (int h = 0; h <= 48; h++) {
            assertEquals(28, shade.temperatureC(h));
            assertEquals(25, shade.filmWm2K(h), 1e-12);
        }
    }

    @Test
    void spacesTakeTheInsideFilmOfTheDirection() {
        OutsideBoundary hot = of(face(FaceName.ROOF, new Beyond.Space(22), 0), sunny());
        assertEquals(22, hot.temperatureC(7));
        assertEquals(1 / 0.17, hot.filmWm2K(7), 1e-12);
        OutsideBoundary loft = of(face(FaceName.ROOF, new Beyond.SpaceAboveOutdoor(3), 0), sunny());
        assertEquals(31, loft.temperatureC(7));
    }

    @Test
    void groundIsTheSlabOfTheStandardOverTheYearlyMean() {
        Face floor = face(FaceName.FLOOR, new Beyond.Ground(), 0);
        Site known = SITE.withYear(new YearWave(26.5, 0, 200));
        Surroundings around = Surroundings.of(known, DAY, sunny(), 48, 12);
        OutsideBoundary ground = OutsideBoundary.of(enclosure(floor), floor, around);
        assertEquals(26.5, ground.temperatureC(30));
        assertEquals(List.of(), ground.reasons());
        double rf = PANEL.resistanceM2KW();
        double total =
                1 / ground.filmWm2K(0)
                        + UValue.resistanceM2KW(ground.addedLayers())
                        + rf
                        + Films.insideM2KW(ground.direction());
        GroundFloor slab = new GroundFloor(12, 14, 0.08, GroundFloor.Soil.SAND_OR_GRAVEL);
        assertEquals(slab.wattsM2K(rf, 0.10), 1 / total, 1e-4 * slab.wattsM2K(rf, 0.10));
        OutsideBoundary guessed = of(floor, sunny());
        assertEquals(28, guessed.temperatureC(0), 1e-9);
        assertEquals("ground-from-run-weather", guessed.reasons().get(0).code());
    }

    @Test
    void unknownSunIsEstimatedWithAReason() {
        double[] t = new double[49];
        double[] unknown = new double[49];
        Arrays.fill(unknown, Double.NaN);
        for (int h = 0; h < 49; h++) {
            t[h] = 28 - 5 * Math.cos(2 * Math.PI * (h - 3) / 24);
        }
        Weather weather = new Weather(t, t, unknown, unknown);
        OutsideBoundary roof = of(face(FaceName.ROOF, new Beyond.Outdoors(), 0), weather);
        assertEquals("sun-from-temperature-range", roof.reasons().get(0).code());
        assertTrue(roof.temperatureC(12) > weather.temperatureC(12) + 5);
    }

    @Test
    void neighbourMustBeKnown() {
        Face wall = face(FaceName.SOUTH, new Beyond.Neighbour("cold"), 180);
        Surroundings around = Surroundings.of(SITE, DAY, sunny(), 48, 12);
        String message =
                assertThrows(
                                IllegalArgumentException.class,
                                () -> OutsideBoundary.of(enclosure(wall), wall, around))
                        .getMessage();
        assertEquals("the air of chamber cold is not given; known are []", message);
        Surroundings known = around.withNeighbours(Map.of("cold", h -> 2 + h));
        assertEquals(9, OutsideBoundary.of(enclosure(wall), wall, known).temperatureC(7));
    }
}
