/**
 * Hourly weather made from monthly normals.
 *
 * <p>Lives here: the twelve normals of a place ({@link MonthlyNormals}), their blending to days,
 * the daily profiles of temperature, vapour and sun, the seeded spells of warm and cold, clear and
 * dull days, and the weather put together from them ({@link NormalsWeather}).
 *
 * <p>May import: {@code java}, Commons Math, {@code errors} and the rest of {@code air}. Units: °C,
 * K, Pa, percent, kWh/(m2 day), W/m2.
 */
@NullMarked
package org.wardon.air.normals;

import org.jspecify.annotations.NullMarked;
