package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.WaterFilm.Chiller;
import org.wardon.enclosure.FaceName;

/** Records of coolers that act on faces, and what a keeper hears of them. */
class WaterCoolersTest {
    private static final Set<FaceName> TWO = Set.of(FaceName.NORTH, FaceName.EAST);
    private static final List<LocalTime> MORNING = List.of(LocalTime.of(7, 0));
    private static final Setting COOL = new Setting(12, 1, 90);

    private static WaterFilm film(Set<FaceName> wets, boolean open, double pumpW, Double... inlet) {
        return new WaterFilm(
                wets, 0.4, List.of(inlet), Optional.empty(), pumpW, open, 10, Control.ON_OFF);
    }

    private static void refuses(String message, Runnable make) {
        IllegalArgumentException bad = assertThrows(IllegalArgumentException.class, make::run);
        assertEquals(message, bad.getMessage());
    }

    @Test
    void whatCannotBeIsRefused() {
        refuses(
                "wets is [ROOF]; cover and floor of a wetted wall are not wet",
                () -> new WettedWall(Set.of(FaceName.ROOF), 40, 0.5, MORNING));
        refuses(
                "wets is empty; name at least one wall",
                () -> new WettedWall(Set.of(), 40, 0.5, MORNING));
        refuses(
                "pouredAt is empty; give at least one hour",
                () -> new WettedWall(TWO, 40, 0.5, List.of()));
        refuses(
                "wets is [FLOOR]; an open film runs down walls only",
                () -> film(Set.of(FaceName.FLOOR), true, 0, 6.0));
        refuses("inletC has 3 values; give 1 or 24", () -> film(TWO, true, 0, 6.0, 6.0, 6.0));
        film(Set.of(FaceName.FLOOR), false, 0, 6.0);
    }

    @Test
    void aSpringGivesTheMeanOfTheHour() {
        List<Double> day = new ArrayList<>();
        for (int h = 0; h < 24; h++) {
            day.add(6.0 + h % 12);
        }
        WaterFilm spring = film(TWO, true, 0, day.toArray(new Double[0]));
        assertEquals(6.5, spring.inletC(0), 1e-12);
        assertEquals(11.5, spring.inletC(23), 1e-12);
        assertEquals(6, spring.coldestC());
        assertEquals(17, spring.warmestC());
        assertEquals(9, film(TWO, true, 0, 9.0).inletC(13));
    }

    /** By hand: (35 + 12 - (7 - 6)) / (0.45 x (1 + 273.15)) = 0.3729. */
    @Test
    void theChillerDrawsByTheCarnotShare() {
        Chiller chiller = new Chiller(2_000, 0.45, 6, 12);
        assertEquals(46 / (0.45 * 274.15), chiller.electricPerW(7, 35), 1e-12);
        // In the cold its condensing temperature is held up.
        assertEquals(15 / (0.45 * 274.15), chiller.electricPerW(7, -10), 1e-12);
    }

    @Test
    void gravityNeedsNoPower() {
        assertFalse(film(TWO, true, 0, 6.0).needsPower());
        assertTrue(film(TWO, true, 50, 6.0).needsPower());
    }

    private static List<String> codes(Cooler cooler) {
        return CoolerCautions.of(cooler, COOL, "north", 101_325).stream()
                .map(c -> c.reason().code())
                .toList();
    }

    @Test
    void cautionsOfWaterAreTold() {
        assertEquals(List.of("standing-water"), codes(new WettedWall(TWO, 40, 0.5, MORNING)));
        assertEquals(List.of(), codes(new WettedWall(TWO, 0, 0.5, MORNING)));
        assertEquals(List.of("wet-floor"), codes(film(TWO, true, 0, 6.0)));
        assertEquals(
                List.of("wet-floor", "water-near-electricity"), codes(film(TWO, true, 50, 6.0)));
        assertEquals(List.of("wet-floor", "jacket-drips"), codes(film(TWO, false, 0, 6.0)));
        assertEquals(
                List.of("wet-floor", "water-grows-legionella", "water-too-warm"),
                codes(film(TWO, true, 0, 24.0)));
    }
}
