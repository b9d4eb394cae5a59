package org.wardon.reference;

import java.util.List;
import org.wardon.enclosure.Doorway;
import org.wardon.enclosure.Material;

/** Reads what stores are built of. */
final class StoreReader {
    private final ReferenceDatabase database;

    StoreReader(ReferenceDatabase database) {
        this.database = database;
    }

    List<Material> materials() {
        return database.list(
                "select m.*, w.vapour_resistance_factor, w.moisture_coefficient from materials m"
                        + " left join material_moisture w using (material_id) order by m.line",
                row ->
                        new Material(
                                row.text("material_id"),
                                row.text("name"),
                                row.number("conductivity_W_mK"),
                                row.number("density_kg_m3"),
                                row.number("specific_heat_J_kgK"),
                                row.number("solar_absorptance"),
                                row.number("resistance_m2K_W"),
                                new Material.Moisture(
                                        row.number("vapour_resistance_factor"),
                                        row.number("moisture_coefficient")),
                                row.text("source_id"),
                                row.evidence(),
                                row.text("note")));
    }

    /** Returns the rows that protect a door; flow factors, times and seals are none. */
    List<Doorway> doorways() {
        return database.list(
                "select * from doorways where doorway_id not like 'flow-factor-%'"
                        + " and doorway_id not like 'time-passage-%'"
                        + " and doorway_id not like 'seal-%'"
                        + " and doorway_id not in ('imperfect-mixing', 'strip-saving-energy')"
                        + " order by line",
                row ->
                        new Doorway(
                                row.text("doorway_id"),
                                row.text("type"),
                                row.fact("effectiveness_min", "effectiveness_max", "1"),
                                row.fact("effectiveness_typical", "1"),
                                row.text("note")));
    }
}
