package org.wardon.advice.forecast;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.files.forecast.SeriesWriter;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Fate;

/** Hourly series of a store's horizon, written as CSV. */
final class StoreSeries {
    private final StoreOutcome outcome;

    StoreSeries(StoreOutcome outcome) {
        this.outcome = outcome;
    }

    void write(Path folder) {
        SeriesWriter writer = new SeriesWriter(folder, outcome.model().plan().timeline());
        outcome.courses().forEach((id, course) -> chamber(writer, id, course));
        Legs.joined(outcome.courses().values()).values().forEach(lot -> lot(writer, lot));
    }

    /** Relative humidity as told: air with mist in it is saturated. */
    static double humidityPct(Hours hours, int row) {
        return Math.min(100, 100 * hours.humidityFraction(row));
    }

    /** The same at the door end of a chamber whose air is two. */
    static double doorEndHumidityPct(Hours hours, int row) {
        return Math.min(100, 100 * hours.doorEndHumidityFraction(row));
    }

    private void chamber(SeriesWriter writer, String id, Course course) {
        Hours hours = course.hours();
        ChamberEthylene level = outcome.ethylene(id);
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        columns.put("airC", hours::airC);
        columns.put("humidityPct", i -> humidityPct(hours, i));
        columns.put("outdoorC", hours::outdoorC);
        columns.put("coolingW", hours::coolingW);
        columns.put("powerW", hours::powerW);
        columns.put("co2Ppm", hours::co2Ppm);
        columns.put("ethylenePpm", i -> level.ppmAt(hours.atS(i)));
        if (Double.isFinite(hours.doorEndC(0))) {
            columns.put("doorEndC", hours::doorEndC);
            columns.put("doorEndHumidityPct", i -> doorEndHumidityPct(hours, i));
        }
        ofCoolers(course, columns);
        if (course.solar().isPresent()) {
            columns.put("panelW", hours::panelW);
            columns.put("batteryPct", i -> 100 * hours.batteryShare(i));
        }
        writer.chamber(id, times(hours.size(), hours::atS), columns);
    }

    /** Where there is more than compressors: water, and how much each cooler ran. */
    private static void ofCoolers(Course course, Map<String, IntToDoubleFunction> columns) {
        Hours hours = course.hours();
        if (course.coolers().stream().allMatch(cooler -> cooler.kind().equals("compressor"))) {
            return;
        }
        if (IntStream.range(0, hours.size()).anyMatch(i -> Double.isFinite(hours.waterOutC(i)))) {
            columns.put("waterOutC", hours::waterOutC);
        }
        if (course.waterUsedKg() > 0) {
            columns.put("waterUsedKg", hours::waterUsedKg);
        }
        if (course.coolers().stream().anyMatch(cooler -> cooler.ice().isPresent())) {
            columns.put("iceKg", hours::iceKg);
        }
        for (int k = 0; k < course.coolers().size(); k++) {
            int cooler = k;
            columns.put(
                    SeriesWriter.running(k),
                    i -> 100 * Math.min(Math.max(hours.ran(cooler, i), 0), 1));
        }
    }

    private void lot(SeriesWriter writer, LotCourse lot) {
        String id = lot.stay().lot().id();
        if (!outcome.has(id)) {
            return;
        }
        Fate plain = outcome.fates(id).plain();
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        columns.put("meanC", lot::meanC);
        columns.put("surfaceC", lot::surfaceC);
        columns.put("coreC", lot::coreC);
        columns.put("respirationW", lot::respirationW);
        columns.put("massKg", lot::massKg);
        columns.put("lifeUsedPct", i -> 100 * plain.usedAt(lot.atS(i)));
        writer.lot(id, times(lot.size(), lot::atS), columns);
    }

    private static double[] times(int n, IntToDoubleFunction atS) {
        return IntStream.range(0, n).mapToDouble(atS).toArray();
    }
}
