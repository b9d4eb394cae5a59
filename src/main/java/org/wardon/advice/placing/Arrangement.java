package org.wardon.advice.placing;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.advice.company.GroupReport;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.Reason;

/**
 * A store with its lots as they stand, and what it comes to when it is run in full.
 *
 * @param chambers its chambers, in the order of the plan
 * @param lots the lots that stand in it, by id
 * @param kept what is kept of them, currency
 * @param energyCost what the electricity costs, currency
 * @param energyKWh the electricity, kWh
 */
public record Arrangement(
        List<There> chambers,
        Map<String, OfLot> lots,
        double kept,
        double energyCost,
        double energyKWh) {
    /** Copies list and map. */
    public Arrangement {
        chambers = List.copyOf(chambers);
        lots = Map.copyOf(lots);
    }

    /**
     * Returns the value net of energy.
     *
     * @return currency
     */
    public double net() {
        return kept - energyCost;
    }

    /**
     * One chamber.
     *
     * @param id its id
     * @param setting what is dialled in
     * @param off whether it is switched off
     * @param dialled whether it has anything to dial: a cooler, a heater or a humidifier
     * @param airC mean of its air, °C
     * @param humidityPct mean humidity of its air, percent
     * @param notHeld why it does not hold its setting; empty where it does
     * @param lots ids of its lots, in the order of the plan
     * @param filled how full it is at its fullest
     * @param sharing whether its lots may share; empty where there are none
     */
    public record There(
            String id,
            PlaceAnswer.Dial setting,
            boolean off,
            boolean dialled,
            double airC,
            double humidityPct,
            List<Reason> notHeld,
            List<String> lots,
            Filled filled,
            Optional<GroupReport> sharing) {
        /** Copies the lists. */
        public There {
            notHeld = List.copyOf(notHeld);
            lots = List.copyOf(lots);
        }
    }

    /**
     * How full a chamber is on the day it is fullest.
     *
     * @param massKg mass of its lots, kg
     * @param capacityKg what it takes, kg
     * @param volumeM3 room its packed lots take, m3
     * @param roomM3 room there is for them beside ways and air, m3
     */
    public record Filled(double massKg, double capacityKg, double volumeM3, double roomM3) {}

    /**
     * One lot where it stands.
     *
     * @param daysLeft days left staying there
     * @param limitedBy what ends it, a code
     * @param valueKept what is kept of it, currency
     * @param soundPct share of draws in which it is sound when sold, percent
     */
    public record OfLot(Quantiles daysLeft, String limitedBy, double valueKept, double soundPct) {}
}
