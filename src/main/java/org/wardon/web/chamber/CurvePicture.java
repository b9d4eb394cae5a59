package org.wardon.web.chamber;

import java.util.ArrayList;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.wardon.web.pages.ChartData;

/**
 * The curves of a chamber as a drawing that needs no script, for paper and for pages without one.
 * Lines are told apart by their dashes, as in the charts the script draws.
 */
final class CurvePicture {
    /** As wide as the picture of the heat budget. */
    private static final double WIDTH = 460;

    private static final double FIELD = 190;
    private static final double LEFT = 44;
    private static final double BELOW = 22;
    private static final double LEGEND_ROW = 18;
    private static final double SAMPLE = 26;
    private static final int MOST_POINTS = 240;

    private final Curves.Curve curve;
    private final ChartData data;
    private final Curves curves;
    private final List<Curves.DayMark> days;
    private final int hours;
    private final double low;
    private final double high;
    private final StringBuilder svg = new StringBuilder();

    private CurvePicture(
            Curves.Curve curve,
            ChartData data,
            List<Curves.DayMark> days,
            int hours,
            Curves curves) {
        this.curve = curve;
        this.data = data;
        this.days = days;
        this.hours = hours;
        this.curves = curves;
        DoubleSummaryStatistics all = new DoubleSummaryStatistics();
        data.lines().stream()
                .flatMap(line -> line.values().stream())
                .filter(Objects::nonNull)
                .forEach(value -> all.accept(shown(value)));
        data.levels().forEach(level -> all.accept(shown(level.value())));
        double least = all.getCount() == 0 ? 0 : all.getMin();
        double most = all.getCount() == 0 ? 1 : all.getMax();
        double room = most > least ? 0.04 * (most - least) : 1;
        low = least >= 0 ? Math.max(0, least - room) : least - room;
        high = most + room;
    }

    /**
     * Returns the picture of one curve.
     *
     * @param curve which
     * @param data its lines and levels, °C and SI
     * @param days the days it names
     * @param told what it shows, for a screen reader
     * @param curves writes numbers and units
     */
    static String of(
            Curves.Curve curve,
            ChartData data,
            List<Curves.DayMark> days,
            String told,
            Curves curves) {
        int hours = Math.max(1, (data.time().size() + MOST_POINTS - 1) / MOST_POINTS);
        return new CurvePicture(curve, data, days, hours, curves).drawn(told);
    }

    private double shown(double value) {
        return curves.shown(value, curve.unit());
    }

    private String drawn(String told) {
        List<String> names = new ArrayList<>();
        List<String> kinds = new ArrayList<>();
        grid();
        for (ChartData.Level level : data.levels()) {
            svg.append(path("level", across(level)));
            names.add(told(level));
            kinds.add("level");
        }
        for (ChartData.Line line : data.lines()) {
            svg.append(path(line.tone(), along(line)));
            names.add(line.name());
            kinds.add(line.tone());
        }
        double tall = legend(names, kinds);
        return "<svg class=\"heat curved\" viewBox=\"0 0 %.0f %.0f\" role=\"img\" aria-label=\"%s\">%s</svg>"
                .formatted(WIDTH, tall, SafeText.of(told), svg);
    }

    private String told(ChartData.Level level) {
        String value = curves.number(shown(level.value()));
        return level.name() + " " + value + " " + curves.unit(curve.unit());
    }

    private void grid() {
        double step = HeatPicture.step((high - low) / 4);
        for (double at = Math.ceil(low / step) * step; at <= high; at += step) {
            svg.append(path("grid", "M%s %sH%s".formatted(n(LEFT), n(y(at)), n(WIDTH))));
            svg.append(text(LEFT - 5, y(at) + 4, "end", curves.number(at)));
        }
        svg.append(text(LEFT + 4, 12, "start", curves.unit(curve.unit())));
        for (Curves.DayMark day : days) {
            double x = LEFT + (WIDTH - LEFT) * day.share();
            svg.append(path("grid", "M%s 0V%s".formatted(n(x), n(FIELD))));
            svg.append(text(x + 2, FIELD + 15, "start", day.name()));
        }
    }

    private String across(ChartData.Level level) {
        return "M%s %sH%s".formatted(n(LEFT), n(y(shown(level.value()))), n(WIDTH));
    }

    /** A point a stretch of hours; where there is no number the line is broken. */
    private String along(ChartData.Line line) {
        Curves.OfDay kind =
                curve.lines().stream()
                        .filter(one -> one.column().equals(line.id()))
                        .map(Curves.Line::ofDay)
                        .findFirst()
                        .orElse(Curves.OfDay.MEAN);
        StringBuilder path = new StringBuilder();
        boolean broken = true;
        int size = line.values().size();
        for (int from = 0; from < size; from += hours) {
            int to = Math.min(size, from + hours);
            Double value = of(kind, line.values().subList(from, to));
            if (value != null) {
                double x = LEFT + (WIDTH - LEFT) * (from + to) / 2 / size;
                path.append(broken ? 'M' : 'L').append(n(x)).append(' ');
                path.append(n(y(shown(value))));
            }
            broken = value == null;
        }
        return path.toString();
    }

    private static @Nullable Double of(Curves.OfDay kind, List<@Nullable Double> values) {
        DoubleSummaryStatistics there = new DoubleSummaryStatistics();
        values.stream().filter(Objects::nonNull).forEach(there::accept);
        if (there.getCount() == 0) {
            return null;
        }
        return switch (kind) {
            case LEAST -> there.getMin();
            case MEAN -> there.getAverage();
            case MOST -> there.getMax();
        };
    }

    private double legend(List<String> names, List<String> kinds) {
        double y = FIELD + BELOW;
        for (int i = 0; i < names.size(); i++) {
            double x = i % 2 == 0 ? LEFT : LEFT + (WIDTH - LEFT) / 2;
            y += i % 2 == 0 ? LEGEND_ROW : 0;
            svg.append(path(kinds.get(i), "M%s %sh%s".formatted(n(x), n(y - 4), n(SAMPLE))));
            svg.append(text(x + SAMPLE + 5, y, "start", names.get(i)));
        }
        return y + 6;
    }

    private double y(double value) {
        return FIELD - (value - low) / (high - low) * FIELD;
    }

    private static String path(String kind, String d) {
        return "<path class=\"" + kind + "\" d=\"" + d + "\"/>";
    }

    private static String text(double x, double y, String anchor, String text) {
        return "<text x=\"%s\" y=\"%s\" text-anchor=\"%s\">%s</text>"
                .formatted(n(x), n(y), anchor, SafeText.of(text));
    }

    private static String n(double value) {
        return String.format(Locale.ROOT, "%.1f", value).replace(".0", "");
    }
}
