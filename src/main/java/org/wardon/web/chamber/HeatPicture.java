package org.wardon.web.chamber;

import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import org.wardon.files.forecast.HourlySeries;

/**
 * The heat budget over time: what brings heat in stands above the line, what takes it up below it,
 * one band on the other. Each band has a pattern, so that no colour is needed to tell them apart.
 */
final class HeatPicture {
    /** The figure of the page is so wide; letters keep a readable size on a phone. */
    private static final double WIDTH = 460;

    private static final double HEIGHT = 260;
    private static final double LEFT = 44;
    private static final double BOTTOM = 22;
    private static final double TOP = 10;
    private static final int MOST_COLUMNS = 96;
    private static final double W_PER_KW = 1_000;

    private final HourlySeries heat;
    private final int hours;
    private final int columns;
    private final Map<HeatTerms, double[]> kW = new EnumMap<>(HeatTerms.class);
    private double highestKW = 0.1;
    private double lowestKW;
    private final StringBuilder svg = new StringBuilder();

    private HeatPicture(HourlySeries heat) {
        this.heat = heat;
        int n = heat.timeS().size();
        hours = Math.max(1, (n + MOST_COLUMNS - 1) / MOST_COLUMNS);
        columns = (n + hours - 1) / hours;
        for (HeatTerms term : HeatTerms.values()) {
            kW.put(term, new double[columns]);
        }
        for (int c = 0; c < columns; c++) {
            fill(c, Math.min(n, (c + 1) * hours));
        }
    }

    private void fill(int column, int until) {
        double up = 0;
        double down = 0;
        for (HeatTerms term : HeatTerms.values()) {
            double value = term.meanW(heat, column * hours, until) / W_PER_KW;
            of(term)[column] = value;
            up += Math.max(0, value);
            down += Math.min(0, value);
        }
        highestKW = Math.max(highestKW, up);
        lowestKW = Math.min(lowestKW, down);
    }

    /** Returns the picture; its name for a screen reader is the text. */
    static String of(HourlySeries heat, String told, Curves curves) {
        return new HeatPicture(heat).drawn(told, curves);
    }

    /** Returns the patterns all pictures and swatches of a page refer to. */
    static String patterns() {
        StringBuilder defs = new StringBuilder("<defs>");
        for (HeatTerms term : HeatTerms.values()) {
            String id = term.id();
            defs.append(
                    "<pattern id=\"%s\" width=\"6\" height=\"6\" patternUnits=\"userSpaceOnUse\"><rect width=\"6\" height=\"6\" class=\"%s\"/><path class=\"hatched\" d=\"%s\"/></pattern>"
                            .formatted(id, id, term.hatching()));
        }
        return defs.append("</defs>").toString();
    }

    private double[] of(HeatTerms term) {
        return kW.getOrDefault(term, new double[columns]);
    }

    private String drawn(String told, Curves curves) {
        svg.append(
                "<svg class=\"heat\" viewBox=\"0 0 %.0f %.0f\" role=\"img\" aria-label=\"%s\">"
                        .formatted(WIDTH, HEIGHT, SafeText.of(told)));
        svg.append(patterns());
        axis(curves);
        double[] up = new double[columns];
        double[] down = new double[columns];
        for (HeatTerms term : HeatTerms.values()) {
            band(term, up, down);
        }
        svg.append(line(LEFT, y(0), WIDTH, y(0), "zero"));
        return svg.append("</svg>").toString();
    }

    private void axis(Curves curves) {
        double step = step((highestKW - lowestKW) / 4);
        for (double at = Math.ceil(lowestKW / step) * step; at <= highestKW; at += step) {
            svg.append(line(LEFT, y(at), WIDTH, y(at), "grid"));
            svg.append(
                    "<text x=\"%.0f\" y=\"%.1f\" text-anchor=\"end\">%s</text>"
                            .formatted(
                                    LEFT - 5,
                                    y(at) + 4,
                                    Math.abs(at) < 1e-9 ? "0 kW" : curves.number(at)));
        }
        var days = curves.days(heat);
        int every = Math.max(1, (days.size() + 4) / 5);
        int n = 0;
        for (var day : days.entrySet()) {
            if (n++ % every == 0) {
                double x = x(1.0 * day.getValue().get(0) / hours);
                svg.append(line(x, TOP, x, HEIGHT - BOTTOM, "grid"));
                svg.append(
                        "<text x=\"%.1f\" y=\"%.0f\">%s</text>"
                                .formatted(x + 2, HEIGHT - 6, curves.shortDay(day.getKey())));
            }
        }
    }

    /** A round step near this. */
    static double step(double about) {
        double ten = Math.pow(10, Math.floor(Math.log10(about)));
        double of = about / ten;
        return ten * (of > 5 ? 10 : of > 2 ? 5 : of > 1 ? 2 : 1);
    }

    private void band(HeatTerms term, double[] up, double[] down) {
        StringBuilder upper = new StringBuilder();
        StringBuilder lower = new StringBuilder();
        for (int c = 0; c < columns; c++) {
            double value = of(term)[c];
            double[] stack = value >= 0 ? up : down;
            double from = stack[c];
            stack[c] += value;
            String left = coordinate(x(c));
            String right = coordinate(x(c + 1.0));
            upper.append(upper.isEmpty() ? "M" : "L");
            upper.append(left + " " + coordinate(y(stack[c])) + "H" + right);
            lower.insert(0, "L" + right + " " + coordinate(y(from)) + "H" + left);
        }
        svg.append(
                "<path fill=\"url(#%s)\" class=\"band\" d=\"%s%sZ\"/>"
                        .formatted(term.id(), upper, lower));
    }

    private static String line(double x1, double y1, double x2, double y2, String kind) {
        return String.format(
                Locale.ROOT,
                "<path class=\"%s\" d=\"M%.1f %.1fL%.1f %.1f\"/>",
                kind,
                x1,
                y1,
                x2,
                y2);
    }

    private static String coordinate(double value) {
        return String.format(Locale.ROOT, "%.1f", value).replace(".0", "");
    }

    private double x(double column) {
        return LEFT + (WIDTH - LEFT) * column / columns;
    }

    private double y(double at) {
        double share = (at - lowestKW) / (highestKW - lowestKW);
        return HEIGHT - BOTTOM - share * (HEIGHT - BOTTOM - TOP);
    }
}
