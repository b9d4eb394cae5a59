package org.wardon.web.plan;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.wardon.errors.Fault;
import org.wardon.files.form.PlanForm;
import org.wardon.files.json.JsonPath;
import org.wardon.web.pages.PageWords;

/**
 * Which faults a page of the editor lists: all of its own, some of the others, and where the rest
 * is.
 */
final class FaultLinks {
    private static final int MOST_OTHERS = 20;

    private final PlanForm form;
    private final long plan;
    private final PageWords words;
    private final List<Fault> own;
    private final List<Fault> others;

    FaultLinks(PlanForm form, long plan, JsonPath page, List<Fault> faults, PageWords words) {
        this.form = form;
        this.plan = plan;
        this.words = words;
        own = faults.stream().filter(fault -> isOn(page, fault)).toList();
        others = faults.stream().filter(fault -> !isOn(page, fault)).toList();
    }

    private boolean isOn(JsonPath page, Fault fault) {
        return PlanPlaces.page(form, fault.path()).equals(page);
    }

    /** Those that are listed. */
    List<Fault> listed() {
        return Stream.concat(own.stream(), others.stream().limit(MOST_OTHERS)).toList();
    }

    /**
     * Where the others stand: in their list where it has a page, else marked in the plan's rows.
     */
    Optional<PlanPartView.Link> more() {
        if (others.size() <= MOST_OTHERS) {
            return Optional.empty();
        }
        JsonPath first = PlanPlaces.page(form, others.get(MOST_OTHERS).path());
        JsonPath list = first.steps().isEmpty() ? first : first.up();
        String href =
                PlanPlaces.isLong(form, list)
                        ? LongList.faulty(PlanPlaces.href(plan, list))
                        : PlanPlaces.href(plan, JsonPath.ROOT);
        String many = String.valueOf(others.size() - MOST_OTHERS);
        return Optional.of(new PlanPartView.Link(href, words.say("edit.more-faults", many)));
    }
}
