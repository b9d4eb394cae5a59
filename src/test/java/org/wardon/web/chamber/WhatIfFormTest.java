package org.wardon.web.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.advice.whatif.Changes;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Preferences;

/** What is typed into the fields of a change, in the units and marks people write. */
class WhatIfFormTest {
    private static final Preferences WITH_COMMA =
            new Preferences(false, false, true, Preferences.Light.AUTO);
    private static final Preferences FAHRENHEIT =
            new Preferences(true, false, false, Preferences.Light.AUTO);

    private static WhatIfForm form(Preferences preferences, Map<String, String> typed) {
        return new WhatIfForm(
                2,
                OptionalDouble.of(24),
                new Figures(preferences),
                PageWords.english(),
                name -> typed.getOrDefault(name, ""));
    }

    @Test
    void whatIsAsPlannedIsNoChange() {
        WhatIfForm blank = form(Preferences.USUAL, Map.of());
        assertEquals(Optional.of(Changes.NOTHING), blank.changes());
        assertFalse(blank.asked());
        WhatIfForm same =
                form(
                        Preferences.USUAL,
                        Map.of("setting", "2", "door", "24", "cooling", "100", "load", "100"));
        assertEquals(Optional.of(Changes.NOTHING), same.changes());
        assertTrue(same.asked());
    }

    @Test
    void eachFieldChangesItsOwn() {
        Changes changes =
                form(
                                WITH_COMMA,
                                Map.of(
                                        "setting", "3,5",
                                        "insulation", "150",
                                        "door", "12",
                                        "cooling", "80",
                                        "load", "50"))
                        .changes()
                        .orElseThrow();
        assertEquals(OptionalDouble.of(3.5), changes.settingC());
        assertEquals(1.5, changes.insulation().orElseThrow().thicknessFactor());
        assertEquals(OptionalDouble.of(12), changes.door().openingsPerDay());
        assertEquals(OptionalDouble.of(0.8), changes.coolingFactor());
        assertEquals(OptionalDouble.of(0.5), changes.loadFactor());
    }

    @Test
    void fahrenheitIsReadAsFahrenheit() {
        Changes changes = form(FAHRENHEIT, Map.of("setting", "41")).changes().orElseThrow();
        assertEquals(5, changes.settingC().orElseThrow(), 1e-9);
    }

    @Test
    void everyFaultIsToldAtItsField() {
        WhatIfForm form =
                form(Preferences.USUAL, Map.of("setting", "cold", "cooling", "0", "load", "5000"));
        assertEquals(Optional.empty(), form.changes());
        assertEquals(
                Map.of(
                        "setting", "Give a number from -30 to 45.",
                        "insulation", "",
                        "door", "",
                        "cooling", "Give a number from 10 to 1000.",
                        "load", "Give a number from 10 to 1000."),
                form.slides().stream()
                        .collect(
                                java.util.stream.Collectors.toMap(
                                        slide -> slide.field().name(),
                                        slide -> slide.field().fault())));
    }
}
