package org.wardon.advice.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.wardon.advice.wording.Words;
import org.wardon.enclosure.FaceSheet;
import org.wardon.enclosure.Layer;

/**
 * A section through a face, outside on the left: layers to scale, each hatched by what it is made
 * of and numbered, those too thin to be seen widened and told.
 */
public final class FacePicture {
    private static final double WIDTH = 360;
    private static final double EDGE = 46;
    private static final double TOP = 26;
    private static final double HIGH = 116;
    private static final double LEAST = 9;
    private static final double MM_IN_M = 1_000;
    private static final double METAL_WMK = 10;
    private static final double INSULATES_WMK = 0.07;
    private static final double LIGHT_WMK = 0.35;

    private final FaceSheet sheet;
    private final Words words;
    private final UnaryOperator<String> marks;
    private final Svg svg = new Svg();

    private FacePicture(FaceSheet sheet, Words words, UnaryOperator<String> marks) {
        this.sheet = sheet;
        this.words = words;
        this.marks = marks;
    }

    /**
     * Draws it.
     *
     * @param sheet the face
     * @param words words of the person
     * @param marks writes decimal marks as the person does
     * @return SVG that takes its colours from the page's style
     */
    public static String of(FaceSheet sheet, Words words, UnaryOperator<String> marks) {
        return new FacePicture(sheet, words, marks).text();
    }

    /** What a layer is made of, by its figures, so that own materials are hatched too. */
    public enum Stuff {
        /** Conducts like metal. */
        METAL,
        /** Has no mass: still air. */
        AIR,
        /** Conducts little. */
        INSULATION,
        /** Wood, boards, light earth. */
        LIGHT,
        /** Stone, concrete, brick, soil. */
        HEAVY;

        /**
         * Returns the word for it.
         *
         * @return in lower case
         */
        public String word() {
            return name().toLowerCase(java.util.Locale.ROOT);
        }

        /**
         * Returns what a layer is made of.
         *
         * @param layer the layer
         * @return its stuff
         */
        public static Stuff of(Layer layer) {
            if (layer.densityKgM3() == 0) {
                return AIR;
            }
            double conducts = layer.conductivityWmK();
            if (conducts >= METAL_WMK) {
                return METAL;
            }
            return conducts < INSULATES_WMK ? INSULATION : conducts < LIGHT_WMK ? LIGHT : HEAVY;
        }
    }

    private String text() {
        List<FaceSheet.Part> parts = sheet.layers().stream().filter(part -> !part.soil()).toList();
        double[] wide = widths(parts);
        double x = EDGE;
        for (int i = 0; i < parts.size(); i++) {
            layer(parts.get(i), i + 1, x, wide[i]);
            x += wide[i];
        }
        boolean soil = sheet.layers().size() > parts.size();
        side(EDGE - 6, "end", words.text(soil ? "face.soil" : "face.outside"));
        side(x + 6, "start", words.text("face.inside"));
        double below = told(parts, wide);
        return "<svg class=\"face-section\" viewBox=\"0 0 "
                + Svg.number(WIDTH)
                + " "
                + Svg.number(below)
                + "\" role=\"img\" aria-label=\""
                + Svg.safe(label(parts)).replace("\"", "&quot;")
                + "\" focusable=\"false\">\n"
                + svg.lines()
                + "</svg>\n";
    }

    private String label(List<FaceSheet.Part> parts) {
        List<String> names = new ArrayList<>();
        parts.forEach(part -> names.add(millimetres(part.layer()) + " " + part.layer().material()));
        return words.text("face.title").replace("{0}", String.join(", ", names));
    }

    private String millimetres(Layer layer) {
        return marks.apply(Svg.number(MM_IN_M * layer.thicknessM())) + " mm";
    }

    /** To scale, but none narrower than can be seen. */
    private static double[] widths(List<FaceSheet.Part> parts) {
        double room = WIDTH - 2 * EDGE;
        double total = parts.stream().mapToDouble(part -> part.layer().thicknessM()).sum();
        double widened = 0;
        double left = 0;
        for (FaceSheet.Part part : parts) {
            double share = part.layer().thicknessM() / total;
            widened += share * room < LEAST ? LEAST : 0;
            left += share * room < LEAST ? 0 : share;
        }
        double[] wide = new double[parts.size()];
        for (int i = 0; i < wide.length; i++) {
            double share = parts.get(i).layer().thicknessM() / total;
            wide[i] = share * room < LEAST ? LEAST : share / left * (room - widened);
        }
        return wide;
    }

    private static boolean widened(FaceSheet.Part part, List<FaceSheet.Part> parts) {
        double total = parts.stream().mapToDouble(one -> one.layer().thicknessM()).sum();
        return part.layer().thicknessM() / total * (WIDTH - 2 * EDGE) < LEAST;
    }

    private void layer(FaceSheet.Part part, int number, double x, double wide) {
        Stuff stuff = Stuff.of(part.layer());
        svg.add(
                "<rect class=\"stuff %s\" x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\"/>",
                stuff.word(), x, TOP, wide, HIGH);
        hatch(stuff, x, wide);
        part.layer().inPlace().bridge().ifPresent(bridge -> bridge(x, wide));
        svg.add(
                "<rect class=\"edge\" x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\"/>",
                x, TOP, wide, HIGH);
        svg.text(x + wide / 2, TOP - 7, "middle", "told", String.valueOf(number));
    }

    /** A batten across the layer. */
    private void bridge(double x, double wide) {
        double y = TOP + 0.4 * HIGH;
        double tall = 0.2 * HIGH;
        svg.add(
                "<rect class=\"stuff light\" x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\"/>",
                x, y, wide, tall);
        svg.add(
                "<path class=\"hatch\" d=\"M%s %sL%s %sM%s %sL%s %s\"/>",
                x, y, x + wide, y + tall, x, y + tall, x + wide, y);
    }

    private void hatch(Stuff stuff, double x, double wide) {
        switch (stuff) {
            case INSULATION -> waves(x, wide);
            case LIGHT -> levels(x, wide, 9);
            case HEAVY -> slants(x, wide, 10);
            case METAL -> slants(x, wide, 4);
            default -> {
                // Air is left white.
            }
        }
    }

    private void waves(double x, double wide) {
        StringBuilder path = new StringBuilder();
        double step = 12;
        for (double y = TOP; y < TOP + HIGH - 1; y += step) {
            double tall = Math.min(step, TOP + HIGH - y);
            path.append("M").append(Svg.number(x)).append(' ').append(Svg.number(y));
            path.append("L").append(Svg.number(x + wide)).append(' ');
            path.append(Svg.number(y + tall / 2));
            path.append("L").append(Svg.number(x)).append(' ').append(Svg.number(y + tall));
        }
        svg.add("<path class=\"hatch\" d=\"%s\"/>", path);
    }

    private void levels(double x, double wide, double step) {
        StringBuilder path = new StringBuilder();
        for (double y = TOP + step; y < TOP + HIGH; y += step) {
            path.append("M").append(Svg.number(x)).append(' ').append(Svg.number(y));
            path.append("h").append(Svg.number(wide));
        }
        svg.add("<path class=\"hatch\" d=\"%s\"/>", path);
    }

    private void slants(double x, double wide, double step) {
        StringBuilder path = new StringBuilder();
        for (double at = -HIGH; at < wide; at += step) {
            double from = Math.max(0, at);
            double to = Math.min(wide, at + HIGH);
            if (to > from) {
                path.append("M").append(Svg.number(x + from)).append(' ');
                path.append(Svg.number(TOP + HIGH - (from - at)));
                path.append("L").append(Svg.number(x + to)).append(' ');
                path.append(Svg.number(TOP + HIGH - (to - at)));
            }
        }
        svg.add("<path class=\"hatch\" d=\"%s\"/>", path);
    }

    private void side(double x, String anchor, String name) {
        svg.text(x, TOP + HIGH / 2, anchor, "told", name);
    }

    /** The key: each layer with its thickness; returns where it ends. */
    private double told(List<FaceSheet.Part> parts, double[] wide) {
        double y = TOP + HIGH + 20;
        for (int i = 0; i < wide.length; i++) {
            FaceSheet.Part part = parts.get(i);
            String text =
                    (i + 1)
                            + "  "
                            + millimetres(part.layer())
                            + " "
                            + part.layer().material()
                            + ", "
                            + words.text("face." + Stuff.of(part.layer()).word())
                            + (widened(part, parts) ? " " + words.text("face.widened") : "");
            svg.text(8, y, "start", "told", text);
            y += 17;
        }
        return y;
    }
}
