package org.wardon.advice.placing;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.wardon.advice.PlanLookups;
import org.wardon.files.PlanReader;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Invented stores of seeded lots and chambers, to be placed. */
final class DrawnStore {
    private static final List<String> CROPS =
            List.of(
                    "mango",
                    "lettuce-crisphead",
                    "carrot-topped",
                    "banana-green",
                    "onion-dry",
                    "broccoli",
                    "tomato-mature-green",
                    "apple",
                    "cucumber");

    private final List<String> chambers = new ArrayList<>();
    private final List<String> lots = new ArrayList<>();
    private String members = "";
    private int days = 5;

    /** Two panel rooms, one too small for all, and a shed. */
    static DrawnStore of(int seed, int lots) {
        SplittableRandom random = new SplittableRandom(seed);
        DrawnStore store = new DrawnStore();
        store.chamber("warm", 12, 2500, 1500 + random.nextInt(1500));
        store.chamber("cold", 2, 3000, 1500);
        store.chamber("shed", 25, 0, 2000);
        for (int i = 0; i < lots; i++) {
            store.lot("L" + i, CROPS.get(random.nextInt(CROPS.size())), random, "");
        }
        return store;
    }

    DrawnStore chamber(String id, double settingC, int watts, int capacityKg) {
        String faces =
                Stream.of("roof", "floor", "north", "east", "south", "west")
                        .map(
                                face ->
                                        "{\"face\": \"%s\", \"beyond\": \"shade\", \"layers\": [{\"conductivityWmK\": 0.028, \"densityKgM3\": 40, \"specificHeatJkgK\": 1400, \"thicknessMm\": 80}]}"
                                                .formatted(face))
                        .collect(Collectors.joining(","));
        String cooling =
                watts == 0
                        ? ""
                        : "{\"kind\": \"compressor\", \"ratedCapacityW\": %d, \"control\": \"modulating\"}"
                                .formatted(watts);
        chambers.add(
                String.format(
                        Locale.ROOT,
                        "{\"id\": \"%s\", \"lengthM\": 4, \"widthM\": 3, \"heightM\": 2.5,"
                                + " \"faces\": [%s], \"freshAirM3PerHour\": 8, \"cooling\": [%s],"
                                + " \"setting\": {\"temperatureC\": %s}, \"capacityKg\": %d}",
                        id,
                        faces,
                        cooling,
                        settingC,
                        capacityKg));
        return this;
    }

    DrawnStore lot(String id, String crop, SplittableRandom random, String more) {
        lots.add(
                String.format(
                        Locale.ROOT,
                        "{\"id\": \"%s\", \"commodity\": \"%s\", \"massKg\": %d,"
                                + " \"package\": \"room-cooling-any\","
                                + " \"arrives\": \"2026-03-0%dT12:00\", \"temperatureC\": %.1f,"
                                + " \"harvested\": \"2026-03-01T18:00\", \"wantedDays\": %d,"
                                + " \"pricePerKg\": %.2f%s}",
                        id,
                        crop,
                        200 + random.nextInt(700),
                        2 + random.nextInt(2),
                        random.nextDouble(18, 28),
                        2 + random.nextInt(4),
                        random.nextDouble(1, 5),
                        more));
        return this;
    }

    DrawnStore lot(String json) {
        lots.add(json);
        return this;
    }

    /** Members of the plan beside those it has. */
    DrawnStore with(String json) {
        members += ", " + json;
        return this;
    }

    /** How long it runs, days. */
    DrawnStore days(int howLong) {
        days = howLong;
        return this;
    }

    /** The same with lots and chambers in the other order. */
    DrawnStore turned() {
        Collections.reverse(chambers);
        Collections.reverse(lots);
        return this;
    }

    String json() {
        return """
        {"storePlan": 1, "name": "drawn (invented)",
         "site": {"latitudeDeg": 12, "longitudeDeg": -61, "elevationM": 10, "zone": "UTC"},
         "weather": {"steady": {"temperatureC": 28, "humidityPct": 75}},
         "from": "2026-03-02T00:00", "days": %d, "energyPricePerKWh": 0.3,
         "chambers": [%s], "lots": [%s]%s}
        """
                .formatted(days, String.join(",", chambers), String.join(",", lots), members);
    }

    StorePlan plan(Path folder, ReferenceBook book) {
        try {
            Path file = Files.writeString(folder.resolve("plan.json"), json());
            return PlanReader.read(file, PlanLookups.of(book));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
