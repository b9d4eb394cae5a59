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

    /** A pound, kg. Source: international yard and pound agreement of 1959, exact by definition. */
    public static final double KG_PER_LB = 0.45359237;

    private static final double G_M2_PER_OZ_FT2 = 305.15;
    private static final double M3_H_PER_FT3_MIN = 1.699;
    private static final double M_PER_FT = 0.3048;

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
     * Returns a temperature as a number of the unit in use, for scales.
     *
     * @param temperatureC °C
     * @return °C or °F
     */
    public double shown(double temperatureC) {
        return fahrenheit ? 1.8 * temperatureC + 32 : temperatureC;
    }

    /**
     * Returns a temperature without its unit, for tables and pictures that name it once.
     *
     * @param temperatureC °C
     * @return such as "9.8", or "50" in °F
     */
    public String degrees(double temperatureC) {
        String text = format(fahrenheit ? "%.0f" : "%.1f", shown(temperatureC));
        return text.equals("-0.0") || text.equals("-0") ? text.substring(1) : text;
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
            case "per kg" ->
                    pounds
                            ? format("%.2f a pound", value * KG_PER_LB)
                            : format("%.2f a kilogram", value);
            case "g/m2" ->
                    pounds
                            ? format("%.2f oz/ft2", value / G_M2_PER_OZ_FT2)
                            : format("%.0f g/m2", value);
            case "m3/h" ->
                    pounds
                            ? format("%,.0f ft3/min", value / M3_H_PER_FT3_MIN)
                            : format("%,.0f m3/h", value);
            case "day" -> days(value);
            case "m" -> pounds ? format("%.1f ft", value / M_PER_FT) : format("%.2f m", value);
            case "h" -> brief(value) + " h";
            case "pct" -> brief(value) + " %";
            case "W" -> value >= 1000 ? format("%.1f kW", value / 1000) : format("%.0f W", value);
            case "kWh" -> brief(value) + " kWh";
            case "ppm" -> format(value != 0 && value < 10 ? "%.2f ppm" : "%,.0f ppm", value);
            case "1" -> format(value == Math.rint(value) ? "%.0f" : "%.2f", value);
            default -> throw new IllegalArgumentException("no words for the unit '" + unit + "'");
        };
    }

    /** Returns a number with one decimal below 10 where it has one, none from there on. */
    static String brief(double value) {
        String text = format(Math.abs(value) < 9.95 ? "%.1f" : "%.0f", value);
        String whole = text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
        return "-0".equals(whole) ? "0" : whole;
    }

    private static String days(double days) {
        String text = brief(days);
        return text + ("1".equals(text) ? " day" : " days");
    }

    private static String format(String pattern, double value) {
        return String.format(Locale.ROOT, pattern, value).replace(',', ' ');
    }
}
