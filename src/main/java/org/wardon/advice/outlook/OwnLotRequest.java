package org.wardon.advice.outlook;

import java.time.LocalDate;
import java.util.Optional;
import org.wardon.produce.rows.OwnLot;

/**
 * A lot that is gone, to be remembered.
 *
 * @param went what it went through, as for {@code keep}
 * @param ended how it ended
 * @param endedOn the day it ended; empty for the last day of its history, or today
 * @param today today
 * @param name what the keeper calls it, may be empty
 * @param note what the keeper writes beside it, may be empty
 */
public record OwnLotRequest(
        KeepRequest went,
        OwnLot.Ended ended,
        Optional<LocalDate> endedOn,
        LocalDate today,
        String name,
        String note) {}
