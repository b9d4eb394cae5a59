package org.wardon.advice.receiving;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.PlanReader;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Invented stores for questions at the door. */
final class Stores {
    static final Words WORDS = Words.english(Units.METRIC);

    private static final List<String> WARM = List.of("mango", "papaya", "banana-green", "avocado");
    private static final List<String> COLD =
            List.of("lettuce-crisphead", "broccoli", "carrot-topped", "cauliflower");

    private Stores() {}

    static String chamber(String id, double settingC, double capacityW) {
        List<String> faces = new ArrayList<>();
        for (String face : List.of("roof", "floor", "north", "east", "south", "west")) {
            faces.add(
                    "{\"face\": \"%s\", \"beyond\": \"shade\", \"layers\": [{\"conductivityWmK\": 0.028, \"densityKgM3\": 40, \"specificHeatJkgK\": 1400, \"thicknessMm\": 80}]}"
                            .formatted(face));
        }
        return String.format(
                Locale.ROOT,
                """
                {"id": "%s", "lengthM": 5, "widthM": 4, "heightM": 2.6, "faces": [%s],
                 "leakageAirChangesPerDay": 2, "freshAirM3PerHour": 20,
                 "door": {"widthM": 1, "heightM": 2, "protection": "strip-curtain"},
                 "cooling": [{"kind": "compressor", "ratedCapacityW": %s, "control": "modulating"}],
                 "setting": {"temperatureC": %s, "humidityPct": 90}, "capacityKg": 8000}
                """,
                id,
                String.join(",", faces),
                capacityW,
                settingC);
    }

    static String lot(String id, String crop, String chamber, int hour, double massKg) {
        return String.format(
                Locale.ROOT,
                """
                {"id": "%s", "commodity": "%s", "massKg": %.0f, "arrives": "2026-03-%02dT%02d:00",
                 "temperatureC": 26, "harvested": "2026-03-01T18:00", "wantedDays": 6, "pricePerKg": 2,
                 "chamber": "%s"}
                """,
                id,
                crop,
                massKg,
                2 + hour / 24,
                hour % 24,
                chamber);
    }

    static String json(double days, List<String> chambers, List<String> lots) {
        return String.format(
                Locale.ROOT,
                """
                {"storePlan": 1, "name": "at the door (invented)",
                 "site": {"latitudeDeg": 12, "longitudeDeg": -61, "elevationM": 10, "zone": "America/Grenada"},
                 "weather": {"normals": {
                   "dailyMaxC": [30, 30, 31, 31, 31, 30, 30, 31, 31, 31, 30, 30],
                   "dailyMinC": [23, 23, 23, 24, 25, 25, 24, 24, 24, 24, 24, 23],
                   "humidityPct": [75, 73, 72, 73, 76, 79, 80, 81, 81, 81, 80, 78],
                   "globalKWhM2Day": [5, 5.6, 6.1, 6.3, 6, 5.8, 5.9, 6, 5.7, 5.3, 4.9, 4.7]}},
                 "from": "2026-03-02T00:00", "days": %s, "energyPricePerKWh": 0.3,
                 "chambers": [%s], "lots": [%s]}
                """,
                days,
                String.join(",", chambers),
                String.join(",", lots));
    }

    /** Chambers by turns warm and cold, lots spread over them, seeded. */
    static String drawn(int chambers, int lots, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        List<String> rooms = new ArrayList<>();
        for (int i = 0; i < chambers; i++) {
            rooms.add(chamber("room" + (i + 1), i % 2 == 0 ? 13 : 2, 7_000));
        }
        List<String> goods = new ArrayList<>();
        for (int i = 0; i < lots; i++) {
            int room = i % chambers;
            List<String> crops = room % 2 == 0 ? WARM : COLD;
            goods.add(
                    lot(
                            "L" + (i + 1),
                            crops.get(random.nextInt(crops.size())),
                            "room" + (room + 1),
                            random.nextInt(60),
                            100 + random.nextInt(500)));
        }
        return json(10, rooms, goods);
    }

    static StorePlan plan(Path folder, ReferenceBook book, String json) throws IOException {
        Files.createDirectories(folder);
        Path file = Files.writeString(folder.resolve("plan.json"), json);
        return PlanReader.read(file, PlanLookups.of(book));
    }

    static StorePlan demo(ReferenceBook book) {
        return PlanReader.read(Path.of("demo-data/landing.json"), PlanLookups.of(book));
    }

    static List<String> turned(List<String> list) {
        List<String> other = new ArrayList<>(list);
        Collections.reverse(other);
        return other;
    }
}
