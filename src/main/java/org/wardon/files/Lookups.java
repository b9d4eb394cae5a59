package org.wardon.files;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;

/**
 * The ids of the tables a plan may name. Given from outside, so that reading a plan needs no
 * tables.
 *
 * @param commodities ids of commodities
 * @param packages ids of packages with a half-cooling time
 * @param materials building materials by id; {@code steel-sheet} is added as a name of {@code
 *     steel}
 * @param protections share of the door's exchange kept back, 0 to 1, by id of the protection
 */
public record Lookups(
        Set<String> commodities,
        Set<String> packages,
        Map<String, Material> materials,
        Map<String, Double> protections) {
    /** Names the trade uses for a material of the tables. */
    private static final Map<String, String> TRADE_NAMES = Map.of("steel-sheet", "steel");

    /** Copies sets and maps; keeps of the materials those that can be layers. */
    public Lookups {
        commodities = Set.copyOf(commodities);
        packages = Set.copyOf(packages);
        materials = layers(materials);
        protections = Map.copyOf(protections);
    }

    private static Map<String, Material> layers(Map<String, Material> rows) {
        Map<String, Material> layers = new HashMap<>(rows);
        // Surface resistances and finishes stand in the same table but are no layers.
        layers.keySet().removeIf(id -> id.startsWith("film-") || id.startsWith("finish-"));
        TRADE_NAMES.forEach(
                (name, id) -> {
                    if (rows.containsKey(id)) {
                        layers.putIfAbsent(name, rows.get(id));
                    }
                });
        return Map.copyOf(layers);
    }
}
