package org.wardon.produce;

import java.util.List;

/**
 * Commodities that a published scheme lets share a room for a short time.
 *
 * @param scheme the scheme
 * @param group group within the scheme
 * @param temperatureC temperature of the group, °C
 * @param humidityPct humidity of the group, percent
 * @param commodityIds its commodities; some may wait for a commodity row
 */
public record MixingGroup(
        String scheme,
        String group,
        Fact temperatureC,
        Fact humidityPct,
        List<String> commodityIds) {
    /** Copies the list. */
    public MixingGroup {
        commodityIds = List.copyOf(commodityIds);
    }
}
