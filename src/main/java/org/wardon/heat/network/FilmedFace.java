package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.water.WaterSheet;
import org.wardon.heat.solver.Branch;

/**
 * A face under cold water inside: an open film or a jacket. It runs by the thermostat of its
 * cooler; with a share of the time running, each flow is the share of what it is with the water
 * running and the rest of what it is without: bursts short against the time the wall takes.
 *
 * <p>What the water takes stands beside the common flows: {@code heat to the air + latent + taken}
 * is what leaves the layers, so the balance of the layers closes over it.
 */
abstract class FilmedFace extends FaceChain {
    /** Heat the water took, W. */
    static final int TAKEN = COMMON;

    /** Water evaporating from the film, kg/s. */
    static final int USED = COMMON + 1;

    /** Water that ran over the face, kg/s. */
    static final int WATER = COMMON + 2;

    /** Heat of that water leaving, above 0 °C, W. */
    static final int OUTLET = COMMON + 3;

    /** Electricity of the chiller, W. */
    static final int CHILLER = COMMON + 4;

    static final int FLOWS = COMMON + 5;

    /** Partials: by the face's inner surface. */
    static final int SURFACE = 0;

    /** By free water on it (film), or by the sheet (jacket). */
    static final int SECOND = 1;

    /** By air temperature. */
    static final int AIR = 2;

    /** By humidity ratio. */
    static final int RATIO = 3;

    private static final int PARTIALS = 4;

    final Water water;
    final FilmExchange film;
    final int kinds;

    /** {@code [kind]}, values without and with the water running. */
    final double[] atRest;

    final double[] running;

    /** {@code [partial][kind]}, slopes where the face was linearised last. */
    final double[][] by;

    double share;
    double shareByAirC;
    double rest;
    double inletC = 10;
    private double chillerPerW;
    private Control control = Control.NONE;

    /**
     * The water of one face.
     *
     * @param flowKgS water over it, kg/s
     * @param widthM across the flow, m
     * @param wayM along it, m
     * @param limitW most its share of the chiller takes of it, W; infinite without one
     * @param pumpW pump heat in its share of the water, W
     */
    record Water(double flowKgS, double widthM, double wayM, double limitW, double pumpW) {}

    /** What tells the face how much of the time its water runs. */
    interface Control {
        /** Never runs. */
        Control NONE =
                new Control() {
                    @Override
                    public double share(double airC) {
                        return 0;
                    }

                    @Override
                    public double shareByAirC(double airC) {
                        return 0;
                    }
                };

        /** Share of the time, 0 to 1. */
        double share(double airC);

        /** Its slope, 1/K. */
        double shareByAirC(double airC);
    }

    FilmedFace(Branch branch, Build build, Water water, double pressurePa, int ownKinds) {
        super(branch, build, 0);
        this.water = water;
        WaterSheet.Sides none = new WaterSheet.Sides(1, 1, 0, 1);
        this.film =
                new FilmExchange(
                        water.limitW,
                        new WaterSheet(areaM2, water.flowKgS, none),
                        pressurePa,
                        build.plain());
        this.kinds = FLOWS + ownKinds;
        atRest = new double[kinds];
        running = new double[kinds];
        by = new double[PARTIALS][kinds];
    }

    void drivenBy(Control cooler) {
        control = cooler;
    }

    /** Enters an hour: water entering, °C, and the chiller's electricity a watt taken. */
    void hour(double entersC, double electricPerW) {
        inletC = entersC + water.pumpW / (water.flowKgS * MoistAir.WATER_J_KG_K);
        chillerPerW = electricPerW;
    }

    /** Lets the conductances of the water follow the state; until the next call they stand. */
    abstract void settle(AirState air, double[] y);

    void sheet(WaterSheet.Sides sides) {
        film.set(new WaterSheet(areaM2, water.flowKgS, sides), inletC);
    }

    /** Conductance from the depth of the face to the water, for NTU, W/(m2 K). */
    double fromDepthWm2K(double wallWm2K) {
        return 1 / (1 / wallWm2K + 1 / intoInnermost());
    }

    void follow(double airC) {
        share = control.share(airC);
        rest = 1 - share;
    }

    /** Flows of the water itself, from what the film did. */
    void waterFlows() {
        WaterSheet sheet = film.sheet();
        running[TAKEN] = film.takenW;
        running[WATER] = water.flowKgS;
        running[OUTLET] =
                water.flowKgS * MoistAir.WATER_J_KG_K * film.meanC
                        + (1 - sheet.meanShare()) * film.takenW;
        running[CHILLER] = chillerPerW * (film.takenW + water.pumpW);
    }

    /** Their slopes by one of the film's inputs. */
    void waterSlopes(int partial, int filmInput) {
        double[] to = by[partial];
        double taken = film.takenBy[filmInput];
        to[TAKEN] += share * taken;
        to[OUTLET] +=
                share
                        * (water.flowKgS * MoistAir.WATER_J_KG_K * film.meanBy[filmInput]
                                + (1 - film.sheet().meanShare()) * taken);
        to[CHILLER] += share * chillerPerW * taken;
    }

    double value(int kind) {
        return rest * atRest[kind] + share * running[kind];
    }

    /** Starts the slopes: with the air's temperature the share itself changes. */
    void startSlopes(double airC) {
        shareByAirC = control.shareByAirC(airC);
        for (int kind = 0; kind < kinds; kind++) {
            by[SURFACE][kind] = 0;
            by[SECOND][kind] = 0;
            by[RATIO][kind] = 0;
            by[AIR][kind] = shareByAirC * (running[kind] - atRest[kind]);
        }
    }

    void writeFlows(double bridgeW, double fromBeyondW, double[] flows) {
        for (int kind = 0; kind < FLOWS; kind++) {
            flows[flowAt + kind] = value(kind);
        }
        flows[flowAt + HEAT] += bridgeW;
        flows[flowAt + BRIDGE] = bridgeW;
        flows[flowAt + FROM_BEYOND] = fromBeyondW;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        double in = areaM2 * outer * beyondSlope;
        rateSlope[outermost] += in / (areaM2 * grid.capacity[0]);
        rateSlope[air.at] += bridgeWK * beyondSlope;
        slope[flowAt + FROM_BEYOND] = in;
        slope[flowAt + HEAT] = bridgeWK * beyondSlope;
        slope[flowAt + BRIDGE] = bridgeWK * beyondSlope;
    }

    /** Changes of all flows along a direction, {@code second} being that of its second state. */
    void along(AirState air, double[] v, double second, double[] change) {
        double airC = air.airAlong(v);
        for (int kind = 0; kind < FLOWS; kind++) {
            change[flowAt + kind] =
                    by[SURFACE][kind] * v[innermost]
                            + by[SECOND][kind] * second
                            + by[AIR][kind] * airC
                            + by[RATIO][kind] * v[air.at + 1];
        }
        change[flowAt + HEAT] -= bridgeWK * airC;
        change[flowAt + BRIDGE] = -bridgeWK * airC;
        change[flowAt + FROM_BEYOND] = -areaM2 * outer * v[outermost];
    }

    @Override
    public double passedKg(double[] totals) {
        return totals[flowAt + WATER];
    }

    @Override
    public double outletJ(double[] totals) {
        return totals[flowAt + OUTLET];
    }

    @Override
    public double takenJ(double[] totals) {
        return totals[flowAt + TAKEN];
    }

    @Override
    public double waterUsedKg(double[] totals) {
        return totals[flowAt + USED];
    }

    @Override
    public double electricityJ(double[] totals) {
        return totals[flowAt + CHILLER];
    }
}
