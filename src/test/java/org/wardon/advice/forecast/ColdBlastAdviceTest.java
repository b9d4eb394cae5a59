package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.reference.ReferenceBook;

/** What is told of the cold blast of a cooler. */
class ColdBlastAdviceTest {
    private static final String NOON = "2026-03-02T12:00";

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

    /** A room whose unit blows little air, and that very cold. */
    private static String icy(double settingC) {
        return SmallStores.chamber("north", settingC)
                .replace("\"airFlowM3s\": 0.6", "\"airFlowM3s\": 0.1")
                .replace("\"ratedCapacityW\": 3500", "\"ratedCapacityW\": 1800")
                .replace("\"control\": \"modulating\"", "\"control\": \"on-off\"");
    }

    private StoreAdvice advise(double settingC, String crop, String place) throws IOException {
        return SmallStores.advise(
                folder,
                book,
                List.of(icy(settingC)),
                List.of(
                        SmallStores.lot("L", crop, NOON, 15, "\"chamber\": \"north\"" + place)
                                .replace("\"room-cooling-any\"", "{\"halfCoolingHours\": 2}")));
    }

    private static Optional<Forecast.Warning> told(StoreAdvice advice, String code) {
        return advice.forecast().warnings().stream().filter(w -> w.code().equals(code)).findFirst();
    }

    @Test
    void aLotThatWouldFreezeByTheCoolerIsToldAndSoIsTheLowestSetting() throws IOException {
        StoreAdvice advice = advise(1.5, "lettuce-crisphead", "");
        Forecast.Warning freezes = told(advice, "freezes-in-blast").orElseThrow();
        assertEquals("caution", freezes.level());
        assertTrue(
                freezes.text()
                        .matches(
                                "L: standing near the cooler of north it would come down to"
                                        + " -?[0-9.]+ °C; it freezes at -0\\.2 °C\\. .*"),
                freezes.text());
        double below =
                new ColdBlast(advice.outcome(), advice.plan().getChamber("north")).supplyBelowK();
        assertTrue(below > 4, "the supply is " + below + " K colder");
        Forecast.Warning set = told(advice, "set-below-advised").orElseThrow();
        String lowest = String.format(java.util.Locale.ROOT, "%.1f", 0.3 + 1 + 0.5 * below);
        String depression = String.format(java.util.Locale.ROOT, "%.1f", below);
        assertEquals(
                "north: it is set to 1.5 °C; near the cooler L is safe from freezing only from "
                        + lowest
                        + " °C on: 0.3 °C is its freezing limit, 1.0 K the band, and half of the "
                        + depression
                        + " K by which the air off the cooler is colder. Keep it out of the blast,"
                        + " or set it warmer.",
                set.text());
    }

    @Test
    void aLotSetWarmEnoughIsNotTold() throws IOException {
        StoreAdvice advice = advise(13, "tomato-mature-green", "");
        assertTrue(told(advice, "set-below-advised").isEmpty());
        assertTrue(told(advice, "freezes-in-blast").isEmpty());
    }

    @Test
    void aLotPutByTheCoolerStandsInThatAirForReal() throws IOException {
        StoreAdvice middle = advise(10, "cucumber", "");
        StoreAdvice near = advise(10, "cucumber", ", \"place\": \"near-cooler\"");
        LotForecast there = near.forecast().lots().get(0);
        LotForecast here = middle.forecast().lots().get(0);
        assertTrue(
                there.temperatureC().atEnd() < here.temperatureC().atEnd() - 0.2,
                there.temperatureC() + " and " + here.temperatureC());
        assertTrue(
                there.chillingRisk().probability() >= here.chillingRisk().probability(),
                there.chillingRisk() + " and " + here.chillingRisk());
        assertTrue(told(near, "chills-in-blast").isEmpty(), "it is there; its own risk is told");
    }

    @Test
    void aLotThatWouldBeChilledByTheCoolerIsToldByHowMuch() throws IOException {
        StoreAdvice advice = advise(13.5, "banana-green", "");
        Forecast.Warning chills = told(advice, "chills-in-blast").orElseThrow();
        assertEquals("caution", chills.level());
        Matcher words =
                Pattern.compile(
                                "L: standing near the cooler of north, in air about ([0-9.]+) K"
                                        + " colder while it blows, it runs a ([0-9.]+) % risk of"
                                        + " chilling injury instead of ([0-9.]+) %\\.")
                        .matcher(chills.text());
        assertTrue(words.matches(), chills.text());
        double there = Double.parseDouble(words.group(2));
        double here = Double.parseDouble(words.group(3));
        assertTrue(there >= 10 && there >= here + 4, chills.text());
        assertTrue(told(advise(20, "banana-green", ""), "chills-in-blast").isEmpty());
    }
}
