package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Weather;
import org.wardon.air.WetBulb;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.errors.Progress;

/** Walls kept wet outside: published bands, balances, limits. */
class WettedWallTest {
    private static final double P = StandardAtmosphere.pressurePa(Chambers.SITE.elevationM());

    private static double wetBulbC(Weather weather, int hour) {
        return WetBulb.temperatureC(
                weather.temperatureC(hour),
                MoistAir.humidityRatioAt(
                        weather.temperatureC(hour), weather.humidityPct(hour) / 100, P),
                P);
    }

    private static Weather summer(double days) {
        return WaterChambers.drySummer((int) (24 * days) + 3, 33, 14, 1_300);
    }

    /** Inside at three in the afternoon, as a share of the wet-bulb depression. */
    @Source("ROY1986 in the table of cooling sources (from memory): 0.6 to 0.9 by day, 25 to 50 L")
    @Test
    void brickAndSandChamberCoolsAndDrinksAsPublished() {
        double days = 4;
        Weather weather = summer(days);
        Course course = HeatModel.run(WaterChambers.ofBrick(50, weather, days), Progress.SILENT);
        int afternoon = 24 * 3 + 15;
        double outdoor = weather.temperatureC(afternoon);
        double inside = course.hours().airC(afternoon);
        double share = (outdoor - inside) / (outdoor - wetBulbC(weather, afternoon));
        double litresADay = course.waterUsedKg() / days;
        assertTrue(share > 0.6 && share < 0.9, "share " + share);
        assertTrue(litresADay > 25 && litresADay < 50, "litres a day " + litresADay);
    }

    @Test
    void balancesCloseAndWaterIsNeverNegative() {
        for (double kgPerDay : new double[] {0, 4, 15, 60}) {
            Course course =
                    HeatModel.run(WaterChambers.ofBrick(kgPerDay, summer(3), 3), Progress.SILENT);
            assertTrue(course.balanceErrorPct() < 0.1, kgPerDay + ": " + course);
            assertTrue(course.sand().errorShare() < 1e-6, course.sand().toString());
            assertTrue(course.waterUsedKg() >= 0);
        }
    }

    @Test
    void aWallWithoutWaterIsAPlainWall() {
        // A setting warmer than outdoors, so that both runs take their films from outdoors.
        ChamberRun dry = WaterChambers.ofBrick(0, summer(2), 2).withSetting(new Setting(40, 1, 90));
        ChamberRun plain = dry.withCoolers(List.of());
        Course one = HeatModel.run(dry, Progress.SILENT);
        Course other = HeatModel.run(plain, Progress.SILENT);
        for (int i = 0; i < one.hours().size(); i++) {
            assertEquals(other.hours().airC(i), one.hours().airC(i), 0.03, "hour " + i);
        }
    }

    @Test
    void dryingOutIsToldAndThePouringEndsIt() {
        Course course = HeatModel.run(WaterChambers.ofBrick(20, summer(4), 4), Progress.SILENT);
        List<CourseEvent> dry =
                course.events().stream()
                        .filter(e -> e.kind() == CourseEvent.Kind.DRY_WALL)
                        .toList();
        assertTrue(dry.size() >= 4, "spells: " + dry);
        for (CourseEvent spell : dry) {
            double hour = spell.untilS() / 3_600 % 24;
            boolean poured = Math.abs(hour - 7) < 1e-6 || Math.abs(hour - 17) < 1e-6;
            assertTrue(poured || spell.untilS() == 4 * 86_400, spell.toString());
        }
        double dryS = dry.stream().mapToDouble(e -> e.untilS() - e.fromS()).sum();
        assertEquals(4 * 86_400 - dryS, course.coolers().get(0).ranS(), 0.02 * dryS);
        // The sand gives all but what clings to it.
        assertEquals(80, course.waterUsedKg(), 1, "of 80 kg poured");
        Course more = HeatModel.run(WaterChambers.ofBrick(60, summer(4), 4), Progress.SILENT);
        int afternoon = 24 * 2 + 15;
        assertTrue(more.hours().airC(afternoon) < course.hours().airC(afternoon) - 1);
    }

    /** Seeded weathers, dry to humid; the bound of the field rules. */
    @Test
    void neverColderThanTheLowestWetBulbOfThreeDaysLessOneAndAHalf() {
        SplittableRandom random = new SplittableRandom(21);
        for (int k = 0; k < 12; k++) {
            double mean = random.nextDouble(22, 36);
            double range = random.nextDouble(2, 18);
            double most = SaturatedAir.pressurePa(mean - 0.5 * range);
            Weather weather =
                    WaterChambers.drySummer(
                            99, mean, range, Math.max(300, random.nextDouble(0.2, 1) * most));
            double kg = random.nextDouble(5, 80);
            Course course = HeatModel.run(WaterChambers.ofBrick(kg, weather, 4), Progress.SILENT);
            for (int i = 0; i < course.hours().size(); i++) {
                double lowest = Double.POSITIVE_INFINITY;
                for (int h = Math.max(0, i - 71); h <= i + 1; h++) {
                    lowest = Math.min(lowest, wetBulbC(weather, h));
                }
                double airC = course.hours().airLowestC(i);
                assertTrue(airC >= lowest - 1.5, mean + " " + kg + " hour " + i + ": " + airC);
            }
            assertTrue(course.balanceErrorPct() < 0.1, course.toString());
        }
    }

    @Test
    void humidAirGivesLittle() {
        Weather humid = WaterChambers.drySummer(75, 29, 5, 3_300);
        Course course = HeatModel.run(WaterChambers.ofBrick(50, humid, 3), Progress.SILENT);
        Course dry = HeatModel.run(WaterChambers.ofBrick(50, summer(3), 3), Progress.SILENT);
        int afternoon = 2 * 24 + 15;
        double gain = humid.temperatureC(afternoon) - course.hours().airC(afternoon);
        double dryGain = summer(3).temperatureC(afternoon) - dry.hours().airC(afternoon);
        assertTrue(gain < 0.4 * dryGain, gain + " K against " + dryGain + " K");
        assertTrue(course.waterUsedKg() < 0.5 * dry.waterUsedKg());
    }

    @Test
    void heatTakenIsTheHeatOfWhatEvaporatedOutsideAndTheLedgerCloses() {
        Course course = HeatModel.run(WaterChambers.ofBrick(50, summer(3), 3), Progress.SILENT);
        assertEquals(
                course.heat().removed(), course.heat().sum(), 1e-3 * course.heat().throughput());
        double insideKg = course.water().faces();
        double outsideKg = course.sand().evaporated() - insideKg;
        // 2.45 MJ/kg at 21 °C, 2.42 at 33 °C.
        double perKg = course.heat().removed() / outsideKg;
        assertTrue(perKg > 2.40e6 && perKg < 2.47e6, "J/kg " + perKg);
    }

    @Test
    void moreWindEvaporatesMore() {
        Weather calm = windy(0.3);
        Weather fresh = windy(4);
        double little = HeatModel.run(inTheOpen(calm), Progress.SILENT).waterUsedKg();
        double much = HeatModel.run(inTheOpen(fresh), Progress.SILENT).waterUsedKg();
        assertTrue(much > 1.6 * little, much + " kg against " + little + " kg");
    }

    private static ChamberRun inTheOpen(Weather weather) {
        return Chambers.passive(WaterChambers.brickAndSand(new Beyond.Outdoors()), weather, 2)
                .withCoolers(List.of(WaterChambers.wetted(300)));
    }

    private static Weather windy(double metresASecond) {
        Weather still = summer(2);
        int n = still.hours();
        double[] t = new double[n];
        double[] rh = new double[n];
        double[] sun = new double[n];
        double[] wind = new double[n];
        for (int h = 0; h < n; h++) {
            t[h] = still.temperatureC(h);
            rh[h] = still.humidityPct(h);
            sun[h] = still.globalWm2(h);
            wind[h] = metresASecond;
        }
        return new Weather(t, rh, sun, wind);
    }
}
