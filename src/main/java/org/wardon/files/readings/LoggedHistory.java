package org.wardon.files.readings;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.wardon.lots.LotHistory;
import org.wardon.plan.FilledGap;
import org.wardon.produce.Reason;

/**
 * What a logger saw of a lot.
 *
 * @param history the lot, its temperature that of the logger throughout
 * @param from local time of second 0
 * @param humidityKnown whether the logger gave humidity; else the humidity is what the reader put
 *     in
 * @param gaps spans of more than three hours without a reading, filled by a straight line
 * @param bounds the same lot colder and warmer in those spans; empty where there are none
 * @param notes what was assumed and what asks for a look
 */
public record LoggedHistory(
        LotHistory history,
        LocalDateTime from,
        boolean humidityKnown,
        List<FilledGap> gaps,
        Optional<Bounds> bounds,
        List<Reason> notes) {
    /**
     * The lot as cold and as warm as it may have been while nothing was read: at the colder and at
     * the warmer of the readings before and after.
     *
     * @param colder the colder lot
     * @param warmer the warmer lot
     */
    public record Bounds(LotHistory colder, LotHistory warmer) {}

    /** Copies the lists. */
    public LoggedHistory {
        gaps = List.copyOf(gaps);
        notes = List.copyOf(notes);
    }
}
