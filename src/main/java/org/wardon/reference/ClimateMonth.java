package org.wardon.reference;

import java.util.OptionalDouble;

/**
 * The mean weather of a place in one month.
 *
 * @param place place
 * @param country country code
 * @param climate climate in words
 * @param latitudeDeg latitude, degrees, north positive
 * @param longitudeDeg longitude, degrees, east positive
 * @param elevationM elevation, m
 * @param month month, 1 to 12
 * @param dailyMaxC mean daily highest, °C
 * @param dailyMinC mean daily lowest, °C
 * @param humidityPct mean relative humidity, percent; empty where not printed
 * @param globalMJm2Day sunshine on a level surface, MJ/(m2 day); empty where not printed
 * @param windMs mean wind, m/s; empty where not printed
 * @param sourceId source
 * @param note the note of the table
 */
public record ClimateMonth(
        String place,
        String country,
        String climate,
        double latitudeDeg,
        double longitudeDeg,
        double elevationM,
        int month,
        double dailyMaxC,
        double dailyMinC,
        OptionalDouble humidityPct,
        OptionalDouble globalMJm2Day,
        OptionalDouble windMs,
        String sourceId,
        String note) {}
