package org.wardon.files;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import org.wardon.enclosure.Material;

/**
 * The ids of the tables a plan may name. Given from outside, so that reading a plan needs no
 * tables.
 *
 * @param commodities ids of commodities
 * @param variants ids of variants that can be chosen, by commodity
 * @param packages ids of packages with a half-cooling time
 * @param materials building materials by id
 * @param protections share of the door's exchange kept back, 0 to 1, by id of the protection
 */
public record Lookups(
        Set<String> commodities,
        Map<String, Set<String>> variants,
        Set<String> packages,
        Map<String, Material> materials,
        Map<String, Double> protections) {
    /** Copies sets and maps; keeps of the materials those that can be layers. */
    public Lookups {
        commodities = Set.copyOf(commodities);
        variants = Map.copyOf(variants);
        packages = Set.copyOf(packages);
        materials = layers(materials);
        protections = Map.copyOf(protections);
    }

    private static Map<String, Material> layers(Map<String, Material> rows) {
        Map<String, Material> layers = new HashMap<>(rows);
        // Surface resistances and finishes stand in the same table but are no layers.
        layers.keySet().removeIf(id -> id.startsWith("film-") || id.startsWith("finish-"));
        return Map.copyOf(layers);
    }
}
