package org.wardon.advice.placing;

import org.wardon.advice.forecast.LotInAir;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.keeping.Spread;

/**
 * What one lot comes to in one option.
 *
 * @param alone what it comes to in that air
 * @param price what a sound kilogram counts, currency
 * @param forbidden why it must not stand there though its price does not show it
 * @param giving ethylene it makes itself there
 * @param lostByOwn share of it that this costs
 */
record Cell(Alone alone, double price, Forbidden forbidden, GivenHere giving, double lostByOwn) {
    /**
     * What a lot comes to in air that is nobody's in particular.
     *
     * @param lot the lot
     * @param there what it comes to in clean air
     * @param taking what ethylene does to it there
     */
    record Alone(TrialLot lot, LotInAir there, Taking taking) {}

    static Cell of(Alone alone, double price, Forbidden forbidden, GivenHere giving) {
        double lost = giving.notable() ? alone.taking.lostShare(giving.ppm()) : 0;
        return new Cell(alone, price, forbidden, giving, lost);
    }

    /** Why a lot must not stand in an option. */
    enum Forbidden {
        /** It may. */
        NO,
        /** It is not cured and the chamber is cooled. */
        UNCURED,
        /** The air comes too near to its freezing point. */
        FREEZING,
        /** None of it is sold sound. */
        LOST
    }

    boolean allowed() {
        return forbidden == Forbidden.NO;
    }

    TrialLot lot() {
        return alone.lot;
    }

    LotInAir there() {
        return alone.there;
    }

    /** What is kept of it without company. */
    double worth() {
        return whole() * shareSound();
    }

    double shareSound() {
        return Math.max(0, alone.there.shareSound() - lostByOwn);
    }

    /** What would be kept of it if all were sold sound. */
    double whole() {
        return price * alone.lot.plan().massKg() * alone.there.massShare();
    }

    /** What ethylene of another lot costs it. */
    double lossBy(Cell giver) {
        if (!giver.giving.notable() || !alone.taking.minds()) {
            return 0;
        }
        double[] both = giving.ppm().clone();
        for (int d = 0; d < both.length; d++) {
            both[d] += giver.giving.ppm()[d];
        }
        return whole() * Math.max(0, alone.taking.lostShare(both) - lostByOwn);
    }

    /** Whether sharing refuses the company of another lot for its ethylene. */
    boolean refuses(Cell giver) {
        return alone.taking.refuses(giving.middlePpm(), giver.giving.middlePpm());
    }

    /** Days it lasts staying there for good, without company. */
    Spread daysStaying(StoreTrial trial) {
        double[] ppm = giving.beside(trial.plan().ethylene().outdoorPpm());
        return alone.there.daysStaying(trial.draws(), ppm);
    }
}
