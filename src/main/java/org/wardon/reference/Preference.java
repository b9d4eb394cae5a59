package org.wardon.reference;

import java.util.Comparator;
import java.util.List;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.ChillingFloor;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.MoistureLimit;
import org.wardon.produce.rows.RespirationRow;

/**
 * The rule of choice where tables or sources disagree. It only sorts: the chosen row comes first,
 * every other row stays visible behind it. The reasons stand in decision 1
 * (src/site/markdown/decisions).
 *
 * <ol>
 *   <li>The keeper's own value before any published one.
 *   <li>A row that speaks of the commodity before one of a state it may come to (table {@code
 *       states}), and before one of a class or of produce in general.
 *   <li>Temperature, humidity, life, highest freezing point: {@code commodities}.
 *   <li>Heat of respiration: the table printed as heat, then the main table of carbon dioxide, then
 *       the other one, each by temperature; the power law only where no table has a row.
 *   <li>Composition: the row that carries a freezing point, so that both come from one source.
 *   <li>Otherwise seen before mixed, derived, computed, recalled, practice and assumption; among
 *       equals the order of the table.
 * </ol>
 */
final class Preference {
    private static final List<String> HEAT_TABLES = List.of("heat", "co2", "co2-other");

    private static final List<Evidence> EVIDENCE =
            List.of(
                    Evidence.OWN,
                    Evidence.SEEN,
                    Evidence.MIXED,
                    Evidence.DERIVED,
                    Evidence.COMPUTED,
                    Evidence.MEMORY,
                    Evidence.PRACTICE,
                    Evidence.ASSUMPTION);

    /** Rows of respiration: a state together, then by table, then by temperature. */
    static final Comparator<RespirationRow> RESPIRATION =
            Comparator.comparing(RespirationRow::state)
                    .thenComparing(row -> HEAT_TABLES.indexOf(row.table()))
                    .thenComparing(RespirationRow::temperatureC)
                    .thenComparing(row -> rank(row.wattsPerTonne()));

    /** Compositions: those with a freezing point first. */
    static final Comparator<CompositionRow> COMPOSITION =
            Comparator.<CompositionRow, Integer>comparing(
                            row -> row.initialFreezingC().isPresent() ? 0 : 1)
                    .thenComparing(row -> EVIDENCE.indexOf(row.evidence()));

    /** Chilling floors: those with a temperature that is a limit, then by evidence. */
    static final Comparator<ChillingFloor> FLOOR =
            Comparator.<ChillingFloor, Integer>comparing(row -> row.zone().isEmpty() ? 1 : 0)
                    .thenComparing(row -> row.lowestSafeC().map(Preference::rank).orElse(99));

    /** Permissible losses by evidence. */
    static final Comparator<MoistureLimit> LOSS =
            Comparator.comparing(row -> rank(row.maxLossPct()));

    private Preference() {}

    /** Returns the place of a fact's evidence in the order of trust, 0 first. */
    static int rank(Fact fact) {
        return EVIDENCE.indexOf(fact.evidence());
    }
}
