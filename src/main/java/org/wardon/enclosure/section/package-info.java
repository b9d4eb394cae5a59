/**
 * The two-dimensional section through still air: where it is warm and where cold in a chamber that
 * no fan stirs.
 *
 * <p>Lives here: steady conduction in a rectangle by finite volumes, Nusselt numbers of enclosed
 * air, and the section of a chest made of both.
 *
 * <p>May import: the other types of {@code org.wardon.enclosure}, {@code air} and {@code errors}.
 *
 * <p>Units: m, °C, W, W/(m K); heat of a section is told for one metre of the third direction.
 */
@NullMarked
package org.wardon.enclosure.section;

import org.jspecify.annotations.NullMarked;
