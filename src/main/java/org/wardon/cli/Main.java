package org.wardon.cli;

/** Starts the program. */
public final class Main {
    private Main() {}

    /**
     * Runs one command.
     *
     * @param args the words typed
     */
    public static void main(String[] args) {
        System.out.println("wardon");
    }
}
