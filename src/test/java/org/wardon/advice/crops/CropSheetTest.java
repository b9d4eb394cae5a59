package org.wardon.advice.crops;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;
import org.wardon.advice.outlook.KeepRequest;
import org.wardon.advice.outlook.KeepingAdvice;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.LifeRow;
import org.wardon.reference.OwnValue;
import org.wardon.reference.OwnValues;
import org.wardon.reference.ReferenceBook;

/** What is known of one crop, against the tables and against {@code keep}. */
class CropSheetTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final CropSheets SHEETS = new CropSheets(BOOK);

    @TempDir Path folder;

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static CropSheet sheet(String name) {
        return SHEETS.of(name, Optional.empty());
    }

    private static SheetFact fact(CropSheet sheet, String name) {
        return sheet.facts().stream()
                .filter(one -> one.fact().name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Source("reference-tables/crops/life-temperature.csv, each row by its own source")
    @Test
    void pointsAreTheTablesRows() throws IOException {
        Map<String, List<String>> table = new TreeMap<>();
        for (NamedCsvRecord row : rows("life-temperature.csv")) {
            table.computeIfAbsent(row.getField("commodity_id"), id -> new ArrayList<>())
                    .add(
                            String.join(
                                    "|",
                                    figure(row.getField("temp_C")),
                                    figure(row.getField("life_days_low")),
                                    figure(row.getField("life_days_high")),
                                    row.getField("bound"),
                                    row.getField("ended_by"),
                                    row.getField("source_id")));
        }
        int points = 0;
        for (Commodity crop : BOOK.all()) {
            List<String> told =
                    SheetFacts.lives(crop).stream().map(CropSheetTest::line).sorted().toList();
            List<String> printed = table.getOrDefault(crop.id(), List.of());
            assertEquals(printed.stream().sorted().toList(), told, crop.id());
            points += told.size();
        }
        assertTrue(points > 150, "only " + points + " points");
    }

    private static String line(LifeRow row) {
        return String.join(
                "|",
                String.valueOf(row.temperatureC().orElseThrow()),
                bound(row.lifeDays().low()),
                bound(row.lifeDays().high()),
                row.bound(),
                row.endedBy(),
                row.lifeDays().sourceId());
    }

    private static String bound(OptionalDouble days) {
        return days.isPresent() ? String.valueOf(days.getAsDouble()) : "";
    }

    private static String figure(String printed) {
        return printed.isEmpty() ? "" : String.valueOf(Double.parseDouble(printed));
    }

    private static List<NamedCsvRecord> rows(String table) throws IOException {
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder()
                        .commentStrategy(de.siegmar.fastcsv.reader.CommentStrategy.SKIP)
                        .ofNamedCsvRecord(Path.of("reference-tables", "crops", table))) {
            return csv.stream().collect(Collectors.toList());
        }
    }

    /** Lowest safe temperatures of the trade's handbooks, by the chilling table of the tables. */
    @Source("AH66-2016, chilling tables, as in reference-tables/crops/chilling.csv")
    @ParameterizedTest(name = "{0} {1}: {2} °C")
    @CsvSource({"mango, UNKNOWN, 13", "banana, GREEN, 13", "cucumber, UNKNOWN, 10"})
    void coldIsThePrintedFloor(String crop, Ripeness ripeness, double floorC) {
        ColdZone zone =
                sheet(crop).cold().stream()
                        .filter(one -> one.ripeness() == ripeness)
                        .findFirst()
                        .orElseThrow();
        assertEquals(floorC, zone.safeFromC(), 1e-9);
        assertFalse(zone.assumed());
    }

    @Test
    void bandsHaveALowerEndAndHardyCropsNoCold() {
        assertTrue(
                sheet("peach").cold().stream().allMatch(zone -> zone.bandLowC().isPresent()),
                "peach is injured in a band");
        assertEquals(List.of(), sheet("broccoli").cold());
    }

    /** The line is what {@code keep} says, at every temperature asked. */
    @ParameterizedTest
    @CsvSource({"mango, 5", "mango, 13", "broccoli, 0", "banana, 30", "potato, 8", "onion, -2"})
    void lineIsWhatKeepSays(String crop, double atC) {
        CropSheet sheet = sheet(crop);
        LifeLine.At at =
                sheet.life().at().stream()
                        .filter(one -> one.temperatureC() == atC)
                        .findFirst()
                        .orElseThrow();
        KeepAnswer keep = new KeepingAdvice(BOOK).ask(steady(crop, atC)).answer();
        assertEquals(keep.daysLeft(), at.days());
        assertEquals(keep.limitedBy(), at.limitedBy());
        assertEquals(keep.chillingRisk().safeDays(), at.safeDays());
    }

    private static KeepRequest steady(String crop, double atC) {
        return new KeepRequest(
                crop,
                new KeepRequest.Steady(atC, KeepRequest.Steady.USUAL_DAYS),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty(),
                Ripeness.UNKNOWN,
                Optional.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty());
    }

    @Test
    void rangesAreInOrderAndNothingBreathesLessInWarmth() {
        for (String crop : List.of("apple", "mango", "spinach", "garlic", "avocado")) {
            CropSheet sheet = sheet(crop);
            assertEquals(43, sheet.life().at().size());
            for (LifeLine.At at : sheet.life().at()) {
                assertTrue(at.days().p10() <= at.days().p50(), crop);
                assertTrue(at.days().p50() <= at.days().p90(), crop);
            }
            double before = 0;
            for (BreathLine.At at : sheet.breath().at()) {
                assertTrue(at.low() <= at.middle() && at.middle() <= at.high(), crop);
                assertTrue(at.middle() > 0, crop);
                if (at.temperatureC() <= 25) {
                    assertTrue(at.middle() >= 0.8 * before, crop + " at " + at.temperatureC());
                }
                before = at.middle();
            }
        }
    }

    @Test
    void ratesTakenLieOnTheRange() {
        for (Commodity crop : BOOK.all().subList(0, 40)) {
            BreathLine breath = sheet(crop.id()).breath();
            for (BreathLine.Printed printed : breath.printed()) {
                double c = printed.row().temperatureC();
                if (printed.taken() && c == Math.rint(c) && c >= 0) {
                    BreathLine.At at = breath.at().get((int) (c - CropSheets.COLDEST_C));
                    double low = printed.row().wattsPerTonne().lowest();
                    double high = printed.row().wattsPerTonne().highest();
                    assertTrue(low >= at.low() * (1 - 1e-9), crop.id() + " at " + c);
                    assertTrue(high <= at.high() * (1 + 1e-9), crop.id() + " at " + c);
                }
            }
        }
    }

    @Source("cantwell-2001, as in reference-tables/crops/commodities.csv: mango 13 °C, 14 to 21 d")
    @Test
    void chosenFactsAreMarkedAndOwnOnesWin() {
        CropSheet printed = sheet("mango");
        SheetFact temperature = fact(printed, "storage-temperature");
        assertEquals(SheetFact.Standing.CHOSEN, temperature.standing());
        assertEquals(13, temperature.fact().low().orElseThrow());
        assertEquals("cantwell-2001", temperature.sources().get(0).id());
        OwnValues own = new OwnValues(folder);
        own.set(OwnValue.of("mango", "storage-temperature", 11, 12, "2026-03-02T00:00:00Z"));
        try (ReferenceBook book = ReferenceBook.open(own)) {
            CropSheet sheet = CropSheet.of("Mango", Optional.empty(), book);
            List<SheetFact> both =
                    sheet.facts().stream()
                            .filter(one -> one.fact().name().equals("storage-temperature"))
                            .toList();
            assertEquals(2, both.size());
            assertTrue(both.get(0).fact().own());
            assertEquals(SheetFact.Standing.CHOSEN, both.get(0).standing());
            assertEquals(SheetFact.Standing.BESIDE, both.get(1).standing());
        }
    }

    @Test
    void everyFactHasASourceThatIsKnownAndAPart() {
        for (Commodity crop : BOOK.all()) {
            CropSheet sheet = sheet(crop.id());
            assertFalse(sheet.facts().isEmpty());
            sheet.facts().forEach(one -> assertFalse(one.sources().isEmpty(), one.fact().name()));
        }
    }

    @Test
    void variantHasItsOwnFloor() {
        CropSheet hass = SHEETS.of("avocado", Optional.of("hass"));
        assertTrue(hass.variants().containsKey("hass"));
        assertEquals("variant-facts", hass.variant().orElseThrow().code());
    }

    @Test
    void unknownNamesAreRefused() {
        BadInput crop = assertThrows(BadInput.class, () -> sheet("brocoly"));
        assertEquals(
                "brocoly: no commodity is called so; perhaps broccoli? 'look' without a name lists"
                        + " all commodities",
                crop.getMessage());
        BadInput variant =
                assertThrows(BadInput.class, () -> SHEETS.of("mango", Optional.of("hass")));
        assertTrue(variant.getMessage().startsWith("--variant: 'hass' is no variant of mango"));
    }
}
