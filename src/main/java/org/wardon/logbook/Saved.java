package org.wardon.logbook;

/** What became of a save. */
public sealed interface Saved {
    /**
     * It is kept.
     *
     * @param version number of the version that counts now
     */
    record Kept(int version) implements Saved {}

    /**
     * It was refused: somebody else changed the plan in between.
     *
     * @param startedFrom the version the save started from
     * @param version the version that counts now
     * @param note what was done in between last
     */
    record Outdated(int startedFrom, int version, String note) implements Saved {}

    /** There is no such plan, or nothing to undo or redo. */
    record Nothing() implements Saved {}
}
