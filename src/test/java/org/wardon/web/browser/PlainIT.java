package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.Cookie;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.MethodOrderer;
import org.junit.jupiter.api.Order;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestMethodOrder;

/** Every page in a browser that runs no script: read, asked, changed and taken back. */
@TestMethodOrder(MethodOrderer.OrderAnnotation.class)
class PlainIT extends InBrowser {
    private static final int PATIENCE_MS = 120_000;
    private static final int CURVES = 5;
    private static final String ALL = "/placing?wish=most-value&move=all";

    /** What is printed in a source stays as it is printed, and a choice of units names both. */
    private static final Pattern QUOTED =
            Pattern.compile("<(span|dd) class=\"(source|hint)\">(printed as )?[^<]*</\\1>|<[^>]*>");

    private static final Pattern METRIC =
            Pattern.compile(".{0,40}(°C|\\d[\\s\u202f]?kg\\b).{0,20}");

    private String plan = "";
    private String changed = "";

    @Override
    boolean scripted() {
        return false;
    }

    @BeforeAll
    void openDemo() {
        plan = demo();
    }

    private Page plain(String path) {
        Page page = tab(DESK);
        page.setDefaultTimeout(PATIENCE_MS);
        page.navigate(address() + path);
        return page;
    }

    @Test
    @Order(1)
    void theNumbersAndCurvesOfAChamberAreSeen() {
        Page page = plain(plan);
        assertTrue(page.locator(".hours table:visible").count() == 3, "tables are folded away");
        page.navigate(address() + plan + "/chamber/cold");
        page.waitForSelector("#what");
        assertEquals(CURVES, page.locator(".plain-curve svg:visible").count());
        assertEquals(CURVES, page.locator(".curve table:visible").count());
        page.fill("#setting", "4");
        page.click("#what button.main");
        page.waitForSelector("#what-answer table");
        picture(page, "plain-chamber");
        page.close();
    }

    @Test
    @Order(2)
    void allIsToldInFahrenheitPoundsAndWithCommas() {
        Page page = tab(DESK);
        page.context()
                .addCookies(
                        List.of(
                                new Cookie("wardon-preferences", "f.lb.comma.auto")
                                        .setUrl(address())));
        for (String path :
                List.of(
                        "",
                        "/chamber/cold?setting=39,2",
                        "/chamber/shed",
                        "/door?crop=mango&mass=1100&pulp=86",
                        ALL,
                        "/sharing?lots=BAN1&lots=LET1&crops=mango=3",
                        "/edit",
                        "/edit?at=$.lots[0]",
                        "/edit?at=$.chambers[1]",
                        "/edit?at=$.chambers[1].cooling[0]",
                        "/edit?at=$.weather")) {
            String told = toldWithoutMetric(page, plan + path);
            assertTrue(
                    told.contains("°F") || told.contains("lb") || path.startsWith("/edit"), path);
        }
        String crop = toldWithoutMetric(page, "/crops/mango");
        assertTrue(crop.contains("°F") && crop.contains(" lb"), "a crop in °F and lb");
        page.context().clearCookies();
        page.close();
    }

    private String toldWithoutMetric(Page page, String path) {
        String told = told(page, path);
        Matcher metric = METRIC.matcher(told);
        assertFalse(metric.find(), () -> path + ": " + metric.group());
        return told;
    }

    /** The text of a page when it waits for nothing more, without what is quoted. */
    private String told(Page page, String path) {
        long end = System.currentTimeMillis() + PATIENCE_MS;
        String html = "";
        do {
            html = page.request().get(address() + path).text();
            page.waitForTimeout(200);
        } while (html.contains("http-equiv=\"refresh\"") && System.currentTimeMillis() < end);
        return QUOTED.matcher(html).replaceAll(" ");
    }

    /** The plan the next tests change. */
    private String changed() {
        if (changed.isEmpty()) {
            changed = ownDemo();
        }
        return changed;
    }

    @Test
    @Order(3)
    void aPlacingIsSoughtTakenOverAndTakenBack() {
        Page page = plain(changed() + "/placing");
        page.check("input[name=wish][value=most-value]");
        page.click(".wishes button.main");
        page.waitForSelector("#gain");
        page.click(".walk button.main");
        page.waitForURL(address() + changed());
        assertTrue(page.locator(".saved").textContent().contains("placing taken over"));
        page.click(".steps button:not([disabled])");
        page.waitForSelector(".saved:has-text('version 1')");
        page.close();
    }

    @Test
    @Order(4)
    void aLotIsAskedAboutAndTakenIn() {
        Page page = plain(changed() + "/door");
        page.fill("#crop", "mango");
        page.fill("#mass", "500");
        page.fill("#pulp", "30");
        page.click(".door-form button.main");
        page.waitForSelector("#answer-title");
        page.click(".door-choice form:has(input[value=fruit]) button");
        page.waitForURL(address() + changed());
        assertTrue(page.locator(".saved").textContent().contains("put into fruit"));
        page.navigate(address() + changed() + "/chamber/fruit?setting=11#what");
        assertEquals(1, page.locator("meta[http-equiv=refresh]").count(), "nothing to wait for");
        page.waitForSelector("#what-answer table");
        page.close();
    }

    @Test
    @Order(5)
    void aLotIsChangedAndPreferencesAreKept() {
        Page page = plain(changed() + "/edit?at=$.lots[0]");
        page.fill("#p-lots-0-massKg", "871");
        page.locator("button.main").first().click();
        page.waitForSelector("#p-lots-0-massKg");
        assertEquals("871", page.inputValue("#p-lots-0-massKg"));
        page.navigate(address() + "/preferences");
        page.check("input[name=mass][value=lb]");
        page.click("main form button.main");
        page.waitForURL(url -> !url.endsWith("/preferences"));
        page.navigate(address() + changed() + "/edit?at=$.lots[0]");
        assertEquals("1920", page.inputValue("#p-lots-0-massKg"));
        page.close();
    }
}
