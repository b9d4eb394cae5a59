package org.wardon.web.api.route;

import java.util.Optional;

/**
 * What an operation takes beside the names in its path.
 *
 * @param query name of the schema whose names may stand in the address
 * @param body name of the schema of its body
 * @param version whether it changes a version of a plan and has to say which
 */
public record Takes(Optional<String> query, Optional<String> body, boolean version) {
    /** Nothing. */
    public static final Takes NOTHING = new Takes(Optional.empty(), Optional.empty(), false);
}
