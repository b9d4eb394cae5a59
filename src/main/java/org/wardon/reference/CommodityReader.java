package org.wardon.reference;

import java.util.ArrayList;
import java.util.List;
import org.wardon.produce.Commodity;

/** Reads commodities with every row that print has of them, the chosen row of each kind first. */
final class CommodityReader {
    private final Selection selection;
    private final NeedsOfView needs;
    private final Grouped<String> aliases;
    private final BodyRows body;
    private final BreathRows breath;
    private final WaterRows water;
    private final KeepingRows keeping;
    private final CompanyRows company;

    private CommodityReader(Selection selection) {
        this.selection = selection;
        needs = new NeedsOfView(selection);
        aliases = selection.rows(Query.table("aliases"), row -> row.text("alias"));
        body = new BodyRows(selection);
        breath = new BreathRows(selection);
        water = new WaterRows(selection);
        keeping = new KeepingRows(selection);
        company = new CompanyRows(selection);
    }

    /** Returns the commodities selected, in the order of their table; none for an unknown id. */
    static List<Commodity> read(Selection selection) {
        return new CommodityReader(selection).commodities();
    }

    private List<Commodity> commodities() {
        return selection.list(Query.table("commodities"), this::commodity);
    }

    private Commodity commodity(Row row) {
        String id = row.text("commodity_id");
        return new Commodity(
                id,
                names(id, row),
                row.text("plant_part"),
                row.text("climacteric").equals("yes"),
                needs(id, row),
                body.of(id),
                breath.of(id, needs.heat(id)),
                water.of(id),
                keeping.of(id),
                company.of(id));
    }

    private List<String> names(String id, Row row) {
        List<String> names = new ArrayList<>();
        names.add(row.text("common_name"));
        names.addAll(aliases.of(id));
        names.addAll(List.of(row.text("scientific_name").split("; ", -1)));
        return names;
    }

    private Commodity.Needs needs(String id, Row row) {
        return new Commodity.Needs(
                needs.temperatureC(id),
                needs.humidityPct(id),
                row.fact("life_low_days", "life_high_days", "day"),
                row.fact("highest_freezing_C", "C"),
                row.text("ethylene_production_class"),
                row.text("ethylene_sensitivity_class"),
                row.text("note"));
    }
}
