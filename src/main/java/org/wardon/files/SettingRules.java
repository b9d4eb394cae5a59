package org.wardon.files;

import java.time.LocalDateTime;
import java.util.Optional;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Part;

/** What the schema cannot say of later settings: when they may be, and that something follows. */
final class SettingRules {
    private final Part plan;
    private final Faults faults;

    SettingRules(Part plan, Faults faults) {
        this.plan = plan;
        this.faults = faults;
    }

    void check(Part chamber) {
        Part changes = chamber.at("settingChanges");
        if (!changes.items().isEmpty() && nothingFollows(chamber)) {
            faults.add(
                    changes.path(),
                    "stands in a chamber in which nothing follows a setting",
                    "accepted: with a cooler in cooling or with heaterW, or left out");
        }
        LocalDateTime last = LocalDateTime.MIN;
        for (Part change : changes.items()) {
            Optional<LocalDateTime> at = Times.at(change.at("from"));
            if (at.isPresent() && !faults.at(change.path()) && within(change, at.get())) {
                order(change, at.get(), last);
                last = at.get().isAfter(last) ? at.get() : last;
            }
        }
    }

    private static boolean nothingFollows(Part chamber) {
        return chamber.at("cooling").items().isEmpty()
                && chamber.at("heaterW").number().orElse(0) <= 0;
    }

    /** The setting the run starts with stands in {@code setting}. */
    private boolean within(Part change, LocalDateTime at) {
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        Optional<LocalDateTime> end = Times.end(plan);
        if (from.isEmpty() || end.isEmpty()) {
            return true;
        }
        boolean late = !at.isBefore(end.get());
        if (late || !at.isAfter(from.get())) {
            faults.add(
                    change.at("from").path(),
                    "is "
                            + at
                            + (late ? ", when the plan has ended" : ", not after the plan begins"),
                    "accepted: a time after " + from.get() + " and before " + end.get());
            return false;
        }
        return true;
    }

    private void order(Part change, LocalDateTime at, LocalDateTime last) {
        if (at.equals(last)) {
            faults.add(
                    change.at("from").path(),
                    "is " + at + ", as in a change above",
                    "accepted: one setting at a time");
        } else if (at.isBefore(last)) {
            faults.add(
                    change.at("from").path(),
                    "is " + at + ", before the change above at " + last,
                    "accepted: changes in order of time");
        }
    }
}
