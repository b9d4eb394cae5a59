package org.wardon.web.pages;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.wardon.advice.forecast.ChamberAir;

/** The air of a chamber as a table by day and as data of a chart by hour. */
final class AirTable {
    private final ChamberAir air;
    private final Figures figures;
    private final PageWords words;

    AirTable(ChamberAir air, Figures figures, PageWords words) {
        this.air = air;
        this.figures = figures;
        this.words = words;
    }

    TableView byDay(String chamber) {
        Map<LocalDate, List<Integer>> days = new TreeMap<>();
        for (int i = 0; i < air.size(); i++) {
            // An hour is named by its end: midnight closes the day before.
            LocalDate day = air.at(i).minusSeconds(1).toLocalDate();
            if (i > 0) {
                days.computeIfAbsent(day, any -> new ArrayList<>()).add(i);
            }
        }
        return new TableView(
                words.say("chart.table", chamber),
                List.of(
                        words.say("chart.day"),
                        words.say("chart.coldest"),
                        words.say("chart.warmest"),
                        words.say("chart.outdoors"),
                        words.say("chart.humidity")),
                days.entrySet().stream().map(day -> row(day.getKey(), day.getValue())).toList());
    }

    private List<String> row(LocalDate day, List<Integer> hours) {
        return List.of(
                figures.day(day),
                figures.temperature(hours.stream().mapToDouble(air::airC).min().orElseThrow()),
                figures.temperature(hours.stream().mapToDouble(air::airC).max().orElseThrow()),
                figures.temperature(
                        hours.stream().mapToDouble(air::outdoorC).average().orElseThrow()),
                figures.figure(
                        hours.stream().mapToDouble(air::humidityPct).average().orElseThrow(),
                        "pct"));
    }
}
