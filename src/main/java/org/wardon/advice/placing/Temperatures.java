package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;

/** The temperatures worth a try: what lots want, what is set now, and steps between. */
final class Temperatures {
    private static final int MOST = 12;
    private static final double STEP_C = 0.5;
    private static final double WIDEST_GAP_K = 3;
    private static final double WARMER_K = 3;
    private static final double WARMEST_C = 35;

    private final List<Double> wantedC;

    private Temperatures(List<Double> wantedC) {
        this.wantedC = wantedC;
    }

    static Temperatures of(StoreTrial trial) {
        TreeSet<Double> wanted = new TreeSet<>();
        for (TrialLot lot : trial.lots()) {
            double handbook = lot.model().handbookC();
            wanted.add(rounded(handbook));
            wanted.add(rounded(Math.max(handbook, lot.model().lowestSafeC())));
        }
        if (!wanted.isEmpty()) {
            wanted.add(Math.min(WARMEST_C, wanted.last() + WARMER_K));
            thin(wanted);
            fill(wanted);
        }
        return new Temperatures(List.copyOf(wanted));
    }

    private static double rounded(double c) {
        return Math.rint(c / STEP_C) * STEP_C;
    }

    /** Lowest that any lot wants, °C; the setting where there are no lots. */
    double coldestC(double settingC) {
        return wantedC.isEmpty() ? settingC : wantedC.get(0);
    }

    /**
     * Settings to be tried in a chamber, rising.
     *
     * @param settingC what is set now, which is always among them, °C
     * @param lowestC below it the chamber cannot come in this weather, °C
     */
    List<Double> in(double settingC, double lowestC) {
        TreeSet<Double> tried = new TreeSet<>();
        for (double c : wantedC) {
            if (c >= lowestC) {
                tried.add(c);
            }
        }
        if (!wantedC.isEmpty() && lowestC > wantedC.get(0)) {
            double last = wantedC.get(wantedC.size() - 1);
            tried.add(Math.min(rounded(lowestC + STEP_C), last));
        }
        tried.add(settingC);
        return new ArrayList<>(tried);
    }

    /** Takes out of the closest pair the one that stands closer to its other neighbour. */
    private static void thin(NavigableSet<Double> tried) {
        while (tried.size() > MOST) {
            double out = Double.NaN;
            double closest = Double.POSITIVE_INFINITY;
            for (double c : tried) {
                Double below = tried.lower(c);
                Double above = tried.higher(c);
                double gap = below == null || above == null ? Double.NaN : above - below;
                if (gap < closest) {
                    closest = gap;
                    out = c;
                }
            }
            tried.remove(out);
        }
    }

    private static void fill(NavigableSet<Double> tried) {
        while (tried.size() < MOST) {
            double widest = WIDEST_GAP_K;
            double from = Double.NaN;
            for (double c : tried) {
                Double above = tried.higher(c);
                if (above != null && above - c > widest) {
                    widest = above - c;
                    from = c;
                }
            }
            if (Double.isNaN(from)) {
                return;
            }
            tried.add(rounded(from + widest / 2));
        }
    }
}
