package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.errors.RunStopped;
import org.wardon.heat.Course;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StartAir;

/**
 * How much heat of lots a chamber can take on each day at each temperature of its air, beside what
 * comes in through faces and door. Found by running it empty with everything at full power and one
 * heat after another set free in it: the heat at which its air stands at a temperature is what it
 * can take there. This asks no cooler of which kind it is.
 */
final class Reach {
    private static final double FIRST_W_M3 = 10;
    private static final double STEP_K = 6;
    private static final double WARM_ENOUGH_C = 32;
    private static final int MOST_LEVELS = 12;

    private final List<double[]> meanC = new ArrayList<>();
    private final List<Double> heatW = new ArrayList<>();
    private final int days;

    private Reach(int days) {
        this.days = days;
    }

    /**
     * Looks at a chamber.
     *
     * @param trial the store
     * @param on the chamber, switched on
     * @param coldestC lowest temperature that is of interest, °C
     */
    static Reach of(StoreTrial trial, ChamberPlan on, double coldestC) {
        Reach reach = new Reach(trial.days());
        ChamberPlan flatOut = flatOut(on, coldestC);
        reach.level(trial, flatOut, 0);
        double heat = FIRST_W_M3 * on.enclosure().box().volumeM3();
        while (reach.level(trial, flatOut, heat)
                && reach.meanC.size() < MOST_LEVELS
                && coldest(reach.meanC.get(reach.meanC.size() - 1)) < WARM_ENOUGH_C) {
            heat += Math.min(2 * heat, STEP_K * reach.lastWK());
        }
        return reach;
    }

    /** Runs with one heat; false where that is more than the model holds. */
    private boolean level(StoreTrial trial, ChamberPlan flatOut, double heat) {
        try {
            Course course = trial.sketch(flatOut, List.of(), 1, heat);
            meanC.add(DayMeans.of(course, days));
            heatW.add(heat);
            return true;
        } catch (RunStopped tooHot) {
            if (heat == 0) {
                throw tooHot;
            }
            return meanC.size() < 2 && level(trial, flatOut, heat / 4);
        }
    }

    /** Heat that the last step took to warm the air by a kelvin in the mean, W/K. */
    private double lastWK() {
        int n = meanC.size();
        double rise = 0;
        for (int day = 0; day < days; day++) {
            rise += (meanC.get(n - 1)[day] - meanC.get(n - 2)[day]) / days;
        }
        return (heatW.get(n - 1) - heatW.get(n - 2)) / Math.max(0.05, rise);
    }

    /** Set so low that it never rests at a temperature of interest. */
    private static ChamberPlan flatOut(ChamberPlan on, double coldestC) {
        Setting set = on.setting();
        double lowC = Math.max(-30, Math.min(coldestC, set.temperatureC()) - 3 - 2 * set.bandK());
        ChamberPlan lower = on.withSetting(new Setting(lowC, set.bandK(), set.humidityPct(), 0));
        boolean cold = on.coolers().stream().anyMatch(Cooler::startsAtSetting);
        return cold && on.starts().isEmpty()
                ? lower.starting(
                        Optional.of(new StartAir(set.temperatureC(), OptionalDouble.empty())))
                : lower;
    }

    private static double coldest(double[] mean) {
        double least = Double.POSITIVE_INFINITY;
        for (double c : mean) {
            least = Math.min(least, c);
        }
        return least;
    }

    /**
     * Returns the heat it can take.
     *
     * @param day the day
     * @param atC mean air of the day, °C
     * @return W; below 0 where its air cannot be brought so low even without lots
     */
    double takesW(int day, double atC) {
        int above = 1;
        while (above < meanC.size() - 1 && meanC.get(above)[day] < atC) {
            above++;
        }
        double lowC = meanC.get(above - 1)[day];
        double highC = meanC.get(above)[day];
        double lowW = heatW.get(above - 1);
        double slope = (heatW.get(above) - lowW) / Math.max(1e-3, highC - lowC);
        return lowW + slope * (atC - lowC);
    }

    /**
     * Returns what a kelvin more is worth to it.
     *
     * @param day the day
     * @param atC mean air of the day, °C
     * @return W/K
     */
    double perKelvinW(int day, double atC) {
        return takesW(day, atC + 0.5) - takesW(day, atC - 0.5);
    }

    /**
     * Returns the lowest daily mean its air comes to without lots, on its warmest day.
     *
     * @return °C
     */
    double lowestC() {
        double most = Double.NEGATIVE_INFINITY;
        for (int day = 0; day < days; day++) {
            most = Math.max(most, meanC.get(0)[day]);
        }
        return most;
    }
}
