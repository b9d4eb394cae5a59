package org.wardon.web.api.document;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.lang.reflect.AnnotatedParameterizedType;
import java.lang.reflect.AnnotatedType;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;
import tools.jackson.databind.util.RawValue;

/**
 * Shapes of answers, read off the records they are written from: every name is there, no other is,
 * only what may be absent may be null, and what is left out where it is absent need not be there.
 */
final class RecordShapes {
    private static final JsonNodeFactory NODES = JsonNodeFactory.instance;
    private static final String REF = "#/components/schemas/";
    private static final String LOCAL_TIME = "^[0-9]{4}-[0-9]{2}-[0-9]{2}T[0-9]{2}:[0-9]{2}$";

    private final Map<String, ObjectNode> shapes = new TreeMap<>();
    private final ApiWords words;

    RecordShapes(ApiWords words) {
        this.words = words;
    }

    /** All shapes asked for so far, by name. */
    Map<String, ObjectNode> all() {
        return shapes;
    }

    /** Names of the records around a record and its own, points between. */
    static String name(Class<?> type) {
        Class<?> outer = type.getDeclaringClass();
        return outer == null ? type.getSimpleName() : name(outer) + "." + type.getSimpleName();
    }

    /** A reference to the shape of a record. */
    ObjectNode of(Class<?> record) {
        String name = name(record);
        if (!shapes.containsKey(name)) {
            ObjectNode shape = NODES.objectNode();
            shapes.put(name, shape);
            fill(shape, record, name);
        }
        return NODES.objectNode().put("$ref", REF + name);
    }

    private void fill(ObjectNode shape, Class<?> record, String name) {
        shape.put("description", words.field(name));
        shape.put("type", "object");
        var required = shape.putArray("required");
        ObjectNode properties = shape.putObject("properties");
        shape.put("additionalProperties", false);
        for (RecordComponent component : record.getRecordComponents()) {
            boolean leftOut = component.getAccessor().isAnnotationPresent(JsonInclude.class);
            if (!leftOut) {
                required.add(component.getName());
            }
            ObjectNode property = leftOut ? given(component) : shape(component.getAnnotatedType());
            property.put("description", words.field(name + "." + component.getName()));
            properties.set(component.getName(), property);
        }
    }

    /** What stands there where it is not left out. */
    private ObjectNode given(RecordComponent component) {
        return component.getAnnotatedType() instanceof AnnotatedParameterizedType optional
                ? shape(optional.getAnnotatedActualTypeArguments()[0])
                : shape(component.getAnnotatedType());
    }

    private ObjectNode shape(AnnotatedType annotated) {
        Type type = annotated.getType();
        ObjectNode shape =
                annotated instanceof AnnotatedParameterizedType generic
                        ? generic(generic, (ParameterizedType) type)
                        : plain((Class<?>) type);
        return annotated.isAnnotationPresent(Nullable.class) ? orNull(shape) : shape;
    }

    private ObjectNode generic(AnnotatedParameterizedType annotated, ParameterizedType type) {
        AnnotatedType[] inner = annotated.getAnnotatedActualTypeArguments();
        Class<?> raw = (Class<?>) type.getRawType();
        ObjectNode shape = NODES.objectNode();
        if (raw == List.class) {
            shape.put("type", "array").set("items", shape(inner[0]));
            return shape;
        }
        if (raw == Map.class) {
            shape.put("type", "object").set("additionalProperties", shape(inner[1]));
            return shape;
        }
        if (raw == Optional.class) {
            return orNull(shape(inner[0]));
        }
        throw new IllegalArgumentException("no shape for " + type);
    }

    private ObjectNode plain(Class<?> type) {
        ObjectNode shape = NODES.objectNode();
        if (type.isRecord()) {
            return of(type);
        }
        if (type == double.class || type == Double.class) {
            return shape.put("type", "number");
        }
        if (type == int.class || type == long.class) {
            return shape.put("type", "integer");
        }
        if (type == boolean.class || type == Boolean.class) {
            return shape.put("type", "boolean");
        }
        if (type == OptionalDouble.class) {
            return orNull(shape.put("type", "number"));
        }
        return written(type, shape);
    }

    private static ObjectNode written(Class<?> type, ObjectNode shape) {
        if (type == RawValue.class) {
            return shape.put("type", "object");
        }
        shape.put("type", "string");
        if (type == LocalDateTime.class) {
            return shape.put("pattern", LOCAL_TIME);
        }
        if (type == LocalDate.class) {
            return shape.put("format", "date");
        }
        if (type == Instant.class) {
            return shape.put("format", "date-time");
        }
        if (type != String.class) {
            throw new IllegalArgumentException("no shape for " + type);
        }
        return shape;
    }

    private static ObjectNode orNull(ObjectNode shape) {
        if (shape.get("type") != null && shape.get("type").isString()) {
            String type = shape.get("type").asString();
            shape.putArray("type").add(type).add("null");
            return shape;
        }
        ObjectNode either = NODES.objectNode();
        either.putArray("oneOf").add(shape).add(NODES.objectNode().put("type", "null"));
        return either;
    }
}
