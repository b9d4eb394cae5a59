package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** What a keeper hears of a cooler. */
class CoolerCautionsTest {
    private static Compressor unit(double powerW, double uaWK, double lowestC, boolean defrost) {
        return new Compressor(
                3_500,
                powerW,
                10,
                35,
                150,
                false,
                uaWK,
                0.6,
                Control.ON_OFF,
                5,
                5,
                3,
                lowestC,
                defrost ? Optional.of(new Defrost(8, 20, 0)) : Optional.empty(),
                OptionalDouble.empty());
    }

    private static List<String> codes(Compressor unit, double settingC) {
        return CoolerCautions.of(unit, new Setting(settingC, 1, 90), "north", 101_325).stream()
                .map(c -> c.reason().code())
                .toList();
    }

    @Test
    void soundUnitRaisesNothing() {
        assertEquals(List.of(), codes(unit(1_400, 600, -5, true), 2));
        assertEquals(List.of(), codes(unit(1_400, 600, -5, false), 12));
    }

    @Test
    void coldAirWithoutDefrostIcesUp() {
        assertEquals(List.of("ices-up"), codes(unit(1_400, 600, -5, false), 2));
    }

    @Test
    void comfortUnitCannotFollowAColdSetting() {
        assertEquals(List.of("control-too-warm"), codes(unit(1_400, 600, 16, false), 2));
    }

    @Test
    void unlikelyRatingAndSmallCoilAreNoted() {
        assertEquals(List.of("rating-unlikely"), codes(unit(500, 600, -5, false), 12));
        assertEquals(List.of("coil-small"), codes(unit(1_800, 150, -5, false), 12));
    }
}
