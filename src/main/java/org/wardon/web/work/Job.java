package org.wardon.web.work;

import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Function;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;

/** One forecast on its way. */
final class Job implements Runnable {
    /** Where each stage begins and how much of all it is; measured on the demo. */
    private static final Map<String, double[]> STAGES =
            Map.of(
                    "forecast", new double[] {0.02, 0.23},
                    "draws", new double[] {0.25, 0.55},
                    "judging", new double[] {0.8, 0.2});

    private final Function<Progress, StoreAdvice> work;
    private final CountDownLatch done = new CountDownLatch(1);
    private volatile Stand stand = new Stand.Running("waiting", 0);
    private volatile boolean cancelled;

    Job(Function<Progress, StoreAdvice> work) {
        this.work = work;
    }

    Stand stand() {
        return stand;
    }

    boolean isOver() {
        return done.getCount() == 0;
    }

    /** A run hears it at its next step of progress. */
    void cancel() {
        cancelled = true;
    }

    /** Waits for the end, so long at most. */
    void await(long millis) {
        try {
            done.await(millis, TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    @Override
    public void run() {
        try {
            heard("forecast", 0);
            stand = new Stand.Ready(work.apply(this::heard));
        } catch (CancellationException e) {
            stand = new Stand.Cancelled();
        } catch (RunStopped e) {
            stand = new Stand.Stopped(String.valueOf(e.getMessage()));
        } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
            // Must not end the worker; the terminal hears the whole of it.
            e.printStackTrace();
            stand = new Stand.Stopped("");
        } finally {
            done.countDown();
        }
    }

    private void heard(String stage, double fraction) {
        if (cancelled) {
            throw new CancellationException(stage);
        }
        double[] part = STAGES.getOrDefault(stage, new double[] {0, 1});
        double all = part[0] + part[1] * fraction;
        if (stand instanceof Stand.Running before && before.fraction() <= all) {
            stand = new Stand.Running(stage, all);
        }
    }
}
