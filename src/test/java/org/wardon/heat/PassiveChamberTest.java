package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.errors.Progress;

/** A chamber without a cooler against what can be worked out by hand. */
class PassiveChamberTest {
    private static final List<Layer> PANEL = List.of(Chambers.SHEET, Chambers.FOAM, Chambers.SHEET);

    private static Enclosure withFans(double fansW, double bridgePct) {
        return new Enclosure(
                new Box(4, 3, 2.5),
                Chambers.faces(new Beyond.Shade(), new Beyond.Shade(), PANEL),
                bridgePct,
                Optional.empty(),
                0,
                0,
                new Gains(0, 0, 0, fansW),
                0,
                false);
    }

    /**
     * Sum of A/(Rsi + d/k + Rse), all films by hand: walls level, roof and floor as the heat goes.
     */
    private static double conductanceWK() {
        Box box = new Box(4, 3, 2.5);
        double panel = 0.08 / 0.024 + 0.04;
        double walls = 2 * (box.areaM2(FaceName.NORTH) + box.areaM2(FaceName.EAST));
        double roof = box.areaM2(FaceName.ROOF);
        // Outdoors and the chamber's mean are equal for a passive chamber: the direction is that of
        // an outside not warmer, up through the roof and down through the floor.
        return walls / (panel + 0.13) + roof / (panel + 0.10) + roof / (panel + 0.17);
    }

    @Test
    void settlesWhereFansAndFacesBalance() {
        ChamberRun run =
                Chambers.passive(withFans(300, 0), Weather.steady(25, 60), 12)
                        .withStart(Start.at(25, 60));
        Course course = HeatModel.run(run, Progress.SILENT);
        double rise = course.hours().airC(course.hours().size() - 1) - 25;
        assertEquals(300 / conductanceWK(), rise, 0.005 * rise);
    }

    @Test
    void thermalBridgesAndWallFactorCarryHeatInProportion() {
        ChamberRun run =
                Chambers.passive(withFans(300, 10), Weather.steady(25, 60), 12)
                        .withStart(Start.at(25, 60))
                        .withFactors(new Factors(1.3, 1, 1, 1, 1, 1, 0));
        Course course = HeatModel.run(run, Progress.SILENT);
        double rise = course.hours().airC(course.hours().size() - 1) - 25;
        assertEquals(300 / (1.3 * 1.1 * conductanceWK()), rise, 0.005 * rise);
    }

    @Test
    void anIsothermalChamberStaysIsothermal() {
        ChamberRun run =
                Chambers.passive(withFans(0, 10), Weather.steady(25, 60), 3)
                        .withStart(Start.at(25, 60));
        Course course = HeatModel.run(run, Progress.SILENT);
        for (int i = 0; i < course.hours().size(); i++) {
            assertEquals(25, course.hours().airLowestC(i), 1e-9);
            assertEquals(25, course.hours().airHighestC(i), 1e-9);
        }
    }

    @Test
    void itsBalancesCloseThoughTheyCouldFail() {
        ChamberRun run =
                Chambers.passive(Chambers.panelRoom(20), Chambers.weather(80), 3)
                        .withStays(Chambers.load(3, 900, 20));
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        assertTrue(course.heat().throughput() > 1e7, "throughput " + course.heat().throughput());
    }
}
