package org.wardon.cooling;

import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.errors.Require;

/**
 * A compressor and its coil in balance: the evaporating temperature is the one at which the coil
 * takes from the air what the compressor can carry away.
 *
 * <p>Capacity rises with the evaporating temperature by 3.5 % a kelvin (3 to 4.5 %), as an
 * exponential so that it never falls below 0, and no further above +10 °C; it falls with the
 * condensing temperature by 1.1 % a kelvin (0.8 to 1.5 %). Power is capacity over {@code eta x
 * Te/(Tc - Te)}, temperatures in kelvin. The rated capacity and power fix the level of the capacity
 * and {@code eta}; the rated air is taken at 85 % humidity (EN 328, from memory), from 20 °C at 47
 * % (27 °C with a wet bulb of 19 °C, ISO 5151, from memory).
 *
 * <p>Source: capacity slopes from memory of ASHRAE Handbook - Refrigeration; fraction of Carnot as
 * in the table of cooling sources (cop_carnot_fraction); limit of +10 °C: common practice, no
 * source.
 *
 * <p>Running on and off, {@code run} is a share of the time. Modulating, it is the speed: less
 * capacity on the same coil, which evaporates warmer and dries less.
 *
 * <p>A coil whose fan always runs has one own state, the water on it (kg): condensate fills it up
 * to 0.2 kg per kW rated (0.1 to 0.3, assumption), the rest drains, and while the compressor rests
 * the fan evaporates it into the chamber again.
 */
public final class CompressorLaw implements CoolerLaw {
    private static final double CAPACITY_PER_TE_K = 0.035;
    private static final double CAPACITY_PER_TC_K = 0.011;
    private static final double NO_GAIN_ABOVE_C = 10;
    private static final double GAIN_ROUNDING_K = 1;
    private static final double COMFORT_FROM_C = 20;
    private static final double COLD_ROOM_HUMIDITY = 0.85;
    private static final double COMFORT_HUMIDITY = 0.47;
    private static final double COIL_WATER_KG_PER_KW = 0.2;

    /** A step of Newton this short is followed by slopes; what is left is of its square, K. */
    private static final double LAST_STEP_K = 1e-5;

    private final Compressor unit;
    private final double pressurePa;
    private final double flowKgS;
    private final double ratedEvaporatingC;
    private final double ratedLimitedC;
    private final double ratedCondensingC;
    private final double carnotFraction;
    private final double coilWaterKg;

    /**
     * Fixes the two constants at the rated point.
     *
     * @param unit the unit
     * @param pressurePa air pressure of the site, Pa
     * @throws IllegalArgumentException where the coil is too small for the rated capacity
     */
    CompressorLaw(Compressor unit, double pressurePa) {
        this.unit = unit;
        this.pressurePa = pressurePa;
        // The fan moves a volume; its mass is taken at the rated air (within 5 % in use).
        flowKgS = unit.airFlowM3s() / MoistAir.specificVolumeM3kg(unit.ratedAirC(), 0, pressurePa);
        ratedEvaporatingC = ratedCoilC();
        ratedLimitedC = limited(ratedEvaporatingC);
        ratedCondensingC = Condensing.temperatureC(unit.ratedOutdoorC());
        double teK = limited(ratedEvaporatingC) + SaturatedAir.ZERO_C_IN_K;
        double lift = ratedCondensingC - limited(ratedEvaporatingC);
        carnotFraction = unit.ratedCapacityW() / unit.ratedPowerW() * lift / teK;
        coilWaterKg = COIL_WATER_KG_PER_KW * unit.ratedCapacityW() / 1_000;
    }

    /** The coil temperature at which the coil takes the rated capacity from the rated air. */
    private double ratedCoilC() {
        double w = MoistAir.humidityRatioAt(unit.ratedAirC(), ratedHumidity(), pressurePa);
        Coil.State coil = new Coil.State();
        double low = -50;
        double high = unit.ratedAirC();
        coil.at(unit.ratedAirC(), w, low, flowKgS, unit.coilUaWK(), pressurePa);
        Require.within(
                "ratedCapacityW",
                unit.ratedCapacityW(),
                0,
                coil.totalW,
                "W at -50 °C evaporating",
                "The coil is too small for the rated capacity: check coilUaWK and airFlowM3s.");
        while (high - low > 1e-11) {
            double middle = 0.5 * (low + high);
            coil.at(unit.ratedAirC(), w, middle, flowKgS, unit.coilUaWK(), pressurePa);
            if (coil.totalW > unit.ratedCapacityW()) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }

    private double ratedHumidity() {
        return unit.ratedAirC() < COMFORT_FROM_C ? COLD_ROOM_HUMIDITY : COMFORT_HUMIDITY;
    }

    /**
     * Returns the evaporating temperature at the rated point.
     *
     * @return °C
     */
    public double ratedEvaporatingC() {
        return ratedEvaporatingC;
    }

    /**
     * Returns the share of the Carnot figure the rated point stands for; 0.35 to 0.65 is usual.
     *
     * @return fraction
     */
    public double carnotFraction() {
        return carnotFraction;
    }

    @Override
    public int ownStates() {
        return unit.fanAlways() ? 1 : 0;
    }

    @Override
    public void effect(CoolerInputs in, CoolerEffect out) {
        double guessC = out.evaporatingC;
        out.clear();
        double condensingC = Condensing.temperatureC(in.outdoorC + unit.condenserRiseK());
        double permitted = Condensing.permitted(condensingC);
        out.tripped = permitted < 1;
        double share = unit.control() == Control.MODULATING ? 1 : in.run;
        double speed = unit.control() == Control.MODULATING ? in.run : 1;
        out.ran = in.run;
        out.ranByRun = 1;
        out.fanW = unit.fanAlways() ? unit.fanW() : unit.fanW() * in.run;
        if (in.run > 0 && permitted > 0) {
            running(in, out, guessC, condensingC, speed * permitted, share);
        }
        if (unit.fanAlways()) {
            coilWater(in, out, in.run * permitted, permitted);
        }
    }

    private void running(
            CoolerInputs in,
            CoolerEffect out,
            double guessC,
            double condensingC,
            double speed,
            double share) {
        Coil.State coil = out.coil;
        double teC =
                balance(
                        in,
                        coil,
                        coil.foreseenC(guessC, in, speed, condensingC),
                        condensingC,
                        speed);
        double full = capacityW(teC, condensingC);
        double byCoil = coil.totalByCoil - speed * full * capacityLogSlope(teC);
        double teByAir = -coil.totalByAir / byCoil;
        double teByHumidity = -coil.totalByHumidity / byCoil;
        double teBySpeed = full / byCoil;
        coil.found(in, speed, condensingC);
        coil.coilByAir = teByAir;
        coil.coilByHumidity = teByHumidity;
        coil.coilBySpeed = teBySpeed;
        coil.coilByCondensing = speed * teBySpeed * condensingLogSlope(condensingC);
        out.sensibleW = share * coil.sensibleW;
        out.vapourKgS = share * coil.vapourKgS;
        out.sensibleByAirC = share * (coil.sensibleByAir + coil.sensibleByCoil * teByAir);
        out.sensibleByHumidity =
                share * (coil.sensibleByHumidity + coil.sensibleByCoil * teByHumidity);
        out.vapourByAirC = share * coil.vapourByCoil * teByAir;
        out.vapourByHumidity = share * (coil.vapourByHumidity + coil.vapourByCoil * teByHumidity);
        if (unit.control() == Control.MODULATING) {
            double speedByRun = speed / in.run;
            out.sensibleByRun = coil.sensibleByCoil * teBySpeed * speedByRun;
            out.vapourByRun = coil.vapourByCoil * teBySpeed * speedByRun;
        } else {
            out.sensibleByRun = coil.sensibleW;
            out.vapourByRun = coil.vapourKgS;
        }
        out.totalW = share * coil.totalW;
        out.frostKgS = out.vapourKgS * Coil.frozenShare(teC);
        out.drainKgS = out.vapourKgS - out.frostKgS;
        double liquid = 1 - Coil.frozenShare(teC);
        double thaws = out.vapourKgS * Coil.frozenShareSlope(teC);
        out.drainByAirC = out.vapourByAirC * liquid - thaws * teByAir;
        out.drainByHumidity = out.vapourByHumidity * liquid - thaws * teByHumidity;
        out.drainByRun = out.vapourByRun * liquid;
        if (unit.control() == Control.MODULATING) {
            out.drainByRun -= thaws * teBySpeed * speed / in.run;
        }
        out.drainEnthalpyJkg = Coil.condensateJkg(teC);
        out.electricW = share * speed * full / cop(teC, condensingC);
        double electricByCoil = out.electricW * powerLogSlope(teC, condensingC);
        out.electricByAirC = electricByCoil * teByAir;
        out.electricByHumidity = electricByCoil * teByHumidity;
        out.electricByRun = out.electricW / in.run;
        if (unit.control() == Control.MODULATING) {
            out.electricByRun += electricByCoil * teBySpeed * speed / in.run;
        }
        out.evaporatingC = teC;
        out.condensingC = condensingC;
        out.supplyC = in.airC - coil.effectiveness * (in.airC - teC);
    }

    /** Newton on coil = compressor, kept inside a bracket; ends with {@code coil} at the root. */
    private double balance(
            CoolerInputs in, Coil.State coil, double guessC, double condensingC, double speed) {
        double low = Math.max(in.airC - 90, SaturatedAir.LOWEST_C);
        double high = Math.min(in.airC + 30, SaturatedAir.HIGHEST_C);
        double te = guessC > low && guessC < high ? guessC : Math.max(low, in.airC - 8);
        for (int i = 0; i < 100; i++) {
            coil.at(in.airC, in.humidityRatio, te, flowKgS, unit.coilUaWK(), pressurePa);
            double carried = speed * capacityW(te, condensingC);
            double f = coil.totalW - carried;
            if (f > 0) {
                low = te;
            } else {
                high = te;
            }
            double step = -f / (coil.totalByCoil - carried * capacityLogSlope(te));
            if (Math.abs(step) < LAST_STEP_K) {
                coil.follow(step);
                return te + step;
            }
            double next = te + step;
            te = next > low && next < high ? next : 0.5 * (low + high);
        }
        return te;
    }

    /** Evaporating temperature that counts for the compressor: no gain above +10 °C. */
    private static double limited(double evaporatingC) {
        return NO_GAIN_ABOVE_C - Smooth.positive(NO_GAIN_ABOVE_C - evaporatingC, GAIN_ROUNDING_K);
    }

    private double capacityW(double evaporatingC, double condensingC) {
        double warmer = limited(evaporatingC) - ratedLimitedC;
        return unit.ratedCapacityW()
                * Math.exp(CAPACITY_PER_TE_K * warmer)
                * (1 - CAPACITY_PER_TC_K * (condensingC - ratedCondensingC));
    }

    private double condensingLogSlope(double condensingC) {
        return -CAPACITY_PER_TC_K / (1 - CAPACITY_PER_TC_K * (condensingC - ratedCondensingC));
    }

    private static double capacityLogSlope(double evaporatingC) {
        return CAPACITY_PER_TE_K
                * Smooth.positiveSlope(NO_GAIN_ABOVE_C - evaporatingC, GAIN_ROUNDING_K);
    }

    /** Slope of the logarithm of power by evaporating temperature: capacity less efficiency. */
    private static double powerLogSlope(double evaporatingC, double condensingC) {
        double te = limited(evaporatingC);
        double counts = Smooth.positiveSlope(NO_GAIN_ABOVE_C - evaporatingC, GAIN_ROUNDING_K);
        return counts
                * (CAPACITY_PER_TE_K
                        - 1 / (condensingC - te)
                        - 1 / (te + SaturatedAir.ZERO_C_IN_K));
    }

    private double cop(double evaporatingC, double condensingC) {
        return CarnotShare.cop(limited(evaporatingC), condensingC, carnotFraction);
    }

    /** Water held on a coil whose fan never stops, and its way back into the air. */
    private void coilWater(CoolerInputs in, CoolerEffect out, double running, double permitted) {
        double wetness = in.own[0] / coilWaterKg;
        double kept = out.drainKgS * (1 - wetness);
        double latent = MoistAir.vapourEnthalpyJkg(in.airC) - MoistAir.WATER_J_KG_K * in.airC;
        double latentSlope = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
        double resting = wetness * (1 - running);
        double lifts = liftKgS(in.airC, in.humidityRatio);
        double back = resting * lifts;
        // Differences here, since the slope of the lift needs the curvature of saturation.
        double byAir =
                resting
                        * (liftKgS(in.airC + 1e-3, in.humidityRatio)
                                - liftKgS(in.airC - 1e-3, in.humidityRatio))
                        / 2e-3;
        double byHumidity =
                resting
                        * (liftKgS(in.airC, in.humidityRatio + 1e-7)
                                - liftKgS(in.airC, in.humidityRatio - 1e-7))
                        / 2e-7;
        out.ownRate[0] = kept - back;
        out.ownRateByAirC[0] = out.drainByAirC * (1 - wetness) - byAir;
        out.ownRateByHumidity[0] = out.drainByHumidity * (1 - wetness) - byHumidity;
        out.ownRateByRun[0] = out.drainByRun * (1 - wetness) + wetness * lifts * permitted;
        out.ownRateByOwn[0] = -(out.drainKgS + (1 - running) * lifts) / coilWaterKg;
        out.vapourByOwn[0] = -(1 - running) * lifts / coilWaterKg;
        out.sensibleByOwn[0] = -out.vapourByOwn[0] * latent;
        out.drainKgS -= kept;
        out.vapourKgS -= back;
        out.vapourByAirC -= byAir;
        out.vapourByHumidity -= byHumidity;
        out.vapourByRun += wetness * lifts * permitted;
        out.sensibleW += back * latent;
        out.sensibleByAirC += byAir * latent + back * latentSlope;
        out.sensibleByHumidity += byHumidity * latent;
        out.sensibleByRun -= wetness * lifts * permitted * latent;
    }

    /** What the fan would evaporate from a wholly wet coil at rest, kg/s. */
    private double liftKgS(double airC, double w) {
        double psat = SaturatedAir.pressurePa(airC);
        double wSat = MoistAir.humidityRatio(psat, pressurePa);
        double wSatSlope =
                wSat * SaturatedAir.logSlopePerK(airC) * pressurePa / (pressurePa - psat);
        double latent = MoistAir.vapourEnthalpyJkg(airC) - MoistAir.WATER_J_KG_K * airC;
        // The wet coil settles near the wet bulb; one linear step from the air's own temperature.
        double lifted = (wSat - w) / (1 + wSatSlope * latent / MoistAir.heatCapacityJkgK(w));
        double eps = 1 - Math.exp(-unit.coilUaWK() / (flowKgS * MoistAir.DRY_AIR_J_KG_K));
        return flowKgS * eps * Smooth.positive(lifted, 1e-5);
    }
}
