package org.wardon.advice.company;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.wardon.errors.BadInput;
import org.wardon.files.PlacedPlan;
import org.wardon.files.PlanReader;
import org.wardon.files.TableLookups;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;

/** What a keeper accepts, in words, in all chambers of a plan or in one. */
class BorneTest {
    private static final Path FILE = Path.of("demo-data/landing.json");
    private static final StorePlan DEMO = PlanReader.read(FILE, TableLookups.read());

    private static StorePlan accepting(String... words) {
        return Borne.within("--accept", List.of(words), DEMO);
    }

    @Test
    void aWordAloneIsAcceptedEverywhereOneBehindAChamberOnlyThere() {
        StorePlan plan = accepting("Ethylene", "cold:odour", "shed: uncured");
        assertEquals(Set.of(Conflict.ETHYLENE), plan.accepts(plan.getChamber("fruit")));
        assertEquals(
                Set.of(Conflict.ETHYLENE, Conflict.ODOUR), plan.accepts(plan.getChamber("cold")));
        assertEquals(
                Set.of(Conflict.ETHYLENE, Conflict.UNCURED), plan.accepts(plan.getChamber("shed")));
    }

    @Test
    void whatThePlanAcceptsStaysAccepted() {
        StorePlan plan = Borne.within("--accept", List.of("odour"), accepting("cold:ethylene"));
        assertEquals(
                Set.of(Conflict.ETHYLENE, Conflict.ODOUR), plan.accepts(plan.getChamber("cold")));
        assertEquals(Set.of(Conflict.ODOUR), plan.accepts(plan.getChamber("shed")));
        assertEquals(DEMO, Borne.within("--accept", List.of(), DEMO));
    }

    @Test
    void everyWordThatNamesNothingIsToldByOneFault() {
        BadInput bad =
                assertThrows(
                        BadInput.class,
                        () -> accepting("ethylen", "odour", "shed:smell", "frut:odour"));
        String accepted = "accepted: ethylene, odour, uncured";
        assertEquals(
                "--accept: 'ethylen' is no conflict a keeper accepts; did you mean 'ethylene'? "
                        + accepted
                        + "\n--accept shed: 'smell' is no conflict a keeper accepts; "
                        + accepted
                        + "\n--accept: the plan has no chamber 'frut'; did you mean 'fruit'?"
                        + " accepted: fruit, cold, shed",
                bad.getMessage());
    }

    /** Read again, the plan written accepts the same, and nothing else of it changed. */
    @Test
    void whatIsAcceptedIsWrittenWhereItHolds() throws IOException {
        String text = Files.readString(FILE);
        String changed =
                PlacedPlan.changed(text, DEMO, accepting("odour", "ethylene", "cold:odour"));
        String expected =
                text.replace(
                                "\"capacityKg\": 4500\n",
                                "\"capacityKg\": 4500,\n      \"accept\": [\"odour\"]\n")
                        .replace(
                                "\"pricePerKg\": 6.5}\n  ]",
                                "\"pricePerKg\": 6.5}\n  ],\n  \"accept\": [\"ethylene\", \"odour\"]");
        assertEquals(expected, changed);
    }
}
