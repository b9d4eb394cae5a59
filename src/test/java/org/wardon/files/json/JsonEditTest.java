package org.wardon.files.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.errors.BadInput;

/** A change by path leaves all other text as it stood. */
class JsonEditTest {
    private static JsonPath path(String path) {
        return JsonPath.parse(path).orElseThrow();
    }

    private static Json tree(String text) {
        return JsonText.read(text, new Faults("t")).orElseThrow();
    }

    private static String demo(String name) throws IOException {
        return Files.readString(Path.of("demo-data", name));
    }

    @Source("RFC 8259, section 7: the seven short escapes and \\u; section 13: its first example")
    @Test
    void namesAreReadAsTheStandardWritesThem() {
        String text = "{\"a\\u0041\\n\\\"\\\\\\/\\b\\f\\r\\t\": 1}";
        JsonPath escaped = JsonPath.ROOT.then(new JsonPath.Member("aA\n\"\\/\b\f\r\t"));
        assertEquals(Optional.of("1"), JsonEdit.of(text).at(escaped));
        String example =
                "{\n  \"Image\": {\n      \"Width\":  800,\n      \"IDs\": [116, 943, 234, 38793]\n"
                        + "    }\n}";
        assertEquals(
                example.replace("943, ", ""),
                JsonEdit.of(example).remove(path("$.Image.IDs[1]")).text());
        assertEquals(
                example.replace("800", "1.50"),
                JsonEdit.of(example).set(path("$.Image.Width"), "1.50").text());
    }

    @ParameterizedTest(name = "{0} at {1} is {2}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{}|$.a|`{\"a\": 9}`",
                "{ }|$.a.b|`{\"a\": {\"b\": 9}}`",
                "`{\"a\":1}`|$.b|`{\"a\":1, \"b\": 9}`",
                "`{\"a\":[]}`|$.a[0]|`{\"a\":[9]}`",
                "`{\"a\":[1, 2]}`|$.a[2]|`{\"a\":[1, 2, 9]}`",
                "`{\"x\": 1.0e0 , \"a\": {} }`|$.a['80-x']|`{\"x\": 1.0e0 , \"a\": {\"80-x\": 9} }`",
                "[1]|$[0]|[9]"
            })
    void set(String text, String path, String wanted) {
        assertEquals(wanted, JsonEdit.of(text).set(path(path), "9").text());
    }

    @Test
    void membersOnLinesOfTheirOwnGetALine() {
        String text = "{\n  \"a\": 1,\n  \"b\": 2\n}\n";
        assertEquals(
                "{\n  \"a\": 1,\n  \"b\": 2,\n  \"c\": 3\n}\n",
                JsonEdit.of(text).set(path("$.c"), "3").text());
        String list = "[\n  {\"a\": 1},\n  {\"a\": 2}\n]";
        assertEquals(
                "[\n  {\"a\": 0},\n  {\"a\": 1},\n  {\"a\": 2}\n]",
                JsonEdit.of(list).insert(JsonPath.ROOT, 0, "{\"a\": 0}").text());
        assertEquals(
                "[\n  {\"a\": 2},\n  {\"a\": 1}\n]",
                JsonEdit.of(list).swap(JsonPath.ROOT, 0).text());
    }

    /** Every place of both demo plans: gone back and forth, the text is the one it was. */
    @ParameterizedTest
    @ValueSource(strings = {"landing.json", "hillside.json"})
    void thereAndBackLeavesTheTextAsItWas(String plan) throws IOException {
        String text = demo(plan);
        List<JsonPath> all = new ArrayList<>();
        collect(tree(text), JsonPath.ROOT, all);
        assertTrue(all.size() > 300, "only " + all.size() + " places");
        JsonEdit edit = JsonEdit.of(text);
        for (JsonPath path : all) {
            assertEquals(path, path(path.toString()));
            String there = edit.at(path).orElseThrow();
            JsonEdit other = edit.set(path, "\"other\"");
            assertEquals(text, other.set(path, there).text(), path.toString());
            if (path.last().orElseThrow() instanceof JsonPath.Item item) {
                JsonEdit copied = edit.copy(path.up(), item.index());
                JsonPath second = path.up().then(new JsonPath.Item(item.index() + 1));
                assertEquals(text, copied.remove(second).text(), path.toString());
                assertEquals(text, copied.swap(path.up(), item.index()).remove(second).text());
            }
        }
    }

    /** Removing a place takes it away and nothing else, as the tree sees it. */
    @Test
    void removingTakesOnePlaceOnly() throws IOException {
        String text = demo("landing.json");
        List<JsonPath> all = new ArrayList<>();
        collect(tree(text), JsonPath.ROOT, all);
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 200; i++) {
            JsonPath path = all.get(random.nextInt(all.size()));
            String less = JsonEdit.of(text).remove(path).text();
            assertEquals(without(tree(text), path.steps()), tree(less), "seed 7: " + path);
        }
    }

    private static Json without(Json json, List<JsonPath.Step> steps) {
        JsonPath.Step step = steps.get(0);
        List<JsonPath.Step> rest = steps.subList(1, steps.size());
        if (step instanceof JsonPath.Item item) {
            List<Json> items = new ArrayList<>(((Json.Arr) json).items());
            Json old = items.remove(item.index());
            if (!rest.isEmpty()) {
                items.add(item.index(), without(old, rest));
            }
            return new Json.Arr(items);
        }
        String name = ((JsonPath.Member) step).name();
        Map<String, Json> members = new java.util.LinkedHashMap<>(((Json.Obj) json).members());
        if (rest.isEmpty()) {
            members.remove(name);
        } else {
            members.put(name, without(members.get(name), rest));
        }
        return new Json.Obj(members);
    }

    private static void collect(Json json, JsonPath path, List<JsonPath> all) {
        if (!path.steps().isEmpty()) {
            all.add(path);
        }
        if (json instanceof Json.Obj object) {
            object.members().forEach((n, v) -> collect(v, path.then(new JsonPath.Member(n)), all));
        } else if (json instanceof Json.Arr list) {
            for (int i = 0; i < list.items().size(); i++) {
                collect(list.items().get(i), path.then(new JsonPath.Item(i)), all);
            }
        }
    }

    @Test
    void quotedTextReadsAsItWas() {
        String hard = "a\"b\\c\nd\u0001é";
        assertEquals(new Json.Text(hard), tree(JsonEdit.quoted(hard)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "a", "$a", "$.", "$[x]", "$.a[", "$['a]", "$.a b"})
    void whatIsNoPathIsNone(String text) {
        assertEquals(Optional.empty(), JsonPath.parse(text));
    }

    @Test
    void badPlacesAreRefused() {
        BadInput noJson = assertThrows(BadInput.class, () -> JsonEdit.of("{\"a\": }"));
        assertEquals(
                "JSON line 1, column 7: an unexpected '}'; accepted: a value, or matching brackets",
                noJson.getMessage());
        JsonEdit edit = JsonEdit.of("{\"a\": 1, \"l\": [1]}");
        IllegalArgumentException number =
                assertThrows(IllegalArgumentException.class, () -> edit.set(path("$.a.b"), "1"));
        assertEquals("$.a is no object", number.getMessage());
        assertEquals(
                "$.a is no list",
                assertThrows(IllegalArgumentException.class, () -> edit.insert(path("$.a"), 0, "1"))
                        .getMessage());
        assertThrows(IllegalArgumentException.class, () -> edit.swap(path("$.l"), 0));
        assertEquals(edit.text(), edit.remove(path("$.z")).text());
    }
}
