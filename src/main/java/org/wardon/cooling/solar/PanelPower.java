package org.wardon.cooling.solar;

import org.wardon.air.Sunshine;
import org.wardon.air.Weather;

/**
 * What panels give, by the sun on their plane and their own heat.
 *
 * <p>{@code P = Wp x G/1000 x (1 - 0.004 (Tcell - 25)) x performance ratio}, {@code Tcell = Tair +
 * (45 - 20) G/800}.
 *
 * <p>Source: cell temperature by the nominal operating temperature, Duffie and Beckman, chapter 23
 * (from memory), 45 °C as for common crystalline panels; loss of 0.4 % a kelvin, crystalline
 * silicon, Skoplaki and Palyvos 2009, On the temperature dependence of photovoltaic module
 * electrical performance, Solar Energy 83 (from memory).
 */
public final class PanelPower {
    private static final double REFERENCE_WM2 = 1_000;
    private static final double REFERENCE_C = 25;
    private static final double LOSS_PER_K = 0.004;
    private static final double NOMINAL_RISE_K = 45 - 20;
    private static final double NOMINAL_WM2 = 800;

    private PanelPower() {}

    /**
     * Returns the power of a panel.
     *
     * @param panelWp its rating, W
     * @param performanceRatio share left after all losses but heat
     * @param irradianceWm2 sun on its plane, W/m2, 0 or more
     * @param airC air around it, °C
     * @return W, 0 or more
     */
    public static double watts(
            double panelWp, double performanceRatio, double irradianceWm2, double airC) {
        double cellC = airC + NOMINAL_RISE_K * irradianceWm2 / NOMINAL_WM2;
        double heat = 1 - LOSS_PER_K * (cellC - REFERENCE_C);
        return panelWp * irradianceWm2 / REFERENCE_WM2 * Math.max(0, heat) * performanceRatio;
    }

    /**
     * Returns the power of a supply's panels through a run, straight between hours.
     *
     * @param supply the supply
     * @param sun sun of the run
     * @param weather its weather
     * @param hours length of the run, h
     * @return {@code [hour]}, 0 to {@code hours}, W
     */
    public static double[] hourlyW(SolarSupply supply, Sunshine sun, Weather weather, int hours) {
        double[] watts = new double[hours + 1];
        for (int h = 0; h <= hours; h++) {
            watts[h] =
                    watts(
                            supply.panelWp(),
                            supply.performanceRatio(),
                            sun.onFaceWm2(h, supply.tiltDeg(), supply.azimuthDeg()),
                            weather.temperatureC(h));
        }
        return watts;
    }
}
