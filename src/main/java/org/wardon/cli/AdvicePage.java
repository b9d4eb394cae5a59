package org.wardon.cli;

import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.Quantiles;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** The advice on a store plan for a person. */
final class AdvicePage {
    /** Heat below this is not worth a word, kWh. */
    private static final double LEAST_TOLD_KWH = 0.5;

    /** Money below this is not worth a word, currency. */
    private static final double LEAST_TOLD_MONEY = 1;

    private final StoreAdvice advice;
    private final StorePlan plan;
    private final Forecast forecast;
    private final Words words;
    private final Units units;
    private final Terminal terminal;
    private final boolean notes;
    private final StringBuilder page = new StringBuilder();

    AdvicePage(StoreAdvice advice, Words words, Terminal terminal, boolean notes) {
        this.advice = advice;
        this.plan = advice.plan();
        this.forecast = advice.forecast();
        this.words = words;
        this.units = words.units();
        this.terminal = terminal;
        this.notes = notes;
    }

    String text() {
        head(
                plan.name()
                        + ": "
                        + units.figure(plan.days(), "day")
                        + " from "
                        + plan.from().toString().replace('T', ' '));
        warnings("danger", "Danger");
        actions();
        forecast.chambers().forEach(this::chamber);
        lots();
        warnings("caution", "Cautions");
        warnings("note", "Good to know");
        value();
        return page.toString();
    }

    private void head(String text) {
        page.append(terminal.bold(Paragraph.hanging("", text))).append('\n');
    }

    private void actions() {
        if (forecast.actions().isEmpty()) {
            return;
        }
        head("What to do first");
        for (Forecast.Action action : forecast.actions()) {
            String gain =
                    action.gainValue().isPresent()
                            ? " (gains " + money(action.gainValue().getAsDouble()) + ")"
                            : "";
            String lead = String.format(Locale.ROOT, "  %2d. ", action.order());
            page.append(Paragraph.hanging(lead, action.text() + gain));
        }
        page.append('\n');
    }

    private String money(double value) {
        return String.format(Locale.ROOT, "%,.0f %s", value, plan.prices().currency())
                .replace(',', ' ')
                .strip();
    }

    private void chamber(ChamberForecast chamber) {
        head("Chamber " + chamber.id() + ": " + sentence(chamber));
        besides(chamber);
        line(
                "air",
                units.temperature(chamber.airC().mean())
                        + " on average, "
                        + units.temperature(chamber.airC().min())
                        + " to "
                        + units.temperature(chamber.airC().max())
                        + "; humidity "
                        + units.figure(chamber.humidityPct().mean(), "pct"));
        chamber.doorEnd().ifPresent(this::doorEnd);
        line("pull-down", pullDown(chamber));
        line(
                "heat",
                "load peaks at "
                        + units.figure(chamber.peakLoadW(), "W")
                        + "; "
                        + kwh(chamber.heatRemovedKWh())
                        + " removed with "
                        + kwh(chamber.energyKWh())
                        + " of power; most from "
                        + largest(chamber.loadKWh()));
        coolers(chamber);
        chamber.solar().ifPresent(this::solar);
        chamber.intakeKgPerDay()
                .ifPresent(
                        kg ->
                                line(
                                        "intake",
                                        "at most " + units.mass(kg) + " of warm produce a day"));
        line(
                "gases",
                "carbon dioxide up to "
                        + units.figure(chamber.co2PpmMax(), "ppm")
                        + ", ethylene up to "
                        + units.figure(chamber.ethylenePpmMax(), "ppm"));
        company(chamber.id());
        page.append('\n');
    }

    /** How long each cooler ran, where there is more to tell than of one compressor. */
    private void coolers(ChamberForecast chamber) {
        List<ChamberForecast.OfCooler> all = chamber.coolers();
        if (all.size() > 1 || all.stream().anyMatch(c -> !c.kind().equals("compressor"))) {
            String each =
                    IntStream.range(0, all.size())
                            .mapToObj(
                                    i ->
                                            named(all, i)
                                                    + " "
                                                    + units.figure(all.get(i).runningHours(), "h"))
                            .collect(Collectors.joining(", "));
            String water =
                    chamber.waterUsedKg() > 0
                            ? "; " + units.mass(chamber.waterUsedKg()) + " of water used"
                            : "";
            line("ran", each + water);
        }
    }

    /** Its kind, with a number where there are several. */
    private static String named(List<ChamberForecast.OfCooler> all, int place) {
        String kind = all.get(place).kind();
        long before = all.subList(0, place).stream().filter(c -> c.kind().equals(kind)).count();
        boolean several = all.stream().filter(c -> c.kind().equals(kind)).count() > 1;
        return several ? kind + " " + (before + 1) + ":" : kind;
    }

    private String sentence(ChamberForecast chamber) {
        ChamberPlan planned = advice.plan().getChamber(chamber.id());
        if (planned.off()) {
            return chamber.holds()
                    ? "is switched off."
                    : "is switched off, and that harms: "
                            + words.sentence(advice.whyNotHeld(chamber.id()).get(0))
                            + ".";
        }
        String set = set(planned);
        if (chamber.holds()) {
            return "holds " + set + chamber.solar().map(this::though).orElse("") + ".";
        }
        String first = words.sentence(advice.whyNotHeld(chamber.id()).get(0));
        return "does not hold " + set + ": " + first + ".";
    }

    private String set(ChamberPlan chamber) {
        StringBuilder all = new StringBuilder(units.temperature(advice.settingC(chamber.id())));
        for (SettingChange change : chamber.use().changes()) {
            all.append(", from ")
                    .append(change.from().toLocalDate())
                    .append(" at ")
                    .append(change.from().toLocalTime())
                    .append(' ')
                    .append(units.temperature(change.temperatureC()));
        }
        return all.toString();
    }

    /** What else speaks against a chamber, beside its headline. */
    private void besides(ChamberForecast chamber) {
        List<Reason> others = advice.whyNotHeld(chamber.id()).stream().skip(1).toList();
        for (Reason reason : others) {
            page.append(Paragraph.hanging("  - ", words.sentence(reason) + "."));
        }
        if (!others.isEmpty()) {
            page.append('\n');
        }
    }

    private String pullDown(ChamberForecast chamber) {
        if (chamber.pullDownHours().isEmpty()) {
            return "never comes to its setting for three hours running";
        }
        double hours = chamber.pullDownHours().getAsDouble();
        return hours == 0 ? "none, it was at its setting" : units.figure(hours, "h");
    }

    private void line(String name, String text) {
        page.append(Paragraph.hanging(String.format(Locale.ROOT, "  %-10s ", name), text));
    }

    /** A chamber may hold though its battery runs out in the night. */
    private String though(ChamberForecast.Solar solar) {
        return solar.firstWithout()
                .map(
                        at ->
                                Reason.about(
                                        "battery-runs-out",
                                        "",
                                        "own",
                                        Argument.of(solar.hoursWithout(), "h"),
                                        Argument.text(at.toString().replace("T", " at "))))
                .map(reason -> ", though " + words.sentence(reason))
                .orElse("");
    }

    private void doorEnd(ChamberForecast.DoorEnd end) {
        line(
                "door end",
                units.temperature(end.airC().mean())
                        + " on average, "
                        + units.temperature(end.airC().min())
                        + " to "
                        + units.temperature(end.airC().max())
                        + " by the hour; humidity "
                        + units.figure(end.humidityPct().mean(), "pct"));
    }

    private void solar(ChamberForecast.Solar solar) {
        String night =
                solar.hoursWithout() > 0
                        ? "battery empty for " + units.figure(solar.hoursWithout(), "h")
                        : "battery down to " + units.figure(solar.batteryLowPct(), "pct");
        line(
                "sun",
                kwh(solar.panelKWh())
                        + " from the panels, "
                        + kwh(solar.usedKWh())
                        + " used, "
                        + kwh(solar.spilledKWh())
                        + " to spare; "
                        + night);
    }

    private static String kwh(double kWh) {
        return String.format(Locale.ROOT, "%.0f kWh", kWh);
    }

    private static String largest(ChamberForecast.LoadKWh load) {
        record Term(String name, double kWh) {}
        return List.of(
                        new Term("the faces", load.walls()),
                        new Term("the door", load.door()),
                        new Term("leakage", load.leakage() + load.freshAir()),
                        new Term("field heat", load.fieldHeat()),
                        new Term("respiration", load.respiration()),
                        new Term("fans", load.fans()),
                        new Term("lights and people", load.lights() + load.people()))
                .stream()
                .sorted(Comparator.comparingDouble(Term::kWh).reversed())
                .limit(3)
                .filter(term -> term.kWh() >= LEAST_TOLD_KWH)
                .map(term -> term.name() + " (" + kwh(term.kWh()) + ")")
                .collect(Collectors.joining(", "));
    }

    private void company(String chamberId) {
        for (Forecast.Sharing sharing : forecast.sharing()) {
            if (sharing.chamber().equals(chamberId)) {
                line("company", words.text("verdict." + sharing.verdict()));
                sharing.reasons()
                        .forEach(
                                reason ->
                                        page.append(
                                                Paragraph.entry(
                                                        "    ", reason.text(), reason.source())));
            }
        }
    }

    private void lots() {
        if (forecast.lots().isEmpty()) {
            return;
        }
        head("Lots, first to leave first");
        Table table =
                new Table("lot", "crop", "chamber", "leave by", "days left", "ended by", "gained");
        forecast.lots().stream()
                .sorted(Comparator.comparing(LotForecast::leaveBy))
                .forEach(lot -> lot(table, lot));
        page.append(table.text()).append('\n');
        dried();
        narrower();
    }

    /** What loss of weight costs, the dearest first. */
    private void dried() {
        double all = forecast.lots().stream().mapToDouble(LotForecast::weightLossValue).sum();
        if (all < LEAST_TOLD_MONEY) {
            return;
        }
        String dearest =
                forecast.lots().stream()
                        .sorted(Comparator.comparingDouble(LotForecast::weightLossValue).reversed())
                        .limit(3)
                        .filter(lot -> lot.weightLossValue() >= LEAST_TOLD_MONEY)
                        .map(
                                lot ->
                                        lot.id()
                                                + " "
                                                + units.figure(lot.weightLossPct(), "pct")
                                                + " ("
                                                + money(lot.weightLossValue())
                                                + ")")
                        .collect(Collectors.joining(", "));
        page.append(
                Paragraph.hanging(
                        "",
                        words.text("weight-lost")
                                + " "
                                + money(all)
                                + (dearest.isEmpty() ? "." : ": " + dearest + ".")));
        page.append('\n');
    }

    /** What the ranges hang on, so that a keeper can narrow them. */
    private void narrower() {
        Map<String, String> lots = new LinkedHashMap<>();
        for (LotForecast lot : forecast.lots()) {
            lot.hangsOn().ifPresent(on -> lots.merge(on.range(), lot.id(), (a, b) -> a + ", " + b));
        }
        if (lots.isEmpty()) {
            return;
        }
        head(words.text("ranges-hang-on"));
        lots.forEach(
                (range, ids) ->
                        page.append(
                                Paragraph.hanging(
                                        "  - ",
                                        ids + ": " + words.text("hangs-on." + range) + ".")));
        page.append('\n');
    }

    private void lot(Table table, LotForecast lot) {
        LotPlan planned =
                plan.lots().stream()
                        .filter(one -> one.id().equals(lot.id()))
                        .findFirst()
                        .orElseThrow();
        table.row(
                lot.id(),
                planned.commodity(),
                lot.chamber().orElse("-"),
                lot.leaveBy().toLocalDate().toString(),
                words.span(lot.daysLeft()),
                words.text("mechanism." + lot.limitedBy()),
                gained(lot.daysGained()));
    }

    private String gained(Quantiles days) {
        String size = units.figure(Math.abs(days.p50()), "day");
        return days.p50() < 0 ? "loses " + size : size;
    }

    private void warnings(String level, String title) {
        List<Forecast.Warning> told =
                forecast.warnings().stream()
                        .filter(warning -> warning.level().equals(level))
                        .filter(warning -> notes || !isDetail(warning))
                        .toList();
        if (told.isEmpty()) {
            return;
        }
        head(title);
        Map<String, List<Forecast.Warning>> alike =
                told.stream()
                        .collect(
                                Collectors.groupingBy(
                                        Forecast.Warning::code,
                                        LinkedHashMap::new,
                                        Collectors.toList()));
        for (List<Forecast.Warning> group : alike.values()) {
            group.forEach(one -> page.append(Paragraph.entry("  ", one.text(), one.source())));
        }
        long hidden =
                forecast.warnings().stream()
                                .filter(warning -> warning.level().equals(level))
                                .count()
                        - told.size();
        if (hidden > 0) {
            String notes = hidden == 1 ? " more note" : " more notes";
            page.append("  - ")
                    .append(hidden)
                    .append(notes)
                    .append(" on what the figures rest on: --notes\n");
        }
        page.append('\n');
    }

    /** What a figure rests on is for those who ask. */
    private static boolean isDetail(Forecast.Warning warning) {
        String code = warning.code();
        return code.equals("default-taken")
                || code.startsWith("life-")
                || code.startsWith("chilling-floor")
                || code.startsWith("chilling-band")
                || code.startsWith("chilling-dose")
                || code.equals("sprouting-range")
                || code.endsWith("-class")
                || code.endsWith("-broad");
    }

    private void value() {
        Forecast.Value value = forecast.value();
        head(
                "Sold produce is worth "
                        + money(value.kept())
                        + ", power costs "
                        + money(value.energyCost())
                        + ", net "
                        + money(value.net())
                        + ".");
        page.append("Wardon advises; local codes and licensed practice decide.\n");
    }
}
