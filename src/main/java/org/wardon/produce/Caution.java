package org.wardon.produce;

/**
 * A reason a person must hear of, with how loud.
 *
 * @param level how loud
 * @param reason what and why
 */
public record Caution(Level level, Reason reason) {
    /** How loud. */
    public enum Level {
        /** Good to know. */
        NOTE,
        /** Produce or money at risk. */
        CAUTION,
        /** People at risk, or the whole load. */
        DANGER
    }
}
