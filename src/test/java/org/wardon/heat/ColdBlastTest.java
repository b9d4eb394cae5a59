package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.wardon.cooling.Control;
import org.wardon.errors.Progress;

/** A lot near the cooler stands midway between the room's air and that off the coil. */
class ColdBlastTest {
    private static ChamberRun run(Control control, Berth berth) {
        ChamberRun full = Chambers.full(control, 3, 3);
        List<Stay> stays =
                full.stays().stream()
                        .map(
                                stay ->
                                        stay.lot().id().equals("L1")
                                                ? new Stay(
                                                        stay.lot(),
                                                        stay.arrivesS(),
                                                        stay.leavesS(),
                                                        stay.pulpC(),
                                                        stay.freshUntilS(),
                                                        0,
                                                        berth)
                                                : stay)
                        .toList();
        return full.withStays(stays);
    }

    @ParameterizedTest
    @EnumSource(Control.class)
    void aLotInTheBlastFollowsTheAirMidwayAndTheBalancesClose(Control control) {
        Course room = HeatModel.run(run(control, Berth.DOOR), Progress.SILENT);
        Course blown = HeatModel.run(run(control, Berth.DOOR.nearCooler()), Progress.SILENT);
        assertTrue(blown.balanceErrorPct() < 1e-6, "error " + blown.balanceErrorPct());
        Hours hours = blown.hours();
        double[] time = new double[hours.size()];
        double[] air = new double[hours.size()];
        double[] humidity = new double[hours.size()];
        double chill = 0;
        double blows = 0;
        for (int i = 0; i < hours.size(); i++) {
            time[i] = hours.atS(i);
            air[i] = hours.airC(i) - 0.5 * hours.chillK(i);
            humidity[i] = Math.min(1, hours.humidityFraction(i));
            assertTrue(hours.blows(i) >= 0 && hours.blows(i) <= 1 + 1e-9);
            assertTrue(hours.blows(i) == 0 || hours.supplyC(i) < hours.airHighestC(i));
            chill += hours.chillK(i) / hours.size();
            blows += hours.blows(i) / hours.size();
        }
        assertTrue(chill > 0.5 && blows > 0.05, chill + " K, " + blows);
        LotCourse lot = blown.lot("L1");
        LotCourse given =
                HeatModel.runInGivenAir(
                        lot.stay(),
                        new AirSeries(time, air, humidity),
                        Chambers.SITE,
                        Factors.PLAIN,
                        3 * 86_400);
        double colder = 0;
        for (int i = 30; i < lot.size(); i++) {
            assertEquals(given.meanC(i), lot.meanC(i), 0.35, "hour " + i);
            colder += (room.lot("L1").meanC(i) - lot.meanC(i)) / (lot.size() - 30);
        }
        // No more than the blast is colder; its drier air has a lot dry and so warm a little less.
        assertTrue(colder > 0.15 * chill && colder < 0.5 * chill, colder + " of " + chill);
        assertTrue(
                blown.lot("L0").meanC(60) - room.lot("L0").meanC(60) < 0.3,
                "the others stand in the room's air");
    }
}
