package org.wardon.enclosure.section;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import org.wardon.errors.Require;

/**
 * A rectangle that conducts heat in two directions, at rest: cells of their own conductivity and
 * heat, and along its four edges a film to a temperature beyond. To be filled, then solved once.
 *
 * <p>Source: Fourier's law and the balance of each cell; between two cells the halves of their
 * resistances in series (S. V. Patankar, Numerical Heat Transfer and Fluid Flow, 1980, section
 * 4.2-3, from memory). Error falls with the square of the cells' size.
 */
public final class Section {
    /** Resistance of an edge that lets no heat through, m2 K/W. */
    public static final double TIGHT = Double.POSITIVE_INFINITY;

    private static final int MOST_CELLS = 20_000;
    private static final String SOLVED = "the section is solved; make another";

    private final double[] widthsM;
    private final double[] heightsM;
    private final double[] conductivityWmK;
    private final double[] heatWm3;
    private final double[] exchangeWm3K;
    private final double[] exchangeW;
    private final Map<Side, Edge> edges = new EnumMap<>(Side.class);
    private boolean solved;

    /** What lies beyond the cells along an edge; tight until it is set. */
    private static final class Edge {
        private final double[] beyondC;
        private final double[] filmM2KW;

        Edge(int cells) {
            beyondC = new double[cells];
            filmM2KW = new double[cells];
            Arrays.fill(filmM2KW, TIGHT);
        }
    }

    private Edge edge(Side side) {
        return Objects.requireNonNull(edges.get(side));
    }

    /**
     * Makes a section whose cells conduct nothing yet.
     *
     * @param widthsM {@code [column]}, widths of the columns from the left, m, each above 0
     * @param heightsM {@code [row]}, heights of the rows from the floor, m, each above 0
     */
    public Section(double[] widthsM, double[] heightsM) {
        this.widthsM = widthsM.clone();
        this.heightsM = heightsM.clone();
        Require.that(
                widthsM.length > 0
                        && heightsM.length > 0
                        && widthsM.length * heightsM.length <= MOST_CELLS,
                "a section has 1 to "
                        + MOST_CELLS
                        + " cells, not "
                        + widthsM.length
                        + " x "
                        + heightsM.length);
        for (double width : widthsM) {
            Require.within("width of a column", width, 1e-6, 1e3, "m", "");
        }
        for (double height : heightsM) {
            Require.within("height of a row", height, 1e-6, 1e3, "m", "");
        }
        conductivityWmK = new double[widthsM.length * heightsM.length];
        heatWm3 = new double[conductivityWmK.length];
        exchangeWm3K = new double[conductivityWmK.length];
        exchangeW = new double[conductivityWmK.length];
        for (Side side : Side.values()) {
            int cells = side.upright() ? heightsM.length : widthsM.length;
            edges.put(side, new Edge(cells));
        }
    }

    /**
     * A span of columns or rows.
     *
     * @param from first
     * @param to behind the last
     */
    public record Span(int from, int to) {
        /** Refuses a span that holds nothing. */
        public Span {
            Require.that(from >= 0 && to > from, "a span of cells, not " + from + " to " + to);
        }
    }

    /**
     * Returns all columns.
     *
     * @return their span
     */
    public Span columns() {
        return new Span(0, widthsM.length);
    }

    /**
     * Returns all rows.
     *
     * @return their span
     */
    public Span rows() {
        return new Span(0, heightsM.length);
    }

    /**
     * Fills cells with something.
     *
     * @param columns its columns
     * @param rows its rows
     * @param conducts its conductivity, W/(m K), above 0
     * @param gives heat it gives off evenly, W/m3; below 0 where it takes it
     */
    public void fill(Span columns, Span rows, double conducts, double gives) {
        Require.that(!solved, SOLVED);
        Require.within("conductivity", conducts, 1e-6, 1e6, "W/(m K)", "");
        Require.within("heat", gives, -1e6, 1e6, "W/m3", "");
        for (int column = columns.from(); column < columns.to(); column++) {
            for (int row = rows.from(); row < rows.to(); row++) {
                conductivityWmK[cell(column, row)] = conducts;
                heatWm3[cell(column, row)] = gives;
            }
        }
    }

    /**
     * Lets cells exchange heat with something that is not beside them: a wall they see, say.
     *
     * @param columns their columns
     * @param rows their rows
     * @param wattsM3K what a cubic metre of them exchanges, W/(m3 K), 0 or more
     * @param temperatureC temperature of the other, °C
     */
    public void exchange(Span columns, Span rows, double wattsM3K, double temperatureC) {
        Require.that(!solved, SOLVED);
        Require.within("exchange", wattsM3K, 0, 1e6, "W/(m3 K)", "");
        Require.within("temperature of the other", temperatureC, -273, 2_000, "°C", "");
        for (int column = columns.from(); column < columns.to(); column++) {
            for (int row = rows.from(); row < rows.to(); row++) {
                exchangeWm3K[cell(column, row)] += wattsM3K;
                exchangeW[cell(column, row)] += wattsM3K * temperatureC;
            }
        }
    }

    /**
     * Sets what lies beyond a part of an edge.
     *
     * @param side the edge
     * @param along its cells, from the floor up or from the left
     * @param temperatureC temperature beyond the film, °C
     * @param resistanceM2KW the film, m2 K/W; 0 for an edge at that temperature, {@link #TIGHT} for
     *     none
     */
    public void edge(Side side, Span along, double temperatureC, double resistanceM2KW) {
        Require.that(!solved, SOLVED);
        Require.within("temperature of the edge", temperatureC, -273, 2_000, "°C", "");
        Require.that(resistanceM2KW >= 0, "a film of " + resistanceM2KW + " m2 K/W; 0 or more");
        Edge edge = edge(side);
        Arrays.fill(edge.beyondC, along.from(), along.to(), temperatureC);
        Arrays.fill(edge.filmM2KW, along.from(), along.to(), resistanceM2KW);
    }

    /**
     * Solves the balance of all cells.
     *
     * @return the temperatures
     * @throws IllegalArgumentException where a cell was not filled or no edge lets heat through
     */
    public SectionField solve() {
        for (double conducts : conductivityWmK) {
            Require.that(conducts > 0, "every cell must be filled before solving");
        }
        int rows = heightsM.length;
        BandedCholesky equations = new BandedCholesky(conductivityWmK.length, rows);
        double[] answer = new double[conductivityWmK.length];
        for (int column = 0; column < widthsM.length; column++) {
            for (int row = 0; row < rows; row++) {
                int here = cell(column, row);
                double areaM2 = widthsM[column] * heightsM[row];
                answer[here] += (heatWm3[here] + exchangeW[here]) * areaM2;
                equations.add(here, here, exchangeWm3K[here] * areaM2);
                if (column > 0) {
                    join(equations, here, cell(column - 1, row), acrossWmK(column, row));
                }
                if (row > 0) {
                    join(equations, here, cell(column, row - 1), upWmK(column, row));
                }
            }
        }
        for (Side side : Side.values()) {
            for (int k = 0; k < edgeCells(side); k++) {
                int here = edgeCell(side, k);
                double conducts = edgeWmK(side, k);
                equations.add(here, here, conducts);
                answer[here] += conducts * beyondC(side, k);
            }
        }
        equations.solve(answer);
        solved = true;
        return new SectionField(this, answer);
    }

    private static void join(BandedCholesky equations, int here, int before, double conducts) {
        equations.add(here, here, conducts);
        equations.add(before, before, conducts);
        equations.add(here, before, -conducts);
    }

    int cell(int column, int row) {
        return column * heightsM.length + row;
    }

    int edgeCell(Side side, int along) {
        return switch (side) {
            case LEFT -> cell(0, along);
            case RIGHT -> cell(widthsM.length - 1, along);
            case FLOOR -> cell(along, 0);
            case ROOF -> cell(along, heightsM.length - 1);
        };
    }

    /** From the column before, W/K for a metre of depth. */
    private double acrossWmK(int column, int row) {
        double before = 0.5 * widthsM[column - 1] / conductivityWmK[cell(column - 1, row)];
        double here = 0.5 * widthsM[column] / conductivityWmK[cell(column, row)];
        return heightsM[row] / (before + here);
    }

    private double upWmK(int column, int row) {
        double before = 0.5 * heightsM[row - 1] / conductivityWmK[cell(column, row - 1)];
        double here = 0.5 * heightsM[row] / conductivityWmK[cell(column, row)];
        return widthsM[column] / (before + here);
    }

    /** From beyond the film to the middle of the cell, W/K for a metre of depth. */
    double edgeWmK(Side side, int along) {
        double film = edge(side).filmM2KW[along];
        return film == TIGHT ? 0 : edgeLengthM(side, along) / (film + halfCellM2KW(side, along));
    }

    /** Share of the way from beyond to the middle of the cell that lies in the film. */
    double filmShare(Side side, int along) {
        double film = edge(side).filmM2KW[along];
        return film == TIGHT ? 1 : film / (film + halfCellM2KW(side, along));
    }

    private double halfCellM2KW(Side side, int along) {
        double deep =
                switch (side) {
                    case LEFT -> widthsM[0];
                    case RIGHT -> widthsM[widthsM.length - 1];
                    case FLOOR -> heightsM[0];
                    case ROOF -> heightsM[heightsM.length - 1];
                };
        return 0.5 * deep / conductivityWmK[edgeCell(side, along)];
    }

    private double edgeLengthM(Side side, int along) {
        return side.upright() ? heightsM[along] : widthsM[along];
    }

    int edgeCells(Side side) {
        return edge(side).beyondC.length;
    }

    double beyondC(Side side, int along) {
        return edge(side).beyondC[along];
    }

    double widthM(int column) {
        return widthsM[column];
    }

    double heightM(int row) {
        return heightsM[row];
    }

    double heatWm3(int column, int row) {
        return heatWm3[cell(column, row)];
    }

    /** What a cell takes from what it exchanges with, W/m3. */
    double exchangedWm3(int column, int row, double temperatureC) {
        int cell = cell(column, row);
        return exchangeW[cell] - exchangeWm3K[cell] * temperatureC;
    }
}
