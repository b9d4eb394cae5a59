package org.wardon.web.browser;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Assumptions;
import org.junit.platform.launcher.TestExecutionListener;
import org.junit.platform.launcher.TestPlan;

/**
 * What browser tests need of the machine. Where it is absent they are passed over, and the run ends
 * with one loud line; where {@code CI} is true they fail.
 */
public final class Absent implements TestExecutionListener {
    /** The browser of Debian. */
    static final Path CHROMIUM = Path.of("/usr/bin/chromium");

    /** What drives it. */
    static final Path NODE = Path.of("/usr/bin/node");

    private static final AtomicBoolean MISSED = new AtomicBoolean();

    /** Passes over a test, or fails it in CI, where there is no browser. */
    static void orHere() {
        orHere(CHROMIUM, NODE);
    }

    /** Passes over a test, or fails it in CI, where there is no Node.js. */
    public static void nodeOrHere() {
        orHere(NODE);
    }

    /**
     * Returns what runs scripts outside a browser.
     *
     * @return its path
     */
    public static String node() {
        return NODE.toString();
    }

    private static void orHere(Path... needed) {
        Optional<Path> absent =
                Stream.of(needed).filter(file -> !Files.isExecutable(file)).findFirst();
        if (absent.isEmpty()) {
            return;
        }
        if ("true".equals(System.getenv("CI"))) {
            Assertions.fail(absent.get() + " is not installed; .ci/run installs it");
        }
        MISSED.set(true);
        Assumptions.abort(absent.get() + " is not installed");
    }

    @Override
    public void testPlanExecutionFinished(TestPlan plan) {
        if (MISSED.get()) {
            System.err.println(
                    "NOT CHECKED: the pages in a browser, or the JSON interface by another client. Install "
                            + CHROMIUM
                            + " and "
                            + NODE
                            + " (Debian: chromium, nodejs) and run the tests again.");
        }
    }
}
