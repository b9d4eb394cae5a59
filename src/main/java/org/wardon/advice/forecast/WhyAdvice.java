package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.files.json.Nearest;
import org.wardon.heat.ChamberRun;
import org.wardon.heat.HeatModel;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * Answers why a chamber is as it is at an hour: its heat and water term by term, a face from
 * outside to inside, a lot from its middle to the air. The chamber is run again to that hour as the
 * forecast runs it, so that the forecast itself need keep nothing for it.
 */
public final class WhyAdvice {
    private final ForecastAdvice forecast;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words of the forecast it asks
     */
    public WhyAdvice(ReferenceBook book, Words words) {
        forecast = new ForecastAdvice(book, words);
    }

    /**
     * A question.
     *
     * @param chamber id of the chamber
     * @param at end of the hour, local time
     * @param face name of a face, where one is asked for
     * @param lot id of a lot, where one is asked for
     */
    public record Question(
            String chamber, String at, Optional<String> face, Optional<String> lot) {}

    /**
     * Answers.
     *
     * @param plan the plan
     * @param asked the question
     * @return the answer
     * @throws BadInput where there is no such chamber, hour, face or lot, with what there is
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public WhyAnswer ask(StorePlan plan, Question asked) {
        List<Fault> faults = new ArrayList<>();
        Asked.chamber(plan, asked.chamber(), faults);
        asked.face()
                .ifPresent(
                        face -> Asked.known("--face", face, faces(), "face of a chamber", faults));
        Optional<Double> untilS = Asked.hourEnd(plan, asked.at(), faults);
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return told(forecast.prepare(plan).model(), asked, untilS.orElseThrow());
    }

    /** Answers a question whose chamber and hour are known to be there. */
    static WhyAnswer told(StoreModel model, Question asked, double endS) {
        ChamberPlan chamber = model.plan().getChamber(asked.chamber());
        asked.lot().ifPresent(lot -> stands(model, asked.chamber(), lot, endS));
        ChamberRun run = model.asInPlain(chamber, model.plan().durationS());
        return new WhyFigures(model, chamber, HeatModel.account(run, endS - Timeline.HOUR_S, endS))
                .answer(
                        asked.face().map(face -> FaceName.valueOf(face.toUpperCase(Locale.ROOT))),
                        asked.lot());
    }

    private static List<String> faces() {
        return Arrays.stream(FaceName.values())
                .map(face -> face.name().toLowerCase(Locale.ROOT))
                .toList();
    }

    private static void stands(StoreModel model, String chamber, String lot, double untilS) {
        List<String> there =
                model.visitsIn(chamber).stream()
                        .filter(visit -> visit.arrivesS() < untilS)
                        .filter(visit -> visit.leavesS() > untilS - Timeline.HOUR_S)
                        .map(Visit::id)
                        .distinct()
                        .toList();
        if (!there.contains(lot)) {
            String accepted =
                    there.isEmpty() ? "none, no lot stands there then" : String.join(", ", there);
            throw new BadInput(
                    "--lot",
                    "",
                    "is '" + lot + "', no lot that stands in " + chamber + " then",
                    Nearest.question(lot, there) + "accepted: " + accepted);
        }
    }
}
