package org.wardon.web.chamber;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.wardon.advice.forecast.CarbonDioxideLimits;
import org.wardon.advice.forecast.ChamberAir;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.web.chamber.ChamberSheet.Drawing;
import org.wardon.web.chamber.ChamberSheet.FaceSheet;
import org.wardon.web.chamber.ChamberSheet.Mark;
import org.wardon.web.pages.ChartData;
import org.wardon.web.pages.ChartView;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Turns a chamber of a forecast into charts, drawings and tables. */
final class ChamberViews {
    private static final double W_PER_KW = 1_000;
    private static final double PPM_SHOWN = 0.5;

    /** So many lots have a chart each. */
    private static final int MOST_LOTS = 12;

    private final StoreAdvice advice;
    private final StorePlan plan;
    private final String chamber;
    private final PageWords say;
    private final Figures figures;
    private final Curves curves;
    private final HourlySeries air;
    private final List<String> lotIds;

    ChamberViews(StoreAdvice advice, String chamber, PageWords say, Figures figures) {
        this.advice = advice;
        this.plan = advice.plan();
        this.chamber = chamber;
        this.say = say;
        this.figures = figures;
        this.curves = new Curves(plan, figures, say);
        this.air = advice.view(chamber).air();
        this.lotIds = advice.view(chamber).lotIds();
    }

    Curves curves() {
        return curves;
    }

    List<ChartView> charts(String path) {
        return Curves.OF_CHAMBER.stream()
                .map(
                        curve -> {
                            String title = say.say("curve.title-" + curve.key());
                            return new ChartView(
                                    title,
                                    path + "/curves/" + curve.key(),
                                    "",
                                    curves.byDay(curve, air, say.say("curve.by-day", title)),
                                    drawn(curve, title));
                        })
                .toList();
    }

    Optional<ChartData> data(String key) {
        return Curves.find(key).map(this::data);
    }

    private ChartData data(Curves.Curve curve) {
        ChartData data = curves.data(curve, air, levels(curve.key()));
        return curve.key().equals("air") ? curves.stepped(data, advice.air(chamber)) : data;
    }

    private String drawn(Curves.Curve curve, String title) {
        return CurvePicture.of(curve, data(curve), curves.marks(air), title, curves);
    }

    private List<ChartData.Level> levels(String key) {
        ChamberAir told = advice.air(chamber);
        List<ChartData.Level> levels = new ArrayList<>();
        switch (key) {
            case "air" -> {
                if (!told.changes()) {
                    levels.add(curves.level("curve.setting", told.settingC(0)));
                    levels.add(curves.level("curve.warmest", told.warmestC(0)));
                    if (Double.isFinite(told.coldestC(0))) {
                        levels.add(curves.level("curve.coldest", told.coldestC(0)));
                    }
                }
            }
            case "co2" -> co2(levels);
            default -> {}
        }
        return levels;
    }

    /** The lowest limit always, the others where the air comes near them. */
    private void co2(List<ChartData.Level> levels) {
        double most =
                air.column("co2Ppm").orElse(List.of()).stream()
                        .mapToDouble(Double::doubleValue)
                        .filter(Double::isFinite)
                        .max()
                        .orElse(0);
        for (CarbonDioxideLimits.Limit limit : CarbonDioxideLimits.ALL) {
            if (levels.isEmpty() || most > PPM_SHOWN * limit.ppm()) {
                levels.add(new ChartData.Level(limit.id(), limited(limit), limit.ppm()));
            }
        }
    }

    private String limited(CarbonDioxideLimits.Limit limit) {
        return say.say("limit." + limit.id());
    }

    List<String> limits() {
        return CarbonDioxideLimits.ALL.stream()
                .map(
                        limit ->
                                say.say(
                                        "curve.limit",
                                        limited(limit),
                                        figures.figure(limit.ppm(), "ppm"),
                                        limit.sourceId()))
                .toList();
    }

    /** A chart a lot; of very many that of the lot asked for, else of the first. */
    List<ChartView> lots(String path, String asked) {
        List<HourlySeries> shown =
                isCrowded()
                        ? advice.view(chamber).lot(chosen(asked)).stream().toList()
                        : advice.view(chamber).lots();
        return shown.stream().map(lot -> ofLot(path, lot)).toList();
    }

    private boolean isCrowded() {
        return lotIds.size() > MOST_LOTS;
    }

    private String chosen(String asked) {
        return lotIds.contains(asked) || lotIds.isEmpty() ? asked : lotIds.get(0);
    }

    /** Lots to choose from; none where each has its chart. */
    List<ChamberSheet.Pick> picks(String asked) {
        String one = chosen(asked);
        return isCrowded()
                ? lotIds.stream().map(id -> new ChamberSheet.Pick(id, id, id.equals(one))).toList()
                : List.of();
    }

    private ChartView ofLot(String path, HourlySeries lot) {
        return new ChartView(
                say.say("curve.lot", lot.of()),
                path + "/lots/" + lot.of() + "/curve",
                "",
                curves.byDay(Curves.OF_LOT, lot, say.say("curve.lot-by-day", lot.of())),
                "");
    }

    Optional<ChartData> lot(String id) {
        return advice.view(chamber).lot(id).map(lot -> curves.data(Curves.OF_LOT, lot, List.of()));
    }

    Drawing heat(HourlySeries heat) {
        String told = say.say("heat.told", chamber);
        return new Drawing(
                HeatPicture.of(heat, told, curves),
                told,
                Arrays.stream(HeatTerms.values())
                        .map(term -> new Mark(term.id(), say.say(term.key())))
                        .toList(),
                heatByDay(heat));
    }

    private TableView heatByDay(HourlySeries heat) {
        List<String> head = new ArrayList<>(List.of(say.say("chart.day")));
        Arrays.stream(HeatTerms.values()).forEach(term -> head.add(say.say(term.key())));
        head.add(say.say("heat.removed"));
        List<List<String>> rows = new ArrayList<>();
        curves.days(heat)
                .forEach(
                        (day, hours) -> {
                            int from = hours.get(0);
                            int to = hours.get(hours.size() - 1) + 1;
                            List<String> row = new ArrayList<>(List.of(figures.day(day)));
                            for (HeatTerms term : HeatTerms.values()) {
                                row.add(kW(term.meanW(heat, from, to)));
                            }
                            row.add(
                                    kW(
                                            heat
                                                    .column("removed")
                                                    .orElseThrow()
                                                    .subList(from, to)
                                                    .stream()
                                                    .mapToDouble(Double::doubleValue)
                                                    .average()
                                                    .orElse(0)));
                            rows.add(row);
                        });
        return new TableView(say.say("heat.by-day"), head, rows);
    }

    private String kW(double watts) {
        return curves.number(watts / W_PER_KW);
    }

    /** The face and hour asked for, else the first face at the warmest hour outdoors. */
    FaceSheet face(String askedFace, String askedAt) {
        List<String> faces = advice.view(chamber).faces();
        String face = faces.contains(askedFace) ? askedFace : faces.get(0);
        LocalDateTime first = plan.timeline().localAt(air.timeS().get(0));
        LocalDateTime last = plan.timeline().localAt(air.timeS().get(air.timeS().size() - 1));
        String at = askedAt.isBlank() ? String.valueOf(warmest()) : askedAt;
        Optional<LocalDateTime> hour = hour(at);
        Optional<Drawing> drawing = hour.flatMap(end -> drawing(face, end));
        FieldView field = FieldView.time("at", say.say("profile.at"), at);
        return new FaceSheet(
                faces.stream()
                        .map(
                                name ->
                                        new ChamberSheet.Pick(
                                                name,
                                                say.say("profile." + name),
                                                name.equals(face)))
                        .toList(),
                drawing.isPresent()
                        ? field
                        : field.withFault(
                                say.say(
                                        "profile.no-hour",
                                        figures.time(first),
                                        figures.time(last))),
                first.toString(),
                last.toString(),
                hour.map(end -> end.minusHours(1))
                        .filter(b -> !b.isBefore(first))
                        .map(String::valueOf)
                        .orElse(""),
                hour.map(end -> end.plusHours(1))
                        .filter(a -> !a.isAfter(last))
                        .map(String::valueOf)
                        .orElse(""),
                drawing);
    }

    private static Optional<LocalDateTime> hour(String typed) {
        try {
            return Optional.of(LocalDateTime.parse(typed).truncatedTo(ChronoUnit.HOURS));
        } catch (java.time.format.DateTimeParseException e) {
            return Optional.empty();
        }
    }

    private LocalDateTime warmest() {
        List<Double> outdoors = air.column("outdoorC").orElseThrow();
        int best = 0;
        for (int i = 0; i < outdoors.size(); i++) {
            boolean whole = plan.timeline().localAt(air.timeS().get(i)).getMinute() == 0;
            if (whole && outdoors.get(i) > outdoors.get(best)) {
                best = i;
            }
        }
        return plan.timeline().localAt(air.timeS().get(best));
    }

    private Optional<Drawing> drawing(String face, LocalDateTime end) {
        try {
            WhyAnswer why = advice.view(chamber).hour(end, Optional.of(face), Optional.empty());
            return why.face().map(told -> drawing(told, end));
        } catch (BadInput noSuchHour) {
            return Optional.empty();
        }
    }

    private Drawing drawing(WhyAnswer.OfFace face, LocalDateTime end) {
        String name = say.say("profile." + face.face());
        String told =
                say.say(
                        "profile.told",
                        name,
                        figures.time(end),
                        figures.temperature(face.outerC()),
                        figures.temperature(face.innerC()),
                        figures.figure(Math.abs(face.toAirW()), "W"),
                        say.say(face.toAirW() < 0 ? "profile.out" : "profile.in"));
        List<String> ends =
                List.of(
                        say.say("profile.beyond"),
                        say.say("profile.chamber"),
                        figures.temperature(face.beyondC()),
                        figures.temperature(face.airC()));
        List<String> layers = ProfilePicture.layers(face);
        List<Mark> marks = new ArrayList<>();
        for (int i = 0; i < layers.size(); i++) {
            marks.add(new Mark(String.valueOf(i + 1), layers.get(i)));
        }
        return new Drawing(ProfilePicture.of(face, told, ends), told, marks, through(face));
    }

    private TableView through(WhyAnswer.OfFace face) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of(say.say("profile.beyond"), "", figures.temperature(face.beyondC())));
        face.points()
                .forEach(
                        point ->
                                rows.add(
                                        List.of(
                                                point.layer(),
                                                curves.number(point.depthMm()),
                                                figures.temperature(point.temperatureC()))));
        rows.add(List.of(say.say("profile.inner"), "", figures.temperature(face.innerC())));
        rows.add(List.of(say.say("profile.chamber"), "", figures.temperature(face.airC())));
        return new TableView(
                say.say("profile.table"),
                List.of(
                        say.say("profile.place"),
                        say.say("profile.depth"),
                        say.say("profile.temperature")),
                rows);
    }
}
