package org.wardon.files.readings;

import java.time.LocalDateTime;
import java.util.List;
import org.wardon.lots.LotHistory;
import org.wardon.plan.FilledGap;

/**
 * What a logger saw of a lot.
 *
 * @param history the lot, its temperature that of the logger throughout
 * @param from local time of second 0
 * @param humidityKnown whether the logger gave humidity; else the humidity is what the reader put
 *     in
 * @param gaps spans of more than three hours without a reading, filled by a straight line
 */
public record LoggedHistory(
        LotHistory history, LocalDateTime from, boolean humidityKnown, List<FilledGap> gaps) {
    /** Copies the list. */
    public LoggedHistory {
        gaps = List.copyOf(gaps);
    }
}
