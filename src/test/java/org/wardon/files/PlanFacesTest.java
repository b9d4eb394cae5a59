package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.enclosure.FaceSheet;
import org.wardon.files.json.JsonEdit;
import org.wardon.files.json.JsonPath;

/** Faces of a plan that is being written. */
class PlanFacesTest {
    private static JsonPath face(int chamber, int face) {
        return JsonPath.parse("$.chambers[" + chamber + "].faces[" + face + "]").orElseThrow();
    }

    private static String demo() throws IOException {
        return Files.readString(Path.of("demo-data", "landing.json"));
    }

    /** 80 mm of 0.028 between thin steel, 0.13 and 0.04: 1/(0.17 + 0.08/0.028) = 0.3303. */
    @Test
    void aPanelOfTheDemo() throws IOException {
        PlanFaces faces = PlanFaces.of(demo(), TableLookups.read());
        FaceSheet north = faces.sheet(face(0, 2)).orElseThrow();
        assertEquals(1 / (0.17 + 0.08 / 0.028), north.wattsM2K(), 1e-4);
        assertEquals(1.1 * north.wattsM2K(), north.upliftedWm2K(), 1e-12);
        FaceSheet floor = faces.sheet(face(0, 1)).orElseThrow();
        assertTrue(floor.layers().get(0).soil(), "soil lies under the floor");
    }

    @Test
    void aFaultElsewhereLeavesTheFaceOneInItsLayersDoesNot() throws IOException {
        JsonEdit plan = JsonEdit.of(demo());
        String elsewhere =
                plan.set(JsonPath.parse("$.chambers[0].setting.temperatureC").orElseThrow(), "999")
                        .text();
        assertTrue(PlanFaces.of(elsewhere, TableLookups.read()).sheet(face(0, 2)).isPresent());
        String layer =
                plan.set(
                                JsonPath.parse("$.buildUps.panel-80.layers[1].thicknessMm")
                                        .orElseThrow(),
                                "\"x\"")
                        .text();
        PlanFaces broken = PlanFaces.of(layer, TableLookups.read());
        assertEquals(Optional.empty(), broken.sheet(face(0, 2)));
        assertTrue(broken.sheet(face(1, 2)).isPresent(), "panel-100 is whole");
        assertEquals(Optional.empty(), broken.sheet(face(9, 0)));
    }
}
