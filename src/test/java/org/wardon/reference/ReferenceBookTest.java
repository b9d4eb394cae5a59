package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;
import org.wardon.enclosure.Doorway;
import org.wardon.enclosure.Material;
import org.wardon.errors.BadInput;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.NamedFact;
import org.wardon.produce.PackageKind;
import org.wardon.produce.rows.RespirationRow;

/** What the book answers, held against the printed tables. */
class ReferenceBookTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();

    @AfterAll
    static void close() {
        BOOK.close();
    }

    @Source("Cantwell 2001, properties and recommended conditions for storage of fresh produce")
    @ParameterizedTest(name = "{0}: {1} to {2} °C, {3} to {4} %, {5} to {6} days")
    @CsvSource({
        "mango, 13, 13, 85, 90, 14, 21",
        "okra, 7, 10, 90, 95, 7, 10",
        "apple, -1.1, 0, 90, 95, 91.2, 182.4",
        "onion-dry, 0, 0, 65, 70, 30.4, 243.2"
    })
    void needsAreThoseOfTheHandbook(
            String id,
            double lowC,
            double highC,
            double lowPct,
            double highPct,
            double d1,
            double d2) {
        Commodity.Needs needs = BOOK.get(id).needs();
        assertRange(lowC, highC, needs.temperatureC().orElseThrow());
        assertRange(lowPct, highPct, needs.humidityPct().orElseThrow());
        assertRange(d1, d2, needs.lifeDays().orElseThrow());
        assertEquals("cantwell-2001", needs.temperatureC().orElseThrow().sourceId());
        assertEquals(Evidence.SEEN, needs.temperatureC().orElseThrow().evidence());
    }

    private static void assertRange(double low, double high, Fact fact) {
        assertEquals(low, fact.lowest());
        assertEquals(high, fact.highest());
        assertFalse(fact.own());
    }

    @Test
    void allAtOnceIsTheSameAsOneByOne() {
        try (ReferenceBook allAtOnce = ReferenceBook.open()) {
            List<Commodity> all = allAtOnce.all();
            assertEquals(BOOK.list(), all.stream().map(Commodity::id).toList());
            for (Commodity commodity : all) {
                assertEquals(BOOK.get(commodity.id()), commodity);
                assertSame(commodity, allAtOnce.get(commodity.id()));
            }
        }
    }

    @Test
    void everyListedCommodityCanBeReadAndShown() {
        List<String> ids = BOOK.list();
        assertEquals(106, ids.size());
        for (String id : ids) {
            Commodity commodity = BOOK.get(id);
            assertFalse(commodity.names().isEmpty(), id);
            List<NamedFact> facts = BOOK.facts(id);
            assertTrue(facts.size() >= 3, id + " has only " + facts);
            for (NamedFact fact : facts) {
                assertFalse(BOOK.sources(fact.sourceId()).isEmpty(), id + " " + fact);
                assertTrue(
                        fact.fact().isPresent() || !fact.text().isEmpty(),
                        id + " says nothing in " + fact);
            }
        }
    }

    @Source("respiration-heat.csv (ASHRAE Refrigeration 2006 chapter 9) before respiration.csv")
    @Test
    void heatTableComesFirstAndTheOthersStayVisible() {
        List<RespirationRow> rows = BOOK.get("mango").breath().respiration();
        assertEquals("heat", rows.get(0).table());
        assertEquals(15, rows.get(0).temperatureC());
        assertEquals(133.4, rows.get(0).wattsPerTonne().lowest());
        Set<String> tables = rows.stream().map(RespirationRow::table).collect(Collectors.toSet());
        assertEquals(Set.of("heat", "co2", "co2-other"), tables);
        List<String> order = rows.stream().map(RespirationRow::table).distinct().toList();
        assertEquals(List.of("heat", "co2", "co2-other"), order);
    }

    @Source("respiration.csv, guava is in no heat table; 10.7 J per mg CO2")
    @Test
    void carbonDioxideIsTurnedIntoHeatWhereNoHeatIsPrinted() {
        RespirationRow mandarin = BOOK.get("mandarin").breath().respiration().get(0);
        assertEquals("co2", mandarin.table());
        NamedFact shown =
                BOOK.facts("mandarin").stream()
                        .filter(fact -> fact.table().equals("respiration"))
                        .findFirst()
                        .orElseThrow();
        double mg = Double.parseDouble(shown.note().split(" ")[2]);
        assertEquals(mg * 2.9722, mandarin.wattsPerTonne().lowest(), mg * 0.0001);
    }

    @Source("sprouting.csv, UCD-SWEETPOT: more rapid above 15 °C")
    @Test
    void namesOfFactsSayWhichEndIsPrintedAndNothingThatIsNot() {
        List<NamedFact> facts = BOOK.facts("sweet-potato");
        assertTrue(facts.stream().anyMatch(fact -> fact.name().equals("sprouting@from-15C")));
        for (String id : BOOK.list()) {
            for (NamedFact fact : BOOK.facts(id)) {
                assertFalse(fact.note().contains("; 0 % humidity"), id + " " + fact);
                assertFalse(fact.note().contains("; 0 days cooled"), id + " " + fact);
                assertFalse(fact.note().endsWith("mean 0"), id + " " + fact);
            }
        }
    }

    @Test
    void compositionWithFreezingPointIsChosen() {
        Commodity mango = BOOK.get("mango");
        assertTrue(mango.body().compositions().get(0).initialFreezingC().isPresent());
        assertEquals(2, mango.body().compositions().size());
    }

    @Test
    void rowsOfLaterStatesComeLastAndNameTheirState() {
        List<String> states =
                BOOK.get("banana-green").breath().respiration().stream()
                        .map(RespirationRow::state)
                        .distinct()
                        .toList();
        assertEquals(List.of("green", "ripe"), states);
        List<String> uncured =
                BOOK.get("sweet-potato").breath().respiration().stream()
                        .map(RespirationRow::state)
                        .distinct()
                        .toList();
        assertEquals(List.of("not-stated", "uncured"), uncured);
    }

    @Test
    void generalRowsComeLast() {
        Commodity mango = BOOK.get("mango");
        assertEquals(
                "ah66-1986",
                mango.water()
                        .limits()
                        .get(mango.water().limits().size() - 1)
                        .maxLossPct()
                        .sourceId()
                        .toLowerCase(java.util.Locale.ROOT));
        assertTrue(
                mango.keeping().q10s().stream()
                        .anyMatch(q10 -> q10.q10().lowest() == 2.5 && q10.q10().highest() == 4));
    }

    @ParameterizedTest(name = "{0} -> {1}")
    @CsvSource({
        "mangoes, mango",
        "MANGO, mango",
        "Lady's finger, okra",
        "lady’s fingers, okra",
        "aubergines, eggplant",
        "courgette, summer-squash",
        "pawpaw, papaya",
        "cilantro, coriander",
        "sweetcorn, sweet-corn",
        "scallions, green-onion",
        "tomatoes, tomato-ripe",
        "strawberries, strawberry",
        "peaches, peach",
        "Mangifera indica, mango",
        "banana green, banana-green",
        "radishes, radish"
    })
    void findsByWhatPeopleSay(String name, String id) {
        assertEquals(id, BOOK.find(name).orElseThrow().id());
    }

    @Test
    void misspeltNamesLeadToTheNearest() {
        assertEquals("mango", BOOK.nearest("mangoo").get(0));
        assertEquals("papaya", BOOK.nearest("paypaya").get(0));
        assertEquals("eggplant", BOOK.nearest("aubergin").get(0));
        assertEquals(List.of("bell-pepper", "chili-pepper"), BOOK.nearest("peppers"));
        assertEquals(List.of(), BOOK.nearest("xylophonequartz"));
        assertTrue(
                assertThrows(BadInput.class, () -> BOOK.get("aubergine"))
                        .getMessage()
                        .contains("perhaps eggplant?"));
        BadInput refused = assertThrows(BadInput.class, () -> BOOK.get("brocoli"));
        assertEquals(
                "brocoli: no commodity is called so; perhaps broccoli? 'look' without a name lists"
                        + " all commodities",
                refused.getMessage());
    }

    @Source("Jekel 2017, strip curtain in good order")
    @Test
    void doorProtectionsAreThoseThatKeepAirBack() {
        Doorway curtain = BOOK.doorway("strip-curtain");
        assertEquals(0.93, curtain.usual().orElseThrow().middle());
        assertEquals(0.85, curtain.effectiveness().orElseThrow().lowest());
        assertThrows(BadInput.class, () -> BOOK.doorway("flow-factor-steady"));
    }

    @Test
    void materialsAreSolidsOrResistances() {
        Material panel = BOOK.material("pur-panel");
        assertEquals(0.025, panel.conductivityWmK().orElseThrow());
        assertTrue(panel.isLayer());
        assertTrue(BOOK.material("airgap-25-h").isLayer());
        assertFalse(BOOK.material("finish-whitewash").isLayer());
        assertFalse(BOOK.material("film-in-h").isLayer());
    }

    @Source("USDA AH66: cooling time 20 to 100 h in room cooling, divided by 3")
    @Test
    void broadPackageHasItsTimeAndAnAssumedVapourPath() {
        PackageKind broad = BOOK.packageKind("room-cooling-any");
        assertEquals(6.7, broad.halfCoolingHours().lowest());
        assertEquals(33.3, broad.halfCoolingHours().highest());
        assertTrue(broad.broad());
        assertEquals(Evidence.ASSUMPTION, broad.vapourConductance().evidence());
        assertFalse(BOOK.packageKind("pallet-blueberry-forced-air").broad());
        PackageKind carton = BOOK.packageKind("vented-carton");
        assertEquals(0.7 / 1.5, carton.vapourConductance().lowest(), 0.001);
        assertEquals(0.7 * 1.5, carton.vapourConductance().highest(), 0.001);
    }

    @Test
    void aPackageWithoutATimeSaysSo() {
        BadInput refused =
                assertThrows(BadInput.class, () -> BOOK.packageKind("bin-half-tonne-room"));
        assertTrue(
                refused.getMessage().contains("no half-cooling time is published"),
                refused.getMessage());
        assertEquals(7, BOOK.packagesWithoutTime().size());
        assertTrue(
                assertThrows(BadInput.class, () -> BOOK.packageKind("crat"))
                        .getMessage()
                        .contains("room-cooling-any"));
    }

    @Source("29 CFR 1910.1000: carbon dioxide 5000 ppm over 8 hours")
    @Test
    void listsAnswer() {
        NamedFact limit =
                BOOK.safetyLimits().stream()
                        .filter(each -> each.name().equals("co2_twa"))
                        .findFirst()
                        .orElseThrow();
        assertEquals(5000, limit.fact().orElseThrow().lowest());
        assertEquals("ppm", limit.unit());
        assertEquals(39, BOOK.safetyLimits().size());
        assertEquals(12, BOOK.marketPractice().size());
        assertEquals(Evidence.PRACTICE, BOOK.marketPractice().get(0).evidence());
        assertEquals("common-practice", BOOK.marketPractice().get(0).sourceId());
        assertEquals(49, BOOK.internalLoads().size());
        assertEquals(64, BOOK.coolingSources().size());
        assertEquals(13, BOOK.ethyleneStorage().size());
        assertEquals(144, BOOK.climate().size());
        assertEquals(
                138,
                BOOK.mixingGroups().stream().mapToInt(each -> each.commodityIds().size()).sum());
    }

    @Test
    void sourcesAnswerAndUnknownOnesAreRefused() {
        assertTrue(BOOK.source("ISO6946").citation().startsWith("ISO 6946:2017"));
        assertEquals("the keeper's own value", BOOK.source("own").citation());
        assertThrows(IllegalArgumentException.class, () -> BOOK.source("NOBODY"));
    }
}
