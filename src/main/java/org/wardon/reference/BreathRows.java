package org.wardon.reference;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.EthyleneRate;
import org.wardon.produce.rows.RespirationPower;
import org.wardon.produce.rows.RespirationRow;

/** Respiration and ethylene of a commodity. */
final class BreathRows {
    private static final Query ETHYLENE =
            new Query(
                    "e.*, case when e.ripeness = 'not-stated' and k.later then k.state"
                            + " else e.ripeness end as stage",
                    "commodity_rows k join ethylene e on e.commodity_id = k.rows_of",
                    "k.commodity_id",
                    "k.later, e.line");

    private final Grouped<RespirationPower> powers;
    private final Grouped<EthyleneRate> ethylene;

    BreathRows(Selection selection) {
        powers = selection.rows(Query.table("respiration_heat_coefficients"), BreathRows::power);
        ethylene = selection.present(ETHYLENE, BreathRows::ethylene);
    }

    Commodity.Breath of(String id, List<RespirationRow> heat) {
        return new Commodity.Breath(heat, powers.of(id), ethylene.of(id));
    }

    private static RespirationPower power(Row row) {
        return new RespirationPower(
                row.value("f"),
                row.value("g"),
                row.text("source_id"),
                row.evidence(),
                row.text("evidence_text"));
    }

    private static Optional<EthyleneRate> ethylene(Row row) {
        return row.fact("uL_C2H4_kg_h_low", "uL_C2H4_kg_h_high", "uL/(kg h)")
                .map(rate -> new EthyleneRate(row.number("temp_C"), rate, row.text("stage")));
    }
}
