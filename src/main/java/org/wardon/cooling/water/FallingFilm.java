package org.wardon.cooling.water;

import org.wardon.air.MoistAir;
import org.wardon.errors.Require;

/**
 * Water running down a wall in a film.
 *
 * <p>Source: Nusselt 1916 for a smooth laminar film; Wilke 1962 for its heat transfer to a wall of
 * one temperature; Chun and Seban 1971 for a wavy one; Reynolds number as in Bird, Stewart and
 * Lightfoot, Transport Phenomena; all from memory, as in the table of cooling sources.
 *
 * @param densityKgM3 density, kg/m3
 * @param viscosityPas dynamic viscosity, Pa s
 * @param conductivityWmK conductivity, W/(m K)
 */
public record FallingFilm(double densityKgM3, double viscosityPas, double conductivityWmK) {
    private static final double GRAVITY_MS2 = 9.81;
    private static final double UPRIGHT_DEG = 90;
    private static final double WAVES_FROM = 30;
    private static final double TURBULENT_FROM = 1_700;

    /** Checks the bounds. */
    public FallingFilm {
        Require.within("densityKgM3", densityKgM3, 100, 2_000, "kg/m3", "");
        Require.within("viscosityPas", viscosityPas, 1e-5, 10, "Pa s", "");
        Require.within("conductivityWmK", conductivityWmK, 0.01, 10, "W/(m K)", "");
    }

    /**
     * Returns the thickness of a smooth laminar film.
     *
     * @param flowKgMs flow a metre of width, kg/(m s), above 0
     * @param slopeDeg slope from the level, degrees, 90 upright
     * @return m
     */
    public double thicknessM(double flowKgMs, double slopeDeg) {
        return Math.cbrt(3 * viscosityPas * flowKgMs / drive(slopeDeg));
    }

    /**
     * Returns the flow of a film of this thickness: the inverse of {@link #thicknessM}.
     *
     * @param thicknessM thickness, m
     * @param slopeDeg slope from the level, degrees
     * @return kg/(m s)
     */
    public double flowKgMs(double thicknessM, double slopeDeg) {
        return thicknessM * thicknessM * thicknessM * drive(slopeDeg) / (3 * viscosityPas);
    }

    /**
     * Returns the mean velocity.
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @param slopeDeg slope from the level, degrees
     * @return m/s
     */
    public double velocityMs(double flowKgMs, double slopeDeg) {
        return flowKgMs / (densityKgM3 * thicknessM(flowKgMs, slopeDeg));
    }

    /**
     * Returns the Reynolds number: laminar below about 30, wavy to about 1700, then turbulent.
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @return dimensionless, 4 flow/viscosity
     */
    public double reynolds(double flowKgMs) {
        return 4 * flowKgMs / viscosityPas;
    }

    /**
     * Returns the film coefficient of a smooth laminar film on a wall of one temperature; a lower
     * bound once waves form.
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @param slopeDeg slope from the level, degrees
     * @return W/(m2 K)
     */
    public double smoothWm2K(double flowKgMs, double slopeDeg) {
        return 1.88 * conductivityWmK / thicknessM(flowKgMs, slopeDeg);
    }

    /**
     * Returns the film coefficient of a wavy laminar film on an upright wall.
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @return W/(m2 K)
     */
    public double wavyWm2K(double flowKgMs) {
        return 0.822 * Math.pow(reynolds(flowKgMs), -0.22) * conductivityWmK / viscousLengthM();
    }

    /**
     * Returns the film coefficient between a wall and the water of a wavy film that is warmed or
     * cooled, Nu = 0.0323 Re^0.2 Pr^0.344.
     *
     * <p>Source: {@code cooling-sources.csv}, row wavy_heating, WILKE1962 (from memory).
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @return W/(m2 K)
     */
    public double wavyHeatingWm2K(double flowKgMs) {
        return 0.0323
                * Math.pow(reynolds(flowKgMs), 0.2)
                * Math.pow(prandtl(), 0.344)
                * conductivityWmK
                / viscousLengthM();
    }

    /**
     * Returns the film coefficient of a turbulent film, Nu = 0.0038 Re^0.4 Pr^0.65.
     *
     * <p>Source: {@code cooling-sources.csv}, row turbulent_evap, CHUN1971 (from memory).
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @return W/(m2 K)
     */
    public double turbulentWm2K(double flowKgMs) {
        return 0.0038
                * Math.pow(reynolds(flowKgMs), 0.4)
                * Math.pow(prandtl(), 0.65)
                * conductivityWmK
                / viscousLengthM();
    }

    /**
     * Returns the film coefficient between an upright wall and the water: the highest of the
     * smooth, wavy and turbulent laws. Each is a lower bound outside its own regime and the three
     * cross near the borders, so the highest is continuous in the flow.
     *
     * @param flowKgMs flow a metre of width, kg/(m s), above 0
     * @return W/(m2 K)
     */
    public double wallWm2K(double flowKgMs) {
        double smooth = smoothWm2K(flowKgMs, UPRIGHT_DEG);
        return Math.max(smooth, Math.max(wavyHeatingWm2K(flowKgMs), turbulentWm2K(flowKgMs)));
    }

    /** How a film runs. */
    public enum Regime {
        /** Smooth. */
        LAMINAR,
        /** With waves. */
        WAVY,
        /** Turbulent. */
        TURBULENT
    }

    /**
     * Returns how the film runs.
     *
     * <p>Source: {@code cooling-sources.csv}, row film_reynolds, BSL (from memory): laminar below
     * about 30, turbulent above about 1600 to 1800.
     *
     * @param flowKgMs flow a metre of width, kg/(m s)
     * @return its regime
     */
    public Regime regime(double flowKgMs) {
        double re = reynolds(flowKgMs);
        if (re < WAVES_FROM) {
            return Regime.LAMINAR;
        }
        return re < TURBULENT_FROM ? Regime.WAVY : Regime.TURBULENT;
    }

    private double prandtl() {
        return MoistAir.WATER_J_KG_K * viscosityPas / conductivityWmK;
    }

    private double viscousLengthM() {
        double nu = viscosityPas / densityKgM3;
        return Math.cbrt(nu * nu / GRAVITY_MS2);
    }

    private double drive(double slopeDeg) {
        Require.within("slopeDeg", slopeDeg, 1, 90, "°", "90 is upright.");
        return densityKgM3 * densityKgM3 * GRAVITY_MS2 * Math.sin(Math.toRadians(slopeDeg));
    }
}
