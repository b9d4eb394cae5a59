package org.wardon.web.lists;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.web.guard.Refusal;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.LinkView;
import org.wardon.web.pages.Paging;
import org.wardon.web.pages.Press;
import org.wardon.web.pages.Telling;
import org.wardon.web.pages.Tellings;
import org.wardon.web.work.Workbench;

/** All cautions, notes, things to do and reasons of a plan, a part at a time. */
public final class ListPage {
    private static final int MOST = 100;

    private final ListDesk desk;

    /**
     * Makes the pages.
     *
     * @param bench what they work with
     * @param press what prints them
     */
    public ListPage(Workbench bench, Press press) {
        desk = new ListDesk(bench, press);
    }

    /**
     * Shows dangers and cautions.
     *
     * @param call the request
     */
    public void cautions(Call call) {
        desk.show(
                call,
                "listed",
                desk.say("cautions.title"),
                asked ->
                        told(
                                asked,
                                Stream.of("danger", "caution")
                                        .flatMap(level -> asked.views().told(level).stream())
                                        .toList(),
                                asked.path() + "/cautions",
                                List.of(
                                        asked.back(),
                                        new LinkView(
                                                asked.path() + "/notes",
                                                asked.say("notes.list")))));
    }

    /**
     * Shows what is good to know.
     *
     * @param call the request
     */
    public void notes(Call call) {
        desk.show(
                call,
                "listed",
                desk.say("notes.list"),
                asked ->
                        told(
                                asked,
                                asked.views().told("note"),
                                asked.path() + "/notes",
                                List.of(asked.back())));
    }

    /**
     * Shows why the lots of a chamber may share it or not.
     *
     * @param call the request
     */
    public void company(Call call) {
        String chamber = call.http().pathParam("chamber");
        desk.show(
                call,
                "listed",
                desk.say("company.list-of", chamber),
                asked -> {
                    if (asked.good().plan().chambers().stream()
                            .noneMatch(one -> one.id().equals(chamber))) {
                        throw new Refusal(404, "nothing-here");
                    }
                    String path = asked.path() + "/chamber/" + chamber;
                    return told(
                            asked,
                            asked.views().reasons(chamber),
                            path + "/company",
                            List.of(
                                    asked.back(),
                                    new LinkView(path, asked.say("page.chamber", chamber)),
                                    new LinkView(
                                            asked.path() + "/sharing",
                                            asked.say("sharing.title"))));
                });
    }

    /**
     * Shows what is to be done, first things first.
     *
     * @param call the request
     */
    public void actions(Call call) {
        desk.show(call, "listed", desk.say("actions.title"), this::actions);
    }

    private ListView actions(ListDesk.Asked asked) {
        List<String> all = asked.views().actions();
        Paging paging = asked.paging(all.size(), MOST, asked.path() + "/actions");
        return new ListView(
                asked.say("actions.title"),
                span(asked, paging),
                true,
                paging.of(all).stream()
                        .map(text -> new CautionView("", text, "", Optional.empty()))
                        .toList(),
                paging,
                List.of(asked.back()));
    }

    /** Those of one kind where one is asked for. */
    private static ListView told(
            ListDesk.Asked asked, List<Telling> all, String path, List<LinkView> ways) {
        Tellings tellings = new Tellings(asked.frame().words(), asked.frame().figures());
        String kind = ListDesk.query(asked.call(), "of");
        boolean known = all.stream().anyMatch(one -> one.code().equals(kind));
        List<Telling> of =
                tellings.once(
                        all.stream().filter(one -> !known || one.code().equals(kind)).toList());
        Paging paging = asked.paging(of.size(), MOST, known ? path + "?of=" + kind : path);
        return new ListView(
                asked.frame().title(),
                span(asked, paging),
                false,
                paging.of(of).stream().map(tellings::view).toList(),
                paging,
                known ? with(ways, new LinkView(path, asked.say("parts.every-kind"))) : ways);
    }

    private static List<LinkView> with(List<LinkView> ways, LinkView one) {
        return Stream.concat(ways.stream(), Stream.of(one)).toList();
    }

    private static String span(ListDesk.Asked asked, Paging paging) {
        return paging.all() == 0
                ? asked.say("parts.none")
                : asked.say(
                        "parts.told",
                        String.valueOf(paging.from()),
                        String.valueOf(paging.to()),
                        String.valueOf(paging.all()));
    }
}
