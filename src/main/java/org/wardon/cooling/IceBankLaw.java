package org.wardon.cooling;

import java.util.Optional;
import org.wardon.air.MoistAir;

/**
 * A bank of ice at its site. Its one own state is the ice, kg.
 *
 * <p>Heat: conductance times air less melting point. Water: the surface dries the air along the
 * line from the air to its own saturated state, the apparatus dew point of the coil ({@link Coil}),
 * wherever the dew point of the air lies above the melting point; what condenses drains at the
 * melting point, its heat melts ice as well.
 *
 * <p>The last {@value #END} of the ice no longer covers the surface, and the machine makes less and
 * less of the last {@value #END} below a full bank (assumption): so ice stays between nothing and
 * full by itself.
 *
 * <p>Air leaving a bank with a fan stands halfway between chamber and ice (assumption, as 5 K of
 * drop at 10 K of difference); only lots in its blast feel that.
 *
 * <p>Recharging: electric power is that at 35 °C outdoors times the lift over the lift there (the
 * same share of Carnot), evaporating 6 K below the melting point as a coil below its air (table of
 * cooling sources, evap_td_mid_rh), condensing as a compressor ({@link Condensing}).
 */
public final class IceBankLaw implements CoolerLaw {
    /** Share of the ice over which it ends, and over which it comes to be full. */
    static final double END = 0.02;

    private static final double RATED_OUTDOOR_C = 35;
    private static final double EVAPORATING_BELOW_K = 6;

    /** Rounding where air comes to the melting point, K. */
    private static final double WARM_WIDTH_K = 0.1;

    /** Rounding of the start of condensation, kg/kg. */
    private static final double WET_WIDTH = 5e-5;

    /** Air off a fan is this share of the way from the chamber to the ice; a damper blows none. */
    private static final double BLAST = 0.5;

    private static final double KILO = 1_000;

    private final IceBank bank;
    private final Optional<Recharge> machine;
    private final double meltC;
    private final double latentJkg;
    private final double saturated;
    private final double drainJkg;
    private final double vapourKgS;
    private final double evaporatingC;
    private final double ratedLiftK;

    IceBankLaw(IceBank bank, double pressurePa) {
        this.bank = bank;
        machine = bank.recharge();
        meltC = bank.material().meltC();
        latentJkg = KILO * bank.material().latentKJkg();
        saturated = MoistAir.saturatedHumidityRatio(meltC, pressurePa);
        drainJkg = Coil.condensateJkg(meltC);
        vapourKgS = bank.uaWK() / MoistAir.DRY_AIR_J_KG_K;
        evaporatingC = meltC - EVAPORATING_BELOW_K;
        ratedLiftK = Condensing.temperatureC(RATED_OUTDOOR_C) - evaporatingC;
    }

    @Override
    public int ownStates() {
        return 1;
    }

    @Override
    public double ownAtStart(int i) {
        return bank.startIceKg();
    }

    @Override
    public double ownTolerance(int i) {
        return 1e-3 * bank.iceKg();
    }

    @Override
    public double ownMost(int i) {
        return bank.iceKg();
    }

    @Override
    public void effect(CoolerInputs in, CoolerEffect out) {
        out.clear();
        out.ran = in.run;
        out.ranByRun = 1;
        out.fanW = in.run * bank.fanW();
        melt(in, out);
        if (in.recharging && machine.isPresent()) {
            recharge(machine.get(), in, out);
        }
        out.ownRate[0] = (out.refreezesW - out.meltsW) / latentJkg;
        out.ownRateByAirC[0] = -out.meltsByAirC / latentJkg;
        out.ownRateByHumidity[0] = -out.meltsByHumidity / latentJkg;
        out.ownRateByRun[0] = -out.meltsByRun / latentJkg;
        out.ownRateByOwn[0] = (out.refreezesByOwn[0] - out.meltsByOwn[0]) / latentJkg;
    }

    /** What air gives to the ice, and the ice to the air. */
    private void melt(CoolerInputs in, CoolerEffect out) {
        double left = in.own[0] / (END * bank.iceKg());
        double contact = Smooth.step(left);
        double contactByIce = Smooth.stepSlope(left) / (END * bank.iceKg());
        double warm = in.airC - meltC;
        double sensible = bank.uaWK() * Smooth.positive(warm, WARM_WIDTH_K);
        double sensibleByAir = bank.uaWK() * Smooth.positiveSlope(warm, WARM_WIDTH_K);
        double wet = in.humidityRatio - saturated;
        double vapour = vapourKgS * Smooth.positive(wet, WET_WIDTH);
        double vapourByHumidity = vapourKgS * Smooth.positiveSlope(wet, WET_WIDTH);
        double share = in.run * contact;
        double shareByIce = in.run * contactByIce;
        out.sensibleW = share * sensible;
        out.sensibleByAirC = share * sensibleByAir;
        out.sensibleByRun = contact * sensible;
        out.sensibleByOwn[0] = shareByIce * sensible;
        out.vapourKgS = share * vapour;
        out.vapourByHumidity = share * vapourByHumidity;
        out.vapourByRun = contact * vapour;
        out.vapourByOwn[0] = shareByIce * vapour;
        double latent = MoistAir.vapourEnthalpyJkg(in.airC) - drainJkg;
        double heat = sensible + vapour * latent;
        out.meltsW = share * heat;
        out.meltsByAirC = share * (sensibleByAir + vapour * MoistAir.VAPOUR_J_KG_K);
        out.meltsByHumidity = share * vapourByHumidity * latent;
        out.meltsByRun = contact * heat;
        out.meltsByOwn[0] = shareByIce * heat;
        drain(out);
        if (bank.fanW() > 0 && share > 0) {
            out.supplyC = in.airC - BLAST * contact * Math.max(warm, 0);
        }
    }

    private void drain(CoolerEffect out) {
        out.totalW = out.meltsW;
        out.frostKgS = out.vapourKgS * Coil.frozenShare(meltC);
        out.drainKgS = out.vapourKgS - out.frostKgS;
        out.drainEnthalpyJkg = drainJkg;
    }

    private void recharge(Recharge by, CoolerInputs in, CoolerEffect out) {
        double lacks = (bank.iceKg() - in.own[0]) / (END * bank.iceKg());
        double room = Smooth.step(lacks);
        double roomByIce = -Smooth.stepSlope(lacks) / (END * bank.iceKg());
        double condensingC = Condensing.temperatureC(in.outdoorC);
        double permitted = Condensing.permitted(condensingC);
        double power = by.powerW() * permitted * (condensingC - evaporatingC) / ratedLiftK;
        out.tripped = permitted < 1;
        out.refreezesW = by.coldW() * permitted * room;
        out.refreezesByOwn[0] = by.coldW() * permitted * roomByIce;
        out.electricW = power * room;
        out.electricByOwn[0] = power * roomByIce;
    }
}
