package org.wardon.web.crops;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.crops.BreathLine;
import org.wardon.advice.crops.ColdZone;
import org.wardon.advice.crops.CropSheet;
import org.wardon.advice.crops.LifeLine;
import org.wardon.advice.crops.SheetFact;
import org.wardon.advice.picture.BreathPicture;
import org.wardon.advice.picture.LifePicture;
import org.wardon.advice.wording.FactWords;
import org.wardon.advice.wording.Words;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.LifeRow;
import org.wardon.produce.rows.RipeningRow;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Turns the sheet of a crop into what its page shows. */
final class CropViews {
    private static final String NOT_STATED = "not-stated";

    private final CropSheet sheet;
    private final PageWords page;
    private final Words words;
    private final Figures figures;
    private final FactWords facts;

    CropViews(CropSheet sheet, PageWords page, Words words, Figures figures) {
        this.sheet = sheet;
        this.page = page;
        this.words = words;
        this.figures = figures;
        facts = new FactWords(words.units());
    }

    /** The handbook's condition in a line. */
    String lead() {
        Commodity.Needs needs = sheet.commodity().needs();
        List<String> parts = new ArrayList<>();
        needs.temperatureC().ifPresent(f -> parts.add(page.say("crop.lead-kept", range(f, "C"))));
        needs.humidityPct().ifPresent(f -> parts.add(page.say("crop.lead-humid", range(f, "pct"))));
        needs.lifeDays().ifPresent(f -> parts.add(page.say("crop.lead-life", range(f, "day"))));
        needs.highestFreezingC()
                .ifPresent(f -> parts.add(page.say("crop.lead-freezes", range(f, "C"))));
        return String.join("; ", parts);
    }

    private String range(Fact fact, String unit) {
        String low = figures.figure(fact.lowest(), unit);
        String high = figures.figure(fact.highest(), unit);
        return low.equals(high) ? low : page.say("crop.range", low, high);
    }

    CropView.PictureView life() {
        LifeLine life = sheet.life();
        List<List<String>> rows = new ArrayList<>();
        for (LifeLine.At at : life.at()) {
            rows.add(
                    List.of(
                            figures.temperature(at.temperatureC()),
                            days(at.days().p10()),
                            days(at.days().p50()),
                            days(at.days().p90()),
                            words.text("limit." + at.limitedBy()),
                            safe(at.safeDays())));
        }
        return new CropView.PictureView(
                page.say("crop.life"),
                LifePicture.of(sheet, words, figures::text),
                page.say(
                        "crop.life-told",
                        figures.figure(life.humidityPct(), "pct"),
                        words.text("rests-on." + life.restsOn())),
                new TableView(
                        page.say("crop.life-table"),
                        List.of(
                                page.say("crop.at"),
                                page.say("crop.short"),
                                page.say("crop.likely"),
                                page.say("crop.long"),
                                page.say("crop.ended"),
                                page.say("crop.safe")),
                        rows));
    }

    private String days(double days) {
        return Words.isCapped(days)
                ? page.say("crop.more-than", figures.figure(730, "day"))
                : figures.figure(days, "day");
    }

    private String safe(OptionalDouble days) {
        return days.isPresent() ? figures.figure(days.getAsDouble(), "day") : "–";
    }

    TableView printed() {
        List<List<String>> rows = new ArrayList<>();
        for (LifeRow row : sheet.life().printed()) {
            rows.add(
                    List.of(
                            figures.temperature(row.temperatureC().orElseThrow()),
                            range(row.lifeDays(), "day"),
                            bound(row),
                            said(row.endedBy()),
                            said(row.criterion()),
                            said(row.variant()),
                            source(row.lifeDays())));
        }
        return new TableView(
                page.say("crop.printed"),
                List.of(
                        page.say("crop.at"),
                        page.say("crop.days"),
                        page.say("crop.bound"),
                        page.say("crop.ended-by"),
                        page.say("crop.criterion"),
                        page.say("crop.variant"),
                        page.say("crop.source")),
                rows);
    }

    private String bound(LifeRow row) {
        return switch (row.bound()) {
            case "at-least" -> page.say("crop.at-least");
            case "at-most" -> page.say("crop.at-most");
            default -> page.say("crop.exact");
        };
    }

    private static String said(String word) {
        return word.isBlank() || word.equals(NOT_STATED) ? "–" : word.replace('-', ' ');
    }

    private String source(Fact fact) {
        return fact.own() ? page.say("crop.own") : fact.sourceId() + ", " + fact.evidence().word();
    }

    Optional<TableView> cold() {
        if (sheet.cold().isEmpty()) {
            return Optional.empty();
        }
        List<List<String>> rows = new ArrayList<>();
        for (ColdZone zone : sheet.cold()) {
            rows.add(
                    List.of(
                            ripeness(zone.ripeness()),
                            figures.temperature(zone.safeFromC()),
                            zone.bandLowC().isPresent()
                                    ? page.say(
                                            "crop.range",
                                            figures.temperature(zone.bandLowC().getAsDouble()),
                                            figures.temperature(zone.safeFromC()))
                                    : "–",
                            zone.assumed() ? page.say("crop.assumed") : zone.sourceId()));
        }
        return Optional.of(
                new TableView(
                        page.say("crop.cold"),
                        List.of(
                                page.say("crop.ripeness"),
                                page.say("crop.safe-from"),
                                page.say("crop.band"),
                                page.say("crop.source")),
                        rows));
    }

    private String ripeness(Ripeness ripeness) {
        return page.say("ripeness." + ripeness.name().toLowerCase(Locale.ROOT));
    }

    CropView.PictureView breath() {
        List<List<String>> rows = new ArrayList<>();
        for (BreathLine.At at : sheet.breath().at()) {
            rows.add(
                    List.of(
                            figures.temperature(at.temperatureC()),
                            watts(at.low()),
                            watts(at.middle()),
                            watts(at.high())));
        }
        return new CropView.PictureView(
                page.say("crop.breath"),
                BreathPicture.of(sheet, words, figures::text),
                page.say("crop.breath-told"),
                new TableView(
                        page.say("crop.breath-table"),
                        List.of(
                                page.say("crop.at"),
                                page.say("crop.low"),
                                page.say("crop.middle"),
                                page.say("crop.high")),
                        rows));
    }

    private String watts(double wattsPerTonne) {
        String format = wattsPerTonne < 10 ? "%.1f W/t" : "%.0f W/t";
        return figures.text(String.format(Locale.ROOT, format, wattsPerTonne));
    }

    TableView rates() {
        List<List<String>> rows = new ArrayList<>();
        for (BreathLine.Printed printed : sheet.breath().printed()) {
            Fact rate = printed.row().wattsPerTonne();
            String low = watts(rate.lowest());
            String high = watts(rate.highest());
            rows.add(
                    List.of(
                            figures.temperature(printed.row().temperatureC()),
                            low.equals(high) ? low : page.say("crop.range", low, high),
                            said(printed.row().state()),
                            page.say(printed.taken() ? "crop.taken" : "crop.beside"),
                            source(rate)));
        }
        return new TableView(
                page.say("crop.rates"),
                List.of(
                        page.say("crop.at"),
                        page.say("crop.rate"),
                        page.say("crop.state"),
                        page.say("crop.standing"),
                        page.say("crop.source")),
                rows);
    }

    Optional<TableView> ripening() {
        if (sheet.ripening().isEmpty()) {
            return Optional.empty();
        }
        List<List<String>> rows = new ArrayList<>();
        for (RipeningRow row : sheet.ripening()) {
            String low = figures.temperature(row.lowC());
            String high = figures.temperature(row.highC().orElse(row.lowC()));
            rows.add(
                    List.of(
                            page.say("leg." + row.leg()),
                            low.equals(high) ? low : page.say("crop.range", low, high),
                            row.days().map(days -> range(days, "day")).orElse("–"),
                            page.say(row.treated() ? "crop.gassed" : "crop.not-gassed"),
                            row.sourceId()));
        }
        return Optional.of(
                new TableView(
                        page.say("crop.ripening"),
                        List.of(
                                page.say("crop.leg"),
                                page.say("crop.at"),
                                page.say("crop.days"),
                                page.say("crop.gas"),
                                page.say("crop.source")),
                        rows));
    }

    List<CropView.FactGroup> facts() {
        List<CropView.FactGroup> groups = new ArrayList<>();
        for (SheetFact.Part part : SheetFact.Part.values()) {
            List<CropView.Line> lines =
                    sheet.facts().stream()
                            .filter(fact -> fact.part() == part)
                            .map(this::line)
                            .toList();
            if (!lines.isEmpty()) {
                String name = page.say("part." + part.name().toLowerCase(Locale.ROOT));
                groups.add(new CropView.FactGroup(name, lines));
            }
        }
        return groups;
    }

    /** The sources of all facts, each once. */
    List<CropView.Because> sources() {
        Map<String, String> whole = new LinkedHashMap<>();
        sheet.facts().stream()
                .flatMap(fact -> fact.sources().stream())
                .forEach(source -> whole.putIfAbsent(source.id(), source.citation()));
        return whole.entrySet().stream()
                .map(one -> new CropView.Because(one.getValue(), one.getKey()))
                .toList();
    }

    /** Own values as they were set. */
    List<CropView.Line> own() {
        return sheet.facts().stream().filter(fact -> fact.fact().own()).map(this::line).toList();
    }

    private CropView.Line line(SheetFact fact) {
        return new CropView.Line(
                facts.name(fact.fact().name()),
                figures.text(facts.value(fact.fact())),
                mark(fact),
                facts.note(fact.fact()),
                fact.fact().own()
                        ? fact.fact().name()
                        : fact.fact().sourceId() + ", " + fact.fact().evidence().word());
    }

    private String mark(SheetFact fact) {
        if (fact.fact().own()) {
            return page.say("crop.own");
        }
        return switch (fact.standing()) {
            case CHOSEN -> page.say("crop.taken");
            case BESIDE -> page.say("crop.beside");
            case AMONG_OTHERS -> "";
        };
    }
}
