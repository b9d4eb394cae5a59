package org.wardon.enclosure.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;

/** Conduction in a rectangle against print, series, one direction alone, and its own laws. */
class SectionTest {
    private static double[] even(int cells, double lengthM) {
        double[] sizes = new double[cells];
        Arrays.fill(sizes, lengthM / cells);
        return sizes;
    }

    private static Section plain(int n, int m, double widthM, double heightM, double conducts) {
        Section section = new Section(even(n, widthM), even(m, heightM));
        section.fill(section.columns(), section.rows(), conducts, 0);
        return section;
    }

    private static void edges(Section section, double[] beyondC, double[] films) {
        for (Side side : Side.values()) {
            Section.Span along = side.upright() ? section.rows() : section.columns();
            int k = side.ordinal();
            section.edge(side, along, beyondC[k], films[k]);
        }
    }

    /** Temperature between four middles of cells. */
    private static double corner(SectionField field, int column, int row) {
        return 0.25
                * (field.temperatureC(column - 1, row - 1)
                        + field.temperatureC(column, row - 1)
                        + field.temperatureC(column - 1, row)
                        + field.temperatureC(column, row));
    }

    @Source(
            "ISO 10211:2017, annex C, case 1: half a square column, its top at 20 °C, its sides and"
                    + " foot at 0 °C; 27 of its 28 temperatures (from memory)")
    @Test
    void matchesTheSquareColumnOfIso10211() {
        double[][] printed = {
            {9.7, 13.4, 14.7, 15.1},
            {5.3, 8.6, 10.3, 10.8},
            {3.2, 5.6, 7.0, 7.5},
            {2.0, 3.6, 4.7, 5.0},
            {1.3, 2.3, 3.0, 3.2},
            {0.7, 1.4, 1.8, 1.9},
            {0.3, 0.6, 0.8}
        };
        int n = 40;
        Section half = plain(n, 2 * n, 1, 2, 1);
        edges(half, new double[] {0, 0, 0, 20}, new double[] {0, Section.TIGHT, 0, 0});
        SectionField field = half.solve();
        for (int row = 0; row < 7; row++) {
            for (int column = 0; column < printed[row].length; column++) {
                int across = (column + 1) * n / 4;
                int up = 2 * n - (row + 1) * n / 4;
                // On the line of symmetry the cell on its far side is the one before it.
                double found =
                        across < n
                                ? corner(field, across, up)
                                : 0.5
                                        * (field.temperatureC(n - 1, up - 1)
                                                + field.temperatureC(n - 1, up));
                assertEquals(printed[row][column], found, 0.05 + 0.01, row + ", " + column);
            }
        }
    }

    @Source(
            "Incropera and others, Fundamentals of Heat and Mass Transfer, problem 4.2: plate of 2 m"
                    + " by 1 m, three edges at 50 °C, the upper at 150 °C: 94.5 °C in the middle (from"
                    + " memory)")
    @Test
    void matchesThePlateOfIncropera() {
        Section plate = plain(80, 40, 2, 1, 15);
        edges(plate, new double[] {50, 50, 50, 150}, new double[4]);
        assertEquals(94.5, corner(plate.solve(), 40, 20), 0.05);
    }

    @Source(
            "Carslaw and Jaeger 1959, Conduction of Heat in Solids, 2nd ed., section 5.3: rectangle"
                    + " with one edge at another temperature (from memory)")
    @ParameterizedTest
    @CsvSource({"1, 1", "2.4, 0.8", "0.6, 1.5"})
    void matchesTheSeriesOfARectangle(double widthM, double heightM) {
        Section section = plain(60, 48, widthM, heightM, 0.7);
        edges(section, new double[] {4, 4, 4, 14}, new double[4]);
        SectionField field = section.solve();
        for (int column = 10; column < 60; column += 10) {
            for (int row = 8; row < 48; row += 8) {
                double x = column * widthM / 60;
                double y = row * heightM / 48;
                double exact = 4 + 10 * SectionSeries.fixed(x, y, widthM, heightM);
                assertEquals(exact, corner(field, column, row), 0.03, x + ", " + y);
            }
        }
    }

    @Source(
            "Eigenfunctions of films on both sides, Carslaw and Jaeger 1959, section 3.9 (from"
                    + " memory), carried up the rectangle by hyperbolic functions as in section 5.3")
    @ParameterizedTest
    @CsvSource({"3, 3, 3, 3", "1.2, 6, 0.4, 8", "0.3, 0.3, 20, 1"})
    void matchesTheSeriesWithFilms(double left, double right, double floor, double roof) {
        SectionSeries series =
                new SectionSeries(1.6, 0.9, 1.4, new double[] {left, right, floor, roof});
        double coarse = filmError(series, 32, 18);
        double fine = filmError(series, 64, 36);
        assertTrue(fine < 2e-4, fine + " of the difference");
        double order = Math.log(coarse / fine) / Math.log(2);
        assertEquals(2, order, 0.15, coarse + ", " + fine);
    }

    /** Largest error at nine places of a field whose warm side is the roof, 0 to 1. */
    private static double filmError(SectionSeries series, int n, int m) {
        Section section = plain(n, m, series.widthM(), series.heightM(), series.conductivityWmK());
        double[] films = Arrays.stream(series.filmsWm2K()).map(h -> 1 / h).toArray();
        edges(section, new double[] {0, 0, 0, 1}, films);
        SectionField field = section.solve();
        double worst = 0;
        for (int i = 1; i < 4; i++) {
            for (int j = 1; j < 3; j++) {
                int column = i * n / 4;
                int row = j * m / 3;
                double exact = series.at(column * series.widthM() / n, row * series.heightM() / m);
                worst = Math.max(worst, Math.abs(exact - corner(field, column, row)));
            }
        }
        return worst;
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.13})
    void oneDirectionAloneIsAWallWithHeat(double film) {
        double q = 40;
        double k = 0.4;
        double thickM = 0.6;
        Section section = new Section(even(120, thickM), even(3, 1));
        section.fill(section.columns(), section.rows(), k, q);
        edges(
                section,
                new double[] {5, 9, 0, 0},
                new double[] {film, film, Section.TIGHT, Section.TIGHT});
        SectionField field = section.solve();
        // Wall with even heat and alike films: a parabola on a straight line (first principles).
        double flow = (9 - 5) / (2 * film + thickM / k);
        for (int column = 0; column < 120; column += 7) {
            double x = (column + 0.5) * thickM / 120;
            double straight = 5 + flow * (film + x / k);
            double bow = q / (2 * k) * x * (thickM - x) + q * thickM / 2 * film;
            assertEquals(straight + bow, field.temperatureC(column, 1), 2e-3 + 1e-9);
        }
        assertEquals(flow - q * thickM / 2, -field.inW(Side.LEFT) - q * thickM, 1e-9);
    }

    @Source(
            "Incropera and others, Fundamentals of Heat and Mass Transfer, table 3.4, fin with a tip"
                    + " that lets no heat through: cosh m(L - x)/cosh mL (from memory)")
    @Test
    void exchangeAlongTheWayIsAFin() {
        double k = 1.2;
        double wattsM3K = 30;
        double lengthM = 0.5;
        Section section = new Section(even(200, lengthM), even(1, 0.1));
        section.fill(section.columns(), section.rows(), k, 0);
        section.exchange(section.columns(), section.rows(), wattsM3K, 8);
        edges(
                section,
                new double[] {28, 0, 0, 0},
                new double[] {0, Section.TIGHT, Section.TIGHT, Section.TIGHT});
        SectionField field = section.solve();
        double m = Math.sqrt(wattsM3K / k);
        for (int column = 0; column < 200; column += 9) {
            double x = (column + 0.5) * lengthM / 200;
            double exact = 8 + 20 * Math.cosh(m * (lengthM - x)) / Math.cosh(m * lengthM);
            assertEquals(exact, field.temperatureC(column, 0), 1e-3);
        }
        assertEquals(0, field.inW(Side.LEFT) + field.exchangedW(), 1e-9);
    }

    @Test
    void layersAcrossAreResistancesInSeries() {
        Section section = new Section(new double[] {0.05, 0.05, 0.1, 0.3}, new double[] {0.5, 0.5});
        double[] k = {0.1, 0.1, 1, 0.5};
        for (int i = 0; i < 4; i++) {
            section.fill(new Section.Span(i, i + 1), section.rows(), k[i], 0);
        }
        edges(
                section,
                new double[] {0, 20, 7, 7},
                new double[] {0.1, 0.2, Section.TIGHT, Section.TIGHT});
        double resistance = 0.1 + 0.1 / 0.1 + 0.1 / 1 + 0.3 / 0.5 + 0.2;
        assertEquals(20 / resistance, section.solve().inW(Side.RIGHT), 1e-9);
    }

    private static Section random(SplittableRandom draw, int n, int m, double heat) {
        double[] widths = draw.doubles(n, 0.01, 0.2).toArray();
        double[] heights = draw.doubles(m, 0.01, 0.2).toArray();
        Section section = new Section(widths, heights);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < m; j++) {
                section.fill(
                        new Section.Span(i, i + 1),
                        new Section.Span(j, j + 1),
                        Math.exp(draw.nextDouble(-3, 3)),
                        heat * draw.nextDouble());
            }
        }
        section.exchange(new Section.Span(0, n / 2 + 1), section.rows(), draw.nextDouble(0, 40), 5);
        double[] beyond = draw.doubles(4, -5, 35).toArray();
        double[] films = draw.doubles(4, 0, 0.5).toArray();
        edges(section, beyond, films);
        return section;
    }

    @Test
    void whatComesInAndIsGivenGoesOut() {
        SplittableRandom draw = new SplittableRandom(11);
        for (int trial = 0; trial < 40; trial++) {
            SectionField field = random(draw, 3 + trial % 9, 2 + trial % 7, 300).solve();
            double through = field.givenW() + Math.abs(field.exchangedW());
            double sum = field.givenW() + field.exchangedW();
            for (Side side : Side.values()) {
                through += Math.abs(field.inW(side));
                sum += field.inW(side);
            }
            assertEquals(0, sum, 1e-9 * through, "seed 11, trial " + trial);
        }
    }

    @Test
    void withoutHeatNothingIsWarmerOrColderThanWhatLiesBeyond() {
        SplittableRandom draw = new SplittableRandom(12);
        for (int trial = 0; trial < 40; trial++) {
            Section section = random(draw, 4 + trial % 9, 3 + trial % 7, 0);
            double least = 5;
            double most = 5;
            for (Side side : Side.values()) {
                least = Math.min(least, section.beyondC(side, 0));
                most = Math.max(most, section.beyondC(side, 0));
            }
            SectionField field = section.solve();
            assertTrue(field.coldest().temperatureC() > least, "seed 12, trial " + trial);
            assertTrue(field.warmest().temperatureC() < most, "seed 12, trial " + trial);
        }
    }

    @Test
    void whatIsAlikeOnBothSidesIsAlikeInside() {
        Section section = plain(14, 10, 1, 1, 0.3);
        section.fill(section.columns(), section.rows(), 0.3, 25);
        edges(section, new double[] {6, 6, 8, 15}, new double[] {0.1, 0.1, 0.05, 0.2});
        SectionField field = section.solve();
        for (int column = 0; column < 7; column++) {
            for (int row = 0; row < 10; row++) {
                assertEquals(
                        field.temperatureC(column, row),
                        field.temperatureC(13 - column, row),
                        1e-10);
            }
        }
    }

    @Test
    void theFourSeriesOfOneWarmEdgeAddUpToOne() {
        double sum = 0;
        for (int warm = 0; warm < 4; warm++) {
            Section section = plain(20, 16, 1.3, 0.7, 2);
            double[] beyond = new double[4];
            beyond[warm] = 1;
            edges(section, beyond, new double[] {0.3, 0, 0.1, 0.2});
            sum += section.solve().temperatureC(6, 9);
        }
        assertEquals(1, sum, 1e-10);
    }

    @Test
    void agreesWithADenseSolver() {
        SplittableRandom draw = new SplittableRandom(13);
        int size = 60;
        int band = 7;
        BandedCholesky own = new BandedCholesky(size, band);
        Array2DRowRealMatrix dense = new Array2DRowRealMatrix(size, size);
        double[] right = draw.doubles(size, -10, 10).toArray();
        for (int row = 0; row < size; row++) {
            for (int column = Math.max(0, row - band); column < row; column++) {
                double value = draw.nextDouble(-1, 0);
                own.add(row, column, value);
                dense.setEntry(row, column, value);
                dense.setEntry(column, row, value);
            }
            own.add(row, row, 2 * band + 0.5);
            dense.setEntry(row, row, 2 * band + 0.5);
        }
        double[] expected =
                new LUDecomposition(dense).getSolver().solve(new ArrayRealVector(right)).toArray();
        own.solve(right);
        for (int i = 0; i < size; i++) {
            assertEquals(expected[i], right[i], 1e-10);
        }
    }

    @Test
    void refusesWhatCannotBeSolved() {
        Section tight = plain(3, 3, 1, 1, 1);
        assertEquals(
                "no edge lets heat through; give at least one a film or a temperature",
                assertThrows(IllegalArgumentException.class, tight::solve).getMessage());
        Section hollow = new Section(even(2, 1), even(2, 1));
        assertEquals(
                "every cell must be filled before solving",
                assertThrows(IllegalArgumentException.class, hollow::solve).getMessage());
        assertEquals(
                "a film of -0.1 m2 K/W; 0 or more",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> hollow.edge(Side.LEFT, hollow.rows(), 4, -0.1))
                        .getMessage());
        Section done = plain(2, 2, 1, 1, 1);
        edges(done, new double[] {1, 1, 1, 1}, new double[4]);
        done.solve();
        assertEquals(
                "the section is solved; make another",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> done.fill(done.columns(), done.rows(), 1, 0))
                        .getMessage());
    }
}
