package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Route;
import com.microsoft.playwright.options.FormData;
import com.microsoft.playwright.options.RequestOptions;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.MethodOrderer;
import org.junit.jupiter.api.Order;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestMethodOrder;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A placing: wished, sought, stopped, read, taken over and taken back. */
@TestMethodOrder(MethodOrderer.OrderAnnotation.class)
class PlacingIT extends InBrowser {
    private static final int LARGEST_BYTES = 100_000;
    private static final String ALL = "/placing?wish=most-value&move=all";

    private String plan = "";

    @BeforeAll
    void bringTwoRooms() {
        Page page = show("/plans", DESK);
        page.setInputFiles(
                "input[name=plan]", Path.of("src/test/resources/plans/placing/two-rooms.json"));
        page.click("form[action='/plans/bring'] button");
        page.waitForURL("**/plan/*");
        plan = page.url().substring(address().length());
        page.close();
    }

    private Page placed(int width) {
        Page page = show(plan + ALL, width);
        page.waitForSelector("#walk");
        return page;
    }

    @Test
    @Order(1)
    void aWishIsSentByKeysAloneAndTheSearchStopsWhenTold() {
        Page page = show("/plans", PHONE);
        page.click("form[action='/plans/demo'] button");
        page.waitForURL("**/plan/*");
        page.navigate(page.url() + "/placing");
        assertEquals(0, page.locator("#walk").count(), "something was sought unasked");
        hold(page, "placing-wishes");
        page.focus("input[name=wish][value=fewest-chambers]");
        page.keyboard().press("Space");
        page.focus(".wishes button.main");
        page.keyboard().press("Enter");
        page.waitForSelector(".progress");
        picture(page, "placing-progress-360");
        page.click(".progress button");
        page.waitForSelector(".notice:has-text('stopped before it was done')");
        page.click(".notice button");
        page.waitForSelector(".progress");
        page.click(".progress button");
        page.waitForSelector(".notice");
        page.close();
    }

    @ParameterizedTest
    @Order(2)
    @ValueSource(ints = {PHONE, DESK})
    void presentStandsAgainstProposed(int width) {
        Page page = placed(width);
        List<String> steps = page.locator(".walk li").allTextContents();
        assertTrue(steps.get(0).startsWith("Move B1 from back to front."), steps.toString());
        assertEquals(2, page.locator(".spread").count());
        assertEquals(2, page.locator(".tag.goes").count());
        assertEquals(3, page.locator(".tag.comes").count());
        assertTrue(page.locator(".ruler").count() >= 2);
        assertTrue(page.content().length() < LARGEST_BYTES, "page of " + page.content().length());
        hold(page, "placing");
        page.click("details.why summary");
        assertEquals(
                "back", page.locator("details.why table tbody th").first().textContent().strip());
        page.close();
    }

    @Test
    @Order(3)
    void withoutScriptThePageComesToTheSame() {
        Page page = tab(PHONE);
        page.route(
                "**/wardon.js",
                route ->
                        route.fulfill(
                                new Route.FulfillOptions()
                                        .setContentType("text/javascript")
                                        .setBody("")));
        page.navigate(address() + plan + "/placing?wish=most-value&move=later");
        for (int i = 0; i < 60 && page.locator("#gain").count() == 0; i++) {
            page.reload();
        }
        assertTrue(page.locator("#gain").count() == 1, "no placing without script");
        page.close();
    }

    @ParameterizedTest
    @Order(4)
    @ValueSource(ints = {PHONE, DESK})
    void lotsThatPullApartAreSeenAndSaid(int width) {
        Page page = show(plan + "/sharing?lots=B1&lots=L1&crops=mango=3", width);
        List<String> pulls = page.locator(".ruler-pulls").allTextContents();
        assertTrue(
                pulls.contains("pulls warmer ▸") && pulls.contains("◂ pulls colder"), "" + pulls);
        assertTrue(page.locator(".ruler").textContent().contains("apart."));
        assertTrue(page.locator(".ruler-key + .hint").textContent().contains("are 2 days"));
        String mango = page.locator(".ruler table tr:has-text('Mango')").textContent();
        assertTrue(mango.contains("5 days (3 days in the chamber, 2 days to the buyer)"), mango);
        hold(page, "sharing");
        page.close();
    }

    @Test
    @Order(4)
    void daysThatAreNoNumberAreToldAndNothingIsJudged() {
        Page page = tab(DESK);
        for (String days : List.of("many", "-3", "0", "731", "1e3", "7,5")) {
            refused(page, "lots=B1&crops=mango&days=" + days);
            assertEquals(
                    "Give a number of days from 0.1 to 730.",
                    page.locator("#days-fault").textContent());
            assertEquals(days, page.inputValue("#days"));
        }
        refused(page, "crops=mango=many, papaya=0, kiwi, kiwi");
        assertEquals(
                "mango: give a number of days from 0.1 to 730 after the =, such as mango=7."
                        + " papaya: give a number of days from 0.1 to 730 after the =, such as"
                        + " papaya=7. kiwi: name each crop once.",
                page.locator("#crops-fault").textContent());
        refused(page, "crops=qqqqzzzz");
        String unknown = page.locator("#crops-fault").textContent();
        assertTrue(unknown.startsWith("qqqqzzzz: "), unknown);
        APIResponse typed =
                page.request()
                        .get(
                                address()
                                        + plan
                                        + "/sharing?crops=mango=3,5,banana, papaya&days=7,5",
                                RequestOptions.create()
                                        .setHeader("Cookie", "wardon-preferences=f.lb.comma.auto"));
        assertEquals(200, typed.status(), typed.text());
        for (String shown : List.of("value=\"7,5\"", "mango", "banana", "papaya", "3,5", "°F")) {
            assertTrue(typed.text().contains(shown), shown);
        }
        page.close();
    }

    /** Shows the refusal of a question: no ruler, no list of faults beside the fields. */
    private void refused(Page page, String question) {
        APIResponse told = page.request().get(address() + plan + "/sharing?" + question);
        assertEquals(422, told.status(), question);
        page.setContent(told.text());
        assertEquals(0, page.locator(".ruler, .faults").count(), "something was judged");
    }

    @Test
    @Order(5)
    void whatIsTakenOverCanBeTakenBackAndLateHandsSeeBothSides() {
        Page first = placed(DESK);
        Page second = placed(DESK);
        first.click(".walk button.main");
        first.waitForURL(address() + plan);
        assertTrue(first.locator(".saved").textContent().contains("placing taken over"));
        FormData typed =
                FormData.create()
                        .set("token", second.locator("input[name=token]").first().inputValue())
                        .set("version", second.locator(".walk input[name=version]").inputValue());
        APIResponse late =
                second.request()
                        .post(
                                address() + second.locator(".walk form").getAttribute("action"),
                                RequestOptions.create().setForm(typed));
        assertEquals(409, late.status());
        second.setContent(late.text());
        String both = second.locator("section[aria-labelledby=clash] table").innerText();
        assertTrue(both.contains("B1\tin front\tin front"), both);
        first.click(".steps button:not([disabled])");
        first.waitForURL(address() + plan);
        first.navigate(address() + plan + ALL);
        first.waitForSelector(".walk li:has-text('Move B1 from back to front.')");
        first.close();
        second.close();
    }
}
