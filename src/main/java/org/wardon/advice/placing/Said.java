package org.wardon.advice.placing;

import java.util.function.Function;
import org.wardon.advice.wording.Words;
import org.wardon.produce.Reason;

/**
 * A part of an answer whose sentence is put into words when somebody reads it.
 *
 * @param written makes the part of its sentence
 * @param reason what the sentence says
 * @param <T> what the part is
 */
record Said<T>(Function<String, T> written, Reason reason) {
    T in(Words words) {
        return written.apply(words.sentence(reason));
    }
}
