package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.MoistAir;
import org.wardon.air.WetBulb;

/** Pads and night air: outdoor air blown in. */
class OutdoorAirLawTest {
    private static final double P = 101_325;

    private static EvaporativePad pad(Control control) {
        return new EvaporativePad(0.8, 0.5, 120, 30, control);
    }

    private static NightAir fan(Control control) {
        return new NightAir(0.5, 120, 2, 3, 40, 90, control);
    }

    private static CoolerInputs inputs(double airC, double rh, double outdoorC, double outdoorRh) {
        CoolerInputs in = new CoolerInputs(0);
        in.airC = airC;
        in.humidityRatio = MoistAir.humidityRatioAt(airC, rh, P);
        in.outdoorC = outdoorC;
        in.outdoorHumidityRatio = MoistAir.humidityRatioAt(outdoorC, outdoorRh, P);
        return in;
    }

    /** Outdoor air of 38 °C and 20 %: the printed row pad_38C_20pct_0m_eps80 at another flow. */
    @Source("PsychroLib by way of checks-enclosure.csv, rows pad_38C_20pct_0m_eps80, 3 %")
    @Test
    void thePadEvaporatesWhatIsPrintedForItsAir() {
        EvaporativePadLaw law = new EvaporativePad(0.8, 0.5, 0, 0, Control.ON_OFF).law(P);
        CoolerEffect out = CoolerSlopes.effect(law, inputs(30, 0.5, 38, 0.2));
        assertEquals(20.6137 / 3_600, out.waterKgS / out.exchangeKgS, 0.03 * 20.6137 / 3_600);
    }

    @Test
    void supplyIsNeverBelowTheWetBulbOfItsAir() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 500; i++) {
            double eps = random.nextDouble(0.1, 1);
            EvaporativePad pad = new EvaporativePad(eps, 0.4, 0, 0, Control.ON_OFF);
            CoolerInputs in = inputs(25, 0.5, random.nextDouble(3, 48), random.nextDouble(0.05, 1));
            CoolerEffect out = CoolerSlopes.effect(pad.law(P), in);
            double wetBulb = WetBulb.temperatureC(in.outdoorC, in.outdoorHumidityRatio, P);
            assertTrue(out.supplyC >= wetBulb - 1e-9, in.outdoorC + " °C, state " + i);
            assertTrue(out.supplyC <= in.outdoorC + 1e-9, in.outdoorC + " °C, state " + i);
            assertTrue(out.waterKgS >= 0);
        }
    }

    @Test
    void whatThePadBringsIsWhatItTakesFromTheAirAndTheWater() {
        EvaporativePadLaw law = pad(Control.ON_OFF).law(P);
        CoolerInputs in = inputs(27, 0.7, 36, 0.3);
        CoolerEffect out = CoolerSlopes.effect(law, in);
        PadOutlet outlet = PadOutlet.of(in.outdoorC, in.outdoorHumidityRatio, 0.8, P);
        double flow = out.exchangeKgS;
        assertEquals(
                0.5,
                flow
                        * MoistAir.specificVolumeM3kg(
                                outlet.temperatureC(), outlet.humidityRatio(), P),
                1e-9);
        double carriedOut = MoistAir.enthalpyJkg(in.airC, in.humidityRatio);
        double broughtIn = MoistAir.enthalpyJkg(outlet.temperatureC(), outlet.humidityRatio());
        assertEquals(flow * (carriedOut - broughtIn), out.totalW, 1e-9 * flow * carriedOut);
        assertEquals(flow * (in.humidityRatio - outlet.humidityRatio()), out.vapourKgS, 1e-12);
        assertEquals(1.3 * flow * outlet.waterKgKg(), out.waterKgS, 1e-12);
        double rise = 120 / (flow * MoistAir.heatCapacityJkgK(outlet.humidityRatio()));
        assertEquals(outlet.temperatureC() + rise, out.supplyC, 1e-9);
        assertEquals(120, out.fanW);
    }

    @Test
    void thePadComesOnForAKelvinAndStaysForHalf() {
        EvaporativePadLaw law = pad(Control.ON_OFF).law(P);
        CoolerEffect scratch = new CoolerEffect(0);
        CoolerInputs in = inputs(27, 0.7, 36, 0.3);
        double supplyC = CoolerSlopes.effect(law, in).supplyC;
        in.airC = supplyC + 0.75;
        assertEquals(-0.25, law.inside(in, false, scratch), 1e-9);
        assertEquals(0.25, law.inside(in, true, scratch), 1e-9);
        CoolerInputs frost = inputs(15, 0.7, 3, 0.5);
        assertTrue(law.inside(frost, true, scratch) < 0, "the pad would freeze");
    }

    @Test
    void nightAirKeepsItsBounds() {
        NightAirLaw law = fan(Control.ON_OFF).law(P);
        CoolerEffect scratch = new CoolerEffect(0);
        assertEquals(0.3, law.inside(inputs(14.3, 0.8, 12, 0.8), true, scratch), 1e-9);
        assertEquals(-0.2, law.inside(inputs(14.3, 0.8, 12, 0.8), false, scratch), 1e-9);
        assertEquals(-0.4, law.inside(inputs(14, 0.8, 2.6, 0.95), true, scratch), 1e-9);
        // 12 °C and 40 % outdoors is air of 29 % at 17 °C: too dry; 100 % is 73 %: welcome.
        assertTrue(law.inside(inputs(17, 0.8, 12, 0.4), true, scratch) < 0);
        assertTrue(law.inside(inputs(17, 0.8, 12, 1), true, scratch) > 0);
        // A chamber hardly warmer than damp air would be wetted by it.
        NightAirLaw near = new NightAir(0.5, 120, 0, 3, 0, 90, Control.ON_OFF).law(P);
        assertTrue(near.inside(inputs(12.5, 0.8, 12, 1), true, scratch) < 0);
    }

    @Test
    void derivativesEqualDifferences() {
        SplittableRandom random = new SplittableRandom(11);
        int partly = 0;
        for (int i = 0; i < 400; i++) {
            Control control = i % 4 == 0 ? Control.ON_OFF : Control.MODULATING;
            boolean wet = i % 2 == 0;
            CoolerLaw law = wet ? pad(control).law(P) : fan(control).law(P);
            double outdoorC = random.nextDouble(2, 40);
            double outdoorRh = random.nextDouble(0.2, 1);
            CoolerInputs in = inputs(20, 0.6, outdoorC, outdoorRh);
            double supplyC = CoolerSlopes.effect(pad(Control.ON_OFF).law(P), in).supplyC;
            double near = wet ? supplyC + 0.75 : outdoorC + 2.25;
            in.airC = near + (i % 3 == 0 ? random.nextDouble(0, 8) : random.nextDouble(-.4, .4));
            in.run = random.nextDouble(0.1, 0.95);
            double ran = CoolerSlopes.effect(law, in).ran;
            partly += ran > 1e-3 && ran < 0.99 * in.run ? 1 : 0;
            CoolerSlopes.check(law, in, 500, 1e-3, i + ": " + in.airC + " °C, run " + in.run);
        }
        assertTrue(partly > 60, "states partly inside their conditions: " + partly);
    }

    @Test
    void saturatedAndOversaturatedAirGivesThePadNothing() {
        EvaporativePadLaw law = pad(Control.ON_OFF).law(P);
        CoolerInputs in = inputs(27, 0.7, 24, 1);
        assertEquals(0, CoolerSlopes.effect(law, in).waterKgS, 1e-9);
        in.outdoorHumidityRatio *= 1.02;
        assertEquals(0, CoolerSlopes.effect(law, in).waterKgS, 1e-9);
    }

    @Test
    void refusesWhatNoPadOrFanIs() {
        assertEquals(
                "effectiveness is 80.0; accepted is 0.1 to 1.0. A fraction of 1.",
                refused(() -> new EvaporativePad(80, 0.5, 0, 0, Control.ON_OFF)));
        assertEquals(
                "airFlowM3s is 0.0 m3/s; accepted is 0.001 to 500.0 m3/s.",
                refused(() -> new NightAir(0, 0, 2, 0, 0, 100, Control.ON_OFF)));
        assertEquals(
                "differenceK is -1.0 K; accepted is 0.0 to 20.0 K.",
                refused(() -> new NightAir(1, 0, -1, 0, 0, 100, Control.ON_OFF)));
    }

    private static String refused(org.junit.jupiter.api.function.Executable made) {
        return assertThrows(IllegalArgumentException.class, made).getMessage();
    }
}
