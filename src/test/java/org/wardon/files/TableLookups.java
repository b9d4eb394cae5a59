package org.wardon.files;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.enclosure.Material;
import org.wardon.produce.Evidence;

/** The ids of the tables we carry, read straight from their CSV files. */
public final class TableLookups {
    private static final Path TABLES = Path.of("reference-tables");

    private TableLookups() {}

    public static Lookups read() {
        Set<String> commodities = new HashSet<>();
        rows("crops/commodities.csv").forEach(row -> commodities.add(row.getField("commodity_id")));
        Set<String> packages = new HashSet<>();
        for (NamedCsvRecord row : rows("stores/packages.csv")) {
            if (number(row, "half_cooling_hours_low").isPresent()) {
                packages.add(row.getField("package_id"));
            }
        }
        Map<String, NamedCsvRecord> moisture = new HashMap<>();
        rows("stores/material-moisture.csv")
                .forEach(row -> moisture.put(row.getField("material_id"), row));
        Map<String, Material> materials = new HashMap<>();
        for (NamedCsvRecord row : rows("stores/materials.csv")) {
            materials.put(row.getField("material_id"), material(row, moisture));
        }
        Map<String, Double> protections = new HashMap<>();
        for (NamedCsvRecord row : rows("stores/doorways.csv")) {
            OptionalDouble low = number(row, "effectiveness_min");
            OptionalDouble high = number(row, "effectiveness_max");
            if (low.isPresent() && high.isPresent()) {
                protections.put(
                        row.getField("doorway_id"),
                        number(row, "effectiveness_typical")
                                .orElse((low.getAsDouble() + high.getAsDouble()) / 2));
            }
        }
        return new Lookups(
                commodities,
                Map.of("mango", Set.of("kensington", "okrong"), "okra", Set.of()),
                packages,
                materials,
                protections);
    }

    private static Material material(NamedCsvRecord row, Map<String, NamedCsvRecord> moisture) {
        NamedCsvRecord wet = moisture.get(row.getField("material_id"));
        return new Material(
                row.getField("material_id"),
                row.getField("name"),
                number(row, "conductivity_W_mK"),
                number(row, "density_kg_m3"),
                number(row, "specific_heat_J_kgK"),
                number(row, "solar_absorptance"),
                number(row, "resistance_m2K_W"),
                wet == null
                        ? Material.Moisture.UNKNOWN
                        : new Material.Moisture(
                                number(wet, "vapour_resistance_factor"),
                                number(wet, "moisture_coefficient")),
                row.getField("source_id"),
                Evidence.MIXED, // several words stand in the column; the reader asks none of them
                row.getField("note"));
    }

    private static OptionalDouble number(NamedCsvRecord row, String column) {
        String cell = row.getField(column);
        return cell.isBlank()
                ? OptionalDouble.empty()
                : OptionalDouble.of(Double.parseDouble(cell));
    }

    private static List<NamedCsvRecord> rows(String name) {
        try (CsvReader<NamedCsvRecord> reader =
                CsvReader.builder()
                        .commentStrategy(CommentStrategy.SKIP)
                        .ofNamedCsvRecord(TABLES.resolve(name))) {
            return reader.stream().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
