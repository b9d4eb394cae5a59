package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * A gas given off at a steady rate into well-mixed air that changes at a steady rate: exact, and a
 * check on the full model.
 *
 * @param sourcePpmH rise without any air change, ppm/h
 * @param airChangesPerHour free volumes an hour
 * @param outdoorPpm level of the air coming in, ppm
 */
public record GasLevel(double sourcePpmH, double airChangesPerHour, double outdoorPpm) {
    /** Molar gas constant, J/(mol K). */
    private static final double GAS_J_MOL_K = 8.314462;

    /** Molar mass of carbon dioxide, g/mol. */
    private static final double CARBON_DIOXIDE_G_MOL = 44.01;

    /** Checks the bounds. */
    public GasLevel {
        Require.within("airChangesPerHour", airChangesPerHour, 0, 1e4, "1/h", "");
    }

    /**
     * Returns the rise of carbon dioxide by respiration in a chamber without air change.
     *
     * @param massKg produce, kg
     * @param respirationMgKgH respiration, mg CO2/(kg h)
     * @param freeVolumeM3 free volume, m3
     * @param temperatureC air, °C
     * @param pressurePa air pressure, Pa
     * @return ppm by volume an hour
     */
    public static double carbonDioxidePpmH(
            double massKg,
            double respirationMgKgH,
            double freeVolumeM3,
            double temperatureC,
            double pressurePa) {
        double molPerHour = massKg * respirationMgKgH * 1e-3 / CARBON_DIOXIDE_G_MOL;
        double airMol = pressurePa * freeVolumeM3 / (GAS_J_MOL_K * (temperatureC + 273.15));
        return 1e6 * molPerHour / airMol;
    }

    /**
     * Returns the level it comes to rest at.
     *
     * @return ppm; infinite without air change
     */
    public double restsAtPpm() {
        return outdoorPpm + sourcePpmH / airChangesPerHour;
    }

    /**
     * Returns the level after some time.
     *
     * @param startPpm level at the start, ppm
     * @param hours time since, h
     * @return ppm
     */
    public double afterPpm(double startPpm, double hours) {
        if (airChangesPerHour == 0) {
            return startPpm + sourcePpmH * hours;
        }
        double rest = restsAtPpm();
        return rest + (startPpm - rest) * Math.exp(-airChangesPerHour * hours);
    }

    /**
     * Returns the time until a level is reached from below.
     *
     * @param startPpm level at the start, ppm
     * @param limitPpm the level, ppm, above the start
     * @return h, infinite where it never is
     */
    public double timeToH(double startPpm, double limitPpm) {
        if (airChangesPerHour == 0) {
            return (limitPpm - startPpm) / sourcePpmH;
        }
        double rest = restsAtPpm();
        return rest <= limitPpm
                ? Double.POSITIVE_INFINITY
                : Math.log((rest - startPpm) / (rest - limitPpm)) / airChangesPerHour;
    }

    /**
     * Returns the air changes that hold a level.
     *
     * @param sourcePpmH rise without any air change, ppm/h
     * @param limitPpm level to hold, ppm, above outdoors
     * @param outdoorPpm level of the air coming in, ppm
     * @return free volumes an hour
     */
    public static double airChangesToHold(double sourcePpmH, double limitPpm, double outdoorPpm) {
        Require.that(limitPpm > outdoorPpm, "no air change holds a level below that outdoors");
        return sourcePpmH / (limitPpm - outdoorPpm);
    }
}
