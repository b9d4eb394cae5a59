package org.wardon.enclosure.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.Predicate;
import org.wardon.enclosure.section.Section.Span;

/** Temperatures of a section at rest, and the heat that goes through it. */
public final class SectionField {
    private final Section section;
    private final double[] temperatureC;

    SectionField(Section section, double[] temperatureC) {
        this.section = section;
        this.temperatureC = temperatureC.clone();
    }

    /**
     * Returns the temperature of a cell.
     *
     * @param column from the left
     * @param row from the floor
     * @return °C in its middle
     */
    public double temperatureC(int column, int row) {
        return temperatureC[section.cell(column, row)];
    }

    /**
     * Returns the temperature at a place, straight between the middles of cells; nearer to an edge
     * than the last of them that of the last.
     *
     * @param xM from the left, m
     * @param yM above the floor, m
     * @return °C
     */
    public double atC(double xM, double yM) {
        int columns = section.columns().to();
        int rows = section.rows().to();
        double[] across = new double[columns];
        Arrays.setAll(across, this::xM);
        double[] up = new double[rows];
        Arrays.setAll(up, this::yM);
        double i = place(across, xM);
        double j = place(up, yM);
        int left = Math.min((int) i, columns - 1);
        int low = Math.min((int) j, rows - 1);
        int right = Math.min(left + 1, columns - 1);
        int high = Math.min(low + 1, rows - 1);
        double below = mix(temperatureC(left, low), temperatureC(right, low), i - left);
        double above = mix(temperatureC(left, high), temperatureC(right, high), i - left);
        return mix(below, above, j - low);
    }

    private static double mix(double one, double other, double share) {
        return one + share * (other - one);
    }

    /** Where a value lies among rising ones, as a number of places; held at their ends. */
    private static double place(double[] rising, double value) {
        int i = 0;
        while (i < rising.length - 1 && rising[i + 1] < value) {
            i++;
        }
        if (i == rising.length - 1) {
            return i;
        }
        double share = (value - rising[i]) / (rising[i + 1] - rising[i]);
        return i + Math.min(1, Math.max(0, share));
    }

    /**
     * Returns the temperature just inside the film of an edge.
     *
     * @param side the edge
     * @param along cell along it, from the floor up or from the left
     * @return °C
     */
    public double edgeC(Side side, int along) {
        double cell = temperatureC[section.edgeCell(side, along)];
        double share = section.filmShare(side, along);
        return share * cell + (1 - share) * section.beyondC(side, along);
    }

    /**
     * Returns the heat that comes in through an edge.
     *
     * @param side the edge
     * @return W for each metre of depth, below 0 where it goes out
     */
    public double inW(Side side) {
        double sum = 0;
        for (int k = 0; k < section.edgeCells(side); k++) {
            double difference = section.beyondC(side, k) - temperatureC[section.edgeCell(side, k)];
            sum += section.edgeWmK(side, k) * difference;
        }
        return sum;
    }

    /**
     * Returns the heat given off inside.
     *
     * @return W for each metre of depth
     */
    public double givenW() {
        double sum = 0;
        for (int column = 0; column < section.columns().to(); column++) {
            for (int row = 0; row < section.rows().to(); row++) {
                sum += section.heatWm3(column, row) * areaM2(column, row);
            }
        }
        return sum;
    }

    /**
     * Returns the heat that comes from what cells exchange with.
     *
     * @return W for each metre of depth, below 0 where it goes there
     */
    public double exchangedW() {
        double sum = 0;
        for (int column = 0; column < section.columns().to(); column++) {
            for (int row = 0; row < section.rows().to(); row++) {
                double here = temperatureC(column, row);
                sum += section.exchangedWm3(column, row, here) * areaM2(column, row);
            }
        }
        return sum;
    }

    /**
     * Returns the mean of cells by their area.
     *
     * @param columns their columns
     * @param rows their rows
     * @return °C
     */
    public double meanC(Span columns, Span rows) {
        double sum = 0;
        double area = 0;
        for (int column = columns.from(); column < columns.to(); column++) {
            for (int row = rows.from(); row < rows.to(); row++) {
                sum += areaM2(column, row) * temperatureC(column, row);
                area += areaM2(column, row);
            }
        }
        return sum / area;
    }

    /**
     * Returns the mean of the whole section.
     *
     * @return °C
     */
    public double meanC() {
        return meanC(section.columns(), section.rows());
    }

    private double areaM2(int column, int row) {
        return section.widthM(column) * section.heightM(row);
    }

    /**
     * Returns the warmest place, the inner side of the films included.
     *
     * @return the place
     */
    public Spot warmest() {
        return warmest(place -> true);
    }

    /**
     * Returns the coldest place, the inner side of the films included.
     *
     * @return the place
     */
    public Spot coldest() {
        return coldest(place -> true);
    }

    /**
     * Returns the warmest of some places, the inner side of the films included.
     *
     * @param some which
     * @return the place
     * @throws java.util.NoSuchElementException where there is none such
     */
    public Spot warmest(Predicate<Spot> some) {
        return spots(section.columns(), section.rows(), true).stream()
                .filter(some)
                .max(Comparator.comparingDouble(Spot::temperatureC))
                .orElseThrow();
    }

    /**
     * Returns the coldest of some places, the inner side of the films included.
     *
     * @param some which
     * @return the place
     * @throws java.util.NoSuchElementException where there is none such
     */
    public Spot coldest(Predicate<Spot> some) {
        return spots(section.columns(), section.rows(), true).stream()
                .filter(some)
                .min(Comparator.comparingDouble(Spot::temperatureC))
                .orElseThrow();
    }

    /**
     * Returns the warmest cell of some.
     *
     * @param columns their columns
     * @param rows their rows
     * @return its middle
     */
    public Spot warmest(Span columns, Span rows) {
        return spots(columns, rows, false).stream()
                .max(Comparator.comparingDouble(Spot::temperatureC))
                .orElseThrow();
    }

    /**
     * Returns the coldest cell of some.
     *
     * @param columns their columns
     * @param rows their rows
     * @return its middle
     */
    public Spot coldest(Span columns, Span rows) {
        return spots(columns, rows, false).stream()
                .min(Comparator.comparingDouble(Spot::temperatureC))
                .orElseThrow();
    }

    private List<Spot> spots(Span columns, Span rows, boolean edges) {
        List<Spot> spots = new ArrayList<>();
        for (int column = columns.from(); column < columns.to(); column++) {
            for (int row = rows.from(); row < rows.to(); row++) {
                spots.add(new Spot(xM(column), yM(row), temperatureC(column, row)));
            }
        }
        for (Side side : edges ? Side.values() : new Side[0]) {
            for (int k = 0; k < section.edgeCells(side); k++) {
                double x = side == Side.LEFT ? 0 : side == Side.RIGHT ? widthM() : xM(k);
                double y = side == Side.FLOOR ? 0 : side == Side.ROOF ? heightM() : yM(k);
                spots.add(new Spot(x, y, edgeC(side, k)));
            }
        }
        return spots;
    }

    private double xM(int column) {
        double x = 0.5 * section.widthM(column);
        for (int i = 0; i < column; i++) {
            x += section.widthM(i);
        }
        return x;
    }

    private double yM(int row) {
        double y = 0.5 * section.heightM(row);
        for (int i = 0; i < row; i++) {
            y += section.heightM(i);
        }
        return y;
    }

    /**
     * Returns the width of the section.
     *
     * @return m
     */
    public double widthM() {
        int last = section.columns().to() - 1;
        return xM(last) + 0.5 * section.widthM(last);
    }

    /**
     * Returns the height of the section.
     *
     * @return m
     */
    public double heightM() {
        int last = section.rows().to() - 1;
        return yM(last) + 0.5 * section.heightM(last);
    }
}
