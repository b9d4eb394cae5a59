package org.wardon.lots;

import java.util.List;
import java.util.stream.Stream;
import org.wardon.produce.Reason;

/**
 * An answer and what it rests on.
 *
 * @param value the answer
 * @param restsOn rows, class values and assumptions used, in order of use
 * @param ofClass whether a class value stands in for a figure nobody printed
 * @param <T> what is answered
 */
public record WithReasons<T>(T value, List<Reason> restsOn, boolean ofClass) {
    /** Copies the list. */
    public WithReasons {
        restsOn = List.copyOf(restsOn);
    }

    /**
     * Returns another answer that rests on the same and more.
     *
     * @param other the other answer with its own reasons
     * @param <U> what the other answers
     * @return the other's value with the reasons of both
     */
    public <U> WithReasons<U> and(WithReasons<U> other) {
        return new WithReasons<>(
                other.value,
                Stream.concat(restsOn.stream(), other.restsOn.stream()).toList(),
                ofClass || other.ofClass);
    }
}
