package org.wardon.files.json;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;

/** Collects the faults of one input, so that all are told at once and each mistake once. */
public final class Faults {
    private final String file;
    private final List<Fault> found = new ArrayList<>();
    private final Set<String> paths = new HashSet<>();

    /**
     * Starts empty.
     *
     * @param file the file as the person named it
     */
    public Faults(String file) {
        this.file = file;
    }

    /**
     * Adds a fault, unless one stands at that path already.
     *
     * @param path where
     * @param what what is wrong
     * @param accepted what is accepted
     */
    public void add(String path, String what, String accepted) {
        if (paths.add(path)) {
            found.add(new Fault(file, path, what, accepted));
        }
    }

    /**
     * Adds the faults of another file this one names.
     *
     * @param others its faults
     */
    public void addAll(List<Fault> others) {
        found.addAll(others);
    }

    /**
     * Returns whether a fault stands at a path or below it.
     *
     * @param path a path
     * @return true if so
     */
    public boolean at(String path) {
        return paths.stream()
                .anyMatch(
                        other ->
                                other.equals(path)
                                        || other.startsWith(path + ".")
                                        || other.startsWith(path + "["));
    }

    /**
     * Returns all faults.
     *
     * @return in the order found
     */
    public List<Fault> list() {
        return List.copyOf(found);
    }

    /**
     * Refuses the input if there is any fault.
     *
     * @throws BadInput with all of them
     */
    public void refuseIfAny() {
        if (!found.isEmpty()) {
            throw new BadInput(found);
        }
    }
}
