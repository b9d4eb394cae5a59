package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;

/**
 * What went wrong, as RFC 9457 has it, in the words of the pages.
 *
 * @param type what kind of trouble it is, a URN
 * @param title what happened
 * @param status HTTP status
 * @param detail what to do
 * @param faults faults of what was given
 * @param versions both versions, where the plan was changed elsewhere in the meantime
 */
public record Problem(
        String type,
        String title,
        int status,
        String detail,
        List<OneFault> faults,
        Optional<Versions> versions) {
    /** Its media type. */
    public static final String MEDIA_TYPE = "application/problem+json";

    /** Copies the list. */
    public Problem {
        faults = List.copyOf(faults);
    }

    /**
     * One fault.
     *
     * @param where what it was found in: {@code body}, {@code query}, or a file or plan by its name
     * @param path JSON path, name or line within it; blank for the whole
     * @param found what is wrong
     * @param accepted what is accepted
     * @param text all of it in a sentence, as the command line prints it
     */
    public record OneFault(String where, String path, String found, String accepted, String text) {
        /**
         * Returns a fault as it is told.
         *
         * @param fault the fault
         * @return the same
         */
        public static OneFault of(org.wardon.errors.Fault fault) {
            return new OneFault(
                    fault.file(), fault.path(), fault.found(), fault.accepted(), fault.sentence());
        }
    }

    /**
     * Two versions of a plan.
     *
     * @param startedFrom the one the change started from; 0 where what was given is none
     * @param version the one that counts now
     * @param note what was done to it, in a line
     */
    public record Versions(int startedFrom, int version, String note) {}
}
