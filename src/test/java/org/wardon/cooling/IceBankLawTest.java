package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalTime;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;

/** A bank of ice: heat, water, and the making of ice. */
class IceBankLawTest {
    private static final double P = 101_325;
    private static final Recharge MACHINE =
            new Recharge(1_500, 600, LocalTime.of(22, 0), LocalTime.of(6, 0));

    private static IceBank bank(Control control) {
        return new IceBank(200, 200, IceBank.Material.ICE, 80, 40, Optional.of(MACHINE), control);
    }

    private static CoolerInputs inputs(double airC, double rh, double iceKg) {
        CoolerInputs in = new CoolerInputs(1);
        in.airC = airC;
        in.humidityRatio = MoistAir.humidityRatioAt(airC, rh, P);
        in.outdoorC = 25;
        in.own[0] = iceKg;
        return in;
    }

    @Test
    void dryAirGivesItsHeatByTheConductanceAndMeltsIceByIt() {
        CoolerEffect out = CoolerSlopes.effect(bank(Control.ON_OFF).law(P), inputs(12, 0.2, 100));
        assertEquals(80 * 12, out.sensibleW, 1e-9);
        assertEquals(0, out.vapourKgS);
        assertEquals(80 * 12, out.meltsW, 1e-9);
        assertEquals(-80 * 12 / 333_500.0, out.ownRate[0], 1e-15);
        assertEquals(40, out.fanW);
        assertEquals(6, out.supplyC, 1e-9);
    }

    /** Along the line from the air to its saturated state at the surface: as on a coil. */
    @Test
    void dampAirIsDriedTowardsTheStateOfTheSurface() {
        CoolerInputs in = inputs(12, 0.9, 100);
        CoolerEffect out = CoolerSlopes.effect(bank(Control.ON_OFF).law(P), in);
        double saturated = MoistAir.saturatedHumidityRatio(0, P);
        double line = (in.humidityRatio - saturated) / 12;
        assertEquals(line, out.vapourKgS / (out.sensibleW / 1_006), 1e-9);
        double latent = MoistAir.vapourEnthalpyJkg(12) - out.drainEnthalpyJkg;
        assertEquals(out.sensibleW + out.vapourKgS * latent, out.meltsW, 1e-9);
        assertEquals(out.vapourKgS, out.drainKgS + out.frostKgS, 1e-15);
        assertEquals(out.meltsW / 333_500, -out.ownRate[0], 1e-15);
    }

    @Test
    void nothingIsTakenWithoutIceAndNothingIsMadeInAFullBank() {
        IceBankLaw law = bank(Control.ON_OFF).law(P);
        assertEquals(0, CoolerSlopes.effect(law, inputs(12, 0.9, 0)).meltsW);
        assertEquals(0, CoolerSlopes.effect(law, inputs(12, 0.9, -0.1)).meltsW);
        CoolerInputs full = inputs(12, 0.9, 200);
        full.recharging = true;
        full.run = 0;
        CoolerEffect out = CoolerSlopes.effect(law, full);
        assertEquals(0, out.refreezesW);
        assertEquals(0, out.electricW);
        full.own[0] = 100;
        assertEquals(1_500, CoolerSlopes.effect(law, full).refreezesW, 1e-9);
        full.recharging = false;
        assertEquals(0, CoolerSlopes.effect(law, full).refreezesW);
        // Air at the melting point gives nothing.
        assertEquals(0, CoolerSlopes.effect(law, inputs(-0.2, 0.5, 100)).meltsW);
    }

    @Test
    void rechargingPowerFollowsTheLift() {
        IceBankLaw law = bank(Control.ON_OFF).law(P);
        CoolerInputs in = inputs(12, 0.5, 100);
        in.recharging = true;
        in.outdoorC = 35;
        assertEquals(600, CoolerSlopes.effect(law, in).electricW, 1e-9);
        in.outdoorC = 20;
        // Evaporating at -6 °C, condensing 12 K above outdoors.
        assertEquals(600 * 38 / 53.0, CoolerSlopes.effect(law, in).electricW, 1e-9);
        in.outdoorC = 51;
        CoolerEffect hot = CoolerSlopes.effect(law, in);
        assertTrue(hot.tripped);
        assertEquals(0, hot.electricW + hot.refreezesW);
    }

    @Test
    void derivativesEqualDifferences() {
        SplittableRandom random = new SplittableRandom(23);
        int thin = 0;
        for (int i = 0; i < 400; i++) {
            IceBankLaw law = bank(i % 2 == 0 ? Control.ON_OFF : Control.MODULATING).law(P);
            double near = i % 3 == 0 ? 0 : i % 3 == 1 ? 196 : 4;
            double ice = i % 3 == 0 ? random.nextDouble(0, 200) : near + random.nextDouble(-4, 4);
            CoolerInputs in = inputs(random.nextDouble(-1, 25), random.nextDouble(0.2, 1), ice);
            in.run = random.nextDouble(0.1, 0.95);
            in.recharging = i % 4 < 2;
            thin += ice < 4 ? 1 : 0;
            CoolerSlopes.check(law, in, 500, 1e-3, i + ": " + in.airC + " °C, " + ice + " kg");
        }
        assertTrue(thin > 40, "states with hardly any ice: " + thin);
    }

    @Test
    void refusesWhatNoBankIs() {
        assertEquals(
                "startIceKg is 150.0 kg; accepted is 0.0 to 100.0 kg. No more than iceKg.",
                assertThrows(
                                IllegalArgumentException.class,
                                () ->
                                        new IceBank(
                                                100,
                                                150,
                                                IceBank.Material.ICE,
                                                50,
                                                0,
                                                Optional.empty(),
                                                Control.ON_OFF))
                        .getMessage());
        assertEquals(
                "latentKJkg is 334000.0 kJ/kg; accepted is 50.0 to 400.0 kJ/kg.",
                assertThrows(IllegalArgumentException.class, () -> new IceBank.Material(0, 334_000))
                        .getMessage());
    }
}
