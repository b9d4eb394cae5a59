package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.web.browser.Absent;
import org.wardon.web.guard.ApiSecret;

/** A client that knows nothing of us builds its calls from the document and uses them. */
class ApiByOthersTest {
    private static final Path HERE = Path.of("src/test/resources/client").toAbsolutePath();
    private static final Path PLANS = Path.of("src/test/resources/plans/api").toAbsolutePath();

    @TempDir Path home;

    @Test
    void aGeneralClientUsesTheInterfaceByItsDocumentAlone() throws Exception {
        Absent.nodeOrHere();
        try (WebServer server =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()))) {
            String secret = Files.readString(home.resolve(ApiSecret.FILE)).strip();
            assertEquals(
                    "",
                    run(server.url(), secret).strip().replaceAll("\\d+ operations, 12 asked", ""));
        }
    }

    private static String run(String url, String secret) throws IOException, InterruptedException {
        Process client =
                new ProcessBuilder(
                                List.of(
                                        Absent.node(),
                                        HERE.resolve("use-api.cjs").toString(),
                                        HERE.resolve("swagger-client.browser.min.js").toString(),
                                        url,
                                        secret,
                                        PLANS.resolve("plan.json").toString(),
                                        PLANS.resolve("weather.csv").toString()))
                        .redirectErrorStream(true)
                        .start();
        String told = new String(client.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(client.waitFor(60, TimeUnit.SECONDS), told);
        assertEquals(0, client.exitValue(), told);
        return told;
    }
}
