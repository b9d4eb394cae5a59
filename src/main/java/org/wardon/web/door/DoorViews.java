package org.wardon.web.door;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.RangeView;

/** Turns the answer at the door into what the page shows. */
final class DoorViews {
    /** Fewer days lost, or less warming, are not worth a line. */
    private static final double NOTICED_DAYS = 0.1;

    private static final double NOTICED_K = 0.5;

    private final ReceiveAnswer answer;
    private final Words words;
    private final PageWords say;
    private final Figures figures;

    DoorViews(ReceiveAnswer answer, Words words, PageWords say, Figures figures) {
        this.answer = answer;
        this.words = words;
        this.say = say;
        this.figures = figures;
    }

    DoorView.Answer view() {
        List<DoorView.Choice> choices = new ArrayList<>();
        for (ReceiveAnswer.Choice one : answer.choices()) {
            choices.add(choice(one, choices.isEmpty()));
        }
        return new DoorView.Answer(
                figures.text(answer.sentence()),
                choices,
                told(answer.assumed()),
                told(answer.notes()),
                List.of(say.say("door.caution-alone"), say.say("door.caution-safety")),
                say.say("door.rests", String.valueOf(answer.draws())));
    }

    private List<DoorView.Told> told(List<Because> list) {
        return list.stream()
                .map(one -> new DoorView.Told(figures.text(one.text()), one.source()))
                .toList();
    }

    private DoorView.Choice choice(ReceiveAnswer.Choice choice, boolean best) {
        List<String> facts = new ArrayList<>();
        choice.inside().ifPresent(inside -> inside(inside, facts));
        cooling(choice.keeps().coolSevenEighthsHours(), facts);
        return new DoorView.Choice(
                name(choice),
                choice.chamber().orElse(""),
                choice.verdict(),
                say.say("door.verdict-" + choice.verdict()),
                best,
                best ? "" : figures.text(choice.text()),
                RangeView.days(choice.keeps().daysLeft(), words, figures),
                words.text("mechanism." + choice.keeps().limitedBy()),
                facts,
                told(
                        choice.reasons().stream()
                                .filter(one -> !one.text().equals(choice.text()))
                                .toList()));
    }

    private String name(ReceiveAnswer.Choice choice) {
        return choice.chamber()
                .map(id -> say.say("door.chamber", id))
                .orElseGet(() -> say.say("door." + choice.kind()));
    }

    private void cooling(OptionalDouble hours, List<String> facts) {
        if (hours.isPresent()) {
            facts.add(say.say("door.cold-after", figures.figure(hours.getAsDouble(), "h")));
        }
    }

    private void inside(ReceiveAnswer.Inside inside, List<String> facts) {
        facts.add(
                say.say(
                        inside.holds()
                                ? "door.holds"
                                : inside.heldBefore() ? "door.holds-no-more" : "door.never-held"));
        inside.airRisesUntil()
                .ifPresent(
                        until ->
                                facts.add(
                                        say.say(
                                                "door.air-rises",
                                                figures.text(
                                                        words.units()
                                                                .difference(inside.airRisesK())),
                                                figures.time(until))));
        if (inside.freeKg() >= 0) {
            facts.add(say.say("door.room-left", figures.mass(inside.freeKg())));
        }
        List<ReceiveAnswer.OfLot> touched =
                inside.lots().stream()
                        .filter(lot -> lot.daysLost() >= NOTICED_DAYS || lot.warmsK() >= NOTICED_K)
                        .toList();
        touched.forEach(lot -> facts.add(neighbour(lot)));
        if (touched.isEmpty() && !inside.lots().isEmpty()) {
            facts.add(say.say("door.others-well"));
        }
    }

    private String neighbour(ReceiveAnswer.OfLot lot) {
        String warms = figures.text(words.units().difference(lot.warmsK()));
        return lot.daysLost() >= NOTICED_DAYS
                ? say.say(
                        "door.other-loses",
                        lot.id(),
                        figures.figure(lot.daysLost(), "day"),
                        figures.text(words.range(lot.daysLeft())))
                : say.say("door.other-warms", lot.id(), warms);
    }
}
