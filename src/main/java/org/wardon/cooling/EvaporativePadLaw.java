package org.wardon.cooling;

import org.wardon.air.MoistAir;
import org.wardon.air.WetBulb;

/**
 * A wet pad at its site: supply air from effectiveness and the wet bulb of that instant, blown in.
 *
 * <p>Source: saturation effectiveness as in Wang, Handbook of Air Conditioning and Refrigeration
 * (table of cooling sources, saturation_effectiveness); humidity along the wet-bulb line of ASHRAE
 * Handbook - Fundamentals, 2017, chapter 1, equation 33; the water taken up (water_use) from memory
 * of the same book. The same relations as {@link PadOutlet}, which is held against print.
 *
 * <p>Own conditions: the supply must be {@value #COMES_ON_K} K colder than the chamber's air to
 * come on and {@value #GOES_OFF_K} K to stay on, since two thermometers differ by half a kelvin,
 * and air moved for less costs more fan and water than it cools; and the wet bulb outdoors must be
 * {@value #FREEZES_BELOW_C} °C or more, since a pad that freezes is destroyed (all assumption). A
 * fan that follows the air within the band is led by the same differences smoothly.
 */
public final class EvaporativePadLaw implements CoolerLaw {
    /** Supply colder than the chamber's air to come on, K. */
    static final double COMES_ON_K = 1;

    /** Supply colder than the chamber's air to stay on, K. */
    static final double GOES_OFF_K = 0.5;

    /** Wet bulb below which the pad stays off, °C. */
    static final double FREEZES_BELOW_C = 1;

    private static final double FREEZING_SPREAD_K = 1;

    private final EvaporativePad pad;
    private final double pressurePa;

    EvaporativePadLaw(EvaporativePad pad, double pressurePa) {
        this.pad = pad;
        this.pressurePa = pressurePa;
    }

    @Override
    public int ownStates() {
        return 0;
    }

    @Override
    public void effect(CoolerInputs in, CoolerEffect out) {
        out.clear();
        if (in.run <= 0) {
            return;
        }
        Supply supply = supply(in, out);
        share(in, supply, out);
        supply.blownIn(in, pad.fanW(), out);
        double evaporates = Math.max(supply.ratio - supply.outdoorRatio, 0);
        out.waterKgS = out.exchangeKgS * evaporates * (1 + pad.bleedPct() / 100);
    }

    /** The share it runs: the thermostat's, less where the supply is hardly colder. */
    private void share(CoolerInputs in, Supply supply, CoolerEffect out) {
        double allowed = 1;
        double byAirC = 0;
        if (pad.control() == Control.MODULATING) {
            double span = COMES_ON_K - GOES_OFF_K;
            double u = (in.airC - supply.enteringC - GOES_OFF_K) / span;
            double thawed = Smooth.step((supply.wetBulbC - FREEZES_BELOW_C) / FREEZING_SPREAD_K);
            allowed = Smooth.step(u) * thawed;
            byAirC = Smooth.stepSlope(u) / span * thawed;
        }
        out.ran = in.run * allowed;
        out.ranByAirC = in.run * byAirC;
        out.ranByRun = allowed;
    }

    private Supply supply(CoolerInputs in, CoolerEffect out) {
        Supply supply = out.supply;
        if (supply.meets(in, pressurePa)) {
            return supply;
        }
        double outdoorC = supply.outdoorC;
        double wetBulb = WetBulb.temperatureC(outdoorC, supply.outdoorRatio, pressurePa);
        supply.wetBulbC = wetBulb;
        supply.airC = outdoorC - pad.effectiveness() * (outdoorC - wetBulb);
        supply.ratio = Math.max(WetBulb.humidityRatio(supply.airC, wetBulb, pressurePa), 0);
        supply.flowKgS =
                pad.airFlowM3s()
                        / MoistAir.specificVolumeM3kg(supply.airC, supply.ratio, pressurePa);
        supply.warmedBy(pad.fanW());
        return supply;
    }

    @Override
    public boolean conditional() {
        return true;
    }

    @Override
    public double inside(CoolerInputs in, boolean on, CoolerEffect out) {
        Supply supply = supply(in, out);
        double colder = in.airC - supply.enteringC - (on ? GOES_OFF_K : COMES_ON_K);
        double thawed = supply.wetBulbC - FREEZES_BELOW_C - (on ? 0 : FREEZING_SPREAD_K);
        return Math.min(colder, thawed);
    }
}
