package org.wardon.web.chamber;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wardon.files.forecast.WhyAnswer.OfFace;
import org.wardon.files.forecast.WhyAnswer.Point;

/** Temperatures through a face from outside to inside, its layers numbered. */
final class ProfilePicture {
    private static final double WIDTH = 460;
    private static final double HEIGHT = 240;
    private static final double LEFT = 8;
    private static final double AIR = 56;
    private static final double TOP = 26;
    private static final double BOTTOM = 30;
    private static final double THINNEST = 16;

    private final OfFace face;
    private final List<Band> bands;
    private final double lowC;
    private final double highC;
    private final StringBuilder svg = new StringBuilder();

    /** A layer as drawn: thin ones wider than they are, so that they can be seen. */
    private record Band(String layer, double fromMm, double toMm, double left, double right) {}

    private ProfilePicture(OfFace face) {
        this.face = face;
        bands = bands(face.points());
        lowC = Math.min(least(face), Math.min(face.beyondC(), face.airC())) - 1;
        highC = Math.max(most(face), Math.max(face.beyondC(), face.airC())) + 1;
    }

    private static double least(OfFace face) {
        return face.points().stream().mapToDouble(Point::temperatureC).min().orElse(face.innerC());
    }

    private static double most(OfFace face) {
        return face.points().stream().mapToDouble(Point::temperatureC).max().orElse(face.innerC());
    }

    /** Returns the picture; its name for a screen reader is the text. */
    static String of(OfFace face, String told, List<String> ends) {
        return new ProfilePicture(face).drawn(told, ends);
    }

    /** Returns the layers from outside to inside. */
    static List<String> layers(OfFace face) {
        return bands(face.points()).stream().map(Band::layer).toList();
    }

    private static List<Band> bands(List<Point> points) {
        List<String> names = new ArrayList<>();
        List<Double> ends = new ArrayList<>();
        for (Point point : points) {
            if (names.isEmpty() || !names.get(names.size() - 1).equals(point.layer())) {
                names.add(point.layer());
                ends.add(point.depthMm());
            }
            ends.set(ends.size() - 1, point.depthMm());
        }
        return placed(names, ends);
    }

    private static List<Band> placed(List<String> names, List<Double> ends) {
        double free = WIDTH - LEFT - 2 * AIR - THINNEST * names.size();
        double thick = Math.max(1e-9, ends.isEmpty() ? 0 : ends.get(ends.size() - 1));
        List<Band> bands = new ArrayList<>();
        double left = LEFT + AIR;
        double from = 0;
        for (int i = 0; i < names.size(); i++) {
            double right = left + THINNEST + free * (ends.get(i) - from) / thick;
            bands.add(new Band(names.get(i), from, ends.get(i), left, right));
            left = right;
            from = ends.get(i);
        }
        return bands;
    }

    private double x(double depthMm, String layer) {
        for (Band band : bands) {
            boolean in = depthMm >= band.fromMm - 1e-9 && depthMm <= band.toMm + 1e-9;
            if (in && band.layer.equals(layer)) {
                double share = (depthMm - band.fromMm) / Math.max(1e-9, band.toMm - band.fromMm);
                return band.left + share * (band.right - band.left);
            }
        }
        return LEFT + AIR;
    }

    private double y(double temperatureC) {
        double share = (temperatureC - lowC) / (highC - lowC);
        return HEIGHT - BOTTOM - share * (HEIGHT - BOTTOM - TOP);
    }

    private String drawn(String told, List<String> ends) {
        add(
                "<svg class=\"profile\" viewBox=\"0 0 %.0f %.0f\" role=\"img\" aria-label=\"%s\">",
                WIDTH, HEIGHT, SafeText.of(told));
        for (int i = 0; i < bands.size(); i++) {
            Band band = bands.get(i);
            add(
                    "<rect class=\"layer%s\" x=\"%.1f\" y=\"%.0f\" width=\"%.1f\" height=\"%.0f\"/>",
                    i % 2, band.left, TOP, band.right - band.left, HEIGHT - TOP - BOTTOM);
            text((band.left + band.right) / 2, TOP - 8, "middle", String.valueOf(i + 1));
        }
        add("<path class=\"middle\" d=\"%s\"/>", path());
        double inside = WIDTH - 2;
        text(LEFT, HEIGHT - 10, "start", ends.get(0));
        text(inside, HEIGHT - 10, "end", ends.get(1));
        text(LEFT, y(face.beyondC()) - 6, "start", ends.get(2));
        text(inside, y(face.airC()) - 6, "end", ends.get(3));
        return svg.append("</svg>").toString();
    }

    private String path() {
        double inner = bands.isEmpty() ? LEFT + AIR : bands.get(bands.size() - 1).right;
        StringBuilder path = new StringBuilder();
        go(path, LEFT, face.beyondC());
        go(path, LEFT + AIR - 14, face.beyondC());
        go(path, LEFT + AIR, face.outerC());
        face.points().forEach(p -> go(path, x(p.depthMm(), p.layer()), p.temperatureC()));
        go(path, inner, face.innerC());
        go(path, inner + 14, face.airC());
        go(path, WIDTH, face.airC());
        return path.toString();
    }

    private void go(StringBuilder path, double x, double temperatureC) {
        path.append(path.isEmpty() ? "M" : "L")
                .append(String.format(Locale.ROOT, "%.1f %.1f", x, y(temperatureC)));
    }

    private void text(double x, double y, String anchor, String text) {
        add(
                "<text x=\"%.1f\" y=\"%.1f\" text-anchor=\"%s\">%s</text>",
                x, y, anchor, SafeText.of(text));
    }

    private void add(String form, Object... values) {
        svg.append(String.format(Locale.ROOT, form, values));
    }
}
