package org.wardon.files.form;

import java.util.Map;
import java.util.Optional;

/** What a new item of some lists begins with, to be changed by the person. */
final class Beginnings {
    /**
     * A room of a size often built, with the six faces to be filled in, and a lot of a kind to be
     * chosen (assumptions).
     */
    private static final Map<String, String> OF =
            Map.of(
                    "chambers",
                    """
                    {
                          "id": "chamber", "lengthM": 4, "widthM": 3, "heightM": 2.5,
                          "faces": [
                            {"face": "roof", LAYERS},
                            {"face": "floor", "layers": [{"material": "concrete-dense", "thicknessMm": 100}]},
                            {"face": "north", LAYERS},
                            {"face": "east", LAYERS},
                            {"face": "south", LAYERS},
                            {"face": "west", LAYERS}
                          ],
                          "cooling": [],
                          "setting": {"temperatureC": 10}
                        }"""
                            .replace(
                                    "LAYERS",
                                    "\"layers\": [{\"material\": \"pur-panel\", \"thicknessMm\":"
                                            + " 80}]"),
                    "lots",
                    "{\"id\": \"lot\", \"commodity\": \"\", \"massKg\": 500, \"temperatureC\": 25}");

    private Beginnings() {}

    static Optional<String> of(String list) {
        return Optional.ofNullable(OF.get(list));
    }
}
