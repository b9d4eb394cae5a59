package org.wardon.files;

import java.time.LocalTime;
import java.util.Optional;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.Recharge;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** Turns a bank of ice of a checked plan into a record. */
final class IceBankBinder {
    private final Inputs inputs;

    IceBankBinder(Inputs inputs) {
        this.inputs = inputs;
    }

    IceBank bind(Part part) {
        double iceKg = inputs.number(part, "iceKg");
        IceBank.Material material =
                new IceBank.Material(
                        inputs.number(part, "meltC", Defaults.MELT_C),
                        inputs.number(part, "latentKJkg", Defaults.LATENT_KJ_KG));
        return new IceBank(
                iceKg,
                inputs.numberElse(part, "startIceKg", iceKg),
                material,
                inputs.number(part, "uaWK"),
                inputs.numberElse(part, "fanW", 0),
                recharge(part, material.meltC()),
                inputs.control(part));
    }

    private Optional<Recharge> recharge(Part part, double meltC) {
        if (!part.has("rechargeW")) {
            return Optional.empty();
        }
        double coldW = inputs.number(part, "rechargeW");
        return Optional.of(
                new Recharge(
                        coldW,
                        inputs.number(
                                part,
                                "rechargePowerW",
                                Defaults.rechargePowerW(coldW, meltC),
                                "W",
                                CompressorBinder.POWER_MARK),
                        hour(part, "rechargeFrom", Defaults.RECHARGE_FROM),
                        hour(part, "rechargeTo", Defaults.RECHARGE_TO)));
    }

    private LocalTime hour(Part part, String name, String otherwise) {
        return LocalTime.parse(inputs.text(part, name, otherwise, Defaults.ASSUMPTION));
    }
}
