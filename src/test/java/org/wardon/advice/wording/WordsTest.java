package org.wardon.advice.wording;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.CoolerCautions;
import org.wardon.cooling.Setting;
import org.wardon.files.forecast.Quantiles;
import org.wardon.keeping.Crops;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.HangsOn;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.LotAtDoor;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.RestsOn;
import org.wardon.lots.ClassValues;
import org.wardon.lots.LotHistory;
import org.wardon.lots.LotRange;
import org.wardon.lots.Shares;
import org.wardon.produce.Commodity;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;
import org.wardon.sharing.PairVerdict;
import org.wardon.sharing.Sharing;
import org.wardon.sharing.SharingAnswer;
import org.wardon.sharing.Verdict;
import org.wardon.sharing.Wish;
import org.wardon.sharing.Workable;

/** Every code has a sentence, and no sentence keeps a gap. */
class WordsTest {
    private static final Words WORDS = Words.english(Units.METRIC);
    private static final Words AMERICAN = Words.english(new Units(true, true));
    private static final Pattern GAP = Pattern.compile("\\{(s?)(\\d+)}|\\{[a-z-]+\\.(\\d+)}");
    private static final Set<String> FAMILIES =
            Set.of(
                    "limit",
                    "hangs-on",
                    "mechanism",
                    "rests-on",
                    "side",
                    "verdict",
                    "place-wish",
                    "why",
                    "section",
                    "crop",
                    "face",
                    "within",
                    "height",
                    "beside",
                    "size",
                    "heat-term",
                    "water-term");
    private static final double DAY_S = 86_400;

    /** Hyphenated words in quotes beside codes and sources. */
    private static final Set<String> OTHER_WORDS =
            Set.of(
                    "common-practice",
                    "chilling-dose",
                    "not-stated",
                    "pull-down",
                    "kelvin-colder",
                    "kelvin-warmer");

    private static void spoken(Iterable<Reason> reasons) {
        for (Reason reason : reasons) {
            for (Words words : List.of(WORDS, AMERICAN)) {
                String sentence = words.sentence(reason);
                assertFalse(sentence.contains("{"), reason + " -> " + sentence);
                assertFalse(sentence.contains("NaN"), reason + " -> " + sentence);
                assertFalse(sentence.contains("null"), reason + " -> " + sentence);
                assertFalse(sentence.contains("Infinity"), reason + " -> " + sentence);
            }
        }
    }

    private static LotHistory held(double atC, double humidity, double ppm, boolean wet) {
        LotHistory.Builder history = new LotHistory.Builder();
        for (int day = 0; day <= 3; day++) {
            history.add(day * DAY_S, atC, atC, atC, humidity, ppm, wet);
        }
        return history.build();
    }

    @Test
    void keepingOfEveryCommodityInEveryConditionHasWords() {
        List<LotAtDoor> doors =
                List.of(
                        LotAtDoor.SOUND,
                        LotAtDoor.SOUND.withRipeness(Ripeness.RIPE).withCured(false),
                        LotAtDoor.SOUND.withRipeness(Ripeness.GREEN).withCured(true));
        List<Draw> draws = Draws.seeded(1, 2);
        for (Commodity commodity : Crops.list()) {
            for (LotAtDoor door : doors) {
                KeepingModel model = KeepingModel.of(Crops.lot(commodity, door));
                for (double atC : new double[] {-3, 1, 6, 13, 25, 36, 45}) {
                    LotHistory damp = held(atC, 1, 10, true);
                    spoken(model.outlook(damp, draws, 0, 3 * DAY_S).reasons());
                    LotHistory dry = held(atC, 0.5, 0, false);
                    spoken(model.outlook(dry, draws, 0, 3 * DAY_S).reasons());
                }
            }
        }
    }

    @Test
    void bodyOfEveryCommodityInEveryPackageHasWords() {
        ClassValues classes = ClassValues.of(Crops.list());
        List<PackageKind> kinds;
        try (ReferenceBook book = ReferenceBook.open()) {
            kinds = book.packageKinds().values().stream().limit(6).toList();
        }
        assertEquals(6, kinds.size());
        for (Commodity commodity : Crops.list()) {
            for (PackageKind kind : kinds) {
                for (Ripeness ripeness : Ripeness.values()) {
                    spoken(
                            LotRange.of("A1", commodity, 500, kind, ripeness, classes)
                                    .at(Shares.MIDDLE)
                                    .restsOn());
                }
            }
        }
    }

    @Test
    void everyPairHasWords() {
        List<Draw> draws = Draws.seeded(1, 2);
        for (double days : new double[] {3, 60}) {
            List<Workable> lots = new ArrayList<>();
            for (Commodity commodity : Crops.list()) {
                lots.add(Workable.of(Wish.of(Crops.lot(commodity), days), draws));
            }
            SharingAnswer answer = Sharing.among(lots);
            spoken(answer.reasons());
            for (PairVerdict pair : answer.pairs()) {
                spoken(pair.reasons());
                WORDS.text("verdict." + pair.verdict().word());
            }
        }
    }

    @Test
    void cautionsOfACompressorHaveWords() {
        Compressor unit =
                new Compressor(
                        3_500,
                        500,
                        10,
                        35,
                        150,
                        false,
                        150,
                        0.6,
                        Control.ON_OFF,
                        5,
                        5,
                        3,
                        3,
                        java.util.Optional.empty(),
                        java.util.OptionalDouble.empty());
        List<Reason> reasons =
                CoolerCautions.of(unit, new Setting(2, 1, 90), "north", 101_325).stream()
                        .map(caution -> caution.reason())
                        .toList();
        assertTrue(reasons.size() >= 3, reasons.toString());
        spoken(reasons);
    }

    @Test
    void everyCodeInTheProgramTextHasASentenceAndEnoughToFillIt() {
        List<SourceCodes.Use> uses = SourceCodes.uses();
        assertTrue(uses.size() > 60, "only " + uses.size() + " codes found");
        Map<String, String> wrong = new HashMap<>();
        for (SourceCodes.Use use : uses) {
            if (!WORDS.codes().contains(use.code())) {
                wrong.put(use.code(), use.file() + ": no sentence");
                continue;
            }
            Matcher gap = GAP.matcher(WORDS.text(use.code()));
            while (gap.find()) {
                boolean subject = "s".equals(gap.group(1));
                int n = Integer.parseInt(gap.group(2) == null ? gap.group(3) : gap.group(2));
                int given = (subject ? use.subjects() : use.arguments()).orElse(Integer.MAX_VALUE);
                if (n >= given) {
                    wrong.put(use.code(), use.file() + ": nothing fills " + gap.group());
                }
            }
        }
        assertEquals(Map.of(), wrong);
    }

    @Test
    void everyHyphenatedWordWhereReasonsAreMadeIsACodeOrASource() {
        Set<String> unknown = new TreeSet<>(SourceCodes.hyphenated());
        unknown.removeAll(WORDS.codes());
        unknown.removeAll(OTHER_WORDS);
        try (ReferenceBook book = ReferenceBook.open()) {
            unknown.removeIf(word -> isSource(book, word));
        }
        assertEquals(Set.of(), unknown);
    }

    private static boolean isSource(ReferenceBook book, String word) {
        try {
            return !book.source(word).citation().isBlank();
        } catch (RuntimeException e) {
            return false;
        }
    }

    @Test
    void noSentenceIsForgotten() {
        Set<String> unused = new TreeSet<>(WORDS.codes());
        unused.removeAll(SourceCodes.quoted());
        unused.removeIf(code -> FAMILIES.contains(code.split("\\.", 2)[0]));
        assertEquals(Set.of(), unused);
    }

    @Test
    void everyMechanismVerdictAndGroundHasWords() {
        for (Mechanism mechanism : Mechanism.values()) {
            WORDS.text("limit." + mechanism.word());
            WORDS.text("mechanism." + mechanism.word());
        }
        for (HangsOn.Range range : HangsOn.Range.values()) {
            WORDS.text("hangs-on." + range.word());
        }
        for (RestsOn ground : RestsOn.values()) {
            WORDS.text("rests-on." + ground.word());
        }
        for (Verdict verdict : Verdict.values()) {
            WORDS.text("verdict." + verdict.word());
        }
    }

    @Test
    void aCodeInsideASentenceIsToldInWords() {
        Reason reason =
                Reason.about("life-rests-on", "M1", "assumption", Argument.text("handbook-life"));
        assertEquals(
                "M1: the life rests on one handbook life and the general curve of perishables.",
                WORDS.sentence(reason));
    }

    @Test
    void aCodeWithoutWordsIsRefusedByName() {
        IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> WORDS.text("no-such-code"));
        assertEquals(
                "no words for 'no-such-code'; add the key to words.properties",
                refused.getMessage());
    }

    @Test
    void daysAreToldAsARange() {
        assertEquals("5 to 12 days (likely 8.5)", WORDS.range(new Quantiles(5, 8.5, 12.3)));
        assertEquals("1 day", WORDS.range(new Quantiles(1, 1, 1.04)));
        assertEquals("0 days", WORDS.range(new Quantiles(0, 0, 0)));
        assertEquals(
                "200 to more than 730 days (likely 400)",
                WORDS.range(new Quantiles(200, 400, 730)));
        assertEquals("more than 730 days", WORDS.range(new Quantiles(730, 730, 730)));
        assertEquals("5 to 12 (likely 8.5)", WORDS.span(new Quantiles(5, 8.5, 12.3)));
    }
}
