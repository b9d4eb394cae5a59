package org.wardon.web.lists;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.files.forecast.LotForecast;
import org.wardon.plan.ChamberPlan;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.LinkView;
import org.wardon.web.pages.LotCards;
import org.wardon.web.pages.Paging;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Telling;
import org.wardon.web.pages.Tellings;
import org.wardon.web.work.Workbench;

/** The lots of a store or of one chamber, first to leave first, with all that is told of each. */
public final class LotsPage {
    private static final int MOST = 30;

    private final ListDesk desk;

    /**
     * Makes the page.
     *
     * @param bench what it works with
     * @param press what prints it
     */
    public LotsPage(Workbench bench, Press press) {
        desk = new ListDesk(bench, press);
    }

    /**
     * Shows the lots of the chamber {@code in}, those that stand nowhere where it is blank, else
     * all.
     *
     * @param call the request
     */
    public void show(Call call) {
        desk.show(call, "lots", desk.say("lots.page"), LotsPage::sheet);
    }

    private static LotsSheet sheet(ListDesk.Asked asked) {
        Optional<String> in = Optional.ofNullable(asked.call().http().queryParam("in"));
        List<String> chambers =
                asked.good().plan().chambers().stream().map(ChamberPlan::id).toList();
        if (in.isPresent() && !in.get().isEmpty() && !chambers.contains(in.get())) {
            throw new Refusal(404, "nothing-here");
        }
        LotCards cards = asked.views().cards();
        List<LotForecast> all =
                in.isPresent() ? cards.in(in.filter(id -> !id.isEmpty())) : cards.all();
        String path = asked.path() + "/lots";
        Paging paging =
                asked.paging(all.size(), MOST, in.map(id -> path + "?in=" + id).orElse(path));
        return new LotsSheet(
                title(asked, in),
                told(asked, paging),
                paging.of(all).stream().map(lot -> lot(asked, lot)).toList(),
                paging,
                groups(asked, in, chambers),
                asked.back());
    }

    private static String title(ListDesk.Asked asked, Optional<String> in) {
        if (in.isEmpty()) {
            return asked.say("lots.page");
        }
        return in.get().isEmpty() ? asked.say("lots.nowhere") : asked.say("lots.page-in", in.get());
    }

    private static String told(ListDesk.Asked asked, Paging paging) {
        return paging.all() == 0
                ? asked.say("lots.none")
                : asked.say(
                        "lots.told",
                        String.valueOf(paging.from()),
                        String.valueOf(paging.to()),
                        String.valueOf(paging.all()));
    }

    private static List<LotsSheet.Group> groups(
            ListDesk.Asked asked, Optional<String> in, List<String> chambers) {
        String path = asked.path() + "/lots";
        List<LotsSheet.Group> groups = new ArrayList<>();
        groups.add(
                new LotsSheet.Group(new LinkView(path, asked.say("lots.group-all")), in.isEmpty()));
        for (String chamber : chambers) {
            groups.add(
                    new LotsSheet.Group(
                            new LinkView(path + "?in=" + chamber, chamber),
                            in.equals(Optional.of(chamber))));
        }
        if (!asked.views().cards().in(Optional.empty()).isEmpty()) {
            groups.add(
                    new LotsSheet.Group(
                            new LinkView(path + "?in=", asked.say("lots.nowhere")),
                            in.equals(Optional.of(""))));
        }
        return groups;
    }

    private static LotsSheet.Lot lot(ListDesk.Asked asked, LotForecast lot) {
        LotCards cards = asked.views().cards();
        return new LotsSheet.Lot(
                cards.card(lot),
                lot.chamber()
                        .map(id -> asked.say("lots.stands-in", id))
                        .orElseGet(() -> asked.say("lots.stands-nowhere")),
                told(asked, lot.id(), false),
                told(asked, lot.id(), true),
                lot.chamber()
                        .map(
                                id ->
                                        new LinkView(
                                                asked.path()
                                                        + "/chamber/"
                                                        + id
                                                        + "?lot="
                                                        + lot.id()
                                                        + "#lots",
                                                asked.say("curve.lot", lot.id()))));
    }

    private static List<CautionView> told(ListDesk.Asked asked, String lot, boolean notes) {
        Tellings tellings = new Tellings(asked.frame().words(), asked.frame().figures());
        List<Telling> told =
                asked.views().cards().told(lot).stream()
                        .filter(one -> one.level().equals("note") == notes)
                        .toList();
        return told.stream().map(one -> tellings.view(one.without(lot))).toList();
    }
}
