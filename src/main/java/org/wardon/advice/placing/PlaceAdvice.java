package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.wardon.advice.company.GroupSharing;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Places the lots of a store plan. */
public final class PlaceAdvice {
    /** Lots times chambers up to which more is tried by the full model. */
    private static final int SMALL = 60;

    private static final int ROUNDS = 4;
    private static final int ROUNDS_OF_MANY = 2;

    private final ReferenceBook book;
    private final Words words;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words for the texts of the answer
     */
    public PlaceAdvice(ReferenceBook book, Words words) {
        this.book = book;
        this.words = words;
    }

    /**
     * Places the lots of a plan as its wish asks.
     *
     * @param plan the plan
     * @param question which lots may be moved
     * @param progress hears how far the work has come
     * @return the placing, never worse by the forecast than the plan as it stands
     * @throws BadInput where the question names a lot the plan does not have
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public PlaceReport place(StorePlan plan, PlaceQuestion question, Progress progress) {
        check(plan, question);
        Stages stages = new Stages(progress);
        StoreTrial trial = StoreTrial.of(plan, book, stages);
        Task task = new Task(trial, question);
        Options options = new Options(trial, task);
        stages.begin("chambers", 0.1);
        Map<String, List<Option>> all = options.all();
        stages.begin("chambers", 0.4);
        Companions companions = new Companions(trial, options);
        Draft draft = new Draft(trial, task, companions);
        Sought asPlanned = Trials.present(trial, task, all, companions);
        Candidate present = new Candidate(asPlanned, trial.run(plan));
        stages.begin("placing", 0.5);
        boolean small = task.items().size() * plan.chambers().size() <= SMALL;
        Coupling coupling = new Coupling(trial, options, draft);
        PlaceWish.Aim aim = plan.wish().aim();
        coupling.run(all, aim, small ? ROUNDS : ROUNDS_OF_MANY, small);
        List<Candidate> candidates = new ArrayList<>(List.of(present));
        candidates.addAll(coupling.candidates());
        Candidate best = new Ranked(plan.wish()).best(candidates);
        stages.begin("telling", 0.8);
        Told told = new Telling(trial, options, draft, coupling).of(best, present, small);
        Arranged arranged = new Arranged(trial, GroupSharing.of(trial, book));
        PlaceReport report =
                new PlaceReport(
                        new PlaceReport.Plans(plan, best.tried().plan()),
                        arranged.of(present.tried()),
                        arranged.of(best.tried()),
                        told,
                        words);
        progress.at("telling", 1);
        return report;
    }

    private static void check(StorePlan plan, PlaceQuestion question) {
        List<String> there = plan.lots().stream().map(LotPlan::id).toList();
        List<Fault> faults = new ArrayList<>();
        for (String id : question.some().stream().sorted().toList()) {
            Named.lot("--may-move", id, there, faults);
        }
        for (String id : plan.wish().lots()) {
            Named.lot("--lots", id, there, faults);
        }
        if (plan.wish().aim() == PlaceWish.Aim.MOST_DAYS && plan.wish().lots().isEmpty()) {
            faults.add(
                    new Fault(
                            "--wish",
                            "",
                            "is 'most-days' for no lot",
                            "accepted: --lots given beside it, with at least one lot"));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
    }
}
