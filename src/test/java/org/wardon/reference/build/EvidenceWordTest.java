package org.wardon.reference.build;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The word of evidence is found at the head of a cell that goes on in prose. */
class EvidenceWordTest {
    @ParameterizedTest(name = "{0} -> {1}")
    @CsvSource(
            delimiter = '|',
            value = {
                "seen|seen",
                "seen; confirmed by UCD-TOMATO|seen",
                "seen (formula only)|seen",
                "seen, derived; confirmed by thompson-cooling-table|derived",
                "memory: gives 1.6 to 2 times the table 9 rates|memory",
                "memory (mg CO2/(kg h) recalled; heat derived)|memory",
                "mixed: freezing point seen (in F), composition memory|mixed",
                "common practice, no source|common practice, no source",
                "seen-k-rho|mixed",
                "seen-R|seen",
                "seen-inputs|computed"
            })
    void headOfTheCell(String cell, String word) {
        assertEquals(Optional.of(word), EvidenceWord.of(cell));
    }

    @Test
    void nothingElseIsAWord() {
        assertEquals(Optional.empty(), EvidenceWord.of("seenish"));
        assertEquals(Optional.empty(), EvidenceWord.of("seen-colour"));
        assertEquals(Optional.empty(), EvidenceWord.of(""));
        assertEquals(Optional.empty(), EvidenceWord.ofProse("guessed"));
        assertEquals(
                Optional.of("mixed"),
                EvidenceWord.ofProse("unit mass from seen edible weight 182 g; density memory"));
        assertEquals(Optional.of("assumption"), EvidenceWord.ofProse("no published size found"));
    }
}
