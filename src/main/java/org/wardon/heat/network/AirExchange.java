package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.enclosure.DoorExchange;
import org.wardon.heat.laws.FreeWater;

/**
 * Air that comes and goes: leakage and fresh air as steady flows of outdoor air, and the door by
 * the difference of densities. Equal masses of dry air pass each way. Air that coolers blow in
 * keeps that much leakage out, down to none. Coolers must have been asked before.
 */
final class AirExchange implements Part {
    /** Flows: enthalpy by leakage, W. */
    static final int LEAK_HEAT = 0;

    /** Vapour by leakage, kg/s. */
    static final int LEAK_VAPOUR = 1;

    /** Enthalpy by fresh air, W. */
    static final int FRESH_HEAT = 2;

    /** Vapour by fresh air, kg/s. */
    static final int FRESH_VAPOUR = 3;

    /** Enthalpy by the door, W. */
    static final int DOOR_HEAT = 4;

    /** Vapour by the door, kg/s. */
    static final int DOOR_VAPOUR = 5;

    /** Dry air exchanged in all, kg/s. */
    static final int EXCHANGED = 6;

    static final int FLOWS = 7;

    private static final double VAPOUR_VOLUME = 1.607858;
    private static final double SLOPE_OVER_S = 1;

    /** Share of the density over which the slope of the door is taken. */
    private static final double DENSITY_STEP = 3e-7;

    /** The last of the leakage fades out over this share of it, to either side. */
    private static final double FADES_OVER = 0.05;

    private final int flowAt;
    private final double pressurePa;
    private final double leakKgS;
    private final double freshKgS;
    private final Doorway doorway;
    private final CoolerPart[] coolers;
    private double open;
    private double freeM3 = 1;

    /** Dry air through the door as it was last asked, kg/s. */
    private double through;

    private double door;
    private double doorByAirC;
    private double doorByRatio;
    private double leak;
    private double leakByAirC;
    private double toOutdoors;
    private double toOutdoorsHeat;
    private double toOutdoorsRatio;
    private double toBeyondHeat;
    private double toBeyondRatio;

    /**
     * The door as numbers.
     *
     * @param widthM clear width, m; 0 for no door
     * @param heightM clear height, m
     * @param share of the full flow in use
     * @param averagedOpenS open time of one opening where openings are averaged, s; else 0
     * @param openingsPerS openings a second while in use, where averaged
     */
    record Doorway(
            double widthM,
            double heightM,
            double share,
            double averagedOpenS,
            double openingsPerS) {
        /** No door. */
        static final Doorway NONE = new Doorway(0, 0, 0, 0, 0);
    }

    /** Steady flows of outdoor air with the door shut and no fan blowing in, kg/s. */
    record Steady(double leakKgS, double freshKgS) {}

    AirExchange(
            int flowAt, double pressurePa, Steady steady, Doorway doorway, CoolerPart[] coolers) {
        this.flowAt = flowAt;
        this.pressurePa = pressurePa;
        this.leakKgS = steady.leakKgS;
        this.freshKgS = steady.freshKgS;
        this.doorway = doorway;
        this.coolers = coolers.clone();
    }

    private double drivenKgS() {
        double sum = 0;
        for (CoolerPart cooler : coolers) {
            sum += cooler.drivenKgS();
        }
        return sum;
    }

    /** Leakage left beside what coolers blow in, kg/s. */
    private double leakKgS() {
        return leakKgS > 0 ? FreeWater.positive(leakKgS - drivenKgS(), FADES_OVER * leakKgS) : 0;
    }

    /** Slope of the leakage left by what coolers blow in. */
    private double leakSlope() {
        return leakKgS > 0
                ? -FreeWater.positiveSlope(leakKgS - drivenKgS(), FADES_OVER * leakKgS)
                : 0;
    }

    /** Opens or shuts the door; where averaged, starts or ends its hours of use. */
    void open(double share) {
        open = share;
    }

    /** Tells the free volume of the chamber, m3. */
    void freeVolume(double m3) {
        freeM3 = m3;
    }

    private double density(double airC, double ratio) {
        return (1 + ratio)
                * pressurePa
                / (MoistAir.DRY_AIR_GAS_J_KG_K
                        * (airC + SaturatedAir.ZERO_C_IN_K)
                        * (1 + VAPOUR_VOLUME * ratio));
    }

    /** Dry air through the door, kg/s. */
    private double doorKgS(double airC, double ratio, double beyondC, double beyondRatio) {
        if (open <= 0 || doorway.widthM <= 0) {
            return 0;
        }
        return moistKgS(density(airC, ratio), density(beyondC, beyondRatio)) / (1 + ratio);
    }

    /** Moist air through the door by the densities on its sides, kg/s. */
    private double moistKgS(double inside, double beyond) {
        double full =
                DoorExchange.flowKgS(inside, beyond, doorway.widthM, doorway.heightM)
                        * doorway.share;
        if (doorway.averagedOpenS <= 0) {
            return open * full;
        }
        return open
                * inside
                * DoorExchange.volumeAnOpeningM3(full / inside, doorway.averagedOpenS, freeM3)
                * doorway.openingsPerS;
    }

    /**
     * Slopes of the door's air, which feels the chamber's by its density; {@code door} is known.
     */
    private void doorSlopes(AirState air, Outside.Place beyond) {
        doorByAirC = 0;
        doorByRatio = 0;
        if (door <= 0) {
            return;
        }
        double inside = density(air.airC, air.ratio);
        double there = density(beyond.airC, beyond.ratio);
        double step = DENSITY_STEP * inside;
        double byDensity =
                (moistKgS(inside + step, there) - moistKgS(inside - step, there)) / (2 * step);
        double perMoist = 1 / (1 + air.ratio);
        doorByAirC = -byDensity * perMoist * inside / (air.airC + SaturatedAir.ZERO_C_IN_K);
        double lighter = perMoist - VAPOUR_VOLUME / (1 + VAPOUR_VOLUME * air.ratio);
        doorByRatio = (byDensity * inside * lighter - door) * perMoist;
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        Outside.Place out = outside.outdoors;
        Outside.Place beyond = outside.beyondDoor;
        through = doorKgS(air.airC, air.ratio, beyond.airC, beyond.ratio);
        double heat = out.enthalpy() - air.enthalpy;
        double vapour = out.ratio - air.ratio;
        double doorHeat = through * (beyond.enthalpy() - air.enthalpy);
        double doorVapour = through * (beyond.ratio - air.ratio);
        double leaks = leakKgS();
        flows[flowAt + LEAK_HEAT] = leaks * heat;
        flows[flowAt + LEAK_VAPOUR] = leaks * vapour;
        flows[flowAt + FRESH_HEAT] = freshKgS * heat;
        flows[flowAt + FRESH_VAPOUR] = freshKgS * vapour;
        flows[flowAt + DOOR_HEAT] = doorHeat;
        flows[flowAt + DOOR_VAPOUR] = doorVapour;
        flows[flowAt + EXCHANGED] = leaks + freshKgS + through;
        rates[air.at] += (leaks + freshKgS) * heat + doorHeat;
        rates[air.at + 1] += (leaks + freshKgS) * vapour + doorVapour;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        Outside.Place beyond = outside.beyondDoor;
        door = through;
        doorSlopes(air, beyond);
        leak = leakKgS();
        leakByAirC = 0;
        for (CoolerPart cooler : coolers) {
            leakByAirC += leakSlope() * cooler.drivenByAirC();
        }
        toOutdoors = leak + freshKgS;
        toOutdoorsHeat = outside.outdoors.enthalpy() - air.enthalpy;
        toOutdoorsRatio = outside.outdoors.ratio - air.ratio;
        toBeyondHeat = beyond.enthalpy() - air.enthalpy;
        toBeyondRatio = beyond.ratio - air.ratio;
        double byEnthalpy = doorByAirC * air.airByEnthalpy;
        double byRatio = doorByAirC * air.airByRatio + doorByRatio;
        air.byItself[0] += (-toOutdoors - door + byEnthalpy * toBeyondHeat) / airKg;
        air.byItself[1] += byRatio * toBeyondHeat / airKg;
        air.byItself[2] += byEnthalpy * toBeyondRatio / airKg;
        air.byItself[3] += (-toOutdoors - door + byRatio * toBeyondRatio) / airKg;
        double leakByEnthalpy = leakByAirC * air.airByEnthalpy / airKg;
        double leakByRatio = leakByAirC * air.airByRatio / airKg;
        air.byItself[0] += leakByEnthalpy * toOutdoorsHeat;
        air.byItself[1] += leakByRatio * toOutdoorsHeat;
        air.byItself[2] += leakByEnthalpy * toOutdoorsRatio;
        air.byItself[3] += leakByRatio * toOutdoorsRatio;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        Outside.Place out = outside.outdoors;
        Outside.Place beyond = outside.beyondDoor;
        double heat = out.enthalpySlope();
        double doorSlope =
                door > 0
                        ? (doorKgS(
                                                air.airC,
                                                air.ratio,
                                                beyond.airC + SLOPE_OVER_S * beyond.airSlope,
                                                beyond.ratio + SLOPE_OVER_S * beyond.ratioSlope)
                                        - door)
                                / SLOPE_OVER_S
                        : 0;
        double doorHeat = door * beyond.enthalpySlope() + doorSlope * toBeyondHeat;
        double doorVapour = door * beyond.ratioSlope + doorSlope * toBeyondRatio;
        double leaks = 0;
        for (CoolerPart cooler : coolers) {
            leaks += leakSlope() * slope[cooler.flow(CoolerPart.EXCHANGED)];
        }
        slope[flowAt + LEAK_HEAT] = leak * heat + leaks * toOutdoorsHeat;
        slope[flowAt + LEAK_VAPOUR] = leak * out.ratioSlope + leaks * toOutdoorsRatio;
        slope[flowAt + FRESH_HEAT] = freshKgS * heat;
        slope[flowAt + FRESH_VAPOUR] = freshKgS * out.ratioSlope;
        slope[flowAt + DOOR_HEAT] = doorHeat;
        slope[flowAt + DOOR_VAPOUR] = doorVapour;
        slope[flowAt + EXCHANGED] = leaks + doorSlope;
        rateSlope[air.at] += toOutdoors * heat + leaks * toOutdoorsHeat + doorHeat;
        rateSlope[air.at + 1] += toOutdoors * out.ratioSlope + leaks * toOutdoorsRatio + doorVapour;
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double heat = -v[air.at];
        double vapour = -v[air.at + 1];
        double airC = air.airAlong(v);
        double more = doorByAirC * airC + doorByRatio * v[air.at + 1];
        double leaks = leakByAirC * airC;
        change[flowAt + LEAK_HEAT] = leak * heat + leaks * toOutdoorsHeat;
        change[flowAt + LEAK_VAPOUR] = leak * vapour + leaks * toOutdoorsRatio;
        change[flowAt + FRESH_HEAT] = freshKgS * heat;
        change[flowAt + FRESH_VAPOUR] = freshKgS * vapour;
        change[flowAt + DOOR_HEAT] = door * heat + more * toBeyondHeat;
        change[flowAt + DOOR_VAPOUR] = door * vapour + more * toBeyondRatio;
        change[flowAt + EXCHANGED] = leaks + more;
    }
}
