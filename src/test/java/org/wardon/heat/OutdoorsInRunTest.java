package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Site;
import org.wardon.air.Sunshine;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.GroundFloor;
import org.wardon.enclosure.Layer;
import org.wardon.errors.Progress;

/**
 * Wind, sky, sun by direction and slope, the year below a floor: each found in what a run takes
 * through its faces, not in the law alone.
 */
class OutdoorsInRunTest {
    private static final ZoneId UTC = ZoneId.of("UTC");
    private static final Box BOX = new Box(4, 3, 2.5);
    private static final Layer FOAM = new Layer("foam", 0.08, 0.024, 35, 1400);

    /** Thin and without capacity: what it passes follows the hour. */
    private static final Layer BOARD = new Layer("board", 0.02, 0.04, 0, 0);

    private static final double BOARD_M2KW = 0.02 / 0.04;
    private static final double SETTING_C = 10;

    /** A chamber that feels nothing but one face: the others lie to a space at its setting. */
    private static Enclosure only(Face face) {
        List<Face> faces = new ArrayList<>();
        for (FaceName name : FaceName.values()) {
            faces.add(
                    name == face.name()
                            ? face
                            : new Face(name, new Beyond.Space(SETTING_C), 0, 0.6, List.of(FOAM)));
        }
        return new Enclosure(BOX, faces, 0, Optional.empty(), 0, 0, Gains.NONE, 0, false);
    }

    /** Mean heat through the faces, the chamber held at its setting, W. */
    private static double wallsW(
            Face face, Site site, LocalDateTime from, Weather weather, int days) {
        ChamberRun run =
                ChamberRun.of(
                                "north",
                                site,
                                new Timeline(from, UTC),
                                weather,
                                only(face),
                                new Setting(SETTING_C, 1, 90),
                                days * 86_400.0)
                        .withStart(Start.at(SETTING_C, 50))
                        .withControlMode(ControlMode.IDEAL);
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course.heat().walls() / run.durationS();
    }

    private static Weather weather(int days, double airC, double globalShare, double windMs) {
        int n = 24 * days + 3;
        double[] t = new double[n];
        double[] rh = new double[n];
        double[] sun = new double[n];
        double[] wind = new double[n];
        Arrays.fill(t, airC);
        Arrays.fill(rh, 30);
        Arrays.fill(wind, windMs);
        for (int h = 0; h < n; h++) {
            sun[h] = globalShare * Math.max(0, Math.cos(2 * Math.PI * (h % 24 - 12) / 24.0));
        }
        return new Weather(t, rh, sun, wind);
    }

    private static Face outdoors(FaceName name, double azimuthDeg, Layer layer) {
        return new Face(name, new Beyond.Outdoors(), azimuthDeg, 0.6, List.of(layer));
    }

    @ParameterizedTest
    @CsvSource({"NaN, 0.04", "0, 0.105263", "4, 0.039216", "12, 0.017391"})
    @Source("ISO 6946:2017, annex C, 1/(4 + 4v + 5.5), from memory; 0.04 where no wind is known")
    void windThinsTheFilmOutside(double windMs, double filmM2KW) {
        Face wall = outdoors(FaceName.EAST, 90, BOARD);
        Site site = new Site(12, 0, 0, UTC);
        double found =
                wallsW(
                        wall,
                        site,
                        LocalDateTime.of(2026, 3, 2, 0, 0),
                        weather(2, 30, 0, windMs),
                        2);
        double expected = BOX.areaM2(FaceName.EAST) * 20 / (0.13 + BOARD_M2KW + filmM2KW);
        // A face that is nothing but resistance is given a little mass, which starts colder.
        assertEquals(expected, found, 0.002 * expected);
    }

    @Test
    @Source("ASHRAE Handbook - Fundamentals, sol-air temperature, 4 K on level faces, from memory")
    void aRoofLosesToAClearSkyAndAWallDoesNot() {
        Site site = new Site(12, 0, 0, UTC);
        LocalDateTime from = LocalDateTime.of(2026, 3, 2, 0, 0);
        Weather clear = weather(4, 30, 850, Double.NaN);
        Sunshine sun = Sunshine.of(site, new Timeline(from, UTC), clear, 96);
        double sky = 0;
        double shine = 0;
        for (int h = 0; h < 96; h++) {
            sky += sun.skyClearness(h) / 96;
            shine += sun.onFaceWm2(h, 0, 0) / 96;
        }
        assertTrue(sky > 0.6, "clearness " + sky);
        double found = wallsW(outdoors(FaceName.ROOF, 0, BOARD), site, from, clear, 4);
        double solAir = 30 + 0.6 * 0.04 * shine - 4 * sky;
        double expected =
                BOX.areaM2(FaceName.ROOF) * (solAir - SETTING_C) / (0.17 + BOARD_M2KW + 0.04);
        assertEquals(expected, found, 0.005 * expected);
        // Under a dull sky nothing is lost: the same sum without it.
        double dull =
                wallsW(
                        outdoors(FaceName.ROOF, 0, BOARD),
                        site,
                        from,
                        weather(4, 30, 0, Double.NaN),
                        4);
        double plain = BOX.areaM2(FaceName.ROOF) * 20 / (0.17 + BOARD_M2KW + 0.04);
        assertEquals(plain, dull, 0.001 * plain);
    }

    @ParameterizedTest
    @CsvSource({"35, 6, 180", "35, 12, 180", "-35, 6, 0", "-35, 12, 0"})
    void theWallToTheEquatorGetsTheSunInEitherHemisphere(
            double latitudeDeg, int month, double equatorwardDeg) {
        Site site = new Site(latitudeDeg, 0, 0, UTC);
        LocalDateTime from = LocalDateTime.of(2026, month, 10, 0, 0);
        boolean winter = latitudeDeg > 0 == (month == 12);
        Weather sunny = weather(3, 20, winter ? 450 : 900, Double.NaN);
        double toward =
                wallsW(outdoors(FaceName.SOUTH, equatorwardDeg, BOARD), site, from, sunny, 3);
        double away =
                wallsW(outdoors(FaceName.SOUTH, 180 - equatorwardDeg, BOARD), site, from, sunny, 3);
        double shade =
                wallsW(
                        new Face(FaceName.SOUTH, new Beyond.Shade(), 0, 0.6, List.of(BOARD)),
                        site,
                        from,
                        sunny,
                        3);
        assertTrue(toward > away && away > shade, toward + ", " + away + ", " + shade);
        if (winter) {
            assertTrue(toward - shade > 3 * (away - shade), "low sun: " + toward + ", " + away);
        }
    }

    @Test
    void aRoofTiltedToTheWinterSunTakesMoreOfItAndLosesLessToTheSky() {
        Site site = new Site(-35, 0, 0, UTC);
        LocalDateTime from = LocalDateTime.of(2026, 6, 10, 0, 0);
        Weather sunny = weather(3, 15, 450, Double.NaN);
        Sunshine sun = Sunshine.of(site, new Timeline(from, UTC), sunny, 72);
        for (double azimuthDeg : new double[] {0, 180}) {
            Face roof =
                    new Face(
                            FaceName.ROOF,
                            new Beyond.Outdoors(),
                            azimuthDeg,
                            30,
                            0.6,
                            List.of(BOARD));
            double solAir = 15;
            for (int h = 0; h < 72; h++) {
                solAir += 0.6 * 0.04 * sun.onFaceWm2(h, 30, azimuthDeg) / 72;
                solAir -= 4 * Math.cos(Math.toRadians(30)) * sun.skyClearness(h) / 72;
            }
            double film = solAir > SETTING_C ? 0.17 : 0.10;
            double expected =
                    BOX.areaM2(FaceName.ROOF) * (solAir - SETTING_C) / (film + BOARD_M2KW + 0.04);
            double found = wallsW(roof, site, from, sunny, 3);
            assertEquals(expected, found, 0.02 * Math.abs(expected));
        }
        double level = wallsW(outdoors(FaceName.ROOF, 0, BOARD), site, from, sunny, 3);
        double north = wallsW(tilted(0), site, from, sunny, 3);
        double south = wallsW(tilted(180), site, from, sunny, 3);
        assertTrue(north > level + 20 && south < level, north + ", " + level + ", " + south);
    }

    private static Face tilted(double azimuthDeg) {
        return new Face(FaceName.ROOF, new Beyond.Outdoors(), azimuthDeg, 30, 0.6, List.of(BOARD));
    }

    @Test
    @Source("ISO 13370:2017, slab on ground and its periodic coefficient, from memory")
    void theFloorFeelsTheYearAMonthLateAndDamped() {
        YearWave year = new YearWave(24, 10, 202);
        Site site = new Site(30, 0, 0, UTC).withYear(year);
        Face floor = new Face(FaceName.FLOOR, new Beyond.Ground(), 0, 0.6, List.of(FOAM));
        GroundFloor slab = new GroundFloor(12, 14, 0.08, GroundFloor.Soil.SAND_OR_GRAVEL);
        double perK = 12 * slab.wattsM2K(FOAM.resistanceM2KW(), 0.10);
        double swingK = 10 * slab.swingShare(FOAM.resistanceM2KW(), 0.10);
        assertTrue(swingK > 5 && swingK <= 10, "swing " + swingK);
        for (int month = 1; month <= 12; month++) {
            LocalDateTime from = LocalDateTime.of(2026, month, 10, 0, 0);
            double found = wallsW(floor, site, from, weather(14, 20, 0, Double.NaN), 14);
            double late = 2 * Math.PI * (from.getDayOfYear() + 7 - 202 - 30.4) / 365.25;
            double groundC = 24 + swingK * Math.cos(late);
            // Half a metre of soil passes the year on a little late still: 1 K of ground.
            assertEquals(perK * (groundC - SETTING_C), found, perK * 1.0, "month " + month);
        }
    }

    @Test
    @Source("Incropera and others, semi-infinite solid, case 3 (surface film), from memory")
    void aThickWallDrawsHeatAsAHalfSpaceDoes() {
        // Two metres of brick at 30 °C when the chamber is set to 10: no other side is felt.
        Layer brick = new Layer("brick", 2, 0.72, 1_800, 840);
        Face wall = new Face(FaceName.EAST, new Beyond.Shade(), 0, 0.6, List.of(brick));
        ChamberRun warm =
                ChamberRun.of(
                                "north",
                                new Site(12, 0, 0, UTC),
                                new Timeline(LocalDateTime.of(2026, 3, 2, 0, 0), UTC),
                                weather(4, 30, 0, Double.NaN),
                                only(wall),
                                new Setting(SETTING_C, 1, 90),
                                4 * 86_400.0)
                        .withStart(Start.at(30, 30))
                        .withControlMode(ControlMode.IDEAL);
        Course course = HeatModel.run(warm, Progress.SILENT);
        ChamberRun without =
                warm.withEnclosure(
                        only(
                                new Face(
                                        FaceName.EAST,
                                        new Beyond.Space(SETTING_C),
                                        0,
                                        0.6,
                                        List.of(FOAM))));
        double wallJ =
                course.heat().walls() - HeatModel.run(without, Progress.SILENT).heat().walls();
        double foamJ = foamStartJ();
        double expected =
                BOX.areaM2(FaceName.EAST)
                        * halfSpaceJ(0.72, 1_800 * 840.0, 1 / 0.13, 20, 4 * 86_400);
        assertEquals(expected, wallJ + foamJ, 0.02 * expected);
    }

    /** What the foam in place of the wall gives from its own steady profile, 30 °C inside, J. */
    private static double foamStartJ() {
        // Held between 10 °C beyond and 30 °C inside at the start, 10 °C at the end: half of it.
        double flux = 20 / (0.13 + FOAM.resistanceM2KW() + 0.13);
        double meanK = 0.5 * 20;
        assertTrue(flux > 0);
        return BOX.areaM2(FaceName.EAST) * FOAM.capacityJm2K() * meanK;
    }

    /** Heat a square metre of a half-space gives through a film, J. */
    private static double halfSpaceJ(
            double conductivity, double capacityJm3K, double film, double stepK, double seconds) {
        double diffusivity = conductivity / capacityJm3K;
        double sum = 0;
        int n = 20_000;
        for (int i = 0; i < n; i++) {
            double t = (i + 0.5) * seconds / n;
            double x = film * Math.sqrt(diffusivity * t) / conductivity;
            // exp(x^2) erfc(x), asymptotic where the factors would overflow.
            double surface =
                    x < 5
                            ? Math.exp(x * x) * Erf.erfc(x)
                            : (1 - 0.5 / (x * x)) / (x * Math.sqrt(Math.PI));
            sum += film * stepK * surface * seconds / n;
        }
        return sum;
    }

    @Test
    void frostyOutdoorAirNeverHoldsMoreThanIceLetsIt() {
        Face wall = outdoors(FaceName.EAST, 90, FOAM);
        Enclosure leaky =
                new Enclosure(
                        BOX, only(wall).faces(), 0, Optional.empty(), 200, 0, Gains.NONE, 0, false);
        int n = 51;
        double[] t = new double[n];
        double[] full = new double[n];
        double[] none = new double[n];
        Arrays.fill(t, -15);
        Arrays.fill(full, 100);
        ChamberRun run =
                ChamberRun.of(
                                "north",
                                new Site(47, 0, 0, UTC),
                                new Timeline(LocalDateTime.of(2026, 1, 2, 0, 0), UTC),
                                new Weather(t, full, none, none),
                                leaky,
                                new Setting(SETTING_C, 1, 90),
                                2 * 86_400.0)
                        .withStart(Start.at(5, 10));
        Course course = HeatModel.run(run, Progress.SILENT);
        double ratio = MoistAir.humidityRatio(SaturatedAir.pressurePa(-15), 101_325);
        int last = course.hours().size() - 1;
        assertEquals(ratio, course.hours().humidityRatio(last), 0.01 * ratio);
    }

    @Test
    void aPassiveChamberStartsOverTheGroundOfItsRunNotOfItsFirstDay() {
        Face floor =
                new Face(
                        FaceName.FLOOR,
                        new Beyond.Ground(),
                        0,
                        0.6,
                        List.of(new Layer("concrete", 0.1, 1.8, 2_400, 1_000)));
        // A first day of 30 °C, then 10 °C for a month: soil at the mean, not at 30 °C.
        Weather cold = weather(30, 10, 0, Double.NaN);
        double[] t = new double[cold.hours()];
        double[] rest = new double[t.length];
        Arrays.setAll(t, h -> h <= 24 ? 30 : 10);
        Site site = new Site(47, 0, 0, UTC);
        ChamberRun run =
                ChamberRun.of(
                        "north",
                        site,
                        new Timeline(LocalDateTime.of(2026, 3, 2, 0, 0), UTC),
                        new Weather(t, rest, rest, rest),
                        only(floor),
                        new Setting(SETTING_C, 1, 90),
                        30 * 86_400.0);
        YearWave told = new YearWave((30 * 25 + 10 * (30 * 24 - 23)) / (30 * 24.0 + 2), 0, 1);
        double guessed = HeatModel.run(run, Progress.SILENT).hours().airC(0);
        ChamberRun known =
                new ChamberRun(
                        run.chamberId(),
                        site.withYear(told),
                        run.timeline(),
                        run.weather(),
                        run.enclosure(),
                        run.coolers(),
                        run.settings(),
                        run.outages(),
                        run.stays(),
                        run.factors(),
                        run.start(),
                        run.durationS(),
                        run.doorMode(),
                        run.controlMode(),
                        run.extras());
        assertEquals(HeatModel.run(known, Progress.SILENT).hours().airC(0), guessed, 0.01);
    }
}
