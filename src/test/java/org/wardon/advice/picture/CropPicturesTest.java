package org.wardon.advice.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.advice.crops.CropSheet;
import org.wardon.advice.crops.CropSheets;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.reference.ReferenceBook;
import org.xml.sax.InputSource;

/** Charts of a crop: one mark a printed row, nothing out of the field, no style of their own. */
class CropPicturesTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final CropSheets SHEETS = new CropSheets(BOOK);
    private static final Words WORDS = Words.english(Units.METRIC);
    private static final Pattern MARK = Pattern.compile("class=\"mark ");
    private static final Pattern PLACE = Pattern.compile("[ML](-?[0-9.]+) (-?[0-9.]+)");

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static CropSheet sheet(String name) {
        return SHEETS.of(name, Optional.empty());
    }

    private static void sound(String svg, double high) throws Exception {
        DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .parse(new InputSource(new StringReader(svg)));
        assertFalse(svg.contains("style"), "a page's own style alone counts");
        assertFalse(svg.contains("NaN") || svg.contains("Infinity"), svg);
        for (MatchResult place : PLACE.matcher(svg).results().toList()) {
            double x = Double.parseDouble(place.group(1));
            double y = Double.parseDouble(place.group(2));
            assertTrue(x >= 0 && x <= 360, place.group());
            assertTrue(y >= 0 && y <= high, place.group());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"mango", "apple", "peach", "broccoli", "onion", "banana"})
    void everyPrintedRowIsOneMark(String crop) throws Exception {
        CropSheet sheet = sheet(crop);
        String life = LifePicture.of(sheet, WORDS, UnaryOperator.identity());
        sound(life, 300);
        assertEquals(sheet.life().printed().size(), MARK.matcher(life).results().count());
        String breath = BreathPicture.of(sheet, WORDS, UnaryOperator.identity());
        sound(breath, 260);
        assertEquals(sheet.breath().printed().size(), MARK.matcher(breath).results().count());
        assertEquals(!sheet.cold().isEmpty(), life.contains("class=\"cold\""));
    }

    @Test
    void unitsAndDecimalMarksAreThePersons() {
        Words american = Words.english(new Units(true, true));
        String life = LifePicture.of(sheet("mango"), american, text -> text.replace('.', ','));
        assertTrue(life.contains(">°F<"));
        assertTrue(life.contains("injured by cold below 55 °F"), life);
        assertTrue(life.contains(">0,3<"));
    }
}
