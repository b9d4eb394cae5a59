package org.wardon.cooling.solar;

import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * Panels and a battery that feed one chamber, and nothing else.
 *
 * @param panelWp power of all panels under 1000 W/m2 at 25 °C, W
 * @param tiltDeg tilt, 0 level, 90 upright
 * @param azimuthDeg compass direction they look to, degrees from north by east
 * @param performanceRatio share left after dirt, wiring, mismatch, charge control and inverter;
 *     heat is counted apart
 * @param battery the battery
 * @param inverterW the most it can give at once, W; absent where it never limits
 */
public record SolarSupply(
        double panelWp,
        double tiltDeg,
        double azimuthDeg,
        double performanceRatio,
        Cells battery,
        OptionalDouble inverterW) {
    /**
     * A battery.
     *
     * @param kWh what can be taken out of it, full to empty, kWh
     * @param efficiency share of what went in that comes out again
     * @param startChargePct its charge at the start of the run, percent
     * @param restartChargePct once empty it feeds nothing until charged so far, percent
     */
    public record Cells(
            double kWh, double efficiency, double startChargePct, double restartChargePct) {
        /** Checks the bounds. */
        public Cells {
            Require.within("supply.solar.batteryKWh", kWh, 0.1, 100_000, "kWh", "");
            Require.within("supply.solar.batteryEfficiency", efficiency, 0.4, 1, "", "");
            Require.within("supply.solar.startChargePct", startChargePct, 0, 100, "%", "");
            Require.within("supply.solar.restartChargePct", restartChargePct, 1, 100, "%", "");
        }
    }

    /** Checks the bounds. */
    public SolarSupply {
        Require.within("supply.solar.panelWp", panelWp, 10, 10_000_000, "W", "");
        Require.within("supply.solar.tiltDeg", tiltDeg, 0, 90, "°", "");
        Require.within("supply.solar.azimuthDeg", azimuthDeg, -360, 360, "°", "");
        Require.within("supply.solar.performanceRatio", performanceRatio, 0.3, 1, "", "");
        if (inverterW.isPresent()) {
            Require.within("supply.solar.inverterW", inverterW.getAsDouble(), 10, 1e7, "W", "");
        }
    }
}
