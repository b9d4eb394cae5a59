package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.APIRequestContext;
import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.FormData;
import com.microsoft.playwright.options.RequestOptions;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;

/** A plan changed by its forms: every part at both widths, faults at their fields, nothing lost. */
class PlanIT extends InBrowser {
    private static final int LARGEST_PAGE = 100_000;

    private String plan = "";

    @BeforeAll
    void openDemo() {
        plan = ownDemo();
    }

    private Page part(String path, int width) {
        return show(plan + "/edit?at=" + path, width);
    }

    private static void keep(Page page) {
        page.locator("button.main").first().click();
        page.waitForLoadState();
    }

    private static String version(Page page) {
        return page.locator("input[name=version]").first().inputValue();
    }

    @ParameterizedTest(name = "{1} at {2} px")
    @CsvSource({
        "$, plan, 360",
        "$, plan, 1440",
        "$.weather, plan-weather, 360",
        "$.weather, plan-weather, 1440",
        "$.chambers[1], plan-chamber, 360",
        "$.chambers[1], plan-chamber, 1440",
        "$.chambers[1].faces[2], plan-face, 360",
        "$.chambers[1].faces[2], plan-face, 1440",
        "$.buildUps.panel-80, plan-build-up, 360",
        "$.buildUps.panel-80, plan-build-up, 1440",
        "$.chambers[1].cooling[0], plan-cooler, 360",
        "$.chambers[1].cooling[0], plan-cooler, 1440",
        "$.lots[0], plan-lot, 360",
        "$.lots[0], plan-lot, 1440"
    })
    void everyPartFitsAndIsSmall(String path, String name, int width) {
        Page page = part(path, width);
        hold(page, name);
        int size = page.content().getBytes(StandardCharsets.UTF_8).length;
        assertTrue(size <= LARGEST_PAGE, size + " bytes");
        page.close();
    }

    @Source("ISO 6946:2017: 1/(0.13 + 0.04 + 0.12/0.028 + 2 x 0.0005/50) = 0.224, from memory")
    @Test
    void theTransmittanceFollowsWhatIsTyped() {
        Page page = part("$.buildUps.panel-80", DESK);
        String kept = version(page);
        page.fill("#p-buildUps-panel-80-layers-1-thicknessMm", "120");
        page.waitForSelector("#face-sheet p:has-text('U-value 0.224 W/m2K')");
        assertTrue(page.locator("#face-sheet .face-section").isVisible());
        page.getByText("Work out, keep nothing yet").click();
        page.waitForSelector("#face-sheet p:has-text('U-value 0.224 W/m2K')");
        assertEquals(kept, version(page), "nothing is kept yet");
        assertEquals("120", page.locator("#p-buildUps-panel-80-layers-1-thicknessMm").inputValue());
        page.close();
    }

    @Test
    void aFaultStandsAtItsFieldAndTheSummaryLeadsThere() {
        Page page = part("$.chambers[1]", PHONE);
        String id = "#p-chambers-1-setting-temperatureC";
        page.fill(id, "warm");
        keep(page);
        page.waitForSelector(".faults");
        assertEquals("warm", page.locator(id).inputValue(), "what was typed is not lost");
        assertEquals(
                "is the text 'warm'; accepted: a number from -30 to 45 °C",
                page.locator(id + "-fault").textContent());
        assertEquals("true", page.locator(id).getAttribute("aria-invalid"));
        hold(page, "plan-fault");
        page.navigate(address() + plan + "/edit");
        page.locator(".faults a").first().click();
        page.waitForSelector(id);
        assertTrue(page.url().endsWith(id), page.url());
        page.fill(id, "2");
        keep(page);
        assertEquals(0, page.locator(".faults").count());
        page.close();
    }

    @Test
    void everyKindOfCoolerCanBeAddedAndTakenAway() {
        Page page = part("$.chambers[2]", DESK);
        int kinds = page.locator("#p-chambers-2-cooling button[value^='ADD']").count();
        assertTrue(kinds >= 6, kinds + " kinds");
        for (int kind = 0; kind < kinds; kind++) {
            page.locator("#p-chambers-2-cooling button[value^='ADD']").nth(kind).click();
            page.waitForURL("**cooling%5B0%5D**");
            assertTrue(page.locator(".field").count() >= 3, page.url());
            page.navigate(address() + plan + "/edit?at=$.chambers[2]");
            page.locator("button[value='REMOVE $.chambers[2].cooling[0] ']").click();
            page.waitForSelector("#p-chambers-2-cooling:not(:has(li))");
        }
        page.close();
    }

    @Test
    void lotsAreCopiedMovedAndRemoved() {
        Page page = show(plan + "/edit", DESK);
        String first = page.locator("#p-lots li a").first().textContent();
        page.locator("button[value='COPY $.lots[0] ']").click();
        page.waitForURL("**lots%5B1%5D**");
        assertEquals(first + "-2", page.locator("#p-lots-1-id").inputValue());
        page.navigate(address() + plan + "/edit");
        page.locator("button[value='UP $.lots[1] ']").click();
        page.waitForSelector("#p-lots li:first-child a:text-is('" + first + "-2')");
        page.locator("button[value='REMOVE $.lots[0] ']").click();
        page.waitForSelector("#p-lots li:first-child a:text-is('" + first + "')");
        page.close();
    }

    /** Two people change one lot; the second save is refused, shows both, and loses nothing. */
    @Test
    void aLateSaveShowsBoth() {
        Page page = part("$.lots[3]", DESK);
        String version = version(page);
        String token = page.locator("input[name=token]").first().inputValue();
        page.fill("#p-lots-3-massKg", "941");
        keep(page);
        APIRequestContext second = page.request();
        FormData typed =
                FormData.create()
                        .set("token", token)
                        .set("version", version)
                        .set("at", "$.lots[3]")
                        .set("v:$.lots[3].massKg", "811")
                        .set("v:$.lots[3].pricePerKg", "5.5");
        APIResponse late =
                second.post(address() + plan + "/edit", RequestOptions.create().setForm(typed));
        assertEquals(409, late.status());
        page.setContent(late.text());
        String table = page.locator(".notice table").innerText();
        assertTrue(table.contains("Mass\t811\t941"), table);
        assertEquals("811", page.locator("#p-lots-3-massKg").inputValue());
        assertEquals("5.5", page.locator("#p-lots-3-pricePerKg").inputValue());
        page.close();
    }

    @Test
    void americanUnitsAndADecimalCommaAreReadAndWritten() {
        Page page = part("$.chambers[0]", DESK);
        page.context()
                .addCookies(
                        java.util.List.of(
                                new com.microsoft.playwright.options.Cookie(
                                                "wardon-preferences", "f.lb.comma.auto")
                                        .setUrl(address())));
        page.reload();
        assertEquals("55,4", page.locator("#p-chambers-0-setting-temperatureC").inputValue());
        page.fill("#p-chambers-0-setting-temperatureC", "50,9");
        keep(page);
        assertEquals("50,9", page.locator("#p-chambers-0-setting-temperatureC").inputValue());
        page.context()
                .clearCookies(
                        new com.microsoft.playwright.BrowserContext.ClearCookiesOptions()
                                .setName("wardon-preferences"));
        page.reload();
        assertEquals("10.5", page.locator("#p-chambers-0-setting-temperatureC").inputValue());
        page.close();
    }

    @Test
    void weatherIsBrought() {
        Page page = part("$.weather", PHONE);
        StringBuilder csv = new StringBuilder("time,temperatureC,humidityPct\n");
        for (int day = 1; day <= 31; day++) {
            for (int hour = 0; hour < 24; hour++) {
                csv.append(String.format("2026-03-%02dT%02d:00,27,80%n", day, hour));
            }
        }
        page.setInputFiles(
                "#weather-file",
                new com.microsoft.playwright.options.FilePayload(
                        "march.csv", "text/csv", csv.toString().getBytes(StandardCharsets.UTF_8)));
        page.getByText("Bring it and let the plan name it").click();
        page.waitForSelector("p:has-text('march.csv')");
        assertEquals("march.csv", page.locator("#p-weather-csv").inputValue());
        assertEquals(0, page.locator(".faults").count());
        page.close();
    }
}
