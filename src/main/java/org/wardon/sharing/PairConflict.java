package org.wardon.sharing;

import java.util.List;
import org.wardon.keeping.KeepingModel;
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
        Conflicts conflicts = Pairing.conflicts(a, b, atC, days, Circumstances.usual());
        return new PairConflict(conflicts.verdict(), conflicts.reasons());
    }

    /**
     * Judges what a level of ethylene does to a lot in the days it is wanted in the chamber.
     *
     * @param taker the lot and its days
     * @param model how it keeps
     * @param giverId the lot that gives most of it
     * @param ppm the level, µL/L
     * @param atC temperature of the air, °C
     * @return verdict and reasons
     */
    public static PairConflict ofEthylene(
            Wish taker, KeepingModel model, String giverId, double ppm, double atC) {
        Conflicts conflicts = new Conflicts();
        conflicts.ethylene(taker, model, giverId, ppm, atC, taker.wantedDays());
        return new PairConflict(conflicts.verdict(), conflicts.reasons());
    }

    /** Whether one takes the smell of another in so many days more than it bears. */
    static boolean ofSmell(Wish giver, Wish taker, double days) {
        Conflicts conflicts = new Conflicts();
        conflicts.odour(giver, taker, days);
        return conflicts.verdict() == Verdict.NO;
    }

    /**
     * Judges whether two lots take each other's smell.
     *
     * @param one one lot
     * @param other the other
     * @param days days together
     * @return verdict and reasons
     */
    public static PairConflict ofOdour(Wish one, Wish other, double days) {
        Conflicts conflicts = new Conflicts();
        conflicts.odour(one, other, days);
        conflicts.odour(other, one, days);
        return new PairConflict(conflicts.verdict(), conflicts.reasons());
    }
}
