package org.wardon.air.normals;

import java.time.Month;
import java.time.YearMonth;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.wardon.air.DailyRadiation;
import org.wardon.air.YearWave;
import org.wardon.errors.Require;

/**
 * The normals of a place, twelve each, January first.
 *
 * @param dailyMaxC mean daily highest air temperature, °C
 * @param dailyMinC mean daily lowest air temperature, °C, nowhere above the highest
 * @param humidityPct mean relative humidity over water, percent, above 0
 * @param globalKWhM2Day mean daily global radiation on the level, kWh/(m2 day); absent where not
 *     known
 */
public record MonthlyNormals(
        List<Double> dailyMaxC,
        List<Double> dailyMinC,
        List<Double> humidityPct,
        Optional<List<Double>> globalKWhM2Day) {
    /** Months of a year. */
    public static final int MONTHS = 12;

    /** Share of the radiation above the air beyond which no month's mean lies (assumption). */
    public static final double CLEAREST_MONTH = 0.82;

    /** Radiation of twilight that a month without sun may be given, kWh/(m2 day) (assumption). */
    public static final double TWILIGHT_KWH_M2 = 0.05;

    private static final double MJ_PER_KWH = 3.6;

    /** Copies the lists and checks the bounds. */
    public MonthlyNormals {
        dailyMaxC = twelve("dailyMaxC", dailyMaxC, -55, 50, "°C");
        dailyMinC = twelve("dailyMinC", dailyMinC, -55, 50, "°C");
        humidityPct = twelve("humidityPct", humidityPct, 1, 100, "%");
        globalKWhM2Day =
                globalKWhM2Day.map(list -> twelve("globalKWhM2Day", list, 0, 15, "kWh/m2"));
        for (int m = 0; m < MONTHS; m++) {
            Require.that(
                    dailyMaxC.get(m) >= dailyMinC.get(m),
                    "dailyMaxC of month "
                            + (m + 1)
                            + " is "
                            + dailyMaxC.get(m)
                            + ", below its dailyMinC of "
                            + dailyMinC.get(m));
        }
    }

    private static List<Double> twelve(
            String name, List<Double> values, double low, double high, String unit) {
        Require.that(
                values.size() == MONTHS, name + " needs twelve values, found " + values.size());
        for (int m = 0; m < MONTHS; m++) {
            String which = String.format(Locale.ROOT, "weather.normals.%s[%d]", name, m);
            Require.within(which, values.get(m), low, high, unit, "");
        }
        return List.copyOf(values);
    }

    /**
     * Returns the mean daily span of temperature of a month.
     *
     * @param month 0 to 11
     * @return K, 0 or more
     */
    public double rangeK(int month) {
        return dailyMaxC.get(month) - dailyMinC.get(month);
    }

    /**
     * Returns the mean temperature of a month, half way between its extremes.
     *
     * @param month 0 to 11
     * @return °C
     */
    public double middleC(int month) {
        return 0.5 * (dailyMaxC.get(month) + dailyMinC.get(month));
    }

    /**
     * Returns the course of the year.
     *
     * @return mean and first harmonic of the months' means
     */
    public YearWave year() {
        return YearWave.ofMonths(IntStream.range(0, MONTHS).mapToObj(this::middleC).toList());
    }

    /**
     * Returns the mean daily radiation that reaches the air above a place in a month.
     *
     * @param month 0 to 11
     * @param latitudeDeg latitude, degrees
     * @return kWh/(m2 day), 0 in the polar night
     */
    public static double aboveTheAirKWhM2(int month, double latitudeDeg) {
        YearMonth days = YearMonth.of(2001, Month.of(month + 1));
        double sum = 0;
        for (int d = 1; d <= days.lengthOfMonth(); d++) {
            sum += DailyRadiation.extraterrestrialMJ(days.atDay(d).getDayOfYear(), latitudeDeg);
        }
        return sum / days.lengthOfMonth() / MJ_PER_KWH;
    }

    /**
     * Returns the highest mean daily radiation a month can have at a place.
     *
     * @param month 0 to 11
     * @param latitudeDeg latitude, degrees
     * @return kWh/(m2 day)
     */
    public static double mostKWhM2(int month, double latitudeDeg) {
        return CLEAREST_MONTH * aboveTheAirKWhM2(month, latitudeDeg) + TWILIGHT_KWH_M2;
    }
}
