package org.wardon.files;

import java.time.LocalTime;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.FaceName;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** Turns a cooler that acts on faces, of a checked plan, into its record. */
final class WaterBinder {
    private final Inputs inputs;

    WaterBinder(Inputs inputs) {
        this.inputs = inputs;
    }

    WettedWall wettedWall(Part part) {
        return new WettedWall(
                wets(part),
                inputs.number(part, "waterKgPerDay"),
                inputs.number(part, "innerDampFraction", Defaults.INNER_DAMP_FRACTION),
                pouredAt(part));
    }

    private List<LocalTime> pouredAt(Part part) {
        Part hours = part.at("pouredAt");
        if (hours.given()) {
            return hours.items().stream()
                    .map(h -> LocalTime.parse(h.text().orElseThrow()))
                    .toList();
        }
        List<String> usual = Defaults.POURED_AT;
        inputs.note(part, "pouredAt", String.join(", ", usual), "", Defaults.POURED_AT_MARK);
        return usual.stream().map(LocalTime::parse).toList();
    }

    WaterFilm waterFilm(Part part) {
        boolean open = part.at("open").flag().orElse(true);
        double flowKgS = inputs.number(part, "flowKgS");
        double pumpW = Defaults.PUMP_W_PER_KG_S.value() * flowKgS;
        return new WaterFilm(
                wets(part),
                flowKgS,
                inletC(part.at("inletC")),
                chiller(part),
                inputs.number(part, "pumpW", pumpW, "W", Defaults.PUMP_W_PER_KG_S.mark()),
                open,
                open
                        ? Defaults.JACKET_GAP_MM.value()
                        : inputs.number(part, "jacketGapMm", Defaults.JACKET_GAP_MM),
                inputs.control(part));
    }

    private static List<Double> inletC(Part inlet) {
        if (inlet.number().isPresent()) {
            return List.of(inlet.number().getAsDouble());
        }
        return inlet.items().stream().map(c -> c.number().orElseThrow()).toList();
    }

    private Optional<WaterFilm.Chiller> chiller(Part part) {
        if (!part.has("chillerCapacityW")) {
            return Optional.empty();
        }
        return Optional.of(
                new WaterFilm.Chiller(
                        inputs.number(part, "chillerCapacityW"),
                        inputs.number(part, "chillerCarnotFraction", Defaults.CARNOT_FRACTION),
                        Defaults.EVAPORATING_TD_K.value(),
                        Defaults.CONDENSING_APPROACH_K.value()));
    }

    private static Set<FaceName> wets(Part part) {
        Set<FaceName> names = EnumSet.noneOf(FaceName.class);
        for (Part name : part.at("wets").items()) {
            names.add(FaceName.valueOf(LotBinder.constant(name.text().orElseThrow())));
        }
        return names;
    }
}
