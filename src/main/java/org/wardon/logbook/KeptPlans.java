package org.wardon.logbook;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.time.Clock;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;
import org.wardon.reference.StoreFile;

/**
 * Plans kept in {@code store.db}, each with its whole history. A save names the version it started
 * from and is refused where another came in between. Reading creates no file. Several programs and
 * people may use the book at once.
 */
public final class KeptPlans {
    private static final int SINCE_VERSION = 3;

    private final StoreFile store;
    private final Clock clock;

    /**
     * Looks into a folder.
     *
     * @param folder where {@code store.db} lies or will lie
     * @param clock tells when something was changed
     */
    public KeptPlans(Path folder, Clock clock) {
        store = new StoreFile(folder);
        this.clock = clock;
    }

    /**
     * Returns all plans.
     *
     * @return the last changed first
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public List<KeptPlan> list() {
        return store.read(SINCE_VERSION, PlanRows::list, List.of());
    }

    /**
     * Returns a plan as it stands.
     *
     * @param id its number
     * @return the plan, absent where there is none
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public Optional<KeptPlan> find(long id) {
        return store.read(SINCE_VERSION, open -> PlanRows.find(open, id), Optional.empty());
    }

    /**
     * Returns the plan that came from a place.
     *
     * @param origin where it came from, such as the path of a file
     * @return the plan, absent where there is none
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public Optional<KeptPlan> from(String origin) {
        return store.read(SINCE_VERSION, open -> PlanRows.from(open, origin), Optional.empty());
    }

    /**
     * Returns the text of a version.
     *
     * @param id number of the plan
     * @param version number of the version
     * @return text and files, absent where there is none
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public Optional<PlanText> text(long id, int version) {
        return store.read(
                SINCE_VERSION, open -> PlanRows.text(open, id, version), Optional.empty());
    }

    /**
     * Returns every version of a plan.
     *
     * @param id number of the plan
     * @return the latest first
     * @throws org.wardon.errors.BadInput if the file cannot be read
     */
    public List<PlanVersion> history(long id) {
        return store.read(SINCE_VERSION, open -> PlanRows.history(open, id), List.of());
    }

    /**
     * Keeps a new plan.
     *
     * @param name its name for people
     * @param origin where it comes from, blank where it was made here
     * @param text its text and files
     * @param note what was done, in a line
     * @return the plan
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public KeptPlan add(String name, String origin, PlanText text, String note) {
        Require.text("name of a plan", name);
        long id =
                whole(
                        open -> {
                            long made = PlanRows.insert(open, origin, now());
                            PlanRows.insert(open, made, new Row(1, 0, name, text, note, now()));
                            return made;
                        });
        return find(id).orElseThrow();
    }

    /** A version to be written. */
    record Row(int number, int parent, String name, PlanText text, String note, String at) {}

    /**
     * Keeps a new version.
     *
     * @param id number of the plan
     * @param startedFrom the version the change started from
     * @param name name of the plan from now on
     * @param text its text and files
     * @param note what was done, in a line
     * @return kept, or refused where another version counts by now
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public Saved save(long id, int startedFrom, String name, PlanText text, String note) {
        return move(
                id,
                startedFrom,
                (open, plan) -> {
                    int number = PlanRows.latest(open, id) + 1;
                    PlanRows.insert(
                            open, id, new Row(number, plan.version(), name, text, note, now()));
                    return number;
                });
    }

    /**
     * Goes back to the version before.
     *
     * @param id number of the plan
     * @param startedFrom the version that is seen
     * @return kept, or refused where another version counts by now
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public Saved undo(long id, int startedFrom) {
        return move(id, startedFrom, (open, plan) -> PlanRows.parent(open, id, plan.version()));
    }

    /**
     * Goes on to the version that was gone back from.
     *
     * @param id number of the plan
     * @param startedFrom the version that is seen
     * @return kept, or refused where another version counts by now
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public Saved redo(long id, int startedFrom) {
        return move(id, startedFrom, (open, plan) -> PlanRows.child(open, id, plan.version()));
    }

    /**
     * Strikes a plan out with all its versions.
     *
     * @param id number of the plan
     * @param startedFrom the version that is seen
     * @return kept, or refused where another version counts by now
     * @throws org.wardon.errors.BadInput if the file cannot be written
     */
    public Saved delete(long id, int startedFrom) {
        return whole(
                open -> {
                    Saved may = mayChange(PlanRows.find(open, id), startedFrom);
                    if (may instanceof Saved.Kept) {
                        PlanRows.delete(open, id);
                    }
                    return may;
                });
    }

    /** Finds the version to go to; 0 for none. */
    private interface Target {
        int of(Connection open, KeptPlan plan) throws SQLException;
    }

    private Saved move(long id, int startedFrom, Target target) {
        return whole(
                open -> {
                    Optional<KeptPlan> plan = PlanRows.find(open, id);
                    Saved may = mayChange(plan, startedFrom);
                    if (!(may instanceof Saved.Kept)) {
                        return may;
                    }
                    int number = target.of(open, plan.orElseThrow());
                    if (number == 0) {
                        return new Saved.Nothing();
                    }
                    PlanRows.pointTo(open, id, number, now());
                    return new Saved.Kept(number);
                });
    }

    private static Saved mayChange(Optional<KeptPlan> plan, int startedFrom) {
        if (plan.isEmpty()) {
            return new Saved.Nothing();
        }
        int version = plan.get().version();
        return version == startedFrom
                ? new Saved.Kept(version)
                : new Saved.Outdated(startedFrom, version, plan.get().note());
    }

    private <T> T whole(StoreFile.Work<T> work) {
        return store.change(open -> StoreFile.whole(open, work));
    }

    private String now() {
        return clock.instant().truncatedTo(ChronoUnit.SECONDS).toString();
    }
}
