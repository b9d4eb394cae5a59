package org.wardon.reference;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.RespirationRow;

/**
 * What the view {@code commodity_needs} says of one commodity.
 *
 * @param temperatureC storage temperature, °C
 * @param humidityPct storage humidity, percent
 * @param heat heat of respiration of all tables, the commodity's own state first
 */
record NeedsOfView(
        Optional<Fact> temperatureC, Optional<Fact> humidityPct, List<RespirationRow> heat) {
    NeedsOfView {
        heat = List.copyOf(heat);
    }

    /** One row of the view. */
    private record ViewRow(
            Optional<Fact> temperatureC,
            Optional<Fact> humidityPct,
            Optional<RespirationRow> heat,
            boolean later) {}

    static NeedsOfView of(ReferenceDatabase database, String id) {
        List<ViewRow> rows =
                database.list(
                        "select * from commodity_needs where commodity_id = ?"
                                + " order by later, state, heat_line",
                        NeedsOfView::viewRow,
                        id);
        return new NeedsOfView(
                rows.get(0).temperatureC(),
                rows.get(0).humidityPct(),
                Stream.concat(heat(rows, false), heat(rows, true)).toList());
    }

    private static Stream<RespirationRow> heat(List<ViewRow> rows, boolean later) {
        return rows.stream()
                .filter(row -> row.later() == later)
                .flatMap(row -> row.heat().stream())
                .sorted(Preference.RESPIRATION);
    }

    private static ViewRow viewRow(Row row) {
        return new ViewRow(
                needs(row, "temperature_low_C", "temperature_high_C", "C"),
                needs(row, "humidity_low_pct", "humidity_high_pct", "pct"),
                heat(row),
                row.value("later") > 0);
    }

    private static Optional<RespirationRow> heat(Row row) {
        if (row.number("heat_at_C").isEmpty()) {
            return Optional.empty();
        }
        Evidence evidence = row.evidence("heat_evidence");
        return fact(
                        row.number("heat_low_W_per_tonne"),
                        row.number("heat_high_W_per_tonne"),
                        "W/t",
                        row.text("heat_source_id"),
                        evidence)
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
