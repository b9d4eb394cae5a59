package org.wardon.cli;

import static java.util.stream.Collectors.joining;

import java.io.PrintStream;
import java.util.List;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.RunStopped;
import org.wardon.files.CannotWrite;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import picocli.CommandLine.UnmatchedArgumentException;

/** The program: reads the words typed and hands them to a verb. */
@Command(
        name = "wardon",
        mixinStandardHelpOptions = true,
        versionProvider = Version.class,
        synopsisSubcommandLabel = "VERB",
        description = {
            "Advice for people who keep other people's harvest cool: which crops may share a"
                    + " chamber, what to set, whether it holds, how many days each lot has left and"
                    + " why."
        },
        footer = {
            "",
            "Exit status: 0 done; 2 input that cannot be used, nothing written; 3 a run met a state"
                    + " that cannot be; 4 a result could not be written.",
            "Wardon advises; local codes and licensed practice decide."
        })
public final class Main implements Runnable {
    private static final List<Class<?>> VERBS =
            List.of(
                    Advise.class,
                    Receive.class,
                    Keep.class,
                    Share.class,
                    Place.class,
                    Look.class,
                    Why.class,
                    Section.class,
                    Compare.class,
                    Size.class,
                    SchemaVerb.class,
                    Demo.class,
                    Open.class);

    @Spec private CommandSpec spec = CommandSpec.create();

    /** Made by the command line. */
    public Main() {}

    /**
     * Runs one command and ends the process with its exit status.
     *
     * @param args the words typed
     */
    public static void main(String[] args) {
        System.exit(run(args));
    }

    /**
     * Runs one command.
     *
     * @param args the words typed
     * @return exit status, see {@code --help}
     */
    static int run(String... args) {
        Terminal terminal = Terminal.ofProcess();
        CommandLine line = new CommandLine(new Main());
        verbsFor(args).forEach(verb -> line.addSubcommand(verb));
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.setParameterExceptionHandler((fault, words) -> misused(fault, terminal.err()));
        line.setExecutionExceptionHandler((fault, command, parsed) -> failed(fault, terminal));
        int status = line.execute(args);
        if (status == Exit.OK && System.out.checkError()) {
            terminal.err()
                    .println(
                            "wardon: standard output: not all of the answer could be written;"
                                    + " free some space, or let the reader read to the end");
            return Exit.CANNOT_WRITE;
        }
        return status;
    }

    /** The verb asked for alone, as reading all of them takes longer than many answers. */
    private static List<Class<?>> verbsFor(String... args) {
        List<Class<?>> asked =
                VERBS.stream()
                        .filter(verb -> args.length > 0 && name(verb).equals(args[0]))
                        .toList();
        return asked.isEmpty() ? VERBS : asked;
    }

    private static String name(Class<?> verb) {
        return verb.getAnnotation(Command.class).name();
    }

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "no verb is given");
    }

    private static int misused(ParameterException fault, PrintStream err) {
        String verb = fault.getCommandLine().getCommandSpec().qualifiedName();
        err.println("wardon: " + message(fault) + "; see '" + verb + " --help'");
        return Exit.BAD_INPUT;
    }

    private static String message(ParameterException fault) {
        boolean noSuchVerb =
                fault.getCommandLine().getParent() == null
                        && fault instanceof UnmatchedArgumentException unmatched
                        && !unmatched.isUnknownOption();
        if (noSuchVerb) {
            UnmatchedArgumentException unmatched = (UnmatchedArgumentException) fault;
            List<String> near = unmatched.getSuggestions();
            return "no verb is called '"
                    + unmatched.getUnmatched().get(0)
                    + "'"
                    + (near.isEmpty() ? "" : "; perhaps " + String.join(", ", near));
        }
        return String.valueOf(fault.getMessage())
                .lines()
                .collect(joining(" "))
                .replaceFirst("^Error: ", "")
                .replace("is not a double", "is not a number");
    }

    private static int failed(Exception fault, Terminal terminal) {
        if (fault instanceof BadInput bad) {
            for (Fault one : bad.faults()) {
                terminal.err().println("wardon: " + one.sentence());
            }
            return Exit.BAD_INPUT;
        }
        if (fault instanceof RunStopped stopped) {
            terminal.err()
                    .println(
                            "wardon: the run stopped at a state that cannot be: "
                                    + stopped.getMessage()
                                    + "; check the plan's figures for this chamber");
            return Exit.RUN_STOPPED;
        }
        if (fault instanceof CannotWrite unwritten) {
            terminal.err().println("wardon: " + unwritten.fault().sentence());
            return Exit.CANNOT_WRITE;
        }
        terminal.err().println("wardon: a fault of the program itself, please report it:");
        fault.printStackTrace(terminal.err());
        return Exit.INTERNAL;
    }
}
