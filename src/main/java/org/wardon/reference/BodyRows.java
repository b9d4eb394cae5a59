package org.wardon.reference;

import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.GeometryRow;

/** Composition and shape of a commodity. */
final class BodyRows {
    private final ReferenceDatabase database;
    private final String id;

    BodyRows(ReferenceDatabase database, String id) {
        this.database = database;
        this.id = id;
    }

    Commodity.Body body() {
        return new Commodity.Body(compositions(), geometries());
    }

    private List<CompositionRow> compositions() {
        return database
                .list(
                        "select * from composition where commodity_id = ? order by line",
                        row ->
                                new CompositionRow(
                                        row.value("water_pct"),
                                        row.value("protein_pct"),
                                        row.value("fat_pct"),
                                        row.value("carbohydrate_pct"),
                                        row.number("fibre_pct"),
                                        row.value("ash_pct"),
                                        row.number("initial_freezing_C"),
                                        row.text("source_id"),
                                        row.evidence()),
                        id)
                .stream()
                .sorted(Preference.COMPOSITION)
                .toList();
    }

    private List<GeometryRow> geometries() {
        return database.list(
                "select * from geometry where commodity_id = ? order by line",
                row ->
                        new GeometryRow(
                                row.text("shape"),
                                row.number("characteristic_mm"),
                                row.number("length_mm"),
                                row.number("unit_mass_kg"),
                                row.number("density_kg_m3"),
                                row.number("bulk_density_kg_m3"),
                                row.source(),
                                row.text("evidence_text")),
                id);
    }
}
