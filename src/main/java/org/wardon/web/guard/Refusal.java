package org.wardon.web.guard;

import java.util.List;

/** A request that is not answered as asked. Its words stand under {@code refusal.CODE}. */
public final class Refusal extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final int status;
    private final String code;
    private final transient List<String> arguments;

    /**
     * Refuses.
     *
     * @param status HTTP status
     * @param code what happened, a key of the words
     * @param arguments what fills the words
     */
    public Refusal(int status, String code, String... arguments) {
        super(code, null, false, false);
        this.status = status;
        this.code = code;
        this.arguments = List.of(arguments);
    }

    /**
     * Returns the status.
     *
     * @return HTTP status
     */
    public int status() {
        return status;
    }

    /**
     * Returns what happened.
     *
     * @return a key of the words
     */
    public String code() {
        return code;
    }

    /**
     * Returns what fills the words.
     *
     * @return in order
     */
    public List<String> arguments() {
        return arguments;
    }
}
