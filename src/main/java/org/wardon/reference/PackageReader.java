package org.wardon.reference;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Fact;
import org.wardon.produce.PackageClass;
import org.wardon.produce.PackageKind;

/**
 * Reads packages: the half-cooling time of one table, vapour and tare of another, joined by the
 * table {@code package_classes}.
 *
 * <p>Choice: a class takes the whole span of its published ratios; where there is none, the assumed
 * range of {@code package_class_values}. The id of a class is a package too: the broad time of room
 * cooling with that class's vapour and tare.
 */
final class PackageReader {
    private static final String BROAD_TIME = "room-cooling-any";

    private final Map<String, PackageClass> classes = new LinkedHashMap<>();
    private final Map<String, PackageKind> kinds = new LinkedHashMap<>();
    private final Map<String, String> withoutTime = new LinkedHashMap<>();

    PackageReader(ReferenceDatabase database) {
        readClasses(database);
        readKinds(database);
        PackageKind broad = kinds.get(BROAD_TIME);
        if (broad != null) {
            classes.values().forEach(each -> kinds.putIfAbsent(each.id(), ofClass(each, broad)));
        }
    }

    Map<String, PackageClass> classes() {
        return classes;
    }

    /** Returns packages with a half-cooling time, by id. */
    Map<String, PackageKind> kinds() {
        return kinds;
    }

    /** Returns descriptions of packages for which print gives no half-cooling time, by id. */
    Map<String, String> withoutTime() {
        return withoutTime;
    }

    private void readClasses(ReferenceDatabase database) {
        Map<String, List<Fact>> ratios = new LinkedHashMap<>();
        for (String table : List.of("package_vapour", "package_class_values")) {
            database.list(
                            "select * from "
                                    + table
                                    + " where rel_vapour_conductance_high is not null order by line",
                            row -> Map.entry(row.text("package_class"), ratio(row)))
                    .forEach(
                            entry ->
                                    ratios.computeIfAbsent(entry.getKey(), id -> new ArrayList<>())
                                            .add(entry.getValue()));
        }
        ratios.forEach((id, facts) -> classes.put(id, packageClass(database, id, span(facts))));
    }

    private static Fact ratio(Row row) {
        return row.fact("rel_vapour_conductance_low", "rel_vapour_conductance_high", "1")
                .orElseThrow();
    }

    /** Returns the span of several trials, with the source and evidence of the first. */
    private static Fact span(List<Fact> facts) {
        Fact first = facts.get(0);
        return new Fact(
                OptionalDouble.of(facts.stream().mapToDouble(Fact::lowest).min().orElseThrow()),
                OptionalDouble.of(facts.stream().mapToDouble(Fact::highest).max().orElseThrow()),
                first.unit(),
                first.sourceId(),
                first.evidence(),
                false);
    }

    private static PackageClass packageClass(ReferenceDatabase database, String id, Fact vapour) {
        List<PackageClass> described =
                database.list(
                        "select heat_path_note, tare_kg_per_kg_low, tare_kg_per_kg_high,"
                                + " stack_half_thickness_m,"
                                + " coalesce(tare_source_id, stack_source_id) as source_id,"
                                + " coalesce(tare_evidence, stack_evidence, 'assumption')"
                                + " as evidence from package_vapour where package_class = ?"
                                + " order by line limit 1",
                        row ->
                                new PackageClass(
                                        id,
                                        row.text("heat_path_note"),
                                        vapour,
                                        row.fact("tare_kg_per_kg_low", "tare_kg_per_kg_high", "1"),
                                        row.fact("stack_half_thickness_m", "m")),
                        id);
        return described.isEmpty()
                ? new PackageClass(id, "", vapour, Optional.empty(), Optional.empty())
                : described.get(0);
    }

    private void readKinds(ReferenceDatabase database) {
        database.list(
                "select p.*, c.package_class, c.broad from packages p"
                        + " join package_classes c on c.package_id = p.package_id order by p.line",
                row -> {
                    String id = row.text("package_id");
                    row.fact("half_cooling_hours_low", "half_cooling_hours_high", "h")
                            .ifPresentOrElse(
                                    time -> kinds.put(id, kind(row, time)),
                                    () -> withoutTime.put(id, row.text("description")));
                    return id;
                });
    }

    private PackageKind kind(Row row, Fact time) {
        PackageClass of = classes.get(row.text("package_class"));
        if (of == null) {
            throw new IllegalStateException("no class " + row.text("package_class"));
        }
        return new PackageKind(
                row.text("package_id"),
                row.text("description"),
                time,
                of.vapourConductance(),
                of.tareKgPerKg(),
                row.text("broad").equals("yes"));
    }

    private static PackageKind ofClass(PackageClass of, PackageKind broad) {
        return new PackageKind(
                of.id(),
                of.id().replace('-', ' ') + ", room cooled; time of any package in a cold room",
                broad.halfCoolingHours(),
                of.vapourConductance(),
                of.tareKgPerKg(),
                true);
    }
}
