package org.wardon.web.work;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Consumer;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;

/**
 * Long work of one kind, done piece after piece in the background, as each takes all processors,
 * and remembered by what was asked.
 *
 * @param <K> what was asked
 */
final class Jobs<K> implements AutoCloseable {
    private final int remembered;
    private final Consumer<K> forgotten;
    private final ExecutorService worker;
    private final Map<K, Job> jobs = new LinkedHashMap<>(16, 0.75f, true);

    /**
     * Begins to work.
     *
     * @param name name of its thread
     * @param remembered how many answers are kept
     * @param forgotten hears which was dropped
     */
    Jobs(String name, int remembered, Consumer<K> forgotten) {
        this.remembered = remembered;
        this.forgotten = forgotten;
        worker =
                Executors.newSingleThreadExecutor(
                        task -> {
                            Thread thread = new Thread(task, name);
                            thread.setDaemon(true);
                            return thread;
                        });
    }

    /** The job of what is asked, begun where nobody has. */
    synchronized Job started(K key, java.util.function.Supplier<Job> made) {
        Job known = jobs.get(key);
        if (known != null) {
            return known;
        }
        Job job = made.get();
        jobs.put(key, job);
        forgetOldest();
        worker.execute(job);
        return job;
    }

    private void forgetOldest() {
        var oldest = jobs.entrySet().iterator();
        while (jobs.size() > remembered && oldest.hasNext()) {
            Map.Entry<K, Job> entry = oldest.next();
            entry.getValue().cancel();
            forgotten.accept(entry.getKey());
            oldest.remove();
        }
    }

    synchronized Optional<Stand> stand(K key) {
        return Optional.ofNullable(jobs.get(key)).map(Job::stand);
    }

    /** What was asked of a kind, with how far it is, the last asked last. */
    synchronized List<Map.Entry<K, Stand>> stands(Predicate<K> which) {
        return jobs.entrySet().stream()
                .filter(entry -> which.test(entry.getKey()))
                .map(entry -> Map.entry(entry.getKey(), entry.getValue().stand()))
                .toList();
    }

    synchronized void cancel(K key) {
        @Nullable Job job = jobs.get(key);
        if (job != null) {
            job.cancel();
        }
    }

    /** Forgets a job that was cancelled or stopped, so that it is begun again when asked. */
    synchronized void again(K key) {
        @Nullable Job job = jobs.get(key);
        if (job != null && job.isOver() && !job.isAnswered()) {
            jobs.remove(key);
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
