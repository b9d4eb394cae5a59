package org.wardon.advice.forecast;

import java.util.Arrays;
import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Spread;
import org.wardon.lots.Item;
import org.wardon.lots.LotHistory;

/**
 * What a lot comes to in air that is there already, which it does not change. Mass, heat and
 * temperature are those of the middle draw, fates those of all draws.
 */
public final class LotInAir {
    private final LotSheet sheet;
    private final LotCourse course;
    private final List<Fate> sold;
    private final double shareSound;

    LotInAir(LotSheet sheet, LotCourse course, List<Fate> sold) {
        this.sheet = sheet;
        this.course = course;
        this.sold = List.copyOf(sold);
        double sound = 0;
        for (int draw = 0; draw < sold.size(); draw++) {
            sound += sound(draw, 1) ? 1 : 0;
        }
        shareSound = sound / sold.size();
    }

    /**
     * Returns the share of draws in which it is sound when sold.
     *
     * @return 0 to 1
     */
    public double shareSound() {
        return shareSound;
    }

    /**
     * Returns whether it is sound when sold if the clock that ethylene drives runs faster.
     *
     * @param draw number of the draw
     * @param times pace of that clock over the one it had
     * @return true where it is
     */
    public boolean sound(int draw, double times) {
        Fate fate = sold.get(draw);
        double from = course.history().timeS(0);
        for (Mechanism mechanism : fate.mechanisms()) {
            double at = fate.endS(mechanism);
            double end = mechanism == Mechanism.ETHYLENE ? from + (at - from) / times : at;
            if (end <= sheet.soldS()) {
                return false;
            }
        }
        return true;
    }

    /**
     * Returns the share of draws in which cold has injured it when it is sold.
     *
     * @return 0 to 1
     */
    public double shareChilled() {
        double chilled =
                sold.stream()
                        .filter(fate -> fate.endS(Mechanism.CHILLING) <= sheet.soldS())
                        .count();
        return chilled / sold.size();
    }

    /**
     * Returns what is left of its mass when it leaves.
     *
     * @return share of the mass at arrival
     */
    public double massShare() {
        LotHistory history = course.history();
        double mass = history.massKg(0);
        for (int i = 0; i < history.size() && history.timeS(i) <= sheet.clock().leavesS(); i++) {
            mass = history.massKg(i);
        }
        return mass / history.massKg(0);
    }

    /**
     * Returns the days it lasts if it leaves as planned, its market leg among them.
     *
     * @return days since it came, or since the start of the run
     */
    public Spread days() {
        double from = sheet.clock().hereFromS();
        return Spread.of(sold.stream().mapToDouble(fate -> fate.daysLeft(from)).toArray());
    }

    /**
     * Returns the days it lasts if it stays in this air for good.
     *
     * @param draws the draws
     * @param ppm ethylene in it, {@code [draw]}, µL/L
     * @return days since it came, or since the start of the run
     */
    public Spread daysStaying(List<Draw> draws, double[] ppm) {
        double from = sheet.clock().hereFromS();
        double[] days = new double[draws.size()];
        for (int d = 0; d < days.length; d++) {
            double[] felt = new double[course.history().size()];
            Arrays.fill(felt, ppm[d]);
            LotHistory here = course.history().withEthylene(felt);
            days[d] = sheet.model().follow(here, draws.get(d)).daysLeft(from);
        }
        return Spread.of(days);
    }

    /**
     * Returns what it most likely ends by.
     *
     * @return the mechanism that is first in most draws
     */
    public Mechanism limitedBy() {
        Mechanism most = sold.get(0).limitedBy();
        long times = 0;
        for (Mechanism mechanism : Mechanism.values()) {
            long here = sold.stream().filter(fate -> fate.limitedBy() == mechanism).count();
            if (here > times) {
                times = here;
                most = mechanism;
            }
        }
        return most;
    }

    /**
     * Returns the heat it gives to the air while it stands in the store: what it breathes, and what
     * it had in it when it came.
     *
     * @param days length of the horizon, days
     * @return {@code [day]}, mean of the day, W, 0 or more
     */
    public double[] heatW(int days) {
        double[] heat = new double[days];
        Item item = sheet.bodies().middle().item();
        for (int i = 1; i < course.size(); i++) {
            double from = course.atS(i - 1);
            double to = Math.min(course.atS(i), sheet.clock().leavesS());
            int day = Math.min(days - 1, (int) (from / Timeline.DAY_S));
            if (to > from) {
                double field =
                        item.sensibleHeatJ(
                                course.massKg(i - 1), course.meanC(i - 1), course.meanC(i));
                heat[day] += (course.respirationW(i) * (to - from) + field) / Timeline.DAY_S;
            }
        }
        for (int day = 0; day < days; day++) {
            heat[day] = Math.max(0, heat[day]);
        }
        return heat;
    }

    /**
     * Returns its mean temperature while it stands in the store.
     *
     * @return °C
     */
    public double meanC() {
        double sum = 0;
        double span = 0;
        for (int i = 1; i < course.size() && course.atS(i) <= sheet.clock().leavesS(); i++) {
            double step = course.atS(i) - course.atS(i - 1);
            sum += step * 0.5 * (course.meanC(i) + course.meanC(i - 1));
            span += step;
        }
        return span > 0 ? sum / span : course.meanC(0);
    }

    /**
     * Returns a draw it was followed in.
     *
     * @param draw its number in the order of the draws
     * @return the draw
     */
    public Draw draw(int draw) {
        return sold.get(draw).draw();
    }
}
