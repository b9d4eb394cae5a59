package org.wardon.advice.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Lines of equal temperature through a field of even cells: between four neighbouring middles the
 * line is straight (marching squares, W. E. Lorensen and H. E. Cline 1987 in the plane, from
 * memory; where two lines may part a square either way, by the mean of its corners).
 */
final class Isotherms {
    private static final double[] STEPS = {0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50};
    private static final int MOST_LINES = 9;

    private final List<List<Double>> rows;

    /** Values in rows from above, each from the left. */
    Isotherms(List<List<Double>> rows) {
        this.rows = rows;
    }

    /** A line's level and its path; places count cells from the upper left corner. */
    record Line(double level, List<double[]> pieces) {
        Line {
            pieces = List.copyOf(pieces);
        }
    }

    /** Round levels between two values, as many as stay legible. */
    static List<Double> levels(double least, double most) {
        double step = STEPS[STEPS.length - 1];
        for (int i = STEPS.length - 1; i >= 0; i--) {
            if ((most - least) / STEPS[i] <= MOST_LINES) {
                step = STEPS[i];
            }
        }
        List<Double> levels = new ArrayList<>();
        for (double k = Math.ceil(least / step + 1e-9); k * step < most; k++) {
            levels.add(Math.round(k * step * 100) / 100.0);
        }
        return levels;
    }

    /** The line of a level, values taken through a scale first. */
    Line line(double level, DoubleUnaryOperator scale) {
        List<double[]> pieces = new ArrayList<>();
        for (int row = 0; row + 1 < rows.size(); row++) {
            for (int column = 0; column + 1 < rows.get(row).size(); column++) {
                square(row, column, level, scale, pieces);
            }
        }
        return new Line(level, pieces);
    }

    private void square(
            int row, int column, double level, DoubleUnaryOperator scale, List<double[]> pieces) {
        double[] over = {
            scale.applyAsDouble(rows.get(row).get(column)) - level,
            scale.applyAsDouble(rows.get(row).get(column + 1)) - level,
            scale.applyAsDouble(rows.get(row + 1).get(column + 1)) - level,
            scale.applyAsDouble(rows.get(row + 1).get(column)) - level
        };
        List<double[]> crossings = new ArrayList<>();
        for (int side = 0; side < 4; side++) {
            double here = over[side];
            double next = over[(side + 1) % 4];
            if (here > 0 != next > 0) {
                crossings.add(place(row, column, side, here / (here - next)));
            }
        }
        if (crossings.size() == 2) {
            pieces.add(piece(crossings.get(0), crossings.get(1)));
        } else if (crossings.size() == 4) {
            boolean middleOver = over[0] + over[1] + over[2] + over[3] > 0;
            // The first corner is cut off where the middle lies on the other side of the line.
            boolean cutsFirst = over[0] > 0 != middleOver;
            int with = cutsFirst ? 3 : 1;
            pieces.add(piece(crossings.get(0), crossings.get(with)));
            pieces.add(piece(crossings.get(2), crossings.get(cutsFirst ? 1 : 3)));
        }
    }

    private static double[] piece(double[] from, double[] to) {
        return new double[] {from[0], from[1], to[0], to[1]};
    }

    /** A share along a side: above, right, below, left; from one corner to the next, clockwise. */
    private static double[] place(int row, int column, int side, double share) {
        double x = column + 0.5;
        double y = row + 0.5;
        return switch (side) {
            case 0 -> new double[] {x + share, y};
            case 1 -> new double[] {x + 1, y + share};
            case 2 -> new double[] {x + 1 - share, y + 1};
            default -> new double[] {x, y + 1 - share};
        };
    }
}
