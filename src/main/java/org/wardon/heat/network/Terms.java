package org.wardon.heat.network;

/**
 * Sums over the parts of a network of the integrals its solver carried: J and kg since the start.
 */
public final class Terms {
    private final FaceBranch[] faces;
    private final CoolerPart[] coolers;
    private final int idealAt;
    private final int exchangeAt;
    private final int gainsAt;
    private final int mistAt;

    Terms(
            FaceBranch[] faces,
            CoolerPart[] coolers,
            int idealAt,
            int exchangeAt,
            int gainsAt,
            int mistAt) {
        this.faces = faces;
        this.coolers = coolers;
        this.idealAt = idealAt;
        this.exchangeAt = exchangeAt;
        this.gainsAt = gainsAt;
        this.mistAt = mistAt;
    }

    private double faces(double[] totals, int kind) {
        double sum = 0;
        for (FaceBranch face : faces) {
            sum += totals[face.flow(kind)];
        }
        return sum;
    }

    private double coolers(double[] totals, int kind) {
        double sum = 0;
        for (CoolerPart cooler : coolers) {
            sum += totals[cooler.flow(kind)];
        }
        return sum;
    }

    /**
     * Enthalpy from faces to the air, less that of mist.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double walls(double[] totals) {
        return faces(totals, FaceBranch.HEAT)
                + faces(totals, FaceBranch.VAPOUR_ENTHALPY)
                - totals[mistAt + MistPart.ENTHALPY];
    }

    /**
     * Vapour from faces to the air; below 0 where it condensed.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double wallVapour(double[] totals) {
        return faces(totals, FaceBranch.VAPOUR);
    }

    /**
     * Water that fell out of the air as mist.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double mist(double[] totals) {
        return totals[mistAt + MistPart.WATER];
    }

    /**
     * Water that ran off the faces.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double ranOff(double[] totals) {
        return faces(totals, FaceBranch.RUNS_OFF);
    }

    /**
     * Heat into the faces' layers from both sides, which their end state must show.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double intoLayers(double[] totals) {
        return faces(totals, FaceBranch.FROM_BEYOND)
                - (faces(totals, FaceBranch.HEAT) - faces(totals, FaceBranch.BRIDGE))
                - faces(totals, FaceBranch.LATENT);
    }

    /**
     * Heat from the far side into the layers.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double fromBeyond(double[] totals) {
        return faces(totals, FaceBranch.FROM_BEYOND);
    }

    /**
     * Enthalpy by leakage.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double leakage(double[] totals) {
        return totals[exchangeAt + AirExchange.LEAK_HEAT];
    }

    /**
     * Enthalpy by fresh air.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double freshAir(double[] totals) {
        return totals[exchangeAt + AirExchange.FRESH_HEAT];
    }

    /**
     * Enthalpy by the door.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double door(double[] totals) {
        return totals[exchangeAt + AirExchange.DOOR_HEAT];
    }

    /**
     * Vapour by leakage.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double leakageVapour(double[] totals) {
        return totals[exchangeAt + AirExchange.LEAK_VAPOUR];
    }

    /**
     * Vapour by fresh air.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double freshAirVapour(double[] totals) {
        return totals[exchangeAt + AirExchange.FRESH_VAPOUR];
    }

    /**
     * Vapour by the door.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double doorVapour(double[] totals) {
        return totals[exchangeAt + AirExchange.DOOR_VAPOUR];
    }

    /**
     * Dry air exchanged by leakage, fresh air and door.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double exchanged(double[] totals) {
        return totals[exchangeAt + AirExchange.EXCHANGED];
    }

    /**
     * Heat of fans, those of coolers included.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double fans(double[] totals) {
        return totals[gainsAt + InnerGains.FANS] + coolers(totals, CoolerPart.FAN);
    }

    /**
     * Heat of lights.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double lights(double[] totals) {
        return totals[gainsAt + InnerGains.LIGHTS];
    }

    /**
     * Enthalpy of people.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double people(double[] totals) {
        return totals[gainsAt + InnerGains.PEOPLE];
    }

    /**
     * Vapour of people.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double peopleVapour(double[] totals) {
        return totals[gainsAt + InnerGains.PEOPLE_VAPOUR];
    }

    /**
     * Heat of the heater.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double heater(double[] totals) {
        return totals[gainsAt + InnerGains.HEATER];
    }

    /**
     * Water of the humidifier.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double humidifierWater(double[] totals) {
        return totals[gainsAt + InnerGains.HUMIDIFIER];
    }

    /**
     * Enthalpy of that water.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double humidifier(double[] totals) {
        return totals[gainsAt + InnerGains.HUMIDIFIER_HEAT];
    }

    /**
     * Integral of the air's temperature.
     *
     * @param totals integrals of the flows
     * @return °C s
     */
    public double airC(double[] totals) {
        return totals[gainsAt + InnerGains.AIR_C];
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
     * Enthalpy taken from the air by coolers.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double removed(double[] totals) {
        return coolers(totals, CoolerPart.REMOVED)
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
     * Electricity of compressors, fans, lights, heater and defrost.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double electricity(double[] totals) {
        return coolers(totals, CoolerPart.ELECTRIC)
                + fans(totals)
                + lights(totals)
                + heater(totals)
                + defrost(totals);
    }

    /**
     * Time the first cooler ran, weighted by its share.
     *
     * @param totals integrals of the flows
     * @return s; 0 without a cooler
     */
    public double ranS(double[] totals) {
        return coolers.length == 0 ? 0 : totals[coolers[0].flow(CoolerPart.RUN)];
    }
}
