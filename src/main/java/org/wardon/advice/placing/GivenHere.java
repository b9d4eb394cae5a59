package org.wardon.advice.placing;

import java.util.Arrays;
import java.util.List;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.keeping.Draw;

/** Ethylene one lot makes in a chamber at rest, in the middle draw and in each. */
final class GivenHere {
    private static final double LITRES = 1_000;
    private static final double NOTABLE_PPM = 0.003;

    private final double middlePpm;
    private final double[] ppm;

    private GivenHere(double middlePpm, double[] ppm) {
        this.middlePpm = middlePpm;
        this.ppm = ppm;
    }

    /**
     * Works it out.
     *
     * @param lot the lot
     * @param draws the draws
     * @param figures the air, its temperature and what carries ethylene out
     */
    static GivenHere of(TrialLot lot, List<Draw> draws, Option.Figures figures) {
        double[] each = draws.stream().mapToDouble(draw -> ppm(lot, draw, figures)).toArray();
        return new GivenHere(ppm(lot, Draw.MEDIAN, figures), each);
    }

    private static double ppm(TrialLot lot, Draw draw, Option.Figures figures) {
        double rate = lot.model().ethyleneMicrolitrePerKgHour(figures.meanC(), draw);
        return rate * lot.plan().massKg() / (LITRES * figures.exchangeM3h());
    }

    double middlePpm() {
        return middlePpm;
    }

    /** {@code [draw]}, µL/L. */
    double[] ppm() {
        return ppm;
    }

    /** The same beside what is outdoors, {@code [draw]}, µL/L. */
    double[] beside(double outdoorPpm) {
        return Arrays.stream(ppm).map(own -> own + outdoorPpm).toArray();
    }

    /** Whether anybody could mind it. */
    boolean notable() {
        return Arrays.stream(ppm).anyMatch(each -> each >= NOTABLE_PPM);
    }
}
