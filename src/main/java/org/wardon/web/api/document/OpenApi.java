package org.wardon.web.api.document;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import org.wardon.web.api.route.Gives;
import org.wardon.web.api.route.Operation;
import org.wardon.web.guard.Guard;
import org.wardon.web.pages.Problem;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/** Puts the document together: routes, what they take and give, words, real answers. */
public final class OpenApi {
    /** Where the plan's own schema is, from the document. */
    static final String PLAN_SCHEMA = "./schema";

    private static final JsonNodeFactory NODES = JsonNodeFactory.instance;
    private static final JsonMapper MAPPER =
            JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();
    private static final List<Integer> OF_ALL = List.of(401, 403, 421, 422, 500);

    private final ApiWords words = new ApiWords();
    private final RecordShapes answers = new RecordShapes(words);
    private final RequestShapes requests = new RequestShapes();
    private final JsonNode examples = MAPPER.readTree(Resource.text("examples.json"));
    private final ObjectNode schemas = NODES.objectNode();

    private OpenApi() {}

    /**
     * Writes the document.
     *
     * @param operations the table of routes
     * @return OpenAPI 3.1
     */
    public static String of(List<Operation> operations) {
        return MAPPER.writeValueAsString(new OpenApi().document(operations)) + "\n";
    }

    private ObjectNode document(List<Operation> operations) {
        ObjectNode document = NODES.objectNode();
        document.put("openapi", "3.1.0");
        ObjectNode info = document.putObject("info");
        info.put("title", words.told("info.title"));
        info.put("description", words.told("info.description"));
        info.put("version", "1");
        document.putArray("servers").addObject().put("url", "/");
        ArrayNode tags = document.putArray("tags");
        operations.stream()
                .map(Operation::tag)
                .distinct()
                .forEach(
                        tag ->
                                tags.addObject()
                                        .put("name", tag)
                                        .put("description", words.told("tag." + tag)));
        ObjectNode paths = document.putObject("paths");
        byPath(operations)
                .forEach(
                        (path, some) -> {
                            ObjectNode item = paths.putObject(path);
                            some.forEach(one -> item.set(method(one), operation(one)));
                        });
        components(document.putObject("components"), operations);
        return document;
    }

    private static Map<String, List<Operation>> byPath(List<Operation> operations) {
        Map<String, List<Operation>> paths = new LinkedHashMap<>();
        operations.forEach(
                one -> paths.computeIfAbsent(one.path(), any -> new ArrayList<>()).add(one));
        return paths;
    }

    private static String method(Operation operation) {
        return operation.method().name().toLowerCase(Locale.ROOT);
    }

    private ObjectNode operation(Operation operation) {
        ObjectNode told = NODES.objectNode();
        told.put("operationId", operation.id());
        told.putArray("tags").add(operation.tag());
        told.put("summary", words.told(operation.id()));
        ArrayNode parameters = NODES.arrayNode();
        operation.pathNames().forEach(name -> parameters.add(inPath(name)));
        operation.takes().query().ifPresent(name -> requests.query(name, parameters));
        if (operation.takes().version()) {
            parameters.addObject().put("$ref", "#/components/parameters/IfMatch");
        }
        if (!parameters.isEmpty()) {
            told.set("parameters", parameters);
        }
        operation.takes().body().ifPresent(name -> told.set("requestBody", body(operation, name)));
        told.set("responses", responses(operation));
        told.set("security", security(operation));
        JsonNode address = examples.get(operation.id() + ".address");
        if (address != null) {
            told.set("x-example-address", address);
        }
        return told;
    }

    private ObjectNode inPath(String name) {
        ObjectNode parameter = NODES.objectNode();
        parameter.put("name", name).put("in", "path").put("required", true);
        parameter.put("description", words.told("path." + name));
        ObjectNode schema = parameter.putObject("schema");
        switch (name) {
            case "plan", "version", "number" ->
                    schema.put("type", "integer").put("minimum", 1).put("maximum", 999_999_999);
            case "curve" -> {
                ArrayNode words = schema.put("type", "string").putArray("enum");
                List.of("air", "humidity", "co2", "ethylene", "cooling").forEach(words::add);
            }
            default -> schema.put("type", "string").put("minLength", 1);
        }
        return parameter;
    }

    private ObjectNode body(Operation operation, String name) {
        if (!schemas.has(name)) {
            schemas.set(name, requests.body(name));
        }
        ObjectNode body = NODES.objectNode();
        body.put("required", schemas.get(name).has("required"));
        ObjectNode content = body.putObject("content").putObject(Gives.JSON);
        content.putObject("schema").put("$ref", "#/components/schemas/" + name);
        example(content, operation.id() + ".request");
        return body;
    }

    private void example(ObjectNode content, String key) {
        JsonNode example = examples.get(key);
        if (example != null) {
            content.set("example", example);
        }
    }

    private ObjectNode responses(Operation operation) {
        ObjectNode responses = NODES.objectNode();
        for (Gives gives : operation.gives()) {
            String status = String.valueOf(gives.status());
            ObjectNode response =
                    responses.get(status) instanceof ObjectNode there
                            ? there
                            : responses.putObject(status);
            response.put("description", words.told("status." + status));
            headers(response, operation, gives);
            if (!gives.mediaType().isEmpty()) {
                content(response, operation, gives);
            }
        }
        TreeSet<Integer> refused = new TreeSet<>(OF_ALL);
        refused.addAll(operation.refuses());
        refused.forEach(
                status ->
                        responses
                                .putObject(String.valueOf(status))
                                .put("$ref", "#/components/responses/Trouble" + status));
        return responses;
    }

    private void content(ObjectNode response, Operation operation, Gives gives) {
        ObjectNode content =
                response.get("content") instanceof ObjectNode there
                        ? there
                        : response.putObject("content");
        boolean another = content.has(gives.mediaType());
        ObjectNode media =
                another
                        ? (ObjectNode) content.get(gives.mediaType())
                        : content.putObject(gives.mediaType());
        if (gives.shape().isEmpty()) {
            media.putObject("schema");
            return;
        }
        ObjectNode shape = answers.of(gives.shape().get());
        if (another) {
            JsonNode first = media.get("schema");
            ObjectNode either = NODES.objectNode();
            either.putArray("anyOf").add(first).add(shape);
            media.set("schema", either);
        } else {
            media.set("schema", shape);
            example(media, operation.id() + "." + gives.status());
        }
    }

    private void headers(ObjectNode response, Operation operation, Gives gives) {
        boolean made = gives.status() == 201 || gives.status() == 202 || gives.status() == 303;
        boolean versioned =
                gives.shape().map(shape -> shape.getSimpleName().equals("KeptPlan")).orElse(false)
                        || operation.id().equals("readPlan");
        if (!made && !versioned) {
            return;
        }
        ObjectNode headers = response.putObject("headers");
        if (made && !operation.id().equals("rememberOwnLot")) {
            header(headers, "Location");
        }
        if (versioned) {
            header(headers, "ETag");
        }
    }

    private void header(ObjectNode headers, String name) {
        ObjectNode header = headers.putObject(name);
        header.put("description", words.told("header." + name));
        header.putObject("schema").put("type", "string");
    }

    /** Any one of these lets in; an empty one means that the machine's own people need none. */
    private static ArrayNode security(Operation operation) {
        ArrayNode security = NODES.arrayNode();
        security.addObject().putArray("bearer");
        ObjectNode browser = security.addObject();
        browser.putArray("session");
        if (operation.path().equals(Guard.API_ENTRANCE)) {
            security.removeAll();
            security.addObject();
        } else if (operation.changes()) {
            browser.putArray("token");
        } else {
            security.addObject();
        }
        return security;
    }

    private void components(ObjectNode components, List<Operation> operations) {
        ObjectNode troubles = components.putObject("responses");
        TreeSet<Integer> statuses = new TreeSet<>(OF_ALL);
        operations.forEach(one -> statuses.addAll(one.refuses()));
        for (Integer status : statuses) {
            ObjectNode trouble = troubles.putObject("Trouble" + status);
            trouble.put("description", words.told("status." + status));
            ObjectNode content = trouble.putObject("content").putObject(Problem.MEDIA_TYPE);
            content.set("schema", answers.of(Problem.class));
            example(content, "trouble." + status);
        }
        ObjectNode match = components.putObject("parameters").putObject("IfMatch");
        match.put("name", "If-Match").put("in", "header").put("required", false);
        match.put("description", words.told("header.If-Match"));
        match.putObject("schema").put("type", "string");
        securitySchemes(components.putObject("securitySchemes"));
        answers.all().forEach(schemas::set);
        goodPlansFitTheirSchema();
        components.set("schemas", schemas);
    }

    private void goodPlansFitTheirSchema() {
        ObjectNode sheet = (ObjectNode) schemas.get("PlanSheet");
        sheet.putObject("if").putObject("properties").putObject("good").put("const", true);
        sheet.putObject("then").putObject("properties").putObject("plan").put("$ref", PLAN_SCHEMA);
    }

    private void securitySchemes(ObjectNode schemes) {
        schemes.putObject("bearer")
                .put("type", "http")
                .put("scheme", "bearer")
                .put("description", words.told("security.bearer"));
        schemes.putObject("session")
                .put("type", "apiKey")
                .put("in", "cookie")
                .put("name", "wardon-session-8480")
                .put("description", words.told("security.session"));
        schemes.putObject("token")
                .put("type", "apiKey")
                .put("in", "header")
                .put("name", Guard.TOKEN_HEADER)
                .put("description", words.told("security.token"));
    }
}
