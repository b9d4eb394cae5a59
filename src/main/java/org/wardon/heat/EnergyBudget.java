package org.wardon.heat;

import java.util.OptionalDouble;
import org.wardon.cooling.Compressor;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.Terms;

/**
 * A supply that can give only so much energy a day, such as solar: when it is used up coolers and
 * fans stand still until midnight.
 */
final class EnergyBudget {
    private static final double SOONEST_S = 30;
    private static final double JOULE_PER_KWH = 3.6e6;

    private final ChamberNetwork network;
    private final Terms terms;
    private final double dayJ;
    private final double mostW;
    private final Spans spans;
    private double atMidnightJ;
    private boolean usedUp;

    EnergyBudget(ChamberRun run, ChamberNetwork network) {
        this.network = network;
        this.terms = network.terms();
        this.spans = new Spans(CourseEvent.Kind.ENERGY_USED_UP, run.chamberId());
        double kWh = 0;
        double watts = 0;
        boolean limited = network.coolerCount() > 0;
        for (int i = 0; i < network.coolerCount(); i++) {
            if (run.coolers().get(i) instanceof Compressor unit) {
                OptionalDouble day = unit.dailyEnergyKWh();
                limited &= day.isPresent();
                kWh += day.orElse(0);
                watts += 1.5 * unit.ratedPowerW() + unit.fanW();
            }
        }
        dayJ = limited ? kWh * JOULE_PER_KWH : Double.POSITIVE_INFINITY;
        mostW = watts;
    }

    private double leftJ(double[] totals) {
        return dayJ - (terms.electricity(totals) - atMidnightJ);
    }

    /** The earliest time at which the energy can be used up, s. */
    double nextCheck(double t, double[] totals) {
        if (Double.isInfinite(dayJ) || usedUp) {
            return Double.POSITIVE_INFINITY;
        }
        return t + Math.max(SOONEST_S, leftJ(totals) / mostW);
    }

    void check(double t, double[] totals) {
        if (!usedUp && leftJ(totals) <= 0) {
            usedUp = true;
            apply();
        }
        spans.is(t, usedUp);
    }

    void midnight(double[] totals, boolean powered) {
        atMidnightJ = terms.electricity(totals);
        if (usedUp && powered) {
            for (int i = 0; i < network.coolerCount(); i++) {
                network.cooler(i).power(true);
            }
        }
        usedUp = false;
    }

    /** Takes the power from the coolers where it is used up. */
    void apply() {
        if (usedUp) {
            for (int i = 0; i < network.coolerCount(); i++) {
                network.cooler(i).switchOn(false);
                network.cooler(i).power(false);
            }
        }
    }

    Spans spans() {
        return spans;
    }
}
