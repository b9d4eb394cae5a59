package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Playwright;
import com.microsoft.playwright.options.ColorScheme;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;

/**
 * Pages in Chromium, on a phone and on a desk, from the packed program. Every test ends with the
 * browser having complained of nothing.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
public abstract class InBrowser {
    /** Width of a phone, px. */
    protected static final int PHONE = 360;

    /** Width of a desk, px. */
    protected static final int DESK = 1440;

    private static final int HEIGHT = 900;
    private static final Path PICTURES = Path.of("target/screenshots");

    /** Rules of WCAG 2.2 to level AA. */
    private static final String RULES =
            "['wcag2a','wcag2aa','wcag21a','wcag21aa','wcag22aa','best-practice']";

    private final List<String> complaints = new ArrayList<>();
    private @Nullable Served served;
    private @Nullable Playwright playwright;
    private @Nullable BrowserContext browser;

    @BeforeAll
    void start(@TempDir Path home, @TempDir Path profile) {
        Absent.orHere();
        served = Served.from(home);
        Map<String, String> driver =
                Map.of(
                        "PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD",
                        "1",
                        "PLAYWRIGHT_NODEJS_PATH",
                        Absent.NODE.toString());
        playwright = Playwright.create(new Playwright.CreateOptions().setEnv(driver));
        browser = playwright.chromium().launchPersistentContext(profile, options(scripted()));
        browser.onConsoleMessage(
                message -> {
                    if (List.of("error", "warning").contains(message.type())) {
                        complaints.add(message.text());
                    }
                });
        browser.onWebError(error -> complaints.add(error.error()));
    }

    /** Whether pages may run scripts. */
    boolean scripted() {
        return true;
    }

    private static BrowserType.LaunchPersistentContextOptions options(boolean scripted) {
        return new BrowserType.LaunchPersistentContextOptions()
                .setExecutablePath(Absent.CHROMIUM)
                .setHeadless(true)
                .setJavaScriptEnabled(scripted)
                .setChromiumSandbox(false)
                .setArgs(
                        List.of(
                                "--no-sandbox",
                                "--disable-gpu",
                                "--disable-quic",
                                "--no-first-run",
                                "--disable-background-networking",
                                "--disable-component-update",
                                "--disable-sync"));
    }

    @AfterAll
    void stop() {
        if (playwright != null) {
            playwright.close();
        }
        if (served != null) {
            served.close();
        }
    }

    @AfterEach
    void complainedOfNothing() {
        assertEquals(List.of(), complaints);
    }

    /** The address of the program. */
    protected String address() {
        return Objects.requireNonNull(served).address();
    }

    /** A new tab of this width. */
    protected Page tab(int width) {
        Page page = Objects.requireNonNull(browser).newPage();
        page.setViewportSize(width, HEIGHT);
        return page;
    }

    /** Shows a path in a new tab of this width. */
    protected Page show(String path, int width) {
        Page page = tab(width);
        page.navigate(address() + path);
        return page;
    }

    /** Opens the demo by its one press and waits for its forecast; returns the path of its plan. */
    protected String demo() {
        Page page = show("/plans", DESK);
        page.click("form[action='/plans/demo'] button");
        page.waitForSelector("section.chamber .strip");
        String path = page.url().substring(address().length());
        page.close();
        return path;
    }

    /**
     * Holds a page against the rules: nothing wider than the screen, no breach of accessibility in
     * light and dark; keeps a picture of it in both.
     */
    protected void hold(Page page, String name) {
        int width = page.viewportSize().width;
        Object wide =
                page.evaluate(
                        "() => document.documentElement.scrollWidth"
                                + " - document.documentElement.clientWidth");
        assertEquals(0, ((Number) wide).intValue(), name + " is wider than " + width + " px");
        for (ColorScheme scheme : List.of(ColorScheme.LIGHT, ColorScheme.DARK)) {
            page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(scheme));
            String shade = scheme == ColorScheme.LIGHT ? "light" : "dark";
            picture(page, name + "-" + width + "-" + shade);
            assertEquals("", breaches(page), name + " at " + width + " px, " + shade);
        }
        page.emulateMedia(new Page.EmulateMediaOptions().setColorScheme(ColorScheme.LIGHT));
    }

    /** Keeps a picture of the whole page. */
    protected void picture(Page page, String name) {
        page.screenshot(
                new Page.ScreenshotOptions()
                        .setFullPage(true)
                        .setPath(PICTURES.resolve(name + ".png")));
    }

    private static String breaches(Page page) {
        page.evaluate(axe());
        Object found =
                page.evaluate(
                        "() => axe.run(document, {runOnly: "
                                + RULES
                                + "}).then(done => done.violations.map(one => one.id + ': ' +"
                                + " one.nodes.map(node => node.target.join(' ') + ' (' +"
                                + " node.failureSummary + ')').join('; ')).join('\\n'))");
        return String.valueOf(found);
    }

    private static String axe() {
        try (InputStream in = InBrowser.class.getResourceAsStream("/axe.min.js")) {
            assertTrue(in != null, "axe.min.js is not on the class path");
            return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
