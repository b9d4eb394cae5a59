package org.wardon.files.readings;

import org.wardon.files.json.Faults;

/** Faults of a long file: the first twenty in full, the rest counted. */
final class LimitedFaults {
    private static final int TOLD = 20;

    private final Faults faults;
    private int count;

    LimitedFaults(Faults faults) {
        this.faults = faults;
    }

    void add(String path, String what, String accepted) {
        if (count < TOLD) {
            faults.add(path, what, accepted);
        }
        count++;
    }

    boolean any() {
        return count > 0;
    }

    /** Tells how many were not told. */
    void close() {
        if (count > TOLD) {
            faults.add(
                    "further lines",
                    (count - TOLD) + " more faults like these",
                    "accepted: none; mend those above first");
        }
    }
}
