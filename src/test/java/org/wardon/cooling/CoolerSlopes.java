package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.function.DoubleConsumer;
import java.util.function.ToDoubleFunction;

/** Holds every derivative a law states against central differences of what it states. */
final class CoolerSlopes {
    private static final double AIR_STEP_K = 1e-4;
    private static final double HUMIDITY_STEP = 1e-8;
    private static final double RUN_STEP = 1e-5;

    private final CoolerLaw law;
    private final CoolerInputs in;
    private final String what;

    private CoolerSlopes(CoolerLaw law, CoolerInputs in, String what) {
        this.law = law;
        this.in = in;
        this.what = what;
    }

    static CoolerEffect effect(CoolerLaw law, CoolerInputs in) {
        CoolerEffect out = new CoolerEffect(law.ownStates());
        law.effect(in, out);
        return out;
    }

    /**
     * The size of watts and of kg/s says what is nothing; a hundred-thousandth of it may differ.
     */
    static void check(CoolerLaw law, CoolerInputs in, double watts, double kgS, String what) {
        CoolerSlopes slopes = new CoolerSlopes(law, in, what);
        CoolerEffect at = effect(law, in);
        slopes.byAir(at, watts, kgS);
        slopes.byHumidity(at, watts, kgS);
        slopes.byRun(at, watts, kgS);
        for (int i = 0; i < in.own.length; i++) {
            slopes.byOwn(at, watts, kgS, i);
        }
    }

    private void byAir(CoolerEffect at, double watts, double kgS) {
        DoubleConsumer set = x -> in.airC = x;
        double t = in.airC;
        hold(set, t, AIR_STEP_K, e -> e.sensibleW, at.sensibleByAirC, watts, "sensible by air");
        hold(set, t, AIR_STEP_K, e -> e.vapourKgS, at.vapourByAirC, kgS, "vapour by air");
        hold(set, t, AIR_STEP_K, e -> e.electricW, at.electricByAirC, watts, "electric by air");
        hold(set, t, AIR_STEP_K, e -> e.ran, at.ranByAirC, 1, "run by air");
        for (int k = 0; k < in.own.length; k++) {
            int i = k;
            hold(set, t, AIR_STEP_K, e -> e.ownRate[i], at.ownRateByAirC[i], kgS, "own by air");
        }
    }

    private void byHumidity(CoolerEffect at, double watts, double kgS) {
        DoubleConsumer set = x -> in.humidityRatio = x;
        double w = in.humidityRatio;
        double s = HUMIDITY_STEP;
        hold(set, w, s, e -> e.sensibleW, at.sensibleByHumidity, 1e3 * watts, "sensible by w");
        hold(set, w, s, e -> e.vapourKgS, at.vapourByHumidity, 1e3 * kgS, "vapour by w");
        hold(set, w, s, e -> e.electricW, at.electricByHumidity, 1e3 * watts, "electric by w");
        hold(set, w, s, e -> e.ran, 0, 1e3, "run by w");
        for (int k = 0; k < in.own.length; k++) {
            int i = k;
            hold(set, w, s, e -> e.ownRate[i], at.ownRateByHumidity[i], 1e3 * kgS, "own by w");
        }
    }

    private void byRun(CoolerEffect at, double watts, double kgS) {
        DoubleConsumer set = x -> in.run = x;
        double r = in.run;
        hold(set, r, RUN_STEP, e -> e.sensibleW, at.sensibleByRun, watts, "sensible by run");
        hold(set, r, RUN_STEP, e -> e.vapourKgS, at.vapourByRun, kgS, "vapour by run");
        hold(set, r, RUN_STEP, e -> e.electricW, at.electricByRun, watts, "electric by run");
        hold(set, r, RUN_STEP, e -> e.ran, at.ranByRun, 1, "run by run");
        for (int k = 0; k < in.own.length; k++) {
            int i = k;
            hold(set, r, RUN_STEP, e -> e.ownRate[i], at.ownRateByRun[i], kgS, "own by run");
        }
    }

    private void byOwn(CoolerEffect at, double watts, double kgS, int i) {
        DoubleConsumer set = x -> in.own[i] = x;
        double y = in.own[i];
        double step = 1e-5 * Math.max(Math.abs(y), 1e-2);
        hold(set, y, step, e -> e.sensibleW, at.sensibleByOwn[i], watts, "sensible by own");
        hold(set, y, step, e -> e.vapourKgS, at.vapourByOwn[i], kgS, "vapour by own");
        hold(set, y, step, e -> e.electricW, at.electricByOwn[i], watts, "electric by own");
        hold(set, y, step, e -> e.ownRate[i], at.ownRateByOwn[i], kgS, "own by own");
    }

    private void hold(
            DoubleConsumer set,
            double at,
            double step,
            ToDoubleFunction<CoolerEffect> of,
            double found,
            double size,
            String which) {
        set.accept(at + step);
        double above = of.applyAsDouble(effect(law, in));
        set.accept(at - step);
        double below = of.applyAsDouble(effect(law, in));
        set.accept(at);
        double difference = (above - below) / (2 * step);
        assertEquals(difference, found, 1e-4 * Math.abs(found) + 1e-5 * size, which + ", " + what);
    }
}
