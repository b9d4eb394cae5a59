package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import com.microsoft.playwright.options.ScreenshotAnimations;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.TestInstance;

/**
 * Pages in Chromium, on a phone and on a desk, from the packed program. Every test ends with the
 * browser having complained of nothing. Program and browser are those of {@link Running}; each
 * class has windows, cookies and a session of its own.
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

    private static final String AXE = axe();

    private final List<String> complaints = new ArrayList<>();
    private @Nullable Running running;
    private @Nullable BrowserContext windows;

    @BeforeAll
    void start() {
        Absent.orHere();
        running = Running.here();
        windows =
                running.browser()
                        .newContext(
                                new Browser.NewContextOptions().setJavaScriptEnabled(scripted()));
        windows.onConsoleMessage(
                message -> {
                    if (List.of("error", "warning").contains(message.type())) {
                        complaints.add(message.text());
                    }
                });
        windows.onWebError(error -> complaints.add(error.error()));
    }

    /** Whether pages may run scripts. */
    boolean scripted() {
        return true;
    }

    @AfterAll
    void stop() {
        if (windows != null) {
            windows.close();
        }
    }

    @AfterEach
    void complainedOfNothing() {
        assertEquals(List.of(), complaints);
    }

    /** The address of the program. */
    protected String address() {
        return Objects.requireNonNull(running).address();
    }

    /** A new tab of this width. */
    protected Page tab(int width) {
        Page page = Objects.requireNonNull(windows).newPage();
        page.setViewportSize(width, HEIGHT);
        return page;
    }

    /** Shows a path in a new tab of this width. */
    protected Page show(String path, int width) {
        Page page = tab(width);
        page.navigate(address() + path);
        return page;
    }

    /** The path of a demo that is only looked at, its forecast ready. */
    protected String demo() {
        String path = Objects.requireNonNull(running).demo(this::ownDemo);
        Page page = show(path, DESK);
        page.waitForSelector("section.chamber .strip");
        page.close();
        return path;
    }

    /** Opens a demo by its one press and waits for its forecast; returns the path of its plan. */
    protected String ownDemo() {
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

    /** Keeps a picture of the whole page, colours that fade into others at their end. */
    protected void picture(Page page, String name) {
        page.screenshot(
                new Page.ScreenshotOptions()
                        .setFullPage(true)
                        .setAnimations(ScreenshotAnimations.DISABLED)
                        .setPath(PICTURES.resolve(name + ".png")));
    }

    private static String breaches(Page page) {
        if (page.evaluate("() => typeof axe").equals("undefined")) {
            page.evaluate(AXE);
        }
        // What passes need not be listed node by node.
        Object found =
                page.evaluate(
                        "() => axe.run(document, {resultTypes: ['violations'], runOnly: "
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
