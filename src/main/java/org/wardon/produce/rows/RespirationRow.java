package org.wardon.produce.rows;

import org.wardon.produce.Fact;

/**
 * Heat of respiration at one temperature.
 *
 * @param temperatureC temperature of the produce, °C
 * @param state {@code green}, {@code turning}, {@code ripe}, {@code uncured} or {@code not-stated}
 * @param wattsPerTonne rate, W per tonne
 * @param table the table it stands in: {@code heat} (printed as heat), {@code co2} or {@code
 *     co2-other} (printed as mg CO2/(kg h), turned with 10.7 J per mg)
 */
public record RespirationRow(double temperatureC, String state, Fact wattsPerTonne, String table) {}
