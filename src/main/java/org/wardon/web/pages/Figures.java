package org.wardon.web.pages;

import java.math.BigDecimal;
import java.math.MathContext;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import org.wardon.advice.wording.Units;

/** Writes numbers as a person likes to read them, and reads them as they like to write them. */
public final class Figures {
    private static final MathContext TYPED = new MathContext(6);
    private static final MathContext FOUR = new MathContext(4);

    /** Digits of a number that was typed in another unit and is kept in the plan's. */
    public static final MathContext KEPT = new MathContext(9);

    private static final Pattern POINT_BETWEEN_DIGITS = Pattern.compile("(?<=\\d)\\.(?=\\d)");
    private static final Pattern NUMBER = Pattern.compile("[-−+]?\\d{1,12}(\\.\\d{0,12})?");
    private static final DateTimeFormatter DAY =
            DateTimeFormatter.ofPattern("EEE d MMM", Locale.UK);
    private static final DateTimeFormatter SHORT_DAY =
            DateTimeFormatter.ofPattern("d MMM", Locale.UK);
    private static final DateTimeFormatter DAY_AND_TIME =
            DateTimeFormatter.ofPattern("EEE d MMM HH:mm", Locale.UK);

    private final Preferences preferences;
    private final Units units;

    /**
     * Writes and reads in these preferences.
     *
     * @param preferences a person's preferences
     */
    public Figures(Preferences preferences) {
        this.preferences = preferences;
        this.units = preferences.units();
    }

    /**
     * Returns a text with its decimal marks as preferred.
     *
     * @param text text with decimal points
     * @return the same with points or commas
     */
    public String text(String text) {
        return preferences.decimalComma()
                ? POINT_BETWEEN_DIGITS.matcher(text).replaceAll(",")
                : text;
    }

    /**
     * Returns a temperature.
     *
     * @param temperatureC °C
     * @return with its unit
     */
    public String temperature(double temperatureC) {
        return text(units.temperature(temperatureC));
    }

    /**
     * Returns a mass.
     *
     * @param massKg kg
     * @return with its unit
     */
    public String mass(double massKg) {
        return text(units.mass(massKg));
    }

    /**
     * Returns a figure with its unit.
     *
     * @param value the figure
     * @param unit a unit of {@link Units#figure}
     * @return with its unit
     */
    public String figure(double value, String unit) {
        return text(units.figure(value, unit));
    }

    /**
     * Returns a day.
     *
     * @param day the day
     * @return such as "Mon 2 Mar"
     */
    public String day(LocalDate day) {
        return DAY.format(day);
    }

    /**
     * Returns a day in few letters.
     *
     * @param day the day
     * @return such as "2 Mar"
     */
    public String shortDay(LocalDate day) {
        return SHORT_DAY.format(day);
    }

    /**
     * Returns a time.
     *
     * @param time local time
     * @return such as "Mon 2 Mar 15:00"
     */
    public String time(LocalDateTime time) {
        return DAY_AND_TIME.format(time);
    }

    /**
     * Returns the unit of temperatures.
     *
     * @return "°C" or "°F"
     */
    public String temperatureUnit() {
        return preferences.fahrenheit() ? "°F" : "°C";
    }

    /**
     * Returns the unit of masses.
     *
     * @return "kg" or "lb"
     */
    public String massUnit() {
        return preferences.pounds() ? "lb" : "kg";
    }

    /**
     * Returns a temperature as it stands in a field, without its unit.
     *
     * @param temperatureC °C
     * @return up to six digits
     */
    public String typedTemperature(double temperatureC) {
        return typed(shownTemperature(temperatureC));
    }

    /**
     * Returns a temperature as a number of the preferred unit.
     *
     * @param temperatureC °C
     * @return °C or °F
     */
    public double shownTemperature(double temperatureC) {
        return units.shown(temperatureC);
    }

    /**
     * Returns the price of the preferred unit of mass, as it stands in a field.
     *
     * @param pricePerKg currency/kg
     * @return up to six digits of the price of a kg; of a lb as few as {@link #typedTurned} gives
     */
    public String typedPrice(double pricePerKg) {
        return preferences.pounds() ? typedTurned(pricePerKg, Units.KG_PER_LB) : typed(pricePerKg);
    }

    /**
     * Returns a number turned into another unit, as it stands in a field: the number somebody typed
     * where what is kept came of it, else four digits, from 1000 on to the whole.
     *
     * @param kept the number in the unit it is kept in
     * @param factor what makes the shown number of it, above 0
     * @return the number in the other unit
     */
    public String typedTurned(double kept, double factor) {
        BigDecimal shown = BigDecimal.valueOf(kept * factor);
        BigDecimal same = BigDecimal.valueOf(kept).round(KEPT);
        for (int digits = 1; digits <= TYPED.getPrecision(); digits++) {
            BigDecimal few = shown.round(new MathContext(digits));
            if (BigDecimal.valueOf(few.doubleValue() / factor).round(KEPT).compareTo(same) == 0) {
                return typed(few.doubleValue());
            }
        }
        BigDecimal four = shown.round(FOUR);
        return typed(
                (four.scale() < 0 ? shown.setScale(0, FOUR.getRoundingMode()) : four)
                        .doubleValue());
    }

    /**
     * Returns a number as it stands in a field.
     *
     * @param value the number
     * @return up to six digits
     */
    public String typed(double value) {
        BigDecimal rounded = BigDecimal.valueOf(value).round(TYPED);
        return text(rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString());
    }

    /**
     * Reads a number as it was typed. Where the decimal mark is a comma a point is understood too;
     * where it is a point a comma is not, as it may stand between thousands.
     *
     * @param typed what was typed; spaces do not count
     * @return the number, empty where it is none
     */
    public OptionalDouble number(String typed) {
        String plain = typed.strip().replaceAll("[ \u00a0\u202f]", "");
        if (preferences.decimalComma() && plain.indexOf('.') < 0) {
            plain = plain.replaceFirst(",", ".");
        }
        return NUMBER.matcher(plain).matches()
                ? OptionalDouble.of(Double.parseDouble(plain.replace('−', '-')))
                : OptionalDouble.empty();
    }

    /**
     * Reads a temperature as it was typed.
     *
     * @param typed a number of the preferred unit
     * @return °C, empty where it is no number
     */
    public OptionalDouble temperatureC(String typed) {
        OptionalDouble number = number(typed);
        return number.isPresent() && preferences.fahrenheit()
                ? OptionalDouble.of((number.getAsDouble() - 32) / 1.8)
                : number;
    }

    /**
     * Reads a mass as it was typed.
     *
     * @param typed a number of the preferred unit
     * @return kg, empty where it is no number
     */
    public OptionalDouble massKg(String typed) {
        OptionalDouble number = number(typed);
        return number.isPresent() && preferences.pounds()
                ? OptionalDouble.of(number.getAsDouble() * Units.KG_PER_LB)
                : number;
    }

    /**
     * Reads a price as it was typed.
     *
     * @param typed a number a preferred unit of mass
     * @return currency/kg, empty where it is no number
     */
    public OptionalDouble pricePerKg(String typed) {
        OptionalDouble number = number(typed);
        return number.isPresent() && preferences.pounds()
                ? OptionalDouble.of(number.getAsDouble() / Units.KG_PER_LB)
                : number;
    }
}
