/**
 * Pictures of answers, as SVG written by hand.
 *
 * <p>Lives here: what is drawn, in words of the bundle and units of the person; no files. Colour is
 * never the only sign: numbers, lines and marks say the same.
 *
 * <p>May import: {@code advice.wording}, {@code files.forecast}.
 */
@NullMarked
package org.wardon.advice.picture;

import org.jspecify.annotations.NullMarked;
