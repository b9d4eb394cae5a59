package org.wardon.web.work;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Function;
import org.wardon.errors.Progress;

/**
 * Long questions other than forecasts and placings, worked out one after the other in the
 * background, each asked once however often it is asked for.
 */
public final class Errands implements AutoCloseable {
    private static final int MOST = 24;
    private static final Map<String, double[]> STAGES = Map.of("variants", new double[] {0, 1});

    private final ExecutorService worker =
            Executors.newSingleThreadExecutor(
                    task -> {
                        Thread thread = new Thread(task, "errand");
                        thread.setDaemon(true);
                        return thread;
                    });
    private final Map<String, Errand> errands = new LinkedHashMap<>();
    private int last;

    private record Errand(Object question, Job job) {}

    Errands() {}

    /**
     * Begins to work a question out where nobody has.
     *
     * @param kind what it is, one word; its id begins with it
     * @param question what is asked, equal where the same is asked again
     * @param work works it out
     * @return its id, absent where too many are waiting already
     */
    public synchronized Optional<String> begin(
            String kind, Object question, Function<Progress, Record> work) {
        for (Map.Entry<String, Errand> one : errands.entrySet()) {
            Job job = one.getValue().job();
            if (one.getValue().question().equals(question) && (!job.isOver() || job.isAnswered())) {
                return Optional.of(one.getKey());
            }
        }
        forgetOldest();
        if (errands.size() >= MOST) {
            return Optional.empty();
        }
        String id = kind + "-" + ++last;
        Job made = new Job(progress -> new Stand.Answered(work.apply(progress)), STAGES);
        errands.put(id, new Errand(question, made));
        worker.execute(made);
        return Optional.of(id);
    }

    private void forgetOldest() {
        if (errands.size() >= MOST) {
            errands.entrySet().stream()
                    .filter(one -> one.getValue().job().isOver())
                    .map(Map.Entry::getKey)
                    .findFirst()
                    .ifPresent(errands::remove);
        }
    }

    /**
     * Returns how far one is.
     *
     * @param id its id
     * @param patienceMs how long to wait for its end, ms
     * @return how far it is, absent where there is none, or it is long over
     */
    public Optional<Stand> stand(String id, long patienceMs) {
        Optional<Job> job = job(id);
        job.ifPresent(one -> one.await(patienceMs));
        return job.map(Job::stand);
    }

    /**
     * Stops one; it hears it at its next step of progress.
     *
     * @param id its id
     * @return whether there is one
     */
    public boolean cancel(String id) {
        Optional<Job> job = job(id);
        job.ifPresent(Job::cancel);
        return job.isPresent();
    }

    private synchronized Optional<Job> job(String id) {
        return Optional.ofNullable(errands.get(id)).map(Errand::job);
    }

    @Override
    public void close() {
        synchronized (this) {
            errands.values().forEach(one -> one.job().cancel());
        }
        worker.shutdownNow();
    }
}
