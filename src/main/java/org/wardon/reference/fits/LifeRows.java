package org.wardon.reference.fits;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.keeping.pooling.LifePoint.Kind;
import org.wardon.produce.Commodity;

/**
 * What every printed row says of a life. A life is counted once: the handbook's own condition is
 * left out where a row among the lives repeats it, and a printed Q10 where its source gave the
 * lives.
 *
 * <p>Rows that ended by ageing, by ripening or by nothing stated, outside the chilling zone, are
 * lives. Whatever else ended a lot says that it had not aged out yet: its life was at least as
 * long. What is at most so long for another reason says nothing.
 */
final class LifeRows {
    private static final Set<String> AGEING = Set.of("senescence", "ripening", "not-stated");
    private static final double WARMEST_RATIO_C = 30;

    private final Map<String, Crop> crops = new LinkedHashMap<>();
    private final List<UsedRow> rows = new ArrayList<>();

    LifeRows(Path tables, List<Commodity> commodities) {
        Path folder = tables.resolve("crops");
        Breathing breathing = new Breathing(folder);
        for (Commodity one : commodities) {
            double slope = breathing.overMiddleKJMol(one.id());
            crops.put(one.id(), new Crop(one.id(), one.plantPart(), slope, Optional.of(one)));
        }
        for (PrintedTable.Line row : PrintedTable.read(folder.resolve("waiting.csv"))) {
            String id = row.text("commodity_id");
            double slope = breathing.overMiddleKJMol(id);
            crops.put(id, new Crop(id, row.text("plant_part"), slope, Optional.empty()));
        }
        PrintedTable.read(folder.resolve("life-temperature.csv")).forEach(this::life);
        new ArrayList<>(crops.values()).forEach(this::handbook);
        new Ratios().read(folder.resolve("q10.csv"));
    }

    List<UsedRow> rows() {
        return List.copyOf(rows);
    }

    List<LifePoint> points() {
        return rows.stream().flatMap(row -> row.point().stream()).toList();
    }

    /** Crops that are commodities or have a life of their own, in the order of their tables. */
    List<Crop> crops() {
        return crops.values().stream()
                .filter(crop -> crop.commodity().isPresent() || hasRow(crop.id()))
                .toList();
    }

    private boolean hasRow(String id) {
        return rows.stream()
                .flatMap(row -> row.point().stream())
                .anyMatch(point -> point.of().crop().equals(id));
    }

    private Crop crop(String id) {
        return Optional.ofNullable(crops.get(id)).orElseThrow();
    }

    private void life(PrintedTable.Line row) {
        Crop crop = crop(row.text("commodity_id"));
        OptionalDouble low = row.number("life_days_low");
        OptionalDouble high = row.number("life_days_high");
        double lowDays = low.orElse(high.orElse(Double.NaN));
        double highDays = high.orElse(lowDays);
        double atC = row.number("temp_C").orElseThrow();
        boolean other =
                !AGEING.contains(row.text("ended_by")) || crop.chills(row.text("ripeness"), atC);
        String bound = row.text("bound");
        String use = other ? (bound.equals("at-most") ? "not-used" : "at-least") : bound;
        String variant = row.text("variant");
        rows.add(
                new UsedRow(
                        "life-temperature",
                        row.line(),
                        variant,
                        lowDays,
                        highDays,
                        bound,
                        use,
                        kind(use)
                                .map(
                                        kind ->
                                                new LifePoint(
                                                        crop.trial(
                                                                variant,
                                                                row.text("source_id"),
                                                                false),
                                                        atC,
                                                        ln(kind, lowDays, highDays),
                                                        kind,
                                                        row.text("note").contains("estimate")))));
    }

    private static Optional<Kind> kind(String use) {
        return switch (use) {
            case "exact" -> Optional.of(Kind.EXACT);
            case "at-least" -> Optional.of(Kind.AT_LEAST);
            case "at-most" -> Optional.of(Kind.AT_MOST);
            default -> Optional.empty();
        };
    }

    private static double ln(Kind kind, double lowDays, double highDays) {
        return switch (kind) {
            case EXACT -> 0.5 * Math.log(lowDays * highDays);
            case AT_LEAST -> Math.log(lowDays);
            case AT_MOST -> Math.log(highDays);
        };
    }

    private void handbook(Crop crop) {
        LifeLevel level = crop.handbook().orElse(null);
        if (level == null || rows.stream().anyMatch(row -> row.repeats(crop, level))) {
            return;
        }
        LifePoint point =
                new LifePoint(
                        crop.trial("", level.sourceId(), false),
                        0.5 * (level.atLowC() + level.atHighC()),
                        0.5 * Math.log(level.lowDays() * level.highDays()),
                        Kind.EXACT,
                        false);
        rows.add(
                new UsedRow(
                        "commodities",
                        0,
                        "",
                        level.lowDays(),
                        level.highDays(),
                        "exact",
                        "exact",
                        Optional.of(point)));
    }

    /** Printed Q10 as pairs of lives of which only the ratio is known. */
    private final class Ratios {
        /** {@code trial -> temperature -> ln life}, up to a constant a trial. */
        private final Map<String, Map<Double, Double>> chains = new LinkedHashMap<>();

        void read(Path table) {
            PrintedTable.read(table).forEach(this::ratio);
        }

        private void ratio(PrintedTable.Line row) {
            String name = row.text("commodity_or_class");
            Optional<Crop> named =
                    crops.values().stream()
                            .filter(c -> name.equals(c.id()) || name.startsWith(c.id() + '-'))
                            .reduce((a, b) -> a.id().length() >= b.id().length() ? a : b);
            if (named.isEmpty()) {
                return;
            }
            Crop crop = named.get();
            double lowC = row.number("temp_low_C").orElseThrow();
            double highC = row.number("temp_high_C").orElseThrow();
            double fall = Math.log(Double.parseDouble(row.text("q10"))) * (highC - lowC) / 10;
            String source = row.text("source_id");
            boolean useless =
                    highC > WARMEST_RATIO_C
                            || crop.chills("not-stated", lowC)
                            || anywhere(crop.id(), source);
            if (useless) {
                return;
            }
            String variant = name.equals(crop.id()) ? "" : name.substring(crop.id().length() + 1);
            Map<Double, Double> chain =
                    chains.computeIfAbsent(name + '|' + source, key -> new LinkedHashMap<>());
            LifePoint.Trial trial = crop.trial(variant, source, true);
            if (chain.isEmpty()) {
                chain.put(lowC, 0.0);
                add(row.line(), variant, new LifePoint(trial, lowC, 0, Kind.EXACT, false));
            }
            double from = Optional.ofNullable(chain.get(lowC)).orElseThrow();
            chain.put(highC, from - fall);
            add(row.line(), variant, new LifePoint(trial, highC, from - fall, Kind.EXACT, false));
        }

        private boolean anywhere(String crop, String source) {
            return rows.stream()
                    .flatMap(row -> row.point().stream())
                    .anyMatch(
                            p ->
                                    !p.of().relative()
                                            && p.of().crop().equals(crop)
                                            && p.of().source().equals(source));
        }

        private void add(long line, String variant, LifePoint point) {
            double days = Math.exp(point.lnDays());
            rows.add(
                    new UsedRow(
                            "q10",
                            line,
                            variant,
                            days,
                            days,
                            "exact",
                            "ratio",
                            Optional.of(point)));
        }
    }
}
