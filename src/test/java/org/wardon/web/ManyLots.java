package org.wardon.web;

import java.time.LocalDateTime;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Plans of a growers' co-operative, drawn by a seed: chambers kept for crops that share, lots from
 * 60 kg to 1.8 t that come in over a week, one in fifteen in a chamber it should not be in.
 */
public final class ManyLots {
    private static final int DAYS = 6;

    /** One lot in so many stands where it should not. */
    private static final int MISPLACED = 15;

    private static final List<Kept> KEPT =
            List.of(
                    new Kept("leaf", 1, "lettuce-crisphead spinach broccoli cauliflower leek"),
                    new Kept("root", 0.5, "carrot-topped cabbage beet turnip parsnip celery"),
                    new Kept("apple", 2, "apple pear grape plum strawberry"),
                    new Kept("bean", 8, "snap-bean bell-pepper eggplant cucumber okra"),
                    new Kept("mango", 12, "mango papaya avocado pineapple passion-fruit"),
                    new Kept("banana", 14, "banana-green plantain sweet-potato ginger lime"));

    private final SplittableRandom random;

    private ManyLots(long seed) {
        random = new SplittableRandom(seed);
    }

    /** A chamber and the crops kept in it. */
    private record Kept(String chamber, double settingC, List<String> crops) {
        Kept(String chamber, double settingC, String crops) {
            this(chamber, settingC, Arrays.asList(crops.split(" ")));
        }
    }

    /**
     * Draws a plan of six chambers.
     *
     * @param lots how many lots stand in them
     * @param seed draws them
     * @return the plan's text
     */
    public static String plan(int lots, long seed) {
        return new ManyLots(seed).drawn(lots);
    }

    private String drawn(int lots) {
        String chambers = KEPT.stream().map(ManyLots::chamber).collect(Collectors.joining(","));
        String all =
                Stream.iterate(0, i -> i + 1)
                        .limit(lots)
                        .map(this::lot)
                        .collect(Collectors.joining(",\n"));
        return """
                {"storePlan": 1, "name": "Growers of the long valley (invented)",
                 "site": {"latitudeDeg": -17.8, "longitudeDeg": 31.0, "elevationM": 1480, "zone": "Africa/Harare"},
                 "weather": {"normals": {
                   "dailyMaxC": [26, 26, 26, 25, 23, 21, 21, 24, 27, 29, 27, 26],
                   "dailyMinC": [16, 16, 15, 13, 9, 7, 7, 9, 12, 15, 16, 16],
                   "humidityPct": [76, 77, 72, 67, 61, 58, 55, 49, 46, 51, 61, 73],
                   "globalKWhM2Day": [6.1, 5.9, 6.0, 5.6, 5.1, 4.7, 4.9, 5.7, 6.4, 6.7, 6.3, 6.0]}},
                 "from": "2026-03-02T00:00", "days": %d, "currency": "USD", "energyPricePerKWh": 0.12,
                 "buildUps": {"panel": {"solarAbsorptance": 0.4, "layers": [
                   {"conductivityWmK": 0.028, "densityKgM3": 40, "specificHeatJkgK": 1400, "thicknessMm": 100}]}},
                 "chambers": [%s],
                 "lots": [
                %s]}
                """
                .formatted(DAYS, chambers, all);
    }

    private static String chamber(Kept kept) {
        String faces =
                Stream.of("roof", "floor", "north", "east", "south", "west")
                        .map(
                                face ->
                                        "{\"face\": \"%s\", \"beyond\": \"shade\", \"buildUp\": \"panel\"}"
                                                .formatted(face))
                        .collect(Collectors.joining(","));
        return """
                {"id": "%s", "lengthM": 9, "widthM": 6, "heightM": 3.5, "faces": [%s],
                 "leakageAirChangesPerDay": 2, "freshAirM3PerHour": 60,
                 "cooling": [{"kind": "compressor", "ratedCapacityW": 22000, "control": "modulating"}],
                 "setting": {"temperatureC": %s, "humidityPct": 90}, "capacityKg": 24000}
                """
                .formatted(kept.chamber, faces, kept.settingC);
    }

    private String lot(int number) {
        Kept kept = KEPT.get(random.nextInt(KEPT.size()));
        String crop = kept.crops.get(random.nextInt(kept.crops.size()));
        boolean misplaced = random.nextInt(MISPLACED) == 0;
        String chamber = misplaced ? KEPT.get(random.nextInt(KEPT.size())).chamber : kept.chamber;
        LocalDateTime arrives =
                LocalDateTime.of(2026, 3, 2, 6, 0).plusHours(random.nextInt(24 * (DAYS - 2)));
        return String.format(
                Locale.ROOT,
                "{\"id\": \"%s-%03d\", \"commodity\": \"%s\", \"massKg\": %.0f, \"package\":"
                        + " \"room-cooling-any\", \"arrives\": \"%s\", \"temperatureC\": %.1f,"
                        + " \"wantedDays\": %d, \"chamber\": \"%s\", \"pricePerKg\": %.2f}",
                crop.substring(0, 3).toUpperCase(Locale.ROOT),
                number + 1,
                crop,
                Math.exp(random.nextDouble(Math.log(60), Math.log(1_800))),
                arrives,
                random.nextDouble(16, 28),
                3 + random.nextInt(7),
                chamber,
                random.nextDouble(0.4, 4));
    }
}
