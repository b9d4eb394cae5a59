package org.wardon.web.api.route;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.errors.Fault;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.files.json.SchemaCheck;

/**
 * What the interface accepts: one resource, from which bodies and questions are checked and the
 * document is made. It is written in that part of JSON Schema that a plan's schema is written in.
 */
public final class Requests {
    /** Name of the whole a fault of a body belongs to. */
    public static final String BODY = "body";

    /** Name of the whole a fault of a question belongs to. */
    public static final String QUERY = "query";

    /** Name of the whole a fault of a path belongs to. */
    public static final String PATH = "path";

    private static final String RESOURCE = "/org/wardon/web/api/requests.schema.json";
    private static final String DEFS = "$defs";

    private final Json tree;

    /** Reads the resource. */
    public Requests() {
        Faults faults = new Faults(RESOURCE);
        tree = JsonText.read(text(), faults).orElseThrow();
        faults.refuseIfAny();
    }

    /**
     * Returns the resource as it is written.
     *
     * @return JSON Schema, draft 2020-12
     */
    public static String text() {
        try (InputStream in = Requests.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException(RESOURCE + " is not in the program");
            }
            return new String(in.readAllBytes(), UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Returns a schema.
     *
     * @param name its name
     * @return the schema
     */
    public Part schema(String name) {
        Part schema = Part.root(tree).at(DEFS).at(name);
        if (!schema.given()) {
            throw new IllegalArgumentException("no schema of requests is called " + name);
        }
        return schema;
    }

    /**
     * Returns the names of all schemas.
     *
     * @return in their order
     */
    public List<String> names() {
        return Part.root(tree).at(DEFS).names();
    }

    /**
     * Checks a tree.
     *
     * @param name name of its schema
     * @param given the tree
     * @param faults hears of what does not fit
     */
    public void check(String name, Json given, Faults faults) {
        Map<String, Json> root = new LinkedHashMap<>();
        root.put("$ref", new Json.Text("#/" + DEFS + "/" + name));
        root.put(DEFS, Part.root(tree).at(DEFS).json().orElseThrow());
        new SchemaCheck(new Json.Obj(root), faults).check(withoutPlan(name, given));
    }

    /** A plan has a schema of its own, which the reader of plans holds it against. */
    private Json withoutPlan(String name, Json given) {
        if (!(given instanceof Json.Obj object)
                || !(object.members().get("plan") instanceof Json.Obj)
                || !schema(name).at("properties").has("plan")) {
            return given;
        }
        Map<String, Json> members = new LinkedHashMap<>(object.members());
        members.put("plan", new Json.Obj(Map.of()));
        return new Json.Obj(members);
    }

    /**
     * Returns what stands in an address as a tree of the types its schema asks for.
     *
     * @param name name of the schema
     * @param given values by name
     * @return an object; what is of no type its schema asks for is a text
     */
    public Json typed(String name, Map<String, List<String>> given) {
        Map<String, Json> members = new LinkedHashMap<>();
        given.forEach(
                (key, values) -> {
                    Part property = schema(name).at("properties").at(key);
                    String type = property.at("type").text().orElse("string");
                    members.put(key, typed(type, values));
                });
        return new Json.Obj(members);
    }

    private static Json typed(String type, List<String> values) {
        if (type.equals("array")) {
            List<Json> items = new ArrayList<>();
            values.forEach(one -> items.add(new Json.Text(one)));
            return new Json.Arr(items);
        }
        String value = values.get(values.size() - 1).strip();
        Optional<Json> read =
                type.equals("string") ? Optional.empty() : JsonText.read(value, new Faults(""));
        return read.filter(json -> json instanceof Json.Num || json instanceof Json.Flag)
                .orElse(new Json.Text(value));
    }

    /**
     * Returns a fault with the name it has here, where it was found under the name of an option of
     * the command line.
     *
     * @param operation the operation
     * @param fault the fault
     * @return the fault of a name of the body, of the question or of the path
     */
    public Fault named(Operation operation, Fault fault) {
        Takes takes = operation.takes();
        Optional<String> inBody = takes.body().flatMap(name -> named(name, fault.file()));
        if (inBody.isPresent()) {
            return new Fault(BODY, "$." + inBody.get(), fault.found(), fault.accepted());
        }
        return takes.query()
                .flatMap(name -> named(name, fault.file()))
                .map(found -> new Fault(QUERY, found, fault.found(), fault.accepted()))
                .orElseGet(() -> inPath(operation, fault));
    }

    private static Fault inPath(Operation operation, Fault fault) {
        String name = fault.file().replaceFirst("^--", "");
        return operation.pathNames().contains(name)
                ? new Fault(PATH, name, fault.found(), fault.accepted())
                : fault;
    }

    private Optional<String> named(String schema, String option) {
        Part properties = schema(schema).at("properties");
        String first = option.split(" ", 2)[0];
        return properties.names().stream()
                .filter(
                        name ->
                                properties
                                        .at(name)
                                        .at("x-option")
                                        .text()
                                        .filter(known -> known.equals(first))
                                        .isPresent())
                .findFirst();
    }
}
