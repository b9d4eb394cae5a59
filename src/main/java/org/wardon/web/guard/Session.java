package org.wardon.web.guard;

import java.time.Instant;
import java.util.OptionalLong;

/** One browser that is let in, until it has been silent too long. */
public final class Session {
    private final String id;
    private final String token;
    private final boolean admitted;
    private volatile Instant seen;
    private volatile OptionalLong plan = OptionalLong.empty();

    Session(String id, String token, boolean admitted, Instant now) {
        this.id = id;
        this.token = token;
        this.admitted = admitted;
        this.seen = now;
    }

    String id() {
        return id;
    }

    boolean admitted() {
        return admitted;
    }

    Instant seen() {
        return seen;
    }

    void seenAt(Instant now) {
        seen = now;
    }

    /**
     * Returns the token every form and every change must carry.
     *
     * @return the token
     */
    public String token() {
        return token;
    }

    /**
     * Returns the plan last looked at.
     *
     * @return its number
     */
    public OptionalLong plan() {
        return plan;
    }

    /**
     * Notes the plan looked at.
     *
     * @param id its number
     */
    public void lookAt(long id) {
        plan = OptionalLong.of(id);
    }
}
