package org.wardon.advice.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.FaceSheet;
import org.wardon.enclosure.Layer;

/** The drawn section of a face. */
class FacePictureTest {
    private static final Layer STEEL = new Layer("steel-sheet", 0.0005, 50, 7800, 450);
    private static final Layer FOAM = new Layer("pur-panel", 0.09, 0.028, 40, 1400);
    private static final Layer BRICK = new Layer("brick", 0.18, 0.7, 1700, 800);
    private static final Pattern EDGE =
            Pattern.compile("class=\"edge\" x=\"([0-9.]+)\" y=\"[0-9.]+\" width=\"([0-9.]+)\"");

    private static String picture(Layer... layers) {
        Face face = new Face(FaceName.NORTH, new Beyond.Outdoors(), 0, 0.6, List.of(layers));
        return FacePicture.of(
                FaceSheet.of(face, 10, Optional.empty()),
                Words.english(Units.METRIC),
                UnaryOperator.identity());
    }

    private static List<double[]> edges(String svg) {
        return EDGE.matcher(svg)
                .results()
                .map(
                        edge ->
                                new double[] {
                                    Double.parseDouble(edge.group(1)),
                                    Double.parseDouble(edge.group(2))
                                })
                .toList();
    }

    @Test
    void layersAreToScaleAndThinOnesWidenedAndTold() {
        String svg = picture(STEEL, BRICK, FOAM, STEEL);
        List<double[]> edges = edges(svg);
        assertEquals(4, edges.size());
        assertEquals(2, edges.get(1)[1] / edges.get(2)[1], 0.001, "180 mm against 90 mm");
        assertEquals(9, edges.get(0)[1], 1e-9);
        assertTrue(svg.contains("0.5 mm steel-sheet, metal (drawn wider than it is)"));
        assertTrue(svg.contains("90 mm pur-panel, insulation<"));
        double end = 46;
        for (double[] edge : edges) {
            assertEquals(end, edge[0], 0.011, "no gap between layers");
            end += edge[1];
        }
        assertEquals(360 - 46, end, 0.03);
    }

    @Test
    void stuffGoesByFigures() {
        assertEquals(FacePicture.Stuff.METAL, FacePicture.Stuff.of(STEEL));
        assertEquals(FacePicture.Stuff.INSULATION, FacePicture.Stuff.of(FOAM));
        assertEquals(FacePicture.Stuff.HEAVY, FacePicture.Stuff.of(BRICK));
        assertEquals(
                FacePicture.Stuff.AIR,
                FacePicture.Stuff.of(new Layer("air-wall", 0.05, 0.28, 0, 0)));
        assertEquals(
                FacePicture.Stuff.LIGHT,
                FacePicture.Stuff.of(new Layer("plywood", 0.012, 0.13, 500, 1600)));
    }
}
