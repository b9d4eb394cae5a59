package org.wardon.heat;

import java.util.ArrayList;
import java.util.List;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.CoolerPart;
import org.wardon.heat.network.Terms;

/**
 * A supply that can give only so much energy a day, such as solar: when it is used up the coolers
 * on it and their fans stand still until midnight. Coolers that name a daily energy share one
 * supply; others are not on it.
 */
final class EnergyBudget {
    private static final double SOONEST_S = 30;
    private static final double JOULE_PER_KWH = 3.6e6;

    private final ChamberNetwork network;
    private final Terms terms;
    private final List<Integer> onIt = new ArrayList<>();
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
        for (int i = 0; i < network.coolerCount(); i++) {
            CoolerPart cooler = network.cooler(i);
            if (cooler.unit().dailyEnergyKWh().isPresent()) {
                onIt.add(i);
                kWh += cooler.unit().dailyEnergyKWh().getAsDouble();
                watts += cooler.unit().mostElectricW();
            }
        }
        dayJ = onIt.isEmpty() ? Double.POSITIVE_INFINITY : kWh * JOULE_PER_KWH;
        mostW = watts;
    }

    private double drawnJ(double[] totals) {
        double sum = 0;
        for (int i : onIt) {
            sum += terms.electricity(i, totals);
        }
        return sum;
    }

    private double leftJ(double[] totals) {
        return dayJ - (drawnJ(totals) - atMidnightJ);
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
        atMidnightJ = drawnJ(totals);
        if (usedUp && powered) {
            onIt.forEach(i -> network.cooler(i).power(true));
        }
        usedUp = false;
    }

    /** Takes the power from the coolers where it is used up. */
    void apply() {
        if (usedUp) {
            for (int i : onIt) {
                network.cooler(i).switchOn(false);
                network.cooler(i).power(false);
            }
        }
    }

    Spans spans() {
        return spans;
    }
}
