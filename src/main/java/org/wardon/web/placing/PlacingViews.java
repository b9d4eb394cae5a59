package org.wardon.web.placing;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.wardon.advice.company.GroupReport;
import org.wardon.advice.placing.Arrangement;
import org.wardon.advice.placing.PlaceReport;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.PlaceWish;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.Frame;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;
import org.wardon.web.work.OpenPlan;

/** Turns a placing into what the page shows. */
final class PlacingViews {
    /** Lots up to which each is shown on its tag on both sides, and on a ruler. */
    private static final int FEW_LOTS = 40;

    /** Where the rest is told is another place here than on the command line. */
    private static final String REST = "place-rest-by-advise";

    private final PlaceReport report;
    private final PlaceAnswer answer;
    private final OpenPlan open;
    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final Money money;
    private final boolean many;

    /**
     * Prepares it.
     *
     * @param report the placing
     * @param open the plan it is of
     * @param words words of reasons
     * @param frame frame of the page
     */
    PlacingViews(PlaceReport report, OpenPlan open, Words words, Frame frame) {
        this.report = report;
        this.answer = report.in(words);
        this.open = open;
        this.words = words;
        say = frame.words();
        figures = frame.figures();
        money = new Money(report.asked().prices().currency());
        many = report.asked().lots().size() > FEW_LOTS;
    }

    /**
     * Returns the placing as the page shows it.
     *
     * @param form what was sought
     * @param path address of the page with what was sought
     * @param page page of the reasons
     */
    PlacingView.Result result(PlacingForm form, String path, int page) {
        SpreadViews spreads = new SpreadViews(report, open, words, say, figures, many);
        WhyViews why = new WhyViews(answer, say, figures, money, page);
        return new PlacingView.Result(
                lead(),
                form.told(),
                steps(spreads),
                spreads.all(answer),
                answer.unplaced().stream()
                        .map(lot -> new PlacingView.Told(figures.text(lot.text()), ""))
                        .toList(),
                many,
                gain(),
                figures.text(answer.told()),
                answer.worth().stream().map(one -> figures.text(one.text())).toList(),
                many ? List.of() : rulers(),
                many ? rulerLinks() : List.of(),
                why.shown(spreads),
                answer.notes().stream().map(this::note).toList(),
                why.links(path));
    }

    private PlacingView.Told note(Because because) {
        String text =
                because.code().equals(REST)
                        ? say.say("placing.rest")
                        : figures.text(because.text());
        return new PlacingView.Told(text, because.source());
    }

    private List<PlacingView.Step> steps(SpreadViews spreads) {
        return Stream.concat(
                        answer.changes().stream().map(change -> step(change, "")),
                        answer.moves().stream()
                                .map(change -> step(change, spreads.about(change.subject()))))
                .toList();
    }

    private PlacingView.Step step(PlaceAnswer.Change change, String about) {
        return new PlacingView.Step(figures.text(change.text()), about);
    }

    private String lead() {
        if (answer.changes().isEmpty() && answer.moves().isEmpty()) {
            return say.say("placing.nothing");
        }
        double more = answer.value() - answer.presentValue();
        String key = money.isNothing(more) ? "placing.lead-same" : "placing.lead";
        return say.say(
                        key,
                        money.of(answer.value()),
                        money.of(answer.presentValue()),
                        money.of(Math.abs(more)),
                        figures.figure(report.asked().days(), "day"))
                + wished();
    }

    /** What was wished for beside value, before and after. */
    private String wished() {
        PlaceWish wish = report.asked().wish();
        return switch (wish.aim()) {
            case MOST_DAYS ->
                    " "
                            + wish.lots().stream()
                                    .filter(report.then().lots()::containsKey)
                                    .map(this::daysOf)
                                    .collect(Collectors.joining(" "));
            case FEWEST_CHAMBERS ->
                    " "
                            + say.say(
                                    "placing.lead-chambers",
                                    running(report.then()),
                                    running(report.present()));
            default -> "";
        };
    }

    private String daysOf(String id) {
        String then = days(report.then(), id);
        return report.present().lots().containsKey(id)
                ? say.say("placing.lead-days", id, then, days(report.present(), id))
                : say.say("placing.lead-days-new", id, then);
    }

    private String days(Arrangement arrangement, String id) {
        return figures.figure(
                java.util.Objects.requireNonNull(arrangement.lots().get(id)).daysLeft().p50(),
                "day");
    }

    private static String running(Arrangement arrangement) {
        return String.valueOf(
                arrangement.chambers().stream()
                        .filter(
                                there ->
                                        !there.lots().isEmpty()
                                                || (there.dialled() && !there.off()))
                        .count());
    }

    private TableView gain() {
        Arrangement now = report.present();
        Arrangement then = report.then();
        List<List<String>> rows = new ArrayList<>();
        rows.add(row("placing.gain-kept", now.kept(), then.kept()));
        rows.add(row("placing.gain-power", now.energyCost(), then.energyCost()));
        rows.add(row("placing.gain-net", answer.presentValue(), answer.value()));
        rows.add(
                List.of(
                        say.say("placing.gain-energy"),
                        figures.figure(now.energyKWh(), "kWh"),
                        figures.figure(then.energyKWh(), "kWh"),
                        energy(then.energyKWh() - now.energyKWh())));
        return new TableView(
                say.say("placing.gain-table", figures.figure(report.asked().days(), "day")),
                List.of(
                        say.say("placing.head-gain"),
                        say.say("placing.head-present"),
                        say.say("placing.head-proposed"),
                        say.say("placing.difference")),
                rows);
    }

    private String energy(double moreKWh) {
        String size = figures.figure(Math.abs(moreKWh), "kWh");
        return size.startsWith("0 ") ? size : (moreKWh > 0 ? "+" : "−") + size;
    }

    private List<String> row(String key, double now, double then) {
        return List.of(say.say(key), money.of(now), money.of(then), money.difference(then - now));
    }

    private List<PlacingView.Rulers> rulers() {
        List<Arrangement.There> now = report.present().chambers();
        List<Arrangement.There> then = report.then().chambers();
        List<GroupReport> groups =
                Stream.concat(now.stream(), then.stream())
                        .flatMap(there -> there.sharing().stream())
                        .toList();
        RulerViews views = new RulerViews(groups, words, say, figures);
        List<PlacingView.Rulers> rulers = new ArrayList<>();
        for (int i = 0; i < now.size(); i++) {
            int c = i;
            List<RulerView> shown = new ArrayList<>();
            if (isAlike(now.get(c), then.get(c))) {
                ruler(views, then.get(c), "ruler.title-both").ifPresent(shown::add);
            } else {
                ruler(views, now.get(c), "ruler.title-now").ifPresent(shown::add);
                ruler(views, then.get(c), "ruler.title-then")
                        .map(ruler -> allTheSame(ruler, then.get(c).sharing()))
                        .ifPresent(shown::add);
            }
            if (!shown.isEmpty()) {
                rulers.add(new PlacingView.Rulers(now.get(c).id(), shown));
            }
        }
        return rulers;
    }

    /** A placing weighs money or days, and may bear what sharing would refuse. */
    private RulerView allTheSame(RulerView ruler, Optional<GroupReport> group) {
        return group.filter(one -> one.verdict().equals("no")).isPresent()
                ? ruler.withSecond(new PlacingView.Told(say.say("ruler.all-the-same"), ""))
                : ruler;
    }

    private static boolean isAlike(Arrangement.There now, Arrangement.There then) {
        return now.lots().equals(then.lots())
                && now.off() == then.off()
                && now.setting().equals(then.setting());
    }

    private Optional<RulerView> ruler(RulerViews views, Arrangement.There there, String key) {
        return there.sharing()
                .map(group -> views.of(say.say(key, there.id()), group, settingC(there)));
    }

    private static OptionalDouble settingC(Arrangement.There there) {
        return there.off() || !there.dialled()
                ? OptionalDouble.empty()
                : OptionalDouble.of(there.setting().temperatureC());
    }

    private List<PlacingView.Link> rulerLinks() {
        return report.then().chambers().stream()
                .filter(there -> !there.lots().isEmpty())
                .map(
                        there ->
                                new PlacingView.Link(
                                        SharingPage.path(open.kept().id())
                                                + "?"
                                                + there.lots().stream()
                                                        .map(PlacingViews::named)
                                                        .collect(Collectors.joining("&")),
                                        say.say("ruler.title-then", there.id())))
                .toList();
    }

    private static String named(String lot) {
        return "lots=" + URLEncoder.encode(lot, StandardCharsets.UTF_8);
    }

    /**
     * Returns what was to be taken over beside what the plan says by now.
     *
     * @param now the plan as it stands
     */
    TableView clash(org.wardon.plan.StorePlan now) {
        List<List<String>> rows = new ArrayList<>();
        for (int c = 0; c < report.then().chambers().size(); c++) {
            Arrangement.There was = report.present().chambers().get(c);
            Arrangement.There is = report.then().chambers().get(c);
            if (was.off() != is.off() || !was.setting().equals(is.setting())) {
                rows.add(List.of(is.id(), dial(is), dialled(now, is.id())));
            }
        }
        for (int l = 0; l < report.asked().lots().size(); l++) {
            var was = report.asked().lots().get(l);
            var is = report.proposed().lots().get(l);
            if (!was.chamber().equals(is.chamber())) {
                rows.add(List.of(is.id(), in(is.chamber()), stands(now, is.id())));
            }
        }
        return new TableView(
                say.say("placing.both"),
                List.of(
                        say.say("placing.head-what"),
                        say.say("placing.head-yours"),
                        say.say("placing.head-now")),
                rows);
    }

    private String dial(Arrangement.There there) {
        return there.off() ? say.say("placing.off") : SpreadViews.dial(there, say, figures);
    }

    private String dialled(org.wardon.plan.StorePlan now, String id) {
        return now.chambers().stream()
                .filter(chamber -> chamber.id().equals(id))
                .findFirst()
                .map(
                        chamber ->
                                chamber.off()
                                        ? say.say("placing.off")
                                        : say.say(
                                                "placing.set",
                                                figures.temperature(chamber.settingC())))
                .orElse(say.say("placing.gone"));
    }

    private String stands(org.wardon.plan.StorePlan now, String id) {
        return now.lots().stream()
                .filter(lot -> lot.id().equals(id))
                .findFirst()
                .map(lot -> in(lot.chamber()))
                .orElse(say.say("placing.gone"));
    }

    private String in(Optional<String> chamber) {
        return chamber.map(id -> say.say("placing.in", id)).orElse(say.say("placing.in-none"));
    }
}
