package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.Setting;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;

/** A placing written into the keeper's plan touches nothing else of it. */
class PlacedPlanTest {
    private static final Path DEMO = Path.of("demo-data/landing.json");

    @Test
    void changesOnlyWhatIsPlacedOtherwise() throws IOException {
        String text = Files.readString(DEMO);
        StorePlan asked = PlanReader.read(DEMO, TableLookups.read());
        List<ChamberPlan> chambers = new java.util.ArrayList<>(asked.chambers());
        Setting was = chambers.get(0).setting();
        chambers.set(
                0,
                chambers.get(0).withSetting(new Setting(10.5, was.bandK(), was.humidityPct(), 1)));
        chambers.set(1, chambers.get(1).switchedOff());
        List<LotPlan> lots = new java.util.ArrayList<>(asked.lots());
        lots.set(3, lots.get(3).placedIn("fruit"));
        lots.set(10, lots.get(10).placedIn("cold"));
        lots.set(9, lots.get(9).unplaced());
        String changed = PlacedPlan.changed(text, asked, asked.with(chambers, lots));
        String expected =
                text.replace(
                                "{\"temperatureC\": 13, \"bandK\"",
                                "{\"temperatureC\": 10.5, \"bandK\"")
                        .replace(
                                "\"wantedDays\": 7, \"chamber\": \"cold\"",
                                "\"wantedDays\": 7, \"chamber\": \"fruit\"")
                        .replace(
                                "\"cured\": false, \"wantedDays\": 9, \"chamber\": \"shed\"",
                                "\"cured\": false, \"wantedDays\": 9")
                        .replace(
                                "\"pricePerKg\": 6.5}",
                                "\"pricePerKg\": 6.5, \"chamber\": \"cold\"}")
                        .replace(
                                "\"capacityKg\": 4500\n",
                                "\"capacityKg\": 4500,\n      \"off\": true\n");
        assertEquals(expected, changed);
    }

    @Test
    void laterSettingsAreWrittenChangedAndTakenOut() throws IOException {
        String text = Files.readString(DEMO);
        StorePlan asked = PlanReader.read(DEMO, TableLookups.read());
        SettingChange later =
                new SettingChange(LocalDateTime.of(2026, 3, 5, 6, 0), 4.5, OptionalDouble.of(95));
        List<ChamberPlan> chambers = new java.util.ArrayList<>(asked.chambers());
        chambers.set(1, chambers.get(1).changing(List.of(later)));
        StorePlan changed = asked.with(chambers, asked.lots());
        String written = PlacedPlan.changed(text, asked, changed);
        assertEquals(
                text.replace(
                        "\"capacityKg\": 4500\n",
                        "\"capacityKg\": 4500,\n      \"settingChanges\": [{\"from\":"
                                + " \"2026-03-05T06:00\", \"temperatureC\": 4.5,"
                                + " \"humidityPct\": 95}]\n"),
                written);
        assertEquals(text, PlacedPlan.changed(written, changed, asked));
    }

    @Test
    void nothingChangedIsTheSameText() throws IOException {
        String text = Files.readString(DEMO);
        StorePlan asked = PlanReader.read(DEMO, TableLookups.read());
        assertEquals(text, PlacedPlan.changed(text, asked, asked));
    }
}
