package org.wardon.web.api.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.TableView;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;

/** The document as a page to be read, made of the document itself. */
public final class ApiPage {
    private static final JsonMapper MAPPER =
            JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();
    private static final int LONGEST_EXAMPLE = 2_500;

    private final Press press;
    private final JsonNode document;

    /**
     * Makes the page.
     *
     * @param press what prints it
     * @param document the OpenAPI document
     */
    public ApiPage(Press press, String document) {
        this.press = press;
        this.document = MAPPER.readTree(document);
    }

    /**
     * Shows it.
     *
     * @param call the request
     */
    public void show(Call call) {
        String address = "http://" + call.http().header("Host");
        String asked = Optional.ofNullable(call.http().queryParam("tag")).orElse("");
        List<ApiView.Group> groups = new ArrayList<>();
        for (JsonNode tag : document.get("tags").values()) {
            String name = tag.get("name").asString();
            groups.add(
                    new ApiView.Group(
                            name,
                            tag.get("description").asString(),
                            name.equals(asked),
                            operations(name, address)));
        }
        press.print(
                call,
                "api",
                press.frame(call, press.words().say("api.title")),
                new ApiView(
                        document.at("/info/description").asString(),
                        "curl " + address + "/api/crops?like=mango",
                        groups));
    }

    private List<ApiView.Operation> operations(String tag, String address) {
        List<ApiView.Operation> operations = new ArrayList<>();
        JsonNode paths = document.get("paths");
        for (String path : paths.propertyNames()) {
            for (String method : paths.get(path).propertyNames()) {
                JsonNode told = paths.get(path).get(method);
                if (told.get("tags").get(0).asString().equals(tag)) {
                    operations.add(operation(method.toUpperCase(Locale.ROOT), path, told, address));
                }
            }
        }
        return operations;
    }

    private ApiView.Operation operation(String method, String path, JsonNode told, String address) {
        JsonNode body = told.at("/requestBody/content/application~1json");
        return new ApiView.Operation(
                told.get("operationId").asString(),
                method,
                path,
                told.get("summary").asString(),
                fields(told, body),
                answers(told),
                curl(method, path, told, body, address),
                example(told));
    }

    private Optional<TableView> fields(JsonNode told, JsonNode body) {
        List<List<String>> fields = new ArrayList<>();
        for (JsonNode one : told.path("parameters").values()) {
            JsonNode parameter = resolved(one);
            fields.add(
                    field(
                            parameter.get("name").asString(),
                            parameter.get("in").asString(),
                            parameter.get("schema"),
                            parameter.path("required").asBoolean(),
                            parameter.get("description").asString()));
        }
        JsonNode shape = resolved(body.path("schema"));
        for (String name : shape.path("properties").propertyNames()) {
            JsonNode property = shape.get("properties").get(name);
            boolean required =
                    shape.path("required").values().stream()
                            .anyMatch(one -> one.asString().equals(name));
            String said = property.path("description").asString("");
            fields.add(field(name, "body", property, required, said));
        }
        return fields.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        table(
                                "api.takes",
                                List.of("name", "where", "kind", "whether", "what"),
                                fields));
    }

    private TableView table(String caption, List<String> head, List<List<String>> rows) {
        PageWords words = press.words();
        return new TableView(
                words.say(caption),
                head.stream().map(one -> words.say("api." + one)).toList(),
                rows);
    }

    private List<String> field(
            String name, String where, JsonNode schema, boolean required, String said) {
        return List.of(
                name,
                press.words().say("api.in-" + where),
                type(schema),
                press.words().say(required ? "api.needed" : "api.free"),
                said);
    }

    /** What may be given, in few words. */
    private static String type(JsonNode schema) {
        if (schema.has("enum")) {
            List<String> words =
                    schema.get("enum").values().stream().map(JsonNode::asString).toList();
            return String.join(", ", words);
        }
        String type = schema.path("type").asString("object");
        return schema.has("minimum")
                ? type
                        + " "
                        + schema.get("minimum").asString()
                        + " … "
                        + schema.get("maximum").asString()
                : type;
    }

    private JsonNode resolved(JsonNode node) {
        String ref = node.path("$ref").asString("");
        return ref.startsWith("#") ? document.at(ref.substring(1)) : node;
    }

    private TableView answers(JsonNode told) {
        List<List<String>> answers = new ArrayList<>();
        JsonNode responses = told.get("responses");
        for (String status : responses.propertyNames()) {
            JsonNode response = resolved(responses.get(status));
            List<String> kinds = new ArrayList<>();
            for (String kind : response.path("content").propertyNames()) {
                JsonNode schema = response.get("content").get(kind).path("schema");
                String ref = schema.path("$ref").asString("");
                kinds.add((kind + " " + ref.substring(ref.lastIndexOf('/') + 1)).strip());
            }
            answers.add(
                    List.of(
                            status,
                            response.get("description").asString(),
                            String.join(", ", kinds)));
        }
        return table("api.answers", List.of("status", "what", "kind"), answers);
    }

    private static String curl(
            String method, String path, JsonNode told, JsonNode body, String address) {
        String asked = told.path("x-example-address").asString(path);
        StringBuilder line = new StringBuilder("curl");
        if (!method.equals("GET")) {
            line.append(" -X ").append(method);
            boolean known = told.get("security").toString().contains("bearer");
            line.append(known ? " -H \"Authorization: Bearer $(cat api-secret)\"" : "");
        }
        for (JsonNode parameter : told.path("parameters").values()) {
            if (parameter.path("$ref").asString("").endsWith("IfMatch")) {
                line.append(" -H 'If-Match: \"1\"'");
            }
        }
        if (body.has("example")) {
            String sent = body.get("example").toString();
            boolean shortEnough = sent.length() < 400 && !sent.contains("'");
            line.append(" -H 'Content-Type: application/json' -d ");
            line.append(shortEnough ? "'" + sent + "'" : "@request.json");
        }
        return line.append(" '").append(address).append(asked).append("'").toString();
    }

    /** The first good answer, as a server gave it. */
    private static String example(JsonNode told) {
        for (JsonNode response : told.get("responses").values()) {
            JsonNode example = response.at("/content/application~1json/example");
            if (!example.isMissingNode()) {
                String text = MAPPER.writeValueAsString(example);
                return text.length() <= LONGEST_EXAMPLE
                        ? text
                        : text.substring(0, text.lastIndexOf('\n', LONGEST_EXAMPLE)) + "\n…";
            }
        }
        return "";
    }
}
