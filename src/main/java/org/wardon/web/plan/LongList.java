package org.wardon.web.plan;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.wardon.files.form.FormPlace;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Paging;

/**
 * The part of a long list that a page of the editor shows.
 *
 * @param items numbers of the items shown
 * @param part what is told of it
 */
record LongList(List<Integer> items, PlanPartView.ListPart part) {
    private static final int MOST = 50;
    private static final String ONLY_FAULTS = "&only=faults";

    LongList {
        items = List.copyOf(items);
    }

    /** Where the items of a long list that have faults stand. */
    static String faulty(String list) {
        return list + ONLY_FAULTS;
    }

    /** Finds the part asked for: of all items, or of those with faults where only they are. */
    static LongList of(FormPlace list, Call call, long plan, RowMaker rows, PageWords words) {
        List<FormPlace> all = list.places();
        List<Integer> faulty =
                IntStream.range(0, all.size())
                        .filter(i -> rows.faultsIn(all.get(i)) > 0)
                        .boxed()
                        .toList();
        boolean only = "faults".equals(call.http().queryParam("only")) && !faulty.isEmpty();
        List<Integer> which = only ? faulty : IntStream.range(0, all.size()).boxed().toList();
        String href = PlanPlaces.href(plan, list.path());
        String asked = Optional.ofNullable(call.http().queryParam("from")).orElse("");
        Paging paging = Paging.of(asked, which.size(), MOST, words, only ? faulty(href) : href);
        String told =
                words.say(
                        only ? "edit.part-faulty" : "edit.part",
                        String.valueOf(paging.from()),
                        String.valueOf(paging.to()),
                        String.valueOf(which.size()));
        Optional<PlanPartView.Link> other = Optional.empty();
        if (only) {
            other = Optional.of(new PlanPartView.Link(href, words.say("edit.whole-list")));
        } else if (!faulty.isEmpty()) {
            String many = String.valueOf(faulty.size());
            other =
                    Optional.of(
                            new PlanPartView.Link(
                                    faulty(href), words.say("edit.only-faulty", many)));
        }
        return new LongList(paging.of(which), new PlanPartView.ListPart(told, paging, other));
    }
}
