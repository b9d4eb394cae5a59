/**
 * Answers only the JSON interface gives.
 *
 * <p>Lives here: records as they are written; the advice itself answers with the records of {@code
 * files.forecast}, as the command line does.
 *
 * <p>May import: {@code web.pages.Problem}, {@code logbook}, {@code files.forecast}.
 */
@NullMarked
package org.wardon.web.api.told;

import org.jspecify.annotations.NullMarked;
