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

    @Test
    void iceCannotBringAirToItsMeltingPoint() {
        IceBank bank =
                new IceBank(
                        100, 100, IceBank.Material.ICE, 50, 0, Optional.empty(), Control.ON_OFF);
        assertEquals(List.of("ice-handling"), of(bank, 4));
        assertEquals(List.of("ice-handling", "ice-too-warm"), of(bank, 1));
    }

    @Test
    void padsAndNightAirAreToldWhatTheyMayBringIn() {
        assertEquals(
                List.of("pad-water"), of(new EvaporativePad(0.8, 0.5, 50, 0, Control.ON_OFF), 15));
        assertEquals(
                List.of("night-air-rain"),
                of(new NightAir(0.5, 50, 2, 0, 0, 100, Control.ON_OFF), 15));
    }

    private static List<String> of(Cooler cooler, double settingC) {
        return CoolerCautions.of(cooler, new Setting(settingC, 1, 90), "north", 101_325).stream()
                .map(c -> c.reason().code())
                .toList();
    }
}
