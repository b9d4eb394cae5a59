package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.web.guard.ApiSecret;
import org.wardon.web.guard.Passcode;
import tools.jackson.databind.JsonNode;

/** Every operation of the interface against the running server, good and bad, by its document. */
class ApiTest {
    @TempDir static Path home;

    private static WebServer server;
    private static Contract contract;
    private static ApiClient api;

    @BeforeAll
    static void serve() throws IOException {
        server =
                WebServer.start(
                        new WebOptions("127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()));
        contract = ApiTour.contract(server.url());
        String secret = Files.readString(home.resolve(ApiSecret.FILE)).strip();
        api = new ApiClient(server.url(), Optional.of(secret), contract);
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @Test
    void everyRouteIsInTheDocumentAndTheReverse() {
        Set<String> documented = new TreeSet<>();
        contract.operations().values().forEach(op -> documented.add(op.method() + " " + op.path()));
        assertEquals(documented, server.routesBelow("/api/"));
    }

    @Test
    void everyOperationAnswersAsTheDocumentSays() throws IOException {
        new ApiTour(api).all();
        Passcode passcode = new Passcode("hard pears keep", "test", Clock.systemUTC());
        try (WebServer open =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1",
                                0,
                                Optional.of(passcode),
                                Files.createDirectory(home.resolve("open")),
                                Clock.systemUTC()))) {
            new ApiTour(new ApiClient(open.url(), Optional.empty(), contract))
                    .enter("hard pears keep");
        }
        Set<String> missing = new TreeSet<>();
        for (Contract.Op op : contract.operations().values()) {
            for (String status : op.statuses()) {
                boolean good = status.compareTo("400") < 0;
                if (good && !contract.seen().contains(op.id() + " " + status)) {
                    missing.add(op.id() + " " + status);
                }
            }
        }
        assertEquals(Set.of(), missing);
    }

    @Test
    void nobodyUnknownChangesAnything() {
        String before = api.ask("listPlans").gives(200).body();
        for (Contract.Op op : contract.operations().values()) {
            if (op.changes() && !op.id().equals("enter")) {
                JsonNode told =
                        filled(api.ask(op.id()), op).sending("{}").unknown().gives(401).json();
                assertEquals("Who asks is not known", told.get("title").asString());
            }
        }
        assertEquals(before, api.ask("listPlans").gives(200).body());
    }

    @Test
    void whatIsNotThereIsTold() {
        for (Contract.Op op : contract.operations().values()) {
            boolean named = op.path().contains("{") && !op.path().endsWith("/own-values/{fact}");
            if (named && !op.takesBody() && !asksSomething(op)) {
                filled(api.ask(op.id()), op).gives(404);
            }
        }
    }

    private static boolean asksSomething(Contract.Op op) {
        for (JsonNode parameter : op.told().path("parameters").values()) {
            if (parameter.path("required").asBoolean()
                    && parameter.get("in").asString().equals("query")) {
                return true;
            }
        }
        return false;
    }

    private static ApiClient.Question filled(ApiClient.Question question, Contract.Op op) {
        for (JsonNode parameter : op.told().path("parameters").values()) {
            if (parameter.path("in").asString().equals("path")) {
                boolean number = parameter.get("schema").get("type").asString().equals("integer");
                question.with(parameter.get("name").asString(), number ? "987654" : "nowhere");
            }
        }
        return question;
    }

    @Test
    void namesNobodyKnowsAreRefusedEverywhere() {
        for (Contract.Op op : contract.operations().values()) {
            if (op.path().contains("{") || op.id().equals("enter")) {
                continue;
            }
            JsonNode told = api.ask(op.id()).asking("nosuchname=1").sending("{}").gives(422).json();
            assertTrue(
                    told.toString().contains("nosuchname: is not a name known here"),
                    told.toString());
        }
    }

    @Test
    void bodiesThatAreNoJsonAreRefused() {
        for (Contract.Op op : contract.operations().values()) {
            if (!op.takesBody()) {
                continue;
            }
            JsonNode cut = filled(api.ask(op.id()), op).sending("{\"plan\": [1,").gives(400).json();
            assertEquals("What was given cannot be used", cut.get("title").asString());
            assertFalse(cut.get("faults").get(0).get("path").asString().isEmpty());
            filled(api.ask(op.id()), op).sending("{}").as("text/plain").gives(415);
            assertFalse(contract.allows(op.id(), "{\"nosuchname\": 1}"), op.id());
            JsonNode strange =
                    filled(api.ask(op.id()), op).sending("{\"nosuchname\": 1}").gives(422).json();
            assertTrue(strange.toString().contains("$.nosuchname"), strange.toString());
        }
    }

    @Test
    void faultsCarryTheirPathsAndTheWordsOfTheCommandLine() throws IOException {
        String plan = ApiTour.plan().replace("\"massKg\": 500", "\"massKgs\": -5");
        JsonNode refused =
                api.ask("keepPlan").sending(ApiTour.body(plan, "Faulty")).gives(422).json();
        assertEquals(
                "body $.plan.lots[0].massKgs: is not a name known here; did you mean 'massKg'?"
                        + " accepted: ",
                refused.get("faults").get(0).get("text").asString().split("id, ")[0]);
        assertFalse(api.ask("listPlans").gives(200).body().contains("Faulty"));
        JsonNode kept =
                api.ask("keepPlan")
                        .sending(
                                ApiTour.body(plan, "Faulty")
                                        .replaceFirst("\\{", "{\"evenFaulty\": true, "))
                        .gives(201)
                        .json();
        JsonNode read = api.ask("readPlan").with("plan", kept.get("id")).gives(200).json();
        assertFalse(read.get("good").asBoolean());
        assertEquals("$.lots[0].massKgs", read.get("faults").get(0).get("path").asString());
        api.ask("advise").with("plan", kept.get("id")).gives(422);
    }

    @Test
    void questionsOutOfReachAreRefusedByTheirNames() {
        Map<String, String> bad =
                Map.of(
                        "massKg", "massKg=0&commodity=mango",
                        "commodity", "massKg=5&commodity=mangoo-nut",
                        "at", "massKg=5&commodity=mango&at=2031-01-01T00:00",
                        "cured", "massKg=5&commodity=mango&cured=maybe",
                        "package", "massKg=5&commodity=mango&package=sack-of-gold");
        String plan =
                api.ask("keepPlan")
                        .sending(ApiTour.body(ApiTour.plan(), "Reach"))
                        .gives(201)
                        .json()
                        .get("id")
                        .toString();
        bad.forEach(
                (name, query) -> {
                    JsonNode told =
                            api.ask("receive")
                                    .with("plan", plan)
                                    .asking(query + "&waitS=60")
                                    .gives(422)
                                    .json();
                    assertEquals("query", told.get("faults").get(0).get("where").asString());
                    assertEquals(name, told.get("faults").get(0).get("path").asString());
                });
        JsonNode own =
                api.ask("setOwnValue")
                        .with("crop", "mango")
                        .with("fact", "colour")
                        .sending("{\"low\": 1}")
                        .gives(422)
                        .json();
        assertEquals("path", own.get("faults").get(0).get("where").asString());
        api.ask("readCurve")
                .with("plan", plan)
                .with("chamber", "cold")
                .with("curve", "smell")
                .gives(404);
        api.ask("why").with("plan", plan).with("chamber", "cold").with("at", "noon").gives(404);
        JsonNode late =
                api.ask("why")
                        .with("plan", plan)
                        .with("chamber", "cold")
                        .with("at", "2031-01-01T00:00")
                        .gives(422)
                        .json();
        assertEquals("at", late.get("faults").get(0).get("path").asString());
    }

    @Test
    void aChangeFromAnOutdatedVersionTellsBothAndKeepsNothing() {
        String body = ApiTour.body(ApiTour.plan(), "Twice");
        String plan = api.ask("keepPlan").sending(body).gives(201).json().get("id").toString();
        assertEquals(
                "\"2\"",
                api.ask("replacePlan")
                        .with("plan", plan)
                        .header("If-Match", "\"1\"")
                        .sending(body)
                        .gives(200)
                        .header("ETag"));
        for (String id : List.of("replacePlan", "undo", "redo", "deletePlan")) {
            Contract.Op op = contract.get(id);
            ApiClient.Question question = api.ask(id).with("plan", plan);
            if (op.takesBody()) {
                question.sending(id.equals("replacePlan") ? body : "{}");
            }
            question.gives(428);
            JsonNode old = question.header("If-Match", "\"1\"").gives(412).json();
            assertEquals(1, old.get("versions").get("startedFrom").asInt());
            assertEquals(2, old.get("versions").get("version").asInt());
        }
        api.ask("undo").with("plan", plan).sending("{\"version\": 1}").gives(409);
        api.ask("deletePlan").with("plan", plan).asking("version=1").gives(409);
        api.ask("undo").with("plan", plan).header("If-Match", "\"x\"").sending("{}").gives(412);
        JsonNode now = api.ask("readPlan").with("plan", plan).gives(200).json();
        assertEquals(2, now.get("kept").get("version").asInt());
    }

    @Test
    void twentyProgramsAtOnceAreServed() throws Exception {
        String body = ApiTour.body(ApiTour.plan(), "Many");
        String plan = api.ask("keepPlan").sending(body).gives(201).json().get("id").toString();
        api.ask("advise").with("plan", plan).asking("waitS=60").gives(200);
        List<Runnable> asked =
                List.of(
                        () -> api.ask("advise").with("plan", plan).gives(200),
                        () -> api.ask("listCrops").asking("like=man").gives(200),
                        () -> api.ask("keep").with("crop", "mango").asking("atC=12").gives(200),
                        () ->
                                api.ask("whatIf")
                                        .with("plan", plan)
                                        .with("chamber", "cold")
                                        .asking("settingC=14")
                                        .gives(200));
        Runnable door =
                () ->
                        api.ask("receive")
                                .with("plan", plan)
                                .asking("commodity=mango&massKg=100&waitS=60")
                                .gives(200);
        var people = java.util.concurrent.Executors.newFixedThreadPool(20);
        try {
            var all = new java.util.ArrayList<java.util.concurrent.Future<?>>();
            for (int i = 0; i < 40; i++) {
                all.add(people.submit(asked.get(i % 4)));
            }
            all.add(people.submit(door));
            all.add(people.submit(door));
            for (var one : all) {
                one.get();
            }
        } finally {
            people.shutdown();
        }
    }
}
