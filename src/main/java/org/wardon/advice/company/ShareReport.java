package org.wardon.advice.company;

import java.util.List;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.produce.Reason;

/**
 * Who may share, and what concerns single crops of the group.
 *
 * @param answer the verdict in its fixed names
 * @param notes reasons about single crops or the group
 */
public record ShareReport(ShareAnswer answer, List<Reason> notes) {
    /** Copies the list. */
    public ShareReport {
        notes = List.copyOf(notes);
    }
}
