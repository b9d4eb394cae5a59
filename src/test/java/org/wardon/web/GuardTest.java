package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.errors.BadInput;
import org.wardon.web.RawHttp.Answer;
import org.wardon.web.RawHttp.Visitor;
import org.wardon.web.guard.Passcode;

/** The pages attacked over the wire. */
class GuardTest {
    private static final String POLICY =
            "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self';"
                    + " connect-src 'self'; form-action 'self'; frame-ancestors 'none';"
                    + " base-uri 'none'";
    private static final String CODE = "hard pears keep";

    @TempDir Path home;

    private final Hands hands = new Hands();
    private WebServer server;
    private RawHttp http;

    /** A clock put forward by hand. */
    private static final class Hands extends Clock {
        private Instant now = Instant.parse("2026-03-02T12:00:00Z");

        @Override
        public ZoneId getZone() {
            return ZoneOffset.UTC;
        }

        @Override
        public Clock withZone(ZoneId zone) {
            return this;
        }

        @Override
        public synchronized Instant instant() {
            return now;
        }

        synchronized void forward(Duration by) {
            now = now.plus(by);
        }
    }

    @BeforeEach
    void start() {
        serve(Optional.empty());
    }

    private void serve(Optional<Passcode> passcode) {
        server = WebServer.start(new WebOptions("127.0.0.1", 0, passcode, home, hands));
        http = new RawHttp(server.url());
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private static void refused(Answer answer, int status, String happened) {
        assertEquals(status, answer.status(), answer.head());
        assertTrue(answer.body().contains("<h1>" + happened + "</h1>"), answer.body());
        assertEquals(POLICY, answer.header("Content-Security-Policy"));
        assertFalse(answer.body().contains("\tat "), answer.body());
    }

    @Test
    void aNameThatIsNotOursIsRefused() {
        String happened = "This page was asked for under a name that is not its own";
        String port = http.host().replaceFirst(".*:", ":");
        for (String host :
                List.of("evil.example" + port, "127.0.0.1:1", "127.0.0.1", "a@" + port)) {
            Answer answer = http.get("/plans", "Host: " + host);
            assertTrue(answer.status() == 421 || answer.status() == 400, host + answer.head());
            assertFalse(answer.body().contains("Plans kept</h1>"), answer.body());
        }
        refused(http.get("/plans", "Host: evil.example" + port), 421, happened);
        assertEquals(200, http.get("/plans", "Host: localhost" + port).status());
    }

    @Test
    void foreignPagesReachNothingButTheFrontOfALink() {
        String happened = "Another site tried to use this page";
        Visitor me = http.visitor("/plans");
        String form = "token=" + me.token();
        for (String origin : List.of("http://evil.example", "null", "https://" + http.host())) {
            refused(http.post(me, "/plans/demo", form, "Origin: " + origin), 403, happened);
        }
        refused(http.post(me, "/plans/demo", form, "Sec-Fetch-Site: same-site"), 403, happened);
        refused(http.get("/plans", "Sec-Fetch-Site: cross-site"), 403, happened);
        Answer link =
                http.get(
                        "/plans",
                        "Sec-Fetch-Site: cross-site",
                        "Sec-Fetch-Mode: navigate",
                        "Sec-Fetch-Dest: document");
        assertEquals(200, link.status());
        Answer own = http.post(me, "/plans/demo", form, "Origin: http://" + http.host());
        assertEquals(303, own.status());
    }

    @Test
    void aChangeWithoutTheTokenOfItsSessionIsRefused() {
        String happened = "The form could not be trusted, so nothing was done";
        Visitor me = http.visitor("/plans");
        Visitor other = http.visitor("/plans");
        refused(http.post(me, "/plans/demo", "a=b"), 403, happened);
        refused(http.post(me, "/plans/demo", "token=wrong"), 403, happened);
        refused(http.post(me, "/plans/demo", "token=" + other.token()), 403, happened);
        refused(http.post(me, "/plans/demo?token=wrong", "a=b"), 403, happened);
        assertEquals("{\n  \"plans\" : [ ]\n}\n", http.get("/api/plans").body());
        Answer byHeader = http.post(me, "/plans/demo", "a=b", "X-Wardon-Token: " + me.token());
        assertEquals(303, byHeader.status());
    }

    @Test
    void aSessionEndsAfterLongSilence() {
        Visitor me = http.visitor("/plans");
        hands.forward(Duration.ofHours(11));
        assertEquals(303, http.post(me, "/plans/demo", "token=" + me.token()).status());
        hands.forward(Duration.ofHours(13));
        refused(
                http.post(me, "/plans/demo", "token=" + me.token()),
                403,
                "This page has grown too old, so nothing was done");
        refused(
                http.post(new Visitor("wardon-session-1=made-up", ""), "/plans/demo", "token=x"),
                403,
                "This page has grown too old, so nothing was done");
    }

    @Test
    void cookiesAreForThisServerAlone() {
        String cookie = http.get("/plans").header("Set-Cookie");
        assertTrue(cookie.endsWith("; Path=/; HttpOnly; SameSite=Strict"), cookie);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/",
                "/plans",
                "/preferences",
                "/enter",
                "/crops",
                "/plan/7",
                "/plan/x",
                "/nope",
                "/static/x/wardon.css",
                "/static/0/../1",
                "/api/plans",
                "/api/nope",
                "/plan/1/air/x"
            })
    void everyAnswerCarriesThePolicyAndIsNotStored(String path) {
        Answer answer = http.get(path);
        assertEquals(POLICY, answer.header("Content-Security-Policy"), answer.head());
        assertEquals("no-store", answer.header("Cache-Control"));
        assertEquals("nosniff", answer.header("X-Content-Type-Options"));
        assertEquals("same-origin", answer.header("Cross-Origin-Resource-Policy"));
        assertEquals("", answer.header("Server"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/static/../../../etc/passwd",
                "/static/%2e%2e/%2e%2e/etc/passwd",
                "/static/..%2f..%2fetc/passwd",
                "/static//etc/passwd",
                "/plan/..%2f..%2fetc",
                "/plan/1%00",
                "/plan/99999999999999999999",
                "/plan/-1",
                "//etc/passwd"
            })
    void pathTricksFindNothing(String path) {
        Answer answer = http.get(path);
        assertTrue(answer.status() == 404 || answer.status() == 400, answer.head());
        assertFalse(answer.body().contains("root:"), answer.body());
    }

    @Test
    void headersCannotBeBrokenOpenAndAreLimited() {
        Visitor me = http.visitor("/plans");
        Answer split = http.get("/plans%0d%0aSet-Cookie:%20a=b", "Cookie: " + me.cookie());
        assertFalse(split.head().contains("a=b"), split.head());
        Answer kept =
                http.post(
                        me,
                        "/preferences",
                        "token=" + me.token() + "&light=dark%0d%0aX-Evil:%20yes&temperature=f");
        assertEquals(303, kept.status());
        assertTrue(kept.header("Set-Cookie").startsWith("wardon-preferences=f.kg.point.auto;"));
        assertEquals("", kept.header("X-Evil"));
        assertEquals(431, http.get("/plans", "X-Long: " + "a".repeat(9_000)).status());
        assertEquals(405, http.send("PUT", "/plans", "").status());
        assertEquals(405, http.send("TRACE", "/plans", "").status());
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
    void uploadsAreLimitedInSizeAndKindAndNameNoPath() {
        Visitor me = http.visitor("/plans");
        refused(upload(me, "big.json", " ".repeat(8_000_100)), 413, "What was sent is too large");
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
        refused(tooMuch, 413, "What was sent is too large");
    }

    @Test
    void aChangeFromAVersionThatNoLongerCountsIsRefused() {
        Visitor me = http.visitor("/plans");
        http.post(me, "/plans/demo", "token=" + me.token());
        refused(
                http.post(me, "/plan/1/undo", "token=" + me.token() + "&version=9"),
                409,
                "The plan was changed elsewhere in the meantime");
        refused(
                http.post(me, "/plan/1/delete", "token=" + me.token()),
                400,
                "The form does not say from which version it started");
        assertTrue(http.get("/api/plans").body().contains("\"version\" : 1"));
    }

    @Test
    void thePasscodeIsAskedForAndTriesAreLimited() {
        server.close();
        serve(Optional.of(new Passcode(CODE, "test", hands)));
        assertEquals("/enter", http.get("/plans").header("Location"));
        assertEquals(401, http.get("/api/plans").status());
        Visitor outside = http.visitor("/enter");
        String form = "token=" + outside.token() + "&passcode=";
        assertEquals(303, http.post(outside, "/plans/demo", form).status());
        Answer in = http.post(outside, "/enter", form + "hard+pears+keep");
        assertEquals(303, in.status());
        assertNotEquals(outside.cookie(), in.cookie().orElseThrow(), "a planted session is ended");
        assertEquals(200, http.get("/plans", "Cookie: " + in.cookie().get()).status());
        assertEquals(
                "/enter", http.get("/plans", "Cookie: " + outside.cookie()).header("Location"));

        Visitor guesser = http.visitor("/enter");
        String guess = "token=" + guesser.token() + "&passcode=";
        for (int i = 0; i < 5; i++) {
            assertEquals(401, http.post(guesser, "/enter", guess + "wrong" + i).status());
        }
        refused(
                http.post(guesser, "/enter", guess + "hard+pears+keep"),
                429,
                "Too many wrong passcodes");
        hands.forward(Duration.ofMinutes(6));
        assertEquals(303, http.post(guesser, "/enter", guess + "hard+pears+keep").status());
    }

    @Test
    void aPasscodeTooShortAndAPortInUseAreRefusedInWords() {
        assertEquals(
                "code.txt: the passcode has 3 characters; accepted: at least 8, on one line",
                assertThrows(BadInput.class, () -> new Passcode("abc\n", "code.txt", hands))
                        .getMessage());
        int port = Integer.parseInt(http.host().replaceFirst(".*:", ""));
        WebOptions taken = new WebOptions("127.0.0.1", port, Optional.empty(), home, hands);
        assertEquals(
                "open: nothing can listen on 127.0.0.1 port "
                        + port
                        + ", another program does perhaps; give another with --port, or 0 for any"
                        + " free one",
                assertThrows(BadInput.class, () -> WebServer.start(taken)).getMessage());
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
