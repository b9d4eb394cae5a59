package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.web.RawHttp.Answer;
import org.wardon.web.RawHttp.Visitor;

/** What is sent is too much, too many, too slow, of another kind or of two meanings. */
class LimitsTest {
    @TempDir Path home;

    private WebServer server;
    private RawHttp http;

    @BeforeEach
    void start() {
        server =
                WebServer.start(
                        new WebOptions("127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()));
        http = new RawHttp(server.url());
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private static void problem(Answer answer, int status, String title) {
        assertEquals(status, answer.status(), answer.head());
        assertEquals("application/problem+json", answer.header("Content-Type"));
        assertTrue(answer.body().contains("\"title\" : \"" + title + "\""), answer.body());
        assertEquals(GuardTest.POLICY, answer.header("Content-Security-Policy"));
        assertFalse(answer.body().contains("\tat "), answer.body());
    }

    private String secret() {
        try {
            return "Authorization: Bearer " + Files.readString(home.resolve("api-secret")).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Answer upload(Visitor me, String fileName, String content) {
        String part = "--b\r\nContent-Disposition: form-data; name=";
        String body =
                part
                        + "\"token\"\r\n\r\n"
                        + me.token()
                        + "\r\n"
                        + part
                        + "\"plan\"; filename=\""
                        + fileName
                        + "\"\r\n\r\n"
                        + content
                        + "\r\n--b--\r\n";
        return http.send(
                "POST",
                "/plans/bring",
                body,
                "Cookie: " + me.cookie(),
                "Content-Type: multipart/form-data; boundary=b");
    }

    @Test
    void largeAndManyFieldedFormsAreRefusedUnread() {
        Visitor me = http.visitor("/plans");
        String field = "token=" + me.token();
        GuardTest.refused(
                http.post(me, "/plans/demo", field + "&a=1".repeat(200_000)),
                413,
                "What was sent is too large");
        GuardTest.refused(
                http.exactly(
                        "POST /plans/demo HTTP/1.1\r\nHost: "
                                + http.host()
                                + "\r\nCookie: "
                                + me.cookie()
                                + "\r\nContent-Type: application/x-www-form-urlencoded\r\n"
                                + "Transfer-Encoding: chunked\r\nConnection: close\r\n\r\n"),
                411,
                "The form does not say how long it is");
        assertEquals("{\n  \"plans\" : [ ]\n}\n", http.get("/api/plans").body());
    }

    @Test
    void aBodyOfAnotherKindChangesNothingThroughTheInterface() {
        String form = "Content-Type: application/x-www-form-urlencoded";
        String text = "Content-Type: text/plain";
        String plan = "{\"plan\": {}, \"evenFaulty\": true}";
        for (String kind : List.of(form, text, "Content-Type: multipart/form-data; boundary=b")) {
            problem(
                    http.send("POST", "/api/plans", plan, kind, secret()),
                    415,
                    "What was sent is not said to be JSON");
            assertEquals(401, http.send("POST", "/api/plans", plan, kind).status());
        }
        assertEquals("{\n  \"plans\" : [ ]\n}\n", http.get("/api/plans").body());
    }

    @Test
    void namesOfTwoMeaningsAndLongAddressesAreRefused() {
        String ask = "GET http://evil.example/plans HTTP/1.1\r\nHost: " + http.host();
        assertEquals(400, http.exactly(ask + "\r\nConnection: close\r\n\r\n").status());
        ask = "GET /plans HTTP/1.1\r\nHost: " + http.host() + "\r\nHost: evil.example";
        assertEquals(400, http.exactly(ask + "\r\nConnection: close\r\n\r\n").status());
        assertEquals(421, http.exactly("GET /plans HTTP/1.0\r\n\r\n").status());
        ask = "POST /plans/demo HTTP/1.1\r\nHost: " + http.host() + "\r\nContent-Length: 5\r\n";
        assertEquals(
                400,
                http.exactly(
                                ask
                                        + "Transfer-Encoding: chunked\r\nConnection: close\r\n\r\n"
                                        + "0\r\n\r\n")
                        .status(),
                "a body of two lengths");
        assertEquals(414, http.get("/plans?" + "a".repeat(9_000)).status());
        assertEquals(200, http.get("/plans", "X-Forwarded-Host: evil.example").status());
        assertEquals("", http.send("HEAD", "/plans", "").body());
    }

    @Test
    void jsonThatIsAllFaultsOrOneHugeNumberIsToldShort() {
        String json = "Content-Type: application/json";
        String number =
                "{\"plan\": {\"storePlan\": 1, \"days\": 1e999999999}, \"evenFaulty\": true}";
        assertEquals(201, http.send("POST", "/api/plans", number, json, secret()).status());
        String lots = "{},".repeat(100_000) + "{}";
        String many = "{\"plan\": {\"lots\": [" + lots + "]}, \"evenFaulty\": true}";
        assertEquals(201, http.send("POST", "/api/plans", many, json, secret()).status());
        String name =
                "{\"plan\": {\"name\": \"" + "a".repeat(1_000_000) + "\"}, \"evenFaulty\": true}";
        assertEquals(201, http.send("POST", "/api/plans", name, json, secret()).status());
        for (String path : List.of("/plans", "/plan/1", "/plan/2/edit", "/plan/3", "/api/plans")) {
            Answer page = http.get(path);
            assertEquals(200, page.status(), path);
            assertTrue(page.body().length() < 100_000, path + " of " + page.body().length());
        }
    }

    /** More of them than the server has threads, each a byte at a time. */
    @Test
    void thoseWhoSendVerySlowlyKeepNobodyOut() throws Exception {
        Visitor me = http.visitor("/plans");
        String begun =
                "POST /plans/demo HTTP/1.1\r\nHost: "
                        + http.host()
                        + "\r\nCookie: "
                        + me.cookie()
                        + "\r\nContent-Type: application/x-www-form-urlencoded\r\n"
                        + "Content-Length: 400000\r\n\r\n";
        List<RawHttp.Slow> slow = new ArrayList<>();
        try {
            for (int i = 0; i < 60; i++) {
                slow.add(http.slow(begun));
            }
            for (int second = 0; second < 3; second++) {
                slow.forEach(RawHttp.Slow::another);
                Thread.sleep(1_000);
            }
            assertEquals(200, http.get("/plans").status());
        } finally {
            slow.forEach(RawHttp.Slow::close);
        }
    }

    @Test
    void uploadsAreLimitedInSizeAndKindAndNameNoPath() {
        Visitor me = http.visitor("/plans");
        GuardTest.refused(
                upload(me, "big.json", " ".repeat(8_000_100)), 413, "What was sent is too large");
        Answer kind = upload(me, "plan.exe", "{}");
        assertEquals(422, kind.status());
        assertTrue(kind.body().contains("the file is of another kind; accepted: .json"));
        assertEquals(303, upload(me, "../../etc/x<b>.json", "{}").status());
        String plans = http.get("/api/plans").body();
        assertTrue(plans.contains("\"name\" : \"x_b_\""), plans);
        Answer tooMuch =
                http.exactly(
                        "POST /plans/bring HTTP/1.1\r\nHost: "
                                + http.host()
                                + "\r\nCookie: "
                                + me.cookie()
                                + "\r\nContent-Type: multipart/form-data; boundary=b\r\n"
                                + "Content-Length: 900000000\r\nConnection: close\r\n\r\n");
        GuardTest.refused(tooMuch, 413, "What was sent is too large");
    }

    @Test
    void bodiesAreLimitedAndNameNoPath() throws IOException {
        String json = "Content-Type: application/json";
        Answer tooMuch =
                http.exactly(
                        "POST /api/plans HTTP/1.1\r\nHost: "
                                + http.host()
                                + "\r\n"
                                + secret()
                                + "\r\n"
                                + json
                                + "\r\nContent-Length: 900000000\r\nConnection: close\r\n\r\n");
        problem(tooMuch, 413, "What was sent is too large");
        String deep = "{\"plan\": " + "[".repeat(5_000) + "]".repeat(5_000) + "}";
        Answer nested = http.send("POST", "/api/plans", deep, json, secret());
        problem(nested, 400, "What was given cannot be used");
        for (String name : List.of("../../etc/passwd", "/etc/passwd", "a/b.csv", "..", ".x")) {
            String body =
                    "{\"plan\": {\"weather\": {\"csv\": \""
                            + name
                            + "\"}}, \"evenFaulty\": true, \"files\": {\""
                            + name
                            + "\": \"x\"}}";
            problem(
                    http.send("POST", "/api/plans", body, json, secret()),
                    422,
                    "What was given cannot be used");
        }
        Path outside = Files.writeString(home.resolve("weather.csv"), "time,temperatureC\n");
        String reading =
                "{\"plan\": {\"weather\": {\"csv\": \"" + outside + "\"}}, \"evenFaulty\": true}";
        assertEquals(201, http.send("POST", "/api/plans", reading, json, secret()).status());
        Answer kept = http.get("/api/plans/1");
        assertTrue(kept.body().contains("is not attached"), kept.body());
        for (String path :
                List.of(
                        "/api/../etc/passwd",
                        "/api/plans/..%2f..%2fetc",
                        "/api/plans/1%00",
                        "/api/plans/99999999999999999999",
                        "/api/sources/..%2f..%2fetc%2fpasswd",
                        "/api/jobs/forecast-1-1%0d%0aSet-Cookie:%20a=b",
                        "/api/crops/%3Cscript%3E")) {
            Answer answer = http.get(path);
            assertTrue(answer.status() == 404 || answer.status() == 400, path + answer.head());
            assertFalse(answer.head().contains("a=b"), answer.head());
        }
    }

    @Test
    void twentyPeopleAtOnceAreServed() throws Exception {
        ExecutorService people = Executors.newFixedThreadPool(20);
        try {
            List<Future<Integer>> asked =
                    IntStream.range(0, 200)
                            .mapToObj(
                                    i ->
                                            people.submit(
                                                    () ->
                                                            http.get(
                                                                            i % 2 == 0
                                                                                    ? "/plans"
                                                                                    : "/crops")
                                                                    .status()))
                            .toList();
            for (Future<Integer> one : asked) {
                assertEquals(200, one.get());
            }
        } finally {
            people.shutdown();
        }
    }
}
