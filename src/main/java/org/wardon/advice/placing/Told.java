package org.wardon.advice.placing;

import java.util.List;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.files.forecast.PlaceAnswer.Change;
import org.wardon.files.forecast.PlaceAnswer.Choice;
import org.wardon.files.forecast.PlaceAnswer.Placed;
import org.wardon.files.forecast.PlaceAnswer.Unplaced;
import org.wardon.files.forecast.PlaceAnswer.Worth;
import org.wardon.produce.Reason;

/**
 * All that is told of a placing, before it is put into words.
 *
 * @param figures what it comes to
 * @param chambers what goes where
 * @param unplaced lots without a place
 * @param because why here, and what elsewhere costs
 * @param moves lots to be moved
 * @param changes what to dial
 * @param worth what more would be worth
 * @param notes what else is to be known
 */
record Told(
        Figures figures,
        List<Said<Placed>> chambers,
        List<Said<Unplaced>> unplaced,
        List<Said<Choice>> because,
        List<Said<Change>> moves,
        List<Said<Change>> changes,
        List<Said<Worth>> worth,
        List<Reason> notes) {
    Told {
        chambers = List.copyOf(chambers);
        unplaced = List.copyOf(unplaced);
        because = List.copyOf(because);
        moves = List.copyOf(moves);
        changes = List.copyOf(changes);
        worth = List.copyOf(worth);
        notes = List.copyOf(notes);
    }

    /**
     * What a placing comes to.
     *
     * @param value value net of energy in the forecast, currency
     * @param bound no placing can be worth more by what is known, currency
     * @param gapPct how far the value is below, percent of the bound
     * @param wish what was sought
     * @param assumed the value the search had assumed, currency
     * @param present the value of the plan's own arrangement, currency
     * @param proven whether the search was complete
     * @param sentence the gap in plain words
     */
    record Figures(
            double value,
            double bound,
            double gapPct,
            String wish,
            double assumed,
            double present,
            boolean proven,
            Reason sentence) {}

    PlaceAnswer in(Words words) {
        return new PlaceAnswer(
                PlaceAnswer.VERSION,
                in(words, chambers),
                in(words, unplaced),
                figures.value,
                figures.bound,
                figures.gapPct,
                in(words, because),
                figures.wish,
                figures.assumed,
                figures.present,
                figures.proven,
                words.sentence(figures.sentence),
                in(words, moves),
                in(words, changes),
                in(words, worth),
                notes.stream()
                        .map(
                                reason ->
                                        new Because(
                                                reason.code(),
                                                reason.subjects(),
                                                words.sentence(reason),
                                                reason.sourceId()))
                        .toList());
    }

    private static <T> List<T> in(Words words, List<Said<T>> parts) {
        return parts.stream().map(part -> part.in(words)).toList();
    }
}
