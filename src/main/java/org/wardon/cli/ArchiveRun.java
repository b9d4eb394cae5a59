package org.wardon.cli;

import java.io.IOException;
import java.io.InputStream;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import org.wardon.web.WebOptions;
import org.wardon.web.WebServer;

/**
 * What the build runs once to learn which classes a long answer and the pages need; the machine
 * that runs it writes them into the archive that {@link Launcher} hands on.
 */
final class ArchiveRun {
    private static final int MOST_LOOKS = 600;
    private static final long BETWEEN_LOOKS_MS = 200;

    private ArchiveRun() {}

    /**
     * Advises on a plan, then serves its pages and looks at them.
     *
     * @param args the plan, and a new folder for the keeper's own file
     * @throws IOException where a page cannot be read
     * @throws InterruptedException where the build is stopped
     */
    public static void main(String[] args) throws IOException, InterruptedException {
        String plan = args[0];
        Path home = Files.createTempDirectory(Path.of(args[1]), "archived-home");
        int status = Main.run("advise", plan);
        WebOptions options =
                new WebOptions("127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC());
        try (WebServer server = WebServer.start(options)) {
            String chambers = server.url() + server.bring(Path.of(plan));
            look(server.url() + "/plans");
            for (int i = 0; i < MOST_LOOKS && look(chambers).contains("data-progress"); i++) {
                Thread.sleep(BETWEEN_LOOKS_MS);
            }
            look(server.url() + "/crops");
            look(chambers + "/edit");
        }
        System.exit(status);
    }

    private static String look(String page) throws IOException {
        try (InputStream in = URI.create(page).toURL().openStream()) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
