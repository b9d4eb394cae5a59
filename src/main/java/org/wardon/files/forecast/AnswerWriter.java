package org.wardon.files.forecast;

import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.OptionalDouble;
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

    private static final class Numbers extends StdSerializer<Double> {
        Numbers(Class<Double> type) {
            super(type);
        }

        @Override
        public void serialize(Double value, JsonGenerator out, SerializationContext context) {
            out.writeNumber(WrittenNumber.text(value));
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
                out.writeNumber(WrittenNumber.text(value.getAsDouble()));
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
