package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The page of one chamber. */
class ChamberIT extends InBrowser {
    private static final int CURVES = 5;
    private static final int BANDS = 6;
    private static final int DAYS = 10;
    private static final int LARGEST_PAGE = 100_000;

    private String demo = "";
    private String cold = "";

    @BeforeAll
    void openDemo() {
        demo = demo();
        cold = demo + "/chamber/cold";
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void chartsAndDrawingsStandWithTheirNumbers(int width) {
        Page page = show(cold, width);
        page.waitForFunction("() => document.querySelectorAll('.curve canvas').length == 5");
        assertEquals(CURVES, page.locator(".curve details table").count());
        assertEquals(BANDS, page.locator(".legend li").count());
        assertEquals(DAYS, page.locator("section[aria-labelledby=heat-title] tbody tr").count());
        hold(page, "chamber");
        page.close();
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void aSliderIsAnsweredAsItMoves(int width) {
        Page page = show(cold, width);
        Locator slider = page.locator(".slide input[type=range]").nth(1);
        slider.focus();
        page.keyboard().press("ArrowRight");
        page.waitForSelector("#what-answer table");
        assertEquals("105", page.locator("#insulation").inputValue());
        page.waitForSelector("#what-answer canvas");
        hold(page, "chamber-what-if");
        page.close();
    }

    @ParameterizedTest
    @ValueSource(ints = {PHONE, DESK})
    void stillAirIsDrawnWithItsNumbers(int width) {
        Page page = show(demo + "/chamber/shed/section", width);
        page.waitForFunction(
                "() => document.querySelector('.section-picture img').naturalWidth > 0");
        page.click("summary");
        hold(page, "section");
        page.close();
    }

    @Test
    void theHourIsChosenByKeysAndWithoutScript() {
        Page page = show(cold + "?face=roof&at=2026-03-04T15:00", DESK);
        String told = page.locator("#profile figcaption").textContent();
        assertTrue(told.startsWith("Roof at Wed 4 Mar 15:00"), told);
        page.locator("#profile button").nth(2).focus();
        page.keyboard().press("Enter");
        page.waitForURL("**hour=2026-03-04T16**");
        String later = page.locator("#profile figcaption").textContent();
        assertTrue(later.startsWith("Roof at Wed 4 Mar 16:00"), later);
        page.close();
    }

    @Test
    void aWrongNumberIsToldAtItsField() {
        Page page = show(cold + "?setting=warm#what", DESK);
        assertEquals("Give a number from -30 to 45.", page.locator("#setting-fault").textContent());
        assertTrue(page.locator("#what-answer").textContent().contains("nothing was worked out"));
        page.close();
    }

    @Test
    void thePageIsLight() {
        Page page = show(cold, DESK);
        int length = page.content().length();
        assertTrue(length < LARGEST_PAGE, "page of " + length);
        assertFalse(page.content().contains(" style=\"color"));
        page.close();
    }
}
