package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** Water inside the faces of a chamber, as a person is told of it. */
class FaceMoistureTest {
    private static ReferenceBook book;

    @TempDir Path folder;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private Forecast with(String layers) throws IOException {
        return new SmallPlan().walls(layers).advice(book, folder).forecast();
    }

    private static String brickFoamAnd(String inner) {
        return "[{\"material\": \"brick-solid\", \"thicknessMm\": 200},"
                + "{\"material\": \"eps-15\", \"thicknessMm\": 100},"
                + inner
                + "]";
    }

    @Test
    void foamBehindATightSheetIsToldWithPlaceAmountAndRemedy() throws IOException {
        Forecast wet = with(brickFoamAnd("{\"material\": \"steel-sheet\", \"thicknessMm\": 0.5}"));
        assertEquals(
                List.of(
                        "north: water gathers inside its faces roof, north, east, south, west, in"
                                + " layer 2 from outside (eps-15), up to 132 g/m2 in a month like"
                                + " this; wet insulation lets heat through and rots. Put a vapour"
                                + " barrier on the outer side of the insulation, joints sealed,"
                                + " and leave the other side open to dry."),
                SmallPlan.told(wet, "wet-inside-faces"));
        assertEquals(List.of(), SmallPlan.told(wet, "wet-inside-unknown"));
    }

    @Test
    void aBarrierOutsideOrAPanelIsNotToldOf() throws IOException {
        String barrier =
                "[{\"material\": \"bitumen-felt\", \"thicknessMm\": 4},"
                        + "{\"material\": \"eps-15\", \"thicknessMm\": 100},"
                        + "{\"material\": \"cement-plaster\", \"thicknessMm\": 15}]";
        for (Forecast dry :
                List.of(with(barrier), new SmallPlan().advice(book, folder).forecast())) {
            assertEquals(List.of(), SmallPlan.told(dry, "wet-inside-faces"));
            assertEquals(List.of(), SmallPlan.told(dry, "wet-inside-unknown"));
        }
    }

    @Test
    void whatIsNotKnownIsSaidAndAFigureOfOnesOwnSettlesIt() throws IOException {
        String own =
                "{\"conductivityWmK\": 0.5, \"densityKgM3\": 1500, \"specificHeatJkgK\": 1000,"
                        + " \"thicknessMm\": 20%s}";
        Forecast open = with(brickFoamAnd(String.format(own, "")));
        assertEquals(List.of(), SmallPlan.told(open, "wet-inside-faces"));
        assertEquals(
                List.of(
                        "north: whether water gathers inside the faces cannot be told: nothing is"
                                + " known of how own holds vapour back. Give its"
                                + " vapourResistanceFactor."),
                SmallPlan.told(open, "wet-inside-unknown"));
        Forecast tight =
                with(brickFoamAnd(String.format(own, ", \"vapourResistanceFactor\": 100000")));
        assertEquals(1, SmallPlan.told(tight, "wet-inside-faces").size());
        assertEquals(List.of(), SmallPlan.told(tight, "wet-inside-unknown"));
    }
}
