package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.picture.SectionPicture;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.AnswerWriter;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Where it is warm and where cold in an invented chest, and what is said of it. */
class SectionAdviceTest {
    private static final Words WORDS = Words.english(Units.METRIC);
    private static final String JACKET =
            "{\"kind\": \"water-film\", \"wets\": [\"north\", \"south\"], \"flowKgS\": 0.05,"
                    + " \"inletC\": 4, \"open\": false, \"control\": \"modulating\"}";
    private static final String OKRA = lot("OKR1", "okra", 60);
    private static final String BROCCOLI = lot("BRO1", "broccoli", 150);

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

    private static String lot(String id, String crop, double kg) {
        return "{\"id\": \"%s\", \"commodity\": \"%s\", \"massKg\": %s, \"package\": \"room-cooling-any\", \"arrives\": \"2026-03-02T06:00\", \"temperatureC\": 8, \"chamber\": \"chest\", \"wantedDays\": 5}"
                .formatted(id, crop, kg);
    }

    /** A chest of foam, 2 m by 1 m by 0.8 m, in steady air. */
    private StorePlan plan(double outdoorC, String cooling, String more, String... lots)
            throws IOException {
        StringBuilder faces = new StringBuilder();
        for (String face : List.of("roof", "floor", "north", "east", "south", "west")) {
            faces.append(faces.isEmpty() ? "" : ",")
                    .append("{\"face\": \"")
                    .append(face)
                    .append("\", \"beyond\": \"shade\", \"layers\": [{\"conductivityWmK\": 0.035,")
                    .append(" \"densityKgM3\": 30, \"specificHeatJkgK\": 1400, \"thicknessMm\": ")
                    .append(face.equals("roof") ? 40 : 80)
                    .append("}]}");
        }
        String plan =
                """
                {"storePlan": 1, "name": "chest (invented)",
                 "site": {"latitudeDeg": 12, "longitudeDeg": -61, "elevationM": 10, "zone": "America/Grenada"},
                 "weather": {"steady": {"temperatureC": %s, "humidityPct": 60}},
                 "from": "2026-03-02T00:00", "days": 4,
                 "chambers": [{"id": "chest", "lengthM": 2, "widthM": 1, "heightM": 0.8, "faces": [%s],
                  "thermalBridgePct": 0, "leakageAirChangesPerDay": 2, "cooling": [%s], %s
                  "setting": {"temperatureC": 6, "bandK": 1, "humidityPct": 90}, "capacityKg": 600}],
                 "lots": [%s]}
                """
                        .formatted(outdoorC, faces, cooling, more, String.join(",", lots));
        Path file = Files.writeString(folder.resolve("plan.json"), plan);
        return PlanReader.read(file, PlanLookups.of(book));
    }

    private static SectionAnswer ask(StorePlan plan, String at, int hours, String across) {
        return new SectionAdvice(book, WORDS)
                .ask(
                        plan,
                        new SectionAdvice.Question(
                                "chest",
                                Optional.of(at).filter(t -> !t.isEmpty()),
                                hours,
                                Optional.of(across).filter(t -> !t.isEmpty())));
    }

    private static List<String> refused(StorePlan plan, String at, int hours, String across) {
        return assertThrows(BadInput.class, () -> ask(plan, at, hours, across)).faults().stream()
                .map(Fault::sentence)
                .toList();
    }

    private static boolean warns(SectionAnswer answer, String code, String subject) {
        return answer.warnings().stream()
                .anyMatch(w -> w.code().equals(code) && w.subject().startsWith(subject));
    }

    @Test
    void aChestWithTwoColdWallsIsCutAcrossThemAndColdBeside() throws IOException {
        SectionAnswer answer = ask(plan(30, JACKET, "", BROCCOLI), "", 24, "");
        assertEquals("south-north", answer.across());
        assertEquals(1, answer.widthM(), 1e-9);
        assertEquals(24, answer.hours(), 1e-9);
        double wallC = answer.faces().get(0).innerC();
        double roofC = answer.faces().get(3).innerC();
        assertTrue(wallC < 7 && roofC > wallC + 2, answer.faces().toString());
        assertTrue(answer.coldest().xM() < 0.02 || answer.coldest().xM() > 0.98);
        assertTrue(answer.coldest().where().matches("in the air, .*, by the (south|north) wall"));
        assertTrue(answer.warmest().inStack());
        assertTrue(answer.airSpreadK() > 2, answer.airSpreadK() + " K");
        assertTrue(answer.spreadK() >= answer.airSpreadK());
        assertTrue(answer.leftOpenPct() < 1e-6, answer.leftOpenPct() + " %");
        assertEquals(List.of("BRO1"), answer.stack().orElseThrow().lots());
        assertTrue(warns(answer, "still-air-spread", "chest"), answer.warnings().toString());
    }

    @Test
    void theFacesAreThoseOfTheForecast() throws IOException {
        StorePlan plan = plan(30, JACKET, "", BROCCOLI);
        String at = "2026-03-04T15:00";
        SectionAnswer answer = ask(plan, at, 1, "west-east");
        for (SectionAnswer.OfFace face : answer.faces()) {
            WhyAnswer why =
                    new WhyAdvice(book, WORDS)
                            .ask(
                                    plan,
                                    new WhyAdvice.Question(
                                            "chest",
                                            at,
                                            Optional.of(face.face()),
                                            Optional.empty()));
            assertEquals(why.face().orElseThrow().innerC(), face.innerC(), 1e-6, face.face());
            assertEquals(why.after().airC(), answer.oneAirC(), 1e-6);
        }
        assertEquals("west", answer.faces().get(0).face());
        assertEquals(2, answer.widthM(), 1e-9);
    }

    @Test
    void inAChestAtRestInSteadyAirAllPlacesAgreeWithTheForecast() throws IOException {
        SectionAnswer answer = ask(plan(20, "", ""), "2026-03-05T20:00", 24, "");
        assertEquals(20, answer.oneAirC(), 0.05);
        assertEquals(answer.oneAirC(), answer.airMeanC(), 0.05);
        assertEquals(0, answer.spreadK(), 0.1);
        assertTrue(answer.stack().isEmpty());
        assertTrue(answer.warnings().isEmpty(), answer.warnings().toString());
        assertTrue(answer.said().get(0).contains("mean of the 24 h to 2026-03-05 20:00"));
    }

    @Test
    void lotsHearOfThePlaceThatHarmsThem() throws IOException {
        SectionAnswer chills = ask(plan(30, JACKET, "", OKRA), "", 24, "");
        assertTrue(warns(chills, "chills-in-cold-place", "OKR1"), chills.warnings().toString());
        SectionAnswer freezes = ask(plan(-6, "", "", OKRA), "2026-03-05T20:00", 24, "");
        assertEquals("freezes-in-cold-place", freezes.warnings().get(0).code());
        assertEquals("danger", freezes.warnings().get(0).level());
        SectionAnswer warm = ask(plan(30, "", "", BROCCOLI), "", 24, "");
        assertTrue(warns(warm, "warm-in-warm-place", "BRO1"), warm.warnings().toString());
        assertFalse(warns(warm, "freezes-in-cold-place", "BRO1"));
    }

    @Test
    void theForecastPointsHereWhereTheAirIsFurtherApartThanTheBand() throws IOException {
        ForecastAdvice forecast = new ForecastAdvice(book, WORDS);
        List<String> wide =
                SmallPlan.told(
                        forecast.advise(plan(30, JACKET, "", BROCCOLI), Progress.SILENT).forecast(),
                        "still-air-spread");
        assertEquals(1, wide.size());
        assertTrue(wide.get(0).contains("See 'wardon section PLAN --chamber chest'"), wide.get(0));
        String fan = "\"gains\": {\"fansW\": 20},";
        Forecast stirred =
                forecast.advise(plan(30, JACKET, fan, BROCCOLI), Progress.SILENT).forecast();
        assertEquals(List.of(), SmallPlan.told(stirred, "still-air-spread"));
        Forecast even = forecast.advise(plan(20, "", ""), Progress.SILENT).forecast();
        assertEquals(List.of(), SmallPlan.told(even, "still-air-spread"));
    }

    @Test
    void iceTakesItsHeatOutOfTheAirAndAFanStirsIt() throws IOException {
        String ice = "{\"kind\": \"ice-bank\", \"iceKg\": 400, \"uaWK\": 12%s}";
        SectionAnswer answer =
                ask(plan(30, ice.formatted(""), "", BROCCOLI), "2026-03-04T12:00", 24, "");
        // The faces bring heat in and only the ice takes it: the air is colder than any face.
        double coldestFace =
                answer.faces().stream()
                        .mapToDouble(SectionAnswer.OfFace::innerC)
                        .min()
                        .orElseThrow();
        assertTrue(answer.coldest().temperatureC() < coldestFace, answer.coldest().toString());
        StorePlan stirred = plan(30, ice.formatted(", \"fanW\": 15"), "", BROCCOLI);
        assertEquals(
                List.of(
                        "--chamber: is 'chest', whose air is stirred (ice-bank): it has no still"
                                + " corners to show; ask 'wardon why PLAN --chamber chest --at"
                                + " TIME' for its heat, and 'wardon advise' for the blast of its"
                                + " cooler; chambers without a fan: none in this plan"),
                refused(stirred, "", 24, ""));
    }

    @Test
    void whatIsWrongIsToldAtOnce() throws IOException {
        StorePlan plan = plan(30, JACKET, "", BROCCOLI);
        assertEquals(
                List.of(
                        "--across: is 'west-est', no way of cutting; did you mean 'west-east'?"
                                + " accepted: west-east, south-north",
                        "--at: is 'noon', no local time; accepted: such as 2026-03-02T15:00",
                        "--hours: 0 is out of range; accepted: 1 to 336 hours"),
                refused(plan, "noon", 0, "west-est"));
        assertEquals(
                List.of(
                        "--at: is 2026-04-01T00:00, where no hour of the plan ends; accepted:"
                                + " 2026-03-02T01:00 to 2026-03-06T00:00"),
                refused(plan, "2026-04-01T00:00", 24, ""));
    }

    @Test
    void everySentenceIsWholeInBothUnits() throws IOException {
        String warm = OKRA.replace("\"temperatureC\": 8", "\"temperatureC\": 26");
        StorePlan plan = plan(30, JACKET, "", warm, BROCCOLI);
        Words american = Words.english(new Units(true, true));
        SectionAnswer answer =
                new SectionAdvice(book, american)
                        .ask(
                                plan,
                                new SectionAdvice.Question(
                                        "chest",
                                        Optional.of("2026-03-03T10:00"),
                                        24,
                                        Optional.empty()));
        String all = AnswerWriter.json(answer);
        assertFalse(all.contains("NaN") || all.contains("{0}") || all.contains("{s"), all);
        assertTrue(answer.said().get(0).contains("°F"), answer.said().get(0));
        assertTrue(answer.said().get(2).contains(" lb,"), answer.said().get(2));
        // On the day after its arrival the warm lot is on its way.
        assertTrue(
                answer.said().stream()
                        .anyMatch(
                                s ->
                                        s.matches(
                                                "BRO1 is still on its way: it came \\d+ °F in that time.*")),
                answer.said().toString());
    }

    @Test
    void thePictureTellsByNumbersLinesAndMarksWhatItTellsByColour() throws Exception {
        SectionAnswer answer = ask(plan(30, JACKET, "", BROCCOLI), "", 24, "");
        String svg = SectionPicture.of(answer, WORDS);
        Document drawn =
                DocumentBuilderFactory.newInstance()
                        .newDocumentBuilder()
                        .parse(new ByteArrayInputStream(svg.getBytes(StandardCharsets.UTF_8)));
        assertEquals("img", drawn.getDocumentElement().getAttribute("role"));
        assertTrue(drawn.getDocumentElement().getAttribute("viewBox").startsWith("0 0 360 "));
        NodeList texts = drawn.getElementsByTagName("text");
        StringBuilder told = new StringBuilder();
        int numbers = 0;
        for (int i = 0; i < texts.getLength(); i++) {
            String text = texts.item(i).getTextContent();
            told.append(text).append('\n');
            numbers += text.matches("-?\\d+\\.\\d") ? 1 : 0;
        }
        assertTrue(numbers >= 8, told.toString());
        for (String part :
                List.of(
                        "Chamber chest, 2026-03-0",
                        "south\n",
                        "north\n",
                        "roof ",
                        "floor ",
                        "load\n",
                        "warmest " + Units.METRIC.temperature(answer.warmest().temperatureC()),
                        "coldest " + Units.METRIC.temperature(answer.coldest().temperatureC()),
                        answer.coldest().where(),
                        "°C, from cold to warm; a line every ")) {
            assertTrue(told.toString().contains(part), part + " in " + told);
        }
        assertFalse(svg.contains("NaN") || svg.contains("{0}"), svg);
        // Every row of cells is drawn to its end.
        double wide = 0;
        NodeList cells = drawn.getElementsByTagName("g").item(0).getChildNodes();
        for (int i = 0; i < cells.getLength(); i++) {
            if (cells.item(i) instanceof org.w3c.dom.Element cell) {
                wide += Double.parseDouble(cell.getAttribute("width")) - 0.5;
            }
        }
        // Each width is written to two decimals.
        double rounding = 0.005 * cells.getLength();
        assertEquals(answer.field().rows() * (360 - 2 * 66), wide, rounding);
        Words fahrenheit = Words.english(new Units(true, false));
        SectionAnswer asked =
                new SectionAdvice(book, fahrenheit)
                        .ask(
                                plan(30, JACKET, "", BROCCOLI),
                                new SectionAdvice.Question(
                                        "chest", Optional.empty(), 24, Optional.empty()));
        String american = SectionPicture.of(asked, fahrenheit);
        assertTrue(american.contains("°F, from cold to warm") && !american.contains("°C"));
    }
}
