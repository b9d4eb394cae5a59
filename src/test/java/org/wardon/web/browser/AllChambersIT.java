package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The first page a keeper sees: every chamber with its sentence, its days and its lots. */
class AllChambersIT extends InBrowser {
    private static final int DAYS = 10;

    private String plan = "";

    @BeforeAll
    void openDemo() {
        Page empty = show("/plans", PHONE);
        hold(empty, "plans-empty");
        empty.close();
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
