package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.errors.BadInput;
import org.wardon.plan.AtDoor;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Market;
import org.wardon.plan.PackagePlan;
import org.wardon.plan.Place;
import org.wardon.plan.Purpose;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Ripeness;

/** Lots put into the text of a plan. */
class LotIntoPlanTest {
    private static final Path DEMO = Path.of("demo-data/landing.json");
    private static final String LINE =
            "{\"id\": \"MAN2\", \"commodity\": \"mango\", \"massKg\": 812.5, \"package\":"
                    + " \"room-cooling-any\", \"arrives\": \"2026-03-04T14:00\","
                    + " \"temperatureC\": 29.5, \"harvested\": \"2026-03-04T08:30\","
                    + " \"ripeness\": \"green\", \"wantedDays\": 6, \"marketDays\": 1.5,"
                    + " \"purpose\": \"sell-ripe\", \"pricePerKg\": 4.2, \"chamber\": \"fruit\"}";

    private static LotPlan mango(PackagePlan packed) {
        LocalDateTime at = LocalDateTime.parse("2026-03-04T14:00");
        return new LotPlan(
                "MAN2",
                "mango",
                Optional.empty(),
                812.5,
                packed,
                at,
                29.5,
                6,
                at.plusDays(6),
                Optional.of("fruit"),
                Place.MIDDLE,
                List.of(),
                new AtDoor(
                        Optional.of(LocalDateTime.parse("2026-03-04T08:30")),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Ripeness.GREEN,
                        Optional.empty(),
                        List.of(),
                        0,
                        Optional.empty()),
                new Market(
                        1.5,
                        OptionalDouble.empty(),
                        Optional.of(Purpose.SELL_RIPE),
                        4.2,
                        Optional.empty()));
    }

    private static final LotPlan MANGO = mango(new PackagePlan.Named("room-cooling-any"));

    @Test
    void everyOtherLetterOfTheDemoStays() throws IOException {
        String before = Files.readString(DEMO);
        String after = LotIntoPlan.addedTo(before, "landing.json", MANGO);
        int at = after.indexOf(LINE);
        String lead = ",\n    ";
        assertEquals(lead, after.substring(at - lead.length(), at));
        assertEquals(
                before,
                after.substring(0, at - lead.length()) + after.substring(at + LINE.length()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"named", "hours", "stack"})
    void whatIsWrittenReadsBackAsTheLot(String packed) throws IOException {
        PackagePlan how =
                switch (packed) {
                    case "hours" -> new PackagePlan.HalfCooling(7.25);
                    case "stack" -> new PackagePlan.Stack(0.4);
                    default -> new PackagePlan.Named("room-cooling-any");
                };
        String after = LotIntoPlan.addedTo(Files.readString(DEMO), "landing.json", mango(how));
        StorePlan plan = PlanReader.read(after, DEMO, TableLookups.read());
        assertEquals(mango(how), plan.lots().get(plan.lots().size() - 1));
        assertEquals(12, plan.lots().size());
    }

    @Test
    void aListOnOneLineAnEmptyOneAndNone() {
        assertEquals(
                "{\"a\": 1, \"lots\": [{\"id\": \"é🥭\"}, " + LINE + "], \"b\": [2]}",
                LotIntoPlan.addedTo(
                        "{\"a\": 1, \"lots\": [{\"id\": \"é🥭\"}], \"b\": [2]}", "p", MANGO));
        assertEquals(
                "{\"lots\": [" + LINE + "]}", LotIntoPlan.addedTo("{\"lots\": []}", "p", MANGO));
        assertEquals(
                "{\n  \"a\": {\"lots\": []},\n  \"lots\": [" + LINE + "]\n}\n",
                LotIntoPlan.addedTo("{\n  \"a\": {\"lots\": []}\n}\n", "p", MANGO));
        assertEquals("{\"lots\": [" + LINE + "]}", LotIntoPlan.addedTo("{}", "p", MANGO));
    }

    @Test
    void whatIsNoPlanIsRefused() {
        refused("[1]", "p $: is no object; accepted: a store plan");
        refused("{\"lots\": 3}", "p $.lots: is no list; accepted: a list of lots");
        refused(
                "{\"lots\": [{\"id\": \"A\"}, {\"id\": \"MAN2\"}]}",
                "p $.lots[1].id: is 'MAN2', the id of the new lot; accepted: each id once");
        BadInput broken =
                assertThrows(BadInput.class, () -> LotIntoPlan.addedTo("{\"lots\": [", "p", MANGO));
        assertTrue(broken.faults().get(0).sentence().startsWith("p "), broken.getMessage());
    }

    private static void refused(String text, String sentence) {
        BadInput refused =
                assertThrows(BadInput.class, () -> LotIntoPlan.addedTo(text, "p", MANGO));
        assertEquals(1, refused.faults().size());
        assertEquals(sentence, refused.faults().get(0).sentence());
    }
}
