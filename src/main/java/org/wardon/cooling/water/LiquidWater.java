package org.wardon.cooling.water;

import org.wardon.air.MoistAir;
import org.wardon.errors.Require;

/**
 * Properties of liquid water at one temperature.
 *
 * @param densityKgM3 density, kg/m3
 * @param viscosityPas dynamic viscosity, Pa s
 * @param conductivityWmK conductivity, W/(m K)
 */
public record LiquidWater(double densityKgM3, double viscosityPas, double conductivityWmK) {
    private static final double ZERO_C_IN_K = 273.15;
    private static final double COLDEST_C = -5;
    private static final double HOTTEST_C = 80;

    /** Checks the bounds. */
    public LiquidWater {
        Require.within("densityKgM3", densityKgM3, 900, 1_010, "kg/m3", "");
        Require.within("viscosityPas", viscosityPas, 1e-4, 1e-2, "Pa s", "");
        Require.within("conductivityWmK", conductivityWmK, 0.4, 0.8, "W/(m K)", "");
    }

    /**
     * Returns the properties; a temperature outside the range takes its end.
     *
     * <p>Source: viscosity by Vogel's form, 2.414e-5 * 10^(247.8/(T - 140)) Pa s, stated good to
     * 2.5 %; conductivity by Ramires and others 1995, a square in T/298.15 K; density by the
     * rational form of Gill 1982 for pure water at air pressure; all from memory.
     *
     * @param temperatureC °C, -5 to 80
     * @return the properties
     */
    public static LiquidWater at(double temperatureC) {
        double t = Math.min(Math.max(temperatureC, COLDEST_C), HOTTEST_C);
        double kelvin = t + ZERO_C_IN_K;
        double away = t - 3.9863;
        double density = 1_000 * (1 - (t + 288.9414) / (508_929.2 * (t + 68.12963)) * away * away);
        double viscosity = 2.414e-5 * Math.pow(10, 247.8 / (kelvin - 140));
        double share = kelvin / 298.15;
        double conductivity = 0.6065 * (-1.48445 + share * (4.12292 - share * 1.63866));
        return new LiquidWater(density, viscosity, conductivity);
    }

    /**
     * Returns the Prandtl number.
     *
     * @return dimensionless
     */
    public double prandtl() {
        return MoistAir.WATER_J_KG_K * viscosityPas / conductivityWmK;
    }

    /**
     * Returns a film of it.
     *
     * @return the film
     */
    public FallingFilm film() {
        return new FallingFilm(densityKgM3, viscosityPas, conductivityWmK);
    }
}
