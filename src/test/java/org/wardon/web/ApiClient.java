package org.wardon.web;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentSkipListMap;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** Asks the interface by the names of its operations, and holds every answer to the document. */
final class ApiClient {
    private static final JsonMapper MAPPER = JsonMapper.builder().build();

    private final HttpClient http =
            HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();
    private final String url;
    private final Optional<String> bearer;
    private final Contract contract;
    private final Map<String, JsonNode> heard = new ConcurrentSkipListMap<>();
    private final Map<String, String> addresses = new ConcurrentSkipListMap<>();

    ApiClient(String url, Optional<String> bearer, Contract contract) {
        this.url = url;
        this.bearer = bearer;
        this.contract = contract;
    }

    /** An answer. */
    record Answer(int status, String type, String body, HttpResponse<byte[]> whole) {
        JsonNode json() {
            return MAPPER.readTree(body);
        }

        String header(String name) {
            return whole.headers().firstValue(name).orElse("");
        }
    }

    /** A question that can be changed before it is asked. */
    final class Question {
        private final Contract.Op op;
        private String path;
        private String query = "";
        private Optional<String> body = Optional.empty();
        private String type = "application/json";
        private final List<String> headers = new ArrayList<>();

        private Question(String id) {
            op = contract.get(id);
            path = op.path();
            bearer.ifPresent(one -> headers.addAll(List.of("Authorization", "Bearer " + one)));
        }

        Question with(String name, Object value) {
            path = path.replace("{" + name + "}", String.valueOf(value));
            return this;
        }

        Question asking(String behind) {
            query = "?" + behind;
            return this;
        }

        Question sending(String json) {
            body = Optional.of(json);
            return this;
        }

        Question as(String mediaType) {
            type = mediaType;
            return this;
        }

        Question header(String name, String value) {
            headers.addAll(List.of(name, value));
            return this;
        }

        Question unknown() {
            headers.clear();
            return this;
        }

        Answer gives(int status) {
            Answer answer = asked();
            assertEquals(
                    status,
                    answer.status(),
                    () -> op.id() + " " + path + query + " " + answer.body());
            contract.gave(op.id(), answer.status(), answer.type(), bodyOf(answer));
            if (status < 300 && body.isPresent()) {
                contract.takes(op.id(), body.get());
                heard.putIfAbsent(op.id() + ".request", MAPPER.readTree(body.get()));
            }
            if (status < 300) {
                addresses.putIfAbsent(op.id(), path + query);
            }
            if (answer.type().endsWith("json") && status < 300) {
                heard.putIfAbsent(op.id() + "." + status, answer.json());
            } else if (answer.type().endsWith("problem+json")) {
                heard.putIfAbsent("trouble." + status, answer.json());
            }
            return answer;
        }

        private String bodyOf(Answer answer) {
            return answer.type().equals("application/zip") ? "" : answer.body();
        }

        private Answer asked() {
            HttpRequest.Builder request =
                    HttpRequest.newBuilder(URI.create(url + path + query))
                            .method(
                                    op.method(),
                                    body.map(HttpRequest.BodyPublishers::ofString)
                                            .orElse(HttpRequest.BodyPublishers.noBody()));
            if (!headers.isEmpty()) {
                request.headers(headers.toArray(String[]::new));
            }
            if (body.isPresent() && !type.isEmpty()) {
                request.header("Content-Type", type);
            }
            return sent(request.build());
        }
    }

    private Answer sent(HttpRequest request) {
        try {
            HttpResponse<byte[]> answer =
                    http.send(request, HttpResponse.BodyHandlers.ofByteArray());
            return new Answer(
                    answer.statusCode(),
                    answer.headers().firstValue("Content-Type").orElse("").split(";")[0],
                    new String(answer.body(), StandardCharsets.UTF_8),
                    answer);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    Question ask(String id) {
        return new Question(id);
    }

    /** Follows a job to its end. */
    JsonNode over(JsonNode job) {
        JsonNode now = job;
        while (now.get("state").asString().equals("running")) {
            try {
                Thread.sleep(30);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
                throw new IllegalStateException(e);
            }
            now = ask("readJob").with("job", job.get("job").asString()).gives(200).json();
        }
        return now;
    }

    /** The first address of each operation that gave a good answer. */
    Map<String, String> addresses() {
        return addresses;
    }

    /** The first good answer of each operation and the first trouble of each status, as heard. */
    Map<String, JsonNode> heard() {
        return heard;
    }
}
