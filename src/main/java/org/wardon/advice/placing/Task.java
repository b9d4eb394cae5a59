package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.air.Timeline;
import org.wardon.plan.PlaceWish;

/** What is to be placed: every lot of the horizon, and where it has to stay. */
final class Task {
    private final StoreTrial trial;
    private final List<Item> items = new ArrayList<>();

    /**
     * A lot, or one stay of a lot that its plan moves about.
     *
     * @param number number of the lot in the plan
     * @param lot the lot
     * @param fixed the chamber it has to stay in; absent where it is to be placed
     * @param firstDay its first day there
     * @param lastDay its last day there
     * @param whole whether it stands nowhere else
     */
    record Item(
            int number,
            TrialLot lot,
            Optional<String> fixed,
            int firstDay,
            int lastDay,
            boolean whole) {
        boolean isFixed() {
            return fixed.isPresent();
        }

        boolean meets(Item other) {
            return firstDay <= other.lastDay && other.firstDay <= lastDay;
        }
    }

    Task(StoreTrial trial, PlaceQuestion question) {
        this.trial = trial;
        for (int i = 0; i < trial.lots().size(); i++) {
            TrialLot lot = trial.lots().get(i);
            boolean comes = lot.hereFromS() < trial.plan().durationS() && lot.leavesS() > 0;
            if (!comes) {
                continue;
            }
            if (mayMove(lot, question)) {
                items.add(item(i, lot, Optional.empty(), lot.hereFromS(), lot.leavesS(), true));
            } else {
                List<TrialLot.Where> stays = lot.where();
                for (TrialLot.Where at : stays) {
                    boolean only = stays.size() == 1;
                    items.add(item(i, lot, Optional.of(at.chamber()), at.fromS(), at.toS(), only));
                }
            }
        }
    }

    private Item item(
            int number,
            TrialLot lot,
            Optional<String> fixed,
            double fromS,
            double toS,
            boolean whole) {
        int days = trial.days();
        int first = Math.min(days - 1, (int) Math.floor(fromS / Timeline.DAY_S + 1e-9));
        int last = Math.min(days - 1, (int) Math.ceil(toS / Timeline.DAY_S - 1e-9) - 1);
        return new Item(number, lot, fixed, first, Math.max(first, last), whole);
    }

    /** A lot without a chamber always may; one that its plan moves about never. */
    private boolean mayMove(TrialLot lot, PlaceQuestion question) {
        if (lot.plan().chamber().isEmpty()) {
            return true;
        }
        if (!lot.plan().moves().isEmpty()) {
            return false;
        }
        boolean stays = trial.plan().wish().aim() == PlaceWish.Aim.LOTS_IN_STAY;
        return stays ? !lot.isIn() : question.all() || question.some().contains(lot.id());
    }

    List<Item> items() {
        return items;
    }

    /** Whether an item may stand in a chamber. */
    static boolean mayStand(Item item, String chamberId) {
        return item.fixed().map(chamberId::equals).orElse(true);
    }

    /** Numbers of lots that may stand in a chamber. */
    List<Integer> mayStand(String chamberId) {
        return items.stream()
                .filter(item -> mayStand(item, chamberId))
                .map(Item::number)
                .distinct()
                .toList();
    }

    /** Numbers of lots that are fixed in a chamber. */
    boolean hasFixed(String chamberId) {
        return items.stream().anyMatch(item -> item.fixed().equals(Optional.of(chamberId)));
    }

    /** Ids of lots that do not stand in the store within the horizon. */
    List<String> outside() {
        List<Integer> inside = items.stream().map(Item::number).toList();
        List<String> ids = new ArrayList<>();
        for (int i = 0; i < trial.lots().size(); i++) {
            if (!inside.contains(i)) {
                ids.add(trial.lots().get(i).id());
            }
        }
        return ids;
    }
}
