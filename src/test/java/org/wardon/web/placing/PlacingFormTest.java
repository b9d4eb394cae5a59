package org.wardon.web.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.company.Borne;
import org.wardon.advice.company.GroupReport;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.placing.PlaceQuestion;
import org.wardon.advice.wording.Words;
import org.wardon.files.PlanReader;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Preferences;

/** What is wished of a placing, and the ruler, in the units and marks people read. */
class PlacingFormTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final StorePlan PLAN =
            PlanReader.read(
                    Path.of("src/test/resources/plans/placing/two-rooms.json"),
                    PlanLookups.of(BOOK));
    private static final PageWords SAY = PageWords.english();

    @AfterAll
    static void close() {
        BOOK.close();
    }

    @Test
    void whatThePlanAcceptsIsToldBesideTheWishes() {
        assertEquals(List.of(), form(Map.of()).view().accepted());
        StorePlan plan = Borne.within("", List.of("odour", "ethylene", "front:uncured"), PLAN);
        assertEquals(
                List.of(
                        "The plan accepts in all chambers: ethylene that shortens a life or starts"
                                + " ripening, smell that is taken on.",
                        "In front it accepts: the cold for lots not cured."),
                new PlacingForm(plan, name -> List.of(), SAY).view().accepted());
    }

    private static PlacingForm form(Map<String, List<String>> typed) {
        return new PlacingForm(PLAN, name -> typed.getOrDefault(name, List.of()), SAY);
    }

    @Test
    void nothingIsAskedAtFirstAndLotsInChambersStayWhereOthersWait() {
        PlacingForm first = form(Map.of());
        assertFalse(first.isAsked());
        assertEquals("wish=most-value&move=none", first.query());
        assertEquals("none", taken(first.view().moves()));
    }

    private static String taken(List<PlacingView.Pick> picks) {
        return picks.stream().filter(PlacingView.Pick::taken).findFirst().orElseThrow().word();
    }

    @Test
    void wishesAreAskedAsTheCommandLineAsksThem() {
        PlacingForm days =
                form(
                        Map.of(
                                "wish",
                                List.of("most-days"),
                                "lots",
                                List.of("L1", "B1"),
                                "move",
                                List.of("all")));
        assertTrue(days.isAsked());
        assertEquals(
                new PlaceWish(PlaceWish.Aim.MOST_DAYS, List.of("B1", "L1"), Set.of()),
                days.asked().wish());
        assertEquals(new PlaceQuestion(true, Set.of()), days.asked().question());
        assertEquals("wish=most-days&move=all&lots=B1&lots=L1", days.query());
        PlacingForm later = form(Map.of("wish", List.of("most-value"), "move", List.of("later")));
        assertEquals(new PlaceQuestion(false, Set.of("B1", "L1", "C1")), later.asked().question());
        assertEquals(later.query(), PlacingForm.of(PLAN, later.asked(), SAY).query());
    }

    @Test
    void daysOfNobodyAndLotsThatAreGoneAreToldNotSought() {
        PlacingForm nobody = form(Map.of("wish", List.of("most-days")));
        assertFalse(nobody.isAsked());
        assertEquals(
                "Tick at least one lot whose days are to come first, or wish something else.",
                nobody.fault());
        PlacingForm gone = form(Map.of("wish", List.of("most-days"), "lots", List.of("L1", "X9")));
        assertEquals("A lot that was named is not in the plan any more. Tick again.", gone.fault());
    }

    private static RulerView ruler(Preferences preferences) {
        GroupReport group = GroupSharing.of(PLAN, BOOK).ask(List.of("B1", "L1"), Map.of());
        return new RulerViews(
                        List.of(group),
                        Words.english(preferences.units()),
                        SAY,
                        new Figures(preferences))
                .of("front", group, OptionalDouble.of(13));
    }

    @Test
    void barsOfLotsThatPullApartDoNotMeet() {
        RulerView ruler = ruler(Preferences.USUAL);
        assertTrue(ruler.common().isEmpty());
        RulerView.Row warm = ruler.rows().get(0);
        RulerView.Row cold = ruler.rows().get(1);
        assertEquals("pulls warmer ▸", warm.pulls());
        assertEquals("◂ pulls colder", cold.pulls());
        double warmFrom = borne(warm).mapToDouble(PlacingFormTest::from).min().orElseThrow();
        double coldTo = borne(cold).mapToDouble(PlacingFormTest::to).max().orElseThrow();
        assertTrue(coldTo < warmFrom, coldTo + " meets " + warmFrom);
    }

    private static Stream<RulerView.Span> borne(RulerView.Row row) {
        return row.spans().stream().filter(s -> Set.of("lasts", "bears").contains(s.kind()));
    }

    private static double from(RulerView.Span span) {
        return Double.parseDouble(span.at());
    }

    private static double to(RulerView.Span span) {
        return from(span) + Double.parseDouble(span.wide());
    }

    @Test
    void theRulerSpeaksFahrenheitAndComma() {
        RulerView ruler = ruler(new Preferences(true, false, true, Preferences.Light.AUTO));
        assertEquals("°F", ruler.unit());
        assertEquals("set to 55 °F", ruler.setting().orElseThrow().text());
        assertTrue(
                ruler.ticks().stream()
                        .map(RulerView.Tick::text)
                        .filter(t -> !t.isEmpty())
                        .allMatch(t -> Integer.parseInt(t) % 10 == 0));
        String told =
                ruler(new Preferences(false, false, true, Preferences.Light.AUTO))
                        .rows()
                        .get(1)
                        .told();
        assertTrue(told.matches("[0-9]+,[0-9] to [0-9]+,[0-9] °C"), told);
    }
}
