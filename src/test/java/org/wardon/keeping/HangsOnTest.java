package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.wardon.lots.LotHistory;

class HangsOnTest {
    private static final List<Draw> DRAWS = Draws.seeded(11, 32);
    private static final double TEN_DAYS_S = 864_000;

    private static double[] days(ToDoubleFunction<Draw> of) {
        return DRAWS.stream().mapToDouble(of).toArray();
    }

    @ParameterizedTest
    @EnumSource(HangsOn.Range.class)
    void whatRisesOrFallsWithOneRangeAloneHangsOnItAlone(HangsOn.Range range) {
        for (double sign : new double[] {1, -1}) {
            HangsOn most =
                    HangsOn.of(DRAWS, days(draw -> Math.exp(sign * 3 * range.quantile(draw))))
                            .orElseThrow();
            assertEquals(range, most.range());
            assertEquals(1, most.share(), 1e-12);
        }
    }

    @Test
    void nothingIsNamedWhereManyRangesPullAlikeDaysDoNotDifferOrDrawsAreFew() {
        double[] many =
                days(
                        draw ->
                                java.util.Arrays.stream(HangsOn.Range.values())
                                        .mapToDouble(range -> range.quantile(draw))
                                        .sum());
        assertTrue(HangsOn.of(DRAWS, many).isEmpty());
        assertTrue(HangsOn.of(DRAWS, days(draw -> 730)).isEmpty());
        assertTrue(HangsOn.of(DRAWS.subList(0, 3), new double[] {1, 2, 3}).isEmpty());
    }

    /** What ends a lot in the cold is cold, in dry air drought, in its own condition age. */
    @ParameterizedTest
    @CsvSource({
        "banana-green, 5, 95, CHILLING",
        "lettuce-leaf, 1, 40, TRANSPIRATION",
        "apple, 0, 95, LIFE_LEVEL"
    })
    void theRangeOfWhatEndsALotIsNamed(
            String crop, double atC, double humidityPct, HangsOn.Range expected) {
        LotHistory history = LotHistory.constant(atC, humidityPct / 100, 0.01, TEN_DAYS_S);
        Outlook outlook = Crops.model(crop).outlook(history, Draws.seeded(2, 128), 0, TEN_DAYS_S);
        assertEquals(expected, outlook.hangsOn().orElseThrow().range());
    }
}
