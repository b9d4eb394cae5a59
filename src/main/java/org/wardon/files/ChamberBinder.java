package org.wardon.files;

import java.time.LocalDate;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.files.json.Part;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.ChamberUse;
import org.wardon.plan.Corrections;
import org.wardon.plan.Default;
import org.wardon.plan.Defaults;
import org.wardon.plan.EthyleneScrub;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StartAir;

/** Turns the chambers of a checked plan into records. */
final class ChamberBinder {
    private static final double MOST_KG = 1e7;

    private final Inputs inputs;
    private final FaceBinder faceBinder;
    private final DoorBinder doorBinder;
    private final PowerBinder powerBinder;

    ChamberBinder(Part buildUps, Lookups lookups, Inputs inputs, PowerBinder powerBinder) {
        this.inputs = inputs;
        this.powerBinder = powerBinder;
        this.faceBinder = new FaceBinder(buildUps, lookups, inputs);
        this.doorBinder = new DoorBinder(lookups, inputs);
    }

    ChamberPlan bind(Part chamber) {
        Box box =
                new Box(
                        inputs.number(chamber, "lengthM"),
                        inputs.number(chamber, "widthM"),
                        inputs.number(chamber, "heightM"));
        Enclosure enclosure = enclosure(chamber, box);
        Setting one = setting(chamber.at("setting"));
        double capacityKg = capacityKg(chamber, box);
        CoolerBinder coolerBinder = new CoolerBinder(inputs, capacityKg);
        List<Cooler> coolers =
                chamber.at("cooling").items().stream()
                        .flatMap(part -> coolerBinder.bind(part).stream())
                        .toList();
        Setting setting = staged(one, chamber.at("setting"), coolers);
        ChamberPlan bound =
                new ChamberPlan(
                        inputs.text(chamber, "id"),
                        enclosure,
                        coolers,
                        setting,
                        capacityKg,
                        powerBinder.single(chamber),
                        powerBinder.power(chamber),
                        inputs.numberElse(chamber, "humidifierKgH", 0),
                        inputs.numberElse(chamber, "heaterW", 0),
                        scrub(chamber.at("ethyleneScrub")),
                        starts(chamber.at("starts")),
                        corrections(chamber.at("corrections")),
                        new ChamberUse(
                                PlanBinder.accepts(chamber), changes(chamber), Optional.empty()));
        return inputs.flag(chamber, "off") ? bound.switchedOff() : bound;
    }

    private Enclosure enclosure(Part chamber, Box box) {
        List<Face> faces = chamber.at("faces").items().stream().map(faceBinder::bind).toList();
        Default leakage = leakage(faces);
        return new Enclosure(
                box,
                faces,
                inputs.number(chamber, "thermalBridgePct", Defaults.THERMAL_BRIDGE_PCT),
                chamber.has("door")
                        ? Optional.of(doorBinder.bind(chamber.at("door")))
                        : Optional.empty(),
                inputs.number(chamber, "leakageAirChangesPerDay", leakage),
                inputs.numberElse(chamber, "freshAirM3PerHour", 0),
                gains(chamber.at("gains")),
                inputs.number(chamber, "structureCapacityJK", structure(box)),
                chamber.at("films").text().equals(Optional.of("computed")),
                chamber.has("airZones")
                        ? Optional.of(zones(chamber.at("airZones")))
                        : Optional.empty());
    }

    private AirZones zones(Part zones) {
        String end = inputs.text(zones, "doorEnd", Defaults.DOOR_END, Defaults.ASSUMPTION);
        double share = inputs.number(zones, "doorEndShare", Defaults.DOOR_END_SHARE);
        OptionalDouble hourly = inputs.maybe(zones, "exchangeM3PerHour");
        if (hourly.isEmpty()) {
            inputs.note(
                    zones,
                    "exchangeM3PerHour",
                    Defaults.ENDS_EXCHANGE,
                    "",
                    Defaults.COMMON_PRACTICE);
        }
        return new AirZones(
                FaceName.valueOf(end.toUpperCase(Locale.ROOT)),
                share,
                hourly.isPresent()
                        ? OptionalDouble.of(hourly.getAsDouble() / 3_600)
                        : OptionalDouble.empty());
    }

    private static Default structure(Box box) {
        Default share = Defaults.STRUCTURE_J_M2K;
        return new Default(share.value() * box.areaM2(FaceName.FLOOR), "J/K", share.mark());
    }

    private static Default leakage(List<Face> faces) {
        boolean loose = false;
        boolean insulated = false;
        for (Face face : faces) {
            if (!face.level()) {
                loose |= face.layers().stream().anyMatch(l -> Defaults.looseBuild(l.material()));
                insulated |=
                        face.layers().stream()
                                .anyMatch(l -> Defaults.insulates(l.conductivityWmK()));
            }
        }
        if (loose) {
            return Defaults.LEAKAGE_LOOSE;
        }
        return insulated ? Defaults.LEAKAGE_PANEL : Defaults.LEAKAGE_MASONRY;
    }

    private Gains gains(Part gains) {
        double peopleHours = inputs.numberElse(gains, "peopleHoursPerDay", 0);
        return new Gains(
                inputs.numberElse(gains, "lightsW", 0),
                inputs.numberElse(gains, "lightsHoursPerDay", Math.min(peopleHours, 24)),
                peopleHours,
                inputs.numberElse(gains, "fansW", 0));
    }

    private Setting setting(Part setting) {
        return new Setting(
                inputs.number(setting, "temperatureC"),
                inputs.number(setting, "bandK", Defaults.BAND_K),
                inputs.number(setting, "humidityPct", Defaults.HUMIDITY_PCT));
    }

    /** The step from one cooler to the next, which is told where there is a next one. */
    private Setting staged(Setting one, Part setting, List<Cooler> coolers) {
        long thermostats = coolers.stream().filter(c -> c.following().isPresent()).count();
        double stageK =
                thermostats > 1
                        ? inputs.number(
                                setting, "stageK", one.stageK(), "K", Defaults.COMMON_PRACTICE)
                        : inputs.numberElse(setting, "stageK", one.stageK());
        return new Setting(one.temperatureC(), one.bandK(), one.humidityPct(), stageK);
    }

    private List<SettingChange> changes(Part chamber) {
        return chamber.at("settingChanges").items().stream()
                .map(
                        change ->
                                new SettingChange(
                                        inputs.time(change, "from").orElseThrow(),
                                        inputs.number(change, "temperatureC"),
                                        inputs.maybe(change, "humidityPct")))
                .toList();
    }

    private double capacityKg(Part chamber, Box box) {
        double usual = Defaults.STOWAGE_KG_M3.value() * box.volumeM3();
        return inputs.number(
                chamber,
                "capacityKg",
                Math.min(Math.max(usual, 1), MOST_KG),
                "kg",
                Defaults.STOWAGE_KG_M3.mark());
    }

    private Optional<EthyleneScrub> scrub(Part scrub) {
        return scrub.given()
                ? Optional.of(
                        new EthyleneScrub(
                                inputs.number(scrub, "airM3PerHour"),
                                inputs.number(
                                        scrub, "efficiencyPct", Defaults.SCRUB_EFFICIENCY_PCT)))
                : Optional.empty();
    }

    private Optional<StartAir> starts(Part starts) {
        return starts.given()
                ? Optional.of(
                        new StartAir(
                                inputs.number(starts, "temperatureC"),
                                inputs.maybe(starts, "humidityPct")))
                : Optional.empty();
    }

    private Corrections corrections(Part part) {
        return new Corrections(
                inputs.numberElse(part, "wallFactor", 1),
                inputs.numberElse(part, "exchangeFactor", 1),
                inputs.numberElse(part, "capacityFactor", 1),
                inputs.numberElse(part, "thermostatOffsetK", 0),
                part.at("since").text().map(LocalDate::parse));
    }
}
