package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;

/** Slips of the pen are counted one by one. */
class EditDistanceTest {
    @Source("Damerau 1964: omission, insertion, substitution, transposition of neighbours")
    @ParameterizedTest(name = "{0} and {1} differ by {2}")
    @CsvSource({
        "mango, mango, 0",
        "mngo, mango, 1",
        "mangoo, mango, 1",
        "manga, mango, 1",
        "magno, mango, 1",
        "'', mango, 5",
        "ca, abc, 3",
        "kitten, sitting, 3"
    })
    void countsSlips(String one, String other, int slips) {
        assertEquals(slips, EditDistance.between(one, other));
        assertEquals(slips, EditDistance.between(other, one));
    }
}
