package org.wardon.cli;

/** An answer on the command line. */
enum YesNo {
    /** It is so. */
    YES,
    /** It is not. */
    NO
}
