package org.wardon.cooling;

import java.util.Arrays;

/**
 * What a cooler does to its chamber at one instant. Mutable with open fields on purpose: the solver
 * asks for it several times a step, hundreds of thousands of times a run, and a new object each
 * time would cost more than the answer. It is filled by a {@link CoolerLaw} and owned by the
 * caller; one thread, one object.
 *
 * <p>Signs: heat and vapour are positive when they leave the chamber's air. The air's own balance
 * is exact with {@code heat capacity x dT/dt = -sensibleW} and {@code dry air mass x dW/dt =
 * -vapourKgS}: vapour leaves at the enthalpy it has at air temperature.
 */
public final class CoolerEffect {
    /** Sensible heat taken from the air, W. */
    public double sensibleW;

    /** Vapour taken from the air, kg/s; below 0 where the cooler moistens. */
    public double vapourKgS;

    /** Sensible heat by air temperature, W/K. */
    public double sensibleByAirC;

    /** Sensible heat by humidity ratio, W per kg/kg. */
    public double sensibleByHumidity;

    /** Vapour by air temperature, kg/(s K). */
    public double vapourByAirC;

    /** Vapour by humidity ratio, kg/s per kg/kg. */
    public double vapourByHumidity;

    /** Sensible heat by running share or speed, W. */
    public double sensibleByRun;

    /** Vapour by running share or speed, kg/s. */
    public double vapourByRun;

    /**
     * Heat the cooler carries out of the chamber, W: sensible heat and what the vapour gives up on
     * its way to water or frost. Air loses this and the enthalpy of what drains.
     */
    public double totalW;

    /** Water draining away as liquid, kg/s. */
    public double drainKgS;

    /** Water turning to frost on the coil, kg/s. */
    public double frostKgS;

    /** Enthalpy of what drains or freezes, J/kg from liquid water of 0 °C. */
    public double drainEnthalpyJkg;

    /**
     * Share of the time it really runs, or speed: the thermostat's share less what its own
     * conditions forbid. Fan, exchange and water go with it.
     */
    public double ran;

    /** That share by air temperature, the thermostat's held, 1/K. */
    public double ranByAirC;

    /** That share by the thermostat's. */
    public double ranByRun;

    /** Outdoor air driven through the chamber, kg dry air/s. */
    public double exchangeKgS;

    /** Water used up, kg/s. */
    public double waterKgS;

    /** Electric power of compressor or pump, without the fan, W. */
    public double electricW;

    /** Electric power by air temperature, W/K. */
    public double electricByAirC;

    /** Electric power by humidity ratio, W per kg/kg. */
    public double electricByHumidity;

    /** Electric power by running share or speed, W. */
    public double electricByRun;

    /** Power of the fan, all of which warms the chamber's air, W. */
    public double fanW;

    /** Heat that melts the cooler's own ice, W. */
    public double meltsW;

    /** That heat by air temperature, W/K. */
    public double meltsByAirC;

    /** That heat by humidity ratio, W per kg/kg. */
    public double meltsByHumidity;

    /** That heat by running share, W. */
    public double meltsByRun;

    /** Heat its machine takes out of its ice, W. */
    public double refreezesW;

    /** Evaporating temperature, °C; NaN where the cooler has none or rests. */
    public double evaporatingC = Double.NaN;

    /** Condensing temperature, °C; NaN where the cooler has none or rests. */
    public double condensingC = Double.NaN;

    /** Temperature of the air leaving the cooler, °C; NaN where it rests. */
    public double supplyC = Double.NaN;

    /** Whether the high-pressure switch holds the compressor back. */
    public boolean tripped;

    /** {@code [own state]}, rate of each, its unit a second. */
    public final double[] ownRate;

    /** {@code [own state]}, its rate by air temperature, unit/(s K). */
    public final double[] ownRateByAirC;

    /** {@code [own state]}, its rate by humidity ratio, unit/s per kg/kg. */
    public final double[] ownRateByHumidity;

    /** {@code [own state]}, its rate by running share or speed, unit/s. */
    public final double[] ownRateByRun;

    /** {@code [own state]}, its rate by itself, 1/s. */
    public final double[] ownRateByOwn;

    /** {@code [own state]}, sensible heat by the state, W per unit. */
    public final double[] sensibleByOwn;

    /** {@code [own state]}, vapour by the state, kg/s per unit. */
    public final double[] vapourByOwn;

    /** {@code [own state]}, electric power by the state, W per unit. */
    public final double[] electricByOwn;

    /** {@code [own state]}, heat that melts ice by the state, W per unit. */
    public final double[] meltsByOwn;

    /** {@code [own state]}, heat taken out of the ice by the state, W per unit. */
    public final double[] refreezesByOwn;

    /** Seconds until the cooler itself changes its course; infinite where it does not. */
    public double nextEventS = Double.POSITIVE_INFINITY;

    /** Scratch: outdoor air on its way in; kept while the outdoor air stays. */
    final Supply supply = new Supply();

    /** Scratch of the coil's iteration. */
    final Coil.State coil = new Coil.State();

    /** Scratch: what drains by air temperature, kg/(s K). */
    double drainByAirC;

    /** Scratch: what drains by humidity ratio, kg/s per kg/kg. */
    double drainByHumidity;

    /** Scratch: what drains by running share or speed, kg/s. */
    double drainByRun;

    /**
     * Makes room for the answers of one cooler.
     *
     * @param ownStates own states of the cooler, 0 or more
     */
    public CoolerEffect(int ownStates) {
        ownRate = new double[ownStates];
        ownRateByAirC = new double[ownStates];
        ownRateByHumidity = new double[ownStates];
        ownRateByRun = new double[ownStates];
        ownRateByOwn = new double[ownStates];
        sensibleByOwn = new double[ownStates];
        vapourByOwn = new double[ownStates];
        electricByOwn = new double[ownStates];
        meltsByOwn = new double[ownStates];
        refreezesByOwn = new double[ownStates];
    }

    /** Sets everything to a resting cooler; the last evaporating temperature goes too. */
    public void clear() {
        sensibleW = vapourKgS = 0;
        sensibleByAirC = sensibleByHumidity = vapourByAirC = vapourByHumidity = 0;
        sensibleByRun = vapourByRun = 0;
        ran = ranByAirC = ranByRun = 0;
        meltsW = meltsByAirC = meltsByHumidity = meltsByRun = refreezesW = 0;
        drainByAirC = drainByHumidity = drainByRun = 0;
        totalW = drainKgS = frostKgS = drainEnthalpyJkg = exchangeKgS = waterKgS = 0;
        electricW = fanW = electricByAirC = electricByHumidity = electricByRun = 0;
        evaporatingC = condensingC = supplyC = Double.NaN;
        tripped = false;
        if (ownRate.length > 0) {
            clearOwn();
        }
        nextEventS = Double.POSITIVE_INFINITY;
    }

    private void clearOwn() {
        Arrays.fill(ownRate, 0);
        Arrays.fill(ownRateByAirC, 0);
        Arrays.fill(ownRateByHumidity, 0);
        Arrays.fill(ownRateByRun, 0);
        Arrays.fill(ownRateByOwn, 0);
        Arrays.fill(sensibleByOwn, 0);
        Arrays.fill(vapourByOwn, 0);
        Arrays.fill(electricByOwn, 0);
        Arrays.fill(meltsByOwn, 0);
        Arrays.fill(refreezesByOwn, 0);
    }

    /**
     * Expects an effect like another, so that it is found from near there.
     *
     * @param other what was found last, of the same cooler
     */
    public void expect(CoolerEffect other) {
        evaporatingC = other.evaporatingC;
        coil.foundAs(other.coil);
    }
}
