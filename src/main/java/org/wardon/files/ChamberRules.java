package org.wardon.files;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Material;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** What the schema cannot say of chambers: what names what, what comes before what. */
final class ChamberRules {
    private static final List<String> FACES =
            List.of("roof", "floor", "north", "east", "south", "west");

    /** Coolers that act on nothing but the room's air. */
    private static final List<String> IN_ROOM = List.of("compressor", "ice-bank");

    private final Part plan;
    private final Lookups lookups;
    private final Faults faults;
    private final IdRules ids;
    private final PowerRules power;
    private final SettingRules settings;

    ChamberRules(Part plan, Lookups lookups, Faults faults) {
        this.plan = plan;
        this.lookups = lookups;
        this.faults = faults;
        this.ids = new IdRules(faults);
        this.power = new PowerRules(plan, faults);
        this.settings = new SettingRules(plan, faults);
    }

    void check() {
        for (String name : plan.at("buildUps").names()) {
            plan.at("buildUps").at(name).at("layers").items().forEach(this::layer);
            bridges(plan.at("buildUps").at(name).at("layers"));
        }
        List<Part> chambers = plan.at("chambers").items();
        ids.unique(chambers, "chamber");
        for (Part chamber : chambers) {
            faces(chamber);
            if (chamber.has("door")) {
                door(chamber);
            }
            power.check(chamber);
            settings.check(chamber);
            chamber.at("cooling").items().forEach(this::cooler);
            units(chamber.at("cooling"));
            new WaterRules(faults).check(chamber);
            zones(chamber);
        }
    }

    private void units(Part cooling) {
        double all = 0;
        for (Part cooler : cooling.items()) {
            all += cooler.at("units").number().orElse(1);
        }
        boolean counted = cooling.items().stream().noneMatch(c -> faults.at(c.at("units").path()));
        if (counted
                && all > CoolerBinder.MOST_UNITS
                && cooling.items().size() <= CoolerBinder.MOST_UNITS) {
            faults.add(
                    cooling.path(),
                    "makes " + Math.round(all) + " units in all",
                    "accepted: " + CoolerBinder.MOST_UNITS + " units at most");
        }
    }

    /** Outdoor air blown through a chamber, and water on its faces, know no ends. */
    private void zones(Part chamber) {
        if (!chamber.has("airZones")) {
            return;
        }
        for (Part cooler : chamber.at("cooling").items()) {
            Optional<String> kind = cooler.at("kind").text();
            if (kind.isPresent()
                    && !IN_ROOM.contains(kind.get())
                    && !faults.at(cooler.at("kind").path())) {
                faults.add(
                        chamber.at("airZones").path(),
                        "stands beside " + cooler.path() + " of kind " + Json.quoted(kind.get()),
                        "accepted: with coolers of kind " + String.join(", ", IN_ROOM) + " only");
                return;
            }
        }
    }

    private void cooler(Part cooler) {
        notAbove(cooler, "lowestHumidityPct", "highestHumidityPct", "%");
        notAbove(cooler, "startIceKg", "iceKg", "kg");
        for (String name : List.of("rechargePowerW", "rechargeFrom", "rechargeTo")) {
            if (cooler.has(name) && !cooler.has("rechargeW")) {
                faults.add(
                        cooler.at(name).path(),
                        "is given without rechargeW",
                        "accepted: together with rechargeW, or not at all");
            }
        }
    }

    private void notAbove(Part cooler, String lowName, String highName, String unit) {
        Part low = cooler.at(lowName);
        Part high = cooler.at(highName);
        boolean known =
                low.number().isPresent()
                        && high.number().isPresent()
                        && !faults.at(low.path())
                        && !faults.at(high.path());
        if (known && low.number().getAsDouble() > high.number().getAsDouble()) {
            String most = high.json().orElseThrow().shown() + " " + unit;
            faults.add(
                    low.path(),
                    "is "
                            + low.json().orElseThrow().shown()
                            + " "
                            + unit
                            + ", above "
                            + highName
                            + " "
                            + most,
                    "accepted: up to " + most);
        }
    }

    private void faces(Part chamber) {
        Part faces = chamber.at("faces");
        boolean misread = false;
        Map<String, String> seen = new HashMap<>();
        for (Part face : faces.items()) {
            Part name = face.at("face");
            name.text().ifPresent(word -> once(word, face, seen));
            misread |= name.text().isEmpty() || faults.at(name.path());
            ids.known(face.at("buildUp"), plan.at("buildUps").names(), "build-up of this plan");
            face.at("layers").items().forEach(this::layer);
            bridges(face.at("layers"));
            tilt(face);
            beyond(face.at("beyond"), chamber);
            if (name.text().equals(Optional.of("floor"))) {
                floor(face.at("beyond"));
            }
        }
        List<String> missing = FACES.stream().filter(name -> !seen.containsKey(name)).toList();
        if (!missing.isEmpty() && !misread && !faces.items().isEmpty()) {
            faults.add(
                    faces.path(),
                    "lacks " + String.join(", ", missing),
                    "accepted: all six of " + String.join(", ", FACES));
        } else if (faces.given() && faces.items().isEmpty()) {
            faults.add(
                    faces.path(), "is empty", "accepted: all six of " + String.join(", ", FACES));
        }
    }

    private void once(String word, Part face, Map<String, String> seen) {
        String first = seen.putIfAbsent(word, face.path());
        if (first != null && !faults.at(face.at("face").path())) {
            faults.add(
                    face.at("face").path(),
                    "is " + Json.quoted(word) + ", as " + first + " is too",
                    "accepted: each face once");
        }
    }

    private void tilt(Part face) {
        Part tilt = face.at("tiltDeg");
        if (tilt.number().isEmpty() || faults.at(tilt.path())) {
            return;
        }
        Optional<String> name = face.at("face").text();
        if (!name.equals(Optional.of("roof"))) {
            faults.add(
                    tilt.path(),
                    "stands on " + name.map(Json::quoted).orElse("no face"),
                    "accepted: on the roof only");
        } else if (tilt.number().getAsDouble() > 0 && !face.has("azimuthDeg")) {
            faults.add(
                    tilt.path(),
                    "slopes without a direction",
                    "accepted: azimuthDeg given beside it");
        }
    }

    private void floor(Part beyond) {
        if (beyond.text().equals(Optional.of("outdoors"))) {
            faults.add(
                    beyond.path(),
                    "is 'outdoors' under a floor",
                    "accepted: ground, shade, {\"spaceC\": 22}, {\"spaceAboveOutdoorK\": 3} or"
                            + " {\"chamber\": \"south\"}");
        }
    }

    private void beyond(Part beyond, Part chamber) {
        Part other = beyond.at("chamber");
        if (faults.at(beyond.path())) {
            return;
        }
        if (other.text().isPresent() && other.text().equals(chamber.at("id").text())) {
            faults.add(
                    other.path(),
                    "is " + Json.quoted(other.text().get()) + ", the chamber itself",
                    "accepted: another chamber of the plan");
        } else {
            ids.chamber(other, plan);
        }
    }

    private void layer(Part layer) {
        Part material = layer.at("material");
        ids.known(material, lookups.materials().keySet(), "material of the tables");
        Material row = material.text().map(lookups.materials()::get).orElse(null);
        if (row != null || material.text().isEmpty()) {
            moisture(layer.at("moisturePct"), Optional.ofNullable(row));
        }
        if (row == null || faults.at(layer.path())) {
            return;
        }
        List<String> unknown = new ArrayList<>();
        boolean resistance = row.resistanceM2KW().isPresent();
        lacks(layer, "conductivityWmK", row.conductivityWmK(), resistance, unknown);
        lacks(layer, "densityKgM3", row.densityKgM3(), resistance, unknown);
        lacks(layer, "specificHeatJkgK", row.specificHeatJkgK(), resistance, unknown);
        if (!unknown.isEmpty()) {
            faults.add(
                    layer.path(),
                    "the tables have no " + String.join(", ", unknown) + " of '" + row.id() + "'",
                    "accepted: " + String.join(", ", unknown) + " given beside the material");
        }
    }

    private void moisture(Part moisture, Optional<Material> row) {
        boolean known = row.isPresent() && row.get().moisture().coefficient().isPresent();
        if (moisture.number().isEmpty() || faults.at(moisture.path()) || known) {
            return;
        }
        String found =
                row.map(m -> "the tables have no moisture coefficient of '" + m.id() + "'")
                        .orElse("a layer without material has no moisture coefficient");
        faults.add(
                moisture.path(),
                found,
                "accepted: agedFactor in its place, how many times more heat it lets through");
    }

    /** The combined method sums every way through the face: each bridged layer doubles them. */
    private void bridges(Part layers) {
        long bridged = layers.items().stream().filter(layer -> layer.has("bridge")).count();
        if (bridged > Face.MOST_BRIDGED) {
            faults.add(
                    layers.path(),
                    "has " + bridged + " layers with a bridge",
                    "accepted: at most " + Face.MOST_BRIDGED + " of them");
        }
    }

    private static void lacks(
            Part layer, String name, OptionalDouble value, boolean resistance, List<String> out) {
        if (value.isEmpty() && !resistance && !layer.has(name)) {
            out.add(name);
        }
    }

    private void door(Part chamber) {
        Part door = chamber.at("door");
        beyond(door.at("beyond"), chamber);
        ids.known(
                door.at("protection"),
                lookups.protections().keySet(),
                "protection of a door with a figure in the tables");
        if (door.at("beyond").text().equals(Optional.of("ground"))) {
            faults.add(
                    door.at("beyond").path(),
                    "is 'ground' behind a door",
                    "accepted: outdoors, shade, {\"spaceC\": 22}, {\"spaceAboveOutdoorK\": 3} or"
                            + " {\"chamber\": \"south\"}");
        }
        hours(door);
        fits(door.at("heightM"), chamber.at("heightM"), "higher");
        Part longest =
                chamber.at("lengthM").number().orElse(0) < chamber.at("widthM").number().orElse(0)
                        ? chamber.at("widthM")
                        : chamber.at("lengthM");
        fits(door.at("widthM"), longest, "wider");
    }

    private void fits(Part of, Part within, String how) {
        boolean known =
                of.number().isPresent()
                        && within.number().isPresent()
                        && !faults.at(of.path())
                        && !faults.at(within.path());
        if (known && of.number().getAsDouble() > within.number().getAsDouble()) {
            faults.add(
                    of.path(),
                    "is "
                            + of.json().orElseThrow().shown()
                            + " m, "
                            + how
                            + " than the chamber's "
                            + within.json().orElseThrow().shown()
                            + " m",
                    "accepted: up to " + within.json().orElseThrow().shown() + " m");
        }
    }

    private void hours(Part door) {
        if (faults.at(door.at("from").path()) || faults.at(door.at("to").path())) {
            return;
        }
        String from = door.at("from").text().orElse(Defaults.DOOR_FROM);
        String to = door.at("to").text().orElse(Defaults.DOOR_TO);
        if (!LocalTime.parse(from).isBefore(LocalTime.parse(to))) {
            faults.add(
                    door.at(door.has("to") ? "to" : "from").path(),
                    "the door is used from " + from + " to " + to,
                    "accepted: a later hour of the same day for to, 23:59 at most");
        }
    }
}
