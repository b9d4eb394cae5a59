package org.wardon.files;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceSheet;
import org.wardon.enclosure.GroundFloor;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.JsonPath;
import org.wardon.files.json.JsonText;
import org.wardon.files.json.Part;
import org.wardon.files.json.SchemaCheck;
import org.wardon.plan.Defaults;

/** Faces of a plan that need not be whole elsewhere. */
public final class PlanFaces {
    private static final double MM_IN_M = 1_000;
    private static final JsonPath BUILD_UPS = JsonPath.ROOT.then(new JsonPath.Member("buildUps"));

    private final Part plan;
    private final Faults faults;
    private final Lookups lookups;

    private PlanFaces(Part plan, Faults faults, Lookups lookups) {
        this.plan = plan;
        this.faults = faults;
        this.lookups = lookups;
    }

    /**
     * Reads a plan for its faces.
     *
     * @param text text of the plan
     * @param lookups the ids of the tables
     * @return its faces
     * @throws org.wardon.errors.BadInput where it is no JSON
     */
    public static PlanFaces of(String text, Lookups lookups) {
        Faults faults = new Faults("plan");
        Optional<Json> json = JsonText.read(text, faults);
        if (json.isEmpty()) {
            faults.refuseIfAny();
        }
        Part plan = Part.root(json.orElseThrow());
        new SchemaCheck(Schema.tree(), faults).check(json.get());
        new ChamberRules(plan, lookups, faults).check();
        return new PlanFaces(plan, faults, lookups);
    }

    /**
     * Returns how a face conducts.
     *
     * @param path its path, such as {@code $.chambers[0].faces[2]}; that of a build-up is told as a
     *     wall in the shade without thermal bridges
     * @return the sheet; absent where there is no such face, or it or its layers have a fault
     */
    public Optional<FaceSheet> sheet(JsonPath path) {
        if (path.up().equals(BUILD_UPS)) {
            return wall(plan.at(path)).map(wall -> FaceSheet.of(wall, 0, Optional.empty()));
        }
        return path.toString().contains("faces")
                ? face(path).map(face -> sheet(face, plan.at(path.up().up())))
                : Optional.empty();
    }

    private Optional<Face> wall(Part buildUp) {
        if (!buildUp.given() || faults.at(buildUp.path())) {
            return Optional.empty();
        }
        Map<String, Json> face = new LinkedHashMap<>();
        face.put("face", new Json.Text("north"));
        face.put("beyond", new Json.Text("shade"));
        buildUp.at("layers").json().ifPresent(layers -> face.put("layers", layers));
        return bound(Part.root(new Json.Obj(face)));
    }

    private Optional<Face> bound(Part part) {
        try {
            return Optional.of(
                    new FaceBinder(plan.at("buildUps"), lookups, new Inputs()).bind(part));
        } catch (IllegalArgumentException | NoSuchElementException e) {
            // A face that is not whole has no sheet; its faults are told where the plan is read.
            return Optional.empty();
        }
    }

    /**
     * Returns a face.
     *
     * @param path its path
     * @return the face; absent where there is none, or it or its layers have a fault
     */
    public Optional<Face> face(JsonPath path) {
        Part part = plan.at(path);
        Part buildUps = plan.at("buildUps");
        boolean named = !part.has("layers");
        String layers = part.at("buildUp").text().map(id -> buildUps.at(id).path()).orElse("$");
        boolean bad = faults.at(part.path()) || (named && faults.at(layers));
        if (!part.given()
                || bad
                || (named && !buildUps.has(part.at("buildUp").text().orElse("")))) {
            return Optional.empty();
        }
        return bound(part);
    }

    private FaceSheet sheet(Face face, Part chamber) {
        double bridges =
                chamber.at("thermalBridgePct").number().orElse(Defaults.THERMAL_BRIDGE_PCT.value());
        Optional<GroundFloor> ground =
                face.beyond() instanceof Beyond.Ground ? ground(chamber) : Optional.empty();
        return FaceSheet.of(face, bridges, ground);
    }

    private Optional<GroundFloor> ground(Part chamber) {
        OptionalDouble length = measure(chamber, "lengthM");
        OptionalDouble width = measure(chamber, "widthM");
        if (length.isEmpty() || width.isEmpty()) {
            return Optional.empty();
        }
        double l = length.getAsDouble();
        double w = width.getAsDouble();
        return Optional.of(
                new GroundFloor(
                        l * w, 2 * (l + w), walls(chamber), GroundFloor.Soil.SAND_OR_GRAVEL));
    }

    private OptionalDouble measure(Part chamber, String name) {
        Part part = chamber.at(name);
        return faults.at(part.path()) ? OptionalDouble.empty() : part.number();
    }

    /** Mean thickness of the walls whose layers are known, m. */
    private double walls(Part chamber) {
        List<Part> faces = chamber.at("faces").items();
        return faces.stream()
                .filter(
                        face ->
                                !List.of("roof", "floor")
                                        .contains(face.at("face").text().orElse("")))
                .map(this::layersOf)
                .filter(layers -> !layers.items().isEmpty())
                .mapToDouble(PlanFaces::thickM)
                .average()
                .orElse(0);
    }

    private Part layersOf(Part face) {
        return face.has("layers")
                ? face.at("layers")
                : plan.at("buildUps").at(face.at("buildUp").text().orElse("")).at("layers");
    }

    private static double thickM(Part layers) {
        return layers.items().stream()
                .mapToDouble(layer -> layer.at("thicknessMm").number().orElse(0) / MM_IN_M)
                .sum();
    }
}
