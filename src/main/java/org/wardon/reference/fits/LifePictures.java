package org.wardon.reference.fits;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.life.Ageing;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.keeping.life.OwnSlope;
import org.wardon.keeping.pooling.LifePoint;
import org.wardon.produce.rows.LifeCurveRow;

/**
 * A picture a crop: life over temperature on a logarithmic scale, the range from the short to the
 * long case, and every row the fit used. Dots are lives, triangles bounds that point where the life
 * lies.
 */
final class LifePictures {
    private static final double COLDEST_C = -2;
    private static final double WARMEST_C = 40;
    private static final double LEAST_DAYS = 0.5;
    private static final double MOST_DAYS = 500;
    private static final int WIDTH = 420;
    private static final int HEIGHT = 260;
    private static final int EDGE = 36;
    private static final int DRAWS = 64;

    private final LifeRows used;
    private final LifeFits fits;
    private final List<Draw> draws = Draws.seeded(1, DRAWS);

    LifePictures(LifeRows used, LifeFits fits) {
        this.used = used;
        this.fits = fits;
    }

    /** Contents by file name. */
    Map<String, String> files() {
        Map<String, String> files = new LinkedHashMap<>();
        for (Crop crop : used.crops()) {
            files.put(crop.id() + ".svg", picture(crop));
        }
        return files;
    }

    private String picture(Crop crop) {
        StringBuilder svg = new StringBuilder();
        svg.append(
                String.format(
                        Locale.ROOT,
                        "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 %d %d\""
                                + " font-family=\"sans-serif\" font-size=\"10\">%n",
                        WIDTH,
                        HEIGHT));
        svg.append(String.format("<title>%s: life in days over °C</title>%n", crop.id()));
        axes(svg);
        svg.append(String.format("<text x=\"%d\" y=\"14\">%s</text>%n", EDGE, crop.id()));
        LifeCurveRow row = fits.curve(crop, "");
        if (crop.commodity().isPresent()) {
            List<Ageing> all =
                    draws.stream()
                            .map(LifeCurve.of(crop.commodity().orElseThrow(), row)::at)
                            .toList();
            line(svg, t -> quantile(all, t, 0.1), "4 3");
            line(svg, t -> quantile(all, t, 0.5), "none");
            line(svg, t -> quantile(all, t, 0.9), "4 3");
        } else {
            double level = level(crop, row);
            line(svg, t -> Math.exp(level - OwnSlope.lnRate(t, row.slopeKJMol())), "none");
        }
        fits.of(crop).forEach(point -> mark(svg, point));
        return svg.append("</svg>\n").toString();
    }

    private double level(Crop crop, LifeCurveRow row) {
        return fits.of(crop).stream()
                .map(UsedRow::known)
                .mapToDouble(p -> p.lnDays() + OwnSlope.lnRate(p.temperatureC(), row.slopeKJMol()))
                .average()
                .orElse(Double.NaN);
    }

    private static double quantile(List<Ageing> all, double atC, double share) {
        double[] days = all.stream().mapToDouble(one -> one.lifeDays(atC)).toArray();
        Arrays.sort(days);
        return days[(int) Math.round(share * (days.length - 1))];
    }

    private static void axes(StringBuilder svg) {
        for (int t = 0; t <= WARMEST_C; t += 10) {
            svg.append(rule(x(t), y(LEAST_DAYS), x(t), y(MOST_DAYS)));
            svg.append(label(x(t), HEIGHT - EDGE + 14, t + " °C"));
        }
        for (int days : new int[] {1, 3, 10, 30, 100, 300}) {
            svg.append(rule(x(COLDEST_C), y(days), x(WARMEST_C), y(days)));
            svg.append(label(4, y(days) + 3, days + " d"));
        }
    }

    private static String rule(double x1, double y1, double x2, double y2) {
        return String.format(
                Locale.ROOT,
                "<path d=\"M%.1f %.1fL%.1f %.1f\" stroke=\"#ccc\"/>%n",
                x1,
                y1,
                x2,
                y2);
    }

    private static String label(double x, double y, String text) {
        return String.format(Locale.ROOT, "<text x=\"%.1f\" y=\"%.1f\">%s</text>%n", x, y, text);
    }

    private static void line(StringBuilder svg, DoubleUnaryOperator days, String dashes) {
        StringBuilder path = new StringBuilder();
        for (double t = COLDEST_C; t <= WARMEST_C; t++) {
            path.append(
                    String.format(
                            Locale.ROOT,
                            "%s%.1f %.1f",
                            path.isEmpty() ? "M" : "L",
                            x(t),
                            y(days.applyAsDouble(t))));
        }
        svg.append(
                String.format(
                        "<path d=\"%s\" fill=\"none\" stroke=\"#246\" stroke-dasharray=\"%s\"/>%n",
                        path, dashes));
    }

    private static void mark(StringBuilder svg, UsedRow row) {
        LifePoint point = row.known();
        if (point.of().relative()) {
            return;
        }
        double x = x(point.temperatureC());
        double y = y(Math.exp(point.lnDays()));
        String form =
                switch (point.kind()) {
                    case EXACT ->
                            String.format(
                                    Locale.ROOT,
                                    "<circle cx=\"%.1f\" cy=\"%.1f\" r=\"3\"%s>",
                                    x,
                                    y,
                                    row.table().equals("commodities") ? " fill=\"#b50\"" : "");
                    case AT_LEAST -> triangle(x, y, -6);
                    case AT_MOST -> triangle(x, y, 6);
                };
        String end = form.startsWith("<circle") ? "</circle>" : "</path>";
        svg.append(form)
                .append(
                        String.format(
                                Locale.ROOT,
                                "<title>%s %s %.1f °C</title>",
                                point.of().source(),
                                row.variant(),
                                point.temperatureC()))
                .append(end)
                .append('\n');
    }

    private static String triangle(double x, double y, double tall) {
        return String.format(
                Locale.ROOT,
                "<path d=\"M%.1f %.1fL%.1f %.1fL%.1f %.1fZ\" fill=\"#778\">",
                x - 4,
                y,
                x + 4,
                y,
                x,
                y + tall);
    }

    private static double x(double temperatureC) {
        return EDGE + (temperatureC - COLDEST_C) / (WARMEST_C - COLDEST_C) * (WIDTH - 1.5 * EDGE);
    }

    private static double y(double days) {
        double held = Math.min(MOST_DAYS, Math.max(LEAST_DAYS, days));
        double share = Math.log(held / LEAST_DAYS) / Math.log(MOST_DAYS / LEAST_DAYS);
        return HEIGHT - EDGE - share * (HEIGHT - 1.5 * EDGE);
    }
}
