package org.wardon.heat;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.lots.LotHistory;

/** What a lot went through in a run, its time as a shadow included. */
public final class LotCourse {
    private final Stay stay;
    private final LotHistory history;

    /** {@code [row]}, perhaps with room behind the last row. */
    private final Map<Column, double[]> rows = new EnumMap<>(Column.class);

    private final int size;
    private final LotTotals totals;
    private final Optional<LotState> carriedOut;

    /** Columns of the hourly series. */
    enum Column {
        AT_S,
        MEAN_C,
        SURFACE_C,
        CORE_C,
        RESPIRATION_W,
        MASS_KG
    }

    LotCourse(
            Stay stay,
            LotHistory history,
            Map<Column, double[]> rows,
            int size,
            LotTotals totals,
            Optional<LotState> carriedOut) {
        this.stay = stay;
        this.history = history;
        this.totals = totals;
        this.size = size;
        this.carriedOut = carriedOut;
        this.rows.putAll(rows);
    }

    /**
     * Joins what one lot went through in one place after another to one course.
     *
     * @param legs in order of time, each carried on to the next; at least 1
     * @return the course of the whole; its stay is that of the first leg up to the last's leaving
     */
    public static LotCourse joined(List<LotCourse> legs) {
        Require.that(!legs.isEmpty(), "a lot that was nowhere has no course");
        LotCourse all = legs.get(0);
        for (LotCourse next : legs.subList(1, legs.size())) {
            all = all.then(next);
        }
        return all;
    }

    private LotCourse then(LotCourse next) {
        double last = size > 0 ? atS(size - 1) : Double.NEGATIVE_INFINITY;
        int skip = 0;
        while (skip < next.size && next.atS(skip) <= last) {
            skip++;
        }
        int more = next.size - skip;
        Map<Column, double[]> both = new EnumMap<>(Column.class);
        for (Column column : Column.values()) {
            double[] values = Arrays.copyOf(Objects.requireNonNull(rows.get(column)), size + more);
            double[] behind = Objects.requireNonNull(next.rows.get(column));
            System.arraycopy(behind, skip, values, size, more);
            both.put(column, values);
        }
        Stay whole =
                new Stay(
                        stay.lot(),
                        stay.arrivesS(),
                        next.stay.leavesS(),
                        stay.pulpC(),
                        stay.freshUntilS(),
                        stay.surfaceWaterKg());
        return new LotCourse(
                whole,
                history.then(next.history),
                both,
                size + more,
                totals.and(next.totals),
                next.carriedOut);
    }

    /**
     * Returns how the lot was when it was carried to another chamber.
     *
     * @return empty where it was not, or not within the run
     */
    public Optional<LotState> carriedOut() {
        return carriedOut;
    }

    /**
     * Returns the stay.
     *
     * @return lot, arrival, leaving
     */
    public Stay stay() {
        return stay;
    }

    /**
     * Returns what keeping reads.
     *
     * @return samples from arrival (or the start of the run) to the end of the run, hourly and
     *     closer after arrival
     */
    public LotHistory history() {
        return history;
    }

    /**
     * Returns what added up while it was in the chamber.
     *
     * @return heat, water, mass
     */
    public LotTotals totals() {
        return totals;
    }

    /**
     * Returns the number of rows of the hourly series.
     *
     * @return 0 where the lot arrives after the run
     */
    public int size() {
        return size;
    }

    private double get(Column column, int i) {
        return Objects.requireNonNull(rows.get(column))[i];
    }

    /**
     * Returns the time of a row.
     *
     * @param i row
     * @return s since the start of the run
     */
    public double atS(int i) {
        return get(Column.AT_S, i);
    }

    /**
     * Returns the mass average at the instant.
     *
     * @param i row
     * @return °C
     */
    public double meanC(int i) {
        return get(Column.MEAN_C, i);
    }

    /**
     * Returns the outermost shell at the instant.
     *
     * @param i row
     * @return °C
     */
    public double surfaceC(int i) {
        return get(Column.SURFACE_C, i);
    }

    /**
     * Returns the innermost shell at the instant.
     *
     * @param i row
     * @return °C
     */
    public double coreC(int i) {
        return get(Column.CORE_C, i);
    }

    /**
     * Returns the heat of respiration at the instant.
     *
     * @param i row
     * @return W
     */
    public double respirationW(int i) {
        return get(Column.RESPIRATION_W, i);
    }

    /**
     * Returns the mass at the instant.
     *
     * @param i row
     * @return kg
     */
    public double massKg(int i) {
        return get(Column.MASS_KG, i);
    }
}
