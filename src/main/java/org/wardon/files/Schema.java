package org.wardon.files;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Shape;
import org.wardon.files.json.Shapes;

/** The JSON Schema of a store plan, as shipped with the program. */
public final class Schema {
    private static final String RESOURCE = "store-plan.schema.json";

    private Schema() {}

    /**
     * Returns the schema as it is printed.
     *
     * @return JSON Schema, draft 2020-12
     */
    public static String text() {
        try (InputStream in = Schema.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException(RESOURCE + " is not in the program");
            }
            return new String(in.readAllBytes(), UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(RESOURCE + " cannot be read from the program", e);
        }
    }

    /**
     * Returns what a plan may hold, for a form.
     *
     * @return the shape of the whole plan
     */
    public static Shape shape() {
        return Shapes.of(tree());
    }

    static Json tree() {
        Faults faults = new Faults(RESOURCE);
        Json tree = JsonText.read(text(), faults).orElseThrow();
        faults.refuseIfAny();
        return tree;
    }
}
