package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.Setting;
import org.wardon.cooling.Thermostat;
import org.wardon.cooling.solar.Inverter;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.heat.laws.FreeWater;

/**
 * What is given off inside: fans that run always, lights, people, a heater that keeps the chamber
 * from falling below setting - band, a humidifier that works towards the wanted humidity. Carries
 * the integral of the air's temperature as well, for hourly means.
 */
final class InnerGains implements Part {
    /** Flows: fans, W. */
    static final int FANS = 0;

    /** Lights, W. */
    static final int LIGHTS = 1;

    /** People, sensible and latent, W. */
    static final int PEOPLE = 2;

    /** Vapour of people, kg/s. */
    static final int PEOPLE_VAPOUR = 3;

    /** Heater, W. */
    static final int HEATER = 4;

    /** Water of the humidifier, kg/s. */
    static final int HUMIDIFIER = 5;

    /** Enthalpy of that water, W. */
    static final int HUMIDIFIER_HEAT = 6;

    /** Temperature of the air, °C. */
    static final int AIR_C = 7;

    static final int FLOWS = 8;

    /** Vapour of people leaves at body temperature, °C. */
    private static final double BODY_C = 37;

    /** Water of the humidifier, °C (assumption). */
    private static final double WATER_C = 20;

    /** Electricity a humidifier turns water to mist with, J/kg. */
    static final double HUMIDIFIER_J_KG = 3_600 * Inverter.HUMIDIFIER_WH_KG;

    /** What a kilogram of that water brings, J. */
    private static final double WATER_HEAT_J_KG = MoistAir.WATER_J_KG_K * WATER_C + HUMIDIFIER_J_KG;

    /** The humidifier gives all it can this far below the wanted humidity (assumption). */
    private static final double HUMIDITY_BAND = 0.04;

    private final int flowAt;
    private Setting setting;
    private final double offsetK;
    private final double fansW;
    private final double lightsW;
    private final double heaterW;
    private final double humidifierKgS;
    private boolean powered = true;
    private double lit;
    private double people;

    private double peopleByAirC;
    private double heaterByAirC;
    private double humidifierByAirC;
    private double humidifierByRatio;

    InnerGains(
            int flowAt,
            Setting setting,
            double offsetK,
            double fansW,
            double lightsW,
            double heaterW,
            double humidifierKgS) {
        this.flowAt = flowAt;
        this.setting = setting;
        this.offsetK = offsetK;
        this.fansW = fansW;
        this.lightsW = lightsW;
        this.heaterW = heaterW;
        this.humidifierKgS = humidifierKgS;
    }

    /** Lets heater and humidifier work towards another setting. */
    void set(Setting other) {
        setting = other;
    }

    void power(boolean on) {
        powered = on;
    }

    void light(double share) {
        lit = share;
    }

    void people(double present) {
        people = present;
    }

    private double heaterShare(double airC) {
        double low = setting.temperatureC() - setting.bandK();
        return 1 - Thermostat.modulatedShare(airC + offsetK, low, 0.5 * setting.bandK());
    }

    private double dryness(AirState air) {
        double humidity = air.vapourPa / Saturation.pressurePa(air.airC);
        return (setting.humidityPct() / 100 - humidity) / HUMIDITY_BAND;
    }

    private double humidifier(AirState air) {
        if (!powered || humidifierKgS <= 0) {
            return 0;
        }
        return humidifierKgS * (1 - FreeWater.positive(1 - dryness(air), 0.1))
                + humidifierKgS * FreeWater.positive(-dryness(air), 0.1);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        double fans = powered ? fansW : 0;
        double lights = powered ? lit * lightsW : 0;
        double body = people * PeopleHeat.watts(air.airC);
        double breath = PeopleHeat.LATENT_SHARE * body / MoistAir.vapourEnthalpyJkg(BODY_C);
        double heater = powered && heaterW > 0 ? heaterW * heaterShare(air.airC) : 0;
        double mist = humidifier(air);
        double mistHeat = mist * WATER_HEAT_J_KG;
        flows[flowAt + FANS] = fans;
        flows[flowAt + LIGHTS] = lights;
        flows[flowAt + PEOPLE] = body;
        flows[flowAt + PEOPLE_VAPOUR] = breath;
        flows[flowAt + HEATER] = heater;
        flows[flowAt + HUMIDIFIER] = mist;
        flows[flowAt + HUMIDIFIER_HEAT] = mistHeat;
        flows[flowAt + AIR_C] = air.airC;
        rates[air.at] += fans + lights + body + heater + mistHeat;
        rates[air.at + 1] += breath + mist;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        peopleByAirC = people * PeopleHeat.slopeWattsPerK(air.airC);
        double low = setting.temperatureC() - setting.bandK();
        heaterByAirC =
                powered && heaterW > 0
                        ? -heaterW
                                * Thermostat.modulatedSlopePerK(
                                        air.airC + offsetK, low, 0.5 * setting.bandK())
                        : 0;
        humidifierByAirC = 0;
        humidifierByRatio = 0;
        if (powered && humidifierKgS > 0) {
            double psat = Saturation.pressurePa(air.airC);
            double d = dryness(air);
            double byHumidity =
                    -humidifierKgS
                            / HUMIDITY_BAND
                            * (FreeWater.positiveSlope(1 - d, 0.1)
                                    - FreeWater.positiveSlope(-d, 0.1));
            humidifierByRatio = byHumidity * air.vapourByRatio / psat;
            humidifierByAirC =
                    -byHumidity * air.vapourPa / (psat * psat) * Saturation.slopePaPerK(air.airC);
        }
        double waterHeat = WATER_HEAT_J_KG;
        double heatByAirC = peopleByAirC + heaterByAirC + humidifierByAirC * waterHeat;
        double breathByAirC =
                PeopleHeat.LATENT_SHARE * peopleByAirC / MoistAir.vapourEnthalpyJkg(BODY_C);
        double waterByAirC = breathByAirC + humidifierByAirC;
        air.byItself[0] += heatByAirC * air.airByEnthalpy / airKg;
        air.byItself[1] += (heatByAirC * air.airByRatio + humidifierByRatio * waterHeat) / airKg;
        air.byItself[2] += waterByAirC * air.airByEnthalpy / airKg;
        air.byItself[3] += (waterByAirC * air.airByRatio + humidifierByRatio) / airKg;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Nothing here follows the weather.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double mist = humidifierByAirC * airC + humidifierByRatio * v[air.at + 1];
        change[flowAt + PEOPLE] = peopleByAirC * airC;
        change[flowAt + PEOPLE_VAPOUR] =
                PeopleHeat.LATENT_SHARE * peopleByAirC * airC / MoistAir.vapourEnthalpyJkg(BODY_C);
        change[flowAt + HEATER] = heaterByAirC * airC;
        change[flowAt + HUMIDIFIER] = mist;
        change[flowAt + HUMIDIFIER_HEAT] = mist * WATER_HEAT_J_KG;
        change[flowAt + AIR_C] = airC;
    }
}
