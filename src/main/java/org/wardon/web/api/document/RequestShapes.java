package org.wardon.web.api.document;

import java.util.List;
import org.wardon.web.api.route.Requests;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** Shapes of requests, out of the schema they are checked by. */
final class RequestShapes {
    /** What only our own check reads. */
    private static final List<String> OURS = List.of("x-option", "x-form", "x-accepted");

    private final JsonNode defs;

    RequestShapes() {
        defs = JsonMapper.builder().build().readTree(Requests.text()).get("$defs");
    }

    /** The shape of a body, closed. */
    ObjectNode body(String name) {
        ObjectNode shape = closed((ObjectNode) defs.get(name).deepCopy());
        if (shape.get("properties").has("evenFaulty")) {
            plansAreGoodUnlessAsked(shape);
        }
        return shape;
    }

    /** A plan fits its own schema, unless it is to be kept with its faults. */
    private static void plansAreGoodUnlessAsked(ObjectNode shape) {
        ObjectNode asked = shape.putObject("if");
        asked.putArray("required").add("evenFaulty");
        asked.putObject("properties").putObject("evenFaulty").put("const", true);
        shape.putObject("else")
                .putObject("properties")
                .putObject("plan")
                .put("$ref", OpenApi.PLAN_SCHEMA);
    }

    private static ObjectNode closed(ObjectNode shape) {
        if (shape.has("properties")) {
            ObjectNode properties = (ObjectNode) shape.get("properties");
            List.copyOf(properties.propertyNames())
                    .forEach(one -> properties.set(one, closed((ObjectNode) properties.get(one))));
            shape.put("additionalProperties", false);
        }
        if (shape.get("items") instanceof ObjectNode items) {
            shape.set("items", closed(items));
        }
        OURS.forEach(shape::remove);
        return shape;
    }

    /** Parameters that stand in the address, one a name. */
    void query(String name, ArrayNode into) {
        ObjectNode shape = body(name);
        List<String> required =
                shape.has("required")
                        ? shape.get("required").values().stream().map(JsonNode::asString).toList()
                        : List.of();
        ObjectNode properties = (ObjectNode) shape.get("properties");
        for (String one : properties.propertyNames()) {
            ObjectNode schema = (ObjectNode) properties.get(one);
            ObjectNode parameter = into.addObject();
            parameter.put("name", one).put("in", "query");
            parameter.put("required", required.contains(one));
            parameter.put("description", schema.get("description").asString());
            schema.remove("description");
            parameter.set("schema", schema);
        }
    }
}
