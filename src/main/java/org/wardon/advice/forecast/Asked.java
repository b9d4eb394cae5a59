package org.wardon.advice.forecast;

import java.time.LocalDateTime;
import java.time.format.DateTimeParseException;
import java.util.List;
import java.util.Optional;
import org.wardon.air.Timeline;
import org.wardon.errors.Fault;
import org.wardon.files.json.Nearest;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;

/** What a question about an hour of a plan names, checked with what there is. */
final class Asked {
    private Asked() {}

    /** A chamber of the plan. */
    static void chamber(StorePlan plan, String given, List<Fault> faults) {
        List<String> there = plan.chambers().stream().map(ChamberPlan::id).toList();
        known("--chamber", given, there, "chamber of this plan", faults);
    }

    static void known(
            String option, String given, List<String> there, String what, List<Fault> faults) {
        if (!there.contains(given)) {
            faults.add(
                    new Fault(
                            option,
                            "",
                            "is '" + given + "', no " + what,
                            Nearest.question(given, there)
                                    + "accepted: "
                                    + String.join(", ", there)));
        }
    }

    /** The end of an hour of the plan, s since its start. */
    static Optional<Double> hourEnd(StorePlan plan, String at, List<Fault> faults) {
        LocalDateTime time;
        try {
            time = LocalDateTime.parse(at);
        } catch (DateTimeParseException e) {
            faults.add(
                    new Fault(
                            "--at",
                            "",
                            "is '" + at + "', no local time",
                            "accepted: such as " + plan.from().plusHours(15)));
            return Optional.empty();
        }
        Timeline timeline = plan.timeline();
        double untilS = timeline.secondsAt(time);
        if (untilS < Timeline.HOUR_S || untilS > plan.durationS()) {
            faults.add(
                    new Fault(
                            "--at",
                            "",
                            "is " + time + ", where no hour of the plan ends",
                            "accepted: "
                                    + plan.from().plusHours(1)
                                    + " to "
                                    + timeline.localAt(plan.durationS())));
            return Optional.empty();
        }
        return Optional.of(untilS);
    }
}
