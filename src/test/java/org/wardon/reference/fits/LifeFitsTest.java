package org.wardon.reference.fits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import org.apache.commons.math3.stat.regression.SimpleRegression;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.errors.BadInput;

/** The fitted curves of life: made again they are the same, and they meet what was left out. */
class LifeFitsTest {
    private static final Path TABLES = Path.of("reference-tables");
    private static FitLives.Fitted fitted;

    @BeforeAll
    static void fit() {
        fitted = FitLives.fit(TABLES);
    }

    @Test
    void fittingAgainGivesTheTablesByteForByte() throws IOException {
        for (Map.Entry<String, String> file : fitted.tables().entrySet()) {
            String stands = Files.readString(TABLES.resolve("fits").resolve(file.getKey()));
            assertEquals(stands, file.getValue(), file.getKey() + ": run FitLives again");
        }
    }

    /**
     * Where the fit uses every row of a set as a life, the plain regression of that set is the one
     * derived for the table of fitted rates; its last digit is 0.1 kJ/mol.
     */
    @Test
    @Source("fitted-rates.csv")
    void regressionOfASingleSetIsTheFittedRate() {
        int checked = 0;
        for (PrintedTable.Line row : PrintedTable.read(TABLES.resolve("crops/fitted-rates.csv"))) {
            List<UsedRow> set =
                    fitted.used().rows().stream()
                            .filter(
                                    one ->
                                            one.isLife()
                                                    && one.variant().equals(row.text("variant")))
                            .filter(one -> isOf(one, row))
                            .toList();
            if (set.size() == row.number("n_temps").orElseThrow()) {
                SimpleRegression line = new SimpleRegression();
                for (UsedRow one : set) {
                    double perGas = 1 / (8.314462618e-3 * (one.known().temperatureC() + 273.15));
                    line.addData(perGas, one.known().lnDays());
                }
                double printed = row.number("Ea_kJ_mol").orElseThrow();
                assertEquals(printed, line.getSlope(), 0.06, row.text("commodity_id"));
                checked++;
            }
        }
        assertTrue(checked >= 10, checked + " sets");
    }

    private static boolean isOf(UsedRow one, PrintedTable.Line row) {
        return one.known().of().crop().equals(row.text("commodity_id"))
                && one.known().of().source().equals(row.text("source_id"));
    }

    @Test
    void aTemperatureLeftOutIsMetWithinAQuarterAndNeverWorseThanByTheGenericCurve() {
        List<LeftOut> left = new LeaveOneTemperature(fitted.used(), fitted.deviations()).list();
        assertTrue(error(left, LeftOut::interior) <= 0.25);
        Predicate<LeftOut> chills = LeftOut::chills;
        for (Predicate<LeftOut> which : List.of(chills, chills.negate())) {
            List<LeftOut> some = left.stream().filter(which).toList();
            double pooled = ScoreLives.median(some, LeftOut::fittedError);
            assertTrue(some.size() >= 16);
            assertTrue(pooled <= ScoreLives.median(some, LeftOut::genericError));
            assertTrue(pooled <= ScoreLives.median(some, LeftOut::genericColdError));
        }
    }

    private static double error(List<LeftOut> all, Predicate<LeftOut> which) {
        return ScoreLives.median(all.stream().filter(which).toList(), LeftOut::fittedError);
    }

    @Test
    void theRangeCoversSevenInTenLivesOfASourceLeftOutWithoutBeingTooWide() {
        List<LeaveOneSource.Covered> all =
                new LeaveOneSource(fitted.used(), fitted.deviations()).list();
        long met = all.stream().filter(LeaveOneSource.Covered::agrees).count();
        assertTrue(all.size() >= 130);
        assertTrue(met >= 0.7 * all.size(), met + " of " + all.size());
        assertTrue(ScoreLives.median(all, LeaveOneSource.Covered::widthUp) <= 2.5);
        assertTrue(ScoreLives.median(all, LeaveOneSource.Covered::widthDown) <= 2.5);
    }

    @Test
    void everyCropHasAPictureWithItsPoints() {
        Map<String, String> pictures = new LifePictures(fitted.used(), fitted.fits()).files();
        assertEquals(fitted.used().crops().size(), pictures.size());
        for (Crop crop : fitted.used().crops()) {
            String picture = pictures.getOrDefault(crop.id() + ".svg", "");
            long marks =
                    picture.lines()
                            .filter(
                                    line ->
                                            line.contains("<title>")
                                                    && line.contains("°C</title></"))
                            .count();
            long points =
                    fitted.fits().of(crop).stream()
                            .filter(row -> !row.known().of().relative())
                            .count();
            assertEquals(points, marks, crop.id());
            assertTrue(!picture.contains("NaN"), crop.id());
        }
    }

    @Test
    void numbersHaveFourDigits() {
        assertEquals("0", LifeTables.number(-1e-6));
        assertEquals("12.35", LifeTables.number(12.3456));
        assertEquals("0.123", LifeTables.number(0.12345));
        assertEquals("1235", LifeTables.number(1234.6));
    }

    @Test
    void tooFewWordsAreRefused() {
        BadInput refused = assertThrows(BadInput.class, () -> FitLives.main(new String[] {"a"}));
        assertEquals(
                "command line: 1 words; the folder of tables, the folder to write to, and a folder"
                        + " for pictures",
                refused.getMessage());
    }
}
