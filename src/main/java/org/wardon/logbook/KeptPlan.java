package org.wardon.logbook;

import java.time.Instant;

/**
 * A kept plan as it stands.
 *
 * @param id its number in the book
 * @param name its name for people
 * @param version number of the version that counts now
 * @param changedAt when it was last changed, UTC
 * @param note what was last done, in a line
 * @param canUndo whether there is an earlier version to go back to
 * @param canRedo whether a version was gone back from
 */
public record KeptPlan(
        long id,
        String name,
        int version,
        Instant changedAt,
        String note,
        boolean canUndo,
        boolean canRedo) {}
