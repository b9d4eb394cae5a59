package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.Bounds;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;
import org.wardon.sharing.PairVerdict;
import org.wardon.sharing.SettingRange;
import org.wardon.sharing.Sharing;
import org.wardon.sharing.SharingAnswer;
import org.wardon.sharing.Stretch;
import org.wardon.sharing.Wish;
import org.wardon.sharing.Workable;

/**
 * Who of the lots of a plan, and of crops beside them, may share: the same judgement as {@code
 * share}, with what each lot bears, for its own days and its state at the door.
 */
public final class GroupSharing {
    private static final double LEAST_DAYS = 0.05;

    private final StoreTrial trial;
    private final ReferenceBook book;
    private final Map<String, Workable> known = new HashMap<>();

    private GroupSharing(StoreTrial trial, ReferenceBook book) {
        this.trial = trial;
        this.book = book;
    }

    /**
     * Prepares a plan to be asked about.
     *
     * @param plan the plan
     * @param book the reference book
     * @return what answers
     */
    public static GroupSharing of(StorePlan plan, ReferenceBook book) {
        return of(StoreTrial.of(plan, book), book);
    }

    /**
     * Answers on a store that is under question already.
     *
     * @param trial the store
     * @param book the reference book
     * @return what answers
     */
    public static GroupSharing of(StoreTrial trial, ReferenceBook book) {
        return new GroupSharing(trial, book);
    }

    /**
     * Judges lots of the plan, and crops beside them.
     *
     * @param lots ids of lots of the plan
     * @param crops days wanted of each crop, by id or any common name
     * @return the verdict
     * @throws BadInput with every fault: an unknown lot or name, a crop named twice, days out of
     *     range, nobody named
     */
    public GroupReport ask(List<String> lots, Map<String, Double> crops) {
        List<Fault> faults = new ArrayList<>();
        for (String id : lots) {
            if (trial.lot(id).isEmpty()) {
                faults.add(new Fault(id, "", "no lot of the plan is called so", "tick lots of it"));
            }
        }
        List<Wish> typed = wishes(crops, faults);
        if (faults.isEmpty() && lots.isEmpty() && typed.isEmpty()) {
            faults.add(new Fault("share", "", "names nobody", "tick lots or name crops"));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        List<Workable> all = new ArrayList<>(workable(lots));
        typed.parallelStream()
                .map(wish -> Workable.of(wish, trial.draws()))
                .forEachOrdered(all::add);
        return report(all);
    }

    private List<Wish> wishes(Map<String, Double> crops, List<Fault> faults) {
        try {
            return new SharingAdvice(book, Words.english(Units.METRIC)).wishes(crops);
        } catch (BadInput e) {
            faults.addAll(e.faults());
            return List.of();
        }
    }

    /**
     * Judges the lots that a plan has in one chamber.
     *
     * @param lots their ids
     * @return the verdict; empty where there are none
     */
    public Optional<GroupReport> among(List<String> lots) {
        return lots.isEmpty() ? Optional.empty() : Optional.of(report(workable(lots)));
    }

    private List<Workable> workable(List<String> ids) {
        List<TrialLot> asked =
                ids.stream()
                        .filter(id -> !known.containsKey(id))
                        .map(id -> trial.lot(id).orElseThrow())
                        .toList();
        List<Workable> found =
                asked.parallelStream()
                        .map(lot -> Workable.of(lot.wish(), lot.model(), trial.draws()))
                        .toList();
        for (int i = 0; i < asked.size(); i++) {
            known.put(asked.get(i).id(), found.get(i));
        }
        return ids.stream().map(known::get).toList();
    }

    private GroupReport report(List<Workable> lots) {
        SharingAnswer found = Sharing.among(lots, this::meet);
        return new GroupReport(
                found.verdict().word(),
                found.workableC().map(GroupSharing::bounds),
                found.workableHumidityPct().map(GroupSharing::bounds),
                lots.stream().map(GroupSharing::member).toList(),
                found.pairs().stream()
                        .filter(pair -> !pair.reasons().isEmpty())
                        .map(GroupSharing::pair)
                        .toList(),
                found.reasons(),
                found.compromise()
                        .map(
                                one ->
                                        new GroupReport.Compromise(
                                                one.atC(),
                                                one.humidityPct(),
                                                losing(one.daysLost()))),
                found.takeOut());
    }

    /** Crops that are typed are there all the time. */
    private boolean meet(String one, String other) {
        Optional<TrialLot> a = trial.lot(one);
        Optional<TrialLot> b = trial.lot(other);
        return a.isEmpty()
                || b.isEmpty()
                || (a.get().hereFromS() < b.get().leavesS()
                        && b.get().hereFromS() < a.get().leavesS());
    }

    private static Map<String, Double> losing(Map<String, Double> daysLost) {
        Map<String, Double> losing = new HashMap<>(daysLost);
        losing.values().removeIf(days -> days < LEAST_DAYS);
        return losing;
    }

    private static GroupReport.Pair pair(PairVerdict pair) {
        return new GroupReport.Pair(pair.a(), pair.b(), pair.verdict().word(), pair.reasons());
    }

    private static GroupReport.Member member(Workable lot) {
        List<Stretch> stretches = lot.stretches();
        return new GroupReport.Member(
                lot.wish().lot().id(),
                lot.wish().lot().commodity().names().get(0),
                lot.wish().wholeDays(),
                stretches.stream()
                        .map(s -> new GroupReport.Stretch(s.lowC(), s.highC(), s.what().word()))
                        .toList(),
                lot.borneC().map(GroupSharing::bounds),
                lot.bornePct().map(GroupSharing::bounds),
                lot.frostC(),
                coldHarmsBelow(stretches));
    }

    /** The warmest temperature looked at that injures by cold, and half a step more. */
    private static OptionalDouble coldHarmsBelow(List<Stretch> stretches) {
        return stretches.stream()
                .filter(stretch -> stretch.what() == Stretch.What.CHILLS)
                .mapToDouble(stretch -> stretch.highC() + Stretch.HALF_STEP_K)
                .max();
    }

    private static Bounds bounds(SettingRange range) {
        return new Bounds(range.low(), range.high());
    }
}
