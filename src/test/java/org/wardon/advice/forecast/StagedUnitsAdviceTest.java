package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.reference.ReferenceBook;

/** What a plan says of units and stages, and what the forecast tells of each. */
class StagedUnitsAdviceTest {
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

    private StoreAdvice advise(int units, double fansW, String setting) throws IOException {
        String chamber =
                "\"setting\": {\"temperatureC\": 12"
                        + setting
                        + "}, \"gains\": {\"fansW\": "
                        + fansW
                        + "}, \"cooling\": [{\"kind\": \"compressor\", \"units\": "
                        + units
                        + ", \"ratedCapacityW\": 1500, \"fanW\": 0}]";
        return new SmallPlan().chamber(chamber).days(2).advice(book, folder);
    }

    private static ChamberForecast north(StoreAdvice advice) {
        return advice.forecast().chambers().get(0);
    }

    private static List<String> told(StoreAdvice advice) {
        return SmallPlan.told(advice.forecast(), "unit-never-ran");
    }

    @Test
    void aSecondUnitTakesWhatTheFirstDoesNotHold() throws IOException {
        StoreAdvice two = advise(2, 1_800, "");
        List<ChamberForecast.OfCooler> coolers = north(two).coolers();
        assertEquals(2, coolers.size());
        assertTrue(north(two).holds(), two.whyNotHeld("north").toString());
        assertEquals(48, coolers.get(0).runningHours(), 3, "the first runs on");
        double second = coolers.get(1).runningHours();
        assertTrue(second > 4 && second < 44, second + " h");
        double sum = coolers.stream().mapToDouble(c -> c.heatRemovedKWh()).sum();
        assertEquals(north(two).heatRemovedKWh(), sum, 1e-6 * sum);
        assertEquals(List.of(), told(two));
        assertFalse(north(advise(1, 1_800, "")).holds());
    }

    @Test
    void aSecondUnitThatRestsIsToldAsAReserve() throws IOException {
        StoreAdvice two = advise(2, 200, "");
        assertEquals(0, north(two).coolers().get(1).runningHours());
        assertEquals(0, north(two).coolers().get(1).energyKWh());
        assertEquals(
                List.of(
                        "north: compressor 2 never ran: those before it hold the load. It is a"
                                + " reserve; one that stands still for long is run by hand now and"
                                + " then."),
                told(two));
    }

    @Test
    void theStepIsToldWhereThereIsANextUnitAndGivenItIsKept() throws IOException {
        String step =
                "$.chambers[0].setting.stageK: not given; 1 K is taken (common practice, no source).";
        StoreAdvice two = advise(2, 1_800, "");
        assertTrue(SmallPlan.told(two.forecast(), "default-taken").contains(step));
        StoreAdvice one = advise(1, 200, "");
        assertFalse(SmallPlan.told(one.forecast(), "default-taken").contains(step));
        StoreAdvice near = advise(2, 1_800, ", \"stageK\": 0.2");
        // The second keeps the air 0.8 K nearer to its setting.
        assertEquals(0.8, north(two).airC().mean() - north(near).airC().mean(), 0.3);
    }
}
