package org.wardon.web.pages;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.wardon.advice.forecast.StoreAdvice;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.Quantiles;
import org.wardon.plan.LotPlan;
import org.wardon.web.work.OpenPlan;

/**
 * Lots at a glance, first to leave first. Of very many a page shows those that leave first and
 * those with the gravest cautions, and says how many more there are.
 */
public final class LotCards {
    /** So many lots of a plan are shown one by one. */
    private static final int ALL_SHOWN = 36;

    /** So many of a larger plan, over all its chambers. */
    private static final int SHOWN = 48;

    private static final int LEAST = 3;

    /** The share of cards kept for lots that leave first; the rest is for cautions. */
    private static final double FOR_FIRST = 0.6;

    /** A danger weighs more than any number of cautions. */
    private static final double DANGER = 1_000;

    private final OpenPlan open;
    private final Forecast forecast;
    private final Words words;
    private final PageWords say;
    private final Figures figures;
    private final LocalDateTime today;
    private final Map<String, LotPlan> planned;
    private final Map<String, List<Forecast.Warning>> warnings = new HashMap<>();
    private final Map<String, Long> kinds;

    /**
     * Prepares the cards.
     *
     * @param advice the advice
     * @param open the plan it is on
     * @param words words of reasons
     * @param frame frame of the page
     * @param today the time that counts as now
     */
    LotCards(StoreAdvice advice, OpenPlan open, Words words, Frame frame, LocalDateTime today) {
        this.open = open;
        this.forecast = advice.forecast();
        this.words = words;
        this.say = frame.words();
        this.figures = frame.figures();
        this.today = today;
        planned =
                advice.plan().lots().stream()
                        .collect(Collectors.toMap(LotPlan::id, Function.identity()));
        for (Forecast.Warning warning : forecast.warnings()) {
            for (String subject : warning.subject().split(",", -1)) {
                warnings.computeIfAbsent(subject, any -> new ArrayList<>()).add(warning);
            }
        }
        kinds =
                forecast.warnings().stream()
                        .collect(
                                Collectors.groupingBy(
                                        Forecast.Warning::code, Collectors.counting()));
    }

    /**
     * Returns lots.
     *
     * @param chamber where they stand, empty for lots that stand nowhere
     * @return first to leave first
     */
    public List<LotForecast> in(Optional<String> chamber) {
        return all().stream().filter(lot -> lot.chamber().equals(chamber)).toList();
    }

    /**
     * Returns every lot.
     *
     * @return first to leave first
     */
    public List<LotForecast> all() {
        return forecast.lots().stream().sorted(Comparator.comparing(LotForecast::leaveBy)).toList();
    }

    /**
     * Returns what is said of a lot, but for what figures rest on.
     *
     * @param lot its id
     * @return in the order of the forecast
     */
    public List<Telling> told(String lot) {
        return warnings.getOrDefault(lot, List.of()).stream()
                .filter(warning -> !AdviceViews.isDetail(warning))
                .map(Tellings::of)
                .toList();
    }

    /**
     * The lots of a chamber, or those that stand nowhere, as far as a page of all can show them.
     */
    LotsView brief(Optional<String> chamber) {
        List<LotForecast> here = in(chamber);
        int most = Math.max(LEAST, SHOWN / Math.max(1, forecast.chambers().size()));
        if (forecast.lots().size() <= ALL_SHOWN || here.size() <= most + 1) {
            return new LotsView(here.stream().map(this::card).toList(), Optional.empty());
        }
        Set<LotForecast> shown = new HashSet<>(here.subList(0, (int) Math.ceil(FOR_FIRST * most)));
        here.stream()
                .filter(lot -> !shown.contains(lot) && gravity(lot) > 0)
                .sorted(Comparator.comparingDouble(this::gravity).reversed())
                .limit(most - shown.size())
                .toList()
                .forEach(shown::add);
        String href = href(chamber);
        List<LotCardView> cards = new ArrayList<>();
        for (int i = 0; i < here.size(); i++) {
            if (shown.contains(here.get(i))) {
                cards.add(briefly(here.get(i), href + "&from=" + (i + 1)));
            }
        }
        return new LotsView(cards, Optional.of(more(chamber, here, shown)));
    }

    private String href(Optional<String> chamber) {
        return Room.CHAMBERS.path(open.kept().id()) + "/lots?in=" + chamber.orElse("");
    }

    private MoreView more(
            Optional<String> chamber, List<LotForecast> here, Set<LotForecast> shown) {
        List<LotForecast> rest = here.stream().filter(lot -> !shown.contains(lot)).toList();
        long urgent = rest.stream().filter(this::urgent).count();
        String told =
                say.say(
                        "lots.more",
                        String.valueOf(rest.size()),
                        figures.day(rest.get(0).leaveBy().toLocalDate()));
        String all = String.valueOf(here.size());
        return new MoreView(
                urgent == 0 ? told : told + " " + say.say("lots.more-now", String.valueOf(urgent)),
                new LinkView(
                        href(chamber),
                        chamber.map(id -> say.say("lots.all-in", all, id))
                                .orElseGet(() -> say.say("lots.all-nowhere", all))));
    }

    /** Cautions few lots have weigh more than what is said of half the store. */
    private double gravity(LotForecast lot) {
        double gravity = 0;
        for (Forecast.Warning warning : warnings.getOrDefault(lot.id(), List.of())) {
            switch (warning.level()) {
                case "danger" -> gravity += DANGER;
                case "caution" -> gravity += 1.0 / kinds.getOrDefault(warning.code(), 1L);
                default -> {}
            }
        }
        return gravity;
    }

    private long cautions(LotForecast lot) {
        return warnings.getOrDefault(lot.id(), List.of()).stream()
                .filter(warning -> !warning.level().equals("note"))
                .count();
    }

    private boolean urgent(LotForecast lot) {
        return lot.leaveBy().isBefore(today.plusDays(1));
    }

    /** A card among many: what its range hangs on stands where all is told of it. */
    private LotCardView briefly(LotForecast lot, String href) {
        long cautions = cautions(lot);
        Optional<LinkView> link =
                cautions == 0
                        ? Optional.empty()
                        : Optional.of(
                                new LinkView(
                                        href + "#lot-" + lot.id(),
                                        cautions == 1
                                                ? say.say("lot.caution")
                                                : say.say(
                                                        "lot.cautions", String.valueOf(cautions))));
        return card(lot, List.of(), link);
    }

    /**
     * Returns the card of a lot.
     *
     * @param lot the lot
     * @return all that a card tells
     */
    public LotCardView card(LotForecast lot) {
        return card(
                lot,
                lot.hangsOn().map(on -> words.text("hangs-on." + on.range())).stream().toList(),
                Optional.empty());
    }

    private LotCardView card(LotForecast lot, List<String> notes, Optional<LinkView> cautions) {
        LotPlan plan = Objects.requireNonNull(planned.get(lot.id()));
        return new LotCardView(
                lot.id(),
                crop(plan),
                figures.mass(plan.massKg()),
                figures.day(lot.leaveBy().toLocalDate()),
                RangeView.days(lot.daysLeft(), words, figures),
                words.text("mechanism." + lot.limitedBy()),
                gained(lot.daysGained()),
                notes,
                cautions,
                urgent(lot));
    }

    private String crop(LotPlan lot) {
        String name = open.book().get(lot.commodity()).names().get(0);
        return lot.variant().map(variant -> name + ", " + variant).orElse(name);
    }

    private String gained(Quantiles days) {
        String size = figures.figure(Math.abs(days.p50()), "day");
        return days.p50() < 0 ? say.say("lot.loses", size) : say.say("lot.gains", size);
    }
}
