package org.wardon.errors;

/**
 * One mistake in what a person gave.
 *
 * @param file the file, or the word on the command line
 * @param path where in it: a JSON path, or line and column
 * @param found what stands there
 * @param accepted what is accepted, and how to mend it
 */
public record Fault(String file, String path, String found, String accepted) {
    /**
     * Returns the fault as one line for a person.
     *
     * @return file, path, what is wrong, what is accepted
     */
    public String sentence() {
        String where = path.isBlank() ? file : file + " " + path;
        return where + ": " + found + "; " + accepted;
    }
}
