/**
 * Time integration of a tree of nodes around a hub.
 *
 * <p>Lives here: the linearly implicit method, its error control, its elimination, its events. It
 * knows no crop, wall or Celsius.
 *
 * <p>May import: {@code java} only.
 */
@NullMarked
package org.wardon.heat.solver;

import org.jspecify.annotations.NullMarked;
