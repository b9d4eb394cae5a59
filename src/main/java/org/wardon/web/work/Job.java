package org.wardon.web.work;

import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Function;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;

/** One piece of long work on its way. */
final class Job implements Runnable {
    private final Function<Progress, Stand> work;
    private final Map<String, double[]> stages;
    private final CountDownLatch done = new CountDownLatch(1);
    private volatile Stand stand = new Stand.Running("waiting", 0);
    private volatile boolean cancelled;

    /**
     * Prepares it.
     *
     * @param work does it and says where it stands then
     * @param stages where each stage of its progress begins and how much of all it is
     */
    Job(Function<Progress, Stand> work, Map<String, double[]> stages) {
        this.work = work;
        this.stages = stages;
    }

    Stand stand() {
        return stand;
    }

    boolean isOver() {
        return done.getCount() == 0;
    }

    /** Whether it ended with an answer. */
    boolean isAnswered() {
        return stand instanceof Stand.Ready
                || stand instanceof Stand.Placed
                || stand instanceof Stand.Answered;
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
            heard("", 0);
            stand = work.apply(this::heard);
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

    /** Stages that are nobody's tell that the work goes on, not how far it is. */
    private void heard(String stage, double fraction) {
        if (cancelled) {
            throw new CancellationException(stage);
        }
        double[] part = stages.get(stage);
        if (part != null) {
            double all = part[0] + part[1] * fraction;
            if (stand instanceof Stand.Running before && before.fraction() <= all) {
                stand = new Stand.Running(stage, all);
            }
        }
    }
}
