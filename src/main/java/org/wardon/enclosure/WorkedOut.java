package org.wardon.enclosure;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;

/**
 * What has been worked out of one site, weather and span, for all runs under it: hundreds of draws
 * of a store meet the same far sides. Safe for several threads.
 */
public final class WorkedOut {
    private final Map<Record, Object> known = new ConcurrentHashMap<>();

    /**
     * Returns what was worked out before, else works it out.
     *
     * @param key all it hangs on but for site, weather, sun and span; of a class of the asker's own
     * @param type what it is
     * @param anew works it out; the same answer each time
     * @param <T> what it is
     * @return the answer, not to be changed
     */
    public <T> T once(Record key, Class<T> type, Supplier<T> anew) {
        return type.cast(known.computeIfAbsent(key, any -> anew.get()));
    }
}
