package org.wardon.errors;

import java.util.List;
import java.util.stream.Collectors;

/** Input that cannot be used: every fault found in it, all at once. */
public final class BadInput extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /**
     * Refuses the input.
     *
     * @param faults all faults, at least one
     */
    public BadInput(List<Fault> faults) {
        super(faults.stream().map(Fault::sentence).collect(Collectors.joining("\n")));
        Require.that(!faults.isEmpty(), "BadInput needs at least one fault");
        this.faults = List.copyOf(faults);
    }

    /**
     * Refuses the input for one fault.
     *
     * @param file the file or word
     * @param path where in it
     * @param found what stands there
     * @param accepted what is accepted
     */
    public BadInput(String file, String path, String found, String accepted) {
        this(List.of(new Fault(file, path, found, accepted)));
    }

    /**
     * Returns the faults.
     *
     * @return all of them, in the order found
     */
    public List<Fault> faults() {
        return faults;
    }
}
