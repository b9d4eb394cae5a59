package org.wardon.web.work;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.AtomicLong;
import org.wardon.advice.placing.PlaceAdvice;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Placings, remembered by plan, version and what was sought. */
public final class Placings implements AutoCloseable {
    private static final int REMEMBERED = 8;

    /** The stages tell how far all is. */
    private static final Map<String, double[]> STAGES =
            Map.of(
                    "chambers", new double[] {0, 1},
                    "placing", new double[] {0, 1},
                    "telling", new double[] {0, 1});

    private static final String ID = "placing-";

    private final Map<Key, String> ids = new ConcurrentHashMap<>();
    private final AtomicLong last = new AtomicLong();
    private final Jobs<Key> jobs = new Jobs<>("placing", REMEMBERED, ids::remove);

    /** A plan in one version, one wish, judged with one book. */
    private record Key(long plan, int version, PlaceAsked asked, ReferenceBook book) {}

    Placings() {}

    private static Key key(OpenPlan open, PlaceAsked asked) {
        return new Key(open.kept().id(), open.kept().version(), asked, open.book());
    }

    /**
     * Returns how far a placing is, and begins it where nobody has.
     *
     * @param open the plan
     * @param plan what reading it gave
     * @param asked what is sought
     * @param patienceMs how long to wait for it, ms
     * @return how far it is; {@link Stand.Placed} where it is there
     */
    public Stand of(OpenPlan open, Reading.Good plan, PlaceAsked asked, long patienceMs) {
        StorePlan wishing = plan.plan().wishing(asked.wish());
        Job job = jobs.started(key(open, asked), () -> job(open.book(), wishing, asked));
        job.await(patienceMs);
        return job.stand();
    }

    private static Job job(ReferenceBook book, StorePlan plan, PlaceAsked asked) {
        PlaceAdvice advice = new PlaceAdvice(book, Words.english(Units.METRIC));
        return new Job(
                progress -> new Stand.Placed(advice.place(plan, asked.question(), progress)),
                STAGES);
    }

    /**
     * Returns how far a placing is, and begins nothing.
     *
     * @param open the plan
     * @param asked what is sought
     * @return how far it is, absent where nobody asked for it
     */
    public Optional<Stand> stand(OpenPlan open, PlaceAsked asked) {
        return jobs.stand(key(open, asked));
    }

    /**
     * Returns what was found for a plan as it stands.
     *
     * @param open the plan
     * @return what was sought, the last first
     */
    public List<PlaceAsked> found(OpenPlan open) {
        List<PlaceAsked> found =
                jobs
                        .stands(
                                key ->
                                        key.plan() == open.kept().id()
                                                && key.version() == open.kept().version()
                                                && key.book() == open.book())
                        .stream()
                        .filter(entry -> entry.getValue() instanceof Stand.Placed)
                        .map(entry -> entry.getKey().asked())
                        .collect(
                                java.util.stream.Collectors.toCollection(java.util.ArrayList::new));
        java.util.Collections.reverse(found);
        return found;
    }

    /**
     * Returns a placing that was found for a version of a plan, perhaps no longer the one that
     * counts.
     *
     * @param plan number of the plan
     * @param version the version
     * @param asked what was sought
     * @return the placing, absent where it is not remembered
     */
    public Optional<PlaceReport> found(long plan, int version, PlaceAsked asked) {
        return jobs
                .stands(
                        key ->
                                key.plan() == plan
                                        && key.version() == version
                                        && key.asked().equals(asked))
                .stream()
                .map(Map.Entry::getValue)
                .filter(Stand.Placed.class::isInstance)
                .map(stand -> ((Stand.Placed) stand).report())
                .reduce((first, last) -> last);
    }

    /**
     * A placing by its id.
     *
     * @param plan number of its plan
     * @param version the version it was sought for
     * @param stand how far it is
     */
    public record Sought(long plan, int version, Stand stand) {}

    /**
     * Returns the id of a placing that was begun.
     *
     * @param open the plan
     * @param asked what is sought
     * @return its id in this run
     */
    public String id(OpenPlan open, PlaceAsked asked) {
        return ids.computeIfAbsent(key(open, asked), any -> ID + last.incrementAndGet());
    }

    private Optional<Key> key(String id) {
        return ids.entrySet().stream()
                .filter(one -> one.getValue().equals(id))
                .map(Map.Entry::getKey)
                .findFirst();
    }

    /**
     * Looks for a placing.
     *
     * @param id its id
     * @return it, absent where it is not remembered
     */
    public Optional<Sought> sought(String id) {
        return key(id).flatMap(
                        key ->
                                jobs.stand(key)
                                        .map(
                                                stand ->
                                                        new Sought(
                                                                key.plan(), key.version(), stand)));
    }

    /**
     * Stops a placing.
     *
     * @param id its id
     */
    public void cancel(String id) {
        key(id).ifPresent(jobs::cancel);
    }

    /**
     * Stops a placing.
     *
     * @param open the plan
     * @param asked what is sought
     */
    public void cancel(OpenPlan open, PlaceAsked asked) {
        jobs.cancel(key(open, asked));
    }

    /**
     * Lets a placing that was stopped begin again.
     *
     * @param open the plan
     * @param asked what is sought
     */
    public void again(OpenPlan open, PlaceAsked asked) {
        jobs.again(key(open, asked));
    }

    @Override
    public void close() {
        jobs.close();
    }
}
