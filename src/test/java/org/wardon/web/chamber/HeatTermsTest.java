package org.wardon.web.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.WhyAnswer;

/** The bands of the heat budget hold every term, each once. */
class HeatTermsTest {
    /** A series in which the n-th term is 2 to the n, so that each sum names its terms. */
    private static HourlySeries powersOfTwo() {
        List<HourlySeries.Column> columns = new ArrayList<>();
        double value = 1;
        for (RecordComponent term : WhyAnswer.HeatW.class.getRecordComponents()) {
            columns.add(new HourlySeries.Column(term.getName(), List.of(value, value)));
            value *= 2;
        }
        return new HourlySeries("north", List.of(3_600.0, 7_200.0), columns);
    }

    @Test
    void everyTermStandsInOneBand() {
        HourlySeries heat = powersOfTwo();
        long sum =
                Arrays.stream(HeatTerms.values())
                        .mapToLong(term -> Math.round(term.meanW(heat, 0, 2)))
                        .sum();
        int terms = WhyAnswer.HeatW.class.getRecordComponents().length;
        assertEquals((1L << terms) - 1, sum);
        long bits =
                Arrays.stream(HeatTerms.values())
                        .mapToLong(term -> Math.round(term.meanW(heat, 0, 2)))
                        .reduce(0, (a, b) -> a | b);
        assertEquals(sum, bits);
    }
}
