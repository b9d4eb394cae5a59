package org.wardon.files.forecast;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a chamber will do.
 *
 * @param id its id
 * @param holds whether it holds its setting
 * @param airC its air, °C
 * @param humidityPct its relative humidity, percent
 * @param hoursOutsideBand hours outside the band after pull-down, h
 * @param hoursDisturbed hours within 12 h of a later arrival, h
 * @param pullDownHours from the first arrival until the air has been inside for 3 h; absent where
 *     never
 * @param settingChanges later settings, and how long the air took to come to each
 * @param peakLoadW highest hourly load with the air held ideally, W; hours after a later setting
 *     left out, up to the next arrival, three at least and twelve at most
 * @param removedPeakW highest hourly heat really removed, W
 * @param intakeKgPerDay largest warm intake a day, kg; absent where the chamber can take none to
 *     its setting or has no cooler
 * @param respirationLoadW heat of respiration, W
 * @param o2PctMin lowest oxygen, percent
 * @param loadKWh heat into the chamber by term, kWh
 * @param heatRemovedKWh heat taken by all coolers, kWh; by walls kept wet the heat of what
 *     evaporated outside, which stands in {@code loadKWh.walls} too
 * @param energyKWh electricity, kWh
 * @param energyCost its cost, currency; 0 from a solar supply
 * @param waterUsedKg water evaporated and bled off, kg
 * @param co2PpmMax highest CO2, ppm
 * @param ethylenePpmMax highest ethylene, ppm
 * @param balanceErrorPct error of the balances, percent of the throughput
 * @param coolers what each cooler did, in the order of the plan
 * @param solar panels and battery; absent where a grid feeds the chamber
 * @param doorEnd air of the door end; absent where the air is one, else {@code airC} and {@code
 *     humidityPct} are those of the coil end
 * @param cleanerAir what cleaner air is worth to its lots; absent where ethylene costs none of them
 *     days
 */
public record ChamberForecast(
        String id,
        boolean holds,
        AirC airC,
        MeanMinMax humidityPct,
        double hoursOutsideBand,
        double hoursDisturbed,
        OptionalDouble pullDownHours,
        @JsonInclude(JsonInclude.Include.NON_EMPTY) List<SettingChange> settingChanges,
        double peakLoadW,
        double removedPeakW,
        OptionalDouble intakeKgPerDay,
        MeanMax respirationLoadW,
        double o2PctMin,
        LoadKWh loadKWh,
        double heatRemovedKWh,
        double energyKWh,
        double energyCost,
        double waterUsedKg,
        double co2PpmMax,
        double ethylenePpmMax,
        double balanceErrorPct,
        List<OfCooler> coolers,
        Optional<Solar> solar,
        @JsonInclude(JsonInclude.Include.NON_ABSENT) Optional<DoorEnd> doorEnd,
        @JsonInclude(JsonInclude.Include.NON_ABSENT) Optional<CleanerAir> cleanerAir) {
    /** Copies the lists. */
    public ChamberForecast {
        settingChanges = List.copyOf(settingChanges);
        coolers = List.copyOf(coolers);
    }

    /**
     * A later setting.
     *
     * @param from local time from which it is in force, or of the first arrival if later
     * @param temperatureC set then, °C
     * @param humidityPct wished for then, percent
     * @param reachedAfterHours until the air has been inside its band for 3 h, h; absent where it
     *     is not before the next setting or the end
     */
    public record SettingChange(
            LocalDateTime from,
            double temperatureC,
            double humidityPct,
            OptionalDouble reachedAfterHours) {}

    /**
     * What cleaner air is worth.
     *
     * @param freshAirM3PerHour fresh air it is reckoned with beside the plan's, m3/h
     * @param freshAirCoolingW cooling it asks for at the least, W
     * @param scrubM3PerHour air a scrubber draws beside the plan's, m3/h
     * @param scrubEfficiencyPct share of the ethylene it takes at a pass, percent
     * @param lots what each lot gains that ethylene costs days
     */
    public record CleanerAir(
            double freshAirM3PerHour,
            double freshAirCoolingW,
            double scrubM3PerHour,
            double scrubEfficiencyPct,
            List<OfLot> lots) {
        /** Copies the list. */
        public CleanerAir {
            lots = List.copyOf(lots);
        }

        /**
         * What one lot gains.
         *
         * @param id its id
         * @param freshAirDays days gained by the fresh air, draw by draw
         * @param scrubDays days gained by the scrubber, draw by draw
         */
        public record OfLot(String id, Quantiles freshAirDays, Quantiles scrubDays) {}
    }

    /**
     * What one cooler did.
     *
     * @param kind its kind
     * @param runningHours time it ran, weighted by its share, h
     * @param heatRemovedKWh heat taken, kWh
     * @param energyKWh electricity, kWh
     * @param waterUsedKg water evaporated and bled off, kg
     * @param ice its ice; absent where it works without
     */
    public record OfCooler(
            String kind,
            double runningHours,
            double heatRemovedKWh,
            double energyKWh,
            double waterUsedKg,
            Optional<Ice> ice) {}

    /**
     * What became of the ice of a bank.
     *
     * @param meltedKg ice that melted, kg
     * @param refrozenKg ice that was made, kg
     * @param leftKg ice at the end, kg
     */
    public record Ice(double meltedKg, double refrozenKg, double leftKg) {}

    /**
     * Panels and battery; panel and start are used, lost, spilled or left at the end.
     *
     * @param panelKWh what the panels could give, kWh
     * @param usedKWh what the chamber drew, kWh
     * @param spilledKWh what found the battery full, kWh
     * @param lossesKWh what the battery lost, kWh
     * @param startKWh charge at the start, kWh
     * @param endKWh charge at the end, kWh
     * @param batteryLowPct lowest charge, percent
     * @param hoursWithout hours without power because the battery was empty, h
     * @param firstWithout local time at which it first ran out; absent where it never did
     */
    public record Solar(
            double panelKWh,
            double usedKWh,
            double spilledKWh,
            double lossesKWh,
            double startKWh,
            double endKWh,
            double batteryLowPct,
            double hoursWithout,
            Optional<LocalDateTime> firstWithout) {}

    /**
     * Air of the door end, by hourly means.
     *
     * @param airC temperature, °C
     * @param humidityPct relative humidity, percent
     * @param warmerK how much warmer than the coil end, K; below 0 colder
     */
    public record DoorEnd(MeanMinMax airC, MeanMinMax humidityPct, MeanMinMax warmerK) {}

    /**
     * The chamber's air.
     *
     * @param mean mean, °C
     * @param min lowest at any time, °C
     * @param max highest at any time, °C
     * @param p95 19 of 20 hours are below, °C
     */
    public record AirC(double mean, double min, double max, double p95) {}

    /**
     * A load in two numbers.
     *
     * @param mean its mean, W
     * @param max its highest hour, W
     */
    public record MeanMax(double mean, double max) {}

    /**
     * Heat into the chamber by term, kWh, positive inwards.
     *
     * @param walls through the faces
     * @param door through the open door
     * @param leakage with leaking air
     * @param freshAir with fresh air
     * @param fieldHeat given up by the lots
     * @param respiration of the lots
     * @param fans fans
     * @param lights lights
     * @param people people
     * @param packages given up by packages and structure
     * @param defrost defrost
     * @param humidifier with the water of the humidifier
     * @param heater heater
     * @param pumps pumps
     * @param air given up by the air
     */
    public record LoadKWh(
            double walls,
            double door,
            double leakage,
            double freshAir,
            double fieldHeat,
            double respiration,
            double fans,
            double lights,
            double people,
            double packages,
            double defrost,
            double humidifier,
            double heater,
            double pumps,
            double air) {
        /**
         * Returns the sum of all terms.
         *
         * @return kWh
         */
        public double sum() {
            return walls
                    + door
                    + leakage
                    + freshAir
                    + fieldHeat
                    + respiration
                    + fans
                    + lights
                    + people
                    + packages
                    + defrost
                    + humidifier
                    + heater
                    + pumps
                    + air;
        }
    }
}
