package org.wardon.air.normals;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.air.SaturatedAir;

/** The laws weather from normals is put together from. */
class NormalsLawsTest {
    private static List<Double> months(SplittableRandom random, double low, double high) {
        List<Double> months = new ArrayList<>();
        for (int m = 0; m < 12; m++) {
            months.add(random.nextDouble(low, high));
        }
        return months;
    }

    private static double mean(MonthBlend blend, int year, int month) {
        LocalDate first = LocalDate.of(year, month, 1);
        double sum = 0;
        for (int d = 0; d < first.lengthOfMonth(); d++) {
            sum += blend.at(first.plusDays(d));
        }
        return sum / first.lengthOfMonth();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void blendedDaysHaveTheMonthsMeansAndNoStep(long seed) {
        List<Double> means = months(new SplittableRandom(seed), -20, 40);
        MonthBlend blend = MonthBlend.of(means);
        for (int year : new int[] {2026, 2028}) {
            for (int m = 1; m <= 12; m++) {
                assertEquals(means.get(m - 1), mean(blend, year, m), 1e-8, "seed " + seed);
            }
        }
        double widest = Collections.max(means) - Collections.min(means);
        for (LocalDate d = LocalDate.of(2026, 1, 1); d.getYear() < 2030; d = d.plusDays(1)) {
            double step = Math.abs(blend.at(d.plusDays(1)) - blend.at(d));
            // Months that swing at random by 60 K: straight lines over 28 days.
            assertTrue(step < 3 * widest / 28, "seed " + seed + ", " + d + " steps " + step);
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void blendedDaysStayWithinTheirBounds(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        List<Double> means = months(random, 55, 97);
        MonthBlend blend = MonthBlend.within(means, 0, 100);
        for (int m = 1; m <= 12; m++) {
            assertEquals(means.get(m - 1), mean(blend, 2026, m), 1e-6, "seed " + seed);
        }
        for (LocalDate d = LocalDate.of(2026, 1, 1); d.getYear() < 2027; d = d.plusDays(1)) {
            assertTrue(blend.at(d) >= 0 && blend.at(d) <= 100);
        }
    }

    @Source("ASHRAE Handbook - Fundamentals, 2017, chapter 14, table 6, from memory")
    @ParameterizedTest
    @CsvSource({
        "1, 0.88",
        "4, 0.98",
        "5, 1.00",
        "8, 0.74",
        "14, 0",
        "15, 0",
        "20, 0.50",
        "24, 0.82"
    })
    void dayCurveIsTheTables(double hour, double fraction) {
        assertEquals(fraction, DayCurve.belowHighest(hour), 1e-12);
    }

    @Test
    void dayCurveRunsOnFromDayToDay() {
        DayCurve.Extremes first = new DayCurve.Extremes(30, 20, 33, 16);
        DayCurve.Extremes second = new DayCurve.Extremes(33, 16, 25, 17);
        assertEquals(20, DayCurve.temperatureC(5, first), 1e-12);
        assertEquals(33, DayCurve.temperatureC(14.5, first), 1e-12);
        assertEquals(DayCurve.temperatureC(24, first), DayCurve.temperatureC(0, second), 1e-12);
        double before = DayCurve.temperatureC(0, first);
        for (double h = 0.01; h <= 24; h += 0.01) {
            double now = DayCurve.temperatureC(h, first);
            assertTrue(Math.abs(now - before) < 0.03, "at " + h);
            before = now;
        }
    }

    @Source("Duffie and Beckman, Solar Engineering of Thermal Processes, 2.9, from memory")
    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.2, 0.35, 0.5, 0.62, 0.75, 0.81})
    void clearDaysHaveTheirMean(double mean) {
        double got =
                new SimpsonIntegrator()
                                .integrate(
                                        1_000_000,
                                        z -> ClearDays.clearness(mean, z) * Math.exp(-z * z / 2),
                                        -8,
                                        8)
                        / Math.sqrt(2 * Math.PI);
        assertEquals(mean, got, 2e-3 * mean);
        assertTrue(ClearDays.clearness(mean, -8) >= 0 && ClearDays.clearness(mean, 8) < 0.9);
    }

    @Source("Bendt, Collares-Pereira and Rabl 1981, in Duffie and Beckman 2.9.4, from memory")
    @Test
    void steepnessIsNearThePrintedFit() {
        // Printed: gamma = -1.498 + (1.184 xi - 27.182 exp(-1.5 xi))/(Kmax - Kmin).
        double mean = 0.5;
        double most = 0.6313 + 0.267 * mean - 11.9 * Math.pow(mean - 0.75, 8);
        double span = most - 0.05;
        double xi = span / (most - mean);
        double printed = -1.498 + (1.184 * xi - 27.182 * Math.exp(-1.5 * xi)) / span;
        double ours = ClearDays.steepness((mean - 0.05) / span) / span;
        assertEquals(printed, ours, 0.05 * printed, "the fit's own error is a few percent");
    }

    @Test
    void heldVapourIsTheRuleWhereNothingIsCut() {
        double[] hourC = {18, 20, 24, 30, 33, 30, 25, 21};
        double inverse =
                Arrays.stream(hourC)
                        .map(c -> 1 / SaturatedAir.overWaterPa(c))
                        .average()
                        .orElseThrow();
        assertEquals(0.40 / inverse, HeldVapour.pressurePa(0.40, hourC), 1e-6);
    }

    @Test
    void whatSaturationCutsGoesToTheOtherHours() {
        double[] hourC = {18, 20, 24, 30, 33, 30, 25, 21};
        double pa = HeldVapour.pressurePa(0.85, hourC);
        double mean =
                Arrays.stream(hourC)
                        .map(c -> Math.min(1, pa / SaturatedAir.overWaterPa(c)))
                        .average()
                        .orElseThrow();
        assertEquals(0.85, mean, 1e-9);
        assertTrue(pa > SaturatedAir.overWaterPa(20), "the coldest hours are saturated");
        double full = HeldVapour.pressurePa(1, hourC);
        assertEquals(SaturatedAir.overWaterPa(33), full, 1e-6 * full);
    }

    @Test
    void normalsRefuseWhatNoMonthCanBe() {
        List<Double> warm = Collections.nCopies(12, 30.0);
        List<Double> cool = Collections.nCopies(12, 20.0);
        List<Double> humid = Collections.nCopies(12, 70.0);
        assertEquals(
                "dailyMaxC of month 1 is 20.0, below its dailyMinC of 30.0",
                refusal(() -> new MonthlyNormals(cool, warm, humid, Optional.empty())));
        assertEquals(
                "weather.normals.humidityPct[0] is 0.0 %; accepted is 1.0 to 100.0 %.",
                refusal(
                        () ->
                                new MonthlyNormals(
                                        warm,
                                        cool,
                                        Collections.nCopies(12, 0.0),
                                        Optional.empty())));
        assertEquals(
                "dailyMinC needs twelve values, found 11",
                refusal(
                        () ->
                                new MonthlyNormals(
                                        warm, cool.subList(0, 11), humid, Optional.empty())));
    }

    private static String refusal(org.junit.jupiter.api.function.Executable what) {
        return String.valueOf(assertThrows(IllegalArgumentException.class, what).getMessage());
    }
}
