package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import tools.jackson.databind.JsonNode;

/** Names and numbers of a JSON answer. */
final class JsonNames {
    private JsonNames() {}

    /**
     * Checks that every object at a place has all the names.
     *
     * @param root the answer
     * @param place such as {@code lots[].daysLeft}; empty for the root; a null on the way is passed
     *     over, but one object must be there
     * @param names the names
     */
    static void check(JsonNode root, String place, String... names) {
        List<JsonNode> objects = at(root, place);
        assertFalse(objects.isEmpty(), "nothing stands at " + place);
        for (JsonNode object : objects) {
            Set<String> missing = new TreeSet<>(List.of(names));
            missing.removeAll(object.propertyNames());
            assertEquals(Set.of(), missing, "missing at " + place + ": " + object);
        }
    }

    /** Returns what stands at a place, nulls left out. */
    static List<JsonNode> at(JsonNode root, String place) {
        List<JsonNode> here = List.of(root);
        for (String step : place.isEmpty() ? new String[0] : place.split("\\.")) {
            List<JsonNode> next = new ArrayList<>();
            boolean list = step.endsWith("[]");
            String name = list ? step.substring(0, step.length() - 2) : step;
            for (JsonNode node : here) {
                JsonNode child = node.required(name);
                if (list) {
                    child.forEach(next::add);
                } else if (!child.isNull()) {
                    next.add(child);
                }
            }
            here = next;
        }
        return here;
    }

    /** Checks that every number is finite and every sentence is whole. */
    static void finite(JsonNode node) {
        if (node.isNumber()) {
            assertTrue(Double.isFinite(node.asDouble()), node.toString());
        } else if (node.isString()) {
            String text = node.asString();
            assertFalse(text.contains("{") || text.contains("NaN"), text);
        }
        node.forEach(JsonNames::finite);
    }
}
