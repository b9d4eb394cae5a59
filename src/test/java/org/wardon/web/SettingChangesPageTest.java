package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A setting that changes on the way, as pages and programs are told of it. */
class SettingChangesPageTest {
    private static final String CHANGED =
            "\"temperatureC\": 12}, \"settingChanges\": [{\"from\": \"2026-03-03T06:00\","
                    + " \"temperatureC\": 8}], \"cooling\": [{\"kind\": \"compressor\","
                    + " \"ratedCapacityW\": 3500, \"control\": \"modulating\"}]";

    @TempDir Path home;

    @Test
    void bothSettingsStandInTheSentenceTheStripAndTheAnswer() throws Exception {
        try (WebServer server =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()))) {
            String plan = server.bring(Files.writeString(home.resolve("plan.json"), plan()));
            RawHttp http = new RawHttp(server.url());
            String cookie = "Cookie: " + http.visitor("/plans").cookie();
            String answer = http.get("/api/plans/1/forecast?waitS=60", cookie).body();
            assertTrue(
                    answer.replaceAll("\\s", "")
                            .contains("\"from\":\"2026-03-03T06:00\",\"temperatureC\":8"),
                    answer);
            String page = http.get(plan, cookie).body();
            assertTrue(page.contains("12.0 °C, from Tue 3 Mar 06:00 8.0 °C"), page);
            assertTrue(page.contains("set to 12.0 °C, 8.0 °C; "), page);
            String setting = page.split("class=\"setting\" d=\"")[1].split("\"")[0];
            assertEquals(2, setting.chars().filter(c -> c == 'M').count(), setting);
            String document = http.get("/api/openapi.json", cookie).body();
            assertTrue(document.contains("local time from which it is in force"));
        }
    }

    private static String plan() throws IOException {
        String text = Files.readString(Path.of("src/test/resources/plans/minimal/plan.json"));
        String changed = text.replaceFirst("\"temperatureC\": 12\\s*}", CHANGED);
        assertTrue(changed.contains("settingChanges"));
        return changed;
    }
}
