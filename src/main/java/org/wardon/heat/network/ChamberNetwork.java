package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Leakage;
import org.wardon.heat.solver.Tree;
import org.wardon.heat.solver.TreeSystem;
import org.wardon.produce.Reason;

/**
 * A chamber compiled into parts around its air. The state holds the air's enthalpy and humidity
 * ratio first, then faces, structure, coolers and lots.
 */
public final class ChamberNetwork implements TreeSystem {
    private final NetworkInputs inputs;
    private final Tree tree = new Tree(2);
    private final AirState air;
    private final AirState startAir;
    private final Outside outside = new Outside();
    private final HourlyAir outdoors;
    private final HourlyAir beyondDoor;
    private final Faces faces;
    private final WettedWalls wettedWalls;
    private final Optional<StructurePart> structure;
    private final CoolerPart[] coolers;
    private final Optional<IdealCooler> ideal;
    private final int idealFlowAt;
    private final AirExchange exchange;
    private final int exchangeFlowAt;
    private final InnerGains gains;
    private final int gainsFlowAt;
    private final MistPart mist;
    private final int mistFlowAt;
    private final LotBank bank;
    private final LotPart[] lots;
    private final Blast blast;
    private final Part[] always;
    private final double[] weights;
    private double lotK = 1;
    private double airK = 1;
    private int flows;
    private double airKg;
    private double freeM3;
    private int hour;
    private double at = Double.NaN;

    /**
     * Compiles a chamber.
     *
     * @param inputs what it is made of
     */
    public ChamberNetwork(NetworkInputs inputs) {
        this.inputs = inputs;
        air = new AirState(inputs.pressurePa());
        startAir = new AirState(inputs.pressurePa());
        outdoors = AirAround.outdoors(inputs);
        beyondDoor = AirAround.beyondDoor(inputs, outdoors);
        faces = new Faces(tree, this::take, inputs);
        wettedWalls = new WettedWalls(faces.wetted());
        double structureJK = inputs.enclosure().structureCapacityJK();
        structure =
                structureJK > 0
                        ? Optional.of(
                                new StructurePart(tree, take(StructurePart.FLOWS), structureJK))
                        : Optional.empty();
        boolean unlimited = inputs.control() == NetworkInputs.Control.IDEAL;
        coolers = unlimited ? new CoolerPart[0] : CoolerParts.of(tree, this::take, inputs);
        faces.drivenBy(coolers);
        idealFlowAt = flows;
        ideal =
                unlimited
                        ? Optional.of(
                                IdealCooler.of(
                                        take(IdealCooler.FLOWS),
                                        inputs,
                                        dryAirKg(inputs.enclosure().box().volumeM3())))
                        : Optional.empty();
        exchangeFlowAt = take(AirExchange.FLOWS);
        exchange = exchange();
        gainsFlowAt = take(InnerGains.FLOWS);
        gains =
                new InnerGains(
                        gainsFlowAt,
                        inputs.setting(),
                        inputs.tuning().thermostatOffsetK(),
                        inputs.enclosure().gains().fansW(),
                        inputs.enclosure().gains().lightsW(),
                        inputs.heaterW(),
                        inputs.humidifierKgS());
        mistFlowAt = take(MistPart.FLOWS);
        mist =
                new MistPart(
                        mistFlowAt, dryAirKg(inputs.enclosure().box().volumeM3()), inputs.plain());
        lots = new LotPart[inputs.lots().size()];
        int flowsOfLots = take(LotBank.FLOWS * lots.length);
        bank = new LotBank(tree, flowsOfLots, lots.length, inputs.pressurePa(), inputs.plain());
        for (int i = 0; i < lots.length; i++) {
            lots[i] = new LotPart(bank, inputs.lots().get(i), inputs.tuning(), inputs.pressurePa());
        }
        blast = new Blast(coolers);
        always = alwaysThere();
        weights = new double[tree.size()];
        freeVolume(inputs.enclosure().box().volumeM3());
        hour(0);
    }

    private int take(int count) {
        int at = flows;
        flows += count;
        return at;
    }

    private Part[] alwaysThere() {
        List<Part> parts = new ArrayList<>(List.of(faces.parts()));
        structure.ifPresent(parts::add);
        parts.addAll(List.of(coolers));
        ideal.ifPresent(parts::add);
        parts.add(exchange);
        parts.add(gains);
        parts.add(mist);
        return parts.toArray(new Part[0]);
    }

    private AirExchange exchange() {
        Enclosure enclosure = inputs.enclosure();
        double factor = inputs.tuning().exchange();
        double perM3 = dryAirKg(1);
        double volume = enclosure.box().volumeM3();
        double leak = Leakage.leakM3s(enclosure.leakageAirChangesPerDay(), volume) * factor;
        double fresh = enclosure.freshAirM3PerHour() / 3600 * factor;
        return new AirExchange(
                exchangeFlowAt,
                inputs.pressurePa(),
                new AirExchange.Steady(leak * perM3, fresh * perM3),
                AirAround.doorway(inputs, factor),
                coolers);
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
        exchange.freeVolume(m3);
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
        hour = Math.min(h, inputs.around().hours() - 1);
        at = Double.NaN;
        faces.hour(hour);
    }

    private void at(double t) {
        if (t == at) {
            return;
        }
        at = t;
        double into = t - hour * 3600.0;
        outdoors.at(hour, into, outside.outdoors);
        beyondDoor.at(hour, into, outside.beyondDoor);
        faces.at(into / 3600);
    }

    /**
     * Lets the water on faces follow the state: at the start of a run and with each hour.
     *
     * @param y state
     */
    public void settle(double[] y) {
        startAir.set(y);
        faces.settle(startAir, y);
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
        setAir(airC, ratio, y);
        at(0);
        faces.steadyProfile(airC, y);
        structure.ifPresent(s -> s.start(airC, y));
        List.of(coolers).forEach(cooler -> cooler.start(y));
        bank.clear();
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
        int idealAt = ideal.isPresent() ? idealFlowAt : -1;
        return new Terms(faces.parts(), coolers, idealAt, exchangeFlowAt, gainsFlowAt, mistFlowAt);
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
        at(t);
        return coolers[i].inside(airC(y), ratio(y), outside);
    }

    /**
     * Returns the air temperature of a state.
     *
     * @param y state
     * @return °C
     */
    public double airC(double[] y) {
        return MoistAir.temperatureC(y[AirState.ENTHALPY], y[AirState.HUMIDITY]);
    }

    /**
     * Returns the humidity ratio of a state.
     *
     * @param y state
     * @return kg/kg
     */
    public double ratio(double[] y) {
        return y[AirState.HUMIDITY];
    }

    /**
     * Returns the relative humidity of the air of a state.
     *
     * @param y state
     * @return 0 to 1, a little above where supersaturated
     */
    public double humidityFraction(double[] y) {
        double pa = MoistAir.vapourPressurePa(y[AirState.HUMIDITY], inputs.pressurePa());
        return pa / Saturation.pressurePa(airC(y));
    }

    /**
     * Returns the enthalpy of the air of a state.
     *
     * @param y state
     * @return J per kg dry air
     */
    public double enthalpyJkg(double[] y) {
        return y[AirState.ENTHALPY];
    }

    /**
     * Sets the air of a state.
     *
     * @param airC temperature, °C
     * @param ratio humidity ratio, kg/kg
     * @param y state, changed in place
     */
    public void setAir(double airC, double ratio, double[] y) {
        y[AirState.ENTHALPY] = MoistAir.enthalpyJkg(airC, ratio);
        y[AirState.HUMIDITY] = ratio;
    }

    /**
     * Mixes outdoor air into the chamber where lots left, or pushes air out where they came in.
     *
     * @param m3 free volume from now on, m3
     * @param y state, changed in place
     * @return enthalpy and vapour that came in, J and kg, below 0 where air was pushed out
     */
    public double[] changeFreeVolume(double m3, double[] y) {
        double before = airKg;
        double heatBefore = before * y[AirState.ENTHALPY];
        double waterBefore = before * y[AirState.HUMIDITY];
        freeVolume(m3);
        if (airKg > before) {
            double in = airKg - before;
            double heat = heatBefore + in * outside.outdoors.enthalpy();
            double water = waterBefore + in * outside.outdoors.ratio;
            y[AirState.ENTHALPY] = heat / airKg;
            y[AirState.HUMIDITY] = water / airKg;
        }
        return new double[] {
            airKg * y[AirState.ENTHALPY] - heatBefore, airKg * y[AirState.HUMIDITY] - waterBefore
        };
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
        return faces.parts()[i].surfaceC(y);
    }

    /**
     * Returns the heat stored in racks and structure.
     *
     * @param y state
     * @return J from 0 °C
     */
    public double structureJ(double[] y) {
        return structure.map(s -> s.heatJ(y)).orElse(0.0);
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
        return outdoors.ratio(h);
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
        exchange.open(open);
    }

    /**
     * Turns all electricity on or off.
     *
     * @param on true for on
     */
    public void power(boolean on) {
        gains.power(on);
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
        gains.light(on);
    }

    /**
     * Tells how many people are at work.
     *
     * @param present persons, may be a mean
     */
    public void people(double present) {
        gains.people(present);
    }

    /**
     * Sets what error counts as 1.
     *
     * @param lotK lots, K
     * @param airK air, K
     */
    public void accuracy(double lotK, double airK) {
        this.lotK = lotK;
        this.airK = airK;
        double[] tolerances = new double[tree.size()];
        Arrays.fill(tolerances, lotK);
        tolerances[AirState.ENTHALPY] = airK * MoistAir.DRY_AIR_J_KG_K;
        tolerances[AirState.HUMIDITY] = airK * 5e-4;
        faces.tolerances(airK, tolerances);
        List.of(coolers).forEach(cooler -> cooler.tolerances(tolerances));
        for (int i = 0; i < weights.length; i++) {
            weights[i] = 1 / tolerances[i];
        }
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
        lots[i].arrive(pulpC, waterKg, ratio(y), y);
        lots[i].weights(lotK, airK, weights);
    }

    /**
     * Lets a lot come in as it was carried out elsewhere.
     *
     * @param i number of the lot in the inputs
     * @param nodes its nodes there
     * @param y state, changed in place
     */
    public void bringIn(int i, double[] nodes, double[] y) {
        LotNodes.put(nodes, lots[i], y);
        lots[i].weights(lotK, airK, weights);
    }

    /**
     * Returns what a node of the state belongs to.
     *
     * @param node index into the state
     * @return such as {@code air} or {@code lot M1}
     */
    public String partAt(int node) {
        return new PartNames(inputs, faces.parts(), lots).at(node);
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
    public double[] weights() {
        return weights;
    }

    @Override
    public void rates(double t, double[] y, double[] rates, double[] flow) {
        at(t);
        ask(air, y, rates, flow);
    }

    private void ask(AirState state, double[] y, double[] rates, double[] flow) {
        state.set(y);
        rates[AirState.ENTHALPY] = 0;
        rates[AirState.HUMIDITY] = 0;
        for (Part part : always) {
            part.rates(state, outside, y, rates, flow);
        }
        blast.follow(state, bank);
        bank.rates(state, outside, y, rates, flow);
        rates[AirState.ENTHALPY] /= airKg;
        rates[AirState.HUMIDITY] /= airKg;
    }

    @Override
    public void linearise(double t, double[] y, Change now, Change slope) {
        at(t);
        startAir.set(y);
        for (Part part : always) {
            part.near(startAir, y);
        }
        bank.near(startAir, y);
        ask(startAir, y, now.rates(), now.flows());
        double[] rateSlope = slope.rates();
        Arrays.fill(tree.hubByHub, 0);
        Arrays.fill(rateSlope, 0);
        Arrays.fill(slope.flows(), 0);
        for (Part part : always) {
            part.linearise(startAir, outside, airKg, y, tree);
            part.timeSlope(startAir, outside, y, rateSlope, slope.flows());
        }
        bank.linearise(startAir, outside, airKg, y, tree);
        rateSlope[AirState.ENTHALPY] /= airKg;
        rateSlope[AirState.HUMIDITY] /= airKg;
    }

    @Override
    public void flowsAlong(double[] direction, double[] change) {
        for (Part part : always) {
            part.flowsAlong(startAir, direction, change);
        }
        bank.flowsAlong(startAir, direction, change);
    }
}
