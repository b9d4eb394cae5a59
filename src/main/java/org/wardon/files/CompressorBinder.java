package org.wardon.files;

import java.util.Optional;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Defrost;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** Turns a compressor of a checked plan into a record. */
final class CompressorBinder {
    private static final String COIL_MARK =
            Defaults.EVAPORATING_TD_K.mark() + "; from memory of ASHRAE-R";
    static final String POWER_MARK =
            Defaults.CARNOT_FRACTION.mark()
                    + "; "
                    + Defaults.EVAPORATING_TD_K.mark()
                    + "; "
                    + Defaults.CONDENSING_APPROACH_K.mark();

    private final Inputs inputs;

    CompressorBinder(Inputs inputs) {
        this.inputs = inputs;
    }

    Compressor bind(Part part) {
        double capacityW = inputs.number(part, "ratedCapacityW");
        double airC = inputs.number(part, "ratedAirC", Defaults.RATED_AIR_C);
        double outdoorC = inputs.number(part, "ratedOutdoorC", Defaults.RATED_OUTDOOR_C);
        double powerW = Math.max(Defaults.ratedPowerW(capacityW, airC, outdoorC), 10);
        double fanW = Defaults.FAN_SHARE.value() * capacityW;
        return new Compressor(
                capacityW,
                inputs.number(part, "ratedPowerW", powerW, "W", POWER_MARK),
                airC,
                outdoorC,
                inputs.number(part, "fanW", fanW, "W", Defaults.FAN_SHARE.mark()),
                inputs.flag(part, "fanAlways"),
                inputs.number(part, "coilUaWK", Defaults.coilUaWK(capacityW), "W/K", COIL_MARK),
                inputs.number(
                        part,
                        "airFlowM3s",
                        Defaults.airFlowM3s(capacityW),
                        "m3/s",
                        Defaults.AIR_DROP_K.mark()),
                inputs.control(part),
                inputs.number(part, "minRunMinutes", Defaults.MIN_RUN_MINUTES),
                inputs.number(part, "minRestMinutes", Defaults.MIN_REST_MINUTES),
                inputs.number(part, "condenserRiseK", Defaults.CONDENSER_RISE_K),
                inputs.number(part, "lowestC", Defaults.LOWEST_C),
                defrost(part.at("defrost")),
                inputs.maybe(part, "dailyEnergyKWh"));
    }

    private Optional<Defrost> defrost(Part defrost) {
        return defrost.given()
                ? Optional.of(
                        new Defrost(
                                inputs.number(defrost, "everyHours"),
                                inputs.number(defrost, "minutes"),
                                inputs.numberElse(defrost, "heaterW", 0)))
                : Optional.empty();
    }
}
