package org.wardon.reference;

import java.util.List;
import org.wardon.produce.NamedFact;

/** Reads facts as they are shown to a person. */
final class FactReader {
    private final ReferenceDatabase database;

    FactReader(ReferenceDatabase database) {
        this.database = database;
    }

    /** Returns every printed fact of a commodity, in the order of their kinds. */
    List<NamedFact> ofCommodity(String id) {
        return database.list(
                "select * from commodity_facts where commodity_id in (?, 'any')"
                        + " order by ord, commodity_id = 'any', table_name, line",
                FactReader::fact,
                id);
    }

    List<NamedFact> safetyLimits() {
        String figure = "case when value glob '*[A-Za-z]*' then null else value + 0.0 end";
        return list(
                "quantity as name, "
                        + figure
                        + " as low, "
                        + figure
                        + " as high, unit,"
                        + " case when value glob '*[A-Za-z]*' then value end as text,"
                        + " source_id, note, evidence",
                "safety_limits");
    }

    List<NamedFact> internalLoads() {
        return list(
                "load_id as name, value as low, value as high, unit, null as text, source_id,"
                        + " description || coalesce('; ' || note, '') as note, evidence",
                "internal_loads");
    }

    List<NamedFact> marketPractice() {
        return list(
                "name, low, high, unit, null as text, null as source_id, note, evidence",
                "market_practice");
    }

    List<NamedFact> coolingSources() {
        return list(
                "kind || '/' || parameter as name, coalesce(min, typical) as low,"
                        + " coalesce(max, typical) as high, unit,"
                        + " case when coalesce(min, max, typical) is null then formula end as text,"
                        + " source_id, coalesce(formula, '') || coalesce('; usual ' || typical, '')"
                        + " || coalesce('; ' || note, '') as note, evidence",
                "cooling_sources");
    }

    private List<NamedFact> list(String columns, String table) {
        return database.list(
                "select "
                        + columns
                        + ", '"
                        + table.replace('_', '-')
                        + "' as table_name from "
                        + table
                        + " order by line",
                FactReader::fact);
    }

    private static NamedFact fact(Row row) {
        return new NamedFact(
                row.text("name"),
                row.number("low"),
                row.number("high"),
                row.text("unit"),
                row.text("text"),
                row.source(),
                row.evidence(),
                false,
                row.text("note"),
                row.text("table_name"));
    }
}
