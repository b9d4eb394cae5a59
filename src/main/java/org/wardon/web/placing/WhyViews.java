package org.wardon.web.placing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.TableView;

/** Why every lot stands where it stands, page after page where there are many. */
final class WhyViews {
    private static final int A_PAGE = 12;

    private final Map<String, List<PlaceAnswer.Choice>> byLot = new LinkedHashMap<>();
    private final PageWords say;
    private final Figures figures;
    private final Money money;
    private final int page;

    /**
     * Prepares them.
     *
     * @param answer the placing
     * @param say words of the pages
     * @param figures figures of the person
     * @param money money of the plan
     * @param asked page asked for, from 1
     */
    WhyViews(PlaceAnswer answer, PageWords say, Figures figures, Money money, int asked) {
        this.say = say;
        this.figures = figures;
        this.money = money;
        for (PlaceAnswer.Choice choice : answer.because()) {
            byLot.computeIfAbsent(choice.lot(), id -> new ArrayList<>()).add(choice);
        }
        page = Math.max(1, Math.min(asked, pages()));
    }

    private int pages() {
        return Math.max(1, (byLot.size() + A_PAGE - 1) / A_PAGE);
    }

    List<PlacingView.Why> shown(SpreadViews spreads) {
        return byLot.entrySet().stream()
                .skip((long) (page - 1) * A_PAGE)
                .limit(A_PAGE)
                .map(entry -> why(spreads.named(entry.getKey()), entry.getValue()))
                .toList();
    }

    PlacingView.Pages links(String path) {
        List<PlacingView.Link> links = new ArrayList<>();
        for (int p = 1; pages() > 1 && p <= pages(); p++) {
            if (p != page) {
                links.add(new PlacingView.Link(path + "&why=" + p + "#why", String.valueOf(p)));
            }
        }
        int from = (page - 1) * A_PAGE + 1;
        int to = Math.min(byLot.size(), page * A_PAGE);
        return new PlacingView.Pages(
                pages() > 1
                        ? say.say(
                                "placing.why-shown",
                                String.valueOf(from),
                                String.valueOf(to),
                                String.valueOf(byLot.size()))
                        : "",
                links);
    }

    private PlacingView.Why why(String lot, List<PlaceAnswer.Choice> choices) {
        String here =
                choices.stream()
                        .filter(PlaceAnswer.Choice::here)
                        .map(choice -> figures.text(choice.text()))
                        .findFirst()
                        .orElse(say.say("placing.nowhere"));
        List<List<String>> rows =
                choices.stream().filter(choice -> !choice.here()).map(this::row).toList();
        return new PlacingView.Why(
                lot,
                here,
                new TableView(
                        say.say("placing.elsewhere", lot),
                        List.of(
                                say.say("placing.head-chamber"),
                                say.say("placing.head-days"),
                                say.say("placing.head-value"),
                                say.say("placing.head-words")),
                        rows));
    }

    private List<String> row(PlaceAnswer.Choice choice) {
        return List.of(
                choice.chamber(),
                days(choice.costDays()),
                choice.costValue().isPresent()
                        ? money.difference(-choice.costValue().getAsDouble())
                        : "–",
                figures.text(choice.text()));
    }

    private String days(OptionalDouble cost) {
        if (cost.isEmpty()) {
            return "–";
        }
        String size = figures.figure(Math.abs(cost.getAsDouble()), "day");
        boolean none = size.startsWith("0 ");
        return none ? size : (cost.getAsDouble() > 0 ? "−" : "+") + size;
    }
}
