package org.wardon.web.crops;

import java.util.List;

/**
 * All crops, or those found.
 *
 * @param asked what was typed; blank for all
 * @param groups crops by the part of the plant they are; one without a name for those found
 */
public record CropListView(String asked, List<Group> groups) {
    /** Copies the list. */
    public CropListView {
        groups = List.copyOf(groups);
    }

    /**
     * Crops of one part of the plant.
     *
     * @param name the part; blank for those found
     * @param crops the crops
     */
    public record Group(String name, List<Entry> crops) {
        /** Copies the list. */
        public Group {
            crops = List.copyOf(crops);
        }
    }

    /**
     * A crop.
     *
     * @param id its id
     * @param name its name
     * @param by the name that was met, where it is another one; blank else
     */
    public record Entry(String id, String name, String by) {}
}
