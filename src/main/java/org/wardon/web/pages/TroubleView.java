package org.wardon.web.pages;

import java.util.List;
import org.wardon.errors.Fault;

/**
 * What went wrong and what to do.
 *
 * @param happened what happened
 * @param mend what to do
 * @param faults faults of what was given, if any
 */
public record TroubleView(String happened, String mend, List<Fault> faults) {
    /** Copies the list. */
    public TroubleView {
        faults = List.copyOf(faults);
    }
}
