package org.wardon.advice.receiving;

import java.util.List;
import java.util.stream.IntStream;
import org.wardon.advice.Ranges;
import org.wardon.advice.forecast.ChamberTrial;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.keeping.Spread;
import org.wardon.lots.LotHistory;

/** What one more lot does to the lots that stand in a chamber while it does. */
final class Neighbours {
    private final Question question;
    private final ChamberTrial before;
    private final ChamberTrial after;

    Neighbours(Question question, ChamberTrial before, ChamberTrial after) {
        this.question = question;
        this.before = before;
        this.after = after;
    }

    List<String> ids() {
        return before.lots(question.fromS(), question.toS());
    }

    List<ReceiveAnswer.OfLot> lots() {
        double ppm = after.ethylenePpm(question.fromS(), question.toS());
        double ppmBefore = before.ethylenePpm(question.fromS(), question.toS());
        List<String> warm = after.tooWarmByDoor();
        List<String> warmBefore = before.tooWarmByDoor();
        return ids().stream()
                .map(
                        id ->
                                new ReceiveAnswer.OfLot(
                                        id,
                                        Ranges.told(
                                                Spread.of(after.daysLeft(id, question.fromS()))),
                                        daysLost(id).p50(),
                                        warmsK(id),
                                        ppm,
                                        ppmBefore,
                                        warm.contains(id) && !warmBefore.contains(id)))
                .toList();
    }

    private Spread daysLost(String id) {
        double[] as = before.daysLeft(id, question.fromS());
        double[] with = after.daysLeft(id, question.fromS());
        return Spread.of(IntStream.range(0, as.length).mapToDouble(i -> as[i] - with[i]).toArray());
    }

    /** Share of its days that a lot loses in the middle of the draws. */
    double shareLost(String id) {
        double as = Spread.of(before.daysLeft(id, question.fromS())).p50();
        return as > 0 ? daysLost(id).p50() / as : 0;
    }

    /** Value all lots of the chamber lose, those included that come later, currency. */
    double valueLost() {
        return before.lots(question.fromS(), Double.POSITIVE_INFINITY).stream()
                .mapToDouble(id -> before.valueKept(id) - after.valueKept(id))
                .sum();
    }

    private double warmsK(String id) {
        LotHistory as = before.history(id);
        LotHistory with = after.history(id);
        double most = 0;
        for (int i = 0; i < with.size(); i++) {
            double atS = with.timeS(i);
            if (atS >= question.fromS() && atS <= as.timeS(as.size() - 1)) {
                most = Math.max(most, with.meanC(i) - meanC(as, atS));
            }
        }
        return most;
    }

    private static double meanC(LotHistory history, double atS) {
        int i = 1;
        while (i < history.size() - 1 && history.timeS(i) < atS) {
            i++;
        }
        if (history.size() == 1) {
            return history.meanC(0);
        }
        double share = (atS - history.timeS(i - 1)) / (history.timeS(i) - history.timeS(i - 1));
        double held = Math.min(1, Math.max(0, share));
        return history.meanC(i - 1) + held * (history.meanC(i) - history.meanC(i - 1));
    }
}
