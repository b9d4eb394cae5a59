package org.wardon.advice.faces;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.wardon.advice.PlanLookups;
import org.wardon.enclosure.Material;
import org.wardon.files.PlanFaces;
import org.wardon.files.json.JsonPath;
import org.wardon.reference.ReferenceBook;

/** Tells how faces of a plan conduct, while the plan is being written. */
public final class FaceAdvice {
    private final PlanFaces faces;

    private FaceAdvice(PlanFaces faces) {
        this.faces = faces;
    }

    /**
     * Reads a plan for its faces.
     *
     * @param text text of the plan
     * @param book the tables
     * @return its faces
     * @throws org.wardon.errors.BadInput where the text is no JSON
     */
    public static FaceAdvice of(String text, ReferenceBook book) {
        return new FaceAdvice(PlanFaces.of(text, PlanLookups.of(book)));
    }

    /**
     * Returns what layers can be made of.
     *
     * @param book the tables
     * @return names by id, sorted
     */
    public static Map<String, String> materials(ReferenceBook book) {
        Map<String, String> names = new TreeMap<>();
        book.materials().values().stream()
                .filter(Material::isLayer)
                .forEach(one -> names.put(one.id(), one.name()));
        return names;
    }

    /**
     * Returns how a face or a build-up conducts.
     *
     * @param path its path, such as {@code $.chambers[0].faces[2]}; a build-up is told as a wall in
     *     the shade without thermal bridges
     * @return the report; absent where there is no such face, or it or its layers have a fault
     */
    public Optional<FaceReport> of(JsonPath path) {
        return faces.sheet(path).map(FaceReport::new);
    }
}
