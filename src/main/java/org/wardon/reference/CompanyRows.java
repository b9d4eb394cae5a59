package org.wardon.reference;

import org.wardon.produce.Commodity;
import org.wardon.produce.rows.EthyleneEffect;
import org.wardon.produce.rows.GasInjury;
import org.wardon.produce.rows.OdourPair;

/** What a commodity does to others and others to it. */
final class CompanyRows {
    /** A pair speaks of its giver and of its taker. */
    private static final Query ODOURS =
            new Query(
                    "*",
                    "(select giver_id as party, * from odour_transfer"
                            + " union select taker_id, * from odour_transfer)",
                    "party",
                    "line");

    private static final Query GASES =
            new Query("*", "gas_injury", "commodity_id", "source_id = 'KADER1989', line");

    private final Grouped<EthyleneEffect> effects;
    private final Grouped<OdourPair> odours;
    private final Grouped<GasInjury> gases;

    CompanyRows(Selection selection) {
        effects = selection.rows(Query.table("ethylene_effects"), CompanyRows::effect);
        odours = selection.rows(ODOURS, CompanyRows::odour);
        gases = selection.rows(GASES, CompanyRows::gas);
    }

    Commodity.Company of(String id) {
        return new Commodity.Company(effects.of(id), odours.of(id), gases.of(id));
    }

    private static EthyleneEffect effect(Row row) {
        return new EthyleneEffect(
                row.fact("threshold_uL_L", "uL/L"), row.text("effect"), row.text("source_id"));
    }

    private static OdourPair odour(Row row) {
        return new OdourPair(row.text("giver_id"), row.text("taker_id"), row.text("source_id"));
    }

    private static GasInjury gas(Row row) {
        return new GasInjury(
                row.fact("co2_injury_pct", "pct"),
                row.fact("o2_low_pct", "pct"),
                row.text("effect"),
                row.text("source_id"));
    }
}
