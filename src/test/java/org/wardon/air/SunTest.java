package org.wardon.air;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.wardon.Source;

/** Time, place and strength of the sun. */
class SunTest {
    private static final ZoneId UTC = ZoneId.of("UTC");

    private static Weather weather(int hours, double globalWm2, double swingK) {
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double[] g = new double[hours];
        double[] wind = new double[hours];
        for (int h = 0; h < hours; h++) {
            t[h] = 25 - swingK / 2 * Math.cos(2 * Math.PI * (h - 3) / 24);
            rh[h] = 60;
            g[h] = globalWm2;
            wind[h] = Double.NaN;
        }
        return new Weather(t, rh, g, wind);
    }

    @Source(
            "Duffie and Beckman, Solar Engineering of Thermal Processes, example 1.5.1, from memory")
    @Test
    void solarTimeAtMadisonOn3February() {
        Site madison = new Site(43.1, -89.4, 270, ZoneId.of("America/Chicago"));
        Timeline day = new Timeline(LocalDateTime.of(2026, 2, 3, 0, 0), madison.zone());
        // Printed 10:19, to the minute.
        double solar = SunPosition.solarHour(madison, day, 10.5 * 3_600);
        assertEquals(10 + 19.0 / 60, solar, 0.5 / 60 + 1e-9);
    }

    @Source(
            "Duffie and Beckman, Solar Engineering of Thermal Processes, example 1.10.1, from memory")
    @Test
    void extraterrestrialRadiationOn15AprilAt43North() {
        // Printed 33.8 MJ/m2 from 1367 W/m2 and Cooper's declination; FAO 56 uses its own of both.
        assertEquals(33.8, DailyRadiation.extraterrestrialMJ(105, 43), 0.005 * 33.8);
    }

    @Source("FAO Irrigation and Drainage Paper 56, 1998, example 15, from memory")
    @Test
    void radiationFromTemperaturesAtLyonInJuly() {
        // Printed 22.3 MJ/(m2 day) of 40.6 outside the atmosphere, 14.8 to 26.6 °C.
        assertEquals(22.3, 40.6 * DailyRadiation.shareByRange(26.6 - 14.8, 200), 0.05);
    }

    @Test
    void diffuseShareIsContinuous() {
        assertEquals(DiffuseShare.of(0.2199999), DiffuseShare.of(0.2200001), 5e-4);
        assertEquals(DiffuseShare.of(0.7999999), DiffuseShare.of(0.8000001), 5e-4);
        assertEquals(1, DiffuseShare.of(0));
        for (double k = 0; k < 1.2; k += 0.01) {
            assertTrue(DiffuseShare.of(k) > 0 && DiffuseShare.of(k) <= 1);
        }
    }

    @Test
    void sunStandsSouthAtNoonInTheNorthAndNorthInTheSouth() {
        assertEquals(0, SunPosition.azimuthDeg(50, 0, 12), 1e-9);
        assertEquals(180, Math.abs(SunPosition.azimuthDeg(-30, 0, 12)), 1e-9);
        assertTrue(SunPosition.azimuthDeg(50, 0, 9) < 0, "east in the morning");
        assertEquals(0, SunPosition.zenithDeg(20, 20, 12), 1e-5);
        assertEquals(24, SunPosition.daylengthH(75, 23));
        assertEquals(0, SunPosition.daylengthH(-75, 23));
        assertEquals(12, SunPosition.daylengthH(0, 23), 1e-9);
    }

    /** A station's clock two hours wrong shows noon's light at a low sun. */
    @Test
    void aWrongClockMakesNoSunsOfALowSun() {
        Site site = new Site(12, 0, 20, UTC);
        Timeline day = new Timeline(LocalDateTime.of(2026, 3, 21, 0, 0), UTC);
        double[] t = new double[25];
        double[] global = new double[25];
        Arrays.fill(t, 28);
        for (int h = 0; h < 25; h++) {
            global[h] = Math.max(0, 900 * Math.sin(Math.PI * (h - 8) / 12));
        }
        Sunshine sun = Sunshine.of(site, day, new Weather(t, t, global, t), 24);
        for (int h = 0; h <= 24; h++) {
            assertEquals(global[h], sun.onFaceWm2(h, 0, 0), 1e-9, "hour " + h);
            // 900 W/m2 in the beam and from the sky and the ground together is a bright wall.
            assertTrue(sun.onFaceWm2(h, 90, 270) < 1_100, h + ": " + sun.onFaceWm2(h, 90, 270));
        }
    }

    @Test
    void splitKeepsMeasuredRadiationOnTheLevelAndFavoursTheSunnyWall() {
        Site site = new Site(12, 0, 20, UTC);
        Timeline day = new Timeline(LocalDateTime.of(2026, 3, 21, 0, 0), UTC);
        double[] t = new double[25];
        double[] global = new double[25];
        Arrays.fill(t, 28);
        for (int h = 0; h < 25; h++) {
            global[h] = Math.max(0, 900 * Math.sin(Math.PI * (h - 6) / 12));
        }
        double[] unknown = new double[25];
        Arrays.fill(unknown, Double.NaN);
        Weather weather = new Weather(t, t, global, unknown);
        Sunshine sun = Sunshine.of(site, day, weather, 24);
        assertFalse(sun.estimated());
        double east = 0;
        double west = 0;
        for (int h = 0; h <= 24; h++) {
            assertEquals(global[h], sun.onFaceWm2(h, 0, 0), 1e-9, "hour " + h);
            assertTrue(sun.diffuseWm2(h) <= global[h] + 1e-9);
            east += h < 12 ? sun.onFaceWm2(h, 90, 90) : 0;
            west += h < 12 ? sun.onFaceWm2(h, 90, 270) : 0;
        }
        assertTrue(east > 2 * west, east + " and " + west);
        assertTrue(sun.skyClearness(12) > 0.7 && sun.skyClearness(12) <= 1);
    }

    @Test
    void verticalFacesShareAnEvenSkyAlike() {
        Site site = new Site(-1, 36, 1_800, UTC);
        Timeline day = new Timeline(LocalDateTime.of(2026, 6, 1, 0, 0), UTC);
        // 30 W/m2 at any hour is an overcast day: nearly all is diffuse.
        Sunshine sun = Sunshine.of(site, day, weather(25, 30, 0), 24);
        for (double azimuth = 0; azimuth < 360; azimuth += 90) {
            double wall = sun.onFaceWm2(0, 90, azimuth);
            assertEquals(30 * 0.5 * (1 + Sunshine.GROUND_ALBEDO), wall, 1e-9);
        }
    }

    @Test
    void sunIsEstimatedFromTheDailyRangeAndSaysSo() {
        Site site = new Site(12, 0, 20, UTC);
        Timeline day = new Timeline(LocalDateTime.of(2026, 3, 21, 0, 0), UTC);
        Sunshine sun = Sunshine.of(site, day, weather(24, Double.NaN, 12), 23);
        assertTrue(sun.estimated());
        double megajoules = 0;
        for (int h = 0; h < 24; h++) {
            megajoules += sun.globalWm2(h) * 3_600 / 1e6;
        }
        // 12 K of range sampled to the hour; Ra as FAO 56 has it, hourly sum against its integral.
        double expected =
                DailyRadiation.shareByRange(12, 20) * DailyRadiation.extraterrestrialMJ(80, 12);
        assertEquals(expected, megajoules, 0.02 * expected);
        Sunshine cloudy = Sunshine.of(site, day, weather(24, Double.NaN, 3), 23);
        assertTrue(cloudy.globalWm2(12) < sun.globalWm2(12));
        assertTrue(cloudy.skyClearness(2) < sun.skyClearness(2));
    }

    @Test
    void shortRunAtEitherEndOfADayStillKnowsItsRange() {
        Site site = new Site(12, 0, 20, UTC);
        Timeline noon = new Timeline(LocalDateTime.of(2026, 3, 21, 12, 0), UTC);
        Sunshine sun = Sunshine.of(site, noon, weather(48, Double.NaN, 12), 47);
        assertTrue(sun.globalWm2(0) > 500, "first noon " + sun.globalWm2(0));
        assertTrue(sun.globalWm2(24) > 500);
    }

    @Test
    void steadyWeatherHasNoSun() {
        Site site = new Site(12, 0, 20, UTC);
        Timeline day = new Timeline(LocalDateTime.of(2026, 3, 21, 0, 0), UTC);
        Sunshine sun = Sunshine.of(site, day, Weather.steady(30, 50), 48);
        for (int h = 0; h <= 48; h++) {
            assertEquals(0, sun.onFaceWm2(h, 90, 180));
            assertEquals(0, sun.skyClearness(h));
        }
    }

    @Test
    void weatherBelowFreezingNeverExceedsSaturationOverIce() {
        Weather frost = Weather.steady(-10, 100);
        assertEquals(SaturatedAir.pressurePa(-10), frost.vapourPressurePa(0));
        Weather dry = Weather.steady(-10, 50);
        assertEquals(0.5 * SaturatedAir.overWaterPa(-10), dry.vapourPressurePa(0), 1e-9);
        assertEquals(
                MoistAir.humidityRatio(dry.vapourPressurePa(0), 1e5), dry.humidityRatio(0, 1e5));
    }
}
