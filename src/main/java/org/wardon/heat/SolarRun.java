package org.wardon.heat;

import java.util.List;
import org.wardon.air.Sunshine;
import org.wardon.cooling.solar.Battery;
import org.wardon.cooling.solar.Inverter;
import org.wardon.cooling.solar.PanelPower;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.Terms;
import org.wardon.heat.solver.Integrator;

/**
 * Panels and battery through a run. The moment the battery runs out is a crossing the integrator
 * finds: it asks what a step tried would draw. Then all electricity of the chamber is off until the
 * panels have charged it again so far as the supply asks; that moment is worked out beforehand.
 */
final class SolarRun implements Integrator.Trigger {
    /** The battery may run out this much late, J: a hundredth of a watt-hour. */
    private static final double LATE_J = 36;

    private static final double HOUR_S = 3600;

    private final SolarSupply supply;
    private final ChamberNetwork network;
    private final List<Boolean> carried;
    private final Terms terms;
    private final Integrator integrator;
    private final double[] tried;
    private final double[] panelW;
    private final Battery battery;
    private final Spans empty;
    private final double startJ;
    private double lastS;
    private double drawnJ;
    private double withoutS;
    private boolean on;

    SolarRun(SolarSupply supply, ChamberRun run, ChamberNetwork network, Integrator integrator) {
        this.supply = supply;
        this.network = network;
        double othersW =
                Inverter.othersW(
                        run.enclosure().gains(),
                        run.extras().heaterW(),
                        run.extras().humidifierKgH());
        this.carried = Inverter.carries(supply.inverterW(), othersW, run.coolers());
        this.terms = network.terms();
        this.integrator = integrator;
        this.tried = new double[network.flows()];
        int hours = RunCompiler.hours(run) + 1;
        Sunshine sun = Sunshine.of(run.site(), run.timeline(), run.weather(), hours);
        this.panelW = PanelPower.hourlyW(supply, sun, run.weather(), hours);
        this.battery = new Battery(supply.battery());
        this.empty = new Spans(CourseEvent.Kind.BATTERY_EMPTY, run.chamberId());
        this.startJ = battery.storedJ();
        this.on = startJ > 0;
    }

    /** Whether it feeds the chamber. */
    boolean on() {
        return on;
    }

    /** Takes the power from the coolers its inverter cannot carry. */
    void leaveOut() {
        for (int i = 0; i < network.coolerCount(); i++) {
            if (!carried.get(i)) {
                network.cooler(i).power(false);
            }
        }
    }

    /** How far below empty a step tried to time t would bring the battery, J. */
    @Override
    public double value(double t, double[] y) {
        if (!on) {
            return Double.NEGATIVE_INFINITY;
        }
        double seconds = t - lastS;
        if (seconds <= 0) {
            return -battery.storedJ();
        }
        integrator.tried(seconds, tried);
        double drawnW = (terms.electricity(tried) - drawnJ) / seconds;
        return -battery.leastJ(seconds, panelW(lastS), panelW(t), drawnW);
    }

    @Override
    public double tolerance() {
        return LATE_J;
    }

    /** Takes a step that was taken. */
    void stepped(double to, double[] totals) {
        double seconds = to - lastS;
        double drawn = terms.electricity(totals);
        withoutS += on ? 0 : seconds;
        battery.pass(seconds, panelW(lastS), panelW(to), (drawn - drawnJ) / seconds);
        drawnJ = drawn;
        lastS = to;
    }

    /** Goes off where the battery is empty, on where it is charged again; returns whether so. */
    boolean turns(double t) {
        boolean before = on;
        if (on && battery.storedJ() <= 0) {
            on = false;
        } else if (!on && battery.share() >= restartShare() - 1e-9) {
            on = true;
        }
        empty.is(t, !on);
        return on != before;
    }

    /**
     * The time a step must land on, s: the end of the hour, up to which the panels run straight, or
     * before it when the battery is charged enough to go on.
     */
    double nextLanding(double t) {
        double left = HOUR_S * (Math.floor(t / HOUR_S + 1e-9) + 1) - t;
        if (on) {
            return t + left;
        }
        double now = panelW(t);
        double slope = (panelW(t + left) - now) / left;
        // Not shorter than the clock can tell, or the run would stand still.
        double seconds = battery.secondsTo(restartShare(), now, slope, left);
        return t + Math.min(left, Math.max(1e-3, seconds));
    }

    private double restartShare() {
        return supply.battery().restartChargePct() / 100;
    }

    private double panelW(double t) {
        int h = (int) Math.min(t / HOUR_S, panelW.length - 2);
        return panelW[h] + (t / HOUR_S - h) * (panelW[h + 1] - panelW[h]);
    }

    double panelJ() {
        return battery.panelJ();
    }

    double share() {
        return battery.share();
    }

    List<CourseEvent> spans(double end) {
        return empty.until(end);
    }

    SolarLedger ledger() {
        return new SolarLedger(
                battery.panelJ(),
                battery.usedJ(),
                battery.spilledJ(),
                battery.lostJ(),
                startJ,
                battery.storedJ(),
                battery.lowestShare(),
                withoutS);
    }
}
