package org.wardon.files.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The fixed names of the forecast, null where there is no answer, no noise in numbers. */
class AnswerWriterTest {
    private static final Quantiles RANGE = new Quantiles(1.0 / 3, 2, 3);

    @ParameterizedTest
    @CsvSource({
        "0.30000000000000004, 0.3",
        "12.345678901, 12.3457",
        "1234567.8912, 1234567.89",
        "1.0E-7, 0.0000001",
        "-0.0, 0",
        "100, 100",
        "9999.996, 10000",
        "120000, 120000"
    })
    void numbersAreRoundedOnce(double value, String written) {
        assertEquals(written, WrittenNumber.text(value));
    }

    @Test
    void refusesANumberThatIsNotFinite() {
        Record answer = new Quantiles(1, Double.NaN, 2);
        assertThrows(RuntimeException.class, () -> AnswerWriter.json(answer));
    }

    @Test
    void forecastHasTheFixedNamesInTheFixedOrder() {
        JsonNode json = JsonMapper.shared().readTree(AnswerWriter.json(forecast()));
        assertNames("forecast chambers value lots sharing warnings actions", json);
        JsonNode chamber = json.get("chambers").get(0);
        assertNames(
                "id holds airC humidityPct hoursOutsideBand hoursDisturbed pullDownHours peakLoadW"
                        + " removedPeakW intakeKgPerDay respirationLoadW o2PctMin loadKWh"
                        + " heatRemovedKWh energyKWh energyCost waterUsedKg co2PpmMax"
                        + " ethylenePpmMax balanceErrorPct coolers solar",
                chamber);
        assertNames(
                "kind runningHours heatRemovedKWh energyKWh waterUsedKg ice",
                chamber.get("coolers").get(0));
        assertNames("meltedKg refrozenKg leftKg", chamber.get("coolers").get(0).get("ice"));
        assertNames(
                "panelKWh usedKWh spilledKWh lossesKWh startKWh endKWh batteryLowPct hoursWithout"
                        + " firstWithout",
                chamber.get("solar"));
        assertNames("mean min max p95", chamber.get("airC"));
        assertNames("mean min max", chamber.get("humidityPct"));
        assertNames("mean max", chamber.get("respirationLoadW"));
        assertNames(
                "walls door leakage freshAir fieldHeat respiration fans lights people packages"
                        + " defrost humidifier heater pumps air",
                chamber.get("loadKWh"));
        assertNames("kept energyCost net", json.get("value"));
        JsonNode lot = json.get("lots").get(0);
        assertNames(
                "id chamber valueKept coolHalfHours coolSevenEighthsHours temperatureC"
                        + " respirationKWh weightLossPct weightLossValue lifeUsedPct restsOn greenLeft edibleLeft"
                        + " ripeFrom ripeOn daysLeft hangsOn daysLeftWithout daysGained limitedBy chillingRisk leaveBy",
                lot);
        assertNames("mean min max atEnd", lot.get("temperatureC"));
        assertNames("p10 p50 p90", lot.get("daysLeft"));
        assertNames("probability safeDays", lot.get("chillingRisk"));
        assertNames("chamber verdict reasons accepted", json.get("sharing").get(0));
        assertNames("code lots text source", json.get("sharing").get(0).get("reasons").get(0));
        assertNames("code level subject text source", json.get("warnings").get(0));
        assertNames("order text subject gainDays gainValue", json.get("actions").get(0));
    }

    @Test
    void noAnswerIsNull() {
        JsonNode json = JsonMapper.shared().readTree(AnswerWriter.json(forecast()));
        assertTrue(json.get("chambers").get(0).get("pullDownHours").isNull());
        JsonNode lot = json.get("lots").get(0);
        assertTrue(lot.get("chillingRisk").get("safeDays").isNull());
        assertTrue(lot.get("greenLeft").isNull());
        assertFalse(lot.get("edibleLeft").isNull());
        assertEquals(0.333333, lot.get("daysLeft").get("p10").asDouble());
        assertEquals("2026-03-09T15:00", lot.get("leaveBy").asString());
        assertTrue(json.get("actions").get(0).get("gainDays").isNull());
    }

    @Test
    void otherVerbsHaveTheirFixedNames() {
        JsonNode share =
                JsonMapper.shared()
                        .readTree(
                                AnswerWriter.json(
                                        new ShareAnswer(
                                                "no",
                                                Optional.empty(),
                                                Optional.of(new Bounds(85, 95)),
                                                List.of(
                                                        new ShareAnswer.Pair(
                                                                "mango", "okra", "no", List.of())),
                                                Optional.of(
                                                        new ShareAnswer.Compromise(
                                                                9, 90, Map.of("okra", 2.5))),
                                                Optional.of("okra"),
                                                List.of(),
                                                List.of())));
        assertNames(
                "verdict workableC workableHumidityPct pairs compromise takeOut spells accepted",
                share);
        assertTrue(share.get("workableC").isNull());
        assertNames("a b verdict reasons", share.get("pairs").get(0));
        assertEquals(2.5, share.get("compromise").get("daysLost").get("okra").asDouble());
        JsonNode keep =
                JsonMapper.shared()
                        .readTree(
                                AnswerWriter.json(
                                        new KeepAnswer(
                                                "mango",
                                                RANGE,
                                                Optional.of(new HangsOn("life-level", 40)),
                                                10,
                                                "ripening",
                                                new ChillingRisk(0.1, OptionalDouble.of(4)),
                                                List.of(),
                                                Optional.empty(),
                                                Optional.of(RANGE),
                                                Optional.of(
                                                        new RipeOn(
                                                                4,
                                                                0.6,
                                                                0.1,
                                                                OptionalDouble.empty())))));
        assertNames("inDays probability overripe atC", keep.get("ripeOn"));
        assertNames(
                "commodity daysLeft hangsOn lifeUsedPct limitedBy chillingRisk mechanisms ripeFrom edibleLeft"
                        + " ripeOn",
                keep);
        JsonNode look =
                JsonMapper.shared()
                        .readTree(
                                AnswerWriter.json(
                                        new LookAnswer(
                                                "mango",
                                                List.of("Mango"),
                                                List.of(
                                                        new LookAnswer.Line(
                                                                "temperature",
                                                                OptionalDouble.of(13),
                                                                OptionalDouble.empty(),
                                                                "°C",
                                                                "",
                                                                "cantwell-2001",
                                                                "seen",
                                                                false)))));
        assertNames("commodity names facts", look);
        assertNames("name low high unit text source evidence own", look.get("facts").get(0));
        JsonNode place =
                JsonMapper.shared()
                        .readTree(
                                AnswerWriter.json(
                                        new PlaceAnswer(
                                                1,
                                                List.of(),
                                                List.of(),
                                                9,
                                                10,
                                                10,
                                                List.of(),
                                                "most-value",
                                                9.5,
                                                8,
                                                true,
                                                "",
                                                List.of(),
                                                List.of(),
                                                List.of(),
                                                List.of())));
        assertNames(
                "placing chambers unplaced value bound gapPct because wish assumedValue"
                        + " presentValue proven told moves changes worth notes",
                place);
    }

    private static void assertNames(String expected, JsonNode object) {
        assertEquals(expected, String.join(" ", object.propertyNames()));
    }

    static Forecast forecast() {
        ChamberForecast chamber =
                new ChamberForecast(
                        "north",
                        true,
                        new ChamberForecast.AirC(12, 11, 13, 12.8),
                        new MeanMinMax(90, 80, 95),
                        1,
                        12,
                        OptionalDouble.empty(),
                        List.of(),
                        3000,
                        2500,
                        OptionalDouble.of(600),
                        new ChamberForecast.MeanMax(80, 200),
                        20.5,
                        new ChamberForecast.LoadKWh(
                                1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15),
                        120,
                        50,
                        45,
                        0,
                        4000,
                        0.4,
                        0.00012,
                        List.of(
                                new ChamberForecast.OfCooler(
                                        "ice-bank",
                                        80,
                                        120,
                                        50,
                                        0,
                                        Optional.of(new ChamberForecast.Ice(900, 800, 100)))),
                        Optional.of(
                                new ChamberForecast.Solar(
                                        60, 50, 6, 3, 5, 6, 12.5, 0, Optional.empty())),
                        Optional.empty(),
                        Optional.empty());
        LotForecast lot =
                new LotForecast(
                        "M1",
                        Optional.of("north"),
                        900,
                        OptionalDouble.of(9),
                        OptionalDouble.empty(),
                        new LotForecast.TemperatureC(13, 12, 29, 12.1),
                        7,
                        2,
                        18,
                        60,
                        "temperature-curve",
                        Optional.empty(),
                        Optional.of(RANGE),
                        Optional.empty(),
                        Optional.empty(),
                        RANGE,
                        Optional.empty(),
                        RANGE,
                        RANGE,
                        "ripening",
                        new ChillingRisk(0, OptionalDouble.empty()),
                        LocalDateTime.parse("2026-03-09T15:00:30"));
        return new Forecast(
                Forecast.VERSION,
                List.of(chamber),
                new Forecast.Value(900, 45, 855),
                List.of(lot),
                List.of(
                        new Forecast.Sharing(
                                "north",
                                "good",
                                List.of(new Because("c", List.of("M1"), "t", "s")),
                                List.of())),
                List.of(new Forecast.Warning("c", "note", "M1", "t", "s")),
                List.of(
                        new Forecast.Action(
                                1, "t", "M1", OptionalDouble.empty(), OptionalDouble.of(3))));
    }
}
