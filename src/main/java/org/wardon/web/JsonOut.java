package org.wardon.web;

import io.javalin.json.JsonMapper;
import java.lang.reflect.Type;
import tools.jackson.databind.MapperFeature;

/** Writes records as JSON in the order of their names; reads none. */
final class JsonOut implements JsonMapper {
    private final tools.jackson.databind.json.JsonMapper mapper =
            tools.jackson.databind.json.JsonMapper.builder()
                    .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
                    .build();

    @Override
    public String toJsonString(Object value, Type type) {
        return mapper.writeValueAsString(value);
    }
}
