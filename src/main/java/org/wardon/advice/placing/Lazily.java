package org.wardon.advice.placing;

import java.util.Objects;
import java.util.concurrent.atomic.AtomicReferenceArray;
import java.util.function.IntFunction;

/**
 * What is worked out of a lot when it is first asked for. Many are never asked for: a lot that
 * stays in its chamber is of no matter to another.
 *
 * @param <T> what is worked out, the same whoever asks
 */
final class Lazily<T> {
    private final AtomicReferenceArray<T> known;
    private final IntFunction<T> find;

    /**
     * Begins with nothing known.
     *
     * @param lots number of lots
     * @param find works it out of a lot; asked by many threads, twice perhaps
     */
    Lazily(int lots, IntFunction<T> find) {
        known = new AtomicReferenceArray<>(lots);
        this.find = find;
    }

    T of(int lot) {
        T there = known.get(lot);
        if (there == null) {
            known.compareAndSet(lot, null, find.apply(lot));
            there = known.get(lot);
        }
        return Objects.requireNonNull(there);
    }
}
