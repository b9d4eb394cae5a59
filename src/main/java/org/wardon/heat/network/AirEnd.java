package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntUnaryOperator;
import org.wardon.cooling.Cooler;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Leakage;
import org.wardon.errors.Require;
import org.wardon.heat.solver.Tree;

/**
 * Air that is well mixed: all of a chamber's, or that of one of its two ends; with the parts that
 * hang on it. The coil end comes first: coolers, thermostat, fans, heater and humidifier are there,
 * door and people at the other. Racks, lights, leakage and fresh air are shared by length.
 */
final class AirEnd {
    /** Number of the end where the coolers are. */
    static final int COIL = 0;

    final AirState air;
    final AirState startAir;

    /** Share of the chamber's length. */
    final double share;

    private final Optional<AirZones> zones;
    private final int number;
    private final List<Part> parts = new ArrayList<>();
    private Part[] always = {};

    /** Dry air in it, kg. */
    double airKg;

    /** Where the flows of its exchange, gains and mist start. */
    record Flows(int exchangeAt, int gainsAt, int mistAt) {}

    /** What is switched from outside, and where its flows are. */
    record Equipment(AirExchange exchange, InnerGains gains, Flows flows) {}

    private AirEnd(int number, double share, NetworkInputs inputs) {
        this.number = number;
        this.share = share;
        this.zones = inputs.enclosure().zones();
        air = new AirState(inputs.pressurePa(), 2 * number);
        startAir = new AirState(inputs.pressurePa(), 2 * number);
    }

    static AirEnd[] of(NetworkInputs inputs) {
        if (inputs.enclosure().zones().isEmpty()) {
            return new AirEnd[] {new AirEnd(COIL, 1, inputs)};
        }
        Require.that(
                inputs.coolers().stream().allMatch(Cooler::actsInRoom),
                "two air zones need coolers that stand in the room and blow no outdoor air in");
        double door = inputs.enclosure().zones().get().doorEndShare();
        return new AirEnd[] {new AirEnd(COIL, 1 - door, inputs), new AirEnd(1, door, inputs)};
    }

    private boolean hasCoolers() {
        return number == COIL;
    }

    private boolean hasDoor() {
        return number > COIL || zones.isEmpty();
    }

    /** Share of a face's area that bounds it. */
    double shareOf(FaceName face) {
        if (zones.isEmpty()) {
            return 1;
        }
        double door = zones.get().doorEndShareOf(face);
        return hasDoor() ? door : 1 - door;
    }

    /** Lets what is added to the tree from now on hang on this air. */
    void hang(Tree tree) {
        tree.hangAt(air.at);
    }

    /** Adds parts that are always there, in the order in which they are asked. */
    void add(List<? extends Part> more) {
        parts.addAll(more);
        always = parts.toArray(new Part[0]);
    }

    /** Adds its share of racks and structure, where there are any. */
    Optional<StructurePart> racks(Tree tree, IntUnaryOperator take, NetworkInputs inputs) {
        double capacity = inputs.enclosure().structureCapacityJK() * share;
        if (capacity <= 0) {
            return Optional.empty();
        }
        hang(tree);
        int flowAt = take.applyAsInt(StructurePart.FLOWS);
        StructurePart part = new StructurePart(tree, flowAt, capacity);
        add(List.of(part));
        return Optional.of(part);
    }

    /** Adds the lots of these numbers, behind all else; they are put into {@code lots}. */
    LotBank lots(
            Tree tree,
            IntUnaryOperator take,
            NetworkInputs inputs,
            List<Integer> here,
            LotPart[] lots) {
        hang(tree);
        int flowAt = take.applyAsInt(LotBank.FLOWS * here.size());
        double pressure = inputs.pressurePa();
        LotBank bank = new LotBank(tree, flowAt, here.size(), pressure, inputs.plain());
        for (int i : here) {
            lots[i] = new LotPart(bank, inputs.lots().get(i), inputs.tuning(), pressure);
        }
        return bank;
    }

    /**
     * Adds exchange with outdoors, what is given off inside and mist, behind the coolers.
     *
     * @param take gives room for a number of flows and returns where it starts
     * @param inputs what the chamber is made of
     * @param airKgM3 dry air in a cubic metre, kg
     * @param coolers all coolers of the chamber, which may drive outdoor air in
     */
    Equipment equip(
            IntUnaryOperator take, NetworkInputs inputs, double airKgM3, CoolerPart[] coolers) {
        double volume = inputs.enclosure().box().volumeM3();
        int exchangeAt = take.applyAsInt(AirExchange.FLOWS);
        int gainsAt = take.applyAsInt(InnerGains.FLOWS);
        int mistAt = take.applyAsInt(MistPart.FLOWS);
        AirExchange exchange = exchange(exchangeAt, inputs, airKgM3, coolers);
        InnerGains gains = gains(gainsAt, inputs);
        add(
                List.of(
                        exchange,
                        gains,
                        new MistPart(mistAt, volume * airKgM3 * share, inputs.plain())));
        return new Equipment(exchange, gains, new Flows(exchangeAt, gainsAt, mistAt));
    }

    private AirExchange exchange(
            int flowAt, NetworkInputs inputs, double airKgM3, CoolerPart[] coolers) {
        Enclosure enclosure = inputs.enclosure();
        double factor = inputs.tuning().exchange();
        double volume = enclosure.box().volumeM3();
        double leak = Leakage.leakM3s(enclosure.leakageAirChangesPerDay(), volume) * factor;
        double fresh = enclosure.freshAirM3PerHour() / 3600 * factor;
        return new AirExchange(
                flowAt,
                inputs.pressurePa(),
                new AirExchange.Steady(leak * airKgM3 * share, fresh * airKgM3 * share),
                hasDoor() ? AirAround.doorway(inputs, factor) : AirExchange.Doorway.NONE,
                hasCoolers() ? coolers : new CoolerPart[0]);
    }

    private InnerGains gains(int flowAt, NetworkInputs inputs) {
        return new InnerGains(
                flowAt,
                inputs.setting(),
                inputs.tuning().thermostatOffsetK(),
                hasCoolers() ? inputs.enclosure().gains().fansW() : 0,
                inputs.enclosure().gains().lightsW() * share,
                hasCoolers() ? inputs.heaterW() : 0,
                hasCoolers() ? inputs.humidifierKgS() : 0);
    }

    /** Lets people work here where the door is; else their number stays 0. */
    void people(InnerGains gains, double present) {
        gains.people(hasDoor() ? present : 0);
    }

    /** Sets the air of a state and asks the parts for rates, which collect W and kg/s for it. */
    void rates(AirState state, Outside outside, double[] y, double[] rates, double[] flows) {
        state.set(y);
        rates[state.at] = 0;
        rates[state.at + 1] = 0;
        for (Part part : always) {
            part.rates(state, outside, y, rates, flows);
        }
    }

    /** Turns W and kg/s collected for the air into its rates. */
    void divide(double[] rates) {
        rates[air.at] /= airKg;
        rates[air.at + 1] /= airKg;
    }

    void near(double[] y) {
        startAir.set(y);
        for (Part part : always) {
            part.near(startAir, y);
        }
    }

    void linearise(Outside outside, double[] y, double[] rateSlope, double[] flowSlope) {
        startAir.startJ();
        for (Part part : always) {
            part.linearise(startAir, outside, airKg, y);
            part.timeSlope(startAir, outside, y, rateSlope, flowSlope);
        }
    }

    void flowsAlong(double[] direction, double[] change) {
        for (Part part : always) {
            part.flowsAlong(startAir, direction, change);
        }
    }
}
