package org.wardon.web;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.wardon.web.guard.ApiSecret;
import org.wardon.web.guard.Passcode;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** Writes the document's examples: what a running server answered, long lists cut short. */
final class ApiExamples {
    private static final Path FILE = Path.of("src/main/resources/org/wardon/web/api/examples.json");
    private static final int MOST = 3;

    private ApiExamples() {}

    /**
     * Asks everything and keeps the first good answers.
     *
     * @param args none
     * @throws IOException where they cannot be written
     */
    public static void main(String[] args) throws IOException {
        Path home = Files.createTempDirectory("wardon-examples");
        try (WebServer server =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1", 0, Optional.empty(), home, Clock.systemUTC()))) {
            Contract contract = ApiTour.contract(server.url());
            String secret = Files.readString(home.resolve(ApiSecret.FILE)).strip();
            ApiClient api = new ApiClient(server.url(), Optional.of(secret), contract);
            new ApiTour(api).all();
            ApiClient outside = entered(home.resolve("open"), contract);
            JsonMapper mapper =
                    JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();
            Map<String, JsonNode> told = new TreeMap<>();
            api.heard()
                    .forEach(
                            (key, answer) -> {
                                if (!key.startsWith("readDocument")
                                        && !key.startsWith("readPlanSchema")) {
                                    told.put(key, key.endsWith(".request") ? answer : cut(answer));
                                }
                            });
            outside.heard().forEach(told::putIfAbsent);
            api.addresses().forEach((id, at) -> told.put(id + ".address", mapper.valueToTree(at)));
            Files.writeString(FILE, mapper.writeValueAsString(told) + "\n");
        }
        System.exit(0);
    }

    /** What a program hears that gets in by the passcode. */
    private static ApiClient entered(Path home, Contract contract) throws IOException {
        Passcode passcode = new Passcode("hard pears keep", "examples", Clock.systemUTC());
        Files.createDirectory(home);
        try (WebServer server =
                WebServer.start(
                        new WebOptions(
                                "127.0.0.1", 0, Optional.of(passcode), home, Clock.systemUTC()))) {
            ApiClient outside = new ApiClient(server.url(), Optional.empty(), contract);
            new ApiTour(outside).enter("hard pears keep");
            return outside;
        }
    }

    /** A plan stays whole, as it would be none without its faces. */
    private static JsonNode cut(JsonNode node) {
        if (node instanceof ObjectNode object) {
            for (String name : List.copyOf(object.propertyNames())) {
                if (!name.equals("plan")) {
                    object.set(name, cut(object.get(name)));
                }
            }
        } else if (node instanceof ArrayNode list) {
            List<JsonNode> first = new ArrayList<>();
            list.values().stream().limit(MOST).forEach(one -> first.add(cut(one)));
            list.removeAll();
            first.forEach(list::add);
        }
        return node;
    }
}
