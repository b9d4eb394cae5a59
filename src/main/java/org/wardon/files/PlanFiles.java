package org.wardon.files;

import java.util.Map;

/** The files a plan may name, from wherever they are kept. */
@FunctionalInterface
public interface PlanFiles {
    /** Largest file read, MB. */
    int LARGEST_MB = 64;

    /**
     * Looks for a file.
     *
     * @param name its name as the plan gives it
     * @return its text, or why there is none
     */
    Found find(String name);

    /** What was found under a name. */
    sealed interface Found {}

    /**
     * A file.
     *
     * @param text its text
     * @param shown its name in messages
     */
    record Text(String text, String shown) implements Found {}

    /**
     * No file that may be read.
     *
     * @param what what is wrong with the name
     * @param accepted what is accepted
     */
    record Absent(String what, String accepted) implements Found {}

    /**
     * Returns files that are kept beside the plan.
     *
     * @param texts their texts by name
     * @return the files
     */
    static PlanFiles attached(Map<String, String> texts) {
        Map<String, String> kept = Map.copyOf(texts);
        return name -> {
            String text = kept.get(name);
            return text == null
                    ? new Absent(
                            "the file '" + name + "' is not attached",
                            "accepted: a file kept with the plan; attach it under this name")
                    : new Text(text, name);
        };
    }
}
