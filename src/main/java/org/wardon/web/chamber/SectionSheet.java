package org.wardon.web.chamber;

import java.util.List;

/**
 * The section of a chamber whose air no fan stirs.
 *
 * @param chamber path of the chamber's page
 * @param title what it shows
 * @param picture path of the drawing
 * @param said the answer in sentences
 * @param warnings what to beware of
 */
public record SectionSheet(
        String chamber, String title, String picture, List<String> said, List<String> warnings) {
    /** Copies the lists. */
    public SectionSheet {
        said = List.copyOf(said);
        warnings = List.copyOf(warnings);
    }
}
