package org.wardon.web.api.told;

import java.util.List;

/**
 * Crops that may be meant.
 *
 * @param crops the likeliest first; all of them where nothing was asked
 */
public record Crops(List<Found> crops) {
    /** Copies the list. */
    public Crops {
        crops = List.copyOf(crops);
    }

    /**
     * A crop.
     *
     * @param id its id
     * @param name its name
     * @param by the name that was met; blank where it is its own
     */
    public record Found(String id, String name, String by) {}
}
