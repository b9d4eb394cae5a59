package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.cli.WardonJar.Ran;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The whole job on the demo: run once by {@code advise}, once by {@code demo}. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class AdviceIT {
    private static final Path PLAN = Path.of("demo-data/landing.json");
    private static final Set<String> LIMITS =
            Set.of(
                    "senescence",
                    "ripening",
                    "water-loss",
                    "chilling",
                    "freezing",
                    "ethylene",
                    "sprouting",
                    "decay");

    /** The error a forecast may report, percent; the terms must close as well. */
    private static final double BALANCE_PCT = 0.1;

    private Path folder = Path.of("");
    private Path series = Path.of("");
    private Ran advised = new Ran(-1, "", "");
    private JsonNode forecast = JsonMapper.shared().nullNode();
    private JsonNode plan = JsonMapper.shared().nullNode();

    @BeforeAll
    void advise(@TempDir Path temporary) throws IOException {
        folder = temporary;
        series = folder.resolve("series");
        Path out = folder.resolve("out.json");
        advised =
                WardonJar.run(
                                "advise",
                                PLAN.toString(),
                                "--json",
                                out.toString(),
                                "--series",
                                series.toString())
                        .good();
        forecast = JsonMapper.shared().readTree(Files.readString(out));
        plan = JsonMapper.shared().readTree(Files.readString(PLAN));
    }

    @Test
    void forecastHasEveryFixedName() {
        JsonNames.check(
                forecast,
                "",
                "forecast",
                "chambers",
                "value",
                "lots",
                "sharing",
                "warnings",
                "actions");
        assertEquals(1, forecast.get("forecast").asInt());
        JsonNames.check(forecast, "value", "kept", "energyCost", "net");
        JsonNames.check(forecast, "sharing[]", "chamber", "verdict", "reasons");
        JsonNames.check(forecast, "sharing[].reasons[]", "code", "lots", "text", "source");
        JsonNames.check(forecast, "warnings[]", "code", "level", "subject", "text", "source");
        JsonNames.check(forecast, "actions[]", "order", "text", "subject", "gainDays", "gainValue");
    }

    @Test
    void everyChamberHasEveryFixedName() {
        JsonNames.check(
                forecast,
                "chambers[]",
                ("id holds airC humidityPct hoursOutsideBand hoursDisturbed pullDownHours"
                                + " peakLoadW removedPeakW intakeKgPerDay respirationLoadW o2PctMin"
                                + " loadKWh heatRemovedKWh energyKWh energyCost waterUsedKg"
                                + " co2PpmMax ethylenePpmMax balanceErrorPct")
                        .split(" "));
        JsonNames.check(forecast, "chambers[].airC", "mean", "min", "max", "p95");
        JsonNames.check(forecast, "chambers[].humidityPct", "mean", "min", "max");
        JsonNames.check(forecast, "chambers[].respirationLoadW", "mean", "max");
        JsonNames.check(
                forecast,
                "chambers[].loadKWh",
                ("walls door leakage freshAir fieldHeat respiration fans lights people packages"
                                + " defrost humidifier heater pumps air")
                        .split(" "));
        assertEquals(ids(plan, "chambers[]"), ids(forecast, "chambers[]"));
    }

    @Test
    void everyLotHasEveryFixedName() {
        JsonNames.check(
                forecast,
                "lots[]",
                ("id chamber valueKept coolHalfHours coolSevenEighthsHours temperatureC"
                                + " respirationKWh weightLossPct weightLossValue lifeUsedPct restsOn greenLeft"
                                + " edibleLeft ripeFrom ripeOn daysLeft hangsOn daysLeftWithout daysGained"
                                + " limitedBy chillingRisk leaveBy")
                        .split(" "));
        JsonNames.check(forecast, "lots[].temperatureC", "mean", "min", "max", "atEnd");
        for (String name :
                List.of(
                        "greenLeft",
                        "edibleLeft",
                        "ripeFrom",
                        "daysLeft",
                        "daysLeftWithout",
                        "daysGained")) {
            JsonNames.check(forecast, "lots[]." + name, "p10", "p50", "p90");
        }
        JsonNames.check(forecast, "lots[].chillingRisk", "probability", "safeDays");
        JsonNames.check(forecast, "lots[].hangsOn", "range", "sharePct");
        assertEquals(ids(plan, "lots[]"), ids(forecast, "lots[]"));
        for (JsonNode lot : forecast.get("lots")) {
            assertTrue(LIMITS.contains(lot.get("limitedBy").asString()), lot.toString());
        }
    }

    /** A lot that leaves within the run loses what its mass at leaving lacks. */
    @Test
    void weightLostIsPricedByTheKilogram() {
        for (JsonNode planned : plan.get("lots")) {
            for (JsonNode lot : forecast.get("lots")) {
                boolean same = lot.get("id").asString().equals(planned.get("id").asString());
                boolean leaves = planned.path("wantedDays").asDouble(99) <= 7;
                if (same && leaves) {
                    double kg = planned.get("massKg").asDouble();
                    double price = planned.get("pricePerKg").asDouble();
                    double lost = lot.get("weightLossPct").asDouble() / 100;
                    assertEquals(
                            kg * price * lost,
                            lot.get("weightLossValue").asDouble(),
                            1e-3 * kg * price * lost,
                            lot.toString());
                }
            }
        }
    }

    private static Set<String> ids(JsonNode root, String place) {
        Set<String> ids = new TreeSet<>();
        JsonNames.at(root, place).forEach(node -> ids.add(node.get("id").asString()));
        return ids;
    }

    @Test
    void numbersAreFiniteAndRangesInOrder() {
        JsonNames.finite(forecast);
        for (String name : List.of("daysLeft", "daysLeftWithout", "daysGained")) {
            for (JsonNode range : JsonNames.at(forecast, "lots[]." + name)) {
                double p10 = range.get("p10").asDouble();
                double p50 = range.get("p50").asDouble();
                double p90 = range.get("p90").asDouble();
                assertTrue(p10 <= p50 && p50 <= p90, range.toString());
            }
        }
    }

    @Test
    void heatClosesInEveryChamber() {
        for (JsonNode chamber : forecast.get("chambers")) {
            double sum = 0;
            double throughput = 0;
            for (JsonNode term : chamber.get("loadKWh")) {
                sum += term.asDouble();
                throughput += Math.abs(term.asDouble());
            }
            double removed = chamber.get("heatRemovedKWh").asDouble();
            assertTrue(throughput > 0, chamber.toString());
            assertEquals(removed, sum, BALANCE_PCT / 100 * Math.max(throughput / 2, removed));
            double error = chamber.get("balanceErrorPct").asDouble();
            assertTrue(error >= 0 && error <= BALANCE_PCT, chamber.toString());
        }
    }

    @Test
    void everySeriesIsThereWithItsHead() throws IOException {
        long hours = plan.get("days").asLong() * 24;
        for (String id : ids(plan, "chambers[]")) {
            List<String> lines = Files.readAllLines(series.resolve("chamber-" + id + ".csv"));
            assertEquals(
                    "time,airC,humidityPct,outdoorC,coolingW,powerW,co2Ppm,ethylenePpm",
                    lines.get(0));
            assertEquals(hours, lines.size() - 1, 1, id);
        }
        for (String id : ids(plan, "lots[]")) {
            List<String> lines = Files.readAllLines(series.resolve("lot-" + id + ".csv"));
            assertEquals("time,meanC,surfaceC,coreC,respirationW,massKg,lifeUsedPct", lines.get(0));
            assertTrue(lines.size() > 24, id);
            assertTrue(lines.stream().allMatch(line -> line.split(",", -1).length == 7), id);
        }
    }

    @Test
    void pageLeadsWithWhatToDoAndFitsTheScreen() {
        String page = advised.out();
        assertTrue(page.contains("\nWhat to do first\n"), page);
        for (String id : ids(plan, "chambers[]")) {
            assertTrue(page.contains("\nChamber " + id + ": "), page);
        }
        assertTrue(page.indexOf("What to do first") < page.indexOf("Chamber "), page);
        assertTrue(page.contains("\nLots, first to leave first\n"), page);
        assertFalse(page.contains("{") || page.contains("NaN"), page);
        List<String> wide = page.lines().filter(line -> line.length() > 120).toList();
        assertEquals(List.of(), wide);
    }

    @Test
    void demoIsTheSameToTheLastByteAndRefusesAUsedFolder() throws IOException {
        Path copy = folder.resolve("copy");
        Path out = folder.resolve("demo.json");
        Ran demo =
                WardonJar.run("demo", "--copy-to", copy.toString(), "--json", out.toString())
                        .good();
        assertArrayEquals(Files.readAllBytes(folder.resolve("out.json")), Files.readAllBytes(out));
        assertEquals(advised.out(), demo.out());
        for (String file : List.of("landing.json", "weather.csv", "hillside.json", "README.md")) {
            assertEquals(-1, Files.mismatch(Path.of("demo-data", file), copy.resolve(file)));
        }
        assertEquals(
                "wardon: "
                        + copy
                        + ": a file 'landing.json' is there already; give a new or empty folder\n",
                WardonJar.run("demo", "--copy-to", copy.toString()).refused(2).err());
    }
}
