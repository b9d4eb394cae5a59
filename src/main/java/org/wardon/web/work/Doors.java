package org.wardon.web.work;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicBoolean;
import org.wardon.advice.placing.OpenLots;
import org.wardon.advice.receiving.Receiving;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Stores worked out as they stand, so that a lot at the door is answered at once. */
final class Doors implements AutoCloseable {
    private static final int REMEMBERED = 4;

    private final ExecutorService worker =
            Executors.newSingleThreadExecutor(
                    task -> {
                        Thread thread = new Thread(task, "door");
                        thread.setDaemon(true);
                        return thread;
                    });
    private final AtomicBoolean practised = new AtomicBoolean();
    private final Map<Key, Future<Receiving>> known = new LinkedHashMap<>(16, 0.75f, true);

    /** A plan in one version, judged with one book, told in some units. */
    private record Key(long plan, int version, ReferenceBook book, Units units) {}

    /**
     * Begins to work a store out where nobody has, and waits so long at most.
     *
     * @throws RunStopped where a chamber meets a state that cannot be
     */
    Optional<Receiving> of(OpenPlan open, StorePlan plan, Units units, long patienceMs) {
        Key key = new Key(open.kept().id(), open.kept().version(), open.book(), units);
        try {
            return Optional.of(begun(key, plan).get(patienceMs, TimeUnit.MILLISECONDS));
        } catch (TimeoutException e) {
            return Optional.empty();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return Optional.empty();
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            throw new IllegalStateException("the store could not be worked out", e);
        }
    }

    private synchronized Future<Receiving> begun(Key key, StorePlan plan) {
        Future<Receiving> work =
                known.computeIfAbsent(key, one -> worker.submit(() -> workedOut(plan, one)));
        var oldest = known.entrySet().iterator();
        while (known.size() > REMEMBERED && oldest.hasNext()) {
            oldest.next();
            oldest.remove();
        }
        return work;
    }

    private Receiving workedOut(StorePlan plan, Key key) {
        StorePlan housed = housed(plan, key.book());
        Receiving ready = Receiving.of(housed, key.book(), Words.english(key.units()));
        if (practised.compareAndSet(false, true)) {
            worker.execute(() -> practise(ready));
        }
        return ready;
    }

    /** Once in a program's life, while the first keeper types. */
    private static void practise(Receiving with) {
        try {
            with.practise();
        } catch (RunStopped | IllegalStateException untold) {
            // Nobody waits for it; who asks the same is told.
        }
    }

    private static StorePlan housed(StorePlan plan, ReferenceBook book) {
        return OpenLots.house(plan, book, Progress.SILENT).plan();
    }

    @Override
    public void close() {
        worker.shutdownNow();
    }
}
