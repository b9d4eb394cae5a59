package org.wardon.plan;

/** What stands in where a plan's solar supply is silent, with what it rests on. */
public final class SolarDefaults {
    /** Share left after dirt, wiring, mismatch, charge control and inverter; heat counts apart. */
    public static final Default PERFORMANCE_RATIO = new Default(0.8, "1", Defaults.COMMON_PRACTICE);

    /** Share of what went into a battery that comes out again. */
    public static final Default BATTERY_EFFICIENCY =
            new Default(0.9, "1", Defaults.COMMON_PRACTICE);

    /** Charge at the start of a run, at midnight often half used. */
    public static final Default START_CHARGE_PCT = new Default(50, "%", Defaults.ASSUMPTION);

    /** An empty battery feeds nothing until charged so far. */
    public static final Default RESTART_CHARGE_PCT = new Default(20, "%", Defaults.ASSUMPTION);

    /** Panels are tilted at least so much, that rain may wash them. */
    private static final double LEAST_TILT_DEG = 10;

    private SolarDefaults() {}

    /**
     * Returns the tilt of panels: the latitude.
     *
     * @param latitudeDeg latitude, degrees
     * @return degrees from level, 10 to 90
     */
    public static Default tiltDeg(double latitudeDeg) {
        double tilt = Math.max(LEAST_TILT_DEG, Math.rint(Math.abs(latitudeDeg)));
        return new Default(tilt, "°", Defaults.COMMON_PRACTICE);
    }

    /**
     * Returns where panels look to: the equator.
     *
     * @param latitudeDeg latitude, degrees, north positive
     * @return 180 north of the equator, 0 south of it, degrees from north by east
     */
    public static Default azimuthDeg(double latitudeDeg) {
        return new Default(latitudeDeg >= 0 ? 180 : 0, "°", Defaults.COMMON_PRACTICE);
    }
}
