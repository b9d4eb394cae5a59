package org.wardon.heat;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.lots.LotHistory;

/** What a lot went through in a run, its time as a shadow included. */
public final class LotCourse {
    private final Stay stay;
    private final LotHistory history;

    private final LotRows rows;
    private final LotTotals totals;
    private final Optional<LotState> carriedOut;

    LotCourse(
            Stay stay,
            LotHistory history,
            LotRows rows,
            LotTotals totals,
            Optional<LotState> carriedOut) {
        this.stay = stay;
        this.history = history;
        this.rows = rows;
        this.totals = totals;
        this.carriedOut = carriedOut;
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
        double last = history.timeS(history.size() - 1);
        int first = 0;
        while (first < next.history.size() && next.history.timeS(first) <= last) {
            first++;
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
                rows.then(next.rows, first, history.size()),
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
        return rows.size();
    }

    /**
     * Returns the time of a row.
     *
     * @param i row
     * @return s since the start of the run
     */
    public double atS(int i) {
        return history.timeS(rows.sample(i));
    }

    /**
     * Returns the mass average at the instant.
     *
     * @param i row
     * @return °C
     */
    public double meanC(int i) {
        return history.meanC(rows.sample(i));
    }

    /**
     * Returns the outermost shell at the instant.
     *
     * @param i row
     * @return °C
     */
    public double surfaceC(int i) {
        return history.surfaceC(rows.sample(i));
    }

    /**
     * Returns the innermost shell at the instant.
     *
     * @param i row
     * @return °C
     */
    public double coreC(int i) {
        return rows.coreC(i);
    }

    /**
     * Returns the heat of respiration at the instant.
     *
     * @param i row
     * @return W
     */
    public double respirationW(int i) {
        return rows.respirationW(i);
    }

    /**
     * Returns the mass at the instant.
     *
     * @param i row
     * @return kg
     */
    public double massKg(int i) {
        return history.massKg(rows.sample(i));
    }
}
