package org.wardon.sharing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.keeping.Crops;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.MixingGroup;
import org.wardon.produce.Reason;

/** Published sharing groups against our verdicts. */
class MixingGroupsTest {
    private static final List<Draw> DRAWS = Draws.seeded(1, 32);
    private static final double APART_K = 8;
    private static final double SHORT_LIVED_DAYS = 34;

    /** Pairs of a published group that we refuse for a week, each with its codes. */
    private static final Path DIFFERENCES =
            Path.of("src/test/resources/published/mixing-group-differences.csv");

    private static final Map<String, Workable> WEEK = workable(7);
    private static final Map<String, Workable> FORTNIGHT = workable(14);

    private static Map<String, Workable> workable(double days) {
        Map<String, Workable> lots = new HashMap<>();
        for (Commodity commodity : Crops.list()) {
            lots.put(commodity.id(), Workable.of(Wish.of(Crops.lot(commodity), days), DRAWS));
        }
        return lots;
    }

    @Test
    @Source("TKS1996 and TRADE-3T, mixing-groups.csv: groups for short-term storage")
    void pairsOfAPublishedGroupAreNotRefusedForAWeekButForTheReasonsListed() throws IOException {
        Map<String, String> refused = new TreeMap<>();
        for (MixingGroup group : Crops.groups()) {
            List<String> ids =
                    group.commodityIds().stream().filter(Crops::has).distinct().sorted().toList();
            for (int i = 0; i < ids.size(); i++) {
                for (int j = i + 1; j < ids.size(); j++) {
                    PairVerdict pair =
                            new Pairing(
                                            WEEK.get(ids.get(i)),
                                            WEEK.get(ids.get(j)),
                                            Circumstances.usual())
                                    .verdict();
                    if (pair.verdict() == Verdict.NO) {
                        refused.put(pair.a() + "," + pair.b(), codes(pair));
                    }
                }
            }
        }
        assertEquals(lines(listed()), lines(refused));
    }

    private static String lines(Map<String, String> pairs) {
        return pairs.entrySet().stream()
                .map(pair -> pair.getKey() + "," + pair.getValue())
                .collect(Collectors.joining("\n"));
    }

    private static String codes(PairVerdict pair) {
        return pair.reasons().stream()
                .map(Reason::code)
                .distinct()
                .sorted()
                .collect(Collectors.joining(" "));
    }

    private static Map<String, String> listed() throws IOException {
        Map<String, String> pairs = new TreeMap<>();
        for (String line : Files.readAllLines(DIFFERENCES)) {
            if (!line.startsWith("#") && !line.startsWith("a,b,")) {
                String[] cells = line.split(",", 3);
                pairs.put(cells[0] + "," + cells[1], cells[2]);
            }
        }
        return pairs;
    }

    @Test
    @Source("commodities.csv: storage temperatures and lives of the handbook")
    void pairsEightKelvinApartAreRefusedForTwoWeeksWhereTheColdOneIsShortLived() {
        List<String> wrong = new ArrayList<>();
        int pairs = 0;
        for (Commodity cold : Crops.list()) {
            for (Commodity warm : Crops.list()) {
                if (!farApart(cold, warm)) {
                    continue;
                }
                pairs++;
                PairVerdict pair =
                        new Pairing(
                                        FORTNIGHT.get(cold.id()),
                                        FORTNIGHT.get(warm.id()),
                                        Circumstances.usual())
                                .verdict();
                Set<String> codes =
                        pair.reasons().stream().map(Reason::code).collect(Collectors.toSet());
                boolean named =
                        codes.contains("temperature-gap")
                                || codes.contains("keeps-less-than-wanted");
                if (pair.verdict() != Verdict.NO || !named) {
                    wrong.add(cold.id() + " + " + warm.id() + ": " + pair.verdict() + codes);
                }
            }
        }
        assertTrue(pairs > 700, pairs + " pairs only");
        assertTrue(wrong.isEmpty(), String.join("\n", wrong));
    }

    private static boolean farApart(Commodity cold, Commodity warm) {
        if (cold.needs().lifeDays().isEmpty()
                || cold.needs().temperatureC().isEmpty()
                || warm.needs().temperatureC().isEmpty()) {
            return false;
        }
        Fact low = cold.needs().temperatureC().get();
        Fact high = warm.needs().temperatureC().get();
        return high.lowest() - low.highest() >= APART_K
                && cold.needs().lifeDays().get().highest() < SHORT_LIVED_DAYS;
    }

    @Test
    void longerStayNeverWidensTheWorkableSettings() {
        List<String> wrong = new ArrayList<>();
        for (Commodity commodity : Crops.list()) {
            Workable brief = WEEK.get(commodity.id());
            Workable longer = FORTNIGHT.get(commodity.id());
            for (int t = 0; t < Settings.TEMPERATURES; t++) {
                for (int h = 0; h < Settings.HUMIDITIES; h++) {
                    if (longer.at(t, h).compareTo(brief.at(t, h)) > 0) {
                        wrong.add(commodity.id() + " at " + Settings.temperatureC(t));
                    }
                }
            }
        }
        assertTrue(wrong.isEmpty(), String.join("\n", wrong));
    }
}
