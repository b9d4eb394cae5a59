package org.wardon.files;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Part;

/** What the schema cannot say of coolers that act on faces: which faces, and each but once. */
final class WaterRules {
    private static final String WETTED = "wetted-wall";
    private static final String FILM = "water-film";
    private static final List<String> LEVEL = List.of("roof", "floor");
    private static final String WALLS = "accepted: north, east, south, west";

    private final Faults faults;

    WaterRules(Faults faults) {
        this.faults = faults;
    }

    void check(Part chamber) {
        Map<String, Part> wetted = new HashMap<>();
        for (Part cooler : chamber.at("cooling").items()) {
            String kind = cooler.at("kind").text().orElse("");
            if (!kind.equals(WETTED) && !kind.equals(FILM)) {
                continue;
            }
            for (Part name : cooler.at("wets").items()) {
                face(name, cooler, kind, wetted);
                beyond(name, kind, chamber);
            }
            hours(cooler.at("pouredAt"));
            jacketGap(cooler);
        }
    }

    private void face(Part name, Part cooler, String kind, Map<String, Part> wetted) {
        Optional<String> word = name.text();
        if (word.isEmpty() || faults.at(name.path())) {
            return;
        }
        Part first = wetted.putIfAbsent(word.get(), name);
        if (first != null) {
            boolean same = first.path().startsWith(cooler.at("wets").path());
            faults.add(
                    name.path(),
                    "is "
                            + Json.quoted(word.get())
                            + (same
                                    ? ", as " + first.path() + " is too"
                                    : ", which " + first.path() + " wets already"),
                    same
                            ? "accepted: each face once"
                            : "accepted: a face is wetted by one cooler, on one side");
        } else if (LEVEL.contains(word.get()) && kind.equals(WETTED)) {
            faults.add(
                    name.path(),
                    "is "
                            + Json.quoted(word.get())
                            + "; cover and floor of a wetted wall are not wet",
                    WALLS);
        } else if (LEVEL.contains(word.get()) && cooler.at("open").flag().orElse(true)) {
            faults.add(
                    name.path(),
                    "is " + Json.quoted(word.get()) + "; an open film runs down walls only",
                    WALLS + ", or a closed jacket with \"open\": false");
        }
    }

    /** A wetted wall must have air on its far side, and air that is not another chamber's. */
    private void beyond(Part name, String kind, Part chamber) {
        if (!kind.equals(WETTED) || name.text().isEmpty() || faults.at(name.path())) {
            return;
        }
        for (Part face : chamber.at("faces").items()) {
            Part beyond = face.at("beyond");
            boolean here = face.at("face").text().equals(name.text());
            boolean soil = beyond.text().equals(Optional.of("ground"));
            if (here && (soil || beyond.has("chamber"))) {
                faults.add(
                        name.path(),
                        "is "
                                + Json.quoted(name.text().get())
                                + ", whose far side is "
                                + (soil ? "ground" : "another chamber"),
                        "accepted: walls with outdoors, shade or a space beyond, to dry to");
            }
        }
    }

    private void hours(Part pouredAt) {
        Map<String, String> seen = new HashMap<>();
        for (Part hour : pouredAt.items()) {
            Optional<String> word = hour.text();
            String first = word.map(w -> seen.putIfAbsent(w, hour.path())).orElse(null);
            if (first != null && !faults.at(hour.path())) {
                faults.add(
                        hour.path(),
                        "is " + Json.quoted(word.orElseThrow()) + ", as " + first + " is too",
                        "accepted: each hour once");
            }
        }
    }

    private void jacketGap(Part cooler) {
        Part gap = cooler.at("jacketGapMm");
        if (gap.given() && cooler.at("open").flag().orElse(true) && !faults.at(gap.path())) {
            faults.add(
                    gap.path(),
                    "is given for an open film",
                    "accepted: jacketGapMm with \"open\": false");
        }
    }
}
