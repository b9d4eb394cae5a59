package org.wardon.reference;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.produce.Commodity;

/** Reads a commodity with every row that print has of it, the chosen row of each kind first. */
final class CommodityReader {
    private final ReferenceDatabase database;

    CommodityReader(ReferenceDatabase database) {
        this.database = database;
    }

    /** Returns the commodity; empty if the table has no such id. */
    Optional<Commodity> read(String id) {
        return database
                .list(
                        "select * from commodities where commodity_id = ?",
                        row -> commodity(id, row),
                        id)
                .stream()
                .findFirst();
    }

    private Commodity commodity(String id, Row row) {
        NeedsOfView view = NeedsOfView.of(database, id);
        return new Commodity(
                id,
                names(id, row),
                row.text("plant_part"),
                row.text("climacteric").equals("yes"),
                needs(row, view),
                new BodyRows(database, id).body(),
                new BreathRows(database, id).breath(view.heat()),
                new WaterRows(database, id).water(),
                new KeepingRows(database, id).keeping(),
                new CompanyRows(database, id).company());
    }

    private List<String> names(String id, Row row) {
        List<String> names = new ArrayList<>();
        names.add(row.text("common_name"));
        names.addAll(
                database.list(
                        "select alias from aliases where commodity_id = ? order by line",
                        alias -> alias.text("alias"),
                        id));
        names.addAll(List.of(row.text("scientific_name").split("; ", -1)));
        return names;
    }

    private static Commodity.Needs needs(Row row, NeedsOfView view) {
        return new Commodity.Needs(
                view.temperatureC(),
                view.humidityPct(),
                row.fact("life_low_days", "life_high_days", "day"),
                row.fact("highest_freezing_C", "C"),
                row.text("ethylene_production_class"),
                row.text("ethylene_sensitivity_class"),
                row.text("note"));
    }
}
