package org.wardon.advice.company;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.Bounds;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.reference.ReferenceBook;

/** Who may share, as it is asked and answered. */
class SharingAdviceTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final SharingAdvice ADVICE =
            new SharingAdvice(BOOK, Words.english(Units.METRIC));

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static ShareAnswer ask(double days, String... crops) {
        Map<String, Double> wanted = new LinkedHashMap<>();
        for (String crop : crops) {
            wanted.put(crop, days);
        }
        return ADVICE.ask(wanted).answer();
    }

    @Test
    void crispCropsOfTheColdShareAndSayWhere() {
        ShareAnswer answer = ask(7, "broccoli", "cauliflower");
        assertEquals("good", answer.verdict());
        Bounds range = answer.workableC().orElseThrow();
        assertTrue(range.low() <= 0.5 && range.high() > range.low(), range.toString());
        assertTrue(answer.workableHumidityPct().isPresent());
        assertEquals(List.of(), answer.pairs().get(0).reasons());
    }

    @Test
    void tropicalAndTemperateCropsArePulledApartInASentenceWithItsSource() {
        ShareAnswer answer = ask(10, "banana-green", "lettuce-crisphead");
        assertEquals("no", answer.verdict());
        assertTrue(answer.workableC().isEmpty());
        var reason = answer.pairs().get(0).reasons().get(0);
        assertEquals("temperature-gap", reason.code());
        assertTrue(
                reason.text()
                        .matches(
                                "lettuce-crisphead works up to [0-9.]+ °C, banana-green from"
                                        + " [0-9.]+ °C on: [0-9.]+ K apart\\."),
                reason.text());
        assertFalse(reason.source().isBlank());
    }

    @Test
    void aCommonNameStandsForItsCropAndEveryPairIsListedOnce() {
        ShareAnswer answer = ask(7, "Mango", "lady's finger", "broccoli");
        List<String> pairs = answer.pairs().stream().map(p -> p.a() + "+" + p.b()).toList();
        assertEquals(List.of("mango+okra", "mango+broccoli", "okra+broccoli"), pairs);
    }

    @Test
    void moreDaysNeverWidenTheSettings() {
        Bounds brief = ask(3, "broccoli", "cauliflower").workableC().orElseThrow();
        Bounds longer = ask(12, "broccoli", "cauliflower").workableC().orElseThrow();
        assertTrue(longer.high() < brief.high(), brief + " then " + longer);
        assertTrue(longer.low() >= brief.low(), brief + " then " + longer);
    }

    @Test
    void eachCropMayWantItsOwnDays() {
        Map<String, Double> wanted = new LinkedHashMap<>();
        wanted.put("broccoli", 3.0);
        wanted.put("onion-dry", 120.0);
        ShareReport report = ADVICE.ask(wanted);
        assertEquals(1, report.answer().pairs().size());
        assertFalse(report.answer().verdict().equals("good"), "120 days do not go with broccoli");
    }

    @Test
    void everyFaultIsToldAtOnce() {
        Map<String, Double> wanted = new LinkedHashMap<>();
        wanted.put("mango", 7.0);
        wanted.put("Mango", 7.0);
        wanted.put("okra", -1.0);
        wanted.put("brocoli", 7.0);
        BadInput bad = assertThrows(BadInput.class, () -> ADVICE.ask(wanted));
        assertEquals(3, bad.faults().size(), bad.getMessage());
        assertTrue(
                bad.getMessage().contains("Mango: mango is named twice; name each crop once"),
                bad.getMessage());
        assertTrue(
                bad.getMessage()
                        .contains("okra: -1.0 days are out of range; accepted: 0.1 to 730 days"),
                bad.getMessage());
        assertTrue(bad.getMessage().contains("perhaps broccoli"), bad.getMessage());
    }
}
