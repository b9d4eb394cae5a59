package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.RespirationRow;
import org.wardon.reference.ReferenceBook;

/** Gaps of the chosen table are filled only where sources agree, and the curve never falls. */
class RespirationGapsTest {
    private static final List<RespirationRow> CHOSEN =
            List.of(Crops.row(10, "not-stated", 20, 30), Crops.row(20, "not-stated", 50, 80));

    private static RespirationRow seen(double c, double low, double high) {
        return other(c, "not-stated", low, high, Evidence.SEEN);
    }

    private static RespirationRow other(
            double c, String state, double low, double high, Evidence evidence) {
        return new RespirationRow(
                c, state, Fact.range(low, high, "W/t", "another", evidence), "co2");
    }

    private static RespirationGaps with(RespirationRow... rows) {
        return RespirationGaps.filled(CHOSEN, List.of(rows));
    }

    @Test
    void aSourceThatAgreesFillsBetweenAndBeyond() {
        RespirationGaps gaps =
                with(seen(5, 12, 15), seen(13, 25, 40), seen(20, 75, 99), seen(25, 90, 120));
        assertEquals(Set.of(5.0, 13.0, 25.0), gaps.filling().keySet());
        assertEquals(Set.of(5.0, 10.0, 13.0, 20.0, 25.0), gaps.rates().keySet());
        assertEquals(80, gaps.rates().get(20.0).highest());
        assertTrue(gaps.refused().isEmpty());
    }

    @Test
    void aSourceThatDiffersByMoreThanTheRangeAnywhereFillsNothing() {
        RespirationGaps gaps = with(seen(5, 12, 15), seen(15, 60, 70));
        assertTrue(gaps.filling().isEmpty());
        assertEquals(Set.of("another"), gaps.refused());
        RespirationRow recalled = other(15, "not-stated", 60, 70, Evidence.MEMORY);
        assertTrue(with(seen(5, 12, 15), seen(20, 60, 60), recalled).filling().isEmpty());
    }

    @Test
    void roundingIsNoDifference() {
        assertEquals(1, with(seen(5, 12, 15), seen(20, 81.4, 90)).filling().size());
        assertTrue(with(seen(5, 12, 15), seen(20, 81.6, 90)).filling().isEmpty());
    }

    @Test
    void aSourceWithNothingToCompareFillsNothing() {
        assertEquals(Set.of("another"), with(seen(5, 12, 15), seen(25, 90, 95)).refused());
    }

    @Test
    void whatWouldMakeTheCurveFallIsLeftOut() {
        RespirationGaps gaps = with(seen(5, 21, 25), seen(13, 29, 29), seen(20, 50, 50));
        assertTrue(gaps.filling().isEmpty());
        assertEquals(Set.of("another"), gaps.refused());
    }

    @Test
    void recalledRowsAndOtherStatesFillNothing() {
        RespirationRow recalled = other(13, "not-stated", 25, 40, Evidence.MEMORY);
        RespirationRow ripe = other(14, "ripe", 25, 40, Evidence.SEEN);
        RespirationGaps gaps = with(recalled, ripe, seen(20, 60, 60));
        assertTrue(gaps.filling().isEmpty());
        assertTrue(gaps.refused().isEmpty());
    }

    @Source("UC Davis produce facts, mango: 10 and 13 °C; ASHRAE Refrigeration 2006 at 15 °C")
    @Test
    void mangoBreathesAsSeenAtTenAndThirteen() {
        try (ReferenceBook book = ReferenceBook.open()) {
            Commodity mango = book.get("mango");
            assertEquals(68, watts(mango, 10, 0), 0.5);
            assertEquals(91, watts(mango, 10, 1), 0.5);
            assertEquals(84, watts(mango, 13, 0), 0.5);
            assertEquals(123, watts(mango, 13, 1), 0.5);
            assertEquals(133.4, watts(mango, 15, 0.5), 1e-9);
            assertTrue(codes(mango).contains("respiration-filled"));
        }
    }

    @Source("papaya: UC Davis produce facts 83 to 195 W/t at 15 °C, ASHRAE 2006 44.6 to 64.5")
    @Test
    void papayaKeepsItsTableAndSaysThatAnotherDiffers() {
        try (ReferenceBook book = ReferenceBook.open()) {
            Commodity papaya = book.get("papaya");
            assertTrue(codes(papaya).contains("respiration-differs"));
            assertFalse(codes(papaya).contains("respiration-filled"));
            double between = Math.exp(0.4 * Math.log(33.5) + 0.6 * Math.log(44.6));
            assertEquals(between, watts(papaya, 13, 0), 1e-9);
        }
    }

    private static double watts(Commodity commodity, double c, double share) {
        return 1000 * curve(commodity, share).value().wattsPerKg(c);
    }

    private static List<String> codes(Commodity commodity) {
        return curve(commodity, 0.5).restsOn().stream().map(Reason::code).toList();
    }

    private static WithReasons<RespirationCurve> curve(Commodity commodity, double share) {
        return Respirations.own(commodity, Ripeness.UNKNOWN, share).orElseThrow();
    }
}
