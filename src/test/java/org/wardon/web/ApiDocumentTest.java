package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.web.api.document.ApiWords;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The OpenAPI document by itself: valid by the published schema, closed, and said in words. */
class ApiDocumentTest {
    private static final Path OAS = Path.of("src/test/resources/published/openapi-3.1/schema.json");
    private static final JsonMapper MAPPER = JsonMapper.builder().build();

    @TempDir static Path home;

    private static String text = "";
    private static JsonNode document = MAPPER.createObjectNode();

    @BeforeAll
    static void fetch() throws IOException {
        try (WebServer server =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()))) {
            text = new RawHttp(server.url()).get("/api/openapi.json").body();
        }
        document = MAPPER.readTree(text);
    }

    private static void valid(Schema schema, String json) {
        List<Error> errors = schema.validate(json, InputFormat.JSON);
        assertEquals(List.of(), errors);
    }

    @Test
    void theDocumentIsValidByThePublishedSchemaOfOpenApi() throws IOException {
        SchemaRegistry registry =
                SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
        Schema oas = registry.getSchema(Files.readString(OAS));
        valid(oas, text);
        String broken = text.replaceFirst("\"operationId\"", "\"operationID\"");
        assertTrue(!oas.validate(broken, InputFormat.JSON).isEmpty(), "the schema refuses nothing");
    }

    @Test
    void everyShapeIsASchemaAndClosed() {
        SchemaRegistry registry =
                SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
        Schema meta =
                registry.getSchema(
                        SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        JsonNode shapes = document.at("/components/schemas");
        assertTrue(shapes.size() > 60, shapes.size() + " shapes");
        for (String name : shapes.propertyNames()) {
            valid(meta, shapes.get(name).toString());
            assertEquals("false", shapes.get(name).path("additionalProperties").toString(), name);
        }
    }

    @Test
    void everyReferenceLeadsSomewhere() {
        Matcher ref = Pattern.compile("\"\\$ref\" : \"([^\"]+)\"").matcher(text);
        int found = 0;
        while (ref.find()) {
            String to = ref.group(1);
            boolean there =
                    to.equals("./schema")
                            || (to.startsWith("#")
                                    && !document.at(to.substring(1)).isMissingNode());
            assertTrue(there, to);
            found++;
        }
        assertTrue(found > 300, found + " references");
    }

    @Test
    void examplesAreRealAnswersThatFitTheirSchemas() {
        Contract contract = new Contract(text, org.wardon.files.Schema.text());
        JsonNode paths = document.get("paths");
        int held = 0;
        for (Contract.Op op : contract.operations().values()) {
            for (String status : op.statuses()) {
                JsonNode media =
                        op.told().at("/responses/" + status + "/content/application~1json/example");
                if (!media.isMissingNode()) {
                    contract.gave(
                            op.id(),
                            Integer.parseInt(status),
                            "application/json",
                            media.toString());
                    held++;
                }
            }
            JsonNode sent = op.told().at("/requestBody/content/application~1json/example");
            if (!sent.isMissingNode()) {
                contract.takes(op.id(), sent.toString());
                held++;
            } else {
                assertTrue(!op.takesBody(), op.id() + " has no example");
            }
        }
        assertTrue(held > 50, held + " examples of " + paths.size() + " paths");
    }

    @Test
    void everyNameIsSaidAndNoWordIsIdle() {
        ApiWords words = new ApiWords();
        Set<String> used = new TreeSet<>();
        document.at("/components/schemas")
                .propertyNames()
                .forEach(
                        name -> {
                            used.add(name);
                            document.at("/components/schemas/" + name + "/properties")
                                    .propertyNames()
                                    .forEach(one -> used.add(name + "." + one));
                        });
        Set<String> idle = new TreeSet<>(words.fieldKeys());
        idle.removeAll(used);
        assertEquals(Set.of(), idle);
        Set<String> keys = new TreeSet<>(words.keys());
        Set<String> said = new TreeSet<>();
        for (JsonNode item : document.get("paths").values()) {
            for (JsonNode op : item.values()) {
                said.add(op.get("operationId").asString());
                op.path("parameters")
                        .values()
                        .forEach(one -> said.add("path." + one.path("name").asString("")));
                op.get("responses").propertyNames().forEach(one -> said.add("status." + one));
                said.add("tag." + op.get("tags").get(0).asString());
            }
        }
        keys.removeAll(said);
        keys.removeIf(key -> key.matches("(info|header|security)\\..*"));
        assertEquals(Set.of(), keys);
    }

    @Test
    void wordsOfAnswersAreThoseBesideTheirRecords() throws IOException {
        ApiWords words = new ApiWords();
        Set<String> left = new TreeSet<>(words.fieldKeys());
        List<String> wrong = new ArrayList<>();
        for (Path file : sources()) {
            RecordDocs.of(file)
                    .forEach(
                            (key, said) -> {
                                if (left.remove(key) && !words.field(key).equals(said)) {
                                    wrong.add(key + ": " + said);
                                }
                            });
        }
        assertEquals(List.of(), wrong);
        assertEquals(Set.of(), left);
    }

    private static List<Path> sources() throws IOException {
        List<Path> all = new ArrayList<>();
        for (String folder :
                List.of(
                        "files/forecast",
                        "web",
                        "logbook",
                        "advice/company",
                        "advice/faces",
                        "produce")) {
            try (Stream<Path> files = Files.walk(Path.of("src/main/java/org/wardon", folder))) {
                files.filter(file -> file.toString().endsWith(".java")).forEach(all::add);
            }
        }
        return all;
    }
}
