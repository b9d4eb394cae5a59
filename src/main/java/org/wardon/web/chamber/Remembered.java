package org.wardon.web.chamber;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;

/**
 * Answers that were worked out, the last asked for; others are worked out again.
 *
 * @param <K> what was asked, with plan, version and book
 * @param <V> the answer
 */
final class Remembered<K, V> {
    private final Map<K, V> known = new LinkedHashMap<>(16, 0.75f, true);
    private final int most;

    Remembered(int most) {
        this.most = most;
    }

    /** Two people who ask the same at once may both work it out; nobody waits for another. */
    V of(K asked, Supplier<V> work) {
        synchronized (known) {
            V there = known.get(asked);
            if (there != null) {
                return there;
            }
        }
        V made = work.get();
        synchronized (known) {
            known.put(asked, made);
            known.keySet().stream()
                    .limit(Math.max(0, known.size() - most))
                    .toList()
                    .forEach(known::remove);
        }
        return made;
    }
}
