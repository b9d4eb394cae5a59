package org.wardon.files.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * Holds a tree against the part of JSON Schema 2020-12 that our schema uses, and says each mistake
 * once and in words. A general validator tells of every alternative that did not match; tests hold
 * this one against such a validator.
 */
public final class SchemaCheck {
    private final Rule rule;
    private final Faults faults;

    /**
     * Takes a schema.
     *
     * @param schema the whole schema
     * @param faults hears of what does not fit
     */
    public SchemaCheck(Json schema, Faults faults) {
        this.rule = Rule.of(schema, (Json.Obj) schema);
        this.faults = faults;
    }

    /**
     * Checks a tree.
     *
     * @param json the tree
     */
    public void check(Json json) {
        check(json, rule, "$");
    }

    private void check(Json json, Rule rule, String path) {
        if (rule.has("oneOf")) {
            choose(json, rule, path);
        } else if (rule.has("const")) {
            constant(json, rule, path);
        } else if (!fits(json, rule.type())) {
            wrong(path, json, rule);
        } else if (json instanceof Json.Obj object) {
            object(object, rule, path);
        } else if (json instanceof Json.Arr list) {
            list(list, rule, path);
        } else if (json instanceof Json.Num num) {
            number(num, rule, path);
        } else if (json instanceof Json.Text text) {
            text(text, rule, path);
        }
    }

    private static boolean fits(Json json, String type) {
        return switch (type) {
            case "object" -> json instanceof Json.Obj;
            case "array" -> json instanceof Json.Arr;
            case "string" -> json instanceof Json.Text;
            case "boolean" -> json instanceof Json.Flag;
            case "number", "integer" -> json instanceof Json.Num;
            default -> throw new IllegalArgumentException("the schema has no type '" + type + "'");
        };
    }

    private void wrong(String path, Json json, Rule rule) {
        String what = json instanceof Json.Text ? "the text " : "";
        faults.add(path, "is " + what + json.shown(), SchemaWords.accepted(rule));
    }

    private void constant(Json json, Rule rule, String path) {
        Json wanted = new Part(path, Optional.of(rule.own())).at("const").json().orElseThrow();
        boolean numbers = json instanceof Json.Num && wanted instanceof Json.Num;
        boolean same =
                numbers
                        ? ((Json.Num) json).value() == ((Json.Num) wanted).value()
                        : json.shown().equals(wanted.shown());
        if (!same) {
            wrong(path, json, rule);
        }
    }

    private void choose(Json json, Rule rule, String path) {
        if (!rule.kinds().isEmpty() && json instanceof Json.Obj object) {
            byKind(object, rule, path);
            return;
        }
        Optional<Rule> fitting =
                rule.kinds().isEmpty()
                        ? rule.alternatives().stream()
                                .filter(other -> fits(json, other.type()))
                                .findFirst()
                        : Optional.empty();
        if (fitting.isEmpty()) {
            wrong(path, json, rule);
        } else if (fitting.get().has("enum") && json instanceof Json.Text text) {
            // A wrong word may stand for an object too, so all alternatives are named.
            if (!fitting.get().words("enum").contains(text.value())) {
                wrongWord(text, fitting.get(), path, SchemaWords.phrase(rule));
            }
        } else {
            check(json, fitting.get(), path);
        }
    }

    private void byKind(Json.Obj object, Rule rule, String path) {
        Part kind = new Part(path, Optional.of(object)).at("kind");
        String accepted = "accepted: " + SchemaWords.oneOf(rule.builtKinds());
        if (!kind.given()) {
            faults.add(kind.path(), "is missing", accepted);
            return;
        }
        String word = kind.text().orElse("");
        Optional<Rule> chosen =
                rule.alternatives().stream()
                        .filter(other -> other.kind().equals(Optional.of(word)))
                        .findFirst();
        if (chosen.isEmpty()) {
            faults.add(
                    kind.path(),
                    "is " + kind.json().orElseThrow().shown(),
                    Nearest.question(word, rule.kinds()) + accepted);
        } else if (chosen.get().flag("x-notBuilt")) {
            faults.add(
                    kind.path(),
                    "'" + word + "' is not built yet",
                    "accepted now: " + String.join(", ", rule.builtKinds()));
        } else {
            check(object, chosen.get(), path);
        }
    }

    private void object(Json.Obj object, Rule rule, String path) {
        List<String> meant = new ArrayList<>();
        int known = 0;
        for (Map.Entry<String, Json> member : object.members().entrySet()) {
            String where = Json.member(path, member.getKey());
            Optional<Rule> property = rule.property(member.getKey());
            if (property.isPresent()) {
                known++;
                property(member.getValue(), property.get(), where, member.getKey(), rule);
            } else if (rule.child("additionalProperties").isPresent()) {
                freeName(member.getKey(), rule, where);
                check(member.getValue(), rule.child("additionalProperties").get(), where);
            } else {
                unknown(member.getKey(), object, rule, where, meant);
            }
        }
        missing(object, rule, path, meant);
        amount(object, rule, path, known, !meant.isEmpty());
    }

    private void property(Json value, Rule property, String where, String name, Rule owner) {
        if (property.flag("x-notBuilt")) {
            List<String> built =
                    owner.propertyNames().stream()
                            .filter(
                                    other ->
                                            !owner.property(other).orElseThrow().flag("x-notBuilt"))
                            .toList();
            faults.add(
                    where,
                    "'" + name + "' is not built yet",
                    "accepted now: " + String.join(", ", built));
        } else {
            check(value, property, where);
        }
    }

    private void freeName(String name, Rule rule, String where) {
        Pattern pattern =
                Pattern.compile(
                        rule.child("propertyNames").flatMap(r -> r.word("pattern")).orElse(".*"));
        if (!pattern.matcher(name).matches()) {
            faults.add(
                    where,
                    "the id has characters that are not accepted",
                    "accepted: 1 to 40 letters, digits, '-' or '_'");
        }
    }

    private void unknown(
            String name, Json.Obj object, Rule rule, String where, List<String> meant) {
        Set<String> given = object.members().keySet();
        List<String> free =
                rule.propertyNames().stream().filter(other -> !given.contains(other)).toList();
        Optional<String> near = Nearest.of(name, free);
        meant.add(near.orElse(""));
        faults.add(
                where,
                "is not a name known here",
                near.map(other -> "did you mean '" + other + "'? ").orElse("")
                        + "accepted: "
                        + String.join(", ", rule.propertyNames()));
    }

    private void missing(Json.Obj object, Rule rule, String path, List<String> meant) {
        for (String name : rule.words("required")) {
            if (!object.members().containsKey(name) && !meant.contains(name)) {
                faults.add(
                        Json.member(path, name),
                        "is missing",
                        SchemaWords.accepted(rule.property(name).orElseThrow()));
            }
        }
        List<List<String>> groups =
                Part.root(rule.own()).at("anyOf").items().stream()
                        .map(
                                item ->
                                        Rule.of(item.json().orElseThrow(), rule.root())
                                                .words("required"))
                        .toList();
        boolean satisfied =
                groups.stream()
                        .anyMatch(
                                group ->
                                        object.members().keySet().containsAll(group)
                                                || group.stream().anyMatch(meant::contains));
        if (!groups.isEmpty() && !satisfied) {
            faults.add(
                    path,
                    "has neither "
                            + String.join(
                                    " nor ", groups.stream().map(SchemaWords::allOf).toList()),
                    "accepted: one of these");
        }
    }

    private void amount(Json.Obj object, Rule rule, String path, int known, boolean strange) {
        boolean few = rule.has("minProperties") && known < rule.number("minProperties");
        int most =
                rule.has("maxProperties") ? (int) rule.number("maxProperties") : Integer.MAX_VALUE;
        int all = rule.child("additionalProperties").isPresent() ? object.members().size() : known;
        if (few && !strange) {
            faults.add(path, "is empty", SchemaWords.accepted(rule));
        } else if (all > most) {
            faults.add(path, "has " + all + " names", SchemaWords.accepted(rule));
        }
    }

    private void list(Json.Arr list, Rule rule, String path) {
        int size = list.items().size();
        if (rule.has("minItems") && size < rule.number("minItems")) {
            faults.add(path, size == 0 ? "is empty" : "has " + size, SchemaWords.accepted(rule));
            return;
        }
        if (rule.has("maxItems") && size > rule.number("maxItems")) {
            faults.add(
                    path,
                    "has " + size + " entries",
                    "accepted: at most " + rule.written("maxItems"));
            return;
        }
        Optional<Rule> items = rule.child("items");
        for (int i = 0; i < size && items.isPresent(); i++) {
            check(list.items().get(i), items.get(), path + "[" + i + "]");
        }
    }

    private void number(Json.Num num, Rule rule, String path) {
        double value = num.value();
        boolean whole = !rule.type().equals("integer") || value == Math.rint(value);
        if (!whole || value < rule.number("minimum") || value > rule.number("maximum")) {
            String unit = rule.word("x-unit").map(word -> " " + word).orElse("");
            faults.add(path, "is " + num.shown() + unit, SchemaWords.accepted(rule));
        }
    }

    private void text(Json.Text text, Rule rule, String path) {
        String value = text.value();
        String form = rule.word("x-form").orElse("");
        if (rule.has("enum") && !rule.words("enum").contains(value)) {
            wrongWord(text, rule, path, SchemaWords.phrase(rule));
        } else if (rule.word("pattern").filter(p -> !Pattern.matches(p, value)).isPresent()) {
            faults.add(path, Form.misshapen(form, value), SchemaWords.accepted(rule));
        } else if (badLength(value, rule)) {
            faults.add(
                    path,
                    value.isEmpty() ? "is an empty text" : "has " + value.length() + " characters",
                    SchemaWords.accepted(rule));
        } else if (!form.isEmpty()) {
            Form.trouble(form, value)
                    .ifPresent(
                            what ->
                                    faults.add(
                                            path,
                                            what,
                                            Form.question(form, value)
                                                    + SchemaWords.accepted(rule)));
        }
    }

    private static boolean badLength(String value, Rule rule) {
        boolean tooLong = rule.has("maxLength") && value.length() > rule.number("maxLength");
        boolean tooShort = rule.has("minLength") && value.length() < rule.number("minLength");
        return tooLong || tooShort;
    }

    private void wrongWord(Json.Text text, Rule rule, String path, String accepted) {
        faults.add(
                path,
                "is " + text.shown(),
                Nearest.question(text.value(), rule.words("enum")) + "accepted: " + accepted);
    }
}
