package org.wardon.cli;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.wardon.errors.Progress;
import picocli.CommandLine.Help;

/** Where answers and messages go: colour only on a terminal, progress only on long work. */
final class Terminal {
    private static final long QUIET_NANOS = 2_000_000_000L;

    private final PrintStream out;
    private final PrintStream err;
    private final boolean colour;

    private Terminal(PrintStream out, PrintStream err, boolean colour) {
        this.out = out;
        this.err = err;
        this.colour = colour;
    }

    /** Returns the terminal of this process, speaking UTF-8. */
    static Terminal ofProcess() {
        return new Terminal(
                new PrintStream(System.out, true, StandardCharsets.UTF_8),
                new PrintStream(System.err, true, StandardCharsets.UTF_8),
                Help.Ansi.AUTO.enabled());
    }

    PrintStream out() {
        return out;
    }

    PrintStream err() {
        return err;
    }

    String bold(String text) {
        return colour ? "\u001b[1m" + text + "\u001b[0m" : text;
    }

    /** Returns progress that keeps silent for two seconds, then shows one line on stderr. */
    Progress progress() {
        long start = System.nanoTime();
        if (!colour) {
            return Progress.SILENT;
        }
        return (stage, fraction) -> {
            if (System.nanoTime() - start > QUIET_NANOS) {
                err.print(String.format(Locale.ROOT, "\r%-24s %3.0f %%", stage, 100 * fraction));
                err.flush();
                if (fraction >= 1) {
                    err.print("\r" + " ".repeat(32) + "\r");
                }
            }
        };
    }
}
