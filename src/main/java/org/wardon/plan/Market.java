package org.wardon.plan;

import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * What comes after the chamber.
 *
 * @param days from leaving to the buyer, days
 * @param temperatureC on the way and at the market, °C; absent: as without the chamber
 * @param purpose what a ripening lot is kept for, where the plan says
 * @param pricePerKg value of a sound kilogram, currency/kg
 * @param ripeOn day on which a ripening lot is wanted ripe, where the plan says
 */
public record Market(
        double days,
        OptionalDouble temperatureC,
        Optional<Purpose> purpose,
        double pricePerKg,
        Optional<LocalDate> ripeOn) {
    /** Checks the bounds. */
    public Market {
        Require.within("marketDays", days, 0, 60, "day", "");
        if (temperatureC.isPresent()) {
            Require.within("marketC", temperatureC.getAsDouble(), -5, 55, "°C", "");
        }
        Require.within("pricePerKg", pricePerKg, 0, 1e6, "1/kg", "");
    }
}
