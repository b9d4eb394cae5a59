package org.wardon.advice.whatif;

import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.Ranges;
import org.wardon.advice.forecast.ChamberTrial;
import org.wardon.advice.forecast.ChamberTrials;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.files.json.Nearest;
import org.wardon.keeping.Spread;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * Answers what a chamber would do with one thing changed, quick enough for a page whose sliders
 * move. The chamber as it stands is worked out once; neighbours stay as they are in the plan. Half
 * of a forecast's draws stand behind the days. May be asked by several threads at once.
 */
public final class WhatIf {
    private static final int DRAWS = 16;

    private final Words words;
    private final Map<String, Double> protections;
    private final ChamberTrials trials;
    private final ChamberPlan chamber;
    private final ChamberTrial standing;
    private final List<String> lots;

    private WhatIf(StorePlan plan, ReferenceBook book, Words words, String chamberId) {
        this.words = words;
        protections = PlanLookups.of(book).protections();
        trials = ChamberTrials.of(plan, chamberId, book, words, DRAWS);
        chamber = trials.plan().getChamber(chamberId);
        standing = trials.standing(chamberId);
        lots = standing.lots(0, plan.durationS());
    }

    /**
     * Works out a chamber as it stands.
     *
     * @param plan the plan
     * @param book the reference book
     * @param words words for reasons
     * @param chamberId the chamber
     * @return what answers questions about it
     * @throws BadInput where the plan has no such chamber
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public static WhatIf of(StorePlan plan, ReferenceBook book, Words words, String chamberId) {
        List<String> there = plan.chambers().stream().map(ChamberPlan::id).toList();
        if (!there.contains(chamberId)) {
            throw new BadInput(
                    "--chamber",
                    "",
                    "is '" + chamberId + "', no chamber of this plan",
                    Nearest.question(chamberId, there) + "accepted: " + String.join(", ", there));
        }
        return new WhatIf(plan, book, words, chamberId);
    }

    /**
     * Returns the plan.
     *
     * @return the plan, every lot placed
     */
    public StorePlan plan() {
        return trials.plan();
    }

    /**
     * Returns the chamber as planned, where sliders start.
     *
     * @return the chamber
     */
    public ChamberPlan chamber() {
        return chamber;
    }

    /**
     * Returns what the chamber is set to as planned.
     *
     * @return the setting, °C
     */
    public double settingC() {
        return chamber.setting().temperatureC();
    }

    /**
     * Returns the chamber hour by hour as it stands, to be compared with.
     *
     * @return the columns of an answer
     */
    public HourlySeries unchanged() {
        return standing.series();
    }

    /**
     * Answers.
     *
     * @param changes what is changed
     * @return the chamber with it
     * @throws BadInput with every fault of the changes
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public WhatIfAnswer answer(Changes changes) {
        ChamberTrial changed =
                trials.changed(
                        Rebuilt.of(chamber, changes, protections), changes.loadFactor().orElse(1));
        return new WhatIfAnswer(
                chamber.id(),
                changed.series(),
                outcome(changed),
                outcome(standing),
                lots.stream().map(id -> lot(id, changed)).toList(),
                changed.whyNotHeld().stream()
                        .map(
                                reason ->
                                        new Because(
                                                reason.code(),
                                                reason.subjects(),
                                                words.sentence(reason),
                                                reason.sourceId()))
                        .toList(),
                DRAWS);
    }

    private WhatIfAnswer.Outcome outcome(ChamberTrial trial) {
        double kept = lots.stream().mapToDouble(trial::valueKept).sum();
        return new WhatIfAnswer.Outcome(
                trial.holds(),
                trial.energyKWh(),
                trial.energyCost(),
                kept,
                kept - trial.energyCost());
    }

    private WhatIfAnswer.OfLot lot(String id, ChamberTrial changed) {
        double[] with = changed.daysLeft(id);
        double[] as = standing.daysLeft(id);
        double[] gained = IntStream.range(0, as.length).mapToDouble(i -> with[i] - as[i]).toArray();
        return new WhatIfAnswer.OfLot(
                id,
                Ranges.told(Spread.of(with)),
                Ranges.told(Spread.of(as)),
                Ranges.told(Spread.of(gained)),
                changed.valueKept(id),
                standing.valueKept(id));
    }
}
