package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.air.MoistAir;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** Sweat is told once for the chamber and once for leaving, with how long and what to do. */
class SweatingTest {
    private static final String COLD =
            "\"setting\": {\"temperatureC\": 3},"
                    + "\"cooling\": [{\"kind\": \"compressor\", \"ratedCapacityW\": 3500,"
                    + " \"defrost\": {\"everyHours\": 8, \"minutes\": 15}}]";

    private static ReferenceBook book;

    @TempDir Path folder;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private static String carrots(String id, double pulpC, String more) {
        return String.format(
                java.util.Locale.ROOT,
                "{\"id\": \"%s\", \"commodity\": \"carrot-topped\", \"massKg\": 400,"
                        + " \"temperatureC\": %.1f, \"chamber\": \"north\","
                        + " \"harvested\": \"2026-03-01T08:00\"%s}",
                id,
                pulpC,
                more);
    }

    private Forecast with(String chamber, String lots) throws IOException {
        return new SmallPlan().chamber(chamber).lots(lots).days(3).advice(book, folder).forecast();
    }

    private static double figure(String text, String pattern) {
        Matcher found = Pattern.compile(pattern).matcher(text);
        assertTrue(found.find(), text);
        return Double.parseDouble(found.group(1));
    }

    @Test
    void coldProduceIntoDampAirSweatsOnLeavingUntilItHasWarmed() throws IOException {
        String quick = ", \"wantedDays\": 2, \"package\": {\"halfCoolingHours\": 2}";
        Forecast forecast = with(COLD, carrots("C1", 4, quick));
        List<String> told = SmallPlan.told(forecast, "will-sweat");
        assertEquals(1, told.size(), forecast.warnings().toString());
        double dew = MoistAir.dewPointC(MoistAir.humidityRatioAt(29, 0.8, 101_325), 101_325);
        double told1 = figure(told.get(0), "a dew point of ([0-9.]+) °C");
        assertEquals(dew, told1, 0.1);
        assertTrue(
                told.get(0).startsWith("C1: leaving on 2026-03-04 00:00 its skin at "),
                told.get(0));
        double wetH = figure(told.get(0), "stays wet for ([0-9.]+) h");
        assertTrue(wetH >= 2 && wetH <= 48, told.get(0));
        assertEquals(List.of(), SmallPlan.told(forecast, "wet-long"));
        // A package that takes a day to half cooling is not warm after two.
        String slow = ", \"wantedDays\": 2, \"package\": {\"halfCoolingHours\": 24}";
        Forecast still = with(COLD, carrots("C1", 4, slow));
        assertEquals(1, SmallPlan.told(still, "will-stay-wet").size());
        assertEquals(List.of(), SmallPlan.told(still, "will-sweat"));
    }

    @Test
    void nothingIsToldWhereTheMarketIsDryOrTheLotWarm() throws IOException {
        Forecast dry =
                new SmallPlan()
                        .weather("{\"steady\": {\"temperatureC\": 20, \"humidityPct\": 25}}")
                        .chamber(COLD)
                        .lots(carrots("C1", 4, ", \"wantedDays\": 2"))
                        .advice(book, folder)
                        .forecast();
        assertEquals(List.of(), SmallPlan.told(dry, "will-sweat"));
        Forecast passive = with("\"setting\": {\"temperatureC\": 20}", carrots("C1", 28, ""));
        assertEquals(List.of(), SmallPlan.told(passive, "will-sweat"));
    }

    @Test
    void aColdLotInAWarmDampChamberIsToldOnceWithWhereAndWhen() throws IOException {
        Forecast forecast =
                with(
                        "\"setting\": {\"temperatureC\": 20}",
                        carrots("C1", 2, ", \"arrives\": \"2026-03-02T06:00\""));
        List<String> sweats = SmallPlan.told(forecast, "sweats");
        List<String> longer = SmallPlan.told(forecast, "sweats-long");
        assertEquals(1, sweats.size() + longer.size(), forecast.warnings().toString());
        assertEquals(List.of(), SmallPlan.told(forecast, "wet-long"));
        String told = sweats.isEmpty() ? longer.get(0) : sweats.get(0);
        assertTrue(told.startsWith("C1: sweats in north, wet for "), told);
        assertTrue(told.contains(" from 2026-03-02 06:"), told);
    }

    @Test
    void whatALotThatLeftWouldGoThroughIsNotCounted() throws IOException {
        Forecast forecast =
                with(
                        "\"setting\": {\"temperatureC\": 20}",
                        carrots("C1", 2, ", \"leaves\": \"2026-03-02T10:00\""));
        String told = SmallPlan.told(forecast, "sweats").get(0);
        assertTrue(figure(told, "wet for ([0-9.]+) h in all") <= 10, told);
    }

    @Test
    void aWashedLotIsToldOfItsWaterNotOfSweat() throws IOException {
        Forecast forecast = with(COLD, carrots("C1", 6, ", \"surfaceWaterPct\": 8"));
        assertEquals(List.of(), SmallPlan.told(forecast, "sweats-long"));
        assertEquals(List.of(), SmallPlan.told(forecast, "sweats"));
    }

    @Test
    void theCoolHourIsNamedWhereItSparesWetHours() throws IOException {
        String csv = "time,temperatureC,humidityPct\n";
        StringBuilder weather = new StringBuilder(csv);
        for (int h = 0; h <= 24 * 5; h++) {
            // Close and damp by day, dry nights; from the evening of the third day on dry weather.
            int hour = h % 24;
            boolean close = hour >= 8 && hour <= 20 && h < 2 * 24 + 21;
            weather.append(
                    String.format(
                            java.util.Locale.ROOT,
                            "2026-03-%02dT%02d:00,%d,%d%n",
                            2 + h / 24,
                            hour,
                            close ? 31 : 12,
                            close ? 80 : 35));
        }
        java.nio.file.Files.writeString(folder.resolve("weather.csv"), weather);
        Forecast forecast =
                new SmallPlan()
                        .weather("{\"csv\": \"weather.csv\"}")
                        .chamber(COLD)
                        .lots(carrots("C1", 4, ", \"leaves\": \"2026-03-04T13:00\""))
                        .advice(book, folder)
                        .forecast();
        List<String> told =
                forecast.warnings().stream()
                        .filter(w -> w.code().startsWith("will-sweat"))
                        .map(Forecast.Warning::text)
                        .toList();
        assertEquals(1, told.size(), told.toString());
        double wetH = figure(told.get(0), "stays wet for ([0-9.]+) h");
        double spared = figure(told.get(0), "then it is wet for ([0-9.]+) h");
        assertTrue(spared < wetH, told.get(0));
        assertTrue(told.get(0).contains("let it go on 2026-03-0"), told.get(0));
    }
}
