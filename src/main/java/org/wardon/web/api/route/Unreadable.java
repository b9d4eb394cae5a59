package org.wardon.web.api.route;

import java.util.List;
import org.wardon.errors.Fault;

/** A body that is no JSON at all, with where and why. */
public final class Unreadable extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /**
     * Refuses a body.
     *
     * @param faults where and why
     */
    public Unreadable(List<Fault> faults) {
        super("body", null, false, false);
        this.faults = List.copyOf(faults);
    }

    /**
     * Returns where and why.
     *
     * @return the faults
     */
    public List<Fault> faults() {
        return faults;
    }
}
