package org.wardon.files;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.Material;
import org.wardon.files.json.Part;
import org.wardon.plan.Default;
import org.wardon.plan.Defaults;

/** Turns the faces of a checked plan into records. */
final class FaceBinder {
    private static final String OWN = "own";
    private static final String PANEL = "pur-panel";
    private static final String ABSORPTANCE = "solarAbsorptance";

    private final Part buildUps;
    private final Lookups lookups;
    private final Inputs inputs;

    FaceBinder(Part buildUps, Lookups lookups, Inputs inputs) {
        this.buildUps = buildUps;
        this.lookups = lookups;
        this.inputs = inputs;
    }

    Face bind(Part face) {
        FaceName name = FaceName.valueOf(LotBinder.constant(inputs.text(face, "face")));
        Optional<Part> buildUp = face.at("buildUp").text().map(buildUps::at);
        Part layers = face.has("layers") ? face.at("layers") : buildUp.orElseThrow().at("layers");
        Beyond usual = name == FaceName.FLOOR ? new Beyond.Ground() : new Beyond.Outdoors();
        Beyond beyond = beyond(face.at("beyond")).orElse(usual);
        return new Face(
                name,
                beyond,
                inputs.numberElse(face, "azimuthDeg", Defaults.azimuthDeg(name)),
                inputs.numberElse(face, "tiltDeg", Defaults.tiltDeg(name)),
                absorptance(face, buildUp, layers, beyond),
                layers.items().stream().map(this::layer).toList());
    }

    /** Returns what lies beyond, absent where the plan does not say. */
    static Optional<Beyond> beyond(Part part) {
        Optional<String> word = part.text();
        if (word.isPresent()) {
            return switch (word.get()) {
                case "shade" -> Optional.of(new Beyond.Shade());
                case "ground" -> Optional.of(new Beyond.Ground());
                default -> Optional.of(new Beyond.Outdoors());
            };
        }
        OptionalDouble space = part.at("spaceC").number();
        if (space.isPresent()) {
            return Optional.of(new Beyond.Space(space.getAsDouble()));
        }
        OptionalDouble above = part.at("spaceAboveOutdoorK").number();
        if (above.isPresent()) {
            return Optional.of(new Beyond.SpaceAboveOutdoor(above.getAsDouble()));
        }
        return part.at("chamber").text().map(Beyond.Neighbour::new);
    }

    private double absorptance(Part face, Optional<Part> buildUp, Part layers, Beyond beyond) {
        OptionalDouble given = face.at(ABSORPTANCE).number();
        if (given.isEmpty() && buildUp.isPresent()) {
            given = buildUp.get().at(ABSORPTANCE).number();
        }
        if (given.isPresent()) {
            return given.getAsDouble();
        }
        Optional<Material> outer =
                layers.items().get(0).at("material").text().map(lookups.materials()::get);
        OptionalDouble printed =
                outer.map(Material::solarAbsorptance).orElse(OptionalDouble.empty());
        Default unknown = Defaults.SOLAR_ABSORPTANCE;
        if (!(beyond instanceof Beyond.Outdoors)) {
            return printed.orElse(unknown.value());
        }
        return printed.isPresent()
                ? inputs.number(
                        face, ABSORPTANCE, printed.getAsDouble(), "1", outer.get().sourceId())
                : inputs.number(face, ABSORPTANCE, unknown);
    }

    private Layer layer(Part layer) {
        double thicknessM = inputs.number(layer, "thicknessMm") / 1_000;
        Optional<String> id = layer.at("material").text();
        if (id.isEmpty()) {
            return new Layer(
                    OWN,
                    thicknessM,
                    inputs.number(layer, "conductivityWmK"),
                    inputs.number(layer, "densityKgM3"),
                    inputs.number(layer, "specificHeatJkgK"),
                    inPlace(layer, Material.Moisture.UNKNOWN));
        }
        Material row = Optional.ofNullable(lookups.materials().get(id.get())).orElseThrow();
        return new Layer(
                row.id(),
                thicknessM,
                conductivity(layer, row, thicknessM),
                inputs.numberElse(layer, "densityKgM3", row.densityKgM3().orElse(0)),
                inputs.numberElse(layer, "specificHeatJkgK", row.specificHeatJkgK().orElse(0)),
                inPlace(layer, row.moisture()));
    }

    private Layer.InPlace inPlace(Part layer, Material.Moisture printed) {
        OptionalDouble vapour = layer.at("vapourResistanceFactor").number();
        Part bridge = layer.at("bridge");
        return new Layer.InPlace(
                inputs.numberElse(layer, "agedFactor", 1),
                new Layer.Damp(
                        inputs.numberElse(layer, "moisturePct", 0),
                        printed.coefficient().orElse(0)),
                bridge.given()
                        ? Optional.of(
                                new Layer.Bridge(
                                        inputs.number(bridge, "conductivityWmK"),
                                        inputs.number(bridge, "areaPct")))
                        : Optional.empty(),
                vapour.isPresent() ? vapour : printed.vapourResistanceFactor());
    }

    private double conductivity(Part layer, Material row, double thicknessM) {
        if (row.id().equals(PANEL)) {
            return inputs.number(layer, "conductivityWmK", Defaults.AGED_PANEL_CONDUCTIVITY);
        }
        double printed =
                row.conductivityWmK().isPresent()
                        ? row.conductivityWmK().getAsDouble()
                        : thicknessM / row.resistanceM2KW().orElse(thicknessM);
        return inputs.numberElse(layer, "conductivityWmK", printed);
    }
}
