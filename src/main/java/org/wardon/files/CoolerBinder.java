package org.wardon.files;

import org.wardon.cooling.Cooler;
import org.wardon.files.json.Part;

/** Turns a cooler of a checked plan into the record of its kind. */
final class CoolerBinder {
    private final Inputs inputs;

    CoolerBinder(Inputs inputs) {
        this.inputs = inputs;
    }

    Cooler bind(Part part) {
        String kind = inputs.text(part, "kind");
        return switch (kind) {
            case "compressor" -> new CompressorBinder(inputs).bind(part);
            default ->
                    throw new IllegalArgumentException(
                            part.path() + ": the schema let the kind '" + kind + "' pass");
        };
    }
}
