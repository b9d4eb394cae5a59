package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.FilePayload;
import com.microsoft.playwright.options.Media;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.web.ManyLots;

/** The first page a keeper sees: every chamber with its sentence, its days and its lots. */
class AllChambersIT extends InBrowser {
    private static final int DAYS = 10;
    private static final int PAPER = 700;
    private static final int LOTS = 36;

    /** Lots a part of their list. */
    private static final int PART = 30;

    private String plan = "";

    @BeforeAll
    void openDemo(@TempDir Path home) {
        try (Served fresh = Served.from(home)) {
            Page empty = tab(PHONE);
            empty.navigate(fresh.address() + "/plans");
            hold(empty, "plans-empty");
            empty.close();
        }
        plan = demo();
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void everyChamberLeadsWithItsSentence(int width) {
        Page page = show(plan, width);
        assertEquals("Wardon", page.locator(".mark span").textContent());
        Locator chambers = page.locator("section.chamber");
        assertEquals(3, chambers.count());
        for (int i = 0; i < chambers.count(); i++) {
            Locator chamber = chambers.nth(i);
            assertTrue(!chamber.locator("h2 .verdict").textContent().isBlank());
            String told = chamber.locator(".strip > svg").getAttribute("aria-label");
            assertTrue(told.contains("set to"), told);
        }
        hold(page, "chambers");
        page.close();
    }

    @Test
    void keysAloneReachTheMainPart() {
        Page page = show(plan, DESK);
        page.keyboard().press("Tab");
        assertEquals("skip", page.evaluate("() => document.activeElement.className"));
        page.keyboard().press("Enter");
        assertEquals("main", page.evaluate("() => document.activeElement.id"));
        page.close();
    }

    /** A sheet of A4 between its margins is about 700 px wide. */
    @ParameterizedTest
    @ValueSource(strings = {"", "/chamber/cold", "/edit", "/door?crop=mango&mass=500&pulp=30"})
    void onPaperAllIsOpenAndNothingIsToBePressed(String path) {
        Page page = show(plan + path, PAPER);
        page.waitForSelector(".verdict, .plan-form, #answer-title");
        page.emulateMedia(new Page.EmulateMediaOptions().setMedia(Media.PRINT));
        assertEquals(0, page.locator("nav:visible, button:visible, canvas:visible").count());
        assertTrue(page.locator(".plan-name:visible").textContent().contains("Heron Quay"));
        assertTrue(page.locator(".on-paper:visible").textContent().endsWith("UTC"));
        if (path.isEmpty()) {
            assertEquals(3, page.locator(".verdict:visible").count());
            assertEquals(3, page.locator(".hours table:visible").count());
            assertEquals(
                    page.locator(".caution").count(), page.locator(".caution:visible").count());
        } else if (path.startsWith("/chamber")) {
            assertEquals(5, page.locator(".plain-curve svg:visible").count());
        }
        Object cut =
                page.evaluate(
                        "() => [...document.querySelectorAll('table, svg, figure')].filter(one =>"
                                + " one.getBoundingClientRect().right > innerWidth + 1).length");
        assertEquals(0, cut, "cut off at the right");
        page.close();
    }

    /**
     * Lists of a store of many lots, part by part; what leads the page of all chambers is short.
     */
    @Test
    void longListsAreGoneThroughPartByPart() {
        String many = brought("many.json", ManyLots.plan(LOTS, 1));
        for (int width : List.of(PHONE, DESK)) {
            Page page = show(many, width);
            page.waitForSelector("section.chamber");
            page.click(".cautions .more-of a:text('All cautions')");
            page.waitForURL("**/cautions");
            hold(page, "list-cautions");
            for (String list : List.of("notes", "actions", "chamber/root/company")) {
                page.navigate(address() + many + "/" + list);
                assertTrue(page.locator(".sentences li").count() > 1, list);
                hold(page, "list-" + list.replaceAll(".*/", ""));
            }
            page.navigate(address() + many + "/lots");
            assertEquals(PART, page.locator(".lot").count());
            page.locator(".parts a:text('" + (PART + 1) + " to ')").first().click();
            page.waitForURL("**from=" + (PART + 1) + "*");
            assertEquals(LOTS - PART, page.locator(".lot").count());
            hold(page, "list-lots");
            page.close();
        }
    }

    private String brought(String name, String text) {
        Page page = show("/plans", DESK);
        page.setInputFiles(
                "input[name=plan]",
                new FilePayload(name, "application/json", text.getBytes(StandardCharsets.UTF_8)));
        page.click("form[action='/plans/bring'] button");
        page.waitForURL("**/plan/*");
        String path = page.url().substring(address().length());
        page.close();
        return path;
    }

    @Test
    void aLongForecastStopsWhenToldAndGoesOnWhenWished() throws IOException {
        String years =
                Files.readString(Path.of("src/test/resources/plans/minimal/plan.json"))
                        .replace("\"days\": 2,", "\"days\": 1830,");
        Page page = show("/plans", DESK);
        page.setInputFiles(
                "input[name=plan]",
                new FilePayload(
                        "years.json", "application/json", years.getBytes(StandardCharsets.UTF_8)));
        page.click("form[action='/plans/bring'] button");
        page.waitForSelector(".progress");
        page.click(".progress button");
        Locator told = page.locator(".notice");
        told.waitFor();
        assertTrue(told.textContent().contains("was stopped before it was ready"));
        told.locator("button").click();
        page.waitForSelector(".progress");
        page.click(".progress button");
        told.waitFor();
        page.close();
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void pagesBesideThePlanAreHeldToo(int width) {
        for (String path : new String[] {"/api", "/preferences"}) {
            Page page = show(path, width);
            hold(page, path.substring(1));
            page.close();
        }
    }

    @Test
    void aChartHasItsTableBehindIt() {
        Page page = show(plan, DESK);
        Locator chart = page.locator("details:has([data-chart])").first();
        chart.locator("summary").first().click();
        page.waitForSelector("[data-chart] canvas");
        assertEquals(DAYS, chart.locator(".scroll tbody tr").count());
        picture(page, "chart-open");
        page.close();
    }
}
