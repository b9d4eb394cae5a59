package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * Money of a plan.
 *
 * @param currency name of the currency, empty where not said
 * @param energyPerKWh price of electricity, currency/kWh
 */
public record Prices(String currency, double energyPerKWh) {
    /** Checks the bounds. */
    public Prices {
        Require.that(currency.length() <= 20, "currency must be at most 20 characters");
        Require.within("energyPricePerKWh", energyPerKWh, 0, 1e6, "1/kWh", "");
    }
}
