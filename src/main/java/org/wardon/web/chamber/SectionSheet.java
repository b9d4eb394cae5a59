package org.wardon.web.chamber;

import java.util.List;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.TableView;

/**
 * The section of a chamber whose air no fan stirs.
 *
 * @param chamber path of the chamber's page
 * @param title what it shows
 * @param picture path of the drawing
 * @param told what the drawing shows, for those who do not see it
 * @param said the answer in sentences
 * @param table temperatures as they lie
 * @param warnings what to beware of
 */
public record SectionSheet(
        String chamber,
        String title,
        String picture,
        String told,
        List<String> said,
        TableView table,
        List<CautionView> warnings) {
    /** Copies the lists. */
    public SectionSheet {
        said = List.copyOf(said);
        warnings = List.copyOf(warnings);
    }
}
