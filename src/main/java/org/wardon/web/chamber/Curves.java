package org.wardon.web.chamber;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.ChamberAir;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.plan.StorePlan;
import org.wardon.web.pages.ChartData;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Hourly series as data of charts and as tables by day. */
final class Curves {
    private static final double W_PER_KW = 1_000;

    private final StorePlan plan;
    private final Figures figures;
    private final PageWords words;

    /** How the hours of a day become one figure. */
    enum OfDay {
        LEAST,
        MEAN,
        MOST
    }

    /** A column as a line: its tone tells dashes too. */
    record Line(String column, String word, String tone, OfDay ofDay) {}

    /** A chart of some columns in one unit. */
    record Curve(String key, String unit, List<Line> lines) {}

    private static Line line(String column, String word, String tone) {
        return new Line(column, word, tone, OfDay.MEAN);
    }

    private static final Curve AIR =
            new Curve(
                    "air",
                    "C",
                    List.of(
                            line("airC", "mean", "main"),
                            new Line("airLowestC", "lowest", "fourth", OfDay.LEAST),
                            new Line("airHighestC", "highest", "third", OfDay.MOST),
                            line("outdoorC", "outdoors", "second")));

    /** The charts of a chamber, in their order. */
    static final List<Curve> OF_CHAMBER =
            List.of(
                    AIR,
                    new Curve("humidity", "pct", List.of(line("humidityPct", "humidity", "main"))),
                    new Curve("co2", "ppm", List.of(line("co2Ppm", "co2", "main"))),
                    new Curve("ethylene", "ppm", List.of(line("ethylenePpm", "ethylene", "main"))),
                    new Curve(
                            "cooling",
                            "kW",
                            List.of(
                                    line("coolingW", "cooling", "main"),
                                    line("powerW", "power", "second"))));

    /** The chart of a lot. */
    static final Curve OF_LOT =
            new Curve(
                    "lot",
                    "C",
                    List.of(
                            new Line("coreC", "core", "main", OfDay.MOST),
                            new Line("surfaceC", "surface", "second", OfDay.MEAN)));

    Curves(StorePlan plan, Figures figures, PageWords words) {
        this.plan = plan;
        this.figures = figures;
        this.words = words;
    }

    /** The curve of a chamber with this key. */
    static Optional<Curve> find(String key) {
        return OF_CHAMBER.stream().filter(curve -> curve.key().equals(key)).findFirst();
    }

    /** Data of a chart. */
    ChartData data(Curve curve, HourlySeries series, List<ChartData.Level> levels) {
        List<ChartData.Line> lines = new ArrayList<>();
        for (Line line : curve.lines()) {
            series.column(line.column())
                    .ifPresent(
                            values ->
                                    lines.add(
                                            new ChartData.Line(
                                                    line.column(),
                                                    name(line),
                                                    line.tone(),
                                                    rounded(values))));
        }
        return new ChartData(siUnit(curve.unit()), times(series), lines, levels);
    }

    /** A setting that changes is a line of steps, each row that of the hour before. */
    ChartData stepped(ChartData data, ChamberAir told) {
        if (!told.changes()) {
            return data;
        }
        List<ChartData.Line> lines = new ArrayList<>(data.lines());
        List<Double> steps = new ArrayList<>();
        for (int i = 0; i < data.time().size(); i++) {
            steps.add(told.settingC(Math.min(i, told.size() - 1)));
        }
        lines.add(new ChartData.Line("settingC", words.say("curve.setting"), "fourth", steps));
        return new ChartData(data.unit(), data.time(), lines, data.levels());
    }

    /** Air with a change over the air as planned. */
    ChartData compared(HourlySeries now, HourlySeries before, double settingC) {
        return new ChartData(
                siUnit("C"),
                times(now),
                List.of(
                        new ChartData.Line(
                                "airPlannedC",
                                words.say("what.planned"),
                                "second",
                                rounded(before.column("airC").orElse(List.of()))),
                        new ChartData.Line(
                                "airC",
                                words.say("what.changed"),
                                "main",
                                rounded(now.column("airC").orElse(List.of())))),
                List.of(level("curve.setting", settingC)));
    }

    /** A level of temperature. */
    ChartData.Level level(String key, double temperatureC) {
        return new ChartData.Level(
                key.substring(key.indexOf('.') + 1), words.say(key), temperatureC);
    }

    private List<LocalDateTime> times(HourlySeries series) {
        return series.timeS().stream().map(s -> plan.timeline().localAt(s)).toList();
    }

    /** Four decimals, as far as they count; nothing where there is no number. */
    static List<@Nullable Double> rounded(List<Double> values) {
        List<@Nullable Double> rounded = new ArrayList<>();
        for (double value : values) {
            rounded.add(Double.isFinite(value) ? (Double) (Math.round(1e4 * value) / 1e4) : null);
        }
        return Collections.unmodifiableList(rounded);
    }

    private static String siUnit(String unit) {
        return switch (unit) {
            case "C" -> "°C";
            case "kW" -> "W";
            case "pct" -> "%";
            default -> unit;
        };
    }

    /** A value as the person likes it. */
    double shown(double value, String unit) {
        return switch (unit) {
            case "C" -> figures.shownTemperature(value);
            case "kW" -> value / W_PER_KW;
            default -> value;
        };
    }

    /** The unit the person likes. */
    String unit(String unit) {
        return switch (unit) {
            case "C" -> figures.temperatureUnit();
            case "pct" -> "%";
            default -> unit;
        };
    }

    private String name(Line line) {
        return words.say("curve." + line.word());
    }

    /** The table behind a chart, a row a day. */
    TableView byDay(Curve curve, HourlySeries series, String caption) {
        List<Line> there =
                curve.lines().stream()
                        .filter(line -> series.column(line.column()).isPresent())
                        .toList();
        List<String> head = new ArrayList<>(List.of(words.say("chart.day")));
        there.forEach(line -> head.add(name(line) + ", " + unit(curve.unit())));
        List<List<String>> rows = new ArrayList<>();
        days(series)
                .forEach(
                        (day, hours) -> {
                            List<String> row = new ArrayList<>(List.of(figures.day(day)));
                            there.forEach(line -> row.add(cell(curve, line, series, hours)));
                            rows.add(row);
                        });
        return new TableView(caption, head, rows);
    }

    private String cell(Curve curve, Line line, HourlySeries series, List<Integer> hours) {
        List<Double> values = series.column(line.column()).orElseThrow();
        var day = hours.stream().mapToDouble(values::get).filter(Double::isFinite);
        var one =
                switch (line.ofDay()) {
                    case LEAST -> day.min();
                    case MOST -> day.max();
                    case MEAN -> day.average();
                };
        return one.isPresent() ? number(shown(one.getAsDouble(), curve.unit())) : "–";
    }

    /** A number with as many digits as it deserves. */
    String number(double value) {
        double size = Math.abs(value);
        String form = size >= 100 ? "%,.0f" : size >= 10 || size == 0 ? "%.1f" : "%.2f";
        return figures.text(String.format(Locale.ROOT, form, value).replace(",", "\u202f"));
    }

    /** Rows by the day their hour ends in: midnight closes the day before. */
    Map<LocalDate, List<Integer>> days(HourlySeries series) {
        Map<LocalDate, List<Integer>> days = new LinkedHashMap<>();
        for (int i = 0; i < series.timeS().size(); i++) {
            LocalDate day =
                    plan.timeline().localAt(series.timeS().get(i)).minusSeconds(1).toLocalDate();
            days.computeIfAbsent(day, any -> new ArrayList<>()).add(i);
        }
        return days;
    }

    /** A day a picture names, and where it begins as a share of the rows. */
    record DayMark(double share, String name) {}

    /** The days a picture names, five at most. */
    List<DayMark> marks(HourlySeries series) {
        Map<LocalDate, List<Integer>> days = days(series);
        int every = Math.max(1, (days.size() + 4) / 5);
        List<DayMark> marks = new ArrayList<>();
        int n = 0;
        for (Map.Entry<LocalDate, List<Integer>> day : days.entrySet()) {
            if (n++ % every == 0) {
                double share = 1.0 * day.getValue().get(0) / series.timeS().size();
                marks.add(new DayMark(share, shortDay(day.getKey())));
            }
        }
        return marks;
    }

    /** A day in few letters. */
    String shortDay(LocalDate day) {
        return figures.shortDay(day);
    }
}
