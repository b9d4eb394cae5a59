package org.wardon.files;

import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.NightAir;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** Turns a cooler that blows outdoor air in, of a checked plan, into its record. */
final class FanBinder {
    private static final double MOST_FAN_W = 50_000;

    private final Inputs inputs;
    private final double capacityKg;

    /** {@code capacityKg} is what the chamber takes: the air a plan does not give goes by it. */
    FanBinder(Inputs inputs, double capacityKg) {
        this.inputs = inputs;
        this.capacityKg = capacityKg;
    }

    EvaporativePad pad(Part part) {
        double effectiveness = inputs.number(part, "effectiveness", Defaults.PAD_EFFECTIVENESS);
        double flowM3s = flowM3s(part);
        return new EvaporativePad(
                effectiveness,
                flowM3s,
                fanW(part, flowM3s),
                inputs.numberElse(part, "bleedPct", 0),
                inputs.control(part));
    }

    NightAir nightAir(Part part) {
        double flowM3s = flowM3s(part);
        return new NightAir(
                flowM3s,
                fanW(part, flowM3s),
                inputs.number(part, "differenceK", Defaults.DIFFERENCE_K),
                inputs.number(part, "lowestC", Defaults.LOWEST_INTAKE_C),
                inputs.numberElse(part, "lowestHumidityPct", 0),
                inputs.numberElse(part, "highestHumidityPct", 100),
                inputs.control(part));
    }

    private double flowM3s(Part part) {
        return inputs.number(
                part,
                "airFlowM3s",
                Defaults.intakeM3s(capacityKg),
                "m3/s",
                Defaults.AIR_M3_H_T.mark());
    }

    private double fanW(Part part, double flowM3s) {
        return inputs.number(
                part,
                "fanW",
                Math.min(Defaults.FAN_W_PER_M3S.value() * flowM3s, MOST_FAN_W),
                "W",
                Defaults.FAN_W_PER_M3S.mark());
    }
}
