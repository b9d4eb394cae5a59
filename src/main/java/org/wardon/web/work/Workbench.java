package org.wardon.web.work;

import java.nio.file.Path;
import java.time.Clock;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.receiving.Receiving;
import org.wardon.advice.wording.Units;
import org.wardon.errors.BadInput;
import org.wardon.files.PlanFiles;
import org.wardon.files.PlanReader;
import org.wardon.logbook.KeptPlan;
import org.wardon.logbook.KeptPlans;
import org.wardon.logbook.PlanText;
import org.wardon.reference.GoneLots;
import org.wardon.reference.OwnValues;
import org.wardon.reference.ReferenceBook;

/** Everything the pages work with: kept plans, the reference book, forecasts. */
public final class Workbench implements AutoCloseable {
    private static final int REMEMBERED = 32;

    private final Path home;
    private final KeptPlans plans;
    private final Books books;
    private final Clock clock;
    private final Forecasts forecasts = new Forecasts();
    private final Placings placings = new Placings();
    private final Doors doors = new Doors();
    private final Errands errands = new Errands();
    private final Map<Key, OpenPlan> read = new LinkedHashMap<>(16, 0.75f, true);

    /** A plan in one version, read with one book. */
    private record Key(KeptPlan plan, ReferenceBook book) {}

    /**
     * Sets up the bench.
     *
     * @param home folder of the keeper's own file
     * @param clock tells when something was changed
     */
    public Workbench(Path home, Clock clock) {
        this.home = home;
        this.plans = new KeptPlans(home, clock);
        this.books = new Books(home);
        this.clock = clock;
    }

    /**
     * Returns the clock.
     *
     * @return the clock pages tell the day by
     */
    public Clock clock() {
        return clock;
    }

    /**
     * Returns the kept plans.
     *
     * @return the book of plans
     */
    public KeptPlans plans() {
        return plans;
    }

    /**
     * Returns the reference book with the keeper's own values as they are now.
     *
     * @return the book; not to be closed
     */
    public ReferenceBook book() {
        return books.current();
    }

    /**
     * Returns the keeper's own values, to be changed.
     *
     * @return the values; the next book has the changes
     */
    public OwnValues ownValues() {
        return new OwnValues(home);
    }

    /**
     * Returns the keeper's own lots that are gone, to be added to.
     *
     * @return the lots; the next book has the changes
     */
    public GoneLots goneLots() {
        return new GoneLots(home);
    }

    /**
     * Opens a kept plan: reads it, or tells its faults.
     *
     * @param id its number
     * @return the plan as it stands, absent where there is none
     */
    public Optional<OpenPlan> open(long id) {
        return plans.find(id).flatMap(this::open);
    }

    private Optional<OpenPlan> open(KeptPlan kept) {
        Key key = new Key(kept, book());
        synchronized (read) {
            OpenPlan known = read.get(key);
            if (known != null) {
                return Optional.of(known);
            }
        }
        Optional<OpenPlan> open =
                plans.text(kept.id(), kept.version())
                        .map(
                                text ->
                                        new OpenPlan(
                                                kept, text, reading(kept.name(), text), key.book));
        synchronized (read) {
            open.ifPresent(plan -> read.put(key, plan));
            read.keySet().stream()
                    .limit(Math.max(0, read.size() - REMEMBERED))
                    .toList()
                    .forEach(read::remove);
        }
        return open;
    }

    /**
     * Reads the text of a plan, kept or not.
     *
     * @param name its name in messages
     * @param text its text and files
     * @return the plan or its faults
     */
    public Reading reading(String name, PlanText text) {
        try {
            return new Reading.Good(
                    PlanReader.read(
                            text.text(),
                            name,
                            PlanFiles.attached(text.files()),
                            PlanLookups.of(book())));
        } catch (BadInput e) {
            return new Reading.Faulty(e.faults());
        }
    }

    /**
     * Returns how far the forecast of a plan is, and begins it where nobody has.
     *
     * @param open the plan
     * @param plan what reading it gave
     * @param units units its sentences are told in
     * @param patienceMs how long to wait for it, ms
     * @return how far it is
     */
    public Stand forecast(OpenPlan open, Reading.Good plan, Units units, long patienceMs) {
        return forecasts.of(open, plan.plan(), units, patienceMs);
    }

    /**
     * Returns how far the forecast of a plan is, and begins nothing.
     *
     * @param open the plan
     * @return how far it is, absent where nobody asked for it
     */
    public Optional<Stand> stand(OpenPlan open) {
        return forecasts.stand(open);
    }

    /**
     * Stops the forecast of a plan.
     *
     * @param open the plan
     */
    public void cancel(OpenPlan open) {
        forecasts.cancel(open);
    }

    /**
     * Lets a forecast that was stopped begin again.
     *
     * @param open the plan
     */
    public void again(OpenPlan open) {
        forecasts.again(open);
    }

    /**
     * Returns the placings that were sought.
     *
     * @return what seeks them and remembers them
     */
    public Placings placings() {
        return placings;
    }

    /**
     * Returns what answers questions at the door of a store, and begins to work it out where nobody
     * has.
     *
     * @param open the plan
     * @param plan what reading it gave
     * @param units units its sentences are told in
     * @param patienceMs how long to wait for it, ms
     * @return it, absent where it is not ready yet
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public Optional<Receiving> door(
            OpenPlan open, Reading.Good plan, Units units, long patienceMs) {
        return doors.of(open, plan.plan(), units, patienceMs);
    }

    /**
     * Returns long questions other than forecasts.
     *
     * @return those asked in this run
     */
    public Errands errands() {
        return errands;
    }

    @Override
    public void close() {
        errands.close();
        doors.close();
        placings.close();
        forecasts.close();
        books.close();
    }
}
