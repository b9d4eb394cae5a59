package org.wardon.files.json;

import java.util.List;
import java.util.stream.Collectors;

/** Says in words what a part of the schema accepts. */
final class SchemaWords {
    private SchemaWords() {}

    static String accepted(Rule rule) {
        return "accepted: " + phrase(rule);
    }

    static String phrase(Rule rule) {
        return rule.word("x-accepted").orElseGet(() -> composed(rule));
    }

    static String oneOf(List<String> words) {
        return words.size() == 1 ? words.get(0) : "one of " + String.join(", ", words);
    }

    static String allOf(List<String> names) {
        return names.size() == 1 ? names.get(0) : "all of " + String.join(", ", names);
    }

    private static String composed(Rule rule) {
        if (rule.has("const")) {
            return rule.constant();
        }
        if (rule.has("enum")) {
            return oneOf(rule.words("enum"));
        }
        if (rule.has("oneOf")) {
            return rule.kinds().isEmpty()
                    ? rule.alternatives().stream()
                            .map(SchemaWords::phrase)
                            .collect(Collectors.joining(" or "))
                    : "an object whose kind is " + oneOf(rule.builtKinds());
        }
        return switch (rule.type()) {
            case "number" -> "a number" + range(rule);
            case "integer" -> "a whole number" + range(rule);
            case "boolean" -> "true or false";
            case "array" -> "a list";
            case "object" -> object(rule);
            default -> "a text" + length(rule);
        };
    }

    static String range(Rule rule) {
        String unit = rule.word("x-unit").map(word -> " " + word).orElse("");
        return " from " + rule.written("minimum") + " to " + rule.written("maximum") + unit;
    }

    private static String length(Rule rule) {
        return rule.has("maxLength")
                ? " of up to " + rule.written("maxLength") + " characters"
                : "";
    }

    private static String object(Rule rule) {
        List<String> required = rule.words("required");
        return required.isEmpty() ? "an object" : "an object with " + String.join(", ", required);
    }
}
