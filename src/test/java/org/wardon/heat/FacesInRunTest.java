package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Sunshine;
import org.wardon.air.Weather;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.GroundFloor;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.NaturalConvection;
import org.wardon.enclosure.RadiantFilm;
import org.wardon.errors.Progress;

/** Each way a face can be built and what lies beyond it, in a run, against sums on paper. */
class FacesInRunTest {
    private static final Box BOX = new Box(4, 3, 2.5);
    private static final List<Layer> PANEL = List.of(Chambers.SHEET, Chambers.FOAM, Chambers.SHEET);
    private static final double PANEL_M2KW = 0.08 / 0.024 + 2 * 0.0005 / 50;
    private static final double SETTING_C = 4;
    private static final double OUTDOOR_C = 28;

    /** A face of panel in shade where it is not told otherwise. */
    private static Enclosure enclosure(Map<FaceName, Face> other, boolean computedFilms) {
        List<Face> faces = new ArrayList<>();
        for (Face face : Chambers.faces(new Beyond.Shade(), new Beyond.Shade(), PANEL)) {
            faces.add(other.getOrDefault(face.name(), face));
        }
        return new Enclosure(BOX, faces, 0, Optional.empty(), 0, 0, Gains.NONE, 0, computedFilms);
    }

    private static Face face(FaceName name, Beyond beyond, List<Layer> layers) {
        return new Face(name, beyond, 90, 0.6, layers);
    }

    private static ChamberRun held(Enclosure enclosure, Weather weather) {
        return Chambers.passive(enclosure, weather, 3)
                .withSetting(new Setting(SETTING_C, 1, 90))
                .withStart(Start.at(SETTING_C, 60))
                .withControlMode(ControlMode.IDEAL);
    }

    /** Mean heat through all faces of a chamber held at its setting from its steady profile. */
    private static double wallsW(ChamberRun run) {
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course.heat().walls() / run.durationS();
    }

    private static double steadyW(Enclosure enclosure) {
        return wallsW(held(enclosure, Weather.steady(OUTDOOR_C, 40)));
    }

    /**
     * Heat of the chamber of panel in shade less that of one face, by hand: its film as it goes.
     */
    private static double othersW(FaceName without) {
        double film = without == FaceName.ROOF ? 0.17 : without == FaceName.FLOOR ? 0.10 : 0.13;
        double one = BOX.areaM2(without) * 24 / (film + PANEL_M2KW + 0.04);
        return steadyW(enclosure(Map.of(), false)) - one;
    }

    private static void isThrough(double expectedW, FaceName name, Face face) {
        double found = steadyW(enclosure(Map.of(name, face), false)) - othersW(name);
        assertEquals(expectedW, found, 0.002 * Math.abs(expectedW));
    }

    @Test
    void aChamberOfPanelTakesTheSumOfItsFaces() {
        double walls = 2 * (BOX.areaM2(FaceName.NORTH) + BOX.areaM2(FaceName.EAST));
        double level = BOX.areaM2(FaceName.ROOF);
        double expected =
                24
                        * (walls / (0.13 + PANEL_M2KW + 0.04)
                                + level / (0.17 + PANEL_M2KW + 0.04)
                                + level / (0.10 + PANEL_M2KW + 0.04));
        assertEquals(expected, steadyW(enclosure(Map.of(), false)), 0.001 * expected);
    }

    @Test
    @Source(
            "ISO 6946:2017, combined method; transmittance of reference-tables row iso6946_bridged_U")
    void battensCarryTheHeatOfTheCombinedMethod() {
        Layer board = new Layer("plywood", 0.012, 0.13, 500, 1600);
        Layer battens =
                new Layer(
                        "own",
                        0.1,
                        0.039,
                        40,
                        1000,
                        new Layer.InPlace(
                                1,
                                Layer.Damp.DRY,
                                Optional.of(new Layer.Bridge(0.13, 15)),
                                OptionalDouble.empty()));
        isThrough(
                0.433972 * BOX.areaM2(FaceName.NORTH) * 24,
                FaceName.NORTH,
                face(FaceName.NORTH, new Beyond.Shade(), List.of(board, battens, board)));
    }

    @Test
    void agedAndDampInsulationLetsMoreThrough() {
        Layer foam =
                new Layer(
                        "foam",
                        0.08,
                        0.024,
                        35,
                        1400,
                        new Layer.InPlace(
                                1.3,
                                new Layer.Damp(3, 6),
                                Optional.empty(),
                                OptionalDouble.empty()));
        double worse = 1.3 * Math.exp(0.18);
        isThrough(
                BOX.areaM2(FaceName.EAST) * 24 / (0.17 + 0.08 / (0.024 * worse)),
                FaceName.EAST,
                face(FaceName.EAST, new Beyond.Shade(), List.of(foam)));
    }

    @Test
    void spacesNeighbourAndShadeAreFeltWithTheirFilms() {
        double wall = BOX.areaM2(FaceName.EAST);
        isThrough(
                wall * (10 - SETTING_C) / (0.13 + PANEL_M2KW + 0.13),
                FaceName.EAST,
                face(FaceName.EAST, new Beyond.Space(10), PANEL));
        isThrough(
                BOX.areaM2(FaceName.ROOF)
                        * (OUTDOOR_C + 5 - SETTING_C)
                        / (0.17 + PANEL_M2KW + 0.17),
                FaceName.ROOF,
                face(FaceName.ROOF, new Beyond.SpaceAboveOutdoor(5), PANEL));
        Face shared = face(FaceName.EAST, new Beyond.Neighbour("south"), PANEL);
        ChamberRun run =
                held(
                        enclosure(Map.of(FaceName.EAST, shared), false),
                        Weather.steady(OUTDOOR_C, 40));
        double found =
                wallsW(
                        run.withExtras(
                                new ChamberRun.Extras(
                                        0, 0, Map.of("south", AirSeries.steady(13, 0.5)))));
        double expected = wall * (13 - SETTING_C) / (0.13 + PANEL_M2KW + 0.13);
        assertEquals(expected, found - othersW(FaceName.EAST), 0.002 * expected);
    }

    @Test
    @Source("ISO 13370:2017, slab on ground, from memory; the run's ground is its mean weather")
    void groundIsTheSlabOfTheStandard() {
        GroundFloor floor = new GroundFloor(12, 14, 0.081, GroundFloor.Soil.SAND_OR_GRAVEL);
        isThrough(
                12 * (OUTDOOR_C - SETTING_C) * floor.wattsM2K(PANEL_M2KW, 0.10),
                FaceName.FLOOR,
                face(FaceName.FLOOR, new Beyond.Ground(), PANEL));
    }

    @Test
    void sunOnAWallCarriesAbsorptanceTimesFilmTimesTransmittance() {
        int hours = 24 * 30 + 3;
        Weather day = Chambers.weather(hours);
        Face shade = face(FaceName.EAST, new Beyond.Shade(), PANEL);
        Face sun = face(FaceName.EAST, new Beyond.Outdoors(), PANEL);
        double inShade = wallsW(days(shade, day));
        double inSun = wallsW(days(sun, day));
        // Mean sunshine on the wall over whole days, by the same sun as told hour by hour.
        double mean = meanOnWallWm2(day, 24 * 30);
        double expected = BOX.areaM2(FaceName.EAST) * 0.6 * 0.04 * mean / (0.17 + PANEL_M2KW);
        assertEquals(expected, inSun - inShade, 0.02 * expected);
    }

    private static ChamberRun days(Face east, Weather weather) {
        return held(enclosure(Map.of(FaceName.EAST, east), false), weather)
                .withDurationS(30 * 86_400.0);
    }

    private static double meanOnWallWm2(Weather weather, int hours) {
        Sunshine sun = Sunshine.of(Chambers.SITE, Chambers.TIMELINE, weather, hours);
        double sum = 0;
        for (int h = 0; h < hours; h++) {
            sum += sun.onFaceWm2(h, 90, 90);
        }
        return sum / hours;
    }

    @Test
    @Source("Churchill and Chu 1975 with radiation at 0.9, as enclosure.NaturalConvection")
    void computedFilmsAreThoseOfTheSurfaceThatTheRunSettlesAt() {
        // A wall of bare brick, where the film is a third of the resistance.
        Layer brick = new Layer("brick", 0.1, 0.72, 1800, 840);
        Face wall = face(FaceName.NORTH, new Beyond.Shade(), List.of(brick));
        double fixed = steadyW(enclosure(Map.of(FaceName.NORTH, wall), false));
        double computed = steadyW(enclosure(Map.of(FaceName.NORTH, wall), true));
        double others = steadyW(enclosure(Map.of(), true)) - panelWallComputedW();
        double area = BOX.areaM2(FaceName.NORTH);
        double throughW = computed - others;
        // The film found back from the flow is the law's at the surface it leaves.
        double surfaceC = OUTDOOR_C - throughW / area * (0.04 + 0.1 / 0.72);
        double film = throughW / area / (surfaceC - SETTING_C);
        double law =
                NaturalConvection.filmWm2K(FaceName.NORTH, BOX, surfaceC, SETTING_C, 101_085)
                        + RadiantFilm.wattsM2K(0.5 * (surfaceC + SETTING_C));
        assertEquals(law, film, 0.005 * law);
        assertTrue(Math.abs(computed - fixed) > 1, "films differ: " + computed + " " + fixed);
    }

    /** Heat of one panel wall with its computed film, found by its own fixed point. */
    private static double panelWallComputedW() {
        double film = 0.13;
        for (int i = 0; i < 60; i++) {
            double flux = (OUTDOOR_C - SETTING_C) / (0.04 + PANEL_M2KW + film);
            double surfaceC = SETTING_C + flux * film;
            film =
                    1
                            / (NaturalConvection.filmWm2K(
                                            FaceName.NORTH, BOX, surfaceC, SETTING_C, 101_085)
                                    + RadiantFilm.wattsM2K(0.5 * (surfaceC + SETTING_C)));
        }
        return BOX.areaM2(FaceName.NORTH) * (OUTDOOR_C - SETTING_C) / (0.04 + PANEL_M2KW + film);
    }
}
