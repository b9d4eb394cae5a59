package org.wardon.advice.forecast;

import java.util.List;
import java.util.Map;
import org.wardon.heat.Course;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Outlook;
import org.wardon.lots.LotHistory;

/**
 * What a lot would come to in a chamber that is there already: the lot runs in that chamber's air,
 * which it is taken not to change, and keeps in the same draws.
 */
final class OtherChambers {
    private final StoreModel model;
    private final Fates fates;
    private final List<Draw> draws;

    OtherChambers(StoreModel model) {
        this.model = model;
        this.fates = new Fates(model);
        this.draws = Draws.seeded(model.plan().seed(), StoreRun.DRAWS);
    }

    /**
     * A lot in another chamber.
     *
     * @param shareSound share of draws in which it is sound when sold
     * @param massShare mass at leaving over mass at arrival
     * @param sold fates in the order of the draws, market leg included
     */
    record There(double shareSound, double massShare, List<Fate> sold) {
        There {
            sold = List.copyOf(sold);
        }

        /** What its owner gets for it. */
        double value(LotSheet sheet) {
            return sheet.plan().market().pricePerKg()
                    * sheet.plan().massKg()
                    * massShare
                    * shareSound;
        }
    }

    /** Puts a lot into the air of a chamber. */
    There of(LotSheet sheet, Course chamber, ChamberEthylene level, double durationS) {
        LotHistory history = model.inAirOf(sheet, chamber, durationS).history();
        double ppm = meanPpm(level, history);
        LotHistory there = fates.inOtherAir(sheet, history, ppm);
        List<Fate> sold =
                draws.parallelStream()
                        .map(draw -> sheet.model().follow(there, draw).brief())
                        .toList();
        return new There(Outlook.shareSound(sold, sheet.soldS()), massShare(sheet, history), sold);
    }

    private static double meanPpm(ChamberEthylene level, LotHistory history) {
        double sum = 0;
        for (int i = 0; i < history.size(); i++) {
            sum += level.ppmAt(history.timeS(i));
        }
        return sum / history.size();
    }

    private static double massShare(LotSheet sheet, LotHistory history) {
        double mass = history.massKg(0);
        for (int i = 0; i < history.size(); i++) {
            if (history.timeS(i) <= sheet.clock().leavesS()) {
                mass = history.massKg(i);
            }
        }
        return mass / history.massKg(0);
    }

    /** Largest mass that stands in a chamber at one time, kg. */
    static double mostKg(List<Visit> visits) {
        double most = 0;
        for (Visit at : visits) {
            double here = 0;
            for (Visit other : visits) {
                boolean overlaps =
                        other.hereFromS() <= at.hereFromS() && other.leavesS() > at.hereFromS();
                here += overlaps ? other.sheet().plan().massKg() : 0;
            }
            most = Math.max(most, here);
        }
        return most;
    }

    /** Best value over the chambers named, by id. */
    static String best(Map<String, There> there, LotSheet sheet) {
        String best = "";
        double most = Double.NEGATIVE_INFINITY;
        for (Map.Entry<String, There> entry : there.entrySet()) {
            double value = rank(entry.getValue(), sheet);
            if (value > most) {
                most = value;
                best = entry.getKey();
            }
        }
        return best;
    }

    /** Value where there is a price, else the share that is sold sound; days break ties. */
    static double rank(There there, LotSheet sheet) {
        double worth = there.massShare() * there.shareSound();
        double days = Outlook.leaveByS(there.sold(), sheet.clock().arrivesS(), 0);
        return worth + 1e-12 * days;
    }
}
