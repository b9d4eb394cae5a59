package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.FormData;
import com.microsoft.playwright.options.RequestOptions;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;

/**
 * Crops: found by any name, with their curves and sources; own values and lots; how long it keeps.
 */
class CropsIT extends InBrowser {
    private static final int LARGEST_PAGE = 100_000;

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void cropsAreFoundByAnyName(int width) {
        Page page = show("/crops", width);
        hold(page, "crops");
        page.fill("#q", "brokoli");
        page.keyboard().press("Enter");
        page.waitForURL("**/crops?q=brokoli");
        assertEquals("Broccoli", page.locator(".crop-list a").first().textContent());
        page.fill("#q", "qqqqzzzz");
        page.keyboard().press("Enter");
        page.waitForURL("**/crops?q=qqqqzzzz");
        assertEquals(0, page.locator(".crop-list li").count());
        page.close();
    }

    @Source(
            "cantwell-2001 and AH66-2016, as in reference-tables: mango 13 °C, 14 to 21 d, no colder")
    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void aCropShowsItsCurvesWithTablesAndSources(int width) {
        Page page = show("/crops/mango", width);
        String lead = page.locator(".lead").textContent();
        assertTrue(lead.contains("13.0 °C") && lead.contains("14 days to 21 days"), lead);
        Locator life = page.locator("section:has(#life-title)");
        int points = life.locator(".plot .mark").count();
        life.locator("summary").nth(1).click();
        assertEquals(points, life.locator("details").nth(1).locator("tbody tr").count());
        life.locator("summary").first().click();
        assertEquals(43, life.locator("details").first().locator("tbody tr").count());
        assertTrue(life.locator(".plot .cold").count() == 1, "the cold that injures is drawn");
        page.locator("summary:has-text('Storage condition')").click();
        assertTrue(
                page.locator(".fact-list").first().textContent().contains("cantwell-2001, seen"));
        hold(page, "crop-mango");
        page.close();
    }

    /** Everything is in the first answer: nothing to wait for, nothing fetched later. */
    @Test
    void pagesAreSmallAndWholeAtOnce() {
        Page page = show("/crops/mango", DESK);
        String first = page.request().get(address() + "/crops/mango").text();
        int bytes = first.getBytes(StandardCharsets.UTF_8).length;
        assertTrue(bytes <= LARGEST_PAGE, bytes + " bytes");
        for (String waits : List.of("http-equiv=\"refresh\"", "data-progress", "data-chart")) {
            assertFalse(first.contains(waits), waits);
        }
        page.close();
    }

    @Test
    void ownValuesWinAreShownAsOwnAndCanBeForgotten() {
        Page page = show("/crops/mango", DESK);
        page.locator("#own summary").click();
        page.fill("#own-low", "11");
        page.fill("#own-high", "12");
        page.getByText("Set it").click();
        page.waitForSelector("#own .own-list li");
        String own = page.locator("#own .own-list").textContent();
        assertTrue(own.contains("storage temperature: 11 to 12 °C"), own);
        assertTrue(page.locator(".lead").textContent().contains("11.0 °C to 12.0 °C"));
        hold(page, "crop-own");
        page.locator("#own .own-list button").click();
        page.waitForSelector("#own:not(:has(.own-list li))");
        assertTrue(page.locator(".lead").textContent().contains("13.0 °C"));
        page.close();
    }

    /** Nothing is set; each field tells its own fault, in the person's unit, and keeps its text. */
    @ParameterizedTest
    @CsvSource({
        "storage-temperature, warm, '', '', own-low, '\"warm\" is no number; give a number'",
        "storage-temperature, 11, 99, '', own-high, '99 is out of range; accepted: -30 to 30'",
        "storage-temperature, 12, 3, '', own-high, it is below the first; give the lower one first",
        "storage-temperature, 12, '', 9, own-at, this value holds at any temperature; leave it blank",
        "respiration-heat, 12, '', '', own-at, nothing is given; give a number",
        "respiration-heat, 12, '', 41, own-at, 41 is out of range; accepted: -2 to 40"
    })
    void ownValuesThatCannotBeAreToldAtTheirField(
            String fact, String low, String high, String at, String field, String told) {
        Page page = show("/crops/mango", DESK);
        APIResponse refused =
                page.request()
                        .post(
                                address() + "/crops/mango/own",
                                RequestOptions.create()
                                        .setForm(
                                                FormData.create()
                                                        .set("token", token(page))
                                                        .set("own-fact", fact)
                                                        .set("own-low", low)
                                                        .set("own-high", high)
                                                        .set("own-at", at)));
        assertEquals(422, refused.status());
        page.setContent(refused.text());
        assertEquals(List.of(told), page.locator("#own .fault").allTextContents());
        assertEquals(told, page.locator("#" + field + "-fault").textContent());
        assertEquals(low, page.inputValue("#own-low"));
        assertEquals(0, page.locator("#own .own-list li").count());
        page.close();
    }

    private static String token(Page page) {
        return page.locator("input[name=token]").first().inputValue();
    }

    @Test
    void lotsThatAreGoneAreRememberedAndForgotten() {
        Page page = show("/crops/mango", PHONE);
        page.locator("#lots summary").click();
        page.fill("#lot-at", "12");
        page.fill("#lot-days", "19");
        page.fill("#lot-name", "L7");
        page.getByText("Remember it").click();
        page.waitForSelector("#lots .own-list li");
        String told = page.locator("#lots").textContent();
        assertTrue(told.contains("kept 19 days at 12.0 °C") && told.contains("L7"), told);
        hold(page, "crop-lots");
        page.locator("#lots .own-list button").click();
        page.waitForSelector("#lots:not(:has(.own-list li))");
        page.close();
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void howLongItKeepsAndWhenItIsRipe(int width) {
        Page page = show("/crops/banana", width);
        page.fill("#keep-at", "16");
        page.fill("#keep-ripe", "6");
        page.fill("#keep-ethylene", "100");
        page.selectOption("#keep-ripeness", "green");
        page.getByText("How long?").click();
        page.waitForSelector(".answer");
        String told = page.locator(".answer").textContent();
        assertTrue(told.contains("It keeps") && told.contains("Ripe after"), told);
        assertTrue(told.contains("in 6 days it is ripe"), told);
        hold(page, "crop-keeps");
        page.close();
    }
}
