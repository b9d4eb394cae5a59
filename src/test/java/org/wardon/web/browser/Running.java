package org.wardon.web.browser;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Playwright;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * The packed program and the browser that all classes of one test machine look at, started by the
 * first and ended with the machine: starting both takes longer than most tests.
 */
final class Running {
    private static @Nullable Running here;

    private final Path home;
    private final Served served;
    private final Playwright playwright;
    private final Browser browser;
    private @Nullable String demo;

    private Running() throws IOException {
        home = Files.createTempDirectory("wardon-browsed");
        served = Served.from(home);
        Map<String, String> driver =
                Map.of(
                        "PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD",
                        "1",
                        "PLAYWRIGHT_NODEJS_PATH",
                        Absent.NODE.toString());
        playwright = Playwright.create(new Playwright.CreateOptions().setEnv(driver));
        browser =
                playwright
                        .chromium()
                        .launch(
                                new BrowserType.LaunchOptions()
                                        .setExecutablePath(Absent.CHROMIUM)
                                        .setHeadless(true)
                                        .setChromiumSandbox(false)
                                        .setArgs(
                                                List.of(
                                                        "--no-sandbox",
                                                        "--disable-gpu",
                                                        "--disable-quic",
                                                        "--no-first-run",
                                                        "--disable-background-networking",
                                                        "--disable-component-update",
                                                        "--disable-sync")));
    }

    /** Both, started where they are not. */
    static synchronized Running here() {
        if (here == null) {
            try {
                here = new Running();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
            Runtime.getRuntime().addShutdownHook(new Thread(here::end));
        }
        return here;
    }

    String address() {
        return served.address();
    }

    Browser browser() {
        return browser;
    }

    /** The path of the one demo nobody changes. */
    String demo(Supplier<String> opened) {
        if (demo == null) {
            demo = opened.get();
        }
        return demo;
    }

    private void end() {
        playwright.close();
        served.close();
        try (Stream<Path> left = Files.walk(home)) {
            left.sorted(Comparator.reverseOrder()).forEach(file -> file.toFile().delete());
        } catch (IOException e) {
            // What is left lies among the temporary files.
        }
    }
}
