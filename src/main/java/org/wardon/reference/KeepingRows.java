package org.wardon.reference;

import java.util.List;
import java.util.stream.Stream;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.AmbientLife;
import org.wardon.produce.rows.ChillingExposure;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.CuringRow;
import org.wardon.produce.rows.LifeRow;
import org.wardon.produce.rows.Q10Row;
import org.wardon.produce.rows.SproutingRow;

/** Lives, chilling, sprouting and curing of a commodity. */
final class KeepingRows {
    private static final String STAGE =
            "case when t.ripeness = 'not-stated' and k.later then k.state else t.ripeness end";

    private final ReferenceDatabase database;
    private final String id;

    KeepingRows(ReferenceDatabase database, String id) {
        this.database = database;
        this.id = id;
    }

    Commodity.Keeping keeping() {
        return new Commodity.Keeping(
                lives(),
                Stream.concat(q10s(id).stream(), q10s("class:typical-perishable").stream())
                        .toList(),
                floors(),
                exposures(),
                sprouting(),
                curing(),
                ambient());
    }

    private List<LifeRow> lives() {
        return database.present(
                "select * from life_temperature where commodity_id = ? order by line",
                row ->
                        row.fact("life_days_low", "life_days_high", "day")
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
                                                        row.text("note"))),
                id);
    }

    private List<Q10Row> q10s(String of) {
        return database.present(
                "select * from q10 where commodity_or_class = ? order by line",
                row ->
                        row.printed("q10", "1")
                                .map(
                                        q10 ->
                                                new Q10Row(
                                                        row.value("temp_low_C"),
                                                        row.value("temp_high_C"),
                                                        q10,
                                                        row.text("note"))),
                of);
    }

    private List<ChillingFloor> floors() {
        return Stream.concat(floors(0), floors(1)).toList();
    }

    private Stream<ChillingFloor> floors(int later) {
        return database
                .list(
                        "select t.*, coalesce(lowest_safe_high_C, lowest_safe_C) as highest_C, "
                                + STAGE
                                + " as stage from commodity_rows k join chilling t"
                                + " on t.commodity_id = k.rows_of"
                                + " where k.commodity_id = ? and k.later = ? order by t.line",
                        row ->
                                new ChillingFloor(
                                        row.fact("lowest_safe_C", "highest_C", "C"),
                                        row.number("lowest_safe_C").isPresent(),
                                        row.text("symptoms"),
                                        row.text("stage"),
                                        row.text("variant"),
                                        row.text("tissue"),
                                        row.text("zone"),
                                        row.number("band_low_C"),
                                        row.text("source_id")),
                        id,
                        later)
                .stream()
                .sorted(Preference.FLOOR);
    }

    private List<ChillingExposure> exposures() {
        return database.present(
                "select t.*, coalesce(days_high, days_to_injury) as days_to, "
                        + STAGE
                        + " as stage from commodity_rows k join chilling_exposure t"
                        + " on t.commodity_id = k.rows_of"
                        + " where k.commodity_id = ? order by k.later, t.line",
                row ->
                        row.fact("days_to_injury", "days_to", "day")
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
                                                        row.text("note"))),
                id);
    }

    private List<SproutingRow> sprouting() {
        return database.list(
                "select * from sprouting where commodity_id = ? order by line",
                row ->
                        new SproutingRow(
                                row.number("temp_low_C"),
                                row.number("temp_high_C"),
                                row.number("rh_limit_pct"),
                                row.fact("days_low", "days_high", "day"),
                                row.text("effect"),
                                row.text("source_id")),
                id);
    }

    private List<CuringRow> curing() {
        return database.list(
                "select * from curing where commodity_id = ? and source_id is not null"
                        + " order by line",
                row ->
                        new CuringRow(
                                row.fact("temp_low_C", "temp_high_C", "C"),
                                row.fact("rh_low_pct", "rh_high_pct", "pct"),
                                row.fact("days_low", "days_high", "day"),
                                row.text("source_id"),
                                row.text("note")),
                id);
    }

    private List<AmbientLife> ambient() {
        return database.list(
                "select * from ambient_practice where commodity_id = ? order by line",
                row ->
                        new AmbientLife(
                                row.text("variant"),
                                row.text("ambient_temp_C"),
                                row.fact("ambient_life_low_d", "ambient_life_high_d", "day"),
                                row.fact("cooled_life_d", "day"),
                                row.text("cooling"),
                                row.text("note")),
                id);
    }
}
