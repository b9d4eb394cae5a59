package org.wardon.cli;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Where the program starts. Long answers get a Java machine of their own, set up for them: the
 * classes read from an archive that the build made, the quick compiler alone, and a collector that
 * keeps the heap near what is in use. One store then takes half the time, and a year of twelve lots
 * half of what the machine's own choice of heap would take. Short answers, and whoever gives the
 * machine options of their own, stay in the machine that is there. The decision is written down as
 * 0002.
 */
public final class Launcher {
    /** Verbs that compute for seconds. */
    private static final Set<String> LONG =
            Set.of("advise", "compare", "demo", "place", "receive", "section", "open");

    static final List<String> MACHINE =
            List.of("-XX:+UseSerialGC", "-Xms64m", "-XX:TieredStopAtLevel=1");

    /** Options from here hold for every machine of the user. */
    private static final List<String> USERS_OPTIONS =
            List.of("JAVA_TOOL_OPTIONS", "JDK_JAVA_OPTIONS", "_JAVA_OPTIONS");

    private static final String STARTED_BY = "wardon.startedBy";
    private static final int KILLED = 137;

    private Launcher() {}

    /**
     * Runs one command and ends the process with its exit status.
     *
     * @param args the words typed
     */
    public static void main(String[] args) {
        String parent = System.getProperty(STARTED_BY);
        if (parent != null) {
            endWith(Long.parseLong(parent));
        } else if (args.length > 0 && LONG.contains(args[0])) {
            Optional<List<String>> command = command(System.getenv(), args);
            if (command.isPresent() && handedOn(command.get())) {
                return;
            }
        }
        Main.main(args);
    }

    /** Ends this machine when the one that started it is gone, killed perhaps. */
    private static void endWith(long parent) {
        Thread watch =
                new Thread(
                        () -> {
                            ProcessHandle.of(parent).ifPresent(it -> it.onExit().join());
                            Runtime.getRuntime().halt(KILLED);
                        },
                        "watch");
        watch.setDaemon(true);
        watch.start();
    }

    /** The command of a machine for a long answer; empty where the user chose the options. */
    private static Optional<List<String>> command(Map<String, String> environment, String[] args) {
        Optional<Path> jar = jar();
        boolean plain =
                ProcessHandle.current()
                        .info()
                        .arguments()
                        .map(given -> given.length > 0 && given[0].equals("-jar"))
                        .orElse(false);
        if (jar.isEmpty() || !plain || USERS_OPTIONS.stream().anyMatch(environment::containsKey)) {
            return Optional.empty();
        }
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(MACHINE);
        Path archive = jar.get().resolveSibling("wardon.jsa");
        if (Files.isReadable(archive)) {
            // An archive of another build or machine is passed over without a word.
            command.addAll(List.of("-XX:SharedArchiveFile=" + archive, "-Xlog:disable"));
        }
        command.add("-D" + STARTED_BY + "=" + ProcessHandle.current().pid());
        command.addAll(List.of("-jar", jar.get().toString()));
        command.addAll(List.of(args));
        return Optional.of(command);
    }

    /** The packed program, where it was started from one. */
    private static Optional<Path> jar() {
        @Nullable String path = System.getProperty("java.class.path");
        return path == null || path.contains(File.pathSeparator) || !path.endsWith(".jar")
                ? Optional.empty()
                : Optional.of(Path.of(path).toAbsolutePath().normalize());
    }

    /** Runs the command and ends with its status; false where it cannot be started. */
    private static boolean handedOn(List<String> command) {
        try {
            Process machine = new ProcessBuilder(command).inheritIO().start();
            Runtime.getRuntime().addShutdownHook(new Thread(machine::destroy));
            System.exit(machine.waitFor());
            return true;
        } catch (IOException e) {
            // No second process is allowed here: the answer comes slower from this one.
            return false;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }
}
