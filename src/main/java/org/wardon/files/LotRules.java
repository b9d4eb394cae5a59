package org.wardon.files;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;

/** What the schema cannot say of lots: what names what, what comes before what. */
final class LotRules {
    private static final String VARIANT = "variant of this commodity with rows of its own";

    private final Part plan;
    private final Lookups lookups;
    private final Faults faults;
    private final IdRules ids;

    LotRules(Part plan, Lookups lookups, Faults faults) {
        this.plan = plan;
        this.lookups = lookups;
        this.faults = faults;
        this.ids = new IdRules(faults);
    }

    void check() {
        List<Part> lots = plan.at("lots").items();
        ids.unique(lots, "lot");
        for (Part lot : lots) {
            ids.known(lot.at("commodity"), lookups.commodities(), "commodity of the tables");
            lot.at("commodity")
                    .text()
                    .map(lookups.variants()::get)
                    .ifPresent(known -> ids.known(lot.at("variant"), known, VARIANT));
            ids.known(
                    lot.at("package"),
                    lookups.packages(),
                    "package with a half-cooling time in the tables");
            ids.chamber(lot.at("chamber"), plan);
            stay(lot);
        }
        wish(lots);
    }

    private void wish(List<Part> lots) {
        List<String> known = lots.stream().flatMap(lot -> lot.at("id").text().stream()).toList();
        Part named = plan.at("wishLots");
        named.items().forEach(id -> ids.known(id, known, "lot of this plan"));
        Part wish = plan.at("wish");
        if (wish.text().equals(Optional.of("most-days")) && named.items().isEmpty()) {
            faults.add(
                    wish.path(),
                    "is 'most-days' for no lot",
                    "accepted: wishLots given beside it, with at least one lot");
        }
    }

    private void stay(Part lot) {
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        Part arrivesAt = lot.at("arrives");
        Optional<LocalDateTime> arrives = arrivesAt.given() ? Times.at(arrivesAt) : from;
        if (arrives.isEmpty()) {
            return;
        }
        harvested(lot, arrives.get());
        ripeOn(lot, arrives.get());
        Optional<LocalDateTime> end = Times.end(plan);
        if (end.isPresent() && arrivesAt.given() && !arrives.get().isBefore(end.get())) {
            faults.add(
                    arrivesAt.path(),
                    "is " + arrives.get() + ", when the plan has ended",
                    "accepted: before " + end.get());
        }
        Optional<LocalDateTime> leaves = leaves(lot, arrives.get());
        if (leaves.isPresent()) {
            leaving(lot, arrives.get(), leaves.get(), from);
        }
        moves(lot, arrives.get(), leaves);
    }

    private void harvested(Part lot, LocalDateTime arrives) {
        Part harvested = lot.at("harvested");
        Optional<LocalDateTime> time = Times.at(harvested);
        if (time.isPresent() && time.get().isAfter(arrives)) {
            faults.add(
                    harvested.path(),
                    "is " + time.get() + ", after the lot arrives at " + arrives,
                    "accepted: a time up to its arrival");
        }
    }

    private void ripeOn(Part lot, LocalDateTime arrives) {
        Part ripeOn = lot.at("ripeOn");
        Optional<LocalDate> day = Times.dayAt(ripeOn);
        if (day.isPresent() && day.get().isBefore(arrives.toLocalDate())) {
            faults.add(
                    ripeOn.path(),
                    "is " + day.get() + ", before the lot arrives at " + arrives,
                    "accepted: a day from its arrival on");
        }
    }

    private Optional<LocalDateTime> leaves(Part lot, LocalDateTime arrives) {
        if (lot.has("leaves")) {
            return Times.at(lot.at("leaves"));
        }
        if (faults.at(lot.at("wantedDays").path())) {
            return Optional.empty();
        }
        double days = lot.at("wantedDays").number().orElse(Defaults.WANTED_DAYS.value());
        return Optional.of(Times.plusDays(arrives, days));
    }

    private void leaving(
            Part lot, LocalDateTime arrives, LocalDateTime leaves, Optional<LocalDateTime> from) {
        Part by = lot.at(lot.has("leaves") ? "leaves" : "wantedDays");
        if (!leaves.isAfter(arrives)) {
            faults.add(
                    by.path(),
                    "the lot leaves at " + leaves + " and arrives at " + arrives,
                    "accepted: leaving after arriving");
        } else if (from.isPresent() && !leaves.isAfter(from.get())) {
            faults.add(
                    by.path(),
                    "the lot leaves at " + leaves + ", before the plan begins",
                    "accepted: leaving after " + from.get());
        }
    }

    private void moves(Part lot, LocalDateTime arrives, Optional<LocalDateTime> leaves) {
        Part moves = lot.at("moves");
        if (!moves.items().isEmpty() && !lot.has("chamber")) {
            faults.add(
                    moves.path(),
                    "the lot moves but has no chamber to start from",
                    "accepted: chamber given too");
        }
        Optional<LocalDateTime> end = Times.end(plan);
        Optional<String> here = lot.at("chamber").text();
        Optional<LocalDateTime> before = Optional.empty();
        for (Part move : moves.items()) {
            Part to = move.at("to");
            ids.chamber(to, plan);
            if (here.isPresent() && to.text().equals(here)) {
                faults.add(
                        to.path(),
                        "is " + Json.quoted(here.get()) + ", where the lot stands already",
                        "accepted: another chamber, or leave this move out");
            }
            here = to.text();
            Optional<LocalDateTime> at = Times.at(move.at("at"));
            if (at.isPresent()) {
                moved(move.at("at"), at.get(), arrives, before);
                movedIn(move.at("at"), at.get(), leaves, end);
                before = at;
            }
        }
    }

    private void moved(
            Part part, LocalDateTime at, LocalDateTime arrives, Optional<LocalDateTime> before) {
        if (at.isBefore(arrives)) {
            faults.add(
                    part.path(),
                    "is " + at + ", before the lot arrives at " + arrives,
                    "accepted: from its arrival on");
        } else if (before.isPresent() && !at.isAfter(before.get())) {
            faults.add(
                    part.path(),
                    "is " + at + ", not after the move before it at " + before.get(),
                    "accepted: moves in order of time");
        }
    }

    private void movedIn(
            Part part,
            LocalDateTime at,
            Optional<LocalDateTime> leaves,
            Optional<LocalDateTime> end) {
        if (leaves.isPresent() && !at.isBefore(leaves.get())) {
            faults.add(
                    part.path(),
                    "is " + at + ", when the lot has left at " + leaves.get(),
                    "accepted: moves before the lot leaves");
        } else if (end.isPresent() && !at.isBefore(end.get())) {
            faults.add(
                    part.path(),
                    "is " + at + ", when the plan has ended",
                    "accepted: before " + end.get());
        }
    }
}
