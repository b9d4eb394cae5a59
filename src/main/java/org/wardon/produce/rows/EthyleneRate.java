package org.wardon.produce.rows;

import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * Ethylene given off at one temperature.
 *
 * @param temperatureC temperature, °C; empty where not printed
 * @param microlitrePerKgHour rate, µL/(kg h); a fact with one bound only is a limit, never a
 *     midpoint
 * @param ripeness ripeness or {@code not-stated}
 */
public record EthyleneRate(
        OptionalDouble temperatureC, Fact microlitrePerKgHour, String ripeness) {}
