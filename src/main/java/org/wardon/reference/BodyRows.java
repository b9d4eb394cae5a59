package org.wardon.reference;

import org.wardon.produce.Commodity;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.GeometryRow;

/** Composition and shape of a commodity. */
final class BodyRows {
    private final Grouped<CompositionRow> compositions;
    private final Grouped<GeometryRow> geometries;

    BodyRows(Selection selection) {
        compositions = selection.rows(Query.table("composition"), BodyRows::composition);
        geometries = selection.rows(Query.table("geometry"), BodyRows::geometry);
    }

    Commodity.Body of(String id) {
        return new Commodity.Body(
                compositions.of(id).stream().sorted(Preference.COMPOSITION).toList(),
                geometries.of(id));
    }

    private static CompositionRow composition(Row row) {
        return new CompositionRow(
                row.value("water_pct"),
                row.value("protein_pct"),
                row.value("fat_pct"),
                row.value("carbohydrate_pct"),
                row.number("fibre_pct"),
                row.value("ash_pct"),
                row.number("initial_freezing_C"),
                row.text("source_id"),
                row.evidence());
    }

    private static GeometryRow geometry(Row row) {
        return new GeometryRow(
                row.text("shape"),
                row.number("characteristic_mm"),
                row.number("length_mm"),
                row.number("unit_mass_kg"),
                row.number("density_kg_m3"),
                row.number("bulk_density_kg_m3"),
                row.source(),
                row.text("evidence_text"));
    }
}
