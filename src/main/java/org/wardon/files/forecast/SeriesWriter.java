package org.wardon.files.forecast;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.errors.Require;
import org.wardon.files.AtomicFile;

/**
 * Writes hourly series as CSV with fixed columns: {@code chamber-ID.csv} and {@code lot-ID.csv}.
 * Air and powers are means of the hour before, all else is at the hour. A value that is not a
 * number is an empty cell.
 */
public final class SeriesWriter {
    /** Columns of a chamber after {@code time}; {@link #OPTIONAL} may follow. */
    public static final List<String> CHAMBER =
            List.of(
                    "airC",
                    "humidityPct",
                    "outdoorC",
                    "coolingW",
                    "powerW",
                    "co2Ppm",
                    "ethylenePpm");

    /** Columns of a lot after {@code time}. */
    public static final List<String> LOT =
            List.of("meanC", "surfaceC", "coreC", "respirationW", "massKg", "lifeUsedPct");

    /**
     * Columns of a chamber that has them: air of the door end where it is two, water leaving a
     * film, water used in the hour before, ice left, power of panels, charge of a battery. After
     * them may come the share of the hour before that each cooler ran, {@link #running}.
     */
    public static final List<String> OPTIONAL =
            List.of(
                    "doorEndC",
                    "doorEndHumidityPct",
                    "waterOutC",
                    "waterUsedKg",
                    "iceKg",
                    "panelW",
                    "batteryPct");

    private final Path folder;
    private final Timeline timeline;

    /**
     * Makes the folder where it does not exist.
     *
     * @param folder where the files go
     * @param timeline clock of the run
     * @throws org.wardon.files.CannotWrite where the folder cannot be made
     */
    public SeriesWriter(Path folder, Timeline timeline) {
        this.folder = AtomicFile.folder(folder);
        this.timeline = timeline;
    }

    /**
     * Writes the series of a chamber.
     *
     * @param id its id
     * @param timeS {@code [row]}, s since the start of the run
     * @param columns the values by row, one for each name of {@link #CHAMBER}, and those of {@link
     *     #OPTIONAL} and {@link #running} that it has
     */
    public void chamber(String id, double[] timeS, Map<String, IntToDoubleFunction> columns) {
        List<String> names = new ArrayList<>(CHAMBER);
        OPTIONAL.stream().filter(columns::containsKey).forEach(names::add);
        for (int i = 0; columns.containsKey(running(i)); i++) {
            names.add(running(i));
        }
        write("chamber-" + id + ".csv", names, timeS, columns);
    }

    /**
     * Writes the series of a chamber.
     *
     * @param series a column for each name of {@link #CHAMBER}, those of {@link #OPTIONAL} and
     *     {@link #running} that it has; others are not written
     */
    public void chamber(HourlySeries series) {
        Map<String, IntToDoubleFunction> columns = columns(series);
        columns.keySet()
                .removeIf(
                        name ->
                                !CHAMBER.contains(name)
                                        && !OPTIONAL.contains(name)
                                        && !name.startsWith("running"));
        chamber(series.of(), times(series), columns);
    }

    /**
     * Writes the series of a lot.
     *
     * @param series a column for each name of {@link #LOT}
     */
    public void lot(HourlySeries series) {
        lot(series.of(), times(series), columns(series));
    }

    private static double[] times(HourlySeries series) {
        return series.timeS().stream().mapToDouble(Double::doubleValue).toArray();
    }

    private static Map<String, IntToDoubleFunction> columns(HourlySeries series) {
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        series.columns().forEach(one -> columns.put(one.name(), one.values()::get));
        return columns;
    }

    /**
     * Returns the name of the column that says how much a cooler ran.
     *
     * @param cooler its number in the plan, from 0
     * @return such as {@code running1Pct} for the first
     */
    public static String running(int cooler) {
        return "running" + (cooler + 1) + "Pct";
    }

    /**
     * Writes the series of a lot.
     *
     * @param id its id
     * @param timeS {@code [row]}, s since the start of the run
     * @param columns the values by row, one for each name of {@link #LOT}
     */
    public void lot(String id, double[] timeS, Map<String, IntToDoubleFunction> columns) {
        write("lot-" + id + ".csv", LOT, timeS, columns);
    }

    private void write(
            String name,
            List<String> names,
            double[] timeS,
            Map<String, IntToDoubleFunction> columns) {
        Require.that(
                columns.size() == names.size() && columns.keySet().containsAll(names),
                name + " needs the columns " + names + ", found " + columns.keySet());
        List<IntToDoubleFunction> values = names.stream().map(columns::get).toList();
        AtomicFile.write(
                folder.resolve(name),
                out -> {
                    out.write("time," + String.join(",", names) + "\n");
                    for (int row = 0; row < timeS.length; row++) {
                        line(out, timeS[row], row, values);
                    }
                });
    }

    private void line(Writer out, double atS, int row, List<IntToDoubleFunction> values)
            throws IOException {
        out.write(timeline.localAt(atS).toString());
        for (IntToDoubleFunction value : values) {
            out.write(',');
            double v = value.applyAsDouble(row);
            if (Double.isFinite(v)) {
                out.write(WrittenNumber.text(v));
            }
        }
        out.write('\n');
    }
}
