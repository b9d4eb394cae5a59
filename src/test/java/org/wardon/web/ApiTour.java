package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import org.wardon.files.json.JsonEdit;
import tools.jackson.databind.JsonNode;

/** Asks everything there is once, as a program would, and keeps what it heard. */
final class ApiTour {
    private static final String OF_CHAMBER = "cold";

    private final ApiClient api;

    ApiTour(ApiClient api) {
        this.api = api;
    }

    static Contract contract(String url) throws IOException {
        return new Contract(fetched(url + "/api/openapi.json"), fetched(url + "/api/schema"));
    }

    private static String fetched(String url) throws IOException {
        try {
            HttpResponse<String> answer =
                    HttpClient.newHttpClient()
                            .send(
                                    HttpRequest.newBuilder(URI.create(url)).build(),
                                    HttpResponse.BodyHandlers.ofString());
            assertEquals(200, answer.statusCode(), url);
            return answer.body();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    private static String file(String name) {
        try {
            return Files.readString(Path.of("src/test/resources/plans/api", name));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static String plan() {
        return file("plan.json");
    }

    /** The body that keeps a plan. */
    static String body(String plan, String name) {
        return "{\"name\": "
                + JsonEdit.quoted(name)
                + ", \"plan\": "
                + plan.strip()
                + ", \"files\": {\"weather.csv\": "
                + JsonEdit.quoted(file("weather.csv"))
                + "}}";
    }

    /** Gets in where a passcode is asked for. */
    void enter(String passcode) {
        String asked = "{\"passcode\": \"" + passcode + "\"}";
        api.ask("enter").sending(asked).gives(200);
        api.ask("enter").sending("{\"passcode\": \"soft pears rot\"}").gives(401);
        api.ask("listPlans").gives(401);
    }

    void all() {
        String plan = plans();
        answers(plan);
        chamber(plan);
        door(plan);
        longWork(plan);
        crops();
        own();
        version(plan);
    }

    private String plans() {
        api.ask("readDocument").gives(200);
        api.ask("readPlanSchema").gives(200);
        api.ask("enter").sending("{\"passcode\": \"hard pears keep\"}").unknown().gives(409);
        String steady =
                plan().replace(
                                "{\"csv\": \"weather.csv\"}",
                                "{\"steady\": {\"temperatureC\": 28, \"humidityPct\": 75}}");
        api.ask("keepPlan").sending("{\"plan\": " + steady.strip() + "}").gives(201);
        String body = body(plan(), "A chamber and a chest");
        ApiClient.Answer made = api.ask("keepPlan").sending(body).gives(201);
        String plan = made.json().get("id").toString();
        assertEquals("/api/plans/" + plan, made.header("Location"));
        assertTrue(
                api.ask("readPlan").with("plan", plan).gives(200).json().get("good").asBoolean());
        assertEquals(plan().strip(), api.ask("readPlanText").with("plan", plan).gives(200).body());
        api.ask("exportPlan").with("plan", plan).gives(200);
        JsonNode checked =
                api.ask("checkPlan").sending("{\"plan\": {\"storePlan\": 1}}").gives(200).json();
        assertEquals("$.plan.site", checked.get("faults").get(0).get("path").asString());
        api.ask("keepDemo").gives(201);
        api.ask("listPlans").gives(200);
        api.ask("listVersions").with("plan", plan).gives(200);
        api.ask("readVersion").with("plan", plan).with("version", 1).gives(200);
        return plan;
    }

    private void answers(String plan) {
        api.ask("advise").with("plan", plan).asking("waitS=0").gives(202);
        api.ask("daysLeft").with("plan", plan).asking("waitS=0").gives(202);
        JsonNode job = api.ask("readJob").with("job", "forecast-" + plan + "-1").gives(200).json();
        assertEquals("ready", api.over(job).get("state").asString());
        api.ask("readResult").with("job", "forecast-" + plan + "-1").gives(303);
        api.ask("advise").with("plan", plan).gives(200);
        api.ask("daysLeft").with("plan", plan).gives(200);
        api.ask("tellFace")
                .with("plan", plan)
                .asking("at=$.chambers[0].faces[0]".replace("[", "%5B").replace("]", "%5D"))
                .gives(200);
        api.ask("share").asking("crop=mango%3D5&crop=banana&days=4").gives(200);
        lotsThatShare(plan);
        JsonNode borne =
                api.ask("share")
                        .asking("crop=apple&crop=broccoli&accept=ethylene")
                        .gives(200)
                        .json();
        assertEquals("ethylene", borne.get("accepted").get(0).get("conflict").asString());
        JsonNode twice = api.ask("share").asking("crop=mango&crop=mango").gives(422).json();
        assertEquals("crop", twice.get("faults").get(0).get("path").asString());
    }

    private void lotsThatShare(String plan) {
        JsonNode told =
                api.ask("shareLots")
                        .with("plan", plan)
                        .asking("lot=M1&lot=C1&crop=lettuce%3D4")
                        .gives(200)
                        .json();
        assertNotEquals("good", told.get("answer").get("verdict").asString());
        JsonNode lots = told.get("lots");
        assertEquals(3, lots.size());
        assertEquals("M1", lots.get(0).get("id").asString());
        assertEquals(6, lots.get(2).get("wholeDays").asDouble(), 1e-9, "4 days and 2 of market");
        // Mangoes are hurt below 10 to 13 °C, lettuce bears 0 °C: field rules and handbook.
        assertTrue(lots.get(0).get("coldHarmsBelowC").asDouble() > 5);
        assertTrue(lots.get(2).get("bearsC").get("low").asDouble() < 2);
        JsonNode unknown =
                api.ask("shareLots").with("plan", plan).asking("lot=nobody").gives(422).json();
        JsonNode fault = unknown.get("faults").get(0);
        assertEquals("lot", fault.get("path").asString());
        assertEquals("'nobody': no lot of the plan is called so", fault.get("found").asString());
        api.ask("shareLots").with("plan", plan).gives(422);
    }

    private ApiClient.Question of(String id, String plan) {
        return api.ask(id).with("plan", plan).with("chamber", OF_CHAMBER);
    }

    private void chamber(String plan) {
        for (String curve : new String[] {"air", "humidity", "co2", "ethylene", "cooling"}) {
            JsonNode told = of("readCurve", plan).with("curve", curve).gives(200).json();
            assertEquals(48, told.get("time").size());
            assertEquals(48, told.get("lines").get(0).get("values").size());
        }
        of("readLotCurve", plan).with("lot", "M1").gives(200);
        of("readLotCurve", plan).with("lot", "C1").gives(404);
        of("readSeries", plan).gives(200);
        of("readLotSeries", plan).with("lot", "M1").gives(200);
        of("readHeat", plan).gives(200);
        JsonNode why =
                of("why", plan)
                        .with("at", "2026-03-02T15:00")
                        .asking("face=roof&lot=M1")
                        .gives(200)
                        .json();
        assertEquals("roof", why.get("face").get("face").asString());
        of("whatIf", plan).asking("settingC=14&openingsPerDay=20").gives(200);
        JsonNode face =
                of("whatIf", plan)
                        .asking("insulationFactor=2&insulationFace=rof")
                        .gives(422)
                        .json();
        assertEquals("insulationFace", face.get("faults").get(0).get("path").asString());
        of("size", plan).asking("pullDownHours=12").gives(200);
        api.ask("section").with("plan", plan).with("chamber", "chest").gives(200);
        of("section", plan).gives(422);
    }

    private void door(String plan) {
        String lot = "commodity=mango&massKg=300&temperatureC=28&ripeness=green";
        api.ask("receive").with("plan", plan).asking(lot + "&waitS=0").gives(202);
        JsonNode answer =
                api.ask("receive").with("plan", plan).asking(lot + "&waitS=60").gives(200).json();
        assertEquals("mango", answer.get("commodity").asString());
        api.over(api.ask("readJob").with("job", "door-" + plan + "-1").gives(200).json());
        String put =
                "{\"commodity\": \"mango\", \"massKg\": 300, \"temperatureC\": 28,"
                        + " \"ripeness\": \"green\", \"chamber\": \"cold\"}";
        JsonNode nowhere =
                api.ask("putLot")
                        .with("plan", plan)
                        .header("If-Match", "\"1\"")
                        .sending(put.replace("\"cold\"", "\"colt\""))
                        .gives(422)
                        .json();
        assertEquals("$.chamber", nowhere.get("faults").get(0).get("path").asString());
        ApiClient.Answer kept =
                api.ask("putLot")
                        .with("plan", plan)
                        .header("If-Match", "\"1\"")
                        .sending(put)
                        .gives(201);
        assertEquals("\"2\"", kept.header("ETag"));
        assertTrue(api.ask("readPlan").with("plan", plan).gives(200).body().contains("\"MAN1\""));
    }

    private void longWork(String plan) {
        String other =
                api.ask("keepPlan")
                        .sending(body(plan(), "Placed"))
                        .gives(201)
                        .json()
                        .get("id")
                        .toString();
        String wish = "{\"wish\": \"most-value\", \"mayMove\": [\"C1\"]}";
        JsonNode placing = api.ask("place").with("plan", other).sending(wish).gives(202).json();
        JsonNode nobody =
                api.ask("place")
                        .with("plan", plan)
                        .sending("{\"mayMove\": [\"M2\"]}")
                        .gives(422)
                        .json();
        assertEquals("$.mayMove[0]", nobody.get("faults").get(0).get("path").asString());
        String changes =
                "{\"variants\": [{\"name\": \"warmer\", \"set\":"
                        + " [\"chambers[cold].setting.temperatureC=14\"]}]}";
        JsonNode comparing =
                api.ask("compare").with("plan", plan).sending(changes).gives(202).json();
        JsonNode again = api.ask("compare").with("plan", plan).sending(changes).gives(202).json();
        assertEquals(comparing.get("job"), again.get("job"));
        String wrong = changes.replace("setting", "seting");
        JsonNode refused = api.ask("compare").with("plan", plan).sending(wrong).gives(422).json();
        assertTrue(
                refused.get("faults")
                        .get(0)
                        .get("text")
                        .asString()
                        .startsWith(
                                "variant 'warmer' $.chambers[0].seting: is not a name known here;"),
                refused.toString());
        JsonNode stopped =
                api.ask("compare")
                        .with("plan", plan)
                        .sending(changes.replace("14", "15"))
                        .gives(202)
                        .json();
        api.ask("cancelJob").with("job", stopped.get("job").asString()).gives(202);
        assertEquals("cancelled", api.over(stopped).get("state").asString());
        api.ask("readResult").with("job", stopped.get("job").asString()).gives(409);
        for (JsonNode job : new JsonNode[] {placing, comparing}) {
            JsonNode over = api.over(job);
            assertEquals("ready", over.get("state").asString(), over.toString());
            api.ask("readResult").with("job", job.get("job").asString()).gives(200);
        }
        String job = placing.get("job").asString();
        assertEquals(
                "2",
                api.ask("keepPlacing")
                        .with("job", job)
                        .gives(200)
                        .json()
                        .get("version")
                        .toString());
        JsonNode late = api.ask("keepPlacing").with("job", job).gives(409).json();
        assertEquals("1", late.get("versions").get("startedFrom").toString());
    }

    private void crops() {
        JsonNode found = api.ask("listCrops").asking("like=lady&most=3").gives(200).json();
        assertEquals("okra", found.get("crops").get(0).get("id").asString());
        api.ask("look").with("crop", "mango").gives(200);
        api.ask("keep").with("crop", "mango").asking("atC=12&days=5&ripeness=green").gives(200);
        JsonNode hot = api.ask("keep").with("crop", "mango").asking("atC=90").gives(422).json();
        assertEquals("atC", hot.get("faults").get(0).get("path").asString());
        api.ask("readSource").with("source", "AH66-2016").gives(200);
    }

    private void own() {
        api.ask("setOwnValue")
                .with("crop", "mango")
                .with("fact", "storage-temperature")
                .sending("{\"low\": 12, \"high\": 13}")
                .gives(200);
        JsonNode values = api.ask("listOwnValues").with("crop", "mango").gives(200).json();
        assertEquals(13, values.get("own").get(0).get("high").asDouble());
        assertTrue(
                api.ask("look").with("crop", "mango").gives(200).body().contains("\"own\" : true"));
        api.ask("forgetOwnValue")
                .with("crop", "mango")
                .with("fact", "storage-temperature")
                .gives(204);
        api.ask("forgetOwnValue")
                .with("crop", "mango")
                .with("fact", "storage-temperature")
                .gives(404);
        JsonNode lots =
                api.ask("rememberOwnLot")
                        .with("crop", "mango")
                        .sending(
                                "{\"ended\": \"sold\", \"atC\": 12, \"days\": 9, \"lot\": \"tree 3\"}")
                        .gives(201)
                        .json();
        api.ask("listOwnLots").with("crop", "mango").gives(200);
        api.ask("forgetOwnLot")
                .with("crop", "mango")
                .with("number", lots.get("lots").get(0).get("number"))
                .gives(204);
    }

    private void version(String plan) {
        api.ask("undo").with("plan", plan).sending("{\"version\": 2}").gives(200);
        api.ask("redo").with("plan", plan).sending("{\"version\": 1}").gives(200);
        api.ask("replacePlan")
                .with("plan", plan)
                .header("If-Match", "\"2\"")
                .sending(body(plan(), "The same again"))
                .gives(200);
        api.ask("deletePlan").with("plan", plan).asking("version=3").gives(204);
        api.ask("readPlan").with("plan", plan).gives(404);
    }
}
