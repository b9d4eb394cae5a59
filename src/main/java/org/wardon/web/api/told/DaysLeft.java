package org.wardon.web.api.told;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.Quantiles;

/**
 * Days left of every lot, out of the forecast.
 *
 * @param lots the lots, in the order of the plan
 */
public record DaysLeft(List<OfLot> lots) {
    /** Copies the list. */
    public DaysLeft {
        lots = List.copyOf(lots);
    }

    /**
     * Returns the days left of a forecast.
     *
     * @param forecast the forecast
     * @return its lots
     */
    public static DaysLeft of(Forecast forecast) {
        return new DaysLeft(
                forecast.lots().stream()
                        .map(
                                lot ->
                                        new OfLot(
                                                lot.id(),
                                                lot.chamber(),
                                                lot.daysLeft(),
                                                lot.daysGained(),
                                                lot.limitedBy(),
                                                lot.leaveBy()))
                        .toList());
    }

    /**
     * A lot.
     *
     * @param id its id
     * @param chamber where it ends
     * @param daysLeft days left
     * @param daysGained days it gains against doing without the chamber
     * @param limitedBy what ends it first
     * @param leaveBy when it has to leave for its market, local time
     */
    public record OfLot(
            String id,
            Optional<String> chamber,
            Quantiles daysLeft,
            Quantiles daysGained,
            String limitedBy,
            LocalDateTime leaveBy) {}
}
