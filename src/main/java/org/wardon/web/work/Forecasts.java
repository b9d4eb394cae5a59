package org.wardon.web.work;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Forecasts, remembered by plan and version. */
final class Forecasts implements AutoCloseable {
    private static final int REMEMBERED = 12;

    /** Where each stage begins and how much of all it is; measured on the demo. */
    private static final Map<String, double[]> STAGES =
            Map.of(
                    "forecast", new double[] {0.02, 0.23},
                    "draws", new double[] {0.25, 0.55},
                    "judging", new double[] {0.8, 0.2});

    private final Jobs<Key> jobs = new Jobs<>("forecast", REMEMBERED, this::forget);
    private final Map<Told, StoreAdvice> otherWords = new LinkedHashMap<>(16, 0.75f, true);

    /** A plan in one version, advised on with one book. */
    private record Key(long plan, int version, ReferenceBook book) {}

    /** A forecast told in other units. */
    private record Told(Key key, Units units) {}

    private static Key key(OpenPlan open) {
        return new Key(open.kept().id(), open.kept().version(), open.book());
    }

    /** Returns how far the forecast is, and begins it where nobody has. */
    Stand of(OpenPlan open, StorePlan plan, Units units, long patienceMs) {
        Job job = jobs.started(key(open), () -> job(open.book(), plan));
        job.await(patienceMs);
        return job.stand() instanceof Stand.Ready ready
                ? new Stand.Ready(told(open, ready.advice(), units))
                : job.stand();
    }

    private static Job job(ReferenceBook book, StorePlan plan) {
        ForecastAdvice advice = new ForecastAdvice(book, Words.english(Units.METRIC));
        return new Job(
                progress -> {
                    OpenLots.Housed housed = OpenLots.house(plan, book, progress);
                    return new Stand.Ready(advice.advise(housed.plan(), housed.told(), progress));
                },
                STAGES);
    }

    private void forget(Key key) {
        synchronized (otherWords) {
            otherWords.keySet().removeIf(told -> told.key().equals(key));
        }
    }

    private StoreAdvice told(OpenPlan open, StoreAdvice advice, Units units) {
        if (units.equals(Units.METRIC)) {
            return advice;
        }
        synchronized (otherWords) {
            return otherWords.computeIfAbsent(
                    new Told(key(open), units),
                    told ->
                            new ForecastAdvice(open.book(), Words.english(units))
                                    .inTheseWords(advice));
        }
    }

    Optional<Stand> stand(OpenPlan open) {
        return jobs.stand(key(open));
    }

    void cancel(OpenPlan open) {
        jobs.cancel(key(open));
    }

    void again(OpenPlan open) {
        jobs.again(key(open));
    }

    @Override
    public void close() {
        jobs.close();
    }
}
