package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Following;
import org.wardon.cooling.Setting;
import org.wardon.cooling.Thermostat;
import org.wardon.heat.solver.Tree;

/**
 * The coolers of a chamber as parts, in the order they act: of another size by the capacity factor,
 * modulating where the run asks for it, each further one with a thermostat a stage later than the
 * one before.
 */
final class CoolerParts {
    private CoolerParts() {}

    /**
     * Builds the parts, one a cooler and in its place.
     *
     * @param tree takes their own states
     * @param take gives room for a number of flows and returns where it starts
     * @param inputs what the chamber is made of
     */
    static CoolerPart[] of(Tree tree, IntUnaryOperator take, NetworkInputs inputs) {
        List<CoolerPart> parts = new ArrayList<>();
        for (Cooler built : inputs.coolers()) {
            Cooler asked = asked(built, inputs);
            parts.add(
                    new CoolerPart(
                            tree,
                            take.applyAsInt(CoolerPart.FLOWS),
                            asked,
                            asked.law(inputs.pressurePa())));
        }
        CoolerPart[] all = parts.toArray(new CoolerPart[0]);
        set(all, inputs.setting(), inputs.tuning().thermostatOffsetK());
        return all;
    }

    /** A cooler as the run asks for it. */
    static Cooler asked(Cooler built, NetworkInputs inputs) {
        Cooler sized = built.sized(inputs.tuning().capacity());
        return inputs.control() == NetworkInputs.Control.MODULATING ? sized.modulating() : sized;
    }

    /** Sets the thermostats of all. */
    static void set(CoolerPart[] parts, Setting setting, double offsetK) {
        int stage = 0;
        for (CoolerPart part : parts) {
            double kept =
                    part.unit()
                            .following()
                            .map(Following::lowestC)
                            .map(lowestC -> Thermostat.followedC(setting, lowestC))
                            .orElse(setting.temperatureC());
            part.keep(
                    new CoolerPart.Band(
                            kept - offsetK + stage * setting.stageK(), setting.bandK()));
            stage += part.unit().following().isPresent() ? 1 : 0;
        }
    }
}
