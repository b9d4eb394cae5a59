package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Pages of a co-operative with 200 lots in six chambers: none is large, nothing is lost. */
class ManyLotsTest {
    private static final int LOTS = 200;
    private static final int LARGEST_BYTES = 100_000;

    /** Pages looked at of each kind. */
    private static final int OF_A_KIND = 2;

    private static final long PATIENCE_MS = 120_000;
    private static final Pattern LINK = Pattern.compile("href=\"(/[^\"#]*)(#[^\"]*)?\"");

    @TempDir static Path home;

    /** Pages that wait for the forecast. */
    private static final List<String> WAIT =
            List.of(
                    "",
                    "/lots?in=leaf&from=31",
                    "/cautions",
                    "/chamber/leaf?setting=3",
                    "/chamber/leaf/section");

    private static final int CAUTIONS_FIRST = 5;

    private static final Map<String, String> waiting = new HashMap<>();

    private static WebServer server;
    private static RawHttp http;
    private static String cookie;
    private static String plan;

    @BeforeAll
    static void serve() throws IOException, InterruptedException {
        server =
                WebServer.start(
                        new WebOptions("127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()));
        http = new RawHttp(server.url());
        cookie = "Cookie: " + http.visitor("/plans").cookie();
        plan = kept("good.json", ManyLots.plan(LOTS, 1));
        WAIT.forEach(path -> waiting.put(path, get(plan + path).body()));
        long end = System.currentTimeMillis() + PATIENCE_MS;
        while (get(plan).body().contains("data-progress") && System.currentTimeMillis() < end) {
            Thread.sleep(50);
        }
        assertFalse(get(plan).body().contains("data-progress"), "the forecast takes too long");
    }

    private static String kept(String name, String text) throws IOException {
        return server.bring(Files.writeString(home.resolve(name), text));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static RawHttp.Answer get(String path) {
        return http.get(path, cookie);
    }

    /** Every page below a path that links lead to, a few of each kind, by its address. */
    private static Map<String, String> pages(String below, String... first) {
        Map<String, String> pages = new LinkedHashMap<>();
        Map<String, Integer> kinds = new HashMap<>();
        Deque<String> wanted = new ArrayDeque<>(List.of(first));
        while (!wanted.isEmpty()) {
            String path = wanted.removeFirst();
            boolean page =
                    path.startsWith(below)
                            && !path.startsWith("/static/")
                            && !path.matches("/api/.+|.*/take");
            if (page
                    && !pages.containsKey(path)
                    && kinds.merge(kind(path), 1, Integer::sum) <= OF_A_KIND) {
                RawHttp.Answer answer = get(path);
                assertTrue(List.of(200, 303).contains(answer.status()), path + " " + answer.head());
                pages.put(path, answer.body());
                LINK.matcher(answer.body())
                        .results()
                        .forEach(link -> wanted.add(link.group(1).replace("&amp;", "&")));
            }
        }
        return pages;
    }

    /** An address without its numbers and names, however many lots it names. */
    private static String kind(String path) {
        return path.replaceAll("\\d+", "0")
                .replaceAll("(/crops|/chamber)/[^/?]+", "$1/x")
                .replaceAll("=[^&]*", "=")
                .replaceAll("(&lots=)+", "&lots=");
    }

    private static int bytes(String page) {
        return page.getBytes(StandardCharsets.UTF_8).length;
    }

    private static void holdSmall(Map<String, String> pages) {
        Map<String, Integer> large = new LinkedHashMap<>();
        pages.forEach(
                (path, page) -> {
                    if (bytes(page) > LARGEST_BYTES) {
                        large.put(path, bytes(page));
                    }
                });
        assertEquals(Map.of(), large);
    }

    private static Set<String> found(String page, String pattern) {
        Set<String> found = new LinkedHashSet<>();
        Pattern.compile(pattern).matcher(page).results().forEach(one -> found.add(one.group(1)));
        return found;
    }

    @Test
    void noPageIsLarge() {
        Map<String, String> pages = pages("/", plan, "/api");
        Set<String> kinds = new TreeSet<>();
        pages.keySet().forEach(path -> kinds.add(kind(path)));
        for (String kind :
                List.of(
                        "",
                        "/lots?in=",
                        "/cautions?of=",
                        "/actions?from=",
                        "/chamber/x/company?of=",
                        "/chamber/x",
                        "/door",
                        "/placing",
                        "/edit",
                        "/edit?at=")) {
            assertTrue(kinds.contains("/plan/0" + kind), kind + " is not among " + kinds);
        }
        assertTrue(
                kinds.containsAll(Set.of("/crops", "/crops/x", "/plans", "/preferences", "/api")),
                "" + kinds);
        holdSmall(pages);
    }

    @Test
    void everyLotStandsInTheListOnceFirstToLeaveFirst() {
        Set<String> lots = new LinkedHashSet<>();
        int shown = 0;
        for (int from = 1; from <= LOTS; from += 30) {
            Set<String> part =
                    found(get(plan + "/lots?from=" + from).body(), "id=\"lot-([^\"]+)\"");
            shown += part.size();
            lots.addAll(part);
        }
        assertEquals(LOTS, shown);
        assertEquals(LOTS, lots.size());
        String store = get(plan).body();
        Set<String> first = found(store, "<strong>([A-Z]{3}-\\d{3})</strong>");
        assertTrue(first.containsAll(lots.stream().limit(5).toList()), "first to leave: " + lots);
        int left =
                Pattern.compile("(\\d+) more lots are not shown here")
                        .matcher(store)
                        .results()
                        .mapToInt(more -> Integer.parseInt(more.group(1)))
                        .sum();
        assertEquals(LOTS, first.size() + left);
    }

    @Test
    void everyFaultOfEveryLotIsReachedAndStandsAtItsField() throws IOException {
        String faulty =
                kept(
                        "faulty.json",
                        ManyLots.plan(LOTS, 2).replace("\"wantedDays\": ", "\"wantedDays\": -"));
        holdSmall(pages(faulty, faulty + "/edit", faulty));
        assertTrue(get(faulty + "/edit").body().contains("180 more faults in other parts"));
        String list = faulty + "/edit?at=%24.lots&amp;only=faults";
        assertTrue(get(faulty + "/edit").body().contains(list));
        Set<String> lots = new LinkedHashSet<>();
        for (int from = 1; from <= LOTS; from += 50) {
            String part = get(list.replace("&amp;", "&") + "&from=" + from).body();
            lots.addAll(found(part, "(at=%24\\.lots%5B\\d+%5D)\">[^,<]*</a> <span class=\"hint"));
        }
        assertEquals(LOTS, lots.size());
        String last = get(faulty + "/edit?at=%24.lots%5B199%5D").body();
        assertTrue(last.contains("<p class=\"fault\" id=\"p-lots-199-wantedDays-fault\">"), last);
        assertTrue(
                last.contains(
                        "href=\"" + faulty + "/edit?at=%24.lots%5B199%5D#p-lots-199-wantedDays\""));
    }

    @Test
    void aStepInALongListLeadsBackToItsPart() throws IOException {
        String moved = kept("moved.json", ManyLots.plan(LOTS, 3));
        RawHttp.Answer list = get(moved + "/edit?at=%24.lots&from=101");
        String form =
                "token=" + list.token() + "&version=1&at=%24.lots&do=REMOVE+%24.lots%5B120%5D+";
        RawHttp.Answer after =
                http.post(new RawHttp.Visitor(cookie.substring(8), ""), moved + "/edit", form);
        assertEquals(303, after.status());
        assertEquals(moved + "/edit?at=%24.lots&from=121#p-lots", after.header("Location"));
        assertTrue(get(moved + "/edit?at=%24.lots&from=121").body().contains("101 to 150 of 199"));
    }

    @Test
    void eachCautionStandsInTheListOfAll() {
        String store = get(plan).body();
        String section =
                store.substring(
                        store.indexOf("class=\"cautions\""),
                        store.indexOf("</section>", store.indexOf("class=\"cautions\"")));
        Set<String> kinds = found(section, "cautions\\?of=([a-z0-9-]+)");
        assertTrue(kinds.size() > 1, "" + kinds);
        int first = section.split("<p class=\"caution\">", -1).length - 1;
        assertTrue(first <= CAUTIONS_FIRST, first + " cautions before anything else");
        assertTrue(section.contains("href=\"" + plan + "/cautions\">All cautions"), section);
        for (String kind : kinds) {
            String list = get(plan + "/cautions?of=" + kind).body();
            String told =
                    found(section, "of=" + kind + "\">All (\\d+) of this kind").iterator().next();
            int sentences = list.split("<li class=\"(danger|caution)\"", -1).length - 1;
            assertEquals(Math.min(100, Integer.parseInt(told)), sentences, kind);
        }
        assertTrue(get(plan + "/cautions?from=nonsense").body().contains("1 to 100 of "));
        assertTrue(get(plan + "/lots?from=9999").body().contains("Lots 181 to 200 of 200"));
        assertEquals(404, get(plan + "/lots?in=nowhere").status());
    }

    @Test
    void withoutScriptEveryPageThatWaitsAsksAgainWithoutItsFragment() {
        for (String path : WAIT) {
            String page = waiting.getOrDefault(path, "");
            assertTrue(page.contains("data-progress"), path);
            // Of an address that has a fragment, only one told without it is fetched again.
            assertTrue(
                    page.contains("content=\"1; url=" + plan + path.replace("&", "&amp;") + "\""),
                    page);
        }
    }
}
