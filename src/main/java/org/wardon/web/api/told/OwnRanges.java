package org.wardon.web.api.told;

import java.util.List;

/**
 * Values of the keeper's own.
 *
 * @param own the values, by name
 */
public record OwnRanges(List<Own> own) {
    /** Copies the list. */
    public OwnRanges {
        own = List.copyOf(own);
    }

    /**
     * A value.
     *
     * @param commodity the crop
     * @param fact what it is, such as {@code storage-temperature} or {@code life@10C}
     * @param low the lower value
     * @param high the higher value
     * @param unit unit of both
     * @param setAt when it was set, UTC
     */
    public record Own(
            String commodity, String fact, double low, double high, String unit, String setAt) {}
}
