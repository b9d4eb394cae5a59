package org.wardon.reference;

import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.EthyleneEffect;
import org.wardon.produce.rows.GasInjury;
import org.wardon.produce.rows.OdourPair;

/** What a commodity does to others and others to it. */
final class CompanyRows {
    private final ReferenceDatabase database;
    private final String id;

    CompanyRows(ReferenceDatabase database, String id) {
        this.database = database;
        this.id = id;
    }

    Commodity.Company company() {
        return new Commodity.Company(effects(), odours(), gases());
    }

    private List<EthyleneEffect> effects() {
        return database.list(
                "select * from ethylene_effects where commodity_id = ? order by line",
                row ->
                        new EthyleneEffect(
                                row.fact("threshold_uL_L", "uL/L"),
                                row.text("effect"),
                                row.text("source_id")),
                id);
    }

    private List<OdourPair> odours() {
        return database.list(
                "select * from odour_transfer where giver_id = ?1 or taker_id = ?1 order by line",
                row ->
                        new OdourPair(
                                row.text("giver_id"), row.text("taker_id"), row.text("source_id")),
                id);
    }

    private List<GasInjury> gases() {
        return database.list(
                "select * from gas_injury where commodity_id = ?"
                        + " order by source_id = 'KADER1989', line",
                row ->
                        new GasInjury(
                                row.fact("co2_injury_pct", "pct"),
                                row.fact("o2_low_pct", "pct"),
                                row.text("effect"),
                                row.text("source_id")),
                id);
    }
}
