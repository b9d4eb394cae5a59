package org.wardon.advice.placing;

import java.util.List;
import org.wardon.advice.forecast.TrialLot;

/** What a kilogram of a lot counts where lots are weighed against each other. */
final class Worth {
    /** A lot without a price counts so much of the mean of the others, to break ties. */
    private static final double UNPRICED = 1e-3;

    private Worth() {}

    /** Prices in the order of the lots; where none has one, a kilogram counts 1. */
    static List<Double> prices(List<TrialLot> lots) {
        double sum = 0;
        int priced = 0;
        for (TrialLot lot : lots) {
            double price = lot.plan().market().pricePerKg();
            sum += price;
            priced += price > 0 ? 1 : 0;
        }
        double otherwise = priced == 0 ? 1 : UNPRICED * sum / priced;
        return lots.stream()
                .map(lot -> lot.plan().market().pricePerKg())
                .map(price -> price > 0 ? price : otherwise)
                .toList();
    }
}
