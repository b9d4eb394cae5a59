package org.wardon.advice.crops;

import java.util.List;
import org.wardon.produce.Reason;
import org.wardon.produce.rows.RespirationRow;

/**
 * Heat of respiration over temperature.
 *
 * @param at the range by rising temperature
 * @param printed every published rate
 * @param reasons what the range rests on
 */
public record BreathLine(List<At> at, List<Printed> printed, List<Reason> reasons) {
    /**
     * The range at one temperature.
     *
     * @param temperatureC temperature of the produce, °C
     * @param low low end, W per tonne
     * @param middle middle of the range in the logarithm, W per tonne
     * @param high high end, W per tonne
     */
    public record At(double temperatureC, double low, double middle, double high) {}

    /**
     * A published rate.
     *
     * @param row as it stands in its table
     * @param taken whether the range goes through it
     */
    public record Printed(RespirationRow row, boolean taken) {}

    /** Copies the lists. */
    public BreathLine {
        at = List.copyOf(at);
        printed = List.copyOf(printed);
        reasons = List.copyOf(reasons);
    }
}
