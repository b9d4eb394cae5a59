package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.keeping.KeepingModel;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;
import org.wardon.reference.ReferenceBook;
import org.wardon.sharing.Circumstances;
import org.wardon.sharing.PairVerdict;
import org.wardon.sharing.Price;
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
    private final StoreTrial trial;
    private final ReferenceBook book;
    private final Map<Known, Workable> known = new HashMap<>();

    private GroupSharing(StoreTrial trial, ReferenceBook book) {
        this.trial = trial;
        this.book = book;
    }

    /** A lot under a thermostat of some swing. */
    private record Known(String id, double swingK) {}

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
     * Judges lots of the plan, and crops beside them. Where all the lots stand in one chamber, by
     * its air exchange, its thermostat and what is accepted in it.
     *
     * @param lots ids of lots of the plan
     * @param crops days wanted of each crop, by id or any common name
     * @return the verdict
     * @throws BadInput with every fault: an unknown lot or name, a crop named twice, days out of
     *     range, nobody named
     */
    public GroupReport ask(List<String> lots, Map<String, Double> crops) {
        return report(asked(new GroupQuestion(lots, crops, Set.of())));
    }

    /**
     * Judges likewise, in the names of {@code share}.
     *
     * @param question who is asked about, and what is accepted
     * @param words words for the reasons
     * @return the verdict
     * @throws BadInput with every fault
     */
    public ShareReport tell(GroupQuestion question, Words words) {
        return new ShareTold(words, Optional.of(trial.plan().timeline()))
                .of(asked(question).found());
    }

    /** A group and what was found. */
    private record Asked(List<Workable> lots, SharingAnswer found) {}

    private Asked asked(GroupQuestion question) {
        List<Fault> faults = new ArrayList<>();
        for (String id : question.lots()) {
            if (trial.lot(id).isEmpty()) {
                faults.add(new Fault(id, "", "no lot of the plan is called so", "tick lots of it"));
            }
        }
        List<Wish> typed = wishes(question.crops(), faults);
        if (faults.isEmpty() && question.lots().isEmpty() && typed.isEmpty()) {
            faults.add(new Fault("share", "", "names nobody", "tick lots or name crops"));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        Optional<ChamberPlan> chamber = chamberOf(question.lots());
        Housed housed = new Housed(trial, chamber);
        List<Workable> all = new ArrayList<>(workable(question.lots(), housed.swingK()));
        typed.parallelStream()
                .map(wish -> workable(wish, housed.swingK()))
                .forEachOrdered(all::add);
        return judged(all, housed, accepts(question.accepts(), chamber));
    }

    private Workable workable(Wish wish, double swingK) {
        return Workable.in(swingK, wish, KeepingModel.of(wish.lot()), trial.draws());
    }

    private Asked judged(List<Workable> lots, Housed housed, Set<Conflict> accepted) {
        Circumstances at = new Circumstances(housed::stay, housed, accepted);
        return new Asked(lots, Sharing.among(lots, at));
    }

    /** What is accepted in a chamber, or everywhere. */
    private Set<Conflict> accepts(Set<Conflict> asked, Optional<ChamberPlan> chamber) {
        Set<Conflict> all = new HashSet<>(asked);
        all.addAll(chamber.map(trial.plan()::accepts).orElse(trial.plan().wish().accepts()));
        return all;
    }

    /** The chamber that all of some lots stand in, where it is one. */
    private Optional<ChamberPlan> chamberOf(List<String> lots) {
        List<Optional<String>> where =
                lots.stream().map(id -> lot(id).plan().chamber()).distinct().toList();
        return where.size() == 1
                ? where.get(0).map(id -> trial.plan().getChamber(id))
                : Optional.empty();
    }

    private TrialLot lot(String id) {
        return trial.lot(id).orElseThrow();
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
     * Judges the lots that stand in one chamber, those that are there at one time.
     *
     * @param chamber the chamber as it is set
     * @param lots their ids
     * @return the verdict; empty where there are none
     */
    public Optional<GroupReport> among(ChamberPlan chamber, List<String> lots) {
        Housed housed = new Housed(trial, Optional.of(chamber));
        Set<Conflict> accepted = accepts(Set.of(), Optional.of(chamber));
        return lots.isEmpty()
                ? Optional.empty()
                : Optional.of(report(judged(workable(lots, housed.swingK()), housed, accepted)));
    }

    private List<Workable> workable(List<String> ids, double swingK) {
        List<TrialLot> asked =
                ids.stream()
                        .filter(id -> !known.containsKey(new Known(id, swingK)))
                        .map(this::lot)
                        .toList();
        List<Workable> found =
                asked.parallelStream()
                        .map(lot -> Workable.in(swingK, lot.wish(), lot.model(), trial.draws()))
                        .toList();
        for (int i = 0; i < asked.size(); i++) {
            known.put(new Known(asked.get(i).id(), swingK), found.get(i));
        }
        return ids.stream()
                .map(id -> Objects.requireNonNull(known.get(new Known(id, swingK))))
                .toList();
    }

    private GroupReport report(Asked asked) {
        SharingAnswer found = asked.found();
        return new GroupReport(
                found.verdict().word(),
                found.workableC().map(ShareTold::bounds),
                found.workableHumidityPct().map(ShareTold::bounds),
                asked.lots().stream().map(GroupSharing::member).toList(),
                found.pairs().stream()
                        .filter(pair -> !pair.reasons().isEmpty())
                        .map(GroupSharing::pair)
                        .toList(),
                Dated.told(found.spells(), trial.plan().timeline()),
                found.prices().stream().map(Price::told).toList(),
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

    private static Map<String, Double> losing(Map<String, Double> daysLost) {
        Map<String, Double> losing = new HashMap<>(daysLost);
        losing.values().removeIf(days -> days < Price.LEAST_DAYS);
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
                lot.wish().marketDays(),
                stretches.stream()
                        .map(s -> new GroupReport.Stretch(s.lowC(), s.highC(), s.what().word()))
                        .toList(),
                lot.borneC().map(ShareTold::bounds),
                lot.bornePct().map(ShareTold::bounds),
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
}
