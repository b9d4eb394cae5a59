package org.wardon.produce;

import java.util.List;
import org.wardon.errors.Require;

/**
 * Why an answer is what it is, without words: a code that a bundle turns into a sentence.
 *
 * @param code lower-case words joined by hyphens, the key of the sentence
 * @param subjects ids of the lots, chambers or commodities it speaks of, in the order of the
 *     sentence
 * @param arguments numbers and texts the sentence needs, in its order
 * @param sourceId the source it rests on, or {@code common-practice} or {@code assumption}
 */
public record Reason(
        String code, List<String> subjects, List<Argument> arguments, String sourceId) {
    /**
     * One value in a sentence.
     *
     * @param value the number; not used where {@code unit} is {@code text}
     * @param unit unit of the number: {@code C}, {@code K}, {@code day}, {@code h}, {@code pct},
     *     {@code kg}, {@code g/m2}, {@code m}, {@code m3/h}, {@code W}, {@code ppm}, {@code 1}; or
     *     {@code text}
     * @param text the text, else empty
     */
    public record Argument(double value, String unit, String text) {
        /**
         * Returns a number with its unit.
         *
         * @param value the number
         * @param unit its unit
         * @return the argument
         */
        public static Argument of(double value, String unit) {
            return new Argument(value, unit, "");
        }

        /**
         * Returns a text.
         *
         * @param text an id or a code
         * @return the argument
         */
        public static Argument text(String text) {
            return new Argument(0, "text", text);
        }
    }

    /** Copies the lists and refuses a blank code or source. */
    public Reason {
        Require.text("code", code);
        Require.text("sourceId", sourceId);
        subjects = List.copyOf(subjects);
        arguments = List.copyOf(arguments);
    }

    /**
     * Returns a reason about one subject.
     *
     * @param code its code
     * @param subject the id it speaks of
     * @param sourceId its source
     * @param arguments its values
     * @return the reason
     */
    public static Reason about(
            String code, String subject, String sourceId, Argument... arguments) {
        return new Reason(code, List.of(subject), List.of(arguments), sourceId);
    }
}
