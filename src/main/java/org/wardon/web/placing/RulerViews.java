package org.wardon.web.placing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.wardon.advice.company.GroupReport;
import org.wardon.advice.company.GroupReport.Member;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Bounds;
import org.wardon.produce.Reason;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Lays out what is known of a group of lots along a ruler of temperatures. */
final class RulerViews {
    private static final double COLDEST_C = -2;
    private static final double SHORTEST_C = 20;
    private static final double LONGEST_C = 35;
    private static final double BEYOND_K = 2;
    private static final int MOST_IDS = 4;
    private static final int MOST_SENTENCES = 4;

    /** So many further sentences a page bears, over all its rulers; so many each has at least. */
    private static final int MOST_MORE = 120;

    private static final int LEAST_MORE = 12;

    /** A figure so near the warm end would meet the unit, share of the length. */
    private static final double UNIT_FROM = 0.93;

    /** Half of the distance between the temperatures a lot was looked at, K. */
    private static final double HALF_STEP_K = 0.25;

    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final double warmestC;
    private final int mostMore;

    /**
     * Prepares rulers of one length.
     *
     * @param groups all that are to be shown
     * @param words words of reasons
     * @param say words of the pages
     * @param figures figures of the person
     */
    RulerViews(List<GroupReport> groups, Words words, PageWords say, Figures figures) {
        this.words = words;
        this.say = say;
        this.figures = figures;
        mostMore = Math.max(LEAST_MORE, MOST_MORE / Math.max(1, groups.size()));
        double most =
                groups.stream()
                        .flatMap(group -> group.members().stream())
                        .flatMap(member -> member.borneC().stream())
                        .mapToDouble(Bounds::high)
                        .max()
                        .orElse(SHORTEST_C);
        double long_ = 5 * Math.ceil((most + BEYOND_K) / 5);
        warmestC = Math.min(LONGEST_C, Math.max(SHORTEST_C, long_));
    }

    /**
     * Lays out a ruler.
     *
     * @param title what it shows
     * @param group the lots
     * @param settingC what is dialled in, °C; empty where nothing is
     */
    RulerView of(String title, GroupReport group, OptionalDouble settingC) {
        List<PlacingView.Told> told = sentences(group);
        int shown = Math.min(told.size(), MOST_SENTENCES);
        return new RulerView(
                title,
                figures.temperatureUnit(),
                ticks(),
                group.workableC().filter(all -> group.members().size() > 1).map(this::common),
                apart(group),
                settingC.isPresent()
                        ? Optional.of(setting(settingC.getAsDouble()))
                        : Optional.empty(),
                rows(group),
                told.subList(0, shown),
                more(told.subList(shown, told.size())),
                table(title, group));
    }

    /** Very many reasons are cut: a page is to be read, and fewer lots can be asked about. */
    private List<PlacingView.Told> more(List<PlacingView.Told> all) {
        if (all.size() <= mostMore) {
            return all;
        }
        List<PlacingView.Told> more = new ArrayList<>(all.subList(0, mostMore));
        more.add(plain(say.say("ruler.left-out", String.valueOf(all.size() - mostMore))));
        return more;
    }

    private String at(double temperatureC) {
        double held = Math.min(warmestC, Math.max(COLDEST_C, temperatureC));
        return percent(held - COLDEST_C);
    }

    private String percent(double kelvins) {
        double pct = 100 * kelvins / (warmestC - COLDEST_C);
        return String.format(Locale.ROOT, "%.2f", pct);
    }

    private RulerView.Span span(double lowC, double highC, String kind) {
        double low = Math.max(COLDEST_C, lowC - HALF_STEP_K);
        double high = Math.min(warmestC, highC + HALF_STEP_K);
        return new RulerView.Span(at(low), percent(Math.max(0, high - low)), kind);
    }

    private List<RulerView.Tick> ticks() {
        List<RulerView.Tick> ticks = new ArrayList<>();
        boolean fahrenheit = figures.temperatureUnit().equals("°F");
        int step = fahrenheit ? 2 : 1;
        int named = fahrenheit ? 10 : 5;
        int from = (int) Math.ceil(figures.shownTemperature(COLDEST_C) / step) * step;
        for (int t = from; t <= figures.shownTemperature(warmestC) + 1e-9; t += step) {
            double temperatureC = fahrenheit ? (t - 32) / 1.8 : t;
            double share = (temperatureC - COLDEST_C) / (warmestC - COLDEST_C);
            boolean told = t % named == 0 && share < UNIT_FROM;
            ticks.add(new RulerView.Tick(at(temperatureC), told ? String.valueOf(t) : ""));
        }
        return ticks;
    }

    private RulerView.Span common(Bounds all) {
        RulerView.Span span = span(all.low(), all.high(), "");
        return new RulerView.Span(span.at(), span.wide(), say.say("ruler.all", range(all)));
    }

    /** The two that pull apart most, told by the reason itself. */
    private Optional<RulerView.Span> apart(GroupReport group) {
        return group.pairs().stream()
                .flatMap(pair -> pair.reasons().stream())
                .filter(reason -> reason.code().equals("temperature-gap"))
                .max(Comparator.comparingDouble(reason -> reason.arguments().get(0).value()))
                .map(this::gap);
    }

    private RulerView.Span gap(Reason reason) {
        double fromC = reason.arguments().get(1).value() + HALF_STEP_K;
        double toC = reason.arguments().get(2).value() - HALF_STEP_K;
        String told =
                say.say(
                        "ruler.apart",
                        reason.subjects().get(0),
                        reason.subjects().get(1),
                        figures.figure(reason.arguments().get(0).value(), "K"));
        double wide = Math.max(0, Math.min(warmestC, toC) - Math.max(COLDEST_C, fromC));
        return new RulerView.Span(at(fromC), percent(wide), told);
    }

    private RulerView.Mark setting(double temperatureC) {
        boolean late = temperatureC > (COLDEST_C + warmestC) / 2;
        return new RulerView.Mark(
                at(temperatureC), say.say("ruler.set", figures.temperature(temperatureC)), late);
    }

    private List<RulerView.Row> rows(GroupReport group) {
        return alike(group).stream().map(same -> row(group, same)).toList();
    }

    private static List<List<Member>> alike(GroupReport group) {
        List<List<Member>> alike = new ArrayList<>();
        for (Member member : group.members()) {
            alike.stream()
                    .filter(same -> same.get(0).isLike(member))
                    .filter(same -> pull(group, same.get(0)).equals(pull(group, member)))
                    .findFirst()
                    .orElseGet(
                            () -> {
                                List<Member> fresh = new ArrayList<>();
                                alike.add(fresh);
                                return fresh;
                            })
                    .add(member);
        }
        return alike;
    }

    private static String pull(GroupReport group, Member member) {
        return group.pulls(member.id());
    }

    private RulerView.Row row(GroupReport group, List<Member> same) {
        Member one = same.get(0);
        String pulls = pull(group, one);
        return new RulerView.Row(
                ids(same),
                one.crop(),
                one.borneC().map(this::range).orElse(say.say("ruler.bears-none")),
                pulls.isEmpty() ? "" : say.say("ruler.pulls-" + pulls),
                one.stretches().stream()
                        .filter(stretch -> !stretch.what().equals("short"))
                        .filter(stretch -> stretch.lowC() < warmestC)
                        .map(stretch -> span(stretch.lowC(), stretch.highC(), stretch.what()))
                        .toList());
    }

    private String ids(List<Member> same) {
        String first =
                same.stream().limit(MOST_IDS).map(Member::id).collect(Collectors.joining(", "));
        return same.size() > MOST_IDS
                ? say.say("ruler.and-more", first, String.valueOf(same.size() - MOST_IDS))
                : first;
    }

    private String range(Bounds bounds) {
        String low = figures.temperature(bounds.low());
        String high = figures.temperature(bounds.high());
        return low.equals(high) ? low : say.say("ruler.range", low.replaceFirst(" °.$", ""), high);
    }

    private List<PlacingView.Told> sentences(GroupReport group) {
        List<PlacingView.Told> told = new ArrayList<>();
        told.add(plain(works(group)));
        group.dated().stream().map(this::told).forEach(told::add);
        group.borne().stream().map(this::told).forEach(told::add);
        for (GroupReport.Pair pair : group.pairs()) {
            pair.reasons().stream()
                    .map(this::told)
                    .filter(t -> !told.contains(t))
                    .forEach(told::add);
        }
        group.compromise().ifPresent(one -> told.add(1, plain(compromise(one))));
        group.takeOut().ifPresent(id -> told.add(1, plain(say.say("ruler.take-out", id))));
        group.notes().stream().map(this::told).filter(t -> !told.contains(t)).forEach(told::add);
        return told;
    }

    private PlacingView.Told told(Reason reason) {
        return new PlacingView.Told(figures.text(words.sentence(reason)), reason.sourceId());
    }

    private static PlacingView.Told plain(String text) {
        return new PlacingView.Told(text, "");
    }

    private String works(GroupReport group) {
        String verdict =
                group.members().size() > 1 ? words.text("verdict." + group.verdict()) + ": " : "";
        String where =
                group.workableC().isEmpty()
                        ? say.say("ruler.none")
                        : say.say(
                                group.members().size() > 1 ? "ruler.works" : "ruler.works-alone",
                                range(group.workableC().get()),
                                humidity(group.workablePct()));
        String all = verdict + where;
        return all.substring(0, 1).toUpperCase(Locale.ROOT) + all.substring(1);
    }

    private String humidity(Optional<Bounds> pct) {
        return pct.map(
                        b ->
                                say.say(
                                        "ruler.humidity",
                                        String.valueOf(Math.round(b.low())),
                                        String.valueOf(Math.round(b.high()))))
                .orElse("–");
    }

    private String compromise(GroupReport.Compromise one) {
        String lost =
                new TreeMap<>(one.daysLost())
                        .entrySet().stream()
                                .map(e -> e.getKey() + " " + figures.figure(e.getValue(), "day"))
                                .collect(Collectors.joining(", "));
        String at = figures.temperature(one.atC());
        String pct = figures.figure(one.humidityPct(), "pct");
        return lost.isEmpty()
                ? say.say("ruler.compromise-free", at, pct)
                : say.say("ruler.compromise", at, pct, lost);
    }

    private TableView table(String title, GroupReport group) {
        return new TableView(
                say.say("ruler.table", title),
                List.of(
                        say.say("ruler.head-lot"),
                        say.say("ruler.head-days"),
                        say.say("ruler.head-lasts"),
                        say.say("ruler.head-bears"),
                        say.say("ruler.head-cold"),
                        say.say("ruler.head-frost"),
                        say.say("ruler.head-humidity")),
                alike(group).stream().map(this::cells).toList());
    }

    private List<String> cells(List<Member> same) {
        Member one = same.get(0);
        return List.of(
                ids(same) + " " + one.crop(),
                days(one),
                ranges(one, Set.of("lasts")),
                ranges(one, Set.of("lasts", "bears")),
                one.coldHarmsBelowC().isPresent()
                        ? figures.temperature(one.coldHarmsBelowC().getAsDouble())
                        : "–",
                figures.temperature(one.frostC()),
                humidity(one.bornePct()));
    }

    /** How long a lot is to last, and what of that is the way to the buyer. */
    private String days(Member one) {
        return say.say(
                "ruler.days",
                figures.figure(one.wholeDays(), "day"),
                figures.figure(one.wholeDays() - one.marketDays(), "day"),
                figures.figure(one.marketDays(), "day"));
    }

    /** Ranges of temperature that do one of these things to a lot, side by side ones as one. */
    private String ranges(Member member, Set<String> what) {
        List<Bounds> found = new ArrayList<>();
        boolean goesOn = false;
        for (GroupReport.Stretch stretch : member.stretches()) {
            boolean counts = what.contains(stretch.what());
            if (counts && goesOn) {
                Bounds before = found.remove(found.size() - 1);
                found.add(new Bounds(before.low(), stretch.highC()));
            } else if (counts) {
                found.add(new Bounds(stretch.lowC(), stretch.highC()));
            }
            goesOn = counts;
        }
        return found.isEmpty()
                ? "–"
                : found.stream().map(this::range).collect(Collectors.joining("; "));
    }
}
