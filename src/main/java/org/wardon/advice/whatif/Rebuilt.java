package org.wardon.advice.whatif;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Layer;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.json.Nearest;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Defaults;

/** Makes the changed chamber, or tells every fault of the changes. */
final class Rebuilt {
    private static final double LEAST_FACTOR = 0.1;
    private static final double MOST_FACTOR = 10;

    private final ChamberPlan chamber;
    private final Changes changes;
    private final Map<String, Double> protections;
    private final List<Fault> faults = new ArrayList<>();

    private Rebuilt(ChamberPlan chamber, Changes changes, Map<String, Double> protections) {
        this.chamber = chamber;
        this.changes = changes;
        this.protections = protections;
    }

    static ChamberPlan of(ChamberPlan chamber, Changes changes, Map<String, Double> protections) {
        Rebuilt rebuilt = new Rebuilt(chamber, changes, protections);
        rebuilt.check();
        if (!rebuilt.faults.isEmpty()) {
            throw new BadInput(rebuilt.faults);
        }
        // Another setting is asked about as one throughout.
        ChamberPlan set = changes.settingC().isPresent() ? chamber.changing(List.of()) : chamber;
        return set.with(rebuilt.enclosure(), rebuilt.coolers(), rebuilt.setting());
    }

    private void check() {
        within("settingC", changes.settingC(), -30, 45, "°C");
        within("coolingFactor", changes.coolingFactor(), LEAST_FACTOR, MOST_FACTOR, "");
        within("loadFactor", changes.loadFactor(), LEAST_FACTOR, MOST_FACTOR, "");
        within("freshAirM3PerHour", changes.freshAirM3PerHour(), 0, 10_000, "m3/h");
        within("openingsPerDay", changes.door().openingsPerDay(), 0, 2_000, "a day");
        changes.insulation()
                .ifPresent(
                        other -> {
                            within(
                                    "insulation.thicknessFactor",
                                    OptionalDouble.of(other.thicknessFactor()),
                                    LEAST_FACTOR,
                                    MOST_FACTOR,
                                    "");
                            other.face().ifPresent(this::known);
                        });
        changes.door().protection().ifPresent(this::protects);
        boolean ofDoor =
                changes.door().openingsPerDay().isPresent()
                        || changes.door().protection().isPresent();
        if (ofDoor && chamber.enclosure().door().isEmpty()) {
            fault("door", "chamber " + chamber.id() + " has none", "accepted: no change of a door");
        }
    }

    private void within(String what, OptionalDouble given, double low, double high, String unit) {
        if (given.isPresent() && !(given.getAsDouble() >= low && given.getAsDouble() <= high)) {
            fault(
                    what,
                    "is " + plain(given.getAsDouble()),
                    ("accepted: " + plain(low) + " to " + plain(high) + " " + unit).strip());
        }
    }

    private static String plain(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e9
                ? String.format(Locale.ROOT, "%.0f", value)
                : String.valueOf(value);
    }

    private void known(String face) {
        List<String> there = chamber.enclosure().faces().stream().map(one -> word(one)).toList();
        if (!there.contains(face)) {
            fault(
                    "insulation.face",
                    "is '" + face + "', no face of a chamber",
                    Nearest.question(face, there) + "accepted: " + String.join(", ", there));
        }
    }

    private void protects(String id) {
        if (!protections.containsKey(id)) {
            List<String> there = protections.keySet().stream().sorted().toList();
            fault(
                    "protection",
                    "is '" + id + "', no protection of a door in the tables",
                    Nearest.question(id, there) + "accepted: " + String.join(", ", there));
        }
    }

    private void fault(String what, String found, String accepted) {
        faults.add(new Fault(what, "", found, accepted));
    }

    private static String word(Face face) {
        return face.name().name().toLowerCase(Locale.ROOT);
    }

    private Setting setting() {
        Setting as = chamber.setting();
        return new Setting(
                changes.settingC().orElse(as.temperatureC()),
                as.bandK(),
                as.humidityPct(),
                as.stageK());
    }

    private List<Cooler> coolers() {
        double factor = changes.coolingFactor().orElse(1);
        return factor == 1
                ? chamber.coolers()
                : chamber.coolers().stream().map(cooler -> cooler.sized(factor)).toList();
    }

    private Enclosure enclosure() {
        Enclosure as = chamber.enclosure();
        return new Enclosure(
                as.box(),
                as.faces().stream().map(this::face).toList(),
                as.thermalBridgePct(),
                as.door().map(this::door),
                as.leakageAirChangesPerDay(),
                changes.freshAirM3PerHour().orElse(as.freshAirM3PerHour()),
                as.gains(),
                as.structureCapacityJK(),
                as.computedFilms(),
                as.zones());
    }

    private Door door(Door as) {
        Optional<String> other = changes.door().protection();
        return new Door(
                as.widthM(),
                as.heightM(),
                changes.door().openingsPerDay().orElse(as.openingsPerDay()),
                as.secondsOpen(),
                as.from(),
                as.to(),
                other.map(id -> protections.getOrDefault(id, 0.0)).orElse(as.effectiveness()),
                other.orElse(as.protection()),
                as.beyond());
    }

    private Face face(Face as) {
        if (changes.insulation().isEmpty()) {
            return as;
        }
        Changes.Insulation other = changes.insulation().get();
        boolean meant =
                other.face()
                        .map(name -> name.equals(word(as)))
                        .orElse(!(as.beyond() instanceof Beyond.Neighbour));
        if (!meant) {
            return as;
        }
        boolean insulated = as.layers().stream().anyMatch(Rebuilt::insulates);
        return new Face(
                as.name(),
                as.beyond(),
                as.azimuthDeg(),
                as.tiltDeg(),
                as.solarAbsorptance(),
                as.layers().stream()
                        .map(
                                layer ->
                                        !insulated || insulates(layer)
                                                ? thicker(layer, other.thicknessFactor())
                                                : layer)
                        .toList());
    }

    private static boolean insulates(Layer layer) {
        return Defaults.insulates(layer.conductivityWmK());
    }

    private static Layer thicker(Layer as, double factor) {
        return new Layer(
                as.material(),
                factor * as.thicknessM(),
                as.conductivityWmK(),
                as.densityKgM3(),
                as.specificHeatJkgK(),
                as.inPlace());
    }
}
