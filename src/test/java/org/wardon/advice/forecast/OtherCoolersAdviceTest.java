package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** What a keeper hears of pads, night air and ice: figures, verdict, cautions, actions, series. */
class OtherCoolersAdviceTest {
    private static final String STEADY =
            "{\"steady\": {\"temperatureC\": %s, \"humidityPct\": %s}}";
    private static final String PAD =
            "{\"kind\": \"evaporative-pad\", \"airFlowM3s\": 0.3, \"fanW\": 90}";

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

    private StoreAdvice advise(String weather, String cooling, double settingC) throws IOException {
        String chamber = SmallStores.chamber("north", settingC);
        int from = chamber.indexOf("\"cooling\"");
        int to = chamber.indexOf("\"setting\"");
        String plan =
                """
                {"storePlan": 1, "name": "other coolers (invented)",
                 "site": {"latitudeDeg": 12, "longitudeDeg": -61, "elevationM": 10, "zone": "America/Grenada"},
                 "weather": %s, "from": "2026-03-02T00:00", "days": 4, "energyPricePerKWh": 0.5,
                 "chambers": [%s],
                 "lots": [{"id": "P1", "commodity": "potato-table", "massKg": 300, "arrives": "2026-03-02T08:00",
                  "temperatureC": 20, "chamber": "north", "cured": true}]}
                """
                        .formatted(
                                weather,
                                chamber.substring(0, from)
                                        + "\"cooling\": ["
                                        + cooling
                                        + "], "
                                        + chamber.substring(to));
        Path file = Files.writeString(folder.resolve("plan.json"), plan);
        return new ForecastAdvice(book, Words.english(Units.METRIC))
                .advise(PlanReader.read(file, PlanLookups.of(book)), Progress.SILENT);
    }

    private static ChamberForecast north(StoreAdvice advice) {
        ChamberForecast north = advice.forecast().chambers().get(0);
        assertTrue(north.balanceErrorPct() < 0.1, north.balanceErrorPct() + " %");
        return north;
    }

    private static String warning(StoreAdvice advice, String code) {
        return advice.forecast().warnings().stream()
                .filter(w -> w.code().equals(code))
                .map(Forecast.Warning::text)
                .findFirst()
                .orElse("");
    }

    private static boolean acts(StoreAdvice advice, String words) {
        return advice.forecast().actions().stream().anyMatch(a -> a.text().contains(words));
    }

    @Test
    void aPadInHumidAirIsToldByItsKelvins() throws IOException {
        StoreAdvice advice = advise(STEADY.formatted(28, 80), PAD, 18);
        ChamberForecast north = north(advice);
        assertFalse(north.holds());
        // Wet bulb of 28 °C and 80 % is 25.2 °C, four fifths of the way there are 2.2 K.
        assertEquals(
                "north: the outdoor air is humid: the pad cools it by 2.2 K on average, where a"
                        + " well-kept pad in dry air takes off 5.6 K or more.",
                warning(advice, "pad-gives-little"));
        assertTrue(warning(advice, "pad-water").contains("Legionella"));
        assertTrue(acts(advice, "add cooling that does not hang on the weather"));
        ChamberForecast.OfCooler pad = north.coolers().get(0);
        assertEquals("evaporative-pad", pad.kind());
        assertTrue(pad.runningHours() > 2, pad.runningHours() + " h");
        assertEquals(0.09 * pad.runningHours(), north.energyKWh(), 1e-6);
        assertEquals(0.5 * north.energyKWh(), north.energyCost(), 1e-9);
        assertEquals(pad.waterUsedKg(), north.waterUsedKg(), 1e-9);
        assertTrue(north.waterUsedKg() > 1);
    }

    @Test
    void aPadInDryAirHoldsAndRaisesNoDoubt() throws IOException {
        StoreAdvice advice = advise(STEADY.formatted(32, 15), PAD, 20);
        assertTrue(north(advice).holds(), advice.whyNotHeld("north").toString());
        assertEquals("", warning(advice, "pad-gives-little"));
        // It starts as outdoors leaves it, not at its setting.
        assertTrue(north(advice).pullDownHours().orElseThrow() >= 0);
        assertTrue(advice.outcome().course("north").hours().airHighestC(0) > 24);
    }

    @Test
    void colderThanTheSettingCountsAgainstACompressorOnly() throws IOException {
        String unit = "{\"kind\": \"compressor\", \"ratedCapacityW\": 2000}";
        StoreAdvice pad = advise(STEADY.formatted(9, 70), PAD, 15);
        StoreAdvice compressor = advise(STEADY.formatted(9, 70), unit, 15);
        assertTrue(north(pad).airC().mean() < 13);
        assertTrue(north(pad).holds(), pad.whyNotHeld("north").toString());
        assertTrue(north(compressor).airC().mean() < 13);
        assertFalse(north(compressor).holds());
    }

    @Test
    void iceThatIsGoneIsToldWithItsHourAndTheHoursWithout() throws IOException {
        String ice = "{\"kind\": \"ice-bank\", \"iceKg\": 60, \"uaWK\": 120, \"fanW\": 30}";
        StoreAdvice advice = advise(STEADY.formatted(30, 60), ice, 10);
        ChamberForecast north = north(advice);
        String text = warning(advice, "ice-gone");
        assertTrue(
                text.matches(
                        "north: the ice is gone first at 2026-03-02 \\d\\d:\\d\\d; [0-9.]+ h of each"
                                + " day are without ice\\."),
                text);
        assertTrue(warning(advice, "ice-handling").contains("never dry ice"));
        assertTrue(acts(advice, "its ice does not last"));
        ChamberForecast.Ice left = north.coolers().get(0).ice().orElseThrow();
        assertEquals(60, left.meltedKg() + left.leftKg(), 1e-6);
        assertEquals(0, left.refrozenKg());
        assertEquals(10, advice.outcome().course("north").hours().airC(0), 1.1, "starts cold");
    }

    @Test
    void nightAirIsJudgedByItsNightsAndWritesItsSeries() throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC,humidityPct\n");
        LocalDateTime start = LocalDateTime.parse("2026-03-02T00:00");
        for (int h = 0; h <= 96; h++) {
            double airC = 16 + 10 * Math.cos(2 * Math.PI * (h - 15) / 24);
            csv.append(String.format(Locale.ROOT, "%s,%.2f,45%n", start.plusHours(h), airC));
        }
        Files.writeString(folder.resolve("weather.csv"), csv);
        String fan = "{\"kind\": \"night-air\", \"airFlowM3s\": 0.02, \"fanW\": 5}";
        StoreAdvice advice = advise("{\"csv\": \"weather.csv\"}", fan, 5);
        ChamberForecast north = north(advice);
        double hours = north.coolers().get(0).runningHours();
        assertTrue(hours > 15 && hours < 70, hours + " h");
        assertTrue(
                warning(advice, "night-air-dry").contains("humidity at the chamber's temperature"));
        assertTrue(warning(advice, "night-air-rain").contains("a hood over the inlet"));
        advice.writeSeries(folder.resolve("series"));
        List<String> series = Files.readAllLines(folder.resolve("series/chamber-north.csv"));
        assertEquals(
                "time,airC,humidityPct,outdoorC,coolingW,powerW,co2Ppm,ethylenePpm,running1Pct",
                series.get(0));
        assertTrue(series.stream().anyMatch(row -> row.endsWith(",100")), series.toString());
        String still = "{\"kind\": \"night-air\", \"lowestC\": 25}";
        assertTrue(
                warning(advise("{\"csv\": \"weather.csv\"}", still, 10), "night-air-rests")
                        .startsWith("north: the night fan ran 0 h of 96 h only"));
    }

    @Test
    void everyDefaultOfTheseCoolersIsTold() throws IOException {
        String all =
                "{\"kind\": \"evaporative-pad\"}, {\"kind\": \"night-air\"},"
                        + " {\"kind\": \"ice-bank\", \"iceKg\": 500, \"uaWK\": 50, \"rechargeW\": 900}";
        StoreAdvice advice = advise(STEADY.formatted(25, 50), all, 12);
        List<String> told =
                advice.forecast().warnings().stream()
                        .filter(w -> w.code().equals("default-taken"))
                        .map(Forecast.Warning::text)
                        .filter(text -> text.contains(".cooling["))
                        .toList();
        String path = "$.chambers[0].cooling";
        assertEquals(
                List.of(
                        path + "[0].effectiveness: not given; 0.8 1 is taken (WANG-CRC).",
                        path + "[0].airFlowM3s: not given; 0.0708 m3/s is taken (NHB2010).",
                        path + "[0].fanW: not given; 17.7083 W is taken (assumption).",
                        path + "[1].airFlowM3s: not given; 0.0708 m3/s is taken (NHB2010).",
                        path + "[1].fanW: not given; 17.7083 W is taken (assumption).",
                        path
                                + "[1].differenceK: not given; 2 K is taken (from memory of"
                                + " ASHRAE-F).",
                        path + "[1].lowestC: not given; 0 °C is taken (assumption).",
                        path + "[2].meltC: not given; 0 °C is taken (ICE-NOTE).",
                        path
                                + "[2].latentKJkg: not given; 333.5 kJ/kg is taken (from memory of"
                                + " ASHRAE-F).",
                        path
                                + "[2].rechargePowerW: not given; 396.7808 W is taken (CARNOT-PAGE;"
                                + " HOLDER; from memory of ASHRAE-R).",
                        path + "[2].rechargeFrom: not given; 22:00 is taken (assumption).",
                        path + "[2].rechargeTo: not given; 06:00 is taken (assumption)."),
                told);
    }
}
