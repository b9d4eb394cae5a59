package org.wardon.heat;

/**
 * Something that went on for a while in a run.
 *
 * @param kind what
 * @param subject id of the chamber or lot
 * @param fromS start, s since the start of the run
 * @param untilS end, s since the start of the run
 */
public record CourseEvent(Kind kind, String subject, double fromS, double untilS) {
    /** What went on. */
    public enum Kind {
        /** No power. */
        OUTAGE,
        /** Free water lay on a lot. */
        WET_LOT,
        /** Water lay on the faces. */
        WET_FACES,
        /** The high-pressure switch held a compressor back. */
        TRIPPED,
        /** Frost gathered on a coil without defrost. */
        ICES_UP,
        /** A wetted wall stood dry. */
        DRY_WALL,
        /** No ice was left in a chamber with banks of ice. */
        ICE_GONE,
        /** The daily energy was used up. */
        ENERGY_USED_UP,
        /** The battery of a solar supply was empty, and nothing fed the chamber. */
        BATTERY_EMPTY
    }
}
