package org.wardon.cooling.solar;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.wardon.cooling.Cooler;
import org.wardon.enclosure.Gains;

/**
 * Which coolers an inverter can carry. It carries fans, lights, heater and humidifier first, then
 * the coolers in the order they act, each counted at the most it can draw; one that would go beyond
 * the inverter stays off for good (assumption: nobody lets an inverter trip day after day).
 */
public final class Inverter {
    /** Electricity a humidifier turns water to mist with, Wh/kg (assumption, ultrasonic). */
    public static final double HUMIDIFIER_WH_KG = 50;

    private Inverter() {}

    /**
     * Returns the most a chamber draws beside its coolers.
     *
     * @param gains fans and lights
     * @param heaterW heater, W
     * @param humidifierKgH humidifier, kg/h
     * @return W
     */
    public static double othersW(Gains gains, double heaterW, double humidifierKgH) {
        return gains.fansW() + gains.lightsW() + heaterW + HUMIDIFIER_WH_KG * humidifierKgH;
    }

    /**
     * Returns which coolers are carried.
     *
     * @param inverterW the most it gives, W; empty for no limit
     * @param othersW the most the chamber draws beside its coolers, W
     * @param coolers in the order they act
     * @return one answer a cooler
     */
    public static List<Boolean> carries(
            OptionalDouble inverterW, double othersW, List<Cooler> coolers) {
        double leftW = inverterW.orElse(Double.POSITIVE_INFINITY) - othersW;
        List<Boolean> carried = new ArrayList<>();
        for (Cooler cooler : coolers) {
            boolean fits = !cooler.needsPower() || cooler.mostElectricW() <= leftW;
            carried.add(fits);
            leftW -= fits ? cooler.mostElectricW() : 0;
        }
        return carried;
    }
}
