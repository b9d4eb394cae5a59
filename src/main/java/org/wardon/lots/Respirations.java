package org.wardon.lots;

import java.util.ArrayList;
import java.util.DoubleSummaryStatistics;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.RespirationPower;
import org.wardon.produce.rows.RespirationRow;

/**
 * Chooses what a commodity breathes by.
 *
 * <p>Rule: the chosen table's rows of the state that is wanted, else those of no stated state, else
 * the same in the other tables, else all rows of the chosen table together; the published power law
 * only where there is no row; else the class. From turning on the ripe rows hold, unless rows of
 * turning fruit are printed. Unknown ripeness takes all states, low to high. Temperatures the
 * chosen table lacks are filled from other sources that agree with it, see {@link RespirationGaps}.
 */
public final class Respirations {
    /**
     * Spread of the class curve, × or ÷ (assumption). Measured by leaving out one commodity after
     * the other: its printed curve lies within three times of the median of its plant part for five
     * in six, within two times for two in three.
     */
    static final double CLASS_SPREAD = 3;

    private static final String NOT_STATED = "not-stated";
    private static final String UNCURED = "uncured";

    private Respirations() {}

    /**
     * Returns the curve of a commodity.
     *
     * @param commodity the commodity
     * @param ripeness how far it has come
     * @param classes class values, for a commodity nobody measured
     * @param share share of the range, 0 low to 1 high
     * @return the curve and what it rests on
     */
    public static WithReasons<RespirationCurve> of(
            Commodity commodity, Ripeness ripeness, ClassValues classes, double share) {
        return own(commodity, ripeness, share).orElseGet(() -> ofClass(commodity, classes, share));
    }

    /** The curve that rests on the commodity's own rows or power law. */
    static Optional<WithReasons<RespirationCurve>> own(
            Commodity commodity, Ripeness ripeness, double share) {
        List<RespirationRow> usable =
                usable(commodity).filter(row -> !row.state().equals(UNCURED)).toList();
        List<RespirationRow> rows = chosen(usable, states(ripeness));
        if (!rows.isEmpty()) {
            RespirationGaps gaps = RespirationGaps.filled(rows, usable);
            return Optional.of(ofRows(commodity.id(), rows, gaps, share));
        }
        return commodity.breath().powers().stream()
                .findFirst()
                .map(law -> ofPower(commodity.id(), law, share));
    }

    /**
     * Returns the printed rows that the curve goes through.
     *
     * @param commodity the commodity
     * @param ripeness how far it has come
     * @return the rows chosen and those that fill their gaps; none where it rests on a power law or
     *     on the class
     */
    public static List<RespirationRow> taken(Commodity commodity, Ripeness ripeness) {
        List<RespirationRow> usable =
                usable(commodity).filter(row -> !row.state().equals(UNCURED)).toList();
        List<RespirationRow> rows = chosen(usable, states(ripeness));
        if (rows.isEmpty()) {
            return rows;
        }
        RespirationGaps gaps = RespirationGaps.filled(rows, usable);
        return usable.stream().filter(row -> rows.contains(row) || gaps.filledBy(row)).toList();
    }

    /**
     * Returns the curve of a root or bulb that has not been cured.
     *
     * @param commodity the commodity
     * @param share share of the range, 0 low to 1 high
     * @return the curve of its uncured rows and what it rests on; empty where none are printed
     */
    public static Optional<WithReasons<RespirationCurve>> uncured(
            Commodity commodity, double share) {
        List<RespirationRow> rows =
                usable(commodity).filter(row -> row.state().equals(UNCURED)).toList();
        return rows.isEmpty()
                ? Optional.empty()
                : Optional.of(ofRows(commodity.id(), rows, RespirationGaps.leftOpen(rows), share));
    }

    private static Stream<RespirationRow> usable(Commodity commodity) {
        return commodity.breath().respiration().stream()
                .filter(row -> row.wattsPerTonne().lowest() > 0);
    }

    private static List<RespirationRow> chosen(
            List<RespirationRow> rows, List<Predicate<RespirationRow>> states) {
        Set<String> tables = new LinkedHashSet<>();
        rows.forEach(row -> tables.add(RespirationGaps.tableOf(row)));
        for (Predicate<RespirationRow> state : states) {
            for (String table : tables) {
                List<RespirationRow> found =
                        rows.stream()
                                .filter(row -> RespirationGaps.tableOf(row).equals(table))
                                .filter(state)
                                .toList();
                if (!found.isEmpty()) {
                    return found;
                }
            }
        }
        return rows;
    }

    private static List<Predicate<RespirationRow>> states(Ripeness ripeness) {
        Predicate<RespirationRow> any = row -> true;
        return switch (ripeness) {
            case GREEN -> List.of(is("green"), is(NOT_STATED), any);
            case TURNING -> List.of(is("turning"), is("ripe"), is(NOT_STATED), any);
            case RIPE -> List.of(is("ripe"), is(NOT_STATED), any);
            case UNKNOWN -> List.of(any);
        };
    }

    private static Predicate<RespirationRow> is(String state) {
        return row -> row.state().equals(state);
    }

    private static WithReasons<RespirationCurve> ofRows(
            String id, List<RespirationRow> chosen, RespirationGaps gaps, double share) {
        List<Reason> reasons = new ArrayList<>();
        reasons.add(table(id, chosen));
        if (!gaps.filling().isEmpty()) {
            reasons.add(
                    Reason.about(
                            "respiration-filled",
                            id,
                            gaps.filling().firstEntry().getValue().sourceId(),
                            Reason.Argument.of(gaps.filling().firstKey(), "C"),
                            Reason.Argument.of(gaps.filling().lastKey(), "C")));
        }
        gaps.refused()
                .forEach(source -> reasons.add(Reason.about("respiration-differs", id, source)));
        if (gaps.rates().firstKey() > 0 || gaps.rates().lastKey() < 20) {
            reasons.add(Reason.about("respiration-extended", id, "ah66-2002-tab"));
        }
        return new WithReasons<>(RespirationCurve.through(gaps.rates(), share), reasons, false);
    }

    private static Reason table(String id, List<RespirationRow> chosen) {
        DoubleSummaryStatistics printed =
                chosen.stream().mapToDouble(RespirationRow::temperatureC).summaryStatistics();
        return Reason.about(
                "respiration-table",
                id,
                chosen.get(0).wattsPerTonne().sourceId(),
                Reason.Argument.of(printed.getMin(), "C"),
                Reason.Argument.of(printed.getMax(), "C"));
    }

    private static WithReasons<RespirationCurve> ofPower(
            String id, RespirationPower law, double share) {
        NavigableMap<Double, Fact> rates = new TreeMap<>();
        for (int c = 0; c <= 30; c++) {
            double wattsPerTonne = 1000 * RespirationPowerLaw.wattsPerKg(law, c);
            rates.put((double) c, Fact.of(wattsPerTonne, "W/t", law.sourceId(), law.evidence()));
        }
        return new WithReasons<>(
                RespirationCurve.through(rates, share),
                List.of(Reason.about("respiration-power", id, law.sourceId())),
                false);
    }

    private static WithReasons<RespirationCurve> ofClass(
            Commodity commodity, ClassValues classes, double share) {
        ClassValues.Figure<Map<Double, Fact>> rates = classes.respiration(commodity);
        return new WithReasons<>(
                RespirationCurve.through(rates.value(), share),
                List.of(
                        Reason.about(
                                "respiration-class",
                                commodity.id(),
                                ClassValues.SOURCE,
                                Reason.Argument.text(rates.group()),
                                Reason.Argument.of(CLASS_SPREAD, "1"))),
                true);
    }
}
