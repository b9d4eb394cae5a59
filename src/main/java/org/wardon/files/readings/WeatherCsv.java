package org.wardon.files.readings;

import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.wardon.air.Weather;
import org.wardon.errors.BadInput;
import org.wardon.files.TextFile;
import org.wardon.files.json.Faults;
import org.wardon.plan.FilledGap;
import org.wardon.plan.WeatherSource;

/**
 * Reads weather: columns {@code time,temperatureC,humidityPct} and, where known, {@code
 * globalWm2,windMs}, at any step of up to three hours, even or not.
 */
public final class WeatherCsv {
    /** Largest file read, MB. */
    public static final int LARGEST_MB = ReadingsCsv.LARGEST_MB;

    private static final Column TEMPERATURE = new Column("temperatureC", true, -60, 60, "°C");
    private static final Column HUMIDITY = new Column("humidityPct", true, 0, 100, "%");
    // A sensor shows a little below zero at night; that is darkness.
    private static final Column GLOBAL = new Column("globalWm2", false, -20, 1_500, "W/m2");
    private static final Column WIND = new Column("windMs", false, 0, 80, "m/s");
    private static final List<Column> COLUMNS = List.of(TEMPERATURE, HUMIDITY, GLOBAL, WIND);
    private static final int HOUR_S = 3_600;

    private WeatherCsv() {}

    /**
     * Reads the weather of a run.
     *
     * @param file the file
     * @param shown its name in messages
     * @param name its name as the plan gives it
     * @param from local time the run starts
     * @param days how long it is, days
     * @return hourly weather from {@code from} to the end, and the gaps that were filled
     * @throws BadInput with every fault: a gap is refused above three hours, so is a file that does
     *     not cover the run
     */
    public static WeatherSource.Csv read(
            Path file, String shown, String name, LocalDateTime from, double days) {
        return read(TextFile.read(file, shown, LARGEST_MB), shown, name, from, days);
    }

    /**
     * Reads the weather of a run from a text.
     *
     * @param text text of the file
     * @param shown its name in messages
     * @param name its name as the plan gives it
     * @param from local time the run starts
     * @param days how long it is, days
     * @return hourly weather from {@code from} to the end, and the gaps that were filled
     * @throws BadInput with every fault, as for a file
     */
    public static WeatherSource.Csv read(
            String text, String shown, String name, LocalDateTime from, double days) {
        Faults faults = new Faults(shown);
        Optional<Readings> readings = ReadingsCsv.read(text, COLUMNS, faults);
        faults.refuseIfAny();
        Readings all = readings.orElseThrow();
        int hours = (int) Math.ceil(days * 24 - 1e-9);
        long fromS = Readings.seconds(from);
        LimitedFaults limited = new LimitedFaults(faults);
        List<String> given =
                COLUMNS.stream().map(Column::name).filter(column -> known(all, column)).toList();
        List<FilledGap> filled =
                new Gaps(all, fromS, fromS + (long) hours * HOUR_S, limited).find(given);
        limited.close();
        faults.refuseIfAny();
        return new WeatherSource.Csv(name, weather(all, fromS, hours), filled);
    }

    private static boolean known(Readings readings, String column) {
        return readings.track(column).size() > 0
                || column.equals(TEMPERATURE.name())
                || column.equals(HUMIDITY.name());
    }

    private static Weather weather(Readings readings, long fromS, int hours) {
        double[] global = hourly(readings, GLOBAL, fromS, hours);
        for (int i = 0; i < global.length; i++) {
            global[i] = global[i] < 0 ? 0 : global[i];
        }
        return new Weather(
                hourly(readings, TEMPERATURE, fromS, hours),
                hourly(readings, HUMIDITY, fromS, hours),
                global,
                hourly(readings, WIND, fromS, hours));
    }

    private static double[] hourly(Readings readings, Column column, long fromS, int hours) {
        if (!known(readings, column.name())) {
            double[] unknown = new double[hours + 1];
            Arrays.fill(unknown, Double.NaN);
            return unknown;
        }
        return readings.track(column.name()).even(fromS, HOUR_S, hours + 1);
    }
}
