package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.DynamicTest.dynamicTest;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.wardon.air.normals.MonthlyNormals;
import org.wardon.errors.Fault;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.files.json.SchemaCheck;
import org.wardon.plan.Assumed;
import org.wardon.plan.WeatherSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** The schema against a general validator, against the records' own bounds and their defaults. */
class SchemaTest {
    private static final Path CORPUS = Path.of("src/test/resources/bad-plans");
    private static final Path PLANS = Path.of("src/test/resources/plans");
    private static final JsonNode SCHEMA = JsonMapper.shared().readTree(Schema.text());
    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private static final com.networknt.schema.Schema ORACLE = REGISTRY.getSchema(Schema.text());
    private static final Lookups LOOKUPS = TableLookups.read();

    /** What we refuse beyond JSON Schema: dates that are none, zones, what is not built. */
    private static final List<String> BEYOND =
            List.of(
                    "no day and time",
                    "no day of",
                    "no time of day",
                    "no time zone",
                    "is not built yet");

    @Test
    void isAValidSchemaOfDraft202012() {
        var meta =
                REGISTRY.getSchema(
                        SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        assertEquals(List.of(), meta.validate(Schema.text(), InputFormat.JSON));
    }

    @TestFactory
    Stream<DynamicTest> ourCheckAgreesWithAGeneralValidator() throws IOException {
        List<Path> plans = new ArrayList<>();
        for (Path root : List.of(CORPUS, PLANS)) {
            try (Stream<Path> folders = Files.list(root)) {
                folders.map(path -> path.resolve("plan.json"))
                        .filter(Files::isRegularFile)
                        .sorted()
                        .forEach(plans::add);
            }
        }
        return plans.stream()
                .map(plan -> dynamicTest(plan.getParent().getFileName() + "", () -> agrees(plan)));
    }

    private static void agrees(Path plan) throws IOException {
        String text = new String(Files.readAllBytes(plan), java.nio.charset.StandardCharsets.UTF_8);
        Faults faults = new Faults("plan.json");
        Optional<Json> json = JsonText.read(text, faults);
        if (json.isEmpty() || !faults.list().isEmpty()) {
            return;
        }
        new SchemaCheck(Schema.tree(), faults).check(json.get());
        boolean valid = ORACLE.validate(text, InputFormat.JSON).isEmpty();
        List<Fault> ours = faults.list();
        boolean onlyBeyond =
                ours.stream().allMatch(f -> BEYOND.stream().anyMatch(f.found()::contains));
        assertEquals(valid, onlyBeyond, () -> "ours: " + ours);
    }

    @Test
    void everyNameIsDescribedAndEveryNumberBounded() {
        List<String> silent = new ArrayList<>();
        describe(SCHEMA, "", silent);
        assertEquals(List.of(), silent);
    }

    private static void describe(JsonNode rule, String where, List<String> silent) {
        JsonNode properties = rule.path("properties");
        for (String name : properties.propertyNames()) {
            JsonNode property = resolved(properties.get(name));
            if (!property.has("const") && !property.has("description")) {
                silent.add(where + "." + name + " has no description");
            }
            boolean number =
                    List.of("number", "integer").contains(property.path("type").asString());
            if (number && !(property.has("minimum") && property.has("maximum"))) {
                silent.add(where + "." + name + " has no bounds");
            }
        }
        boolean free = rule.path("additionalProperties").isBoolean();
        if (rule.path("type").asString().equals("object") && properties.size() > 0 && !free) {
            silent.add(where + " accepts unknown names");
        }
        for (String name : rule.propertyNames()) {
            JsonNode child = rule.get(name);
            if (child.isContainer() && !name.equals("anyOf")) {
                describe(child, where + "." + name, silent);
            }
        }
    }

    @Test
    void theRecordsHaveTheSameBounds() {
        ObjectNode plan = read("example");
        ((ArrayNode) plan.at("/chambers/0/outages")).remove(1);
        ((ObjectNode) plan.at("/lots/0")).remove("moves");
        List<String> checked = new ArrayList<>();
        holdBounds(plan, plan, SCHEMA, "$", checked);
        ObjectNode coolers = read("coolers");
        holdBounds(
                coolers,
                coolers.at("/chambers/0/cooling"),
                SCHEMA.at("/$defs/chamber/properties/cooling"),
                "$.chambers[0].cooling",
                checked);
        ObjectNode water = read("water");
        for (int i = 0; i < 2; i++) {
            holdBounds(
                    water,
                    water.at("/chambers/" + i + "/cooling"),
                    SCHEMA.at("/$defs/chamber/properties/cooling"),
                    "$.chambers[" + i + "].cooling",
                    checked);
        }
        ObjectNode steady = read("minimal");
        holdBounds(
                steady, steady.get("weather"), SCHEMA.at("/$defs/weather"), "$.weather", checked);
        assertTrue(checked.size() > 90, "bounds checked: " + checked);
    }

    @Test
    void normalsHaveTheSameBounds() {
        List<Double> low = Collections.nCopies(12, -55.0);
        List<Double> high = Collections.nCopies(12, 50.0);
        List<Double> humid = Collections.nCopies(12, 70.0);
        holdNormal("dailyMaxC", l -> new MonthlyNormals(l, low, humid, Optional.empty()));
        holdNormal("dailyMinC", l -> new MonthlyNormals(high, l, humid, Optional.empty()));
        holdNormal("humidityPct", l -> new MonthlyNormals(high, low, l, Optional.empty()));
        holdNormal("globalKWhM2Day", l -> new MonthlyNormals(high, low, humid, Optional.of(l)));
    }

    private static void holdNormal(String name, Function<List<Double>, MonthlyNormals> make) {
        JsonNode rule = SCHEMA.at("/$defs/weather/properties/normals/properties/" + name);
        double low = rule.at("/items/minimum").asDouble();
        double high = rule.at("/items/maximum").asDouble();
        for (double inside : new double[] {low, high}) {
            assertDoesNotThrow(() -> make.apply(Collections.nCopies(12, inside)), name);
        }
        for (double outside : new double[] {low - 1e-3, high + 1e-3}) {
            assertThrows(
                    IllegalArgumentException.class,
                    () -> make.apply(Collections.nCopies(12, outside)),
                    name + " of " + outside);
        }
        assertEquals(MonthlyNormals.MONTHS, rule.get("minItems").asInt());
        assertEquals(MonthlyNormals.MONTHS, rule.get("maxItems").asInt());
    }

    private static void holdBounds(
            ObjectNode plan, JsonNode value, JsonNode schema, String path, List<String> checked) {
        JsonNode rule = chosen(resolved(schema), value);
        if (value.isObject()) {
            for (String name : List.copyOf(((ObjectNode) value).propertyNames())) {
                JsonNode next =
                        rule.path("properties").has(name)
                                ? rule.get("properties").get(name)
                                : rule.path("additionalProperties");
                JsonNode child = value.get(name);
                if (child.isNumber() && !name.equals("storePlan")) {
                    JsonNode bounds = chosen(resolved(next), child);
                    hold(plan, (ObjectNode) value, name, bounds, path + "." + name);
                    checked.add(path + "." + name);
                } else {
                    holdBounds(plan, child, next, path + "." + name, checked);
                }
            }
        }
        for (int i = 0; value.isArray() && i < value.size(); i++) {
            holdBounds(plan, value.get(i), rule.get("items"), path + "[" + i + "]", checked);
        }
    }

    private static void hold(
            ObjectNode plan, ObjectNode owner, String name, JsonNode bounds, String path) {
        JsonNode kept = owner.get(name);
        double low = bounds.get("minimum").asDouble();
        double high = bounds.get("maximum").asDouble();
        for (double inside : new double[] {low, high}) {
            owner.put(name, inside);
            assertDoesNotThrow(() -> bind(plan), path + " = " + inside);
        }
        double step = bounds.path("type").asString().equals("integer") ? 2 : 1e-3;
        for (double outside :
                new double[] {low - step * Math.max(1, Math.abs(low)), high * (1 + step)}) {
            owner.put(name, outside);
            assertThrows(
                    IllegalArgumentException.class,
                    () -> bind(plan),
                    path + " = " + outside + " is refused by the schema, not by the record");
        }
        owner.set(name, kept);
    }

    private static void bind(ObjectNode plan) {
        Part part =
                Part.root(JsonText.read(plan.toString(), new Faults("plan.json")).orElseThrow());
        WeatherSource weather =
                part.at("weather").has("steady")
                        ? PlanWeather.read(
                                        part,
                                        new FilesOfFolder(Path.of("plan.json")),
                                        new Faults("x"))
                                .orElseThrow()
                        : new WeatherSource.Steady(20, 50);
        new PlanBinder(part, LOOKUPS).bind(weather, "plan");
    }

    @Test
    void everyDefaultToldIsTheSchemasDefault() {
        ObjectNode plan = read("minimal");
        ObjectNode chamber = (ObjectNode) plan.at("/chambers/0");
        chamber.putObject("door").put("widthM", 0.9).put("heightM", 2);
        ArrayNode cooling = chamber.putArray("cooling");
        cooling.addObject().put("kind", "compressor").put("ratedCapacityW", 3500);
        cooling.addObject().put("kind", "evaporative-pad");
        cooling.addObject().put("kind", "night-air");
        cooling.addObject()
                .put("kind", "wetted-wall")
                .put("waterKgPerDay", 40)
                .putArray("wets")
                .add("north");
        ObjectNode jacket = cooling.addObject();
        jacket.put("kind", "water-film").put("flowKgS", 0.3).put("inletC", 6).put("open", false);
        jacket.put("chillerCapacityW", 2_000).putArray("wets").add("south");
        cooling.addObject()
                .put("kind", "ice-bank")
                .put("iceKg", 400)
                .put("uaWK", 80)
                .put("rechargeW", 1_500);
        Part part =
                Part.root(JsonText.read(plan.toString(), new Faults("plan.json")).orElseThrow());
        List<Assumed> told =
                new PlanBinder(part, LOOKUPS)
                        .bind(new WeatherSource.Steady(20, 50), "plan")
                        .assumed();
        int fixed = 0;
        for (Assumed assumed : told) {
            JsonNode rule = ruleAt(plan, assumed.path());
            String description = rule.path("description").asString("");
            assertTrue(
                    description.contains("Default") || assumed.path().contains("layers"),
                    assumed + " is not announced by the schema: " + description);
            if (rule.has("default") && rule.get("default").isNumber()) {
                assertEquals(
                        rule.get("default").asDouble(),
                        Double.parseDouble(assumed.value()),
                        assumed.path());
                fixed++;
            } else if (rule.has("default")) {
                assertEquals(rule.get("default").asString(), assumed.value(), assumed.path());
            }
            if (assumed.mark().equals("common practice, no source")) {
                assertTrue(
                        description.contains(assumed.mark()) || assumed.path().contains("layers"),
                        assumed.path() + " does not say what it rests on: " + description);
            }
        }
        assertTrue(fixed >= 20, "defaults compared: " + fixed);
    }

    private static JsonNode ruleAt(JsonNode plan, String path) {
        JsonNode rule = SCHEMA;
        JsonNode value = plan;
        for (String step : path.substring(2).split("[.\\[]")) {
            rule = chosen(resolved(rule), value);
            if (step.endsWith("]")) {
                int i = Integer.parseInt(step.replace("]", ""));
                value = value.path(i);
                rule = rule.get("items");
            } else {
                value = value.path(step);
                rule =
                        rule.path("properties").has(step)
                                ? rule.get("properties").get(step)
                                : rule.get("additionalProperties");
            }
        }
        return resolved(rule);
    }

    private static JsonNode resolved(JsonNode rule) {
        if (!rule.has("$ref")) {
            return rule;
        }
        ObjectNode whole =
                (ObjectNode)
                        resolved(SCHEMA.at(rule.get("$ref").asString().substring(1))).deepCopy();
        for (Map.Entry<String, JsonNode> own : rule.properties()) {
            whole.set(own.getKey(), own.getValue());
        }
        return whole;
    }

    private static boolean fits(String type, JsonNode value) {
        return switch (type) {
            case "object" -> value.isObject();
            case "array" -> value.isArray();
            default -> !value.isContainer();
        };
    }

    private static JsonNode chosen(JsonNode rule, JsonNode value) {
        for (JsonNode option : rule.path("oneOf")) {
            JsonNode other = resolved(option);
            JsonNode kind = other.path("properties").path("kind").path("const");
            boolean fits =
                    kind.isMissingNode()
                            ? fits(other.path("type").asString(), value)
                            : kind.equals(value.path("kind"));
            if (fits) {
                return other;
            }
        }
        return rule;
    }

    private static ObjectNode read(String name) {
        return (ObjectNode)
                JsonMapper.shared().readTree(PLANS.resolve(name + "/plan.json").toFile());
    }
}
