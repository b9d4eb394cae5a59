package org.wardon.sharing;

import java.util.List;
import org.wardon.keeping.Fate;
import org.wardon.keeping.KeepingModel;

/**
 * A lot in a chamber as it was worked out there.
 *
 * @param wish the lot and its days
 * @param model how it keeps
 * @param fates its fates in the draws, with the chamber's air, humidity and ethylene
 * @param massKg its mass, kg
 * @param span when it is there, and when in the store
 * @param felt what it went through while there
 * @param ethyleneDays days of life that the ethylene there costs it, a draw each as {@code fates};
 *     empty where nobody asked
 */
public record Together(
        Wish wish,
        KeepingModel model,
        List<Fate> fates,
        double massKg,
        Span span,
        Felt felt,
        List<Double> ethyleneDays) {
    /**
     * What a lot went through in a chamber.
     *
     * @param meanC its mean temperature, °C
     * @param coldestC the lowest its mean came to, °C
     * @param ethylenePpm mean ethylene of the air, µL/L
     */
    public record Felt(double meanC, double coldestC, double ethylenePpm) {}

    /**
     * When a lot is in a chamber, and when in the store, of which it may leave another chamber.
     *
     * @param arrivesS when it comes into the chamber, s
     * @param leavesS when it leaves the chamber, s
     * @param storedS when it comes into the store, s
     * @param goesS when it leaves the store, s
     */
    public record Span(double arrivesS, double leavesS, double storedS, double goesS) {
        /** A lot that is nowhere else in the store. */
        public static Span only(double arrivesS, double leavesS) {
            return new Span(arrivesS, leavesS, arrivesS, leavesS);
        }

        /** Whether the lot leaves the store from here. */
        boolean last() {
            return leavesS == goesS;
        }
    }

    /** Copies the lists. */
    public Together {
        fates = List.copyOf(fates);
        ethyleneDays = List.copyOf(ethyleneDays);
    }

    /** Days both are there, 0 where their stays do not meet. */
    double daysWith(Together other) {
        double from = Math.max(span.arrivesS(), other.span.arrivesS());
        double to = Math.min(span.leavesS(), other.span.leavesS());
        return Math.max(0, to - from) / org.wardon.air.Timeline.DAY_S;
    }

    String id() {
        return wish.lot().id();
    }
}
