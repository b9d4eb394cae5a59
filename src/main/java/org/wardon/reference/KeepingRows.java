package org.wardon.reference;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.AmbientLife;
import org.wardon.produce.rows.ChillingExposure;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.CuringRow;
import org.wardon.produce.rows.LifeCurveRow;
import org.wardon.produce.rows.LifeRow;
import org.wardon.produce.rows.Q10Row;
import org.wardon.produce.rows.RipeningRow;
import org.wardon.produce.rows.SproutingRow;

/** Lives, chilling, sprouting and curing of a commodity. */
final class KeepingRows {
    private static final String STAGE =
            ", case when t.ripeness = 'not-stated' and k.later then k.state else t.ripeness end"
                    + " as stage";
    private static final String GENERAL = "class:typical-perishable";
    private static final Query Q10S = new Query("*", "q10", "commodity_or_class", "line");
    private static final Query EXPOSURES =
            new Query(
                    "t.*, coalesce(days_high, days_to_injury) as days_to" + STAGE,
                    "commodity_rows k join chilling_exposure t on t.commodity_id = k.rows_of",
                    "k.commodity_id",
                    "k.later, t.line");
    private static final Query CURING =
            new Query(
                    "*",
                    "(select * from curing where source_id is not null)",
                    "commodity_id",
                    "line");

    private final Grouped<LifeRow> lives;
    private final Grouped<Q10Row> q10s;
    private final List<Q10Row> generalQ10s;
    private final Grouped<ChillingFloor> floors;
    private final Grouped<ChillingFloor> laterFloors;
    private final Grouped<ChillingExposure> exposures;
    private final Grouped<SproutingRow> sprouting;
    private final Grouped<CuringRow> curing;
    private final Grouped<AmbientLife> ambient;
    private final Grouped<LifeCurveRow> curves;
    private final Grouped<RipeningRow> ripening;

    KeepingRows(Selection selection) {
        lives = selection.present(Query.table("life_temperature"), KeepingRows::life);
        q10s = selection.present(Q10S, KeepingRows::q10);
        generalQ10s = selection.general(GENERAL, Q10S, KeepingRows::q10).of(GENERAL);
        floors = selection.rows(floors(0), KeepingRows::floor);
        laterFloors = selection.rows(floors(1), KeepingRows::floor);
        exposures = selection.present(EXPOSURES, KeepingRows::exposure);
        sprouting = selection.rows(Query.table("sprouting"), KeepingRows::sprouting);
        curing = selection.rows(CURING, KeepingRows::curing);
        ambient = selection.rows(Query.table("ambient_practice"), KeepingRows::ambient);
        curves = selection.rows(Query.table("life_curves"), KeepingRows::curve);
        ripening = selection.rows(Query.table("ripening"), KeepingRows::ripening);
    }

    private static Query floors(int later) {
        return new Query(
                "t.*, coalesce(lowest_safe_high_C, lowest_safe_C) as highest_C" + STAGE,
                "commodity_rows k join chilling t on t.commodity_id = k.rows_of and k.later = "
                        + later,
                "k.commodity_id",
                "t.line");
    }

    Commodity.Keeping of(String id) {
        return new Commodity.Keeping(
                lives.of(id),
                Stream.concat(q10s.of(id).stream(), generalQ10s.stream()).toList(),
                Stream.concat(sorted(floors.of(id)), sorted(laterFloors.of(id))).toList(),
                exposures.of(id),
                sprouting.of(id),
                curing.of(id),
                ambient.of(id),
                curves.of(id),
                ripening.of(id),
                List.of());
    }

    private static Stream<ChillingFloor> sorted(List<ChillingFloor> floors) {
        return floors.stream().sorted(Preference.FLOOR);
    }

    private static Optional<LifeRow> life(Row row) {
        return row.fact("life_days_low", "life_days_high", "day")
                .map(
                        life ->
                                new LifeRow(
                                        row.text("variant"),
                                        row.number("temp_C"),
                                        row.text("rh_pct"),
                                        life,
                                        row.text("criterion"),
                                        row.text("ended_by"),
                                        row.text("bound"),
                                        row.text("ripeness"),
                                        row.text("package"),
                                        row.text("note")));
    }

    private static Optional<Q10Row> q10(Row row) {
        return row.printed("q10", "1")
                .map(
                        q10 ->
                                new Q10Row(
                                        row.value("temp_low_C"),
                                        row.value("temp_high_C"),
                                        q10,
                                        row.text("note")));
    }

    private static ChillingFloor floor(Row row) {
        return new ChillingFloor(
                row.fact("lowest_safe_C", "highest_C", "C"),
                row.number("lowest_safe_C").isPresent(),
                row.text("symptoms"),
                row.text("stage"),
                row.text("variant"),
                row.text("tissue"),
                row.text("zone"),
                row.number("band_low_C"),
                row.text("source_id"));
    }

    private static Optional<ChillingExposure> exposure(Row row) {
        return row.fact("days_to_injury", "days_to", "day")
                .map(
                        days ->
                                new ChillingExposure(
                                        row.value("temp_C"),
                                        days,
                                        row.text("kind"),
                                        row.text("visible"),
                                        row.text("bound"),
                                        row.text("stage"),
                                        row.text("variant"),
                                        row.text("tissue"),
                                        row.text("note")));
    }

    private static SproutingRow sprouting(Row row) {
        return new SproutingRow(
                row.number("temp_low_C"),
                row.number("temp_high_C"),
                row.number("rh_limit_pct"),
                row.fact("days_low", "days_high", "day"),
                row.text("effect"),
                row.text("source_id"));
    }

    private static CuringRow curing(Row row) {
        return new CuringRow(
                row.fact("temp_low_C", "temp_high_C", "C"),
                row.fact("rh_low_pct", "rh_high_pct", "pct"),
                row.fact("days_low", "days_high", "day"),
                row.text("source_id"),
                row.text("note"));
    }

    private static RipeningRow ripening(Row row) {
        return new RipeningRow(
                row.text("leg"),
                row.value("temp_low_C"),
                row.number("temp_high_C"),
                row.fact("days_low", "days_high", "day"),
                row.text("ethylene").equals("yes"),
                row.text("source_id"));
    }

    private static AmbientLife ambient(Row row) {
        return new AmbientLife(
                row.text("variant"),
                row.text("ambient_temp_C"),
                row.fact("ambient_life_low_d", "ambient_life_high_d", "day"),
                row.fact("cooled_life_d", "day"),
                row.text("cooling"),
                row.text("note"));
    }

    private static LifeCurveRow curve(Row row) {
        return new LifeCurveRow(
                row.text("variant"),
                row.value("slope_kJ_mol"),
                row.value("slope_sd_kJ_mol"),
                row.value("own_weight"),
                row.number("temp_min_C"),
                row.number("temp_max_C"),
                (int) row.value("temperatures"),
                row.number("shortest_days"),
                row.number("longest_days"),
                row.value("source_sd_ln"),
                row.value("crop_sd_share"),
                List.of(row.text("source_id").split(";", -1)));
    }
}
