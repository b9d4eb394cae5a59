package org.wardon.web.work;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * Forecasts, worked out one after the other in the background, as each takes all processors, and
 * remembered by plan and version.
 */
final class Forecasts implements AutoCloseable {
    private static final int REMEMBERED = 12;

    private final ExecutorService worker =
            Executors.newSingleThreadExecutor(
                    task -> {
                        Thread thread = new Thread(task, "forecast");
                        thread.setDaemon(true);
                        return thread;
                    });
    private final Map<Key, Job> jobs = new LinkedHashMap<>(16, 0.75f, true);
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
        Job job = started(key(open), open.book(), plan);
        job.await(patienceMs);
        return job.stand() instanceof Stand.Ready ready
                ? new Stand.Ready(told(open, ready.advice(), units))
                : job.stand();
    }

    private synchronized Job started(Key key, ReferenceBook book, StorePlan plan) {
        Job known = jobs.get(key);
        if (known != null) {
            return known;
        }
        Function<Progress, StoreAdvice> work =
                progress -> {
                    OpenLots.Housed housed = OpenLots.house(plan, book, progress);
                    return new ForecastAdvice(book, Words.english(Units.METRIC))
                            .advise(housed.plan(), housed.told(), progress);
                };
        Job job = new Job(work);
        jobs.put(key, job);
        forgetOldest();
        worker.execute(job);
        return job;
    }

    private void forgetOldest() {
        var oldest = jobs.entrySet().iterator();
        while (jobs.size() > REMEMBERED && oldest.hasNext()) {
            Map.Entry<Key, Job> entry = oldest.next();
            entry.getValue().cancel();
            otherWords.keySet().removeIf(told -> told.key().equals(entry.getKey()));
            oldest.remove();
        }
    }

    private synchronized StoreAdvice told(OpenPlan open, StoreAdvice advice, Units units) {
        if (units.equals(Units.METRIC)) {
            return advice;
        }
        return otherWords.computeIfAbsent(
                new Told(key(open), units),
                told -> new ForecastAdvice(open.book(), Words.english(units)).inTheseWords(advice));
    }

    synchronized Optional<Stand> stand(OpenPlan open) {
        return Optional.ofNullable(jobs.get(key(open))).map(Job::stand);
    }

    synchronized void cancel(OpenPlan open) {
        @Nullable Job job = jobs.get(key(open));
        if (job != null) {
            job.cancel();
        }
    }

    /** Forgets a forecast that was cancelled or stopped, so that it is begun again when asked. */
    synchronized void again(OpenPlan open) {
        @Nullable Job job = jobs.get(key(open));
        if (job != null && job.isOver() && !(job.stand() instanceof Stand.Ready)) {
            jobs.remove(key(open));
        }
    }

    @Override
    public void close() {
        synchronized (this) {
            jobs.values().forEach(Job::cancel);
        }
        worker.shutdownNow();
    }
}
