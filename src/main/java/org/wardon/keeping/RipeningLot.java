package org.wardon.keeping;

import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.keeping.ethylene.Giving;
import org.wardon.keeping.ethylene.Stage;
import org.wardon.keeping.ethylene.Trigger;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Ripeness;

/**
 * One lot stepped through a chamber's ethylene: gives off, feels, begins to ripen.
 *
 * <p>Autocatalysis is one step (ours, kept simple): until its green clock is over or ethylene has
 * started it, the lot gives off the lowest rate printed for its temperature, from then on the
 * highest, which feeds the air that it and its neighbours feel. A slow rise between the two, and
 * its own gas inside the fruit, are not followed.
 */
final class RipeningLot {
    /** Ageing does not ask for humidity. */
    private static final double ANY_HUMIDITY = 0.9;

    private final Giver giver;
    private final Draw draw;
    private final KeepingModel model;
    private final Giving giving;
    private final Wear green;
    private final Trigger trigger;
    private double greenUsed;
    private double ripensS = Double.POSITIVE_INFINITY;
    private int cursor;

    RipeningLot(Giver giver, Draw draw) {
        this.giver = giver;
        this.draw = draw;
        model = giver.model();
        giving = model.response().giving();
        OptionalDouble level = model.response().triggerPpm(draw);
        trigger = new Trigger(level.orElse(Double.POSITIVE_INFINITY), model.lowestSafeC());
        Paces paces = model.paces(draw);
        green = paces.aged(paces.greenShare(), true);
        greenUsed = paces.usedAtDoor(green);
    }

    private boolean here(double atS) {
        return atS >= giver.history().timeS(0);
    }

    /** Ethylene given off, µL/h. */
    double microlitrePerHour(double atS) {
        if (!here(atS) || atS >= giver.leavesS()) {
            return 0;
        }
        return giver.massKg() * giving.microlitrePerKgHour(meanC(atS), stage(atS), draw);
    }

    private double stage(double atS) {
        return atS >= ripensS
                ? Stage.giving(model.lot().commodity(), Ripeness.RIPE, draw)
                : Stage.giving(model.lot().commodity(), model.lot().door().ripeness(), draw);
    }

    /** Feels the air of a step. */
    void feel(double fromS, double toS, double ppm) {
        if (!model.span().twoClocks() || !here(fromS) || fromS >= ripensS) {
            return;
        }
        double middleC = meanC(0.5 * (fromS + toS));
        double days = (toS - fromS) / Timeline.DAY_S;
        greenUsed += days * green.perDay(middleC, middleC, ANY_HUMIDITY, ppm);
        trigger.feel(toS, meanC(toS), ppm);
        if (greenUsed >= 1 || trigger.startsS() <= toS) {
            ripensS = toS;
        }
    }

    /** When it began to ripen, s; infinite where it did not. */
    double ripensS() {
        return ripensS;
    }

    private double meanC(double atS) {
        LotHistory h = giver.history();
        int last = h.size() - 1;
        if (atS >= h.timeS(last)) {
            return h.meanC(last);
        }
        if (atS <= h.timeS(0)) {
            return h.meanC(0);
        }
        while (cursor > 0 && h.timeS(cursor) > atS) {
            cursor--;
        }
        while (h.timeS(cursor + 1) < atS) {
            cursor++;
        }
        double share = (atS - h.timeS(cursor)) / (h.timeS(cursor + 1) - h.timeS(cursor));
        return h.meanC(cursor) + share * (h.meanC(cursor + 1) - h.meanC(cursor));
    }
}
