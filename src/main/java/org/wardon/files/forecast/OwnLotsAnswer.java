package org.wardon.files.forecast;

import java.util.List;

/**
 * The keeper's own lots of a commodity.
 *
 * @param commodity its id
 * @param lifePct its life by print and these lots, percent of the published
 * @param atC a temperature, °C
 * @param days days a lot keeps there by ageing alone, by print and these lots
 * @param publishedDays the same by print alone
 * @param lots the lots, by number
 */
public record OwnLotsAnswer(
        String commodity,
        double lifePct,
        double atC,
        Quantiles days,
        Quantiles publishedDays,
        List<Lot> lots) {
    /** Copies the list. */
    public OwnLotsAnswer {
        lots = List.copyOf(lots);
    }

    /**
     * One lot.
     *
     * @param number its number
     * @param lot what the keeper calls it
     * @param variant its variant, empty where nobody said
     * @param endedOn the day it ended, ISO 8601
     * @param ended {@code aged}, {@code ripe}, {@code sold} or {@code spoilt}
     * @param days how long it was followed, days
     * @param meanC its mean temperature, °C
     * @param publishedPct how long it kept, or at least kept, percent of the published life
     * @param note what the keeper wrote
     */
    public record Lot(
            long number,
            String lot,
            String variant,
            String endedOn,
            String ended,
            double days,
            double meanC,
            double publishedPct,
            String note) {}
}
