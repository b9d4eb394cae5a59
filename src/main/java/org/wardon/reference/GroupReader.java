package org.wardon.reference;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wardon.produce.Fact;
import org.wardon.produce.MixingGroup;
import org.wardon.produce.rows.EthyleneStorageRow;

/** Reads what print says of several commodities at once. */
final class GroupReader {
    private final ReferenceDatabase database;

    GroupReader(ReferenceDatabase database) {
        this.database = database;
    }

    /** What makes rows of the table one group. */
    private record Key(String scheme, String group, Fact temperatureC, Fact humidityPct) {}

    List<MixingGroup> mixingGroups() {
        Map<Key, List<String>> members = new LinkedHashMap<>();
        database.list(
                        "select * from mixing_groups order by line",
                        row -> Map.entry(key(row), row.text("commodity_id")))
                .forEach(
                        entry ->
                                members.computeIfAbsent(entry.getKey(), key -> new ArrayList<>())
                                        .add(entry.getValue()));
        return members.entrySet().stream()
                .map(
                        entry ->
                                new MixingGroup(
                                        entry.getKey().scheme(),
                                        entry.getKey().group(),
                                        entry.getKey().temperatureC(),
                                        entry.getKey().humidityPct(),
                                        entry.getValue()))
                .toList();
    }

    private static Key key(Row row) {
        return new Key(
                row.text("group_set"),
                row.text("group_id"),
                row.fact("temp_low_C", "temp_high_C", "C").orElseThrow(),
                row.fact("rh_low_pct", "rh_high_pct", "pct").orElseThrow());
    }

    List<EthyleneStorageRow> ethyleneStorage() {
        return database.list(
                "select * from ethylene_storage order by line",
                row ->
                        new EthyleneStorageRow(
                                row.text("commodity"),
                                row.text("temp_C"),
                                row.text("ethylene"),
                                row.text("effect_on_life"),
                                row.text("source_id"),
                                row.evidence(),
                                row.text("note")));
    }

    List<ClimateMonth> climate() {
        return database.list(
                "select * from climate_normals order by line",
                row ->
                        new ClimateMonth(
                                row.text("place"),
                                row.text("country"),
                                row.text("climate"),
                                row.value("latitude_deg"),
                                row.value("longitude_deg"),
                                row.value("elevation_m"),
                                (int) row.value("month"),
                                row.value("mean_daily_max_C"),
                                row.value("mean_daily_min_C"),
                                row.number("mean_rh_pct"),
                                row.number("global_radiation_MJ_m2_day"),
                                row.number("mean_wind_m_s"),
                                row.text("source_id"),
                                row.text("note")));
    }
}
