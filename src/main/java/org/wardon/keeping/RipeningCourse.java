package org.wardon.keeping;

import java.util.TreeSet;
import java.util.function.DoubleUnaryOperator;
import org.wardon.air.Timeline;
import org.wardon.keeping.ripening.RipeningPace;
import org.wardon.lots.LotHistory;

/**
 * One lot of fruit followed through green, ripening and ripe. Ripening starts by the green clock or
 * by ethylene, whichever is first, and is never undone. Shares of the whole way are told as the
 * legs would share it at 20 °C (ours).
 */
final class RipeningCourse {
    private static final double SHARES_AT_C = 20;

    /** Ageing does not ask for humidity. */
    private static final double ANY_HUMIDITY = 0.9;

    private final LotHistory history;
    private final Window beyond;
    private final Track green;
    private final Track ripens;
    private final Track softens;
    private final Track spoils;
    private final double greenLeg;
    private final double ripeLeg;
    private final double overripeLeg;
    private final double[] weights;
    private final double startsS;
    private final double softS;
    private final RipeTimes times;

    /**
     * Follows a lot that ripens.
     *
     * @param paces its paces; its ripening must be printed
     * @param history what it goes through
     * @param beyond hours at whose rate it goes on
     * @param ethylene whether ethylene hastens its green clock
     * @param triggeredS when ethylene starts it, s; infinite where it does not
     */
    RipeningCourse(
            Paces paces, LotHistory history, Window beyond, boolean ethylene, double triggeredS) {
        this.history = history;
        this.beyond = beyond;
        RipeningPace pace = paces.ripening().orElseThrow();
        Wear clock = paces.greenClock(ethylene);
        boolean isGreen = paces.model().span().twoClocks();
        Start start = isGreen ? Start.GREEN : Start.of(paces, pace);
        greenLeg = isGreen ? pace.startsAtGreenShare() : 0;
        ripeLeg = 1 - start.ripe();
        overripeLeg = 1 - start.overripe();
        green = Track.of(history, clock, paces.usedAtDoor(clock), beyond);
        ripens = track(pace::ripensPerDay);
        softens = track(pace::softensPerDay);
        spoils = track(pace::spoilsPerDay);
        double warm = clock.perDay(SHARES_AT_C, SHARES_AT_C, ANY_HUMIDITY, 0);
        weights =
                new double[] {
                    isGreen ? greenLeg / warm : 0,
                    ripeLeg / pace.softensPerDay(SHARES_AT_C),
                    overripeLeg / pace.spoilsPerDay(SHARES_AT_C)
                };
        startsS = isGreen ? Math.min(green.reachesS(greenLeg), triggeredS) : history.timeS(0);
        softS = after(softens, startsS, ripeLeg);
        double overripeS = after(spoils, softS, overripeLeg);
        double ripeS = after(ripens, startsS, ripeLeg);
        times = new RipeTimes(ripeS < overripeS ? ripeS : Double.POSITIVE_INFINITY, overripeS);
    }

    /**
     * How far a lot that is no longer green has come at the start of its history.
     *
     * @param ripe share of the way to ripe
     * @param overripe share of the way from ripe to overripe
     */
    private record Start(double ripe, double overripe) {
        static final Start GREEN = new Start(0, 0);

        /** Counts what was used before, or the time since harvest. */
        static Start of(Paces paces, RipeningPace pace) {
            LotAtDoor door = paces.model().lot().door();
            double heldC = door.age().map(Age::heldC).orElse(SHARES_AT_C);
            double toRipe = (1 - pace.atDoor()) / pace.softensPerDay(heldC);
            double toOverripe = 1 / pace.spoilsPerDay(heldC);
            double days =
                    door.usedFraction().isPresent()
                            ? door.usedFraction().getAsDouble() * (toRipe + toOverripe)
                            : paces.daysBeforeArrival();
            double ripening = Math.min(days, toRipe);
            double ripe = Math.min(days - ripening, toOverripe);
            return new Start(
                    pace.atDoor() + ripening * pace.softensPerDay(heldC),
                    ripe * pace.spoilsPerDay(heldC));
        }
    }

    private Track track(DoubleUnaryOperator perDay) {
        return Track.of(history, (mean, skin, humid, ppm) -> perDay.applyAsDouble(mean), 0, beyond);
    }

    /** When a leg of which so much is left ends that begins at a time. */
    private static double after(Track leg, double fromS, double left) {
        if (Double.isInfinite(fromS) || left <= 0) {
            return fromS;
        }
        return leg.reachesS(leg.usedAt(fromS) + left);
    }

    RipeTimes times() {
        return times;
    }

    /** Share of the whole way to overripe along the history and on to its end. */
    Track toOverripe() {
        TreeSet<Double> at = new TreeSet<>();
        for (int i = 0; i < history.size(); i++) {
            at.add(history.timeS(i));
        }
        for (double eventS : new double[] {startsS, softS, times.overripeS()}) {
            if (Double.isFinite(eventS)) {
                at.add(eventS);
            }
        }
        double[] timeS = at.stream().mapToDouble(s -> s).toArray();
        double[] used = new double[timeS.length];
        for (int i = 0; i < timeS.length; i++) {
            used[i] = usedAt(timeS[i]);
        }
        double last = timeS[timeS.length - 1];
        return Track.on(timeS, used, (usedAt(last + Timeline.DAY_S) - used[timeS.length - 1]));
    }

    private double usedAt(double atS) {
        double whole = weights[0] + weights[1] + weights[2];
        double gone = 0;
        if (greenLeg > 0) {
            double share = atS >= startsS ? 1 : Math.min(1, green.usedAt(atS) / greenLeg);
            gone += weights[0] * share;
        }
        if (atS >= startsS && ripeLeg > 0) {
            double share = (softens.usedAt(atS) - softens.usedAt(startsS)) / ripeLeg;
            gone += weights[1] * (atS >= softS ? 1 : Math.min(1, share));
        }
        if (atS >= softS) {
            if (overripeLeg <= 0) {
                return 1;
            }
            gone += weights[2] * (spoils.usedAt(atS) - spoils.usedAt(softS)) / overripeLeg;
        }
        return atS >= times.overripeS() ? Math.max(1, gone / whole) : gone / whole;
    }
}
