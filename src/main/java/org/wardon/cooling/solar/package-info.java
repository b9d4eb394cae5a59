/**
 * Electricity from panels and a battery.
 *
 * <p>Lives here: what a chamber's solar supply is made of ({@link SolarSupply}), what its panels
 * give in the weather of a run ({@link PanelPower}) how its battery fills and empties ({@link
 * Battery}) and what its inverter carries ({@link Inverter}).
 *
 * <p>May import: {@code java}, {@code errors}, {@code air}, {@code enclosure} and {@code cooling}.
 * Units: W, J, °C, degrees, fractions of 1.
 */
@NullMarked
package org.wardon.cooling.solar;

import org.jspecify.annotations.NullMarked;
