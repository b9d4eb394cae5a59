package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.wardon.advice.wording.Words;
import org.wardon.enclosure.section.Cut;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * Answers where it is warm and where cold in a chamber whose air no fan stirs: a section cut
 * upright through it at an hour of the forecast.
 */
public final class SectionAdvice {
    /** Faces swing by the day, and a load feels their mean. */
    public static final int USUAL_HOURS = 24;

    private static final int MOST_HOURS = 24 * 14;

    private final ForecastAdvice forecast;
    private final Words words;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words of the answer
     */
    public SectionAdvice(ReferenceBook book, Words words) {
        forecast = new ForecastAdvice(book, words);
        this.words = words;
    }

    /**
     * A question.
     *
     * @param chamber id of the chamber
     * @param at end of the hours, local time; without it the warmest span outdoors with a lot
     *     inside
     * @param hours mean of how many hours, 1 or more
     * @param across the way to cut; without it the way that shows most
     */
    public record Question(
            String chamber, Optional<String> at, int hours, Optional<String> across) {}

    /**
     * Answers.
     *
     * @param plan the plan
     * @param asked the question
     * @return the answer
     * @throws BadInput where there is no such chamber, hour or way, or a fan stirs the air
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public SectionAnswer ask(StorePlan plan, Question asked) {
        Optional<Double> endS = checked(plan, asked);
        StoreModel model = forecast.prepare(plan).model();
        ChamberPlan chamber = model.plan().getChamber(asked.chamber());
        StillChamber still =
                new StillChamber(model, chamber, model.asInPlain(chamber, plan.durationS()));
        double untilS =
                endS.orElseGet(() -> StillChamber.warmestEndS(model, chamber, asked.hours()));
        Optional<Cut> cut = asked.across().map(way -> cut(way));
        return new SectionFigures(model, chamber, words)
                .answer(still.at(untilS, asked.hours(), cut));
    }

    /** Refuses what cannot be asked; returns the end of the hours where it was given, s. */
    private Optional<Double> checked(StorePlan plan, Question asked) {
        List<Fault> faults = new ArrayList<>();
        Asked.chamber(plan, asked.chamber(), faults);
        String way = words.text("section.way-of-cutting");
        asked.across().ifPresent(a -> Asked.known("--across", a, ways(), way, faults));
        Optional<Double> endS = asked.at().flatMap(at -> Asked.hourEnd(plan, at, faults));
        if (asked.hours() < 1 || asked.hours() > MOST_HOURS) {
            String out = words.text("section.hours-out").replace("{0}", "" + asked.hours());
            String in = words.text("section.hours-in").replace("{0}", "" + MOST_HOURS);
            faults.add(new Fault("--hours", "", out, in));
        }
        if (faults.isEmpty()) {
            stirred(plan, asked, faults);
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return endS;
    }

    private static List<String> ways() {
        return Arrays.stream(Cut.values()).map(SectionFigures::word).toList();
    }

    private static Cut cut(String way) {
        return Cut.valueOf(way.toUpperCase(Locale.ROOT).replace('-', '_'));
    }

    private void stirred(StorePlan plan, Question asked, List<Fault> faults) {
        List<String> still =
                plan.chambers().stream()
                        .filter(chamber -> StillChamber.stirredBy(chamber).isEmpty())
                        .map(ChamberPlan::id)
                        .toList();
        String others = still.isEmpty() ? words.text("section.none") : String.join(", ", still);
        StillChamber.stirredBy(plan.getChamber(asked.chamber()))
                .map(by -> words.text("section.stirred").replace("{1}", by))
                .ifPresent(
                        told ->
                                faults.add(
                                        new Fault(
                                                "--chamber",
                                                "",
                                                told.replace("{0}", asked.chamber()),
                                                words.text("section.ask-instead")
                                                        .replace("{0}", asked.chamber())
                                                        .replace("{1}", others))));
    }
}
