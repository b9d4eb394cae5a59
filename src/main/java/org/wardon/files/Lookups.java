package org.wardon.files;

import java.util.Map;
import java.util.Set;

/**
 * The ids of the tables a plan may name. Given from outside, so that reading a plan needs no
 * tables.
 *
 * @param commodities ids of commodities
 * @param packages ids of packages with a half-cooling time
 * @param materials building materials by id
 * @param protections share of the door's exchange kept back, 0 to 1, by id of the protection
 */
public record Lookups(
        Set<String> commodities,
        Set<String> packages,
        Map<String, Material> materials,
        Map<String, Double> protections) {
    /** Copies sets and maps. */
    public Lookups {
        commodities = Set.copyOf(commodities);
        packages = Set.copyOf(packages);
        materials = Map.copyOf(materials);
        protections = Map.copyOf(protections);
    }
}
