package org.wardon.reference;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.MoistureLimit;
import org.wardon.produce.rows.MoistureLossRow;
import org.wardon.produce.rows.TranspirationRow;

/** Transpiration, permissible loss and printed losses of a commodity. */
final class WaterRows {
    private static final String ANY = "any";
    private static final Query LIMITS = Query.table("moisture_loss_limits");

    private final Grouped<TranspirationRow> transpiration;
    private final Grouped<MoistureLimit> limits;
    private final List<MoistureLimit> generalLimits;
    private final Grouped<MoistureLossRow> losses;

    WaterRows(Selection selection) {
        transpiration = selection.rows(Query.table("transpiration"), WaterRows::transpiration);
        limits = selection.present(LIMITS, WaterRows::limit);
        generalLimits = selection.general(ANY, LIMITS, WaterRows::limit).of(ANY);
        losses = selection.rows(Query.table("moisture_loss"), WaterRows::loss);
    }

    Commodity.Water of(String id) {
        return new Commodity.Water(
                transpiration.of(id),
                Stream.concat(sorted(limits.of(id)), sorted(generalLimits)).toList(),
                losses.of(id));
    }

    private static Stream<MoistureLimit> sorted(List<MoistureLimit> limits) {
        return limits.stream().sorted(Preference.LOSS);
    }

    private static TranspirationRow transpiration(Row row) {
        return new TranspirationRow(
                row.fact("k_ng_kg_s_Pa", "ng/(kg s Pa)"),
                row.fact("skin_ks_low_ug_s_m2_Pa", "skin_ks_high_ug_s_m2_Pa", "ug/(s m2 Pa)"),
                row.number("skin_ks_mean_ug_s_m2_Pa"),
                row.number("vapour_pressure_lowering_effect"));
    }

    private static Optional<MoistureLimit> limit(Row row) {
        return row.fact("max_permissible_loss_pct", "pct")
                .map(loss -> new MoistureLimit(loss, row.text("symptom")));
    }

    private static MoistureLossRow loss(Row row) {
        return new MoistureLossRow(
                row.text("variant"),
                row.figure("temp_C"),
                row.number("rh_pct"),
                row.fact("weight_loss_pct_per_day", row.text("unit")),
                row.printed("max_acceptable_loss_pct", "pct"),
                note(row));
    }

    private static String note(Row row) {
        boolean words = !row.text("temp_C").isEmpty() && row.figure("temp_C").isEmpty();
        return words ? "at " + row.text("temp_C") + "; " + row.text("note") : row.text("note");
    }
}
