package org.wardon.heat.network;

import org.wardon.cooling.FaceCooler;

/**
 * Sums over the parts of a network of the integrals its solver carried: J and kg since the start.
 */
public final class Terms {
    private static final int ALL = -1;

    private final Faces byFace;
    private final FacePart[] faces;
    private final CoolerPart[] coolers;
    private final int idealAt;
    private final int mixingAt;
    private final AirEnd.Flows[] ends;

    Terms(Faces faces, CoolerPart[] coolers, int idealAt, int mixingAt, AirEnd.Flows[] ends) {
        this.byFace = faces;
        this.faces = faces.parts();
        this.coolers = coolers;
        this.idealAt = idealAt;
        this.mixingAt = mixingAt;
        this.ends = ends;
    }

    private double exchange(double[] totals, int kind) {
        double sum = 0;
        for (AirEnd.Flows end : ends) {
            sum += totals[end.exchangeAt() + kind];
        }
        return sum;
    }

    private double gains(double[] totals, int kind) {
        double sum = 0;
        for (AirEnd.Flows end : ends) {
            sum += totals[end.gainsAt() + kind];
        }
        return sum;
    }

    private double mist(double[] totals, int kind) {
        double sum = 0;
        for (AirEnd.Flows end : ends) {
            sum += totals[end.mistAt() + kind];
        }
        return sum;
    }

    private double faces(double[] totals, int kind) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += totals[face.flow(kind)];
        }
        return sum;
    }

    /**
     * Reads one face.
     *
     * @param i number of the face in the enclosure
     * @param y state, in which the rates were asked for last
     * @param totals integrals of the flows
     * @return its temperatures and what went through it
     */
    public FaceReading face(int i, double[] y, double[] totals) {
        return FaceReading.of(byFace.of(i), y, totals);
    }

    private double coolers(double[] totals, int kind) {
        double sum = 0;
        for (CoolerPart cooler : coolers) {
            sum += totals[cooler.flow(kind)];
        }
        return sum;
    }

    /** Heat that coolers took from faces and the air before them; of all, or of one cooler. */
    private double taken(double[] totals, int cooler) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += cooler < 0 || face.cooler() == cooler ? face.takenJ(totals) : 0;
        }
        return sum;
    }

    private double faceWater(double[] totals, int cooler) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += cooler < 0 || face.cooler() == cooler ? face.waterUsedKg(totals) : 0;
        }
        return sum;
    }

    private double chillers(double[] totals, int cooler) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += cooler < 0 || face.cooler() == cooler ? face.electricityJ(totals) : 0;
        }
        return sum;
    }

    /**
     * Enthalpy from faces to the air, less that of mist, and what coolers took of their heat before
     * it came to the air: by evaporation outside, by water inside.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double walls(double[] totals) {
        return faces(totals, FacePart.HEAT)
                + taken(totals, ALL)
                + faces(totals, FacePart.VAPOUR_ENTHALPY)
                - mist(totals, MistPart.ENTHALPY);
    }

    /**
     * Vapour from faces to the air; below 0 where it condensed.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double wallVapour(double[] totals) {
        return faces(totals, FacePart.VAPOUR);
    }

    /**
     * Water that fell out of the air as mist.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double mist(double[] totals) {
        return mist(totals, MistPart.WATER);
    }

    /**
     * Water that ran off the faces.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double ranOff(double[] totals) {
        return faces(totals, FacePart.RUNS_OFF);
    }

    /**
     * Heat into the faces' layers from both sides, which their end state must show.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double intoLayers(double[] totals) {
        return faces(totals, FacePart.FROM_BEYOND)
                - (faces(totals, FacePart.HEAT) - faces(totals, FacePart.BRIDGE))
                - faces(totals, FacePart.LATENT)
                - taken(totals, ALL);
    }

    /**
     * Heat from the far side into the layers.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double fromBeyond(double[] totals) {
        return faces(totals, FacePart.FROM_BEYOND);
    }

    /**
     * Enthalpy by leakage.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double leakage(double[] totals) {
        return exchange(totals, AirExchange.LEAK_HEAT);
    }

    /**
     * Enthalpy by fresh air.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double freshAir(double[] totals) {
        return exchange(totals, AirExchange.FRESH_HEAT);
    }

    /**
     * Enthalpy by the door.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double door(double[] totals) {
        return exchange(totals, AirExchange.DOOR_HEAT);
    }

    /**
     * Vapour by leakage.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double leakageVapour(double[] totals) {
        return exchange(totals, AirExchange.LEAK_VAPOUR);
    }

    /**
     * Vapour by fresh air.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double freshAirVapour(double[] totals) {
        return exchange(totals, AirExchange.FRESH_VAPOUR);
    }

    /**
     * Vapour by the door.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double doorVapour(double[] totals) {
        return exchange(totals, AirExchange.DOOR_VAPOUR);
    }

    /**
     * Dry air exchanged by leakage, fresh air, door and coolers that blow outdoor air in.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double exchanged(double[] totals) {
        return exchange(totals, AirExchange.EXCHANGED) + coolers(totals, CoolerPart.EXCHANGED);
    }

    /**
     * Heat of fans, those of coolers included.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double fans(double[] totals) {
        return gains(totals, InnerGains.FANS) + coolers(totals, CoolerPart.FAN);
    }

    /**
     * Heat of lights.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double lights(double[] totals) {
        return gains(totals, InnerGains.LIGHTS);
    }

    /**
     * Enthalpy of people.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double people(double[] totals) {
        return gains(totals, InnerGains.PEOPLE);
    }

    /**
     * Vapour of people.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double peopleVapour(double[] totals) {
        return gains(totals, InnerGains.PEOPLE_VAPOUR);
    }

    /**
     * Heat of the heater.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double heater(double[] totals) {
        return gains(totals, InnerGains.HEATER);
    }

    /**
     * Water of the humidifier.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double humidifierWater(double[] totals) {
        return gains(totals, InnerGains.HUMIDIFIER);
    }

    /**
     * Enthalpy of that water.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double humidifier(double[] totals) {
        return gains(totals, InnerGains.HUMIDIFIER_HEAT);
    }

    /**
     * Integral of the temperature of the air; of the coil end where there are two.
     *
     * @param totals integrals of the flows
     * @return °C s
     */
    public double airC(double[] totals) {
        return totals[ends[AirEnd.COIL].gainsAt() + InnerGains.AIR_C];
    }

    /**
     * Integral of the temperature of the door end's air.
     *
     * @param totals integrals of the flows
     * @return °C s; NaN where the air is one
     */
    public double doorEndC(double[] totals) {
        return ends.length > 1 ? totals[ends[1].gainsAt() + InnerGains.AIR_C] : Double.NaN;
    }

    /**
     * Heat that went from the door end to the coil end.
     *
     * @param totals integrals of the flows
     * @return J; 0 where the air is one
     */
    public double mixed(double[] totals) {
        return mixingAt < 0 ? 0 : totals[mixingAt + Mixing.HEAT];
    }

    /**
     * Vapour that went from the door end to the coil end.
     *
     * @param totals integrals of the flows
     * @return kg; 0 where the air is one
     */
    public double mixedVapour(double[] totals) {
        return mixingAt < 0 ? 0 : totals[mixingAt + Mixing.VAPOUR];
    }

    /**
     * Dry air that went each way between the ends.
     *
     * @param totals integrals of the flows
     * @return kg; 0 where the air is one
     */
    public double mixedAir(double[] totals) {
        return mixingAt < 0 ? 0 : totals[mixingAt + Mixing.AIR];
    }

    /**
     * Heat of pumps, which the water they drive carries away.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double pumps(double[] totals) {
        double sum = 0;
        for (CoolerPart cooler : coolers) {
            sum += pump(cooler, totals);
        }
        return sum;
    }

    private static double pump(CoolerPart cooler, double[] totals) {
        return cooler.unit() instanceof FaceCooler ? totals[cooler.flow(CoolerPart.ELECTRIC)] : 0;
    }

    /**
     * Heat of defrosting.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double defrost(double[] totals) {
        return coolers(totals, CoolerPart.DEFROST);
    }

    /**
     * Enthalpy taken by coolers: from the air, by water and evaporation from faces, heat of pumps.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double removed(double[] totals) {
        return coolers(totals, CoolerPart.REMOVED)
                + taken(totals, ALL)
                + pumps(totals)
                + (idealAt >= 0 ? totals[idealAt + IdealCooler.REMOVED] : 0);
    }

    /**
     * Vapour taken from the air by coolers.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double removedVapour(double[] totals) {
        return coolers(totals, CoolerPart.VAPOUR)
                + (idealAt >= 0 ? totals[idealAt + IdealCooler.VAPOUR] : 0);
    }

    /**
     * Electricity of compressors, pumps, chillers, fans, lights, heater, humidifier and defrost.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double electricity(double[] totals) {
        return coolers(totals, CoolerPart.ELECTRIC)
                + chillers(totals, ALL)
                + fans(totals)
                + lights(totals)
                + heater(totals)
                + InnerGains.HUMIDIFIER_J_KG * humidifierWater(totals)
                + defrost(totals);
    }

    /**
     * Water used up by coolers.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double waterUsed(double[] totals) {
        return coolers(totals, CoolerPart.WATER) + faceWater(totals, ALL);
    }

    /**
     * Water that ran over faces.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double facesWaterKg(double[] totals) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += face.passedKg(totals);
        }
        return sum;
    }

    /**
     * Heat of that water leaving, above 0 °C.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double facesOutletJ(double[] totals) {
        double sum = 0;
        for (FacePart face : faces) {
            sum += face.outletJ(totals);
        }
        return sum;
    }

    /**
     * What one cooler did.
     *
     * @param i number of the cooler
     * @param totals integrals of the flows
     * @return the sums
     */
    public OfCooler cooler(int i, double[] totals) {
        CoolerPart cooler = coolers[i];
        return new OfCooler(
                ranS(i, totals),
                totals[cooler.flow(CoolerPart.REMOVED)] + taken(totals, i) + pump(cooler, totals),
                electricity(i, totals),
                totals[cooler.flow(CoolerPart.WATER)] + faceWater(totals, i));
    }

    /**
     * Time one cooler ran, weighted by its share; for wetted walls the time they were wet, in the
     * mean of them.
     *
     * @param i number of the cooler
     * @param totals integrals of the flows
     * @return s
     */
    public double ranS(int i, double[] totals) {
        double wetS = 0;
        int walls = 0;
        for (FacePart face : faces) {
            if (face instanceof WettedFace wall && wall.cooler() == i) {
                wetS += wall.wetS(totals);
                walls++;
            }
        }
        return walls > 0 ? wetS / walls : totals[coolers[i].flow(CoolerPart.RUN)];
    }

    /**
     * Heat that melted the ice of one cooler.
     *
     * @param i number of the cooler
     * @param totals integrals of the flows
     * @return J
     */
    public double melted(int i, double[] totals) {
        return totals[coolers[i].flow(CoolerPart.MELTS)];
    }

    /**
     * Heat a machine took out of the ice of one cooler.
     *
     * @param i number of the cooler
     * @param totals integrals of the flows
     * @return J
     */
    public double refrozen(int i, double[] totals) {
        return totals[coolers[i].flow(CoolerPart.REFREEZES)];
    }

    /**
     * Electricity of one cooler, its pump and chiller, its fan and its defrost.
     *
     * @param i number of the cooler
     * @param totals integrals of the flows
     * @return J
     */
    public double electricity(int i, double[] totals) {
        CoolerPart cooler = coolers[i];
        return chillers(totals, i)
                + totals[cooler.flow(CoolerPart.ELECTRIC)]
                + totals[cooler.flow(CoolerPart.FAN)]
                + totals[cooler.flow(CoolerPart.DEFROST)];
    }

    /**
     * Sums of one cooler.
     *
     * @param ranS time it ran, weighted by its share, s
     * @param removedJ enthalpy taken, J
     * @param electricityJ electricity, fan and defrost included, J
     * @param waterKg water used up, kg
     */
    public record OfCooler(double ranS, double removedJ, double electricityJ, double waterKg) {}
}
