package org.wardon.advice.picture;

import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/**
 * The field of a chart: scales, grid, and lines drawn on it. Colours come from the page's style.
 */
final class Plot {
    /** Width of a chart, so that it is legible on a phone. */
    static final double WIDTH = 360;

    private static final double LEFT = 46;
    private static final double RIGHT = 10;
    private static final double TOP = 20;
    private static final double BELOW = 44;

    private final double high;
    private final double fromX;
    private final double toX;
    private final double fromY;
    private final double toY;
    private final boolean log;
    private final Svg svg = new Svg();

    /** A chart with a logarithmic or an even scale upright. */
    Plot(double high, double fromX, double toX, double fromY, double toY, boolean log) {
        this.high = high;
        this.fromX = fromX;
        this.toX = toX;
        this.fromY = fromY;
        this.toY = toY;
        this.log = log;
    }

    double x(double value) {
        double share = (Math.min(toX, Math.max(fromX, value)) - fromX) / (toX - fromX);
        return LEFT + share * (WIDTH - LEFT - RIGHT);
    }

    double y(double value) {
        double held = Math.min(toY, Math.max(fromY, value));
        double share =
                log
                        ? Math.log(held / fromY) / Math.log(toY / fromY)
                        : (held - fromY) / (toY - fromY);
        return high - BELOW - share * (high - TOP - BELOW);
    }

    double top() {
        return TOP;
    }

    double bottom() {
        return high - BELOW;
    }

    Svg svg() {
        return svg;
    }

    void grid(
            List<Double> xs,
            DoubleFunction<String> xText,
            List<Double> ys,
            DoubleFunction<String> yText) {
        for (double value : ys) {
            svg.add("<path class=\"grid\" d=\"M%s %sH%s\"/>", LEFT, y(value), WIDTH - RIGHT);
            svg.text(LEFT - 6, y(value) + 4, "end", "scale", yText.apply(value));
        }
        for (double value : xs) {
            svg.add("<path class=\"grid\" d=\"M%s %sV%s\"/>", x(value), TOP, bottom());
            svg.text(x(value), bottom() + 16, "middle", "scale", xText.apply(value));
        }
        svg.add("<path class=\"axis\" d=\"M%s %sV%sH%s\"/>", LEFT, TOP, bottom(), WIDTH - RIGHT);
    }

    void names(String across, String upright) {
        svg.text((LEFT + WIDTH - RIGHT) / 2, high - 10, "middle", "scale", across);
        svg.text(4, 11, "start", "scale", upright);
    }

    /** A strip between two temperatures, hatched so that it is seen without colour. */
    void zone(double from, double to, String kind) {
        double left = x(from);
        double wide = x(to) - left;
        if (wide <= 0) {
            return;
        }
        svg.add(
                "<rect class=\"%s\" x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\"/>",
                kind, left, TOP, wide, bottom() - TOP);
        for (double at = left - (bottom() - TOP); at < left + wide; at += 9) {
            hatch(at, left, left + wide);
        }
    }

    /** What a strip is, written upright along its warm edge. */
    void told(double edge, String text) {
        svg.add(
                "<text class=\"upright\" text-anchor=\"end\" transform=\"translate(%s %s)"
                        + " rotate(-90)\">%s</text>",
                x(edge) - 5, TOP + 4, Svg.safe(text));
    }

    private void hatch(double at, double left, double right) {
        double tall = bottom() - TOP;
        double from = Math.max(at, left);
        double to = Math.min(at + tall, right);
        if (to > from) {
            svg.add(
                    "<path class=\"hatch\" d=\"M%s %sL%s %s\"/>",
                    from, bottom() - (from - at), to, bottom() - (to - at));
        }
    }

    <T> void line(List<T> points, ToDoubleFunction<T> x, ToDoubleFunction<T> y, String kind) {
        svg.add("<path class=\"%s\" d=\"%s\"/>", kind, path(points, x, y, 'M'));
    }

    <T> void band(
            List<T> points,
            ToDoubleFunction<T> x,
            ToDoubleFunction<T> low,
            ToDoubleFunction<T> up) {
        List<T> back = new java.util.ArrayList<>(points);
        java.util.Collections.reverse(back);
        svg.add(
                "<path class=\"range\" d=\"%s%sZ\"/>",
                path(points, x, up, 'M'), path(back, x, low, 'L'));
    }

    private <T> String path(
            List<T> points, ToDoubleFunction<T> x, ToDoubleFunction<T> y, char first) {
        StringBuilder path = new StringBuilder();
        for (T point : points) {
            path.append(path.isEmpty() ? first : 'L')
                    .append(Svg.number(x(x.applyAsDouble(point))))
                    .append(' ')
                    .append(Svg.number(y(y.applyAsDouble(point))));
        }
        return path.toString();
    }

    /** A point with what it says; its form tells what it is. */
    void mark(Mark form, double x, double y, String kind, String text) {
        svg.add(
                "<path class=\"mark %s\" d=\"%s\"><title>%s</title></path>",
                kind, form.path(x(x), y(y)), Svg.safe(text));
    }

    /** From the low to the high end of a printed range. */
    void stem(double x, double low, double up) {
        svg.add("<path class=\"stem\" d=\"M%s %sV%s\"/>", x(x), y(low), y(up));
    }

    String text(String label) {
        return "<svg class=\"plot\" viewBox=\"0 0 "
                + Svg.number(WIDTH)
                + " "
                + Svg.number(high)
                + "\" role=\"img\" aria-label=\""
                + Svg.safe(label).replace("\"", "&quot;")
                + "\" focusable=\"false\">\n"
                + svg.lines()
                + "</svg>\n";
    }

    /** Forms of points. */
    enum Mark {
        /** A figure. */
        ROUND,
        /** At least so much. */
        UP,
        /** At most so much. */
        DOWN,
        /** One's own. */
        DIAMOND;

        private static final double R = 3.6;

        String path(double x, double y) {
            return switch (this) {
                case ROUND ->
                        form(
                                "M%s %sa%s %s 0 1 0 %s 0a%s %s 0 1 0 %s 0Z",
                                x - R, y, R, R, 2 * R, R, R, -2 * R);
                case UP -> form("M%s %sL%s %sL%s %sZ", x - R, y + 2, x + R, y + 2, x, y - 6);
                case DOWN -> form("M%s %sL%s %sL%s %sZ", x - R, y - 2, x + R, y - 2, x, y + 6);
                case DIAMOND ->
                        form("M%s %sL%s %sL%s %sL%s %sZ", x - 6, y, x, y - 6, x + 6, y, x, y + 6);
            };
        }

        private static String form(String pattern, double... values) {
            Object[] drawn = new Object[values.length];
            for (int i = 0; i < values.length; i++) {
                drawn[i] = Svg.number(values[i]);
            }
            return String.format(pattern, drawn);
        }
    }
}
