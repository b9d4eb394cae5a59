package org.wardon.web.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.wardon.advice.placing.Arrangement;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.LotPlan;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.RangeView;
import org.wardon.web.work.OpenPlan;

/** Every chamber as the plan has it, against how it is proposed. */
final class SpreadViews {
    private static final String STAYS = "stays";

    private final PlaceReport report;
    private final OpenPlan open;
    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final boolean many;

    /**
     * Prepares them.
     *
     * @param report the placing
     * @param open the plan it is of
     * @param words words of reasons
     * @param say words of the pages
     * @param figures figures of the person
     * @param many whether lots that stay are told by their ids only
     */
    SpreadViews(
            PlaceReport report,
            OpenPlan open,
            Words words,
            PageWords say,
            Figures figures,
            boolean many) {
        this.report = report;
        this.open = open;
        this.words = words;
        this.say = say;
        this.figures = figures;
        this.many = many;
    }

    List<PlacingView.Spread> all(PlaceAnswer answer) {
        List<PlacingView.Spread> spreads = new ArrayList<>();
        for (int c = 0; c < report.then().chambers().size(); c++) {
            Arrangement.There now = report.present().chambers().get(c);
            Arrangement.There then = report.then().chambers().get(c);
            String changed =
                    answer.changes().stream()
                            .filter(change -> change.subject().equals(now.id()))
                            .map(change -> figures.text(change.text()))
                            .collect(Collectors.joining(" "));
            spreads.add(
                    new PlacingView.Spread(now.id(), changed, side(now, false), side(then, true)));
        }
        return spreads;
    }

    private PlacingView.Side side(Arrangement.There there, boolean proposed) {
        boolean fails = !there.notHeld().isEmpty();
        List<PlacingView.Tag> tags = new ArrayList<>();
        List<String> others = new ArrayList<>();
        for (String id : there.lots()) {
            PlacingView.Tag tag = tag(id, proposed);
            if (many && tag.kind().equals(STAYS)) {
                others.add(id);
            } else {
                tags.add(tag);
            }
        }
        return new PlacingView.Side(
                setting(there),
                there.off() && there.lots().isEmpty() ? "" : air(there),
                holds(there),
                fails,
                mass(there.filled()),
                room(there.filled()),
                tags,
                others.isEmpty()
                        ? ""
                        : say.say(
                                "placing.others",
                                String.valueOf(others.size()),
                                String.join(", ", others)));
    }

    private String setting(Arrangement.There there) {
        if (there.off()) {
            return say.say("placing.off");
        }
        return there.dialled() ? dial(there, say, figures) : say.say("placing.not-dialled");
    }

    /** What is dialled in, and later. */
    static String dial(Arrangement.There there, PageWords say, Figures figures) {
        String all = figures.temperature(there.setting().temperatureC());
        for (PlaceAnswer.Later later : there.setting().later()) {
            String to = figures.temperature(later.temperatureC());
            all = say.say("chamber.then", all, figures.time(later.from()), to);
        }
        return say.say("placing.set", all);
    }

    private String air(Arrangement.There there) {
        return say.say(
                "placing.air",
                figures.temperature(there.airC()),
                figures.figure(there.humidityPct(), "pct"),
                figures.figure(there.setting().humidityPct(), "pct"));
    }

    private String holds(Arrangement.There there) {
        if (there.off() || there.lots().isEmpty()) {
            return "";
        }
        return there.notHeld().isEmpty()
                ? say.say("placing.holds")
                : say.say(
                        "placing.holds-not", figures.text(words.sentence(there.notHeld().get(0))));
    }

    private PlacingView.Fill mass(Arrangement.Filled filled) {
        return fill(
                filled.massKg() / filled.capacityKg(),
                say.say(
                        "placing.fill-mass",
                        figures.mass(filled.massKg()),
                        figures.mass(filled.capacityKg())));
    }

    private PlacingView.Fill room(Arrangement.Filled filled) {
        double share = filled.volumeM3() / filled.roomM3();
        return fill(share, say.say("placing.fill-room", String.valueOf(Math.round(100 * share))));
    }

    private static PlacingView.Fill fill(double share, String text) {
        return new PlacingView.Fill((int) Math.round(100 * Math.min(1, share)), text);
    }

    private PlacingView.Tag tag(String id, boolean proposed) {
        LotPlan was = lot(report.asked().lots(), id);
        LotPlan is = lot(report.proposed().lots(), id);
        boolean moved = !was.chamber().equals(is.chamber());
        Arrangement.OfLot here = (proposed ? report.then() : report.present()).lots().get(id);
        Optional<Arrangement.OfLot> before =
                Optional.ofNullable(report.present().lots().get(id)).filter(lot -> proposed);
        return new PlacingView.Tag(
                id,
                about(id),
                moved ? proposed ? "comes" : "goes" : STAYS,
                moved ? way(was, is, proposed) : "",
                here == null ? RangeView.of("–") : days(here),
                here == null ? "" : say.say("placing.ended", limit(here)),
                before.map(lot -> say.say("placing.before", brief(lot), limit(lot))).orElse(""));
    }

    private String limit(Arrangement.OfLot lot) {
        return words.text("mechanism." + lot.limitedBy());
    }

    private RangeView days(Arrangement.OfLot lot) {
        return RangeView.days(lot.daysLeft(), words, figures);
    }

    private String brief(Arrangement.OfLot lot) {
        RangeView days = days(lot);
        return days.low().isEmpty()
                ? days.likely()
                : say.say("placing.range", days.likely(), days.low(), days.high());
    }

    private String way(LotPlan was, LotPlan is, boolean proposed) {
        if (proposed) {
            return was.chamber()
                    .map(from -> say.say("placing.from", from))
                    .orElse(say.say("placing.new-here"));
        }
        return is.chamber()
                .map(to -> say.say("placing.to", to))
                .orElse(say.say("placing.taken-out"));
    }

    /** A lot of the plan in a few words. */
    String about(String id) {
        LotPlan lot = lot(report.asked().lots(), id);
        return say.say("placing.crop", crop(lot), figures.mass(lot.massKg()));
    }

    private String crop(LotPlan lot) {
        String name = open.book().get(lot.commodity()).names().get(0);
        return lot.variant().map(variant -> name + ", " + variant).orElse(name);
    }

    /** A lot of the plan by its id and crop. */
    String named(String id) {
        return id + " " + crop(lot(report.asked().lots(), id));
    }

    private static LotPlan lot(List<LotPlan> lots, String id) {
        return lots.stream().filter(lot -> lot.id().equals(id)).findFirst().orElseThrow();
    }
}
