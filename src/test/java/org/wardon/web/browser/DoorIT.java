package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.RequestOptions;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A warm lot at the door: asked about in three fields, put into the plan by one press. */
class DoorIT extends InBrowser {
    private static final int THUMB_PX = 44;
    private static final int LARGEST_BYTES = 100_000;

    private String plan = "";

    @BeforeAll
    void openDemo() {
        plan = demo();
    }

    private Page asked(String plan, int width) {
        Page page = show(plan + "/door?crop=mango&mass=500&pulp=30", width);
        page.waitForSelector("#answer-title");
        return page;
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void threeFieldsAreEnough(int width) {
        Page page = show(plan + "/door", width);
        page.fill("#crop", "mengo");
        Locator mango = page.locator(".suggested button").first();
        assertEquals("Mango", mango.textContent());
        mango.click();
        page.fill("#mass", "500");
        page.fill("#pulp", "30");
        hold(page, "door-form");
        page.click(".door-form button.main");
        page.waitForSelector("#answer-title");
        assertEquals(5, page.locator(".door-choice").count());
        assertTrue(page.content().length() < LARGEST_BYTES);
        hold(page, "door-answer");
        page.close();
    }

    @Test
    void everythingIsWideEnoughForAThumb() {
        Page page = asked(plan, PHONE);
        for (Locator one : page.locator("main button, main summary, .pictures label").all()) {
            if (one.isVisible()) {
                assertTrue(one.boundingBox().height >= THUMB_PX, one.textContent());
            }
        }
        page.close();
    }

    @Test
    void whatHasNoFieldIsToldTooAndWhatWasTypedIsToldAsTyped() {
        Page page = tab(DESK);
        String lot = address() + plan + "/door?crop=mango&mass=500&";
        String unknown = page.request().get(lot + "packed=bathtub").text();
        assertTrue(unknown.contains("'bathtub'"), unknown);
        RequestOptions comma =
                RequestOptions.create().setHeader("Cookie", "wardon-preferences=c.kg.comma.auto");
        String large = page.request().get(lot + "wanted=99999999999", comma).text();
        assertTrue(large.contains("is 99999999999; accepted: 0,1 to 730 days"), large);
        String typed = page.request().get(lot + "price=1.2.3", comma).text();
        assertTrue(typed.contains("\"1.2.3\" is no number"), typed);
        page.close();
    }

    @Test
    void aLotGoesIntoThePlanAndAStaleVersionIsTold() {
        String changed = ownDemo();
        Page first = asked(changed, DESK);
        Page second = asked(changed, DESK);
        String put = ".door-choice form:has(input[value=fruit]) button";
        first.click(put);
        first.waitForURL(address() + changed);
        assertTrue(first.locator(".saved").textContent().contains("put into fruit"));
        second.click(put);
        second.waitForSelector(".notice");
        assertTrue(second.locator(".notice").textContent().contains("nothing of yours is lost"));
        assertEquals("500", second.inputValue("#mass"));
        first.close();
        second.close();
    }
}
