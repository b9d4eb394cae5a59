package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentSkipListSet;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The interface's own document, and whether what is sent and answered keeps to it. */
final class Contract {
    private static final String BASE = "https://wardon.test/api/";
    private static final JsonMapper MAPPER = JsonMapper.builder().build();

    private final JsonNode document;
    private final SchemaRegistry registry;
    private final Map<String, Schema> schemas = new ConcurrentHashMap<>();
    private final Map<String, Op> operations = new TreeMap<>();
    private final Set<String> seen = new ConcurrentSkipListSet<>();

    /** An operation as the document has it. */
    record Op(String id, String method, String path, JsonNode told, String pointer) {
        Set<String> statuses() {
            return new TreeSet<>(told.get("responses").propertyNames());
        }

        boolean takesBody() {
            return told.has("requestBody");
        }

        boolean changes() {
            return !method.equals("GET");
        }

        boolean names(String status) {
            return told.get("responses").has(status);
        }
    }

    Contract(String text, String planSchema) {
        document = MAPPER.readTree(text);
        registry =
                SchemaRegistry.withDefaultDialect(
                        SpecificationVersion.DRAFT_2020_12,
                        builder ->
                                builder.schemas(
                                        Map.of(
                                                BASE + "openapi.json", text,
                                                BASE + "schema", planSchema)));
        for (String path : document.get("paths").propertyNames()) {
            JsonNode item = document.get("paths").get(path);
            for (String method : item.propertyNames()) {
                JsonNode told = item.get(method);
                String id = told.get("operationId").asString();
                String pointer = "/paths/" + path.replace("/", "~1") + "/" + method;
                Op before =
                        operations.put(
                                id,
                                new Op(id, method.toUpperCase(Locale.ROOT), path, told, pointer));
                assertEquals(null, before, id + " stands twice");
            }
        }
    }

    JsonNode document() {
        return document;
    }

    Map<String, Op> operations() {
        return operations;
    }

    Op get(String id) {
        Op op = operations.get(id);
        assertNotNull(op, id + " is not in the document");
        return op;
    }

    Set<String> seen() {
        return seen;
    }

    private List<String> faults(String pointer, String json) {
        // A pointer in an address has its braces and quotation marks escaped.
        String at = pointer.replace("{", "%7B").replace("}", "%7D");
        Schema schema =
                schemas.computeIfAbsent(
                        at,
                        any -> registry.getSchema(SchemaLocation.of(BASE + "openapi.json#" + at)));
        List<String> told = new ArrayList<>();
        for (Error error : schema.validate(json, InputFormat.JSON)) {
            told.add(error.toString());
        }
        return told;
    }

    /** A request the server takes is one the document takes. */
    void takes(String id, String body) {
        List<String> faults =
                faults(get(id).pointer() + "/requestBody/content/application~1json/schema", body);
        assertEquals(List.of(), faults, id + " sent " + body);
    }

    /** Whether the document takes a body. */
    boolean allows(String id, String body) {
        return faults(get(id).pointer() + "/requestBody/content/application~1json/schema", body)
                .isEmpty();
    }

    /** An answer is one the document has: its status, its kind, every name in it. */
    void gave(String id, int status, String mediaType, String body) {
        Op op = get(id);
        JsonNode told = op.told().get("responses").get(String.valueOf(status));
        assertNotNull(told, id + " answered " + status + ": " + body);
        String pointer = op.pointer() + "/responses/" + status;
        if (told.has("$ref")) {
            pointer = told.get("$ref").asString().substring(1);
            told = document.at(pointer);
        }
        seen.add(id + " " + status);
        if (!told.has("content")) {
            assertEquals("", body, id);
            return;
        }
        JsonNode media = told.get("content").get(mediaType);
        assertNotNull(media, id + " answered with " + mediaType);
        if (!media.get("schema").isEmpty()) {
            String escaped = mediaType.replace("/", "~1");
            List<String> faults = faults(pointer + "/content/" + escaped + "/schema", body);
            assertEquals(List.of(), faults, () -> id + " answered " + body);
        }
        assertTrue(!body.contains("\tat org."), body);
    }
}
