package org.wardon.files.forecast;

import java.util.List;

/**
 * One chamber with something changed, against the plan unchanged.
 *
 * @param chamber id of the chamber
 * @param series hour by hour with the change: {@code airC humidityPct coolingW powerW co2Ppm
 *     ethylenePpm} and more
 * @param now with the change
 * @param unchanged without it
 * @param lots its lots
 * @param whyNot why it does not hold with the change; empty where it holds
 * @param draws how many draws stand behind the days
 */
public record WhatIfAnswer(
        String chamber,
        HourlySeries series,
        Outcome now,
        Outcome unchanged,
        List<OfLot> lots,
        List<Because> whyNot,
        int draws) {
    /** Copies the lists. */
    public WhatIfAnswer {
        lots = List.copyOf(lots);
        whyNot = List.copyOf(whyNot);
    }

    /**
     * What the chamber comes to.
     *
     * @param holds whether it holds its setting
     * @param energyKWh electricity to the plan's end, kWh
     * @param energyCost what that costs, currency
     * @param valueKept value of its lots when sold, currency
     * @param net that less the energy, currency
     */
    public record Outcome(
            boolean holds, double energyKWh, double energyCost, double valueKept, double net) {}

    /**
     * One of its lots.
     *
     * @param id the lot
     * @param daysLeft days left with the change
     * @param daysLeftUnchanged days left without it
     * @param daysGained the difference draw by draw; below 0 where it costs days
     * @param valueKept value when sold with the change, currency
     * @param valueUnchanged the same without it, currency
     */
    public record OfLot(
            String id,
            Quantiles daysLeft,
            Quantiles daysLeftUnchanged,
            Quantiles daysGained,
            double valueKept,
            double valueUnchanged) {}
}
