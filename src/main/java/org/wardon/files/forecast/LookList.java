package org.wardon.files.forecast;

import java.util.List;

/**
 * The answer of {@code look} without a name.
 *
 * @param commodities all commodities
 */
public record LookList(List<Entry> commodities) {
    /** Copies the list. */
    public LookList {
        commodities = List.copyOf(commodities);
    }

    /**
     * One commodity.
     *
     * @param commodity its id
     * @param names its names
     */
    public record Entry(String commodity, List<String> names) {
        /** Copies the list. */
        public Entry {
            names = List.copyOf(names);
        }
    }
}
