/**
 * The pages of crops: finding one, what is known of it, own values and lots, how long a lot keeps.
 *
 * <p>Lives here: views and handlers of {@code /crops}.
 *
 * <p>May import: desk, shelf, {@code plan}, {@code produce}, {@code air}.
 */
@NullMarked
package org.wardon.web.crops;

import org.jspecify.annotations.NullMarked;
