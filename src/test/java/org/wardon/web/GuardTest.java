package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
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
    static final String POLICY =
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

    static void refused(Answer answer, int status, String happened) {
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
        assertEquals("0; url=http://" + http.host() + "/plans", link.header("Refresh"));
        assertEquals("", link.header("Set-Cookie"), "a link takes no session's place");
        assertFalse(link.body().contains("name=\"token\""), link.body());
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
                "/api",
                "/api/plans",
                "/api/openapi.json",
                "/api/nope",
                "/plan/1/chamber/x"
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

    private static void problem(Answer answer, int status, String title) {
        assertEquals(status, answer.status(), answer.head());
        assertEquals("application/problem+json", answer.header("Content-Type"));
        assertTrue(answer.body().contains("\"title\" : \"" + title + "\""), answer.body());
        assertEquals(POLICY, answer.header("Content-Security-Policy"));
        assertFalse(answer.body().contains("\tat "), answer.body());
    }

    private String secret() {
        try {
            return "Authorization: Bearer " + Files.readString(home.resolve("api-secret")).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void programsChangeNothingWithoutTheSecret() {
        String unknown = "Who asks is not known";
        String wrong = "Who asks is not known: the secret is wrong or too old";
        Visitor me = http.visitor("/plans");
        String cookie = "Cookie: " + me.cookie();
        problem(http.send("POST", "/api/plans/demo", ""), 401, unknown);
        for (String given :
                List.of(
                        "Bearer",
                        "Bearer ",
                        "Bearer x",
                        "Basic YTpi",
                        "Bearer " + me.cookie().replaceFirst(".*=", ""),
                        "Bearer " + me.token())) {
            Answer refused =
                    http.send(
                            "POST",
                            "/api/plans/demo",
                            "",
                            "Authorization: " + given,
                            cookie,
                            "X-Wardon-Token: " + me.token());
            problem(refused, 401, wrong);
            assertEquals("Bearer realm=\"wardon\"", refused.header("WWW-Authenticate"));
            assertEquals("", refused.header("Set-Cookie"));
        }
        String distrusted = "The form could not be trusted, so nothing was done";
        problem(http.send("POST", "/api/plans/demo", "", cookie), 403, distrusted);
        problem(
                http.send("DELETE", "/api/plans/1?version=1", "", cookie, "X-Wardon-Token: x"),
                403,
                distrusted);
        assertEquals("{\n  \"plans\" : [ ]\n}\n", http.get("/api/plans", secret()).body());
        assertEquals(
                201,
                http.send("POST", "/api/plans/demo", "", cookie, "X-Wardon-Token: " + me.token())
                        .status());
        Answer known = http.send("POST", "/api/plans/demo", "", secret());
        assertEquals(201, known.status());
        assertEquals("", known.header("Set-Cookie"), "a program gets no session");
    }

    @Test
    void theSecretOpensTheInterfaceAloneAndNoForeignSiteCanUseIt() {
        String site = "Another site tried to use this page";
        Answer page = http.send("POST", "/plans/demo", "a=b", secret());
        assertEquals(403, page.status(), "pages know no bearer");
        problem(
                http.send("POST", "/api/plans/demo", "", secret(), "Origin: http://evil.example"),
                403,
                site);
        problem(
                http.send("POST", "/api/plans/demo", "", secret(), "Sec-Fetch-Site: cross-site"),
                403,
                site);
        String port = http.host().replaceFirst(".*:", ":");
        problem(
                http.get("/api/plans", secret(), "Host: evil.example" + port),
                421,
                "This page was asked for under a name that is not its own");
        problem(
                http.send("OPTIONS", "/api/plans", "", "Origin: http://" + http.host()),
                405,
                "This page cannot be asked in that way");
        assertEquals("", http.get("/api/plans").header("Access-Control-Allow-Origin"));
    }

    @Test
    void theSecretIsItsOwnersAlone() throws IOException {
        Path file = home.resolve("api-secret");
        String first = Files.readString(file);
        assertEquals(
                "rw-------", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
        server.close();
        serve(Optional.empty());
        assertEquals(first, Files.readString(file), "it lasts");
        server.close();
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r--r--"));
        serve(Optional.empty());
        String second = Files.readString(file);
        assertNotEquals(first, second, "what others could read is replaced");
        server.close();
        Path elsewhere = Files.writeString(home.resolve("elsewhere"), second);
        Files.delete(file);
        Files.createSymbolicLink(file, elsewhere);
        serve(Optional.empty());
        assertFalse(Files.isSymbolicLink(file));
        assertNotEquals(second, Files.readString(file));
        assertEquals(second, Files.readString(elsewhere), "a link is not followed");
        try (Stream<Path> left = Files.list(home)) {
            assertEquals(
                    List.of("api-secret", "elsewhere"),
                    left.map(one -> one.getFileName().toString()).sorted().toList());
        }
    }

    @Test
    void programsGetInByThePasscodeAndTriesAreLimited() {
        server.close();
        serve(Optional.of(new Passcode(CODE, "test", hands)));
        String json = "Content-Type: application/json";
        problem(http.get("/api/plans"), 401, "Who asks is not known");
        problem(http.get("/api/openapi.json"), 401, "Who asks is not known");
        assertEquals(200, http.get("/api/plans", secret()).status());
        Answer in = http.send("POST", "/api/enter", "{\"passcode\": \"" + CODE + "\"}", json);
        assertEquals(200, in.status(), in.body());
        assertEquals("", in.header("Set-Cookie"));
        String bearer =
                "Authorization: Bearer "
                        + in.body().replaceAll("(?s).*\"bearer\" : \"([^\"]+)\".*", "$1");
        assertEquals(201, http.send("POST", "/api/plans/demo", "", bearer).status());
        hands.forward(Duration.ofHours(13));
        assertEquals(401, http.get("/api/plans", bearer).status(), "it ends after long silence");
        for (int i = 0; i < 5; i++) {
            problem(
                    http.send("POST", "/api/enter", "{\"passcode\": \"guess " + i + "\"}", json),
                    401,
                    "The passcode is wrong");
        }
        Answer limited = http.send("POST", "/api/enter", "{\"passcode\": \"" + CODE + "\"}", json);
        problem(limited, 429, "Too many wrong passcodes");
        assertEquals("300", limited.header("Retry-After"));
        problem(
                http.send(
                        "POST",
                        "/api/enter",
                        "{\"passcode\": \"" + CODE + "\"}",
                        json,
                        "Origin: http://evil.example"),
                403,
                "Another site tried to use this page");
    }
}
