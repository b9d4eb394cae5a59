package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.cooling.SettingCourse;
import org.wardon.heat.Hours;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * The air of a chamber from one setting to the next. Until it has been inside the band for three
 * hours running it is being brought to its setting, whether down or up.
 */
final class Stretches {
    /**
     * A stretch of one setting.
     *
     * @param fromS its start, or the first arrival if later, s since the start of the run
     * @param untilS its end, s
     * @param setting in force
     * @param reachedS from when on the air was inside for three hours running; empty where never
     */
    record Stretch(double fromS, double untilS, Setting setting, OptionalDouble reachedS) {
        /** Whether the air is being brought to the setting at a time of it. */
        boolean coming(double atS) {
            return reachedS.isEmpty() || atS <= reachedS.getAsDouble();
        }

        OptionalDouble hoursToReach() {
            return reachedS.isPresent()
                    ? OptionalDouble.of((reachedS.getAsDouble() - fromS) / Timeline.HOUR_S)
                    : OptionalDouble.empty();
        }

        double hours() {
            return (untilS - fromS) / Timeline.HOUR_S;
        }
    }

    private final ChamberPlan chamber;
    private final SettingCourse settings;
    private final Hours hours;
    private final double horizonS;

    Stretches(ChamberPlan chamber, SettingCourse settings, Hours hours, double horizonS) {
        this.chamber = chamber;
        this.settings = settings;
        this.hours = hours;
        this.horizonS = horizonS;
    }

    /** All from a time on; the first begins there. */
    List<Stretch> from(double firstS) {
        List<Stretch> all = new ArrayList<>();
        double from = firstS;
        do {
            double until = Math.min(settings.nextS(from), horizonS);
            Setting setting = settings.at(from);
            all.add(new Stretch(from, until, setting, reachedS(setting, from, until)));
            from = until;
        } while (from < horizonS);
        return all;
    }

    boolean inside(double airC, Setting setting) {
        return chamber.coolers().stream().anyMatch(Cooler::holdsBand)
                ? Math.abs(airC - setting.temperatureC())
                        <= setting.bandK() + Holding.AIR_ALLOWANCE_K
                : airC <= setting.temperatureC() + setting.bandK();
    }

    /** When the air has been inside for three hours running: the start of those hours. */
    private OptionalDouble reachedS(Setting setting, double fromS, double untilS) {
        double since = Double.NaN;
        for (int i = 0; i < hours.size() && hours.atS(i) <= untilS; i++) {
            if (hours.atS(i) <= fromS || !inside(hours.airC(i), setting)) {
                since = Double.NaN;
                continue;
            }
            double start = Math.max(fromS, i == 0 ? 0 : hours.atS(i - 1));
            since = Double.isNaN(since) ? start : since;
            if (hours.atS(i) - since >= Holding.PULLED_DOWN_HOURS * Timeline.HOUR_S - 1) {
                return OptionalDouble.of(since);
            }
        }
        return OptionalDouble.empty();
    }

    /** What is told of settings that follow on another. */
    List<Caution> told(double firstS, StoreOutcome outcome) {
        List<Caution> all = new ArrayList<>();
        for (Stretch stretch : from(firstS)) {
            if (settings.sinceS(stretch.fromS()) > 0) {
                told(stretch, outcome).ifPresent(one -> all.add(new Caution(Level.NOTE, one)));
            }
        }
        return all;
    }

    /** One that is not reached in a day is a reason not to hold, and told there. */
    private Optional<Reason> told(Stretch stretch, StoreOutcome outcome) {
        Argument when = BatteryNights.at(stretch.fromS(), outcome);
        Argument set = Argument.of(stretch.setting().temperatureC(), "C");
        OptionalDouble took = stretch.hoursToReach();
        if (took.isPresent()) {
            Argument hours = Argument.of(took.getAsDouble(), "h");
            return Optional.of(
                    Reason.about("setting-reached", chamber.id(), "own", when, set, hours));
        }
        Argument last = Argument.of(hours.airC(rowAt(stretch.untilS())), "C");
        return stretch.hours() < Holding.SEVEN_EIGHTHS_LEAST_H
                ? Optional.of(
                        Reason.about(
                                "setting-still-coming",
                                chamber.id(),
                                "own",
                                when,
                                set,
                                Argument.of(stretch.hours(), "h"),
                                last))
                : Optional.empty();
    }

    private int rowAt(double atS) {
        int row = 0;
        while (row + 1 < hours.size() && hours.atS(row + 1) <= atS) {
            row++;
        }
        return row;
    }

    /** Mean of the air over the hours of a span, °C. */
    double meanC(double fromS, double untilS) {
        double sum = 0;
        int n = 0;
        for (int i = 0; i < hours.size(); i++) {
            if (hours.atS(i) > fromS && hours.atS(i) <= untilS) {
                sum += hours.airC(i);
                n++;
            }
        }
        return n > 0 ? sum / n : hours.airC(hours.size() - 1);
    }
}
