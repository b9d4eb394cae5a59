package org.wardon.logbook;

import java.util.Map;
import java.util.TreeMap;

/**
 * A plan as it is kept: its text and the files it names.
 *
 * @param text JSON text of the plan
 * @param files texts of the files, such as the weather, by name
 */
public record PlanText(String text, Map<String, String> files) {
    /** Copies the map, sorted. */
    public PlanText {
        files = java.util.Collections.unmodifiableMap(new TreeMap<>(files));
    }
}
