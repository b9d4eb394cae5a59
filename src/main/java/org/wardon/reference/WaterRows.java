package org.wardon.reference;

import java.util.ArrayList;
import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.MoistureLimit;
import org.wardon.produce.rows.MoistureLossRow;
import org.wardon.produce.rows.TranspirationRow;

/** Transpiration, permissible loss and printed losses of a commodity. */
final class WaterRows {
    private static final String ANY = "any";

    private final ReferenceDatabase database;
    private final String id;

    WaterRows(ReferenceDatabase database, String id) {
        this.database = database;
        this.id = id;
    }

    Commodity.Water water() {
        List<MoistureLimit> limits = new ArrayList<>(limits(id));
        limits.addAll(limits(ANY));
        return new Commodity.Water(transpiration(), limits, losses());
    }

    private List<TranspirationRow> transpiration() {
        return database.list(
                "select * from transpiration where commodity_id = ? order by line",
                row ->
                        new TranspirationRow(
                                row.fact("k_ng_kg_s_Pa", "ng/(kg s Pa)"),
                                row.fact(
                                        "skin_ks_low_ug_s_m2_Pa",
                                        "skin_ks_high_ug_s_m2_Pa",
                                        "ug/(s m2 Pa)"),
                                row.number("skin_ks_mean_ug_s_m2_Pa"),
                                row.number("vapour_pressure_lowering_effect")),
                id);
    }

    private List<MoistureLimit> limits(String commodity) {
        return database
                .present(
                        "select * from moisture_loss_limits where commodity_id = ? order by line",
                        row ->
                                row.fact("max_permissible_loss_pct", "pct")
                                        .map(loss -> new MoistureLimit(loss, row.text("symptom"))),
                        commodity)
                .stream()
                .sorted(Preference.LOSS)
                .toList();
    }

    private List<MoistureLossRow> losses() {
        return database.list(
                "select * from moisture_loss where commodity_id = ? order by line",
                row ->
                        new MoistureLossRow(
                                row.text("variant"),
                                row.figure("temp_C"),
                                row.number("rh_pct"),
                                row.fact("weight_loss_pct_per_day", row.text("unit")),
                                row.printed("max_acceptable_loss_pct", "pct"),
                                note(row)),
                id);
    }

    private static String note(Row row) {
        boolean words = !row.text("temp_C").isEmpty() && row.figure("temp_C").isEmpty();
        return words ? "at " + row.text("temp_C") + "; " + row.text("note") : row.text("note");
    }
}
