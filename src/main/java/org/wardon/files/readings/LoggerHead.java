package org.wardon.files.readings;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.regex.Pattern;
import org.wardon.files.json.Json;

/**
 * The line of names of a logger's file, whatever the logger calls them.
 *
 * @param separator what stands between cells
 * @param lineNumber line it stands on, from 1
 * @param cells number of cells
 * @param date column of the date, or of date and time together
 * @param clock column of the time of day, where it stands apart
 * @param temperature column of the temperature
 * @param fahrenheit whether that is in °F
 * @param humidity column of the humidity, where there is one
 * @param unused names of the columns not used
 */
record LoggerHead(
        char separator,
        int lineNumber,
        int cells,
        int date,
        OptionalInt clock,
        int temperature,
        boolean fahrenheit,
        OptionalInt humidity,
        List<String> unused) {
    static final String ACCEPTED =
            "accepted: time,temperatureC or time,temperatureF, and humidityPct where known";

    /** Lines before the names in which a logger tells its serial number and the like. */
    private static final int MOST_LINES_BEFORE = 40;

    private static final Pattern TIME =
            Pattern.compile(
                    ".*\\b(time|timestamp|date|datetime|hour|zeit|datum|uhrzeit|fecha|hora|heure"
                            + "|data|tijd)\\b.*");
    private static final Pattern DATE = Pattern.compile(".*\\b(date|datum|fecha|data)\\b.*");
    private static final Pattern CLOCK =
            Pattern.compile("(time|hour|zeit|uhrzeit|hora|heure|tijd)\\b.*");
    private static final Pattern TEMPERATURE = Pattern.compile(".*(temp|celsius|fahrenheit|°).*");
    private static final Pattern FAHRENHEIT =
            Pattern.compile(".*(fahrenheit|°\\s*f\\b|\\bf\\b|\\(f\\)|\\bdegf\\b).*|temperaturef");
    private static final Pattern CELSIUS =
            Pattern.compile(".*(celsius|°\\s*c\\b|\\bc\\b|\\(c\\)|\\bdegc\\b).*|temperaturec");
    private static final Pattern HUMIDITY = Pattern.compile(".*(humid|\\brh\\b|feuchte|humed).*");
    private static final Pattern NOT_ASKED = Pattern.compile(".*(dew|wet.?bulb|taupunkt).*");

    private static final String STAMP = "time";

    /** Finds the line of names, or tells what is wrong with it. */
    static Optional<LoggerHead> find(String text, LimitedFaults faults) {
        int number = 0;
        for (String line : (Iterable<String>) text.lines().limit(MOST_LINES_BEFORE)::iterator) {
            number++;
            char separator = separator(line);
            List<String> names = names(line, separator);
            boolean timed = names.stream().anyMatch(name -> TIME.matcher(name).matches());
            boolean read =
                    names.stream()
                            .anyMatch(
                                    name ->
                                            TEMPERATURE.matcher(name).matches()
                                                    || HUMIDITY.matcher(name).matches());
            if (names.size() > 1 && timed && read) {
                return of(names, separator, number, faults);
            }
        }
        faults.add("line 1", "no line names a time and a temperature", ACCEPTED);
        return Optional.empty();
    }

    static char separator(String line) {
        return line.indexOf('\t') >= 0 ? '\t' : line.indexOf(';') >= 0 ? ';' : ',';
    }

    private static List<String> names(String line, char separator) {
        List<String> names = new ArrayList<>();
        // A separator inside quotes is part of a name.
        String outside = separator + "(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)";
        for (String cell : line.split(outside, -1)) {
            names.add(cell.strip().replaceAll("^\"|\"$", "").toLowerCase(Locale.ROOT));
        }
        return names;
    }

    private static Optional<LoggerHead> of(
            List<String> names, char separator, int line, LimitedFaults faults) {
        List<Integer> warm = new ArrayList<>();
        OptionalInt date = OptionalInt.empty();
        OptionalInt clock = OptionalInt.empty();
        OptionalInt humidity = OptionalInt.empty();
        List<String> unused = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            if (NOT_ASKED.matcher(name).matches()) {
                unused.add(name);
            } else if (TEMPERATURE.matcher(name).matches()) {
                warm.add(i);
            } else if (HUMIDITY.matcher(name).matches() && humidity.isEmpty()) {
                humidity = OptionalInt.of(i);
            } else if (TIME.matcher(name).matches() && date.isEmpty()) {
                date = OptionalInt.of(i);
            } else if (clock.isEmpty() && CLOCK.matcher(name).matches() && apart(names, date)) {
                clock = OptionalInt.of(i);
            } else if (!name.isEmpty()) {
                unused.add(name);
            }
        }
        if (warm.isEmpty() || date.isEmpty()) {
            faults.add("line " + line, warm.isEmpty() ? "no temperature" : "no time", ACCEPTED);
            return Optional.empty();
        }
        if (!single(names, warm, line, faults)) {
            return Optional.empty();
        }
        String name = names.get(warm.get(0));
        boolean fahrenheit = FAHRENHEIT.matcher(name).matches();
        if (!fahrenheit && !CELSIUS.matcher(name).matches()) {
            faults.add(
                    "line " + line + ", column " + name,
                    "it says neither °C nor °F",
                    "accepted: a name such as temperatureC, temperatureF or Temp (°C)");
            return Optional.empty();
        }
        return Optional.of(
                new LoggerHead(
                        separator,
                        line,
                        names.size(),
                        date.getAsInt(),
                        clock,
                        warm.get(0),
                        fahrenheit,
                        humidity,
                        List.copyOf(unused)));
    }

    private static boolean apart(List<String> names, OptionalInt date) {
        return date.isPresent()
                && DATE.matcher(names.get(date.getAsInt())).matches()
                && !names.get(date.getAsInt()).contains(STAMP);
    }

    private static boolean single(
            List<String> names, List<Integer> warm, int line, LimitedFaults faults) {
        if (warm.size() == 1) {
            return true;
        }
        List<String> both = warm.stream().map(names::get).toList();
        boolean ours = both.equals(List.of("temperaturec", "temperaturef"));
        faults.add(
                "line " + line,
                ours
                        ? "temperatureC and temperatureF both stand there"
                        : "several columns are temperatures: "
                                + String.join(", ", both.stream().map(Json::quoted).toList()),
                ours ? ACCEPTED : "accepted: one; keep that of the probe in the produce");
        return false;
    }
}
