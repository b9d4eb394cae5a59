package org.wardon.reference;

import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/** A value made when it is first asked for, so that a short command reads only what it needs. */
final class Once<T> {
    private final Supplier<T> maker;
    private @Nullable T made;

    Once(Supplier<T> maker) {
        this.maker = maker;
    }

    synchronized T get() {
        T value = made;
        if (value == null) {
            value = maker.get();
            made = value;
        }
        return value;
    }
}
