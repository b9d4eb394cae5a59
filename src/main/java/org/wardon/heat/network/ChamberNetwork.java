package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.wardon.air.MoistAir;
import org.wardon.cooling.Setting;
import org.wardon.heat.solver.Tree;
import org.wardon.heat.solver.TreeSystem;
import org.wardon.produce.Reason;

/**
 * A chamber compiled into parts around its air. The state holds the air's enthalpy and humidity
 * ratio first, of both ends where the air is two, then faces, structure, coolers and lots.
 */
public final class ChamberNetwork implements TreeSystem {
    private static final int NONE = -1;

    private final NetworkInputs inputs;
    private final AirEnd[] ends;
    private final RoomAir roomAir;
    private final Tree tree;
    private final OutsideInTime around;
    private final Outside outside;
    private final Faces faces;
    private final WettedWalls wettedWalls;
    private final List<StructurePart> structure = new ArrayList<>();
    private final CoolerPart[] coolers;
    private final List<IdealCooler> ideal;
    private final AirEnd.Equipment[] equipment;
    private final Mixing[] mixing;
    private final int mixingFlowAt;
    private final LotBank[] banks;
    private final LotPart[] lots;
    private final Blast blast;
    private final Weights weights;
    private int flows;
    private double airKg;
    private double freeM3;

    /**
     * Compiles a chamber.
     *
     * @param inputs what it is made of
     */
    public ChamberNetwork(NetworkInputs inputs) {
        this.inputs = inputs;
        ends = AirEnd.of(inputs);
        roomAir = new RoomAir(ends, inputs.pressurePa());
        tree = new Tree(2 * ends.length);
        faces = new Faces(tree, this::take, inputs, ends);
        around = new OutsideInTime(inputs, faces);
        outside = around.now;
        wettedWalls = new WettedWalls(faces.wetted());
        for (AirEnd end : ends) {
            end.racks(tree, this::take, inputs).ifPresent(structure::add);
        }
        ends[AirEnd.COIL].hang(tree);
        boolean unlimited = inputs.control() == NetworkInputs.Control.IDEAL;
        coolers = unlimited ? new CoolerPart[0] : CoolerParts.of(tree, this::take, inputs);
        faces.drivenBy(coolers);
        ends[AirEnd.COIL].add(List.of(coolers));
        ideal = unlimited ? List.of(ideal()) : List.of();
        ends[AirEnd.COIL].add(ideal);
        equipment = new AirEnd.Equipment[ends.length];
        for (int e = 0; e < ends.length; e++) {
            equipment[e] = ends[e].equip(this::take, inputs, dryAirKg(1), coolers);
        }
        mixingFlowAt = ends.length > 1 ? take(Mixing.FLOWS) : NONE;
        mixing =
                ends.length > 1
                        ? new Mixing[] {
                            new Mixing(mixingFlowAt, ends, inputs, dryAirKg(1), coolers)
                        }
                        : new Mixing[0];
        banks = new LotBank[ends.length];
        lots = new LotPart[inputs.lots().size()];
        for (int e = 0; e < ends.length; e++) {
            int end = e;
            List<Integer> here =
                    IntStream.range(0, lots.length).filter(i -> endOf(i) == end).boxed().toList();
            banks[e] = ends[e].lots(tree, this::take, inputs, here, lots);
        }
        blast = new Blast(coolers);
        weights = new Weights(tree.size());
        freeVolume(inputs.enclosure().box().volumeM3());
        hour(0);
    }

    private IdealCooler ideal() {
        double airOfAll = dryAirKg(inputs.enclosure().box().volumeM3());
        return IdealCooler.of(take(IdealCooler.FLOWS), inputs, airOfAll);
    }

    /** Number of the end a lot stands in. */
    private int endOf(int lot) {
        return ends.length > 1 && inputs.atDoorEnd().contains(lot) ? 1 : AirEnd.COIL;
    }

    private int take(int count) {
        int at = flows;
        flows += count;
        return at;
    }

    /** Dry air in a volume at the setting, kg; a constant for flows counted in chamber air. */
    private double dryAirKg(double volumeM3) {
        return volumeM3
                / MoistAir.specificVolumeM3kg(
                        inputs.around().insideMeanC(), 0, inputs.pressurePa());
    }

    /**
     * Sets the free volume of the chamber.
     *
     * @param m3 volume without lots and packages, m3, above 0
     */
    public void freeVolume(double m3) {
        freeM3 = m3;
        airKg = dryAirKg(m3);
        for (int e = 0; e < ends.length; e++) {
            ends[e].airKg = airKg * ends[e].share;
            equipment[e].exchange().freeVolume(m3);
        }
    }

    /**
     * Returns the free volume.
     *
     * @return m3
     */
    public double freeM3() {
        return freeM3;
    }

    /**
     * Returns the dry air in the chamber.
     *
     * @return kg
     */
    public double airKg() {
        return airKg;
    }

    /**
     * Turns a flow of dry air into one of chamber air.
     *
     * @param kgS kg/s
     * @return m3/s
     */
    public double cubicMetres(double kgS) {
        return kgS / dryAirKg(1);
    }

    /**
     * Enters an hour of the weather, and the stretch that starts with it.
     *
     * @param h hour of the run, 0 to the last but one
     */
    public void hour(int h) {
        around.hour(h);
    }

    /**
     * Lets the water on faces follow the state: at the start of a run and with each hour.
     *
     * @param y state
     */
    public void settle(double[] y) {
        AirState state = ends[AirEnd.COIL].startAir;
        state.set(y);
        faces.settle(state, y);
    }

    /**
     * Writes the start: air as given, faces at the steady profile, lots not there yet.
     *
     * @param airC air, °C
     * @param ratio humidity ratio, kg/kg
     * @return the state
     */
    public double[] start(double airC, double ratio) {
        double[] y = new double[tree.size()];
        roomAir.set(airC, ratio, y);
        around.at(0);
        faces.steadyProfile(airC, y);
        structure.forEach(s -> s.start(airC, y));
        List.of(coolers).forEach(cooler -> cooler.start(y));
        for (LotBank bank : banks) {
            bank.clear();
        }
        for (LotPart lot : lots) {
            lot.takeOut();
        }
        settle(y);
        return y;
    }

    /**
     * Returns the sums of the flows by term.
     *
     * @return the terms
     */
    public Terms terms() {
        AirEnd.Flows[] ofEnds = new AirEnd.Flows[ends.length];
        for (int e = 0; e < ends.length; e++) {
            ofEnds[e] = equipment[e].flows();
        }
        int idealFlowAt = ideal.isEmpty() ? NONE : ideal.get(0).flowAt();
        return new Terms(faces, coolers, idealFlowAt, mixingFlowAt, ofEnds);
    }

    /**
     * Returns a lot.
     *
     * @param i number of the lot in the inputs
     * @return the part
     */
    public LotPart lot(int i) {
        return lots[i];
    }

    /**
     * Stands a lot near the cooler.
     *
     * @param i number of the lot in the inputs
     */
    public void inBlast(int i) {
        lots[i].standInBlast();
        blast.wanted();
    }

    /**
     * Returns how many coolers there are.
     *
     * @return 0 for a passive chamber and an ideal cooler
     */
    public int coolerCount() {
        return coolers.length;
    }

    /**
     * Returns a cooler.
     *
     * @param i number of the cooler in the inputs
     * @return the part
     */
    public CoolerPart cooler(int i) {
        return coolers[i];
    }

    /**
     * Returns how far a cooler is inside its own conditions for running, thermostat apart.
     *
     * @param i number of the cooler in the inputs
     * @param t time, s
     * @param y state
     * @return K or percent of humidity, below 0 outside; infinite where it has no conditions
     */
    public double inside(int i, double t, double[] y) {
        around.at(t);
        return coolers[i].inside(airC(y), ratio(y), outside);
    }

    /**
     * Returns the air, all of it and that at the door end.
     *
     * @return what a state says of it
     */
    public RoomAir air() {
        return roomAir;
    }

    /**
     * Returns the air temperature of a state; at the coil end where the air is two.
     *
     * @param y state
     * @return °C
     */
    public double airC(double[] y) {
        return roomAir.airC(AirEnd.COIL, y);
    }

    /**
     * Returns the humidity ratio of a state; at the coil end where the air is two.
     *
     * @param y state
     * @return kg/kg
     */
    public double ratio(double[] y) {
        return y[AirState.HUMIDITY];
    }

    /**
     * Returns the relative humidity of the air of a state; at the coil end where the air is two.
     *
     * @param y state
     * @return 0 to 1, a little above where supersaturated
     */
    public double humidityFraction(double[] y) {
        return roomAir.humidityFraction(AirEnd.COIL, y);
    }

    /**
     * Mixes outdoor air into the chamber where lots left, or pushes air out where they came in; at
     * both ends alike where the air is two.
     *
     * @param m3 free volume from now on, m3
     * @param y state, changed in place
     * @return enthalpy and vapour that came in, J and kg, below 0 where air was pushed out
     */
    public double[] changeFreeVolume(double m3, double[] y) {
        double before = airKg;
        double heatBefore = roomAir.heatJ(y);
        double waterBefore = roomAir.vapourKg(y);
        freeVolume(m3);
        if (airKg > before) {
            roomAir.mixIn((airKg - before) / airKg, outside.outdoors, y);
        }
        return new double[] {roomAir.heatJ(y) - heatBefore, roomAir.vapourKg(y) - waterBefore};
    }

    /**
     * Returns the heat stored in the layers of all faces.
     *
     * @param y state
     * @return J from 0 °C
     */
    public double layersJ(double[] y) {
        return faces.layersJ(y);
    }

    /**
     * Returns the water on all faces.
     *
     * @param y state
     * @return kg
     */
    public double faceWaterKg(double[] y) {
        return faces.waterKg(y);
    }

    /**
     * Returns the inner surface of a face.
     *
     * @param i number of the face in the enclosure
     * @param y state
     * @return °C
     */
    public double surfaceC(int i, double[] y) {
        return faces.surfaceC(i, y);
    }

    /**
     * Returns the heat stored in racks and structure.
     *
     * @param y state
     * @return J from 0 °C
     */
    public double structureJ(double[] y) {
        return structure.stream().mapToDouble(s -> s.heatJ(y)).sum();
    }

    /**
     * Returns the outdoor air at the time last asked for.
     *
     * @return °C
     */
    public double outdoorC() {
        return outside.outdoors.airC;
    }

    /**
     * Returns the outdoor air of an hour.
     *
     * @param h hour of the run
     * @return humidity ratio, kg/kg
     */
    public double outdoorRatio(int h) {
        return around.outdoorRatio(h);
    }

    /**
     * Returns the reasons of the far sides: sun or ground that had to be estimated.
     *
     * @return reasons with an empty subject
     */
    public List<Reason> reasons() {
        return faces.reasons();
    }

    /**
     * Opens or shuts the door; where averaged, starts or ends its hours of use.
     *
     * @param open 1 to open, 0 to shut; between them a share of the exchange
     */
    public void door(double open) {
        for (AirEnd.Equipment one : equipment) {
            one.exchange().open(open);
        }
    }

    /**
     * Dials in another setting.
     *
     * @param setting in force from now on
     */
    public void set(Setting setting) {
        CoolerParts.set(coolers, setting, inputs.tuning().thermostatOffsetK());
        ideal.forEach(one -> one.set(setting));
        List.of(equipment).forEach(one -> one.gains().set(setting));
    }

    /**
     * Turns all electricity on or off.
     *
     * @param on true for on
     */
    public void power(boolean on) {
        for (AirEnd.Equipment one : equipment) {
            one.gains().power(on);
        }
        for (CoolerPart cooler : coolers) {
            cooler.power(on);
        }
    }

    /**
     * Returns the walls kept wet outside.
     *
     * @return live, may be none
     */
    public WettedWalls wettedWalls() {
        return wettedWalls;
    }

    /**
     * Turns the lights on or off.
     *
     * @param on 1 for on, 0 for off; between them a share of the time
     */
    public void light(double on) {
        for (AirEnd.Equipment one : equipment) {
            one.gains().light(on);
        }
    }

    /**
     * Tells how many people are at work.
     *
     * @param present persons, may be a mean
     */
    public void people(double present) {
        for (int e = 0; e < ends.length; e++) {
            ends[e].people(equipment[e].gains(), present);
        }
    }

    /**
     * Sets what error counts as 1.
     *
     * @param lotK lots, K
     * @param airK air, K
     */
    public void accuracy(double lotK, double airK) {
        weights.allow(lotK, airK, ends, faces, coolers);
    }

    /**
     * Lets a lot arrive.
     *
     * @param i number of the lot in the inputs
     * @param pulpC flesh, °C
     * @param waterKg free water, kg
     * @param y state, changed in place
     */
    public void arrive(int i, double pulpC, double waterKg, double[] y) {
        lots[i].arrive(pulpC, waterKg, roomAir.ratio(endOf(i), y), y);
        weights.take(lots[i]);
    }

    /**
     * Lets a lot come in as it was carried out elsewhere.
     *
     * @param i number of the lot in the inputs
     * @param nodes its nodes there
     * @param y state, changed in place
     */
    public void bringIn(int i, double[] nodes, double[] y) {
        lots[i].put(nodes, y);
        weights.take(lots[i]);
    }

    /**
     * Returns what a node of the state belongs to.
     *
     * @param node index into the state
     * @return such as {@code air} or {@code lot M1}
     */
    public String partAt(int node) {
        return new PartNames(inputs, ends.length, faces, lots).at(node);
    }

    @Override
    public Tree tree() {
        return tree;
    }

    @Override
    public int flows() {
        return flows;
    }

    @Override
    public boolean possible(double[] y) {
        for (CoolerPart cooler : coolers) {
            if (!cooler.possible(y)) {
                return false;
            }
        }
        return true;
    }

    @Override
    public double[] weights() {
        return weights.perNode;
    }

    @Override
    public void rates(double t, double[] y, double[] rates, double[] flow) {
        around.at(t);
        ask(false, y, rates, flow);
    }

    private AirState air(AirEnd end, boolean atStart) {
        return atStart ? end.startAir : end.air;
    }

    private void ask(boolean atStart, double[] y, double[] rates, double[] flow) {
        for (AirEnd end : ends) {
            end.rates(air(end, atStart), outside, y, rates, flow);
        }
        AirState coil = air(ends[AirEnd.COIL], atStart);
        for (Mixing both : mixing) {
            both.rates(coil, air(ends[1], atStart), rates, flow);
        }
        blast.follow(coil, banks[AirEnd.COIL]);
        for (int e = 0; e < ends.length; e++) {
            banks[e].rates(air(ends[e], atStart), outside, y, rates, flow);
            ends[e].divide(rates);
        }
    }

    @Override
    public void linearise(double t, double[] y, Change now, Change slope) {
        around.at(t);
        for (int e = 0; e < ends.length; e++) {
            ends[e].near(y);
            banks[e].near(ends[e].startAir, y);
        }
        ask(true, y, now.rates(), now.flows());
        double[] rateSlope = slope.rates();
        Arrays.fill(tree.hubByHub, 0);
        Arrays.fill(rateSlope, 0);
        Arrays.fill(slope.flows(), 0);
        for (int e = 0; e < ends.length; e++) {
            AirState air = ends[e].startAir;
            ends[e].linearise(outside, y, rateSlope, slope.flows());
            banks[e].linearise(air, outside, ends[e].airKg, y);
            air.intoHub(tree);
        }
        for (Mixing both : mixing) {
            both.linearise(tree, rateSlope, slope.flows());
        }
        for (AirEnd end : ends) {
            end.divide(rateSlope);
        }
    }

    @Override
    public void flowsAlong(double[] direction, double[] change) {
        for (int e = 0; e < ends.length; e++) {
            ends[e].flowsAlong(direction, change);
            banks[e].flowsAlong(ends[e].startAir, direction, change);
        }
        for (Mixing both : mixing) {
            both.flowsAlong(direction, change);
        }
    }
}
