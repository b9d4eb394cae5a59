package org.wardon.files.forecast;

import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What becomes of a lot.
 *
 * @param id its id
 * @param chamber the chamber it stands in; absent where no place was found
 * @param valueKept value at the end of the market leg, currency
 * @param coolHalfHours time until half cooled, h; absent where not reached
 * @param coolSevenEighthsHours time until seven eighths cooled, h; absent where not reached
 * @param temperatureC its mean temperature, °C
 * @param respirationKWh heat of its respiration in the chamber, kWh
 * @param weightLossPct loss of mass, percent
 * @param weightLossValue what that loss costs until it leaves, currency
 * @param lifeUsedPct life used at the horizon's end, percent; may pass 100
 * @param restsOn what the life rests on
 * @param greenLeft days until ripening can no longer be held; absent unless it ripens
 * @param edibleLeft days until overripe; absent unless it ripens
 * @param ripeFrom days until ripe; absent where no times of ripening are printed
 * @param ripeOn whether it is ripe on the day it is wanted ripe; absent where nobody asked or
 *     nothing is known
 * @param daysLeft days left
 * @param hangsOn what its range hangs on most; absent where nothing stands out
 * @param daysLeftWithout days left without the chamber
 * @param daysGained the difference, draw by draw
 * @param limitedBy the mechanism that ends it first
 * @param chillingRisk risk of chilling injury
 * @param leaveBy local time it should leave by
 */
public record LotForecast(
        String id,
        Optional<String> chamber,
        double valueKept,
        OptionalDouble coolHalfHours,
        OptionalDouble coolSevenEighthsHours,
        TemperatureC temperatureC,
        double respirationKWh,
        double weightLossPct,
        double weightLossValue,
        double lifeUsedPct,
        String restsOn,
        Optional<Quantiles> greenLeft,
        Optional<Quantiles> edibleLeft,
        Optional<Quantiles> ripeFrom,
        Optional<RipeOn> ripeOn,
        Quantiles daysLeft,
        Optional<HangsOn> hangsOn,
        Quantiles daysLeftWithout,
        Quantiles daysGained,
        String limitedBy,
        ChillingRisk chillingRisk,
        LocalDateTime leaveBy) {
    /**
     * The lot's mean temperature.
     *
     * @param mean mean over its stay, °C
     * @param min lowest, °C
     * @param max highest, °C
     * @param atEnd when it leaves or the run ends, °C
     */
    public record TemperatureC(double mean, double min, double max, double atEnd) {}
}
