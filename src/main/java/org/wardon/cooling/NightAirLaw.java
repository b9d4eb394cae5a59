package org.wardon.cooling;

import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;

/**
 * Night air at its site: outdoor air blown in while its own conditions hold.
 *
 * <p>Source: the rule "colder than the store by 1 to 3 K, and where the dew point allows" from
 * memory of ASHRAE Handbook - Fundamentals (table of cooling sources, night_ventilation). Dew point
 * against store is the humidity the air has once it has come to the chamber's temperature, and both
 * bounds are held against that humidity: it is the one produce meets, while the humidity outdoors
 * is high every night whatever it does inside (assumption).
 *
 * <p>To come on, each condition must be fulfilled by a little more than to stay on: {@value
 * #MORE_K} K and {@value #MORE_PCT} percent (assumption). A fan that follows the air within the
 * band is led over the same differences smoothly.
 */
public final class NightAirLaw implements CoolerLaw {
    /** More than asked for to come on, K. */
    static final double MORE_K = 0.5;

    /** More than asked for to come on, percent of humidity. */
    static final double MORE_PCT = 2;

    private final NightAir fan;
    private final double pressurePa;

    NightAirLaw(NightAir fan, double pressurePa) {
        this.fan = fan;
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
        supply.blownIn(in, fan.fanW(), out);
    }

    /** The share it runs: the thermostat's, less where a condition hardly holds. */
    private void share(CoolerInputs in, Supply supply, CoolerEffect out) {
        out.ran = in.run;
        out.ranByRun = 1;
        if (fan.control() != Control.MODULATING) {
            return;
        }
        double humidityPct = humidityPct(in.airC, supply);
        double perK = -humidityPct * SaturatedAir.logSlopePerK(in.airC);
        double colder = (in.airC - supply.airC - fan.differenceK()) / MORE_K;
        double damp = damp(humidityPct, 0) / MORE_PCT;
        double dry = dry(humidityPct, 0) / MORE_PCT;
        double first = Smooth.step(colder) * Smooth.step((supply.airC - fan.lowestC()) / MORE_K);
        double firstByAirC =
                Smooth.stepSlope(colder)
                        / MORE_K
                        * Smooth.step((supply.airC - fan.lowestC()) / MORE_K);
        double second = Smooth.step(damp) * Smooth.step(dry);
        double secondByAirC =
                (Smooth.stepSlope(damp) * Smooth.step(dry)
                                - Smooth.step(damp) * Smooth.stepSlope(dry))
                        / MORE_PCT
                        * perK;
        out.ranByRun = first * second;
        out.ran = in.run * out.ranByRun;
        out.ranByAirC = in.run * (firstByAirC * second + first * secondByAirC);
    }

    /** Relative humidity of the outdoor air once it has come to the chamber's temperature, %. */
    private double humidityPct(double airC, Supply supply) {
        return 100
                * MoistAir.vapourPressurePa(supply.outdoorRatio, pressurePa)
                / SaturatedAir.pressurePa(airC);
    }

    /** How far the air is from too dry, percent; far where there is no bound. */
    private double damp(double humidityPct, double more) {
        double low = fan.lowestHumidityPct();
        return low <= 0 ? 100 : humidityPct - low - more;
    }

    /** How far the air is from too damp, percent; far where there is no bound. */
    private double dry(double humidityPct, double more) {
        double high = fan.highestHumidityPct();
        return high >= 100 ? 100 : high - humidityPct - more;
    }

    private Supply supply(CoolerInputs in, CoolerEffect out) {
        Supply supply = out.supply;
        if (supply.meets(in, pressurePa)) {
            return supply;
        }
        supply.airC = supply.outdoorC;
        supply.ratio = supply.outdoorRatio;
        supply.flowKgS =
                fan.airFlowM3s()
                        / MoistAir.specificVolumeM3kg(supply.airC, supply.ratio, pressurePa);
        supply.warmedBy(fan.fanW());
        return supply;
    }

    @Override
    public boolean conditional() {
        return true;
    }

    @Override
    public double inside(CoolerInputs in, boolean on, CoolerEffect out) {
        Supply supply = supply(in, out);
        double moreK = on ? 0 : MORE_K;
        double morePct = on ? 0 : MORE_PCT;
        double humidityPct = humidityPct(in.airC, supply);
        double colder = in.airC - supply.airC - fan.differenceK() - moreK;
        double notTooCold = supply.airC - fan.lowestC() - moreK;
        double humidity = Math.min(damp(humidityPct, morePct), dry(humidityPct, morePct));
        return Math.min(Math.min(colder, notTooCold), humidity);
    }
}
