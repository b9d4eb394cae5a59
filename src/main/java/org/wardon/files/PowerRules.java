package org.wardon.files;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Part;

/** What the schema cannot say of the electricity of chambers. */
final class PowerRules {
    private final Part plan;
    private final Faults faults;

    PowerRules(Part plan, Faults faults) {
        this.plan = plan;
        this.faults = faults;
    }

    void check(Part chamber) {
        single(chamber);
        for (Part outage : chamber.at("outages").items()) {
            if (!faults.at(outage.path())) {
                daily(outage);
            }
        }
        if (chamber.at("supply").has("solar")) {
            solar(chamber);
        }
    }

    private void daily(Part outage) {
        Part daily = outage.at("daily");
        boolean once = outage.has("from") || outage.has("hours");
        boolean dated = outage.has("fromDate") || outage.has("toDate");
        if (daily.given() && once) {
            faults.add(
                    daily.path(),
                    "stands beside " + (outage.has("from") ? "from" : "hours"),
                    "accepted: daily, or from with hours");
        } else if (!daily.given() && dated) {
            faults.add(
                    outage.at(outage.has("fromDate") ? "fromDate" : "toDate").path(),
                    "stands without daily",
                    "accepted: beside daily only");
        } else if (daily.given()) {
            hours(daily);
            dates(outage);
        }
    }

    private void hours(Part daily) {
        Part to = daily.at("to");
        if (to.text().isPresent() && to.text().equals(daily.at("from").text())) {
            faults.add(
                    to.path(),
                    "is " + to.text().get() + ", when the outage begins",
                    "accepted: another time of day; for whole days {\"from\":"
                            + " \"2026-03-03T18:00\", \"hours\": 24}");
        }
    }

    private void dates(Part outage) {
        Optional<LocalDate> first = date(outage.at("fromDate"));
        Optional<LocalDate> last = date(outage.at("toDate"));
        if (first.isPresent() && last.isPresent() && last.get().isBefore(first.get())) {
            faults.add(
                    outage.at("toDate").path(),
                    "is " + last.get() + ", before fromDate, " + first.get(),
                    "accepted: that day or a later one");
            return;
        }
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        Optional<LocalDateTime> end = Times.end(plan);
        if (first.isPresent()
                && end.isPresent()
                && !first.get().atStartOfDay().isBefore(end.get())) {
            faults.add(
                    outage.at("fromDate").path(),
                    "is " + first.get() + ", after the plan has ended",
                    "accepted: a day before " + end.get());
        }
        // An outage that starts on the day before may last into the plan.
        if (last.isPresent()
                && from.isPresent()
                && last.get().isBefore(from.get().toLocalDate().minusDays(1))) {
            faults.add(
                    outage.at("toDate").path(),
                    "is " + last.get() + ", before the plan begins",
                    "accepted: " + from.get().toLocalDate() + " or later");
        }
    }

    private static Optional<LocalDate> date(Part part) {
        try {
            return part.text().map(LocalDate::parse);
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }

    private void solar(Part chamber) {
        if (plan.at("weather").has("steady")) {
            faults.add(
                    chamber.at("supply").at("solar").path(),
                    "is fed by a sun that steady weather does not have",
                    "accepted: with weather from csv or normals");
        }
        for (Part cooler : chamber.at("cooling").items()) {
            Part daily = cooler.at("dailyEnergyKWh");
            if (daily.given()) {
                faults.add(
                        daily.path(),
                        "stands beside a solar supply, which tells the energy by itself",
                        "accepted: one of the two");
            }
        }
    }

    private void single(Part chamber) {
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        Optional<LocalDateTime> end = Times.end(plan);
        LocalDateTime last = LocalDateTime.MIN;
        for (Part outage : chamber.at("outages").items()) {
            Optional<LocalDateTime> at = Times.at(outage.at("from"));
            OptionalDouble hours = outage.at("hours").number();
            if (outage.has("daily")
                    || at.isEmpty()
                    || hours.isEmpty()
                    || faults.at(outage.path())) {
                continue;
            }
            LocalDateTime to = Times.plusHours(at.get(), hours.getAsDouble());
            if (end.isPresent() && !at.get().isBefore(end.get())) {
                outside(outage, "is " + at.get() + ", after the plan has ended", from, end);
                continue;
            }
            if (from.isPresent() && !to.isAfter(from.get())) {
                outside(outage, "ends at " + to + ", before the plan begins", from, end);
                continue;
            }
            if (at.get().isBefore(last)) {
                faults.add(
                        outage.at("from").path(),
                        "is " + at.get() + ", before the outage above has ended at " + last,
                        "accepted: outages in order, none overlapping");
            }
            last = to.isAfter(last) ? to : last;
        }
    }

    private void outside(
            Part outage, String what, Optional<LocalDateTime> from, Optional<LocalDateTime> end) {
        faults.add(
                outage.at("from").path(),
                what,
                "accepted: hours between "
                        + from.map(LocalDateTime::toString).orElse("from")
                        + " and "
                        + end.map(LocalDateTime::toString).orElse("the end"));
    }
}
