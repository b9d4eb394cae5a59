package org.wardon.files.forecast;

import java.util.List;
import java.util.Optional;

/**
 * Plans side by side, each run in full.
 *
 * @param variants the plan as it is first, then as it is changed
 */
public record CompareAnswer(List<Variant> variants) {
    /** Copies the list. */
    public CompareAnswer {
        variants = List.copyOf(variants);
    }

    /**
     * One plan.
     *
     * @param name its name
     * @param changed what was changed in it
     * @param value what its lots are worth, and the energy
     * @param energyKWh electricity of all chambers to the plan's end, kWh
     * @param chambers its chambers
     * @param lots its lots
     */
    public record Variant(
            String name,
            List<Changed> changed,
            Forecast.Value value,
            double energyKWh,
            List<OfChamber> chambers,
            List<OfLot> lots) {
        /** Copies the lists. */
        public Variant {
            changed = List.copyOf(changed);
            chambers = List.copyOf(chambers);
            lots = List.copyOf(lots);
        }
    }

    /**
     * One change.
     *
     * @param path where in the plan
     * @param from what stood there; absent where nothing did and the default held
     * @param to what stands there now
     */
    public record Changed(String path, Optional<String> from, String to) {}

    /**
     * A chamber.
     *
     * @param id its id
     * @param holds whether it holds its setting
     * @param airC its mean air, °C
     * @param energyKWh its electricity, kWh
     * @param energyCost what that costs, currency
     */
    public record OfChamber(
            String id, boolean holds, double airC, double energyKWh, double energyCost) {}

    /**
     * A lot.
     *
     * @param id its id
     * @param chamber where it ends
     * @param daysLeft days left
     * @param limitedBy what ends it first
     * @param valueKept its value when sold, currency
     */
    public record OfLot(
            String id,
            Optional<String> chamber,
            Quantiles daysLeft,
            String limitedBy,
            double valueKept) {}
}
