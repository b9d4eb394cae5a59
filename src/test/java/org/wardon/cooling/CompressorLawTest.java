package org.wardon.cooling;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.function.DoubleConsumer;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.MoistAir;

/** A compressor in balance with its coil. */
class CompressorLawTest {
    private static final double P = 101_325;

    private static Compressor unit(Control control, boolean fanAlways) {
        return new Compressor(
                3_500,
                1_400,
                10,
                35,
                150,
                fanAlways,
                600,
                0.6,
                control,
                5,
                5,
                3,
                -5,
                Optional.empty(),
                OptionalDouble.empty());
    }

    private static CoolerInputs inputs(CoolerLaw law, double airC, double rh, double outdoorC) {
        CoolerInputs in = new CoolerInputs(law.ownStates());
        in.airC = airC;
        in.humidityRatio = MoistAir.humidityRatioAt(airC, rh, P);
        in.outdoorC = outdoorC;
        return in;
    }

    private static CoolerEffect effect(CoolerLaw law, CoolerInputs in) {
        CoolerEffect out = new CoolerEffect(law.ownStates());
        law.effect(in, out);
        return out;
    }

    @Test
    void ratedPointIsMet() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        // 3 K of condenser rise are not part of the rating: outdoors 32 gives 35 onto it.
        CoolerEffect out = effect(law, inputs(law, 10, 0.85, 32));
        assertEquals(3_500, out.totalW, 1e-6);
        assertEquals(1_400, out.electricW, 1e-6);
        CoolerEffect dry = effect(law, inputs(law, 10, 0.1, 32));
        assertEquals(0, dry.vapourKgS);
        assertTrue(dry.totalW < 3_500, "a dry coil carries less");
        assertEquals(law.ratedEvaporatingC(), out.evaporatingC, 1e-6);
        assertTrue(law.carnotFraction() > 0.35 && law.carnotFraction() < 0.65);
    }

    @Test
    void wetAirIsDriedAndTheHeatAddsUp() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerInputs in = inputs(law, 13, 0.9, 32);
        CoolerEffect out = effect(law, in);
        assertTrue(out.vapourKgS > 0);
        double given = MoistAir.vapourEnthalpyJkg(in.airC) - out.drainEnthalpyJkg;
        assertEquals(out.sensibleW + out.vapourKgS * given, out.totalW, 1e-9 * out.totalW);
        assertEquals(out.vapourKgS, out.drainKgS + out.frostKgS, 1e-15);
        assertTrue(out.supplyC < in.airC && out.supplyC > out.evaporatingC);
    }

    @Test
    void capacityFallsWithOutdoorHeatAndColdAir() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        double last = Double.POSITIVE_INFINITY;
        for (double outdoor = 15; outdoor <= 46; outdoor += 1) {
            double now = effect(law, inputs(law, 10, 0.8, outdoor)).totalW;
            assertTrue(now < last, outdoor + " °C outdoors");
            last = now;
        }
        last = 0;
        for (double air = -10; air <= 30; air += 1) {
            double now = effect(law, inputs(law, air, 0.8, 32)).totalW;
            assertTrue(now > last - 1e-6, air + " °C inside");
            last = now;
        }
    }

    @Test
    void compressorGainsNothingAboveTenDegreesEvaporating() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerEffect hot = effect(law, inputs(law, 35, 0.5, 32));
        CoolerEffect hotter = effect(law, inputs(law, 40, 0.5, 32));
        assertTrue(hot.evaporatingC > 11);
        assertEquals(hot.totalW, hotter.totalW, 1e-6);
        assertEquals(3_500 * Math.exp(0.035 * (10 - law.ratedEvaporatingC())), hotter.totalW, 0.01);
    }

    /** The three figures of a row: least, most, typical. */
    private static double[] printed(String parameter) throws IOException {
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder()
                        .ofNamedCsvRecord(Path.of("reference-tables/stores/cooling-sources.csv"))) {
            for (NamedCsvRecord r : csv) {
                if (r.getField("parameter").equals(parameter)) {
                    return new double[] {
                        Double.parseDouble(r.getField("min")),
                        Double.parseDouble(r.getField("max")),
                        Double.parseDouble(r.getField("typical"))
                    };
                }
            }
        }
        throw new AssertionError(parameter);
    }

    @Source("ASHRAE Handbook - Refrigeration, from memory: table of cooling sources, capacity_te")
    @Test
    void capacityRisesWithTheEvaporatingTemperatureAsPrinted() throws IOException {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerEffect cold = effect(law, inputs(law, 2, 0.85, 32));
        CoolerEffect warm = effect(law, inputs(law, 8, 0.85, 32));
        double perK = Math.log(warm.totalW / cold.totalW) / (warm.evaporatingC - cold.evaporatingC);
        double[] row = printed("capacity_te");
        assertEquals(row[2], perK, 1e-6);
        assertTrue(row[0] <= perK && perK <= row[1]);
    }

    @Source("ASHRAE Handbook - Refrigeration, from memory: capacity_tc and condensing_approach")
    @Test
    void capacityFallsWithTheCondensingTemperatureAsPrinted() throws IOException {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        // Above +10 °C evaporating only the condensing side tells.
        CoolerEffect rated = effect(law, inputs(law, 35, 0.5, 32));
        CoolerEffect hot = effect(law, inputs(law, 35, 0.5, 42));
        double perK = (1 - hot.totalW / rated.totalW) / 10;
        assertEquals(printed("capacity_tc")[2], perK, 1e-6);
        assertEquals(35 + printed("condensing_approach")[2], rated.condensingC, 1e-9);
    }

    @Test
    void frostTakesAFifthOfTheConductance() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerInputs in = inputs(law, -10, 0.85, 32);
        CoolerEffect out = effect(law, in);
        assertTrue(out.evaporatingC < -5);
        double met = (in.airC - out.supplyC) / (in.airC - out.evaporatingC);
        double flow = 0.6 / MoistAir.specificVolumeM3kg(10, 0, P);
        assertEquals(1 - Math.exp(-0.8 * 600 / (flow * 1_006)), met, 1e-9);
        assertEquals(0, out.drainKgS, 1e-15);
        assertTrue(out.frostKgS > 0);
    }

    @Test
    void highPressureSwitchOpens() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerEffect warm = effect(law, inputs(law, 10, 0.8, 46));
        assertFalse(warm.tripped);
        assertTrue(warm.totalW > 0);
        CoolerEffect hot = effect(law, inputs(law, 10, 0.8, 47.1)); // 62.1 °C condensing
        assertTrue(hot.tripped);
        assertEquals(0, hot.totalW);
        assertEquals(0, hot.electricW);
    }

    @Test
    void restingCoolerDoesNothing() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerInputs in = inputs(law, 10, 0.8, 32);
        in.run = 0;
        CoolerEffect out = effect(law, in);
        assertEquals(0, out.totalW);
        assertEquals(0, out.electricW + out.fanW + out.vapourKgS);
    }

    @Test
    void slowerCompressorDriesLessPerHeat() {
        CompressorLaw law = unit(Control.MODULATING, false).law(P);
        CoolerInputs in = inputs(law, 13, 0.9, 32);
        CoolerEffect full = effect(law, in);
        in.run = 0.4;
        CoolerEffect slow = effect(law, in);
        assertTrue(slow.evaporatingC > full.evaporatingC);
        assertTrue(slow.vapourKgS / slow.totalW < full.vapourKgS / full.totalW);
    }

    @Test
    void fanThatRunsOnPutsCoilWaterBackWithoutGainOfHeat() {
        CompressorLaw law = unit(Control.ON_OFF, true).law(P);
        CoolerInputs in = inputs(law, 10, 0.8, 32);
        in.own[0] = 0.35;
        in.run = 0;
        CoolerEffect out = effect(law, in);
        assertTrue(out.vapourKgS < 0);
        assertEquals(-out.ownRate[0], -out.vapourKgS, 1e-15);
        assertTrue(out.sensibleW > 0);
        // Air loses to the water what the vapour brings back.
        double back = -out.vapourKgS;
        double brought = MoistAir.vapourEnthalpyJkg(10) - MoistAir.WATER_J_KG_K * 10;
        assertEquals(back * brought, out.sensibleW, 1e-9);
        assertEquals(150, out.fanW);
    }

    @Test
    void warmStartChangesNothing() {
        CompressorLaw law = unit(Control.ON_OFF, false).law(P);
        CoolerEffect reused = new CoolerEffect(0);
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 200; i++) {
            CoolerInputs in =
                    inputs(
                            law,
                            random.nextDouble(-5, 35),
                            random.nextDouble(0.2, 1),
                            random.nextDouble(10, 46));
            law.effect(in, reused);
            assertEquals(effect(law, in).totalW, reused.totalW, 1e-5);
        }
    }

    @Test
    void derivativesEqualDifferences() {
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 400; i++) {
            Control control = i % 2 == 0 ? Control.ON_OFF : Control.MODULATING;
            CompressorLaw law = unit(control, i % 4 > 1).law(P);
            CoolerInputs in =
                    inputs(
                            law,
                            random.nextDouble(-5, 35),
                            random.nextDouble(0.2, 0.98),
                            random.nextDouble(10, 45));
            in.run = random.nextDouble(0.1, 0.95);
            if (in.own.length > 0) {
                in.own[0] = random.nextDouble(0, 0.7);
            }
            CoolerEffect at = effect(law, in);
            double t = in.airC;
            double w = in.humidityRatio;
            double run = in.run;
            String what = i + ": " + t + " °C, " + w + ", run " + run;
            DoubleConsumer setAir = x -> in.airC = x;
            DoubleConsumer setHumidity = x -> in.humidityRatio = x;
            DoubleConsumer setRun = x -> in.run = x;
            check(law, in, setAir, t, 1e-3, e -> e.sensibleW, at.sensibleByAirC, 500, what);
            check(law, in, setAir, t, 1e-3, e -> e.vapourKgS, at.vapourByAirC, 2e-4, what);
            check(
                    law,
                    in,
                    setHumidity,
                    w,
                    2e-8,
                    e -> e.sensibleW,
                    at.sensibleByHumidity,
                    2e5,
                    what);
            check(law, in, setHumidity, w, 2e-8, e -> e.vapourKgS, at.vapourByHumidity, 0.3, what);
            check(law, in, setRun, run, 1e-4, e -> e.sensibleW, at.sensibleByRun, 3e3, what);
            check(law, in, setRun, run, 1e-4, e -> e.vapourKgS, at.vapourByRun, 1e-3, what);
            check(law, in, setAir, t, 1e-3, e -> e.electricW, at.electricByAirC, 20, what);
            check(
                    law,
                    in,
                    setHumidity,
                    w,
                    2e-8,
                    e -> e.electricW,
                    at.electricByHumidity,
                    1e4,
                    what);
            check(law, in, setRun, run, 1e-4, e -> e.electricW, at.electricByRun, 1e3, what);
            if (in.own.length > 0) {
                double own = in.own[0];
                DoubleConsumer setOwn = x -> in.own[0] = x;
                check(law, in, setAir, t, 1e-3, e -> e.ownRate[0], at.ownRateByAirC[0], 2e-4, what);
                check(
                        law,
                        in,
                        setHumidity,
                        w,
                        2e-8,
                        e -> e.ownRate[0],
                        at.ownRateByHumidity[0],
                        0.3,
                        what);
                check(
                        law,
                        in,
                        setOwn,
                        own,
                        1e-4,
                        e -> e.ownRate[0],
                        at.ownRateByOwn[0],
                        1e-3,
                        what);
                check(law, in, setOwn, own, 1e-4, e -> e.vapourKgS, at.vapourByOwn[0], 1e-3, what);
                check(law, in, setOwn, own, 1e-4, e -> e.sensibleW, at.sensibleByOwn[0], 3e3, what);
            }
        }
    }

    /** A ten-thousandth of the usual size of the derivative: what differences can tell. */
    private static void check(
            CoolerLaw law,
            CoolerInputs in,
            DoubleConsumer set,
            double at,
            double step,
            ToDoubleFunction<CoolerEffect> of,
            double found,
            double size,
            String what) {
        set.accept(at + step);
        double above = of.applyAsDouble(effect(law, in));
        set.accept(at - step);
        double below = of.applyAsDouble(effect(law, in));
        set.accept(at);
        assertEquals((above - below) / (2 * step), found, 1e-4 * size, what);
    }

    @Test
    void refusesACoilTooSmallForItsCapacity() {
        Compressor small =
                new Compressor(
                        3_500,
                        1_400,
                        10,
                        35,
                        0,
                        false,
                        20,
                        0.6,
                        Control.ON_OFF,
                        5,
                        5,
                        3,
                        -5,
                        Optional.empty(),
                        OptionalDouble.empty());
        String message =
                assertThrows(IllegalArgumentException.class, () -> small.law(P)).getMessage();
        assertTrue(message.endsWith("check coilUaWK and airFlowM3s."), message);
    }

    @Test
    void modulatedShareIsLevelAtItsEnds() {
        assertEquals(0, Thermostat.modulatedShare(11, 12, 1));
        assertEquals(0.5, Thermostat.modulatedShare(12, 12, 1));
        assertEquals(1, Thermostat.modulatedShare(13, 12, 1));
        assertEquals(0, Thermostat.modulatedSlopePerK(13, 12, 1));
        assertEquals(0.75, Thermostat.modulatedSlopePerK(12, 12, 1));
        assertEquals(16, Thermostat.followedC(new Setting(12, 1, 90), 16));
    }
}
