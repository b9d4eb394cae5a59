package org.wardon.reference;

import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.EthyleneRate;
import org.wardon.produce.rows.RespirationPower;
import org.wardon.produce.rows.RespirationRow;

/** Respiration and ethylene of a commodity. */
final class BreathRows {
    private final ReferenceDatabase database;
    private final String id;

    BreathRows(ReferenceDatabase database, String id) {
        this.database = database;
        this.id = id;
    }

    Commodity.Breath breath(List<RespirationRow> heat) {
        return new Commodity.Breath(heat, powers(), ethylene());
    }

    private List<RespirationPower> powers() {
        return database.list(
                "select * from respiration_heat_coefficients where commodity_id = ?",
                row ->
                        new RespirationPower(
                                row.value("f"),
                                row.value("g"),
                                row.text("source_id"),
                                row.evidence(),
                                row.text("evidence_text")),
                id);
    }

    private List<EthyleneRate> ethylene() {
        return database.present(
                "select e.*, case when e.ripeness = 'not-stated' and k.later then k.state"
                        + " else e.ripeness end as stage from commodity_rows k"
                        + " join ethylene e on e.commodity_id = k.rows_of"
                        + " where k.commodity_id = ? order by k.later, e.line",
                row ->
                        row.fact("uL_C2H4_kg_h_low", "uL_C2H4_kg_h_high", "uL/(kg h)")
                                .map(
                                        rate ->
                                                new EthyleneRate(
                                                        row.number("temp_C"),
                                                        rate,
                                                        row.text("stage"))),
                id);
    }
}
