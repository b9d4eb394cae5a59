package org.wardon.cli;

/** Exit statuses of the program. */
final class Exit {
    /** Done. */
    static final int OK = 0;

    /** Something the program itself got wrong. */
    static final int INTERNAL = 1;

    /** Input that cannot be used; nothing was written. */
    static final int BAD_INPUT = 2;

    /** A run met a state that cannot be. */
    static final int RUN_STOPPED = 3;

    /** A result could not be written. */
    static final int CANNOT_WRITE = 4;

    private Exit() {}
}
