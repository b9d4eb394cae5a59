/**
 * Moist air, weather, sun and time.
 *
 * <p>Lives here: pure functions of state, one class per published formula set: saturation ({@link
 * SaturatedAir}), moist air ({@link MoistAir}, {@link WetBulb}), pressure by height, sun ({@link
 * SunPosition}, {@link DailyRadiation}, {@link DiffuseShare}, {@link SolAir}); the weather,
 * sunshine and calendar of a run.
 *
 * <p>May import: {@code java}, Commons Math and {@code errors}. Units: °C, Pa, kg water per kg dry
 * air, J per kg dry air.
 */
@NullMarked
package org.wardon.air;

import org.jspecify.annotations.NullMarked;
