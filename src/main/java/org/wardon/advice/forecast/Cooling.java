package org.wardon.advice.forecast;

import java.util.OptionalDouble;
import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.cooling.SettingCourse;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/**
 * How a lot cools in its chamber, or on its way through several to the one it ends in.
 *
 * <p>The cooling fraction is (mean - mark) / (mean at arrival - mark). The mark is the setting; in
 * a chamber that cannot reach it, the chamber's own mean air of the last 24 hours. Where the
 * setting changes while a lot may still be cooling, the mark is the warmer one.
 *
 * @param startC mean temperature at the start, °C
 * @param markC temperature it is to come to, °C
 * @param halfHours hours to half cooling; empty where it does not apply or is not reached
 * @param sevenEighthsHours hours to seven-eighths cooling; empty likewise
 */
record Cooling(
        double startC, double markC, OptionalDouble halfHours, OptionalDouble sevenEighthsHours) {
    /** Below this difference cooling times say nothing, K. */
    private static final double LEAST_K = 2;

    static Cooling of(
            LotHistory history, LotSheet sheet, ChamberPlan chamber, StoreOutcome outcome) {
        double start = history.meanC(0);
        Course course = outcome.course(chamber.id());
        IntToDoubleFunction airC = sheet.airC(chamber.enclosure(), course.hours());
        double mark = markC(chamber, course, airC, force(history, sheet, chamber, outcome));
        if (start - mark < LEAST_K) {
            return new Cooling(start, mark, OptionalDouble.empty(), OptionalDouble.empty());
        }
        return new Cooling(
                start,
                mark,
                hoursTo(history, mark + (start - mark) / 2),
                hoursTo(history, mark + (start - mark) / 8));
    }

    /** Whether the lot had anything to cool. */
    boolean wasWarm() {
        return startC - markC >= LEAST_K;
    }

    /** A setting and until when it is in force, s. */
    private record Force(double settingC, double untilS) {}

    private static Force force(
            LotHistory history, LotSheet sheet, ChamberPlan chamber, StoreOutcome outcome) {
        SettingCourse settings = outcome.model().settings(chamber);
        double from = Math.max(0, history.timeS(0));
        double until = from + Holding.coolsInS(sheet);
        double at = from;
        for (SettingCourse.Change change : settings.changes()) {
            boolean cooling = change.atS() > from && change.atS() < until;
            if (cooling && change.to().temperatureC() > settings.at(at).temperatureC()) {
                at = change.atS();
            }
        }
        return new Force(settings.at(at).temperatureC(), settings.nextS(at));
    }

    private static double markC(
            ChamberPlan chamber, Course course, IntToDoubleFunction airC, Force force) {
        double setting = force.settingC();
        double own = lastDayC(course.hours(), airC, force.untilS());
        boolean reaches =
                !chamber.coolers().isEmpty() && own <= setting + chamber.setting().bandK() + 0.5;
        return reaches ? setting : own;
    }

    private static double lastDayC(Hours hours, IntToDoubleFunction airC, double untilS) {
        double end = Math.min(hours.atS(hours.size() - 1), untilS);
        double sum = 0;
        int n = 0;
        for (int i = hours.size() - 1; i >= 0 && hours.atS(i) > end - Timeline.DAY_S; i--) {
            if (hours.atS(i) <= end) {
                sum += airC.applyAsDouble(i);
                n++;
            }
        }
        return n > 0 ? sum / n : airC.applyAsDouble(0);
    }

    private static OptionalDouble hoursTo(LotHistory history, double targetC) {
        for (int i = 1; i < history.size(); i++) {
            if (history.meanC(i) <= targetC) {
                double fall = history.meanC(i - 1) - history.meanC(i);
                double share = fall > 0 ? (history.meanC(i - 1) - targetC) / fall : 1;
                double at =
                        history.timeS(i - 1) + share * (history.timeS(i) - history.timeS(i - 1));
                return OptionalDouble.of((at - history.timeS(0)) / Timeline.HOUR_S);
            }
        }
        return OptionalDouble.empty();
    }
}
