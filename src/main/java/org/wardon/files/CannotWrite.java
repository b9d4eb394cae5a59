package org.wardon.files;

import org.wardon.errors.Fault;

/**
 * A file that was to be written could not be; nothing stands under its final name because of it.
 */
public final class CannotWrite extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Fault fault;

    /**
     * Reports the file.
     *
     * @param fault the file, what happened, what to do
     * @param cause what the system said
     */
    CannotWrite(Fault fault, Throwable cause) {
        super(fault.sentence(), cause);
        this.fault = fault;
    }

    /**
     * Returns what happened.
     *
     * @return the file, what happened, what to do
     */
    public Fault fault() {
        return fault;
    }
}
