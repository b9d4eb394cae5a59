package org.wardon.heat;

import org.wardon.air.Timeline;
import org.wardon.enclosure.Gains;
import org.wardon.heat.network.ChamberNetwork;

/**
 * Door, people and lights of a run whose single hours nobody reads: spread evenly over each row by
 * the share of it that lies in the hours of use, so that no step need land inside a row.
 */
final class UseByRow {
    private final double midnightS;
    private final double fromS;
    private final double toS;
    private final double litFromS;
    private final double litToS;
    private final double people;
    private double used = Double.NaN;
    private double lit = Double.NaN;

    UseByRow(ChamberRun run) {
        midnightS = -run.timeline().secondOfDay(0);
        Schedule.Hours use = Schedule.use(run);
        fromS = use.fromS();
        toS = use.toS();
        Schedule.Hours lights = Schedule.lights(run);
        litFromS = lights.fromS();
        litToS = lights.toS();
        Gains gains = run.enclosure().gains();
        people = gains.peopleHoursPerDay() * Timeline.HOUR_S / (toS - fromS);
    }

    /** Enters a row; returns whether anything changes with it. */
    boolean enter(double rowFromS, double rowToS, ChamberNetwork network) {
        double nowUsed = share(rowFromS, rowToS, fromS, toS);
        double nowLit = share(rowFromS, rowToS, litFromS, litToS);
        if (nowUsed == used && nowLit == lit) {
            return false;
        }
        used = nowUsed;
        lit = nowLit;
        network.door(used);
        network.people(people * used);
        network.light(lit);
        return true;
    }

    /** Share of a row that lies within hours of every day, these told from midnight. */
    private double share(double rowFromS, double rowToS, double from, double to) {
        double within = 0;
        double first = Math.floor((rowFromS - midnightS) / Timeline.DAY_S) - 1;
        double last = Math.floor((rowToS - midnightS) / Timeline.DAY_S) + 1;
        for (double day = first; day <= last; day++) {
            double start = Math.max(rowFromS, midnightS + day * Timeline.DAY_S + from);
            double end = Math.min(rowToS, midnightS + day * Timeline.DAY_S + to);
            within += Math.max(end - start, 0);
        }
        return within / (rowToS - rowFromS);
    }
}
