package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.Quantiles;
import org.wardon.reference.ReferenceBook;

/** Whatever a plan asks, within its bounds: an answer, and one that obeys the limits of physics. */
class RandomPlansTest {
    private static ReferenceBook book;

    @TempDir Path folder;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 80})
    void balancesCloseAndRangesAreInOrder(int seed) throws IOException {
        Path file = folder.resolve("plan.json");
        Files.writeString(file, new RandomPlan(new SplittableRandom(seed), book.list()).json());
        Forecast forecast =
                new ForecastAdvice(book, Words.english(Units.METRIC))
                        .advise(PlanReader.read(file, PlanLookups.of(book)), Progress.SILENT)
                        .forecast();
        forecast.chambers().forEach(RandomPlansTest::check);
        forecast.lots().forEach(RandomPlansTest::check);
    }

    private static void check(ChamberForecast chamber) {
        assertTrue(chamber.balanceErrorPct() <= 0.1, "balance error " + chamber.balanceErrorPct());
        double sum = chamber.loadKWh().sum();
        double through = Math.max(1, Math.abs(chamber.heatRemovedKWh()));
        assertEquals(chamber.heatRemovedKWh(), sum, 1e-3 * through, chamber.id());
        assertTrue(chamber.humidityPct().min() >= 0 && chamber.humidityPct().max() <= 100);
        assertTrue(chamber.airC().min() <= chamber.airC().mean());
        assertTrue(chamber.airC().mean() <= chamber.airC().max());
        assertTrue(chamber.co2PpmMax() >= 419, "carbon dioxide " + chamber.co2PpmMax());
    }

    private static void check(LotForecast lot) {
        inOrder(lot.daysLeft());
        inOrder(lot.daysLeftWithout());
        inOrder(lot.daysGained());
        assertTrue(lot.weightLossPct() < 100, "weight loss " + lot.weightLossPct());
        double risk = lot.chillingRisk().probability();
        assertTrue(risk >= 0 && risk <= 1, "chilling risk " + risk);
        assertTrue(lot.temperatureC().max() < 60, "lot at " + lot.temperatureC().max() + " °C");
    }

    private static void inOrder(Quantiles q) {
        assertTrue(q.p10() <= q.p50() && q.p50() <= q.p90(), q.toString());
    }

    /** A plan drawn at random. */
    private record RandomPlan(SplittableRandom random, List<String> commodities) {
        String json() {
            StringBuilder lots = new StringBuilder();
            int n = random.nextInt(1, 6);
            for (int i = 0; i < n; i++) {
                lots.append(i == 0 ? "" : ",").append(lot(i));
            }
            return String.format(
                    Locale.ROOT,
                    """
                    {"storePlan": 1, "name": "random",
                     "site": {"latitudeDeg": %.1f, "longitudeDeg": 10, "elevationM": %d, "zone": "UTC"},
                     "weather": %s,
                     "from": "2026-06-01T00:00", "days": 5,
                     "chambers": [%s], "lots": [%s]}
                    """,
                    random.nextDouble(-40, 50),
                    pick(0, 1800),
                    weather(),
                    chamber(),
                    lots);
        }

        private String weather() {
            double middleC = random.nextDouble(-8, 36);
            double pct = random.nextDouble(15, 98);
            if (random.nextInt(3) > 0) {
                return String.format(
                        Locale.ROOT,
                        "{\"steady\": {\"temperatureC\": %.1f, \"humidityPct\": %.0f}}",
                        middleC,
                        pct);
            }
            double rangeK = random.nextDouble(0, 14);
            return String.format(
                    Locale.ROOT,
                    "{\"normals\": {\"dailyMaxC\": %s, \"dailyMinC\": %s, \"humidityPct\": %s}}",
                    Collections.nCopies(12, middleC + rangeK / 2),
                    Collections.nCopies(12, middleC - rangeK / 2),
                    Collections.nCopies(12, pct));
        }

        private int pick(int... among) {
            return among[random.nextInt(among.length)];
        }

        private String chamber() {
            StringBuilder faces = new StringBuilder();
            int thickness = pick(40, 100, 200);
            double conductivity = pick(24, 40, 800) / 1000.0;
            for (String face : List.of("roof", "floor", "north", "east", "south", "west")) {
                String beyond =
                        face.equals("floor")
                                ? "\"ground\""
                                : List.of("\"outdoors\"", "\"shade\"", "{\"spaceC\": 22}")
                                        .get(random.nextInt(3));
                faces.append(faces.isEmpty() ? "" : ",")
                        .append(
                                String.format(
                                        Locale.ROOT,
                                        "{\"face\": \"%s\", \"beyond\": %s, \"layers\":"
                                                + " [{\"conductivityWmK\": %.3f, \"densityKgM3\":"
                                                + " 300, \"specificHeatJkgK\": 1200,"
                                                + " \"thicknessMm\": %d}]}",
                                        face,
                                        beyond,
                                        conductivity,
                                        thickness));
            }
            StringBuilder cooling = new StringBuilder();
            for (int n = pick(0, 1, 1, 2, 3); n > 0; n--) {
                cooling.append(cooling.isEmpty() ? "" : ",").append(cooler());
            }
            return String.format(
                    Locale.ROOT,
                    "{\"id\": \"c\", \"lengthM\": %.1f, \"widthM\": 3, \"heightM\": 2.5, \"faces\":"
                            + " [%s], \"door\": {\"widthM\": 1, \"heightM\": 2, \"openingsPerDay\":"
                            + " %d, \"secondsOpen\": %d, \"from\": \"06:00\", \"to\": \"20:00\"},"
                            + " \"cooling\": [%s], \"setting\": {\"temperatureC\": %d},"
                            + " \"capacityKg\": 20000}",
                    random.nextDouble(2, 8),
                    faces,
                    pick(0, 5, 40),
                    pick(20, 60, 600),
                    cooling,
                    pick(0, 5, 12, 20));
        }

        private String cooler() {
            String control = random.nextBoolean() ? "on-off" : "modulating";
            return switch (random.nextInt(7)) {
                case 0 ->
                        String.format(
                                "{\"kind\": \"evaporative-pad\", \"bleedPct\": %d, \"control\":"
                                        + " \"%s\"}",
                                pick(0, 50), control);
                case 1 ->
                        String.format(
                                "{\"kind\": \"night-air\", \"lowestHumidityPct\": %d, \"control\":"
                                        + " \"%s\"}",
                                pick(0, 40), control);
                case 2 ->
                        String.format(
                                "{\"kind\": \"ice-bank\", \"iceKg\": %d, \"uaWK\": %d, \"fanW\":"
                                        + " %d, \"rechargeW\": %d, \"control\": \"%s\"}",
                                pick(20, 300, 2000),
                                pick(20, 150),
                                pick(0, 50),
                                pick(0, 1500),
                                control);
                default ->
                        String.format(
                                "{\"kind\": \"compressor\", \"ratedCapacityW\": %d,"
                                        + " \"ratedPowerW\": %d, \"control\": \"%s\"}",
                                pick(1000, 4000, 10_000), pick(500, 1500, 4000), control);
            };
        }

        private String lot(int i) {
            return String.format(
                    Locale.ROOT,
                    "{\"id\": \"L%d\", \"commodity\": \"%s\", \"massKg\": %d, \"package\":"
                            + " {\"halfCoolingHours\": %d}, \"arrives\": \"2026-06-0%dT%02d:30\","
                            + " \"temperatureC\": %.1f, \"wantedDays\": %d, \"chamber\": \"c\"}",
                    i,
                    commodities.get(random.nextInt(commodities.size())),
                    pick(50, 400, 2000),
                    pick(1, 6, 40),
                    random.nextInt(1, 5),
                    random.nextInt(24),
                    random.nextDouble(2, 38),
                    pick(1, 5, 30));
        }
    }
}
