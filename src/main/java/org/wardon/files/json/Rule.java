package org.wardon.files.json;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * One part of the schema, references followed. What stands beside a reference is added to what it
 * names.
 *
 * @param own the keywords
 * @param root the whole schema
 */
record Rule(Json.Obj own, Json.Obj root) {
    private static final String DEFS = "#/$defs/";

    static Rule of(Json schema, Json.Obj root) {
        Map<String, Json> keywords = new LinkedHashMap<>(((Json.Obj) schema).members());
        Json reference = keywords.remove("$ref");
        if (reference instanceof Json.Text text) {
            String name = text.value().substring(DEFS.length());
            Part named = Part.root(root).at("$defs").at(name);
            Rule target = of(named.json().orElseThrow(), root);
            target.own.members().forEach(keywords::putIfAbsent);
        }
        return new Rule(new Json.Obj(keywords), root);
    }

    boolean has(String keyword) {
        return own.members().containsKey(keyword);
    }

    Optional<String> word(String keyword) {
        return Part.root(own).at(keyword).text();
    }

    boolean flag(String keyword) {
        return Part.root(own).at(keyword).flag().orElse(false);
    }

    double number(String keyword) {
        return Part.root(own).at(keyword).number().orElseThrow();
    }

    String written(String keyword) {
        return own.members().get(keyword) instanceof Json.Num num ? num.written() : "";
    }

    List<String> words(String keyword) {
        return Part.root(own).at(keyword).items().stream()
                .map(item -> item.text().orElseThrow())
                .toList();
    }

    String type() {
        return word("type").orElse("");
    }

    String constant() {
        Part constant = Part.root(own).at("const");
        return constant.text().orElseGet(() -> constant.json().orElseThrow().shown());
    }

    List<String> propertyNames() {
        return Part.root(own).at("properties").names();
    }

    Optional<Rule> property(String name) {
        return Part.root(own).at("properties").at(name).json().map(json -> of(json, root));
    }

    Optional<Rule> child(String keyword) {
        return Optional.ofNullable(own.members().get(keyword))
                .filter(Json.Obj.class::isInstance)
                .map(json -> of(json, root));
    }

    List<Rule> alternatives() {
        return Part.root(own).at("oneOf").items().stream()
                .map(item -> of(item.json().orElseThrow(), root))
                .toList();
    }

    /** The kinds its alternatives are told apart by; none where they are not. */
    List<String> kinds() {
        return alternatives().stream().flatMap(rule -> rule.kind().stream()).toList();
    }

    List<String> builtKinds() {
        return alternatives().stream()
                .filter(rule -> !rule.flag("x-notBuilt"))
                .flatMap(rule -> rule.kind().stream())
                .toList();
    }

    Optional<String> kind() {
        return property("kind").filter(rule -> rule.has("const")).map(Rule::constant);
    }
}
