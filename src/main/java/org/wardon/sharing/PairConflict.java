package org.wardon.sharing;

import java.util.List;
import org.wardon.produce.Reason;

/**
 * What two lots do to each other in one air beside its temperature and humidity: ethylene and
 * smell.
 *
 * @param verdict whether they may stand together
 * @param reasons why not
 */
public record PairConflict(Verdict verdict, List<Reason> reasons) {
    /** Copies the list. */
    public PairConflict {
        reasons = List.copyOf(reasons);
    }

    /**
     * Judges two lots, each taken as half of a usual load in a chamber of usual air exchange.
     *
     * @param a one lot
     * @param b the other
     * @param atC temperature of the air, °C
     * @param days days together
     * @return verdict and reasons
     */
    public static PairConflict of(Workable a, Workable b, double atC, double days) {
        Conflicts conflicts = Pairing.conflicts(a, b, atC, days);
        return new PairConflict(conflicts.verdict(), conflicts.reasons());
    }
}
