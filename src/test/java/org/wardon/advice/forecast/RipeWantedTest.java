package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.RipeOn;
import org.wardon.reference.ReferenceBook;

/** A lot of a plan that is wanted ripe on a day. */
class RipeWantedTest {
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

    private Forecast at(double settingC, String lot) throws IOException {
        return new SmallPlan()
                .chamber(
                        "\"setting\": {\"temperatureC\": "
                                + settingC
                                + "}, \"cooling\": [{\"kind\": \"compressor\","
                                + " \"ratedCapacityW\": 3500}]")
                .lots(
                        "{\"id\": \"T1\", \"massKg\": 300, \"temperatureC\": 20, \"harvested\":"
                                + " \"2026-03-01T20:00\", \"chamber\": \"north\","
                                + " \"wantedDays\": 12, "
                                + lot
                                + "}")
                .days(4)
                .advice(book, folder)
                .forecast();
    }

    private static LotForecast lot(Forecast forecast) {
        return forecast.lots().get(0);
    }

    @Test
    void aTurningTomatoIsToldForTheDayAndTheSettingThatWouldMakeIt() throws IOException {
        String lot =
                "\"commodity\": \"tomato-mature-green\", \"ripeness\": \"turning\","
                        + " \"ripeOn\": \"2026-03-07\"";
        Forecast cool = at(14, lot);
        RipeOn told = lot(cool).ripeOn().orElseThrow();
        assertEquals(5.5, told.inDays(), 1e-9, "noon of the day");
        double atC = told.atC().orElseThrow();
        assertTrue(atC > 14.5, "a warmer setting than 14 °C is told, found " + atC);
        assertTrue(told.probability() < 0.5, told.toString());
        List<String> sentences = SmallPlan.told(cool, "ripe-on-day");
        assertEquals(1, sentences.size());
        assertTrue(
                sentences.get(0).startsWith("T1: on 2026-03-07 it is ripe, and not yet overripe,"),
                sentences.get(0));
        assertEquals(1, SmallPlan.told(cool, "ripe-setting").size());
        // At that setting about half of the draws are ripe by then; it comes in at 20 °C.
        Forecast there = at(Math.round(10 * atC) / 10.0, lot);
        assertEquals(5.5, lot(there).ripeFrom().orElseThrow().p50(), 0.5);
        assertTrue(lot(there).ripeOn().orElseThrow().probability() > told.probability());
    }

    @Test
    void nothingIsToldWhereNobodyAsks() throws IOException {
        Forecast forecast =
                at(14, "\"commodity\": \"tomato-mature-green\", \"ripeness\": \"green\"");
        assertTrue(lot(forecast).ripeOn().isEmpty());
        assertEquals(List.of(), SmallPlan.told(forecast, "ripe-on-day"));
        double green = lot(forecast).greenLeft().orElseThrow().p50();
        double ripe = lot(forecast).ripeFrom().orElseThrow().p50();
        double edible = lot(forecast).edibleLeft().orElseThrow().p50();
        assertTrue(ripe > 0.7 * green && ripe < edible, green + ", " + ripe + ", " + edible);
    }

    @Test
    void saysWhatIsMissing() throws IOException {
        Forecast unknown = at(14, "\"commodity\": \"mango\", \"ripeOn\": \"2026-03-09\"");
        assertEquals(
                List.of(
                        "T1: nobody said how ripe it is, so nobody can tell when it will be ripe."
                                + " Look and tell."),
                SmallPlan.told(unknown, "ripe-tell-ripeness"));
        Forecast unprinted = at(5, "\"commodity\": \"broccoli\", \"ripeOn\": \"2026-03-09\"");
        assertEquals(
                List.of(
                        "T1: no days to ripe are printed for this crop, so nothing is told of the"
                                + " day."),
                SmallPlan.told(unprinted, "ripe-not-printed"));
        assertTrue(lot(unprinted).ripeFrom().isEmpty() && lot(unprinted).ripeOn().isEmpty());
    }
}
