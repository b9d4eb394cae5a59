package org.wardon.files.readings;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.wardon.errors.BadInput;
import org.wardon.files.json.Faults;
import org.wardon.lots.LotHistory;
import org.wardon.plan.FilledGap;

/**
 * Reads the logged history of a lot: columns {@code time,temperatureC} and, where known, {@code
 * humidityPct}, at any steps. A column {@code temperatureF} may stand instead, in °F.
 */
public final class HistoryCsv {
    private static final Column CELSIUS = new Column("temperatureC", false, -40, 70, "°C");
    private static final Column FAHRENHEIT = new Column("temperatureF", false, -40, 158, "°F");
    private static final Column HUMIDITY = new Column("humidityPct", false, 0, 100, "%");

    private HistoryCsv() {}

    /**
     * Reads a history.
     *
     * @param file the file
     * @param shown its name in messages
     * @param humidityFraction humidity at the fruit where the file gives none, 0 to 1
     * @param ethylenePpm ethylene around the lot, µL/L
     * @return the history and its gaps
     * @throws BadInput with every fault
     */
    public static LoggedHistory read(
            Path file, String shown, double humidityFraction, double ethylenePpm) {
        Faults faults = new Faults(shown);
        Readings readings =
                ReadingsCsv.read(file, shown, List.of(CELSIUS, FAHRENHEIT, HUMIDITY), faults)
                        .orElseGet(
                                () ->
                                        new Readings(
                                                new LongList(),
                                                new LongList(),
                                                java.util.Map.of()));
        faults.refuseIfAny();
        Track temperature = temperature(readings, faults);
        faults.refuseIfAny();
        Track humidity = readings.track(HUMIDITY.name());
        boolean fahrenheit = readings.has(FAHRENHEIT.name());
        double[] rhPct = humidity.size() == 0 ? new double[0] : humidity.valuesAt(temperature.at());
        LotHistory.Builder history = new LotHistory.Builder();
        for (int i = 0; i < temperature.size(); i++) {
            long at = temperature.at().get(i);
            double value = temperature.value().get(i);
            double c = fahrenheit ? celsiusFromFahrenheit(value) : value;
            double rh = rhPct.length == 0 ? humidityFraction : rhPct[i] / 100;
            history.add((double) (at - temperature.at().get(0)), c, c, c, rh, ethylenePpm, false);
        }
        return new LoggedHistory(
                history.build(),
                Readings.local(temperature.at().get(0)),
                humidity.size() > 0,
                gaps(temperature, readings.usualStepS()));
    }

    private static Track temperature(Readings readings, Faults faults) {
        boolean celsius = readings.has(CELSIUS.name());
        boolean fahrenheit = readings.has(FAHRENHEIT.name());
        if (celsius == fahrenheit) {
            faults.add(
                    "line 1",
                    celsius ? "temperatureC and temperatureF both stand there" : "no temperature",
                    "accepted: time,temperatureC or time,temperatureF, and humidityPct where known");
        }
        Track track = readings.track(fahrenheit ? FAHRENHEIT.name() : CELSIUS.name());
        if (celsius != fahrenheit && track.size() < 2) {
            faults.add(
                    "",
                    "there are " + track.size() + " readings of temperature",
                    "accepted: at least 2");
        }
        return track;
    }

    private static List<FilledGap> gaps(Track track, long usualS) {
        List<FilledGap> gaps = new ArrayList<>();
        for (int i = 1; i < track.size(); i++) {
            long a = track.at().get(i - 1);
            long b = track.at().get(i);
            if (b - a > Gaps.LONGEST_S && 2 * (b - a) > 3 * usualS) {
                gaps.add(new FilledGap(Readings.local(a), Readings.local(b), "time"));
            }
        }
        return gaps;
    }

    private static double celsiusFromFahrenheit(double fahrenheit) {
        return (fahrenheit - 32) * 5 / 9;
    }
}
