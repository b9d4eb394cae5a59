package org.wardon.files.form;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.files.Schema;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;

/** What is typed into a form of a plan changes its text there and nowhere else. */
class PlanChangeTest {
    /** Numbers as the plan has them. */
    private static final NumberText PLAIN =
            new NumberText() {
                @Override
                public String shown(String written, String unit) {
                    return written;
                }

                @Override
                public Optional<String> read(String typed, String unit) {
                    return typed.matches("-?\\d+(\\.\\d+)?")
                            ? Optional.of(typed)
                            : Optional.empty();
                }
            };

    private static final PlanChange CHANGE = new PlanChange(PLAIN);

    private static String demo(String name) throws IOException {
        return Files.readString(Path.of("demo-data", name));
    }

    private static PlanChange.Typed values(String... pathsAndValues) {
        Map<String, String> values = new HashMap<>();
        for (int i = 0; i < pathsAndValues.length; i += 2) {
            values.put(pathsAndValues[i], pathsAndValues[i + 1]);
        }
        return new PlanChange.Typed(values, Map.of(), Map.of());
    }

    private static JsonPath path(String path) {
        return JsonPath.parse(path).orElseThrow();
    }

    /** Everything shown and sent back untouched, of every place there is. */
    @ParameterizedTest
    @ValueSource(strings = {"landing.json", "hillside.json"})
    void whatIsLeftAloneStaysAsItWasWritten(String plan) throws IOException {
        String text = demo(plan);
        Map<String, String> values = new HashMap<>();
        Map<String, String> options = new HashMap<>();
        Map<String, List<String>> sets = new HashMap<>();
        collect(PlanForm.of(text).root(), values, options, sets);
        assertTrue(values.size() > 600, "only " + values.size() + " places");
        assertEquals(text, CHANGE.apply(text, new PlanChange.Typed(values, options, sets)));
    }

    private static void collect(
            FormPlace place,
            Map<String, String> values,
            Map<String, String> options,
            Map<String, List<String>> sets) {
        String at = place.path().toString();
        if (place.shape() instanceof Shape.Choice choice && !choice.options().isEmpty()) {
            options.put(at, place.taken().map(Shape.Option::word).orElse(""));
            if (place.taken().filter(o -> o.by() == Shape.By.TYPE).isPresent()) {
                values.put(at, CHANGE.shown(place));
                return;
            }
        } else if (place.shape() instanceof Shape.Listed list && list.of() instanceof Shape.Words) {
            sets.put(at, place.places().stream().map(FormPlace::written).toList());
            return;
        } else if (place.shape() instanceof Shape.Listed list
                && !(list.of() instanceof Shape.Group)
                && !(list.of() instanceof Shape.Choice)) {
            values.put(at, CHANGE.shown(place));
            return;
        } else if (!(place.shape() instanceof Shape.Group)
                && !(place.shape() instanceof Shape.Listed)
                && !(place.shape() instanceof Shape.Named)
                && !(place.shape() instanceof Shape.Fixed)) {
            values.put(at, CHANGE.shown(place));
        }
        if (place.given() || place.shape() instanceof Shape.Group) {
            place.places().forEach(one -> collect(one, values, options, sets));
        }
    }

    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "$.chambers[0].setting.temperatureC|14|\"temperatureC\": 13,|\"temperatureC\": 14,",
                "$.name|A \"new\" name|\"Three chambers at Heron Quay (invented)\"|\"A \\\"new\\\" name\"",
                "$.days|ten|\"days\": 10|\"days\": \"ten\"",
                "$.seed||`,\n  \"seed\": 1`|",
            })
    void oneValue(String path, String typed, String was, String is) throws IOException {
        String text = demo("landing.json");
        assertTrue(text.contains(was), was);
        assertEquals(
                text.replace(was, is == null ? "" : is),
                CHANGE.apply(text, values(path, typed == null ? "" : typed)));
    }

    @Test
    void missingGroupsAreMadeWhereAValueIsTyped() {
        assertEquals(
                "{\"chambers\": [{\"door\": {\"widthM\": 0.9}}]}",
                CHANGE.apply("{\"chambers\": [{}]}", values("$.chambers[0].door.widthM", "0.9")));
    }

    @Test
    void anOptionTakenBringsItsValueAndLeavesTheOthers() {
        String text = "{\"chambers\": [{\"faces\": [{\"face\": \"roof\"}]}]}";
        String beyond = "$.chambers[0].faces[0].beyond";
        PlanChange.Typed typed =
                new PlanChange.Typed(
                        Map.of(
                                beyond + ".spaceC", "22",
                                beyond + ".spaceAboveOutdoorK", "3",
                                beyond + ".chamber", "south"),
                        Map.of(beyond, "spaceAboveOutdoorK"),
                        Map.of());
        String changed = CHANGE.apply(text, typed);
        assertEquals(
                "{\"chambers\": [{\"faces\": [{\"face\": \"roof\", \"beyond\":"
                        + " {\"spaceAboveOutdoorK\": 3}}]}]}",
                changed);
        PlanChange.Typed back =
                new PlanChange.Typed(
                        Map.of(beyond + ".spaceC", "22"), Map.of(beyond, ""), Map.of());
        assertEquals(text, CHANGE.apply(changed, back));
        PlanChange.Typed word =
                new PlanChange.Typed(
                        Map.of(beyond + ".spaceC", "22"), Map.of(beyond, "shade"), Map.of());
        assertTrue(CHANGE.apply(changed, word).contains("\"beyond\": \"shade\""));
    }

    @Test
    void aKindOrATypeTakenTakesItsValues() {
        PlanChange.Typed steady =
                new PlanChange.Typed(
                        Map.of(
                                "$.withoutChamber.temperatureC", "25",
                                "$.withoutChamber.humidityPct", "60"),
                        Map.of("$.withoutChamber", "steady"),
                        Map.of());
        assertEquals(
                "{\"withoutChamber\": {\"kind\": \"steady\", \"humidityPct\": 60, \"temperatureC\":"
                        + " 25}}",
                CHANGE.apply("{}", steady));
        PlanChange.Typed crates =
                new PlanChange.Typed(
                        Map.of("$.lots[0].package", "carton-vented"),
                        Map.of("$.lots[0].package", "string"),
                        Map.of());
        assertEquals(
                "{\"lots\": [{\"package\": \"carton-vented\"}]}",
                CHANGE.apply("{\"lots\": [{\"package\": {\"halfCoolingHours\": 9}}]}", crates));
    }

    @Test
    void wordsTickedAreAList() {
        String text = "{\"chambers\": [{\"cooling\": [{\"kind\": \"wetted-wall\"}]}]}";
        String wets = "$.chambers[0].cooling[0].wets";
        PlanChange.Typed two =
                new PlanChange.Typed(Map.of(), Map.of(), Map.of(wets, List.of("north", "east")));
        assertTrue(CHANGE.apply(text, two).contains("\"wets\": [\"north\", \"east\"]"));
    }

    @Test
    void chambersNamedElsewhereFollowANewId() throws IOException {
        String text = demo("landing.json");
        String changed = CHANGE.apply(text, values("$.chambers[0].id", "front"));
        assertFalse(changed.contains("\"fruit\""), "the old id is gone");
        assertEquals(text.replace("\"fruit\"", "\"front\""), changed);
    }

    /** Steps: what is added begins as the schema asks, ids stay their own, moves can be undone. */
    @Test
    void steps() throws IOException {
        String text = demo("landing.json");
        JsonPath lots = path("$.lots");
        PlanStep.Done copied = PlanStep.take(text, PlanStep.Kind.COPY, path("$.lots[0]"), "");
        assertEquals("$.lots[1]", copied.path().toString());
        assertTrue(copied.text().contains("\"id\": \"MAN1-2\""));
        assertEquals(
                text, PlanStep.take(copied.text(), PlanStep.Kind.REMOVE, copied.path(), "").text());
        PlanStep.Done down = PlanStep.take(text, PlanStep.Kind.DOWN, path("$.lots[0]"), "");
        assertEquals(lots, down.path());
        assertEquals(
                text, PlanStep.take(down.text(), PlanStep.Kind.UP, path("$.lots[1]"), "").text());
        assertEquals(text, PlanStep.take(text, PlanStep.Kind.UP, path("$.lots[0]"), "").text());
        PlanStep.Done door =
                PlanStep.take(
                        "{\"chambers\": [{}]}", PlanStep.Kind.ADD, path("$.chambers[0].door"), "");
        assertEquals("{\"chambers\": [{\"door\": {}}]}", door.text());
    }

    /** A kind of cooler is added by its word alone, whatever kinds there are. */
    @Test
    void everyKindOfCoolerCanBeAdded() {
        Shape cooler =
                ((Shape.Listed)
                                Schema.shape()
                                        .at(path("$.chambers[0].cooling"), new Json.Null())
                                        .orElseThrow())
                        .of();
        List<Shape.Option> kinds = ((Shape.Choice) cooler).options();
        assertTrue(kinds.size() >= 6, kinds.toString());
        for (Shape.Option kind : kinds) {
            String text =
                    PlanStep.take(
                                    "{\"chambers\": [{}]}",
                                    PlanStep.Kind.ADD,
                                    path("$.chambers[0].cooling"),
                                    kind.word())
                            .text();
            FormPlace added = PlanForm.of(text).at(path("$.chambers[0].cooling[0]")).orElseThrow();
            assertEquals(Optional.of(kind), added.taken());
            assertFalse(added.places().isEmpty());
        }
    }

    @Test
    void aNewChamberIsWholeButForWhatThePersonMustSay() {
        PlanStep.Done added = PlanStep.take("{}", PlanStep.Kind.ADD, path("$.chambers"), "");
        PlanStep.Done second =
                PlanStep.take(added.text(), PlanStep.Kind.ADD, path("$.chambers"), "");
        assertEquals("$.chambers[1]", second.path().toString());
        FormPlace chamber = PlanForm.of(second.text()).at(second.path()).orElseThrow();
        assertEquals("chamber-2", chamber.place("id").orElseThrow().written());
        assertEquals(6, chamber.place("faces").orElseThrow().places().size());
    }
}
