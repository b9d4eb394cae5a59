package org.wardon.files;

import java.util.Collections;
import java.util.List;
import org.wardon.cooling.Cooler;
import org.wardon.errors.Require;
import org.wardon.files.json.Part;

/** Turns a cooler of a checked plan into the record of its kind, one for each of its units. */
final class CoolerBinder {
    static final int MOST_UNITS = 20;

    private final Inputs inputs;
    private final FanBinder fans;

    /** {@code capacityKg} is what the chamber takes, kg. */
    CoolerBinder(Inputs inputs, double capacityKg) {
        this.inputs = inputs;
        this.fans = new FanBinder(inputs, capacityKg);
    }

    List<Cooler> bind(Part part) {
        double units = inputs.numberElse(part, "units", 1);
        Require.within("units", units, 1, MOST_UNITS, "", "");
        return Collections.nCopies((int) units, one(part));
    }

    private Cooler one(Part part) {
        String kind = inputs.text(part, "kind");
        return switch (kind) {
            case "compressor" -> new CompressorBinder(inputs).bind(part);
            case "evaporative-pad" -> fans.pad(part);
            case "night-air" -> fans.nightAir(part);
            case "wetted-wall" -> new WaterBinder(inputs).wettedWall(part);
            case "water-film" -> new WaterBinder(inputs).waterFilm(part);
            case "ice-bank" -> new IceBankBinder(inputs).bind(part);
            default ->
                    throw new IllegalArgumentException(
                            part.path() + ": the schema let the kind '" + kind + "' pass");
        };
    }
}
