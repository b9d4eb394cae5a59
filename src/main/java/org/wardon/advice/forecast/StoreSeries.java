package org.wardon.advice.forecast;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.SeriesWriter;
import org.wardon.heat.Course;
import org.wardon.heat.HeatLedger;
import org.wardon.heat.HourAccount;
import org.wardon.heat.Hours;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Fate;

/** Hourly series of a store's horizon, in memory and written as CSV. */
final class StoreSeries {
    private final StoreOutcome outcome;

    StoreSeries(StoreOutcome outcome) {
        this.outcome = outcome;
    }

    void write(Path folder) {
        SeriesWriter writer = new SeriesWriter(folder, outcome.model().plan().timeline());
        outcome.courses().keySet().forEach(id -> writer.chamber(chamber(id)));
        lots().forEach(writer::lot);
    }

    /** Series of all lots of the run. */
    List<HourlySeries> lots() {
        return lots(any -> true);
    }

    /** Series of those lots of the run whose id is asked for; others cost nothing. */
    List<HourlySeries> lots(Predicate<String> asked) {
        return Legs.joined(outcome.courses().values()).values().stream()
                .filter(lot -> asked.test(lot.stay().lot().id()))
                .filter(lot -> outcome.has(lot.stay().lot().id()))
                .map(this::lot)
                .toList();
    }

    /** Relative humidity as told: air with mist in it is saturated. */
    static double humidityPct(Hours hours, int row) {
        return Math.min(100, 100 * hours.humidityFraction(row));
    }

    /** The same at the door end of a chamber whose air is two. */
    static double doorEndHumidityPct(Hours hours, int row) {
        return Math.min(100, 100 * hours.doorEndHumidityFraction(row));
    }

    /** Series of a chamber: those of the CSV file, and the lowest and highest of each hour. */
    HourlySeries chamber(String id) {
        Course course = outcome.course(id);
        Hours hours = course.hours();
        ChamberEthylene level = outcome.ethylene(id);
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        columns.put("airC", hours::airC);
        columns.put("airLowestC", hours::airLowestC);
        columns.put("airHighestC", hours::airHighestC);
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
        return series(id, hours.size(), hours::atS, columns);
    }

    private static HourlySeries series(
            String id, int n, IntToDoubleFunction atS, Map<String, IntToDoubleFunction> columns) {
        List<HourlySeries.Column> all = new ArrayList<>();
        columns.forEach((name, value) -> all.add(new HourlySeries.Column(name, values(n, value))));
        return new HourlySeries(id, values(n, atS), all);
    }

    private static List<Double> values(int n, IntToDoubleFunction value) {
        return IntStream.range(0, n).mapToDouble(value).boxed().toList();
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

    private HourlySeries lot(LotCourse lot) {
        String id = lot.stay().lot().id();
        Fate plain = outcome.fates(id).plain();
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        columns.put("meanC", lot::meanC);
        columns.put("surfaceC", lot::surfaceC);
        columns.put("coreC", lot::coreC);
        columns.put("respirationW", lot::respirationW);
        columns.put("massKg", lot::massKg);
        columns.put("lifeUsedPct", i -> 100 * plain.usedAt(lot.atS(i)));
        return series(id, lot.size(), lot::atS, columns);
    }

    /** What brought heat into a chamber in each hour, by the names of {@code loadKWh}, W. */
    static HourlySeries heat(String id, List<HourAccount> accounts) {
        Map<String, ToDoubleFunction<HeatLedger>> terms = new LinkedHashMap<>();
        terms.put("walls", HeatLedger::walls);
        terms.put("door", HeatLedger::door);
        terms.put("leakage", HeatLedger::leakage);
        terms.put("freshAir", HeatLedger::freshAir);
        terms.put("fieldHeat", HeatLedger::fieldHeat);
        terms.put("respiration", HeatLedger::respiration);
        terms.put("fans", HeatLedger::fans);
        terms.put("lights", HeatLedger::lights);
        terms.put("people", HeatLedger::people);
        terms.put("packages", HeatLedger::packages);
        terms.put("defrost", HeatLedger::defrost);
        terms.put("humidifier", HeatLedger::humidifier);
        terms.put("heater", HeatLedger::heater);
        terms.put("pumps", HeatLedger::pumps);
        terms.put("air", HeatLedger::air);
        terms.put("removed", HeatLedger::removed);
        Map<String, IntToDoubleFunction> columns = new LinkedHashMap<>();
        terms.forEach((name, term) -> columns.put(name, i -> meanW(accounts.get(i), term)));
        return series(id, accounts.size(), i -> accounts.get(i).untilS(), columns);
    }

    private static double meanW(HourAccount account, ToDoubleFunction<HeatLedger> term) {
        return term.applyAsDouble(account.heat()) / (account.untilS() - account.fromS());
    }
}
