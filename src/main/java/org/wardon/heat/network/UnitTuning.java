package org.wardon.heat.network;

import org.wardon.cooling.Compressor;
import org.wardon.cooling.Thermostat;

/** A unit as a run asks for it: of another size by the capacity factor, or modulating. */
final class UnitTuning {
    private UnitTuning() {}

    /** Scales capacity, coil and air flow together: the same unit, larger; power stays. */
    static Compressor of(Compressor unit, NetworkInputs inputs) {
        double factor = inputs.tuning().capacity();
        boolean modulating = inputs.control() == NetworkInputs.Control.MODULATING;
        return new Compressor(
                unit.ratedCapacityW() * factor,
                unit.ratedPowerW(),
                unit.ratedAirC(),
                unit.ratedOutdoorC(),
                unit.fanW(),
                unit.fanAlways(),
                unit.coilUaWK() * factor,
                unit.airFlowM3s() * factor,
                modulating ? Compressor.Control.MODULATING : unit.control(),
                unit.minRunMinutes(),
                unit.minRestMinutes(),
                unit.condenserRiseK(),
                unit.lowestC(),
                unit.defrost(),
                unit.dailyEnergyKWh());
    }

    /** What it follows: each further cooler comes in a band later than the one before. */
    static CoolerPart.Following following(
            Compressor unit, Compressor asked, int stage, NetworkInputs inputs) {
        double bandK = inputs.setting().bandK();
        double followed =
                Thermostat.followedC(inputs.setting(), unit.lowestC())
                        - inputs.tuning().thermostatOffsetK()
                        + stage * bandK;
        return new CoolerPart.Following(
                asked.control() == Compressor.Control.MODULATING,
                followed,
                bandK,
                unit.fanAlways() ? unit.fanW() : 0);
    }
}
