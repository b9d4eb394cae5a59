package org.wardon.web.api.told;

import java.util.List;
import org.wardon.web.pages.Problem;

/**
 * What reading a plan gave.
 *
 * @param good whether it can be run
 * @param faults its faults
 */
public record Checked(boolean good, List<Problem.OneFault> faults) {
    /** Copies the list. */
    public Checked {
        faults = List.copyOf(faults);
    }
}
