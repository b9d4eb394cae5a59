package org.wardon.files.forecast;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.OptionalDouble;
import org.wardon.errors.Require;
import org.wardon.files.AtomicFile;
import tools.jackson.core.JsonGenerator;
import tools.jackson.databind.MapperFeature;
import tools.jackson.databind.SerializationContext;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.module.SimpleModule;
import tools.jackson.databind.ser.std.StdSerializer;

/**
 * Writes answers as JSON: names in the order of the records, numbers with six significant digits,
 * large ones with two decimals, {@code null} where there is no answer.
 */
public final class AnswerWriter {
    private static final MathContext SIX_DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);
    private static final double SIX_DIGITS_KEEP_CENTS_BELOW = 10_000;
    private static final JsonMapper MAPPER =
            JsonMapper.builder()
                    .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
                    .enable(SerializationFeature.INDENT_OUTPUT)
                    .addModule(
                            new SimpleModule()
                                    .addSerializer(new Numbers(Double.class))
                                    .addSerializer(new Numbers(Double.TYPE))
                                    .addSerializer(new OptionalNumbers())
                                    .addSerializer(new Times()))
                    .build();

    private AnswerWriter() {}

    /**
     * Returns an answer as JSON.
     *
     * @param answer one of the records of this package
     * @return JSON text that ends with a line feed
     * @throws IllegalArgumentException if a number in it is not finite
     */
    public static String json(Record answer) {
        return MAPPER.writeValueAsString(answer) + "\n";
    }

    /**
     * Writes an answer whole or not at all.
     *
     * @param file where to
     * @param answer one of the records of this package
     * @throws org.wardon.files.CannotWrite where the file cannot be written
     */
    public static void write(Path file, Record answer) {
        String text = json(answer);
        AtomicFile.write(file, out -> out.write(text));
    }

    /**
     * Returns a number as text, as it stands in answers.
     *
     * @param value a finite number
     * @return plain digits
     */
    public static String text(double value) {
        return rounded(value).toPlainString();
    }

    /**
     * Returns a number as it is written.
     *
     * @param value a finite number
     * @return six significant digits, or two decimals from 10 000 on
     * @throws IllegalArgumentException if it is not finite
     */
    static BigDecimal rounded(double value) {
        Require.that(
                Double.isFinite(value), "a number of an answer must be finite, found " + value);
        BigDecimal exact = BigDecimal.valueOf(value);
        BigDecimal rounded =
                Math.abs(value) < SIX_DIGITS_KEEP_CENTS_BELOW
                        ? exact.round(SIX_DIGITS)
                        : exact.setScale(2, RoundingMode.HALF_EVEN);
        if (rounded.signum() == 0) {
            return BigDecimal.ZERO;
        }
        BigDecimal bare = rounded.stripTrailingZeros();
        return bare.scale() < 0 ? bare.setScale(0) : bare;
    }

    private static final class Numbers extends StdSerializer<Double> {
        Numbers(Class<Double> type) {
            super(type);
        }

        @Override
        public void serialize(Double value, JsonGenerator out, SerializationContext context) {
            out.writeNumber(rounded(value).toPlainString());
        }
    }

    private static final class OptionalNumbers extends StdSerializer<OptionalDouble> {
        OptionalNumbers() {
            super(OptionalDouble.class);
        }

        @Override
        public void serialize(
                OptionalDouble value, JsonGenerator out, SerializationContext context) {
            if (value.isPresent()) {
                out.writeNumber(rounded(value.getAsDouble()).toPlainString());
            } else {
                out.writeNull();
            }
        }
    }

    private static final class Times extends StdSerializer<LocalDateTime> {
        Times() {
            super(LocalDateTime.class);
        }

        @Override
        public void serialize(
                LocalDateTime value, JsonGenerator out, SerializationContext context) {
            out.writeString(value.truncatedTo(ChronoUnit.MINUTES).toString());
        }
    }
}
