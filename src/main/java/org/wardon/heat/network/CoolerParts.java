package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Following;
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
        int stage = 0;
        for (Cooler built : inputs.coolers()) {
            Cooler asked = asked(built, inputs);
            parts.add(
                    new CoolerPart(
                            tree,
                            take.applyAsInt(CoolerPart.FLOWS),
                            asked,
                            asked.law(inputs.pressurePa()),
                            band(asked, stage, inputs)));
            stage += asked.following().isPresent() ? 1 : 0;
        }
        return parts.toArray(new CoolerPart[0]);
    }

    /** A cooler as the run asks for it. */
    static Cooler asked(Cooler built, NetworkInputs inputs) {
        Cooler sized = built.sized(inputs.tuning().capacity());
        return inputs.control() == NetworkInputs.Control.MODULATING ? sized.modulating() : sized;
    }

    private static CoolerPart.Band band(Cooler cooler, int stage, NetworkInputs inputs) {
        double bandK = inputs.setting().bandK();
        double kept =
                cooler.following()
                        .map(Following::lowestC)
                        .map(lowestC -> Thermostat.followedC(inputs.setting(), lowestC))
                        .orElse(inputs.setting().temperatureC());
        return new CoolerPart.Band(
                kept - inputs.tuning().thermostatOffsetK() + stage * inputs.setting().stageK(),
                bandK);
    }
}
