/**
 * The command line: reads the words typed, asks the desk, prints the answer.
 *
 * <p>Lives here: one class per verb, exit statuses, progress on the terminal.
 *
 * <p>May import: the desk, the shelf, {@code plan}, {@code produce}, {@code air}, {@code report};
 * never a part.
 */
@NullMarked
package org.wardon.cli;

import org.jspecify.annotations.NullMarked;
