package org.wardon.web.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.files.Schema;
import org.wardon.files.form.PlanForm;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.Shape;
import org.wardon.web.pages.Preferences;

/** Every place a plan may have is called something, and numbers are as a person writes them. */
class PlanWordsTest {
    private static final FieldWords WORDS = new FieldWords();

    @Test
    void everyPlaceOfTheSchemaHasALabelAndAHint() {
        List<String> missing = new ArrayList<>();
        int places = walk(Schema.shape(), "", missing);
        assertEquals(List.of(), missing);
        assertTrue(places > 200, "only " + places + " places");
    }

    private static int walk(Shape shape, String key, List<String> missing) {
        int places = 0;
        if (shape instanceof Shape.Group group) {
            for (Shape.Member member : group.members()) {
                if (member.shape() instanceof Shape.Fixed) {
                    continue;
                }
                String below = key.isEmpty() ? member.name() : key + "." + member.name();
                if (!WORDS.has("label." + below)
                        || !WORDS.has("hint." + below) && !member.hint().isEmpty()) {
                    missing.add(below);
                }
                places += 1 + walk(member.shape(), below, missing);
            }
        } else if (shape instanceof Shape.Choice choice) {
            for (Shape.Option option : choice.options()) {
                String below = option.by() == Shape.By.TYPE ? key : key + "." + option.word();
                boolean words = WORDS.has("label." + below) || WORDS.has("word." + option.word());
                if (!words) {
                    missing.add(below);
                }
                places += 1 + walk(option.shape(), below, missing);
            }
        } else if (shape instanceof Shape.Listed list) {
            places += walk(list.of(), key, missing);
        } else if (shape instanceof Shape.Named named) {
            places += walk(named.of(), key, missing);
        } else if (shape instanceof Shape.Words of) {
            of.words().stream().filter(w -> !WORDS.has("word." + w)).forEach(missing::add);
        }
        return places;
    }

    @Test
    void whatHasNoWordsIsToldByItsName() {
        assertEquals("Rated capacity w", WORDS.label("chambers.cooling.new-kind.ratedCapacityW"));
        assertEquals("as the schema says", WORDS.hint("no.such", "as the schema says"));
    }

    @ParameterizedTest(name = "{0} {1} is shown {2} and read {3}")
    @CsvSource({
        "12.5, °C, '54,5', 12.5",
        "-40, °C, -40, -40",
        "2, K, '3,6', 2",
        "453.59237, kg, 1000, 453.59237",
        "1.50, m, '1,50', 1.50",
        "20, min, 20, 20"
    })
    void numbersInAmericanUnitsWithADecimalComma(
            String written, String unit, String shown, String read) {
        TypedNumbers numbers =
                new TypedNumbers(new Preferences(true, true, true, Preferences.Light.AUTO));
        assertEquals(shown, numbers.shown(written, unit));
        assertEquals(Optional.of(read), numbers.read(shown, unit));
        assertEquals(Optional.empty(), numbers.read("about 3", unit));
    }

    @ParameterizedTest(name = "{0} is told on {1}")
    @CsvSource({
        "$.days, $",
        "$.weather.steady.temperatureC, $.weather",
        "$.chambers[2].door.widthM, $.chambers[2]",
        "$.chambers[0].faces[3].layers[1].thicknessMm, $.chambers[0].faces[3]",
        "$.chambers[0].faces, $.chambers[0]",
        "$.lots[7].massKg, $.lots[7]",
        "$.buildUps.slab.layers, $.buildUps.slab",
        "$.buildUps['80'].layers, $.buildUps['80']",
        "'line 3, column 4', $"
    })
    void faultsAreToldOnThePageOfTheirField(String path, String page) {
        assertEquals(page, PlanPlaces.page(PlanForm.of("{}"), path).toString());
        assertTrue(PlanPlaces.isPage(JsonPath.parse(page).orElseThrow()));
    }
}
