package org.wardon.sharing;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The setting that costs lots least that have none in common.
 *
 * @param atC temperature, °C
 * @param humidityPct humidity at the produce, percent
 * @param daysLost by id, days of its stay and market leg, or of what it keeps in the handbook's own
 *     condition if that is less, that a lot does not reach in the middle of its range
 */
public record Compromise(double atC, double humidityPct, Map<String, Double> daysLost) {
    private static final double TIE = 1e-3;

    /** Copies the map. */
    public Compromise {
        daysLost = Map.copyOf(daysLost);
    }

    /** Of the settings that freeze and chill none, the one where the worst off loses least. */
    static Optional<Compromise> of(List<Workable> lots) {
        double least = Double.POSITIVE_INFINITY;
        int bestT = -1;
        int bestH = -1;
        for (int t = 0; t < Settings.TEMPERATURES; t++) {
            if (!safe(lots, t)) {
                continue;
            }
            for (int h = 0; h < Settings.HUMIDITIES; h++) {
                double lost = lost(lots, t, h);
                if (lost < least) {
                    least = lost;
                    bestT = t;
                    bestH = h;
                }
            }
        }
        return bestT < 0 ? Optional.empty() : Optional.of(at(lots, bestT, bestH));
    }

    private static boolean safe(List<Workable> lots, int t) {
        return lots.stream().allMatch(lot -> lot.safe(Settings.temperatureC(t)));
    }

    /** Share of its days the worst off loses; what the others lose decides between equals. */
    private static double lost(List<Workable> lots, int t, int h) {
        double worst = 0;
        double sum = 0;
        for (Workable lot : lots) {
            double share = lot.daysLost(t, h) / lot.wish().wholeDays();
            worst = Math.max(worst, share);
            sum += share;
        }
        return worst + TIE * sum;
    }

    private static Compromise at(List<Workable> lots, int t, int h) {
        Map<String, Double> lost = new TreeMap<>();
        for (Workable lot : lots) {
            lost.put(lot.wish().lot().id(), lot.daysLost(t, h));
        }
        return new Compromise(Settings.temperatureC(t), Settings.humidityPct(h), lost);
    }
}
