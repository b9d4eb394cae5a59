package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Layer;
import org.wardon.heat.network.FaceReading;

/** What moves the heat and the water of one hour. */
class HourAccountTest {
    private static final double HOUR_S = 3_600;

    private static ChamberRun run() {
        return run(Control.ON_OFF);
    }

    private static ChamberRun run(Control control) {
        ChamberRun full = Chambers.full(control, 3, 3);
        Stay late = full.stays().get(2);
        return full.withStays(
                List.of(
                        full.stays().get(0),
                        new Stay(full.stays().get(1).lot(), 0, 40.3 * HOUR_S, 24),
                        new Stay(late.lot(), 33.5 * HOUR_S, Double.POSITIVE_INFINITY, 26)));
    }

    @ParameterizedTest(name = "hour {0}")
    @ValueSource(ints = {0, 7, 12, 33, 40, 71})
    void theTermsOfAnHourSumToItsChange(int hour) {
        HourAccount hourly = HeatModel.account(run(), hour * HOUR_S, (hour + 1) * HOUR_S);
        HeatLedger heat = hourly.heat();
        assertTrue(heat.errorShare() < 1e-3, "heat closes to " + heat.errorShare());
        assertTrue(hourly.water().errorShare() < 1e-3, "water " + hourly.water().errorShare());
        // What the air stores is told by its states, everything else by the solver's integrals.
        double stored =
                hourly.after().dryAirKg() * hourly.after().enthalpyJkg()
                        - hourly.before().dryAirKg() * hourly.before().enthalpyJkg();
        double others = heat.sum() - heat.air() - heat.removed();
        assertEquals(stored, others, 1e-3 * heat.throughput());
        for (HourAccount.OfLot lot : hourly.lots()) {
            LotAmounts gave = lot.gave();
            double in = gave.respirationJ() + gave.fleshJ() + gave.liquidJ() + gave.packageJ();
            assertEquals(in, gave.toAirJ(), 1e-3 * Math.abs(gave.toAirJ()) + 1, lot.id());
            assertEquals(
                    gave.evaporatedKg() + gave.packageKg(),
                    gave.toAirKg(),
                    1e-3 * Math.abs(gave.toAirKg()) + 1e-9,
                    lot.id());
        }
        assertEquals(hour < 33 || hour > 40 ? 2 : 3, hourly.lots().size());
    }

    /** Modulating: switched on and off, the air of an instant hangs on the phase of the cycles. */
    @Test
    void aSpanHourByHourIsTheSameAsItsHoursAskedOneByOne() {
        ChamberRun run = run(Control.MODULATING);
        List<HourAccount> hours = HeatModel.accounts(run, 31.5 * HOUR_S, 35 * HOUR_S);
        assertEquals(4, hours.size());
        assertEquals(0.5 * HOUR_S, hours.get(3).untilS() - hours.get(3).fromS(), 1e-9);
        for (HourAccount hour : hours) {
            HourAccount alone = HeatModel.account(run, hour.fromS(), hour.untilS());
            // The steps of the two runs land in other places.
            assertEquals(alone.after().temperatureC(), hour.after().temperatureC(), 0.02);
            assertEquals(
                    alone.heat().removed(),
                    hour.heat().removed(),
                    0.01 * Math.abs(alone.heat().removed()) + 2_000);
            assertEquals(alone.lots().size(), hour.lots().size());
        }
    }

    @Test
    void theHoursOfADayAddUpToTheDaysLedger() {
        ChamberRun day = run().withDurationS(24 * HOUR_S).withStays(run().stays().subList(0, 2));
        HeatLedger whole = HeatModel.run(day, org.wardon.errors.Progress.SILENT).heat();
        double walls = 0;
        double fieldHeat = 0;
        double removed = 0;
        for (int h = 0; h < 24; h++) {
            HeatLedger heat = HeatModel.account(day, h * HOUR_S, (h + 1) * HOUR_S).heat();
            walls += heat.walls();
            fieldHeat += heat.fieldHeat();
            removed += heat.removed();
        }
        assertEquals(whole.walls(), walls, 1e-3 * Math.abs(whole.walls()));
        assertEquals(whole.fieldHeat(), fieldHeat, 1e-3 * whole.fieldHeat());
        assertEquals(whole.removed(), removed, 1e-3 * whole.removed());
    }

    @Source("ISO 6946: steady temperatures through plane layers, surface resistances 0.04 and 0.13")
    @ParameterizedTest
    @EnumSource(names = {"NORTH", "WEST"})
    void aSteadyProfileIsMonotoneAndThatOfTheClosedForm(FaceName name) {
        Layer brick = new Layer("brick", 0.1, 0.6, 1_700, 840);
        List<Layer> layers = List.of(Chambers.SHEET, Chambers.FOAM, brick);
        ChamberRun steady =
                Chambers.passive(Chambers.shut(layers), Weather.steady(30, 20), 10)
                        .withSetting(new Setting(4, 1, 50))
                        .withDoorMode(DoorMode.AVERAGED)
                        .withControlMode(ControlMode.IDEAL);
        HourAccount last = HeatModel.account(steady, 239 * HOUR_S, 240 * HOUR_S);
        FaceReading face = java.util.Objects.requireNonNull(last.faces().get(name));
        double airC = last.after().temperatureC();
        double foam = 0.08 / 0.024;
        double all = 0.04 + foam + 0.1 / 0.6 + 0.13;
        double flux = (30 - airC) / all;
        assertEquals(30 - 0.04 * flux, face.outerC(), 0.02);
        assertEquals(airC + 0.13 * flux, face.innerC(), 0.02);
        assertEquals(0.1805, face.thicknessM(), 1e-9);
        double before = 30;
        for (FaceReading.Point point : face.points()) {
            double inFoam = Math.min(Math.max(point.depthM() - 0.0005, 0), 0.08) / 0.024;
            double inBrick = Math.max(point.depthM() - 0.0805, 0) / 0.6;
            double exact = 30 - flux * (0.04 + inFoam + inBrick);
            assertEquals(exact, point.temperatureC(), 0.02, "at " + point.depthM());
            assertTrue(point.temperatureC() <= before, "monotone at " + point.depthM());
            before = point.temperatureC();
        }
        assertTrue(before > airC);
        assertEquals(flux * face.areaM2() * HOUR_S, face.fromBeyondJ(), 0.002 * face.fromBeyondJ());
        assertEquals(face.fromBeyondJ(), face.toAirJ(), 0.002 * face.fromBeyondJ());
    }
}
