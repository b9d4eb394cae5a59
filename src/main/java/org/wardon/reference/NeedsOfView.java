package org.wardon.reference;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.RespirationRow;

/** What the view {@code commodity_needs} says: temperature, humidity and heat of respiration. */
final class NeedsOfView {
    /** The view repeats a commodity's needs with every rate. */
    private static final Query NEEDS =
            new Query(
                    "*",
                    "(select distinct commodity_id, temperature_low_C, temperature_high_C,"
                            + " humidity_low_pct, humidity_high_pct, needs_source_id,"
                            + " needs_evidence from commodity_needs)",
                    "commodity_id",
                    "commodity_id");

    /** Storage temperature, °C, and humidity, percent. */
    private record Needs(Optional<Fact> temperatureC, Optional<Fact> humidityPct) {}

    private final Grouped<Needs> needs;
    private final Grouped<RespirationRow> heat;
    private final Grouped<RespirationRow> laterHeat;

    NeedsOfView(Selection selection) {
        needs = selection.rows(NEEDS, NeedsOfView::needs);
        heat = selection.present(heat(0), NeedsOfView::heat);
        laterHeat = selection.present(heat(1), NeedsOfView::heat);
    }

    private static Query heat(int later) {
        return new Query(
                "heat_at_C, heat_low_W_per_tonne, heat_high_W_per_tonne, state, heat_table,"
                        + " heat_source_id, heat_evidence",
                "(select * from commodity_needs where heat_at_C is not null and later = "
                        + later
                        + ")",
                "commodity_id",
                "state, heat_line");
    }

    /** Returns the storage temperature, °C. */
    Optional<Fact> temperatureC(String id) {
        return needs.of(id).get(0).temperatureC();
    }

    /** Returns the storage humidity, percent. */
    Optional<Fact> humidityPct(String id) {
        return needs.of(id).get(0).humidityPct();
    }

    /** Returns the heat of respiration of all tables, the commodity's own state first. */
    List<RespirationRow> heat(String id) {
        return Stream.concat(sorted(heat.of(id)), sorted(laterHeat.of(id))).toList();
    }

    private static Stream<RespirationRow> sorted(List<RespirationRow> rows) {
        return rows.stream().sorted(Preference.RESPIRATION);
    }

    private static Needs needs(Row row) {
        return new Needs(
                needs(row, "temperature_low_C", "temperature_high_C", "C"),
                needs(row, "humidity_low_pct", "humidity_high_pct", "pct"));
    }

    private static Optional<RespirationRow> heat(Row row) {
        return fact(
                        row.number("heat_low_W_per_tonne"),
                        row.number("heat_high_W_per_tonne"),
                        "W/t",
                        row.text("heat_source_id"),
                        row.evidence("heat_evidence"))
                .map(
                        watts ->
                                new RespirationRow(
                                        row.value("heat_at_C"),
                                        row.text("state"),
                                        watts,
                                        row.text("heat_table")));
    }

    private static Optional<Fact> needs(Row row, String low, String high, String unit) {
        return fact(
                row.number(low),
                row.number(high),
                unit,
                row.text("needs_source_id"),
                row.evidence("needs_evidence"));
    }

    private static Optional<Fact> fact(
            OptionalDouble low,
            OptionalDouble high,
            String unit,
            String source,
            Evidence evidence) {
        return low.isEmpty() && high.isEmpty()
                ? Optional.empty()
                : Optional.of(new Fact(low, high, unit, source, evidence, false));
    }
}
