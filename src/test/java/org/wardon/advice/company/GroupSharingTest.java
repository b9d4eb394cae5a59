package org.wardon.advice.company;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;

/** Groups of lots of a plan and crops beside them: the words of {@code share}, and the bars. */
class GroupSharingTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final double HALF_A_KELVIN = 0.5;
    private static final GroupSharing DEMO = GroupSharing.of(demo(), BOOK);

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static Map<String, Double> crops(double days, String... names) {
        Map<String, Double> crops = new LinkedHashMap<>();
        List.of(names).forEach(name -> crops.put(name, days));
        return crops;
    }

    @Test
    void cropsAreJudgedAsShareJudgesThem() {
        Map<String, Double> crops = crops(10, "banana-green", "lettuce-crisphead", "broccoli");
        ShareAnswer share =
                new SharingAdvice(BOOK, Words.english(Units.METRIC)).ask(crops).answer();
        GroupReport group = DEMO.ask(List.of(), crops);
        assertEquals(share.verdict(), group.verdict());
        assertEquals(share.workableC(), group.workableC());
        assertEquals(share.takeOut(), group.takeOut());
        assertEquals(
                share.pairs().stream().filter(pair -> !pair.reasons().isEmpty()).count(),
                group.pairs().size());
    }

    @Test
    void barsEndWhereTheKelvinsApartBegin() {
        GroupReport group = DEMO.ask(List.of(), crops(10, "banana-green", "lettuce-crisphead"));
        Reason gap = group.pairs().get(0).reasons().get(0);
        assertEquals("temperature-gap", gap.code());
        var cold = member(group, gap.subjects().get(0));
        var warm = member(group, gap.subjects().get(1));
        double apart = warm.borneC().orElseThrow().low() - cold.borneC().orElseThrow().high();
        assertEquals(gap.arguments().get(0).value(), apart, 1e-9);
        assertEquals("colder", group.pulls(cold.id()));
        assertEquals("warmer", group.pulls(warm.id()));
        assertTrue(warm.coldHarmsBelowC().orElseThrow() > 10, "bananas are harmed by cold");
        assertTrue(cold.coldHarmsBelowC().isEmpty(), "lettuce is not");
        assertTrue(cold.frostC() > -1 && cold.frostC() < 1, "lettuce freezes near 0 °C");
    }

    private static GroupReport.Member member(GroupReport group, String id) {
        return group.members().stream()
                .filter(one -> one.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void barsCoverEveryTemperatureOnce() {
        for (GroupReport.Member one : DEMO.ask(List.of(), crops(5, "mango", "peach")).members()) {
            double next = one.stretches().get(0).lowC();
            for (GroupReport.Stretch stretch : one.stretches()) {
                assertEquals(next, stretch.lowC(), 1e-9, one.id());
                assertTrue(stretch.highC() >= stretch.lowC(), one.id());
                next = stretch.highC() + HALF_A_KELVIN;
            }
        }
    }

    @Test
    void lotsOfOneChamberAreJudgedByItsDoorItsThermostatAndTheirDays() {
        Words words = Words.english(Units.METRIC);
        List<String> cold = List.of("CAR1", "LET1");
        GroupReport pair = DEMO.ask(cold, Map.of());
        double frost = member(pair, "LET1").frostC();
        double alone =
                member(DEMO.ask(List.of(), crops(6, "lettuce-crisphead")), "lettuce-crisphead")
                        .frostC();
        double bandK = demo().getChamber("cold").setting().bandK();
        assertEquals(alone + bandK, frost, 1e-9, "the thermostat swings");
        Map<String, Double> apples = crops(6, "apple");
        ShareAnswer strict =
                DEMO.tell(new GroupQuestion(List.of("LET1"), apples, Set.of()), words).answer();
        Set<Conflict> ethylene = Set.of(Conflict.ETHYLENE);
        ShareAnswer borne =
                DEMO.tell(new GroupQuestion(List.of("LET1"), apples, ethylene), words).answer();
        assertEquals("no", strict.verdict());
        assertEquals("tolerable", borne.verdict());
        ShareAnswer.Accepted price = borne.accepted().get(0);
        assertEquals("ethylene", price.conflict());
        assertTrue(price.daysLost().orElseThrow() > 0, price.text());
    }

    private static StorePlan demo() {
        return PlanReader.read(Path.of("demo-data/landing.json"), PlanLookups.of(BOOK));
    }

    @Test
    void whatIsNoConflictOfLotsIsRefusedByName() {
        BadInput bad =
                assertThrows(
                        BadInput.class,
                        () -> Borne.named("--accept", List.of("ethylen", "smell", "odour")));
        assertEquals(
                "--accept: 'ethylen' is no conflict of lots; did you mean 'ethylene'? accepted:"
                        + " ethylene, odour\n"
                        + "--accept: 'smell' is no conflict of lots; accepted: ethylene, odour",
                bad.getMessage());
    }

    @Test
    void nobodyAndStrangersAreRefusedInOneGo() {
        BadInput nobody = assertThrows(BadInput.class, () -> DEMO.ask(List.of(), Map.of()));
        assertEquals("share: names nobody; tick lots or name crops", nobody.getMessage());
        BadInput strangers =
                assertThrows(BadInput.class, () -> DEMO.ask(List.of("X9"), crops(0, "mango")));
        assertEquals(
                "X9: no lot of the plan is called so; tick lots of it\n"
                        + "mango: 0.0 days are out of range; accepted: 0.1 to 730 days",
                strangers.getMessage());
    }
}
