package org.wardon.advice.wording;

import java.util.Locale;

/**
 * The units a person reads.
 *
 * @param fahrenheit whether temperatures are told in °F
 * @param pounds whether masses are told in lb
 */
public record Units(boolean fahrenheit, boolean pounds) {
    /** Celsius and kilograms. */
    public static final Units METRIC = new Units(false, false);

    private static final double KG_PER_LB = 0.45359237;

    /**
     * Returns a temperature.
     *
     * @param temperatureC °C
     * @return with its unit
     */
    public String temperature(double temperatureC) {
        return fahrenheit
                ? format("%.0f °F", 1.8 * temperatureC + 32)
                : format("%.1f °C", temperatureC);
    }

    /**
     * Returns a temperature difference.
     *
     * @param differenceK K
     * @return with its unit
     */
    public String difference(double differenceK) {
        return fahrenheit ? format("%.0f °F", 1.8 * differenceK) : format("%.1f K", differenceK);
    }

    /**
     * Returns a mass.
     *
     * @param massKg kg
     * @return with its unit
     */
    public String mass(double massKg) {
        return pounds ? format("%,.0f lb", massKg / KG_PER_LB) : format("%,.0f kg", massKg);
    }

    /**
     * Returns a figure with its unit as a person reads it.
     *
     * @param value the figure
     * @param unit one of the units of a reason's argument
     * @return text
     */
    public String figure(double value, String unit) {
        return switch (unit) {
            case "C" -> temperature(value);
            case "K" -> difference(value);
            case "kg" -> mass(value);
            case "day" -> days(value);
            case "h" -> format(Math.abs(value) < 10 ? "%.1f h" : "%.0f h", value);
            case "pct" -> format(Math.abs(value) < 10 ? "%.1f %%" : "%.0f %%", value);
            case "W" -> value >= 1000 ? format("%.1f kW", value / 1000) : format("%.0f W", value);
            case "ppm" -> format(value < 10 ? "%.2f ppm" : "%,.0f ppm", value);
            default -> format(value == Math.rint(value) ? "%.0f" : "%.1f", value);
        };
    }

    private static String days(double days) {
        String text = format(Math.abs(days) < 10 ? "%.1f" : "%.0f", days);
        return text + ("1.0".equals(text) ? " day" : " days");
    }

    private static String format(String pattern, double value) {
        return String.format(Locale.ROOT, pattern, value).replace(',', ' ');
    }
}
