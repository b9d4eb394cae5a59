package org.wardon.advice.forecast;

import java.util.Map;
import java.util.NoSuchElementException;

/** Reads what must stand in a map by id. */
final class ById {
    private ById() {}

    /**
     * Returns what stands under an id.
     *
     * @param map the map
     * @param id the id
     * @param <T> what is kept
     * @return the value
     * @throws NoSuchElementException where there is none
     */
    static <T> T get(Map<String, T> map, String id) {
        T value = map.get(id);
        if (value == null) {
            throw new NoSuchElementException("nothing stands under '" + id + "'");
        }
        return value;
    }
}
