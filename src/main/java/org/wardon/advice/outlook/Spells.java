package org.wardon.advice.outlook;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.wardon.air.Timeline;
import org.wardon.lots.LotHistory;
import org.wardon.produce.rows.OwnLot;

/**
 * A history as time spent at temperatures: what ageing needs of it, in a few figures. Times fall
 * into steps of half a kelvin and each step keeps its mean, so a steady history loses nothing and
 * another one less than a thousandth of its ageing.
 */
final class Spells {
    private static final double STEP_K = 0.5;

    private Spells() {}

    /** Time and the temperature summed over it. */
    private record Sum(double hours, double degreeHours) {
        Sum and(Sum other) {
            return new Sum(hours + other.hours, degreeHours + other.degreeHours);
        }
    }

    static List<OwnLot.Spell> of(LotHistory history) {
        Map<Long, Sum> steps = new TreeMap<>();
        for (int i = 1; i < history.size(); i++) {
            double hours = (history.timeS(i) - history.timeS(i - 1)) / Timeline.HOUR_S;
            double from = history.meanC(i - 1);
            double to = history.meanC(i);
            int parts = (int) Math.max(1, Math.ceil(Math.abs(to - from) / STEP_K));
            for (int part = 0; part < parts; part++) {
                double c = from + (to - from) * (part + 0.5) / parts;
                double h = hours / parts;
                steps.merge((long) Math.floor(c / STEP_K), new Sum(h, h * c), Sum::and);
            }
        }
        return steps.values().stream()
                .filter(sum -> sum.hours() > 0)
                .map(sum -> new OwnLot.Spell(sum.degreeHours() / sum.hours(), sum.hours()))
                .toList();
    }
}
