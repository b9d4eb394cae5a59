package org.wardon.errors;

/** Hears how far long work has come, and may stop it. */
@FunctionalInterface
public interface Progress {
    /** Hears nothing. */
    Progress SILENT = (stage, fraction) -> {};

    /**
     * Hears that a stage has come so far.
     *
     * @param stage what is being done, a short code such as {@code forecast}
     * @param fraction done of it, 0 to 1
     */
    void at(String stage, double fraction);
}
