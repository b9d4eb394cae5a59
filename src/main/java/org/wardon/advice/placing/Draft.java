package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.sharing.placing.ChamberToFill;
import org.wardon.sharing.placing.Climate;
import org.wardon.sharing.placing.Effort;
import org.wardon.sharing.placing.LotToPlace;
import org.wardon.sharing.placing.Offer;
import org.wardon.sharing.placing.Placing;
import org.wardon.sharing.placing.PlacingAnswer;
import org.wardon.sharing.placing.PlacingProblem;
import org.wardon.sharing.placing.PlacingSearch;

/** Puts a task and the options of the chambers to the search. */
final class Draft {
    /** Items lie so close in their packages, share of the room (assumption). */
    private static final double PACKED = 0.55;

    /** Share of a chamber that can be filled beside ways and air (assumption). */
    private static final double FILLED = 0.8;

    private static final double SLACK = 1 + 1e-9;

    private final StoreTrial trial;
    private final Task task;
    private final Companions companions;

    Draft(StoreTrial trial, Task task, Companions companions) {
        this.trial = trial;
        this.task = task;
        this.companions = companions;
    }

    /**
     * Seeks the best placing.
     *
     * @param chambers the chambers, in the order of the plan
     * @param options what each can make
     * @param aim what comes first
     * @param share how much of the usual work to do, 1 for all
     */
    Sought seek(
            List<ChamberPlan> chambers,
            Map<String, List<Option>> options,
            PlaceWish.Aim aim,
            double share) {
        Stakes stakes = Stakes.of(trial, task, options, aim);
        PlacingProblem problem = problem(chambers, options, stakes);
        PlacingAnswer answer =
                PlacingSearch.of(problem, effort(problem, stakes, share), trial.progress());
        List<Optional<Option>> chosen = new ArrayList<>();
        for (int c = 0; c < chambers.size(); c++) {
            int offer = answer.placing().chambers().get(c).offer();
            chosen.add(
                    offer == Placing.RESTS
                            ? Optional.empty()
                            : Optional.of(of(options, chambers.get(c)).get(offer)));
        }
        return new Sought(
                task,
                chambers,
                chosen,
                answer.placing(),
                answer.bound() - stakes.all(),
                answer.proven(),
                companions);
    }

    /** Room a lot takes in its packages, m3. */
    static double packedM3(TrialLot lot) {
        return lot.produceM3() / PACKED;
    }

    /** Room a chamber has for packed lots, m3. */
    static double roomM3(ChamberPlan chamber) {
        return FILLED * chamber.enclosure().box().volumeM3();
    }

    private static List<Option> of(Map<String, List<Option>> options, ChamberPlan chamber) {
        return Objects.requireNonNull(options.get(chamber.id()), chamber.id());
    }

    private static Effort effort(PlacingProblem problem, Stakes stakes, double share) {
        Effort usual = Effort.of(problem);
        double real = stakes.money() / (stakes.money() + stakes.all());
        return new Effort(
                usual.priceSteps(),
                usual.branchSteps(),
                (int) Math.ceil(share * usual.branches()),
                usual.loadSteps(),
                (int) Math.ceil(share * usual.polishes()),
                usual.gapFraction() * real);
    }

    private PlacingProblem problem(
            List<ChamberPlan> chambers, Map<String, List<Option>> options, Stakes stakes) {
        List<LotToPlace> lots = new ArrayList<>();
        for (int i = 0; i < task.items().size(); i++) {
            Task.Item item = task.items().get(i);
            lots.add(
                    new LotToPlace(
                            item.lot().id() + (item.whole() ? "" : "@" + i),
                            item.lot().plan().massKg(),
                            packedM3(item.lot()),
                            item.firstDay(),
                            item.lastDay(),
                            item.fixed()));
        }
        List<ChamberToFill> fills =
                chambers.parallelStream()
                        .map(chamber -> fill(chamber, of(options, chamber), lots, stakes))
                        .toList();
        return new PlacingProblem(trial.days(), lots, fills);
    }

    private ChamberToFill fill(
            ChamberPlan chamber, List<Option> options, List<LotToPlace> lots, Stakes stakes) {
        double mass = 0;
        double room = 0;
        for (int day = 0; day < trial.days(); day++) {
            double kg = 0;
            double m3 = 0;
            for (LotToPlace lot : lots) {
                boolean here = lot.onlyIn().equals(Optional.of(chamber.id()));
                if (here && lot.firstDay() <= day && day <= lot.lastDay()) {
                    kg += lot.massKg();
                    m3 += lot.volumeM3();
                }
            }
            mass = Math.max(mass, kg);
            room = Math.max(room, m3);
        }
        return new ChamberToFill(
                chamber.id(),
                Math.max(chamber.capacityKg(), SLACK * mass),
                Math.max(roomM3(chamber), SLACK * room),
                options.stream().map(option -> offer(chamber, option, stakes)).toList(),
                !task.hasFixed(chamber.id()));
    }

    private Offer offer(ChamberPlan chamber, Option option, Stakes stakes) {
        int n = task.items().size();
        double[] worth = new double[n];
        double[][] heat = new double[n][];
        double[] fixed = new double[trial.days()];
        for (int i = 0; i < n; i++) {
            Task.Item item = task.items().get(i);
            if (!Task.mayStand(item, chamber.id())) {
                heat[i] = new double[fixed.length];
                worth[i] = Climate.NEVER;
                continue;
            }
            Cell cell = option.cell(item.number());
            heat[i] = heatThere(item, cell);
            worth[i] = stakes.worth(item, cell);
            boolean here = item.fixed().equals(Optional.of(chamber.id()));
            for (int day = 0; here && day < fixed.length; day++) {
                fixed[day] += heat[i][day];
            }
        }
        Climate climate =
                new Climate(
                        chamber.id()
                                + " "
                                + option.settingC()
                                + " "
                                + option.riseK()
                                + (option.changes() ? " " + option.chamber().use().changes() : ""),
                        worth,
                        heat,
                        companions.losses(option, task.items()));
        return new Offer(
                climate,
                IntStream.range(0, fixed.length)
                        .mapToObj(d -> Math.max(option.takesW().get(d), SLACK * fixed[d]))
                        .toList(),
                option.figures().idleCost() + stakes.running(),
                option.figures().costPerWDay());
    }

    /** Heat of the days it stands there, the day of its leaving by its share. */
    private double[] heatThere(Task.Item item, Cell cell) {
        double[] heat = cell.there().heatW(trial.days());
        for (int day = 0; day < heat.length; day++) {
            if (day < item.firstDay() || day > item.lastDay()) {
                heat[day] = 0;
            }
        }
        return heat;
    }
}
