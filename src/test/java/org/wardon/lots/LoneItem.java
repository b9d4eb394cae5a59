package org.wardon.lots;

import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;

/** An item in shells, alone in air of 0 °C behind a film, integrated by a general library. */
final class LoneItem implements FirstOrderDifferentialEquations {
    private final Item item;
    private final Shells shells;
    private final double filmWPerKgK;
    private final double heatWPerKg;

    LoneItem(Item item, Shells shells, double filmWPerKgK, double heatWPerKg) {
        this.item = item;
        this.shells = shells;
        this.filmWPerKgK = filmWPerKgK;
        this.heatWPerKg = heatWPerKg;
    }

    @Override
    public int getDimension() {
        return shells.count();
    }

    @Override
    public void computeDerivatives(double timeS, double[] c, double[] rateCs) {
        int last = shells.count() - 1;
        double inwardW = 0;
        for (int i = 0; i <= last; i++) {
            double outwardW =
                    i < last
                            ? shells.conductanceWPerKgK(i) * (c[i] - c[i + 1])
                            : shells.throughFilmWPerKgK(filmWPerKgK) * c[i];
            double ownW = heatWPerKg * shells.massFraction(i);
            rateCs[i] =
                    (inwardW - outwardW + ownW)
                            / (item.specificHeatJkgK() * shells.massFraction(i));
            inwardW = outwardW;
        }
    }

    /** Goes on from one time to another. */
    double[] after(double[] startC, double fromS, double toS) {
        double[] c = startC.clone();
        new DormandPrince853Integrator(1e-9, 1e7, 1e-10, 1e-10).integrate(this, fromS, c, toS, c);
        return c;
    }

    double mean(double[] c) {
        double sum = 0;
        for (int i = 0; i < shells.count(); i++) {
            sum += shells.massFraction(i) * c[i];
        }
        return sum;
    }

    double centre(double[] c) {
        return shells.centreC(c[0], c[1]);
    }

    double skin(double[] c) {
        return shells.skinC(c[c.length - 1], 0, filmWPerKgK, 0);
    }
}
