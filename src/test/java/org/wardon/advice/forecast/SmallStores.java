package org.wardon.advice.forecast;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Invented small stores for tests of forecasts. */
final class SmallStores {
    private SmallStores() {}

    /** A panel room; two of one setting are alike to the last screw. */
    static String chamber(String id, double settingC) {
        String faces =
                List.of("roof", "floor", "north", "east", "south", "west").stream()
                        .map(
                                face ->
                                        "{\"face\": \"%s\", \"beyond\": \"shade\", \"layers\": [{\"conductivityWmK\": 0.028, \"densityKgM3\": 40, \"specificHeatJkgK\": 1400, \"thicknessMm\": 80}]}"
                                                .formatted(face))
                        .collect(java.util.stream.Collectors.joining(","));
        return """
               {"id": "%s", "lengthM": 4, "widthM": 3, "heightM": 2.5, "faces": [%s],
                "leakageAirChangesPerDay": 2, "freshAirM3PerHour": 10,
                "cooling": [{"kind": "compressor", "ratedCapacityW": 3500, "ratedPowerW": 1400, "ratedAirC": 5,
                 "ratedOutdoorC": 35, "fanW": 150, "coilUaWK": 600, "airFlowM3s": 0.6, "control": "modulating"}],
                "setting": {"temperatureC": %s, "humidityPct": 90}, "capacityKg": 3000}
               """
                .formatted(id, faces, settingC);
    }

    static String lot(String id, String crop, String arrives, double atC, String rest) {
        return """
               {"id": "%s", "commodity": "%s", "massKg": 300, "package": "room-cooling-any",
                "arrives": "%s", "temperatureC": %s, "harvested": "2026-03-01T18:00", "wantedDays": 6,
                "pricePerKg": 2, %s}
               """
                .formatted(id, crop, arrives, atC, rest);
    }

    static StorePlan plan(Path folder, ReferenceBook book, List<String> chambers, List<String> lots)
            throws IOException {
        String plan =
                """
                {"storePlan": 1, "name": "moves (invented)",
                 "site": {"latitudeDeg": 12, "longitudeDeg": -61, "elevationM": 10, "zone": "America/Grenada"},
                 "weather": {"steady": {"temperatureC": 28, "humidityPct": 75}},
                 "from": "2026-03-02T00:00", "days": 6, "energyPricePerKWh": 0.3,
                 "chambers": [%s], "lots": [%s]}
                """
                        .formatted(String.join(",", chambers), String.join(",", lots));
        Path file = Files.writeString(folder.resolve("plan.json"), plan);
        return PlanReader.read(file, PlanLookups.of(book));
    }

    static StoreAdvice advise(
            Path folder, ReferenceBook book, List<String> chambers, List<String> lots)
            throws IOException {
        return new ForecastAdvice(book, Words.english(Units.METRIC))
                .advise(plan(folder, book, chambers, lots), Progress.SILENT);
    }
}
