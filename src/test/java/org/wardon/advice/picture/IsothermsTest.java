package org.wardon.advice.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lines of equal temperature lie where the temperature is equal, and join up. */
class IsothermsTest {
    private static List<List<Double>> field(int rows, int columns, Value value) {
        List<List<Double>> all = new ArrayList<>();
        for (int row = 0; row < rows; row++) {
            List<Double> one = new ArrayList<>();
            for (int column = 0; column < columns; column++) {
                one.add(value.at(column + 0.5, row + 0.5));
            }
            all.add(one);
        }
        return all;
    }

    private interface Value {
        double at(double x, double y);
    }

    @Test
    void onASlopeTheLineIsExact() {
        Isotherms slope = new Isotherms(field(7, 9, (x, y) -> 2 * x - 3 * y));
        List<double[]> pieces = slope.line(1.3, c -> c).pieces();
        assertTrue(pieces.size() > 5);
        for (double[] piece : pieces) {
            assertEquals(1.3, 2 * piece[0] - 3 * piece[1], 1e-9);
            assertEquals(1.3, 2 * piece[2] - 3 * piece[3], 1e-9);
        }
    }

    @Test
    void aroundAHillTheLineClosesAtItsRadius() {
        Isotherms hill = new Isotherms(field(41, 41, (x, y) -> -Math.hypot(x - 20.5, y - 20.5)));
        List<double[]> pieces = hill.line(-12, c -> c).pieces();
        double length = 0;
        for (double[] piece : pieces) {
            assertEquals(12, Math.hypot(piece[0] - 20.5, piece[1] - 20.5), 0.05);
            length += Math.hypot(piece[2] - piece[0], piece[3] - piece[1]);
            long joined =
                    pieces.stream()
                            .filter(
                                    other ->
                                            touches(other, piece[0], piece[1])
                                                    || touches(other, piece[2], piece[3]))
                            .count();
            assertEquals(3, joined, "itself and a neighbour on either side");
        }
        assertEquals(2 * Math.PI * 12, length, 0.01 * length);
    }

    private static boolean touches(double[] piece, double x, double y) {
        return Math.hypot(piece[0] - x, piece[1] - y) < 1e-9
                || Math.hypot(piece[2] - x, piece[3] - y) < 1e-9;
    }

    @Test
    void atASaddleLinesNeverCross() {
        Isotherms saddle = new Isotherms(field(2, 2, (x, y) -> (x - 1) * (y - 1)));
        for (double level : new double[] {-0.1, 0.1}) {
            List<double[]> pieces = saddle.line(level, c -> c).pieces();
            assertEquals(2, pieces.size());
            // The middle of the saddle is 0: both pieces stay on their own side of it.
            for (double[] piece : pieces) {
                double x = 0.5 * (piece[0] + piece[2]) - 1;
                double y = 0.5 * (piece[1] + piece[3]) - 1;
                assertEquals(Math.signum(level), Math.signum(x * y), level + " at " + x);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({
        "3.2, 9.9, 1, 4, 9",
        "20, 20.5, 0.1, 20.1, 20.4",
        "-4.5, 31, 5, 0, 30",
        "5, 6, 0.2, 5.2, 5.8"
    })
    void levelsAreRoundAndFew(double least, double most, double step, double first, double last) {
        List<Double> levels = Isotherms.levels(least, most);
        assertEquals(first, levels.get(0), 1e-9);
        assertEquals(last, levels.get(levels.size() - 1), 1e-9);
        assertEquals(step, levels.get(1) - levels.get(0), 1e-9);
    }
}
