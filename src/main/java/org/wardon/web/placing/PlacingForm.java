package org.wardon.web.placing;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.wardon.advice.placing.PlaceQuestion;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.web.pages.PageWords;
import org.wardon.web.work.PlaceAsked;

/** What a person wishes of a placing, as it stands in the address of the page. */
final class PlacingForm {
    /** Lots that have a chamber stay in it. */
    static final String NONE = "none";

    /** Lots in the store stay; those that come later may go anywhere. */
    static final String LATER = "later";

    /** All may be moved. */
    static final String ALL = "all";

    private static final List<PlaceWish.Aim> AIMS =
            List.of(
                    PlaceWish.Aim.MOST_VALUE,
                    PlaceWish.Aim.MOST_DAYS,
                    PlaceWish.Aim.FEWEST_CHAMBERS);

    private final StorePlan plan;
    private final PageWords say;
    private final boolean asked;
    private final PlaceWish.Aim aim;
    private final String move;
    private final List<String> lots;
    private String fault = "";

    /**
     * Reads it.
     *
     * @param plan the plan
     * @param from gives all values of a name
     * @param say words of the pages
     */
    PlacingForm(StorePlan plan, Function<String, List<String>> from, PageWords say) {
        this.plan = plan;
        this.say = say;
        asked = !from.apply("wish").isEmpty();
        aim = aim(asked ? from.apply("wish").get(0) : plan.wish().aim().word());
        List<String> moves = from.apply("move");
        move = moves.isEmpty() ? usualMove() : moves.get(0);
        Set<String> ticked = Set.copyOf(asked ? from.apply("lots") : plan.wish().lots());
        lots = plan.lots().stream().map(LotPlan::id).filter(ticked::contains).toList();
        judge(ticked.size());
    }

    /** What was asked before, told again as it would be asked now. */
    static PlacingForm of(StorePlan plan, PlaceAsked asked, PageWords say) {
        PlaceQuestion question = asked.question();
        String move =
                question.all() ? ALL : question.equals(PlaceQuestion.NONE_MOVES) ? NONE : LATER;
        Function<String, List<String>> from =
                name ->
                        switch (name) {
                            case "wish" -> List.of(asked.wish().aim().word());
                            case "move" -> List.of(move);
                            case "lots" -> asked.wish().lots();
                            default -> List.of();
                        };
        return new PlacingForm(plan, from, say);
    }

    /** Lots that stay are no aim of their own here, but a limit beside any aim. */
    private static PlaceWish.Aim aim(String word) {
        return AIMS.stream()
                .filter(one -> one.word().equals(word))
                .findFirst()
                .orElse(PlaceWish.Aim.MOST_VALUE);
    }

    /** Where lots wait for a chamber the others stay; where none waits there is only moving. */
    private String usualMove() {
        if (plan.wish().aim() == PlaceWish.Aim.LOTS_IN_STAY) {
            return LATER;
        }
        boolean waits = plan.lots().stream().anyMatch(lot -> lot.chamber().isEmpty());
        return waits ? NONE : ALL;
    }

    private void judge(int ticked) {
        if (asked && aim == PlaceWish.Aim.MOST_DAYS && lots.isEmpty()) {
            fault = say.say("placing.no-lots-ticked");
        } else if (asked && ticked > lots.size()) {
            fault = say.say("placing.lot-unknown");
        }
    }

    boolean isAsked() {
        return asked && fault.isEmpty();
    }

    String fault() {
        return fault;
    }

    PlaceAsked asked() {
        List<String> named = aim == PlaceWish.Aim.MOST_DAYS ? lots : List.of();
        PlaceWish wish = new PlaceWish(aim, named, plan.wish().accepts());
        return new PlaceAsked(wish, question());
    }

    private PlaceQuestion question() {
        return switch (move) {
            case ALL -> new PlaceQuestion(true, Set.of());
            case LATER ->
                    new PlaceQuestion(
                            false,
                            plan.lots().stream()
                                    .filter(lot -> lot.arrives().isAfter(plan.from()))
                                    .map(LotPlan::id)
                                    .collect(Collectors.toSet()));
            default -> PlaceQuestion.NONE_MOVES;
        };
    }

    /** The same in an address, in one way only. */
    String query() {
        StringBuilder query = new StringBuilder("wish=" + aim.word() + "&move=" + moveWord());
        if (aim == PlaceWish.Aim.MOST_DAYS) {
            lots.forEach(id -> query.append("&lots=").append(encoded(id)));
        }
        return query.toString();
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }

    private String moveWord() {
        return List.of(ALL, LATER).contains(move) ? move : NONE;
    }

    /** What is sought, in a few words. */
    String told() {
        String what = say.say("placing.aim-" + aim.word());
        String named = aim == PlaceWish.Aim.MOST_DAYS ? " (" + String.join(", ", lots) + ")" : "";
        return what + named + "; " + say.say("placing.move-" + moveWord());
    }

    PlacingView.Form view() {
        List<PlacingView.Pick> aims = new ArrayList<>();
        for (PlaceWish.Aim one : AIMS) {
            aims.add(pick(one.word(), "placing.aim-", one == aim));
        }
        List<PlacingView.Pick> moves =
                List.of(NONE, LATER, ALL).stream()
                        .map(one -> pick(one, "placing.move-", one.equals(moveWord())))
                        .toList();
        List<PlacingView.Pick> ticks =
                plan.lots().stream()
                        .map(
                                lot ->
                                        new PlacingView.Pick(
                                                lot.id(), lot.id(), "", lots.contains(lot.id())))
                        .toList();
        boolean days = aim == PlaceWish.Aim.MOST_DAYS;
        return new PlacingView.Form(aims, ticks, moves, fault, days, accepted());
    }

    /** What the plan accepts, so that nobody wonders who may stand together. */
    private List<String> accepted() {
        List<String> told = new ArrayList<>();
        if (!plan.wish().accepts().isEmpty()) {
            told.add(say.say("placing.accepted-everywhere", named(plan.wish().accepts())));
        }
        for (ChamberPlan chamber : plan.chambers()) {
            Set<Conflict> there = chamber.use().accepts();
            if (!there.isEmpty()) {
                told.add(say.say("placing.accepted-there", chamber.id(), named(there)));
            }
        }
        return told;
    }

    private String named(Set<Conflict> conflicts) {
        return conflicts.stream()
                .sorted()
                .map(one -> say.say("placing.conflict-" + one.word()))
                .collect(Collectors.joining(", "));
    }

    private PlacingView.Pick pick(String word, String family, boolean taken) {
        return new PlacingView.Pick(
                word, say.say(family + word), say.say(family + word + "-hint"), taken);
    }
}
