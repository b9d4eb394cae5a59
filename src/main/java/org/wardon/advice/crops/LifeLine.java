package org.wardon.advice.crops;

import java.util.List;
import java.util.OptionalDouble;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.rows.LifeRow;

/**
 * Life over temperature.
 *
 * @param humidityPct humidity it is reckoned at, percent
 * @param freezingC below it the crop freezes, °C
 * @param at figures by rising temperature
 * @param printed every published life with a temperature, as it stands in the table, own ones first
 * @param restsOn what the line rests on, a code
 */
public record LifeLine(
        double humidityPct, double freezingC, List<At> at, List<LifeRow> printed, String restsOn) {
    /**
     * The figures at one temperature.
     *
     * @param temperatureC temperature of lot and air, °C
     * @param days days left of a fresh lot kept there
     * @param limitedBy what ends it, a code
     * @param safeDays days until the first lots are injured by cold; empty where none are
     */
    public record At(
            double temperatureC, Quantiles days, String limitedBy, OptionalDouble safeDays) {}

    /** Copies the lists. */
    public LifeLine {
        at = List.copyOf(at);
        printed = List.copyOf(printed);
    }
}
